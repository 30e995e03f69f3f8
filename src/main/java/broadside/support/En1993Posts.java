package broadside.support;

import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/** Steel tubes by EN 1993-1-1: plastic where the class allows it, elastic with torsion. */
final class En1993Posts implements PostRule {

    private static final String CODE = "EN 1993-1-1:2005, ";
    private static final String SHEAR = CODE + "6.2.6";
    private static final String TORSION = CODE + "6.2.7";
    private static final String BENDING = CODE + "6.2.5";
    private static final String REDUCED = CODE + "6.2.8";
    private static final String SUM = CODE + "6.2.1(7)";
    private static final String ELASTIC = CODE + "6.2.1(5)";
    private static final LoadSymbols LOADS = LoadSymbols.EN;

    private final En1993Classes classes;
    private final Figure gammaM0;
    private final Figure shearShare;
    private final Figure sumLimit;
    private final Figure weights;

    En1993Posts(Edition edition) {
        this.classes = new En1993Classes(edition);
        this.gammaM0 = Figure.of(edition.rows("steel-en"), "gamma-m0");
        this.shearShare = Figure.of(edition.rows("steel-en"), "shear-share");
        this.sumLimit = Figure.of(edition.rows("steel-en"), "sum-limit");
        this.weights = Figure.of(edition.rows("weight-factors"), "en");
    }

    @Override
    public String title() {
        return "Steel posts by EN 1993-1-1, design resistances";
    }

    @Override
    public boolean strength() {
        return true;
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
        double fy = grade.strength().into(trace.line("post-strength", "f_y", "yield strength"));
        Status status = grade.strength().source().status().weaker(Status.RECALLED);
        En1993Classes.Found found = classes.of(post, axes, post.wall(trace), fy, trace);
        if (found.number() > 3) {
            return List.of(Check.of("wall slenderness", "EN 1993-1-1:2005, table 5.2, class 3. Thinner walls buckle before they yield: class 4 and EN 1993-1-6 are not covered",
                new Check.In("λ", found.slenderness()), new Check.In("λ_lim", found.limit()), "1", load.named(), status.weaker(classes.status()), trace));
        }
        Steel steel = new Steel(post, axes, load, fy, gammaM0.into(trace.line("post-material-factor", "γ_M0", "partial factor of the material")), status);
        List<Check> checks = new ArrayList<>();
        double torsion = load.twisted() ? torsion(steel, checks, trace) : 0;
        double[] shares = new double[axes.size()];
        double[] areas = new double[axes.size()];
        for (int i = 0; i < shares.length; i++) {
            Axis axis = axes.get(i);
            Trace sheet = axis.sheet(trace);
            areas[i] = shearArea(steel, axis, sheet);
            shares[i] = bent(steel, axis, found.number(), areas[i], torsion, checks, sheet);
        }
        if (load.twisted()) {
            stressed(steel, areas, torsion, checks, trace);
        } else {
            summed(steel, shares, checks, trace);
        }
        return checks;
    }

    /** What all steps share: yield strength in Pa. */
    private record Steel(PostValues post, List<Axis> axes, DesignLoad load, double yield, double gamma, Status status) {

        Trace.Line strength(Trace.Line line) {
            return line.in("f_y", yield, "Pa").in("γ_M0", gamma);
        }

        double shearStrength() {
            return yield / (Math.sqrt(3) * gamma);
        }
    }

    /** St Venant torsion of a closed section; returns its stress, recorded as τ_t, Pa. */
    private double torsion(Steel steel, List<Check> checks, Trace trace) {
        double w = steel.post.torsion(trace);
        double t = steel.load.torsion();
        double resistance = steel.strength(trace.line("post-resistance/torsion", "T_Rd", "torsion resistance")).in("W_t", w, "m³").from(TORSION, Status.RECALLED)
            .gives("W_t f_y / (3^0.5 γ_M0)", w * steel.shearStrength(), "N m");
        checks.add(Check.of("post torsion", TORSION, new Check.In(LOADS.torsion(), t), new Check.In("T_Rd", resistance), "N m", steel.load.named(), steel.status, trace));
        return trace.line("post-stress/torsion", "τ_t", "stress of torsion").in(LOADS.torsion(), t, "N m").in("W_t", w, "m³").from(TORSION, Status.RECALLED)
            .gives("T_Ed / W_t", t / w, "Pa");
    }

