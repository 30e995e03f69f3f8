package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.assess.Loads;
import broadside.panel.ProjectingSign;
import broadside.quantity.Length;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A blade sign seen along the wall, and its plan beside it. */
final class BladeDrawing {

    private static final double WALL = 104;
    private static final double PLAN_WALL = 318;
    private static final double TALLEST = 104;
    private static final double ROOM = 100;
    private static final double TOP = 60;
    private static final double PLAN_ROOM = 66;

    private final ProjectingSign sign;
    private final Optional<Loads> loads;
    private final Format format;
    private final double gap;
    private final double out;
    private final double bottom;
    private final double height;

    BladeDrawing(ProjectingSign sign, Optional<Loads> loads, Format format) {
        this.sign = sign;
        this.loads = loads;
        this.format = format;
        this.gap = sign.gap().metres();
        this.out = gap + sign.projection().metres();
        this.bottom = sign.bottom().metres();
        this.height = sign.height().metres();
    }

    Drawing make() {
        List<Double> brackets = brackets();
        double low = Math.min(bottom, brackets.get(0));
        double high = Math.max(bottom + height, brackets.get(brackets.size() - 1));
        double scale = Math.min(TALLEST / (high - low), ROOM / out);
        GroundDrawing hung = GroundDrawing.below(WALL, TOP + (high - low) * scale, scale, low);
        Canvas front = hung.at();
        front.text(WALL + 40, 12, "elevation, seen along the wall", Anchor.MIDDLE, Ink.BLACK);
        hung.draw(WALL - 36, WALL + ROOM + 24);
        front.wall(WALL, hung.ground(), TOP - 14);
        hung.mark(WALL);
        brackets.forEach(y -> bracket(front, y));
        front.box(gap, bottom, sign.projection().metres(), height, Canvas.THICK, Fill.PAPER);
        zones(front);
        dimensions(hung, brackets);
        double end = hung.ground() + 26;
        double bar = ItemDrawing.barLength(200 / scale, format.units());
        front.scaleBar(WALL, end, bar, ItemDrawing.barText(bar, format));
        return new Drawing(ItemDrawing.WIDTH, Math.max(end, plan(front.view(PLAN_WALL, 116, Math.min(scale, PLAN_ROOM / out)), scale)) + 10, front.shapes());
    }

    /** Heights of the brackets above the ground, set about the middle of the sign. */
    private List<Double> brackets() {
        int count = sign.brackets().count();
        double step = sign.brackets().spacing().map(Length::metres).orElse(0.0);
        List<Double> heights = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            heights.add(bottom + height / 2 + (i - (count - 1) / 2.0) * step);
        }
        return heights;
    }

    private void bracket(Canvas front, double y) {
        double end = front.x(gap + sign.projection().metres() / 3);
        front.line(front.x(0), front.y(y) - 1.2, end, front.y(y) - 1.2, Canvas.THIN, Ink.BLACK, false);
        front.line(front.x(0), front.y(y) + 1.2, end, front.y(y) + 1.2, Canvas.THIN, Ink.BLACK, false);
        front.line(front.x(0), front.y(y) - 4, front.x(0), front.y(y) + 4, 3, Ink.BLACK, false);
    }

    private void zones(Canvas front) {
        if (loads.isEmpty()) {
            return;
        }
        ZoneDrawing zones = ZoneDrawing.of(ItemDrawing.shown(loads.get()), bottom, height);
        for (PanelZones panel : zones.panels()) {
            zones.draw(front, panel, panel.left(), gap, out);
        }
        CaseAction turning = loads.get().governs("base-moment");
        front.target(turning.side(), turning.height(), front.x(out) + 18, "F, " + Format.caseWords(turning.name()));
    }

    private void dimensions(GroundDrawing hung, List<Double> brackets) {
        Canvas front = hung.at();
        double top = front.y(bottom + height);
        front.help(front.x(gap), top, front.x(gap), 28);
        front.help(front.x(out), top, front.x(out), 36);
        front.acrossBeside(gap, out, 38, sign.projection().typed());
        if (gap > 0) {
            front.acrossPaper(front.x(0), front.x(gap), 27);
            front.text(front.x(0) - 6, 30, "gap " + sign.gap().typed(), Anchor.END, Ink.BLACK);
        }
        double right = front.x(out) + 12;
        double clear = loads.isPresent() && Math.abs(front.y(bottom + height / 2) - front.y(loads.get().governs("base-moment").height())) < 16 ? 13 : 0;
        front.help(front.x(out), top, right + 4, top);
        front.help(front.x(out), front.y(bottom), right + 4, front.y(bottom));
        front.upwardPaper(front.y(bottom), top, right);
        front.text(right + 4, front.y(bottom + height / 2) + 3 + clear, sign.height().typed(), Anchor.START, Ink.BLACK);
        new GroundDrawing(front, bottom, hung.ground()).dimensionRight(right, sign.bottom().typed());
        int count = brackets.size();
        double beside = WALL - 18;
        if (count > 1 && sign.brackets().spread() * front.scale() >= 8) {
            front.upwardPaper(front.y(brackets.get(0)), front.y(brackets.get(1)), beside);
            front.text(beside - 4, (front.y(brackets.get(0)) + front.y(brackets.get(1))) / 2 + 3, sign.brackets().spacing().orElseThrow().typed(), Anchor.END, Ink.BLACK);
        }
        front.text(WALL - 14, TOP - 14, count == 1 ? "one bracket" : count + " brackets", Anchor.END, Ink.BLACK);
    }

    /** Seen from above: the wall on the left, wind across the sign from below and on its edge from the right. */
    private double plan(Canvas plan, double elevation) {
        double middle = plan.y(0);
        plan.text(PLAN_WALL + 60, 12, plan.scale() < elevation ? "plan, smaller scale" : "plan", Anchor.MIDDLE, Ink.BLACK);
        plan.wall(PLAN_WALL, middle + 66, middle - 60);
        double deep = Math.max(sign.depth().metres(), 2.5 / plan.scale());
        plan.box(gap, -deep / 2, sign.projection().metres(), deep, Canvas.THICK, Fill.PAPER);
        double end = plan.x(gap + sign.projection().metres() / 3);
        plan.line(plan.x(0), middle, end, middle, Canvas.THIN, Ink.BLACK, false);
        double face = middle + deep / 2 * plan.scale() + 2;
        double edge = plan.x(out) + 4;
        plan.arrow(edge + 36, middle, edge, middle, Canvas.THIN);
        plan.text(edge + 4, middle - 6, "wind on edge", Anchor.START, Ink.ACCENT);
        if (loads.isEmpty()) {
            plan.arrow(plan.x((gap + out) / 2), face + 40, plan.x((gap + out) / 2), face, Canvas.THIN);
            plan.text(plan.x((gap + out) / 2) + 6, face + 38, "wind", Anchor.START, Ink.ACCENT);
            return middle + 70;
        }
        CaseAction turning = loads.get().governs("base-moment");
        double at = plan.x(turning.side());
        plan.arrow(at, face + 40, at, face, 2);
        plan.boldText(at + 6, face + 30, "F " + format.force(turning.force()), Anchor.START, Ink.ACCENT);
        loads.get().edgeOn().ifPresent(e -> plan.boldText(edge + 4, middle + 13, format.force(e.force()), Anchor.START, Ink.ACCENT));
        plan.help(at, face + 40, at, face + 58);
        plan.acrossPaper(plan.x(0), at, face + 54);
        plan.text(PLAN_WALL + 2, face + 67, format.length(turning.side()) + " from the wall", Anchor.START, Ink.BLACK);
        return face + 70;
    }
}
