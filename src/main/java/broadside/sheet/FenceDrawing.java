package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.assess.Loads;
import broadside.panel.BannerFence;
import broadside.panel.Item;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Elevation of a line of fence panels, its middle left out where the line is long, and a side view at a larger scale below it. */
final class FenceDrawing {

    private static final double MARGIN = 74;
    private static final double ROOM = ItemDrawing.WIDTH - MARGIN - 30;
    private static final double TALLEST = 84;
    /** A line lower than this, or with joints closer than that, is drawn without its middle; points. */
    private static final double LOWEST = 14;
    private static final double CLOSEST = 5;
    private static final double LEFT_OUT = 30;
    private static final double SIDE = 84;
    private static final double REACH = 96;
    private static final double MIDDLE = 290;

    private final BannerFence fence;
    private final Optional<Loads> loads;
    private final Format format;
    private final double height;
    private final double each;

    /** A stretch of the line with its own place on paper; between the whole of it and two ends. */
    private record Stretch(int first, int last, Canvas at) { }

    FenceDrawing(BannerFence fence, Optional<Loads> loads, Format format) {
        this.fence = fence;
        this.loads = loads;
        this.format = format;
        this.height = fence.panelHeight().metres();
        this.each = fence.panelLength().metres();
    }

    Drawing make() {
        List<Stretch> stretches = stretches();
        Canvas front = stretches.get(0).at();
        Canvas last = stretches.get(stretches.size() - 1).at();
        double ground = front.y(0);
        double from = front.x(0);
        double to = last.x(fence.length());
        front.text((from + to) / 2, 12, ItemDrawing.elevation(loads), Anchor.MIDDLE, Ink.BLACK);
        stretches.forEach(this::draw);
        for (double end : new double[] {from, to}) {
            front.help(end, front.y(height), end, 34);
        }
        front.acrossPaper(from, to, 36);
        front.text((from + to) / 2, 33, fence.count() + (fence.count() == 1 ? " panel of " + fence.panelLength().typed()
            : " panels of " + fence.panelLength().typed() + ", " + format.length(fence.length()) + " in all"), Anchor.MIDDLE, Ink.BLACK);
        front.upward(0, height, from - 26, fence.panelHeight().typed());
        if (stretches.size() > 1) {
            front.text((front.x(stretches.get(0).last() * each) + last.x(stretches.get(1).first() * each)) / 2, ground + 20,
                stretches.get(1).first() - stretches.get(0).last() + " panels left out", Anchor.MIDDLE, Ink.BLACK);
        }
        double bar = ItemDrawing.barLength((to - from) / front.scale(), format.units());
        front.scaleBar(from, ground + 34, bar, ItemDrawing.barText(bar, format));
        return side(front, ground + 50);
    }

    private List<Stretch> stretches() {
        double whole = Math.min(ROOM / fence.length(), TALLEST / height);
        int atEachEnd = Math.max(3, (int) Math.ceil(6 * height / each));
        boolean small = height * whole < LOWEST || each * whole < CLOSEST;
        if (!small || 2 * atEachEnd >= fence.count()) {
            double start = MARGIN + (ROOM - fence.length() * whole) / 2;
            return List.of(new Stretch(0, fence.count(), new Canvas(start, 58 + height * whole, whole)));
        }
        double scale = Math.min((ROOM - LEFT_OUT) / (2 * atEachEnd * each), TALLEST / height);
        Canvas left = new Canvas(MARGIN, 58 + height * scale, scale);
        Canvas right = left.view(MARGIN + ROOM - fence.length() * scale, left.y(0), scale);
        return List.of(new Stretch(0, atEachEnd, left), new Stretch(fence.count() - atEachEnd, fence.count(), right));
    }

    private void draw(Stretch stretch) {
        Canvas at = stretch.at();
        double from = stretch.first() * each;
        double to = stretch.last() * each;
        boolean left = stretch.first() > 0;
        boolean right = stretch.last() < fence.count();
        at.ground(at.x(from) - (left ? 8 : 18), at.x(to) + (right ? 8 : 18));
        at.box(from, 0, to - from, height, Canvas.THICK, Fill.PAPER);
        loads.ifPresent(l -> zones(at, l, from, to));
        for (int i = stretch.first(); i <= stretch.last(); i++) {
            at.help(at.x(i * each), at.y(0), at.x(i * each), at.y(height));
            if (foot().isPresent() || brace().isPresent()) {
                at.line(at.x(i * each), at.y(0) + 4, at.x(i * each), at.y(0), 3, Ink.BLACK, false);
            }
        }
        if (left) {
            edge(at, from);
        }
        if (right) {
            edge(at, to);
        }
    }

