package broadside.quantity;

import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Reads lengths of feet followed by inches: {@code 8 ft 6 in}, {@code 8' 6"}, {@code 8ft6}, {@code 8-6}. */
final class FeetInches {
    private static final List<String> FOOT = List.of("feet", "foot", "ft", "'");
    private static final BigDecimal TWELVE = BigDecimal.valueOf(12);

    private FeetInches() {
    }

    /** The total inches, or two readings, or neither when no inches follow the feet. */
    sealed interface Result {
        record Inches(BigDecimal inches, List<String> warnings) implements Result {
        }

        record Open(List<String> options) implements Result {
        }
    }

    /**
     * Looks for inches after a first number.
     *
     * @param line the folded line without its sign
     * @param feet the number at its start
     * @param bare the unit a number without unit takes
     */
    static Optional<Result> read(String line, NumberText feet, Optional<Unit> bare, Sentences says) {
        String rest = line.substring(feet.end());
        if (rest.startsWith("-") && startsNumber(rest.substring(1).strip())) {
            return Optional.of(hyphen(rest.substring(1).strip(), feet, bare, says));
        }
        Optional<String> after = afterFoot(rest);
        if (after.isEmpty()) {
            return Optional.empty();
        }
        NumberText inches = inches(after.get(), feet, says);
        // The point in "8 ft.6 in" may end the word or begin the inches.
        if (after.get().startsWith(".") && rest.contains("t.")) {
            NumberText whole = inches(after.get().substring(1), feet, says);
            return Optional.of(new Result.Open(List.of(plain(feet) + " ft " + plain(whole) + " in",
                    plain(feet) + " ft " + plain(inches) + " in")));
        }
        boolean likePower = after.get().equals("2") || after.get().equals("3");
        List<String> warnings = likePower
                ? List.of(Folding.quote(says.text()) + " is read as " + plain(feet) + " ft " + plain(inches) + " in")
                : List.of();
        return Optional.of(new Result.Inches(total(feet, inches), warnings));
    }

    private static Result hyphen(String after, NumberText feet, Optional<Unit> bare, Sentences says) {
        NumberText second = NumberText.scan(after, 0, false, says);
        String unit = after.substring(second.end()).strip();
        boolean usField = bare.isEmpty() || bare.get().system() == Units.US;
        if (!unit.isEmpty() && !isInch(unit)) {
            throw says.twoNumbers();
        }
        if (unit.isEmpty() && !usField) {
            throw says.hyphen();
        }
        NumberText inches = inches(after, feet, says);
        if (second.form() == NumberText.Form.FRACTION) {
            String fraction = after.substring(0, second.end());
            return new Result.Open(List.of(plain(feet) + " " + fraction + " in",
                    plain(feet) + " ft " + fraction + " in"));
        }
        return new Result.Inches(total(feet, inches), List.of());
    }

    /** The text after the foot mark and any separator, when a number begins there. */
    private static Optional<String> afterFoot(String rest) {
        String lower = rest.strip().toLowerCase(Locale.ROOT);
        Optional<String> mark = FOOT.stream().filter(lower::startsWith).findFirst();
        // "8 ft2" with a space before the unit is an area; "8ft6" without one is feet and inches.
        boolean power = rest.startsWith(" ") && (lower.equals("ft2") || lower.equals("ft3"));
        if (mark.isEmpty() || power) {
            return Optional.empty();
        }
        String after = lower.substring(mark.get().length());
        after = (after.startsWith(".") && !startsNumber(after) ? after.substring(1) : after).strip();
        after = after.startsWith("and ") ? after.substring(4) : after;
        after = after.startsWith("-") || after.startsWith(",") ? after.substring(1).strip() : after;
        return startsNumber(after) ? Optional.of(after) : Optional.empty();
    }

    private static NumberText inches(String after, NumberText feet, Sentences says) {
        NumberText inches = NumberText.scan(after, 0, false, says);
        String unit = after.substring(inches.end()).strip();
        if (feet.form() != NumberText.Form.WHOLE) {
            throw says.feetNotWhole();
        }
        if (inches.value().compareTo(TWELVE) >= 0 || (!unit.isEmpty() && !isInch(unit))) {
            throw says.inches();
        }
        return inches;
    }

    private static boolean startsNumber(String text) {
        char first = NumberText.charAt(text, 0);
        return NumberText.isDigit(first) || (first == '.' && NumberText.isDigit(NumberText.charAt(text, 1)));
    }

    private static boolean isInch(String unit) {
        return Unit.of(Dimension.LENGTH, unit).filter(u -> u.symbol().equals("in")).isPresent();
    }

    private static BigDecimal total(NumberText feet, NumberText inches) {
        return feet.value().multiply(TWELVE).add(inches.value());
    }

    private static String plain(NumberText number) {
        return number.value().toPlainString();
    }
}
