package broadside.codes;

import static broadside.codes.AsNzsJobs.GUST_45;
import static broadside.codes.AsNzsJobs.board;
import static broadside.codes.AsNzsJobs.job;
import static broadside.codes.AsNzsJobs.problems;
import static broadside.codes.AsNzsJobs.region;
import static broadside.codes.AsNzsJobs.result;
import static broadside.codes.AsNzsJobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.trace.Status;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Design wind speed and its pressure, AS/NZS 1170.2 sections 2 to 4, against hand calculations. */
class AsNzsWindTest {

    private static String terrain(String category) {
        return ",\"terrain\":\"" + category + "\"";
    }

    private static String slope(String feature, String height, String length, String x) {
        return ",\"topography\":{\"feature\":\"" + feature + "\",\"height\":\"" + height + "\",\"upwind-length\":\"" + length + "\",\"distance-from-crest\":\"" + x + "\"}";
    }

    /**
     * Board with its top at 7.5 m, terrain 2: M_z,cat half-way between 0.91 and 1.00 = 0.955. V_sit = 45 x 0.95 x (0.955 x 0.9) = 36.7436 m/s;
     * q = 0.6 x 36.7436^2 = 810.05 Pa. In mph: 45 m/s = 100.6621 mph.
     */
    @Test
    void speed_and_pressure_by_hand_in_both_systems() {
        String factors = terrain("2") + ",\"direction-multiplier\":0.95,\"shielding-multiplier\":0.9";
        for (String speed : new String[] {"45 m/s", "100.662133 mph"}) {
            ItemResult item = result(job("2011", "\"basic-speed\":\"" + speed + "\",\"averaging\":\"3 s gust\"" + factors, board(2, 1, 6.5, "")));
            assertThat(value(item, "terrain-height-multiplier")).isCloseTo(0.955, within(1e-9));
            assertThat(value(item, "site-speed")).isCloseTo(36.7436, within(1e-4));
            assertThat(value(item, "velocity-pressure")).isCloseTo(810.05, within(0.01));
        }
    }

    /** 30 m/s is the least design speed: q = 0.6 x 900 = 540 Pa. */
    @Test
    void the_design_speed_is_not_below_30_metres_per_second() {
        ItemResult item = result(job("2011", region("A", "5 years") + terrain("4"), board(2, 1, 2, "")));
        assertThat(value(item, "site-speed")).isCloseTo(24, within(1e-9));
        assertThat(value(item, "design-speed")).isEqualTo(30);
        assertThat(value(item, "velocity-pressure")).isCloseTo(540, within(1e-9));
    }

    /** Category 1 differs between the editions: at 12.5 m the means of 1.12, 1.16 and of 1.08, 1.12. Category 1.5 is the mean of 1 and 2. */
    @ParameterizedTest
    @CsvSource({"2011, 1, 12.5, 1.14", "2021, 1, 12.5, 1.10", "2011, 1.5, 12.5, 1.0825", "2011, 1.5, 2, 0.95", "2011, 2, 2, 0.91", "2021, 2.5, 17.5, 0.99", "2021, 3, 9, 0.83", "2011, 3, 12.5, 0.86",
        "2021, 4, 22, 0.76", "2011, 4, 100, 1.03"})
    void terrain_height_multiplier(String edition, String category, double top, double expected) {
        assertThat(value(edition, GUST_45 + terrain(category), board(2, 1, top - 1, ""), "terrain-height-multiplier")).isCloseTo(expected, within(1e-9));
    }

    @Test
    void the_table_ends_at_100_metres() {
        ItemResult item = result(job("2011", GUST_45 + terrain("2"), board(2, 1, 99.5, "")));
        assertThat(item.loads()).isEmpty();
        assertThat(item.refusal().orElseThrow().reason()).contains("from 3 to 100");
    }

    @Test
    void terms_differ_by_edition() {
        assertThat(problems(job("2021", GUST_45 + terrain("1.5"), board(2, 1, 2, "")))).contains(
            "site.terrain: \"1.5\" is not a terrain class of AS/NZS 1170.2:2021; it has 1, 2, 2.5, 3, 4");
        assertThat(problems(job("2011", GUST_45 + ",\"climate-multiplier\":1.05" + terrain("2"), board(2, 1, 2, "")))).anyMatch(p -> p.startsWith("site.climate-multiplier: is not a value of AS/NZS 1170.2:2011"));
        assertThat(problems(job("2021", "\"basic-speed\":\"45 m/s\",\"averaging\":\"10 min mean\"" + terrain("2"), board(2, 1, 2, "")))).anyMatch(p -> p.contains("as a 0.2 s gust"));
    }

    /** Each class has plain words. */
    @Test
    void every_terrain_has_a_meaning() {
        for (String edition : new String[] {"2011", "2021"}) {
            SiteTerms terms = AsNzsJobs.ASSESSOR.codes().code("as-nzs-1170-2/" + edition).orElseThrow().terms();
            assertThat(terms.terrains()).allSatisfy(t -> assertThat(t.meaning()).isNotBlank());
            assertThat(terms.smoothest()).isEqualTo("1");
        }
    }

    /** An unknown terrain is category 1, an unknown ground the largest multiplier: V_sit = 45 x (0.99 x 1.71). */
    @Test
    void what_is_not_known_counts_at_its_worst() {
        ItemResult item = result(job("2011", GUST_45 + terrain("unknown") + ",\"ground-nearby\":\"unknown\"", board(2, 1, 2, "")));
        assertThat(value(item, "topography-factor")).isEqualTo(1.71);
        assertThat(value(item, "site-speed")).isCloseTo(45 * 0.99 * 1.71, within(1e-9));
        assertThat(item.notes()).noneMatch(n -> n.text().contains("taken as flat")).anyMatch(n -> n.text().contains("the worst value that the code can give"));
    }

