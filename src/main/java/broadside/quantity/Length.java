package broadside.quantity;

/**
 * A length.
 *
 * @param metres the value in metres
 * @param typed the text as typed, or a plain rendering in metres
 */
public record Length(double metres, String typed) implements Quantity, Comparable<Length> {
    public Length {
        Finite.check(metres, typed, Dimension.LENGTH);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a length. */
    public static Length of(String text) {
        return (Length) Typed.quantity(text, Dimension.LENGTH);
    }

    /** From a number of metres. */
    public static Length metres(double metres) {
        return new Length(metres, Finite.plain(metres, Dimension.LENGTH));
    }

    @Override
    public double si() {
        return metres;
    }

    @Override
    public Dimension dimension() {
        return Dimension.LENGTH;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Length other) {
        return Double.compare(metres, other.metres);
    }
}
