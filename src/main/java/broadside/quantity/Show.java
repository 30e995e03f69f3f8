package broadside.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

/**
 * Renders values for display; the only place where values are rounded.
 *
 * <p>Units shown: m or feet and inches; m/s or mph; Pa below 100 Pa and kPa from there, or psf; N below 1000 N
 * and kN from there, or lbf below 10 000 lbf and kip from there; moments alike; kg or lb; m2 or ft2; kg/m3 or
 * lb/ft3; degrees and years in both systems.
 */
public final class Show {
    /** Steps this close to a printable number, relative to it, are binary noise and not rounded away from it. */
    private static final BigDecimal NOISE = new BigDecimal("1e-9");
    private static final int ECHO_FIGURES = 4;
    private static final BigDecimal EIGHTH_INCH_METRES = new BigDecimal("0.003175");

    private Show() {
    }

    /** A value in the unit of calculation as number and unit of the chosen system. */
    public static Shown of(double si, Dimension dimension, Units system, int figures, Rounding rounding) {
        requireFinite(si);
        if (dimension == Dimension.LENGTH && system == Units.US) {
            return new Shown(feetInches(si, rounding), "");
        }
        Unit unit = DisplayUnits.small(dimension, system);
        BigDecimal value = rounded(UnitTable.fromSi(si, unit), figures, rounding);
        if (value.abs().compareTo(DisplayUnits.limit(dimension, system)) >= 0) {
            unit = DisplayUnits.large(dimension, system);
            value = rounded(UnitTable.fromSi(si, unit), figures, rounding);
        }
        return new Shown(text(value, figures), unit.symbol());
    }

    /** A plain number to some significant figures, trailing zeros kept; {@code 0} for zero. */
    public static String number(double value, int figures, Rounding rounding) {
        requireFinite(value);
        return text(rounded(BigDecimal.valueOf(value), figures, rounding), figures);
    }

    /** A value of a calculation line, in the unit as it stands. */
    public static Shown step(double value, String siUnit, int figures) {
        return new Shown(number(value, figures, Rounding.NEAREST), siUnit);
    }

    /** A length in feet and inches to the nearest 1/8 in. */
    public static String feetInches(double metres) {
        return feetInches(metres, Rounding.NEAREST);
    }

    /** A length in feet and inches to a whole 1/8 in, rounded as told. */
    public static String feetInches(double metres, Rounding rounding) {
        requireFinite(metres);
        BigDecimal exact = BigDecimal.valueOf(metres).divide(EIGHTH_INCH_METRES, MathContext.DECIMAL128);
        BigDecimal eighths = withoutNoise(exact, exact.setScale(0, RoundingMode.HALF_UP),
                exact.setScale(0, mode(rounding)));
        return FeetInchesText.of(eighths.toBigInteger());
    }

    /** A quantity in metric units and, where they differ, in US units: {@code 2.591 m (8 ft 6 in)}. */
    public static String both(Quantity quantity) {
        String metric = echo(quantity, Units.METRIC);
        String us = echo(quantity, Units.US);
        return metric.equals(us) ? metric : metric + " (" + us + ")";
    }

    /** To four figures without trailing zeros, and never less than all digits before the point. */
    private static String echo(Quantity quantity, Units system) {
        Shown shown = of(quantity.si(), quantity.dimension(), system, ECHO_FIGURES, Rounding.NEAREST);
        if (shown.unit().isEmpty()) {
            return shown.text();
        }
        Unit unit = Unit.of(quantity.dimension(), shown.unit()).orElseThrow();
        BigDecimal value = UnitTable.fromSi(quantity.si(), unit);
        int whole = value.precision() - value.scale();
        BigDecimal kept = value.round(new MathContext(Math.max(ECHO_FIGURES, whole), RoundingMode.HALF_UP));
        return new Shown(text(kept.stripTrailingZeros(), 1), shown.unit()).text();
    }

    private static BigDecimal rounded(BigDecimal exact, int figures, Rounding rounding) {
        if (figures < 1) {
            throw new IllegalArgumentException("A number is shown to one figure or more.");
        }
        BigDecimal nearest = exact.round(new MathContext(figures, RoundingMode.HALF_UP));
        return withoutNoise(exact, nearest, exact.round(new MathContext(figures, mode(rounding))));
    }

    private static BigDecimal withoutNoise(BigDecimal exact, BigDecimal nearest, BigDecimal directed) {
        BigDecimal step = exact.subtract(nearest).abs();
        return step.compareTo(exact.abs().multiply(NOISE)) <= 0 ? nearest : directed;
    }

    private static RoundingMode mode(Rounding rounding) {
        return switch (rounding) {
            case NEAREST -> RoundingMode.HALF_UP;
            case UP -> RoundingMode.UP;
            case DOWN -> RoundingMode.DOWN;
        };
    }

    /** Plain digits from 1e-7 to 1e15, else with an exponent so that the text stays short. */
    private static String text(BigDecimal value, int figures) {
        if (value.signum() == 0) {
            return "0";
        }
        int exponent = value.precision() - value.scale() - 1;
        int places = Math.max(figures - 1 - exponent, 0);
        if (exponent >= -7 && exponent < 15) {
            return value.setScale(Math.max(places, value.stripTrailingZeros().scale()), RoundingMode.UNNECESSARY)
                    .toPlainString();
        }
        BigDecimal digits = value.stripTrailingZeros().movePointLeft(exponent);
        BigDecimal lead = digits.setScale(Math.max(figures - 1, digits.scale()), RoundingMode.UNNECESSARY);
        return String.format(Locale.ROOT, "%se%d", lead.toPlainString(), exponent);
    }

    private static void requireFinite(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("Only a finite number can be shown.");
        }
    }
}
