package broadside.codes;

import broadside.panel.PostSection;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/** Wind on posts by plain fluid mechanics: long sections, without a reduction for their length. */
final class OpenFlowMembers implements MemberRule {

    private final Constants constants;
    private final Curve cylinder;
    private final Curve rectangles;

    OpenFlowMembers(Edition edition) {
        this.constants = new Constants(edition);
        this.cylinder = edition.curve("cylinder");
        this.rectangles = edition.curve("rectangles");
    }

    @Override
    public double coefficient(PostSection section, double length, double pressure, Trace trace) {
        return section.shape() == PostSection.Shape.ROUND ? round(section, pressure, trace) : box(section, trace);
    }

    @Override
    public String words() {
        return "plain fluid mechanics, as the code has no rule here";
    }

    /**
     * The coefficient falls by more than half at a Reynolds number that posts of signs meet, and turbulence and
     * roughness shift it: the value before the fall counts, and the curve is shown beside it.
     */
    private double round(PostSection section, double pressure, Trace trace) {
        Source air = constants.source("sea-level-density");
        double density = constants.number("sea-level-density");
        double speed = trace.line("post-speed", "v_p", "wind speed that belongs to the pressure, in air at sea level").in("q_m", pressure, "Pa")
            .from(air.citation(), air.status()).gives("(2 q_m / " + Numbers.plain(density) + ")^0.5", Math.sqrt(2 * pressure / density), "m/s");
        Source viscosity = constants.source("kinematic-viscosity");
        double nu = constants.number("kinematic-viscosity");
        double re = trace.line("reynolds-number/post", "R_p", "Reynolds number of the post").in("v_p", speed, "m/s").in("b_p", section.width(), "m")
            .from(viscosity.citation(), viscosity.status())
            .gives("100000 v_p b_p / " + Numbers.plain(nu), 100_000 * speed * section.width() / nu, "1");
        if (re >= cylinder.first() && re <= cylinder.last()) {
            cylinder.at("CD", re).into(trace.line("cylinder-curve", "C_s", "a smooth cylinder in an even wind; not credited").in("R_p", re));
        }
        Source rule = constants.source("round-post");
        return trace.line("coefficient/post", "c_p", "force coefficient of a round post, not reduced for its length").from(rule.citation(), rule.status())
            .reads("the value before the fall, at any speed", constants.number("round-post"), "1");
    }

    private double box(PostSection section, Trace trace) {
        double width = trace.given("b_p", "width of a post across the wind", section.width(), "m", "");
        double depth = trace.given("d_p", "depth of a post along the wind", section.depth(), "m", "");
        double ratio = trace.line("post-aspect", "d/b", "depth over width of the post").in("d_p", depth, "m").in("b_p", width, "m")
            .from("geometry", Status.DERIVED).gives("d_p / b_p", depth / width, "1");
        return rectangles.at("CD", ratio).into(trace.line("coefficient/post", "c_p",
            "force coefficient of a box post with sharp edges, not reduced for its length").in("d/b", ratio));
    }
}
