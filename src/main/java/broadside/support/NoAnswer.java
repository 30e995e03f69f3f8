package broadside.support;

/** Why something cannot be pre-sized although every answer is a possible one: the loads stand, and an engineer is needed. */
public final class NoAnswer extends RuntimeException {

    public NoAnswer(String text) {
        super(text);
    }
}
