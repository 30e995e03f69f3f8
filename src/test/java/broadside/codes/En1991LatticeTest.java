package broadside.codes;

import static broadside.codes.En1991Inputs.board;
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
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Panels with a solidity below 0.8 as plane lattices, EN 1991-1-4, 7.11. */
class En1991LatticeTest {

    private static LoadCase only(Panel panel, Trace trace) {
        List<LoadCase> cases = code("").netPressures(panel, site(26, "II"), trace);
        assertThat(cases.get(0).name()).isIn("wall", "centred");
        assertThat(cases).hasSize(cases.get(0).name().equals("wall") ? 1 : 3);
        return cases.get(0);
    }

    /**
     * Wall 20 m by 2 m, half open: q_p at its top, 2 m: c_r = 0.19 ln 40 = 0.700887, v_m = 18.2231 m/s, I_v = 0.271085,
     * q_p = 2.897595 x 0.625 x 332.080 = 601.40 Pa. Members 20 m2 with 1.6: 601.40 x 1.6 x 20 = 19 245 N on 40 m2, 481.12 Pa on the gross area.
     */
    @Test
    void half_open_wall() {
        LoadCase wall = only(wall(20, 2, 0.5, 0, 0, 1), new Trace());
        assertThat(wall.name()).isEqualTo("wall");
        assertThat(wall.windward()).isEqualTo(LoadCase.Windward.NONE);
        assertThat(wall.zones()).hasSize(1);
        assertThat(wall.zones().get(0).zone()).isEqualTo("all");
        assertThat(wall.zones().get(0).pressure()).isCloseTo(481.12, within(0.01));
        assertThat(wall.zones().get(0).coefficient()).isCloseTo(0.8, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({"0.799999, 1.6", "0.2, 1.6", "0.199999, 2.0", "0.01, 2.0", "0.0001, 2.0"})
    void the_coefficient_follows_the_solidity(double solidity, double coefficient) {
        Trace trace = new Trace();
        only(wall(20, 2, solidity, 0, 0, 1), trace);
        assertThat(value(trace, "lattice-coefficient")).isEqualTo(coefficient);
        assertThat(value(trace, "coefficient/all")).isCloseTo(coefficient * solidity, within(1e-12));
    }

    @Test
    void from_four_fifths_it_is_a_wall_or_a_signboard() {
        assertThat(code("").netPressures(wall(20, 2, 0.8, 0, 0, 1), site(26, "II"), new Trace())).hasSize(2);
        assertThat(code("").netPressures(board(3, 2, 2, 0.8), site(26, "II"), new Trace())).extracting(LoadCase::name).containsExactly("centred", "eccentric", "eccentric");
    }

    /** Strips of the open wall against the sum over its members: 1.6 q on each square metre of member, wherever it is. */
    @Test
    void gross_area_and_sum_over_members_agree() {
        Random random = new Random(3);
        for (int i = 0; i < 300; i++) {
            double width = 0.5 + 10 * random.nextDouble();
            double height = 0.5 + 4 * random.nextDouble();
            double clearance = random.nextBoolean() ? 0 : 3 * random.nextDouble();
            double solidity = 0.01 + 0.78 * random.nextDouble();
            LoadCase load = only(board(width, height, clearance, solidity), new Trace());
            double force = load.zones().stream().mapToDouble(z -> z.pressure() * (z.to() - z.from()) * height).sum();
            boolean wall = clearance < height / 4 && width > height;
            double q = peakInTerrain2(26, clearance + (wall ? height : height / 2));
            double members = 0;
            for (int k = 0; k < 50; k++) {
                members += (solidity < 0.2 ? 2 : 1.6) * q * width * height * solidity / 50;
            }
            assertThat(force).isCloseTo(members, within(1e-6 * members));
            assertThat(load.name()).isEqualTo(wall ? "wall" : "centred");
        }
    }

    @Test
    void shelter_is_not_counted_and_that_is_said() {
        Trace trace = new Trace();
        LoadCase sheltered = only(wall(20, 2, 0.5, 0, 0, 0.5), trace);
        assertThat(sheltered.zones().get(0).coefficient()).isCloseTo(0.8, within(1e-12));
        assertThat(trace.find("coefficient/all").orElseThrow().meaning()).contains("no shelter is counted for a lattice");
    }
}
