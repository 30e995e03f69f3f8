package broadside.support;

import static broadside.support.GroundCases.TABLES;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.trace.Trace;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Pressure, overturning and sliding of pads against values worked out by hand. */
class PadTest {

    private static final Pad PAD = new Pad(TABLES, Known.typed(2400, "kg/m³", "2400 kg/m3"));

    private static double found(Trace trace, String step) {
        return trace.find(step).orElseThrow().value();
    }

    private static Pad.Block block(double along, double across, double depth) {
        return new Pad.Block(along, across, depth, 0);
    }

    /** PG-O1 and PG-O2: H 5 kN at 3 m, 0.5 m deep, 1.6 m square, N 40 and 70 kN. */
    @Test
    void regressionValues() {
        Trace trace = new Trace();
        double m = PAD.baseMoment(5000, 15000, 0.5, trace);
        assertThat(m).isEqualTo(17500);
        assertThat(PAD.pressure(40000, m, "M_b", block(1.6, 1.6, 0.5), trace)).isCloseTo(45977, within(0.5));
        assertThat(found(trace, "pad-eccentricity")).isCloseTo(0.4375, within(1e-12));
        assertThat(PAD.resisting(40000, 1.6, trace) / m).isCloseTo(1.8286, within(5e-5));
        Trace full = new Trace();
        assertThat(PAD.pressure(70000, m, "M_b", block(1.6, 1.6, 0.5), full)).isCloseTo(52979, within(0.5));
        assertThat(found(full, "bearing-pressure-least")).isCloseTo(1709, within(0.5));
        assertThat(PAD.resisting(70000, 1.6, full) / m).isCloseTo(3.2, within(1e-9));
    }

    /** N = 10 kip, 10 kip ft, 4 ft square: e = 1 ft, contact 3 ft, q = 1.6667 ksf = 1666.7 psf = 79.80 kPa. */
    @Test
    void byHandUs() {
        Trace trace = new Trace();
        double kip = 4448.2216152605;
        double q = PAD.pressure(10 * kip, 10 * kip * 0.3048, "M_b", block(4 * 0.3048, 4 * 0.3048, 0.6), trace);
        assertThat(found(trace, "contact-length") / 0.3048).isCloseTo(3, within(1e-9));
        assertThat(q / kip * 0.3048 * 0.3048).isCloseTo(1.66667, within(1e-5));
    }

    /** B is along the moment: 2 m by 1 m, 20 kN, 4 kN m: e 0.2 m; q = 10 (1 + 0.6) = 16 kPa along, 2 x 20/(2 x 3 (0.5 - 0.2)) = 22.222 kPa across. */
    @Test
    void aRectangularPadKnowsItsDirection() {
        assertThat(PAD.pressure(20000, 4000, "M_b", block(2, 1, 0.5), new Trace())).isCloseTo(16000, within(1e-6));
        assertThat(PAD.pressure(20000, 4000, "M_b", block(1, 2, 0.5), new Trace())).isCloseTo(22222.2, within(0.1));
    }

    /** At e = B/6 the two formulas meet at twice the mean. */
    @ParameterizedTest
    @CsvSource({"0.199999999, 20000", "0.2, 20000", "0.200000001, 20000"})
    void theFormulasMeet(double e, double q) {
        assertThat(PAD.pressure(12000, 12000 * e, "M_b", block(1.2, 1, 0.5), new Trace())).isCloseTo(q, within(0.01));
    }

    /** From e = B/2 on nothing balances the moment: no pressure is given, and no number is infinite. */
    @ParameterizedTest
    @CsvSource({"0.6", "0.7", "100"})
    void aPadThatOverturns(double e) {
        Trace trace = new Trace();
        PAD.pressure(12000, 12000 * e, "M_b", block(1.2, 1, 0.5), trace);
        assertThat(trace.find("bearing-pressure")).isEmpty();
        assertThat(found(trace, "contact-length")).isZero();
        assertThat(found(trace, "bearing-pressure-of-weight")).isCloseTo(10000, within(1e-9));
    }

