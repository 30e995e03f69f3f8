package broadside.quantity;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Reads quantities as people type them.
 *
 * <p>A number has one decimal mark, comma or point. {@code 1.500,00} and {@code 1,500.00} are clear.
 * One comma with exactly three digits behind it, as in {@code 1,500 m}, has two readings: with a unit the
 * plausible one is taken and a warning states it, else both are offered. One point with three digits behind
 * it is a decimal point when the unit is typed, as job files are written so; in a field that supplies the
 * unit ({@code 1.500}) both readings are offered. Exponents ({@code 1e3 mm}) are refused. Negative numbers
 * are read; whether they have a meaning is for the caller to say.
 */
public final class Typed {
    private static final int LONGEST = 100;

    private Typed() {
    }

    /** Reads a text that has to carry its unit. Any text gives a reading, never an exception. */
    public static Reading read(String text, Dimension dimension) {
        return reading(text, dimension, Optional.empty());
    }

    /** Reads a text in a field with a unit beside it, which a bare number takes. */
    public static Reading read(String text, Dimension dimension, Unit bare) {
        if (bare.dimension() != dimension) {
            throw new IllegalArgumentException(bare.symbol() + " is not a unit of " + dimension.word());
        }
        return reading(text, dimension, Optional.of(bare));
    }

    /** The quantity a text stands for; throws when it is refused or has two readings. */
    public static Quantity quantity(String text, Dimension dimension) {
        Reading reading = read(text, dimension);
        if (reading instanceof Reading.Value value) {
            return quantity(dimension, value.si(), value.typed());
        }
        throw new QuantityException(reading instanceof Reading.Ambiguous open
                ? open.problem() : ((Reading.Refused) reading).problem());
    }

    /** A quantity from a value in the unit of calculation and the text it came from. */
    public static Quantity quantity(Dimension dimension, double si, String typed) {
        return switch (dimension) {
            case LENGTH -> new Length(si, typed);
            case SPEED -> new Speed(si, typed);
            case PRESSURE -> new Pressure(si, typed);
            case FORCE -> new Force(si, typed);
            case MOMENT -> new Moment(si, typed);
            case MASS -> new Mass(si, typed);
            case ANGLE -> new Angle(si, typed);
            case AREA -> new Area(si, typed);
            case DENSITY -> new Density(si, typed);
            case MASS_PER_AREA -> new MassPerArea(si, typed);
            case PERIOD -> new Period(si, typed);
            case PRESSURE_PER_DEPTH, FORCE_PER_LENGTH, MASS_PER_LENGTH, VOLUME, INERTIA, FREQUENCY -> new Measure(dimension, si, typed);
        };
    }

    private static Reading reading(String text, Dimension dimension, Optional<Unit> bare) {
        String given = text == null ? "" : text;
        Sentences says = new Sentences(given, dimension);
        try {
            String line = line(given, says);
            boolean signed = line.startsWith("-") || line.startsWith("+");
            String body = signed ? line.substring(1).strip() : line;
            return body(new Context(given, dimension, bare, says, line.startsWith("-")), body);
        } catch (QuantityException refused) {
            return new Reading.Refused(refused.getMessage());
        }
    }

    private static String line(String text, Sentences says) {
        if (text.length() > LONGEST) {
            throw says.tooLong();
        }
        if (text.chars().anyMatch(c -> c != '\t' && Character.getType(c) != Character.SURROGATE
                && !Folding.prints(c) && !stray(c))) {
            throw says.unprintable();
        }
        String line = Folding.line(text);
        if (line.isEmpty()) {
            throw says.nothing();
        }
        if (line.codePoints().anyMatch(c -> Character.isDigit(c) && (c < '0' || c > '9'))) {
            throw says.otherDigits();
        }
        String lower = line.toLowerCase(Locale.ROOT);
        if (says.dimension() == Dimension.SPEED && (lower.contains("bft") || lower.contains("beaufort"))) {
            throw says.beaufort();
        }
        return line;
    }

    /** Marks without width that come along when a text is copied, and that change nothing. */
    private static boolean stray(int c) {
        return c == '\u200B' || c == '\u200E' || c == '\u200F' || c == '\u2060' || c == '\uFEFF' || c == '\u00AD';
    }

    private record Context(String text, Dimension dimension, Optional<Unit> bare, Sentences says, boolean minus) {
        BigDecimal signed(BigDecimal value) {
            return minus ? value.negate() : value;
        }

        Reading value(BigDecimal value, Unit unit, Unit typedIn, List<String> warnings) {
            return new Reading.Value(UnitTable.toSi(signed(value), unit), typedIn, text, warnings);
        }

        Reading open(List<String> options) {
            List<String> withSign = options.stream().map(o -> minus ? "-" + o : o).toList();
            return new Reading.Ambiguous(Folding.quote(text) + " can be read as " + String.join(" or as ", withSign)
                    + ": type one of these", withSign);
        }
    }

    private static Reading body(Context context, String body) {
        boolean length = context.dimension() == Dimension.LENGTH;
        boolean apostrophes = !length || UnitWords.endsMetric(body, context.bare());
        NumberText number = NumberText.scan(body, 0, apostrophes, context.says());
        if (length) {
            Optional<FeetInches.Result> feet = FeetInches.read(body, number, context.bare(), context.says());
            if (feet.isPresent()) {
                return feetInches(context, feet.get());
            }
        }
        String rest = body.substring(number.end()).strip();
        if (!rest.isEmpty()) {
            Unit unit = UnitWords.unit(rest, context.says());
            return withUnit(context, number, unit, UnitWords.warnings(rest, unit));
        }
        Unit unit = context.bare().orElseThrow(context.says()::noUnit);
        return number.thousands().isPresent()
                ? context.open(options(number, unit))
                : context.value(number.value(), unit, unit, List.of());
    }

    private static Reading feetInches(Context context, FeetInches.Result result) {
        if (result instanceof FeetInches.Result.Inches total) {
            Unit inch = Unit.of(Dimension.LENGTH, "in").orElseThrow();
            Unit foot = Unit.of(Dimension.LENGTH, "ft").orElseThrow();
            return context.value(total.inches(), inch, foot, total.warnings());
        }
        return context.open(((FeetInches.Result.Open) result).options());
    }

    private static Reading withUnit(Context context, NumberText number, Unit unit, List<String> warnings) {
        if (number.thousands().isEmpty() || number.mark() == '.') {
            return context.value(number.value(), unit, unit, warnings);
        }
        BigDecimal thousands = number.thousands().get();
        boolean small = unit.dimension().plausible(UnitTable.toSi(number.value(), unit));
        boolean large = unit.dimension().plausible(UnitTable.toSi(thousands, unit));
        List<String> options = options(number, unit);
        if (small == large) {
            return context.open(options);
        }
        List<String> all = new ArrayList<>(warnings);
        String sign = context.minus() ? "-" : "";
        all.add(Folding.quote(context.text()) + " is read as " + sign + options.get(large ? 0 : 1) + ", as "
                + sign + options.get(large ? 1 : 0) + " would be an unlikely " + unit.dimension().word());
        return context.value(large ? thousands : number.value(), unit, unit, all);
    }

    private static List<String> options(NumberText number, Unit unit) {
        return List.of(number.thousands().orElseThrow().toPlainString() + " " + unit.symbol(),
                number.value().stripTrailingZeros().toPlainString() + " " + unit.symbol());
    }
}
