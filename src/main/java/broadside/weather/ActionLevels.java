package broadside.weather;

import broadside.quantity.Speed;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/**
 * Speeds at which to act before a limiting speed is reached, by shares such as 60 % and 80 %. Plans do not always say whether a share is one of
 * the speed or of the load, which goes with its square: both are given, and the share of the speed is the lower and safe one.
 */
public final class ActionLevels {

    /**
     * One level, m/s.
     *
     * @param share    0 to 1
     * @param ofSpeed  that share of the limiting speed
     * @param ofLoad   the speed at which that share of the load is reached
     */
    public record Level(double share, double ofSpeed, double ofLoad) { }

    /** The levels of a limiting speed, recorded as "level-of-speed/0.6" and "level-of-load/0.6". */
    public static List<Level> of(Speed limit, List<Double> shares, Trace sheet) {
        double v = limit.metresPerSecond();
        if (!(v > 0)) {
            throw new UnfitWeather("limit", "a limiting speed is above zero");
        }
        List<Level> levels = new ArrayList<>();
        for (double share : shares) {
            if (!(share > 0 && share <= 1)) {
                throw new UnfitWeather("share", "a share is above 0 and not above 1, such as 0.6");
            }
            Trace trace = sheet.part(Plain.number(share));
            trace.given("V_{lim}", "limiting wind speed", v, "m/s", limit.typed());
            trace.given("p", "share", share, "1", Plain.number(share));
            double ofSpeed = trace.line("level-of-speed", "V_s", "share of the limiting speed").in("V_{lim}", v, "m/s").in("p", share)
                .from("share read as one of the speed", Status.DERIVED).gives("p V_{lim}", share * v, "m/s");
            double ofLoad = trace.line("level-of-load", "V_q", "speed at that share of the load").in("V_{lim}", v, "m/s").in("p", share)
                .from("share read as one of the load, which goes with the square of the speed", Status.DERIVED)
                .gives("p^0.5 V_{lim}", Math.sqrt(share) * v, "m/s");
            levels.add(new Level(share, ofSpeed, ofLoad));
        }
        return levels;
    }

    private ActionLevels() { }
}
