package broadside.codes;

import static broadside.codes.Is875Jobs.DELHI;
import static broadside.codes.Is875Jobs.building;
import static broadside.codes.Is875Jobs.facade;
import static broadside.codes.Is875Jobs.ofSign;
import static broadside.codes.Is875Jobs.result;
import static broadside.codes.Is875Jobs.sign;
import static broadside.codes.Is875Jobs.site;
import static broadside.codes.Is875Jobs.step;
import static broadside.codes.Is875Jobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Step;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Wind speed, wind pressure and design wind pressure of IS 875 (Part 3), 6.3 and 7.2. */
class Is875WindTest {

    private static final String SIGN = sign("2 m", "1 m", "2 m");

    private static String ofClass(String speed, String structure) {
        return site(speed, "2", "'structure-class': '" + structure + "'");
    }

    private static String hill(String height, String length, String distance) {
        return site("47 m/s", "2", "'topography': {'feature': 'ridge', 'height': '" + height + "', 'upwind-length': '" + length + "', 'distance-from-crest': '"
            + distance + "'}");
    }

    @ParameterizedTest
    @CsvSource({"temporary, 33, 0.82", "temporary, 39, 0.76", "temporary, 44, 0.73", "temporary, 47, 0.71", "temporary, 50, 0.70", "temporary, 55, 0.67",
        "low hazard, 33, 0.94", "low hazard, 39, 0.92", "low hazard, 44, 0.91", "low hazard, 47, 0.90", "low hazard, 50, 0.90", "low hazard, 55, 0.89",
        "important, 33, 1.05", "important, 39, 1.06", "important, 44, 1.07", "important, 47, 1.07", "important, 50, 1.08", "important, 55, 1.08",
        "general, 33, 1.0", "general, 47, 1.0", "general, 55, 1.0", "general, 30, 1.0", "general, 60, 1.0"})
    void the_risk_factor_is_the_printed_one(String structure, String speed, double printed) {
        assertThat(ofSign(ofClass(speed + " m/s", structure), "risk-factor")).isEqualTo(printed);
    }

    @Test
    void general_structures_have_the_same_factor_at_every_printed_speed() {
        var rows = TableLibrary.shipped().edition("is-875-3/2015").orElseThrow().rows("risk-factor");
        assertThat(rows.keys()).hasSize(6).allSatisfy(v -> assertThat(rows.number(v, "general").value()).isEqualTo(1));
    }

    /** 45 m/s lies between 44 (0.73) and 47 (0.71); 48 between 47 (1.07) and 50 (1.08). */
    @Test
    void between_two_printed_speeds_the_larger_factor_counts_and_the_step_says_so() {
        Step falling = step(result(ofClass("45 m/s", "temporary"), SIGN), "risk-factor");
        assertThat(falling.value()).isEqualTo(0.73);
        assertThat(falling.formula()).contains("larger of the values printed at V_b = 44 m/s (0.73) and 47 m/s (0.71)");
        assertThat(ofSign(ofClass("48 m/s", "important"), "risk-factor")).isEqualTo(1.08);
        assertThat(ofSign(ofClass("33.01 m/s", "low hazard"), "risk-factor")).isEqualTo(0.94);
    }

    @Test
    void a_printed_speed_typed_in_another_unit_is_read_as_printed() {
        Step step = step(result(ofClass("169.2 km/h", "temporary"), SIGN), "risk-factor");
        assertThat(step.value()).isEqualTo(0.71);
        assertThat(step.formula()).contains("read at V_b = 47 m/s");
    }

    @ParameterizedTest
    @CsvSource({"32.9, temporary", "55.1, temporary", "32.9, low hazard", "55.1, important"})
    void outside_the_printed_speeds_other_classes_are_refused(String speed, String structure) {
        ItemResult item = result(ofClass(speed + " m/s", structure), SIGN);
        assertThat(item.outcome()).isEqualTo(ItemResult.Outcome.NOT_COVERED);
        assertThat(item.refusal().orElseThrow().reason()).contains("V_b from 33 to 55 m/s").contains(speed);
    }

