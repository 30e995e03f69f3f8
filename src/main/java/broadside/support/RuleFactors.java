package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * The factors of a rule as recorded, and the wind at its level.
 *
 * @param rule      against overturning
 * @param sliding   the same rule against sliding
 * @param weight    on favourable weight, γ_G
 * @param wind      on the wind of its level, γ_W
 * @param level     from the code to that level, γ_L
 * @param required  ratio against overturning, η_o
 * @param slide     ratio against sliding, η_s
 * @param gravity   m/s2, g_n
 */
record RuleFactors(StabilityRule rule, StabilityRule sliding, double weight, double wind, double level, double required, double slide, double gravity,
                   Status status) {

    private static final String OVERTURNING = "overturning";

    /** Wind of one case at the level of the rule: force F_d, N, and moment at the ground M_d, N m. */
    record Action(double force, double moment) { }

    static RuleFactors of(StabilityRule rule, StabilityRules rules, WindLevels levels, StabilityNumbers assumed, Trace trace) {
        StabilityRule sliding = rules.sliding(rule);
        String named = rule.title() + " (" + rule.key() + ")";
        double g = assumed.gravity(trace);
        double weight = trace.line("factor-on-weight", "γ_G", "factor on favourable weight").from(rule.place(), rule.status())
            .reads(named, rule.onWeight(), "1");
        double wind = trace.line("factor-on-wind", "γ_W", "factor on the wind").from(rule.place(), rule.status()).reads(named, rule.onWind(), "1");
        double level = trace.line("wind-level", "γ_L", "from the wind of the code to the " + (rule.strength() ? "strength" : "service") + " level")
            .from(levels.place(), levels.status()).reads("by the code", rule.strength() ? levels.strength() : levels.service(), "1");
        double required = trace.line("ratio-required/overturning", "η_o", "ratio that must be reached against overturning").from(rule.place(), rule.status())
            .reads(named, rule.required(), "1");
        double slide = trace.line("ratio-required/sliding", "η_s", "ratio that must be reached against sliding").from(sliding.place(), sliding.status())
            .reads(named, sliding.required(), "1");
        return new RuleFactors(rule, sliding, weight, wind, level, required, slide, g, rule.status().weaker(levels.status()));
    }

    /** The wind at the level of the rule, recorded as F_d and M_d. */
    Action action(PanelWind on, Trace trace) {
        String f = on.force().symbol();
        String z = on.height().symbol();
        double force = trace.line("design-force", "F_d", "wind force at the level of the rule, " + on.named()).in("γ_L", level).in("γ_W", wind)
            .in(f, on.force().value(), "N").from(rule.place(), status).gives("γ_L γ_W " + f, level * wind * on.force().value(), "N");
        double moment = trace.line("overturning-moment", "M_d", "moment at the ground of that force").in("F_d", force, "N").in(z, on.height().value(), "m")
            .from("statics", Status.DERIVED).gives("F_d " + z, force * on.height().value(), "N m");
        return new Action(force, moment);
    }

    /**
     * Records a ratio of what resists to what acts; a load of nothing has the greatest ratio that is written.
     *
     * @param resists  symbol and value, N or N m
     * @param acts     the same
     */
    static double ratio(Trace.Line line, Check.In resists, Check.In acts, String unit, Status status) {
        line.in(resists.symbol(), resists.value(), unit).in(acts.symbol(), acts.value(), unit).from("statics", status);
        return acts.value() > TINY ? line.gives(resists.symbol() + " / " + acts.symbol(), resists.value() / acts.value(), "1")
            : line.reads("no load acts; " + (int) Check.MOST + " is written in place of the ratio", Check.MOST, "1");
    }

    /** Loads below this count as none, N or N m. */
    private static final double TINY = 1e-6;

    /** Check against overturning: the moment times the ratio that must be reached, against the moment that resists, recorded before. */
    Check overturning(String name, Check.In resists, Action acts, PanelWind on, Trace trace) {
        double asked = trace.line("overturning-demand" + (name.equals(OVERTURNING) ? "" : "/" + name.substring(OVERTURNING.length() + 1).replace(' ', '-')), "M_E",
            "overturning moment times the ratio that must be reached").in("η_o", required).in("M_d", acts.moment(), "N m").from(rule.place(), status)
            .gives("η_o M_d", required * acts.moment(), "N m");
        return Check.of(name, rule.title() + ", " + rule.place(), new Check.In("M_E", asked), resists, "N m", on.named(), status, trace);
    }

    /** Check against sliding: the force times the ratio that must be reached, against the friction, recorded before. */
    Check sliding(Check.In resists, Action acts, PanelWind on, Status friction, Trace trace) {
        double asked = trace.line("sliding-demand", "F_E", "force along the ground times the ratio that must be reached").in("η_s", slide).in("F_d", acts.force(), "N")
            .from(sliding.place(), status).gives("η_s F_d", slide * acts.force(), "N");
        return Check.of("sliding", sliding.title() + ", " + sliding.place(), new Check.In("F_E", asked), resists, "N", on.named(), status.weaker(friction), trace);
    }
}
