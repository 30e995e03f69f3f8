package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.trace.Trace;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Deflection, rotation and frequency of posts by beam theory. */
class PostDeflectionTest {

    private static final PostDeflection DEFLECTION = new PostDeflection(Tubes.RULES);
    private static final PostFrequency FREQUENCY = new PostFrequency(Tubes.RULES);
    private static final double E = 210e9;
    private static final double I = 192e-8;

    private static Trace run(double squares, double cubes, double height, double lever, String limit) {
        Trace trace = new Trace();
        DEFLECTION.check(new PostDeflection.Bent("centred", squares, cubes, lever), height, E, I, limit, trace);
        return trace;
    }

    /** 1.2 kN at the top of 3 m: F L^3/(3 E I) = 26.786 mm, F L^2/(2 E I) = 13.393 mrad. */
    @Test
    void oneForceAtTheTop() {
        Trace trace = run(1200 * 9, 1200 * 27, 3, 3, "tdb4");
        assertThat(Sheets.value(trace, "post-deflection")).isCloseTo(1200 * 27 / (3 * E * I), within(1e-12)).isCloseTo(0.026786, within(1e-6));
        assertThat(Sheets.value(trace, "post-rotation")).isCloseTo(0.013393, within(1e-6));
        assertThat(Sheets.value(trace, "post-deflection-limit")).isCloseTo(0.075, within(1e-12));
    }

    /** Two forces, seen at 4 m: each bends the post up to itself and turns what stands above. */
    @Test
    void forcesBelowTheTop() {
        double a = 900;
        double b = 400;
        Trace trace = run(a * 9 + b * 2.25, a * 27 + b * 3.375, 4, 2.5, "l-80");
        double expected = (a * 27 / 3 + a * 9 / 2 * 1 + b * 3.375 / 3 + b * 2.25 / 2 * 2.5) / (E * I);
        assertThat(Sheets.value(trace, "post-deflection")).isCloseTo(expected, within(1e-12));
        assertThat(Sheets.value(trace, "post-deflection-limit")).isCloseTo(2.5 / 80, within(1e-12));
    }

    /** An even load of 100 N/m over 3 m: w L^4/(8 E I). */
    @Test
    void evenDrag() {
        OwnDrag drag = OwnDrag.even(100, 0, 3);
        assertThat(drag.force()).isEqualTo(300);
        assertThat(drag.moment()).isEqualTo(450);
        assertThat(Sheets.value(run(drag.bending(), drag.cubes(), 3, 1.5, "tdb6"), "post-deflection")).isCloseTo(100 * 81 / (8 * E * I), within(1e-12));
        OwnDrag two = OwnDrag.even(100, 0, 1).plus(OwnDrag.even(100, 1, 3));
        assertThat(two.force()).isEqualTo(drag.force());
        assertThat(two.moment()).isEqualTo(drag.moment());
        assertThat(two.bending()).isCloseTo(drag.bending(), within(1e-9));
        assertThat(two.cubes()).isCloseTo(drag.cubes(), within(1e-9));
    }

    @ParameterizedTest
    @CsvSource({"tdb1,0.008", "tdb2,0.020", "tdb3,0.040", "tdb4,0.100", "tdb5,0.200", "tdb6,0.400", "l-80,0.0375", "l-150,0.02668", "aashto-15,0.6"})
    void limits(String name, double limit) {
        assertThat(Sheets.value(run(1000, 1000, 4, 3, name), "post-deflection-limit")).isCloseTo(limit, within(1e-9));
        assertThat(DEFLECTION.names()).contains(name).hasSize(9);
        assertThat(DEFLECTION.place(name)).isNotBlank();
    }

    @Test
    void standards() {
        assertThat(DEFLECTION.standard("en")).isEqualTo("tdb4");
        assertThat(DEFLECTION.standard("us-asd")).isEqualTo("l-80");
        assertThat(DEFLECTION.standard("us-strength")).isEqualTo("l-80");
        assertThatThrownBy(() -> DEFLECTION.known("tdb9")).isInstanceOf(UnfitAnswer.class).hasMessageContaining("tdb4");
    }

    /** CHS 88.9 x 4, I 96.34 cm4, 25.1 kg, 3 m, tip 12 kg: 5.64 Hz. */
    @Test
    void frequencyOfASmallSign() {
        assertThat(FREQUENCY.of("f", E, 96.34e-8, 3, 12, 25.1, new Trace())).isCloseTo(5.64, within(0.005));
    }

    /** First roots of a beam with a tip mass: exact values of lambda squared, and by how much the rule lies above them. */
    @ParameterizedTest
    @CsvSource({"0,3.516015,3.5675", "0.1,2.967838,2.9893", "0.5,2.016299,2.0193", "1,1.557298,1.5581", "2,1.158197,1.1584", "5,0.756937,0.75696", "10,0.541375,0.54138"})
    void frequencyAgainstExactRoots(double ratio, double exact, double rule) {
        double f = FREQUENCY.of("f", E, 1e-6, 3, 30 * ratio, 30, new Trace());
        double root = f * 2 * Math.PI / Math.sqrt(E * 1e-6 / (10 * 81));
        assertThat(root).isCloseTo(rule, within(1e-4)).isBetween(exact, exact * 1.0147);
    }

    @Test
    void slowPostsAreDynamic() {
        assertThat(FREQUENCY.dynamic(0.99)).isTrue();
        assertThat(FREQUENCY.dynamic(1)).isFalse();
        Trace trace = new Trace();
        trace.line("f", "f_1", "f").from("x", broadside.trace.Status.DERIVED).reads("x", 0.8, "Hz");
        Check check = FREQUENCY.check(0.8, trace);
        assertThat(check.passes()).isFalse();
        assertThat(check.utilisation()).isEqualTo(1.25);
        assertThat(FREQUENCY.check(1, new Trace()).passes()).isTrue();
    }
}
