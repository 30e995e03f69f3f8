package broadside.sheet;

import broadside.sheet.Drawing.Ink;

/**
 * Something that hangs at a height, and the ground below it: to scale, or cut short where the ground is far below, so that
 * the thing itself stays large enough to read.
 *
 * @param at      heights above the ground, in metres, from the lowest edge upward
 * @param low     height of the lowest edge, m
 * @param ground  where the ground is on paper
 */
record GroundDrawing(Canvas at, double low, double ground) {

    private static final double DEEPEST = 60;
    private static final double SHORT = 44;

    /** From the place of the lowest edge on paper. */
    static GroundDrawing below(double x, double lowY, double scale, double low) {
        double below = low * scale;
        return new GroundDrawing(new Canvas(x, lowY + below, scale), low, lowY + (below > DEEPEST ? SHORT : below));
    }

    boolean shortened() {
        return ground < at.y(0) - 1e-6;
    }

    void draw(double from, double to) {
        at.view(at.x(0), ground, at.scale()).ground(from, to);
    }

    /** A line upward from the ground, cut where the ground is drawn too near. */
    void upright(double atX, double toY, double weight) {
        at.line(atX, ground, atX, toY, weight, Ink.BLACK, false);
        mark(atX);
    }

    /** The sign of the cut on something that reaches the ground. */
    void mark(double atX) {
        if (shortened()) {
            at.cut(atX, ground - SHORT / 2);
        }
    }

    /** Dimension from the ground to the lowest edge, its text on the left. */
    void dimension(double atX, String text) {
        if (ground - at.y(low) > 1) {
            at.upwardPaper(ground, at.y(low), atX);
            mark(atX);
            at.text(atX - 6, middle(), text, Drawing.Anchor.END, Ink.BLACK);
        }
    }

    /** The same with its text on the right. */
    void dimensionRight(double atX, String text) {
        if (ground - at.y(low) > 1) {
            at.upwardPaper(ground, at.y(low), atX);
            mark(atX);
            at.text(atX + 6, middle(), text, Drawing.Anchor.START, Ink.BLACK);
        }
    }

    /** Base line of a text half-way up from the ground, never on the ground line. */
    private double middle() {
        return Math.min((ground + at.y(low)) / 2 + 3, ground - 3);
    }
}
