package broadside.weather;

import broadside.table.Coefficient;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.OptionalDouble;

/** The published curves of a mean over t seconds over a longer mean, each worked out on the sheet. */
final class GustCurves {

    private final Rows curves;
    private final Rows beyond;

    GustCurves(WeatherTables tables) {
        this.curves = tables.gustCurves;
        this.beyond = tables.gustLong;
    }

    GustFactors.Relation relation(String key) {
        Coefficient first = curves.number(key, "a");
        OptionalDouble ground = curves.isPrinted(key, "roughness") ? OptionalDouble.of(number(key, "roughness")) : OptionalDouble.empty();
        return new GustFactors.Relation(key, curves.text(key, "title"), curves.text(key, "wind"), ground, first.source().status(), curves.text(key, "place"));
    }

    /** A curve begins and ends at its printed times; one relative to 600 s says nothing about longer means. */
    boolean covers(String key, double gustSeconds, double meanSeconds) {
        double base = number(key, "base");
        boolean longMean = meanSeconds > base && beyond.has(key) && meanSeconds <= beyond.number(key, "to").value();
        return gustSeconds >= number(key, "from") && gustSeconds <= number(key, "to") && (meanSeconds == base || longMean
            || meanSeconds >= number(key, "from") && meanSeconds <= number(key, "to"));
    }

    /** r = G(t)/G(T), with G(T) = 1 where T is the time to which the curve relates its means. */
    double ratio(String key, double gustSeconds, double meanSeconds, double turbulence, Trace trace) {
        Source from = source(key);
        String meaning = "gust over mean, " + curves.text(key, "title");
        double gust = value(key, gustSeconds, "t", "G_t", turbulence, trace.part("gust"));
        if (meanSeconds == number(key, "base")) {
            return trace.line("gust-ratio", "r", meaning).in("G_t", gust).from(from.place(), from.status()).gives("G_t", gust, "1");
        }
        double mean = meanSeconds > number(key, "base") ? longMean(key, meanSeconds, trace.part("mean"))
            : value(key, meanSeconds, "T", "G_T", turbulence, trace.part("mean"));
        return trace.line("gust-ratio", "r", meaning).in("G_t", gust).in("G_T", mean).from(from.place(), from.status())
            .gives("G_t / G_T", gust / mean, "1");
    }

    private double longMean(String key, double seconds, Trace trace) {
        trace.given("T", "averaging time", seconds, "s", Plain.number(seconds) + " s");
        double a = beyond.number(key, "a").value();
        double b = beyond.number(key, "b").value();
        Coefficient found = beyond.number(key, "a");
        double value = a - b * Math.log(seconds) / Math.log(10);
        return trace.line("curve", "G_T", "mean over T over the hourly mean").in("T", seconds, "s").from(beyond.text(key, "place"), found.source().status())
            .gives(Plain.number(a) + " - " + Plain.number(b) + " ln(T) / ln(10)", value, "1");
    }

    private double value(String key, double seconds, String time, String symbol, double turbulence, Trace trace) {
        trace.given(time, "averaging time", seconds, "s", Plain.number(seconds) + " s");
        Source from = source(key);
        Trace.Line line = trace.line("curve", symbol, "mean over " + time + " over the mean over " + text(key, "base") + " s").in(time, seconds, "s")
            .from(from.place(), from.status());
        double a = number(key, "a");
        double base = number(key, "base");
        return switch (curves.text(key, "form")) {
            case "power" -> line.gives(text(key, "a") + " + " + text(key, "b") + " / (1 + (" + time + " / " + text(key, "c") + ")^" + text(key, "d") + ")",
                a + number(key, "b") / (1 + Math.pow(seconds / number(key, "c"), number(key, "d"))), "1");
            case "tanh" -> tanh(key, seconds, time, symbol, trace);
            case "turbulence-hour" -> {
                trace.given("I_u", "intensity of turbulence at 10 m", turbulence, "1", Plain.number(turbulence));
                yield line.in("I_u", turbulence).gives("1 + " + text(key, "a") + " I_u ln(" + text(key, "base") + " / " + time + ")",
                    1 + a * turbulence * Math.log(base / seconds), "1");
            }
            case "turbulence-short" -> {
                trace.given("I_u", "intensity of turbulence at 10 m", turbulence, "1", Plain.number(turbulence));
                yield line.in("I_u", turbulence).gives("1 + (" + text(key, "a") + " + " + text(key, "b") + " ln(" + text(key, "base") + " / " + time + " - "
                    + text(key, "c") + ")) I_u", 1 + (a + number(key, "b") * Math.log(base / seconds - number(key, "c"))) * turbulence, "1");
            }
            default -> throw new IllegalStateException(curves.text(key, "form") + " is no form of a gust curve");
        };
    }

    /** tanh x = 1 - 2/(e^(2 x) + 1). */
    private double tanh(String key, double seconds, String time, String symbol, Trace trace) {
        Source from = source(key);
        double x = trace.line("curve-argument", "x", "argument of the curve").in(time, seconds, "s").from(from.place(), from.status())
            .gives(text(key, "d") + " ln(" + text(key, "c") + " / " + time + ") / ln(10)",
                number(key, "d") * Math.log(number(key, "c") / seconds) / Math.log(10), "1");
        return trace.line("curve", symbol, "mean over " + time + " over the mean over " + text(key, "base") + " s").in("x", x)
            .from(from.place(), from.status())
            .gives(text(key, "a") + " + " + text(key, "b") + " (1 - 2 / (exp(2 x) + 1))",
                number(key, "a") + number(key, "b") * (1 - 2 / (Math.exp(2 * x) + 1)), "1");
    }

    private record Source(String place, Status status) { }

    private Source source(String key) {
        return new Source(curves.text(key, "place"), curves.number(key, "a").source().status());
    }

    private double number(String key, String column) {
        return curves.number(key, column).value();
    }

    private String text(String key, String column) {
        return Plain.number(number(key, column));
    }
}
