package broadside.support;

import broadside.support.Section.Properties;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * From the sizes of a section to its properties: area in m2, inertia in m4, moduli in m3, mass in kg/m. The sizes stand on
 * the sheet as D_s (diameter), H_s (depth), B_s (width), t_s (wall that is counted) and t_n (wall as sold).
 */
final class SectionShape {

    static final String GEOMETRY = "geometry of the section";

    private static final Trace NOWHERE = new Trace().quiet();

    private final Curve rectangle;

    SectionShape(Materials materials) {
        this.rectangle = materials.rectangle();
    }

    /** The properties alone. */
    Properties quietly(Sizes sizes, Coefficient density) {
        return of(sizes, density, NOWHERE);
    }

    /** Records the properties of sizes that stand on the sheet. */
    Properties of(Sizes sizes, Coefficient density, Trace trace) {
        return switch (sizes.form()) {
            case ROUND_TUBE -> roundTube(sizes, density, trace);
            case RECTANGULAR_TUBE -> RectangularTube.of(sizes, density, trace);
            case SOLID_RECTANGLE -> solid(sizes, density, trace);
        };
    }

    private static Properties roundTube(Sizes sizes, Coefficient density, Trace trace) {
        double outer = sizes.depth();
        double wall = sizes.wall();
        double inner = trace.line("section-inner-diameter", "d_s", "inner diameter of the section").in("D_s", outer, "m").in("t_s", wall, "m")
            .from(GEOMETRY, Status.DERIVED).gives("D_s - 2 t_s", outer - 2 * wall, "m");
        double area = diameters(trace.line("section-area", "A_s", "area of the section"), outer, inner)
            .gives("π / 4 (D_s² - d_s²)", Math.PI / 4 * (outer * outer - inner * inner), "m²");
        double inertia = diameters(trace.line("section-inertia", "I_s", "second moment of area"), outer, inner)
            .gives("π / 64 (D_s^4 - d_s^4)", Math.PI / 64 * (Math.pow(outer, 4) - Math.pow(inner, 4)), "m⁴");
        double elastic = trace.line("section-modulus-elastic", "W_{el}", "elastic section modulus").in("I_s", inertia, "m⁴").in("D_s", outer, "m")
            .from(GEOMETRY, Status.DERIVED).gives("2 I_s / D_s", 2 * inertia / outer, "m³");
        double plastic = diameters(trace.line("section-modulus-plastic", "W_{pl}", "plastic section modulus"), outer, inner)
            .gives("(D_s^3 - d_s^3) / 6", (Math.pow(outer, 3) - Math.pow(inner, 3)) / 6, "m³");
        double torsionInertia = trace.line("section-torsion-inertia", "I_t", "torsion constant").in("I_s", inertia, "m⁴")
            .from(GEOMETRY, Status.DERIVED).gives("2 I_s", 2 * inertia, "m⁴");
        double torsionModulus = trace.line("section-torsion-modulus", "W_t", "torsion modulus").in("W_{el}", elastic, "m³")
            .from(GEOMETRY, Status.DERIVED).gives("2 W_{el}", 2 * elastic, "m³");
        double sold = sizes.nominal() == wall ? area : trace.line("section-area/nominal", "A_n", "area with the wall as sold").in("D_s", outer, "m")
            .in("t_n", sizes.nominal(), "m").from(GEOMETRY, Status.DERIVED)
            .gives("π (D_s - t_n) t_n", Math.PI * (outer - sizes.nominal()) * sizes.nominal(), "m²");
        double mass = mass(density, sizes.nominal() == wall ? "A_s" : "A_n", sold, trace);
        return new Properties(area, inertia, inertia, elastic, elastic, plastic, plastic, torsionInertia, torsionModulus, mass);
    }

    private static Trace.Line diameters(Trace.Line line, double outer, double inner) {
        return line.in("D_s", outer, "m").in("d_s", inner, "m").from(GEOMETRY, Status.DERIVED);
    }

