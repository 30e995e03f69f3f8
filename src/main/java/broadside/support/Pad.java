package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * A block or slab that holds by its weight. The moment is taken about its base, and the soil at its sides counts for nothing.
 *
 * <p>Hand calculation, metric: 5 kN at 3 m, B = L = 1.6 m, 0.5 m deep, N = 40 kN: M = 15 + 2.5 = 17.5 kN m; e = 17.5/40 = 0.4375 m, above B/6 = 0.2667;
 * contact 3 (0.8 - 0.4375) = 1.0875 m; q = 2 x 40/(1.6 x 1.0875) = 45.977 kPa; ratio 40 x 0.8/17.5 = 1.8286. US: N = 10 kip, M = 10 kip ft at the base,
 * B = L = 4 ft: e = 1 ft, above 0.6667; contact 3 ft; q = 20/(4 x 3) = 1.6667 ksf; ratio 10 x 2/10 = 2.
 */
public final class Pad {

    private static final String STATICS = "statics of a rigid pad on ground that takes no tension";

    /**
     * A pad, m, and what stands on it.
     *
     * @param along   in the direction of the moment, symbol "B"
     * @param across  symbol "L"
     * @param weight  permanent, on the pad, N, recorded as "G_f"
     */
    public record Block(double along, double across, double depth, double weight) { }

    /**
     * What the ground under a pad can take.
     *
     * @param bearing   allowable pressure, Pa
     * @param friction  coefficient, when {@code cohesive} is false; otherwise the cohesion on the area in contact, Pa
     */
    public record Soil(Known bearing, Known friction, boolean cohesive) { }

    private final GroundTables tables;
    private final Known density;

    /**
     * A pad of concrete.
     *
     * @param density  of the concrete that counts (less that of water where it stands high), kg/m3
     */
    public Pad(GroundTables tables, Known density) {
        this.tables = tables;
        this.density = density;
    }

    /** Weight on the ground, N, recorded as "N", above zero also where boards beside the posts lift the pad; the sizes were recorded as "B", "L" and "d_f". */
    public double vertical(Block block, Trace trace) {
        double rho = density.into(trace.line("concrete-density", "ρ_c", "density of the concrete that counts"));
        double g = tables.size("gravity").into(trace.line("gravity", "g", "acceleration of free fall"));
        double own = trace.line("pad-weight", "W_p", "weight of the pad").in("ρ_c", rho, "kg/m³").in("g", g, "m/s²").in("B", block.along(), "m")
            .in("L", block.across(), "m").in("d_f", block.depth(), "m").from("definition of weight", Status.DERIVED)
            .gives("ρ_c g B L d_f", rho * g * block.along() * block.across() * block.depth(), "N");
        return trace.line("vertical-load", "N", "weight on the ground").in("G_f", block.weight(), "N").in("W_p", own, "N").from("statics", Status.DERIVED)
            .gives("max(W_p / 1000; G_f + W_p)", Math.max(own / 1000, block.weight() + own), "N");
    }

    /** Moment at the base, N m, of a shear and a moment at the ground recorded as "V_f" and "M_f"; recorded as "M_b". */
    public double baseMoment(double shear, double moment, double depth, Trace trace) {
        return trace.line("pad-moment", "M_b", "moment at the base of the pad").in("M_f", moment, "N m").in("V_f", shear, "N").in("d_f", depth, "m")
            .from("statics", Status.DERIVED).gives("M_f + V_f d_f", moment + shear * depth, "N m");
    }

    /** Length in contact, m, recorded as "c"; 0 when the resultant leaves the base. */
    public double contact(double vertical, double moment, String symbol, double along, Trace trace) {
        double e = trace.line("pad-eccentricity", "e", "resultant from the middle of the base").in(symbol, moment, "N m").in("N", vertical, "N")
            .from(STATICS, Status.READ).gives(symbol + " / N", moment / vertical, "m");
        return trace.line("contact-length", "c", "length in contact with the ground").in("B", along, "m").in("e", e, "m").from(STATICS, Status.READ)
            .gives("max(0; min(B; 3 (B / 2 - e)))", Math.max(0, Math.min(along, 3 * (along / 2 - e))), "m");
    }

    /**
     * Greatest pressure on the ground, Pa, recorded as "q_max"; where nothing is in contact, the pressure of the weight alone,
     * recorded as "q_w" under another name.
     */
    public double pressure(double vertical, double moment, String symbol, Block block, Trace trace) {
        double along = block.along();
        double across = block.across();
        double c = contact(vertical, moment, symbol, along, trace);
        double e = moment / vertical;
        String meaning = "greatest pressure on the ground";
        if (c <= 0) {
            return trace.line("bearing-pressure-of-weight", "q_w", "pressure of the weight alone: no pressure balances the moment").in("N", vertical, "N")
                .in("B", along, "m").in("L", across, "m").from(STATICS, Status.READ).gives("N / (B L)", vertical / (along * across), "Pa");
        }
        if (c < along) {
            return trace.line("bearing-pressure", "q_max", meaning).in("N", vertical, "N").in("L", across, "m").in("c", c, "m").from(STATICS, Status.READ)
                .gives("2 N / (L c)", 2 * vertical / (across * c), "Pa");
        }
        trace.line("bearing-pressure-least", "q_min", "least pressure on the ground").in("N", vertical, "N").in("B", along, "m").in("L", across, "m")
            .in("e", e, "m").from(STATICS, Status.READ).gives("N / (B L) (1 - 6 e / B)", vertical / (along * across) * (1 - 6 * e / along), "Pa");
        return trace.line("bearing-pressure", "q_max", meaning).in("N", vertical, "N").in("B", along, "m").in("L", across, "m").in("e", e, "m")
            .from(STATICS, Status.READ).gives("N / (B L) (1 + 6 e / B)", vertical / (along * across) * (1 + 6 * e / along), "Pa");
    }

