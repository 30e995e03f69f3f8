package broadside.quantity;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/** Finds the unit in the words after a number, or says why there is none. */
final class UnitWords {
    private static final Set<String> TONS = Set.of("ton", "tons");

    private UnitWords() {
    }

    /** The unit for the words after the number; throws with the reason when there is none. */
    static Unit unit(String words, Sentences says) {
        char first = words.charAt(0);
        if (isExponent(words)) {
            throw says.exponent();
        }
        if (NumberText.isDigit(first) || (first == '-' && hasDigitAfterDash(words))) {
            throw says.twoNumbers();
        }
        if (".,/*·^".indexOf(first) >= 0) {
            throw says.notOneNumber();
        }
        return Unit.of(says.dimension(), words).orElseThrow(() -> reason(words, says));
    }

    /** Sentences about a unit that was taken although its letters are unusual. */
    static List<String> warnings(String words, Unit unit) {
        String exact = Folding.symbol(words);
        boolean kilonewton = unit.symbol().startsWith("kN") && exact.regionMatches(true, 0, "kN", 0, 2)
                && !exact.startsWith("kN");
        boolean knot = unit.symbol().equals("kn") && exact.equals("kN");
        if (!kilonewton && !knot) {
            return List.of();
        }
        String meaning = knot ? ", the knot" : ", with k for kilo and N for newton";
        return List.of(Folding.quote(words) + " is read as " + unit.symbol() + meaning);
    }

    /** Whether the text ends in a metric length unit, or in a digit in a field with a metric unit. */
    static boolean endsMetric(String line, Optional<Unit> bare) {
        int start = line.length();
        while (start > 0 && Character.isLetter(line.charAt(start - 1))) {
            start--;
        }
        if (start == line.length()) {
            return NumberText.isDigit(NumberText.charAt(line, start - 1))
                    && bare.filter(u -> u.system() == Units.METRIC).isPresent();
        }
        return Unit.of(Dimension.LENGTH, line.substring(start)).filter(u -> u.system() == Units.METRIC).isPresent();
    }

    private static QuantityException reason(String words, Sentences says) {
        Optional<Unit> otherCase = UnitTable.anyCase(says.dimension(), words);
        if (otherCase.isPresent()) {
            return says.letterCase(otherCase.get());
        }
        if (says.dimension() == Dimension.MASS && TONS.contains(words.toLowerCase(Locale.ROOT))) {
            return says.ton();
        }
        return UnitTable.kind(words).map(says::otherKind).orElseGet(says::unknownUnit);
    }

    private static boolean isExponent(String words) {
        char first = words.charAt(0);
        char second = NumberText.charAt(words, 1);
        boolean sign = second == '-' || second == '+';
        return (first == 'e' || first == 'E') && NumberText.isDigit(sign ? NumberText.charAt(words, 2) : second);
    }

    private static boolean hasDigitAfterDash(String words) {
        return NumberText.isDigit(NumberText.charAt(words.substring(1).strip(), 0));
    }
}
