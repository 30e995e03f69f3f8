package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Short pile in clay, free at its head, by Broms: soil reaction 9 cu b below 1.5 b. Loads of service with a factor; the
 * closed form printed in the style of AASHTO is this one with the moment taken over the shear.
 *
 * <p>Hand calculation, metric: V = 2 kN, M = 5 kN m, factor 2.5, b = 0.5 m, cu = 40 kPa: V_F = 5 kN, M_F = 12.5 kN m; f = 5/(9 x 40 x 0.5) = 0.02778 m;
 * M_max = 12.5 + 5 (0.75 + 0.01389) = 16.3194 kN m; g = sqrt(16.3194/(2.25 x 40 x 0.5)) = 0.60221 m; L = 0.75 + 0.02778 + 0.60221 = 1.3800 m.
 * US: V = 1000 lbf, M = 10 000 lbf ft, factor 2, b = 2 ft, cu = 1000 psf: V_F = 2000, M_F = 20 000; f = 2000/18 000 = 0.11111 ft;
 * M_max = 20 000 + 2000 (3 + 0.05556) = 26 111 lbf ft; g = sqrt(26 111/4500) = 2.40883 ft; L = 5.5199 ft.
 */
public final class BromsClay implements DepthRule {

    private final GroundTables tables;
    private final Known soil;
    private final double cohesion;
    private final double factor;

    /**
     * Takes the undrained strength, Pa, and the factor on the loads, and records them.
     *
     * @throws UnfitAnswer when the clay has no strength
     */
    public BromsClay(GroundTables tables, Known cohesion, Known factor, Trace trace) {
        if (!(cohesion.value() > 0)) {
            throw new UnfitAnswer("footing.cohesion",
                "clay without strength holds nothing: give its undrained shear strength, such as \"40 kPa\", or another rule");
        }
        this.tables = tables;
        this.soil = cohesion;
        this.cohesion = cohesion.into(trace.line("cohesion", "c_u", "undrained shear strength"));
        this.factor = BromsSand.factor(factor, trace);
    }

    @Override
    public String title() {
        return "Broms, short pile in clay";
    }

    @Override
    public Status status() {
        return soil.status().weaker(tables.broms("lower").status());
    }

    @Override
    public double needed(Column c, Trace trace) {
        double v = BromsSand.factoredShear(factor, c, trace);
        double m = BromsSand.factoredMoment(factor, c, trace);
        Known dead = tables.broms("dead-zone");
        double f = zeroShear(v, "V_F", c.width(), trace);
        double most = trace.line("pier-moment", "M_max", "greatest moment in the pier, with the factor").in("M_F", m, "N m").in("V_F", v, "N")
            .in("b", c.width(), "m").in("f", f, "m").from(dead.place(), dead.status())
            .gives("M_F + V_F (" + dead.text() + " b + 0.5 f)", m + v * (dead.value() * c.width() + 0.5 * f), "N m");
        Known lower = tables.broms("lower");
        double g = trace.line("pier-lower-part", "g", "length below that turns the moment").in("M_max", most, "N m").in("c_u", cohesion, "Pa")
            .in("b", c.width(), "m").from(lower.place(), lower.status())
            .gives("(M_max / (" + lower.text() + " c_u b))^0.5", Math.sqrt(most / (lower.value() * cohesion * c.width())), "m");
        return trace.line("embedment-depth", "d", "embedment needed").in("b", c.width(), "m").in("f", f, "m").in("g", g, "m")
            .from(dead.place(), dead.status()).gives(dead.text() + " b + f + g", dead.value() * c.width() + f + g, "m");
    }

    @Override
    public Check check(Column column, double depth, boolean sized, String named, Trace trace) {
        double needed = needed(column, sized ? trace.quiet() : trace);
        return Check.of("embedment", title(), new Check.In("d", needed), new Check.In("d_f", depth), "m", named, status(), trace);
    }

    /**
     * Ultimate load, N, of a pile of a given length, without a factor.
     *
     * @param width   m, recorded as "b"
     * @param length  in the ground, m, recorded as "d_f"
     * @param height  of the load above the ground, m, recorded as "h"
     * @throws UnfitAnswer when the pile does not reach below the part without reaction
     */
    public double capacity(double width, double length, double height, Trace trace) {
        Known dead = tables.broms("dead-zone");
        Known reaction = tables.broms("reaction");
        double zone = dead.value() * width;
        if (!(length > zone)) {
            throw new UnfitAnswer("footing.depth", "a pile in clay must reach deeper than " + dead.text() + " times its width");
        }
        double reach = trace.line("pier-reach", "L_0", "length that the soil holds").in("d_f", length, "m").in("b", width, "m")
            .from(dead.place(), dead.status()).gives("d_f - " + dead.text() + " b", length - zone, "m");
        double k = trace.line("pier-reaction", "k", "reaction of the soil for each metre").in("c_u", cohesion, "Pa").in("b", width, "m")
            .from(reaction.place(), reaction.status()).gives(reaction.text() + " c_u b", reaction.value() * cohesion * width, "N/m");
        double beta = trace.line("quadratic-coefficient", "β", "coefficient of P in P² + β P = k² L_0²").in("k", k, "N/m").in("h", height, "m")
            .in("b", width, "m").in("L_0", reach, "m").from("moments about the point of zero shear", Status.DERIVED)
            .gives("4 k (h + " + dead.text() + " b + 0.5 L_0)", 4 * k * (height + zone + 0.5 * reach), "N");
        double p = trace.line("ultimate-lateral-load", "P_u", "ultimate load of the pile, without a factor").in("β", beta, "N").in("k", k, "N/m")
            .in("L_0", reach, "m").from("root of the quadratic above", Status.DERIVED)
            .gives("(k L_0)² / (0.5 β + (0.25 β² + (k L_0)²)^0.5)",
                k * reach * k * reach / (0.5 * beta + Math.sqrt(beta * beta / 4 + k * reach * k * reach)), "N");
        double f = zeroShear(p, "P_u", width, trace);
        trace.line("pier-lower-part", "g", "length below that turns the moment").in("L_0", reach, "m").in("f", f, "m").from(dead.place(), dead.status())
            .gives("L_0 - f", reach - f, "m");
        trace.line("pier-moment", "M_max", "greatest moment in the pier").in("P_u", p, "N").in("h", height, "m").in("b", width, "m").in("f", f, "m")
            .from(dead.place(), dead.status()).gives("P_u (h + " + dead.text() + " b + 0.5 f)", p * (height + zone + 0.5 * f), "N m");
        return p;
    }

    private double zeroShear(double shear, String symbol, double width, Trace trace) {
        Known reaction = tables.broms("reaction");
        return trace.line("pier-zero-shear", "f", "depth of zero shear below the part without reaction").in(symbol, shear, "N").in("c_u", cohesion, "Pa")
            .in("b", width, "m").from(reaction.place(), reaction.status())
            .gives(symbol + " / (" + reaction.text() + " c_u b)", shear / (reaction.value() * cohesion * width), "m");
    }
}
