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
        return usual(text) ? Optional.of(usualTime(text)) : any(text);
    }

    /** 2026-08-14T15:00 as most records have it: read without a search, since records are long. */
    private static boolean usual(String text) {
        if (text.length() != 16) {
            return false;
        }
        for (int i = 0; i < 16; i++) {
            char c = text.charAt(i);
            boolean fits = switch (i) {
                case 4, 7 -> c == '-';
                case 10 -> c == ' ' || c == 'T';
                case 13 -> c == ':';
                default -> c >= '0' && c <= '9';
            };
            if (!fits) {
                return false;
            }
        }
        return digits(text, 5, 7) >= 1 && digits(text, 5, 7) <= 12 && digits(text, 8, 10) >= 1 && digits(text, 8, 10) <= 28
            && digits(text, 11, 13) < 24 && digits(text, 14, 16) < 60;
    }

    private static RecordTime usualTime(String text) {
        LocalDateTime local = LocalDateTime.of(digits(text, 0, 4), digits(text, 5, 7), digits(text, 8, 10), digits(text, 11, 13), digits(text, 14, 16));
        return new RecordTime(local, local.toInstant(ZoneOffset.UTC), false);
    }

    private static int digits(String text, int from, int to) {
        return Integer.parseInt(text, from, to, 10);
    }

    private static Optional<RecordTime> any(String text) {
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
