package broadside.codes;

import broadside.panel.FacadePanel;
import broadside.site.Site;
import broadside.table.Source;
import broadside.trace.Trace;

/** Peak velocity pressures on the walls of a building, EN 1991-1-4, figure 7.4: the windward face in strips, the others at the height of the building. */
final class En1991FacadeWind {

    private final Source place;

    En1991FacadeWind(Source place) {
        this.place = place;
    }

    /**
     * Peak velocity pressures, Pa.
     *
     * @param atTop   at the height of the building, for all faces but the windward one
     * @param onFace  of the strip of the windward face in which the panel lies, the worse where it lies in two
     */
    record Pressures(double atTop, double onFace, String faceSymbol) { }

    /** The strip is worked out first, so that the pressure at the height of the building is the last one on the sheet. */
    Pressures pressures(FacadePanel facade, En1991Facade.Sizes building, Site site, WindCode code, Trace trace) {
        double top = facade.bottom().metres() + facade.height().metres();
        double strip = stripTop(top, building);
        double onFace = -1;
        if (strip < building.height()) {
            Trace windward = trace.part("windward");
            double z = line(windward, "reference-height", "z_e", "reference height of the windward face: the top of the strip that holds the upper edge of the panel")
                .in("H_w", building.height(), "m").in("B_w", building.width(), "m").reads(strip == building.width() ? "the lowest strip ends at the width of the face"
                    : "a strip that ends at the upper edge of the panel", strip, "m");
            double q = code.velocityPressure(site, z, windward);
            onFace = line(trace, "strip-pressure", "q_{p,D}", "peak velocity pressure on this strip of the windward face").in("q_p", q, "Pa").gives("q_p", q, "Pa");
        }
        double ze = line(trace, "reference-height", "z_e", "reference height of the walls: the height of the building").in("H_w", building.height(), "m")
            .gives("H_w", building.height(), "m");
        double atTop = code.velocityPressure(site, ze, trace);
        return onFace < 0 ? new Pressures(atTop, atTop, "q_p") : new Pressures(atTop, onFace, "q_{p,D}");
    }

    /**
     * Height of the strip in which the upper edge of the panel lies: one strip for a face that is not higher than wide,
     * a lower one as high as the face is wide for others, and one of that height at the top for a face more than twice as high as wide.
     */
    private static double stripTop(double top, En1991Facade.Sizes building) {
        double b = building.width();
        double h = building.height();
        if (!Numbers.above(h / b, 1)) {
            return h;
        }
        if (!Numbers.above(top / b, 1)) {
            return b;
        }
        return Numbers.above(h / b, 2) && !Numbers.above(top / (h - b), 1) ? top : h;
    }

    private Trace.Line line(Trace trace, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.publicationAndEdition() + ", 7.2.2(1), figure 7.4", place.status());
    }
}
