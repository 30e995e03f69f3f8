package broadside.weather;

import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.special.Gamma;

/**
 * Annual maxima by the Gumbel law F(x) = exp(-exp(-(x - u)/b)), and speeds of long return periods from it:
 * x_T = u - b ln(-ln(1 - 1/T)). Speeds in m/s.
 */
public final class Gumbel {

    private static final String BOOKS = "Jain, Wind Energy Engineering (2011), (8-1) to (8-6); Burton et al., Wind Energy Handbook, p. 31";
    private static final String LIKELIHOOD = "likelihood equations of the Gumbel law";
    private static final int TRIALS = 200;

    /** How the two parameters are found. */
    public enum Method {
        MOMENTS, MAXIMUM_LIKELIHOOD;

        public String words() {
            return name().toLowerCase(Locale.ROOT).replace('_', ' ');
        }

        public static Optional<Method> of(String words) {
            return Arrays.stream(values()).filter(m -> m.words().equals(words)).findFirst();
        }
    }

    /**
     * A fitted law.
     *
     * @param n          number of maxima
     * @param mean       of the maxima
     * @param deviation  standard deviation with n - 1
     * @param location   u, the mode
     * @param scale      b
     * @param warnings   what a reader of the results should know
     */
    public record Fit(Method method, int n, double mean, double deviation, double location, double scale, List<String> warnings) { }

    /**
     * Speed of a return period.
     *
     * @param error       standard error of the speed
     * @param least       lower end of the band
     * @param confidence  share of such bands that hold the true value, if the law is right
     */
    public record Level(double years, double speed, double error, double least, double greatest, double confidence) { }

    private final WeatherTables tables;

    public Gumbel(WeatherTables tables) {
        this.tables = tables;
    }

    /** From the complete years of a record. */
    public Fit fit(AnnualMaxima maxima, Method method, Trace trace) {
        return fit(maxima.complete().stream().map(AnnualMaxima.OneYear::speed).toList(), maxima.length(), method, trace);
    }

    /**
     * Fits the law; recorded as "maxima-mean", "maxima-deviation", "location" and "scale".
     *
     * @param maxima  greatest speed of each year, m/s
     * @param years   length of the record
     * @throws UnfitWeather for a record of less than a year, fewer than three maxima, or maxima that are all alike
     */
    public Fit fit(List<Double> maxima, double years, Method method, Trace trace) {
        double[] x = maxima.stream().mapToDouble(Double::doubleValue).sorted().toArray();
        require(x, years);
        int n = x.length;
        trace.given("n", "number of annual maxima", n, "1", Integer.toString(n));
        double mean = Arrays.stream(x).sum() / n;
        double squares = Arrays.stream(x).map(v -> (v - mean) * (v - mean)).sum();
        double deviation = Math.sqrt(squares / (n - 1));
        if (!(deviation > 1e-9 * Math.abs(mean))) {
            throw new UnfitWeather("maxima", "the annual maxima are all alike: no law can be drawn from them");
        }
        trace.line("maxima-mean", "m", "mean of the annual maxima").from("definition of the mean", Status.DERIVED).reads("of " + n + " maxima", mean, "m/s");
        trace.line("maxima-deviation", "s", "standard deviation of the annual maxima").from("definition, with n - 1", Status.DERIVED)
            .reads("of " + n + " maxima", deviation, "m/s");
        double[] law = method == Method.MOMENTS ? moments(mean, deviation, trace) : likelihood(x, mean, deviation, trace);
        return new Fit(method, n, mean, deviation, law[0], law[1], warnings(n, years));
    }

    private void require(double[] x, double years) {
        double least = tables.number("least-record");
        if (!(years >= least)) {
            throw new UnfitWeather("record", "the record is shorter than " + Plain.number(least) + " year: nothing can be said about extremes");
        }
        if (x.length < tables.number("least-maxima")) {
            throw new UnfitWeather("maxima", "there " + (x.length == 1 ? "is 1 annual maximum" : "are " + x.length + " annual maxima")
                + " of complete years; at least " + tables.text("least-maxima") + " are needed");
        }
        double greatest = tables.number("greatest-speed");
        if (!(x[0] > 0) || !(x[x.length - 1] <= greatest)) {
            throw new UnfitWeather("maxima", "annual maxima are speeds above zero and not above the highest gust ever measured, "
                + Plain.number(greatest) + " m/s");
        }
    }

    private List<String> warnings(int n, double years) {
        List<String> warnings = new ArrayList<>();
        double few = tables.number("short-record");
        if (n < few || years < few) {
            warnings.add("The record gives " + n + " annual maxima; from fewer than " + Plain.number(few)
                + " years the speeds of long return periods are little more than a guess.");
        }
        return warnings;
    }

    /** mean = u + gamma b; deviation = pi b / sqrt 6. */
    private static double[] moments(double mean, double deviation, Trace trace) {
        double b = trace.line("scale", "b", "scale of the law").in("s", deviation, "m/s").from(BOOKS, Status.READ)
            .gives("6^0.5 s / π", Math.sqrt(6) * deviation / Math.PI, "m/s");
        double u = trace.line("location", "u", "location of the law").in("m", mean, "m/s").in("b", b, "m/s").from(BOOKS, Status.READ)
            .gives("m - " + Plain.number(Gamma.GAMMA) + " b", mean - Gamma.GAMMA * b, "m/s");
        return new double[] {u, b};
    }

