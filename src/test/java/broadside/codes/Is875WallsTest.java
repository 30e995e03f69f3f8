package broadside.codes;

import static broadside.codes.Is875Jobs.DELHI;
import static broadside.codes.Is875Jobs.building;
import static broadside.codes.Is875Jobs.facade;
import static broadside.codes.Is875Jobs.result;
import static broadside.codes.Is875Jobs.site;
import static broadside.codes.Is875Jobs.step;
import static broadside.codes.Is875Jobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.assess.ItemResult;
import broadside.codes.LoadCase.Windward;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Panels on walls of buildings by table 5 of IS 875 (Part 3). Below 10 m in terrain 2 at 47 m/s p_z is 1325.4 Pa, p_d 1192.86 Pa. */
class Is875WallsTest {

    private static final String SMALL = "'width': '2 m', 'height': '1 m'";

    private static ItemResult panel(double width, double depth, double height) {
        return result(DELHI, facade("wall", SMALL, "0 m", building(width + " m", depth + " m", height + " m")));
    }

    private static List<Double> coefficients(ItemResult item) {
        return List.of(value(item, "coefficient/pushed/general"), value(item, "coefficient/pulled/general"), value(item, "coefficient/local"));
    }

    /** Width of the face, depth, height; windward; the worse of side and leeward; local. Where both rows print l/w = 3/2 the worse counts. */
    @ParameterizedTest
    @CsvSource({
        "15, 12, 6, 0.7, -0.5, -0.8", "12, 15, 6, 0.7, -0.5, -0.8", "18, 12, 6, 0.7, -0.5, -0.8", "12, 18, 6, 0.7, -0.5, -0.8",
        "18.1, 12, 6, 0.7, -0.5, -1.0", "12, 18.1, 6, 0.7, -0.6, -1.0", "47.9, 12, 6, 0.7, -0.5, -1.0",
        "15, 12, 6.1, 0.7, -0.6, -1.1", "12, 15, 18, 0.7, -0.6, -1.1", "18, 12, 12, 0.7, -0.6, -1.1", "12, 18, 12, 0.7, -0.7, -1.1", "24, 12, 12, 0.7, -0.5, -1.1", "12, 24, 12, 0.7, -0.7, -1.1",
        "15, 12, 18.1, 0.8, -0.8, -1.2", "12, 15, 24, 0.8, -0.8, -1.2", "18, 12, 24, 0.8, -0.8, -1.2", "12, 18, 24, 0.8, -0.8, -1.2", "24, 12, 24, 0.7, -0.5, -1.2", "12, 24, 24, 0.8, -0.7, -1.2",
        "12, 12, 6, 0.7, -0.5, -0.8", "12, 12, 12, 0.7, -0.6, -1.1", "12, 12, 24, 0.8, -0.8, -1.2", "12, 12, 72, 0.95, -1.25, -1.25"})
    void every_row_and_both_faces(double width, double depth, double height, double push, double pull, double local) {
        assertThat(coefficients(panel(width, depth, height))).containsExactly(push, pull, local);
    }

    @ParameterizedTest
    @CsvSource({"48, 12, 6, no row", "12, 60, 12, no row", "13, 12, 72, no row", "24, 12, 72, not held here", "12, 18, 72, not held here"})
    void what_the_table_does_not_give_is_refused(double width, double depth, double height, String reason) {
        ItemResult item = panel(width, depth, height);
        assertThat(item.outcome()).isEqualTo(ItemResult.Outcome.NOT_COVERED);
        assertThat(item.refusal().orElseThrow().reason()).contains(reason);
        assertThat(item.refusal().orElseThrow().clause()).contains("table 5");
    }

    /**
     * Panel 4 m by 3 m, 1 m from the corner of a wall of 20 m; building 10 m deep and 9 m high: strip 0.25 x 10 = 2.5 m, so 1.5 m of the panel lie in it.
     * Pushed 0.7 x 1192.86 = 835.002 Pa; pulled 0.5 x 1192.86 = 596.43 Pa, in the strip 1.1 x 1325.4 (K_d = 1) = 1457.94 Pa; force over the whole panel 12 x 1457.94 = 17 495.28 N.
     */
    @Test
    void a_panel_across_the_edge_of_the_strip_by_hand() {
        ItemResult item = result(DELHI, facade("wall", "'width': '4 m', 'height': '3 m'", "1 m", building("20 m", "10 m", "9 m")));
        assertThat(value(item, "pressure/pushed/general")).isCloseTo(835.002, within(1e-6));
        assertThat(value(item, "pressure/pulled/general")).isCloseTo(-596.43, within(1e-6));
        assertThat(value(item, "pressure/local")).isCloseTo(-1457.94, within(1e-6));
        assertThat(value(item, "zone-width/local")).isCloseTo(2.5, within(1e-12));
        CaseAction pulled = item.loads().orElseThrow().cases().get(1);
        assertThat(pulled.name()).isEqualTo("pulled");
        assertThat(pulled.force()).isCloseTo(17495.28, within(1e-5));
        assertThat(pulled.zones().get(0).zones()).extracting(ZonePressure::zone).containsExactly("local", "general");
        assertThat(pulled.zones().get(0).zones().get(0).to()).isCloseTo(1.5, within(1e-12));
        CaseAction pushed = item.loads().orElseThrow().cases().get(0);
        assertThat(pushed.name()).isEqualTo("pushed");
        assertThat(pushed.force()).isCloseTo(12 * 835.002, within(1e-5));
        assertThat(pushed.windward()).isEqualTo(Windward.NONE);
    }

