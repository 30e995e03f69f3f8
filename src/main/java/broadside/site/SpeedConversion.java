package broadside.site;

import broadside.quantity.Speed;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Converts a wind speed from one averaging time to another over open terrain at 10 m, by the ratio to the hourly mean
 * (C. S. Durst, 1960). The ratio depends on turbulence: in rougher terrain and in tropical storms it is larger.
 */
public final class SpeedConversion {

    private final Curve ratioToHour;

    public SpeedConversion(Curve ratioToHour) {
        this.ratioToHour = ratioToHour;
    }

    /** The speed averaged over {@code to}, in m/s; recorded as the step "speed". */
    public double convert(Speed speed, Averaging from, Averaging to, Trace trace) {
        double v = trace.given("v_1", "wind speed, " + from.words(), speed.metresPerSecond(), "m/s", speed.typed());
        return convert(v, from.seconds(), to, trace);
    }

    /** The same for a fastest mile, whose averaging time is the time in which one mile passes. */
    public double convertFastestMile(Speed speed, Averaging to, Trace trace) {
        double v = trace.given("v_1", "wind speed, fastest mile", speed.metresPerSecond(), "m/s", speed.typed());
        double seconds = trace.line("averaging-time", "t_1", "time in which one mile passes")
            .in("v_1", v, "m/s").from("definition of the fastest mile, 1609.344 m", Status.DERIVED)
            .gives("1609.344 / v_1", 1609.344 / v, "s");
        return convert(v, seconds, to, trace);
    }

    private double convert(double v, double seconds, Averaging to, Trace trace) {
        double r1 = ratio("ratio-from", "r_1", seconds, trace);
        double r2 = ratio("ratio-to", "r_2", to.seconds(), trace);
        return trace.line("speed", "v_2", "wind speed, " + to.words())
            .in("v_1", v, "m/s").in("r_2", r2).in("r_1", r1)
            .from("ratios to the hourly mean, open terrain, 10 m", Status.DERIVED)
            .gives("v_1 r_2 / r_1", v * r2 / r1, "m/s");
    }

    private double ratio(String name, String symbol, double seconds, Trace trace) {
        Coefficient found = ratioToHour.at("ratio", seconds);
        return found.into(trace.line(name, symbol, "mean over the averaging time over the hourly mean").in("t", seconds, "s"));
    }
}
