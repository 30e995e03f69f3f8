package broadside.quantity;

import java.math.BigDecimal;

/** What every quantity holds to: a finite value, and the text it came from. */
final class Finite {
    private Finite() {
    }

    /** Refuses a value that is not finite, and a missing text. */
    static void check(double value, String typed, Dimension dimension) {
        if (!Double.isFinite(value)) {
            throw new QuantityException(dimension.phrase() + " is a finite number of " + dimension.siUnit());
        }
        if (typed == null) {
            throw new QuantityException(dimension.phrase() + " keeps the text it was typed as");
        }
    }

    /** A number and the unit of calculation in plain digits; it reads as the same number, up to 100 characters. */
    static String plain(double value, Dimension dimension) {
        return plain(value, dimension.siUnit(), dimension);
    }

    /** A number and a unit in plain digits. */
    static String plain(double value, String unit, Dimension dimension) {
        check(value, unit, dimension);
        return BigDecimal.valueOf(value).stripTrailingZeros().toPlainString() + " " + unit;
    }
}
