package broadside.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A number at the start of a folded line: digits with one decimal mark (comma or point), thousands by space,
 * apostrophe, comma or point, and plain fractions such as {@code 6 1/2}.
 *
 * @param value     the number, with a single mark read as the decimal mark
 * @param thousands the other reading, when exactly three digits follow a single mark
 * @param mark      the decimal mark, or a space when there is none
 * @param form      what the number is made of
 * @param end       the position after the number
 */
record NumberText(BigDecimal value, Optional<BigDecimal> thousands, char mark, Form form, int end) {

    enum Form { WHOLE, DECIMAL, FRACTION, MIXED }

    /** Reads the number that begins at a position; an apostrophe may stand between thousands or not. */
    static NumberText scan(String line, int start, boolean apostrophes, Sentences says) {
        List<String> runs = new ArrayList<>();
        StringBuilder marks = new StringBuilder();
        int at = digitsEnd(line, start);
        runs.add(line.substring(start, at));
        while (markAt(line, at, apostrophes)) {
            marks.append(line.charAt(at));
            int next = digitsEnd(line, at + 1);
            runs.add(line.substring(at + 1, next));
            at = next;
        }
        if (runs.get(0).isEmpty() && (runs.size() < 2 || runs.get(1).isEmpty())) {
            throw says.noNumber();
        }
        if (runs.size() == 1) {
            return fraction(line, runs.get(0), start, at, says);
        }
        return decimal(runs, marks.toString(), at, says);
    }

    /** Whether a mark that belongs to the number stands at the position. */
    private static boolean markAt(String line, int at, boolean apostrophes) {
        char c = charAt(line, at);
        if (c == '.' || c == ',') {
            boolean closes = c == '.' && isDigit(charAt(line, at - 1)) && endsNumber(line, at + 1);
            return isDigit(charAt(line, at + 1)) || closes;
        }
        int end = digitsEnd(line, at + 1);
        return (c == ' ' || (c == '\'' && apostrophes)) && end == at + 4 && charAt(line, end) != '/';
    }

    /** A point with nothing more of the number behind it, as in {@code 2400. mm}. */
    private static boolean endsNumber(String line, int at) {
        char c = charAt(line, at);
        return c == '\0' || c == ' ' || Character.isLetter(c);
    }

    private static NumberText fraction(String line, String digits, int start, int at, Sentences says) {
        int over = charAt(line, at) == '/' ? start : at + 1;
        int slash = digitsEnd(line, over);
        int end = digitsEnd(line, slash + 1);
        boolean mixed = over != start;
        if ((mixed && charAt(line, at) != ' ') || slash == over || charAt(line, slash) != '/' || end == slash + 1) {
            return new NumberText(new BigDecimal(digits), Optional.empty(), ' ', Form.WHOLE, at);
        }
        BigDecimal top = new BigDecimal(line.substring(over, slash));
        BigDecimal bottom = new BigDecimal(line.substring(slash + 1, end));
        if (bottom.signum() == 0) {
            throw says.zeroDenominator();
        }
        if (mixed && top.compareTo(bottom) >= 0) {
            throw says.notOneNumber();
        }
        BigDecimal whole = mixed ? new BigDecimal(digits) : BigDecimal.ZERO;
        BigDecimal sum = whole.multiply(bottom).add(top).divide(bottom, MathContext.DECIMAL128);
        return new NumberText(sum, Optional.empty(), ' ', mixed ? Form.MIXED : Form.FRACTION, end);
    }

    private static NumberText decimal(List<String> runs, String marks, int end, Sentences says) {
        char last = marks.charAt(marks.length() - 1);
        String before = marks.substring(0, marks.length() - 1);
        boolean isDecimal = (last == '.' || last == ',') && before.indexOf(last) < 0;
        List<String> groups = isDecimal ? runs.subList(0, runs.size() - 1) : runs;
        String groupMarks = isDecimal ? before : marks;
        if (!groupsFit(groups, groupMarks)) {
            throw says.notOneNumber();
        }
        String whole = String.join("", groups);
        if (!isDecimal) {
            return new NumberText(new BigDecimal(whole), Optional.empty(), ' ', Form.WHOLE, end);
        }
        String part = runs.get(runs.size() - 1);
        BigDecimal value = new BigDecimal("0" + whole + "." + (part.isEmpty() ? "0" : part));
        boolean open = before.isEmpty() && part.length() == 3 && whole.length() >= 1 && whole.length() <= 3
                && whole.charAt(0) != '0';
        Optional<BigDecimal> other = open ? Optional.of(new BigDecimal(whole + part)) : Optional.empty();
        return new NumberText(value, other, last, Form.DECIMAL, end);
    }

    /** Whether the runs are one to three digits and then threes, with one and the same mark between. */
    private static boolean groupsFit(List<String> groups, String marks) {
        if (marks.isEmpty()) {
            return true;
        }
        boolean threes = groups.subList(1, groups.size()).stream().allMatch(g -> g.length() == 3);
        int first = groups.get(0).length();
        return threes && first >= 1 && first <= 3 && marks.chars().distinct().count() == 1;
    }

    static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    /** The character at a position, or a zero character outside the line. */
    static char charAt(String line, int at) {
        return at >= 0 && at < line.length() ? line.charAt(at) : '\0';
    }

    private static int digitsEnd(String line, int start) {
        int at = start;
        while (isDigit(charAt(line, at))) {
            at++;
        }
        return at;
    }
}
