package broadside.support;

import broadside.panel.Fixings;
import broadside.panel.ProjectingSign.Brackets;
import broadside.quantity.Mass;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Fixings of the brackets of a blade sign, the same grid under each bracket. Wind square on turns the blade about an upright
 * axis: a couple between the columns; the weight tips it away from the wall: a couple between top and bottom. Statics.
 */
public final class BracketFixings {

    private static final String STATICS = "statics of a projecting sign";

    private final StabilityNumbers assumed;

    /**
     * What the blade brings, at the level of allowable stress.
     *
     * @param normal  wind square on the blade, from either side, recorded before, N
     * @param along   wind along the blade, recorded before, N
     * @param turning moment of that wind about the upright axis at the wall, recorded before, N m; empty where the wind acts in the middle of the blade
     * @param arm     from the wall to the middle of the blade, m
     */
    public record BladeLoad(Check.In normal, Check.In along, Optional<Check.In> turning, double arm, Optional<Mass> mass) {

        /** Wind in the middle of the blade. */
        public BladeLoad(Check.In normal, Check.In along, double arm, Optional<Mass> mass) {
            this(normal, along, Optional.empty(), arm, mass);
        }
    }

    /** Reads the tables of stability. */
    public BracketFixings(Edition stability) {
        this.assumed = new StabilityNumbers(stability);
    }

    /**
     * Pulls on the hardest fixing, and its checks where allowable loads were typed. Where one bracket or one column gives no
     * couple, the moment is recorded and no pull is reported.
     *
     * @throws UnfitAnswer  for fixings that cannot be
     */
    public FixingPulls assess(Fixings fixings, Brackets brackets, BladeLoad load, Trace trace) {
        FixingChecks.sane(fixings);
        if (brackets.count() < 1) {
            throw new UnfitAnswer("brackets.count", "a blade sign has at least one bracket");
        }
        if (brackets.count() > 1 && !(brackets.spread() > 0)) {
            throw new UnfitAnswer("brackets.spacing", brackets.count() + " brackets have a distance above zero between them");
        }
        List<String> assumptions = new ArrayList<>();
        List<String> remarks = new ArrayList<>(List.of("Wind from either side: every fixing must take the pull of the hardest, and push as well.",
            "Prying of thin plates is not counted."));
        assumptions.add("The brackets lie evenly above and below the middle of the blade, and each carries the same grid of fixings.");
        double weight = FixingGroup.weight(load.mass(), assumed, assumptions, trace);
        double arm = trace.given("a_1", "from the wall to the middle of the blade", load.arm(), "m", "");
        double all = trace.given("n_1", "fixings of all brackets", (double) brackets.count() * fixings.count(), "1", "");
        Optional<Double> turned = turned(fixings, load, arm, all, remarks, trace);
        Optional<Double> hung = hung(fixings, brackets, weight, arm, remarks, trace);
        String w = load.normal().symbol();
        String e = load.along().symbol();
        Trace square = trace.part("square-on");
        Trace beside = trace.part("along");
        double shear = square.line("fixing-shear", "V_1", "shear of each fixing, wind square on").in(w, load.normal().value(), "N").in("G", weight, "N")
            .in("n_1", all)
            .from(STATICS, Status.RECALLED).gives("(" + w + "² + G²)^0.5 / n_1", Math.pow(load.normal().value() * load.normal().value() + weight * weight,
            0.5) / all, "N");
        List<Check> checks = new ArrayList<>();
        Optional<Double> first = turned.flatMap(t -> hung.map(g -> square.line("fixing-tension", "T_1", "pull on the hardest fixing, wind square on")
            .in("T_W", t, "N").in("T_G", g, "N").from(STATICS, Status.RECALLED).gives("T_W + T_G", t + g, "N")));
        first.ifPresent(t -> checks.addAll(FixingChecks.of(fixings, t, shear, "wind square on", remarks, square)));
        Optional<Double> second = hung.map(g -> beside.line("fixing-tension", "T_1", "pull on the hardest fixing, wind along the blade")
            .in(e, load.along().value(), "N")
            .in("n_1", all).in("T_G", g, "N").from(STATICS, Status.RECALLED).gives(e + " / n_1 + T_G", load.along().value() / all + g, "N"));
        double down = beside.line("fixing-shear", "V_1", "shear of each fixing, wind along the blade").in("G", weight, "N").in("n_1", all)
            .from(STATICS, Status.RECALLED).gives("G / n_1", weight / all, "N");
        second.ifPresent(t -> checks.addAll(FixingChecks.of(fixings, t, down, "wind along the blade", remarks, beside)));
        return new FixingPulls(first.flatMap(t -> second.map(u -> Math.max(t, u))), Math.max(shear, down), checks, assumptions, remarks);
    }

