package broadside.limit;

import java.util.Comparator;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.DoubleFunction;
import org.apache.commons.math3.analysis.solvers.PegasusSolver;

/**
 * Finds the wind at which a share of what can be taken is just 1, on the whole calculation: it is handed a function from the
 * wind to the shares of all checks and knows nothing else. Shares never fall when the wind grows.
 */
public final class LimitSearch {

    /** Winds from a fiftieth of the first one to fifty times as much. */
    private static final double WIDEST = 50;
    private static final double SHARP = 1e-12;
    private static final double TINY = 1e-12;
    private static final int MOST_TRIES = 200;
    private static final int MOST_STEPS = 12;
    /** The first bracket around what the square of the speed gives. */
    private static final double NEAR = 1e-6;

    private final DoubleFunction<Map<String, Double>> shares;
    private final Map<Double, Map<String, Double>> known = new HashMap<>();

    /**
     * Makes a search.
     *
     * @param shares  share of each check by the wind, as a multiple of a first one
     */
    public LimitSearch(DoubleFunction<Map<String, Double>> shares) {
        this.shares = shares;
    }

    /**
     * What was found for one check.
     *
     * @param multiple  of the first wind at which the share is 1
     * @param bySquare  whether no wind of the calculation gives a share of 1, because a least value of the code holds below, and the square of the
     *                  speed was used from the first wind on
     */
    public record Found(double multiple, boolean bySquare) { }

    /** The limit of a check; empty where the wind does not bring it to 1. */
    public Optional<Found> find(String check) {
        double first = share(check, 1);
        if (first < TINY) {
            return Optional.empty();
        }
        OptionalDouble straight = straight(check, first);
        if (straight.isPresent()) {
            return Optional.of(new Found(straight.getAsDouble(), false));
        }
        double guess = Math.min(WIDEST / 2, Math.max(2 / WIDEST, 1 / Math.sqrt(first)));
        double low = guess * (1 - NEAR);
        double high = guess * (1 + NEAR);
        for (double wider = NEAR; share(check, low) > 1; wider *= 8) {
            if (low <= 1 / WIDEST) {
                return share(check, low) < first ? Optional.of(new Found(1 / Math.sqrt(first), true)) : Optional.empty();
            }
            high = low;
            low = Math.max(1 / WIDEST, guess * Math.exp(-wider * 8));
        }
        for (double wider = NEAR; share(check, high) < 1; wider *= 8) {
            if (high >= WIDEST) {
                return Optional.empty();
            }
            low = high;
            high = Math.min(WIDEST, guess * Math.exp(wider * 8));
        }
        // Shares go about with the square of the wind: their logarithms go with each other in a straight line.
        double at = share(check, low) == 1 ? Math.log(low) : share(check, high) == 1 ? Math.log(high)
            : new PegasusSolver(SHARP, SHARP, SHARP).solve(MOST_TRIES, x -> Math.log(Math.max(TINY, share(check, Math.exp(x)))), Math.log(low), Math.log(high));
        return Optional.of(new Found(Math.exp(at), false));
    }

    /** The first check to fail and its limit: the greatest of the shares is brought to 1. */
    public Optional<Map.Entry<String, Found>> first(Set<String> checks) {
        LimitSearch greatest = new LimitSearch(multiple -> Map.of("", checks.stream().mapToDouble(c -> share(c, multiple)).max().orElse(0)));
        return greatest.find("").map(found -> Map.entry(checks.stream().max(Comparator.comparingDouble(c -> share(c, found.bySquare() ? 1 : found.multiple()))).orElseThrow(), found));
    }

    /** By the straight line through two winds, in logarithms; most checks need one or two steps. Empty where it does not settle. */
    private OptionalDouble straight(String check, double first) {
        double x = 0;
        double f = Math.log(first);
        double next = -f / 2;
        for (int i = 0; i < MOST_STEPS && Math.abs(next) < Math.log(WIDEST) && !Double.isNaN(next); i++) {
            double multiple = Math.exp(next);
            double share = share(check, multiple);
            if (Math.abs(share - 1) < SHARP) {
                return OptionalDouble.of(multiple);
            }
            double value = Math.log(Math.max(TINY, share));
            double slope = (value - f) / (next - x);
            x = next;
            f = value;
            next = x - f / slope;
        }
        return OptionalDouble.empty();
    }

    private double share(String check, double multiple) {
        return known.computeIfAbsent(multiple, shares::apply).getOrDefault(check, 0.0);
    }
}
