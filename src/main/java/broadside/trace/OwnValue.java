package broadside.trace;

/**
 * A value that the user sets in place of a calculated one.
 *
 * @param name    name of the step whose value is replaced
 * @param value   the value in SI
 * @param unit    unit of the value, "1" for a plain number
 * @param reason  why, as typed; never empty
 */
public record OwnValue(String name, double value, String unit, String reason) {

    public OwnValue {
        if (reason.isBlank()) {
            throw new IllegalArgumentException("an override needs a reason");
        }
    }
}
