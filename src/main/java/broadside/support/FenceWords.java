package broadside.support;

import broadside.support.StabilityResult.Stand;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Says plainly when a fence does not stand on blocks, and what would hold it. */
final class FenceWords {

    private final StabilityNumbers assumed;

    FenceWords(StabilityNumbers assumed) {
        this.assumed = assumed;
    }

    /**
     * Adds what there is to say.
     *
     * @param braced  the need of the covered fence once it has this brace
     */
    void tell(Fence fence, List<Stand> stands, Function<Fence, BallastNeed> braced, List<String> remarks) {
        double limit = assumed.value("block-limit");
        Optional<BallastNeed> covered = most(stands, true);
        if (covered.isEmpty()) {
            return;
        }
        BallastNeed need = covered.get();
        if (fence.brace().isEmpty() && need.line() > limit) {
            double reach = Math.max(assumed.value("brace-lever"), 2 * fence.half());
            BallastNeed other = braced.apply(fence.with(new Fence.Brace(reach, 0)));
            remarks.add("Will not stand on blocks alone: the " + need.named() + " needs " + kg(need.line()) + " of blocks, and more than " + kg(limit)
                + " on one panel are no longer blocks. What would hold it: braces that reach " + reach + " m behind the line, with " + kg(other.brace())
                + " on the foot of each brace and " + kg(other.line()) + " on the line of each panel; returns at the ends; or taking the cover off"
                + bare(stands) + ".");
        } else if (fence.brace().isPresent() && Math.max(need.line(), need.brace()) > limit) {
            remarks.add("Even braced, the " + need.named() + " needs " + kg(need.line()) + " on the line of each panel and " + kg(need.brace())
                + " on the foot of each brace, and more than " + kg(limit)
                + " in one place are no longer blocks. What would hold it: a longer brace, returns, or taking the cover off"
                + bare(stands) + ".");
        }
    }

    private static String bare(List<Stand> stands) {
        return most(stands, false).map(n -> ", when " + kg(n.total()) + " of ballast on each panel are enough").orElse("");
    }

    private static Optional<BallastNeed> most(List<Stand> stands, boolean covered) {
        return stands.stream().filter(s -> s.wind().covered() == covered).map(Stand::need).reduce(BallastNeed::and);
    }

    /** Whole kilograms, upward. */
    private static String kg(double mass) {
        return (long) Math.ceil(mass - 1e-9) + " kg";
    }
}
