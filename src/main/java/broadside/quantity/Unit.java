package broadside.quantity;

import java.util.Objects;
import java.util.Optional;

/**
 * A unit in which a quantity may be typed or shown.
 *
 * @param symbol    the symbol as it is shown
 * @param dimension the kind of quantity
 * @param toSi      the factor to the unit of calculation ({@link Dimension#siUnit()})
 * @param system    the system it belongs to; units common to both count as metric
 */
public record Unit(String symbol, Dimension dimension, double toSi, Units system) {
    public Unit {
        Objects.requireNonNull(symbol, "symbol");
        Objects.requireNonNull(dimension, "dimension");
        Objects.requireNonNull(system, "system");
        if (!(toSi > 0) || Double.isInfinite(toSi)) {
            throw new IllegalArgumentException("The factor of a unit is a finite number above zero.");
        }
    }

    /** The unit for a symbol or one of its usual spellings, if it is one of this dimension. */
    public static Optional<Unit> of(Dimension dimension, String symbol) {
        return UnitTable.find(dimension, symbol);
    }
}
