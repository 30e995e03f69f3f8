package broadside.report;

/** The size of the paper, in points (1/72 inch). */
public enum Paper {
    /** 210 mm by 297 mm, ISO 216. */
    A4(595.28, 841.89),
    /** 8.5 inches by 11 inches. */
    LETTER(612, 792);

    private final double width;
    private final double height;

    Paper(double width, double height) {
        this.width = width;
        this.height = height;
    }

    double width() {
        return width;
    }

    double height() {
        return height;
    }
}
