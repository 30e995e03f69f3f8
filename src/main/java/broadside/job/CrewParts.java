package broadside.job;

import broadside.crew.ActionLevels;
import broadside.crew.CraneWind;
import broadside.crew.Crew;
import broadside.crew.Handling;
import broadside.crew.LeadTime;
import broadside.crew.UnfitFigure;
import broadside.quantity.Dimension;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tools.jackson.databind.JsonNode;

/** Published checks of what a crew is told: levels, classes, handling, lifting. */
final class CrewParts {

    private static final String MINUTES = "-minutes";

    private final Crew crew;

    CrewParts(TableLibrary tables) {
        this.crew = new Crew(tables);
    }

    Trace run(String part, JsonNode given) {
        Trace trace = new Trace();
        try {
            switch (part) {
                case "action-levels" -> levels(given, trace);
                case "evacuation-class" -> crew.classes().design(PublishedChecks.text(given, "class"),
                    given.has("pressure") ? Optional.of(Parts.positive(given, "pressure", Dimension.PRESSURE, "800 Pa")) : Optional.empty(),
                    Parts.positive(given, "air-density", Dimension.DENSITY, "1.25 kg/m3"), trace);
                case "handling" -> handling(given, trace);
                case "person-in-wind" -> person(given, trace);
                case "published-limit" -> crew.limits().record(PublishedChecks.text(given, "limit"), trace);
                default -> crane(given, trace);
            }
        } catch (UnfitFigure e) {
            throw PublishedChecks.bad(e.field() + ": " + e.getMessage());
        }
        return trace;
    }

    private void levels(JsonNode given, Trace trace) {
        double limit = Parts.positive(given, "limit", Dimension.SPEED, "18 m/s");
        List<ActionLevels.Level> levels = crew.levels().of(limit, reading(given), trace);
        Map<String, Double> times = new LinkedHashMap<>();
        crew.levels().keys().stream().filter(k -> given.has(k + MINUTES)).forEach(k -> times.put(k, 60 * number(given, k + MINUTES)));
        if (times.isEmpty()) {
            return;
        }
        Optional<String> weather = given.has("weather") ? Optional.of(PublishedChecks.text(given, "weather")) : Optional.empty();
        Optional<Double> rise = given.has("rise-in-an-hour")
            ? Optional.of(Parts.positive(given, "rise-in-an-hour", Dimension.SPEED, "10 m/s") / 3600) : Optional.empty();
        Optional<Double> work = given.has("work-limit") ? Optional.of(Parts.positive(given, "work-limit", Dimension.SPEED, "7 m/s")) : Optional.empty();
        crew.leadTime().starts(levels, limit, new LeadTime.Plan(times, weather, rise, work), trace);
    }

    private static Optional<ActionLevels.Reading> reading(JsonNode given) {
        if (!given.has("share-of")) {
            return Optional.empty();
        }
        return switch (PublishedChecks.text(given, "share-of")) {
            case "speed" -> Optional.of(ActionLevels.Reading.SPEED);
            case "load" -> Optional.of(ActionLevels.Reading.LOAD);
            default -> throw PublishedChecks.bad("share-of is \"speed\" or \"load\"");
        };
    }

    private void handling(JsonNode given, Trace trace) {
        Handling.Sheet sheet = new Handling.Sheet(Parts.positive(given, "width", Dimension.LENGTH, "2.44 m"),
            Parts.positive(given, "height", Dimension.LENGTH, "1.22 m"));
        if (given.has("speed")) {
            double angle = PublishedChecks.text(given, "angle").equals("0 deg") ? 0 : Parts.positive(given, "angle", Dimension.ANGLE, "90 deg");
            crew.handling().force(sheet, angle, Parts.positive(given, "speed", Dimension.SPEED, "8 m/s"), trace);
        } else if (given.has("people")) {
            crew.handling().held(sheet, List.of(people(given)), trace);
        } else {
            crew.handling().held(sheet, trace);
        }
    }

    private void person(JsonNode given, Trace trace) {
        if (given.has("mean")) {
            crew.person().comfort(Parts.positive(given, "mean", Dimension.SPEED, "8 m/s"), trace);
        }
        if (given.has("speed")) {
            crew.person().force(Parts.positive(given, "speed", Dimension.SPEED, "15 m/s"), trace);
        }
        if (given.has("mass")) {
            crew.person().slidingSpeed(Parts.positive(given, "mass", Dimension.MASS, "70 kg"), trace);
        }
    }

    private void crane(JsonNode given, Trace trace) {
        double drag = given.has("shape") ? crew.crane().drag(PublishedChecks.text(given, "shape")) : number(given, "drag-coefficient");
        CraneWind.Load load = new CraneWind.Load(Parts.positive(given, "mass", Dimension.MASS, "50 kg"),
            Parts.positive(given, "area", Dimension.AREA, "3 m2"), drag);
        double chart = Parts.positive(given, "chart-speed", Dimension.SPEED, "9 m/s");
        if (given.path("standard").asBoolean(false)) {
            crew.crane().standard(load, chart, trace);
        } else {
            crew.crane().lift(load, chart, trace);
        }
    }

    private static int people(JsonNode given) {
        if (!given.path("people").isInt()) {
            throw PublishedChecks.bad("people: a whole number like 2");
        }
        return given.path("people").intValue();
    }

    private static double number(JsonNode given, String name) {
        JsonNode node = given.path(name);
        if (!node.isNumber() || !Double.isFinite(node.doubleValue())) {
            throw PublishedChecks.bad(name + ": a plain number");
        }
        return node.doubleValue();
    }
}
