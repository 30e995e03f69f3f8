package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.Foot;
import broadside.trace.Status;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tools.jackson.databind.JsonNode;

/** The result file of every example: its fields, and no number that is none. */
class ResultTextTest {

    static Stream<String> examples() {
        return Jobs.all().keySet().stream();
    }

    private static List<String> names(JsonNode list, String key) {
        return list.valueStream().map(n -> n.get(key).stringValue()).toList();
    }

    @ParameterizedTest
    @MethodSource("examples")
    void itsHeadSaysWhatMadeIt(String example) {
        JsonNode root = Jobs.result(Jobs.text(example));
        assertThat(root.get("broadside").intValue()).isEqualTo(1);
        assertThat(root.get("status").stringValue()).isEqualTo("preliminary");
        assertThat(root.get("version").stringValue()).matches("\\d+\\.\\d+.*");
        assertThat(root.get("tables").stringValue()).isEqualTo(Jobs.TABLES.digest());
        assertThat(root.get("items").size()).isPositive();
    }

    @ParameterizedTest
    @MethodSource("examples")
    void everyItemHasTheFieldsOfTheContract(String example) {
        for (JsonNode item : Jobs.result(Jobs.text(example)).get("items")) {
            assertThat(item.propertyNames()).contains("mark", "kind", "outcome", "supports", "limits", "notes", "steps");
            assertThat(item.get("outcome").stringValue()).isIn("assessed", "outside-scope");
            if (item.get("outcome").stringValue().equals("outside-scope")) {
                assertThat(item.get("scope").propertyNames()).contains("sentence", "case", "reason", "send", "shown");
                if (item.get("scope").get("shown").stringValue().equals("nothing")) {
                    assertThat(item.propertyNames()).doesNotContain("cases", "governing", "velocity-pressure");
                    continue;
                }
            }
            assertThat(item.propertyNames()).contains("velocity-pressure", "cases", "governing", "reactions");
            assertThat(item.get("velocity-pressure").propertyNames()).contains("height_m", "value_Pa", "level");
            assertThat(item.get("velocity-pressure").get("value_Pa").doubleValue()).isPositive();
            assertThat(item.get("velocity-pressure").get("level").stringValue()).isIn("characteristic", "strength");
            assertThat(item.get("supports").isArray() && item.get("limits").isArray()).isTrue();
            assertThat(item.get("cases").size()).isPositive();
            double posts = item.path("posts-drag").path("base_moment_Nm").asDouble(0);
            Foot foot = foot(item.get("kind").stringValue());
            item.get("cases").forEach(c -> aCase(c, posts, foot));
            assertThat(item.get("governing").propertyNames()).contains("base-shear");
            Set<String> cases = Set.copyOf(names(item.get("cases"), "case"));
            item.get("governing").properties().stream().filter(g -> !g.getKey().endsWith("-state")).forEach(g -> assertThat(cases).contains(g.getValue().stringValue()));
            item.get("notes").forEach(n -> assertThat(n.propertyNames()).containsExactlyInAnyOrder("kind", "text"));
            item.get("steps").forEach(ResultTextTest::aStep);
        }
    }

    private static Foot foot(String kind) {
        return switch (kind) {
            case "projecting-sign" -> Foot.WALL;
            case "facade-panel", "spanned-banner" -> Foot.NONE;
            default -> Foot.GROUND;
        };
    }

    /** The moment at the ground is that of the boards and that of the wind on the posts; what has no foot has no moment. */
    private static void aCase(JsonNode node, double posts, Foot foot) {
        assertThat(node.propertyNames()).contains("case", "label", "direction", "zones", "force_N", "height_m", "base_shear_N");
        assertThat(node.has("base_moment_Nm")).isEqualTo(foot != Foot.NONE);
        assertThat(node.has("torsion_Nm")).isEqualTo(foot == Foot.GROUND);
        assertThat(node.get("direction").stringValue()).isIn("front", "back", "inward", "outward");
        assertThat(node.get("force_N").doubleValue()).as("a magnitude").isPositive();
        if (foot == Foot.GROUND) {
            assertThat(node.get("base_moment_Nm").doubleValue())
                .isCloseTo(node.get("force_N").doubleValue() * node.get("height_m").doubleValue() + posts, within(1e-6 * node.get("base_moment_Nm").doubleValue()));
        }
        for (JsonNode zone : node.get("zones")) {
            assertThat(zone.propertyNames()).contains("zone", "from_m", "to_m", "coefficient", "pressure_Pa");
            assertThat(zone.get("to_m").doubleValue()).isGreaterThan(zone.get("from_m").doubleValue());
        }
    }

    private static void aStep(JsonNode step) {
        assertThat(step.propertyNames()).contains("name", "symbol", "meaning", "formula", "inputs", "value", "unit", "place", "status");
        for (String key : List.of("name", "symbol", "meaning", "formula", "unit", "place")) {
            assertThat(step.get(key).stringValue()).as("%s of %s", key, step.get("name")).isNotBlank();
        }
        assertThat(Status.of(step.get("status").stringValue())).isPresent();
        step.get("inputs").forEach(i -> assertThat(i.propertyNames()).containsExactlyInAnyOrder("symbol", "value", "unit"));
    }

