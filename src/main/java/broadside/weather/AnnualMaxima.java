package broadside.weather;

import broadside.weather.WindRecord.Row;
import broadside.weather.WindRecord.Series;
import java.time.Duration;
import java.time.LocalDateTime;
import java.time.Year;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * The greatest speed of each calendar year.
 *
 * @param years         each year that has a value, in order
 * @param leastComplete share of a year that must be known for its maximum to count
 */
public record AnnualMaxima(List<OneYear> years, double leastComplete) {

    /**
     * One year.
     *
     * @param speed     greatest speed, m/s
     * @param time      when
     * @param complete  share of the year for which the record has values, 0 to 1
     */
    public record OneYear(int year, double speed, LocalDateTime time, double complete) { }

    public AnnualMaxima {
        years = List.copyOf(years);
    }

    /** The maxima of a record, in the years of its own time. */
    public static AnnualMaxima of(WindRecord record, Series series, WeatherTables tables) {
        Map<Integer, OneYear> years = new TreeMap<>();
        for (int i = 0; i < record.rows().size(); i++) {
            Row row = record.rows().get(i);
            if (row.value(series).isEmpty()) {
                continue;
            }
            int year = row.time().getYear();
            double share = record.hours(i) / Duration.ofDays(Year.of(year).length()).toHours();
            OneYear own = new OneYear(year, row.value(series).getAsDouble(), row.time(), share);
            years.merge(year, own, (a, b) -> {
                OneYear top = b.speed() > a.speed() ? b : a;
                return new OneYear(year, top.speed(), top.time(), Math.min(1, a.complete() + b.complete()));
            });
        }
        return new AnnualMaxima(new ArrayList<>(years.values()), tables.number("least-complete"));
    }

    /** The years that are known well enough. */
    public List<OneYear> complete() {
        return years.stream().filter(y -> y.complete() >= leastComplete).toList();
    }

    /** Years of record, parts of years included. */
    public double length() {
        return years.stream().mapToDouble(OneYear::complete).sum();
    }
}
