package broadside.action;

import broadside.codes.LoadCase;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Shares of a sign's posts: the board is stiff, so that force is shared alike and torsion goes into the posts as a
 * couple in proportion to their distance from the middle. One post takes the torsion itself.
 */
public final class SignPosts {

    private static final String STATICS = "statics: stiff board, equal posts";

    /** Works out and records each post: its greatest shear and its greatest moment, each in the case that gives it. */
    public static List<PostAction> of(List<Double> positions, List<FootActions.Combined> combinations, List<PostDrag> drag, Trace trace) {
        double spread = positions.stream().mapToDouble(x -> x * x).sum();
        List<PostAction> posts = new ArrayList<>();
        if (positions.size() > 1) {
            trace.given("n", "number of posts", positions.size(), "1", "");
            trace.line("post-spread", "S", "sum of the squares of the posts' distances from their middle").from(STATICS, Status.DERIVED)
                .reads("from the positions of the posts", spread, "m²");
        }
        for (int i = 0; i < positions.size(); i++) {
            posts.add(post(i + 1, new Row(positions.get(i), positions.size(), spread, drag.isEmpty() ? PostDrag.NONE : drag.get(i)), combinations, trace));
        }
        PostAction hardest = posts.stream().max(Comparator.comparingDouble(PostAction::shear)).orElseThrow();
        PostAction most = posts.stream().max(Comparator.comparingDouble(PostAction::moment)).orElseThrow();
        greatest("post-shear", "F_p", "greatest shear at the foot of a post: post " + hardest.post(), "F_{p" + hardest.post() + "}", hardest.shear(), "N", trace);
        greatest("post-moment", "M_p", "greatest moment at the foot of a post: post " + most.post(), "M_{p" + most.post() + "}", most.moment(), "N m", trace);
        return posts;
    }

    private static void greatest(String step, String symbol, String meaning, String of, double value, String unit, Trace trace) {
        trace.line(step, symbol, meaning).in(of, value, unit).from(STATICS, Status.DERIVED).gives(of, value, unit);
    }

    /** One post in its row: its distance from the middle, how many there are, and the sum of the squares of their distances. */
    private record Row(double x, int count, double spread, PostDrag drag) {

        double shear(FootActions.Combined c) {
            return Math.abs(c.force() / count + (spread == 0 ? 0 : c.combination().torsion() * x / spread)) + drag.force();
        }

        double moment(FootActions.Combined c) {
            return Math.abs(signedMoment(c)) + drag.moment();
        }

        double signedMoment(FootActions.Combined c) {
            return c.moment() / count + (spread == 0 ? 0 : c.combination().couple() * x / spread);
        }
    }

