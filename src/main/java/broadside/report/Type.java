package broadside.report;

/** The sizes of type in the document, in points, with the distance from line to line and the colour. */
enum Type {
    TITLE(18, 23, Colour.INK),
    SECTION(13.5, 18, Colour.ACCENT),
    PART(11, 15, Colour.INK),
    LARGE(15, 20, Colour.INK),
    BODY(10.5, 14.5, Colour.INK),
    TABLE(10, 13, Colour.INK),
    QUIET(10, 13, Colour.GREY),
    MARGIN(9, 11, Colour.GREY);

    private final double size;
    private final double leading;
    private final Colour colour;

    Type(double size, double leading, Colour colour) {
        this.size = size;
        this.leading = leading;
        this.colour = colour;
    }

    double size() {
        return size;
    }

    double leading() {
        return leading;
    }

    Colour colour() {
        return colour;
    }

    /** Returns the distance from the top of a line to its base line: capitals stand in the middle of the line. */
    double base() {
        return leading / 2 + size * 0.345;
    }
}
