package broadside.support;

import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;

/** Ballast of a frame on legs by the rule of DIN EN 12811 and 12812: uplift over the factor on weight, friction over the factor against sliding. */
public final class FrameBallast {

    private static final String KEY = "frame-ballast-0.9";

    private final StabilityRules rules;
    private final StabilityNumbers assumed;

    /** Reads the tables of stability. */
    public FrameBallast(Edition stability) {
        this.rules = new StabilityRules(stability);
        this.assumed = new StabilityNumbers(stability);
    }

    /**
     * Ballast of the windward legs, kg, recorded as "ballast-mass".
     *
     * @param moment     of the wind, N m
     * @param legs       distance of the legs, m
     * @param permanent  load on the windward legs, N
     */
    public double ballast(double moment, double legs, double permanent, Trace trace) {
        if (!(legs > 0)) {
            throw new UnfitAnswer("leg-spacing", "the legs of a frame stand apart");
        }
        StabilityRule rule = rules.of(KEY);
        double m = trace.given("M_1", "overturning moment", moment, "N m", "");
        double a = trace.given("a_1", "distance of the legs", legs, "m", "");
        double g = trace.given("G_1", "permanent load on the windward legs", permanent, "N", "");
        double lift = trace.line("uplift", "Z", "uplift of the windward legs by the wind").in("M_1", m, "N m").in("a_1", a, "m").from("statics", Status.DERIVED)
            .gives("M_1 / a_1", m / a, "N");
        double net = trace.line("uplift/net", "Z_n", "what the permanent load leaves of it").in("Z", lift, "N").in("G_1", g, "N")
            .from("statics", Status.DERIVED).gives("max(0; Z - G_1)", Math.max(0, lift - g), "N");
        double factor = trace.line("factor-on-weight", "γ_G", "factor on favourable weight").from(rule.place(), rule.status())
            .reads(rule.key(), rule.onWeight(), "1");
        double weight = trace.line("ballast-weight", "G_2", "weight of the ballast").in("Z_n", net, "N").in("γ_G", factor).from(rule.place(), rule.status())
            .gives("Z_n / γ_G", net / factor, "N");
        double fall = assumed.gravity(trace);
        return trace.line("ballast-mass", "m_2", "mass of the ballast").in("G_2", weight, "N").in("g_n", fall, "m/s²").from("statics", Status.DERIVED)
            .gives("G_2 / g_n", weight / fall, "kg");
    }

    /** Whether the frame stays where it is: force along the ground and what friction allows, N. */
    public Check sliding(double friction, double vertical, double along, Trace trace) {
        if (!(friction > 0)) {
            throw new UnfitAnswer("friction", "a friction coefficient is a number above 0");
        }
        StabilityRule rule = rules.sliding(rules.of(KEY));
        double mu = trace.given("μ", "friction coefficient", friction, "1", "");
        double v = trace.given("V_d", "vertical force", vertical, "N", "");
        double h = trace.given("H_d", "force along the ground", along, "N", "");
        double factor = trace.line("ratio-required/sliding", "η_s", "ratio that must be reached against sliding").from(rule.place(), rule.status())
            .reads(rule.key(), rule.required(), "1");
        double allowed = trace.line("sliding-resistance", "H_a", "force along the ground that friction allows").in("μ", mu).in("V_d", v, "N").in("η_s", factor)
            .from(rule.place(), rule.status()).gives("μ V_d / η_s", mu * v / factor, "N");
        return Check.of("sliding", rule.title() + ", " + rule.place(), new Check.In("H_d", h), new Check.In("H_a", allowed), "N", "", rule.status(), trace);
    }
}
