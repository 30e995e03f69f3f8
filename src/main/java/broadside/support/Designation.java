package broadside.support;

import java.util.Locale;
import java.util.Optional;

/**
 * What a designation such as "SHS 100x5 hot" tells: letters, sizes, finish.
 *
 * @param prefix  letters in front, in capitals
 * @param sizes   numbers as typed
 * @param finish  "hot" or "cold", empty where none is told
 */
record Designation(String prefix, double[] sizes, String finish) {

    /** A longer text is no designation. */
    private static final int LONGEST = 40;

    /**
     * One form for all ways to type a designation: capitals, no spaces, X between the sizes, numbers as short decimals, so
     * that "chs 114,3 × 5.0" is "CHS114.3X5" and "HSS 2-1/2x2-1/2x1/8" is "HSS2.5X2.5X0.125". Empty for what is too long.
     */
    static String key(String text) {
        if (text.length() > LONGEST) {
            return "";
        }
        StringBuilder key = new StringBuilder(text.length() + 4);
        int at = 0;
        while (at < text.length()) {
            char c = text.charAt(at);
            if (ofNumber(text, at)) {
                int start = at;
                while (at < text.length() && (ofNumber(text, at) || insideNumber(text, at))) {
                    at++;
                }
                number(text.substring(start, at), key);
                continue;
            }
            if (c == '×' || c == '*') {
                key.append('X');
            } else if (!Character.isWhitespace(c) && !Character.isSpaceChar(c)) {
                key.append(Character.toUpperCase(c));
            }
            at++;
        }
        return key.toString();
    }

    private static boolean ofNumber(String text, int at) {
        char c = text.charAt(at);
        return c >= '0' && c <= '9' || ".,/-".indexOf(c) >= 0;
    }

    /** A space between the whole part and the fraction of "2 1/2". */
    private static boolean insideNumber(String text, int at) {
        return text.charAt(at) == ' ' && at + 1 < text.length() && text.charAt(at + 1) >= '0' && text.charAt(at + 1) <= '9';
    }

    private static void number(String token, StringBuilder key) {
        int slash = token.indexOf('/');
        if (slash < 0 && token.indexOf('.') < 0 && token.indexOf(',') < 0) {
            key.append(token);
            return;
        }
        try {
            int dash = Math.max(token.indexOf('-', 1), token.indexOf(' '));
            double value = slash < 0 ? Double.parseDouble(token.replace(',', '.'))
                : Double.parseDouble(token.substring(dash + 1, slash)) / Double.parseDouble(token.substring(slash + 1))
                    + (dash > 0 ? Double.parseDouble(token.substring(0, dash)) : 0);
            key.append(plain(value));
        } catch (NumberFormatException e) {
            key.append(token);
        }
    }

    /** A size without a needless ".0". */
    static String plain(double value) {
        String text = Double.toString(value);
        return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
    }

    /** Takes a key apart; nothing when it is not letters, two or three sizes, and perhaps a finish. */
    static Optional<Designation> of(String key) {
        int letters = 0;
        while (letters < key.length() && Character.isLetter(key.charAt(letters))) {
            letters++;
        }
        String finish = key.endsWith("HOT") ? "HOT" : key.endsWith("COLD") ? "COLD" : "";
        String[] parts = key.substring(letters, Math.max(letters, key.length() - finish.length())).split("X", -1);
        if (letters == 0 || parts.length < 2 || parts.length > 3) {
            return Optional.empty();
        }
        double[] sizes = new double[parts.length];
        for (int i = 0; i < parts.length; i++) {
            if (!isNumber(parts[i])) {
                return Optional.empty();
            }
            sizes[i] = Double.parseDouble(parts[i]);
        }
        return Optional.of(new Designation(key.substring(0, letters), sizes, finish.toLowerCase(Locale.ROOT)));
    }

    /** Digits with at most one point among them, perhaps below zero. */
    private static boolean isNumber(String text) {
        int digits = 0;
        int points = 0;
        for (int i = text.startsWith("-") ? 1 : 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '.') {
                points++;
            } else if (c < '0' || c > '9') {
                return false;
            } else {
                digits++;
            }
        }
        return digits > 0 && points < 2;
    }
}
