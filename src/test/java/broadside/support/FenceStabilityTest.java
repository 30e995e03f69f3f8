package broadside.support;

import static broadside.support.Stands.PLAIN;
import static broadside.support.Stands.RULES;
import static broadside.support.Stands.STABILITY;
import static broadside.support.Stands.brace;
import static broadside.support.Stands.feet;
import static broadside.support.Stands.friction;
import static broadside.support.Stands.ground;
import static broadside.support.Stands.staked;
import static broadside.support.Stands.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.FenceFeet;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Fences on feet, worked out by hand with 9.80665 m/s2. */
class FenceStabilityTest {

    private static final double G = 9.80665;
    private static final FenceStability FENCES = new FenceStability(STABILITY);

    private static StabilityResult assess(FenceFeet feet, String rule, double force, double height) {
        Trace trace = new Trace();
        return FENCES.assess(feet, 3.5, List.of(wind("hardest-covered", force, height, true, trace)), RULES.of(rule), PLAIN, trace);
    }

    private static double ratio(StabilityResult result, String way) {
        return result.panels().get(0).turns().stream().filter(t -> t.name().equals(way)).findFirst().orElseThrow().ratio();
    }

    /** 3.45 x 2.0 m, foot 25 kg and 0.65 m, panel 18 kg, brace 1.2 m with 80 kg, lever 1.0 m, 1.25 kg/m3: tipping speeds as worked out before, m/s. */
    @ParameterizedTest
    @CsvSource({"1.2, '', 1, 5.1", "1.2, '', 1.5, 4.2", "0.96, '', 1, 5.8", "0.96, '', 1.5, 4.7", "0.25, '', 1, 11.3", "0.25, '', 1.5, 9.2",
        "1.2, towards the brace, 1, 9.9", "1.2, towards the brace, 1.5, 8.1", "1.2, away from the brace, 1, 14.4", "1.2, away from the brace, 1.5, 11.8"})
    void tippingSpeedsOfABannerOnATemporaryFence(double coefficient, String way, double safety, double speed) {
        double atOne = 0.5 * 1.25 * coefficient * 3.45 * 2.0;
        FenceFeet feet = feet(18, 25, 0.65, friction(0.4), way.isEmpty() ? Optional.empty() : brace(1.2, 80));
        double ratio = ratio(assess(feet, "factor-1.5", atOne, 1.0), way);
        assertThat(Math.sqrt(ratio / safety)).isCloseTo(speed, within(0.0501));
        assertThat(ratio(assess(feet, "factor-1.5", atOne * speed * speed, 1.0), way)).isCloseTo(safety, within(0.03 * safety));
    }

    /** Sheeted panel 3.5 x 2.0 m at 200 Pa and 1.2, 200 N, 60 kg at 0.35 m: ratio 276.01/1680, sliding 0.4 x 788.6/1680. */
    @Test
    void aSheetedPanelOnBlocksFailsByAFactorOfSix() {
        StabilityResult result = assess(feet(200 / 9.81, 0, 0.7, friction(0.4), Optional.empty(), 60, 0), "factor-1.5", 1680, 1.0);
        assertThat(ratio(result, "")).isCloseTo(0.1643, within(0.0001));
        assertThat(result.panels().get(0).sliding()).isCloseTo(0.1878, within(0.00015));
        assertThat(result.checks()).extracting(Check::name).containsExactly("overturning", "sliding");
        assertThat(result.checks()).noneMatch(Check::passes);
        assertThat(result.checks().get(0).utilisation()).isCloseTo(1.5 / 0.16424, within(0.01));
        assertThat(result.need().line()).isCloseTo(1.5 * 1680 / (G * 0.35) - 200 / 9.81, within(0.01));
        assertThat(result.perMetre()).isCloseTo(result.need().line() / 3.5, within(1e-9));
        assertThat(result.remarks()).anyMatch(r -> r.startsWith("Will not stand on blocks alone: the hardest covered needs 714 kg"));
    }

