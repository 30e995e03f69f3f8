package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.BadJob;
import broadside.assess.Problem;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;

/** Values that a user sets in place of calculated ones. */
class OverrideTest {

    private static String with(String override) {
        return Jobs.changed(Jobs.HOARDING, "\"broadside\": 1,", "\"broadside\": 1, \"overrides\": [" + override + "],");
    }

    private static String override(String name, String value, String reason) {
        return "{ \"name\": \"" + name + "\", \"value\": " + value + (reason.isEmpty() ? "" : ", \"reason\": \"" + reason + "\"") + " }";
    }

    @Test
    void anOverrideIsUsedAndMarkedOnTheResult() {
        JsonNode plain = Jobs.result(Jobs.text(Jobs.HOARDING)).get("items").get(0);
        JsonNode item = Jobs.result(with(override("velocity-pressure", "\"0.65 kN/m2\"", "survey by N. Quill"))).get("items").get(0);
        double ratio = 650 / plain.get("velocity-pressure").get("value_Pa").doubleValue();
        assertThat(item.get("velocity-pressure").get("value_Pa").doubleValue()).isEqualTo(650);
        assertThat(item.get("cases").get(0).get("force_N").doubleValue())
            .isCloseTo(ratio * plain.get("cases").get(0).get("force_N").doubleValue(), within(1e-6));
        assertThat(item.get("overrides").toString())
            .isEqualTo("[{\"name\":\"velocity-pressure\",\"value\":650.0,\"unit\":\"Pa\",\"reason\":\"survey by N. Quill\"}]");
        assertThat(item.get("notes").get(0).get("kind").stringValue()).isEqualTo("override");
        assertThat(item.get("notes").get(0).get("text").stringValue()).contains("velocity-pressure was set to 650 Pa", "survey by N. Quill");
        assertThat(plain.has("overrides")).isFalse();
    }

    @Test
    void anOverrideWithoutAReasonIsRefused() {
        assertThat(Jobs.problems(with(override("velocity-pressure", "\"0.65 kN/m2\"", "")))).extracting(Problem::path).containsExactly("overrides[0].reason");
        assertThat(Jobs.problems(with(override("velocity-pressure", "\"0.65 kN/m2\"", " ")))).extracting(Problem::path).containsExactly("overrides[0].reason");
    }

    @Test
    void anOverrideOfAnUnknownStepIsRefusedByTheAssessor() {
        byte[] text = with(override("velocity-presure", "\"0.65 kN/m2\"", "r")).getBytes(StandardCharsets.UTF_8);
        assertThat(Jobs.READER.read(Jobs.json(new String(text, StandardCharsets.UTF_8))).problems()).as("the reader knows no steps").isEmpty();
        assertThatThrownBy(() -> Jobs.ASSESSOR.assess(Jobs.READER.read(text))).isInstanceOfSatisfying(BadJob.class, e -> {
            assertThat(e.problems()).hasSize(1);
            assertThat(e.problems().get(0).path()).isEqualTo("overrides[0].name");
            assertThat(e.problems().get(0).text()).startsWith("\"velocity-presure\" is not a step of this calculation with the unit Pa; there are ")
                .contains("velocity-pressure");
        });
    }

    @Test
    void anOverrideInAnotherUnitIsRefused() {
        assertThat(Jobs.problems(with(override("velocity-pressure", "650", "r")))).extracting(Problem::path).containsExactly("overrides[0].name");
        assertThat(Jobs.problems(with(override("velocity-pressure", "\"650 kg\"", "r")))).extracting(Problem::path).containsExactly("overrides[0].value");
        assertThat(Jobs.problems(with(override("velocity-pressure", "true", "r")))).extracting(Problem::path).containsExactly("overrides[0].value");
        assertThat(Jobs.problems(with(override("velocity-pressure", "1e400", "r")))).extracting(Problem::path).containsExactly("overrides[0].value");
    }

    @Test
    void theOlderWordForTheTopographicFactorIsKept() {
        String sign = Jobs.changed(Jobs.SIGN, "\"broadside\": 1,", "\"broadside\": 1, \"overrides\": [" + override("orography", "1.12", "survey") + "],");
        JsonNode steps = Jobs.result(sign).get("items").get(0).get("steps");
        assertThat(steps.valueStream().filter(s -> s.get("name").stringValue().equals("topography-factor")).findFirst().orElseThrow().get("value").doubleValue())
            .isEqualTo(1.12);
    }

    @Test
    void anOverrideOfOnePartLeavesTheOtherAsItWas() {
        Map<String, Double> plain = pressures(Jobs.text(Jobs.HOARDING));
        Map<String, Double> changed = pressures(with(override("pressure/A/stretch-1", "\"3 kPa\"", "r")));
        assertThat(plain).containsKeys("pressure/A/stretch-1", "pressure/A/stretch-2", "pressure/B/stretch-1");
        assertThat(changed.remove("pressure/A/stretch-1")).isEqualTo(3000);
        plain.remove("pressure/A/stretch-1");
        assertThat(changed).isEqualTo(plain);
    }

    private static Map<String, Double> pressures(String job) {
        Map<String, Double> found = new TreeMap<>();
        for (JsonNode step : Jobs.result(job).get("items").get(0).get("steps")) {
            if (step.get("name").stringValue().startsWith("pressure/")) {
                found.put(step.get("name").stringValue(), step.get("value").doubleValue());
            }
        }
        return found;
    }
}