    private static double shearArea(Steel steel, Axis axis, Trace trace) {
        double a = steel.post.area(trace);
        if (steel.post.round()) {
            return trace.line("post-shear-area", "A_v", "area that carries shear").in("A", a, "m²").from(SHEAR, Status.RECALLED).reads("2 A / π", 2 * a / Math.PI, "m²");
        }
        double h = steel.post.depth(axis, trace);
        double b = steel.post.across(axis, trace);
        return trace.line("post-shear-area", "A_v", "area that carries shear").in("A", a, "m²").in("h_s", h, "m").in("b_s", b, "m").from(SHEAR, Status.RECALLED)
            .gives("A h_s / (b_s + h_s)", a * h / (b + h), "m²");
    }

    /** Shear and bending about one axis; returns the share of the bending resistance that is used. */
    private double bent(Steel steel, Axis axis, int number, double area, double torsion, List<Check> checks, Trace trace) {
        double shear = steel.strength(trace.line("post-resistance/shear", "V_{pl,Rd}", "shear resistance")).in("A_v", area, "m²").from(SHEAR, Status.RECALLED)
            .gives("A_v f_y / (3^0.5 γ_M0)", area * steel.shearStrength(), "N");
        String shearSymbol = "V_{pl,Rd}";
        if (steel.load.twisted()) {
            shearSymbol = "V_{pl,T,Rd}";
            shear = steel.strength(trace.line("post-resistance/shear-with-torsion", shearSymbol, "shear resistance beside the torsion")).in("τ_t", torsion, "Pa")
                .in("V_{pl,Rd}", shear, "N").from(TORSION + ", (6.28)", Status.RECALLED)
                .gives("max(0; 1 - τ_t / (f_y / (3^0.5 γ_M0))) V_{pl,Rd}", Math.max(0, 1 - torsion / steel.shearStrength()) * shear, "N");
        }
        checks.add(Check.of(axis.shearCheck(), SHEAR, new Check.In(axis.shearSymbol(), axis.shear()), new Check.In(shearSymbol, shear), "N", steel.load.named(), steel.status,
            trace));
        boolean plastic = number < 3;
        String modulus = plastic ? "W_pl" : "W_el";
        double w = plastic ? steel.post.plastic(axis, modulus, trace) : steel.post.elastic(axis, modulus, trace);
        double bending = steel.strength(trace.line("post-resistance/bending", "M_{c,Rd}", "bending resistance")).in(modulus, w, "m³").from(BENDING, Status.RECALLED)
            .gives(plastic ? "W_pl f_y / γ_M0" : "W_el f_y / γ_M0", w * steel.yield / steel.gamma, "N m");
        String symbol = "M_{c,Rd}";
        if (axis.shear() > shearShare.value() * shear) {
            symbol = "M_{V,Rd}";
            bending = reduced(axis, shearSymbol, shear, bending, trace);
        }
        checks.add(Check.of(axis.bendingCheck(), BENDING, new Check.In(axis.momentSymbol(), axis.moment()), new Check.In(symbol, bending), "N m", steel.load.named(),
            steel.status, trace));
        return steel.load.twisted() ? 0 : axis.bendingShare(symbol, bending, SUM, Status.RECALLED, trace);
    }

