package broadside.codes;

import broadside.site.Site;
import broadside.trace.Status;
import broadside.trace.Trace;

/** The last step to a net pressure, the same for every code: the authority's least pressure, where one is given; it holds for suction too. */
final class NetPressure {

    /**
     * Records the pressure of a zone.
     *
     * @param line     makes the step of the code's own rule, under the name it is given
     * @param formula  the code's relation
     * @param value    what it gives, Pa
     * @return the net pressure that counts, Pa; the least counts for suction as it does for pressure
     */
    static double record(Site site, Level level, Trace trace, String zone, String symbol, Maker line, String formula, double value) {
        if (site.authorityMinimum().isEmpty()) {
            return line.begin("pressure/" + zone, symbol).gives(formula, value, "Pa");
        }
        double own = line.begin("code-pressure/" + zone, symbol + "'").gives(formula, value, "Pa");
        double least = trace.once("authority minimum", () -> least(site.authorityMinimum().get(), level, trace), known -> known);
        Trace.Line larger = trace.line("pressure/" + zone, symbol, "net pressure: the larger of the code's and the authority's least")
            .in(symbol + "'", own, "Pa").in("p_{min}", least, "Pa").from("authority's least pressure", Status.GIVEN);
        return own < 0 ? larger.gives("min(" + symbol + "'; -p_{min})", Math.min(own, -least), "Pa")
            : larger.gives("max(" + symbol + "'; p_{min})", Math.max(own, least), "Pa");
    }

    /** Begins the step of the code's own rule. */
    interface Maker {
        Trace.Line begin(String name, String symbol);
    }

    private static double least(Site.AuthorityMinimum minimum, Level level, Trace trace) {
        double typed = trace.given("p_a", "least pressure asked for by the authority", minimum.pressure().pascals(), "Pa",
            minimum.pressure().typed());
        boolean raise = minimum.service() && level.name().equals("strength");
        if (raise) {
            return trace.line("authority-minimum", "p_{min}", "the authority's least pressure, brought from service to strength level")
                .in("p_a", typed, "Pa").in("f", level.factor()).from(level.place(), level.status())
                .gives("p_a / f", typed / level.factor(), "Pa");
        }
        return trace.line("authority-minimum", "p_{min}", "the authority's least pressure, taken at the level of the code's loads")
            .in("p_a", typed, "Pa").from("authority's least pressure", Status.GIVEN).gives("p_a", typed, "Pa");
    }

    private NetPressure() { }
}
