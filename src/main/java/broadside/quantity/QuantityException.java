package broadside.quantity;

/** A text that is not a quantity of the kind asked for; the message is one line that says why and what fits. */
public final class QuantityException extends RuntimeException {
    public QuantityException(String message) {
        super(message);
    }
}
