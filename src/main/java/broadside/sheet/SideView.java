package broadside.sheet;

import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;

/**
 * The view along the panel: wind from the left, the force at its height, the ground.
 *
 * @param left    where the ground begins on paper
 * @param right   where it ends
 * @param top     height of the highest edge, m
 * @param behind  how far things stand out behind the panel, m
 */
record SideView(Canvas view, double left, double right, double top, double behind) {

    private static final double POST = 0.05;

    /** Panels by lower edge, height and depth, m, and the post behind them. */
    void draw(double[][] panels) {
        view.ground(left, right);
        view.box(-POST, 0, 2 * POST, top, Canvas.THIN, Fill.PAPER);
        for (double[] panel : panels) {
            double depth = Math.max(panel[2], 2.5 / view.scale());
            view.box(-POST - depth, panel[0], depth, panel[1], Canvas.THICK, Fill.PAPER);
        }
        double windY = view.y(top) - 10;
        view.text(left, windY - 4, "wind", Anchor.START, Ink.ACCENT);
        view.arrow(left, windY, left + 34, windY, Canvas.THIN);
    }

    /** The force at its height, with its label, its case where it has to be told, and that height as text. */
    void force(double depth, double height, String label, String ofCase, String text) {
        double tip = view.x(-POST) - Math.max(3, depth * view.scale());
        double y = view.y(height);
        view.arrow(tip - 40, y, tip - 1, y, 2);
        view.boldText(tip - 6, y - 6, label, Anchor.END, Ink.ACCENT);
        if (!ofCase.isEmpty()) {
            view.boldText(tip - 6, y + 12, ofCase, Anchor.END, Ink.ACCENT);
        }
        double dim = Math.max(view.x(POST), view.x(behind)) + 26;
        view.help(view.x(POST), y, dim + 4, y);
        view.line(dim, y, dim, view.y(0), Canvas.THIN, Ink.BLACK, false);
        view.beside(dim, view.y(0), y, text);
    }
}
