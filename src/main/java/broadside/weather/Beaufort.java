package broadside.weather;

import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.table.Coefficient;
import broadside.table.Rows;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The Beaufort scale: mean over 10 minutes at 10 m over open ground. Forces go by the printed edges, as classes that reach up to
 * the first speed of the next one, and never by the formula.
 */
public final class Beaufort {

    /** A unit in which the scale is printed. */
    public enum Scale {
        METRES_PER_SECOND("m/s", "ms"), KNOTS("kn", "kn"), KILOMETRES_PER_HOUR("km/h", "kmh"), MILES_PER_HOUR("mph", "mph");

        private final String symbol;
        private final String column;

        Scale(String symbol, String column) {
            this.symbol = symbol;
            this.column = column;
        }

        /** The unit as typed. */
        public String symbol() {
            return symbol;
        }

        public static Optional<Scale> of(String symbol) {
            return java.util.Arrays.stream(values()).filter(s -> s.symbol.equals(symbol)).findFirst();
        }

        double toSi() {
            return Unit.of(Dimension.SPEED, symbol).orElseThrow().toSi();
        }
    }

    /**
     * One force as printed in one unit; speeds in that unit.
     *
     * @param to    last printed speed, absent where none is printed
     * @param also  other edges in km/h that some tables print, such as "30-39"
     */
    public record Force(int number, String name, Scale scale, double from, OptionalDouble to, Optional<String> also, Optional<String> effect) { }

    /**
     * A speed on the scale.
     *
     * @param force   by the edges of the unit in which the speed was given
     * @param byUnit  by the edges of each unit
     * @param told    where the printed edges do not agree about this speed
     */
    public record Reading(Force force, Map<Scale, Integer> byUnit, List<String> told) { }

    private final WeatherTables tables;
    private final Rows rows;

    public Beaufort(WeatherTables tables) {
        this.tables = tables;
        this.rows = tables.beaufort;
    }

    /** A force by its number, 0 to 12. */
    public Force force(int number, Scale scale) {
        String key = Integer.toString(number);
        if (!rows.has(key)) {
            throw new UnfitWeather("force", "the scale has the forces 0 to " + last());
        }
        return new Force(number, rows.text(key, "name"), scale, rows.number(key, scale.column + "-from").value(),
            rows.isPrinted(key, scale.column + "-to") ? OptionalDouble.of(rows.number(key, scale.column + "-to").value()) : OptionalDouble.empty(),
            printed(key, "also"), printed(key, "effect"));
    }

    /** All forces in one unit, from calm. */
    public List<Force> forces(Scale scale) {
        return rows.keys().stream().map(k -> force(Integer.parseInt(k), scale)).toList();
    }

    /** Records the first and last printed speed of a force as "class-from" and "class-to", m/s. */
    public Force recorded(int number, Scale scale, Trace trace) {
        Force force = force(number, scale);
        edge(force, "class-from", "v_1", "first speed of force " + number + " (" + force.name() + ")", "-from", trace);
        if (force.to().isPresent()) {
            edge(force, "class-to", "v_2", "last speed of force " + number + " (" + force.name() + ")", "-to", trace);
        }
        return force;
    }

    private void edge(Force force, String step, String symbol, String meaning, String end, Trace trace) {
        Coefficient printed = rows.number(Integer.toString(force.number()), force.scale().column + end);
        trace.line(step, symbol, meaning).from(printed.source().citation(), printed.source().status())
            .reads("printed as " + Plain.number(printed.value()) + " " + force.scale().symbol(), printed.value() * force.scale().toSi(), "m/s");
    }