    /** Blocks 60 kg at 0.2 m behind the line, foot 0.6 m: arms 0.1 m for wind from the front, 0.5 m for wind from behind. */
    @Test
    void aBlockOffTheLineHelpsOneWayMore() {
        StabilityResult result = assess(feet(10, 10, 0.6, friction(0.4), Optional.empty(), 60, 0.2), "factor-1.5", 100, 1.0);
        assertThat(ratio(result, "to the back")).isCloseTo(G * (20 * 0.3 + 60 * 0.1) / 100, within(1e-9));
        assertThat(ratio(result, "to the front")).isCloseTo(G * (20 * 0.3 + 60 * 0.5) / 100, within(1e-9));
        StabilityResult beyond = assess(feet(10, 10, 0.6, friction(0.4), Optional.empty(), 60, 0.5), "factor-1.5", 100, 1.0);
        assertThat(ratio(beyond, "to the back")).isCloseTo(G * 20 * 0.3 / 100, within(1e-9));
        assertThat(beyond.remarks()).anyMatch(r -> r.contains("beyond the end of the foot"));
    }

    /** EN 1990 EQU: 0.9 x 20 x 0.3 x g over 1.5 x 100 x 1.0. BR18: 0.9 of the weight over 1.2 times the wind. */
    @Test
    void theRulePutsItsFactorsOnWeightAndWind() {
        FenceFeet feet = feet(10, 10, 0.6, friction(0.4), Optional.empty());
        assertThat(ratio(assess(feet, "en-1990-equ", 100, 1.0), "")).isCloseTo(0.9 * 6 * G / 150, within(1e-9));
        assertThat(ratio(assess(feet, "evacuation-1.2", 100, 1.0), "")).isCloseTo(0.9 * 6 * G / 120, within(1e-9));
        assertThat(assess(feet, "frame-ballast-0.9", 100, 1.0).checks().get(1).demand()).isCloseTo(1.5 * 100, within(1e-9));
        assertThat(assess(feet, "frame-ballast-0.9", 100, 1.0).checks().get(0).demand()).isCloseTo(100, within(1e-9));
    }

    /** Braced: 43 kg about 1.2 m; wind moment 1000 N m. Uplift (1000 - 506.0)/1.2 at the fence; away (1000 - 1078.5)/1.2: none. */
    @Test
    void theWindwardFootOfABracedFenceLifts() {
        StabilityResult result = assess(feet(18, 25, 0.65, friction(0.4), brace(1.2, 80)), "factor-1.5", 1000, 1.0);
        assertThat(result.panels().get(0).turns().get(0).uplift()).isCloseTo((1000 - 43 * 1.2 * G) / 1.2, within(1e-9));
        assertThat(result.panels().get(0).turns().get(1).uplift()).isZero();
        assertThat(result.need().line()).isCloseTo(1500 / (1.2 * G) - 43, within(1e-9));
        double tipping = 1500 / (1.2 * G) - (43 + result.need().line()) * 0.325 / 1.2;
        assertThat(result.need().brace()).isCloseTo(Math.max(tipping, 1500 / (0.4 * G) - 43 - result.need().line()), within(1e-9));
    }

    /** Two stakes proved at 1 kN each: 2 x 1000/1.25 x 0.6 m more; the friction stays. */
    @Test
    void stakesCountByTheirProofLoadAgainstTippingOnly() {
        FenceFeet bare = feet(10, 10, 0.6, friction(0.4), Optional.empty());
        StabilityResult with = assess(staked(bare, 1000, 2), "factor-1.5", 100, 1.0);
        assertThat(ratio(with, "")).isCloseTo((20 * 0.3 * G + 960) / 100, within(1e-9));
        assertThat(with.panels().get(0).sliding()).isEqualTo(assess(bare, "factor-1.5", 100, 1.0).panels().get(0).sliding());
        FenceFeet words = new FenceFeet(bare.panelMass(), bare.footMass(), bare.footLength(), List.of(), Optional.empty(), bare.surface(),
            new FenceFeet.Stakes(Optional.of("pins"), Optional.empty(), Optional.empty()));
        assertThat(ratio(assess(words, "factor-1.5", 100, 1.0), "")).isEqualTo(ratio(assess(bare, "factor-1.5", 100, 1.0), ""));
        assertThat(assess(words, "factor-1.5", 100, 1.0).remarks()).anyMatch(r -> r.startsWith("Stakes are not counted"));
    }

