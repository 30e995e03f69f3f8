package broadside.codes;

import broadside.aero.Strip;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** The zones A, B and C of a wall along the wind, EN 1991-1-4, figure 7.5, and those that a panel lies in. */
final class En1991FacadeZones {

    /** Shorter stretches come from binary rounding only, m. */
    private static final double ROUNDING = 1e-9;

    private final Rows zones;

    En1991FacadeZones(Edition edition) {
        this.zones = edition.rows("building-wall-zones");
    }

    /** The zones of the whole wall from the windward corner; e is the smaller of the width across the wind and twice the height. */
    List<Strip> ofWall(En1991Facade.Sizes building, Trace trace) {
        Source place = zones.number(zones.keys().get(0), "from").source();
        double e = trace.line("zone-length", "e", "the smaller of the width across the wind and twice the height, wind along the wall")
            .in("D_w", building.depth(), "m").in("H_w", building.height(), "m").from(place.citation(), place.status())
            .gives("min(D_w; 2 H_w)", Math.min(building.depth(), 2 * building.height()), "m");
        List<Double> limits = zones.keys().stream()
            .map(z -> zones.isPrinted(z, "to") ? zones.number(z, "to").value() * e : Double.POSITIVE_INFINITY).toList();
        List<Strip> strips = Strip.cut(building.width(), zones.keys(), limits);
        for (Strip strip : strips) {
            Source printed = zones.number(strip.name(), "from").source();
            trace.line("zone-width/" + strip.name(), "l_" + strip.name(), "width of zone " + strip.name() + " of the whole wall").in("e", e, "m")
                .in("B_w", building.width(), "m").from(printed.citation(), printed.status())
                .reads("from " + Numbers.plain(En1991Walls.round(strip.from())) + " m to " + Numbers.plain(En1991Walls.round(strip.to())) + " m from the windward corner", strip.width(), "m");
        }
        return strips;
    }

    /** The parts of a panel by zone, each from its edge nearer to the corner from which they are measured. */
    static List<Strip> ofPanel(List<Strip> wall, double fromCorner, double width) {
        List<Strip> parts = new ArrayList<>();
        for (Strip zone : wall) {
            if (Strip.overlap(zone.from(), zone.to(), fromCorner, fromCorner + width) > ROUNDING) {
                parts.add(new Strip(zone.name(), Math.max(zone.from(), fromCorner) - fromCorner, Math.min(zone.to(), fromCorner + width) - fromCorner));
            }
        }
        return parts;
    }

    /** The same parts told from the other edge of the panel. */
    static List<Strip> turned(List<Strip> parts, double width) {
        List<Strip> turned = new ArrayList<>(parts.stream().map(p -> new Strip(p.name(), exact(width - p.to()), width - p.from())).toList());
        Collections.reverse(turned);
        return turned;
    }

    /** An edge that misses the edge of the panel by binary rounding only lies on it. */
    private static double exact(double from) {
        return Math.abs(from) < ROUNDING ? 0 : from;
    }
}
