package broadside.codes;

import static broadside.codes.AsceJobs.result;
import static broadside.codes.AsceJobs.sign;
import static broadside.codes.AsceJobs.step;
import static broadside.codes.AsceJobs.value;
import static broadside.codes.AsceJobs.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.trace.Status;
import broadside.trace.Step;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Signs with openings of 30 % and more, ASCE 7, 29.4. */
class AsceOpenSignsTest {

    /**
     * Frame 4 m by 3 m, 2 m clear, a fifth solid, V = 50 m/s, exposure C; the pressure is put on the solid area of 2.4 m2.
     * 7-16: q_z at 3.5 m, below 15 ft: 1106.41 Pa with K_d; p = 0.85 x 1.8 q = 1692.8 Pa; F = 2.4 p = 4062.7 N.
     * 7-22: q_z 1305.12 Pa; p = 0.85 x 0.85 x 1.8 q = 1697.3 Pa; F = 4073.5 N. M = 3.5 F.
     */
    @ParameterizedTest
    @CsvSource({"16, 1106.41, 1692.8, 4062.7", "22, 1305.12, 1697.3, 4073.5"})
    void force_on_the_solid_area(String edition, double q, double pressure, double force) {
        ItemResult item = result(edition, wind("50 m/s", "C"), sign("4 m", "3 m", "2 m", "0.2"));
        assertThat(value(item, "velocity-pressure")).isCloseTo(q, within(0.05));
        assertThat(value(item, "reference-height")).isEqualTo(3.5);
        assertThat(value(item, "solid-area-pressure/case-a")).isCloseTo(pressure, within(0.1));
        assertThat(value(item, "pressure/case-a")).isCloseTo(0.2 * pressure, within(0.05));
        assertThat(value(item, "force/case-a")).isCloseTo(force, within(0.3));
        assertThat(value(item, "base-moment/case-a")).isCloseTo(3.5 * force, within(1.0));
        assertThat(item.loads().orElseThrow().cases()).extracting(c -> c.name()).containsOnly("case-a");
    }

    /** The printed classes, and the gap between 0.29 and 0.3 in the class before it. */
    @ParameterizedTest
    @CsvSource({"0.05, 2.0", "0.0999, 2.0", "0.1, 1.8", "0.29, 1.8", "0.295, 1.8", "0.3, 1.6", "0.5, 1.6", "0.7, 1.6"})
    void coefficient_by_class(String solidity, double printed) {
        for (String edition : new String[] {"16", "22"}) {
            ItemResult item = result(edition, wind("50 m/s", "C"), sign("4 m", "3 m", "2 m", solidity));
            assertThat(value(item, "coefficient/case-a")).isEqualTo(printed);
            assertThat(step(item, "coefficient/case-a").status()).isEqualTo(Status.SECOND_HAND);
        }
    }

    /** Above 0.7 it is a solid sign with its reduction, at the top and with all its cases. */
    @Test
    void from_openings_below_30_percent_it_is_a_solid_sign() {
        ItemResult item = result("22", wind("50 m/s", "C"), sign("4 m", "3 m", "2 m", "0.71"));
        assertThat(value(item, "reference-height")).isEqualTo(5.0);
        assertThat(item.sheet().find("porosity-factor")).isPresent();
        assertThat(item.loads().orElseThrow().cases()).extracting(c -> c.name()).contains("case-a", "case-b");
    }

    /** 16 psf is 766.08 Pa on the solid area of 2.4 m2: 1838.6 N. */
    @ParameterizedTest
    @ValueSource(strings = {"16", "22"})
    void not_below_16_psf_on_the_solid_area(String edition) {
        ItemResult item = result(edition, wind("20 m/s", "C"), sign("4 m", "3 m", "2 m", "0.2"));
        assertThat(value(item, "force/case-a")).isCloseTo(1838.6, within(0.05));
    }

    /** The height of the middle counts, not that of the top: a frame from 10 m to 14 m, 7-16, exposure B: 2.01 (12/365.76)^(2/7). */
    @Test
    void the_wind_at_the_middle_counts() {
        ItemResult item = result("16", wind("50 m/s", "B"), sign("4 m", "4 m", "10 m", "0.4"));
        assertThat(value(item, "exposure-factor")).isCloseTo(2.01 * Math.pow(12 / 365.76, 2 / 7.0), within(1e-9));
    }

    @Test
    void an_open_hoarding_has_posts_and_a_bare_fence_has_loads() {
        ItemResult hoarding = result("22", wind("50 m/s", "C"), "'kind':'hoarding','length':'12 m','height':'2 m','solidity':0.5,'posts':{'spacing':'3 m'}");
        assertThat(hoarding.loads().orElseThrow().posts()).hasSize(5);
        double pressure = value(hoarding, "pressure/case-a");
        assertThat(hoarding.loads().orElseThrow().posts().get(1).moment()).as("3 m of boards, at half height").isCloseTo(pressure * 3 * 2 * 1, within(0.01));
        ItemResult fence = result("16", wind("50 m/s", "C"), "'kind':'banner-fence','panel-length':'3.5 m','panel-height':'2 m','panels':4,'fence-solidity':0.25");
        assertThat(fence.sheet().steps()).extracting(Step::name).contains("force/case-a/bare-fence");
    }

    /** By the formula the gust factor of the whole sign counts, with the height of its top. */
    @Test
    void the_computed_gust_factor_works_for_an_open_sign() {
        ItemResult open = result("16", wind("50 m/s", "C") + ",'gust-factor':'computed'", sign("4 m", "3 m", "2 m", "0.2"));
        ItemResult solid = result("16", wind("50 m/s", "C") + ",'gust-factor':'computed'", sign("4 m", "3 m", "2 m", "1"));
        assertThat(value(open, "gust-factor")).isEqualTo(value(solid, "gust-factor"));
    }

    /** An authority's least pressure holds on the gross area. */
    @Test
    void the_authority_comes_last() {
        ItemResult item = result("16", wind("30 m/s", "C") + ",'authority-minimum-pressure':'1.5 kN/m2'", sign("4 m", "3 m", "2 m", "0.2"));
        assertThat(value(item, "pressure/case-a")).isEqualTo(1500);
    }
}
