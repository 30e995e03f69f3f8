package broadside.weather;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import org.apache.commons.math3.distribution.GumbelDistribution;
import org.apache.commons.math3.random.Well19937c;
import org.apache.commons.math3.special.Gamma;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class GumbelTest {

    private static final WeatherTables TABLES = new WeatherTables(TableLibrary.shipped());
    private static final Gumbel GUMBEL = new Gumbel(TABLES);

    /** Hartford, annual maxima 1944 to 1983 (Coles, 2001, data set wind). */
    private static final List<Double> HARTFORD = DoubleStream.of(49, 54, 60, 49, 57, 51, 79, 57, 45, 60, 54, 55, 49, 58, 51, 59, 51, 47, 46, 57,
        57, 51, 47, 62, 45, 48, 45,
        57, 53, 42, 53, 51, 55, 55, 60, 49, 48, 45, 50, 52).boxed().toList();

    @Test
    void hartford_by_moments() {
        Trace trace = new Trace();
        Gumbel.Fit fit = GUMBEL.fit(HARTFORD, 40, Gumbel.Method.MOMENTS, trace);
        assertThat(fit.location()).isCloseTo(49.854, within(0.0005));
        assertThat(fit.scale()).isCloseTo(5.147, within(0.0005));
        assertThat(fit.warnings()).isEmpty();
        assertThat(GUMBEL.level(fit, 50, trace).speed()).isCloseTo(69.94, within(0.005));
        SheetCheck.holds(trace);
    }

    /** The likelihood by the density of the reference library is greatest at the fit. */
    @Test
    void hartford_by_maximum_likelihood() {
        Trace trace = new Trace();
        Gumbel.Fit fit = GUMBEL.fit(HARTFORD, 40, Gumbel.Method.MAXIMUM_LIKELIHOOD, trace);
        assertThat(fit.location()).isCloseTo(49.945, within(0.0005));
        assertThat(fit.scale()).isCloseTo(5.025, within(0.0005));
        assertThat(GUMBEL.level(fit, 50, trace).speed()).isCloseTo(69.55, within(0.005));
        double best = likelihood(fit.location(), fit.scale());
        for (double d : new double[] {-0.01, 0.01}) {
            assertThat(likelihood(fit.location() + d, fit.scale())).isLessThan(best);
            assertThat(likelihood(fit.location(), fit.scale() + d)).isLessThan(best);
        }
        SheetCheck.holds(trace);
    }

    private static double likelihood(double u, double b) {
        GumbelDistribution law = new GumbelDistribution(u, b);
        return HARTFORD.stream().mapToDouble(x -> Math.log(law.density(x))).sum();
    }

    @ParameterizedTest
    @EnumSource(Gumbel.Method.class)
    void return_levels_are_those_of_the_reference_library(Gumbel.Method method) {
        Gumbel.Fit fit = GUMBEL.fit(HARTFORD, 40, method, new Trace());
        GumbelDistribution law = new GumbelDistribution(fit.location(), fit.scale());
        for (double years : new double[] {1.01, 2, 10, 50, 100, 1000, 100000}) {
            assertThat(GUMBEL.level(fit, years, new Trace()).speed()).isCloseTo(law.inverseCumulativeProbability(1 - 1 / years), within(1e-9));
        }
    }

    /** Bands of 400 drawn samples hold the true value about as often as they say, and the standard error is the scatter of the fits. */
    @ParameterizedTest
    @EnumSource(Gumbel.Method.class)
    void band_holds_the_true_value_as_often_as_it_says(Gumbel.Method method) {
        GumbelDistribution law = new GumbelDistribution(new Well19937c(2026), 25, 3);
        double truth = law.inverseCumulativeProbability(0.98);
        int held = 0;
        double squares = 0;
        double errors = 0;
        for (int i = 0; i < 400; i++) {
            List<Double> sample = new ArrayList<>();
            for (double v : law.sample(60)) {
                sample.add(v);
            }
            Gumbel.Level level = GUMBEL.level(GUMBEL.fit(sample, 60, method, new Trace().quiet()), 50, new Trace().quiet());
            held += level.least() <= truth && truth <= level.greatest() ? 1 : 0;
            squares += (level.speed() - truth) * (level.speed() - truth);
            errors += level.error();
        }
        assertThat(held / 400.0).isBetween(0.90, 0.98);
        assertThat(errors / 400).isCloseTo(Math.sqrt(squares / 400), within(0.12 * errors / 400));
    }

    /** V_T/V_50 of a law with a coefficient of variation of 0.10 and 0.20, worked out apart from this program. */
    @ParameterizedTest
    @CsvSource({"0.10, 2, 0.781", "0.10, 10, 0.898", "0.10, 500, 1.143", "0.15, 25, 0.941", "0.20, 2, 0.637", "0.20, 100, 1.072"})
    void levels_by_the_coefficient_of_variation(double variation, double years, double printed) {
        double b = variation * Math.sqrt(6) / Math.PI;
        Gumbel.Fit fit = new Gumbel.Fit(Gumbel.Method.MOMENTS, 40, 1, variation, 1 - Gamma.GAMMA * b, b, List.of());
        assertThat(GUMBEL.level(fit, years, new Trace()).speed() / GUMBEL.level(fit, 50, new Trace()).speed()).isCloseTo(printed, within(0.0006));
    }

    @Test
    void short_records_are_told_or_refused() {
        assertThat(GUMBEL.fit(List.of(20.0, 22.0, 25.0), 3, Gumbel.Method.MOMENTS, new Trace()).warnings()).hasSize(1);
        refused(List.of(20.0, 22.0), 2, "2 annual maxima");
        refused(List.of(20.0), 0.5, "shorter than 1 year");
        refused(List.of(20.0, 20.0, 20.0), 3, "all alike");
        refused(List.of(0.0, 20.0, 21.0), 3, "above zero");
        Gumbel.Fit fit = GUMBEL.fit(HARTFORD, 40, Gumbel.Method.MOMENTS, new Trace());
        refused(List.of(1e200, 1e200, 2e200), 3, "ever measured");
        assertThatThrownBy(() -> GUMBEL.level(fit, 1e17, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> GUMBEL.level(fit, 1, new Trace())).isInstanceOf(UnfitWeather.class);
    }

    @Test
    void one_far_maximum_does_not_stop_the_likelihood() {
        Gumbel.Fit fit = GUMBEL.fit(List.of(20.0, 20.0001, 20.0002, 90.0), 4, Gumbel.Method.MAXIMUM_LIKELIHOOD, new Trace());
        assertThat(fit.scale()).isPositive();
        assertThat(fit.location()).isBetween(0.0, 90.0);
    }

    private static void refused(List<Double> maxima, double years, String words) {
        assertThatThrownBy(() -> GUMBEL.fit(maxima, years, Gumbel.Method.MAXIMUM_LIKELIHOOD, new Trace())).isInstanceOf(UnfitWeather.class)
            .hasMessageContaining(words);
    }

    @ParameterizedTest
    @CsvSource({"10, 5, 0.410", "50, 25, 0.397", "500, 100, 0.181", "1000, 1, 0.001"})
    void risk_and_return_period_are_inverse(double period, double years, double printed) {
        Trace trace = new Trace();
        double risk = Risk.of(period, years, trace);
        assertThat(risk).isCloseTo(printed, within(0.0005));
        assertThat(Risk.returnPeriod(risk, years, trace)).isCloseTo(period, within(1e-6 * period));
        assertThatThrownBy(() -> Risk.of(1, 5, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> Risk.returnPeriod(1e-300, 1000, new Trace())).isInstanceOf(UnfitWeather.class);
    }
}
