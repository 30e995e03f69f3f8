package broadside.weather;

import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.quantity.Unit;
import broadside.weather.WindRecord.Kind;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Reads a record of wind from separated text. A line of headings names time, mean and gust, in any order and letter case; lines before it
 * are passed over. What cannot be used is told with its row, and the rest is kept.
 */
public final class RecordReader {

    private static final int HEADING_WITHIN = 60;
    private static final Pattern NUMBER = Pattern.compile("[+-]?\\d{1,7}(?:[.,]\\d{1,9})?|[+-]?[.,]\\d{1,9}");
    private static final Set<String> NONE = Set.of("", "-", "--", "---", "/", "//", "///", "na", "n/a", "nan", "null", "none", "m", "x", "missing");

    private final double greatest;
    private final double gap;

    public RecordReader(WeatherTables tables) {
        this.greatest = tables.number("greatest-speed");
        this.gap = tables.number("gap");
    }

    /**
     * Reads the text.
     *
     * @param unit  unit of speeds whose heading names none
     * @throws UnfitWeather when there are no headings, no unit, or no row that can be used
     */
    public WindRecord read(String text, Optional<Unit> unit) {
        String body = text.startsWith("\uFEFF") ? text.substring(1) : text;
        char delimiter = delimiter(body);
        CSVFormat format = CSVFormat.DEFAULT.builder().setDelimiter(delimiter).setIgnoreSurroundingSpaces(true).setIgnoreEmptyLines(false).get();
        RecordRows rows = new RecordRows(gap);
        try (CSVParser parser = CSVParser.parse(body, format)) {
            Iterator<CSVRecord> lines = parser.iterator();
            RecordHeader header = header(lines, rows);
            Columns columns = columns(header, unit, rows);
            while (lines.hasNext()) {
                row(lines.next(), columns, rows);
            }
        } catch (IOException | UncheckedIOException | IllegalStateException e) {
            throw new UnfitWeather("record", "the text cannot be read as separated values: " + shown(String.valueOf(e.getMessage())));
        }
        return rows.record();
    }

    /** The first of tab, semicolon and comma that the line of headings holds. */
    private static char delimiter(String text) {
        return text.lines().limit(HEADING_WITHIN).flatMap(line -> {
            for (char each : new char[] {'\t', ';', ','}) {
                List<String> cells = List.of(line.replace("\"", "").split(Pattern.quote(String.valueOf(each)), -1)).stream().map(String::strip).toList();
                if (isHeader(cells)) {
                    return java.util.stream.Stream.of(each);
                }
            }
            return java.util.stream.Stream.empty();
        }).findFirst().orElse(',');
    }

    private static boolean isHeader(List<String> cells) {
        try {
            return RecordHeader.of(cells).isPresent();
        } catch (UnfitWeather e) {
            return true;
        }
    }

    private static RecordHeader header(Iterator<CSVRecord> lines, RecordRows rows) {
        for (int i = 0; i < HEADING_WITHIN && lines.hasNext(); i++) {
            CSVRecord line = lines.next();
            Optional<RecordHeader> found = RecordHeader.of(line.toList());
            if (found.isPresent()) {
                rows.heading((int) line.getRecordNumber());
                return found.get();
            }
        }
        throw new UnfitWeather("record", "no headings were found: they name \"time\" and \"mean\" or \"gust\", as in \"time, mean (km/h), gust (km/h)\"");
    }

    private record Columns(RecordHeader header, Unit mean, Unit gust) { }

    private static Columns columns(RecordHeader header, Optional<Unit> typed, RecordRows rows) {
        Unit mean = unit(header.mean() >= 0, header.meanUnit(), typed, "mean", rows);
        Unit gust = unit(header.gust() >= 0, header.gustUnit(), typed, "gust", rows);
        if (mean != null && gust != null && !mean.equals(gust)) {
            rows.problem(Kind.UNITS, "the mean is in " + mean.symbol() + " and the gust in " + gust.symbol() + "; both are taken as headed");
        }
        return new Columns(header, mean, gust);
    }

