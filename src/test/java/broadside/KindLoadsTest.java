package broadside;

import static broadside.JobTexts.en;
import static broadside.JobTexts.step;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.action.Foot;
import broadside.assess.ItemResult;
import broadside.assess.ItemResult.Outcome;
import broadside.assess.Loads;
import org.junit.jupiter.api.Test;

/** Loads of blade signs, banners, fences, stacked boards and replaced boards, worked out by hand from the clauses and from statics. */
class KindLoadsTest {

    private static final String BLADE = "{'mark': 'P1', 'kind': 'projecting-sign', 'projection': '0.6 m', 'height': '2.4 m', 'bottom': '3.2 m', 'gap': '0.1 m', "
        + "'mass': '35 kg', 'depth': '0.12 m', 'brackets': {'count': 2, 'spacing': '1.8 m'}}";

    /**
     * EN 1991-1-4, v_b = 26 m/s, II, z_e = 3.2 + 1.2 = 4.4 m: ln 88 = 4.47734; v_m = 0.19 x 4.47734 x 26 = 22.1181 m/s; I_v = 0.223347;
     * q_p = 2.563429 x 0.625 x 489.209 = 783.77 Pa. F = 1.8 q_p 0.6 x 2.4 = 2031.5 N. At the wall: centred F (0.1 + 0.3) = 812.6 N m,
     * outward by 0.25 x 0.6: F 0.55 = 1117.3 N m. Each of two brackets: 1015.8 N and 558.7 N m. Weight 35 x 9.80665 = 343.23 N, couple
     * 343.23 x 0.4 / 1.8 = 76.27 N. Along the wall's normal: q_p (2.0 x 0.12 x 2.4 + 2 x 0.04 x 0.6 x 2.4) = 783.77 x 0.6912 = 541.7 N, half each.
     */
    @Test
    void blade_sign_on_two_brackets() {
        ItemResult item = en(BLADE);
        Loads loads = item.loads().orElseThrow();
        assertThat(loads.foot()).isEqualTo(Foot.WALL);
        assertThat(step(item, "force/centred")).isCloseTo(2031.5, within(0.5));
        assertThat(step(item, "base-moment/centred")).isCloseTo(812.6, within(0.2));
        assertThat(loads.governs("base-moment").baseMoment()).isCloseTo(1117.3, within(0.3));
        assertThat(step(item, "bracket-shear")).isCloseTo(1015.8, within(0.3));
        assertThat(step(item, "bracket-moment")).isCloseTo(558.7, within(0.2));
        assertThat(step(item, "bracket-couple")).isCloseTo(76.27, within(0.01));
        assertThat(step(item, "bracket-pull")).isCloseTo(270.9, within(0.1));
        assertThat(item.notes().toString()).contains("Indicative");
    }

    @Test
    void the_moment_at_the_wall_grows_outward_only() {
        Loads loads = en(BLADE).loads().orElseThrow();
        assertThat(loads.cases()).filteredOn(c -> c.name().equals("eccentric")).allMatch(c -> c.baseMoment() > 812.7);
    }

    /**
     * Banner 8 m by 1 m, 5 m up, sag 0.4 m; z_e = 5.5 m: ln 110 = 4.70048; v_m = 23.2204; I_v = 0.212744; q_p = 2.489208 x 0.625 x 539.187
     * = 838.84 Pa; F = 1.8 x 838.84 x 8 = 12 079 N, w = 1509.9 N/m. Parabola H = w 64 / 3.2 = 30 198 N. Ends, force moved by a quarter of the span:
     * 0.75 F = 9059.5 N. Catenary: a with a (cosh(4/a) - 1) = 0.4 is 20.0664 m, H_c = 30 298 N; resultant (30298² + 9059.5²)^0.5 = 31 624 N.
     */
    @Test
    void banner_between_two_supports() {
        ItemResult item = en("{'mark': 'B1', 'kind': 'spanned-banner', 'width': '8 m', 'height': '1 m', 'bottom': '5 m', 'sag': '0.4 m'}");
        assertThat(step(item, "force/centred")).isCloseTo(12079, within(3.0));
        assertThat(step(item, "line-pull")).isCloseTo(30198, within(8.0));
        assertThat(step(item, "catenary-parameter")).isCloseTo(20.0664, within(0.0001));
        assertThat(step(item, "line-pull/catenary")).isCloseTo(30298, within(8.0));
        assertThat(step(item, "end-reaction")).isCloseTo(9059.5, within(3.0));
        assertThat(step(item, "end-pull")).isCloseTo(31624, within(8.0));
        assertThat(item.loads().orElseThrow().foot()).isEqualTo(Foot.NONE);
    }

    /**
     * Ten panels of 3.45 m by 2 m, closed, no returns; l/h = 17.25, so 3.4, 2.1, 1.7, 1.2 over 0.6, 3.4, 4, 26.5 m. z_e = 2 m: ln 40 = 3.688879;
     * v_m = 18.2231; I_v = 0.271085; q_p = 2.897596 x 0.625 x 332.080 = 601.40 Pa. End panel: (3.4 x 0.6 + 2.1 x 2.85) x 2 q_p = 9652.4 N at 1 m.
     * A panel all in D: 1.2 x 3.45 x 2 q_p = 4979.6 N.
     */
    @Test
    void covered_fence_panel_by_panel() {
        ItemResult item = en("{'mark': 'F1', 'kind': 'banner-fence', 'panel-length': '3.45 m', 'panel-height': '2 m', 'panels': 10, 'cover-solidity': 1.0, 'fence-solidity': 0.85}");
        assertThat(step(item, "velocity-pressure")).isCloseTo(601.40, within(0.05));
        assertThat(step(item, "fence-panel-shear/hardest")).isCloseTo(9652.4, within(2.0));
        assertThat(step(item, "fence-panel-moment/hardest")).isCloseTo(9652.4, within(2.0));
        assertThat(step(item, "fence-panel-shear/easiest")).isCloseTo(4979.6, within(1.0));
        assertThat(item.sheet().find("force/wall/bare-fence")).as("solidity 0.85 is covered").isPresent();
    }

