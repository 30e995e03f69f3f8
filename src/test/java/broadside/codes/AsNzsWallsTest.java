package broadside.codes;

import static broadside.codes.AsNzsJobs.GUST_45;
import static broadside.codes.AsNzsJobs.job;
import static broadside.codes.AsNzsJobs.result;
import static broadside.codes.AsNzsJobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.assess.ItemResult;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Panels flat on the walls of a building, AS/NZS 1170.2 section 5, against hand calculations. */
class AsNzsWallsTest {

    private static final String SITE = GUST_45 + ",\"terrain\":\"3\"";

    private static String panel(String backing, double width, double height, double corner, String building) {
        return "{\"mark\":\"F\",\"kind\":\"facade-panel\",\"backing\":\"" + backing + "\",\"width\":\"" + width + " m\",\"height\":\"" + height
            + " m\",\"bottom\":\"2 m\",\"distance-from-corner\":\"" + corner + " m\",\"building\":{" + building + "}}";
    }

    private static String building(double width, double depth, double height, String more) {
        return "\"width\":\"" + width + " m\",\"depth\":\"" + depth + " m\",\"height\":\"" + height + " m\"" + more;
    }

    private static ItemResult facade(String item) {
        return result(job("2011", SITE, item));
    }

    private static List<ZonePressure> pulled(ItemResult item) {
        return item.loads().orElseThrow().cases().stream().filter(c -> c.name().equals("pulled")).findFirst().orElseThrow().zones().get(0).zones();
    }

    private static String zones(ItemResult item) {
        return pulled(item).stream().map(z -> z.zone() + " " + Math.round(z.from() * 1000) / 1000.0 + "-" + Math.round(z.to() * 1000) / 1000.0).reduce((a, b) -> a + ", " + b).orElseThrow();
    }

    /**
     * Building 20 m by 15 m, 8 m high: a = min(4; 3; 8) = 3 m; q = 0.6 (45 x 0.83)^2 = 837.01 Pa. Panel 1 m by 1 m at the corner, 1 m2 below 0.25 a2 = 2.25 m2: pushed
     * 0.7 x 1.5 = 1.05; pulled within 1.5 m -0.65 x 2 = -1.3.
     */
    @Test
    void small_panel_at_the_corner() {
        ItemResult item = facade(panel("wall", 1, 1, 0, building(20, 15, 8, "")));
        assertThat(item.sheet().find("velocity-pressure").orElseThrow().value()).isCloseTo(837.01, within(0.01));
        assertThat(value(item, "reference-height")).isEqualTo(8);
        assertThat(value(item, "pressure/WA1")).isCloseTo(1.05 * 837.01, within(0.02));
        assertThat(value(item, "pressure/SA2")).isCloseTo(-1.3 * 837.01, within(0.02));
        assertThat(item.loads().orElseThrow().cases()).extracting(CaseAction::name).containsExactly("pushed", "pulled");
    }

    /** Local zones go by the area of the panel against a2 = 9 m2 and a quarter of it, and by the distance from the corner. */
    @ParameterizedTest
    @CsvSource({"1, 1, 0, SA2 0.0-1.0", "1, 1, 1, 'SA2 0.0-0.5, SA1 0.5-1.0'", "1, 1, 3, side 0.0-1.0", "4, 1, 0, 'SA1 0.0-3.0, side 3.0-4.0'", "4, 3, 0, side 0.0-4.0", "2.25, 1, 0, 'SA2 0.0-1.5, SA1 1.5-2.25'",
        "3, 3, 0, SA1 0.0-3.0"})
    void zones_by_area_and_distance(double width, double height, double corner, String expected) {
        assertThat(zones(facade(panel("wall", width, height, corner, building(20, 15, 8, ""))))).isEqualTo(expected);
    }

    /** Building 3 m high: from the corner -0.65 to 3 m, -0.5 to 6 m, -0.3 to 9 m, -0.2 beyond; the leeward wall has -0.5 with d/b = 15/60. a = 3 m; the panel has 6 m2. */
    @Test
    void far_from_both_corners_the_leeward_wall_counts() {
        ItemResult item = facade(panel("wall", 12, 0.5, 2, building(60, 15, 3, "")));
        assertThat(zones(item)).isEqualTo("SA1 0.0-1.0, leeward 1.0-12.0");
        assertThat(value(item, "coefficient/leeward")).isEqualTo(-0.5);
        assertThat(value(item, "coefficient/SA1")).isCloseTo(-0.65 * 1.5, within(1e-9));
    }

    /** A deep building, d/b = 40/10 = 4, has -0.2 on its leeward wall, and d/b = 3 is half-way between -0.3 and -0.2. */
    @Test
    void leeward_wall_by_depth() {
        assertThat(zones(facade(panel("wall", 1, 0.5, 4.5, building(10, 40, 3, ""))))).isEqualTo("side-1h 0.0-1.0");
        ItemResult item = facade(panel("wall", 1, 0.5, 14.5, building(30, 90, 3, "")));
        assertThat(zones(item)).isEqualTo("leeward 0.0-1.0");
        assertThat(value(item, "coefficient/leeward")).isCloseTo(-0.25, within(1e-9));
    }

