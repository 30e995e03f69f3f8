package broadside.support;

import broadside.panel.Fixings;
import broadside.quantity.Mass;
import broadside.support.EccentricGroup.At;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A grid of fixings of a panel on a wall: pull of the hardest from suction and weight, shear from weight and side wind. */
public final class FixingGroup {

    private static final String STATICS = "statics";

    private final StabilityNumbers assumed;

    /** How suction is shared: each fixing takes the area around it, or all take the same. */
    public enum Sharing { BY_AREA, EQUAL }

    /**
     * What the panel brings, at the level of allowable stress.
     *
     * @param suction   recorded before, Pa, a magnitude
     * @param width     m
     * @param height    m
     * @param standOff  from the wall to the middle of the panel's weight: the gap and half the depth, m
     * @param aside     of the weight from the middle of the grid, sideways, m
     * @param sideWind  on its edge, recorded before, N
     */
    public record PanelLoad(Check.In suction, double width, double height, double standOff, double aside, Optional<Mass> mass, Check.In sideWind) { }

    /** Reads the tables of stability. */
    public FixingGroup(Edition stability) {
        this.assumed = new StabilityNumbers(stability);
    }

    /**
     * Pulls on the hardest fixing, and its check where allowable loads were typed.
     *
     * @throws UnfitAnswer  for a grid that cannot be
     */
    public FixingPulls assess(Fixings fixings, PanelLoad load, Sharing sharing, Trace trace) {
        FixingChecks.sane(fixings);
        List<String> assumptions = new ArrayList<>();
        List<String> remarks = new ArrayList<>();
        double columns = trace.given("n_x", "columns of fixings", fixings.columns(), "1", "");
        double rows = trace.given("n_y", "rows of fixings", fixings.rows(), "1", "");
        double weight = weight(load.mass(), assumed, assumptions, trace);
        double wind = sharing == Sharing.EQUAL ? equalShare(load, columns, rows, trace) : byArea(fixings, load, remarks, trace);
        double hung = hung(fixings, load, weight, assumptions, trace);
        double tension = trace.line("fixing-tension", "T_1", "pull on the hardest fixing").in("T_W", wind, "N").in("T_G", hung, "N")
            .from(STATICS, Status.RECALLED).gives("T_W + T_G", wind + hung, "N");
        double shear = shear(fixings, load, weight, trace);
        List<Check> checks = FixingChecks.of(fixings, tension, shear, "suction", remarks, trace);
        remarks.add("Prying of thin plates and of brackets is not counted.");
        return new FixingPulls(Optional.of(tension), shear, checks, assumptions, remarks);
    }

    /** Weight, N, recorded as G; zero where no mass was given. */
    static double weight(Optional<Mass> mass, StabilityNumbers assumed, List<String> assumptions, Trace trace) {
        if (mass.isEmpty()) {
            assumptions.add("The mass was not given: the fixings are loaded by the wind alone.");
        }
        double value = Fence.notNegative(mass.map(Mass::kilograms).orElse(0.0), "mass");
        double m = trace.given("m_1", "mass on the fixings" + (mass.isEmpty() ? ", not given" : ""), value, "kg", mass.map(Mass::typed).orElse(""));
        double g = assumed.gravity(trace);
        return trace.line("self-weight/fixings", "G", "weight on the fixings").in("m_1", m, "kg").in("g_n", g, "m/s²").from(STATICS, Status.DERIVED)
            .gives("m_1 g_n", m * g, "N");
    }

    private static double equalShare(PanelLoad load, double columns, double rows, Trace trace) {
        String p = load.suction().symbol();
        double b = width(load, trace);
        double h = height(load, trace);
        return trace.line("fixing-tension/wind", "T_W", "suction on the panel, the same on every fixing").in(p, load.suction().value(), "Pa")
            .in("b_1", b, "m").in("h_1", h, "m").in("n_x", columns).in("n_y", rows).from(STATICS, Status.READ).gives(p + " b_1 h_1 / (n_x n_y)",
            load.suction().value() * b * h / (columns * rows), "N");
    }

    private double byArea(Fixings fixings, PanelLoad load, List<String> remarks, Trace trace) {
        double across = reach(fixings.columns(), fixings.horizontal(), width(load, trace), new Names("x", "b_1", "fixings.horizontal-pitch", "width"),
            remarks, trace);
        double along = reach(fixings.rows(), fixings.vertical(), height(load, trace), new Names("y", "h_1", "fixings.vertical-pitch", "height"), remarks,
            trace);
        String p = load.suction().symbol();
        Trace.Line line = trace.line("fixing-tension/wind", "T_W", "suction on the area of the hardest fixing");
        if (Math.max(fixings.columns(), fixings.rows()) < assumed.fixing("continuity-from")) {
            return line.in(p, load.suction().value(), "Pa").in("l_x", across, "m").in("l_y", along, "m").from(STATICS, Status.RECALLED)
                .gives(p + " l_x l_y", load.suction().value() * across * along, "N");
        }
        double factor = assumed.fixing("continuity", "κ", "middle support of a rail that runs over several fixings", trace);
        return line.in("κ", factor).in(p, load.suction().value(), "Pa").in("l_x", across, "m").in("l_y", along, "m").from(STATICS, Status.RECALLED)
            .gives("κ " + p + " l_x l_y", factor * load.suction().value() * across * along, "N");
    }