    private static Unit unit(boolean there, Optional<Unit> headed, Optional<Unit> typed, String name, RecordRows rows) {
        if (!there) {
            return null;
        }
        if (headed.isPresent() && typed.isPresent() && !headed.equals(typed)) {
            rows.problem(Kind.UNITS, "the heading of the " + name + " says " + headed.get().symbol() + ", " + typed.get().symbol()
                + " was given; the heading counts");
        }
        return headed.or(() -> typed).orElseThrow(() -> new UnfitWeather("unit", "the unit of the " + name
            + " is not known: it stands in the heading, as in \"" + name + " (km/h)\""));
    }

    private void row(CSVRecord line, Columns columns, RecordRows rows) {
        int number = (int) line.getRecordNumber();
        RecordHeader header = columns.header();
        String time = cell(line, header.time());
        if (line.size() == 1 && time.isEmpty()) {
            return; // an empty line
        }
        if (header.date() >= 0) {
            time = cell(line, header.date()) + " " + time;
        }
        if (line.size() > header.width() && line.toList().subList(header.width(), line.size()).stream().anyMatch(c -> !c.isBlank())) {
            rows.drop(number, Kind.VALUE, "more cells than headings; a decimal comma needs another mark between the cells");
            return;
        }
        Optional<RecordTime> read = RecordTime.of(time.strip());
        if (read.isEmpty()) {
            rows.drop(number, Kind.TIME, "\"" + shown(time) + "\" is not a time like 2026-08-14 15:00");
            return;
        }
        Speed mean = speed(line, header.mean(), columns.mean(), number, "mean", rows);
        Speed gust = speed(line, header.gust(), columns.gust(), number, "gust", rows);
        if (mean.bad() || gust.bad()) {
            rows.drop();
        }
        if (mean.value().isEmpty() && gust.value().isEmpty()) {
            return;
        }
        if (mean.value().isPresent() && gust.value().isPresent() && mean.value().getAsDouble() > gust.value().getAsDouble() * (1 + 1e-9)) {
            rows.drop(number, Kind.MEAN_ABOVE_GUST, "the mean is above the gust, so one of them is wrong; the row is left out");
            return;
        }
        rows.add(number, read.get(), mean.value(), gust.value());
    }

    /** A speed in m/s, or none; bad when something stood there that is no speed. */
    private record Speed(OptionalDouble value, boolean bad) {

        static final Speed NONE = new Speed(OptionalDouble.empty(), false);
        static final Speed BAD = new Speed(OptionalDouble.empty(), true);
    }

    private Speed speed(CSVRecord line, int column, Unit unit, int row, String name, RecordRows rows) {
        if (column < 0) {
            return Speed.NONE;
        }
        String cell = cell(line, column);
        double si;
        if (NUMBER.matcher(cell).matches()) {
            si = Double.parseDouble(cell.replace(',', '.')) * unit.toSi();
        } else if (NONE.contains(cell.toLowerCase(java.util.Locale.ROOT))) {
            rows.problem(row, Kind.MISSING, "no " + name);
            return Speed.NONE;
        } else if (Typed.read(cell, Dimension.SPEED) instanceof Reading.Value value) {
            si = value.si();
            if (!value.unit().equals(unit)) {
                rows.problem(row, Kind.UNITS, "the " + name + " is in " + value.unit().symbol() + ", its column in " + unit.symbol() + "; taken as typed");
            }
        } else {
            rows.problem(row, Kind.VALUE, "\"" + shown(cell) + "\" is no " + name);
            return Speed.BAD;
        }
        if (si < 0) {
            rows.problem(row, Kind.NEGATIVE, "a " + name + " below zero, \"" + shown(cell) + "\", is left out");
            return Speed.BAD;
        }
        if (si > greatest) {
            rows.problem(row, Kind.ABSURD, "a " + name + " of \"" + shown(cell) + "\" is above the highest gust ever measured, "
                + Plain.number(greatest) + " m/s, and is left out");
            return Speed.BAD;
        }
        return new Speed(OptionalDouble.of(si), false);
    }

    private static String cell(CSVRecord line, int column) {
        return column < line.size() ? line.get(column).strip() : "";
    }

    /** The beginning of a text from outside, in one line. */
    static String shown(String text) {
        String line = text.replaceAll("[\\p{Cntrl}\"]", " ").strip();
        return line.length() > 40 ? line.substring(0, 40) + "..." : line;
    }
}