    /** Nothing known but blocks: 60 kg on a foot of 0.6 m. */
    @Test
    void whatIsNotKnownCountsAsNothingAndIsSaid() {
        FenceFeet unknown = new FenceFeet(Optional.empty(), Optional.empty(), Optional.empty(), List.of(new FenceFeet.Block(Mass.kilograms(60),
            Length.metres(0))),
            Optional.empty(), ground("dry grass"), new FenceFeet.Stakes(Optional.empty(), Optional.empty(), Optional.empty()));
        StabilityResult result = assess(unknown, "factor-1.5", 100, 1.0);
        assertThat(ratio(result, "")).isCloseTo(60 * 0.3 * G / 100, within(1e-9));
        assertThat(result.panels().get(0).sliding()).isCloseTo(0.25 * 60 * G / 100, within(1e-9));
        assertThat(result.assumptions()).hasSize(4).anyMatch(a -> a.contains("0.6 m is taken"));
        FenceFeet nothing = new FenceFeet(Optional.empty(), Optional.empty(), Optional.empty(), List.of(), Optional.empty(), ground("grass"),
            new FenceFeet.Stakes(Optional.empty(), Optional.empty(), Optional.empty()));
        assertThat(assess(nothing, "factor-1.5", 100, 1.0).checks()).allMatch(c -> c.utilisation() == Check.MOST);
    }

    @Test
    void eachWindHasItsChecksAndTheHardestNamesTheNeed() {
        Trace trace = new Trace();
        List<PanelWind> winds = List.of(wind("hardest-covered", 900, 1.1, true, trace), wind("mean-covered", 500, 1.1, true, trace), wind("hardest-bare",
            150, 1.0, false, trace));
        StabilityResult result = FENCES.assess(feet(18, 25, 0.65, friction(0.4), Optional.empty(), 25, 0), 3.45, winds, RULES.of("factor-1.5"), PLAIN, trace);
        assertThat(result.panels()).hasSize(3);
        assertThat(result.need().named()).isEqualTo("hardest covered");
        assertThat(trace.find("overturning-ratio/mean-covered")).isPresent();
        assertThat(trace.find("ballast-mass/line/hardest-bare").orElseThrow().value()).isEqualTo(result.panels().get(2).need().line());
        assertThat(result.remarks()).anyMatch(r -> r.startsWith("Will not stand on blocks alone") && r.contains("reaching 1.2 m behind the line they need")
            && r.contains("With the cover taken off each panel needs " + broadside.quantity.Show.number(result.panels().get(2).need().line(), 3, broadside.quantity.Rounding.UP) + " kg"));
    }

    @Test
    void aLittleWindNeedsNoWords() {
        assertThat(assess(feet(18, 25, 0.65, friction(0.4), Optional.empty()), "factor-1.5", 50, 1.0).remarks()).isEmpty();
        StabilityResult calm = assess(feet(18, 25, 0.65, friction(0.4), Optional.empty()), "factor-1.5", 0, 1.0);
        assertThat(calm.need().total()).isZero();
        assertThat(ratio(calm, "")).isEqualTo(Check.MOST);
        assertThat(calm.checks()).allMatch(Check::passes);
    }

    @Test
    void feetThatCannotBeAreRefusedWithTheirField() {
        refused(feet(18, 25, 0, friction(0.4), Optional.empty()), "foot-length");
        refused(feet(-1, 25, 0.6, friction(0.4), Optional.empty()), "panel-mass");
        refused(feet(1, -25, 0.6, friction(0.4), Optional.empty()), "foot-mass");
        refused(feet(1, 25, 0.6, friction(0.4), Optional.empty(), 5, 0, -3, 0), "blocks[1].mass");
        refused(feet(1, 25, 0.6, friction(0.4), brace(0.3, 80)), "brace.lever");
        refused(feet(1, 25, 0.6, friction(0.4), brace(1.2, -80)), "brace.mass");
        refused(staked(feet(1, 25, 0.6, friction(0.4), Optional.empty()), 0, 1), "stake-proof-load");
        refused(staked(feet(1, 25, 0.6, friction(0.4), Optional.empty()), 100, 0), "stakes-per-panel");
    }

    private static void refused(FenceFeet feet, String field) {
        assertThatThrownBy(() -> assess(feet, "factor-1.5", 100, 1.0)).isInstanceOf(UnfitAnswer.class)
            .satisfies(e -> assertThat(((UnfitAnswer) e).field()).isEqualTo(field));
    }
}
