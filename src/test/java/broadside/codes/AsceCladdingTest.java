package broadside.codes;

import static broadside.codes.AsceJobs.result;
import static broadside.codes.AsceJobs.step;
import static broadside.codes.AsceJobs.value;
import static broadside.codes.AsceJobs.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.assess.ItemResult;
import broadside.codes.LoadCase.Windward;
import broadside.trace.Status;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Panels on the walls of buildings, ASCE 7 chapter 30 and 29.3.2. */
class AsceCladdingTest {

    private static final String HALL = "'width':'30 m','depth':'20 m','height':'12 m'";
    private static final String TOWER = "'width':'30 m','depth':'24 m','height':'40 m'";

    private static String panel(String backing, String width, String height, String bottom, String corner, String building, String more) {
        return "'kind':'facade-panel','backing':'" + backing + "','width':'" + width + "','height':'" + height + "','bottom':'" + bottom + "','distance-from-corner':'" + corner
            + "','building':{" + building + "}" + more;
    }

    private static ItemResult skin(String edition, String speed, String exposure, String building) {
        return result(edition, wind(speed, exposure), panel("skin", "2 m", "3 m", "4 m", "0.5 m", building, ""));
    }

    /**
     * Panel 2 m by 3 m on a hall 12 m high, 0.5 m from the corner, 50 m/s, exposure C, skin of an enclosed building.
     * 7-16: K_h = 2.01 (12/274.32)^(2/9.5) = 1.040099, q_h = 0.613343 x 1.040099 x 0.85 x 2500 = 1355.62 Pa.
     * 7-22: K_h = 2.41 (12/749.808)^(2/9.8) = 1.036415, q_h = 1589.20 Pa, times K_d 0.85 = 1350.82 Pa.
     * a = min(0.1 x 20, 0.4 x 12) = 2 m: 1.5 m of the panel in zone 5, 0.5 m in zone 4. A = 3 x 2 = 6 m2 = 64.583 ft2, log A = 1.81012:
     * GC_p = 1.1766 - 0.1766 log A = 0.85693; zone 4 -(1.2766 - 0.1766 log A) = -0.95693; zone 5 -(1.7532 - 0.3532 log A) = -1.11387.
     * With 0.18 inside: 7-16 1405.7, -1541.2, -1754.0 Pa; 7-22 1400.7, -1535.8, -1747.8 Pa. The forms are rounded to four decimals.
     */
    @ParameterizedTest
    @CsvSource({"16, 1355.62, 1405.7, -1541.2, -1754.0", "22, 1589.20, 1400.7, -1535.8, -1747.8"})
    void a_low_building_by_hand(String edition, double q, double pushed, double four, double five) {
        ItemResult item = skin(edition, "50 m/s", "C", HALL);
        assertThat(value(item, "velocity-pressure")).isCloseTo(q, within(0.05));
        assertThat(value(item, "edge-zone-width")).isCloseTo(2, within(1e-12));
        assertThat(value(item, "effective-area")).isCloseTo(6, within(1e-12));
        assertThat(value(item, "external-coefficient/pushed/4")).isCloseTo(0.85693, within(1e-4));
        assertThat(value(item, "pressure/pushed/4")).isCloseTo(pushed, within(0.3));
        assertThat(value(item, "pressure/pushed/5")).isCloseTo(pushed, within(0.3));
        assertThat(value(item, "pressure/pulled/4")).isCloseTo(four, within(0.3));
        assertThat(value(item, "pressure/pulled/5")).isCloseTo(five, within(0.3));
        List<CaseAction> cases = item.loads().orElseThrow().cases();
        assertThat(cases).extracting(CaseAction::name).containsExactly("pushed", "pulled");
        assertThat(cases.get(1).zones().get(0).zones()).extracting(ZonePressure::zone).as("from the edge nearer the corner").containsExactly("5", "4");
        assertThat(cases.get(1).zones().get(0).zones().get(0).width()).isCloseTo(1.5, within(1e-12));
        assertThat(cases.get(1).windward()).isEqualTo(Windward.NONE);
        assertThat(cases.get(1).force()).as("the worse zone over all of it").isCloseTo(-five * 6, within(2.0));
        assertThat(item.sheet().steps().stream().filter(s -> s.name().equals("velocity-pressure"))).hasSize(1);
        assertThat(item.sheet().steps().stream().filter(s -> s.name().equals("reference-height"))).hasSize(1);
    }

