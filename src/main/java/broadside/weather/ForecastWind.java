package broadside.weather;

import broadside.quantity.Speed;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * From a forecast at 10 m in the open to the 3 s gust at an item, and back. The mean is brought to other ground under the same wind
 * aloft, to the height by the logarithmic profile, and to the gust by a peak factor g of the turbulence: V = U (1 + g / ln(z/z_0)).
 * The published relations of gust and mean give other peak factors; least and greatest result go with each answer.
 */
public final class ForecastWind {

    private static final double GUST_SECONDS = 3;
    private static final String OWN = "peak factor of the closed form";

    /** What the forecast names: a mean, or a 3 s gust. */
    public enum Kind { MEAN, GUST }

    /**
     * A forecast at 10 m.
     *
     * @param meanSeconds  time of the mean that is forecast, or in which the gust is the highest: 600 or 3600
     */
    public record Forecast(Kind kind, Speed speed, double meanSeconds) { }

    /**
     * Ground and height.
     *
     * @param openRoughness  roughness length of the ground of the forecast, m
     * @param roughness      roughness length of the ground at the item, m
     * @param height         of the item above the ground, m
     */
    public record Place(double openRoughness, double roughness, double height) { }

    /** A result by the peak factor of one relation, m/s. */
    public record Limit(String relation, double value) { }

    /**
     * Wind at the item, m/s.
     *
     * @param openGust  gust at the item if the ground there were that of the forecast: nothing credited for rougher ground
     */
    public record AtItem(double mean, double gust, double openGust, Limit least, Limit greatest) { }

    /** Wind at 10 m in the open, m/s; the limits are those of the mean and of the gust. */
    public record InTheOpen(double mean, double gust, Limit leastMean, Limit greatestMean, Limit leastGust, Limit greatestGust) { }

    /** What a sensor over the ground of the item reads, m/s. */
    public record AtSensor(double mean, double gust, Limit leastMean, Limit greatestMean, Limit leastGust, Limit greatestGust) { }

    private record Peak(String relation, double g) { }

    private final WeatherTables tables;
    private final GustFactors factors;
    private final GroundProfile ground;

    public ForecastWind(WeatherTables tables) {
        this.tables = tables;
        this.factors = new GustFactors(tables);
        this.ground = new GroundProfile(tables);
    }

    /** The 3 s gust at the item; recorded as "mean-at-item", "gust-at-item", "gust-open-ground", "gust-at-item/least" and "/greatest". */
    public AtItem atItem(Forecast forecast, Place place, Trace trace) {
        double typed = requireSpeed("speed", forecast.speed());
        double z = given(place, trace);
        boolean gust = forecast.kind() == Kind.GUST;
        String symbol = gust ? "V_f" : "U_f";
        trace.given(symbol, gust ? "forecast gust at 10 m" : "forecast mean at 10 m", typed, "m/s", forecast.speed().typed());
        double kr = ground.groundRatio(place.roughness(), place.openRoughness(), trace);
        double g = peak(trace);
        double uf = gust ? openMean(typed, g, place, trace) : typed;
        double mean = meanAtItem(uf, kr, z, place.roughness(), trace);
        double result = gustAtItem(mean, g, z, place.roughness(), trace);
        double open = GroundProfile.gust(trace.line("gust-open-ground", "V_o", "gust at the item if the ground there were that of the forecast"))
            .in("U_f", uf, "m/s").in("z", z, "m").in("z_{0f}", place.openRoughness(), "m").in("g", g)
            .gives("U_f (ln(z / z_{0f}) + g) / " + ground.logTen("z_{0f}"),
                uf * (Math.log(z / place.openRoughness()) + g) / ground.logTen(place.openRoughness()), "m/s");
        List<Limit> all = new ArrayList<>();
        for (Peak peak : peaks(forecast.meanSeconds(), place)) {
            Trace quiet = trace.quiet();
            double u = gust ? openMean(typed, peak.g(), place, quiet) : typed;
            all.add(new Limit(peak.relation(), gustAtItem(meanAtItem(u, kr, z, place.roughness(), quiet), peak.g(), z, place.roughness(), quiet)));
        }
        Limit least = limit(all, true, "gust-at-item", "V", trace);
        return new AtItem(mean, result, open, least, limit(all, false, "gust-at-item", "V", trace));
    }