    /** Wall of 20 m, strips of 2.5 m at both ends; a panel of 2 m. */
    @ParameterizedTest
    @CsvSource({"0 m, 2 m, local", "0.5 m, 2 m, local", "2.5 m, 2 m, general", "2.4 m, 2 m, local general", "10 m, 2 m, general", "15.5 m, 2 m, general", "15.6 m, 2 m, general local",
        "17.5 m, 2 m, local", "18 m, 2 m, local", "1 m, 18 m, local general local"})
    void the_strips_beside_both_corners_count(String corner, String width, String zones) {
        ItemResult item = result(DELHI, facade("wall", "'width': '" + width + "', 'height': '1 m'", corner, building("20 m", "10 m", "9 m")));
        assertThat(item.loads().orElseThrow().cases().get(1).zones().get(0).zones()).extracting(ZonePressure::zone).containsExactly(zones.split(" "));
        assertThat(item.loads().orElseThrow().cases().get(0).zones().get(0).zones()).extracting(ZonePressure::zone).containsExactly("general");
    }

    /** 8 ft 2.425 in is a quarter of 32 ft 9.7 in: the panel begins where the strip ends. */
    @Test
    void a_panel_that_begins_where_the_strip_ends_lies_outside_it() {
        ItemResult item = result(DELHI, facade("wall", SMALL, "8 ft 2.425 in", building("65 ft 7.4 in", "32 ft 9.7 in", "9 m")));
        assertThat(item.loads().orElseThrow().cases().get(1).zones().get(0).zones()).extracting(ZonePressure::zone).containsExactly("general");
    }

    /** Skin: C_pi 0.2, 0.5, 0.7. Pushed (0.7 + C_pi) p_d, pulled (-0.5 - C_pi) p_d, in the strip (-1.1 - C_pi) p_z. */
    @ParameterizedTest
    @CsvSource({"enclosed, 0.2", "partially enclosed, 0.5", "open, 0.7"})
    void the_skin_of_a_building_has_internal_pressure_too(String enclosure, double internal) {
        ItemResult item = result(DELHI, facade("skin", SMALL, "1 m", building("20 m", "10 m", "9 m") + ", 'enclosure': '" + enclosure + "'"));
        assertThat(value(item, "pressure/pushed/general")).isCloseTo((0.7 + internal) * 1192.86, within(1e-9));
        assertThat(value(item, "pressure/pulled/general")).isCloseTo(-(0.5 + internal) * 1192.86, within(1e-9));
        assertThat(value(item, "pressure/local")).isCloseTo(-(1.1 + internal) * 1325.4, within(1e-9));
        ItemResult wall = result(DELHI, facade("wall", SMALL, "1 m", building("20 m", "10 m", "9 m") + ", 'enclosure': '" + enclosure + "'"));
        assertThat(wall.sheet().find("internal-coefficient")).isEmpty();
    }

    /** Suction of 596.43 Pa and pressure of 835.002 Pa are raised to 1000 Pa each; 1457.94 Pa stays. */
    @Test
    void an_authority_s_least_pressure_counts_for_suction_too() {
        ItemResult item = result(site("47 m/s", "2", "'authority-minimum-pressure': '1 kN/m2'"), facade("wall", SMALL, "1 m", building("20 m", "10 m", "9 m")));
        assertThat(value(item, "pressure/pushed/general")).isEqualTo(1000);
        assertThat(value(item, "pressure/pulled/general")).isEqualTo(-1000);
        assertThat(value(item, "pressure/local")).isCloseTo(-1457.94, within(1e-6));
    }

    @Test
    void cyclones_take_the_directionality_away_and_the_wind_is_that_at_the_top_of_the_building() {
        ItemResult item = result(site("50 m/s", "2", "'k4': 1.15"), facade("wall", SMALL, "5 m", building("20 m", "10 m", "15 m")));
        assertThat(value(item, "reference-height")).isEqualTo(15);
        assertThat(value(item, "velocity-pressure")).isCloseTo(0.6 * Math.pow(50 * 1.05 * 1.15, 2), within(1e-9));
        assertThat(value(item, "design-pressure")).isEqualTo(value(item, "velocity-pressure"));
        assertThat(step(item, "area-factor").formula()).contains("fixings share the panel");
    }
}
