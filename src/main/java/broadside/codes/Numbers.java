package broadside.codes;

/** Numbers as they stand in formula texts, and limits that a ratio of typed lengths meets in spite of binary rounding. */
final class Numbers {

    /** Ratios of lengths that are equal on paper differ by less than this share in binary. */
    private static final double ROUNDING = 1e-9;

    /** Shortest plain text of a number: 0.19, 7, 2.01. */
    static String plain(double value) {
        return value == Math.rint(value) && Math.abs(value) < 1e9 ? Long.toString((long) value) : Double.toString(value);
    }

    /** Whether a ratio is at least a limit; 1.9999999999999998 is at least 2. */
    static boolean atLeast(double ratio, double limit) {
        return ratio >= limit * (1 - ROUNDING);
    }

    /** Whether a ratio is above a limit; 2.0000000000000004 is not above 2. */
    static boolean above(double ratio, double limit) {
        return ratio > limit * (1 + ROUNDING);
    }

    private Numbers() { }
}
