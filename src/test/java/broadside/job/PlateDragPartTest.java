package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A plate in the wind as a published check without a job. */
class PlateDragPartTest {

    private static final String PLATE = "\"part\": \"plate-drag\", \"width\": \"3 m\", \"height\": \"2 m\", \"speed\": \"20 m/s\", \"air-density\": \"1.225 kg/m3\"";

    private static PublishedCheck.Line run(String given, String step, String value, String within) {
        String text = "{ \"title\": \"Plate\", \"source\": { \"publication\": \"P\", \"edition\": \"E\", \"place\": \"p. 1\", \"status\": \"read\" }, \"given\": { " + given
            + " }, \"expected\": [{ \"step\": \"" + step + "\", \"value\": " + value + ", \"within\": " + within + ", \"why\": \"w\" }] }";
        return Jobs.CHECKS.run(Map.of("a.json", text.getBytes(StandardCharsets.UTF_8))).get(0).lines().get(0);
    }

    /** Sides 1.5: 1.185039; on the ground 4 by 3: 1.18 + 0.02 ln(4/3)/ln 5 = 1.183575. q = 245 Pa, area 6 m2. */
    @Test
    void coefficientAndForce() {
        assertThat(run(PLATE, "coefficient", "1.185039", "0.000001").passed()).isTrue();
        assertThat(run(PLATE, "force", "\"1742.01 N\"", "\"0.01 N\"").passed()).isTrue();
        assertThat(run(PLATE + ", \"on-ground\": false, \"solidity\": 1.0", "force", "\"1742.01 N\"", "\"0.01 N\"").passed()).isTrue();
        assertThat(run(PLATE + ", \"on-ground\": true", "coefficient", "1.183575", "0.000001").passed()).isTrue();
        assertThat(run(PLATE + ", \"solidity\": 0.5", "coefficient", "0.999343", "0.000001").passed()).isTrue();
        assertThat(run(PLATE + ", \"solidity\": 0.5", "porosity-factor", "0.8433", "0.0001").passed()).isTrue();
    }

    /** 9 ft 10 in by 6 ft 6.74 in at 44.7387 mph in 0.07647 lb/ft3. */
    @Test
    void usUnits() {
        String feet = "\"part\": \"plate-drag\", \"width\": \"9.84252 ft\", \"height\": \"6.56168 ft\", \"speed\": \"44.73873 mph\", \"air-density\": \"0.0764742 lb/ft3\"";
        assertThat(run(feet, "force", "\"391.62 lbf\"", "\"0.05 lbf\"").passed()).isTrue();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "\"width\": \"3 m\"|\"width\": \"3\"|width: a length above zero",
        "\"width\": \"3 m\"|\"width\": \"0 m\"|width: a length above zero",
        "\"height\": \"2 m\"|\"tall\": \"2 m\"|height: a length above zero",
        "\"speed\": \"20 m/s\"|\"speed\": 20|speed: a speed above zero",
        "\"air-density\": \"1.225 kg/m3\"|\"air-density\": \"1.2\"|air-density: a density above zero",
        "\"height\": \"2 m\"|\"height\": \"2 m\", \"solidity\": 0|solidity must be a number above 0",
        "\"height\": \"2 m\"|\"height\": \"2 m\", \"solidity\": \"half\"|solidity must be a number above 0",
        "\"height\": \"2 m\"|\"height\": \"2 m\", \"on-ground\": \"no\"|on-ground must be true or false",
        "\"height\": \"2 m\"|\"height\": \"2 mm\"|the Reynolds number is below 10000",
        "\"part\": \"plate-drag\"|\"part\": \"kite\"|it knows convert-speed, plate-drag"})
    void whatDoesNotFitIsSaid(String old, String other, String reason) {
        PublishedCheck.Line line = run(PLATE.replace(old, other), "force", "\"1742 N\"", "\"1 N\"");
        assertThat(line.passed()).isFalse();
        assertThat(line.computed()).contains(reason);
    }
}
