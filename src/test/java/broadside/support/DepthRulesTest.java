package broadside.support;

import static broadside.support.GroundCases.TABLES;
import static broadside.support.GroundCases.perDepth;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.support.DepthRule.Column;
import broadside.trace.Trace;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Depths of posts and piers against values worked out by hand, in metric and US units. */
class DepthRulesTest {

    private static final double FT = 0.3048;
    private static final double LBF = 4.4482216152605;
    private static final double PSF = LBF / (FT * FT);

    private static IbcEmbedment ibc(String lateral, boolean doubled, boolean increased, boolean paved, Trace trace) {
        return new IbcEmbedment(TABLES, new IbcEmbedment.Soil(Known.typed(perDepth(lateral).si(), "Pa/m", lateral), doubled, increased), paved, trace);
    }

    private static double found(Trace trace, String step) {
        return trace.find(step).orElseThrow().value();
    }

    /**
     * IBC equation 18-1 at a trial depth. P = 2 kN at 2.5 m, b = 0.45 m, 15.7 kPa/m, d = 1.80 m: S1 = 9.42 kPa; A = 4.68/4.239 = 1.104034 m;
     * 4.36 x 2.5/1.104034 = 9.872885; d = 0.552017 (1 + 3.297406) = 2.372241 m.
     */
    @Test
    void ibcByHandMetric() {
        Trace trace = new Trace();
        double d = ibc("15.7 kPa/m", false, false, false, trace).required(new Column(2000, 5000, 0.45), 1.8, "d_f", trace);
        assertThat(found(trace, "lateral-pressure")).isCloseTo(9420, within(1e-6));
        assertThat(found(trace, "embedment-constant")).isCloseTo(1.104034, within(1e-6));
        assertThat(trace.find("embedment-constant").orElseThrow().unit()).as("A comes out as a length").isEqualTo("m");
        assertThat(d).isCloseTo(2.372241, within(1e-5));
    }

    /**
     * P = 480 lbf at 5 ft, b = 1.5 ft, 100 psf/ft: at d = 6.440 ft S1 = 214.667 psf, A = 1123.2/322 = 3.488199 ft, d = 1.744099 (1 +
     * sqrt(7.249640)) = 6.4401 ft.
     */
    @Test
    void ibcByHandUs() {
        Trace trace = new Trace();
        double d = ibc("100 psf/ft", false, false, false, trace).needed(new Column(480 * LBF, 2400 * LBF * FT, 1.5 * FT), trace);
        assertThat(d / FT).isCloseTo(6.4400, within(2e-4));
        assertThat(found(trace, "embedment-constant") / FT).isCloseTo(3.4882, within(2e-4));
        assertThat(found(trace, "trial-depth")).as("the depth needed is the depth assumed").isCloseTo(d, within(1e-9));
    }

    /** PG-T1: A is a length, so a model twice as large in every length under forces to match gives twice the length: P by 8, S by 1, b by 2. */
    @Test
    void theConstantScalesAsALength() {
        Trace small = new Trace();
        Trace large = new Trace();
        ibc("20 kPa/m", false, false, false, small).required(new Column(1000, 2000, 0.5), 1.5, "d_f", small);
        ibc("20 kPa/m", false, false, false, large).required(new Column(8000, 32000, 1.0), 3.0, "d_f", large);
        assertThat(found(large, "embedment-constant")).isCloseTo(2 * found(small, "embedment-constant"), within(1e-9));
        assertThat(found(large, "embedment-depth")).isCloseTo(2 * found(small, "embedment-depth"), within(1e-9));
    }

    /**
     * The two switches are two: doubling alone 2, a third alone 4/3, both 8/3. At 3 m with 15 kPa/m: 15, 30, 20, 40 kPa. The depth counts to 12 ft:
     * at 6 m it is 15 x 3.6576/3 = 18.288 kPa.
     */
    @ParameterizedTest
    @CsvSource({"false, false, 3, 15000", "true, false, 3, 30000", "false, true, 3, 20000", "true, true, 3, 40000", "false, false, 6, 18288",
        "false, false, 60, 18288"})
    void lateralPressure(boolean doubled, boolean increased, double depth, double pressure) {
        Trace trace = new Trace();
        ibc("15 kPa/m", doubled, increased, false, trace).required(new Column(1000, 2000, 0.5), depth, "d_f", trace);
        assertThat(found(trace, "lateral-pressure")).isCloseTo(pressure, within(1e-6));
    }

