package broadside.crew;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.TableFormat;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/**
 * Levels of wind at which a crew acts, below the gust that a structure can just take. A published share is read as
 * a share of the speed or of the load, which grows with the square of the speed; both are given, and the lower speed
 * is taken where no reading was chosen.
 */
public final class ActionLevels {

    private final Rows rows;
    private final Figures figures;

    /** What a share is a share of. */
    public enum Reading {
        SPEED("share of the speed"),
        LOAD("share of the load");

        private final String words;

        Reading(String words) {
            this.words = words;
        }

        public String words() {
            return words;
        }
    }

    /**
     * One level. Speeds are gusts at the height of the limiting gust, m/s.
     *
     * @param action        what is done, in words
     * @param share         as the table has it
     * @param bySpeed       gust when it is a share of the speed
     * @param byLoad        gust when it is a share of the load
     * @param loadBySpeed   share of the load at {@code bySpeed}
     * @param speedByLoad   share of the speed at {@code byLoad}
     * @param gust          the one that holds, recorded as v_{KEY}
     */
    public record Level(String key, String action, double share, double bySpeed, double byLoad, double loadBySpeed, double speedByLoad, double gust,
                        Status status) { }

    ActionLevels(Edition crew) {
        this.rows = crew.rows("action-levels");
        this.figures = new Figures(rows);
        double before = 0;
        for (String key : rows.keys()) {
            double share = figures.value(key, "share");
            if (!(share > before && share <= 1)) {
                throw new TableFormat(crew.key() + "/action-levels.csv", 1, "the shares must rise from row to row and end at 1 at most; " + key + " has "
                    + share);
            }
            before = share;
        }
    }

    /** The names of the levels, lowest wind first. */
    public List<String> keys() {
        return rows.keys();
    }

    /**
     * The levels below a gust, lowest first, recorded as "level/KEY" beside "level-by-speed/KEY" and "level-by-load/KEY".
     *
     * @param limit    limiting gust, m/s
     * @param reading  what the shares are taken of; the safer where it is not chosen
     * @throws UnfitFigure  for a gust that is not above zero
     */
    public List<Level> of(double limit, Optional<Reading> reading, Trace trace) {
        UnfitFigure.positive("limit", limit, "18 m/s");
        double v = trace.given(LIMIT, "limiting gust", limit, "m/s", "");
        return rows.keys().stream().map(key -> level(key, v, reading, trace)).toList();
    }

    static final String LIMIT = "v_{lim}";

    private Level level(String key, double v, Optional<Reading> reading, Trace trace) {
        Status status = figures.source(key).status();
        String p = "p_{" + key + "}";
        double share = figures.record(key, "share", "share/" + key, p, "share of the limit, " + key, "1", trace);
        double load = relation("share-of-load/" + key, "p_{" + key + ",q}", "share of the load when the share is one of the speed", trace).in(p, share)
            .gives(p + "²", share * share, "1");
        double speed = relation("share-of-speed/" + key, "p_{" + key + ",v}", "share of the speed when the share is one of the load", trace).in(p, share)
            .gives(p + "^0.5", Math.sqrt(share), "1");
        double bySpeed = relation("level-by-speed/" + key, byS(key), "gust, share of the speed", trace).in(p, share).in(LIMIT, v, "m/s")
            .gives(p + " " + LIMIT, share * v, "m/s");
        double byLoad = relation("level-by-load/" + key, byL(key), "gust, share of the load", trace).in("p_{" + key + ",v}", speed).in(LIMIT, v, "m/s")
            .gives("p_{" + key + ",v} " + LIMIT, speed * v, "m/s");
        double gust = reading.isPresent() ? chosen(key, reading.get(), bySpeed, byLoad, status, trace)
            : trace.line("level/" + key, gust(key), "gust from which this holds: " + key).in(byS(key), bySpeed, "m/s").in(byL(key), byLoad, "m/s")
                .from("own rule: the safer of the two readings of the share", Status.DERIVED)
                .gives("min(" + byS(key) + "; " + byL(key) + ")", Math.min(bySpeed, byLoad), "m/s");
        return new Level(key, rows.text(key, "action"), share, bySpeed, byLoad, load, speed, gust, status);
    }

    private static double chosen(String key, Reading reading, double bySpeed, double byLoad, Status status, Trace trace) {
        String symbol = reading == Reading.SPEED ? byS(key) : byL(key);
        double value = reading == Reading.SPEED ? bySpeed : byLoad;
        return trace.line("level/" + key, gust(key), "gust from which this holds: " + key + ", " + reading.words()).in(symbol, value, "m/s")
            .from("reading chosen by the user", status).gives(symbol, value, "m/s");
    }

    private static String byS(String key) {
        return "v_{" + key + ",S}";
    }

    private static String byL(String key) {
        return "v_{" + key + ",L}";
    }

    /** Symbol of the gust of a level. */
    static String gust(String key) {
        return "v_{" + key + "}";
    }

    private static Trace.Line relation(String step, String symbol, String meaning, Trace trace) {
        return trace.line(step, symbol, meaning).from("the load grows with the square of the speed", Status.DERIVED);
    }

    /** Time in seconds that the action of a level takes where none was given; absent where it must be given. */
    Optional<Double> usualTime(String key) {
        return rows.isPrinted(key, "time") ? Optional.of(60 * figures.value(key, "time")) : Optional.empty();
    }

    /** Whether sheets are handled at this level. */
    boolean handles(String key) {
        return rows.text(key, "handles").equals("yes");
    }

    Figures figures() {
        return figures;
    }
}
