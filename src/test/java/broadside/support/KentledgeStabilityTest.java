package broadside.support;

import static broadside.support.Stands.PLAIN;
import static broadside.support.Stands.RULES;
import static broadside.support.Stands.STABILITY;
import static broadside.support.Stands.kentledge;
import static broadside.support.Stands.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.Kentledge;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Hoardings on braces, worked out by hand: 2 kN at 1.2 m on a post, braces of 2 m, factor 1.5. */
class KentledgeStabilityTest {

    private static final double G = 9.80665;

    private static StabilityResult assess(Kentledge kentledge, double force) {
        Trace trace = new Trace();
        return new KentledgeStability(STABILITY).assess(kentledge, 2.4, List.of(wind("worst-zone", force, 1.2, true, trace), wind("ordinary-zone", force / 2,
            1.2, true, trace)),
            RULES.of("twf-1.5"), PLAIN, trace);
    }

    @Test
    void bothDirectionsAndSliding() {
        StabilityResult result = assess(kentledge(500, 2, 200, 100, 0.4), 2000);
        StabilityResult.Stand worst = result.panels().get(0);
        assertThat(worst.turns().get(0).ratio()).isCloseTo(300 * 2 * G / 2400, within(1e-9));
        assertThat(worst.turns().get(1).ratio()).isCloseTo(500 * 2 * G / 2400, within(1e-9));
        assertThat(worst.turns().get(0).uplift()).isZero();
        assertThat(worst.sliding()).isCloseTo(0.4 * 800 * G / 2000, within(1e-9));
        assertThat(worst.need().line()).isCloseTo(1.5 * 2400 / (2 * G) - 100, within(1e-9));
        assertThat(worst.need().brace()).isCloseTo(3000 / (0.4 * G) - 1.5 * 2400 / (2 * G), within(1e-9));
        assertThat(result.need().named()).isEqualTo("worst zone");
        assertThat(result.perMetre()).isCloseTo(result.need().total() / 2.4, within(1e-9));
        assertThat(result.panels().get(1).turns().get(0).ratio()).isCloseTo(2 * worst.turns().get(0).ratio(), within(1e-9));
        assertThat(result.checks()).extracting(Check::name).containsExactly("overturning towards the brace", "overturning away from the brace", "sliding",
            "overturning towards the brace", "overturning away from the brace", "sliding");
    }

    /** The ballast of the brace stands on the edge about which wind towards it tips the wall. */
    @Test
    void braceBallastDoesNotHelpAgainstWindTowardsTheBrace() {
        StabilityResult heavy = assess(kentledge(5000, 2, 0, 0, 0.4), 2000);
        assertThat(heavy.panels().get(0).turns().get(0).ratio()).isZero();
        assertThat(heavy.checks().get(0).utilisation()).isEqualTo(Check.MOST);
        assertThat(heavy.checks().get(1).passes()).isTrue();
        assertThat(heavy.panels().get(0).turns().get(0).uplift()).isCloseTo(1200, within(1e-9));
    }

    @Test
    void whatIsMissingIsSaidOrRefused() {
        Kentledge unknown = new Kentledge(Optional.empty(), Optional.of(broadside.quantity.Length.metres(2)), Optional.empty(), Optional.empty(),
            Stands.ground("clay"));
        assertThat(assess(unknown, 2000).assumptions()).hasSize(4);
        assertThatThrownBy(() -> assess(new Kentledge(Stands.mass(5), Optional.empty(), Stands.mass(5), Stands.mass(5), Stands.friction(0.4)),
            1)).isInstanceOf(UnfitAnswer.class)
            .satisfies(e -> assertThat(((UnfitAnswer) e).field()).isEqualTo("ballast.lever"));
        assertThatThrownBy(() -> assess(kentledge(5, 0, 5, 5, 0.4), 1)).isInstanceOf(UnfitAnswer.class);
        assertThatThrownBy(() -> assess(kentledge(5, 2, -5, 5, 0.4), 1)).satisfies(e -> assertThat(((UnfitAnswer) e).field()).isEqualTo("ballast.front-mass"));
    }
}
