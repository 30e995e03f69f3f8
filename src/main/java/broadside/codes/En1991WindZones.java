package broadside.codes;

import broadside.quantity.Dimension;
import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.quantity.Unit;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.OutsideTable;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Wind zones of national tables: the fundamental basic wind velocity of a zone, and a simplified peak velocity pressure
 * where the zone is named with its site, such as "2 inland". An edition without such tables has no zones.
 */
final class En1991WindZones {

    /** What cannot be given beside a simplified pressure: it holds all of them already. */
    private static final Set<String> FACTORS = Set.of("direction-factor", "season-factor", "season", "air-density", "duration-rule");

    private final Edition edition;
    private final Optional<Rows> zones;
    private final Optional<Rows> simplified;
    private final double reference;

    En1991WindZones(Edition edition) {
        this.edition = edition;
        this.zones = edition.has("wind-zones") ? Optional.of(edition.rows("wind-zones")) : Optional.empty();
        this.simplified = edition.has("simplified-pressure") ? Optional.of(edition.rows("simplified-pressure")) : Optional.empty();
        this.reference = new Constants(edition).number("probability-reference");
    }

    /** The fundamental basic wind velocity that a zone stands for; a zone that is not there, or stands beside what it holds, is refused. */
    Optional<Speed> speed(SiteOptions options, Optional<Period> returnPeriod) {
        if (zones.isEmpty() || options.word("wind-zone").isEmpty()) {
            return Optional.empty();
        }
        String word = options.word("wind-zone").get();
        boolean pressure = sites().contains(word);
        if (!pressure && !zones.get().has(word)) {
            List<String> words = new ArrayList<>(zones.get().keys());
            words.addAll(sites());
            throw new IllegalArgumentException("the wind zone is none of " + edition.property("title") + "; it has " + String.join(", ", words));
        }
        boolean otherWind = returnPeriod.filter(p -> Math.abs(p.years() * reference - 1) > 1e-9).isPresent();
        if (pressure && (otherWind || options.names().stream().anyMatch(FACTORS::contains))) {
            throw new IllegalArgumentException("the wind zone \"" + word + "\" gives a peak pressure in which no return period and no factor of the wind can be counted; "
                + "give the zone alone, \"" + number(word) + "\", for the procedure with factors");
        }
        Coefficient found = zones.get().number(number(word), "speed");
        return Optional.of(new Speed(found.value(), zones.get().text(number(word), "speed") + " m/s"));
    }

    /** The fundamental basic wind velocity of a site, m/s: read in the table of zones, or as typed. */
    double fundamental(Site site, Trace trace) {
        double v = site.basicSpeed().metresPerSecond();
        Optional<Coefficient> printed = zones.flatMap(rows -> site.options().word("wind-zone").map(w -> rows.number(number(w), "speed")));
        return printed.filter(p -> p.value() == v).map(p -> trace.line("fundamental-speed", "v_{b,0}", "fundamental basic wind velocity of the wind zone, 10 min mean")
            .from(p.source().citation(), p.source().status()).reads(p.how(), v, "m/s"))
            .orElseGet(() -> trace.given("v_{b,0}", "fundamental basic wind velocity, 10 min mean", v, "m/s", site.basicSpeed().typed()));
    }

    /** Whether the zone was named with its site, so that the simplified pressure counts. */
    boolean isSimplified(Site site) {
        return site.options().word("wind-zone").filter(w -> sites().contains(w)).isPresent();
    }

    /** The simplified peak velocity pressure at a height above the ground, Pa; terrain and profile play no part in it. */
    double pressure(Site site, double height, Trace trace) {
        Rows rows = simplified.orElseThrow();
        String word = site.options().word("wind-zone").orElseThrow();
        List<String> ofSite = rows.keys().stream().filter(k -> rows.text(k, "site").equals(word)).toList();
        Source place = rows.number(ofSite.get(0), "pressure").source();
        if (site.ground().topography().isPresent() || site.ground().shapeUnknown()) {
            throw new NotCovered(edition.property("title"), place.place(), "the simplified pressure holds for flat ground only.",
                "Give the wind zone alone, \"" + number(word) + "\", for the procedure with the shape of the ground.");
        }
        String row = ofSite.stream().filter(k -> !Numbers.above(height, rows.number(k, "height").value())).findFirst().orElseThrow(() ->
            new OutsideTable(place, "prints no pressure above " + rows.text(ofSite.get(ofSite.size() - 1), "height") + " m; this case has " + Numbers.plain(height) + " m"));
        double printed = rows.number(row, "pressure").value() * Unit.of(Dimension.PRESSURE, "kN/m2").orElseThrow().toSi();
        double zone = zones.orElseThrow().number(number(word), "speed").value();
        double v = site.basicSpeed().metresPerSecond();
        Trace.Line line = trace.line(v == zone ? "velocity-pressure" : "zone-pressure", v == zone ? "q_p" : "q_z", "peak velocity pressure of the wind zone, simplified")
            .in("z_e", height, "m").from(place.citation(), place.status());
        double ofZone = line.reads("read at " + row + "; the terrain plays no part", printed, "Pa");
        return v == zone ? ofZone : inOtherWind(site, ofZone, zone, place, trace);
    }

    /** The pressure of a zone brought to a speed that is not that of the zone: it goes with the square of the speed. */
    private double inOtherWind(Site site, double ofZone, double zone, Source place, Trace trace) {
        double v = fundamental(site, trace);
        double speed = trace.line("zone-speed", "v_z", "fundamental basic wind velocity of the wind zone").from(place.citation(), place.status())
            .reads("read in the table of wind zones", zone, "m/s");
        return trace.line("velocity-pressure", "q_p", "peak velocity pressure, simplified, in another wind than that of the zone").in("q_z", ofZone, "Pa")
            .in("v_{b,0}", v, "m/s").in("v_z", speed, "m/s").from(place.citation(), place.status())
            .gives("q_z (v_{b,0} / v_z)²", ofZone * (v / speed) * (v / speed), "Pa");
    }

    private List<String> sites() {
        return simplified.map(rows -> rows.keys().stream().map(k -> rows.text(k, "site")).distinct().toList()).orElse(List.of());
    }

    /** The number of the zone without the words for its site. */
    private static String number(String word) {
        return word.split(" ", 2)[0];
    }
}
