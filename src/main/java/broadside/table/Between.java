package broadside.table;

import java.util.Optional;

/** How a table is read between its printed points. */
enum Between {
    STRAIGHT_LINE("straight line"), LOGARITHMIC("logarithmic"), STEPS("steps");

    private final String word;

    Between(String word) {
        this.word = word;
    }

    static Optional<Between> of(String word) {
        for (Between between : values()) {
            if (between.word.equals(word)) {
                return Optional.of(between);
            }
        }
        return Optional.empty();
    }

    /** Share of the way from a to b at which x lies, 0 to 1. */
    double share(double a, double b, double x) {
        return switch (this) {
            case STRAIGHT_LINE -> (x - a) / (b - a);
            case LOGARITHMIC -> Math.log(x / a) / Math.log(b / a);
            case STEPS -> x >= b ? 1 : 0;
        };
    }

    /** Index of the last printed point at or below x; {@code at} rises and holds x. */
    static int lower(double[] at, double x) {
        int i = 0;
        while (i + 1 < at.length && at[i + 1] <= x) {
            i++;
        }
        return i;
    }
}
