package broadside.codes;

/** Numbers as they stand in formula texts. */
final class Numbers {

    /** Shortest plain text of a number: 0.19, 7, 2.01. */
    static String plain(double value) {
        return value == Math.rint(value) && Math.abs(value) < 1e9 ? Long.toString((long) value) : Double.toString(value);
    }

    private Numbers() { }
}
