package broadside.support;

import broadside.support.Section.Properties;
import broadside.table.Coefficient;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Properties of a rectangular tube with rounded corners: the outer rounded rectangle less the inner one. What a corner
 * lacks of its square (the spandrel) has the area a, its centroid at c from both faces, and the inertia i about itself.
 */
final class RectangularTube {

    private static final String TORSION = "EN 10210-2:2006, annex B";
    private static final double CENTROID = (10 - 3 * Math.PI) / (12 - 3 * Math.PI);
    private static final double OWN_INERTIA = 1.0 / 3 - Math.PI / 16 - 1 / (36 - 9 * Math.PI);

    /** Name, symbol, meaning and formula of a step. */
    private record Words(String name, String symbol, String meaning, String formula) {

        Trace.Line on(Trace trace) {
            return trace.line(name, symbol, meaning).from(SectionShape.GEOMETRY, Status.DERIVED);
        }
    }

    /** Words of one axis; symbols of the outer and inner size that stand across it and of those that lie along it. */
    private record Axis(String outer, String inner, String outerAlong, String innerAlong, Words outerArm, Words innerArm, Words inertia, Words elastic,
                        Words plastic) {

        static Axis of(String part, String words, String h, String b, String hi, String bi, String y, String i, String marks) {
            String yo = y + "_o";
            String yi = y + "_i";
            return new Axis(h, hi, b, bi,
                new Words("section-corner-arm/outer" + part, yo, "distance of its centroid from the axis" + words, h + " / 2 - c_o"),
                new Words("section-corner-arm/inner" + part, yi, "distance of its centroid from the axis" + words, hi + " / 2 - c_i"),
                new Words("section-inertia" + part, i, "second moment of area" + words,
                    "(" + b + " " + h + "^3 - " + bi + " " + hi + "^3) / 12 - 4 (i_o + a_o " + yo + "²) + 4 (i_i + a_i " + yi + "²)"),
                new Words("section-modulus-elastic" + part, "W_{el" + marks + "}", "elastic section modulus" + words, "2 " + i + " / " + h),
                new Words("section-modulus-plastic" + part, "W_{pl" + marks + "}", "plastic section modulus" + words,
                    "(" + b + " " + h + "² - " + bi + " " + hi + "²) / 4 - 4 a_o " + yo + " + 4 a_i " + yi));
        }
    }

    private static final Axis STRONG = Axis.of("", "", "H_s", "B_s", "h_i", "b_i", "y", "I_s", "");
    private static final Axis WEAK = Axis.of("/weak", ", weak axis", "B_s", "H_s", "b_i", "h_i", "z", "I_{s,z}", ",z");

    /** A rounded rectangle, and the area, centroid and inertia of a spandrel. */
    private record Rounded(double depth, double width, double area, double centroid, double inertia) { }

    private record Bending(double inertia, double elastic, double plastic) { }

