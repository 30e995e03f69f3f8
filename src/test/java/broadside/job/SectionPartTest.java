package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A section as a published check without a job. */
class SectionPartTest {

    private static PublishedCheck.Line run(String section, String step, String value) {
        String text = "{ \"title\": \"Section\", \"source\": { \"publication\": \"P\", \"edition\": \"E\", \"place\": \"p. 1\", \"status\": \"read\" }, \"given\": "
            + "{ \"part\": \"section\", \"section\": " + section + " }, \"expected\": [{ \"step\": \"" + step + "\", \"value\": \"" + value
            + "\", \"within\": \"0.01 %\", \"why\": \"w\" }] }";
        return Jobs.CHECKS.run(Map.of("a.json", text.getBytes(StandardCharsets.UTF_8))).get(0).lines().get(0);
    }

    /** A ring of 114.3 and 107.1 mm: pi/4 (114.3^2 - 107.1^2) = 1252.0 mm2, pi/64 (114.3^4 - 107.1^4) = 191.98 cm4. */
    @Test
    void propertiesByHand() {
        assertThat(run("\"CHS 114.3x3.6\"", "section-area", "1251.99 mm2").passed()).isTrue();
        assertThat(run("\"CHS 114.3x3.6\"", "section-inertia", "191.984 cm4").passed()).isTrue();
        assertThat(run("\"CHS 114.3x3.6\"", "section-modulus-elastic", "33.593 cm3").passed()).isTrue();
        assertThat(run("\"CHS 114.3x3.6\"", "section-mass", "9.8281 kg/m").passed()).isTrue();
        assertThat(run("\"CHS 114.3x3.6\"", "section-area", "1253 mm2").passed()).isFalse();
        assertThat(run("\"timber 100 x 100\"", "section-modulus-elastic", "166.667 cm3").passed()).isTrue();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"\"IPE 200\"|section \"IPE 200\" is not known", "5|is not known", "\"\"|is not known",
        "\"CHS 100x60\"|CHS 100x60 can be no section: its wall is thicker than half the diameter"})
    void whatIsNoSectionIsSaid(String section, String reason) {
        PublishedCheck.Line line = run(section, "section-area", "1 mm2");
        assertThat(line.passed()).isFalse();
        assertThat(line.computed()).contains(reason);
    }
}
