package broadside.crew;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * When work has to begin so that it ends in time: own rule, common practice. The action of a level is ended before the
 * wind that starts the next one, the last before the limit, and sheets are down before the wind in which they cannot be
 * held. The wind rises meanwhile in a straight line at a stated rate.
 */
public final class LeadTime {

    private static final String RULE = "own rule: an action ends before the wind of the next one, while the wind rises at the stated rate";
    private static final String RISE = "r_w";

    private final ActionLevels levels;
    private final Rows rises;
    private final Figures figures;

    LeadTime(Edition crew, ActionLevels levels) {
        this.levels = levels;
        this.rises = crew.rows("rise-of-wind");
        this.figures = new Figures(rises);
        rises.keys().forEach(k -> figures.value(k, "rise"));
    }

    /**
     * What a crew needs.
     *
     * @param times      seconds that the action of a level takes, by the name of the level; usual ones where none is given
     * @param weather    kind of weather, for the rate at which the wind rises; the first of the table where none is given
     * @param rise       rate typed in its place, m/s in a second
     * @param workLimit  gust up to which the sheets can be handled, m/s
     */
    public record Plan(Map<String, Double> times, Optional<String> weather, Optional<Double> rise, Optional<Double> workLimit) {

        public Plan {
            times = Map.copyOf(times);
        }
    }

    /**
     * When the action of a level begins.
     *
     * @param gust        m/s, at the height of the limiting gust; not above {@code level}
     * @param level       gust of the level without the time that its action takes, m/s
     * @param beforehand  whether no wind is low enough: it is decided on the forecast
     */
    public record Start(String key, double gust, double level, boolean beforehand) { }

    /** The kinds of weather with a rate. */
    public List<String> weathers() {
        return rises.keys();
    }

    /**
     * The gusts at which the actions begin, lowest first, recorded as "start/KEY". The levels were recorded on this sheet.
     *
     * @throws UnfitFigure  for a time that is missing or below zero, a rate or work limit that is none, unknown weather
     */
    public List<Start> starts(List<ActionLevels.Level> of, double limit, Plan plan, Trace trace) {
        double rise = rise(plan, trace);
        plan.times().keySet().stream().filter(k -> !levels.keys().contains(k)).findFirst().ifPresent(k -> {
            throw new UnfitFigure("times", "\"" + k + "\" is none of the levels " + String.join(", ", levels.keys()));
        });
        Optional<Double> work = plan.workLimit().map(w -> trace.given("v_{work}", "gust up to which the sheets can be handled",
            UnfitFigure.positive("work-limit", w, "7 m/s"), "m/s", ""));
        List<Start> starts = new ArrayList<>();
        String next = ActionLevels.LIMIT;
        double nextGust = limit;
        for (int i = of.size() - 1; i >= 0; i--) {
            ActionLevels.Level level = of.get(i);
            double time = time(level.key(), plan, trace);
            if (levels.handles(level.key()) && work.isPresent()) {
                String done = "v_{" + level.key() + ",end}";
                nextGust = trace.line("end/" + level.key(), done, "gust before which this has ended").in(next, nextGust, "m/s")
                    .in("v_{work}", work.get(), "m/s").from(RULE, Status.COMMON_PRACTICE)
                    .gives("min(" + next + "; v_{work})", Math.min(nextGust, work.get()), "m/s");
                next = done;
            }
            String symbol = "v_{" + level.key() + ",start}";
            String t = "t_{" + level.key() + "}";
            String gust = ActionLevels.gust(level.key());
            nextGust = trace.line("start/" + level.key(), symbol, "gust at which this begins: " + level.key()).in(gust, level.gust(), "m/s")
                .in(next, nextGust, "m/s").in(RISE, rise, "m/s²").in(t, time, "s").from(RULE, Status.COMMON_PRACTICE)
                .gives("max(0; min(" + gust + "; " + next + " - " + RISE + " " + t + "))", Math.max(0, Math.min(level.gust(), nextGust - rise * time)), "m/s");
            next = symbol;
            starts.add(0, new Start(level.key(), nextGust, level.gust(), nextGust <= 0));
        }
        return List.copyOf(starts);
    }

    private double rise(Plan plan, Trace trace) {
        if (plan.rise().isPresent()) {
            return trace.given(RISE, "rate at which the gust rises", UnfitFigure.positive("rise", plan.rise().get(), "0.003 m/s in a second"), "m/s²", "");
        }
        String key = plan.weather().orElse(rises.keys().get(0));
        if (!rises.has(key)) {
            throw new UnfitFigure("weather", "there is no rate for this; known are " + String.join(", ", rises.keys()));
        }
        double more = figures.record(key, "rise", "rise", "Δ_w", "rise of the gust, " + rises.text(key, "title"), "m/s", trace);
        double within = figures.line(key, "rise-time", "t_w", "time in which it comes", trace).reads("read at " + key, 60 * figures.value(key, "minutes"), "s");
        return figures.line(key, "rise-rate", RISE, "rate at which the gust rises", trace).in("Δ_w", more, "m/s").in("t_w", within, "s")
            .gives("Δ_w / t_w", more / within, "m/s²");
    }

    private double time(String key, Plan plan, Trace trace) {
        String t = "t_{" + key + "}";
        if (plan.times().containsKey(key)) {
            double typed = plan.times().get(key);
            if (!(typed >= 0) || Double.isInfinite(typed)) {
                throw new UnfitFigure("times." + key, "the time is 0 or more, such as 20 minutes");
            }
            return trace.given(t, "time that it takes: " + key, typed, "s", "");
        }
        double usual = levels.usualTime(key).orElseThrow(() -> new UnfitFigure("times." + key,
            "how long it takes must be known: try it once before the event"));
        return trace.line("time/" + key, t, "time that it takes: " + key).from(levels.figures().source(key).citation(), Status.COMMON_PRACTICE)
            .reads("usual time, none was given", usual, "s");
    }
}
