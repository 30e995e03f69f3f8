package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.assess.Loads;
import broadside.panel.FacadePanel;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import java.util.Optional;

/** Elevation of a building face with its panel, the panel at a larger scale beside it, and a strip of the plan below. */
final class FacadeDrawing {

    private static final double LEFT = 84;
    private static final double ROOM = 212;
    private static final double TALLEST = 108;
    private static final double TOP = 44;
    /** The panel by itself. */
    private static final double DETAIL = 408;
    private static final double WIDEST = 92;
    private static final double HIGHEST = 84;
    /** Smallest mark for a panel on the face, points. */
    private static final double LEAST = 3;
    private static final double DEEPEST = 34;

    private final FacadePanel facade;
    private final Optional<Loads> loads;
    private final Format format;
    private final double wide;
    private final double high;
    private final double corner;

    FacadeDrawing(FacadePanel facade, Optional<Loads> loads, Format format) {
        this.facade = facade;
        this.loads = loads;
        this.format = format;
        this.wide = facade.building().width().metres();
        this.high = facade.building().height().metres();
        this.corner = facade.fromCorner().metres();
    }

    Drawing make() {
        double scale = Math.min(ROOM / wide, TALLEST / high);
        double start = LEFT + (ROOM - wide * scale) / 2;
        Canvas face = new Canvas(start, TOP + high * scale, scale);
        double ground = face.y(0);
        face.text(face.x(wide / 2), 12, "elevation of the face", Anchor.MIDDLE, Ink.BLACK);
        face.ground(start - 26, face.x(wide) + 26);
        face.box(0, 0, wide, high, Canvas.THICK, Fill.PAPER);
        face.acrossPaper(face.x(0), face.x(wide), 32);
        face.text(face.x(wide / 2), 28, facade.building().width().typed(), Anchor.MIDDLE, Ink.BLACK);
        face.help(face.x(0), TOP, start - 18, TOP);
        face.upward(0, high, start - 14, facade.building().height().typed());
        onFace(face);
        double bar = ItemDrawing.barLength(ROOM / scale, format.units());
        face.scaleBar(start, ground + 38, bar, ItemDrawing.barText(bar, format));
        double end = plan(face, ground + 56);
        return new Drawing(ItemDrawing.WIDTH, Math.max(end, detail(face)) + 10, face.shapes());
    }

    /** The panel in its place, with its distances from the corner and from the ground. */
    private void onFace(Canvas face) {
        double w = facade.width().metres();
        double h = facade.height().metres();
        double bottom = facade.bottom().metres();
        double least = LEAST / face.scale();
        face.box(Math.min(corner, wide - Math.min(least, wide)), bottom, Math.max(w, least), Math.max(h, least), Canvas.THICK, Fill.PAPER);
        double ground = face.y(0);
        face.help(face.x(corner), face.y(bottom), face.x(corner), ground + 22);
        String words = corner == 0 ? "at the corner" : facade.fromCorner().typed() + " from the corner";
        face.acrossBeside(0, corner, ground + 20, words);
        if (ground - face.y(bottom) > 1) {
            double right = face.x(corner) + Math.max(w * face.scale(), LEAST);
            double room = Canvas.width(facade.bottom().typed()) + 16;
            boolean left = face.x(corner) - room > face.x(0);
            double at = left ? face.x(corner) - 8 : right + room < face.x(wide) ? right + 8 : Math.max(right, face.x(wide)) + 12;
            face.help(left ? at - 4 : right, face.y(bottom), left ? face.x(corner) : at + 4, face.y(bottom));
            face.upwardPaper(ground, face.y(bottom), at);
            face.text(at + (left ? -5 : 5), Math.min((ground + face.y(bottom)) / 2 + 3, ground - 3), facade.bottom().typed(), left ? Anchor.END : Anchor.START, Ink.BLACK);
        }
    }

