package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Embedment of a post by the International Building Code, section 1807.3, at the level of allowable stress. The lateral
 * pressure is taken at a third of the depth that it leads to, so the depth is found by trial.
 *
 * <p>Hand calculation, metric: P = 2 kN at 2.5 m, b = 0.45 m, S = 15.7 kPa/m (not doubled), d = 1.80 m: S1 = 15.7 x 1.80/3 = 9.42 kPa;
 * A = 2.34 x 2/(9.42 x 0.45) = 1.1040 m; d = 0.5 x 1.1040 (1 + sqrt(1 + 4.36 x 2.5/1.1040)) = 2.3721 m: 1.80 m is too little.
 * US: P = 480 lbf at 5 ft, b = 1.5 ft, S = 100 psf/ft, d = 6.44 ft: S1 = 214.67 psf; A = 1123.2/322 = 3.4882 ft;
 * d = 1.7441 (1 + sqrt(1 + 21.8/3.4882)) = 6.440 ft.
 */
public final class IbcEmbedment implements DepthRule {

    private static final double NO_FORCE = 1e-9;
    private static final double PUSH = 1e-6;

    /**
     * Lateral bearing of the soil.
     *
     * @param lateral    for each metre of depth, Pa/m
     * @param doubled    the post may move half an inch at the ground
     * @param increased  a third more counts with wind
     */
    public record Soil(Known lateral, boolean doubled, boolean increased) { }

    private final GroundTables tables;
    private final Soil soil;
    private final boolean paved;
    private final double lateral;
    private final double factor;
    private final Known constant;
    private final Known height;
    private final Known most;
    private final Known limit;
    private final double share;
    private final String pressurePlace;

    /**
     * Takes the soil and records it.
     *
     * @param paved  a rigid floor or pavement at ground level holds the post: constrained. The doubling does not count then
     */
    public IbcEmbedment(GroundTables tables, Soil soil, boolean paved, Trace trace) {
        this.tables = tables;
        this.soil = soil;
        this.paved = paved;
        this.constant = tables.ibc(paved ? "constrained" : "constant");
        this.height = tables.ibc("height");
        this.most = tables.ibc("depth-limit");
        this.limit = tables.ibc("lateral-limit");
        this.share = paved ? 1 : tables.ibc("share").value();
        this.pressurePlace = tables.ibc("share").place() + "; " + limit.place();
        this.lateral = soil.lateral().into(trace.line("lateral-bearing", "S", "allowable lateral bearing for each metre of depth"));
        this.factor = factor(trace);
    }

    private double factor(Trace trace) {
        Known twice = tables.ibc("double");
        Known third = tables.ibc("increase");
        boolean doubled = soil.doubled() && !paved;
        double value = (doubled ? twice.value() : 1) * (soil.increased() ? 1 + 1 / third.value() : 1);
        String how = (doubled ? "doubled: the post may move half an inch at the ground" : "not doubled")
            + (soil.increased() ? "; one third more with wind" : "; no increase with wind");
        Known from = soil.increased() && !doubled ? third : twice;
        return trace.line("lateral-factor", "k_S", "factor on the lateral bearing").from(from.place(), from.status()).reads(how, value, "1");
    }

    @Override
    public String title() {
        return "IBC section 1807.3, embedded post, " + (paved ? "held by a pavement at the ground" : "free at the ground");
    }

    @Override
    public Status status() {
        Status own = tables.ibc(paved ? "constrained" : "constant").status().weaker(soil.lateral().status());
        return soil.doubled() && !paved || soil.increased() ? own.weaker(tables.ibc("double").status()) : own;
    }

    @Override
    public String shearSymbol() {
        return "P";
    }

    @Override
    public String momentSymbol() {
        return "M_g";
    }

