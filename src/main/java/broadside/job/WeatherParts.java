package broadside.job;

import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Speed;
import broadside.quantity.Typed;
import broadside.quantity.Unit;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import broadside.weather.Beaufort;
import broadside.weather.ForecastWind;
import broadside.weather.Gumbel;
import broadside.weather.GustFactors;
import broadside.weather.Risk;
import broadside.weather.UnfitWeather;
import broadside.weather.WeatherTables;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import tools.jackson.databind.JsonNode;

/** Published checks of gusts, the Beaufort scale, forecasts and extremes, without a job. */
final class WeatherParts {

    static final String NAMES = "gust-factor, beaufort, forecast-gust, open-wind, gumbel-fit (also extremes), return-level, lifetime-risk";

    private final WeatherTables tables;
    private final GustFactors gusts;
    private final Beaufort beaufort;
    private final ForecastWind forecasts;
    private final Gumbel gumbel;

    WeatherParts(TableLibrary library) {
        this.tables = new WeatherTables(library);
        this.gusts = new GustFactors(tables);
        this.beaufort = new Beaufort(tables);
        this.forecasts = new ForecastWind(tables);
        this.gumbel = new Gumbel(tables);
    }

    Trace run(String part, JsonNode given) {
        try {
            return switch (part) {
                case "gust-factor" -> gustFactor(given);
                case "beaufort" -> beaufort(given);
                case "forecast-gust" -> forecastGust(given);
                case "open-wind" -> openWind(given);
                case "lifetime-risk" -> risk(given);
                default -> extremes(given, part.equals("return-level"));
            };
        } catch (UnfitWeather e) {
            throw PublishedChecks.bad(e.field() + ": " + e.getMessage());
        }
    }

    /**
     * "gust-seconds", "mean-seconds", optional "turbulence" (that of the open ground of a forecast without it), "ground" (land, coast, sea; land
     * without it) and "relation": one relation, step "gust-ratio"; all of them without it, with "gust-ratio-least" and "gust-ratio-greatest".
     */
    private Trace gustFactor(JsonNode given) {
        Trace trace = new Trace();
        double gust = number(given, "gust-seconds");
        double mean = number(given, "mean-seconds");
        double turbulence = given.has("turbulence") ? number(given, "turbulence") : gusts.openTurbulence();
        String word = given.has("ground") ? PublishedChecks.text(given, "ground") : "land";
        GustFactors.Ground ground = Arrays.stream(GustFactors.Ground.values()).filter(g -> g.word().equals(word)).findFirst()
            .orElseThrow(() -> PublishedChecks.bad("ground must be land, coast or sea"));
        String relation = PublishedChecks.text(given, "relation");
        if (relation.isEmpty()) {
            gusts.band(gust, mean, turbulence, ground, trace);
        } else {
            gusts.ratio(relation, gust, mean, turbulence, trace);
        }
        return trace;
    }

    /** "speed" with a unit of the scale: "beaufort-force"; or "force", with "unit" for "class-from" and "class-to", without it "beaufort-speed". */
    private Trace beaufort(JsonNode given) {
        Trace trace = new Trace();
        if (given.has("speed")) {
            Reading.Value speed = speed(given, "speed");
            Beaufort.Scale scale = scale(speed.unit().symbol());
            beaufort.read(speed.si() / speed.unit().toSi(), scale, trace);
            return trace;
        }
        double force = number(given, "force");
        if (!given.has("unit")) {
            beaufort.speedByFormula(force, trace);
            return trace;
        }
        if (force != Math.rint(force)) {
            throw PublishedChecks.bad("force must be a whole number");
        }
        beaufort.recorded((int) force, scale(PublishedChecks.text(given, "unit")), trace);
        return trace;
    }

    private static Beaufort.Scale scale(String unit) {
        return Beaufort.Scale.of(unit).orElseThrow(() -> PublishedChecks.bad("the scale is printed in m/s, kn, km/h and mph"));
    }

    /**
     * "mean" or "gust" at 10 m, "height" of the item, optional "roughness" of its ground, "forecast-roughness" (open ground without them) and
     * "mean-seconds" (600 without it): "mean-at-item", "gust-at-item", "gust-at-item/least" and "gust-at-item/greatest".
     */
    private Trace forecastGust(JsonNode given) {
        Trace trace = new Trace();
        boolean gust = given.has("gust");
        Reading.Value speed = speed(given, gust ? "gust" : "mean");
        ForecastWind.Kind kind = gust ? ForecastWind.Kind.GUST : ForecastWind.Kind.MEAN;
        forecasts.atItem(new ForecastWind.Forecast(kind, new Speed(speed.si(), speed.typed()), meanSeconds(given)), place(given), trace);
        return trace;
    }

