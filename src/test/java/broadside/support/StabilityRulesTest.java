package broadside.support;

import static broadside.support.Stands.RULES;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Rules as gathered: EN 1990 A1.2(A), Florida Building Code, EN 13782, BR18, BS 5975, TWf, DIN EN 12811. */
class StabilityRulesTest {

    @ParameterizedTest
    @CsvSource({"en-1990-equ, 0.90, 1, true, 1, 1, second-hand", "asd-0.6, 0.6, 1, false, 1, 1, read", "factor-1.5, 1, 1, false, 1.5, 1.5, read",
        "en-13782, 1, 1.2, false, 1, 1, recalled", "evacuation-1.2, 0.9, 1.2, false, 1, 1, read", "br18-1.5, 0.9, 1.5, false, 1, 1, read",
        "bs-5975-1.2, 1, 1, false, 1.2, 1.2, recalled", "twf-1.5, 1, 1, false, 1.5, 1.5, recalled", "frame-ballast-0.9, 0.9, 1, false, 1, 1.5, second-hand"})
    void theFactorsOfEachRule(String key, double weight, double wind, boolean strength, double required, double sliding, String status) {
        StabilityRule rule = RULES.of(key);
        assertThat(rule.onWeight()).isEqualTo(weight);
        assertThat(rule.onWind()).isEqualTo(wind);
        assertThat(rule.strength()).isEqualTo(strength);
        assertThat(rule.required()).isEqualTo(required);
        assertThat(rule.status().word()).isEqualTo(status);
        assertThat(RULES.sliding(rule).required()).isEqualTo(sliding);
        assertThat(rule.title()).isNotBlank();
        assertThat(rule.place()).isNotBlank();
    }

    @Test
    void anotherKeyIsRefusedWithThoseThatThereAre() {
        assertThatThrownBy(() -> RULES.of("en-1990")).isInstanceOf(UnfitAnswer.class).hasMessageContaining("en-1990-equ, asd-0.6, factor-1.5")
            .satisfies(e -> assertThat(((UnfitAnswer) e).field()).isEqualTo("basis.stability"));
        assertThat(RULES.keys()).hasSize(9);
    }
}
