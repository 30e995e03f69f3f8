package broadside.support;

import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;

/** Torsional capacity of a round tube in Australian practice: φ 0.6 f_y C. A check from outside; no route uses it. */
public final class TubeTorsion {

    private final Figure phi;
    private final Figure shearYield;

    public TubeTorsion(Edition edition) {
        this.phi = Figure.of(edition.rows("torsion-au"), "phi");
        this.shearYield = Figure.of(edition.rows("torsion-au"), "shear-yield");
    }

    /** Capacity in N m of a tube of outside diameter D and wall t, m, recorded under these symbols, and yield strength f_y, Pa. */
    public double capacity(double diameter, double wall, double yield, Trace trace) {
        double outer = diameter / 2;
        double inner = outer - wall;
        double c = trace.line("section-modulus-torsion", "C", "section modulus of torsion").in("D", diameter, "m").in("t", wall, "m").from("theory of torsion", Status.DERIVED)
            .reads("π (r_o⁴ - r_i⁴) / (2 r_o) with r_o = D / 2, r_i = D / 2 - t", Math.PI * (Math.pow(outer, 4) - Math.pow(inner, 4)) / (2 * outer), "m³");
        double p = phi.into(trace.line("post-safety", "φ", "capacity factor"));
        double k = shearYield.into(trace.line("post-shear-yield", "k_v", "yield strength in shear over that in tension"));
        return trace.line("post-resistance/torsion", "φT_u", "torsional capacity").in("φ", p).in("k_v", k).in("f_y", yield, "Pa").in("C", c, "m³")
            .from(phi.place(), phi.status()).gives("φ k_v f_y C", p * k * yield * c, "N m");
    }
}