    /**
     * Board with its top at 4 m, ridge of 20 m, upwind slope 100 m, so L_u = 50 m, H/2L_u = 0.2, L_1 = max(18; 8) = 18 m.
     * Upwind 30 m: L_2 = 72 m: 1 + 20/(3.5 x 22) x (1 - 30/72) = 1 + 0.259740 x 0.583333 = 1.151515. Downwind of an escarpment 30 m: L_2 = 180 m:
     * 1 + 0.259740 x 0.833333 = 1.216450. Beyond L_2 nothing is left. H = 5 m: H/2L_u = 0.05 still counts (5/100), 4.9 m does not.
     */
    @ParameterizedTest
    @CsvSource({"ridge, 20 m, 100 m, -30 m, 1.151515", "escarpment, 20 m, 100 m, -30 m, 1.151515", "escarpment, 20 m, 100 m, 30 m, 1.216450", "hill, 20 m, 100 m, 30 m, 1.151515",
        "hill, 20 m, 100 m, 80 m, 1.0", "ridge, 5 m, 100 m, 0 m, 1.064935", "ridge, 4.9 m, 100 m, 0 m, 1.0"})
    void topography_by_hand(String feature, String height, String length, String x, double expected) {
        assertThat(value("2011", GUST_45 + terrain("2") + slope(feature, height, length, x), board(2, 1, 3, ""), "topography-factor")).isCloseTo(expected, within(1e-6));
        assertThat(value("2021", GUST_45 + terrain("2") + slope(feature, height, length, x), board(2, 1, 3, ""), "topography-factor")).isCloseTo(expected, within(1e-6));
    }

    /** The downwind slope is no part of this rule, and the notes do not speak of it. */
    @Test
    void the_downwind_slope_is_not_spoken_of() {
        assertThat(result(job("2011", GUST_45 + terrain("2") + slope("hill", "20 m", "100 m", "30 m"), board(2, 1, 3, ""))).notes()).noneMatch(n -> n.text().contains("downwind slope"));
    }

    /**
     * Steep ground, H = 40 m, L_u = 20 m: L_1 = max(7.2; 16) = 16 m. At the crest 1.71, the largest. 10 m before it is the edge of the peak zone (H/4), where the
     * other formula counts: 1 + 40/(3.5 x 20) x (1 - 10/64) = 1.482143; 9.9 m before it 1 + 0.71 x (1 - 9.9/64) = 1.600172.
     */
    @ParameterizedTest
    @CsvSource({"0 m, 1.71", "-10 m, 1.482143", "-9.9 m, 1.600172", "32 m, 1.355"})
    void steep_ground(String x, double expected) {
        assertThat(value("2011", GUST_45 + terrain("2") + slope("hill", "40 m", "40 m", x), board(2, 1, 3, ""), "topography-factor")).isCloseTo(expected, within(1e-6));
    }

    @Test
    void a_measured_half_length_counts() {
        String ground = slope("ridge", "20 m", "100 m", "0 m").replace("}", ",\"half-length\":\"40 m\"}");
        // L_1 = max(14.4; 8); 1 + 20/(3.5 x 18.4) = 1.310559.
        ItemResult item = result(job("2011", GUST_45 + terrain("2") + ground, board(2, 1, 3, "")));
        assertThat(value(item, "topography-factor")).isCloseTo(1.310559, within(1e-6));
        assertThat(item.notes()).noneMatch(n -> n.text().startsWith("Half the height"));
        assertThat(result(job("2011", GUST_45 + terrain("2") + slope("ridge", "20 m", "100 m", "0 m"), board(2, 1, 3, ""))).notes()).anyMatch(n -> n.text().startsWith("Half the height"));
    }

    @Test
    void high_ground_is_not_covered() {
        ItemResult item = result(job("2011", GUST_45 + terrain("2") + ",\"altitude\":\"500 m\"", board(2, 1, 2, "")));
        assertThat(item.refusal().orElseThrow().clause()).isEqualTo("4.4.2");
        assertThat(item.refusal().orElseThrow().reason()).contains("500 m");
        assertThat(result(job("2011", GUST_45 + terrain("2") + ",\"altitude\":\"499 m\"", board(2, 1, 2, ""))).loads()).isPresent();
    }

    @Test
    void shielding_counts_up_to_25_metres_in_2021() {
        String sheltered = GUST_45 + terrain("3") + ",\"shielding-multiplier\":0.9";
        assertThat(result(job("2021", sheltered, board(2, 1, 25, ""))).refusal().orElseThrow().reason()).contains("25 m");
        assertThat(result(job("2021", sheltered, board(2, 1, 24, ""))).loads()).isPresent();
        assertThat(result(job("2011", sheltered, board(2, 1, 25, ""))).sheet().find("shielding-multiplier").orElseThrow().value()).isEqualTo(0.9);
        assertThat(result(job("2021", sheltered, board(2, 1, 24, ""))).notes()).anyMatch(n -> n.text().contains("by the shielding multiplier given")).noneMatch(n -> n.text().startsWith("No shelter"));
    }

    /** Almost nothing of this standard was seen in print, and the sheet says so step by step. */
    @Test
    void no_step_claims_to_be_read() {
        for (String edition : new String[] {"2011", "2021"}) {
            ItemResult item = result(job(edition, region("C", "500 years") + terrain("2") + slope("hill", "30 m", "100 m", "0 m"), board(4, 1, 2, "")));
            assertThat(item.sheet().steps()).filteredOn(s -> s.place().startsWith("AS/NZS")).isNotEmpty().allSatisfy(s ->
                assertThat(s.status()).isIn(Status.RECALLED, Status.SECOND_HAND));
        }
    }
}
