package broadside.report;

import java.util.Arrays;

/** Shares the width of the text among the columns of a table. */
final class Columns {

    /**
     * Returns one width for each column; together they fill {@code width}.
     *
     * @param whole   what each column needs to keep its texts on one line
     * @param least   what each column needs to keep its words whole
     * @param weights how the columns share what is left over, or what is missing
     */
    static double[] fit(double[] whole, double[] least, int[] weights, double width) {
        if (sum(whole) <= width) {
            return share(whole, weights, width - sum(whole));
        }
        double[] narrow = new double[least.length];
        for (int i = 0; i < least.length; i++) {
            // One long word must not take the room of all others: it breaks.
            narrow[i] = Math.min(least[i], Math.max(width * 0.6 / least.length, width * weight(weights[i])
                / Arrays.stream(weights).mapToDouble(Columns::weight).sum()));
        }
        if (sum(least) <= width) {
            narrow = least.clone();
        }
        double over = sum(narrow) - width;
        if (over > 0) {
            double factor = width / sum(narrow);
            return Arrays.stream(narrow).map(w -> w * factor).toArray();
        }
        return grow(narrow, whole, weights, -over);
    }

    /** Gives each column more until its texts fit on one line, by weight, as long as there is room. */
    private static double[] grow(double[] start, double[] whole, int[] weights, double room) {
        double[] result = start.clone();
        double rest = room;
        for (int round = 0; round < result.length && rest > 0.01; round++) {
            double hungry = 0;
            for (int i = 0; i < result.length; i++) {
                hungry += whole[i] > result[i] ? weight(weights[i]) : 0;
            }
            if (hungry == 0) {
                return share(result, weights, rest);
            }
            double portion = rest / hungry;
            for (int i = 0; i < result.length; i++) {
                double more = Math.max(0, Math.min(whole[i] - result[i], portion * weight(weights[i])));
                result[i] += more;
                rest -= more;
            }
        }
        return share(result, weights, Math.max(0, rest));
    }

    private static double[] share(double[] start, int[] weights, double extra) {
        double all = Arrays.stream(weights).mapToDouble(Columns::weight).sum();
        double[] result = start.clone();
        for (int i = 0; i < result.length; i++) {
            result[i] += extra * weight(weights[i]) / all;
        }
        return result;
    }

    private static double weight(int weight) {
        return Math.max(1, weight);
    }

    private static double sum(double[] values) {
        return Arrays.stream(values).sum();
    }

    private Columns() { }
}
