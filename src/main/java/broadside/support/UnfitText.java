package broadside.support;

/** Typed text inside a sentence. */
final class UnfitText {

    private static final int LONGEST = 40;

    /** Short, and without characters that do not print. */
    static String clean(String typed) {
        StringBuilder text = new StringBuilder();
        typed.codePoints().limit(LONGEST).forEach(c -> text.appendCodePoint(Character.isISOControl(c) || Character.getType(c) == Character.FORMAT
            || Character.getType(c) == Character.SURROGATE ? '?' : c));
        return typed.codePointCount(0, typed.length()) > LONGEST ? text.append('…').toString() : text.toString();
    }

    private UnfitText() { }
}
