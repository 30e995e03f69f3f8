package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.assess.Loads;
import broadside.codes.WindCode;
import broadside.job.JobText;
import broadside.panel.Panel;
import broadside.table.Rows;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tools.jackson.databind.node.ObjectNode;

/** Every demo scenario by every code: the outcome that the coverage table says, and loads inside the bracket of plain statics or a reason why not. */
class ScenarioTest {

    private static final List<List<String>> TABLE = lines("own/scenarios.csv");
    private static final Map<String, String> REASONS = reasons();

    /** Ratio of the 3 s gust to the 10 min mean after Durst. */
    private static final double GUST = 1.53 / 1.05;

    private static List<List<String>> lines(String name) {
        return new String(AllJobs.files().get(name), StandardCharsets.UTF_8).lines().filter(l -> !l.startsWith("#") && !l.isBlank())
            .map(l -> Arrays.asList(l.split(","))).toList();
    }

    private static Map<String, String> reasons() {
        Map<String, String> reasons = new HashMap<>();
        lines("own/scenario-notes.csv").stream().skip(1).forEach(l -> reasons.put(l.get(0) + " " + l.get(1), String.join(",", l.subList(2, l.size()))));
        return reasons;
    }

    static Stream<Arguments> cases() {
        List<String> head = TABLE.get(0);
        List<Arguments> all = new ArrayList<>();
        TABLE.stream().skip(1).forEach(row -> {
            for (int i = 8; i < head.size(); i++) {
                all.add(Arguments.of(row.get(0), head.get(i), row, row.get(i)));
            }
        });
        return all.stream();
    }

    @ParameterizedTest(name = "{0} by {1}")
    @MethodSource("cases")
    void the_outcome_is_that_of_the_coverage_table(String scenario, String key, List<String> row, String outcome) {
        ItemResult result = result(row, key);
        String word = switch (outcome) {
            case "A" -> "assessed";
            case "N" -> "not-covered";
            default -> "outside-scope";
        };
        assertThat(result.outcome().word()).as(result.refusal().toString()).isEqualTo(word);
        if (!outcome.equals("A")) {
            assertThat(result.refusal().orElseThrow().reason()).isNotBlank();
            assertThat(result.refusal().orElseThrow().instead()).isNotBlank();
        }
    }

    @ParameterizedTest(name = "{0} by {1}")
    @MethodSource("cases")
    void loads_lie_near_plain_statics_or_the_reason_is_written_down(String scenario, String key, List<String> row, String outcome) {
        ItemResult result = result(row, key);
        if (row.get(5).equals("-") || result.loads().isEmpty()) {
            return;
        }
        double value = value(row.get(5), result.loads().get(), result);
        double low = 0.5 * Double.parseDouble(row.get(6));
        double high = 2.5 * Double.parseDouble(row.get(7));
        boolean inside = value >= low && value <= high;
        String reason = REASONS.get(scenario + " " + key);
        assertThat(inside || reason != null).as("%s is %.3f, outside %.3f to %.3f, and scenario-notes.csv gives no reason", row.get(5), value, low, high).isTrue();
        assertThat(inside && reason != null).as("scenario-notes.csv explains %s by %s, which needs no reason", scenario, key).isFalse();
    }

    private static double value(String what, Loads loads, ItemResult result) {
        return switch (what) {
            case "moment" -> loads.governs("base-moment").baseMoment() / 1000;
            case "force per metre" -> loads.governs("base-shear").force() / 1000 / result.item().panels().stream().mapToDouble(Panel::width).sum();
            default -> loads.governs("base-shear").force() / 1000;
        };
    }

    /** The demo job in the wind of its scenario by another code. */
    private static ItemResult result(List<String> row, String key) {
        ObjectNode job = (ObjectNode) JobText.read(AllJobs.files().get(row.get(1)));
        int slash = key.indexOf('/');
        job.putObject("basis").put("code", key.substring(0, slash)).put("edition", key.substring(slash + 1));
        WindCode code = AllJobs.TOOL.assessor().codes().code(key).orElseThrow();
        ObjectNode before = (ObjectNode) job.get("site");
        double gust = Double.parseDouble(row.get(4));
        boolean mean = code.terms().averaging().seconds() > 3;
        Rows terrains = AllJobs.TOOL.tables().edition("own-rules/1").orElseThrow().rows("terrain-match");
        ObjectNode site = job.putObject("site").put("basic-speed", String.format(Locale.ROOT, "%.3f m/s", mean ? gust / GUST : gust))
            .put("averaging", code.terms().averaging().words()).put("terrain", terrains.text(row.get(3), key.substring(0, slash)));
        for (String name : List.of("altitude", "topography")) {
            if (before.has(name)) {
                site.set(name, before.get(name));
            }
        }
        Job read = AllJobs.TOOL.reader().read(job).orThrow();
        return AllJobs.assess(read).items().stream().filter(i -> i.item().mark().equals(row.get(2))).findFirst().orElseThrow();
    }

    @Test
    void every_scenario_is_there() {
        assertThat(TABLE.stream().skip(1).map(r -> r.get(0).replaceAll("[a-z]$", "")).distinct()).hasSize(12);
        assertThat(TABLE.get(0).subList(8, TABLE.get(0).size())).containsExactlyInAnyOrderElementsOf(AllJobs.TOOL.assessor().codes().editions());
    }
}
