package broadside.codes;

import static broadside.codes.AsceJobs.code;
import static broadside.codes.AsceJobs.job;
import static broadside.codes.AsceJobs.result;
import static broadside.codes.AsceJobs.sign;
import static broadside.codes.AsceJobs.step;
import static broadside.codes.AsceJobs.value;
import static broadside.codes.AsceJobs.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.site.Site;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Short stays by ASCE 37, ground that is not known, and the pressure on members. */
class AsceSpeedTest {

    private static final String BOARD = sign("2 m", "1 m", "2 m", "1");

    @ParameterizedTest
    @CsvSource({"16, 5 weeks, 0.75", "22, 5.9 weeks, 0.75", "16, 6 weeks, 0.80", "22, 6 months, 0.80", "16, 1 year, 0.80", "16, 12 months, 0.80", "22, 13 months, 0.85",
        "16, 2 years, 0.85", "22, 3 years, 0.90", "16, 5 years, 0.90"})
    void the_speed_is_lowered_where_the_rule_is_asked_for(String edition, String stay, double factor) {
        ItemResult item = result(edition, wind("50 m/s", "C") + ",'stands-for':'" + stay + "','duration-rule':'code'", BOARD);
        ItemResult whole = result(edition, wind("50 m/s", "C") + ",'stands-for':'" + stay + "'", BOARD);
        assertThat(value(item, "duration-factor")).isEqualTo(factor);
        assertThat(step(item, "duration-factor").status()).isEqualTo(Status.RECALLED);
        assertThat(value(item, "velocity-pressure") / value(whole, "velocity-pressure")).isCloseTo(factor * factor, within(1e-12));
        assertThat(whole.sheet().find("duration-factor")).isEmpty();
    }

    @Test
    void above_five_years_nothing_is_lowered() {
        ItemResult item = result("22", wind("50 m/s", "C") + ",'stands-for':'6 years','duration-rule':'code'", BOARD);
        assertThat(value(item, "duration-factor")).isEqualTo(1);
    }

    @Test
    void the_rule_needs_to_know_how_long() {
        ItemResult item = result("16", wind("50 m/s", "C") + ",'duration-rule':'code'", BOARD);
        assertThat(item.loads()).isEmpty();
        assertThat(item.refusal().orElseThrow().reason()).contains("how long the item stands was not given");
    }

    /** A ridge, H/L_h held at 0.5, at the crest and the ground: (1 + 0.5 x 1.30)² = 2.7225, (1 + 0.5 x 1.45)² = 2.975625, (1 + 0.5 x 1.55)² = 3.150625. */
    @ParameterizedTest
    @CsvSource({"16, B, 2.7225", "16, C, 2.975625", "16, D, 3.150625", "22, B, 2.7225", "22, C, 2.975625", "22, D, 3.150625"})
    void ground_that_is_not_known_takes_the_worst_factor(String edition, String exposure, double worst) {
        ItemResult item = result(edition, wind("50 m/s", exposure) + ",'ground-nearby':'unknown'", BOARD);
        assertThat(value(item, "topography-factor")).isCloseTo(worst, within(1e-12));
        assertThat(step(item, "topography-factor").formula()).contains("not known");
        assertThat(value(result(edition, wind("50 m/s", exposure) + ",'ground-nearby':'flat'", BOARD), "topography-factor")).isEqualTo(1);
    }

    @Test
    void no_hill_is_worse_than_ground_that_is_not_known() {
        Random random = new Random(268);
        for (int i = 0; i < 200; i++) {
            String exposure = String.valueOf("BCD".charAt(random.nextInt(3)));
            String feature = new String[] {"hill", "ridge", "escarpment"}[random.nextInt(3)];
            String hill = ",'topography':{'feature':'" + feature + "','height':'" + (5 + random.nextInt(300)) + " m','upwind-length':'" + (10 + random.nextInt(500))
                + " m','distance-from-crest':'" + (random.nextInt(200) - 100) + " m'}";
            double known = value(result("22", wind("50 m/s", exposure) + hill, BOARD), "topography-factor");
            assertThat(known).isLessThanOrEqualTo(value(result("22", wind("50 m/s", exposure) + ",'ground-nearby':'unknown'", BOARD), "topography-factor") + 1e-12);
        }
    }

    @Test
    void terrain_that_is_not_known_is_exposure_d() {
        assertThat(value(result("22", wind("50 m/s", "unknown"), BOARD), "profile-exponent")).isEqualTo(11.5);
    }

    /** q K_d G at 4 m: 7-16, exposure C: 1106.41 x 0.85 = 940.45 Pa; 7-22: 1305.12 x 0.85 x 0.85 = 942.95 Pa. */
    @ParameterizedTest
    @CsvSource({"16, 940.45", "22, 942.95"})
    void members_have_every_factor_but_the_coefficient(String edition, double pressure) {
        Site site = job(edition, wind("50 m/s", "C"), BOARD).site();
        Trace trace = new Trace();
        assertThat(code(edition).memberPressure(site, 4, trace)).isCloseTo(pressure, within(0.05));
        assertThat(trace.find("member-pressure").orElseThrow().symbol()).isEqualTo("q_m");
    }

    /** By the formula a member without width has the largest factor of all. */
    @Test
    void a_member_takes_no_relief_from_the_width_of_a_panel() {
        ItemResult item = result("22", wind("50 m/s", "C") + ",'gust-factor':'computed'", sign("8 m", "2 m", "2 m", "1"));
        assertThat(value(item, "gust-factor/edge-on")).isGreaterThan(value(item, "gust-factor"));
        assertThat(value(item, "member-pressure/edge-on")).isCloseTo(value(item, "velocity-pressure") * 0.85 * value(item, "gust-factor/edge-on"), within(1e-9));
    }
}
