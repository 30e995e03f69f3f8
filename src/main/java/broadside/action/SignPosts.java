package broadside.action;

import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Shares of a sign's posts: the board is stiff, so that force is shared alike and torsion goes into the posts as a
 * couple in proportion to their distance from the middle. One post takes the torsion itself.
 */
public final class SignPosts {

    private static final String STATICS = "statics: stiff board, equal posts";

    /** Works out and records each post in the combination that is worst for its moment. */
    public static List<PostAction> of(List<Double> positions, List<FootActions.Combined> combinations, Trace trace) {
        double spread = positions.stream().mapToDouble(x -> x * x).sum();
        List<PostAction> posts = new ArrayList<>();
        if (positions.size() > 1) {
            trace.given("n", "number of posts", positions.size(), "1", "");
            trace.line("post-spread", "S", "sum of the squares of the posts' distances from their middle").from(STATICS, Status.DERIVED)
                .reads("from the positions of the posts", spread, "m²");
        }
        for (int i = 0; i < positions.size(); i++) {
            double x = positions.get(i);
            FootActions.Combined worst = combinations.stream()
                .max(Comparator.comparingDouble(c -> Math.abs(moment(c, x, positions.size(), spread)))).orElseThrow();
            posts.add(record(i + 1, x, positions.size(), spread, worst, trace));
        }
        PostAction most = posts.stream().max(Comparator.comparingDouble(PostAction::moment)).orElseThrow();
        trace.line("post-shear", "F_p", "greatest shear at the foot of a post: post " + most.post()).in("F_{p" + most.post() + "}", most.shear(), "N")
            .from(STATICS, Status.DERIVED).gives("F_{p" + most.post() + "}", most.shear(), "N");
        trace.line("post-moment", "M_p", "greatest moment at the foot of a post: post " + most.post())
            .in("M_{p" + most.post() + "}", most.moment(), "N m").from(STATICS, Status.DERIVED)
            .gives("M_{p" + most.post() + "}", most.moment(), "N m");
        return posts;
    }

    private static double moment(FootActions.Combined c, double x, int count, double spread) {
        return c.moment() / count + (spread == 0 ? 0 : c.combination().couple() * x / spread);
    }

    private static PostAction record(int post, double x, int count, double spread, FootActions.Combined worst, Trace trace) {
        String part = Integer.toString(post);
        double force = worst.force();
        double moment = worst.moment();
        if (count == 1) {
            double v = trace.line("post-shear/1", "F_{p1}", "shear at the foot of the post").in("F", force, "N").from(STATICS, Status.DERIVED)
                .gives("F", force, "N");
            double m = trace.line("post-moment/1", "M_{p1}", "moment at the foot of the post").in("M", moment, "N m").from(STATICS, Status.DERIVED)
                .gives("M", moment, "N m");
            return new PostAction(1, x, "", 0, java.util.Optional.empty(), worst.name(), v, m);
        }
        trace.given("x_{" + part + "}", "post " + part + " from the middle of the posts, to the right", x, "m", "");
        double t = couple("M_T", "torsion of case " + worst.name() + ", wind meeting the " + end(worst), worst.combination().torsion(), "post-couple/torsion/" + part, trace);
        double j = couple("J", "sum of force, height and side distance in the same case", worst.combination().couple(), "post-couple/moment/" + part, trace);
        double v = trace.line("post-shear/" + part, "F_{p" + part + "}", "shear at the foot of post " + part).in("F", force, "N").in("n", count)
            .in("M_T", t, "N m").in("x_{" + part + "}", x, "m").in("S", spread, "m²").from(STATICS, Status.DERIVED)
            .gives("abs(F / n + M_T x_{" + part + "} / S)", Math.abs(force / count + t * x / spread), "N");
        double m = trace.line("post-moment/" + part, "M_{p" + part + "}", "moment at the foot of post " + part).in("M", moment, "N m").in("n", count)
            .in("J", j, "N m²").in("x_{" + part + "}", x, "m").in("S", spread, "m²").from(STATICS, Status.DERIVED)
            .gives("abs(M / n + J x_{" + part + "} / S)", Math.abs(moment / count + j * x / spread), "N m");
        return new PostAction(post, x, "", 0, java.util.Optional.empty(), worst.name(), v, m);
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

    /** Sums of the posts' shears, N, and moments, N m, in one combination, each post worked out by itself. */
    public static double[] sums(FootActions.Combined combined, List<Double> positions) {
        int count = positions.size();
        double spread = positions.stream().mapToDouble(x -> x * x).sum();
        double shear = 0;
        double moment = 0;
        for (double x : positions) {
            shear += combined.force() / count + (spread == 0 ? 0 : combined.combination().torsion() * x / spread);
            moment += moment(combined, x, count, spread);
        }
        return new double[] {shear, moment};
    }

    private SignPosts() { }
}
