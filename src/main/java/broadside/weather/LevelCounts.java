package broadside.weather;

import broadside.weather.WindRecord.Row;
import broadside.weather.WindRecord.Series;
import java.time.Duration;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** How often a record reaches a level. A speed at the level counts, since that is where one acts. Levels in m/s. */
public final class LevelCounts {

    /**
     * Hours and days at or above a level.
     *
     * @param hours       at or above the level
     * @param knownHours  hours for which the record has a value
     * @param days        calendar days with at least one such row, in the time of the record
     * @param knownDays   calendar days with at least one value
     * @param first       first time of it
     */
    public record Above(double level, double hours, double knownHours, int days, int knownDays, Optional<LocalDateTime> first) { }

    /**
     * When to act.
     *
     * @param reached  first time at which the level is reached
     * @param actBy    so long before it
     * @param atOnce   whether that is before the record begins
     * @param row      row of the record
     */
    public record ActionTime(LocalDateTime reached, LocalDateTime actBy, boolean atOnce, int row) { }

    /**
     * Hours of work.
     *
     * @param from        beginning
     * @param to          end; before the beginning for work over midnight, equal to it for the whole day
     * @param leastHours  hours at or above the level that lose the day; 0 when any row does
     */
    public record WorkingDay(LocalTime from, LocalTime to, double leastHours) {

        boolean holds(LocalTime time) {
            if (from.equals(to)) {
                return true;
            }
            boolean after = !time.isBefore(from);
            boolean before = time.isBefore(to);
            return from.isBefore(to) ? after && before : after || before;
        }
    }

    /** Days lost of those with values in the hours of work. */
    public record DaysLost(int lost, int known, List<LocalDate> dates) { }

    /** Counts at or above each level. */
    public static List<Above> above(WindRecord record, Series series, List<Double> levels) {
        return levels.stream().map(level -> above(record, series, level)).toList();
    }

    /** Counts at or above one level. */
    public static Above above(WindRecord record, Series series, double level) {
        requireLevel(level);
        double hours = 0;
        double known = 0;
        Map<LocalDate, Boolean> days = new LinkedHashMap<>();
        Optional<LocalDateTime> first = Optional.empty();
        for (int i = 0; i < record.rows().size(); i++) {
            Row row = record.rows().get(i);
            if (row.value(series).isEmpty()) {
                continue;
            }
            boolean reached = row.value(series).getAsDouble() >= level;
            known += record.hours(i);
            hours += reached ? record.hours(i) : 0;
            days.merge(row.time().toLocalDate(), reached, Boolean::logicalOr);
            if (reached && first.isEmpty()) {
                first = Optional.of(row.time());
            }
        }
        return new Above(level, hours, known, (int) days.values().stream().filter(r -> r).count(), days.size(), first);
    }

    /** The first time at which to act so that it is done when the level is reached; empty when it is not reached. */
    public static Optional<ActionTime> firstToAct(WindRecord record, Series series, double level, Duration lead) {
        requireLevel(level);
        if (lead.isNegative()) {
            throw new UnfitWeather("lead", "a lead time is not below zero");
        }
        Row start = record.rows().get(0);
        return record.rows().stream().filter(r -> r.value(series).isPresent() && r.value(series).getAsDouble() >= level).findFirst()
            .map(r -> new ActionTime(r.time(), r.time().minus(lead), r.instant().minus(lead).isBefore(start.instant()), r.row()));
    }

    /** Days on which the level is reached for long enough within the hours of work. Work over midnight counts to the day it begins on. */
    public static DaysLost daysLost(WindRecord record, Series series, double level, WorkingDay work) {
        requireLevel(level);
        Map<LocalDate, Double> days = new LinkedHashMap<>();
        Map<LocalDate, Boolean> any = new LinkedHashMap<>();
        for (int i = 0; i < record.rows().size(); i++) {
            Row row = record.rows().get(i);
            LocalTime time = row.time().toLocalTime();
            if (row.value(series).isEmpty() || !work.holds(time)) {
                continue;
            }
            LocalDate day = work.to().isBefore(work.from()) && time.isBefore(work.to()) ? row.time().toLocalDate().minusDays(1) : row.time().toLocalDate();
            boolean reached = row.value(series).getAsDouble() >= level;
            days.merge(day, reached ? record.hours(i) : 0, Double::sum);
            any.merge(day, reached, Boolean::logicalOr);
        }
        List<LocalDate> lost = days.keySet().stream().filter(d -> any.get(d) && days.get(d) >= work.leastHours() - 1e-9).toList();
        return new DaysLost(lost.size(), days.size(), lost);
    }

    private static void requireLevel(double level) {
        if (!(level > 0) || !Double.isFinite(level)) {
            throw new UnfitWeather("level", "a level is a speed above zero");
        }
    }

    private LevelCounts() { }
}
