package broadside.codes;

import static broadside.codes.En1991Inputs.code;
import static broadside.codes.En1991Inputs.site;
import static broadside.codes.En1991Inputs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.PostSection;
import broadside.table.OutsideTable;
import broadside.trace.Trace;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Posts by EN 1991-1-4, 7.6 and 7.9, and friction by 7.5. */
class En1991MembersTest {

    private static final MemberRule RULE = code("").memberRule().orElseThrow();

    private static double round(double width, double pressure, Trace trace) {
        return RULE.coefficient(new PostSection(PostSection.Shape.ROUND, width, width), 3, pressure, trace);
    }

    /** 700 N/m2 is 33.47 m/s. 168 mm: Re 3.748e5, 1.2 + 0.18 log(2/168)/(1 + 0.4 log 0.3748) = 0.782; 300 mm: Re 6.693e5, 0.779. */
    @ParameterizedTest
    @CsvSource({"0.076, 1.2", "0.114, 1.2", "0.168, 0.782", "0.3, 0.779"})
    void round_posts_in_700_pascals(double width, double coefficient) {
        assertThat(round(width, 700, new Trace())).isCloseTo(coefficient, within(0.0005));
    }

    /** By the plain formulas: the larger of the two branches, not above 1.2. */
    @ParameterizedTest
    @ValueSource(doubles = {0.15, 0.16, 0.2, 0.25, 0.4, 1})
    void round_posts_follow_the_curve(double width) {
        for (double q = 1; q < 5000; q *= 1.3) {
            double re = width * Math.sqrt(2 * q / 1.25) / 15e-6 / 1e6;
            double falling = 0.11 / Math.pow(re, 1.4);
            double above = 1.2 + 0.18 * Math.log10(10 * 0.0002 / width) / (1 + 0.4 * Math.log10(re));
            assertThat(round(width, q, new Trace())).as(width + " m in " + q + " Pa").isCloseTo(falling >= 1.2 ? 1.2 : Math.min(1.2, Math.max(falling, above)), within(1e-9));
        }
    }

    /** Printed points, and d/b = 1.2: 2.1 - 0.45 log 1.2/log 2 = 1.98163. */
    @ParameterizedTest
    @CsvSource({"0.1, 0.1, 2.1", "0.1, 0.2, 1.65", "0.2, 0.02, 2.0", "0.1, 0.06, 2.35", "0.1, 0.12, 1.98163"})
    void rectangular_posts(double width, double depth, double coefficient) {
        Trace trace = new Trace();
        assertThat(RULE.coefficient(new PostSection(PostSection.Shape.RECTANGULAR, width, depth), 3, 700, trace)).isCloseTo(coefficient, within(5e-6));
        assertThat(trace.find("coefficient/post")).isPresent();
    }

    @Test
    void a_section_that_the_figure_does_not_hold_is_refused() {
        assertThatThrownBy(() -> RULE.coefficient(new PostSection(PostSection.Shape.RECTANGULAR, 0.1, 0.009), 3, 700, new Trace())).isInstanceOf(OutsideTable.class);
    }

    @ParameterizedTest
    @CsvSource({"smooth, 0.01, read", "rough, 0.02, read", "very rough, 0.04, recalled"})
    void friction(String surface, double coefficient, String status) {
        assertThat(code("").friction(surface).orElseThrow().value()).isEqualTo(coefficient);
        assertThat(code("").friction(surface).orElseThrow().source().status().word()).isEqualTo(status);
        assertThat(code("").friction("icy")).isEmpty();
    }

    @Test
    void forces_on_members_take_the_peak_pressure_at_their_height() {
        Trace trace = new Trace();
        double q = code("").memberPressure(site(26, "II"), 5, trace);
        assertThat(q).isCloseTo(En1991Inputs.peakInTerrain2(26, 5), within(1e-6));
        assertThat(value(trace, "member-pressure")).isEqualTo(q);
        assertThat(trace.find("member-pressure").orElseThrow().symbol()).isEqualTo("q_m");
    }
}
