package broadside.support;

import static broadside.support.Stands.STABILITY;
import static broadside.support.Stands.allowed;
import static broadside.support.Stands.fixings;
import static broadside.support.Stands.in;
import static broadside.support.Stands.mass;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.Fixings;
import broadside.quantity.Mass;
import broadside.support.FixingGroup.Sharing;
import broadside.trace.Trace;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Grids of fixings worked out by hand: 1000 Pa of suction on a panel 2.4 m wide and 1.2 m high, 40 kg, weight 0.1 m off the wall. */
class FixingGroupTest {

    private static final double WEIGHT = 40 * 9.80665;
    private static final FixingGroup GROUP = new FixingGroup(STABILITY);

    private static FixingPulls assess(Fixings fixings, double aside, Optional<Mass> mass, double side, Sharing sharing) {
        Trace trace = new Trace();
        return GROUP.assess(fixings, new FixingGroup.PanelLoad(in("p_s", 1000, "Pa", trace), 2.4, 1.2, 0.1, aside, mass, in("S", side, "N", trace)), sharing,
            trace);
    }

    private static FixingPulls assess(Fixings fixings) {
        return assess(fixings, 0, mass(40), 0, Sharing.BY_AREA);
    }

    /** Two by two: a quarter each, 720 N, and G 0.1/(2 x 0.8) from the weight. */
    @Test
    void twoByTwoIsAQuarterEach() {
        FixingPulls pulls = assess(fixings(2, 2, 1.8, 0.8));
        assertThat(pulls.tension().orElseThrow()).isCloseTo(720 + WEIGHT * 0.1 / (2 * 0.8), within(1e-9));
        assertThat(pulls.shear()).isCloseTo(WEIGHT / 4, within(1e-9));
        assertThat(pulls.checks()).isEmpty();
        assertThat(pulls.remarks()).anyMatch(r -> r.startsWith("The fixings are not checked"));
        assertThat(pulls.assumptions()).isEmpty();
    }

    /** Four columns at 0.7 m, two rows: inner 0.7 x 0.6 m against the edge 0.5 x 0.6 m; 1.25 for a rail over three spans. */
    @Test
    void anInnerFixingOfALongRailTakesItsPitchAndAQuarterMore() {
        FixingPulls pulls = assess(fixings(4, 2, 0.7, 0.8));
        assertThat(pulls.tension().orElseThrow()).isCloseTo(1.25 * 1000 * 0.7 * 0.6 + WEIGHT * 0.1 / (4 * 0.8), within(1e-9));
    }

    /** Three columns at 0.6 m on 2.4 m: the edge takes 0.3 + 0.6 m, more than an inner one. */
    @Test
    void aFixingAtTheEdgeTakesWhatStandsOut() {
        FixingPulls pulls = assess(fixings(3, 2, 0.6, 0.8));
        assertThat(pulls.tension().orElseThrow()).isCloseTo(1.25 * 1000 * 0.9 * 0.6 + WEIGHT * 0.1 / (3 * 0.8), within(1e-9));
    }

    /** Rows at -0.4, 0 and 0.4 m, two columns: sum of squares 4 x 0.16; pull M 0.4/0.64. */
    @Test
    void theWeightPullsLinearlyOverTheRows() {
        FixingPulls pulls = assess(fixings(2, 3, 1.8, 0.4));
        assertThat(pulls.tension().orElseThrow()).isCloseTo(1.25 * 1000 * 1.2 * 0.4 + WEIGHT * 0.1 * 0.4 / 0.64, within(1e-9));
    }

    @Test
    void oneRowLeansOnTheLowerEdge() {
        FixingPulls pulls = assess(fixings(2, 1, 1.8, 0));
        assertThat(pulls.tension().orElseThrow()).isCloseTo(1000 * 1.2 * 1.2 + WEIGHT * 0.1 / (2 * 0.6), within(1e-9));
        assertThat(pulls.assumptions()).anyMatch(a -> a.startsWith("One row of fixings"));
    }