    static Properties of(Sizes sizes, Coefficient density, Trace trace) {
        Materials.Corner corner = sizes.corner().orElseThrow();
        double h = sizes.depth();
        double b = sizes.width();
        double t = sizes.wall();
        double outerRadius = trace.line("section-corner-radius/outer", "r_o", "outer radius of the corners").in("t_s", t, "m")
            .from(corner.place(), corner.status()).gives(corner.outerFormula(), corner.outer() * t, "m");
        double innerRadius = trace.line("section-corner-radius/inner", "r_i", "inner radius of the corners").in("t_s", t, "m")
            .from(corner.place(), corner.status()).gives(corner.innerFormula(), corner.inner() * t, "m");
        double hi = trace.line("section-inner-depth", "h_i", "inner depth").in("H_s", h, "m").in("t_s", t, "m").from(SectionShape.GEOMETRY, Status.DERIVED)
            .gives("H_s - 2 t_s", h - 2 * t, "m");
        double bi = trace.line("section-inner-width", "b_i", "inner width").in("B_s", b, "m").in("t_s", t, "m").from(SectionShape.GEOMETRY, Status.DERIVED)
            .gives("B_s - 2 t_s", b - 2 * t, "m");
        Rounded outer = new Rounded(h, b, spandrelArea("section-corner-area/outer", "a_o", "r_o", "(1 - π / 4) r_o²", outerRadius, trace),
            centroid("section-corner-centroid/outer", "c_o", "r_o", "r_o (10 - 3 π) / (12 - 3 π)", outerRadius, trace),
            ownInertia("section-corner-inertia/outer", "i_o", "r_o", "(1 / 3 - π / 16 - 1 / (36 - 9 π)) r_o^4", outerRadius, trace));
        Rounded inner = new Rounded(hi, bi, spandrelArea("section-corner-area/inner", "a_i", "r_i", "(1 - π / 4) r_i²", innerRadius, trace),
            centroid("section-corner-centroid/inner", "c_i", "r_i", "r_i (10 - 3 π) / (12 - 3 π)", innerRadius, trace),
            ownInertia("section-corner-inertia/inner", "i_i", "r_i", "(1 / 3 - π / 16 - 1 / (36 - 9 π)) r_i^4", innerRadius, trace));
        double area = trace.line("section-area", "A_s", "area of the section").in("H_s", h, "m").in("B_s", b, "m").in("h_i", hi, "m").in("b_i", bi, "m")
            .in("a_o", outer.area(), "m²").in("a_i", inner.area(), "m²").from(SectionShape.GEOMETRY, Status.DERIVED)
            .gives("H_s B_s - h_i b_i - 4 a_o + 4 a_i", h * b - hi * bi - 4 * outer.area() + 4 * inner.area(), "m²");
        Bending strong = bending(STRONG, outer, inner, trace);
        Bending weak = h == b ? strong : bending(WEAK, turned(outer), turned(inner), trace);
        double sold = sizes.nominal() == t ? area : trace.line("section-area/nominal", "A_n", "area with the wall as sold").in("H_s", h, "m").in("B_s", b, "m")
            .in("t_n", sizes.nominal(), "m").from(SectionShape.GEOMETRY, Status.DERIVED).gives(corner.nominalArea(), nominalArea(sizes, corner), "m²");
        double[] torsion = torsion(h, b, t, outerRadius, innerRadius, trace);
        double mass = SectionShape.mass(density, sizes.nominal() == t ? "A_s" : "A_n", sold, trace);
        return new Properties(area, strong.inertia(), weak.inertia(), strong.elastic(), weak.elastic(), strong.plastic(), weak.plastic(),
            torsion[0], torsion[1], mass);
    }

    private static Rounded turned(Rounded r) {
        return new Rounded(r.width(), r.depth(), r.area(), r.centroid(), r.inertia());
    }

    private static double nominalArea(Sizes sizes, Materials.Corner corner) {
        double t = sizes.nominal();
        double outer = corner.outer() * t;
        double inner = corner.inner() * t;
        return sizes.depth() * sizes.width() - (sizes.depth() - 2 * t) * (sizes.width() - 2 * t) - (4 - Math.PI) * (outer * outer - inner * inner);
    }

    private static double spandrelArea(String name, String symbol, String radius, String formula, double r, Trace trace) {
        return trace.line(name, symbol, "area that a rounded corner lacks").in(radius, r, "m").from(SectionShape.GEOMETRY, Status.DERIVED)
            .gives(formula, (1 - Math.PI / 4) * r * r, "m²");
    }

    private static double centroid(String name, String symbol, String radius, String formula, double r, Trace trace) {
        return trace.line(name, symbol, "distance of its centroid from the face").in(radius, r, "m")
            .from(SectionShape.GEOMETRY, Status.DERIVED).gives(formula, r * CENTROID, "m");
    }

    private static double ownInertia(String name, String symbol, String radius, String formula, double r, Trace trace) {
        return trace.line(name, symbol, "second moment of that area about its own centroid").in(radius, r, "m")
            .from(SectionShape.GEOMETRY, Status.DERIVED).gives(formula, OWN_INERTIA * r * r * r * r, "m⁴");
    }

