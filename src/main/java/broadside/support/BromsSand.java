package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Short pile in sand, free at its head, by Broms: three passive pressures, moments about its foot. Loads of service with a
 * factor.
 *
 * <p>Hand calculation, metric: V_F = 11.391 kN at 2.5 m, b = 0.5 m, 18 kN/m3, 30 degrees: K_p = 1.5/0.5 = 3; at d = 1.5 m:
 * resistance 0.5 x 18 x 0.5 x 3.375 x 3 = 45.5625 kN m; asked 11.391 (2.5 + 1.5) = 45.564 kN m. f = sqrt(2 x 11.391/(3 x 18 x 0.5 x 3)) = 0.5303 m;
 * M_max = 28.4775 + 2/3 x 11.391 x 0.5303 = 32.504 kN m. US: V_F = 1000 lbf, M_F = 8000 lbf ft, b = 2 ft, 110 lbf/ft3, 30 degrees, d = 4 ft:
 * resistance 0.5 x 110 x 2 x 64 x 3 = 21 120; asked 8000 + 4000 = 12 000 lbf ft.
 */
public final class BromsSand implements DepthRule {

    private final Known pressures;
    private final Status soil;
    private final double unitWeight;
    private final double passive;
    private final double factor;

    /**
     * Takes the angle of friction, rad, the density that counts (less that of water where it stands high), kg/m3, and the
     * factor on the loads, and records them.
     *
     * @throws UnfitAnswer for an angle that no sand has, or a density not above zero
     */
    public BromsSand(GroundTables tables, Known angle, Known density, Known factor, Trace trace) {
        Known least = tables.size("least-friction");
        Known most = tables.size("most-friction");
        if (!(angle.value() >= least.value() - 1e-9 && angle.value() <= most.value() + 1e-9)) {
            throw new UnfitAnswer("footing.friction-angle", "an angle of friction of sand lies between " + degrees(least) + " and " + degrees(most)
                + " degrees");
        }
        if (!(density.value() > 0)) {
            throw new UnfitAnswer("footing.soil-density", "the density of the soil must be above zero, and above that of water where the water stands high");
        }
        this.pressures = tables.broms("sand-pressure");
        this.soil = angle.status().weaker(density.status());
        double phi = angle.into(trace.line("friction-angle", "φ", "angle of friction of the sand"));
        double sine = trace.line("friction-angle-sine", "s_φ", "its sine").in("φ", phi, "rad").from("trigonometry", Status.DERIVED)
            .reads("sine of φ", Math.sin(phi), "1");
        this.passive = trace.line("passive-coefficient", "K_p", "coefficient of passive pressure").in("s_φ", sine).from("Rankine", Status.RECALLED)
            .gives("(1 + s_φ) / (1 - s_φ)", (1 + sine) / (1 - sine), "1");
        double rho = density.into(trace.line("soil-density", "ρ_s", "density of the soil that counts"));
        double g = tables.size("gravity").into(trace.line("gravity", "g", "acceleration of free fall"));
        this.unitWeight = trace.line("soil-unit-weight", "γ", "unit weight of the soil that counts").in("ρ_s", rho, "kg/m³").in("g", g, "m/s²")
            .from("definition of weight", Status.DERIVED).gives("ρ_s g", rho * g, "Pa/m");
        this.factor = factor(factor, trace);
    }

    private static long degrees(Known angle) {
        return Math.round(Math.toDegrees(angle.value()));
    }

    @Override
    public String title() {
        return "Broms, short pile in sand";
    }

    @Override
    public Status status() {
        return soil.weaker(pressures.status());
    }

    @Override
    public double needed(Column c, Trace trace) {
        Trace quiet = trace.quiet();
        double v = factoredShear(factor, c, trace);
        double m = factoredMoment(factor, c, trace);
        double root = Root.depth(d -> demand(v, m, d, quiet) - resistance(c.width(), d, quiet));
        return trace.line("embedment-depth", "d", "embedment needed").from(pressures.place(), status())
            .reads("found by trial, so that the soil resists what is asked about the foot of the pile", root, "m");
    }

