package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/** Timber posts of a solid rectangle by NDS, allowable stress design, wet service. */
final class NdsPosts implements PostRule {

    private static final String CODE = "NDS 2015, ";
    private static final double ROUNDING = 1e-9;

    private final TimberFamilies european;
    private final Figure duration;
    private final Figure wetBending;
    private final Figure wetShear;
    private final Figure wetTimber;
    private final Figure timberSize;
    private final Figure peak;
    private final Figure torsionShare;
    private final Figure weights;
    private final ElasticPosts elastic = new ElasticPosts(LoadSymbols.US, this::shearArea);

    NdsPosts(Edition edition) {
        Rows rows = edition.rows("timber-us");
        this.european = new TimberFamilies(edition);
        this.duration = Figure.of(rows, "duration");
        this.wetBending = Figure.of(rows, "wet-bending");
        this.wetShear = Figure.of(rows, "wet-shear");
        this.wetTimber = Figure.of(rows, "wet-timber");
        this.timberSize = Figure.of(rows, "timber-size");
        this.peak = Figure.of(rows, "shear-peak");
        this.torsionShare = Figure.of(rows, "torsion-share");
        this.weights = Figure.of(edition.rows("weight-factors"), "us-asd");
    }

    @Override
    public String title() {
        return "Timber posts by NDS, allowable stress design (ASD), wet service";
    }

    @Override
    public boolean strength() {
        return false;
    }

    @Override
    public Figure weights() {
        return weights;
    }

    @Override
    public LoadSymbols symbols() {
        return LoadSymbols.US;
    }

    @Override
    public List<String> notes() {
        return List.of("The cross-section at the foot is checked. Buckling of the post as a column, fixings and rot at the ground line are not. NDS has no rule for torsion: "
            + "a share of the shear stress is used. Sizes above 12 in need a size factor, which is not counted.");
    }

    @Override
    public List<Check> check(Section section, Grade grade, DesignLoad load, Trace trace) {
        if (european.factor(grade).isPresent()) {
            throw new NoAnswer(grade.name() + " is a European grade with characteristic strengths; NDS needs reference stresses, such as those of "
                + "Southern Pine No.2");
        }
        PostValues post = new PostValues(section);
        boolean timber = Math.min(section.depth(), section.width()) >= timberSize.value() * (1 - ROUNDING);
        double cd = duration.into(trace.line("post-duration-factor", "C_D", "factor for the duration of the load"));
        double fb = allowable("post-strength", "F_b", "reference bending stress", "f_m", "post-resistance/stress", grade.strength().value(), grade.strength().source(), cd,
            timber ? wetTimber : wetBending, "F_b C_D C_M", trace);
        var shear = grade.shear().orElseThrow(() -> new UnfitAnswer("posts.grade", "no shear stress of " + grade.name() + " is known"));
        double fv = allowable("post-strength/shear", "F_v", "reference shear stress", "f_v", "post-resistance/shear-stress", shear.value(), shear.source(), cd,
            timber ? wetTimber : wetShear, "F_v C_D C_M", trace);
        double ft = fv;
        if (load.twisted()) {
            double share = torsionShare.into(trace.line("post-torsion-share", "k_t", "share of the shear stress allowed in torsion"));
            ft = trace.line("post-resistance/torsion-stress", "f_t", "allowable stress of torsion").in("k_t", share).in("f_v", fv, "Pa")
                .from("own rule: NDS has none", torsionShare.status()).gives("k_t f_v", share * fv, "Pa");
        }
        Status status = grade.strength().source().status().weaker(Status.RECALLED);
        return elastic.check(post, load, new ElasticPosts.Strengths(fb, fv, ft, CODE + "3.3", CODE + "3.4", "own rule: NDS has none", CODE + "3.9, linear sum", status, false),
            trace);
    }

    private static double allowable(String step, String symbol, String meaning, String design, String designStep, double value, Source source, double cd, Figure wet,
                                    String formula, Trace trace) {
        double own = trace.line(step, symbol, meaning).from(source.citation(), source.status()).reads("of the grade", value, "Pa");
        double cm = wet.into(trace.line("post-wet-factor", "C_M", "factor for wet service"));
        return trace.line(designStep, design, "allowable stress").in(symbol, own, "Pa").in("C_D", cd).in("C_M", cm).from(CODE + "table 4.3.1", Status.RECALLED)
            .gives(formula, own * cd * cm, "Pa");
    }

    private double shearArea(PostValues post, Axis axis, Trace trace) {
        double a = post.area(trace);
        double p = peak.into(trace.line("post-shear-peak", "k_p", "peak over mean shear stress"));
        return trace.line("post-shear-area", "A_v", "area that carries shear").in("A", a, "m²").in("k_p", p).from(CODE + "3.4.2", Status.RECALLED).gives("A / k_p", a / p, "m²");
    }
}