    /**
     * Constrained: S at the full depth, not doubled, at most 15 times the value of a foot: 15 kPa/m x 4.572 m = 68.58 kPa where a third more would
     * give 73.15.
     */
    @Test
    void constrainedPressure() {
        Trace trace = new Trace();
        ibc("15 kPa/m", true, false, true, trace).required(new Column(1000, 2000, 0.5), 2, "d_f", trace);
        assertThat(found(trace, "lateral-pressure")).isCloseTo(30000, within(1e-6));
        Trace deep = new Trace();
        ibc("15 kPa/m", false, true, true, deep).required(new Column(1000, 2000, 0.5), 5, "d_f", deep);
        assertThat(found(deep, "lateral-pressure")).isCloseTo(68580, within(1e-6));
    }

    /**
     * PG-O6: P 1.33 kN at 8 m, b 0.849 m, 31.4 kPa/m: d³ = 4.25 x 10.64/(31.4 x 0.849) = 1.69627, d = 1.1926 m. US: 4.25 x 2400/(100 x 1.5) = 68,
     * d = 4.0817 ft.
     */
    @Test
    void constrainedByHand() {
        Trace trace = new Trace();
        double d = ibc("31.4 kPa/m", false, false, true, trace).needed(new Column(1330, 10640, 0.849), trace);
        assertThat(d).isCloseTo(1.1926, within(5e-5));
        Trace us = new Trace();
        assertThat(ibc("100 psf/ft", false, false, true, us).needed(new Column(480 * LBF, 2400 * LBF * FT, 1.5 * FT), us) / FT).isCloseTo(4.0817,
            within(1e-4));
    }

    /** PG-W2 fully iterated: 1.5312 m. */
    @Test
    void theLightPoleIterated() {
        assertThat(ibc("31.4 kPa/m", false, false, false, new Trace()).needed(new Column(1330, 10640, 0.849), new Trace())).isCloseTo(1.5312, within(5e-5));
    }

    /** A moment alone: the limit of equation 18-1, d = 0.5 sqrt(4.36 x 2.34 M/(S1 b)); the smallest force changes nothing to speak of. */
    @Test
    void aMomentAlone() {
        double alone = ibc("20 kPa/m", false, false, false, new Trace()).needed(new Column(0, 5000, 0.5), new Trace());
        double almost = ibc("20 kPa/m", false, false, false, new Trace()).needed(new Column(1e-4, 5000, 0.5), new Trace());
        assertThat(alone).isPositive().isCloseTo(almost, within(1e-4));
        assertThat(ibc("20 kPa/m", false, false, false, new Trace()).needed(new Column(0, 0, 0.5), new Trace())).isLessThan(1e-3);
    }

    /** PG-O3 and PG-O4: D 0.5 m, P 1.2 m; 3 kN at 2.5 m. */
    @ParameterizedTest
    @CsvSource({"poor, 19872", "average, 33696", "good, 54432"})
    void groundFactor(String ground, double resistance) {
        Trace trace = new Trace();
        GroundFactor rule = new GroundFactor(TABLES, TABLES.factor(ground), trace);
        Column column = new Column(3000, 7500, 0.5);
        assertThat(rule.resistance(column, 1.2, trace)).isCloseTo(resistance, within(1e-6));
        assertThat(rule.demand(column, 1.2, trace)).isCloseTo(10045.58, within(0.01));
        Check check = rule.check(column, 1.2, false, "wind", trace);
        assertThat(check.capacity()).isCloseTo(resistance / 1.25, within(1e-6));
        assertThat(check.utilisation()).isCloseTo(10045.58 / (resistance / 1.25), within(1e-5));
    }

