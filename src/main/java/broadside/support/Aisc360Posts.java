package broadside.support;

import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/** Steel tubes by AISC 360: chapters F and G, and H3 with torsion; allowable strength or load and resistance factors. */
final class Aisc360Posts implements PostRule {

    private static final LoadSymbols LOADS = LoadSymbols.US;
    private static final String CODE = AiscNominal.CODE;

    private final AiscNominal nominal;
    private final boolean factored;
    private final Figure safety;
    private final Figure weights;

    /**
     * Makes one of the two ways.
     *
     * @param factored  load and resistance factors; otherwise allowable strength
     */
    Aisc360Posts(Edition edition, boolean factored) {
        this.nominal = new AiscNominal(edition);
        this.factored = factored;
        this.safety = nominal.figure(factored ? "phi" : "omega");
        this.weights = Figure.of(edition.rows("weight-factors"), factored ? "us-strength" : "us-asd");
    }

    @Override
    public String title() {
        return factored ? "Steel posts by AISC 360, load and resistance factors (LRFD)" : "Steel posts by AISC 360, allowable strength (ASD)";
    }

    @Override
    public boolean strength() {
        return factored;
    }

    @Override
    public Figure weights() {
        return weights;
    }

    @Override
    public LoadSymbols symbols() {
        return LOADS;
    }

    @Override
    public List<String> notes() {
        return List.of(STEEL_NOTE);
    }

    @Override
    public List<Check> check(Section section, Grade grade, DesignLoad load, Trace trace) {
        PostValues post = new PostValues(section);
        List<Axis> axes = Axis.of(section, load, LOADS);
        double fy = grade.strength().into(trace.line("post-strength", "F_y", "yield strength"));
        double e = grade.modulus().into(trace.line("post-modulus", "E", "modulus of elasticity"));
        Status status = grade.strength().source().status().weaker(Status.RECALLED);
        AiscNominal.Steel steel = nominal.steel(post, load, fy, e, trace);
        AiscNominal.Flats[] flats = new AiscNominal.Flats[axes.size()];
        for (int i = 0; i < flats.length && !steel.round(); i++) {
            flats[i] = nominal.flats(steel, axes.get(i), axes.get(i).sheet(trace));
        }
        AiscNominal.TooThin thin = nominal.tooThin(steel, axes, flats, trace);
        if (thin != null) {
            return List.of(Check.of("wall slenderness", CODE + "table B4.1b and F8: walls beyond the limit are not covered", new Check.In("λ", thin.slenderness()),
                new Check.In("λ_lim", thin.limit()), "1", load.named(), status, trace));
        }
        double factor = safety.into(trace.line("post-safety", factored ? "φ" : "Ω", factored ? "resistance factor" : "safety factor"));
        List<Check> checks = new ArrayList<>();
        double[] bending = new double[flats.length];
        double[] shear = new double[flats.length];
        for (int i = 0; i < flats.length; i++) {
            Axis axis = axes.get(i);
            Trace sheet = axis.sheet(trace);
            double mn = nominal.bending(steel, axis, flats[i], sheet);
            bending[i] = available("post-resistance/bending", "M_c", "available bending strength", factored ? "φ M_n" : "M_n / Ω", "M_n", mn, factor, "N m", sheet);
            checks.add(Check.of(axis.bendingCheck(), CODE + (steel.round() ? "F8" : "F7"), new Check.In(axis.momentSymbol(), axis.moment()), new Check.In("M_c", bending[i]),
                "N m", load.named(), status, sheet));
            bending[i] = axis.bendingShare("M_c", bending[i], CODE + "H3-6", Status.RECALLED, sheet);
            double vn = nominal.shear(steel, axis, flats[i], sheet);
            shear[i] = available("post-resistance/shear", "V_c", "available shear strength", factored ? "φ V_n" : "V_n / Ω", "V_n", vn, factor, "N", sheet);
            checks.add(Check.of(axis.shearCheck(), CODE + (steel.round() ? "G5" : "G4"), new Check.In(axis.shearSymbol(), axis.shear()), new Check.In("V_c", shear[i]), "N",
                load.named(), status, sheet));
            shear[i] = load.twisted() ? axis.shearShare("V_c", shear[i], CODE + "H3-6", Status.RECALLED, sheet) : 0;
        }
        double torsion = load.twisted() ? torsion(steel, axes.get(0), flats[0], factor, status, checks, trace) : 0;
        combined(steel, axes, bending, shear, torsion, factor, status, checks, trace);
        post.normalStress(axes, load, LOADS, "S", "post-stress", trace);
        return checks;
    }

