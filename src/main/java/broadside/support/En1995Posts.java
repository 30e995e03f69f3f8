package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/** Timber posts of a solid rectangle by EN 1995-1-1, outdoors (service class 3). */
final class En1995Posts implements PostRule {

    private static final String CODE = "EN 1995-1-1:2004 + A1:2008, ";
    private static final String STRENGTH = CODE + "2.4.1";

    private final TimberFamilies families;
    private final String duration;
    private final Figure kMod;
    private final Figure peak;
    private final Figure cracks;
    private final Figure slope;
    private final Figure most;
    private final Figure weights;
    private final ElasticPosts elastic;

    /** Makes the rule for wind of a duration class of the table, such as "short" or "instantaneous". */
    En1995Posts(Edition edition, Rows durations, String duration) {
        Rows rows = edition.rows("timber-en");
        this.families = new TimberFamilies(edition);
        this.duration = duration;
        this.kMod = Figure.of(durations, duration, "k-mod");
        this.peak = Figure.of(rows, "shear-peak");
        this.cracks = Figure.of(rows, "cracks");
        this.slope = Figure.of(rows, "shape-slope");
        this.most = Figure.of(rows, "shape-most");
        this.weights = Figure.of(edition.rows("weight-factors"), "en");
        this.elastic = new ElasticPosts(LoadSymbols.EN, this::shearArea);
    }

    @Override
    public String title() {
        return "Timber posts by EN 1995-1-1, design resistances, service class 3, wind as " + duration + (duration.contains("-") || duration.equals("instantaneous")
            ? " load" : "-term load");
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
        return LoadSymbols.EN;
    }

    @Override
    public List<String> notes() {
        return List.of("The cross-section at the foot is checked. Buckling of the post as a column, fixings and rot at the ground line are not: "
            + "timber in the ground has to be of use class 4.");
    }

    @Override
    public List<Check> check(Section section, Grade grade, DesignLoad load, Trace trace) {
        Figure gamma = families.factor(grade).orElseThrow(() -> new UnfitAnswer("posts.grade", grade.name() + " is no grade of EN 338 or EN 14080, such as C24, D30 or GL24h"));
        PostValues post = new PostValues(section);
        Status status = grade.strength().source().status().weaker(Status.RECALLED);
        double k = kMod.into(trace.line("post-duration-factor", "k_mod", "factor for the duration of the load and for damp"));
        double g = gamma.into(trace.line("post-material-factor", "γ_M", "partial factor of the material"));
        double fm = strength("post-strength", "f_{m,k}", "bending strength", "f_m", "post-resistance/stress", grade.strength().value(), grade.strength().source(), k, g,
            "k_mod f_{m,k} / γ_M", trace);
        var shear = grade.shear().orElseThrow(() -> new UnfitAnswer("posts.grade", "no shear strength of " + grade.name() + " is known"));
        double fv = strength("post-strength/shear", "f_{v,k}", "shear strength", "f_v", "post-resistance/shear-stress", shear.value(), shear.source(), k, g,
            "k_mod f_{v,k} / γ_M", trace);
        double ft = load.twisted() ? torsionStrength(post, fv, trace) : fv;
        return elastic.check(post, load, new ElasticPosts.Strengths(fm, fv, ft, CODE + "6.1.6", CODE + "6.1.7", CODE + "6.1.8", CODE + "6.1.6 and 6.2.4, with k_m taken as 1",
            status, false), trace);
    }

    private static double strength(String step, String symbol, String meaning, String design, String designStep, double value, broadside.table.Source source, double k,
                                   double gamma, String formula, Trace trace) {
        double own = trace.line(step, symbol, meaning).from(source.citation(), source.status()).reads("of the grade", value, "Pa");
        return trace.line(designStep, design, meaning).in("k_mod", k).in(symbol, own, "Pa").in("γ_M", gamma).from(STRENGTH, Status.RECALLED)
            .gives(formula, k * own / gamma, "Pa");
    }

    /** The peak of the shear stress over a section that cracks have narrowed, as an area. */
    private double shearArea(PostValues post, Axis axis, Trace trace) {
        double a = post.area(trace);
        double p = peak.into(trace.line("post-shear-peak", "k_p", "peak over mean shear stress"));
        double c = cracks.into(trace.line("post-cracks", "k_cr", "share of the width that cracks leave"));
        return trace.line("post-shear-area", "A_v", "area that carries shear").in("k_cr", c).in("A", a, "m²").in("k_p", p).from(CODE + "6.1.7", Status.RECALLED)
            .gives("k_cr A / k_p", c * a / p, "m²");
    }

    private double torsionStrength(PostValues post, double fv, Trace trace) {
        double h = Math.max(post.section().depth(), post.section().width());
        double b = Math.min(post.section().depth(), post.section().width());
        double s = slope.into(trace.line("post-shape-slope", "k_1", "number of the rule"));
        double m = most.into(trace.line("post-shape-most", "k_2", "number of the rule"));
        double large = trace.line("post-section/larger-side", "h_s", "larger side").from(CODE + "6.1.8", Status.DERIVED).reads(post.section().designation(), h, "m");
        double small = trace.line("post-section/smaller-side", "b_s", "smaller side").from(CODE + "6.1.8", Status.DERIVED).reads(post.section().designation(), b, "m");
        double shape = trace.line("post-shape", "k_shape", "factor for the shape of the section").in("k_1", s).in("h_s", large, "m").in("b_s", small, "m").in("k_2", m)
            .from(CODE + "6.1.8, (6.15)", Status.RECALLED).gives("min(1 + k_1 h_s / b_s; k_2)", Math.min(1 + s * large / small, m), "1");
        return trace.line("post-resistance/torsion-stress", "f_t", "design stress of torsion").in("k_shape", shape).in("f_v", fv, "Pa").from(CODE + "6.1.8, (6.14)", Status.RECALLED)
            .gives("k_shape f_v", shape * fv, "Pa");
    }
}
