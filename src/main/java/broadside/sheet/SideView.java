package broadside.sheet;

import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;

/** The view along the panel: wind from the left, the force at its height, the ground. */
final class SideView {

    /**
     * Draws one item from the side.
     *
     * @param top     height of the highest edge, m
     * @param force   height of the force, m; below zero when there is none
     * @param label   of the force
     */
    static void draw(Canvas view, double left, double right, double[][] panels, double top, double force, String label, String height) {
        view.ground(left, right);
        double post = 0.05;
        view.box(-post, 0, 2 * post, top, Canvas.THIN, Fill.PAPER);
        for (double[] panel : panels) {
            double depth = Math.max(panel[2], 2.5 / view.scale());
            view.box(-post - depth, panel[0], depth, panel[1], Canvas.THICK, Fill.PAPER);
        }
        double windY = view.y(top) - 10;
        view.text(left, windY - 4, "wind", Anchor.START, Ink.ACCENT);
        view.arrow(left, windY, left + 34, windY, Canvas.THIN);
        if (force < 0) {
            return;
        }
        double tip = view.x(-post) - Math.max(3, panels[0][2] * view.scale());
        double y = view.y(force);
        view.arrow(tip - 40, y, tip - 1, y, 2);
        view.boldText(tip - 6, y - 6, label, Anchor.END, Ink.ACCENT);
        double dim = view.x(post) + 26;
        view.help(view.x(post), y, dim + 4, y);
        view.line(dim, y, dim, view.y(0), Canvas.THIN, Ink.BLACK, false);
        view.text(dim + 4, (y + view.y(0)) / 2 + 3, height, Anchor.START, Ink.BLACK);
    }

    private SideView() { }
}
