package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/**
 * One direction in which a post bends: a section seen along the wind on the face, or along the face. Lengths m, moduli m3.
 *
 * @param weak          wind along the face
 * @param depth         size along the bending
 * @param across        size across it
 * @param moment        about the axis, N m
 * @param momentSymbol  under which it was recorded
 * @param share         symbol of the share of the bending resistance that is used
 * @param shearShare    symbol of the share of the shear resistance that is used
 * @param stress        symbol of the bending stress
 */
record Axis(boolean weak, double depth, double across, double elastic, double plastic, double moment, String momentSymbol, double shear,
            String shearSymbol, String share, String shearShare, String stress) {

    private static final String ALONG = "along";

    /** The strong axis, and the weak one where something bends about it. */
    static List<Axis> of(Section section, DesignLoad load, LoadSymbols symbols) {
        Section.Properties p = section.properties();
        Axis strong = new Axis(false, section.depth(), section.width(), p.elastic(), p.plastic(), load.moment(), symbols.moment(), load.shear(),
            symbols.shear(), "η_M", "η_V", "σ_M");
        if (load.weakMoment() <= 0 && load.weakShear() <= 0) {
            return List.of(strong);
        }
        return List.of(strong, new Axis(true, section.width(), section.depth(), p.weakElastic(), p.weakPlastic(), load.weakMoment(), symbols.weakMoment(),
            load.weakShear(), symbols.weakShear(), "η_{Mz}", "η_{Vz}", "σ_{Mz}"));
    }

    /** The sheet of this axis: steps of the weak one have their own names. */
    Trace sheet(Trace trace) {
        return weak ? trace.part(ALONG) : trace;
    }

    String bendingCheck() {
        return weak ? "post bending along the face" : "post bending";
    }

    String shearCheck() {
        return weak ? "post shear along the face" : "post shear";
    }

    /** Records the share of the bending resistance that is used. */
    double bendingShare(String symbol, double resistance, String place, Status status, Trace trace) {
        return share("post-share/bending", share, "share of the bending resistance that is used", momentSymbol, moment, symbol, resistance, "N m", place, status, trace);
    }

    /** Records the share of the shear resistance that is used. */
    double shearShare(String symbol, double resistance, String place, Status status, Trace trace) {
        return share("post-share/shear", shearShare, "share of the shear resistance that is used", shearSymbol, shear, symbol, resistance, "N", place, status, trace);
    }

    private static double share(String step, String symbol, String meaning, String of, double demand, String over, double resistance, String unit, String place,
                                Status status, Trace trace) {
        Trace.Line line = trace.line(step, symbol, meaning).in(of, demand, unit).in(over, resistance, unit).from(place, status);
        return resistance > 0 ? line.gives(of + " / " + over, demand / resistance, "1")
            : line.reads("nothing is left of the resistance", demand > 0 ? Check.MOST : 0, "1");
    }
}
