package broadside.support;

import java.util.List;
import java.util.Optional;

/**
 * What the hardest fixing of a group takes, at the level of allowable stress.
 *
 * @param tension      N; none where the fixings cannot give the couple that is needed
 * @param shear        N
 * @param checks       none where no allowable loads were typed
 * @param assumptions  what was taken without having been typed
 * @param remarks      what the reader should know
 */
public record FixingPulls(Optional<Double> tension, double shear, List<Check> checks, List<String> assumptions, List<String> remarks) {

    public FixingPulls {
        checks = List.copyOf(checks);
        assumptions = List.copyOf(assumptions);
        remarks = List.copyOf(remarks);
    }
}