    private static Bending bending(Axis axis, Rounded outer, Rounded inner, Trace trace) {
        double yo = axis.outerArm().on(trace).in(axis.outer(), outer.depth(), "m").in("c_o", outer.centroid(), "m")
            .gives(axis.outerArm().formula(), outer.depth() / 2 - outer.centroid(), "m");
        double yi = axis.innerArm().on(trace).in(axis.inner(), inner.depth(), "m").in("c_i", inner.centroid(), "m")
            .gives(axis.innerArm().formula(), inner.depth() / 2 - inner.centroid(), "m");
        double inertia = both(axis.inertia().on(trace), axis, outer, inner, yo, yi).in("i_o", outer.inertia(), "m⁴").in("i_i", inner.inertia(), "m⁴")
            .gives(axis.inertia().formula(), (outer.width() * Math.pow(outer.depth(), 3) - inner.width() * Math.pow(inner.depth(), 3)) / 12
                - 4 * (outer.inertia() + outer.area() * yo * yo) + 4 * (inner.inertia() + inner.area() * yi * yi), "m⁴");
        double elastic = axis.elastic().on(trace).in(axis.inertia().symbol(), inertia, "m⁴").in(axis.outer(), outer.depth(), "m")
            .gives(axis.elastic().formula(), 2 * inertia / outer.depth(), "m³");
        double plastic = both(axis.plastic().on(trace), axis, outer, inner, yo, yi)
            .gives(axis.plastic().formula(), (outer.width() * outer.depth() * outer.depth() - inner.width() * inner.depth() * inner.depth()) / 4
                - 4 * outer.area() * yo + 4 * inner.area() * yi, "m³");
        return new Bending(inertia, elastic, plastic);
    }

    private static Trace.Line both(Trace.Line line, Axis axis, Rounded outer, Rounded inner, double yo, double yi) {
        return line.in(axis.outer(), outer.depth(), "m").in(axis.outerAlong(), outer.width(), "m").in(axis.inner(), inner.depth(), "m")
            .in(axis.innerAlong(), inner.width(), "m").in("a_o", outer.area(), "m²").in("a_i", inner.area(), "m²")
            .in(axis.outerArm().symbol(), yo, "m").in(axis.innerArm().symbol(), yi, "m");
    }

    /** Torsion constant, m4, and torsion modulus, m3, of the closed wall along its middle line. */
    private static double[] torsion(double h, double b, double t, double outerRadius, double innerRadius, Trace trace) {
        double r = trace.line("section-corner-radius/middle", "r_m", "radius of the middle line of the wall").in("r_o", outerRadius, "m")
            .in("r_i", innerRadius, "m").from(TORSION, Status.RECALLED).gives("(r_o + r_i) / 2", (outerRadius + innerRadius) / 2, "m");
        double round = trace.line("section-middle-line", "h_m", "length of the middle line of the wall").in("H_s", h, "m").in("B_s", b, "m")
            .in("t_s", t, "m").in("r_m", r, "m").from(TORSION, Status.RECALLED)
            .gives("2 (B_s - t_s) + 2 (H_s - t_s) - 2 r_m (4 - π)", 2 * (b - t) + 2 * (h - t) - 2 * r * (4 - Math.PI), "m");
        double inside = trace.line("section-middle-area", "A_m", "area inside the middle line").in("H_s", h, "m").in("B_s", b, "m")
            .in("t_s", t, "m").in("r_m", r, "m").from(TORSION, Status.RECALLED)
            .gives("(B_s - t_s) (H_s - t_s) - r_m² (4 - π)", (b - t) * (h - t) - r * r * (4 - Math.PI), "m²");
        double k = trace.line("section-torsion-factor", "K_m", "factor of torsion").in("A_m", inside, "m²").in("t_s", t, "m").in("h_m", round, "m")
            .from(TORSION, Status.RECALLED).gives("2 A_m t_s / h_m", 2 * inside * t / round, "m²");
        double inertia = trace.line("section-torsion-inertia", "I_t", "torsion constant").in("t_s", t, "m").in("h_m", round, "m").in("K_m", k, "m²")
            .in("A_m", inside, "m²").from(TORSION, Status.RECALLED).gives("t_s^3 h_m / 3 + 2 K_m A_m", t * t * t * round / 3 + 2 * k * inside, "m⁴");
        double modulus = trace.line("section-torsion-modulus", "W_t", "torsion modulus").in("I_t", inertia, "m⁴").in("t_s", t, "m").in("K_m", k, "m²")
            .from(TORSION, Status.RECALLED).gives("I_t / (t_s + K_m / t_s)", inertia / (t + k / t), "m³");
        return new double[] {inertia, modulus};
    }

    private RectangularTube() { }
}
