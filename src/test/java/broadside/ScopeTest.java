package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.ItemResult.Outcome;
import broadside.job.ResultText;
import broadside.table.Rows;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tools.jackson.databind.JsonNode;

/** What lies outside the scope is refused with the fixed sentence, the reason and what to send, and never with a check of a support. */
class ScopeTest {

    private static final Rows RULES = AllJobs.TOOL.tables().edition("own-rules/1").orElseThrow().rows("scope");

    private static final Map<String, String> KINDS = Map.of(
        "post-sign", "'boards': [{'width': '2 m', 'height': '1 m', 'clearance': '2.5 m'}], 'posts': {'count': 1}",
        "hoarding", "'length': '20 m', 'height': '2.4 m', 'posts': {'spacing': '2.4 m'}",
        "banner-fence", "'panel-length': '3.5 m', 'panel-height': '2 m', 'panels': 12, 'cover-solidity': 1.0",
        "facade-panel", "'backing': 'wall', 'width': '1.2 m', 'height': '2.5 m', 'bottom': '3 m', 'distance-from-corner': '0.3 m', "
            + "'building': {'width': '30 m', 'depth': '20 m', 'height': '12 m'}",
        "projecting-sign", "'projection': '0.6 m', 'height': '2.4 m', 'bottom': '3.2 m', 'depth': '0.1 m'",
        "spanned-banner", "'width': '8 m', 'height': '1 m', 'bottom': '5 m', 'sag': '0.4 m'");

    static Stream<Arguments> answers() {
        List<Arguments> all = new ArrayList<>();
        KINDS.forEach((kind, fields) -> RULES.keys().stream().filter(a -> !a.equals("v-shaped faces")).forEach(answer -> all.add(Arguments.of(kind, answer, fields))));
        return all.stream();
    }

    @Test
    void there_are_many_of_them() {
        assertThat(answers().count() + angles().count()).isGreaterThanOrEqualTo(60);
    }

    @ParameterizedTest(name = "{0} on {1}")
    @MethodSource("answers")
    void what_it_is_fixed_to_is_outside_the_scope(String kind, String answer, String fields) {
        refused("{'mark': 'X1', 'kind': '" + kind + "', " + fields + ", 'held-by': '" + answer + "'}", answer);
    }

    static Stream<String> angles() {
        return Stream.of("5 deg", "15 deg", "30 deg", "45 deg", "60 deg", "90 deg", "120 deg", "180 deg");
    }

    @ParameterizedTest
    @MethodSource("angles")
    void faces_that_open_in_a_v_are_outside_the_scope(String angle) {
        refused("{'mark': 'X1', 'kind': 'post-sign', " + KINDS.get("post-sign") + ", 'faces': 2, 'opening-angle': '" + angle + "'}", "v-shaped faces");
    }

    private static void refused(String item, String key) {
        Assessment assessment = AllJobs.assess(JobTexts.job("en-1991-1-4/2005", JobTexts.EN, item));
        ItemResult result = assessment.items().get(0);
        assertThat(result.outcome()).isEqualTo(Outcome.OUTSIDE_SCOPE);
        assertThat(result.refusal().orElseThrow().ofScope()).isTrue();
        assertThat(result.loads().isPresent()).isEqualTo(RULES.text(key, "shown").equals("loads"));
        JsonNode node = ResultText.of(assessment).path("items").path(0);
        assertThat(node.path("outcome").asString()).isEqualTo("outside-scope");
        assertThat(node.path("scope").path("sentence").asString()).isEqualTo("Outside the scope of this tool: an engineer is needed");
        assertThat(node.path("scope").path("reason").asString()).isNotBlank();
        assertThat(node.path("scope").path("send").asString()).isNotBlank();
        assertThat(node.path("supports")).as("no check of a support").isEmpty();
        assertThat(node.toString()).doesNotContainIgnoringCase("\"pass").doesNotContain("utilisation");
    }

    @Test
    void an_item_on_its_own_supports_is_assessed() {
        KINDS.forEach((kind, fields) -> {
            if (!kind.equals("facade-panel")) {
                assertThat(JobTexts.en("{'mark': 'X1', 'kind': '" + kind + "', " + fields + ", 'held-by': 'own supports'}").outcome()).as(kind).isEqualTo(Outcome.ASSESSED);
            }
        });
    }

    @Test
    void sizes_beyond_small_works_are_told() {
        ItemResult high = JobTexts.en("{'mark': 'X1', 'kind': 'post-sign', 'boards': [{'width': '2 m', 'height': '1 m', 'clearance': '19.5 m'}], 'posts': {'count': 1}}");
        assertThat(high.notes().toString()).contains("an engineer is needed with full drawings");
        ItemResult low = JobTexts.en("{'mark': 'X1', 'kind': 'post-sign', 'boards': [{'width': '2 m', 'height': '1 m', 'clearance': '18.5 m'}], 'posts': {'count': 1}}");
        assertThat(low.notes().toString()).doesNotContain("full drawings");
    }
}
