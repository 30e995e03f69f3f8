package broadside.quantity;

/**
 * A pressure.
 *
 * @param pascals the value in pascals
 * @param typed the text as typed, or a plain rendering in pascals
 */
public record Pressure(double pascals, String typed) implements Quantity, Comparable<Pressure> {
    public Pressure {
        Finite.check(pascals, typed, Dimension.PRESSURE);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a pressure. */
    public static Pressure of(String text) {
        return (Pressure) Typed.quantity(text, Dimension.PRESSURE);
    }

    /** From a number of pascals. */
    public static Pressure pascals(double pascals) {
        return new Pressure(pascals, Finite.plain(pascals, Dimension.PRESSURE));
    }

    @Override
    public double si() {
        return pascals;
    }

    @Override
    public Dimension dimension() {
        return Dimension.PRESSURE;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Pressure other) {
        return Double.compare(pascals, other.pascals);
    }
}