    /** Mean and gust at 10 m in the open behind a gust at the item; recorded as "open-mean" and "open-gust", with "/least" and "/greatest". */
    public InTheOpen inTheOpen(Speed gustAtItem, double meanSeconds, Place place, Trace trace) {
        double v = requireSpeed("gust", gustAtItem);
        double z = given(place, trace);
        trace.given("V", "gust at the item", v, "m/s", gustAtItem.typed());
        double kr = ground.groundRatio(place.roughness(), place.openRoughness(), trace);
        double[] own = back(v, kr, peak(trace), z, place, trace);
        List<Limit> means = new ArrayList<>();
        List<Limit> gusts = new ArrayList<>();
        for (Peak peak : peaks(meanSeconds, place)) {
            double[] each = back(v, kr, peak.g(), z, place, trace.quiet());
            means.add(new Limit(peak.relation(), each[0]));
            gusts.add(new Limit(peak.relation(), each[1]));
        }
        return new InTheOpen(own[0], own[1], limit(means, true, "open-mean", "U_f", trace), limit(means, false, "open-mean", "U_f", trace),
            limit(gusts, true, "open-gust", "V_f", trace), limit(gusts, false, "open-gust", "V_f", trace));
    }

    /** Mean and gust that a sensor at another height over the same ground reads at a gust at the item; recorded as "sensor-mean" and "sensor-gust". */
    public AtSensor atSensor(Speed gustAtItem, double meanSeconds, Place place, double sensorHeight, Trace trace) {
        double v = requireSpeed("gust", gustAtItem);
        double z = given(place, trace);
        double zs = trace.given("z_s", "height of the sensor above the ground", ground.requireSensor(sensorHeight, place.roughness()), "m",
            Plain.number(sensorHeight) + " m");
        trace.given("V", "gust at the item", v, "m/s", gustAtItem.typed());
        double[] own = sensor(v, peak(trace), z, zs, place.roughness(), trace);
        List<Limit> means = new ArrayList<>();
        List<Limit> gusts = new ArrayList<>();
        for (Peak peak : peaks(meanSeconds, place)) {
            double[] each = sensor(v, peak.g(), z, zs, place.roughness(), trace.quiet());
            means.add(new Limit(peak.relation(), each[0]));
            gusts.add(new Limit(peak.relation(), each[1]));
        }
        return new AtSensor(own[0], own[1], limit(means, true, "sensor-mean", "U_s", trace), limit(means, false, "sensor-mean", "U_s", trace),
            limit(gusts, true, "sensor-gust", "V_s", trace), limit(gusts, false, "sensor-gust", "V_s", trace));
    }

    private double given(Place place, Trace trace) {
        double z0 = ground.requireRoughness("roughness", place.roughness());
        double open = ground.requireRoughness("forecast-roughness", place.openRoughness());
        trace.given("z_{0f}", "roughness length of the ground of the forecast", open, "m", Plain.number(open) + " m");
        trace.given("z_0", "roughness length of the ground at the item", z0, "m", Plain.number(z0) + " m");
        return ground.heightUsed(place.height(), z0, trace);
    }

    private double peak(Trace trace) {
        return tables.rule("peak-factor").into(trace.line("peak-factor", "g", "gust above the mean in units of the turbulence"));
    }

    /**
     * The peak factors that the relations stand for: (r - 1) ln(10/z_0) over the ground of each relation, so that a factor found over one
     * ground is not carried to another.
     */
    private List<Peak> peaks(double meanSeconds, Place place) {
        double turbulence = 1 / ground.logTen(place.openRoughness());
        List<Peak> peaks = new ArrayList<>(List.of(new Peak(OWN, tables.number("peak-factor"))));
        for (GustFactors.Ratio each : factors.ratios(GUST_SECONDS, requireMean(meanSeconds), turbulence, GustFactors.Ground.LAND, new Trace().quiet())) {
            peaks.add(new Peak(each.relation().title(), (each.value() - 1) * ground.logTen(each.relation().roughness().orElse(place.openRoughness()))));
        }
        return peaks;
    }

    private double openMean(double gust, double g, Place place, Trace trace) {
        return GroundProfile.gust(trace.line("open-mean", "U_f", "mean at 10 m in the open")).in("V_f", gust, "m/s").in("g", g)
            .in("z_{0f}", place.openRoughness(), "m")
            .gives("V_f / (1 + g / " + ground.logTen("z_{0f}") + ")", gust / (1 + g / ground.logTen(place.openRoughness())), "m/s");
    }

    private double meanAtItem(double uf, double kr, double z, double z0, Trace trace) {
        double ten = GroundProfile.profile(trace.line("mean-at-10-m", "U_10", "mean at 10 m over the ground of the item")).in("k_r", kr).in("U_f", uf, "m/s")
            .gives("k_r U_f", kr * uf, "m/s");
        return GroundProfile.profile(trace.line("mean-at-item", "U_z", "mean at the height of the item")).in("U_10", ten, "m/s").in("z", z, "m")
            .in("z_0", z0, "m")
            .gives("U_10 ln(z / z_0) / " + ground.logTen("z_0"), ten * Math.log(z / z0) / ground.logTen(z0), "m/s");
    }

