package broadside.quantity;

/**
 * A density.
 *
 * @param kilogramsPerCubicMetre the value in kilograms per cubic metre
 * @param typed the text as typed, or a plain rendering in kilograms per cubic metre
 */
public record Density(double kilogramsPerCubicMetre, String typed) implements Quantity, Comparable<Density> {
    public Density {
        Finite.check(kilogramsPerCubicMetre, typed, Dimension.DENSITY);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a density. */
    public static Density of(String text) {
        return (Density) Typed.quantity(text, Dimension.DENSITY);
    }

    /** From a number of kilograms per cubic metre. */
    public static Density kilogramsPerCubicMetre(double kilogramsPerCubicMetre) {
        return new Density(kilogramsPerCubicMetre, Finite.plain(kilogramsPerCubicMetre, Dimension.DENSITY));
    }

    @Override
    public double si() {
        return kilogramsPerCubicMetre;
    }

    @Override
    public Dimension dimension() {
        return Dimension.DENSITY;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Density other) {
        return Double.compare(kilogramsPerCubicMetre, other.kilogramsPerCubicMetre);
    }
}