    @Override
    public double needed(Column column, Trace trace) {
        Trace quiet = trace.quiet();
        double root = Root.depth(d -> required(column, d, "d_t", quiet) - d);
        double trial = trace.line("trial-depth", "d_t", "depth at which the lateral pressure is taken").from(tables.ibc("share").place(), Status.DERIVED)
            .reads("found by trial, so that the depth needed is the depth assumed", root, "m");
        return required(column, trial, "d_t", trace);
    }

    @Override
    public Check check(Column column, double depth, boolean sized, String named, Trace trace) {
        Trace sheet = sized ? trace.part("chosen") : trace;
        double needed = required(column, depth, "d_f", sheet);
        return Check.of("embedment", title(), new Check.In("d", needed), new Check.In("d_f", depth), "m", named, status(), trace);
    }

    /** Depth needed, m, with the lateral pressure of a depth, m, recorded under {@code symbol}. */
    public double required(Column column, double depth, String symbol, Trace trace) {
        return paved ? constrained(column, depth, symbol, trace) : unconstrained(column, depth, symbol, trace);
    }

    private double pressure(String meaning, String name, double depth, String symbol, Trace trace) {
        String shared = share > 1 ? " / " + (int) share : "";
        double grown = factor * lateral * Math.min(depth, most.value()) / share;
        boolean limited = grown > limit.value() * lateral;
        return trace.line("lateral-pressure", name, meaning).in("k_S", factor).in("S", lateral, "Pa/m").in(symbol, depth, "m")
            .from(pressurePlace, (limited ? limit : most).status().weaker(soil.lateral().status()))
            .gives("min(k_S S min(" + symbol + "; " + most.text() + ")" + shared + "; " + limit.text() + " S)",
                limited ? limit.value() * lateral : grown, "Pa");
    }

    private double unconstrained(Column c, double depth, String symbol, Trace trace) {
        double s1 = pressure("allowable lateral pressure at a third of the depth", "S_1", depth, symbol, trace);
        if (c.shear() < NO_FORCE || c.moment() > c.shear() / PUSH / PUSH) {
            double aH = constant.value() * c.moment() / (s1 * c.width());
            return trace.line("embedment-depth", "d", "embedment needed").in("M_g", c.moment(), "N m").in("S_1", s1, "Pa").in("b", c.width(), "m")
                .from(height.place() + ", its limit for a moment alone", height.status())
                .gives("0.5 (" + height.text() + " (" + constant.text() + " M_g / (S_1 b)))^0.5", 0.5 * Math.sqrt(height.value() * aH), "m");
        }
        double h = trace.line("load-height", "h", "height of the force above the ground").in("M_g", c.moment(), "N m").in("P", c.shear(), "N")
            .from("statics", Status.DERIVED).gives("M_g / P", c.moment() / c.shear(), "m");
        double a = trace.line("embedment-constant", "A", "length in the rule for the embedment").in("P", c.shear(), "N").in("S_1", s1, "Pa")
            .in("b", c.width(), "m").from(constant.place(), constant.status())
            .gives(constant.text() + " P / (S_1 b)", constant.value() * c.shear() / (s1 * c.width()), "m");
        return trace.line("embedment-depth", "d", "embedment needed").in("A", a, "m").in("h", h, "m").from(height.place(), height.status())
            .gives("0.5 A (1 + (1 + " + height.text() + " h / A)^0.5)", 0.5 * a * (1 + Math.sqrt(1 + height.value() * h / a)), "m");
    }

    private double constrained(Column c, double depth, String symbol, Trace trace) {
        double s3 = pressure("allowable lateral pressure at the foot of the post", "S_3", depth, symbol, trace);
        return trace.line("embedment-depth", "d", "embedment needed").in("M_g", c.moment(), "N m").in("S_3", s3, "Pa").in("b", c.width(), "m")
            .from(constant.place(), constant.status())
            .gives("(" + constant.text() + " M_g / (S_3 b))^0.5", Math.sqrt(constant.value() * c.moment() / (s3 * c.width())), "m");
    }
}
