package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.EdgeOn;
import broadside.action.PostAction;
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
 * @param cases      every case of the code, wind on the front and on the back
 * @param governing  the case that governs base-shear, base-moment and torsion, wind on the front
 * @param posts      what reaches the foot of each post; empty where the posts are not known
 * @param edgeOn     wind along the face, by the tool's own rule
 * @param level      level of these loads and the companion
 * @param selfWeight weight of the boards where their mass was given, N; zero otherwise
 * @param balance    sum of loads and sum of reactions
 */
public record Loads(Velocity velocity, List<CaseAction> cases, Map<String, CaseAction> governing, List<PostAction> posts,
                    EdgeOn edgeOn, Level level, double selfWeight, List<Balance> balance) {

    /** Velocity pressure, Pa, at a height above the ground, m. */
    public record Velocity(double height, double pressure) { }

    /** One line of equilibrium: what acts and what answers, in the same unit. */
    public record Balance(String what, double loads, double reactions, String unit) { }

    public Loads {
        cases = List.copyOf(cases);
        governing = Map.copyOf(governing);
        posts = List.copyOf(posts);
        balance = List.copyOf(balance);
    }

    /** The case that governs base-shear, base-moment or torsion, wind on the front. */
    public CaseAction governs(String quantity) {
        return governing.get(quantity);
    }

    /** The same loads at the companion level. */
    public Loads companion() {
        double f = level.factor();
        Map<String, CaseAction> governs = new TreeMap<>();
        governing.forEach((quantity, action) -> governs.put(quantity, action.atLevel(f)));
        return new Loads(velocity, cases.stream().map(c -> c.atLevel(f)).toList(), governs, posts.stream().map(p -> p.atLevel(f)).toList(), edgeOn, level,
            selfWeight, balance);
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
        return posts.stream().max(Comparator.comparingDouble(PostAction::moment));
    }
}