    @ParameterizedTest
    @MethodSource("examples")
    void everyNumberIsFinite(String example) {
        JsonNode root = Jobs.result(Jobs.text(example));
        assertThat(new String(JobText.write(root), StandardCharsets.UTF_8)).doesNotContain("NaN", "Infinity", ": null", ": -0.0,");
        finite(root);
    }

    private static void finite(JsonNode node) {
        assertThat(node.isNumber() && !Double.isFinite(node.doubleValue())).isFalse();
        assertThat(node.isNull()).isFalse();
        node.forEach(ResultTextTest::finite);
    }

    @ParameterizedTest
    @MethodSource("examples")
    void aJobWrittenAndReadBackGivesTheSameResult(String example) {
        String again = new String(JobText.write(Jobs.json(Jobs.text(example))), StandardCharsets.UTF_8);
        assertThat(JobText.write(Jobs.result(again))).isEqualTo(JobText.write(Jobs.result(Jobs.text(example))));
    }

    @ParameterizedTest
    @MethodSource("examples")
    void loadsAndReactionsBalance(String example) {
        for (JsonNode item : Jobs.result(Jobs.text(example)).get("items")) {
            if (item.path("posts").isEmpty()) {
                continue;
            }
            assertThat(item.get("equilibrium").size()).isPositive();
            for (JsonNode line : item.get("equilibrium")) {
                double loads = line.get("loads").doubleValue();
                assertThat(line.get("reactions").doubleValue()).isCloseTo(loads, within(1e-9 * loads));
            }
        }
    }

    @Test
    void theNamedStepsAreThere() {
        JsonNode sign = Jobs.result(Jobs.text(Jobs.SIGN)).get("items").get(0).get("steps");
        assertThat(names(sign, "name")).contains("basic-velocity-pressure", "roughness-factor", "turbulence-intensity", "mean-speed", "exposure-factor",
            "velocity-pressure", "topography-factor", "probability-factor", "air-density", "coefficient/all", "pressure/all", "force/centred",
            "eccentricity/eccentric", "lever-arm/centred", "base-shear/centred", "base-moment/centred", "torsion/eccentric", "post-moment", "post-shear");
        JsonNode feet = Jobs.result(Jobs.text(Jobs.FEET)).get("items").get(0).get("steps");
        assertThat(names(feet, "name")).contains("exposure-factor", "velocity-pressure", "topography-factor", "elevation-factor", "gust-factor", "force/case-a",
            "eccentricity/case-b", "base-moment/case-a", "torsion/case-b", "post-moment");
        JsonNode wall = Jobs.result(Jobs.text(Jobs.HOARDING)).get("items").get(0).get("steps");
        assertThat(names(wall, "name").stream().map(n -> n.replaceFirst("/stretch-\\d$", "")).collect(Collectors.toSet()))
            .contains("coefficient/A", "coefficient/D", "zone-width/A", "zone-width/D", "pressure/A", "pressure/D", "force/wall", "base-moment/wall", "torsion/wall");
    }

    @Test
    void theSignOfTheContractIsWorkedOut() {
        JsonNode item = Jobs.result(Jobs.text(Jobs.SIGN)).get("items").get(0);
        double q = item.get("velocity-pressure").get("value_Pa").doubleValue();
        JsonNode centred = item.get("cases").get(0);
        assertThat(item.get("velocity-pressure").get("height_m").doubleValue()).isEqualTo(3.5);
        assertThat(centred.get("force_N").doubleValue()).as("q c_f b h").isCloseTo(q * 1.8 * 3 * 2, within(1e-6));
        assertThat(centred.get("height_m").doubleValue()).isCloseTo(3.5, within(1e-12));
        JsonNode eccentric = item.get("cases").valueStream().filter(c -> c.get("case").stringValue().equals("eccentric")).findFirst().orElseThrow();
        assertThat(Math.abs(eccentric.get("torsion_Nm").doubleValue())).isCloseTo(0.75 * q * 1.8 * 6, within(1e-6));
        assertThat(item.get("self_weight_N").doubleValue()).isCloseTo(60 * 9.80665, within(1e-9));
    }

    @Test
    void anItemThatTheCodeDoesNotCoverSaysWhy() {
        JsonNode item = Jobs.result(Jobs.changed(Jobs.HOARDING, "\"height\": \"2.4 m\"", "\"height\": \"250 m\"")).get("items").get(0);
        assertThat(item.get("outcome").stringValue()).isEqualTo("not-covered");
        assertThat(item.get("reason").propertyNames()).containsExactly("code", "clause", "reason", "instead");
        item.get("reason").forEach(r -> assertThat(r.stringValue()).isNotBlank());
        assertThat(item.has("cases") || item.has("velocity-pressure") || item.has("governing")).isFalse();
    }
}
