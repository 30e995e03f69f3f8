package broadside.codes;

import broadside.quantity.Period;
import broadside.quantity.Quantity;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.OutsideTable;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/** Design wind speed and wind pressure of IS 875 (Part 3), 6.3 and 7.2. */
final class Is875Wind {

    private static final String GENERAL = "general";
    private static final String TEMPORARY = "temporary";

    private final Constants constants;
    private final Rows risk;
    private final Rows classes;
    private final Curve terrain;
    private final Rows cyclone;
    private final Is875Topography topography;
    private final Source place;

    Is875Wind(Edition edition) {
        this.constants = new Constants(edition);
        this.risk = edition.rows("risk-factor");
        this.classes = edition.rows("structure-classes");
        this.terrain = edition.curve("terrain-factor");
        this.cyclone = edition.rows("cyclone-factor");
        this.topography = new Is875Topography(edition);
        this.place = constants.source("pressure-factor");
    }

    /** Wind pressure p_z at a height above the ground, Pa. */
    double pressure(Site site, double height, Trace trace) {
        double vb = trace.given("V_b", "basic wind speed, 3 s gust", site.basicSpeed().metresPerSecond(), "m/s", site.basicSpeed().typed());
        double k1 = riskFactor(site, vb, trace);
        double k2 = terrain.at(site.ground().terrain(), height)
            .into(trace.line("terrain-factor", "k_2", "terrain and height factor, terrain category " + site.ground().terrain()).in("z", height, "m"));
        double k3 = topography.factor(site.ground(), trace);
        double k4 = cycloneFactor(site, trace);
        double vz = trace.line("site-speed", "V_z", "design wind speed").in("V_b", vb, "m/s").in("k_1", k1).in("k_2", k2).in("k_3", k3).in("k_4", k4)
            .from(place.publicationAndEdition() + ", 6.3", place.status()).gives("V_b k_1 k_2 k_3 k_4", vb * k1 * k2 * k3 * k4, "m/s");
        double factor = constants.number("pressure-factor");
        return trace.line("velocity-pressure", "p_z", "wind pressure at the height z").in("V_z", vz, "m/s").from(place.citation(), place.status())
            .gives(Numbers.plain(factor) + " V_z²", factor * vz * vz, "Pa");
    }

    private double riskFactor(Site site, double vb, Trace trace) {
        Optional<Quantity> stay = site.options().word("structure-class").isPresent() ? Optional.empty() : shortStay(site, trace);
        String structure = site.options().word("structure-class").orElse(stay.isPresent() ? TEMPORARY : GENERAL);
        return printed(structure, vb).into(trace.line("risk-factor", "k_1", "risk factor: " + classes.text(structure, "years") + " years, "
            + classes.text(structure, "structures") + stay.map(s -> "; by the rule for a short stay, as it stands for " + s.typed()).orElse("")).in("V_b", vb, "m/s"));
    }

    /** How long it stands, where the rule for a short stay was asked for and covers that. */
    private Optional<Quantity> shortStay(Site site, Trace trace) {
        if (site.options().word("duration-rule").isEmpty() || !(site.options().quantities().get("stands-for") instanceof Period stay)) {
            return Optional.empty();
        }
        trace.given("N", "how long it stands", stay.years(), "years", stay.typed());
        return Numbers.above(stay.years(), classes.number(TEMPORARY, "years").value()) ? Optional.empty() : Optional.of(stay);
    }

    /** The table has no rule between its speeds: the larger of the two neighbours counts. General structures have 1.0 at every speed. */
    private Coefficient printed(String structure, double vb) {
        List<String> speeds = risk.keys();
        if (structure.equals(GENERAL)) {
            Coefficient first = risk.number(speeds.get(0), GENERAL);
            return new Coefficient(first.value(), "1", first.source(), first.value() + ", as at every printed basic speed");
        }
        for (int i = 0; i < speeds.size(); i++) {
            double speed = Double.parseDouble(speeds.get(i));
            Coefficient here = risk.number(speeds.get(i), structure);
            if (Numbers.atLeast(vb, speed) && !Numbers.above(vb, speed)) {
                return new Coefficient(here.value(), "1", here.source(), "read at V_b = " + speeds.get(i) + " m/s");
            }
            if (i > 0 && vb < speed && vb > Double.parseDouble(speeds.get(i - 1))) {
                Coefficient before = risk.number(speeds.get(i - 1), structure);
                return new Coefficient(Math.max(before.value(), here.value()), "1", here.source(), "the larger of the values printed at V_b = " + speeds.get(i - 1)
                    + " m/s (" + before.value() + ") and " + speeds.get(i) + " m/s (" + here.value() + "), as no rule is given between them");
            }
        }
        throw new OutsideTable(risk.number(speeds.get(0), structure).source(), "covers V_b from " + speeds.get(0) + " to " + speeds.get(speeds.size() - 1)
            + " m/s for structures of the class " + structure + "; this case has " + (double) Math.round(vb * 1000) / 1000);
    }

    private double cycloneFactor(Site site, Trace trace) {
        String others = "all other structures";
        Coefficient least = cyclone.number(others, "value");
        Trace.Line line = trace.line("cyclone-factor", "k_4", "cyclone factor, for the coastal belt of 60 km of the east coast and Gujarat");
        if (site.options().number("k4").isEmpty()) {
            return line.from(least.source().citation(), least.source().status()).reads("none given: outside that belt, or " + others, least.value(), "1");
        }
        double typed = site.options().number("k4").get();
        if (!Numbers.atLeast(typed, least.value())) {
            throw new NotCovered(least.source().publicationAndEdition(), least.source().place(), "a cyclone factor of " + Numbers.plain(typed)
                + " is below " + least.value() + ", the least that is printed.", "Give the printed value of the structure.");
        }
        return line.from("given", Status.GIVEN).reads("as given; printed are " + String.join(", ", cyclone.keys().stream()
            .map(k -> cyclone.text(k, "value") + " for " + k).toList()), typed, "1");
    }
}