    private static Optional<Double> turned(Fixings fixings, BladeLoad load, double arm, double all, List<String> remarks, Trace trace) {
        String w = load.normal().symbol();
        Trace.Line about = trace.line("bracket-moment/wind", "M_W", "moment of the wind square on, about an upright axis at the wall");
        double moment = load.turning().map(m -> about.in(m.symbol(), m.value(), "N m").from(STATICS, Status.RECALLED).gives(m.symbol(), m.value(), "N m"))
            .orElseGet(() -> about.in(w, load.normal().value(), "N").in("a_1", arm, "m").from(STATICS, Status.RECALLED).gives(w + " a_1", load.normal().value() * arm, "N m"));
        if (fixings.columns() == 1) {
            remarks.add("One column of fixings gives no couple against wind square on: a moment of " + shown(moment)
                + " must be taken by the bracket plate leaning on the wall, which is not checked here. Two columns of fixings would take it.");
            return Optional.empty();
        }
        double columns = trace.given("n_x", "columns of fixings under one bracket", fixings.columns(), "1", "");
        double pitch = trace.given("s_x", "distance of the columns", fixings.horizontal(), "m", "");
        return Optional.of(trace.line("fixing-tension/wind", "T_W", "pull from the wind on the outer columns, linear about the middle of the group")
            .in("M_W", moment, "N m").in("n_1", all).in("n_x", columns).in("s_x", pitch, "m").from(STATICS, Status.RECALLED)
            .gives("6 M_W / (n_1 (n_x + 1) s_x)", 6 * moment / (all * (columns + 1) * pitch), "N"));
    }

    private static Optional<Double> hung(Fixings fixings, Brackets brackets, double weight, double arm, List<String> remarks, Trace trace) {
        double moment = trace.line("bracket-moment/weight", "M_G", "moment of the weight about the wall").in("G", weight, "N").in("a_1", arm, "m")
            .from(STATICS, Status.RECALLED).gives("G a_1", weight * arm, "N m");
        Trace.Line line = trace.line("fixing-tension/weight", "T_G", "pull from the weight on the top fixings").in("M_G", moment, "N m")
            .from(STATICS, Status.RECALLED);
        if (brackets.count() > 1) {
            double spread = trace.given("h_B", "from the lowest bracket to the highest", brackets.spread(), "m", "");
            double top = trace.given("n_t", "fixings of the top bracket", fixings.count(), "1", "");
            return Optional.of(line.in("h_B", spread, "m").in("n_t", top).gives("M_G / (h_B n_t)", moment / (spread * top), "N"));
        }
        if (fixings.rows() == 1) {
            if (moment == 0) {
                return Optional.of(line.reads("no weight was given", 0, "N"));
            }
            remarks.add("One bracket with one row of fixings gives no couple against the weight: a moment of " + shown(moment)
                + " must be taken by the bracket leaning on the wall, which is not checked here. A second bracket would take it.");
            return Optional.empty();
        }
        double columns = trace.given("n_x", "columns of fixings under one bracket", fixings.columns(), "1", "");
        double rows = trace.given("n_y", "rows of fixings under the bracket", fixings.rows(), "1", "");
        double pitch = trace.given("s_y", "distance of the rows", fixings.vertical(), "m", "");
        return Optional.of(line.in("n_x", columns).in("n_y", rows).in("s_y", pitch, "m")
            .gives("6 M_G / (n_x n_y (n_y + 1) s_y)", 6 * moment / (columns * rows * (rows + 1) * pitch), "N"));
    }

    private static String shown(double moment) {
        return Show.number(moment, 3, Rounding.UP) + " N m";
    }
}
