package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.action.Reaction;
import broadside.assess.Loads;
import broadside.panel.SpannedBanner;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import java.util.Optional;

/** Elevation of a banner between two supports, and its plan with the bow below it. */
final class BannerDrawing {

    private static final double LEFT = 108;
    private static final double ROOM = 276;
    private static final double TALLEST = 90;
    private static final double TOP = 60;
    /** From an end of the banner to the line of its support, points. */
    private static final double TIE = 12;
    private static final double DEEPEST = 64;
    private static final int PIECES = 32;

    private final SpannedBanner banner;
    private final Optional<Loads> loads;
    private final Format format;
    private final double width;
    private final double height;
    private final double bottom;

    BannerDrawing(SpannedBanner banner, Optional<Loads> loads, Format format) {
        this.banner = banner;
        this.loads = loads;
        this.format = format;
        this.width = banner.width().metres();
        this.height = banner.height().metres();
        this.bottom = banner.bottom().metres();
    }

    Drawing make() {
        double scale = Math.min(ROOM / width, TALLEST / height);
        double start = LEFT + (ROOM - width * scale) / 2;
        GroundDrawing hung = GroundDrawing.below(start, TOP + height * scale, scale, bottom);
        Canvas front = hung.at();
        front.text(start + width * scale / 2, 12, "elevation, seen along the wind", Anchor.MIDDLE, Ink.BLACK);
        hung.draw(start - TIE - 20, front.x(width) + TIE + 20);
        for (double end : new double[] {0, width}) {
            double support = front.x(end) + (end == 0 ? -TIE : TIE);
            hung.upright(support, TOP - 12, 2.4);
            front.line(support, front.y(bottom), front.x(end), front.y(bottom), Canvas.THIN, Ink.BLACK, false);
            front.line(support, front.y(bottom + height), front.x(end), front.y(bottom + height), Canvas.THIN, Ink.BLACK, false);
        }
        front.box(0, bottom, width, height, Canvas.THICK, Fill.PAPER);
        zones(front);
        front.help(front.x(0), TOP, front.x(0), 34);
        front.help(front.x(width), TOP, front.x(width), 34);
        front.acrossBeside(0, width, 36, banner.width().typed());
        double beside = start - TIE - 16;
        front.help(front.x(0), TOP, beside - 4, TOP);
        front.help(front.x(0), front.y(bottom), beside - 4, front.y(bottom));
        front.upward(bottom, bottom + height, beside, banner.height().typed());
        hung.dimension(beside, banner.bottom().typed());
        double bar = ItemDrawing.barLength(ROOM / scale, format.units());
        front.scaleBar(start, hung.ground() + 24, bar, ItemDrawing.barText(bar, format));
        return plan(front, start, hung.ground() + 44);
    }

    private void zones(Canvas front) {
        if (loads.isEmpty()) {
            return;
        }
        CaseAction shown = ItemDrawing.shown(loads.get());
        ZoneDrawing zones = ZoneDrawing.of(shown, bottom, height);
        for (PanelZones panel : zones.panels()) {
            zones.draw(front, panel, panel.left() + width / 2, 0, width);
        }
        CaseAction worst = loads.get().governs("base-shear");
        front.target(width / 2 + worst.side(), worst.height(), front.x(width) + TIE + 8, "F,");
        front.boldText(front.x(width) + TIE + 8, front.y(worst.height()) + 7, Format.caseWords(worst.name()), Anchor.START, Ink.ACCENT);
    }

    /** Seen from above: the wind blows upward on the paper, and the banner bows that way. */
    private Drawing plan(Canvas front, double start, double startY) {
        double sag = banner.sag().metres();
        double scale = Math.min(front.scale(), DEEPEST / sag);
        boolean smaller = scale < front.scale() * (1 - 1e-9);
        double left = smaller ? LEFT + (ROOM - width * scale) / 2 : start;
        Canvas plan = front.view(left, startY + 26 + sag * scale, scale);
        double chord = plan.y(0);
        plan.text(plan.x(width / 2), startY + 8, smaller ? "plan, smaller scale" : "plan", Anchor.MIDDLE, Ink.BLACK);
        plan.line(plan.x(0), chord, plan.x(width), chord, Canvas.THIN, Ink.GREY, true);
        bow(plan, sag);
        for (double end : new double[] {0, width}) {
            double support = plan.x(end) + (end == 0 ? -TIE : TIE);
            plan.line(support, chord, plan.x(end), chord, Canvas.THIN, Ink.BLACK, false);
            plan.line(support, chord - 4, support, chord + 4, 6, Ink.BLACK, false);
        }
        double middle = plan.x(width / 2);
        plan.upwardPaper(chord, plan.y(sag), middle);
        String words = "sag " + banner.sag().typed();
        boolean inside = width * scale / 2 > Canvas.width(words) + 12 && sag * scale > 14;
        plan.text(middle + 5, inside ? (chord + plan.y(sag)) / 2 + 3 : sag * scale > 14 ? plan.y(sag) - 4 : chord + 12, words, Anchor.START, Ink.BLACK);
        double below = chord + 44;
        double quarter = plan.x(width / 4);
        plan.arrow(quarter, below, quarter, chord + 6, Canvas.THIN);
        plan.text(quarter - 5, below - 2, "wind", Anchor.END, Ink.ACCENT);
        loads.ifPresent(l -> forces(plan, l));
        if (smaller) {
            double bar = ItemDrawing.barLength(width, format.units());
            plan.scaleBar(LEFT - 60, below + 12, bar, ItemDrawing.barText(bar, format));
        }
        return new Drawing(ItemDrawing.WIDTH, below + (smaller ? 24 : 12), front.shapes());
    }

    private void bow(Canvas plan, double sag) {
        for (int i = 0; i < PIECES; i++) {
            double from = (double) i / PIECES;
            double to = (double) (i + 1) / PIECES;
            plan.line(plan.x(from * width), plan.y(4 * sag * from * (1 - from)), plan.x(to * width), plan.y(4 * sag * to * (1 - to)), Canvas.THICK, Ink.BLACK, false);
        }
    }

    private void forces(Canvas plan, Loads known) {
        CaseAction worst = known.governs("base-shear");
        double chord = plan.y(0);
        double at = plan.x(width / 2 + worst.side());
        plan.arrow(at, chord + 44, at, chord + 4, 2);
        plan.boldText(at + 6, chord + 42, "F " + format.force(worst.force()), Anchor.START, Ink.ACCENT);
        known.reactions().stream().filter(r -> r.step().startsWith("line-pull")).mapToDouble(Reaction::value).max().ifPresent(pull -> {
            double left = plan.x(0) - TIE - 5;
            double right = plan.x(width) + TIE + 5;
            plan.arrow(left, chord, left - 34, chord, 2);
            plan.arrow(right, chord, right + 34, chord, 2);
            plan.boldText(left, chord + 14, "pull " + format.force(pull), Anchor.END, Ink.ACCENT);
            plan.boldText(right, chord + 14, "pull " + format.force(pull), Anchor.START, Ink.ACCENT);
        });
    }
}