    /** The edge at which the line goes on and is not drawn. */
    private void edge(Canvas at, double where) {
        double x = at.x(where);
        at.line(x, at.y(0), x, at.y(height), 3, Ink.BLACK, false);
        at.cut(x, at.y(height / 2));
    }

    private void zones(Canvas at, Loads known, double from, double to) {
        ZoneDrawing zones = ZoneDrawing.of(ItemDrawing.shown(known), 0, height);
        for (PanelZones panel : zones.panels()) {
            zones.draw(at, panel, panel.left() + fence.length() / 2, from, to);
        }
    }

    private Drawing side(Canvas front, double startY) {
        List<Double> blocks = blocks();
        Optional<Double> brace = brace();
        double reach = Math.max(brace.orElse(0.0), blocks.stream().mapToDouble(b -> b).max().orElse(0));
        double foot = foot().orElse(0.0);
        double widest = Math.max(reach, foot / 2);
        double scale = Math.min(SIDE / height, widest > 0 ? REACH / widest : SIDE / height);
        double ground = startY + 30 + height * scale;
        Canvas side = front.view(MIDDLE, ground, scale);
        side.text(MIDDLE, startY + 6, "side view, " + (scale < front.scale() ? "smaller" : "larger") + " scale", Anchor.MIDDLE, Ink.BLACK);
        SideView view = new SideView(side, MIDDLE - 106, MIDDLE + 112, height, widest);
        brace.ifPresent(lever -> side.line(side.x(0), side.y(height * 0.9), side.x(lever), side.y(0), Canvas.THICK, Ink.BLACK, false));
        view.draw(new double[][] {{0, height, 0}});
        if (foot > 0) {
            side.line(side.x(-foot / 2), ground - 1.5, side.x(foot / 2), ground - 1.5, 3, Ink.BLACK, false);
            side.tippingEdge(-foot / 2);
            side.tippingEdge(foot / 2);
        }
        brace.ifPresent(lever -> block(side, lever));
        brace.ifPresent(side::tippingEdge);
        blocks.forEach(b -> block(side, b));
        loads.map(l -> l.governs("base-moment")).ifPresent(c -> view.force(0, c.height(), "F " + format.force(c.force()) + " in all", ItemDrawing.otherCase(loads.get()), format.length(c.height())));
        double below = levers(side, blocks, ground);
        double list = carries(front, startY + 24);
        double bar = ItemDrawing.barLength(SIDE * 2 / scale, format.units());
        double barY = Math.max(ground + 4, list + 8);
        side.scaleBar(MARGIN - 34, barY, bar, ItemDrawing.barText(bar, format));
        return new Drawing(ItemDrawing.WIDTH, Math.max(below, barY) + 14, front.shapes());
    }

    private static void block(Canvas side, double lever) {
        double half = 5 / side.scale();
        side.box(lever - half, 0, 2 * half, 8 / side.scale(), Canvas.THICK, Fill.PAPER);
    }

    /** Dimensions of levers below the ground, one line for each different length. */
    private double levers(Canvas side, List<Double> blocks, double ground) {
        List<Double> levers = new ArrayList<>();
        brace().ifPresent(levers::add);
        levers.addAll(blocks);
        double y = ground;
        for (double lever : levers.stream().distinct().sorted().limit(3).toList()) {
            y += 18;
            side.acrossBeside(0, lever, y, format.length(lever));
        }
        return y;
    }

    /** What carries it as typed, beside the side view. */
    private double carries(Canvas front, double startY) {
        List<Item.Carrying> lines = fence.carrying();
        double y = startY;
        for (Item.Carrying line : lines.stream().limit(8).toList()) {
            String text = line.name() + " " + line.typed();
            front.text(MARGIN - 34, y, text.length() > 30 ? text.substring(0, 29) + "..." : text, Anchor.START, Ink.BLACK);
            y += 12;
        }
        if (lines.size() > 8) {
            front.text(MARGIN - 34, y, "and " + (lines.size() - 8) + " more", Anchor.START, Ink.BLACK);
            y += 12;
        }
        return y;
    }

    /** Levers of the blocks behind the fence, m. */
    private List<Double> blocks() {
        return fence.feet().blocks().stream().map(b -> b.lever().metres()).filter(l -> l > 0).toList();
    }

    private Optional<Double> brace() {
        return fence.feet().brace().map(b -> b.lever().metres());
    }

    private Optional<Double> foot() {
        return fence.feet().footLength().map(l -> l.metres());
    }
}
