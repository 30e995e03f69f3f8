package broadside.weather;

import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.TableFormat;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import java.util.List;

/** The tables of weather, all read at once, so that one that is missing stops the start. */
public final class WeatherTables {

    public static final String EDITION = "weather/1";
    private static final String OPEN_FLOW = "open-flow/1";

    /** A class of ground: number, name, roughness length in m. */
    public record GroundClass(String key, String name, double roughness) { }

    final Rows gustTable;
    final Rows gustPlaces;
    final Rows gustCurves;
    final Rows gustLong;
    final Rows beaufort;
    private final Rows rules;
    private final Rows flow;
    private final Rows roughness;

    /** Reads the tables; throws {@link TableFormat} when one is missing. */
    public WeatherTables(TableLibrary tables) {
        Edition own = edition(tables, EDITION);
        gustTable = own.rows("gust-table");
        gustPlaces = own.rows("gust-places");
        gustCurves = own.rows("gust-curves");
        gustLong = own.rows("gust-long");
        beaufort = own.rows("beaufort");
        rules = own.rows("weather-rules");
        roughness = own.rows("roughness-classes");
        flow = edition(tables, OPEN_FLOW).rows("constants");
    }

    /** The classes of ground as printed, smoothest first. */
    public List<GroundClass> groundClasses() {
        return roughness.keys().stream().map(k -> new GroundClass(k, roughness.text(k, "name"), roughness.number(k, "roughness").value())).toList();
    }

    /** Roughness length of the open ground for which forecasts are made, m. */
    public double openRoughness() {
        return number("open-roughness");
    }

    /** A single number, from the rules of weather or from the constants of open flow. */
    Coefficient rule(String key) {
        return rules.has(key) ? rules.number(key, "value") : flow.number(key, "value");
    }

    double number(String key) {
        return rule(key).value();
    }

    /** The number as it stands in a formula. */
    String text(String key) {
        return Plain.number(number(key));
    }

    /** The place and status of a number, for a step that uses it. */
    Trace.Line cite(Trace.Line line, String key) {
        Rows table = rules.has(key) ? rules : flow;
        return line.from(table.text(key, "place"), rule(key).source().status());
    }

    private static Edition edition(TableLibrary tables, String key) {
        return tables.edition(key).orElseThrow(() -> new TableFormat(key + "/edition.properties", 1, "this edition is missing"));
    }
}
