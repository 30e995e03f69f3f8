package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.codes.ZonePressure;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Ink;
import java.util.List;

/**
 * The zones of one case on panels of one height: hatched the denser the higher the pressure, and named above.
 *
 * @param most  greatest pressure of the case, Pa
 */
record ZoneDrawing(List<PanelZones> panels, double bottom, double height, double most) {

    /** Distance of the strokes at the greatest pressure, points. */
    private static final double DENSEST = 4;

    static ZoneDrawing of(CaseAction action, double bottom, double height) {
        double most = action.zones().stream().flatMap(p -> p.zones().stream()).mapToDouble(z -> Math.abs(z.pressure())).max().orElseThrow();
        return new ZoneDrawing(action.zones(), bottom, height, most);
    }

    /** Draws the zones of a panel whose left edge stands at {@code left}, as far as they lie between two places, m; one zone alone needs no name. */
    void draw(Canvas canvas, PanelZones panel, double left, double from, double to) {
        draw(canvas, panel, left, from, to, panel.zones().size() > 1);
    }

    void draw(Canvas canvas, PanelZones panel, double left, double from, double to, boolean named) {
        double[] taken = {-20, -20};
        for (ZonePressure zone : panel.zones()) {
            double start = Math.max(from, left + zone.from());
            double end = Math.min(to, left + zone.to());
            if (end <= start) {
                continue;
            }
            if (zone.pressure() != 0) {
                canvas.hatch(start, bottom, end - start, height, DENSEST * most / Math.abs(zone.pressure()));
            }
            canvas.line(canvas.x(start), canvas.y(bottom), canvas.x(start), canvas.y(bottom + height), Canvas.THIN, Ink.BLACK, false);
            if (named) {
                name(canvas, canvas.x((start + end) / 2), HoardingDrawing.shortName(zone.zone()), taken);
            }
        }
    }

    /** Names stand in one row above the panel; one that would touch the name before it moves up into a second row, or is left to the table. */
    private void name(Canvas canvas, double middle, String name, double[] taken) {
        double half = name.length() * 2.9;
        for (int row = 0; row < taken.length; row++) {
            if (middle - half >= taken[row]) {
                canvas.boldText(middle, canvas.y(bottom + height) - 4 - 9 * row, name, Anchor.MIDDLE, Ink.BLACK);
                taken[row] = middle + half + 3;
                return;
            }
        }
    }
}
