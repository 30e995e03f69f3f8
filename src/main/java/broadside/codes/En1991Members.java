package broadside.codes;

import broadside.panel.PostSection;
import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;

/** Slender members of EN 1991-1-4: rectangular sections by 7.6 and circular cylinders by 7.9, without the relief of their ends. */
final class En1991Members implements MemberRule {

    private final Constants constants;
    private final Curve rectangular;
    private final Rows cylinder;

    En1991Members(Edition edition) {
        this.constants = new Constants(edition);
        this.rectangular = edition.curve("rectangular-sections");
        this.cylinder = edition.rows("circular-cylinder");
    }

    @Override
    public double coefficient(PostSection section, double length, double pressure, Trace trace) {
        return section.shape() == PostSection.Shape.ROUND ? round(section, pressure, trace) : rectangular(section, trace);
    }

    @Override
    public String words() {
        return "EN 1991-1-4, 7.6 or 7.9";
    }

    private double rectangular(PostSection section, Trace trace) {
        Source place = rectangular.at("c_f0", 1).source();
        double d = trace.given("d_p", "depth of a post along the wind", section.depth(), "m", "");
        double ratio = trace.line("section-ratio", "d/b", "depth of the post over its width").in("d_p", d, "m").in("b_p", section.width(), "m")
            .from(place.citation(), place.status()).gives("d_p / b_p", d / section.width(), "1");
        double cf0 = rectangular.at("c_f0", Numbers.atLeast(ratio, rectangular.first()) ? Math.max(ratio, rectangular.first()) : ratio).into(trace.line("member-coefficient", "c_{f,0}", "force coefficient of a rectangular section").in("d/b", ratio));
        double corner = constants.entry("corner-factor").into(trace.line("corner-factor", "ψ_r", "corner factor, sharp corners"));
        double end = end(trace);
        return trace.line("coefficient/post", "c_p", "force coefficient of the post").in("c_{f,0}", cf0).in("ψ_r", corner).in("ψ_λ", end)
            .from(place.citation(), place.status()).gives("c_{f,0} ψ_r ψ_λ", cf0 * corner * end, "1");
    }

    private double end(Trace trace) {
        return constants.entry("end-effect-factor").into(trace.line("end-effect-factor", "ψ_λ", "end-effect factor, its safe end"));
    }

    /** Thin posts take the subcritical value; for others the larger of the falling and the supercritical branch, not above it. */
    private double round(PostSection section, double pressure, Trace trace) {
        Coefficient most = cylinder.number("subcritical", "value");
        Source place = most.source();
        double width = section.width();
        double least = metres("least-width");
        Trace.Line line = trace.line("member-coefficient", "c_{f,0}", "force coefficient of a circular cylinder").from(place.citation(), place.status());
        double cf0 = Numbers.atLeast(width, least) ? byReynolds(width, pressure, trace) : line.in("b_p", width, "m")
            .reads("the value below the drop, as the post is thinner than " + cylinder.text("least-width", "value") + " mm", most.value(), "1");
        double end = end(trace);
        return trace.line("coefficient/post", "c_p", "force coefficient of the post").in("c_{f,0}", cf0).in("ψ_λ", end)
            .from(place.citation(), place.status()).gives("c_{f,0} ψ_λ", cf0 * end, "1");
    }

    private double byReynolds(double width, double pressure, Trace trace) {
        Source place = cylinder.number("falling-factor", "value").source();
        double re = reynolds(width, pressure, trace);
        double most = cylinder.number("subcritical", "value").value();
        double reference = cylinder.number("reynolds-reference", "value").value();
        String share = "R_e / " + Numbers.plain(reference);
        double falling = trace.line("falling-branch", "c_{f,a}", "falling branch of the curve").in("R_e", re).from(place.citation(), place.status())
            .gives(text("falling-factor") + " / (" + share + ")^" + text("falling-exponent"), value("falling-factor") / Math.pow(re / reference, value("falling-exponent")), "1");
        Trace.Line line = trace.line("member-coefficient", "c_{f,0}", "force coefficient of a circular cylinder").from(place.citation(), place.status());
        if (falling >= most) {
            return line.in("c_{f,a}", falling).reads("the value below the drop, as the falling branch does not lie below it", most, "1");
        }
        double k = trace.line("surface-roughness", "k", "equivalent roughness of galvanised steel")
            .from(cylinder.number("roughness", "value").source().citation(), place.status()).reads("read at galvanised steel", metres("roughness"), "m");
        double multiple = value("roughness-multiple");
        double log = Math.log(multiple * k / width) / Math.log(10);
        double logRe = Math.log(re / reference) / Math.log(10);
        double above = trace.line("supercritical-branch", "c_{f,b}", "supercritical branch of the curve").in("k", k, "m").in("b_p", width, "m").in("R_e", re)
            .from(place.citation(), place.status())
            .gives(text("supercritical") + " + " + text("roughness-slope") + " ln(" + text("roughness-multiple") + " k / b_p) / ln(10) / (1 + " + text("reynolds-slope")
                + " ln(" + share + ") / ln(10))", value("supercritical") + value("roughness-slope") * log / (1 + value("reynolds-slope") * logRe), "1");
        return line.in("c_{f,a}", falling).in("c_{f,b}", above)
            .gives("min(" + Numbers.plain(most) + "; max(c_{f,a}; c_{f,b}))", Math.min(most, Math.max(falling, above)), "1");
    }

    private double reynolds(double width, double pressure, Trace trace) {
        Source place = cylinder.number("kinematic-viscosity", "value").source();
        double rho = constants.entry("air-density").into(trace.line("post-air-density", "ρ_p", "air density for the speed at the post"));
        double v = trace.line("post-speed", "v_p", "peak wind velocity at the post").in("q_m", pressure, "Pa").in("ρ_p", rho, "kg/m³")
            .from(place.citation(), place.status()).gives("(2 q_m / ρ_p)^0.5", Math.sqrt(2 * pressure / rho), "m/s");
        double nu = trace.line("kinematic-viscosity", "ν", "kinematic viscosity of air").from(place.citation(), place.status())
            .reads("as printed", value("kinematic-viscosity"), "m²/s");
        return trace.line("reynolds-number", "R_e", "Reynolds number").in("b_p", width, "m").in("v_p", v, "m/s").in("ν", nu, "m²/s")
            .from(place.citation(), place.status()).gives("b_p v_p / ν", width * v / nu, "1");
    }

    private double value(String key) {
        return cylinder.number(key, "value").value();
    }

    private String text(String key) {
        return Numbers.plain(value(key));
    }

    private double metres(String key) {
        return value(key) * Unit.of(Dimension.LENGTH, cylinder.text(key, "unit")).orElseThrow().toSi();
    }
}
