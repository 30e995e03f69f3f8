package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.PostAction;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import org.junit.jupiter.api.Test;

/**
 * One result of each kind, worked out by hand from the clauses and written down here, with the numbers on the way.
 * The tolerance is half a unit of the last figure of the hand calculation.
 */
class HandCalculationTest {

    /**
     * Sign 3 m by 2 m, 2.5 m clear, on two posts 2 m apart; EN 1991-1-4:2005, v_b = 26 m/s, terrain II.
     * z_e = 2.5 + 1 = 3.5 m; k_r = 0.19; c_r = 0.19 ln(3.5/0.05) = 0.80721; v_m = 20.987 m/s; I_v = 1/ln 70 = 0.23538;
     * q_p = (1 + 7 x 0.23538) x 0.625 x 20.987² = 1043.5 x ... = 728.85 Pa. w = 1.8 q_p = 1311.9 Pa; F = 6 w = 7871.6 N;
     * M = 3.5 F = 27 551 N m. Eccentric: T = 0.75 F = 5903.7 N m, couple on posts T/2 = 2951.8 N; worst post
     * F/2 + 2951.8 = 6887.6 N, times 3.5 m = 24 107 N m.
     */
    @Test
    void signboard_of_en_1991_1_4_on_two_posts() {
        Loads loads = RandomJobs.loads(RandomJobs.job(true, 26, "II", "", RandomJobs.sign(
            java.util.List.of(new RandomJobs.Board(3, 2, 2.5, 0, 0, 1)), 2, 2)));
        assertThat(loads.velocity().pressure()).isCloseTo(728.85, within(0.1));
        assertThat(loads.governs("base-moment").force()).isCloseTo(7871.6, within(1.0));
        assertThat(loads.governs("base-moment").baseMoment()).isCloseTo(27551, within(4.0));
        assertThat(Math.abs(loads.governs("torsion").torsion())).isCloseTo(5903.7, within(0.8));
        assertThat(loads.posts().get(0).moment()).isCloseTo(24107, within(4.0));
        assertThat(loads.posts().get(1).moment()).isCloseTo(24107, within(4.0));
    }

    /**
     * Hoarding 20 m by 2 m on the ground, free ends, posts at 2 m; EN 1991-1-4:2005, v_b = 25 m/s, terrain III.
     * z_e = 2 m, below z_min = 5 m; k_r = 0.19 (0.3/0.05)^0.07 = 0.215389; c_r = k_r ln(5/0.3) = 0.605982;
     * I_v = 1/ln(16.6667) = 0.355438; v_m = 15.1496 m/s; q_p = 3.48807 x 0.625 x 229.509 = 500.34 Pa. l/h = 10: 3.4, 2.1, 1.7, 1.2.
     * Zones 0.6, 3.4, 4, 12 m wide. Force (3.4 x 0.6 + 2.1 x 3.4 + 1.7 x 4 + 1.2 x 12) x 2 m x q_p = 30.38 x 2 x 500.34 = 30 401 N.
     * End post carries 1 m: 0.6 m of A and 0.4 m of B: (2.04 + 0.84) x 2 x 500.34 = 2882.0 N, times 1 m.
     * Second post carries 1 m to 3 m, all B: 4.2 x 2 x 500.34 = 4202.9 N, times 1 m.
     */
    @Test
    void wall_of_en_1991_1_4_post_by_post() {
        Loads loads = RandomJobs.loads(RandomJobs.job(true, 25, "III", "", RandomJobs.hoarding(new RandomJobs.Wall(20, 2, 0, 1, 0, 0, 2))));
        assertThat(loads.velocity().pressure()).isCloseTo(500.34, within(0.05));
        assertThat(loads.governs("base-moment").force()).isCloseTo(30401, within(5.0));
        assertThat(loads.posts()).hasSize(11);
        assertThat(loads.posts().get(0).moment()).isCloseTo(2882.0, within(0.5));
        assertThat(loads.posts().get(1).moment()).isCloseTo(4202.9, within(0.7));
        assertThat(loads.posts().get(10).moment()).isCloseTo(2882.0, within(0.5));
    }

    /**
     * The same hoarding with returns of 1 m, half its height: half-way between the rows of table 7.9.
     * A (3.4 + 2.1)/2 = 2.75, B (2.1 + 1.8)/2 = 1.95, C (1.7 + 1.4)/2 = 1.55, D 1.2.
     */
    @Test
    void wall_of_en_1991_1_4_with_short_returns() {
        ItemResult item = RandomJobs.result(RandomJobs.job(true, 25, "III", "", RandomJobs.hoarding(new RandomJobs.Wall(20, 2, 0, 1, 1, 1, 2))));
        assertThat(item.sheet().find("coefficient/A").orElseThrow().value()).isCloseTo(2.75, within(1e-9));
        assertThat(item.sheet().find("coefficient/B").orElseThrow().value()).isCloseTo(1.95, within(1e-9));
        assertThat(item.sheet().find("coefficient/C").orElseThrow().value()).isCloseTo(1.55, within(1e-9));
        assertThat(item.sheet().find("coefficient/D").orElseThrow().value()).isCloseTo(1.2, within(1e-9));
    }

