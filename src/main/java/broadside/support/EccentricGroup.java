package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/**
 * A group of fixings loaded in its plane: elastic (vector) method, as in Quimby's slides on eccentric bolt groups. Equal
 * share of the force, and of the moment by the distance from the centroid. Safe against the method of the instantaneous centre.
 */
public final class EccentricGroup {

    private static final String PLACE = "elastic (vector) method of bolt groups, Quimby, lecture slides";

    /** Place of a fixing, m, to the right and upward. */
    public record At(double x, double y) { }

    /**
     * A load through the centroid and a moment about it; N, upward and to the right, and N m, anticlockwise. Each under
     * the symbol with which it was recorded.
     */
    public record Load(Check.In right, Check.In up, Check.In moment) { }

    /**
     * What each fixing takes.
     *
     * @param forces   on each fixing, N, to the right and upward, in the order of the fixings
     * @param most     resultant on the hardest, N, recorded as V_1
     */
    public record Result(List<At> forces, double most) {

        public Result {
            forces = List.copyOf(forces);
        }
    }

    /** Shares the load out and records the hardest fixing as "fixing-shear". */
    public static Result of(List<At> fixings, Load load, Trace trace) {
        int count = fixings.size();
        double cx = fixings.stream().mapToDouble(At::x).sum() / count;
        double cy = fixings.stream().mapToDouble(At::y).sum() / count;
        List<At> from = fixings.stream().map(f -> new At(f.x() - cx, f.y() - cy)).toList();
        double n = trace.given("n", "fixings of the group", count, "1", "");
        double squares = from.stream().mapToDouble(f -> f.x() * f.x() + f.y() * f.y()).sum();
        double polar = load.moment().value() == 0 ? squares : trace.line("group-inertia", "I_p", "sum of the squares of the distances from the centroid")
            .from(PLACE, Status.READ).reads("sum of x² + y² over " + count + " fixings", squares, "m²");
        double turn = polar > TINY ? load.moment().value() / polar : 0;
        if (polar <= TINY && load.moment().value() != 0) {
            throw new UnfitAnswer("fixings", "fixings in one place take no moment in their plane");
        }
        List<At> forces = new ArrayList<>();
        int hardest = 0;
        for (int i = 0; i < count; i++) {
            forces.add(new At(load.right().value() / count - turn * from.get(i).y(), load.up().value() / count + turn * from.get(i).x()));
            hardest = size(forces.get(i)) > size(forces.get(hardest)) * (1 + 1e-9) ? i : hardest;
        }
        return new Result(forces, load.moment().value() == 0 ? direct(load, n, trace) : record(from.get(hardest), load, n, polar, trace));
    }

    private static final double TINY = 1e-12;

    private static double size(At force) {
        return Math.hypot(force.x(), force.y());
    }

    private static double record(At hardest, Load load, double n, double polar, Trace trace) {
        double x = trace.line("fixing-place/x", "x_1", "place of the hardest fixing, to the right of the centroid").from(PLACE, Status.READ)
            .reads("found by trying all", hardest.x(), "m");
        double y = trace.line("fixing-place/y", "y_1", "place of the hardest fixing, above the centroid").from(PLACE, Status.READ)
            .reads("found by trying all", hardest.y(), "m");
        String m = load.moment().symbol();
        double right = trace.line("fixing-shear/x", "V_x", "its force to the right").in(load.right().symbol(), load.right().value(), "N").in("n", n)
            .in(m, load.moment().value(), "N m").in("I_p", polar, "m²").in("y_1", y, "m").from(PLACE, Status.READ)
            .gives(load.right().symbol() + " / n - " + m + " / I_p y_1", load.right().value() / n - load.moment().value() / polar * y, "N");
        double up = trace.line("fixing-shear/y", "V_y", "its force upward").in(load.up().symbol(), load.up().value(), "N").in("n", n)
            .in(m, load.moment().value(), "N m").in("I_p", polar, "m²").in("x_1", x, "m").from(PLACE, Status.READ)
            .gives(load.up().symbol() + " / n + " + m + " / I_p x_1", load.up().value() / n + load.moment().value() / polar * x, "N");
        return resultant(trace.line("fixing-shear", "V_1", "shear of the hardest fixing").in("V_x", right, "N")
            .in("V_y", up, "N"), "(V_x² + V_y²)^0.5", right, up);
    }

    private static double direct(Load load, double n, Trace trace) {
        String x = load.right().symbol();
        String y = load.up().symbol();
        return trace.line("fixing-shear", "V_1", "shear of each fixing, an equal share").in(x, load.right().value(), "N").in(y, load.up().value(), "N")
            .in("n", n).from(PLACE, Status.READ).gives("(" + x + "² + " + y + "²)^0.5 / n", Math.pow(load.right().value() * load.right().value()
            + load.up().value() * load.up().value(), 0.5) / n, "N");
    }

    private static double resultant(Trace.Line line, String formula, double x, double y) {
        return line.from(PLACE, Status.READ).gives(formula, Math.pow(x * x + y * y, 0.5), "N");
    }

    private EccentricGroup() { }
}
