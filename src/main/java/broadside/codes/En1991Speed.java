package broadside.codes;

import broadside.quantity.Period;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Basic wind velocity of EN 1991-1-4, 4.2, with the return period of EN 1991-1-6 for short stays, and the altitude and
 * the seasons of national tables where an overlay has them.
 */
final class En1991Speed {

    private final Edition edition;
    private final Constants constants;
    private final Rows durations;
    private final Optional<Rows> altitude;
    private final Optional<Rows> seasons;
    private final En1991WindZones zones;
    private final String name;

    En1991Speed(Edition edition, En1991WindZones zones) {
        this.edition = edition;
        this.constants = new Constants(edition);
        this.durations = edition.rows("execution-duration");
        this.altitude = edition.has("altitude-factor") ? Optional.of(edition.rows("altitude-factor")) : Optional.empty();
        this.seasons = edition.has("season") ? Optional.of(edition.rows("season")) : Optional.empty();
        this.zones = zones;
        this.name = constants.source("peak-constant").publicationAndEdition();
    }

    /** Refuses a season that the tables do not have, or one beside a factor for it. */
    void check(SiteOptions options) {
        options.word("season").filter(s -> seasons.isPresent()).ifPresent(season -> {
            if (!seasons.get().has(season)) {
                throw new IllegalArgumentException("the season is none of " + edition.property("title") + "; it has " + String.join(", ", seasons.get().keys()));
            }
            if (options.number("season-factor").isPresent()) {
                throw new IllegalArgumentException("season stands beside season-factor; give one of the two");
            }
        });
    }

    /** A factor of the basic wind velocity with its symbol. */
    private record Factor(String symbol, double value) { }

    /** Basic wind velocity v_b in m/s; the height above the ground counts for the altitude only. */
    double basic(Site site, double height, Trace trace) {
        List<Factor> factors = new ArrayList<>();
        altitude.ifPresent(rows -> factors.add(new Factor("c_{alt}", altitudeFactor(rows, site, height, trace))));
        double vb0 = zones.fundamental(site, trace);
        factors.add(new Factor("c_{dir}", factor(site, trace, "direction-factor", "c_{dir}", "direction factor")));
        factors.add(new Factor("c_{season}", season(site, trace)));
        Optional<Stay> stay = stay(site, trace);
        stay.ifPresent(s -> factors.add(new Factor("c_{prob}", probability(s.years(), trace))));
        Trace.Line line = trace.line("basic-speed", "v_b", "basic wind velocity")
            .from(name + ", 4.2(2), (4.1)" + (stay.isPresent() ? " and (4.2)" : ""), constants.source("peak-constant").status());
        StringBuilder formula = new StringBuilder();
        double product = 1;
        for (Factor factor : factors) {
            line.in(factor.symbol(), factor.value());
            formula.append(factor.symbol()).append(' ');
            product *= factor.value();
        }
        line.in("v_{b,0}", vb0, "m/s");
        formula.append("v_{b,0}");
        double least = stay.map(Stay::least).orElse(0.0);
        return least == 0 ? line.gives(formula.toString(), product * vb0, "m/s")
            : line.in("v_{min}", least, "m/s").gives("max(" + formula + "; v_{min})", Math.max(product * vb0, least), "m/s");
    }

    /** Without the altitude the speed would come out too low, so that nothing is worked out. */
    private double altitudeFactor(Rows rows, Site site, double height, Trace trace) {
        Source place = rows.number("rise", "value").source();
        if (site.ground().altitude().isEmpty()) {
            throw new NotCovered(edition.property("title"), "altitude factor", "the altitude of the site is needed: it raises the wind speed of the map.",
                "Give the altitude above the sea.");
        }
        double a = trace.given("A_s", "altitude of the site above the sea", site.ground().altitude().get().metres(), "m", site.ground().altitude().get().typed());
        Trace.Line line = trace.line("altitude-factor", "c_{alt}", "altitude factor").in("A_s", a, "m").from(place.citation(), place.status());
        if (a < 0) {
            return line.reads("1, as the site lies below the sea", 1, "1");
        }
        double rise = rows.number("rise", "value").value();
        double low = rows.number("height", "value").value();
        double power = rows.number("exponent", "value").value();
        String plain = "1 + " + Numbers.plain(rise) + " A_s";
        return Numbers.above(height, low) ? line.in("z_e", height, "m").gives(plain + " (" + Numbers.plain(low) + " / z_e)^" + Numbers.plain(power),
            1 + rise * a * Math.pow(low / height, power), "1") : line.gives(plain, 1 + rise * a, "1");
    }

