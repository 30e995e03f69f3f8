package broadside.support;

import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * A block of concrete in the ground below a panel, by its weight alone: moment to the base of the block, about its edge.
 * The ground at its sides is not counted on.
 */
public final class BlockFooting {

    private final StabilityRules rules;
    private final StabilityNumbers assumed;

    /** Width of the block along the wind, length across it and depth, m; mass per volume, kg/m3. */
    public record Block(double width, double length, double depth, double density) { }

    /** Reads the tables of stability. */
    public BlockFooting(Edition stability) {
        this.rules = new StabilityRules(stability);
        this.assumed = new StabilityNumbers(stability);
    }

    /**
     * Checks the block by a rule against overturning.
     *
     * @param force   of the wind at the level of the rule, recorded before, N
     * @param height  of that force above the ground, recorded before, m
     */
    public Check overturning(Block block, Check.In force, Check.In height, StabilityRule rule, Trace trace) {
        if (!(block.width() > 0 && block.length() > 0 && block.depth() > 0 && block.density() > 0)) {
            throw new UnfitAnswer("footing", "a block has width, length, depth and density above zero");
        }
        RuleFactors by = RuleFactors.of(rule, rules, new WindLevels(1, 1, "the force is at the level of the rule", Status.GIVEN), assumed, trace);
        double b = trace.given("b_F", "width of the block along the wind", block.width(), "m", "");
        double l = trace.given("l_F", "length of the block", block.length(), "m", "");
        double d = trace.given("d_F", "depth of the block", block.depth(), "m", "");
        double rho = trace.given("ρ_F", "density of the block", block.density(), "kg/m³", "");
        double arm = trace.line("lever-arm/base", "z_B", "height of the force above the base of the block").in(height.symbol(), height.value(), "m")
            .in("d_F", d, "m").from("statics", Status.DERIVED).gives(height.symbol() + " + d_F", height.value() + d, "m");
        RuleFactors.Action acts = by.action(new PanelWind("wind on the panel", "", force, new Check.In("z_B", arm), true), trace);
        double resists = trace.line("resisting-moment", "R_d", "weight of the block about its edge").in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²")
            .in("ρ_F", rho, "kg/m³").in("b_F", b, "m").in("l_F", l, "m").in("d_F", d, "m").from("statics", by.status()).gives("γ_G g_n ρ_F b_F l_F d_F b_F / 2",
                by.weight() * by.gravity() * rho * b * l * d * b / 2, "N m");
        RuleFactors.ratio(trace.line("overturning-ratio", "r_o", "resisting over overturning moment, at the base"), new Check.In("R_d", resists),
            new Check.In("M_d", acts.moment()), "N m", by.status());
        return by.overturning("overturning", new Check.In("R_d", resists), acts, new PanelWind("wind on the panel", "", force, height, true), trace);
    }
}
