package broadside.support;

import broadside.quantity.Rounding;
import broadside.quantity.Show;
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
                + " on one panel are no longer blocks. " + (Math.max(other.line(), other.brace()) > limit ? "Braces do not bring it down to blocks either" : "What would hold it: braces")
                + ": reaching " + reach + " m behind the line they need " + kg(other.brace()) + " on the foot of each and " + kg(other.line()) + " on the line of each panel. " + bare(stands, limit));
        } else if (fence.brace().isPresent() && Math.max(need.line(), need.brace()) > limit) {
            remarks.add("Even braced, the " + need.named() + " needs " + kg(need.line()) + " on the line of each panel and " + kg(need.brace())
                + " on the foot of each brace, and more than " + kg(limit)
                + " in one place are no longer blocks. A longer brace or returns need less. " + bare(stands, limit));
        }
    }

    /** What is left with the cover taken off, where the loads of the bare fence are known. */
    private static String bare(List<Stand> stands, double limit) {
        return most(stands, false).map(n -> "With the cover taken off each panel needs " + kg(n.total()) + (n.total() > limit ? ", which is too much for blocks as well: at this wind it must not "
            + "stand there as typed." : " in all.")).orElse("The loads with the cover taken off are not known.");
    }

    private static Optional<BallastNeed> most(List<Stand> stands, boolean covered) {
        return stands.stream().filter(s -> s.wind().covered() == covered).map(Stand::need).reduce(BallastNeed::and);
    }

    /** Kilograms as on the sheet: three figures, upward. */
    private static String kg(double mass) {
        return Show.number(mass, 3, Rounding.UP) + " kg";
    }
}
