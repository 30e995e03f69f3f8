package broadside.quantity;

import java.math.BigDecimal;

/**
 * An angle.
 *
 * @param radians the value in radians
 * @param typed the text as typed, or a plain rendering in radians
 */
public record Angle(double radians, String typed) implements Quantity, Comparable<Angle> {
    public Angle {
        Finite.check(radians, typed, Dimension.ANGLE);
    }

    /** Reads a text with its unit; throws {@link QuantityException} when it is not an angle. */
    public static Angle of(String text) {
        return (Angle) Typed.quantity(text, Dimension.ANGLE);
    }

    /** From a number of radians. */
    public static Angle radians(double radians) {
        return new Angle(radians, Finite.plain(radians, Dimension.ANGLE));
    }

    /** From a number of degrees. */
    public static Angle degrees(double degrees) {
        String typed = Finite.plain(degrees, "deg", Dimension.ANGLE);
        Unit degree = Unit.of(Dimension.ANGLE, "deg").orElseThrow();
        return new Angle(UnitTable.toSi(BigDecimal.valueOf(degrees), degree), typed);
    }

    @Override
    public double si() {
        return radians;
    }

    @Override
    public Dimension dimension() {
        return Dimension.ANGLE;
    }

    /** By value; the text does not count. */
    @Override
    public int compareTo(Angle other) {
        return Double.compare(radians, other.radians);
    }
}