    /** Moment, N m, that the weight resists about the edge, recorded as "M_R". */
    public double resisting(double vertical, double along, Trace trace) {
        return trace.line("resisting-moment", "M_R", "moment of the weight about the edge").in("N", vertical, "N").in("B", along, "m")
            .from(STATICS, Status.READ).gives("N B / 2", vertical * along / 2, "N m");
    }

    /** Overturning by a rule of stability whose factors were recorded; {@code moment} is that at the base, N m. */
    Check overturning(Stability rule, Block block, double vertical, double moment, String named, Trace trace) {
        double resisting = resisting(vertical, block.along(), trace);
        double demand = rule.demand("overturning", "M_E", "M_b", moment, "N m", trace);
        double capacity = trace.line("overturning-capacity", "M_C", "resisting moment with the factor on weight").in("γ_g", rule.onWeight())
            .in("M_R", resisting, "N m").from(rule.place(), rule.status()).gives("γ_g M_R", rule.onWeight() * resisting, "N m");
        rule.ratio("overturning", capacity, "M_C", moment, "M_b", "N m", trace);
        return Check.of("overturning", rule.title(), new Check.In("M_E", demand), new Check.In("M_C", capacity), "N m", named, rule.status(), trace);
    }

    /** Sliding by a rule of stability; friction on the weight, or cohesion on the area in contact up to a share of the weight. */
    Check sliding(Stability rule, Soil soil, double friction, Block block, double vertical, FootLoad wind, double baseMoment, Trace trace) {
        double capacity = soil.cohesive() ? cohesive(rule, friction, block, vertical, baseMoment, soil.friction().status(), trace)
            : trace.line("sliding-resistance", "R_s", "friction under the pad").in("μ", friction).in("γ_g", rule.onWeight()).in("N", vertical, "N")
                .from(soil.friction().place(), soil.friction().status()).gives("μ γ_g N", friction * rule.onWeight() * vertical, "N");
        double demand = rule.demand("sliding", "H_E", "V_f", wind.shear(), "N", trace);
        rule.ratio("sliding", capacity, "R_s", wind.shear(), "V_f", "N", trace);
        return Check.of("sliding", rule.title(), new Check.In("H_E", demand), new Check.In("R_s", capacity), "N", wind.named(),
            rule.status().weaker(soil.friction().status()), trace);
    }

    private double cohesive(Stability rule, double cohesion, Block block, double vertical, double baseMoment, Status status, Trace trace) {
        Known limit = tables.ibc("cohesion-limit");
        double e = trace.line("sliding-eccentricity", "e_s", "resultant from the middle of the base, with the factors").in("γ_w", rule.onWind())
            .in("k_w", rule.level()).in("M_b", baseMoment, "N m").in("γ_g", rule.onWeight()).in("N", vertical, "N").from(STATICS, Status.READ)
            .gives("γ_w k_w M_b / (γ_g N)", rule.onWind() * rule.level() * baseMoment / (rule.onWeight() * vertical), "m");
        double c = trace.line("sliding-contact-length", "c_s", "length in contact, with the factors").in("B", block.along(), "m").in("e_s", e, "m")
            .from(STATICS, Status.READ).gives("max(0; min(B; 3 (B / 2 - e_s)))", Math.max(0, Math.min(block.along(), 3 * (block.along() / 2 - e))), "m");
        return trace.line("sliding-resistance", "R_s", "cohesion under the pad").in("c_a", cohesion, "Pa").in("L", block.across(), "m").in("c_s", c, "m")
            .in("γ_g", rule.onWeight()).in("N", vertical, "N").from(limit.place(), limit.status().weaker(status))
            .gives("min(c_a L c_s; γ_g N / " + limit.text() + ")", Math.min(cohesion * block.across() * c, rule.onWeight() * vertical / limit.value()), "N");
    }

    /** Pressure at the level of service against what is allowed; nothing is allowed where the pad overturns. */
    Check bearing(Soil soil, double allowed, Block block, double vertical, double service, String named, Trace trace) {
        double q = pressure(vertical, service, "M_s", block, trace);
        boolean held = contact(vertical, service, "M_s", block.along(), trace.quiet()) > 0;
        double capacity = held ? allowed : trace.line("bearing-none", "q_0", "pressure that balances the moment").from(STATICS, Status.READ)
            .reads("none: the resultant leaves the base", 0, "Pa");
        return Check.of("bearing", "pressure under the pad at the level of service", new Check.In(held ? "q_max" : "q_w", q),
            new Check.In(held ? "q_a" : "q_0", capacity), "Pa", named, soil.bearing().status().weaker(Status.READ), trace);
    }
}