    /**
     * The depth that is found asks for exactly what the ground gives: G D P³/12.5 = M + V P/√2, tried again by hand: P = 0.841154 m gives 9284.36
     * N m on both sides.
     */
    @Test
    void groundFactorSolved() {
        Trace trace = new Trace();
        GroundFactor rule = new GroundFactor(TABLES, TABLES.factor("average"), trace);
        double p = rule.needed(new Column(3000, 7500, 0.5), trace);
        assertThat(390e3 * 0.5 * p * p * p / 12.5).isCloseTo(7500 + 3000 * p / Math.sqrt(2), within(1e-4));
        assertThat(p).isCloseTo(0.841154, within(1e-6));
        assertThat(rule.least(0.5)).isCloseTo(0.75, within(1e-12));
    }

    /**
     * US: 1000 lbf and 8000 lbf ft, 2 ft wide, poor: 230 kN/m3 = 1464.17 lbf/ft3; at 4 ft 1464.17 x 2 x 64/10 = 18 741 lbf ft, asked 8000 +
     * 4000/√2 = 10 828 lbf ft.
     */
    @Test
    void groundFactorByHandUs() {
        Trace trace = new Trace();
        GroundFactor rule = new GroundFactor(TABLES, TABLES.factor("poor"), trace);
        Column column = new Column(1000 * LBF, 8000 * LBF * FT, 2 * FT);
        assertThat(rule.resistance(column, 4 * FT, trace) / LBF / FT).isCloseTo(18741, within(1.0));
        assertThat(rule.demand(column, 4 * FT, trace) / LBF / FT).isCloseTo(10828.4, within(0.1));
    }

    private static BromsClay clay(double cohesion, double factor, Trace trace) {
        return new BromsClay(TABLES, Known.typed(cohesion, "Pa", "typed"), Known.typed(factor, "1", "typed"), trace);
    }

    /** V = 2 kN, M = 5 kN m, factor 2.5, b = 0.5 m, cu = 40 kPa: f = 0.027778, M_max = 16.31944 kN m, g = 0.602208, L = 1.379986 m. */
    @Test
    void clayByHandMetric() {
        Trace trace = new Trace();
        assertThat(clay(40e3, 2.5, trace).needed(new Column(2000, 5000, 0.5), trace)).isCloseTo(1.379986, within(1e-6));
        assertThat(found(trace, "pier-moment")).isCloseTo(16319.44, within(0.01));
    }

    /**
     * 1000 lbf, 10 000 lbf ft, factor 2, b = 2 ft, cu = 1000 psf; also the closed form q [1 + sqrt(2 + (4 H + 6 D)/q)] + 1.5 D with H = 10 ft, q =
     * 1/9 ft.
     */
    @Test
    void clayByHandUs() {
        Trace trace = new Trace();
        double l = clay(1000 * PSF, 2, trace).needed(new Column(1000 * LBF, 10000 * LBF * FT, 2 * FT), trace) / FT;
        assertThat(l).isCloseTo(3 + 1.0 / 9 * (1 + Math.sqrt(2 + (4 * 10 + 6 * 2) * 9)), within(1e-9));
        assertThat(l).isCloseTo(5.51994, within(1e-4));
        assertThat(found(trace, "pier-moment") / LBF / FT).isCloseTo(26111.1, within(0.1));
    }

    /** Reese and Van Impe, appendix A: P 59.49 kN, f 0.4524 m, g 1.530 m, M_max 76.96 kN m. The length that its load needs is its length. */
    @Test
    void clayCapacity() {
        Trace trace = new Trace();
        double p = clay(47.9e3, 1, trace).capacity(0.305, 2.44, 0.61, trace);
        assertThat(p).isCloseTo(59490, within(10.0));
        assertThat(found(trace, "pier-zero-shear")).isCloseTo(0.4524, within(1e-4));
        assertThat(found(trace, "pier-lower-part")).isCloseTo(1.530, within(5e-4));
        assertThat(found(trace, "pier-moment")).isCloseTo(76960, within(15.0));
        assertThat(clay(47.9e3, 1, new Trace()).needed(new Column(p, p * 0.61, 0.305), new Trace())).isCloseTo(2.44, within(1e-9));
        assertThatThrownBy(() -> clay(47.9e3, 1, trace).capacity(0.5, 0.75, 0.6, trace)).isInstanceOf(UnfitAnswer.class);
    }