    /** A panel over the whole of a short face has its hardest zones at both ends; they are one zone on the sheet. */
    @Test
    void both_corners_count() {
        ItemResult item = facade(panel("wall", 10, 0.4, 0, building(10, 10, 8, "")));
        // a = 2 m, a2 = 4 m2, the panel has 4 m2.
        assertThat(zones(item)).isEqualTo("SA1 0.0-2.0, side 2.0-8.0, SA1 8.0-10.0");
        assertThat(item.sheet().steps().stream().filter(s -> s.name().equals("pressure/SA1"))).hasSize(1);
    }

    /** Area reduction on side walls: 17.5 m2 is half-way between 1.0 and 0.9; not on the windward wall. */
    @Test
    void area_factor() {
        ItemResult item = facade(panel("wall", 7, 2.5, 0, building(20, 15, 8, "")));
        assertThat(value(item, "coefficient/side")).isCloseTo(-0.65 * 0.95, within(1e-9));
        assertThat(value(item, "coefficient/windward")).isEqualTo(0.7);
    }

    /** The skin of an enclosed building: 0.7 + 0.3 and -0.65 - 0.2; with a dominant opening 0.7 + 0.65 and -0.65 - 0.7; an open building is not covered. */
    @Test
    void internal_pressure() {
        ItemResult enclosed = facade(panel("skin", 4, 3, 0, building(20, 15, 8, "")));
        assertThat(value(enclosed, "coefficient/windward")).isCloseTo(1.0, within(1e-9));
        // 12 m2: K_a = 1 - 0.1 x 2/15.
        assertThat(value(enclosed, "coefficient/side")).isCloseTo(-0.65 * (1 - 0.2 / 15) - 0.2, within(1e-9));
        ItemResult opened = facade(panel("skin", 2, 1, 5, building(20, 15, 8, ",\"enclosure\":\"partially enclosed\"")));
        assertThat(value(opened, "coefficient/WA1")).isCloseTo(0.7 * 1.5 + 0.65, within(1e-9));
        assertThat(value(opened, "coefficient/side")).isCloseTo(-0.65 - 0.7, within(1e-9));
        ItemResult open = facade(panel("skin", 2, 1, 5, building(20, 15, 8, ",\"enclosure\":\"open\"")));
        assertThat(open.refusal().orElseThrow().reason()).contains("open building");
        assertThat(facade(panel("wall", 2, 1, 5, building(20, 15, 8, ",\"enclosure\":\"open\""))).loads()).isPresent();
    }

    /** Above 25 m the windward wall has 0.8 and the local factors of slender buildings count. At 25 m it is still a low building. */
    @Test
    void high_buildings() {
        ItemResult low = facade(panel("wall", 1, 1, 0, building(20, 15, 25, "")));
        assertThat(zones(low)).isEqualTo("SA2 0.0-1.0");
        assertThat(value(low, "external-coefficient/WA1")).isEqualTo(0.7);
        ItemResult high = facade(panel("wall", 4, 0.5, 0, building(20, 15, 26, "")));
        assertThat(value(high, "external-coefficient/WA1")).isEqualTo(0.8);
        assertThat(zones(high)).isEqualTo("SA5 0.0-1.5, SA4 1.5-3.0, SA3 3.0-4.0");
        assertThat(value(high, "coefficient/SA5")).isCloseTo(-1.95, within(1e-9));
        assertThat(value(high, "coefficient/SA4")).isCloseTo(-1.3, within(1e-9));
        assertThat(value(high, "coefficient/SA3")).isCloseTo(-0.975, within(1e-9));
    }

    /** Below a roof of 10 degrees or more the leeward coefficient is not known: the largest suction of a side wall stands for it. */
    @Test
    void a_steep_roof() {
        ItemResult item = facade(panel("wall", 12, 0.5, 2, building(60, 15, 3, ",\"roof-slope\":\"10 deg\"")));
        assertThat(zones(item)).isEqualTo("SA1 0.0-1.0, leeward 1.0-12.0");
        assertThat(value(item, "coefficient/leeward")).isEqualTo(-0.65);
        assertThat(item.sheet().find("external-coefficient/leeward").orElseThrow().formula()).contains("not known here");
        assertThat(value(facade(panel("wall", 12, 0.5, 2, building(60, 15, 3, ",\"roof-slope\":\"9.9 deg\""))), "coefficient/leeward")).isEqualTo(-0.5);
    }

    /** The authority's least pressure counts outward too. */
    @Test
    void the_authoritys_least_pressure_counts_both_ways() {
        ItemResult item = result(job("2011", SITE + ",\"authority-minimum-pressure\":\"1 kPa\"", panel("wall", 4, 3, 0, building(20, 15, 8, ""))));
        assertThat(value(item, "pressure/windward")).isEqualTo(1000);
        assertThat(value(item, "pressure/side")).isEqualTo(-1000);
        assertThat(item.notes()).anyMatch(n -> n.text().equals("The authority's least pressure governs in every zone."));
    }

    /** The editions differ in the symbol of the shape factor, and in terrain 3 in nothing else. */
    @Test
    void the_editions_agree_in_terrain_3() {
        ItemResult now = result(job("2021", SITE, panel("skin", 2, 1, 0.5, building(20, 15, 8, ""))));
        ItemResult before = facade(panel("skin", 2, 1, 0.5, building(20, 15, 8, "")));
        assertThat(value(now, "pressure/SA2")).isEqualTo(value(before, "pressure/SA2"));
        assertThat(now.sheet().find("coefficient/SA2").orElseThrow().symbol()).isEqualTo("C_{shp,SA2}");
        assertThat(before.sheet().find("coefficient/SA2").orElseThrow().symbol()).isEqualTo("C_{fig,SA2}");
    }
}