    /** The panel by itself with its sizes, zones and force. */
    private double detail(Canvas face) {
        double w = facade.width().metres();
        double h = facade.height().metres();
        double scale = Math.min(WIDEST / w, HIGHEST / h);
        Canvas panel = face.view(DETAIL - w * scale / 2, TOP + 18 + h * scale, scale);
        panel.text(DETAIL, 12, "the panel, larger scale", Anchor.MIDDLE, Ink.BLACK);
        panel.box(0, 0, w, h, Canvas.THICK, Fill.PAPER);
        loads.ifPresent(l -> {
            ZoneDrawing zones = ZoneDrawing.of(ItemDrawing.shown(l), 0, h);
            for (PanelZones each : zones.panels()) {
                zones.draw(panel, each, 0, 0, w, true);
            }
        });
        panel.acrossPaper(panel.x(0), panel.x(w), 40);
        panel.text(DETAIL, 36, facade.width().typed(), Anchor.MIDDLE, Ink.BLACK);
        panel.upward(0, h, panel.x(0) - 12, facade.height().typed());
        double y = panel.y(0) + 16;
        panel.text(DETAIL, y, "corner to the left", Anchor.MIDDLE, Ink.BLACK);
        if (loads.isPresent()) {
            for (CaseAction each : loads.get().cases()) {
                y += 14;
                panel.boldText(DETAIL, y, (each.direction().equals("outward") ? "pulled off: F " : "pushed on: F ") + format.force(each.force()),
                    Anchor.MIDDLE, Ink.ACCENT);
            }
        }
        return y;
    }

    /** Seen from above: the building, the panel on its face, the wind onto the wall and along it. */
    private double plan(Canvas face, double startY) {
        double deep = facade.building().depth().metres() * face.scale();
        boolean whole = deep <= DEEPEST;
        double line = startY + 14 + Math.min(deep, DEEPEST);
        double x1 = face.x(0);
        double x2 = face.x(wide);
        face.text((x1 + x2) / 2, startY + 6, "plan", Anchor.MIDDLE, Ink.BLACK);
        face.line(x1, line, x2, line, Canvas.THICK, Ink.BLACK, false);
        for (double x : new double[] {x1, x2}) {
            face.line(x, line, x, startY + 14, Canvas.THICK, Ink.BLACK, false);
            if (!whole) {
                face.cut(x, startY + 24);
            }
        }
        face.line(x1, startY + 14, x2, startY + 14, Canvas.THIN, Ink.BLACK, !whole);
        face.text(x2 + 6, line - Math.min(deep, DEEPEST) / 2 + 3, facade.building().depth().typed(), Anchor.START, Ink.BLACK);
        double left = face.x(corner);
        double right = Math.max(left + LEAST, face.x(corner + facade.width().metres()));
        face.line(left, line + 1.5, right, line + 1.5, 3, Ink.BLACK, false);
        double middle = (left + right) / 2;
        double tip = line + 5;
        face.arrow(middle, tip + 32, middle, tip, Canvas.THIN);
        face.text(middle + 6, tip + 30, "wind onto the wall", Anchor.START, Ink.ACCENT);
        face.arrow(x1 - 58, line + 8, x1 - 8, line + 8, Canvas.THIN);
        face.text(x1 - 62, line + 20, "wind along", Anchor.START, Ink.ACCENT);
        face.text(x1 - 62, line + 31, "the wall", Anchor.START, Ink.ACCENT);
        loads.map(l -> l.governs("base-shear")).filter(c -> c.direction().equals("outward")).ifPresent(c -> {
            double at = Math.min(right + 22, x2 + 30);
            face.line(middle, line + 3, at, line + 3, 0.4, Ink.GREY, false);
            face.arrow(at, line + 4, at, line + 26, 2);
            face.boldText(at + 6, line + 18, "F", Anchor.START, Ink.ACCENT);
        });
        return tip + 34;
    }
}
