package broadside.quantity;

/**
 * A moment of force.
 *
 * @param newtonMetres the value in newton metres
 * @param typed the text as typed, or a plain rendering in newton metres
 */
public record Moment(double newtonMetres, String typed) implements Quantity, Comparable<Moment> {
    public Moment {
        Finite.check(newtonMetres, typed, Dimension.MOMENT);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a moment. */
    public static Moment of(String text) {
        return (Moment) Typed.quantity(text, Dimension.MOMENT);
    }

    /** From a number of newton metres. */
    public static Moment newtonMetres(double newtonMetres) {
        return new Moment(newtonMetres, Finite.plain(newtonMetres, Dimension.MOMENT));
    }

    @Override
    public double si() {
        return newtonMetres;
    }

    @Override
    public Dimension dimension() {
        return Dimension.MOMENT;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Moment other) {
        return Double.compare(newtonMetres, other.newtonMetres);
    }
}