    private double available(String step, String symbol, String meaning, String formula, String of, double value, double factor, String unit, Trace trace) {
        return trace.line(step, symbol, meaning).in(of, value, unit).in(factored ? "φ" : "Ω", factor).from(CODE + "B3", Status.RECALLED)
            .gives(formula, factored ? factor * value : value / factor, unit);
    }

    /** Returns the share of the torsional strength that is used, recorded as η_T. */
    private double torsion(AiscNominal.Steel steel, Axis axis, AiscNominal.Flats flats, double factor, Status status, List<Check> checks, Trace trace) {
        double tn = nominal.torsion(steel, axis, flats, trace);
        double tc = available("post-resistance/torsion", "T_c", "available torsional strength", factored ? "φ T_n" : "T_n / Ω", "T_n", tn, factor, "N m", trace);
        double t = steel.load().torsion();
        checks.add(Check.of("post torsion", CODE + "H3.1", new Check.In(LOADS.torsion(), t), new Check.In("T_c", tc), "N m", steel.load().named(), status, trace));
        return trace.line("post-share/torsion", "η_T", "share of the torsional strength that is used").in(LOADS.torsion(), t, "N m").in("T_c", tc, "N m")
            .from(CODE + "H3-6", Status.RECALLED).gives("T_r / T_c", t / tc, "1");
    }

    /** The sum of H3-6; shear and torsion are left out where the torsion is small, as the clause allows. */
    private void combined(AiscNominal.Steel steel, List<Axis> axes, double[] bending, double[] shear, double torsion, double factor, Status status, List<Check> checks,
                          Trace trace) {
        double area = steel.post().area(trace);
        double pn = trace.line("post-nominal/compression", "P_n", "yield strength in compression").in("F_y", steel.yield(), "Pa").in("A", area, "m²")
            .from(CODE + "E3, short member", Status.RECALLED).gives("F_y A", steel.yield() * area, "N");
        double pc = available("post-resistance/compression", "P_c", "available strength in compression", factored ? "φ P_n" : "P_n / Ω", "P_n", pn, factor, "N", trace);
        Trace.Line line = trace.line("post-combined", "η_c", "compression, bending and, where it counts, shear and torsion together")
            .in(LOADS.axial(), steel.load().axial(), "N").in("P_c", pc, "N").from(CODE + "H3-6", Status.RECALLED);
        double sum = steel.load().axial() / pc;
        double round = torsion;
        for (int i = 0; i < bending.length; i++) {
            line.in(axes.get(i).share(), bending[i]);
            sum += bending[i];
            round += shear[i];
        }
        boolean both = bending.length > 1;
        String formula = both ? "P_r / P_c + η_M + η_{Mz}" : "P_r / P_c + η_M";
        if (torsion > nominal.figure("torsion-ignored").value()) {
            for (int i = 0; i < shear.length; i++) {
                line.in(axes.get(i).shearShare(), shear[i]);
            }
            line.in("η_T", torsion);
            formula += both ? " + (η_V + η_{Vz} + η_T)²" : " + (η_V + η_T)²";
            sum += round * round;
        }
        double combined = line.gives(formula, sum, "1");
        double limit = nominal.figure("sum-limit").into(trace.line("post-combined-limit", "η_lim", "limit of the sum"));
        checks.add(Check.of("post combined", CODE + "H3-6: the sum of the shares", new Check.In("η_c", combined), new Check.In("η_lim", limit), "1", steel.load().named(),
            status, trace));
    }
}
