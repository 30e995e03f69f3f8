package broadside.weather;

import broadside.weather.WindRecord.Kind;
import broadside.weather.WindRecord.Row;
import broadside.weather.WindRecord.RowProblem;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** Rows and problems of a record while it is read; sorts them at the end and looks for gaps and times that stand twice. */
final class RecordRows {

    private final double gap;
    private final List<Row> rows = new ArrayList<>();
    private final List<RowProblem> problems = new ArrayList<>();
    private final Map<String, Integer> open = new HashMap<>();
    private int heading = 1;
    private int dropped;
    private int zoned;
    private int disorder;

    RecordRows(double gap) {
        this.gap = gap;
    }

    void heading(int row) {
        heading = row;
    }

    /** A problem of the headings. */
    void problem(Kind kind, String text) {
        problem(heading, kind, text);
    }

    /** The same problem in rows that follow each other is told once. */
    void problem(int row, Kind kind, String text) {
        Integer last = open.get(text);
        if (last != null && problems.get(last).toRow() + 1 == row) {
            problems.set(last, new RowProblem(problems.get(last).row(), row, kind, text));
            return;
        }
        open.put(text, problems.size());
        problems.add(new RowProblem(row, row, kind, text));
    }

    void drop(int row, Kind kind, String text) {
        problem(row, kind, text);
        dropped++;
    }

    void drop() {
        dropped++;
    }

    void add(int row, RecordTime time, OptionalDouble mean, OptionalDouble gust) {
        if (time.zoned()) {
            zoned++;
        }
        if (disorder == 0 && !rows.isEmpty() && time.instant().isBefore(rows.get(rows.size() - 1).instant())) {
            disorder = row;
        }
        rows.add(new Row(row, time.local(), time.instant(), mean, gust));
    }

    WindRecord record() {
        if (rows.isEmpty()) {
            throw new UnfitWeather("record", "no row has a time and a speed that can be used"
                + (problems.isEmpty() ? "" : "; " + problems.get(0).line()));
        }
        if (zoned > 0 && zoned < rows.size()) {
            problem(Kind.TIME, "some times have a zone and some have none; those without are taken as UTC");
        }
        if (disorder > 0) {
            problem(disorder, Kind.ORDER, "the rows are not in the order of time; they were put in order");
        }
        rows.sort(Comparator.comparing(Row::instant));
        List<Row> kept = once();
        Duration step = step(kept);
        gaps(kept, step);
        problems.sort(Comparator.comparingInt(RowProblem::row));
        return new WindRecord(kept, problems, step, dropped);
    }

    private List<Row> once() {
        List<Row> kept = new ArrayList<>(rows.size());
        for (Row row : rows) {
            if (!kept.isEmpty() && kept.get(kept.size() - 1).instant().equals(row.instant())) {
                drop(row.row(), Kind.DUPLICATE, "the time " + row.time() + " stands twice; row " + kept.get(kept.size() - 1).row() + " counts");
            } else {
                kept.add(row);
            }
        }
        return kept;
    }

    /** The time that most often lies between two rows; an hour for a single row. */
    private Duration step(List<Row> kept) {
        Map<Duration, Integer> counts = new HashMap<>();
        for (int i = 1; i < kept.size(); i++) {
            counts.merge(Duration.between(kept.get(i - 1).instant(), kept.get(i).instant()), 1, Integer::sum);
        }
        if (counts.isEmpty()) {
            problem(kept.get(0).row(), Kind.STEP, "a single row: it is taken as one hour");
            return Duration.ofHours(1);
        }
        Comparator<Map.Entry<Duration, Integer>> oftenest = Map.Entry.comparingByValue();
        Comparator<Map.Entry<Duration, Integer>> longest = Map.Entry.comparingByKey();
        return counts.entrySet().stream().max(oftenest.thenComparing(longest.reversed())).orElseThrow().getKey();
    }

    private void gaps(List<Row> kept, Duration step) {
        for (int i = 1; i < kept.size(); i++) {
            Duration between = Duration.between(kept.get(i - 1).instant(), kept.get(i).instant());
            if (between.toMillis() > gap * step.toMillis()) {
                long missing = Math.max(1, Math.round(between.toMillis() / (double) step.toMillis()) - 1);
                problem(kept.get(i).row(), Kind.GAP, "nothing between " + kept.get(i - 1).time() + " and " + kept.get(i).time() + ": " + missing
                    + (missing == 1 ? " time is missing" : " times are missing"));
            }
        }
    }
}
