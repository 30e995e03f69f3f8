package broadside.quantity;

import java.util.Objects;

/**
 * A number as it is shown, and its unit.
 *
 * @param number the rounded number, or feet and inches in full such as {@code 8 ft 6 in}
 * @param unit   the unit symbol; empty when {@code number} already holds the units
 */
public record Shown(String number, String unit) {
    public Shown {
        Objects.requireNonNull(number, "number");
        Objects.requireNonNull(unit, "unit");
    }

    /** Number and unit with a space between. */
    public String text() {
        return unit.isEmpty() ? number : number + " " + unit;
    }
}
