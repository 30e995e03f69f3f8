package broadside.support;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.exception.MathIllegalStateException;

/** The least depth that is enough, found by trial in a bounded number of steps. */
final class Root {

    private static final double LEAST = 1e-6;
    private static final int TRIALS = 200;
    private static final int DOUBLINGS = 60;

    /**
     * Solves for the depth, m, at which {@code lacking} falls to zero.
     *
     * @param lacking  what is lacking at a depth: above zero while it is too small, falling with the depth
     * @throws UnfitAnswer when no depth is enough
     */
    static double depth(DoubleUnaryOperator lacking) {
        if (lacking.applyAsDouble(LEAST) <= 0) {
            return LEAST;
        }
        double high = 1;
        double low = LEAST;
        for (int i = 0; lacking.applyAsDouble(high) > 0; i++) {
            if (i == DOUBLINGS) {
                throw none();
            }
            low = high;
            high *= 2;
        }
        try {
            return new BrentSolver(1e-12, 1e-12).solve(TRIALS, lacking::applyAsDouble, low, high);
        } catch (MathIllegalStateException e) {
            throw none();
        }
    }

    private static UnfitAnswer none() {
        return new UnfitAnswer("footing.depth", "no depth was found that holds these loads: the search does not come to an end");
    }

    private Root() { }
}