    @ParameterizedTest
    @CsvSource({"'stands-for': '5 years'; 'duration-rule': 'code', 0.71", "'stands-for': '18 months'; 'duration-rule': 'code', 0.71",
        "'stands-for': '6 years'; 'duration-rule': 'code', 1.0", "'stands-for': '5 years', 1.0", "'stands-for': '5 years'; 'duration-rule': 'none', 1.0",
        "'duration-rule': 'code', 1.0", "'stands-for': '1 years'; 'duration-rule': 'code'; 'structure-class': 'general', 1.0",
        "'stands-for': '1 years'; 'duration-rule': 'code'; 'structure-class': 'important', 1.07"})
    void a_short_stay_lowers_the_factor_only_where_that_was_asked_for_and_no_class_was_given(String more, double factor) {
        assertThat(ofSign(site("47 m/s", "2", more.replace(';', ',')), "risk-factor")).isEqualTo(factor);
    }

    @Test
    void the_step_tells_life_and_kind_of_structure() {
        assertThat(step(result(ofClass("47 m/s", "temporary"), SIGN), "risk-factor").meaning()).contains("5 years, temporary structures and boundary walls");
        assertThat(step(result(DELHI, SIGN), "risk-factor").meaning()).contains("50 years, general buildings and structures");
        assertThat(step(result(site("47 m/s", "2", "'stands-for': '2 years', 'duration-rule': 'code'"), SIGN), "risk-factor").meaning())
            .contains("5 years, temporary").contains("stands for 2 years");
    }

    /** Half-way between 10 m (1.00) and 15 m (1.05); category 4 half-way between 20 m (0.80) and 30 m (0.97). */
    @Test
    void the_terrain_factor_is_level_to_ten_metres_and_straight_above() {
        assertThat(value(result(DELHI, sign("2 m", "1 m", "9 m")), "terrain-factor")).isEqualTo(1.0);
        assertThat(value(result(DELHI, sign("2 m", "1 m", "11.5 m")), "terrain-factor")).isCloseTo(1.025, within(1e-12));
        String tall = facade("wall", "'width': '2 m', 'height': '1 m'", "5 m", building("30 m", "20 m", "25 m"));
        assertThat(value(result(site("47 m/s", "4", ""), tall), "terrain-factor")).isCloseTo(0.885, within(1e-12));
        assertThat(result(DELHI, facade("wall", "'width': '2 m', 'height': '1 m'", "5 m", building("300 m", "300 m", "301 m"))).refusal().orElseThrow().reason())
            .contains("covers z from 10 to 300");
    }

    /** 30 m high: 600 m is 2.86 degrees; 170 m is 10 degrees, C = 1.2 x 30/170 = 0.211765; 100 m is 16.7 degrees, C = 0.36; 98 m is 17.02 degrees. */
    @ParameterizedTest
    @CsvSource({"600 m, 0 m, 1", "170 m, 0 m, 1.2117647058823529", "100 m, 0 m, 1.36", "98.4 m, 0 m, 1.36", "98 m, 0 m, 1.36", "30 m, 0 m, 1.36"})
    void the_topography_factor_follows_the_slope(String length, String distance, double factor) {
        assertThat(ofSign(hill("30 m", length, distance), "topography-factor")).isCloseTo(factor, within(1e-12));
    }

    /** 98.4 m: 16.96 degrees, 1 + 1.2 x 30/98.4 = 1.36585, which the range of 6.3.3 cuts to 1.36. */
    @Test
    void just_below_seventeen_degrees_the_printed_range_cuts_the_factor() {
        ItemResult item = result(hill("30 m", "98.4 m", "0 m"), SIGN);
        assertThat(value(item, "topography-constant")).isCloseTo(1.2 * 30 / 98.4, within(1e-12)).isGreaterThan(0.36);
        assertThat(value(item, "topography-factor")).isEqualTo(1.36);
    }

    /** L_e = L = 170 m: influence from -255 m to 425 m. Steeper, 60 m: L_e = 30/0.3 = 100 m, from -150 m to 250 m. */
    @ParameterizedTest
    @CsvSource({"170 m, -255 m, true", "170 m, -256 m, false", "170 m, 425 m, true", "170 m, 426 m, false", "60 m, -150 m, true", "60 m, -151 m, false",
        "60 m, 250 m, true", "60 m, 251 m, false"})
    void the_hill_counts_inside_its_influence_only(String length, String distance, boolean inside) {
        double factor = ofSign(hill("30 m", length, distance), "topography-factor");
        assertThat(factor > 1).isEqualTo(inside);
    }

    @Test
    void the_place_on_the_slope_counts_as_the_worst_and_the_step_says_so() {
        Step s0 = step(result(hill("30 m", "170 m", "100 m"), SIGN), "topography-location-factor");
        assertThat(s0.value()).isEqualTo(1);
        assertThat(s0.status()).isEqualTo(Status.DERIVED);
        assertThat(s0.formula()).contains("charts");
    }

