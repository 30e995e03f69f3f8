package broadside.weather;

import java.time.Duration;
import java.time.Instant;
import java.time.LocalDateTime;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A record of wind in the order of time.
 *
 * @param rows      what could be used
 * @param problems  what could not, and what a reader of the results should know, by rows of the text
 * @param step      usual time between two rows
 * @param dropped   rows that held a time or a value which could not be used
 */
public record WindRecord(List<Row> rows, List<RowProblem> problems, Duration step, int dropped) {

    /**
     * One row; speeds in m/s.
     *
     * @param row      its number in the text, the first line is 1
     * @param time     as written, in the time of the record
     * @param instant  the same on one time scale; without a zone as if it were UTC
     */
    public record Row(int row, LocalDateTime time, Instant instant, OptionalDouble mean, OptionalDouble gust) {

        /** The mean or the gust. */
        public OptionalDouble value(Series series) {
            return series == Series.MEAN ? mean : gust;
        }
    }

    /** Which column of the record. */
    public enum Series { MEAN, GUST }

    /** What is wrong. */
    public enum Kind { HEADING, TIME, VALUE, MISSING, NEGATIVE, ABSURD, MEAN_ABOVE_GUST, DUPLICATE, GAP, ORDER, UNITS, STEP }

    /**
     * A problem of one row or of rows that follow each other.
     *
     * @param row    first row
     * @param toRow  last row
     */
    public record RowProblem(int row, int toRow, Kind kind, String text) {

        /** The rows and the text in one sentence. */
        public String line() {
            return (row == toRow ? "row " + row : "rows " + row + " to " + toRow) + ": " + text;
        }
    }

    public WindRecord {
        rows = List.copyOf(rows);
        problems = List.copyOf(problems);
    }

    /** How long row {@code i} counts, in hours: to the next row, at most one step. */
    public double hours(int i) {
        long step = this.step.toMillis();
        long next = i + 1 < rows.size() ? Duration.between(rows.get(i).instant(), rows.get(i + 1).instant()).toMillis() : step;
        return Math.min(step, next) / (double) Duration.ofHours(1).toMillis();
    }
}