    private Properties solid(Sizes sizes, Coefficient density, Trace trace) {
        double depth = sizes.depth();
        double width = sizes.width();
        double area = sides(trace.line("section-area", "A_s", "area of the section"), sizes).gives("H_s B_s", depth * width, "m²");
        double inertia = sides(trace.line("section-inertia", "I_s", "second moment of area"), sizes)
            .gives("B_s H_s^3 / 12", width * Math.pow(depth, 3) / 12, "m⁴");
        double elastic = sides(trace.line("section-modulus-elastic", "W_{el}", "elastic section modulus"), sizes)
            .gives("B_s H_s² / 6", width * depth * depth / 6, "m³");
        double plastic = sides(trace.line("section-modulus-plastic", "W_{pl}", "plastic section modulus"), sizes)
            .gives("B_s H_s² / 4", width * depth * depth / 4, "m³");
        boolean square = depth == width;
        double weakInertia = square ? inertia : sides(trace.line("section-inertia/weak", "I_{s,z}", "second moment of area, weak axis"), sizes)
            .gives("H_s B_s^3 / 12", depth * Math.pow(width, 3) / 12, "m⁴");
        double weakElastic = square ? elastic : sides(trace.line("section-modulus-elastic/weak", "W_{el,z}", "elastic section modulus, weak axis"), sizes)
            .gives("H_s B_s² / 6", depth * width * width / 6, "m³");
        double weakPlastic = square ? plastic : sides(trace.line("section-modulus-plastic/weak", "W_{pl,z}", "plastic section modulus, weak axis"), sizes)
            .gives("H_s B_s² / 4", depth * width * width / 4, "m³");
        double larger = sides(trace.line("section-side/larger", "h_1", "larger side"), sizes).gives("max(H_s; B_s)", Math.max(depth, width), "m");
        double smaller = sides(trace.line("section-side/smaller", "b_1", "smaller side"), sizes).gives("min(H_s; B_s)", Math.min(depth, width), "m");
        double k = rectangle.at("inertia", larger / smaller).into(trace.line("section-torsion-share/inertia", "k_I", "share of h b³, by larger over smaller side"));
        double torsionInertia = torsion(trace.line("section-torsion-inertia", "I_t", "torsion constant").in("k_I", k), larger, smaller)
            .gives("k_I h_1 b_1^3", k * larger * Math.pow(smaller, 3), "m⁴");
        double w = rectangle.at("modulus", larger / smaller).into(trace.line("section-torsion-share/modulus", "k_W", "share of h b², by larger over smaller side"));
        double torsionModulus = torsion(trace.line("section-torsion-modulus", "W_t", "torsion modulus").in("k_W", w), larger, smaller)
            .gives("k_W h_1 b_1²", w * larger * smaller * smaller, "m³");
        double mass = mass(density, "A_s", area, trace);
        return new Properties(area, inertia, weakInertia, elastic, weakElastic, plastic, weakPlastic, torsionInertia, torsionModulus, mass);
    }

    private static Trace.Line torsion(Trace.Line line, double larger, double smaller) {
        return line.in("h_1", larger, "m").in("b_1", smaller, "m").from("Saint-Venant's torsion of a rectangle", Status.DERIVED);
    }

    private static Trace.Line sides(Trace.Line line, Sizes sizes) {
        return line.in("H_s", sizes.depth(), "m").in("B_s", sizes.width(), "m").from(GEOMETRY, Status.DERIVED);
    }

    /** Mass per metre from the area as sold. */
    static double mass(Coefficient density, String symbol, double area, Trace trace) {
        double ρ = density.into(trace.line("section-density", "ρ_s", "density of the section"));
        return trace.line("section-mass", "m_s", "mass of the section for each metre").in("ρ_s", ρ, "kg/m³").in(symbol, area, "m²")
            .from(density.source().citation(), density.source().status()).gives("ρ_s " + symbol, ρ * area, "kg/m");
    }
}
