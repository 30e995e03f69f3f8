package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.EdgeOn;
import broadside.action.Foot;
import broadside.action.PostAction;
import broadside.action.PostDrag;
import broadside.action.Reaction;
import broadside.codes.Level;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The loads on one item and at its foot.
 *
 * @param velocity   the greatest velocity pressure of its panels, with its height
 * @param cases      every case of the code in every arrangement of the item, wind on the front and on the back
 * @param governing  the case that governs base-shear and, where the item has a foot, base-moment and torsion, wind on the front
 * @param supports   what reaches its supports
 * @param edgeOn     wind along the face; none for a panel flat on a wall
 * @param level      level of these loads and the companion
 * @param selfWeight weight of the item where its mass was given, N; zero otherwise
 * @param foot       where its loads end
 */
public record Loads(Velocity velocity, List<CaseAction> cases, Map<String, CaseAction> governing, Supports supports,
                    Optional<EdgeOn> edgeOn, Level level, double selfWeight, Foot foot) {

    /** Velocity pressure, Pa, at a height above the ground, m. */
    public record Velocity(double height, double pressure) { }

    /** One line of equilibrium: what acts and what answers, in the same unit. */
    public record Balance(String what, double loads, double reactions, String unit) { }

    /**
     * What reaches the supports.
     *
     * @param posts      the foot of each post; empty where the posts are not known
     * @param drag       wind on all posts themselves, inside the base actions; empty where it is not known
     * @param reactions  brackets, ends, panels of a line
     * @param balance    sum of loads and sum of reactions
     * @param carried    what carries the item, pre-sized; empty where it is loads only
     */
    public record Supports(List<PostAction> posts, Optional<PostDrag> drag, List<Reaction> reactions, List<Balance> balance, Optional<Carried> carried) {

        public Supports {
            posts = List.copyOf(posts);
            reactions = List.copyOf(reactions);
            balance = List.copyOf(balance);
        }

        static Supports of(List<Reaction> reactions, Optional<Carried> carried) {
            return new Supports(List.of(), Optional.empty(), reactions, List.of(), carried);
        }
    }

    public Loads {
        cases = List.copyOf(cases);
        governing = Map.copyOf(governing);
    }

    public List<PostAction> posts() {
        return supports.posts();
    }

    public List<Reaction> reactions() {
        return supports.reactions();
    }

    /** What carries the item, pre-sized; empty where it is loads only. */
    public Optional<Carried> carried() {
        return supports.carried();
    }

    public List<Balance> balance() {
        return supports.balance();
    }

    /** The case that governs base-shear, base-moment or torsion, wind on the front; that of base-shear where the item has no foot. */
    public CaseAction governs(String quantity) {
        return governing.getOrDefault(quantity, governing.get("base-shear"));
    }

    /** The same loads at the companion level. */
    public Loads companion() {
        double f = level.factor();
        Map<String, CaseAction> governs = new TreeMap<>();
        governing.forEach((quantity, action) -> governs.put(quantity, action.atLevel(f)));
        Supports other = new Supports(posts().stream().map(p -> p.atLevel(f)).toList(), supports.drag(),
            reactions().stream().map(r -> r.atLevel(f)).toList(), balance(), carried());
        return new Loads(velocity, cases.stream().map(c -> c.atLevel(f)).toList(), governs, other, edgeOn, level, selfWeight, foot);
    }

    /** The names of the governing cases, post-moment among them where there are posts. */
    public Map<String, String> governingNames() {
        Map<String, String> names = new TreeMap<>();
        governing.forEach((quantity, action) -> names.put(quantity, action.name()));
        worstPost().ifPresent(p -> names.put("post-moment", p.named()));
        return names;
    }

    /** The post with the greatest moment at its foot. */
    public Optional<PostAction> worstPost() {
        return posts().stream().max(Comparator.comparingDouble(PostAction::moment));
    }
}
