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
import broadside.panel.ProjectingSign.Brackets;
import broadside.quantity.Length;
import broadside.trace.Trace;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** A blade 0.4 m off the wall to its middle, 30 kg, 1200 N square on and 90 N along, worked out by hand. */
class BracketFixingsTest {

    private static final double WEIGHT = 30 * 9.80665;

    private static Brackets brackets(int count, double spacing) {
        return new Brackets(count, Optional.of(Length.metres(spacing)));
    }

    private static FixingPulls assess(Fixings fixings, Brackets brackets) {
        Trace trace = new Trace();
        return new BracketFixings(STABILITY).assess(fixings, brackets,
            new BracketFixings.BladeLoad(in("F_w", 1200, "N", trace), in("F_e", 90, "N", trace), 0.4, mass(30)), trace);
    }

    /** W a over s and two fixings on each side; G a over h and two fixings at the top; all four share the shear. */
    @Test
    void twoBracketsWithTwoFixingsEach() {
        FixingPulls pulls = assess(fixings(2, 1, 0.15, 0), brackets(2, 1.0));
        assertThat(pulls.tension().orElseThrow()).isCloseTo(1200 * 0.4 / (0.15 * 2) + WEIGHT * 0.4 / (1.0 * 2), within(1e-9));
        assertThat(pulls.shear()).isCloseTo(Math.hypot(300, WEIGHT / 4), within(1e-9));
        assertThat(pulls.checks()).isEmpty();
        assertThat(pulls.remarks()).anyMatch(r -> r.startsWith("Wind from either side"));
    }

    /** Three columns 0.1 m apart under one bracket of two rows: sum of squares 4 x 0.01; rows 0.2 m apart, three fixings at the top. */
    @Test
    void oneBracketTakesTheWeightOverItsRows() {
        FixingPulls pulls = assess(fixings(3, 2, 0.1, 0.2), brackets(1, 0));
        assertThat(pulls.tension().orElseThrow()).isCloseTo(1200 * 0.4 * 0.1 / (4 * 0.01) + WEIGHT * 0.4 / (3 * 0.2), within(1e-9));
    }

    @Test
    void oneColumnGivesNoCoupleAndTheMomentIsSaid() {
        FixingPulls pulls = assess(fixings(1, 2, 0, 0.1), brackets(2, 1.0));
        assertThat(pulls.tension()).isEmpty();
        assertThat(pulls.remarks()).anyMatch(r -> r.contains("no couple") && r.contains("480 N m"));
        FixingPulls lone = assess(fixings(2, 1, 0.15, 0), brackets(1, 0));
        assertThat(lone.tension()).isEmpty();
        assertThat(lone.remarks()).anyMatch(r -> r.startsWith("One bracket") && r.contains("118 N m"));
    }

    @Test
    void bothWindsAreCheckedAndTheHarderCounts() {
        FixingPulls pulls = assess(allowed(fixings(2, 1, 0.15, 0), 4000, 1000), brackets(2, 1.0));
        assertThat(pulls.checks()).extracting(Check::named).containsExactly("wind square on", "wind along the blade");
        assertThat(pulls.checks().get(0).utilisation()).isCloseTo((1600 + WEIGHT * 0.2) / 4000 + Math.hypot(300, WEIGHT / 4) / 1000, within(1e-12));
        assertThat(pulls.checks().get(1).utilisation()).isCloseTo((22.5 + WEIGHT * 0.2) / 4000 + WEIGHT / 4 / 1000, within(1e-12));
    }

    @Test
    void bracketsThatCannotBeAreRefused() {
        assertThatThrownBy(() -> assess(fixings(2, 1, 0.15, 0), brackets(2, 0))).satisfies(e -> assertThat(((UnfitAnswer) e).field())
            .isEqualTo("brackets.spacing"));
        assertThatThrownBy(() -> assess(fixings(2, 1, 0.15, 0), brackets(0, 1))).satisfies(e -> assertThat(((UnfitAnswer) e).field())
            .isEqualTo("brackets.count"));
        assertThatThrownBy(() -> assess(fixings(2, 1, 0, 0), brackets(2, 1))).satisfies(e -> assertThat(((UnfitAnswer) e).field())
            .isEqualTo("fixings.horizontal-pitch"));
    }
}
