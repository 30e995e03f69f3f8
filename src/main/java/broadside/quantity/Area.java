package broadside.quantity;

/**
 * An area.
 *
 * @param squareMetres the value in square metres
 * @param typed the text as typed, or a plain rendering in square metres
 */
public record Area(double squareMetres, String typed) implements Quantity, Comparable<Area> {
    public Area {
        Finite.check(squareMetres, typed, Dimension.AREA);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not an area. */
    public static Area of(String text) {
        return (Area) Typed.quantity(text, Dimension.AREA);
    }

    /** From a number of square metres. */
    public static Area squareMetres(double squareMetres) {
        return new Area(squareMetres, Finite.plain(squareMetres, Dimension.AREA));
    }

    @Override
    public double si() {
        return squareMetres;
    }

    @Override
    public Dimension dimension() {
        return Dimension.AREA;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Area other) {
        return Double.compare(squareMetres, other.squareMetres);
    }
}
