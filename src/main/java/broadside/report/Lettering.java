package broadside.report;

/** Liberation Sans, regular and bold; made once and shared by all documents and threads. */
final class Lettering {

    /** Stands in for a character that the fonts lack. */
    static final char MISSING = '\u25A1';
    /** Size of a subscript as a share of the size of its line. */
    static final double LOWERED_SIZE = 0.72;
    /** How far a subscript stands below the base line, as a share of the size of its line. */
    static final double LOWERED_BY = 0.18;

    private final Face regular = new Face("/liberation/LiberationSans-Regular.ttf");
    private final Face bold = new Face("/liberation/LiberationSans-Bold.ttf");

    Face face(boolean isBold) {
        return isBold ? bold : regular;
    }

    boolean has(int c) {
        return c < 0x10000 && regular.glyph((char) c) != 0 && bold.glyph((char) c) != 0;
    }

    /** Returns the width of a character in points. */
    double width(char c, byte mark, double size) {
        double lowered = (mark & Words.LOWERED) != 0 ? LOWERED_SIZE : 1;
        return face((mark & Words.BOLD) != 0).advance(c) * size * lowered / 1000;
    }
}
