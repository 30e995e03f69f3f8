package broadside.support;

import broadside.panel.FenceFeet;
import broadside.quantity.Mass;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * One panel of a temporary fence on its feet, as read and recorded: masses in kg, lengths in m. Levers are measured from
 * the line of the fence, positive behind it.
 *
 * @param panel  m_p
 * @param foot   m_f, the feet of one panel
 * @param half   a_f, half the length of a foot
 * @param stakes M_s, moment that proved stakes give about the leeward end of the foot, N m
 */
record Fence(double panel, double foot, double half, List<Block> blocks, Optional<Brace> brace, Optional<Double> stakes) {

    /** Mass and lever under the symbols m_{bi} and x_{bi}. */
    record Block(double mass, double lever) { }

    /** Reach L_B and mass m_B on its foot. */
    record Brace(double lever, double mass) { }

    Fence {
        blocks = List.copyOf(blocks);
    }

    static Fence of(FenceFeet feet, StabilityNumbers assumed, List<String> assumptions, List<String> remarks, Trace trace) {
        double panel = mass(feet.panelMass(), "panel-mass", "m_p", "mass of one panel with its cover", assumptions, trace);
        double foot = mass(feet.footMass(), "foot-mass", "m_f", "mass of the feet of one panel", assumptions, trace);
        double length = footLength(feet, assumed, assumptions, trace);
        double half = trace.line("half-foot", "a_f", "half the length of a foot").in("b_f", length, "m").from("statics", Status.DERIVED)
            .gives("b_f / 2", length / 2, "m");
        List<Block> blocks = new ArrayList<>();
        for (int i = 0; i < feet.blocks().size(); i++) {
            FenceFeet.Block each = feet.blocks().get(i);
            String n = String.valueOf(i + 1);
            blocks.add(new Block(notNegative(trace.given("m_{b" + n + "}", "mass of block " + n, each.mass().kilograms(), "kg", each.mass().typed()),
                "blocks[" + i + "].mass"),
                trace.given("x_{b" + n + "}", "distance of block " + n + " behind the line", each.lever().metres(), "m", each.lever().typed())));
        }
        if (!blocks.isEmpty() || feet.brace().isPresent()) {
            remarks.add("Blocks count only while they are tied or hooked to the fence or its brace: a block that stands loose beside a foot holds nothing.");
        }
        if (blocks.stream().anyMatch(b -> Math.abs(b.lever()) > half)) {
            remarks.add("A block beyond the end of the foot counts only when a frame that cannot bend holds it.");
        }
        Optional<Brace> brace = feet.brace().map(b -> brace(b, half, trace));
        return new Fence(panel, foot, half, blocks, brace, stakes(feet.stakes(), length, assumed, assumptions, remarks, trace));
    }

    private static Brace brace(FenceFeet.Brace typed, double half, Trace trace) {
        double lever = typed.lever().metres();
        if (!(lever > half)) {
            throw new UnfitAnswer("brace.lever", "the brace must reach farther from the line than the end of the foot, which is at " + half + " m");
        }
        return new Brace(trace.given("L_B", "from the line to the foot of the brace", lever, "m", typed.lever().typed()),
            notNegative(trace.given("m_B", "mass on the foot of the brace", typed.mass().kilograms(), "kg", typed.mass().typed()), "brace.mass"));
    }

    private static double mass(Optional<Mass> typed, String field, String symbol, String meaning, List<String> assumptions, Trace trace) {
        if (typed.isEmpty()) {
            assumptions.add("The " + meaning + " was not given: it counts as nothing.");
        }
        double value = notNegative(typed.map(Mass::kilograms).orElse(0.0), field);
        return trace.given(symbol, meaning + (typed.isEmpty() ? ", not given" : ""), value, "kg", typed.map(Mass::typed).orElse(""));
    }

    static double notNegative(double mass, String field) {
        if (!(mass >= 0)) {
            throw new UnfitAnswer(field, "a mass is not below zero");
        }
        return mass;
    }

    private static double footLength(FenceFeet feet, StabilityNumbers assumed, List<String> assumptions, Trace trace) {
        if (feet.footLength().isEmpty()) {
            double length = assumed.length("foot-length", "b_f", "length of a foot across the line", trace);
            assumptions.add("The length of the feet was not given: " + length + " m is taken, half of it on each side of the line.");
            return length;
        }
        double length = feet.footLength().get().metres();
        if (!(length > 0)) {
            throw new UnfitAnswer("foot-length", "a foot has a length above zero, across the line of the fence");
        }
        return trace.given("b_f", "length of a foot across the line", length, "m", feet.footLength().get().typed());
    }

    private static Optional<Double> stakes(FenceFeet.Stakes stakes, double length, StabilityNumbers assumed, List<String> assumptions, List<String> remarks,
        Trace trace) {
        if (stakes.proofLoad().isEmpty()) {
            if (stakes.words().isPresent() || stakes.count().isPresent()) {
                remarks.add("Stakes are not counted: what they hold depends on the ground. They count with a proof load, measured on this ground; "
                    + "wet ground holds about half.");
            }
            return Optional.empty();
        }
        double proof = stakes.proofLoad().get().newtons();
        int count = stakes.count().orElse(1);
        if (!(proof > 0)) {
            throw new UnfitAnswer("stake-proof-load", "a proof load is a pull above zero, such as 1.6 kN");
        }
        if (count < 1) {
            throw new UnfitAnswer("stakes-per-panel", "at least one stake holds a panel, or the proof load is left out");
        }
        if (stakes.count().isEmpty()) {
            assumptions.add("The number of stakes was not given: one on each side of each panel is counted, at the ends of the foot.");
        }
        remarks.add("Stakes count against tipping only, upwards at the windward end of the foot; "
            + "their proof load must be of this ground as it will be, since wet ground holds about half.");
        double each = trace.given("P_s", "proof load of one stake", proof, "N", stakes.proofLoad().get().typed());
        double n = trace.given("n_s", "stakes on each side of a panel", count, "1", "");
        double factor = assumed.fixing("stake-factor", "γ_s", "pull-out over what may be counted on", trace);
        return Optional.of(trace.line("stake-moment", "M_s", "moment of the stakes about the leeward end of the foot").in("n_s", n).in("P_s", each, "N")
            .in("γ_s", factor).in("b_f", length, "m").from("statics", Status.DERIVED).gives("n_s P_s / γ_s b_f", n * each / factor * length, "N m"));
    }

    /** Whether both winds find the same: no brace, and no block off the line. */
    boolean alike() {
        return brace.isEmpty() && blocks.stream().allMatch(b -> b.lever() == 0);
    }

    /** The same with a brace in place of the one that it has. */
    Fence with(Brace other) {
        return new Fence(panel, foot, half, blocks, Optional.of(other), stakes);
    }
}
