package broadside.codes;

import static broadside.codes.Is875Jobs.DELHI;
import static broadside.codes.Is875Jobs.find;
import static broadside.codes.Is875Jobs.hoarding;
import static broadside.codes.Is875Jobs.result;
import static broadside.codes.Is875Jobs.sign;
import static broadside.codes.Is875Jobs.site;
import static broadside.codes.Is875Jobs.step;
import static broadside.codes.Is875Jobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.action.PostAction;
import broadside.assess.ItemResult;
import broadside.codes.LoadCase.Windward;
import broadside.trace.Status;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Hoardings, walls and boards of IS 875 (Part 3), 7.4.2.3 and table 26. p_d is 0.9 x 0.6 x 47² = 1192.86 Pa where nothing else is said. */
class Is875HoardingsTest {

    private static final double PD = 1192.86;

    private static double cf(ItemResult item) {
        return value(item, "coefficient/normal");
    }

    private static ItemResult board(double width, double height, double gap) {
        return result(DELHI, sign(width + " m", height + " m", gap + " m"));
    }

    @ParameterizedTest
    @CsvSource({"0.5, 1.2", "1, 1.2", "5.999, 1.2", "6, 1.2", "8, 1.25", "10, 1.3", "13, 1.35", "16, 1.4", "18, 1.45", "20, 1.5", "30, 1.625", "40, 1.75", "50, 1.775",
        "60, 1.8", "70, 1.9", "80, 2.0", "100, 2.0"})
    void above_ground_the_first_column_counts(double ratio, double coefficient) {
        assertThat(cf(board(ratio, 1, 0.25))).isCloseTo(coefficient, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({"1, 1.2", "12, 1.2", "16, 1.25", "20, 1.3", "26, 1.35", "32, 1.4", "36, 1.45", "40, 1.5", "60, 1.625", "80, 1.75", "100, 1.775", "120, 1.8", "140, 1.9",
        "160, 2.0", "200, 2.0"})
    void on_the_ground_the_second_column_counts(double ratio, double coefficient) {
        assertThat(cf(result(DELHI, hoarding(ratio + " m", "1 m", "0 m", "")))).isCloseTo(coefficient, within(1e-12));
        assertThat(cf(board(ratio, 1, 0.249))).isCloseTo(coefficient, within(1e-12));
    }

    /** 1.2 m high, b/h = 10: 1.3 above ground, 1.2 on the ground. A quarter of 1.2 m is 0.3 m; 0.3/1.2 is 0.25 only on paper. */
    @Test
    void a_quarter_of_the_height_is_enough_to_stand_above_ground() {
        assertThat(cf(board(12, 1.2, 0.3))).isCloseTo(1.3, within(1e-12));
        assertThat(cf(board(12, 1.2, 0.299))).isEqualTo(1.2);
        assertThat(cf(result(DELHI, sign("33 ft", "3 ft 3.6 in", "9.9 in")))).isCloseTo(1.3, within(1e-9));
        assertThat(step(board(12, 1.2, 0.299), "coefficient/normal").formula()).contains("on the ground, as h' is less than 0.25 h");
    }

    @Test
    void the_straight_line_is_read_in_its_printed_range_and_our_own_elsewhere() {
        assertThat(step(board(8, 1, 1), "coefficient/normal").status()).isEqualTo(Status.READ);
        assertThat(step(board(8, 1, 1), "coefficient/normal").formula()).doesNotContain("reading of this tool");
        assertThat(step(board(16, 1, 1), "coefficient/normal").status()).isEqualTo(Status.READ);
        assertThat(step(board(13, 1, 1), "coefficient/normal").status()).isEqualTo(Status.DERIVED);
        assertThat(step(board(13, 1, 1), "coefficient/normal").formula()).contains("a reading of this tool");
        assertThat(step(board(16, 1, 0), "coefficient/normal").status()).isEqualTo(Status.READ);
        assertThat(step(board(26, 1, 0), "coefficient/normal").status()).isEqualTo(Status.DERIVED);
    }

    /** A plate is the same when it is turned: b/h 1/8 above ground is 8 (1.25). On the ground it is half of one twice as high: b/h 1/2 is 4 (1.2), 1/4 is 8 (1.25). */
    @ParameterizedTest
    @CsvSource({"0.49, 1, 1, 1.2", "0.125, 1, 1, 1.25", "0.6, 2.4, 3.2, 1.2", "0.99, 1, 0, 1.2", "0.5, 1, 0, 1.2", "0.25, 1, 0, 1.25", "0.125, 1, 0.1, 1.25"})
    void narrower_than_the_table_is_the_same_plate_turned_and_the_step_says_so(double width, double height, double gap, double coefficient) {
        ItemResult item = board(width, height, gap);
        assertThat(cf(item)).isCloseTo(coefficient, within(1e-12));
        assertThat(step(item, "coefficient/normal").status()).isEqualTo(Status.DERIVED);
        assertThat(step(item, "coefficient/normal").formula()).contains("the same plate turned on its side").contains("a reading of this tool");
    }

    /** The clause lets a board with a small gap be read as above ground; that column begins at 0.5. */
    @Test
    void a_narrow_board_with_a_small_gap_is_read_as_above_ground() {
        assertThat(cf(board(0.8, 1, 0.1))).isEqualTo(1.2);
        assertThat(step(board(0.8, 1, 0.1), "coefficient/normal").formula()).contains("as the clause allows for a small gap");
    }

    @Test
    void from_fifteen_metres_up_the_table_does_not_hold() {
        assertThat(board(4, 2, 12.99).outcome()).isEqualTo(ItemResult.Outcome.ASSESSED);
        ItemResult tall = board(4, 2, 13);
        assertThat(tall.outcome()).isEqualTo(ItemResult.Outcome.NOT_COVERED);
        assertThat(tall.refusal().orElseThrow().reason()).contains("lower than 15 m").contains("15 m.");
        assertThat(result(DELHI, sign("4 m", "3.1 m", "11.9 m")).outcome()).as("3.1 + 11.9 is 15 on paper").isEqualTo(ItemResult.Outcome.NOT_COVERED);
    }

    @Test
    void openings_bring_no_reduction_and_the_step_says_so() {
        ItemResult mesh = result(DELHI, sign("4 m", "2 m", "2 m", "0 m", 0.5));
        assertThat(value(mesh, "pressure/normal")).isCloseTo(1.2 * PD, within(1e-9));
        assertThat(step(mesh, "coefficient/normal").formula()).contains("openings bring no reduction");
    }

    /**
     * Board 4 m by 2 m, 2.5 m clear, 0.3 m to the right of two posts 2 m apart. p_d 1192.86 Pa, C_f 1.2: p 1431.432 Pa, F 11 451.456 N, M = 3.5 F = 40 080.1 N m.
     * Oblique: mean 1.07 x 1431.432 = 1531.632 Pa, F 12 253.06 N, M 42 885.70 N m; e = 0.0981308 x 4 = 0.392523 m: T = F (0.3 + 0.392523) = 8485.53 N m
     * from the right, F (0.3 - 0.392523) = -1133.69 N m from the left. Post 2, 1 m to the right: M/2 + 3.5 T x 1/2 = 21 442.85 + 14 849.68 = 36 292.53 N m.
     */
    @Test
    void board_by_hand() {
        ItemResult item = result(DELHI, sign("4 m", "2 m", "2.5 m", "0.3 m", 1));
        CaseAction normal = find(item, "normal", Windward.NONE);
        assertThat(normal.force()).isCloseTo(11451.456, within(0.001));
        assertThat(normal.baseMoment()).isCloseTo(40080.10, within(0.01));
        assertThat(value(item, "pressure/oblique/windward-edge")).isCloseTo(1.7 * 1431.432, within(0.001));
        assertThat(value(item, "pressure/oblique/leeward-edge")).isCloseTo(0.44 * 1431.432, within(0.001));
        CaseAction right = find(item, "oblique", Windward.RIGHT);
        assertThat(right.force()).isCloseTo(12253.06, within(0.01));
        assertThat(right.baseMoment()).isCloseTo(42885.70, within(0.01));
        assertThat(right.torsion()).isCloseTo(8485.53, within(0.01));
        CaseAction left = find(item, "oblique", Windward.LEFT);
        assertThat(left.torsion()).isCloseTo(-1133.69, within(0.01));
        assertThat(item.loads().orElseThrow().posts().get(1).moment()).isCloseTo(36292.53, within(0.02));
        assertThat(item.loads().orElseThrow().cases().get(0).name()).isEqualTo("normal");
    }

    /** The printed line from 1.7 C_f to 0.44 C_f summed over 20 000 strips, and T = p_d C_f h b² (1.7 - 0.44) / 12. */
    @ParameterizedTest
    @CsvSource({"4, 2, 2", "12, 1.5, 0", "30, 2, 0.6", "2, 3, 1"})
    void two_ways_to_the_torsion_of_oblique_wind(double b, double h, double gap) {
        ItemResult item = board(b, h, gap);
        double c = cf(item);
        double pd = value(item, "design-pressure");
        int strips = 20_000;
        double force = 0;
        double torsion = 0;
        for (int i = 0; i < strips; i++) {
            double x = (i + 0.5) / strips;
            double f = (1.7 + (0.44 - 1.7) * x) * c * pd * h * b / strips;
            force += f;
            torsion += f * (0.5 - x) * b;
        }
        CaseAction oblique = find(item, "oblique", Windward.RIGHT);
        assertThat(oblique.force()).isCloseTo(force, within(1e-8 * force));
        assertThat(oblique.torsion()).isCloseTo(torsion, within(1e-7 * torsion));
        assertThat(oblique.torsion()).isCloseTo(pd * c * h * b * b * (1.7 - 0.44) / 12, within(1e-9 * torsion));
        assertThat(find(item, "oblique", Windward.LEFT).torsion()).isEqualTo(-oblique.torsion());
    }

    /**
     * Hoarding 20 m by 2 m on the ground, posts at 5 m: b/h 10, C_f 1.2. The end post carries 0 to 2.5 m from the windward end, mean coefficient at 1.25 m:
     * 1.7 - 1.26 x 1.25/20 = 1.62125; the next 2.5 to 7.5 m, at 5 m: 1.385; the middle one, at 10 m: 1.07. Arm 1 m, height 2 m.
     * Each end may be the windward one, so the wall is alike from both.
     */
    @Test
    void posts_of_a_hoarding_see_the_straight_line() {
        ItemResult item = result(DELHI, hoarding("20 m", "2 m", "0 m", ", 'posts': {'spacing': '5 m'}"));
        List<PostAction> posts = item.loads().orElseThrow().posts();
        double unit = 1.2 * PD * 2 * 1;
        assertThat(posts).extracting(PostAction::moment).satisfiesExactly(
            m -> assertThat(m).isCloseTo(1.62125 * 2.5 * unit, within(1e-6)), m -> assertThat(m).isCloseTo(1.385 * 5 * unit, within(1e-6)),
            m -> assertThat(m).isCloseTo(1.07 * 5 * unit, within(1e-6)), m -> assertThat(m).isCloseTo(1.385 * 5 * unit, within(1e-6)),
            m -> assertThat(m).isCloseTo(1.62125 * 2.5 * unit, within(1e-6)));
        assertThat(posts).allSatisfy(p -> assertThat(p.named()).isEqualTo("oblique"));
        assertThat(value(item, "moment-per-metre/oblique/oblique")).as("at the windward edge").isCloseTo(1.7 * unit, within(1e-6));
        assertThat(value(item, "moment-per-metre/normal/normal")).isCloseTo(unit, within(1e-9));
    }

    /** Gate of 4 m from 8 m: stretches of 8 m each, and the whole 20 m while it is shut. */
    @Test
    void each_stretch_beside_a_gate_has_its_own_straight_line() {
        ItemResult item = result(DELHI, hoarding("20 m", "2 m", "0 m", ", 'gates': [{'from': '8 m', 'width': '4 m'}], 'posts': {'spacing': '4 m'}"));
        double unit = 1.2 * PD * 2 * 1;
        // The post at the gate, open: 2 m from the windward end of 8 m, at 1 m 1.7 - 1.26/8 = 1.5425. Shut: its 2 m and 2 m of leaf, 6 to 10 m of 20 m, at 8 m from either end 1.196 at most.
        assertThat(item.loads().orElseThrow().posts().get(2).moment()).isCloseTo(4 * 1.196 * unit, within(1e-6));
        assertThat(item.loads().orElseThrow().posts().get(0).moment()).isCloseTo(Math.max(1.5425, 1.7 - 1.26 * 1 / 20) * 2 * unit, within(1e-6));
    }

    /** Least pressure 1000 Pa: the leeward edge, 0.44 x 1431.432 = 629.8 Pa, is raised; the line runs from 2433.4344 to 1000 Pa, mean 1716.7172, e/b = 1433.4344/(6 x 3433.4344). */
    @Test
    void an_authority_s_least_pressure_raises_the_low_end_of_the_line() {
        ItemResult item = result(site("47 m/s", "2", "'authority-minimum-pressure': '1 kN/m2'"), sign("4 m", "2 m", "2 m"));
        assertThat(value(item, "pressure/oblique/leeward-edge")).isEqualTo(1000);
        assertThat(value(item, "pressure/oblique")).isCloseTo(1716.7172, within(1e-6));
        assertThat(value(item, "eccentricity-ratio/oblique")).isCloseTo(0.0695824, within(1e-6));
        ItemResult even = result(site("47 m/s", "2", "'authority-minimum-pressure': '5 kN/m2'"), sign("4 m", "2 m", "2 m"));
        assertThat(find(even, "oblique", Windward.RIGHT).torsion()).isZero();
        assertThat(find(even, "oblique", Windward.RIGHT).force()).isCloseTo(40_000, within(1e-6));
    }

    @Test
    void fences_banners_and_blade_signs_are_worked_out_too() {
        String fence = "{'mark': 'F', 'kind': 'banner-fence', 'panel-length': '3.5 m', 'panel-height': '2 m', 'panels': 10, 'cover-solidity': 0.8}";
        String banner = "{'mark': 'B', 'kind': 'spanned-banner', 'width': '8 m', 'height': '1 m', 'bottom': '5 m', 'sag': '0.4 m'}";
        String blade = "{'mark': 'P', 'kind': 'projecting-sign', 'projection': '0.9 m', 'height': '1.2 m', 'bottom': '3 m', 'gap': '0.1 m', 'brackets': {'count': 2, 'spacing': '0.9 m'}}";
        for (String item : List.of(fence, banner, blade)) {
            assertThat(result(DELHI, item).outcome()).as(item).isEqualTo(ItemResult.Outcome.ASSESSED);
        }
    }
}
