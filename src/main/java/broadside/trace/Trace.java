package broadside.trace;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.DoubleSupplier;
import java.util.function.DoubleUnaryOperator;

/**
 * The calculation sheet of one item. Recording a step hands its value back, so the sheet is the calculation:
 * what is printed is what was used.
 */
public final class Trace {

    /** A value that the user gave, before any step. */
    public record Given(String symbol, String meaning, double value, String unit, String typed) { }

    private final List<Given> givens;
    private final List<Step> steps; // null on a quiet sheet
    private final List<OwnValue> overrides;
    private final Set<OwnValue> used;
    private final Map<String, Double> found;
    private final String suffix;

    public Trace() {
        this(List.of());
    }

    public Trace(List<OwnValue> overrides) {
        this(new ArrayList<>(), new ArrayList<>(), List.copyOf(overrides), new HashSet<>(), new HashMap<>(), "");
    }

    private Trace(List<Given> givens, List<Step> steps, List<OwnValue> overrides, Set<OwnValue> used, Map<String, Double> found, String suffix) {
        this.givens = givens;
        this.steps = steps;
        this.overrides = overrides;
        this.used = used;
        this.found = found;
        this.suffix = suffix;
    }

    /**
     * A sheet that keeps nothing and only hands the values back, with the user's own values in their places: for trying
     * out what is then recorded once it is chosen.
     */
    public Trace quiet() {
        return new Trace(givens, null, overrides, new HashSet<>(), new HashMap<>(found), suffix);
    }

    /** The same sheet, with {@code part} behind a slash in the name of each step that is recorded through it. */
    public Trace part(String part) {
        return part.isEmpty() ? this : new Trace(givens, steps, overrides, used, found, suffix + "/" + part);
    }

    /**
     * Works a value out the first time and takes it over later, so that parts which share it do not repeat its steps.
     * Where a value of one part is replaced by the user, nothing is shared between parts.
     *
     * @param key    what the value depends on
     * @param first  works it out and records it
     * @param again  records that it is taken over
     */
    public double once(String key, DoubleSupplier first, DoubleUnaryOperator again) {
        if (found.containsKey(key) && overrides.stream().noneMatch(o -> o.name().contains("/"))) {
            return again.applyAsDouble(found.get(key));
        }
        double value = first.getAsDouble();
        found.put(key, value);
        return value;
    }

    /** Notes a value that the user gave and hands it back. */
    public double given(String symbol, String meaning, double value, String unit, String typed) {
        if (steps != null) {
            Given given = new Given(symbol, meaning, value, unit, typed);
            if (!givens.contains(given)) {
                givens.add(given);
            }
        }
        return value;
    }

    /** Begins a step; {@code name} is the fixed name of the quantity. */
    public Line line(String name, String symbol, String meaning) {
        return new Line(suffix.isEmpty() ? name : name + suffix, symbol, meaning);
    }

    public List<Given> givens() {
        return Collections.unmodifiableList(givens);
    }

    public List<Step> steps() {
        return steps == null ? List.of() : Collections.unmodifiableList(steps);
    }

    /** The value of a step that was recorded, by its whole name; the last one when it was recorded more than once. */
    public Optional<Step> find(String name) {
        List<Step> kept = steps();
        for (int i = kept.size() - 1; i >= 0; i--) {
            if (kept.get(i).name().equals(name)) {
                return Optional.of(kept.get(i));
            }
        }
        return Optional.empty();
    }

    /** The overrides that replaced a value. */
    public List<OwnValue> overridesUsed() {
        return overrides.stream().filter(used::contains).toList();
    }

    /** A step in the making. */
    public final class Line {

        private final String name;
        private final String symbol;
        private final String meaning;
        private final List<Step.Input> inputs = steps == null ? List.of() : new ArrayList<>(6);
        private String place = "";
        private Status status = Status.DERIVED;

        private Line(String name, String symbol, String meaning) {
            this.name = name;
            this.symbol = symbol;
            this.meaning = meaning;
        }

        /** A value that goes in, under the symbol that the formula uses. */
        public Line in(String inputSymbol, double value, String unit) {
            if (steps != null) {
                inputs.add(new Step.Input(inputSymbol, value, unit));
            }
            return this;
        }

        /** A plain number that goes in. */
        public Line in(String inputSymbol, double value) {
            return in(inputSymbol, value, "1");
        }

        /** Where the relation stands and how well that place is known. */
        public Line from(String thePlace, Status theStatus) {
            this.place = thePlace;
            this.status = theStatus;
            return this;
        }

        /** Ends the step with a relation in the input symbols; returns the recorded value. */
        public double gives(String formula, double value, String unit) {
            return record(Step.Way.RELATION, formula, value, unit);
        }

        /** Ends the step with how a table or rule was read; returns the recorded value. */
        public double reads(String how, double value, String unit) {
            return record(Step.Way.READING, how, value, unit);
        }

        private double record(Step.Way way, String formula, double value, String unit) {
            Optional<OwnValue> own = ownValue(unit);
            if (steps == null) {
                return own.map(OwnValue::value).orElse(Step.finite(name, value));
            }
            if (own.isEmpty()) {
                steps.add(new Step(name, symbol, meaning, way, formula, inputs, value, unit, place, status, Optional.empty()));
                return value;
            }
            used.add(own.get());
            steps.add(new Step(name, symbol, meaning, Step.Way.READING, "set by the user: " + own.get().reason(), List.of(),
                own.get().value(), unit, "user's own value", Status.GIVEN,
                Optional.of(new Step.Replaced(value, own.get().reason()))));
            return own.get().value();
        }

        /** An override holds for its step in every part of the item, or for one part when it names it. */
        private Optional<OwnValue> ownValue(String unit) {
            if (overrides.isEmpty()) {
                return Optional.empty();
            }
            String bare = name.endsWith(suffix) ? name.substring(0, name.length() - suffix.length()) : name;
            return overrides.stream()
                .filter(o -> o.unit().equals(unit) && (o.name().equals(name) || o.name().equals(bare)))
                .findFirst();
        }
    }
}