    private record Names(String axis, String size, String field, String word) { }

    /** How much of the panel hangs on one fixing, m: the most of an inner one and of one at the edge. */
    private static double reach(int lines, double pitch, double size, Names names, List<String> remarks, Trace trace) {
        String n = "n_" + names.axis();
        String s = "s_" + names.axis();
        Trace.Line line = trace.line("fixing-reach/" + names.axis(), "l_" + names.axis(), names.word() + " of the panel that hangs on the hardest fixing");
        if (lines == 1) {
            return line.in(names.size(), size, "m").from(STATICS, Status.DERIVED).gives(names.size(), size, "m");
        }
        if ((lines - 1) * pitch > size * (1 + 1e-9)) {
            throw new UnfitAnswer(names.field(), lines + " lines of fixings at that pitch do not fit on the " + names.word() + " of the panel");
        }
        if (lines == 2) {
            return line.in(names.size(), size, "m").from(STATICS, Status.DERIVED).gives(names.size() + " / 2", size / 2, "m");
        }
        trace.given(s, "pitch of the fixings", pitch, "m", "");
        if (size - (lines - 1) * pitch > 2 * pitch) {
            FixingChecks.remark("The panel stands out beyond its outer fixings by more than their pitch: "
                + "the outer ones may take more than the area around them.", remarks);
        }
        return line.in(names.size(), size, "m").in(n, lines).in(s, pitch, "m").from(STATICS, Status.RECALLED)
            .gives("max(" + s + "; " + names.size() + " / 2 - (" + n + " - 2) " + s + " / 2)", Math.max(pitch, size / 2 - (lines - 2) * pitch / 2), "m");
    }

    /** Pull from the weight that hangs off the wall: linear over the rows about their middle; with one row the panel leans on its lower edge. */
    private static double hung(Fixings fixings, PanelLoad load, double weight, List<String> assumptions, Trace trace) {
        double off = trace.given("e_1", "from the wall to the middle of the weight", load.standOff(), "m", "");
        Trace.Line line = trace.line("fixing-tension/weight", "T_G", "pull from the weight that hangs off the wall").in("G", weight, "N").in("e_1", off, "m")
            .in("n_x", fixings.columns()).from("statics: elastic distribution about the middle of the group", Status.READ);
        if (fixings.rows() == 1) {
            if (weight * off > 0) {
                assumptions.add("One row of fixings at half the height: the weight that hangs off the wall is held by them "
                    + "and by the lower edge, which leans on the wall.");
            }
            double h = height(load, trace);
            return line.in("h_1", h, "m").gives("G e_1 / (n_x h_1 / 2)", weight * off / (fixings.columns() * h / 2), "N");
        }
        double n = fixings.rows();
        double s = trace.given("s_y", "pitch of the fixings", fixings.vertical(), "m", "");
        return line.in("n_y", n).in("s_y", s, "m").gives("6 G e_1 / (n_x n_y (n_y + 1) s_y)", 6 * weight * off / (fixings.columns() * n * (n + 1) * s), "N");
    }

    private static double shear(Fixings fixings, PanelLoad load, double weight, Trace trace) {
        Check.In down = new Check.In("G", weight);
        if (load.aside() == 0 || weight == 0) {
            return EccentricGroup.of(grid(fixings), new EccentricGroup.Load(load.sideWind(), down, new Check.In("M_1", 0)), trace).most();
        }
        double aside = trace.given("x_G", "of the weight from the middle of the fixings, sideways", load.aside(), "m", "");
        double moment = trace.line("fixing-moment", "M_1", "moment of the weight in the plane of the fixings").in("G", weight, "N").in("x_G", aside, "m")
            .from(STATICS, Status.DERIVED).gives("G x_G", weight * aside, "N m");
        return EccentricGroup.of(grid(fixings), new EccentricGroup.Load(load.sideWind(), down, new Check.In("M_1", moment)), trace).most();
    }

    private static List<At> grid(Fixings fixings) {
        List<At> grid = new ArrayList<>();
        for (int i = 0; i < fixings.columns(); i++) {
            for (int j = 0; j < fixings.rows(); j++) {
                grid.add(new At(i * fixings.horizontal(), j * fixings.vertical()));
            }
        }
        return grid;
    }

    private static double width(PanelLoad load, Trace trace) {
        return trace.given("b_1", "width of the panel on the fixings", load.width(), "m", "");
    }

    private static double height(PanelLoad load, Trace trace) {
        return trace.given("h_1", "height of the panel on the fixings", load.height(), "m", "");
    }
}
