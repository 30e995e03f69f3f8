package broadside.weather;

import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/**
 * Ratio of the highest mean over a short time (a gust) to the mean over a longer time at 10 m, by each published relation.
 * They disagree: the ratio depends on turbulence, and so on the ground, and on the kind of storm.
 */
public final class GustFactors {

    private static final String STEP = "gust-ratio";
    private static final String TABLE = "wmo-";

    /** Ground for which the table of tropical cyclones has columns of its own. */
    public enum Ground {
        LAND, COAST, SEA;

        public String word() {
            return name().toLowerCase(java.util.Locale.ROOT);
        }
    }

    /**
     * A published relation.
     *
     * @param wind       "any", or "tropical" for cyclones and hurricanes only
     * @param roughness  roughness length of the ground that it stands for, m; absent where turbulence goes in
     */
    public record Relation(String key, String title, String wind, OptionalDouble roughness, Status status, String place) { }

    /** A ratio by one relation; a plain number. */
    public record Ratio(Relation relation, double value) { }

    /** Where the relations lie furthest apart. */
    public record Band(Ratio least, Ratio greatest, List<Ratio> all) { }

    private final WeatherTables tables;
    private final GustCurves curves;

    public GustFactors(WeatherTables tables) {
        this.tables = tables;
        this.curves = new GustCurves(tables);
    }

    /** Intensity of turbulence at 10 m over the open ground of a forecast, 1/ln(10/z_0). */
    public double openTurbulence() {
        return 1 / new GroundProfile(tables).logTen(tables.openRoughness());
    }

    /** The relations that hold over that ground, curves first. */
    public List<Relation> relations(Ground ground) {
        Rows places = tables.gustPlaces;
        return Stream.concat(tables.gustCurves.keys().stream(), places.keys().stream()
            .filter(p -> List.of(places.text(p, "ground").split("; ")).contains(ground.word())).map(p -> TABLE + p)).map(this::relation).toList();
    }

    /** A relation by its key, such as "durst-asce" or "wmo-in-land". */
    public Relation relation(String key) {
        if (tables.gustCurves.has(key)) {
            return curves.relation(key);
        }
        String place = key.startsWith(TABLE) ? key.substring(TABLE.length()) : "";
        if (!tables.gustPlaces.has(place)) {
            throw new UnfitWeather("relation", "there is no relation of that name; there are " + String.join(", ", tables.gustCurves.keys()) + " and, with "
                + TABLE + " before them, " + String.join(", ", tables.gustPlaces.keys()));
        }
        return new Relation(key, tables.gustPlaces.text(place, "title"), "tropical", OptionalDouble.of(tables.gustPlaces.number(place, "roughness").value()),
            tables.gustTable.number("600/3", place).source().status(), tables.gustTable.number("600/3", place).source().citation());
    }

    /** Whether the relation covers a gust of that many seconds within a mean of that many seconds. */
    public boolean covers(String key, double gustSeconds, double meanSeconds) {
        if (!(gustSeconds > 0) || !(meanSeconds >= gustSeconds) || !Double.isFinite(meanSeconds)) {
            return false;
        }
        return key.startsWith(TABLE) ? tables.gustTable.has(row(gustSeconds, meanSeconds)) : curves.covers(key, gustSeconds, meanSeconds);
    }

    /**
     * The ratio by one relation, recorded as the step "gust-ratio".
     *
     * @param turbulence  intensity of turbulence at 10 m, a plain number; used by the relations that ask for it
     * @throws UnfitWeather where the relation does not cover these times
     */
    public Ratio ratio(String key, double gustSeconds, double meanSeconds, double turbulence, Trace trace) {
        Relation relation = relation(key);
        requireTimes(gustSeconds, meanSeconds, turbulence);
        if (!covers(key, gustSeconds, meanSeconds)) {
            throw new UnfitWeather("gust-seconds", relation.title() + " does not cover a gust of " + within(gustSeconds, meanSeconds));
        }
        if (key.startsWith(TABLE)) {
            return new Ratio(relation, tables.gustTable.number(row(gustSeconds, meanSeconds), key.substring(TABLE.length()))
                .into(trace.line(STEP, "r", "gust over mean, " + relation.title())));
        }
        return new Ratio(relation, curves.ratio(key, gustSeconds, meanSeconds, turbulence, trace));
    }

    /** The ratio by each relation that covers the times, each on its own part of the sheet, such as "gust-ratio/cem". */
    public List<Ratio> ratios(double gustSeconds, double meanSeconds, double turbulence, Ground ground, Trace trace) {
        requireTimes(gustSeconds, meanSeconds, turbulence);
        List<Ratio> all = new ArrayList<>();
        for (Relation relation : relations(ground)) {
            if (covers(relation.key(), gustSeconds, meanSeconds)) {
                all.add(ratio(relation.key(), gustSeconds, meanSeconds, turbulence, trace.part(relation.key())));
            }
        }
        return all;
    }

    /** All ratios with the least and the greatest, recorded as "gust-ratio-least" and "gust-ratio-greatest". */
    public Band band(double gustSeconds, double meanSeconds, double turbulence, Ground ground, Trace trace) {
        List<Ratio> all = ratios(gustSeconds, meanSeconds, turbulence, ground, trace);
        if (all.isEmpty()) {
            throw new UnfitWeather("gust-seconds", "no published relation covers a gust of " + within(gustSeconds, meanSeconds));
        }
        Ratio least = all.stream().min(Comparator.comparingDouble(Ratio::value)).orElseThrow();
        Ratio greatest = all.stream().max(Comparator.comparingDouble(Ratio::value)).orElseThrow();
        named(trace, "gust-ratio-least", "r_{min}", "least of the published ratios", least);
        named(trace, "gust-ratio-greatest", "r_{max}", "greatest of the published ratios", greatest);
        return new Band(least, greatest, all);
    }

    private static void named(Trace trace, String step, String symbol, String meaning, Ratio ratio) {
        Relation relation = ratio.relation();
        trace.line(step, symbol, meaning).from(relation.place(), relation.status()).reads("by " + relation.title(), ratio.value(), "1");
    }

    private static void requireTimes(double gustSeconds, double meanSeconds, double turbulence) {
        if (!(gustSeconds > 0) || !(meanSeconds >= gustSeconds) || !Double.isFinite(meanSeconds)) {
            throw new UnfitWeather("mean-seconds", "the time of the mean must not be shorter than that of the gust, and both above zero");
        }
        if (!(turbulence > 0) || !(turbulence < 1)) {
            throw new UnfitWeather("turbulence", "the intensity of turbulence is a number between 0 and 1, such as 0.17 in open country");
        }
    }

    private static String within(double gustSeconds, double meanSeconds) {
        return Plain.number(gustSeconds) + " s within " + Plain.number(meanSeconds) + " s";
    }

    private static String row(double gustSeconds, double meanSeconds) {
        return Plain.number(meanSeconds) + "/" + Plain.number(gustSeconds);
    }
}