    /** b = mean - sum(x e^(-x/b))/sum(e^(-x/b)); u = -b ln(mean of e^(-x/b)), here from the least maximum on. */
    private static double[] likelihood(double[] x, double mean, double deviation, Trace trace) {
        double high = deviation;
        while (lacking(x, mean, high) <= 0) {
            high *= 2;
        }
        double root = new BrentSolver(1e-12, 1e-12).solve(TRIALS, b -> lacking(x, mean, b), 1e-6 * deviation, high);
        double b = trace.line("scale", "b", "scale of the law").from(LIKELIHOOD, Status.DERIVED)
            .reads("found by trial: b = m - Σ x e^(-x / b) / Σ e^(-x / b)", root, "m/s");
        double least = trace.line("least-maximum", "x_1", "least of the annual maxima").from("the maxima", Status.DERIVED)
            .reads("of " + x.length + " maxima", x[0], "m/s");
        double w = trace.line("weight", "w", "mean of the weights").in("x_1", least, "m/s").in("b", b, "m/s").from(LIKELIHOOD, Status.DERIVED)
            .reads("mean of e^(-(x - x_1) / b)", Arrays.stream(x).map(v -> Math.exp((least - v) / b)).sum() / x.length, "1");
        double u = trace.line("location", "u", "location of the law").in("x_1", least, "m/s").in("b", b, "m/s").in("w", w).from(LIKELIHOOD, Status.DERIVED)
            .gives("x_1 - b ln(w)", least - b * Math.log(w), "m/s");
        return new double[] {u, b};
    }

    private static double lacking(double[] x, double mean, double b) {
        double weights = 0;
        double weighted = 0;
        for (double v : x) {
            double w = Math.exp((x[0] - v) / b);
            weights += w;
            weighted += w * (v - x[0]);
        }
        return b - (mean - x[0] - weighted / weights);
    }

    /**
     * Speed of a return period in years, with its band; recorded as "return-level/50" and so on. The band is the speed with as many standard
     * errors on each side as the normal law has for the confidence (delta method): for maximum likelihood the error from the Fisher information
     * of the law, for moments that of x = m + K s from its skewness and kurtosis. It holds the chance of the sample alone, not the doubt about the law.
     */
    public Level level(Fit fit, double years, Trace sheet) {
        if (!(years > 1) || !(1 - 1 / years < 1)) {
            throw new UnfitWeather("return-period", "a return period is longer than 1 year, and no longer than can be worked out");
        }
        Trace trace = sheet.part(Plain.number(years));
        trace.given("T", "return period", years, "years", Plain.number(years) + " years");
        double y = trace.line("reduced-variate", "y", "reduced variate").in("T", years, "years").from(BOOKS, Status.READ)
            .gives("-ln(-ln(1 - 1 / T))", -Math.log(-Math.log(1 - 1 / years)), "1");
        double x = trace.line("return-level", "x_T", "greatest speed of a year reached once in T years on average").in("u", fit.location(), "m/s")
            .in("b", fit.scale(), "m/s")
            .in("y", y).from(BOOKS, Status.READ).gives("u + b y", fit.location() + fit.scale() * y, "m/s");
        double error = fit.method() == Method.MOMENTS ? momentError(fit, y, trace) : likelihoodError(fit, y, trace);
        double confidence = tables.number("confidence");
        double normal = tables.cite(trace.line("normal-share", "k", "standard errors on each side"), "confidence")
            .reads("normal law, " + Plain.number(confidence) + " on both sides",
                new NormalDistribution().inverseCumulativeProbability((1 + confidence) / 2), "1");
        double least = end(trace, "return-level-least", "x_{min}", "lower end of the band", x, normal, error, -1);
        double greatest = end(trace, "return-level-greatest", "x_{max}", "upper end of the band", x, normal, error, 1);
        return new Level(years, x, error, least, greatest, confidence);
    }

    private static double end(Trace trace, String step, String symbol, String meaning, double x, double k, double error, int side) {
        return trace.line(step, symbol, meaning).in("x_T", x, "m/s").in("k", k).in("e", error, "m/s").from("delta method", Status.DERIVED)
            .gives(side > 0 ? "x_T + k e" : "x_T - k e", x + side * k * error, "m/s");
    }

    private static double likelihoodError(Fit fit, double y, Trace trace) {
        double g = 1 - Gamma.GAMMA + y;
        return trace.line("standard-error", "e", "standard error of the speed").in("b", fit.scale(), "m/s").in("n", fit.n()).in("y", y)
            .from("delta method with the Fisher information of the Gumbel law", Status.DERIVED)
            .gives("b / n^0.5 (1 + 6 / π² (1 - " + Plain.number(Gamma.GAMMA) + " + y)²)^0.5",
                fit.scale() / Math.sqrt(fit.n()) * Math.sqrt(1 + 6 / (Math.PI * Math.PI) * g * g), "m/s");
    }

    private double momentError(Fit fit, double y, Trace trace) {
        double k = trace.line("frequency-factor", "K", "standard deviations above the mean").in("y", y).from("x_T = m + K s", Status.DERIVED)
            .gives("6^0.5 / π (y - " + Plain.number(Gamma.GAMMA) + ")", Math.sqrt(6) / Math.PI * (y - Gamma.GAMMA), "1");
        double skewness = tables.number("gumbel-skewness");
        double kurtosis = tables.number("gumbel-kurtosis");
        return trace.line("standard-error", "e", "standard error of the speed").in("s", fit.deviation(), "m/s").in("n", fit.n()).in("K", k)
            .from("delta method with the skewness and kurtosis of the Gumbel law", Status.DERIVED)
            .gives("s / n^0.5 (1 + " + tables.text("gumbel-skewness") + " K + (" + tables.text("gumbel-kurtosis") + " - 1) / 4 K²)^0.5",
                fit.deviation() / Math.sqrt(fit.n()) * Math.sqrt(1 + skewness * k + (kurtosis - 1) / 4 * k * k), "m/s");
    }
}
