package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/** Aluminium tubes by elastic stresses: f_o/γ_M1 of EN 1999-1-1, or yielding of the Aluminum Design Manual. */
final class AluminiumPosts implements PostRule {

    private static final String EN = "EN 1999-1-1:2007, ";
    private static final String US = "Aluminum Design Manual, yielding";

    /** The way of checking. */
    enum Way {
        EN("en", "gamma-m1", "γ_M1", "f_o / γ_M1"), ALLOWABLE("us-asd", "omega", "Ω", "f_o / Ω"), FACTORED("us-strength", "phi", "φ", "φ f_o");

        private final String route;
        private final String key;
        private final String symbol;
        private final String formula;

        Way(String route, String key, String symbol, String formula) {
            this.route = route;
            this.key = key;
            this.symbol = symbol;
            this.formula = formula;
        }
    }

    private final Way way;
    private final Figure safety;
    private final Figure roundShear;
    private final Figure shearYield;
    private final Figure weights;
    private final ElasticPosts elastic;

    AluminiumPosts(Edition edition, Way way) {
        Rows rows = edition.rows("aluminium");
        this.way = way;
        this.safety = Figure.of(rows, way.key);
        this.roundShear = Figure.of(rows, "shear-area-round");
        this.shearYield = Figure.of(rows, "shear-yield");
        this.weights = Figure.of(edition.rows("weight-factors"), way.route);
        this.elastic = new ElasticPosts(symbols(), this::shearArea);
    }

    @Override
    public String title() {
        return "Aluminium posts, elastic stresses by " + switch (way) {
            case EN -> "EN 1999-1-1, design resistances";
            case ALLOWABLE -> "the Aluminum Design Manual, allowable strength (ASD)";
            case FACTORED -> "the Aluminum Design Manual, load and resistance factors (LRFD)";
        };
    }

    @Override
    public boolean strength() {
        return way != Way.ALLOWABLE;
    }

    @Override
    public Figure weights() {
        return weights;
    }

    @Override
    public LoadSymbols symbols() {
        return way == Way.EN ? LoadSymbols.EN : LoadSymbols.US;
    }

    @Override
    public List<String> notes() {
        return List.of("Local buckling of the wall is not checked, and the softer zone beside welds is not counted: at welds of T6 tempers about half of the strength is left. "
            + "Buckling of the post as a column, holes and the base are not checked.");
    }

    @Override
    public List<Check> check(Section section, Grade grade, DesignLoad load, Trace trace) {
        String place = way == Way.EN ? EN + "6.2.1" : US;
        Status status = grade.strength().source().status().weaker(Status.RECALLED);
        double fo = grade.strength().into(trace.line("post-strength", "f_o", "0.2 % proof strength"));
        double s = safety.into(trace.line("post-safety", way.symbol, way == Way.FACTORED ? "resistance factor" : "safety factor of the material"));
        double f = trace.line("post-resistance/stress", "f_m", "design strength").in("f_o", fo, "Pa").in(way.symbol, s).from(place, Status.RECALLED)
            .gives(way.formula, way == Way.FACTORED ? s * fo : fo / s, "Pa");
        double fv = shearStrength(f, trace);
        double ft = load.twisted() ? trace.line("post-resistance/torsion-stress", "f_t", "design strength in torsion").in("f_v", fv, "Pa").from(place, Status.RECALLED)
            .gives("f_v", fv, "Pa") : fv;
        return elastic.check(new PostValues(section), load, new ElasticPosts.Strengths(f, fv, ft, way == Way.EN ? EN + "6.2.5, elastic" : US, way == Way.EN ? EN + "6.2.6" : US,
            way == Way.EN ? EN + "6.2.7" : US, way == Way.EN ? EN + "6.2.1, (6.15): elastic stresses" : US + ": elastic stresses", status, true), trace);
    }

    private double shearStrength(double f, Trace trace) {
        if (way == Way.EN) {
            return trace.line("post-resistance/shear-stress", "f_v", "design strength in shear").in("f_m", f, "Pa").from(EN + "6.2.6", Status.RECALLED)
                .gives("f_m / 3^0.5", f / Math.sqrt(3), "Pa");
        }
        double k = shearYield.into(trace.line("post-shear-yield", "k_v", "yield strength in shear over that in tension"));
        return trace.line("post-resistance/shear-stress", "f_v", "design strength in shear").in("k_v", k).in("f_m", f, "Pa").from(US, Status.RECALLED).gives("k_v f_m", k * f, "Pa");
    }

    private double shearArea(PostValues post, Axis axis, Trace trace) {
        double a = post.area(trace);
        if (post.round()) {
            double share = roundShear.into(trace.line("post-shear-share", "η_v", "share of the area that carries shear"));
            return trace.line("post-shear-area", "A_v", "area that carries shear").in("η_v", share).in("A", a, "m²").from(EN + "6.2.6", Status.RECALLED)
                .gives("η_v A", share * a, "m²");
        }
        double h = post.depth(axis, trace);
        double b = post.across(axis, trace);
        return trace.line("post-shear-area", "A_v", "area that carries shear: the part of the webs").in("A", a, "m²").in("h_s", h, "m").in("b_s", b, "m")
            .from("share of the webs in a thin tube", Status.DERIVED).gives("A h_s / (b_s + h_s)", a * h / (b + h), "m²");
    }
}
