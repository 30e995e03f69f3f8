package broadside.quantity;

/**
 * A force.
 *
 * @param newtons the value in newtons
 * @param typed the text as typed, or a plain rendering in newtons
 */
public record Force(double newtons, String typed) implements Quantity, Comparable<Force> {
    public Force {
        Finite.check(newtons, typed, Dimension.FORCE);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a force. */
    public static Force of(String text) {
        return (Force) Typed.quantity(text, Dimension.FORCE);
    }

    /** From a number of newtons. */
    public static Force newtons(double newtons) {
        return new Force(newtons, Finite.plain(newtons, Dimension.FORCE));
    }

    @Override
    public double si() {
        return newtons;
    }

    @Override
    public Dimension dimension() {
        return Dimension.FORCE;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Force other) {
        return Double.compare(newtons, other.newtons);
    }
}