    private static BromsSand sand(double degrees, double unitWeight, double factor, Trace trace) {
        return new BromsSand(TABLES, Known.typed(Math.toRadians(degrees), "rad", "typed"), Known.typed(unitWeight / 9.80665, "kg/m³", "typed"),
            Known.typed(factor, "1", "typed"), trace);
    }

    /** PG-O5: 18 kN/m3, D 0.5 m, L 1.5 m, 30 degrees, e 2.5 m: Kp 3, H 11.391 kN, f 0.5303 m, Mmax 32.504 kN m. */
    @Test
    void sandByHandMetric() {
        Trace trace = new Trace();
        BromsSand rule = sand(30, 18e3, 1, trace);
        double h = rule.capacity(0.5, 1.5, 2.5, trace);
        assertThat(found(trace, "passive-coefficient")).isCloseTo(3, within(1e-9));
        assertThat(h).isCloseTo(11390.6, within(0.1));
        Column column = new Column(h, h * 2.5, 0.5);
        assertThat(rule.needed(column, trace)).isCloseTo(1.5, within(1e-9));
        rule.check(column, 1.5, true, "wind", trace);
        assertThat(found(trace, "pier-zero-shear")).isCloseTo(0.5303, within(1e-4));
        assertThat(found(trace, "pier-moment")).isCloseTo(32504, within(1.0));
        assertThat(found(trace, "utilisation/embedment")).isCloseTo(1, within(1e-9));
    }

    /** 500 lbf and 4000 lbf ft with factor 2, b = 2 ft, 110 lbf/ft3, 30 degrees, 4 ft: asked 8000 + 4000 = 12 000 of 21 120 lbf ft. */
    @Test
    void sandByHandUs() {
        Trace trace = new Trace();
        Check check = sand(30, 110 * LBF / (FT * FT * FT), 2, trace).check(new Column(500 * LBF, 4000 * LBF * FT, 2 * FT), 4 * FT, false, "wind", trace);
        assertThat(check.demand() / LBF / FT).isCloseTo(12000, within(0.01));
        assertThat(check.capacity() / LBF / FT).isCloseTo(21120, within(0.1));
    }

    @Test
    void soilsThatHoldNothingAreRefused() {
        assertThatThrownBy(() -> clay(0, 2, new Trace())).isInstanceOfSatisfying(UnfitAnswer.class, e -> assertThat(e.field()).isEqualTo("footing.cohesion"));
        for (double angle : new double[] {0, 19.9, 50.1, 90}) {
            assertThatThrownBy(() -> sand(angle, 18e3, 2, new Trace())).isInstanceOfSatisfying(UnfitAnswer.class,
                e -> assertThat(e.field()).isEqualTo("footing.friction-angle")).hasMessageContaining("between 20 and 50 degrees");
        }
        assertThat(sand(20, 18e3, 2, new Trace())).isNotNull();
        assertThat(sand(50, 18e3, 2, new Trace())).isNotNull();
        assertThatThrownBy(() -> sand(30, 0, 2, new Trace())).isInstanceOf(UnfitAnswer.class);
        assertThatThrownBy(() -> clay(40e3, 0.9, new Trace())).isInstanceOfSatisfying(UnfitAnswer.class,
            e -> assertThat(e.field()).isEqualTo("footing.load-factor"));
    }

    /** 2/0.7. */
    @Test
    void theFactorOnTheLoadsWhereNoneIsTyped() {
        assertThat(TABLES.loadFactor().value()).isCloseTo(2.857, within(5e-4));
    }

    /** A depth that is never enough ends the search. */
    @Test
    void theSearchEnds() {
        assertThatThrownBy(() -> Root.depth(d -> 1)).isInstanceOf(UnfitAnswer.class).hasMessageContaining("does not come to an end");
        assertThat(Root.depth(d -> -1)).isLessThan(1e-5);
        assertThat(Root.depth(d -> 1000 / d - d)).isCloseTo(Math.sqrt(1000), within(1e-9));
    }
}