    @Test
    void ground_that_is_not_known_counts_as_the_worst() {
        ItemResult item = result(site("47 m/s", "unknown", "'ground-nearby': 'unknown'"), SIGN);
        assertThat(value(item, "topography-factor")).isEqualTo(1.36);
        assertThat(step(item, "topography-factor").formula()).contains("not known");
        assertThat(value(item, "terrain-factor")).as("category 1").isEqualTo(1.05);
    }

    @Test
    void a_cyclone_factor_takes_the_directionality_away() {
        ItemResult inland = result(DELHI, SIGN);
        assertThat(value(inland, "cyclone-factor")).isEqualTo(1);
        assertThat(value(inland, "directionality-factor")).isEqualTo(0.9);
        ItemResult coast = result(site("50 m/s", "2", "'k4': 1.15"), SIGN);
        assertThat(value(coast, "site-speed")).isCloseTo(57.5, within(1e-12));
        assertThat(value(coast, "directionality-factor")).isEqualTo(1);
        assertThat(value(coast, "design-pressure")).isCloseTo(0.6 * 57.5 * 57.5, within(1e-9));
        assertThat(ofSign(site("50 m/s", "2", "'k4': 1.15, 'directionality': 0.95"), "directionality-factor")).isEqualTo(0.95);
        assertThat(ofSign(site("50 m/s", "2", "'k4': 1.0"), "directionality-factor")).as("1.00 is a factor of the cyclone belt too").isEqualTo(1);
    }

    @Test
    void a_cyclone_factor_below_the_printed_ones_is_refused() {
        assertThat(result(site("50 m/s", "2", "'k4': 0.95"), SIGN).refusal().orElseThrow().reason()).contains("0.95 is below 1.0");
    }

    /** 0.5 x 1325.4 lies below 0.70 x 1325.4 = 927.78 Pa. */
    @Test
    void the_design_pressure_has_its_floor() {
        String site = site("47 m/s", "2", "'directionality': 0.5");
        assertThat(ofSign(site, "design-pressure")).isCloseTo(927.78, within(1e-9));
        assertThat(value(result(site, SIGN), "member-pressure/edge-on")).isCloseTo(927.78, within(1e-9));
    }

    /** Board of 50 m² on two posts, 25 m² each: K_a 0.9, p_d = 0.9 x 0.9 x 1325.4; 17.5 m² each: 0.95. Walls and edges have none. */
    @Test
    void the_area_factor_is_for_boards_and_not_for_walls_and_edges() {
        ItemResult board = result(DELHI, sign("20 m", "2.5 m", "2 m"));
        assertThat(value(board, "design-pressure")).isCloseTo(0.81 * 1325.4, within(1e-9));
        assertThat(value(board, "member-pressure/edge-on")).as("K_d 1.0 of circular forms").isCloseTo(1325.4, within(1e-9));
        assertThat(value(result(DELHI, sign("14 m", "2.5 m", "2 m")), "area-factor")).isCloseTo(0.95, within(1e-12));
        assertThat(value(result(DELHI, Is875Jobs.hoarding("40 m", "2.5 m", "0 m", "")), "area-factor")).isEqualTo(1);
    }

    @Test
    void loads_are_characteristic_and_the_factor_on_them_is_told_to_be_from_memory() {
        Level level = result(DELHI, SIGN).loads().orElseThrow().level();
        assertThat(level.name()).isEqualTo("characteristic");
        assertThat(level.factor()).isEqualTo(1.5);
        assertThat(level.status()).isEqualTo(Status.RECALLED);
    }

    @Test
    void miles_and_feet_give_the_same_sheet() {
        ItemResult us = result(site("100 mph", "3", "'structure-class': 'important'"), sign("12 ft", "5 ft", "8 ft"));
        ItemResult si = result(site("44.704 m/s", "3", "'structure-class': 'important'"), sign("3.6576 m", "1.524 m", "2.4384 m"));
        List<Step> steps = si.sheet().steps();
        assertThat(us.sheet().steps()).hasSameSizeAs(steps);
        // A footing that was not typed is sized in the units of the job.
        for (int i = 0; i < steps.size() && !steps.get(i).name().equals("footing-width"); i++) {
            assertThat(us.sheet().steps().get(i).value()).as(steps.get(i).name()).isCloseTo(steps.get(i).value(), within(1e-9 * Math.max(1, Math.abs(steps.get(i).value()))));
        }
    }
}