    /**
     * Panel 3 m by 3 m with its top at 20 m on a tower 40 m high and 24 m deep, 50 m/s, exposure B, 0.5 m from the corner; a = 2.4 m.
     * A = 9 m2 = 96.875 ft2: GC_p = 1.1792 - 0.2146 log A = 0.75296; -(1.0861 - 0.1431 log A) = -0.80187; -(2.5445 - 0.5723 log A) = -1.40779.
     * 7-16: q_h = 1392.03 Pa, q_z at 20 m = 1141.93 Pa; 0.75296 q_z + 0.18 q_h = 1110.4; -0.98187 q_h = -1366.8; -1.58779 q_h = -2210.3 Pa.
     * 7-22: q_h = 1566.41 Pa, q_z = 1302.06 Pa, the same times 0.85: 1073.0, -1307.3, -2114.1 Pa.
     */
    @ParameterizedTest
    @CsvSource({"16, 1392.03, 1141.93, 1110.4, -1366.8, -2210.3", "22, 1566.41, 1302.06, 1073.0, -1307.3, -2114.1"})
    void a_high_building_by_hand(String edition, double qh, double qz, double pushed, double four, double five) {
        ItemResult item = result(edition, wind("50 m/s", "B"), panel("skin", "3 m", "3 m", "17 m", "0.5 m", TOWER, ""));
        assertThat(value(item, "velocity-pressure")).isCloseTo(qh, within(0.05));
        assertThat(value(item, "velocity-pressure/pushed")).isCloseTo(qz, within(0.05));
        assertThat(value(item, "edge-zone-width")).isCloseTo(2.4, within(1e-12));
        assertThat(value(item, "pressure/pushed/4")).isCloseTo(pushed, within(0.3));
        assertThat(value(item, "pressure/pulled/4")).isCloseTo(four, within(0.3));
        assertThat(value(item, "pressure/pulled/5")).isCloseTo(five, within(0.3));
        assertThat(step(item, "external-coefficient/pulled/5").status()).as("between the printed areas").isEqualTo(Status.RECALLED);
        assertThat(item.loads().orElseThrow().velocity().height()).isEqualTo(40);
    }

    /** Printed end values of the table, in square feet: 10 and 500 up to 60 ft, 20 and 500 above. */
    @ParameterizedTest
    @CsvSource({"18 m, 0.5 m, 1.0, -1.1, -1.4", "18 m, 7 m, 0.7, -0.8, -0.8", "19 m, 1 m, 0.9, -0.9, -1.8", "19 m, 7 m, 0.6, -0.7, -1.0"})
    void end_values(String height, String side, double pushed, double four, double five) {
        ItemResult item = result("22", wind("60 m/s", "C"), panel("wall", side, side, "4 m", side.equals("7 m") ? "1 m" : "1.6 m",
            "'width':'30 m','depth':'20 m','height':'" + height + "'", ""));
        assertThat(value(item, "coefficient/pushed/4")).isEqualTo(pushed);
        assertThat(value(item, "coefficient/pushed/5")).isEqualTo(pushed);
        assertThat(value(item, "coefficient/pulled/4")).isEqualTo(four);
        assertThat(value(item, "coefficient/pulled/5")).isEqualTo(five);
        assertThat(step(item, "external-coefficient/pulled/5").status()).isEqualTo(Status.SECOND_HAND);
    }

    /** The span by a third of it where the panel is narrow: 6 m by 1 m counts as 6 x 2 = 12 m2, upright or lying. */
    @Test
    void a_narrow_panel_counts_a_third_of_its_span() {
        assertThat(value(result("16", wind("50 m/s", "C"), panel("wall", "6 m", "1 m", "4 m", "3 m", HALL, "")), "effective-area")).isCloseTo(12, within(1e-12));
        assertThat(value(result("16", wind("50 m/s", "C"), panel("wall", "1 m", "6 m", "4 m", "3 m", HALL, "")), "effective-area")).isCloseTo(12, within(1e-12));
    }

