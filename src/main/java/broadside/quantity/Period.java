package broadside.quantity;

/**
 * A span of time such as a return period or a working life.
 *
 * @param years the value in years
 * @param typed the text as typed, or a plain rendering in years
 */
public record Period(double years, String typed) implements Quantity, Comparable<Period> {
    public Period {
        Finite.check(years, typed, Dimension.PERIOD);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a period. */
    public static Period of(String text) {
        return (Period) Typed.quantity(text, Dimension.PERIOD);
    }

    /** From a number of years. */
    public static Period years(double years) {
        return new Period(years, Finite.plain(years, Dimension.PERIOD));
    }

    @Override
    public double si() {
        return years;
    }

    @Override
    public Dimension dimension() {
        return Dimension.PERIOD;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Period other) {
        return Double.compare(years, other.years);
    }
}
