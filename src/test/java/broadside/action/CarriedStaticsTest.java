package broadside.action;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.action.FootActions.Combined;
import broadside.codes.LoadCase;
import broadside.panel.Panel;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/**
 * What the posts of a sign are checked for is in balance with the wind, in every combination of random signs: the loads of
 * the posts are worked out case by case as magnitudes, so that only one choice of their signs can be in balance.
 */
class CarriedStaticsTest {

    private static final int SIGNS = 100_000;
    private static final Trace QUIET = new Trace().quiet();

    private final Random random = new Random(20);

    private double between(double least, double most) {
        return least + (most - least) * random.nextDouble();
    }

    /** A board with wind square on, shifted to both sides, or in zones from either end. */
    private PanelCases board(String part) {
        Panel panel = Cases.board(part, between(0.3, 10), between(0.3, 4), between(0, 6), between(-2, 2));
        double pressure = between(50, 4000);
        LoadCase right = Cases.even("eccentric", panel, pressure, panel.width() * between(0.05, 0.25));
        List<LoadCase> cases = new ArrayList<>(List.of(Cases.even("centred", panel, pressure, 0), right, right.mirrored(panel.width())));
        if (random.nextInt(4) == 0) {
            cases.addAll(Cases.wall(panel));
        }
        return new PanelCases(panel, cases);
    }

    /** Magnitudes with the signs by which they are in balance; the first of the posts from one end may be pulled the other way. */
    private static boolean balances(double[] magnitudes, double sum, List<Double> at, double couple, double scale) {
        int n = magnitudes.length;
        for (int turned = -n; turned <= n; turned++) {
            double total = 0;
            double about = 0;
            for (int i = 0; i < n; i++) {
                double sign = turned >= 0 ? i < turned ? -1 : 1 : i >= n + turned ? -1 : 1;
                total += sign * magnitudes[i];
                about += sign * magnitudes[i] * at.get(i);
            }
            if (Math.abs(total - sum) <= 1e-9 * scale && (n == 1 || Math.abs(about - couple) <= 1e-9 * scale * Math.max(1, at.get(n - 1)))) {
                return true;
            }
        }
        return false;
    }

    @Test
    void postsBalanceTheWindInEveryCombination() {
        int combinations = 0;
        for (int i = 0; i < SIGNS; i++) {
            List<PanelCases> boards = new ArrayList<>();
            for (int k = random.nextInt(3); k >= 0; k--) {
                boards.add(board(Integer.toString(k)));
            }
            int posts = 1 + random.nextInt(4);
            double spacing = between(0.3, 4);
            List<Double> at = new ArrayList<>();
            for (int p = 0; p < posts; p++) {
                at.add((p - (posts - 1) / 2.0) * spacing);
            }
            List<Combined> all = FootActions.of(boards, Cases.SYMBOLS, Cases.ALONE, QUIET).combinations();
            List<PostCase> cases = SignPosts.cases(at, all);
            assertThat(cases).hasSize(all.size() * posts);
            for (int c = 0; c < all.size(); c++) {
                balanced(all.get(c), cases.subList(c * posts, (c + 1) * posts), at);
                combinations++;
            }
        }
        assertThat(combinations).isGreaterThan(300_000);
    }

    /** Force, torsion, moment and the sums for the deflection, from the pressures of the zones themselves. */
    private static void balanced(Combined combined, List<PostCase> posts, List<Double> at) {
        double[] sums = new double[4];
        double[] couples = new double[4];
        double[] scale = new double[4];
        for (PanelForce board : combined.combination().panels()) {
            double low = board.panel().clearance();
            double top = low + board.panel().height();
            for (var zone : board.load().zones()) {
                double f = zone.pressure() * (zone.to() - zone.from()) * board.panel().height();
                double x = board.panel().middle() - board.panel().width() / 2 + (zone.from() + zone.to()) / 2 + board.load().shift();
                for (int k = 0; k < 4; k++) {
                    double power = (Math.pow(top, k + 1) - Math.pow(low, k + 1)) / ((k + 1) * (top - low));
                    sums[k] += f * power;
                    couples[k] += f * power * x;
                    scale[k] += f * power * (1 + Math.abs(x));
                }
            }
        }
        boolean alone = posts.size() == 1;
        double[][] found = {posts.stream().mapToDouble(PostCase::shear).toArray(), posts.stream().mapToDouble(PostCase::moment).toArray(),
            posts.stream().mapToDouble(PostCase::squares).toArray(), posts.stream().mapToDouble(PostCase::cubes).toArray()};
        for (int k = 0; k < 4; k++) {
            assertThat(balances(found[k], sums[k], at, couples[k], scale[k])).as("power %d of the height, %s of %s", k, combined.name(), posts).isTrue();
        }
        double twisted = posts.stream().mapToDouble(PostCase::torsion).sum();
        double asked = alone ? Math.abs(couples[0]) : 0;
        assertThat(Math.abs(twisted - asked)).as("torsion of " + combined.name()).isLessThanOrEqualTo(1e-9 * scale[0]);
    }
}