    /** A tenth of the least dimension or 0.4 h, not below 0.04 of it nor 3 ft. */
    @ParameterizedTest
    @CsvSource({"30 m, 20 m, 12 m, 2", "30 m, 20 m, 4 m, 1.6", "60 m, 80 m, 3 m, 2.4", "8 m, 5 m, 4 m, 0.9144", "30 m, 24 m, 40 m, 2.4", "6 m, 8 m, 40 m, 0.9144"})
    void width_of_the_edge_zone(String width, String depth, String height, double a) {
        ItemResult item = result("16", wind("60 m/s", "C"), panel("wall", "1 m", "1 m", "1 m", "1 m", "'width':'" + width + "','depth':'" + depth + "','height':'" + height + "'", ""));
        assertThat(value(item, "edge-zone-width")).isCloseTo(a, within(1e-9));
    }

    /** Distance from the nearer corner of a face 30 m wide with a = 2 m, and what a panel covers. */
    @ParameterizedTest
    @CsvSource({"2 m, 2 m, 4", "0.1 m, 1.9 m, 5", "1 m, 4 m, 5 4", "0 m, 30 m, 5 4 5", "26.5 m, 3 m, 4 5", "28 m, 2 m, 5", "1.9999 m, 2 m, 5 4"})
    void zones_of_a_panel(String corner, String width, String zones) {
        ItemResult item = result("22", wind("60 m/s", "C"), panel("wall", width, "2 m", "4 m", corner, HALL, ""));
        List<ZonePressure> found = item.loads().orElseThrow().cases().get(1).zones().get(0).zones();
        assertThat(String.join(" ", found.stream().map(ZonePressure::zone).toList())).isEqualTo(zones);
        assertThat(found.stream().mapToDouble(ZonePressure::width).sum()).isCloseTo(Double.parseDouble(width.replace(" m", "")), within(1e-9));
        assertThat(found.get(0).from()).isZero();
    }

    @Test
    void a_face_narrower_than_two_edge_zones_is_all_zone_5() {
        ItemResult item = result("22", wind("60 m/s", "C"), panel("wall", "1.6 m", "2 m", "4 m", "0 m", "'width':'1.6 m','depth':'20 m','height':'12 m'", ""));
        assertThat(item.loads().orElseThrow().cases().get(1).zones().get(0).zones()).extracting(ZonePressure::zone).containsExactly("5");
    }