    @Test
    void oneFixingTakesAll() {
        FixingPulls pulls = assess(fixings(1, 1, 0, 0), 0, Optional.empty(), 300, Sharing.BY_AREA);
        assertThat(pulls.tension().orElseThrow()).isCloseTo(2880, within(1e-9));
        assertThat(pulls.shear()).isCloseTo(300, within(1e-9));
        assertThat(pulls.assumptions()).anyMatch(a -> a.startsWith("The mass was not given"));
    }

    /** Weight 0.3 m aside of two by two at 1.8 and 0.8 m: I_p = 4 (0.81 + 0.16); direct and moment parts added. */
    @Test
    void aWeightAsideTurnsTheGroup() {
        double moment = WEIGHT * 0.3;
        double polar = 4 * (0.81 + 0.16);
        FixingPulls pulls = assess(fixings(2, 2, 1.8, 0.8), 0.3, mass(40), 100, Sharing.BY_AREA);
        assertThat(pulls.shear()).isCloseTo(Math.hypot(25 + moment * 0.4 / polar, WEIGHT / 4 + moment * 0.9 / polar), within(1e-9));
        assertThatThrownBy(() -> assess(fixings(1, 1, 0, 0), 0.3, mass(40), 0, Sharing.BY_AREA)).isInstanceOf(UnfitAnswer.class);
    }

    /** T/Ta + V/Va: 724.5/2000 + 98.07/1000. */
    @Test
    void tensionAndShearAddUp() {
        FixingPulls pulls = assess(allowed(fixings(2, 2, 1.8, 0.8), 2000, 1000));
        double used = (720 + WEIGHT * 0.1 / 1.6) / 2000 + WEIGHT / 4000;
        assertThat(pulls.checks()).hasSize(1);
        assertThat(pulls.checks().get(0).utilisation()).isCloseTo(used, within(1e-12));
        assertThat(pulls.checks().get(0).passes()).isTrue();
        assertThat(assess(allowed(fixings(2, 2, 1.8, 0.8), 800, 900)).checks().get(0).passes()).isFalse();
    }

    @Test
    void oneAllowableLoadIsCheckedAlone() {
        Fixings typed = allowed(fixings(2, 2, 1.8, 0.8), 2000, 1000);
        FixingPulls tension = assess(new Fixings(2, 2, typed.horizontalPitch(), typed.verticalPitch(), typed.tension(), Optional.empty()));
        assertThat(tension.checks()).extracting(Check::name).containsExactly("fixings in tension");
        assertThat(tension.remarks()).anyMatch(r -> r.startsWith("Tension and shear act together"));
        FixingPulls shear = assess(new Fixings(2, 2, typed.horizontalPitch(), typed.verticalPitch(), Optional.empty(), typed.shear()));
        assertThat(shear.checks()).extracting(Check::utilisation).containsExactly(WEIGHT / 4 / 1000);
    }

    @ParameterizedTest
    @CsvSource({"0, 2, 1, 1, 1, 1, fixings.columns", "2, 0, 1, 1, 1, 1, fixings.rows", "2, 2, 0, 1, 1, 1, fixings.horizontal-pitch",
        "2, 2, 1, -1, 1, 1, fixings.vertical-pitch",
        "2, 2, 1, 1, 0, 1, fixings.allowable-tension", "2, 2, 1, 1, 1, -5, fixings.allowable-shear", "4, 2, 0.9, 1, 1, 1, fixings.horizontal-pitch",
        "2, 4, 1, 0.5, 1, 1, fixings.vertical-pitch"})
    void aGridThatCannotBeIsRefused(int columns, int rows, double across, double along, double tension, double shear, String field) {
        assertThatThrownBy(() -> assess(allowed(fixings(columns, rows, across, along), tension, shear))).isInstanceOf(UnfitAnswer.class)
            .satisfies(e -> assertThat(((UnfitAnswer) e).field()).isEqualTo(field));
    }
}