    /** 2400 x 9.80665 x 1.6 x 1.6 x 0.5 = 30.126 kN; with 1.5 kN on it 31.626 kN. */
    @Test
    void weight() {
        Trace trace = new Trace();
        assertThat(PAD.vertical(new Pad.Block(1.6, 1.6, 0.5, 1500), trace)).isCloseTo(31626.0, within(0.1));
    }

    /** Factors of a rule: 0.9 x 40 x 0.8 = 28.8 against 1.5 x 17.5 = 26.25 kN m: ratio 1.0971, use 0.9115; with a global 1.5: 32 of 26.25. */
    @Test
    void overturningByTwoRules() {
        Trace trace = new Trace();
        Check equ = PAD.overturning(Stability.of(GroundCases.EQU, GroundCases.LEVELS, trace), block(1.6, 1.6, 0.5), 40000, 17500, "wind", trace);
        assertThat(equ.demand()).isCloseTo(26250, within(1e-6));
        assertThat(equ.capacity()).isCloseTo(28800, within(1e-6));
        assertThat(found(trace, "overturning-ratio")).isCloseTo(1.09714, within(1e-5));
        Check global = PAD.overturning(Stability.of(GroundCases.GLOBAL, GroundCases.LEVELS, new Trace()), block(1.6, 1.6, 0.5), 40000, 17500, "wind",
            new Trace());
        assertThat(global.demand()).isCloseTo(26250, within(1e-6));
        assertThat(global.capacity()).isCloseTo(32000, within(1e-6));
    }

    /** Friction 0.25 x 40 = 10 kN against 1.5 x 5; cohesion 6.22 kPa x 1.6 x 1.0875 = 10.82 kN, at most half of the weight: with 100 kPa 20 kN. */
    @ParameterizedTest
    @CsvSource({"false, 0.25, 10000", "true, 6220, 10822.8", "true, 100000, 20000"})
    void sliding(boolean cohesive, double value, double resistance) {
        Trace trace = new Trace();
        Pad.Soil soil = new Pad.Soil(Known.typed(1e5, "Pa", "t"), Known.typed(value, cohesive ? "Pa" : "1", "t"), cohesive);
        Check check = PAD.sliding(Stability.of(GroundCases.GLOBAL, GroundCases.LEVELS, trace), soil, value, block(1.6, 1.6, 0.5), 40000,
            GroundCases.load(5000, 15000), 17500,
            trace);
        assertThat(check.capacity()).isCloseTo(resistance, within(0.5));
        assertThat(check.demand()).isCloseTo(7500, within(1e-9));
        assertThat(found(trace, "sliding-ratio")).isCloseTo(resistance / 5000, within(1e-4));
    }

    /**
     * A published hoarding sheet ("SOF 1.0"): 312.66 N at 1 m on a footing of 0.3 x 0.3 x 1.0 m, 2119 N. At its base 625.3 N m against 317.8: it
     * overturns, and
     * all that is asked of it fails.
     */
    @Test
    void thePublishedHoardingIsRejected() {
        Trace trace = new Trace();
        Pad.Block block = block(0.3, 0.3, 1.0);
        double n = PAD.vertical(block, trace);
        assertThat(n).isCloseTo(2118.2, within(0.1));
        double m = PAD.baseMoment(312.66, 312.66, 1.0, trace);
        Check check = PAD.overturning(Stability.of(GroundCases.GLOBAL, GroundCases.LEVELS, trace), block, n, m, "wind", trace);
        assertThat(check.passes()).isFalse();
        assertThat(found(trace, "overturning-ratio")).isCloseTo(0.508, within(0.001));
        Pad.Soil soil = new Pad.Soil(Known.typed(1e6, "Pa", "t"), Known.typed(0.25, "1", "t"), false);
        Check bearing = PAD.bearing(soil, 1e6, block, n, m, "wind", trace);
        assertThat(bearing.passes()).isFalse();
        assertThat(bearing.utilisation()).isEqualTo(Check.MOST);
    }
}
