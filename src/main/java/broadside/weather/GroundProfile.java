package broadside.weather;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Mean wind and gust near the ground by the logarithmic profile of the neutral wind: U(z) goes with ln(z/z_0), the intensity of
 * turbulence is 1/ln(z/z_0), the gust is U (1 + g I). Heights in m, speeds in m/s.
 */
final class GroundProfile {

    private static final String PROFILE = "logarithmic profile of the neutral wind";
    private static final String HEIGHT = "reference-height";

    private final WeatherTables tables;

    GroundProfile(WeatherTables tables) {
        this.tables = tables;
    }

    /** Refuses ground for which no roughness length is printed. */
    double requireRoughness(String field, double z0) {
        double least = tables.number("least-roughness");
        double greatest = tables.number("greatest-roughness");
        if (!(z0 >= least && z0 <= greatest)) {
            throw new UnfitWeather(field, "roughness lengths are printed from " + Plain.number(least) + " m for the sea to " + Plain.number(greatest)
                + " m for suburbs and forest; up to 10 m above the ground the smaller one gives the larger gust");
        }
        return z0;
    }

    /** The height of the item, not below the lowest for which the profile is used; recorded as "height-used". */
    double heightUsed(double height, double z0, Trace trace) {
        requireHeight("height", height);
        trace.given("h", "height of the item above the ground", height, "m", Plain.number(height) + " m");
        return tables.cite(trace.line("height-used", "z", "height at which the wind is read"), "least-height").in("h", height, "m").in("z_0", z0, "m")
            .gives("max(h; " + tables.text("least-height") + "; " + tables.text("least-height-roughness") + " z_0)", Math.max(height, least(z0)), "m");
    }

    /** A sensor has to stand where the profile holds. */
    double requireSensor(double height, double z0) {
        requireHeight("sensor-height", height);
        if (height < least(z0)) {
            throw new UnfitWeather("sensor-height", "over this ground the wind is known from " + Plain.number(least(z0))
                + " m above it: a sensor stands higher");
        }
        return height;
    }

    private void requireHeight(String field, double height) {
        double greatest = tables.number("greatest-height");
        if (!(height > 0 && height <= greatest)) {
            throw new UnfitWeather(field, "the wind near the ground is worked out above the ground and up to " + Plain.number(greatest) + " m");
        }
    }

    private double least(double z0) {
        return Math.max(tables.number("least-height"), tables.number("least-height-roughness") * z0);
    }

    double logTen(double z0) {
        return Math.log(tables.number(HEIGHT) / z0);
    }

    /** ln(10/z_0) as it stands in a formula. */
    String logTen(String z0) {
        return "ln(" + tables.text(HEIGHT) + " / " + z0 + ")";
    }

    /** Mean at 10 m over the ground of the item over that over the ground of the forecast, under the same wind aloft; recorded as "ground-ratio". */
    double groundRatio(double z0, double z0Forecast, Trace trace) {
        String power = tables.text("upper-wind-exponent");
        return tables.cite(trace.line("ground-ratio", "k_r", "mean at 10 m over the ground of the item over that of the forecast"), "upper-wind-exponent")
            .in("z_0", z0, "m").in("z_{0f}", z0Forecast, "m")
            .gives("(z_0 / z_{0f})^" + power + " " + logTen("z_0") + " / " + logTen("z_{0f}"),
                Math.pow(z0 / z0Forecast, tables.number("upper-wind-exponent")) * logTen(z0) / logTen(z0Forecast), "1");
    }

    static Trace.Line profile(Trace.Line line) {
        return line.from(PROFILE, Status.SECOND_HAND);
    }

    static Trace.Line gust(Trace.Line line) {
        return line.from("gust = mean (1 + g I), I = 1 / ln(z / z_0), peak factor g", Status.DERIVED);
    }
}
