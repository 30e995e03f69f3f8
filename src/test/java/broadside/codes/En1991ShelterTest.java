package broadside.codes;

import static broadside.codes.En1991Inputs.code;
import static broadside.codes.En1991Inputs.peakInTerrain2;
import static broadside.codes.En1991Inputs.site;
import static broadside.codes.En1991Inputs.value;
import static broadside.codes.En1991Inputs.wall;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.Panel;
import broadside.trace.Trace;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Shelter by a wall in front of a wall, EN 1991-1-4, 7.4.2, by a typed factor. */
class En1991ShelterTest {

    private static LoadCase left(Panel panel, Trace trace) {
        return code("").netPressures(panel, site(26, "II"), trace).stream().filter(c -> c.windward() == LoadCase.Windward.LEFT).findFirst().orElseThrow();
    }

    /**
     * Wall 20 m by 2 m, factor 0.5: A 0 to 0.6 m and B to 2 m as they are; from 2 m to 18 m B, C, D with half of 2.1, 1.7, 1.2;
     * the last 2 m D as it is. Force: (3.4 x 0.6 + 2.1 x 1.4 + 1.05 x 2 + 0.85 x 4 + 0.6 x 10 + 1.2 x 2) x 2 x 601.396 = 18.88 x 2 x 601.396 = 22 709 N.
     */
    @Test
    void zones_are_cut_where_shelter_begins_and_ends() {
        Trace trace = new Trace();
        LoadCase load = left(wall(20, 2, 1, 0, 0, 0.5), trace);
        assertThat(load.zones()).extracting(ZonePressure::zone).containsExactly("A", "B", "B/sheltered", "C/sheltered", "D/sheltered", "D");
        assertThat(load.zones()).extracting(z -> Math.round(z.to() * 1000) / 1000.0).containsExactly(0.6, 2.0, 4.0, 8.0, 18.0, 20.0);
        double force = load.zones().stream().mapToDouble(z -> z.pressure() * z.width() * 2).sum();
        assertThat(force).isCloseTo(22709, within(1.0));
        assertThat(value(trace, "coefficient/D/sheltered")).isCloseTo(0.6, within(1e-12));
        assertThat(value(trace, "coefficient/D")).isCloseTo(1.2, within(1e-12));
    }

    @Test
    void a_wall_not_longer_than_twice_its_height_has_no_shelter() {
        assertThat(left(wall(4, 2, 1, 0, 0, 0.5), new Trace()).zones()).extracting(ZonePressure::zone).containsExactly("A", "B");
        assertThat(left(wall(4.2, 2.1, 1, 0, 0, 0.5), new Trace()).zones()).extracting(ZonePressure::zone).containsExactly("A", "B");
    }

    /** 5 m by 2 m: B runs from 0.6 m to 4 m, shelter from 2 m to 3 m. */
    @Test
    void a_zone_may_lie_on_both_sides_of_the_shelter() {
        assertThat(left(wall(5, 2, 1, 0, 0, 0.5), new Trace()).zones()).extracting(ZonePressure::zone).containsExactly("A", "B", "B/sheltered", "B/far-end", "C");
    }

    @Test
    void a_factor_of_one_changes_nothing() {
        assertThat(left(wall(20, 2, 1, 0, 0, 1), new Trace()).zones()).extracting(ZonePressure::zone).containsExactly("A", "B", "C", "D");
    }

    /** The sum over zones against a sum over thin slices: at each the factor of its zone, and the shelter where it counts. */
    @Test
    void zones_and_slices_agree() {
        Random random = new Random(5);
        for (int i = 0; i < 200; i++) {
            double height = 1 + 2 * random.nextDouble();
            double length = height * (1 + 20 * random.nextDouble());
            double factor = 0.3 + 0.69 * random.nextDouble();
            LoadCase load = left(wall(length, height, 0.8, 0, 0, factor), new Trace());
            double q = peakInTerrain2(26, height);
            double force = load.zones().stream().mapToDouble(z -> z.pressure() * (z.to() - z.from()) * height).sum();
            // At solidity 0.8 all zones have 1.2.
            double open = Math.max(0, length - 2 * height);
            assertThat(force).isCloseTo(1.2 * q * height * (length - open + factor * open), within(1e-6 * force));
            for (int k = 1; k < load.zones().size(); k++) {
                assertThat(load.zones().get(k).from()).isEqualTo(load.zones().get(k - 1).to());
            }
        }
    }
}
