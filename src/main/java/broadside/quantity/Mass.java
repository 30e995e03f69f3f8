package broadside.quantity;

/**
 * A mass; its weight is a force and is never taken for it.
 *
 * @param kilograms the value in kilograms
 * @param typed the text as typed, or a plain rendering in kilograms
 */
public record Mass(double kilograms, String typed) implements Quantity, Comparable<Mass> {
    public Mass {
        Finite.check(kilograms, typed, Dimension.MASS);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a mass. */
    public static Mass of(String text) {
        return (Mass) Typed.quantity(text, Dimension.MASS);
    }

    /** From a number of kilograms. */
    public static Mass kilograms(double kilograms) {
        return new Mass(kilograms, Finite.plain(kilograms, Dimension.MASS));
    }

    @Override
    public double si() {
        return kilograms;
    }

    @Override
    public Dimension dimension() {
        return Dimension.MASS;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Mass other) {
        return Double.compare(kilograms, other.kilograms);
    }
}
