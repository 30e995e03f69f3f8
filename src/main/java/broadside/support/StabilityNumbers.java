package broadside.support;

import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Trace;

/** Numbers taken where nothing was typed, from assumptions.csv, and the numbers of fixings.csv. */
final class StabilityNumbers {

    private final Rows own;
    private final Rows fixings;

    StabilityNumbers(Edition stability) {
        this.own = stability.rows("assumptions");
        this.fixings = stability.rows("fixings");
    }

    double value(String key) {
        return own.number(key, "value").value();
    }

    /** Acceleration of free fall, m/s2, recorded as g_n. */
    double gravity(Trace trace) {
        return record(own, "gravity", "free-fall", "g_n", "acceleration of free fall", "m/s²", trace);
    }

    /** A length, m, recorded. */
    double length(String key, String symbol, String meaning, Trace trace) {
        return record(own, key, key, symbol, meaning, "m", trace);
    }

    double fixing(String key) {
        return fixings.number(key, "value").value();
    }

    /** A plain number of the table of fixings, recorded. */
    double fixing(String key, String symbol, String meaning, Trace trace) {
        return record(fixings, key, key, symbol, meaning, "1", trace);
    }

    private static double record(Rows rows, String key, String step, String symbol, String meaning, String unit, Trace trace) {
        Coefficient found = rows.number(key, "value");
        return trace.line(step, symbol, meaning).from(found.source().citation() + ": " + rows.text(key, "place"), found.source().status())
            .reads(found.how(), found.value(), unit);
    }
}
