package broadside.codes;

import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.Optional;

/** The basic wind speed of ASCE 7, lowered for a short stay by ASCE 37 where the user asks for that rule. */
final class Asce7Stay {

    private final Rows classes;

    Asce7Stay(Edition edition) {
        this.classes = edition.rows("short-stay");
    }

    /** The speed that counts, m/s, and its symbol. */
    record Speed(String symbol, double value) { }

    Speed speed(Site site, Trace trace) {
        double v = trace.given("V", "basic wind speed, 3 s gust", site.basicSpeed().metresPerSecond(), "m/s", site.basicSpeed().typed());
        if (site.options().word("duration-rule").isEmpty()) {
            return new Speed("V", v);
        }
        Source place = classes.number(classes.keys().get(0), "factor").source();
        double years = site.options().si("stands-for").orElseThrow(() -> new NotCovered(place.publicationAndEdition(), place.place(),
            "the rule for a short stay was asked for, but how long the item stands was not given.", "Give stands-for, such as 6 months, or leave the rule out."));
        trace.given("T", "how long it stands", years, "years", site.options().quantities().get("stands-for").typed());
        Trace.Line line = trace.line("duration-factor", "k_T", "factor on the speed for a short stay; it presumes that the site controls access").in("T", years, "years");
        Optional<Coefficient> found = classes.keys().stream().filter(stay -> holds(stay, years)).findFirst().map(stay -> classes.number(stay, "factor"));
        double factor = found.isPresent() ? found.get().into(line) : line.from(place.citation(), place.status()).reads("1, as it stands longer than any printed class", 1, "1");
        return new Speed("V_T", trace.line("design-speed", "V_T", "wind speed for a short stay").in("k_T", factor).in("V", v, "m/s").from(place.citation(), place.status())
            .gives("k_T V", factor * v, "m/s"));
    }

    private boolean holds(String stay, double years) {
        double end = classes.number(stay, "to").value() * Unit.of(Dimension.PERIOD, classes.text(stay, "unit")).orElseThrow().toSi();
        return classes.text(stay, "counts").equals("yes") ? !Numbers.above(years, end) : !Numbers.atLeast(years, end);
    }
}