    @Override
    public Check check(Column c, double depth, boolean sized, String named, Trace trace) {
        if (!sized) {
            needed(c, trace);
        }
        double v = factoredShear(factor, c, trace.quiet());
        double m = factoredMoment(factor, c, trace.quiet());
        double demand = demand(v, m, depth, trace);
        double capacity = resistance(c.width(), depth, trace);
        moment(v, m, c.width(), trace);
        return Check.of("embedment", title(), new Check.In("M_t", demand), new Check.In("M_{R,t}", capacity), "N m", named, status(), trace);
    }

    private double demand(double shear, double moment, double depth, Trace trace) {
        return trace.line("foot-demand", "M_t", "moment about the foot of the pile").in("M_F", moment, "N m").in("V_F", shear, "N").in("d_f", depth, "m")
            .from("statics", Status.DERIVED).gives("M_F + V_F d_f", moment + shear * depth, "N m");
    }

    private double resistance(double width, double depth, Trace trace) {
        return trace.line("foot-resistance", "M_{R,t}", "moment of the soil about the foot of the pile").in("γ", unitWeight, "Pa/m").in("b", width, "m")
            .in("d_f", depth, "m").in("K_p", passive).from(pressures.place(), pressures.status())
            .gives(pressures.text() + " γ b d_f^3 K_p / 6", pressures.value() * unitWeight * width * depth * depth * depth * passive / 6, "N m");
    }

    /** Greatest moment in the pier, N m, below the ground where its shear is zero. */
    private double moment(double shear, double moment, double width, Trace trace) {
        double f = trace.line("pier-zero-shear", "f", "depth of zero shear").in("V_F", shear, "N").in("γ", unitWeight, "Pa/m").in("b", width, "m")
            .in("K_p", passive).from(pressures.place(), pressures.status())
            .gives("(2 V_F / (" + pressures.text() + " γ b K_p))^0.5", Math.sqrt(2 * shear / (pressures.value() * unitWeight * width * passive)), "m");
        return trace.line("pier-moment", "M_max", "greatest moment in the pier, with the factor").in("M_F", moment, "N m").in("V_F", shear, "N")
            .in("f", f, "m").from("statics", Status.DERIVED).gives("M_F + 2 V_F f / 3", moment + 2 * shear * f / 3, "N m");
    }

    /**
     * Ultimate load, N, of a pile of a given length, without a factor.
     *
     * @param width   m, recorded as "b"
     * @param length  in the ground, m, recorded as "d_f"
     * @param height  of the load above the ground, m, recorded as "h"
     */
    public double capacity(double width, double length, double height, Trace trace) {
        double resistance = resistance(width, length, trace);
        return trace.line("ultimate-lateral-load", "P_u", "ultimate load of the pile, without a factor").in("M_{R,t}", resistance, "N m").in("h", height, "m")
            .in("d_f", length, "m").from("moments about the foot of the pile", Status.DERIVED)
            .gives("M_{R,t} / (h + d_f)", resistance / (height + length), "N");
    }

    static double factor(Known factor, Trace trace) {
        if (!(factor.value() >= 1)) {
            throw new UnfitAnswer("footing.load-factor", "the factor on the loads of an ultimate method must be at least 1");
        }
        return factor.into(trace.line("load-factor", "n_F", "factor on the loads of an ultimate method"));
    }

    static double factoredShear(double factor, Column c, Trace trace) {
        return trace.line("factored-shear", "V_F", "shear at the ground with the factor").in("n_F", factor).in("V_s", c.shear(), "N")
            .from("definition of the factor", Status.DERIVED).gives("n_F V_s", factor * c.shear(), "N");
    }

    static double factoredMoment(double factor, Column c, Trace trace) {
        return trace.line("factored-moment", "M_F", "moment at the ground with the factor").in("n_F", factor).in("M_s", c.moment(), "N m")
            .from("definition of the factor", Status.DERIVED).gives("n_F M_s", factor * c.moment(), "N m");
    }
}
