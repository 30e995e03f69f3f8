package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/** What timber and aluminium share: elastic stresses at the foot of a post against design stresses of bending, shear and torsion. */
final class ElasticPosts {

    /**
     * Design stresses of a post, as recorded before.
     *
     * @param bending        Pa, recorded as f_m
     * @param shear          Pa, recorded as f_v
     * @param torsion        Pa, recorded as f_t
     * @param bendingPlace   where the rule of bending stands
     * @param shearPlace     where that of shear stands
     * @param torsionPlace   where that of torsion stands
     * @param combinedPlace  where that of stresses together stands
     * @param status         the weakest of all that goes in
     * @param yields         shear and bending meet in one stress, as in metals; otherwise shear and torsion are added on their own
     */
    record Strengths(double bending, double shear, double torsion, String bendingPlace, String shearPlace, String torsionPlace, String combinedPlace, Status status,
                     boolean yields) { }

    /** Area that carries shear about one axis, recorded as A_v, m2. */
    @FunctionalInterface
    interface ShearArea {
        double of(PostValues post, Axis axis, Trace trace);
    }

    private final LoadSymbols symbols;
    private final ShearArea shearArea;

    ElasticPosts(LoadSymbols symbols, ShearArea shearArea) {
        this.symbols = symbols;
        this.shearArea = shearArea;
    }

    List<Check> check(PostValues post, DesignLoad load, Strengths f, Trace trace) {
        List<Axis> axes = Axis.of(post.section(), load, symbols);
        List<Check> checks = new ArrayList<>();
        double[] areas = new double[axes.size()];
        double[] shares = new double[axes.size()];
        for (int i = 0; i < areas.length; i++) {
            Axis axis = axes.get(i);
            Trace sheet = axis.sheet(trace);
            double w = post.elastic(axis, "W_el", sheet);
            double bending = sheet.line("post-resistance/bending", "M_R", "bending resistance").in("W_el", w, "m³").in("f_m", f.bending, "Pa").from(f.bendingPlace, f.status)
                .gives("W_el f_m", w * f.bending, "N m");
            checks.add(Check.of(axis.bendingCheck(), f.bendingPlace, new Check.In(axis.momentSymbol(), axis.moment()), new Check.In("M_R", bending), "N m", load.named(),
                f.status, sheet));
            areas[i] = shearArea.of(post, axis, sheet);
            double shear = sheet.line("post-resistance/shear", "V_R", "shear resistance").in("A_v", areas[i], "m²").in("f_v", f.shear, "Pa").from(f.shearPlace, f.status)
                .gives("A_v f_v", areas[i] * f.shear, "N");
            checks.add(Check.of(axis.shearCheck(), f.shearPlace, new Check.In(axis.shearSymbol(), axis.shear()), new Check.In("V_R", shear), "N", load.named(), f.status, sheet));
            shares[i] = load.twisted() && !f.yields ? axis.shearShare("V_R", shear, f.combinedPlace, f.status, sheet) : 0;
        }
        if (load.twisted()) {
            torsion(post, axes, load, f, shares, checks, trace);
        }
        boolean together = load.twisted() && f.yields;
        double sigma = post.normalStress(axes, load, symbols, "W_el", together ? "post-stress/normal" : "post-stress", trace);
        double stress = together ? together(post, axes, areas, load, f, sigma, trace) : sigma;
        checks.add(Check.of("post combined", f.combinedPlace, new Check.In(together ? "σ_v" : "σ", stress), new Check.In("f_m", f.bending), "Pa", load.named(), f.status, trace));
        return checks;
    }

    private void torsion(PostValues post, List<Axis> axes, DesignLoad load, Strengths f, double[] shares, List<Check> checks, Trace trace) {
        double w = post.torsion(trace);
        double resistance = trace.line("post-resistance/torsion", "T_R", "torsion resistance").in("W_t", w, "m³").in("f_t", f.torsion, "Pa").from(f.torsionPlace, f.status)
            .gives("W_t f_t", w * f.torsion, "N m");
        checks.add(Check.of("post torsion", f.torsionPlace, new Check.In(symbols.torsion(), load.torsion()), new Check.In("T_R", resistance), "N m", load.named(), f.status, trace));
        if (f.yields) {
            return;
        }
        Trace.Line line = trace.line("post-shear-and-torsion", "η_s", "shear and torsion together").in(symbols.torsion(), load.torsion(), "N m").in("T_R", resistance, "N m")
            .from(f.combinedPlace, f.status);
        double sum = load.torsion() / resistance;
        for (int i = 0; i < shares.length; i++) {
            line.in(axes.get(i).shearShare(), shares[i]);
            sum += shares[i];
        }
        double both = line.gives(symbols.torsion() + (shares.length > 1 ? " / T_R + η_V + η_{Vz}" : " / T_R + η_V"), sum, "1");
        double whole = trace.line("post-shear-and-torsion-limit", "η_{s,lim}", "limit of the sum").from(f.combinedPlace, Status.DERIVED).reads("the whole", 1, "1");
        checks.add(Check.of("post shear and torsion", "the sum of the shares, own rule on the safe side", new Check.In("η_s", both), new Check.In("η_{s,lim}", whole), "1",
            load.named(), f.status, trace));
    }

    private double together(PostValues post, List<Axis> axes, double[] areas, DesignLoad load, Strengths f, double sigma, Trace trace) {
        double w = post.torsion(trace);
        double tau = trace.line("post-stress/torsion", "τ_t", "stress of torsion").in(symbols.torsion(), load.torsion(), "N m").in("W_t", w, "m³").from(f.torsionPlace, f.status)
            .gives(symbols.torsion() + " / W_t", load.torsion() / w, "Pa");
        for (int i = 0; i < areas.length; i++) {
            Axis axis = axes.get(i);
            tau = axis.sheet(trace).line("post-stress/shear", "τ", "stress of torsion and shear").in(i == 0 ? "τ_t" : "τ", tau, "Pa").in(axis.shearSymbol(), axis.shear(), "N")
                .in("A_v", areas[i], "m²").from(f.combinedPlace, f.status).gives((i == 0 ? "τ_t + " : "τ + ") + axis.shearSymbol() + " / A_v", tau + axis.shear() / areas[i], "Pa");
        }
        return trace.line("post-stress", "σ_v", "stress of bending, compression, shear and torsion together").in("σ", sigma, "Pa").in("τ", tau, "Pa")
            .from(f.combinedPlace, f.status).gives("(σ² + 3 τ²)^0.5", Math.sqrt(sigma * sigma + 3 * tau * tau), "Pa");
    }
}
