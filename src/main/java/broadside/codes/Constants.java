package broadside.codes;

import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** The single numbers of an edition, from its constants.csv. */
final class Constants {

    private final Rows rows;
    private final Map<String, Coefficient> entries = new ConcurrentHashMap<>();

    Constants(Edition edition) {
        this.rows = edition.rows("constants");
    }

    /** A plain number, or a multiple of a length. */
    double number(String key) {
        return entry(key).value();
    }

    /** A length in metres, whatever its printed unit. */
    double metres(String key) {
        String unit = rows.text(key, "unit");
        double factor = Unit.of(Dimension.LENGTH, unit).orElseThrow(() ->
            new IllegalArgumentException("constants.csv " + key + ": " + unit + " is not a unit of length")).toSi();
        return number(key) * factor;
    }

    /** A pressure in pascals, whatever its printed unit. */
    double pascals(String key) {
        String unit = rows.text(key, "unit");
        double factor = Unit.of(Dimension.PRESSURE, unit).orElseThrow(() ->
            new IllegalArgumentException("constants.csv " + key + ": " + unit + " is not a unit of pressure")).toSi();
        return number(key) * factor;
    }

    /** The number with its source, to be recorded. */
    Coefficient entry(String key) {
        return entries.computeIfAbsent(key, this::read);
    }

    private Coefficient read(String key) {
        Coefficient found = rows.number(key, "value");
        return new Coefficient(found.value(), found.unit(), found.source(), "as printed");
    }

    Source source(String key) {
        return entry(key).source();
    }

    /** A number as it stands in a formula text. */
    String text(String key) {
        return Numbers.plain(number(key));
    }
}
