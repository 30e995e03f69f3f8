package broadside.crew;

import broadside.quantity.Speed;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/** Winds at which others stop work, by trade, or act at an event: for comparison, each with its source. */
public final class PublishedLimits {

    private final Rows trades;
    private final Rows plans;

    /**
     * One published limit.
     *
     * @param subject  work or structure concerned
     * @param speed    absent where the source prints no number
     * @param kind     mean, gust, any (mean or gust) or not said
     */
    public record Limit(String key, String subject, Optional<Speed> speed, String kind, String rule, String place, Status status) { }

    PublishedLimits(Edition crew) {
        this.trades = crew.rows("work-limits");
        this.plans = crew.rows("event-plans");
        byTrade();
        ofEvents();
    }

    /** Limits of work, by trade. */
    public List<Limit> byTrade() {
        return trades.keys().stream().map(k -> read(trades, k)).toList();
    }

    /** Levels in event plans and guides. */
    public List<Limit> ofEvents() {
        return plans.keys().stream().map(k -> read(plans, k)).toList();
    }

    /** Records the speed of one limit as "speed", m/s. */
    public Limit record(String key, Trace trace) {
        Rows rows = trades.has(key) ? trades : plans;
        if (!rows.has(key)) {
            throw new UnfitFigure("limit", "no published limit has this name");
        }
        Limit limit = read(rows, key);
        Speed speed = limit.speed().orElseThrow(() -> new UnfitFigure("limit", "this source prints no number"));
        trace.line("speed", "v_p", limit.subject() + ": " + limit.rule() + " (" + limit.kind() + ")").from(limit.place(), limit.status())
            .reads("printed as " + speed.typed(), speed.metresPerSecond(), "m/s");
        return limit;
    }

    private static Limit read(Rows rows, String key) {
        Figures figures = new Figures(rows);
        return new Limit(key, rows.text(key, "subject"), figures.speed(key, "speed"), rows.text(key, "kind"), rows.text(key, "rule"), figures.place(key),
            figures.source(key).status());
    }
}
