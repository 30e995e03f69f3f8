package broadside.codes;

import broadside.aero.Strip;
import broadside.panel.FacadePanel;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.List;

/** Zones 4 and 5 of a wall of a building by ASCE 7 chapter 30, and what of them a panel covers. */
final class Asce7WallZones {

    private final Constants constants;

    Asce7WallZones(Edition edition) {
        this.constants = new Constants(edition);
    }

    /** Width a of the zone along a vertical edge, m. */
    double edge(FacadePanel facade, double h, boolean low, Trace trace) {
        double width = trace.given("w_b", "width of the face of the building", facade.building().width().metres(), "m", facade.building().width().typed());
        double depth = trace.given("d_b", "depth of the building", facade.building().depth().metres(), "m", facade.building().depth().typed());
        Source place = constants.source("edge-share-of-width");
        double w = line(trace, place, "least-building-width", "w", "least horizontal dimension of the building").in("w_b", width, "m").in("d_b", depth, "m")
            .gives("min(w_b; d_b)", Math.min(width, depth), "m");
        double least = line(trace, constants.source("edge-least-width"), "edge-least-width", "a_{min}", "least width of the edge zone")
            .reads(constants.text("edge-least-width") + " ft", constants.metres("edge-least-width"), "m");
        double ofWidth = constants.number("edge-share-of-width");
        Trace.Line line = line(trace, place, "edge-zone-width", "a", "width of zone 5 along a vertical edge").in("w", w, "m").in("a_{min}", least, "m");
        if (!low) {
            return line.gives("max(" + constants.text("edge-share-of-width") + " w; a_{min})", Math.max(ofWidth * w, least), "m");
        }
        double ofHeight = constants.number("edge-share-of-height");
        double smallest = constants.number("edge-least-share");
        return line.in("h", h, "m").gives("max(min(" + constants.text("edge-share-of-width") + " w; " + constants.text("edge-share-of-height") + " h); "
            + constants.text("edge-least-share") + " w; a_{min})", Math.max(Math.min(ofWidth * w, ofHeight * h), Math.max(smallest * w, least)), "m");
    }

    /** The zones on a panel from its edge nearer to the corner; both corners of the wall have a zone 5. */
    List<Strip> strips(FacadePanel facade, double a, Trace trace) {
        double b = facade.width().metres();
        double near = trace.given("x_c", "distance of the panel from the nearer corner", facade.fromCorner().metres(), "m", facade.fromCorner().typed());
        double far = facade.fromFarCorner();
        double left = Numbers.above(a, near) ? a - near : 0;
        double right = Numbers.above(a, far) ? b - (a - far) : b;
        List<Strip> strips = right <= left ? List.of(new Strip("5", 0, b)) : Strip.cut(b, List.of("5", "4", "5"), List.of(left, right, Double.POSITIVE_INFINITY));
        Source place = constants.source("edge-share-of-width");
        for (int i = 0; i < strips.size(); i++) {
            Strip strip = strips.get(i);
            String farEnd = i > 0 && strip.name().equals("5") && strips.get(0).name().equals("5") ? "/far-corner" : "";
            line(trace, place, "zone-width/" + strip.name() + farEnd, "l_" + strip.name(), "width of zone " + strip.name() + " on the panel").in("a", a, "m").in("x_c", near, "m")
                .in("B", b, "m").in("w_b", facade.building().width().metres(), "m").reads("measured from both vertical edges of the wall", strip.width(), "m");
        }
        return strips;
    }

    private static Trace.Line line(Trace trace, Source place, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
