package broadside.assess;

import broadside.action.EdgeOn;
import broadside.action.FootActions.Combined;
import broadside.action.PostDrag;
import broadside.panel.PostSection;
import broadside.panel.PostSign;
import broadside.support.WindLevels;
import broadside.trace.Trace;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** The posts of a sign: decides the section before the loads are recorded, so that a section that was found or asked for counts in them. */
final class SignCarrier {

    private final PostSign typed;
    private final ItemLoads loads;
    private final PostCarrier carrier;
    private final WindLevels levels;
    private final PostCarrier.Decision decided;
    private final Trace quiet;

    /** Decides by the wind on the boards alone, in every combination. */
    SignCarrier(Carriers by, PostSign typed, List<Combined> combinations, EdgeOn edgeOn, ItemLoads loads) {
        this.typed = typed;
        this.loads = loads;
        this.quiet = loads.sheet().quiet();
        PostDemands demands = PostDemands.of(typed, combinations, edgeOn, by.rules().own().number("board-mass", "value"), loads.sheet());
        this.carrier = new PostCarrier(by, typed.posts().type(), typed.footing(), demands, this::drag);
        this.levels = by.levels(loads.sheet());
        this.decided = carrier.choose(levels, quiet);
    }

    /** The sign with the outline of its posts, where a section was typed or asked for. */
    PostSign sign() {
        boolean counts = typed.posts().type().typed() || typed.posts().type().auto();
        return counts && typed.posts().section().isEmpty() ? decided.chosen().map(c -> typed.with(c.section().outline())).orElse(typed) : typed;
    }

    /** The post with the most wind on itself. */
    private PostDrag drag(PostSection outline) {
        return loads.memberRule().flatMap(rule -> PostDrag.of(typed.with(outline), loads.code(), rule, loads.job().site(), quiet).stream()
            .max(Comparator.comparingDouble(PostDrag::moment))).orElse(PostDrag.NONE);
    }

    Carried carried() {
        double thick = decided.chosen().map(c -> Math.max(c.section().width(), c.section().depth())).orElse(0.0);
        if (typed.posts().spacing().filter(s -> typed.posts().count() > 1 && s.metres() < thick).isPresent()) {
            return new Carried(List.of(Carried.Part.refused("posts", "Posts", "at that spacing the posts that are needed would overlap: set them farther apart, or use one post. Loads only.")));
        }
        return carrier.carry(decided, levels, loads.sheet());
    }
}