    private double gustAtItem(double mean, double g, double z, double z0, Trace trace) {
        double i = turbulence(z, z0, trace);
        return GroundProfile.gust(trace.line("gust-at-item", "V", "3 s gust at the height of the item")).in("U_z", mean, "m/s").in("g", g).in("I_z", i)
            .gives("U_z (1 + g I_z)", mean * (1 + g * i), "m/s");
    }

    private double turbulence(double z, double z0, Trace trace) {
        return GroundProfile.profile(trace.line("turbulence-intensity", "I_z", "intensity of turbulence at the height of the item")).in("z", z, "m")
            .in("z_0", z0, "m")
            .gives("1 / ln(z / z_0)", 1 / Math.log(z / z0), "1");
    }

    private double meanOfGust(double v, double g, double z, double z0, Trace trace) {
        double i = turbulence(z, z0, trace);
        return GroundProfile.gust(trace.line("mean-at-item", "U_z", "mean at the height of the item")).in("V", v, "m/s").in("g", g).in("I_z", i)
            .gives("V / (1 + g I_z)", v / (1 + g * i), "m/s");
    }

    private double[] back(double v, double kr, double g, double z, Place place, Trace trace) {
        double z0 = place.roughness();
        double mean = meanOfGust(v, g, z, z0, trace);
        double ten = GroundProfile.profile(trace.line("mean-at-10-m", "U_10", "mean at 10 m over the ground of the item")).in("U_z", mean, "m/s")
            .in("z", z, "m")
            .in("z_0", z0, "m").gives("U_z " + ground.logTen("z_0") + " / ln(z / z_0)", mean * ground.logTen(z0) / Math.log(z / z0), "m/s");
        double open = GroundProfile.profile(trace.line("open-mean", "U_f", "mean at 10 m in the open")).in("U_10", ten, "m/s").in("k_r", kr)
            .gives("U_10 / k_r", ten / kr, "m/s");
        double gust = GroundProfile.gust(trace.line("open-gust", "V_f", "3 s gust at 10 m in the open")).in("U_f", open, "m/s").in("g", g)
            .in("z_{0f}", place.openRoughness(), "m")
            .gives("U_f (1 + g / " + ground.logTen("z_{0f}") + ")", open * (1 + g / ground.logTen(place.openRoughness())), "m/s");
        return new double[] {open, gust};
    }

    private double[] sensor(double v, double g, double z, double zs, double z0, Trace trace) {
        double mean = meanOfGust(v, g, z, z0, trace);
        double reads = GroundProfile.profile(trace.line("sensor-mean", "U_s", "mean at the height of the sensor")).in("U_z", mean, "m/s")
            .in("z_s", zs, "m").in("z", z, "m")
            .in("z_0", z0, "m").gives("U_z ln(z_s / z_0) / ln(z / z_0)", mean * Math.log(zs / z0) / Math.log(z / z0), "m/s");
        double gust = GroundProfile.gust(trace.line("sensor-gust", "V_s", "3 s gust at the height of the sensor")).in("U_s", reads, "m/s")
            .in("g", g).in("z_s", zs, "m")
            .in("z_0", z0, "m").gives("U_s (1 + g / ln(z_s / z_0))", reads * (1 + g / Math.log(zs / z0)), "m/s");
        return new double[] {reads, gust};
    }

    private Limit limit(List<Limit> all, boolean least, String step, String symbol, Trace trace) {
        Comparator<Limit> by = Comparator.comparingDouble(Limit::value);
        Limit found = (least ? all.stream().min(by) : all.stream().max(by)).orElseThrow();
        String end = least ? "least" : "greatest";
        trace.line(step + "/" + end, symbol + (least ? "_{min}" : "_{max}"), end + " by the published relations")
            .from("published relations of gust and mean, each by its peak factor (r - 1) ln(10 / z_0)", Status.RECALLED)
            .reads("by " + found.relation(), found.value(), "m/s");
        return found;
    }

    private double requireSpeed(String field, Speed speed) {
        double greatest = tables.number("greatest-speed");
        if (!(speed.metresPerSecond() > 0 && speed.metresPerSecond() <= greatest)) {
            throw new UnfitWeather(field, "a wind speed is above zero and not above the highest gust ever measured, " + Plain.number(greatest) + " m/s");
        }
        return speed.metresPerSecond();
    }

    private static double requireMean(double seconds) {
        if (seconds != 600 && seconds != 3600) {
            throw new UnfitWeather("mean-seconds", "a forecast mean is one of 600 s or 3600 s");
        }
        return seconds;
    }
}