    /**
     * Sign 2.4 m by 1.2 m, 1.8 m clear, one post, board 0.3 m to the right; ASCE/SEI 7-16, V = 50 m/s, exposure C.
     * h = 3 m, below 15 ft: K = 2.01 (15/900)^(2/9.5) = 0.848887; q = 0.613344 x 0.848887 x 0.85 x 2500 = 1106.41 Pa.
     * s/h = 0.4, B/s = 2: C_f half-way between 1.70 and 1.80 = 1.75. p = 0.85 x 1.75 q = 1645.8 Pa; F = 2.88 p = 4739.9 N;
     * M = 2.4 F = 11 376 N m. Case B: e = 0.2 x 2.4 = 0.48 m towards the side that adds: T = (0.3 + 0.48) F = 3697.1 N m.
     * Case C, B/s = 2: 2.25 over 1.2 m, 1.50 over 1.2 m: F = 0.85 q x 1.2 x 1.2 (2.25 + 1.50) = 5078.4 N, which governs the moment.
     */
    @Test
    void solid_sign_of_asce_7_off_centre() {
        ItemResult item = RandomJobs.result(RandomJobs.job(false, 50, "C", "", RandomJobs.sign(
            java.util.List.of(new RandomJobs.Board(2.4, 1.2, 1.8, 0.3, 0, 1)), 1, 1)));
        Loads loads = item.loads().orElseThrow();
        assertThat(loads.velocity().pressure()).isCloseTo(1106.41, within(0.05));
        assertThat(item.sheet().find("force/case-a").orElseThrow().value()).isCloseTo(4739.9, within(0.5));
        assertThat(item.sheet().find("base-moment/case-a").orElseThrow().value()).isCloseTo(11376, within(1.0));
        assertThat(Math.abs(item.sheet().find("torsion/case-b").orElseThrow().value())).isCloseTo(3697.1, within(0.5));
        assertThat(item.sheet().find("force/case-c").orElseThrow().value()).isCloseTo(5078.4, within(0.5));
        assertThat(loads.governingNames()).containsEntry("base-moment", "case-c").containsEntry("torsion", "case-b");
    }

    /**
     * Fence 30 m by 2 m on the ground, posts at 3 m; ASCE/SEI 7-16, V = 60 m/s, exposure B.
     * K = 2.01 (15/1200)^(2/7) = 0.574723; q = 0.613344 x 0.574723 x 0.85 x 3600 = 1078.66 Pa. B/s = 15, s/h = 1.
     * Case C, 0 to s: between 4.00 at 13 and 4.30 at 45: 4.01875, times 0.8 = 3.2150; s to 2s: 2.60 - 0.05 x 2/32 = 2.596875, times 0.8 = 2.0775.
     * End post carries 1.5 m of the first region: 0.85 x 1078.66 x 3.2150 x 1.5 x 2 = 8843.1 N, at 1 + 0.05 x 2 = 1.1 m: 9727.4 N m.
     * Second post carries 1.5 m to 4.5 m: 0.5 m at 3.2150, 2 m at 2.0775, 0.5 m of the third region.
     */
    @Test
    void fence_of_asce_7_end_post() {
        ItemResult item = RandomJobs.result(RandomJobs.job(false, 60, "B", "", RandomJobs.hoarding(new RandomJobs.Wall(30, 2, 0, 1, 0, 0, 3))));
        Loads loads = item.loads().orElseThrow();
        assertThat(loads.velocity().pressure()).isCloseTo(1078.66, within(0.05));
        assertThat(item.sheet().find("coefficient/case-c/0-s").orElseThrow().value()).isCloseTo(3.2150, within(1e-4));
        PostAction end = loads.posts().get(0);
        assertThat(end.moment()).isCloseTo(9727.4, within(1.0));
        double third = item.sheet().find("coefficient/case-c/2s-3s").orElseThrow().value();
        double second = 0.85 * 1078.66 * 2 * (0.5 * 3.2150 + 2 * 2.0775 + 0.5 * third) * 1.1;
        assertThat(loads.posts().get(1).moment()).isCloseTo(second, within(2.0));
    }

    /** 30 m escarpment, upwind slope 90 m, site 15 m behind the crest; ASCE/SEI 7-16, exposure C, top at 6 m. */
    @Test
    void escarpment_of_asce_7() {
        ItemResult item = RandomJobs.result(RandomJobs.job(false, 50, "C", ",\"topography\":{\"feature\":\"escarpment\",\"height\":\"30 m\","
            + "\"upwind-length\":\"90 m\",\"distance-from-crest\":\"15 m\"}", RandomJobs.sign(
            java.util.List.of(new RandomJobs.Board(4, 2, 4, 0, 0, 1)), 1, 1)));
        // H/L_h = 30/45 above 0.5: K_1 = 0.85 x 0.5, L = 2 H = 60 m; K_2 = 1 - 15/(4 x 60); K_3 = exp(-2.5 x 6/60).
        double expected = Math.pow(1 + 0.425 * (1 - 15 / 240.0) * Math.exp(-0.25), 2);
        assertThat(item.sheet().find("topography-factor").orElseThrow().value()).isCloseTo(expected, within(1e-12));
    }
}