    /** "gust" at the item and the place as for "forecast-gust": "open-mean" and "open-gust"; with "sensor-height": "sensor-mean" and "sensor-gust". */
    private Trace openWind(JsonNode given) {
        Trace trace = new Trace();
        Reading.Value speed = speed(given, "gust");
        Speed gust = new Speed(speed.si(), speed.typed());
        if (given.has("sensor-height")) {
            forecasts.atSensor(gust, meanSeconds(given), place(given), Parts.positive(given, "sensor-height", Dimension.LENGTH, "10 m"), trace);
        } else {
            forecasts.inTheOpen(gust, meanSeconds(given), place(given), trace);
        }
        return trace;
    }

    private ForecastWind.Place place(JsonNode given) {
        double open = given.has("forecast-roughness") ? Parts.positive(given, "forecast-roughness", Dimension.LENGTH, "0.03 m") : tables.openRoughness();
        double own = given.has("roughness") ? Parts.positive(given, "roughness", Dimension.LENGTH, "0.25 m") : open;
        return new ForecastWind.Place(open, own, Parts.positive(given, "height", Dimension.LENGTH, "3 m"));
    }

    private static double meanSeconds(JsonNode given) {
        return given.has("mean-seconds") ? number(given, "mean-seconds") : 600;
    }

    /**
     * "series" of annual maxima, "unit", "method" (moments or maximum likelihood), optional "years" of record: "location", "scale", and
     * "return-level/T" for the numbers of "return-periods", or 50 and 100 years.
     */
    private Trace extremes(JsonNode given, boolean asked) {
        Trace trace = new Trace();
        Unit unit = Unit.of(Dimension.SPEED, PublishedChecks.text(given, "unit"))
            .orElseThrow(() -> PublishedChecks.bad("unit must be one of speed, like \"km/h\""));
        Gumbel.Method method = Gumbel.Method.of(PublishedChecks.text(given, "method"))
            .orElseThrow(() -> PublishedChecks.bad("method must be \"moments\" or \"maximum likelihood\""));
        List<Double> maxima = numbers(given, "series").stream().map(v -> v * unit.toSi()).toList();
        Gumbel.Fit fit = gumbel.fit(maxima, given.has("years") ? number(given, "years") : maxima.size(), method, trace);
        if (asked && !given.has("return-periods")) {
            throw PublishedChecks.bad("return-periods must be a list of numbers of years");
        }
        for (double years : given.has("return-periods") ? numbers(given, "return-periods") : List.of(50.0, 100.0)) {
            gumbel.level(fit, years, trace);
        }
        return trace;
    }

    /** "years" with "return-period": "risk"; or with "risk": "annual-chance" and "return-period". */
    private Trace risk(JsonNode given) {
        Trace trace = new Trace();
        if (given.has("risk")) {
            Risk.returnPeriod(number(given, "risk"), number(given, "years"), trace);
        } else {
            Risk.of(number(given, "return-period"), number(given, "years"), trace);
        }
        return trace;
    }

    private static Reading.Value speed(JsonNode given, String name) {
        Reading reading = Typed.read(PublishedChecks.text(given, name), Dimension.SPEED);
        if (!(reading instanceof Reading.Value value) || !(value.si() >= 0)) {
            throw PublishedChecks.bad(name + ": a speed not below zero is typed with its unit, like \"12 m/s\"");
        }
        return value;
    }

    private static List<Double> numbers(JsonNode given, String name) {
        JsonNode list = given.path(name);
        List<Double> numbers = new ArrayList<>();
        for (JsonNode each : list) {
            if (!each.isNumber() || !Double.isFinite(each.doubleValue())) {
                throw PublishedChecks.bad(name + " must hold plain numbers");
            }
            numbers.add(each.doubleValue());
        }
        if (!list.isArray() || numbers.isEmpty()) {
            throw PublishedChecks.bad(name + " must be a list of numbers");
        }
        return numbers;
    }

    private static double number(JsonNode given, String name) {
        JsonNode node = given.path(name);
        if (!node.isNumber() || !Double.isFinite(node.doubleValue())) {
            throw PublishedChecks.bad(name + " must be a plain number");
        }
        return node.doubleValue();
    }
}
