package broadside.codes;

import static broadside.codes.En1991Inputs.code;
import static broadside.codes.En1991Inputs.peakInTerrain2;
import static broadside.codes.En1991Inputs.site;
import static broadside.codes.En1991Inputs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.codes.En1991Inputs.Face;
import broadside.panel.Building.Enclosure;
import broadside.panel.FacadePanel.Backing;
import broadside.quantity.Pressure;
import broadside.site.Site;
import broadside.table.OutsideTable;
import broadside.trace.Trace;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Panels flat on walls of buildings, EN 1991-1-4, 7.2.2. */
class En1991FacadeTest {

    private static final Site OPEN_COUNTRY = site(26, "II");

    private static List<LoadCase> cases(Face face, Backing backing, Enclosure enclosure, Trace trace) {
        return code("").wallPressures(face.panel(backing, enclosure), OPEN_COUNTRY, trace);
    }

    private static List<LoadCase> onWall(Face face, Trace trace) {
        return cases(face, Backing.WALL, Enclosure.ENCLOSED, trace);
    }

    /**
     * Building 20 m wide, 12 m deep, 8 m high; panel 3 m by 2 m, 1 m from the corner. v_b 26 m/s, terrain II, z_e = 8 m:
     * c_r = 0.19 ln 160 = 0.964283, v_m = 25.0714 m/s, I_v = 0.197038, q_p = 2.379263 x 0.625 x 628.573 = 934.71 Pa.
     * Along the wall: e = min(12, 16) = 12 m; A to 2.4 m, B to 12 m, C to 20 m: the panel lies 1.4 m in A and 1.6 m in B.
     * 6 m2: log 6 = 0.778151. A -1.4 + 0.2 x 0.778151 = -1.24437, B -1.1 + 0.3 x 0.778151 = -0.866555.
     * On the face h/d = 8/12: D,10 0.7 + 0.1 x 0.416667/0.75 = 0.755556, D 1 - 0.244444 x 0.778151 = 0.809785; E -0.3 - 0.2 x 0.555556 = -0.411111.
     * w_A = -1163.1 Pa, w_D = 756.9 Pa.
     */
    @Test
    void a_panel_beside_the_corner() {
        Trace trace = new Trace();
        List<LoadCase> cases = onWall(new Face(20, 12, 8, 1, 3, 2, 2), trace);
        assertThat(cases).extracting(LoadCase::name).containsExactly("pushed", "pulled");
        assertThat(value(trace, "velocity-pressure")).isCloseTo(934.71, within(0.01));
        assertThat(value(trace, "reference-height")).isEqualTo(8);
        assertThat(value(trace, "zone-length")).isEqualTo(12);
        assertThat(cases.get(0).zones()).extracting(ZonePressure::zone).containsExactly("D");
        assertThat(cases.get(0).zones().get(0).pressure()).isCloseTo(756.9, within(0.05));
        assertThat(cases.get(1).zones()).extracting(ZonePressure::zone).containsExactly("A", "B");
        ZonePressure a = cases.get(1).zones().get(0);
        assertThat(a.pressure()).isCloseTo(-1163.1, within(0.05));
        assertThat(a.coefficient()).isCloseTo(-1.24437, within(5e-6));
        assertThat(a.from()).isZero();
        assertThat(a.to()).isCloseTo(1.4, within(1e-12));
        assertThat(value(trace, "coefficient/B")).isCloseTo(-0.866555, within(5e-7));
        assertThat(value(trace, "coefficient/E")).isCloseTo(-0.411111, within(5e-7));
    }

    /** The same panel one metre from the other corner: the zones come from its other edge. */
    @Test
    void the_farther_corner_counts_where_it_gives_more() {
        List<ZonePressure> zones = onWall(new Face(20, 12, 8, 16, 3, 2, 2), new Trace()).get(1).zones();
        assertThat(zones).extracting(ZonePressure::zone).containsExactly("B", "A");
        assertThat(zones.get(0).to()).isCloseTo(1.6, within(1e-9));
        assertThat(zones.get(1).to()).isCloseTo(3, within(1e-9));
    }