    /**
     * The force of a mean speed, recorded as "beaufort-force", and by the edges of each unit as "beaufort-force/kn" and so on.
     *
     * @param speed  mean over 10 minutes at 10 m, in {@code scale}, not below zero
     */
    public Reading read(double speed, Scale scale, Trace trace) {
        if (!(speed >= 0) || !Double.isFinite(speed)) {
            throw new UnfitWeather("speed", "a speed on the Beaufort scale is not below zero");
        }
        Map<Scale, Integer> byUnit = new LinkedHashMap<>();
        for (Scale each : Scale.values()) {
            byUnit.put(each, number(each == scale ? speed : speed * scale.toSi() / each.toSi(), each));
        }
        Force force = force(byUnit.get(scale), scale);
        trace.given("v", "mean wind speed at 10 m", speed * scale.toSi(), "m/s", Plain.number(speed) + " " + scale.symbol());
        Coefficient printed = rows.number(Integer.toString(force.number()), scale.column + "-from");
        byUnit.forEach((each, number) -> trace.part(each.symbol().replace("/", "-"))
            .line("beaufort-force", "B_{" + each.symbol() + "}", "force by the edges in " + each.symbol()).in("v", speed * scale.toSi(), "m/s")
            .from(printed.source().citation(), printed.source().status()).reads(rows.text(Integer.toString(number), "name"), number, "1"));
        trace.line("beaufort-force", "B", "force by the edges in the unit of the speed, " + scale.symbol()).in("v", speed * scale.toSi(), "m/s")
            .from(printed.source().citation(), printed.source().status()).reads(force.name(), force.number(), "1");
        return new Reading(force, byUnit, told(speed, scale, force, byUnit));
    }

    private List<String> told(double speed, Scale scale, Force force, Map<Scale, Integer> byUnit) {
        List<String> told = new ArrayList<>();
        byUnit.forEach((each, number) -> {
            if (number != force.number()) {
                told.add("The printed edges in " + each.symbol() + " make this speed force " + number + ", those in " + scale.symbol() + " force "
                    + force.number() + ".");
            }
        });
        Scale kilometres = Scale.KILOMETRES_PER_HOUR;
        // 62 km/h through m/s and back is not 62 in binary
        double kmh = (scale == kilometres ? speed : speed * scale.toSi() / kilometres.toSi()) * (1 + 1e-12);
        for (Force each : forces(kilometres)) {
            each.also().ifPresent(other -> {
                int dash = other.indexOf('-');
                double from = Double.parseDouble(other.substring(0, dash));
                double to = Double.parseDouble(other.substring(dash + 1));
                double next = each.to().orElse(to) + 1;
                if (kmh >= Math.min(from, each.from()) && kmh < Math.max(from, each.from()) || kmh >= next && kmh < to + 1) {
                    told.add(String.format(Locale.ROOT, "Some tables print %s km/h for force %d where others print %s-%s.", other, each.number(),
                        Plain.number(each.from()), Plain.number(each.to().orElse(to))));
                }
            });
        }
        return told;
    }

    private int number(double speed, Scale scale) {
        int found = 0;
        for (String key : rows.keys()) {
            // 12 km/h in knots and back is not 12 in binary
            if (speed >= rows.number(key, scale.column + "-from").value() * (1 - 1e-12)) {
                found = Integer.parseInt(key);
            }
        }
        return found;
    }

    /** The middle of a class by the formula v = 0.836 B^1.5, m/s; recorded as "beaufort-speed". Not for classes. */
    public double speedByFormula(double force, Trace trace) {
        if (!(force >= 0 && force <= last())) {
            throw new UnfitWeather("force", "the formula is for the forces 0 to " + last());
        }
        trace.given("B", "Beaufort force", force, "1", Plain.number(force));
        return tables.cite(trace.line("beaufort-speed", "v_B", "middle of the class by the formula"), "beaufort-factor").in("B", force)
            .gives(tables.text("beaufort-factor") + " B^" + tables.text("beaufort-power"),
                tables.number("beaufort-factor") * Math.pow(force, tables.number("beaufort-power")), "m/s");
    }

    private int last() {
        return rows.keys().size() - 1;
    }

    private Optional<String> printed(String key, String column) {
        return rows.isPrinted(key, column) ? Optional.of(rows.text(key, column)) : Optional.empty();
    }
}
