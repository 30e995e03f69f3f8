package broadside.support;

import broadside.quantity.Force;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A stay that takes a force along the ground. Forces in N, without the initial pull of the stay.
 *
 * @param tension   of the stay
 * @param uplift    of its anchor, and push on the mast
 * @param strength  ultimate strength that it needs
 * @param checks    one where the ultimate strength was typed
 */
public record Stay(double tension, double uplift, double strength, List<Check> checks, List<String> remarks) {

    private static final String STATICS = "statics";

    public Stay {
        checks = List.copyOf(checks);
        remarks = List.copyOf(remarks);
    }

    /**
     * Works out one stay.
     *
     * @param force     along the ground, recorded before, N
     * @param angle     above the ground, rad
     * @param ultimate  strength of the stay as typed
     * @throws UnfitAnswer  for an angle that is not between the ground and upright, or a strength that is none
     */
    public static Stay of(Edition stability, Check.In force, double angle, Optional<Force> ultimate, Trace trace) {
        if (!(angle >= 0) || !(Math.cos(angle) > 1e-6) || angle > 2.0) {
            throw new UnfitAnswer("stay.angle", "the angle of a stay above the ground is from 0 to below 90 degrees");
        }
        if (ultimate.isPresent() && !(ultimate.get().newtons() > 0)) {
            throw new UnfitAnswer("stay.strength", "the ultimate strength of a stay is above zero");
        }
        String h = force.symbol();
        double theta = trace.given("θ", "angle of the stay above the ground", angle, "rad", "");
        double tension = trace.line("stay-tension", "T_s", "pull of the stay, without its initial pull").in(h, force.value(), "N").in("θ", theta, "rad")
            .from(STATICS, Status.DERIVED).gives(h + " / cos(θ)", force.value() / Math.cos(theta), "N");
        double uplift = trace.line("stay-uplift", "Z_s", "uplift of the anchor, and push on the mast").in(h, force.value(), "N").in("θ", theta, "rad")
            .from(STATICS, Status.DERIVED).gives(h + " tan(θ)", force.value() * Math.tan(theta), "N");
        StabilityNumbers assumed = new StabilityNumbers(stability);
        double factor = assumed.fixing("guy-factor", "γ_s", "ultimate strength over the pull that is allowed", trace);
        double strength = trace.line("stay-strength", "U_s", "ultimate strength that the stay needs").in("γ_s", factor).in("T_s", tension, "N")
            .from("Baytown, Texas, sign code section 118-241 (d)", Status.READ).gives("γ_s T_s", factor * tension, "N");
        List<Check> checks = new ArrayList<>();
        ultimate.ifPresent(u -> checks.add(Check.of("stay", "pull at most 1/5 of the ultimate strength, Baytown, Texas, sign code section 118-241 (d)",
            new Check.In("U_s", strength),
            new Check.In("U_u", trace.given("U_u", "ultimate strength of the stay", u.newtons(), "N", u.typed())), "N", "", Status.READ, trace)));
        return new Stay(tension, uplift, strength, checks, List.of("The initial pull of the stay comes on top.",
            "Chains, cables and wires do not count as bracing in at least one city code (Redwood City): ask the authority."));
    }
}
