package broadside.job;

import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.support.PostFrequency;
import broadside.support.TubeTorsion;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import tools.jackson.databind.JsonNode;

/** Published checks of posts without a job: a mass on a tube, a pipe in bending, a tube in torsion. */
final class PostParts {

    static final List<String> NAMES = List.of("tip-mass-frequency", "post-bending-asd", "post-modulus-needed", "post-torsion");

    private static final String STATICS = "statics";
    private static final String BEAM = "beam theory: cantilever fixed at the ground";

    private final Edition edition;
    private final TubeTorsion torsion;

    PostParts(Edition edition) {
        this.edition = edition;
        this.torsion = new TubeTorsion(edition);
    }

    Trace run(String part, JsonNode given) {
        Trace trace = new Trace();
        switch (part) {
            case "tip-mass-frequency" -> frequency(given, trace);
            case "post-bending-asd" -> bending(given, trace);
            case "post-modulus-needed" -> modulus(given, trace);
            case "post-torsion" -> torsion.capacity(put(given, "diameter", Dimension.LENGTH, "168.3 mm", "D", "m", trace),
                put(given, "wall", Dimension.LENGTH, "6.4 mm", "t", "m", trace), put(given, "strength", Dimension.PRESSURE, "350 MPa", "f_y", "Pa", trace), trace);
            default -> throw new IllegalArgumentException(part);
        }
        return trace;
    }

    private void frequency(JsonNode given, Trace trace) {
        double i = put(given, "inertia", Dimension.INERTIA, "100 cm4", "I", "m⁴", trace);
        double e = put(given, "modulus", Dimension.PRESSURE, "210000 MPa", "E", "Pa", trace);
        double l = put(given, "length", Dimension.LENGTH, "3 m", "L_t", "m", trace);
        double tip = given.has("tip-mass") ? value(given, "tip-mass", Dimension.MASS, "12 kg", true) : 0;
        trace.given("m_t", "tip mass", tip, "kg", PublishedChecks.text(given, "tip-mass"));
        double post = put(given, "post-mass", Dimension.MASS, "25 kg", "m_p", "kg", trace);
        new PostFrequency(edition).of("frequency", e, i, l, tip, post, trace);
    }

    /** Wind on panels of one post by allowable stress, with each force bending the post at its own height only. */
    private void bending(JsonNode given, Trace trace) {
        double q = put(given, "pressure", Dimension.PRESSURE, "24.7 psf", "p", "Pa", trace);
        JsonNode panels = given.path("panels");
        if (!panels.isArray() || panels.isEmpty()) {
            throw PublishedChecks.bad("panels: a list of panels is due, each with its area and height, like [{ \"area\": \"16 ft2\", \"height\": \"5 ft\" }]");
        }
        double turning = 0;
        double cubes = 0;
        for (JsonNode panel : panels) {
            double a = value(panel, "area", Dimension.AREA, "16 ft2", false);
            double z = value(panel, "height", Dimension.LENGTH, "5 ft", false);
            turning += a * z;
            cubes += a * z * z * z;
        }
        double areas = trace.given("A_z", "sum of area times height", turning, "m³", "");
        double m = trace.line("post-moment", "M", "moment at the ground").in("p", q, "Pa").in("A_z", areas, "m³").from(STATICS, Status.DERIVED).gives("p A_z", q * areas, "N m");
        double fy = put(given, "strength", Dimension.PRESSURE, "35000 psi", "F_y", "Pa", trace);
        double s = put(given, "section-modulus", Dimension.VOLUME, "1.72 in3", "S", "m³", trace);
        double omega = edition.rows("aisc-360").number("omega", "value").into(trace.line("post-safety", "Ω", "safety factor"));
        double mn = trace.line("post-nominal/bending", "M_n", "moment at which the outermost fibre yields").in("F_y", fy, "Pa").in("S", s, "m³").from(STATICS, Status.DERIVED)
            .gives("F_y S", fy * s, "N m");
        double mc = trace.line("post-resistance/bending", "M_c", "allowable moment").in("M_n", mn, "N m").in("Ω", omega).from("AISC 360-16, B3", Status.RECALLED)
            .gives("M_n / Ω", mn / omega, "N m");
        trace.line("utilisation/post-bending", "η", "share of the allowable moment").in("M", m, "N m").in("M_c", mc, "N m").from(STATICS, Status.DERIVED).gives("M / M_c", m / mc, "1");
        if (given.has("inertia")) {
            double i = put(given, "inertia", Dimension.INERTIA, "3.0 in4", "I", "m⁴", trace);
            double e = put(given, "modulus", Dimension.PRESSURE, "29000000 psi", "E", "Pa", trace);
            double sum = trace.given("A_{zzz}", "sum of area times height cubed", cubes, "m⁵", "");
            trace.line("post-deflection", "δ", "sum of the deflections, each at the height of its own force").in("p", q, "Pa").in("A_{zzz}", sum, "m⁵").in("E", e, "Pa")
                .in("I", i, "m⁴").from(BEAM, Status.DERIVED).gives("p A_{zzz} / (3 E I)", q * sum / (3 * e * i), "m");
            double share = edition.rows("deflection-limits").number("l-80", "share").into(trace.line("post-deflection-share", "k_δ", "share of the height that is allowed"));
            double l = put(given, "limit-height", Dimension.LENGTH, "60 in", "L", "m", trace);
            trace.line("post-deflection-limit", "δ_lim", "deflection that is allowed").in("k_δ", share).in("L", l, "m").from("L/80", Status.READ).gives("k_δ L", share * l, "m");
        }
    }

    private static void modulus(JsonNode given, Trace trace) {
        double q = put(given, "pressure", Dimension.PRESSURE, "30 psf", "p", "Pa", trace);
        double a = put(given, "area", Dimension.AREA, "50 ft2", "A", "m²", trace);
        double z = put(given, "height", Dimension.LENGTH, "22.5 ft", "z", "m", trace);
        double f = put(given, "allowable-stress", Dimension.PRESSURE, "28571 psi", "F_b", "Pa", trace);
        double m = trace.line("post-moment", "M", "moment at the ground").in("p", q, "Pa").in("A", a, "m²").in("z", z, "m").from(STATICS, Status.DERIVED)
            .gives("p A z", q * a * z, "N m");
        trace.line("post-modulus-needed", "S", "section modulus that is needed").in("M", m, "N m").in("F_b", f, "Pa").from(STATICS, Status.DERIVED).gives("M / F_b", m / f, "m³");
    }

    private static double put(JsonNode given, String name, Dimension dimension, String example, String symbol, String unit, Trace trace) {
        return trace.given(symbol, name.replace('-', ' '), value(given, name, dimension, example, false), unit, PublishedChecks.text(given, name));
    }

    private static double value(JsonNode given, String name, Dimension dimension, String example, boolean zero) {
        Reading reading = Typed.read(PublishedChecks.text(given, name), dimension);
        if (!(reading instanceof Reading.Value value) || !(zero ? value.si() >= 0 : value.si() > 0)) {
            throw PublishedChecks.bad(name + ": a " + dimension.word() + (zero ? " not below zero" : " above zero") + " is typed with its unit, like \"" + example + "\"");
        }
        return value.si();
    }
}
