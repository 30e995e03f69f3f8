package broadside.weather;

import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.quantity.Unit;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The line of headings of a record: which column holds what, and the unit beside its name, as in "mean (km/h)".
 *
 * @param date  column of the date where it stands apart from the time, else -1
 * @param mean  column of the mean, -1 where there is none; {@code gust} likewise
 * @param width number of headings
 */
record RecordHeader(int date, int time, int mean, int gust, int width, Optional<Unit> meanUnit, Optional<Unit> gustUnit) {

    private static final Set<String> DATES = Set.of("date", "day");
    private static final Set<String> TIMES = Set.of("time", "datetime", "date time", "date and time", "timestamp", "valid time", "hour");
    private static final Set<String> MEANS = Set.of("mean", "wind", "wind speed", "windspeed", "speed", "average", "mean wind", "mean speed",
        "mean wind speed", "avg");
    private static final Set<String> GUSTS = Set.of("gust", "gusts", "wind gust", "wind gusts", "windgust", "gust speed", "max gust", "peak gust",
        "maximum gust");
    private static final Pattern CELL = Pattern.compile("([^(\\[]*)(?:[(\\[]([^)\\]]*)[)\\]])?\\s*");

    /** The headings, or empty when these cells are none. */
    static Optional<RecordHeader> of(List<String> cells) {
        int[] at = {-1, -1, -1, -1};
        String[] units = new String[2];
        for (int i = 0; i < cells.size(); i++) {
            Matcher cell = CELL.matcher(cells.get(i));
            if (!cell.matches()) {
                continue;
            }
            int found = column(cell.group(1).strip().toLowerCase(Locale.ROOT).replaceAll("[_/\\s.-]+", " ").strip());
            if (found >= 0 && at[found] < 0) {
                at[found] = i;
                if (found >= 2) {
                    units[found - 2] = cell.group(2);
                }
            }
        }
        if (at[1] < 0 && at[0] >= 0) {
            at[1] = at[0];
            at[0] = -1;
        }
        return at[1] >= 0 && (at[2] >= 0 || at[3] >= 0)
            ? Optional.of(new RecordHeader(at[0], at[1], at[2], at[3], cells.size(), unit(units[0]), unit(units[1]))) : Optional.empty();
    }

    private static int column(String name) {
        return DATES.contains(name) ? 0 : TIMES.contains(name) ? 1 : MEANS.contains(name) ? 2 : GUSTS.contains(name) ? 3 : -1;
    }

    /** A unit of speed in any letter case. */
    static Optional<Unit> unit(String words) {
        if (words == null || words.isBlank()) {
            return Optional.empty();
        }
        // read as a typed speed, so that all its names count
        String text = "1 " + words.strip().toLowerCase(Locale.ROOT);
        if (Typed.read(text, Dimension.SPEED) instanceof Reading.Value value) {
            return Optional.of(value.unit());
        }
        throw new UnfitWeather("unit", "\"" + RecordReader.shown(words) + "\" is no unit of speed; there are m/s, km/h, kn, mph, ft/s");
    }
}