    /** As deep as 8 m and 40 m high: h/d = 5, so E has -0.7, and the middle of the wall has C with -0.5. */
    @Test
    void the_wind_from_behind_governs_in_the_middle_of_a_tall_wall() {
        Trace trace = new Trace();
        List<ZonePressure> zones = onWall(new Face(40, 8, 40, 18, 4, 4, 5), trace).get(1).zones();
        assertThat(zones).extracting(ZonePressure::zone).containsExactly("E");
        assertThat(zones.get(0).coefficient()).isCloseTo(-0.7, within(1e-12));
        assertThat(trace.find("governing-suction").orElseThrow().meaning()).contains("the wind from behind gives it");
        assertThat(value(trace, "coefficient/C")).isCloseTo(-0.5, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({"1, 1, -1.4, 1.0", "0.5, 0.5, -1.4, 1.0", "2.5, 4, -1.2, 0.8", "5, 4, -1.2, 0.8"})
    void one_and_ten_square_metres_are_the_printed_columns(double width, double height, double suction, double pressure) {
        Trace trace = new Trace();
        onWall(new Face(30, 10, 10, 0, width, height, 1), trace);
        assertThat(value(trace, "coefficient/A")).isEqualTo(suction);
        assertThat(value(trace, "coefficient/D")).isEqualTo(pressure);
    }

    /** 4.7 m over 0.94 m is 5 on paper and a bit more in binary. */
    @Test
    void a_building_five_times_as_high_as_deep_is_covered() {
        Trace trace = new Trace();
        onWall(new Face(4.7, 0.94, 4.7, 0, 1, 1, 1), trace);
        assertThat(value(trace, "coefficient/E")).isCloseTo(-0.7, within(1e-9));
    }

    /** Skin of a closed building: D + 0.3 and A - 0.2 on 1 m2. With a dominant opening: 0.9 x 1.4 and 0.9 x 1.0. */
    @Test
    void a_skin_takes_the_internal_pressure_too() {
        Face face = new Face(30, 10, 10, 0, 1, 1, 1);
        List<LoadCase> closed = cases(face, Backing.SKIN, Enclosure.ENCLOSED, new Trace());
        assertThat(closed.get(0).zones().get(0).coefficient()).isCloseTo(1.3, within(1e-12));
        assertThat(closed.get(1).zones().get(0).coefficient()).isCloseTo(-1.6, within(1e-12));
        List<LoadCase> dominant = cases(face, Backing.SKIN, Enclosure.PARTIALLY_ENCLOSED, new Trace());
        assertThat(dominant.get(0).zones().get(0).coefficient()).isCloseTo(1 + 1.26, within(1e-12));
        assertThat(dominant.get(1).zones().get(0).coefficient()).isCloseTo(-1.4 - 0.9, within(1e-12));
        assertThat(dominant.get(1).zones().get(0).pressure()).isCloseTo(-2.3 * peakInTerrain2(26, 10), within(1e-6));
    }

    @Test
    void open_buildings_and_slender_ones_are_not_covered() {
        Face face = new Face(30, 10, 10, 0, 1, 1, 1);
        assertThatThrownBy(() -> cases(face, Backing.SKIN, Enclosure.OPEN, new Trace())).isInstanceOf(NotCovered.class).hasMessageContaining("the building is open");
        assertThatThrownBy(() -> onWall(new Face(30, 5.9, 30, 0, 1, 1, 1), new Trace())).isInstanceOf(OutsideTable.class).hasMessageContaining("covers h/d from 0.25 to 5");
        assertThatThrownBy(() -> onWall(new Face(5.9, 30, 30, 0, 1, 1, 1), new Trace())).isInstanceOf(OutsideTable.class);
    }

    /**
     * Windward strips, figure 7.4, on a wall 10 m wide: by height of the building, height of the panel's upper edge and
     * the reference height that follows.
     */
    @ParameterizedTest
    @CsvSource({"10, 9, 10", "9, 4, 9", "15, 4, 10", "15, 10, 10", "15, 10.5, 15", "20, 11, 20", "30, 9, 10", "30, 10.5, 10.5", "30, 17, 17", "30, 20, 20", "30, 20.5, 30"})
    void the_windward_face_is_cut_into_strips(double height, double top, double reference) {
        Trace trace = new Trace();
        LoadCase pushed = onWall(new Face(10, 20, height, 4, 1, 1, top - 1), trace).get(0);
        assertThat(pushed.zones().get(0).pressure()).isCloseTo(1.0 * peakInTerrain2(26, reference), within(1e-6));
        assertThat(value(trace, "velocity-pressure")).isCloseTo(peakInTerrain2(26, height), within(1e-6));
        assertThat(value(trace, "reference-height")).isEqualTo(height);
    }

    /** 3000 N/m2 is more than the code gives: it counts in both directions, each with its sign. */
    @Test
    void the_least_pressure_of_an_authority_counts_for_suction_too() {
        Site least = En1991Inputs.withLeast(OPEN_COUNTRY, Pressure.of("3 kN/m2"));
        List<LoadCase> cases = code("").wallPressures(new Face(20, 12, 8, 1, 3, 2, 2).panel(Backing.WALL, Enclosure.ENCLOSED), least, new Trace());
        assertThat(cases.get(0).zones()).allSatisfy(z -> assertThat(z.pressure()).isEqualTo(3000));
        assertThat(cases.get(1).zones()).allSatisfy(z -> assertThat(z.pressure()).isEqualTo(-3000));
    }

    /** Zones by strips against points along the panel: at every point the largest suction of four winds, the largest over the panel. */
    @Test
    void strips_and_points_agree() {
        Random random = new Random(7);
        for (int i = 0; i < 2000; i++) {
            double width = 2 + 40 * random.nextDouble();
            double depth = 2 + 40 * random.nextDouble();
            double height = 2 + (Math.min(5 * Math.min(width, depth), 60) - 2) * random.nextDouble();
            double panel = Math.min(width, 0.2 + 6 * random.nextDouble());
            double corner = (width - panel) * random.nextDouble();
            double high = Math.min(height, 0.2 + 3 * random.nextDouble());
            Face face = new Face(width, depth, height, corner, panel, high, (height - high) * random.nextDouble());
            List<LoadCase> cases = onWall(face, new Trace());
            double worst = cases.get(1).zones().stream().mapToDouble(ZonePressure::pressure).min().orElseThrow();
            assertThat(worst).as(face.toString()).isCloseTo(byPoints(face), within(1e-6));
            assertThat(cases.get(1).zones().get(0).from()).isZero();
            assertThat(cases.get(1).zones().get(cases.get(1).zones().size() - 1).to()).isCloseTo(panel, within(1e-9));
        }
    }

    private static double byPoints(Face f) {
        double e = Math.min(f.depth(), 2 * f.height());
        double log = Math.min(1, Math.max(0, Math.log10(f.panelWidth() * f.panelHeight())));
        double behind = f.height() / f.depth();
        double least = behind <= 0.25 ? -0.3 : behind <= 1 ? -0.3 - 0.2 * (behind - 0.25) / 0.75 : -0.5 - 0.2 * (behind - 1) / 4;
        for (int k = 0; k <= 4000; k++) {
            double x = f.corner() + f.panelWidth() * (k + 0.5) / 4001;
            for (double from : new double[] {x, f.width() - x}) {
                least = Math.min(least, from < e / 5 ? -1.4 + 0.2 * log : from < e ? -1.1 + 0.3 * log : -0.5);
            }
        }
        return least * peakInTerrain2(26, f.height());
    }
}