    private static PostAction post(int number, Row row, List<FootActions.Combined> combinations, Trace trace) {
        FootActions.Combined forShear = combinations.stream().max(Comparator.comparingDouble(row::shear)).orElseThrow();
        FootActions.Combined forMoment = combinations.stream().max(Comparator.comparingDouble(row::moment)).orElseThrow();
        String part = Integer.toString(number);
        if (row.count() == 1) {
            double v = ends(trace.line("post-shear/1", "F_{p1}", "shear at the foot of the post").in("F", forShear.force(), "N"), "F", forShear.force(),
                "F_{d1}", row.drag().force(), "N");
            String panel = row.drag().moment() == 0 ? "M" : "M_{panel}";
            double m = ends(trace.line("post-moment/1", "M_{p1}", "moment at the foot of the post").in(panel, forMoment.moment(), "N m"), panel,
                forMoment.moment(), "M_{d1}", row.drag().moment(), "N m");
            return new PostAction(1, row.x(), "", 0, Optional.empty(), forMoment.state(), forMoment.name(), v, forShear.name(), m);
        }
        String x = "x_{" + part + "}";
        trace.given(x, "post " + part + " from the middle of the posts, to the right", row.x(), "m", "");
        double t = couple("M_T", "torsion of case " + LoadCase.shortName(forShear.name()) + ", wind meeting the " + end(forShear), forShear.combination().torsion(),
            "post-couple/torsion/" + part, trace);
        double v = ends(trace.line("post-shear/" + part, "F_{p" + part + "}", "shear at the foot of post " + part + ", case " + LoadCase.shortName(forShear.name()))
            .in("F", forShear.force(), "N").in("n", row.count()).in("M_T", t, "N m").in(x, row.x(), "m").in("S", row.spread(), "m²"),
            "abs(F / n + M_T " + x + " / S)", Math.abs(forShear.force() / row.count() + t * row.x() / row.spread()), "F_{d" + part + "}", row.drag().force(), "N");
        double j = couple("J", "sum of force, height and side distance, case " + LoadCase.shortName(forMoment.name()) + ", wind meeting the " + end(forMoment),
            forMoment.combination().couple(), "post-couple/moment/" + part, trace);
        String panel = row.drag().moment() == 0 ? "M" : "M_{panel}";
        double m = ends(trace.line("post-moment/" + part, "M_{p" + part + "}", "moment at the foot of post " + part + ", case " + LoadCase.shortName(forMoment.name()))
            .in(panel, forMoment.moment(), "N m").in("n", row.count()).in("J", j, "N m²").in(x, row.x(), "m").in("S", row.spread(), "m²"),
            "abs(" + panel + " / n + J " + x + " / S)", Math.abs(forMoment.moment() / row.count() + j * row.x() / row.spread()),
            "M_{d" + part + "}", row.drag().moment(), "N m");
        return new PostAction(number, row.x(), "", 0, Optional.empty(), forMoment.state(), forMoment.name(), v, forShear.name(), m);
    }

    /** Ends a step with what the panels give, and with the wind on the post itself where it is known. */
    private static double ends(Trace.Line line, String formula, double value, String symbol, double own, String unit) {
        line.from(STATICS, Status.DERIVED);
        return own == 0 ? line.gives(formula, value, unit) : line.in(symbol, own, unit).gives(formula + " + " + symbol, value + own, unit);
    }

    private static String end(FootActions.Combined worst) {
        return switch (worst.combination().windward()) {
            case LEFT -> "left end";
            case RIGHT -> "right end";
            case NONE -> "face square on";
        };
    }

    private static double couple(String symbol, String meaning, double value, String step, Trace trace) {
        return trace.line(step, symbol, meaning).from(STATICS, Status.DERIVED)
            .reads("sum over the boards of force" + (symbol.equals("J") ? ", height" : "") + " and distance from the middle of the posts", value,
                symbol.equals("J") ? "N m²" : "N m");
    }

    /** What each post takes from the wind on the boards, in every combination. */
    public static List<PostCase> cases(List<Double> positions, List<FootActions.Combined> combinations) {
        double spread = positions.stream().mapToDouble(x -> x * x).sum();
        List<PostCase> cases = new ArrayList<>();
        for (FootActions.Combined combined : combinations) {
            for (int i = 0; i < positions.size(); i++) {
                cases.add(PostCase.of(i + 1, positions.get(i), positions.size(), spread, combined));
            }
        }
        return cases;
    }

    /** Sums of the posts' shears, N, and moments, N m, by the wind on the panels in one combination, each post worked out by itself. */
    public static double[] sums(FootActions.Combined combined, List<Double> positions) {
        double spread = positions.stream().mapToDouble(x -> x * x).sum();
        double shear = 0;
        double moment = 0;
        for (double x : positions) {
            shear += combined.force() / positions.size() + (spread == 0 ? 0 : combined.combination().torsion() * x / spread);
            moment += new Row(x, positions.size(), spread, PostDrag.NONE).signedMoment(combined);
        }
        return new double[] {shear, moment};
    }

    private SignPosts() { }
}
