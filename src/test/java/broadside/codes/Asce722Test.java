package broadside.codes;

import static broadside.codes.AsceJobs.code;
import static broadside.codes.AsceJobs.job;
import static broadside.codes.AsceJobs.result;
import static broadside.codes.AsceJobs.sign;
import static broadside.codes.AsceJobs.step;
import static broadside.codes.AsceJobs.value;
import static broadside.codes.AsceJobs.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.site.Site;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** ASCE/SEI 7-22 beside 7-16: other profile, K_d out of q and into each load equation. */
class Asce722Test {

    /**
     * Sign 2.4 m by 1.2 m, 1.8 m clear, V = 50 m/s, exposure C. h = 3 m, below 15 ft:
     * K = 2.41 (15/2460)^(2/9.8) = 0.851154; q = 0.613344 x 0.851154 x 2500 = 1305.12 Pa, without K_d.
     * s/h = 0.4, B/s = 2: C_f = 1.75. p = 0.85 x 0.85 x 1.75 q = 1650.2 Pa; F = 2.88 p = 4752.5 N; M = 2.4 F = 11 406 N m.
     */
    @Test
    void a_solid_sign_by_hand() {
        ItemResult item = result("22", wind("50 m/s", "C"), sign("2.4 m", "1.2 m", "1.8 m", "1"));
        assertThat(value(item, "exposure-factor")).isCloseTo(0.851154, within(1e-6));
        assertThat(value(item, "velocity-pressure")).isCloseTo(1305.12, within(0.05));
        assertThat(value(item, "directionality-factor")).isEqualTo(0.85);
        assertThat(value(item, "pressure/case-a")).isCloseTo(1650.2, within(0.1));
        assertThat(value(item, "force/case-a")).isCloseTo(4752.5, within(0.3));
        assertThat(value(item, "base-moment/case-a")).isCloseTo(11406, within(1.0));
        assertThat(item.loads().orElseThrow().velocity().pressure()).isEqualTo(value(item, "velocity-pressure"));
    }

    /** The product of all factors is the same in both editions, so the pressures stand to each other as the coefficients of height. */
    @Test
    void the_editions_differ_by_the_profile_alone() {
        Random random = new Random(722);
        for (int i = 0; i < 60; i++) {
            String site = wind(40 + random.nextInt(40) + " m/s", String.valueOf("BCD".charAt(random.nextInt(3))));
            String solidity = random.nextBoolean() ? "1" : String.valueOf((10 + random.nextInt(85)) / 100.0);
            String item = sign((10 + random.nextInt(90)) / 10.0 + " m", (10 + random.nextInt(40)) / 10.0 + " m", random.nextInt(12) + " m", solidity);
            ItemResult older = result("16", site, item);
            ItemResult newer = result("22", site, item);
            double ratio = value(newer, "exposure-factor") / value(older, "exposure-factor");
            assertThat(value(newer, "velocity-pressure") / value(older, "velocity-pressure")).isCloseTo(ratio / 0.85, within(1e-9));
            if (value(older, "pressure/case-a") > 766.1 && value(newer, "pressure/case-a") > 766.1) {
                assertThat(value(newer, "pressure/case-a") / value(older, "pressure/case-a")).isCloseTo(ratio, within(1e-9));
            }
        }
    }

    /** 2.41 holds from z_g, 1935 ft in exposure D, to 3280 ft; in 7-16 the table ends at 500 ft. */
    @Test
    void the_profile_ends_where_its_clause_ends() {
        Site site = job("22", wind("50 m/s", "D"), sign("2 m", "1 m", "2 m", "1")).site();
        double ft = 0.3048;
        Trace trace = new Trace();
        code("22").velocityPressure(site, 2000 * ft, trace);
        assertThat(trace.find("exposure-factor").orElseThrow().value()).isEqualTo(2.41);
        code("22").velocityPressure(site, 3280 * ft, new Trace());
        assertThatThrownBy(() -> code("22").velocityPressure(site, 3281 * ft, new Trace())).isInstanceOf(NotCovered.class).hasMessageContaining("3280 ft");
        assertThatThrownBy(() -> code("16").velocityPressure(site, 501 * ft, new Trace())).isInstanceOf(NotCovered.class).hasMessageContaining("500 ft");
    }

    /** Feet in, the same result: 8 ft is 2.4384 m. */
    @Test
    void feet_and_metres_agree() {
        double feet = value(result("22", wind("115 mph", "B"), sign("8 ft", "4 ft", "30 ft", "1")), "force/case-a");
        double metres = value(result("22", wind("51.4096 m/s", "B"), sign("2.4384 m", "1.2192 m", "9.144 m", "1")), "force/case-a");
        assertThat(feet).isCloseTo(metres, within(1e-6));
    }

    /** 60 ft in exposure B, 15 ft in the others, and one in five: 26.8.1 without the conditions of isolation. */
    @ParameterizedTest
    @CsvSource({"B, 18.2 m, 40 m, 1", "B, 18.3 m, 40 m, 0", "C, 4.5 m, 10 m, 1", "C, 4.6 m, 10 m, 0", "D, 4.6 m, 24 m, 1"})
    void a_hill_counts_from_the_printed_size_upward(String exposure, String height, String half, int flat) {
        String hill = ",'topography':{'feature':'ridge','height':'" + height + "','upwind-length':'200 m','half-length':'" + half + "','distance-from-crest':'0 m'}";
        double kzt = value(result("22", wind("50 m/s", exposure) + hill, sign("2 m", "1 m", "1 m", "1")), "topography-factor");
        assertThat(kzt == 1).isEqualTo(flat == 1);
    }

    @Test
    void a_figure_is_known_as_well_as_it_was_read() {
        ItemResult item = result("22", wind("50 m/s", "C"), sign("4 m", "1 m", "1 m", "1"));
        for (String read : new String[] {"velocity-pressure", "exposure-factor", "profile-exponent", "directionality-factor", "gust-factor", "elevation-factor"}) {
            assertThat(step(item, read).status()).as(read).isEqualTo(Status.READ);
        }
        assertThat(step(item, "coefficient/case-a").status()).isEqualTo(Status.SECOND_HAND);
        assertThat(step(item, "coefficient/case-c/0-s").status()).isEqualTo(Status.SECOND_HAND);
        assertThat(step(item, "pressure/case-c/0-s").status()).as("the load equations of chapter 29").isEqualTo(Status.RECALLED);
        assertThat(step(item, "exposure-factor").meaning()).contains("1.6 %");
        assertThat(step(result("16", wind("50 m/s", "C"), sign("4 m", "1 m", "1 m", "1")), "velocity-pressure").status()).isEqualTo(Status.SECOND_HAND);
    }

    /** V_T/V_50 = 0.36 + 0.10 ln(12 T): 1.1789, 1.2636, 1.3523, 1.4091; without a category the map of category II is meant. */
    @ParameterizedTest
    @CsvSource({"16, I, 1.1789", "16, II, 1.2636", "22, III, 1.3523", "22, IV, 1.4091", "22, none, 1.2636"})
    void the_wind_of_50_years(String edition, String category, double ratio) {
        String site = wind("50 m/s", "C") + (category.equals("none") ? "" : ",'risk-category':'" + category + "'");
        Trace trace = new Trace();
        double found = code(edition).fiftyYearRatio(job(edition, site, sign("2 m", "1 m", "2 m", "1")).site(), trace);
        assertThat(1 / found).isCloseTo(ratio, within(5e-5));
        assertThat(trace.find("fifty-year-ratio").orElseThrow().value()).isEqualTo(found);
    }
}