    /** The whole bending resistance is reduced, not only the part of the webs: safe, and right for a round tube. */
    private static double reduced(Axis axis, String shearSymbol, double shear, double bending, Trace trace) {
        Trace.Line line = trace.line("post-shear-reduction", "ρ", "share of the yield strength that the shear takes").in(axis.shearSymbol(), axis.shear(), "N")
            .in(shearSymbol, shear, "N").from(REDUCED, Status.RECALLED);
        double half = shear > 0 ? 2 * axis.shear() / shear - 1 : 1;
        double rho = shear > 0 ? line.gives("(2 " + axis.shearSymbol() + " / " + shearSymbol + " - 1)²", half * half, "1") : line.reads("all of it", 1, "1");
        return trace.line("post-resistance/bending-with-shear", "M_{V,Rd}", "bending resistance beside the shear").in("ρ", rho).in("M_{c,Rd}", bending, "N m")
            .from(REDUCED, Status.RECALLED).gives("max(0; 1 - ρ) M_{c,Rd}", Math.max(0, 1 - rho) * bending, "N m");
    }

    private void summed(Steel steel, double[] shares, List<Check> checks, Trace trace) {
        double area = steel.post.area(trace);
        double axial = steel.strength(trace.line("post-resistance/compression", "N_{pl,Rd}", "resistance to compression")).in("A", area, "m²")
            .from(CODE + "6.2.4", Status.RECALLED).gives("A f_y / γ_M0", area * steel.yield / steel.gamma, "N");
        Trace.Line line = trace.line("post-combined", "η_c", "compression and bending together").in(LOADS.axial(), steel.load.axial(), "N").in("N_{pl,Rd}", axial, "N")
            .from(SUM + ", (6.2)", Status.RECALLED);
        double sum = steel.load.axial() / axial;
        for (int i = 0; i < shares.length; i++) {
            line.in(steel.axes.get(i).share(), shares[i]);
            sum += shares[i];
        }
        double combined = line.gives(shares.length > 1 ? "N_Ed / N_{pl,Rd} + η_M + η_{Mz}" : "N_Ed / N_{pl,Rd} + η_M", sum, "1");
        double limit = sumLimit.into(trace.line("post-combined-limit", "η_lim", "limit of the sum"));
        checks.add(Check.of("post combined", SUM + ", (6.2): the sum of the shares", new Check.In("η_c", combined), new Check.In("η_lim", limit), "1", steel.load.named(),
            steel.status, trace));
        steel.post.normalStress(steel.axes, steel.load, LOADS, "W_el", "post-stress", trace);
    }

    /** The greatest normal stress and the shear stresses taken at one point, which is safe: they peak at different ones. */
    private void stressed(Steel steel, double[] areas, double torsion, List<Check> checks, Trace trace) {
        double sigma = steel.post.normalStress(steel.axes, steel.load, LOADS, "W_el", "post-stress/normal", trace);
        double tau = torsion;
        for (int i = 0; i < areas.length; i++) {
            Axis axis = steel.axes.get(i);
            tau = axis.sheet(trace).line("post-stress/shear", "τ", "stress of torsion and shear").in(i == 0 ? "τ_t" : "τ", tau, "Pa").in(axis.shearSymbol(), axis.shear(), "N")
                .in("A_v", areas[i], "m²").from(ELASTIC, Status.RECALLED)
                .gives((i == 0 ? "τ_t + " : "τ + ") + axis.shearSymbol() + " / A_v", tau + axis.shear() / areas[i], "Pa");
        }
        double stress = trace.line("post-stress", "σ_v", "stress of bending, compression, shear and torsion together").in("σ", sigma, "Pa").in("τ", tau, "Pa")
            .from(ELASTIC + ", (6.1)", Status.RECALLED).gives("(σ² + 3 τ²)^0.5", Math.sqrt(sigma * sigma + 3 * tau * tau), "Pa");
        double design = steel.strength(trace.line("post-resistance/stress", "f_d", "design strength")).from(ELASTIC, Status.RECALLED)
            .gives("f_y / γ_M0", steel.yield / steel.gamma, "Pa");
        checks.add(Check.of("post combined", ELASTIC + ", (6.1): elastic stresses", new Check.In("σ_v", stress), new Check.In("f_d", design), "Pa", steel.load.named(),
            steel.status, trace));
    }
}
