package broadside.support;

import broadside.panel.Footing;
import java.util.List;

/**
 * The footing of one post as checked. Lengths in m.
 *
 * @param kind      how it holds
 * @param rule      the rule by which it holds, in words
 * @param sized     whether its depth, or the width of a pad, was found here; otherwise it was typed and checked
 * @param round     round in plan
 * @param depth     below the ground
 * @param width     along the wind for a pad; diameter, or face across the wind, for a post or pier
 * @param length    across the wind for a pad; the other face of a pier
 * @param concrete  volume of the hole, m3
 * @param checks    one for a depth; overturning, sliding and bearing for a pad
 * @param assumed   what must be confirmed
 * @param remarks   what the reader must know
 */
public record FootingResult(Footing.Kind kind, String rule, boolean sized, boolean round, double depth, double width, double length, double concrete,
                            List<Check> checks, List<Assumed> assumed, List<String> remarks) {

    public FootingResult {
        checks = List.copyOf(checks);
        assumed = List.copyOf(assumed);
        remarks = List.copyOf(remarks);
    }

    public boolean passes() {
        return checks.stream().allMatch(Check::passes);
    }
}
