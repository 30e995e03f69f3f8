package broadside.codes;

import static broadside.codes.OpenFlowJobs.posted;
import static broadside.codes.OpenFlowJobs.result;
import static broadside.codes.OpenFlowJobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Wind on posts by plain fluid mechanics, for itself and for codes that have no rule of their own. */
class OpenFlowMembersTest {

    /**
     * Post of 114.3 mm, 3 m free below the board; gust 35 m/s over 0.05 m, at 3 m: v = 35 (ln 60 + 3)/(ln 200 + 3) = 35 x 7.094345/8.298317 = 29.92198 m/s;
     * q = 0.6125 x 895.325 = 548.386 Pa; F = 548.386 x 1.2 x 0.1143 x 3 = 225.650 N at 1.5 m: 338.475 N m.
     * Re = 29.92198 x 0.1143/1.461e-5 = 234 092; the smooth cylinder lies between 1.21 at 210 000 and 1.17 at 270 000.
     */
    @Test
    void aRoundPost() {
        ItemResult item = result("35 m/s", "0.05 m", "", posted("CHS 114.3x5"));
        assertThat(value(item, "coefficient/post/post-1")).isEqualTo(1.2);
        assertThat(value(item, "reynolds-number/post/post-1")).isCloseTo(234092, within(1.0));
        assertThat(value(item, "cylinder-curve/post-1")).isBetween(1.17, 1.21);
        assertThat(value(item, "post-drag/post-1")).isCloseTo(225.650, within(0.005));
        assertThat(value(item, "post-drag-moment/post-1")).isCloseTo(338.475, within(0.01));
    }

    /** Posts of 60 mm at 20 m/s to 170 mm at 40 m/s meet Reynolds numbers from 0.8e5 to 4.5e5: the fall of the curve is not credited. */
    @ParameterizedTest
    @CsvSource({"20 m/s, CHS 60.3x4, 0.8e5", "40 m/s, CHS 168.3x5, 4.5e5", "80 m/s, CHS 508x10, 2.7e6", "150 m/s, CHS 1200x20, 1.2e7"})
    void theFallIsNotCredited(String speed, String section, double reynolds) {
        ItemResult item = result(speed, "0.0002 m", ",\"air-density\":\"1.225 kg/m3\"", posted(section));
        assertThat(value(item, "coefficient/post/post-1")).isEqualTo(1.2);
        assertThat(value(item, "reynolds-number/post/post-1")).isCloseTo(reynolds, within(0.12 * reynolds));
    }

    /** Beyond the last point of the curve nothing is shown beside the coefficient. */
    @Test
    void beyondTheCurveNothingIsShown() {
        assertThat(result("150 m/s", "0.0002 m", "", posted("CHS 1200x20")).sheet().find("cylinder-curve/post-1")).isEmpty();
    }

    /** Square 2.2, the largest that is printed for it; RHS 120x80: 120 mm along the wind over 80 mm: 1.5, half-way between 2.2 and 1.6. */
    @ParameterizedTest
    @CsvSource({"SHS 100x5, 2.2", "RHS 120x80x8, 1.9", "RHS 65x100x5, 2.9", "RHS 200x100x8, 1.6"})
    void boxPostsByDepthOverWidth(String section, double coefficient) {
        assertThat(value(result("35 m/s", "0.05 m", "", posted(section)), "coefficient/post/post-1")).isCloseTo(coefficient, within(1e-9));
    }

    /** A code without a rule for posts takes this one, on its own pressure. */
    @Test
    void anotherCodeTakesTheRule() {
        ItemResult item = OpenFlowJobs.assess("{\"broadside\":1,\"basis\":{\"code\":\"en-1991-1-4\",\"edition\":\"2005\"},\"site\":{\"basic-speed\":\"26 m/s\","
            + "\"averaging\":\"10 min mean\",\"terrain\":\"II\"},\"items\":[" + posted("SHS 100x5") + "]}");
        double drag = value(item, "post-drag/post-1");
        assertThat(drag).isCloseTo(value(item, "member-pressure/post-1") * value(item, "coefficient/post/post-1") * 0.1 * 3, within(1e-9));
        assertThat(value(item, "base-shear/centred")).isCloseTo(value(item, "force/centred") + drag, within(1e-6));
    }
}
