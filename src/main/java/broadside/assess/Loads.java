package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.EdgeOn;
import broadside.action.PostAction;
import broadside.codes.Level;
import java.util.List;
import java.util.Map;

/**
 * The loads on one item and at its foot.
 *
 * @param velocity   the greatest velocity pressure of its panels, with its height
 * @param cases      every case of the code, wind on the front and on the back
 * @param governing  which case governs what: base-shear, base-moment, torsion, post-moment
 * @param posts      what reaches the foot of each post; empty where the posts are not known
 * @param edgeOn     wind along the face, by the tool's own rule
 * @param level      level of these loads and the companion
 * @param selfWeight weight of the boards where their mass was given, N; zero otherwise
 * @param balance    sum of loads and sum of reactions
 */
public record Loads(Velocity velocity, List<CaseAction> cases, Map<String, String> governing, List<PostAction> posts,
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

    /** The case that governs a quantity, wind on the front. */
    public CaseAction governs(String quantity) {
        String name = governing.get(quantity);
        return cases.stream().filter(c -> c.name().equals(name) && c.direction().equals("front")).findFirst().orElseThrow();
    }
}
