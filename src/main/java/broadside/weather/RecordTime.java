package broadside.weather;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A time as records write it: 2026-08-14T15:00, with a blank for the T, with seconds, Z or +02:00, a date alone, or the date as 14.08.2026.
 * Dates with slashes are refused, because day and month cannot be told apart.
 */
record RecordTime(LocalDateTime local, Instant instant, boolean zoned) {

    private static final Pattern TIME = Pattern.compile("(?:(\\d{4})-(\\d{2})-(\\d{2})|(\\d{1,2})\\.(\\d{1,2})\\.(\\d{4}))"
        + "(?:[T ]\\s*(\\d{1,2}):(\\d{2})(?::(\\d{2})(?:[.,]\\d{1,9})?)?)?\\s*(Z|UTC|[+-]\\d{2}:?(?:\\d{2})?)?");

    static Optional<RecordTime> of(String text) {
        Matcher found = TIME.matcher(text);
        if (!found.matches()) {
            return Optional.empty();
        }
        boolean iso = found.group(1) != null;
        int hour = number(found.group(7));
        try {
            LocalDateTime local = LocalDateTime.of(number(found.group(iso ? 1 : 6)), number(found.group(iso ? 2 : 5)), number(found.group(iso ? 3 : 4)),
                hour == 24 ? 0 : hour, number(found.group(8)), number(found.group(9)));
            if (hour == 24) {
                if (local.getMinute() > 0 || local.getSecond() > 0) {
                    return Optional.empty();
                }
                local = local.plusDays(1);
            }
            String zone = found.group(10);
            ZoneOffset offset = zone == null || zone.equals("Z") || zone.equals("UTC") ? ZoneOffset.UTC : ZoneOffset.of(zone);
            return Optional.of(new RecordTime(local, local.toInstant(offset), zone != null));
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    private static int number(String digits) {
        return digits == null ? 0 : Integer.parseInt(digits);
    }
}
