package broadside.quantity;

/**
 * A mass for each square metre, as of fabric.
 *
 * @param kilogramsPerSquareMetre the value in kilograms per square metre
 * @param typed the text as typed, or a plain rendering in kilograms per square metre
 */
public record MassPerArea(double kilogramsPerSquareMetre, String typed) implements Quantity, Comparable<MassPerArea> {
    public MassPerArea {
        Finite.check(kilogramsPerSquareMetre, typed, Dimension.MASS_PER_AREA);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not a mass per area. */
    public static MassPerArea of(String text) {
        return (MassPerArea) Typed.quantity(text, Dimension.MASS_PER_AREA);
    }

    /** From a number of kilograms per square metre. */
    public static MassPerArea kilogramsPerSquareMetre(double kilogramsPerSquareMetre) {
        return new MassPerArea(kilogramsPerSquareMetre, Finite.plain(kilogramsPerSquareMetre, Dimension.MASS_PER_AREA));
    }

    @Override
    public double si() {
        return kilogramsPerSquareMetre;
    }

    @Override
    public Dimension dimension() {
        return Dimension.MASS_PER_AREA;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(MassPerArea other) {
        return Double.compare(kilogramsPerSquareMetre, other.kilogramsPerSquareMetre);
    }
}
