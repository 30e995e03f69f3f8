package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.PostAction;
import broadside.assess.Loads;
import broadside.panel.Hoarding;
import broadside.panel.Kentledge;
import broadside.panel.Panel;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import java.util.Optional;

/** Elevation of a hoarding over its whole length, and a side view at a larger scale below it. */
final class HoardingDrawing {

    private static final double MARGIN = 40;
    private static final double SIDE = 84;
    /** Points from the lowest of the footing to the top. */
    private static final double DEEPEST = 150;

    private final Hoarding hoarding;
    private final Optional<Loads> loads;
    private final Format format;
    private final double length;
    private final double top;

    HoardingDrawing(Hoarding hoarding, Optional<Loads> loads, Format format) {
        this.hoarding = hoarding;
        this.loads = loads;
        this.format = format;
        this.length = hoarding.length().metres();
        this.top = hoarding.clearance().metres() + hoarding.height().metres();
    }

    Drawing make() {
        double scale = Math.min((ItemDrawing.WIDTH - 2 * MARGIN) / length, 120 / top);
        double ground = 58 + top * scale;
        Canvas front = new Canvas(MARGIN + ((ItemDrawing.WIDTH - 2 * MARGIN) - length * scale) / 2, ground, scale);
        front.text(ItemDrawing.WIDTH / 2, 12, ItemDrawing.elevation(loads), Anchor.MIDDLE, Ink.BLACK);
        front.ground(front.x(0) - 20, front.x(length) + 20);
        for (Panel panel : hoarding.panels()) {
            front.box(left(panel), panel.clearance(), panel.width(), panel.height(), Canvas.THICK, Fill.PAPER);
        }
        zones(front);
        posts(front);
        gates(front);
        returns(front);
        front.help(front.x(0), front.y(top), front.x(0), 34);
        front.help(front.x(length), front.y(top), front.x(length), 34);
        front.across(0, length, 36, hoarding.length().typed());
        double bar = ItemDrawing.barLength(length, format.units());
        front.scaleBar(front.x(0), ground + 48, bar, ItemDrawing.barText(bar, format));
        return side(front, ground + 66);
    }

    private double left(Panel panel) {
        return panel.middle() - panel.width() / 2 + length / 2;
    }

    private void zones(Canvas front) {
        if (loads.isEmpty()) {
            return;
        }
        ZoneDrawing zones = ZoneDrawing.of(ItemDrawing.shown(loads.get()), hoarding.clearance().metres(), hoarding.height().metres());
        for (PanelZones panel : zones.panels()) {
            zones.draw(front, panel, panel.left() + length / 2, 0, length);
        }
    }

    /** "case-c/s-2s" becomes "s-2s", "case-a" becomes "all", a part of a lettered zone stays "B/sheltered": the words on the drawing and in tables. */
    static String shortName(String zone) {
        return zone.equals("case-a") || zone.equals("case-b") ? "all" : zone.indexOf('/') == 1 ? zone : zone.substring(zone.indexOf('/') + 1);
    }

    private void posts(Canvas front) {
        if (loads.isEmpty()) {
            return;
        }
        for (PostAction post : loads.get().posts()) {
            front.line(front.x(post.position()), front.y(0), front.x(post.position()), front.y(0) + 9, Canvas.THICK, Ink.BLACK, false);
        }
        if (loads.get().posts().size() > 1) {
            front.text(front.x(0), front.y(0) + 22, "posts at " + hoarding.spacing().orElseThrow().typed(), Anchor.START, Ink.BLACK);
        }
    }

    private void gates(Canvas front) {
        for (Hoarding.Gate gate : hoarding.gates()) {
            front.line(front.x(gate.from().metres()), front.y(0), front.x(gate.end()), front.y(top), Canvas.THIN, Ink.BLACK, true);
            front.line(front.x(gate.from().metres()), front.y(top), front.x(gate.end()), front.y(0), Canvas.THIN, Ink.BLACK, true);
            front.text(front.x((gate.from().metres() + gate.end()) / 2), front.y(0) + 22, "gate " + gate.width().typed(), Anchor.MIDDLE, Ink.BLACK);
        }
    }

