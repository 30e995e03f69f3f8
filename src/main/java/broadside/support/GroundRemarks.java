package broadside.support;

import broadside.panel.Footing;
import java.util.List;
import java.util.Optional;

/** What the reader must know of the ground around a footing. */
final class GroundRemarks {

    /**
     * Adds what the answers about the ground ask for.
     *
     * @param rule   name of the rule for the depth; empty for a pad
     * @param depth  of the footing, m
     */
    static void add(Footing.Ground ground, Optional<String> rule, double depth, List<Assumed> assumed, List<String> remarks) {
        switch (ground.slope().orElse("")) {
            case "sloping" -> assumed.add(new Assumed("The ground slopes: a slope takes away passive resistance, which none of these rules covers. "
                + "An engineer must check the footing.", true));
            case "flat" -> { }
            default -> assumed.add(new Assumed("The ground is assumed to be flat around the footing. A slope or ditch nearby takes away its hold."));
        }
        switch (ground.water().orElse("")) {
            case "high" -> assumed.add(new Assumed("Ground water stands high: values of the soil must be those of wet ground" + (rule.isEmpty()
                ? ", and the weight of the pad counts less the water."
                : rule.get().equals(FootingRules.SAND) ? ", and the weight of the sand counts less the water." : "."), true));
            case "deep" -> { }
            default -> assumed.add(new Assumed("Ground water is assumed to stand below the footing."));
        }
        ground.frost().filter(f -> depth < f.metres()).ifPresent(f -> assumed.add(new Assumed("The footing ends above the depth of frost (" + f.typed()
            + "): frost can lift it.", true)));
        switch (ground.services().orElse("")) {
            case "located" -> { }
            case "not located" -> assumed.add(new Assumed("Buried services are not located: do not dig or drive before they are.", true));
            default -> assumed.add(new Assumed("Buried services are not known to be located. Do not dig or drive before they are."));
        }
        if (ground.paved()) {
            remarks.add(rule.filter(FootingRules.IBC::equals).isPresent() ? "The pavement must be rigid, lie against the post all round and take its thrust."
                : "The pavement is not counted by this rule.");
        }
        rule.filter(FootingRules.IBC::equals).ifPresent(r -> switches(ground, assumed, remarks));
    }

    private static void switches(Footing.Ground ground, List<Assumed> assumed, List<String> remarks) {
        if (ground.doubled() && ground.paved()) {
            remarks.add("The doubling of the lateral bearing is not counted for a post that a pavement holds.");
        } else if (ground.doubled()) {
            assumed.add(new Assumed("The lateral bearing is doubled: the post may move half an inch at the ground without harm."));
        }
        if (ground.increased()) {
            remarks.add("The increase of one third for wind goes with the alternative basic load combinations only" + (ground.doubled() && !ground.paved()
                ? ", and it is counted on top of the doubling: whoever is responsible must accept both." : "."));
        }
    }

    private GroundRemarks() { }
}