    /** Nine tenths up to 10 degrees on a low building; not where the slope is not known, nor on a high one. */
    @ParameterizedTest
    @CsvSource({"12 m, 10 deg, 0.9", "12 m, 0 deg, 0.9", "12 m, 10.1 deg, 1", "12 m, '', 1", "40 m, 2 deg, 1"})
    void reduction_below_a_flat_roof(String height, String slope, double factor) {
        String building = "'width':'30 m','depth':'20 m','height':'" + height + "'" + (slope.isEmpty() ? "" : ",'roof-slope':'" + slope + "'");
        ItemResult item = result("16", wind("60 m/s", "C"), panel("skin", "2 m", "3 m", "4 m", "5 m", building, ""));
        assertThat(value(item, "coefficient/pulled/4")).isCloseTo(factor * value(item, "external-coefficient/pulled/4") - 0.18, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({"skin, enclosed, 0.18", "skin, partially enclosed, 0.55", "skin, open, 0", "wall, partially enclosed, 0"})
    void internal_pressure(String backing, String enclosure, double printed) {
        ItemResult item = result("22", wind("60 m/s", "C"), panel(backing, "2 m", "3 m", "4 m", "5 m", HALL + ",'enclosure':'" + enclosure + "'", ""));
        assertThat(value(item, "internal-coefficient")).isEqualTo(printed);
        assertThat(value(item, "coefficient/pushed/4")).isCloseTo(value(item, "external-coefficient/pushed/4") + printed, within(1e-12));
        assertThat(value(item, "coefficient/pulled/4")).isCloseTo(value(item, "external-coefficient/pulled/4") - printed, within(1e-12));
    }

    /** 16 psf is 766.08 Pa. */
    @ParameterizedTest
    @ValueSource(strings = {"16", "22"})
    void not_below_16_psf_either_way(String edition) {
        ItemResult item = skin(edition, "25 m/s", "B", HALL);
        assertThat(value(item, "pressure/pushed/4")).isCloseTo(766.08, within(0.01));
        assertThat(value(item, "pressure/pulled/4")).isCloseTo(-766.08, within(0.01));
    }

    @ParameterizedTest
    @CsvSource({"16, B, 6 m, 0.70", "22, B, 9.144 m, 0.70", "16, B, 9.144 m, 0.70059", "22, C, 4 m, 0.85115"})
    void cladding_in_exposure_b_has_the_coefficient_of_30_feet(String edition, String exposure, String height, double k) {
        ItemResult item = result(edition, wind("60 m/s", exposure), panel("wall", "1 m", "1 m", "1 m", "3 m", "'width':'30 m','depth':'20 m','height':'" + height + "'", ""));
        assertThat(value(item, "exposure-factor")).isCloseTo(k, within(5e-6));
    }

    /** An authority's least pressure of 2 kPa holds for suction too. */
    @Test
    void the_authority_comes_last() {
        ItemResult item = result("16", wind("50 m/s", "C") + ",'authority-minimum-pressure':'2 kN/m2'", panel("skin", "2 m", "3 m", "4 m", "0.5 m", HALL, ""));
        assertThat(value(item, "pressure/pushed/4")).isEqualTo(2000);
        assertThat(value(item, "pressure/pulled/5")).isEqualTo(-2000);
        assertThat(value(item, "code-pressure/pulled/5")).isCloseTo(-1754.0, within(0.3));
    }

    @Test
    void a_sign_near_the_wall_and_inside_its_edges_is_cladding() {
        ItemResult near = result("22", wind("50 m/s", "C"), panel("wall", "2 m", "3 m", "4 m", "1 m", HALL, ",'gap':'0.9 m'"));
        ItemResult touching = result("22", wind("50 m/s", "C"), panel("wall", "2 m", "3 m", "4 m", "1 m", HALL, ""));
        assertThat(value(near, "pressure/pulled/5")).isEqualTo(value(touching, "pressure/pulled/5"));
        assertThat(near.sheet().find("free-standing-pressure")).isEmpty();
    }

    /**
     * Off the wall and 0.3 m from the corner it is a free-standing sign as well: 1.2 m by 2.5 m, top at 8.5 m, 50 m/s, exposure C, 7-16.
     * K_h = 2.01 (8.5/274.32)^(2/9.5) = 0.96716, q_h = 1260.55 Pa; s/h 0.2941, B/s 0.48: between the rows 0.3 and 0.2, columns 0.2 and 0.5:
     * C_f 1.8033 in both rows; p_f = 1260.55 x 0.85 x 1.8033 = 1932.2 Pa, more than the cladding takes.
     */
    @Test
    void a_sign_off_the_wall_at_its_edge_is_free_standing() {
        ItemResult item = result("16", wind("50 m/s", "C"), panel("wall", "1.2 m", "2.5 m", "6 m", "0.3 m", HALL, ",'gap':'40 mm'"));
        assertThat(value(item, "free-standing-pressure")).isCloseTo(1932.2, within(0.5));
        assertThat(value(item, "pressure/pushed/5")).isCloseTo(1932.2, within(0.5));
        assertThat(value(item, "pressure/pulled/5")).isCloseTo(-1932.2, within(0.5));
        assertThat(step(item, "pressure/pulled/5").formula()).contains("-p_f");
        assertThat(item.loads().orElseThrow().velocity().height()).as("the height of the building").isEqualTo(12);
        ItemResult top = result("16", wind("50 m/s", "C"), panel("wall", "1.2 m", "2.5 m", "9 m", "5 m", HALL, ",'gap':'40 mm'"));
        assertThat(top.sheet().find("free-standing-pressure")).as("half a metre below the top of the wall").isPresent();
    }

    /** A wide one has the first region of case C: 3 m by 1 m, B/s = 3, C_f = 2.60. */
    @Test
    void a_wide_sign_off_the_wall_has_the_pressure_of_its_end() {
        ItemResult item = result("22", wind("50 m/s", "C"), panel("wall", "3 m", "1 m", "6 m", "0.3 m", HALL, ",'gap':'40 mm'"));
        assertThat(value(item, "free-standing-pressure")).isEqualTo(value(item, "pressure/case-c/0-s/free-standing"));
        assertThat(value(item, "coefficient/case-c/0-s/free-standing")).isEqualTo(2.60);
    }

    @Test
    void a_wide_gap_is_refused() {
        ItemResult item = result("16", wind("50 m/s", "C"), panel("wall", "2 m", "3 m", "4 m", "5 m", HALL, ",'gap':'0.95 m'"));
        assertThat(item.loads()).isEmpty();
        assertThat(item.refusal().orElseThrow().clause()).isEqualTo("29.3.2");
        assertThat(item.refusal().orElseThrow().instead()).contains("sign on posts");
    }
}
