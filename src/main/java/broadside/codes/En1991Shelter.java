package broadside.codes;

import broadside.aero.Strip;
import broadside.panel.Panel;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/**
 * Shelter by a wall or fence in front of a wall, EN 1991-1-4, 7.4.2. The factor is the user's own: figure 7.20 is not among
 * the tables. Within the height of the wall from either end there is no shelter.
 */
final class En1991Shelter {

    private final Source place;
    private final double end;

    En1991Shelter(Constants constants) {
        this.place = constants.source("shelter-factor");
        this.end = constants.number("shelter-end");
    }

    /**
     * One stretch of a zone.
     *
     * @param strip   where it lies, under the name of its zone
     * @param behind  what stands behind the zone in the names of its steps: "", "/sheltered" or "/far-end"
     * @param mark    the same in symbols: "", ",s" or ",f"
     */
    record Part(Strip strip, String behind, String mark) {

        boolean sheltered() {
            return behind.equals("/sheltered");
        }

        String name() {
            return strip.name() + behind;
        }

        String symbol(String letter) {
            return letter + "_" + (mark.isEmpty() ? strip.name() : "{" + strip.name() + mark + "}");
        }

        /** The same in words: B, sheltered. */
        String words() {
            return strip.name() + (behind.isEmpty() ? "" : sheltered() ? ", sheltered" : ", unsheltered at the far end");
        }
    }

    /** The zones cut where shelter begins and ends; zones as they are where there is none. */
    List<Part> cut(Panel panel, List<Strip> zones) {
        double near = end * panel.height();
        double far = panel.width() - near;
        if (panel.shelter() == 1 || !Numbers.above(far / near, 1)) {
            return zones.stream().map(z -> new Part(z, "", "")).toList();
        }
        List<Part> parts = new ArrayList<>();
        for (Strip zone : zones) {
            boolean first = add(parts, zone, 0, near, "", "");
            add(parts, zone, near, far, "/sheltered", ",s");
            add(parts, zone, far, panel.width(), first ? "/far-end" : "", first ? ",f" : "");
        }
        return parts;
    }

    private static boolean add(List<Part> parts, Strip zone, double from, double to, String behind, String mark) {
        double begin = Math.max(zone.from(), from);
        double stop = Math.min(zone.to(), to);
        boolean there = stop - begin > 1e-9;
        if (there) {
            parts.add(new Part(new Strip(zone.name(), begin, stop), behind, mark));
        }
        return there;
    }

    /** The factor as it counts, recorded with where it does not; 1 where there is no shelter. */
    double factor(Panel panel, Trace trace) {
        return panel.shelter() == 1 ? 1
            : trace.line("shelter-factor", "ψ_s", "shelter factor for a wall or fence in front, as high and as closed as 7.4.2 asks for").from("given", Status.GIVEN)
                .reads("as given; not within " + Numbers.plain(end) + " h of the ends of the wall", panel.shelter(), "1");
    }

    /** The coefficient of a sheltered stretch. */
    double coefficient(Part part, double ofZone, double factor, String end, Trace trace) {
        String zone = part.strip().name();
        return trace.line("coefficient/" + part.name() + end, part.symbol("c"), "net pressure coefficient of zone " + part.words())
            .in("ψ_s", factor).in("c_" + zone, ofZone).from(place.publicationAndEdition() + ", 7.4.2(1), (7.6)", place.status())
            .gives("ψ_s c_" + zone, factor * ofZone, "1");
    }
}