    private double season(Site site, Trace trace) {
        return site.options().word("season").map(word -> seasons.orElseThrow().number(word, "value")
            .into(trace.line("season-factor", "c_{season}", "season factor, as it stands in: " + word)))
            .orElseGet(() -> factor(site, trace, "season-factor", "c_{season}", "season factor"));
    }

    private double factor(Site site, Trace trace, String key, String symbol, String meaning) {
        return site.options().number(key)
            .map(typed -> trace.line(key, symbol, meaning).from("given", Status.GIVEN).reads("as given", typed, "1"))
            .orElseGet(() -> constants.entry(key).into(trace.line(key, symbol, meaning + ", recommended value")));
    }

    /** What a return period or a short stay asks for: the return period in years and the least speed in m/s, 0 for none. */
    private record Stay(double years, double least) { }

    private Optional<Stay> stay(Site site, Trace trace) {
        boolean rule = site.options().word("duration-rule").isPresent();
        if (site.returnPeriod().isPresent()) {
            Period typed = site.returnPeriod().get();
            return Optional.of(new Stay(trace.given("T", rule ? "return period; it was typed, so it counts and not the rule for a short stay" : "return period",
                typed.years(), "years", typed.typed()), 0));
        }
        return rule ? Optional.of(shortStay(site, trace)) : Optional.empty();
    }

    /** The return period by how long it stands, EN 1991-1-6, table 3.1. */
    private Stay shortStay(Site site, Trace trace) {
        Source table = durations.number(durations.keys().get(0), "years").source();
        double stay = site.options().si("stands-for").orElseThrow(() -> new NotCovered(table.publicationAndEdition(), table.place(),
            "the rule for a short stay is asked for, but how long it stands is not given.", "Say how long it stands, or leave the rule out."));
        String row = durations.keys().stream().filter(k -> !durations.isPrinted(k, "limit")
            || !Numbers.above(stay, Period.of(durations.text(k, "limit")).years())).findFirst().orElseThrow();
        Coefficient years = durations.number(row, "years");
        double t = trace.line("return-period", "T", "return period of the wind for a stay of " + site.options().quantities().get("stands-for").typed())
            .from(table.citation(), table.status()).reads(years.how(), years.value(), "years");
        if (!durations.isPrinted(row, "least-speed")) {
            return new Stay(t, 0);
        }
        return new Stay(t, trace.line("least-basic-speed", "v_{min}", "least basic wind velocity for a short stay, recommended value")
            .from(table.citation(), table.status()).reads(years.how(), durations.number(row, "least-speed").value(), "m/s"));
    }

    private double probability(double t, Trace trace) {
        double k = constants.number("probability-k");
        double n = constants.number("probability-n");
        double reference = constants.number("probability-reference");
        double ratio = (1 - k * Math.log(-Math.log(1 - 1 / t))) / (1 - k * Math.log(-Math.log(1 - reference)));
        Source source = constants.source("probability-k");
        boolean national = !source.publication().equals(edition.property("publication"));
        return trace.line("probability-factor", "c_{prob}", "probability factor")
            .from(name + ", 4.2(2) note 4, (4.2)" + (national ? "; K and n by " + source.citation() : ""), source.status()).in("T", t, "years")
            .gives("((1 - " + constants.text("probability-k") + " ln(-ln(1 - 1 / T))) / (1 - " + constants.text("probability-k") + " ln(-ln(1 - "
                + Numbers.plain(reference) + "))))^" + constants.text("probability-n"), Math.pow(ratio, n), "1");
    }
}
