package broadside.quantity;

/**
 * A speed; which averaging time it stands for is kept elsewhere.
 *
 * @param metresPerSecond the value in metres per second
 * @param typed the text as typed, or a plain rendering in metres per second
 */
public record Speed(double metresPerSecond, String typed) implements Quantity, Comparable<Speed> {
    public Speed {
        Finite.check(metresPerSecond, typed, Dimension.SPEED);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a speed. */
    public static Speed of(String text) {
        return (Speed) Typed.quantity(text, Dimension.SPEED);
    }

    /** From a number of metres per second. */
    public static Speed metresPerSecond(double metresPerSecond) {
        return new Speed(metresPerSecond, Finite.plain(metresPerSecond, Dimension.SPEED));
    }

    @Override
    public double si() {
        return metresPerSecond;
    }

    @Override
    public Dimension dimension() {
        return Dimension.SPEED;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Speed other) {
        return Double.compare(metresPerSecond, other.metresPerSecond);
    }
}
