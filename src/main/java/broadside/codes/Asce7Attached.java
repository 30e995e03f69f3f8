package broadside.codes;

import broadside.panel.FacadePanel.Backing;
import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Signs on a solid wall, ASCE 7, 29.3.2: cladding of the wall where they touch it, or stand near to it and well inside
 * its free edges; free-standing signs otherwise. The wall stands on the ground, so its lower edge is not free.
 */
final class Asce7Attached {

    private final Constants constants;
    private final Asce7Velocity velocity;
    private final Asce7Gust gust;
    private final Asce7Signs signs;

    Asce7Attached(Edition edition, Asce7Velocity velocity, Asce7Gust gust, Asce7Signs signs) {
        this.constants = new Constants(edition);
        this.velocity = velocity;
        this.gust = gust;
        this.signs = signs;
    }

    /** The greatest pressure on the panel as a free-standing sign, Pa, where it counts as one; recorded as p_f. */
    OptionalDouble freeStanding(FacadePanel facade, Site site, WindCode code, Trace trace) {
        if (facade.backing() == Backing.SKIN || facade.gap().isEmpty() || facade.gap().get().metres() == 0) {
            return OptionalDouble.empty();
        }
        Source place = constants.source("attached-gap");
        double gap = trace.given("g_w", "gap between the wall and the panel", facade.gap().get().metres(), "m", facade.gap().get().typed());
        if (Numbers.above(gap, constants.metres("attached-gap"))) {
            throw new NotCovered(place.publicationAndEdition(), place.place(), "the gap of " + facade.gap().get().typed() + " to the wall is wider than "
                + constants.text("attached-gap") + " ft; such a sign is no sign on a wall.", "Enter it as a sign on posts, with its real height above the ground.");
        }
        double above = facade.building().height().metres() - facade.bottom().metres() - facade.height().metres();
        double nearest = Math.min(above, Math.min(facade.fromCorner().metres(), facade.fromFarCorner()));
        return Numbers.atLeast(nearest, constants.metres("attached-edge")) ? OptionalDouble.empty() : OptionalDouble.of(asSign(facade.panels().get(0), site, code, trace));
    }

    private double asSign(Panel panel, Site site, WindCode code, Trace trace) {
        Trace part = trace.part("free-standing");
        Source place = constants.source("attached-edge");
        double h = part.line("reference-height", "h", "height of the top of the panel").in("g", panel.clearance(), "m").in("s", panel.height(), "m")
            .from(place.citation(), place.status()).gives("g + s", panel.top(), "m");
        Asce7Pressure q = velocity.inLoads(new Asce7Velocity.Point(site, h, Asce7Use.SOLID), part);
        List<ZonePressure> zones = signs.cases(panel, site, code, q, gust.ofPanel(site, panel.width(), h, part), part).stream()
            .flatMap(load -> load.zones().stream()).distinct().toList();
        Trace.Line line = trace.line("free-standing-pressure", "p_f", "greatest pressure on the panel as a free-standing sign, since it stands off the wall nearer than "
            + constants.text("attached-edge") + " ft to a free edge").from(place.citation(), place.status());
        List<String> symbols = zones.stream().map(ZonePressure::symbol).distinct().toList();
        zones.forEach(zone -> line.in(zone.symbol(), zone.pressure(), "Pa"));
        return line.gives(symbols.size() == 1 ? symbols.get(0) : "max(" + String.join("; ", symbols) + ")",
            zones.stream().mapToDouble(ZonePressure::pressure).max().orElseThrow(), "Pa");
    }
}
