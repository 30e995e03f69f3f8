package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.codes.ZonePressure;
import broadside.panel.Board;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Ink;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Names of the zones of one board, each inside its zone and clear of the point at which the force acts, the hardest first.
 * One that has no room there is left to the table of zones.
 */
record ZoneNames(Canvas canvas, Board board, CaseAction force) {

    /** Height of a row of names, points. */
    private static final double ROW = 10;
    /** Room that the sign of the force takes on each side, points. */
    private static final double TARGET = 6.5;

    void write(PanelZones panel) {
        List<double[]> taken = new ArrayList<>();
        double px = canvas.x(force.side());
        double py = canvas.y(force.height());
        taken.add(new double[] {px - TARGET, py - TARGET, px + TARGET, py + TARGET});
        for (ZonePressure zone : panel.zones().stream().sorted(Comparator.comparingDouble(ZonePressure::pressure).reversed()).toList()) {
            name(HoardingDrawing.shortName(zone.zone()), canvas.x(panel.left() + zone.from()), canvas.x(panel.left() + zone.to()), taken);
        }
    }

    private void name(String name, double from, double to, List<double[]> taken) {
        double half = name.length() * 2.6;
        double left = from + 1 + half;
        double right = to - 1 - half;
        double low = canvas.y(board.clearance().metres()) - 3;
        double high = canvas.y(board.clearance().metres() + board.height().metres()) + 1;
        if (left > right) {
            return;
        }
        for (double y = low; y - 7 >= high; y -= ROW) {
            for (double aside = 0; aside <= (right - left) / 2; aside = aside > 0 ? -aside : 1 - aside) {
                double x = (left + right) / 2 + aside;
                double[] box = {x - half, y - 7, x + half, y + 1};
                if (taken.stream().noneMatch(t -> box[0] < t[2] && t[0] < box[2] && box[1] < t[3] && t[1] < box[3])) {
                    canvas.boldText(x, y, name, Anchor.MIDDLE, Ink.BLACK);
                    taken.add(box);
                    return;
                }
            }
        }
    }
}
