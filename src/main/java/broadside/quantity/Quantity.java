package broadside.quantity;

import java.math.BigDecimal;

/** A physical value in the unit of calculation, together with the text it came from. */
public sealed interface Quantity
        permits Length, Speed, Pressure, Force, Moment, Mass, Angle, Area, Density, Period {

    /** The value in the unit of calculation ({@link Dimension#siUnit()}); always finite. */
    double si();

    /** The text as typed, or a plain rendering in the unit of calculation when made from a number. */
    String typed();

    /** The kind of quantity. */
    Dimension dimension();

    /** Refuses a value that is not finite, and a missing text. */
    static void check(double value, String typed, Dimension dimension) {
        if (!Double.isFinite(value)) {
            throw new QuantityException(dimension.phrase() + " is a finite number of " + dimension.siUnit());
        }
        if (typed == null) {
            throw new QuantityException(dimension.phrase() + " keeps the text it was typed as");
        }
    }

    /** A number and the unit of calculation in plain digits; reading it gives the same number again. */
    static String plain(double value, Dimension dimension) {
        return plain(value, dimension.siUnit(), dimension);
    }

    /** A number and a unit in plain digits. */
    static String plain(double value, String unit, Dimension dimension) {
        check(value, unit, dimension);
        return BigDecimal.valueOf(value).stripTrailingZeros().toPlainString() + " " + unit;
    }
}
