package broadside.support;

import static broadside.support.Stands.STABILITY;
import static broadside.support.Stands.friction;
import static broadside.support.Stands.ground;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import broadside.panel.FenceFeet;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The lowest of the published values: EN 13814 table 3 and BS 5975 as quoted, the rest recalled. */
class FrictionTest {

    private static final Friction FRICTION = new Friction(STABILITY);

    private static Friction.Grip of(String words) {
        return FRICTION.of(ground(words), new Trace());
    }

    @ParameterizedTest
    @CsvSource({"concrete on concrete, 0.4, second-hand", "Steel  on Concrete, 0.1, second-hand", "steel on steel, 0.1, second-hand",
        "wood on clay, 0.25, second-hand",
        "concrete on loam, 0.4, second-hand", "steel on sand, 0.2, second-hand", "rubber on dry asphalt, 0.5, recalled", "rubber on wet asphalt, 0.3, recalled",
        "asphalt, 0.3, recalled", "concrete, 0.3, recalled", "paving, 0.3, recalled", "clay, 0.25, second-hand", "loam, 0.4, second-hand",
        "sand, 0.25, second-hand",
        "gravel, 0.35, second-hand", "dry grass, 0.25, derived", "grass, 0.2, recalled", "wet grass, 0.2, recalled", "steel on trowelled concrete, 0.5, second-hand",
        "steel on grass, 0.2, recalled"})
    void theLowestPublishedValueThatAppliesIsTaken(String words, double mu, String status) {
        assertThat(of(words).value()).isEqualTo(mu);
        assertThat(of(words).status().word()).isEqualTo(status);
        assertThat(of(words).assumptions()).noneMatch(a -> a.contains("no published value"));
    }

    @ParameterizedTest
    @CsvSource({"lava, 0.2", "'', 0.2", "on, 0.2", "steel on lava, 0.1", "steel on asphalt, 0.1", "glass on concrete, 0.3", "rubber on sand, 0.2"})
    void aSurfaceThatNobodyPublishedHasTheLowestThatCanApply(String words, double mu) {
        assertThat(of(words).value()).isEqualTo(mu);
        assertThat(of(words).assumptions()).isNotEmpty();
    }

    @ParameterizedTest
    @org.junit.jupiter.params.provider.ValueSource(strings = {"ice", "Snow", "mud", "steel on slush", "peat"})
    void nothingHoldsByItsWeightOnIceOrMud(String words) {
        org.assertj.core.api.Assertions.assertThatThrownBy(() -> of(words)).isInstanceOf(NoAnswer.class).hasMessageContaining("no friction can be counted");
    }

    @Test
    void noSurfaceIsTheLowestOfAllAndSaysSo() {
        Friction.Grip grip = FRICTION.of(new FenceFeet.Surface(Optional.empty(), Optional.empty(), Optional.empty()), new Trace());
        assertThat(grip.value()).isEqualTo(0.2);
        assertThat(grip.assumptions()).hasSize(1).allMatch(a -> a.contains("(grass)") && a.contains("not given"));
    }

    @Test
    void wetGrassAndBareSteelAreSaid() {
        assertThat(of("asphalt").remarks()).isEmpty();
        assertThat(of("concrete").assumptions()).anyMatch(a -> a.contains("steel on concrete") && a.contains("0.1"));
        assertThat(of("concrete on concrete").assumptions()).isEmpty();
    }

    @Test
    void aTypedValueStandsWithItsReason() {
        assertThat(FRICTION.of(friction(0.75), new Trace())).isEqualTo(new Friction.Grip(0.75, Status.GIVEN,
            java.util.List.of("The friction of 0.75 is as typed, and who measured it was not said."), java.util.List.of()));
        FenceFeet.Surface measured = new FenceFeet.Surface(Optional.of("asphalt"), Optional.of(1.1), Optional.of("pulled on site"));
        Trace trace = new Trace();
        assertThat(FRICTION.of(measured, trace).value()).isEqualTo(1.1);
        assertThat(trace.find("friction").orElseThrow().formula()).contains("pulled on site");
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -0.1, 1.0001, 5, Double.NaN, Double.POSITIVE_INFINITY})
    void aTypedValueThatCannotBeIsRefused(double mu) {
        assertThatThrownBy(() -> FRICTION.of(friction(mu), new Trace())).isInstanceOf(UnfitAnswer.class)
            .satisfies(e -> assertThat(((UnfitAnswer) e).field()).isEqualTo("friction"));
    }
}