    private void returns(Canvas front) {
        if (hoarding.returnLeft().metres() > 0) {
            front.text(front.x(0), front.y(0) + 34, "return " + hoarding.returnLeft().typed(), Anchor.START, Ink.BLACK);
        }
        if (hoarding.returnRight().metres() > 0) {
            front.text(front.x(length), front.y(0) + 34, "return " + hoarding.returnRight().typed(), Anchor.END, Ink.BLACK);
        }
    }

    private Drawing side(Canvas front, double startY) {
        double scale = Math.min(SIDE / top, DEEPEST / (top + FootingDrawing.of(loads).map(FootingDrawing::depth).orElse(0.0)));
        double ground = startY + 26 + top * scale;
        Canvas side = front.view(ItemDrawing.WIDTH / 2, ground, scale);
        double[][] panels = {{hoarding.clearance().metres(), hoarding.height().metres(), 0}};
        double behind = hoarding.held().kentledge().flatMap(Kentledge::lever).map(l -> foot(side, l.metres()) + 6 / scale).orElse(0.0);
        double dim = Math.max(ItemDrawing.WIDTH / 2 + 80, behind == 0 ? 0 : side.x(behind) + 74);
        SideView view = new SideView(side, ItemDrawing.WIDTH / 2 - 110, dim + 30, top, behind);
        hoarding.held().kentledge().ifPresent(k -> braced(side, k));
        view.draw(panels);
        FootingDrawing.of(loads).ifPresent(f -> f.draw(side, format));
        loads.map(l -> l.governs("base-moment")).ifPresent(c -> view.force(0, c.height(), "F " + format.force(c.force()) + " in all", ItemDrawing.otherCase(loads.get()),
            format.length(c.height())));
        side.help(side.x(0.06), side.y(top), dim + 4, side.y(top));
        side.line(dim, side.y(hoarding.clearance().metres()), dim, side.y(top), Canvas.THIN, Ink.BLACK, false);
        side.text(dim + 4, (side.y(hoarding.clearance().metres()) + side.y(top)) / 2, hoarding.height().typed(), Anchor.START, Ink.BLACK);
        if (hoarding.clearance().metres() > 0) {
            side.text(dim + 4, side.y(0) - 3, hoarding.clearance().typed() + " gap", Anchor.START, Ink.BLACK);
        }
        side.text(ItemDrawing.WIDTH / 2, startY + 6, "side view, larger scale", Anchor.MIDDLE, Ink.BLACK);
        double bar = ItemDrawing.barLength(4 * top, format.units());
        side.scaleBar(ItemDrawing.WIDTH / 2 - 200, ground, bar / 2, ItemDrawing.barText(bar / 2, format));
        return new Drawing(ItemDrawing.WIDTH, ground + Math.max(14, FootingDrawing.of(loads).map(f -> f.room(scale, format)).orElse(0.0)), front.shapes());
    }

    /** Where the brace stands, m: a long one is drawn shorter. */
    private static double foot(Canvas side, double lever) {
        return Math.min(lever, 100 / side.scale());
    }

    /** The raking brace, the ballast on its foot, and the two tipping edges. */
    private void braced(Canvas side, Kentledge kentledge) {
        kentledge.lever().ifPresent(lever -> {
            double at = foot(side, lever.metres());
            side.line(side.x(0), side.y(top * 0.9), side.x(at), side.y(0), Canvas.THICK, Ink.BLACK, false);
            side.box(at - 6 / side.scale(), 0, 12 / side.scale(), 10 / side.scale(), Canvas.THICK, Fill.PAPER);
            side.tippingEdge(0);
            side.tippingEdge(at);
        });
    }
}
