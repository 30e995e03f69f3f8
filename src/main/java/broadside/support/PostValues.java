package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/** Records the sizes and properties of a section that a rule asks for, as the tables of the section give them. */
record PostValues(Section section) {

    private static final String PLACE = "properties of the section";
    private static final String BEAM = "beam theory";

    double area(Trace trace) {
        return of("post-section/area", "A", "area", section.properties().area(), "m²", trace);
    }

    double wall(Trace trace) {
        return of("post-section/wall", "t", "wall by which it is checked", section.wall(), "m", trace);
    }

    double diameter(Trace trace) {
        return of("post-section/diameter", "D", "outside diameter", section.depth(), "m", trace);
    }

    double depth(Axis axis, Trace trace) {
        return of("post-section/depth", "h_s", "size along the bending", axis.depth(), "m", trace);
    }

    double across(Axis axis, Trace trace) {
        return of("post-section/width", "b_s", "size across the bending", axis.across(), "m", trace);
    }

    double elastic(Axis axis, String symbol, Trace trace) {
        return of("post-section/modulus-elastic", symbol, "elastic section modulus", axis.elastic(), "m³", trace);
    }

    double plastic(Axis axis, String symbol, Trace trace) {
        return of("post-section/modulus-plastic", symbol, "plastic section modulus", axis.plastic(), "m³", trace);
    }

    double torsion(Trace trace) {
        return of("post-section/modulus-torsion", "W_t", "section modulus of torsion", section.properties().torsionModulus(), "m³", trace);
    }

    boolean round() {
        return section.form() == Section.Form.ROUND_TUBE;
    }

    private double of(String step, String symbol, String meaning, double value, String unit, Trace trace) {
        return trace.line(step, symbol, meaning).from(PLACE, Status.DERIVED).reads(section.designation(), value, unit);
    }

    /** Elastic stress of bending about each axis and of compression, Pa, recorded as σ. Beam theory. */
    double normalStress(List<Axis> axes, DesignLoad load, LoadSymbols symbols, String modulus, String step, Trace trace) {
        double area = area(trace);
        double[] bending = new double[axes.size()];
        double sum = load.axial() / area;
        for (int i = 0; i < bending.length; i++) {
            Axis axis = axes.get(i);
            Trace sheet = axis.sheet(trace);
            double w = elastic(axis, modulus, sheet);
            bending[i] = sheet.line("post-stress/bending", axis.stress(), "bending stress, elastic").in(axis.momentSymbol(), axis.moment(), "N m").in(modulus, w, "m³")
                .from(BEAM, Status.DERIVED).gives(axis.momentSymbol() + " / " + modulus, axis.moment() / w, "Pa");
            sum += bending[i];
        }
        Trace.Line line = trace.line(step, "σ", "stress of bending and compression, elastic").in(symbols.axial(), load.axial(), "N").in("A", area, "m²")
            .from(BEAM, Status.DERIVED);
        for (int i = 0; i < bending.length; i++) {
            line.in(axes.get(i).stress(), bending[i], "Pa");
        }
        return line.gives(symbols.axial() + (axes.size() > 1 ? " / A + σ_M + σ_{Mz}" : " / A + σ_M"), sum, "Pa");
    }
}