    /**
     * Two boards 2 m by 1 m with a gap of 0.2 m on two posts: 0.2 m is less than half of 1 m, so the closed rectangle 2 m by 2.2 m counts too.
     * It takes 1.8 q_p(3.1 m) 4.4, against 1.8 x 2 (q_p(2.5 m) + q_p(3.7 m)) for the boards: one board is worse.
     */
    @Test
    void boards_close_to_each_other_count_as_one_too() {
        String boards = "{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'width': '2 m', 'height': '1 m', 'clearance': '3.2 m'}, {'width': '2 m', 'height': '1 m', "
            + "'clearance': '%s m'}], 'posts': {'count': 2, 'spacing': '1.2 m'}}";
        ItemResult close = en(boards.formatted("2.0"));
        CaseAction governing = close.loads().orElseThrow().governs("base-moment");
        assertThat(governing.state()).isEqualTo("envelope");
        assertThat(step(close, "force/centred/envelope")).isCloseTo(1.8 * 4.4 * step(close, "velocity-pressure/envelope"), within(0.01));
        assertThat(step(close, "reference-height/envelope")).isCloseTo(3.1, within(1e-9));
        ItemResult apart = en(boards.formatted("1.6"));
        assertThat(apart.sheet().find("force/centred/envelope")).as("a gap of 0.6 m").isEmpty();
        assertThat(apart.loads().orElseThrow().governs("base-moment").state()).isEmpty();
    }

    @Test
    void a_pair_and_a_lone_board_keep_their_own_panels() {
        ItemResult item = en("{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'mark': 'low', 'width': '1 m', 'height': '1 m', 'clearance': '1 m'}, {'mark': 'mid', 'width': '2 m', "
            + "'height': '1 m', 'clearance': '4 m'}, {'mark': 'top', 'width': '2 m', 'height': '1 m', 'clearance': '5.1 m'}], 'posts': {'count': 1}}");
        CaseAction one = item.loads().orElseThrow().cases().stream().filter(c -> c.state().equals("envelope")).findFirst().orElseThrow();
        assertThat(one.zones()).hasSize(2);
        assertThat(step(item, "force/centred/envelope")).isGreaterThan(step(item, "force/centred"));
    }

    /**
     * New board 1.2 m by 1.8 m, 2.6 m up, old one 1.009 m by 0.725 m, 2.9 m up: areas 2.16 and 0.731525 m2, ratio 2.9527 (CROSS report 793 prints the sizes).
     * Moments: areas times q_p at 3.5 m and 3.2625 m times those heights.
     */
    @Test
    void a_larger_sign_on_an_old_post() {
        ItemResult item = AllJobs.assess(AllJobs.demo("old-post-sign.json")).items().get(0);
        assertThat(item.outcome()).isEqualTo(Outcome.OUTSIDE_SCOPE);
        assertThat(step(item, "replacement-ratio/area")).isCloseTo(2.9527, within(0.0001));
        double q = step(item, "velocity-pressure") / step(item, "velocity-pressure/replaced-board");
        assertThat(step(item, "replacement-ratio/moment")).isCloseTo(2.16 / 0.731525 * 3.5 / 3.2625 * q, within(1e-9));
    }

    /** An old disc filled pi/4 of the rectangle around it, an old triangle half: the ratio is larger by as much, and the wind on the posts is in neither moment. */
    @Test
    void the_outline_of_the_old_board_counts() {
        String sign = "{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'width': '1 m', 'height': '1 m', 'clearance': '3 m'}], 'posts': {'count': 1, 'section': 'CHS 114.3x5'}, "
            + "'replaces': {'width': '1 m', 'height': '1 m', 'clearance': '3 m', 'shape': '%s'}}";
        assertThat(step(en(sign.formatted("rectangle")), "replacement-ratio/moment")).isCloseTo(1, within(1e-12));
        assertThat(step(en(sign.formatted("disc")), "replacement-ratio/moment")).isCloseTo(4 / Math.PI, within(1e-12));
        assertThat(step(en(sign.formatted("triangle")), "replacement-ratio/area")).isCloseTo(2, within(1e-12));
    }

    /** Board 2 m wide, posts 0.2 m wide: a post is covered only when its whole width is. */
    @Test
    void a_post_that_is_covered_in_part_stands_free() {
        String sign = "{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'width': '2 m', 'height': '2 m', 'clearance': '2 m'}], 'posts': {'count': 2, 'spacing': '%s m', "
            + "'shape': 'square', 'width': '0.2 m'}}";
        assertThat(step(en(sign.formatted("1.8")), "post-length/post-1")).isEqualTo(2);
        assertThat(step(en(sign.formatted("1.82")), "post-length/post-1")).isEqualTo(4);
    }

    @Test
    void with_data_of_the_old_post_the_loads_are_assessed() {
        ItemResult item = en("{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'width': '1 m', 'height': '1 m', 'clearance': '2 m'}], "
            + "'posts': {'count': 1, 'section': 'CHS 88.9x4'}, 'held-by': 'existing post'}");
        assertThat(item.outcome()).isEqualTo(Outcome.ASSESSED);
    }
}
