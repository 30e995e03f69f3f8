package broadside.quantity;

/**
 * A value of one of the dimensions that are rarely typed: a pressure per depth, a second moment of area and so on.
 *
 * @param si    the value in the unit of calculation of its dimension
 * @param typed the text as typed
 */
public record Measure(Dimension dimension, double si, String typed) implements Quantity {
    public Measure {
        Finite.check(si, typed, dimension);
    }
}
