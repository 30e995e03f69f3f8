package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import broadside.assess.BadJob;
import broadside.assess.ItemResult;
import broadside.assess.Problem;
import broadside.cli.Tool;
import broadside.panel.Panel;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Faults that were found once and must not come back. */
class MendedTest {

    private static final Tool TOOL = Tool.of(Optional.empty());

    private static String sign(String boards, String more) {
        return "{\"broadside\":1,\"basis\":{\"code\":\"en-1991-1-4\",\"edition\":\"2005\"},\"site\":{\"basic-speed\":\"24 m/s\",\"averaging\":\"10 min mean\","
            + "\"terrain\":\"II\"},\"items\":[{\"mark\":\"S\",\"kind\":\"post-sign\",\"boards\":[" + boards + "],\"posts\":{\"count\":2,\"spacing\":\"2 m\"}}]" + more + "}";
    }

    private static final String BOARD = "{\"width\":\"4 m\",\"height\":\"2 m\",\"clearance\":\"2.5 m\",\"offset\":\"1 m\"}";

    private static JobReader.Result read(String job) {
        return TOOL.reader().read(JobText.read(job.getBytes(StandardCharsets.UTF_8)));
    }

    private static ItemResult assess(String job) {
        return TOOL.assessor().assess(read(job).orThrow()).items().get(0);
    }

    @ParameterizedTest
    @ValueSource(strings = {"\"-1 kPa\"", "\"0 Pa\"", "0", "-2", "1e308"})
    void overridesOfZeroBelowZeroOrBeyondMeasureAreRefused(String value) {
        List<Problem> problems = read(sign(BOARD, ",\"overrides\":[{\"name\":\"velocity-pressure\",\"value\":" + value + ",\"reason\":\"r\"}]")).problems();
        assertThat(problems).extracting(Problem::path).containsExactly("overrides[0].value");
    }

    @Test
    void aValueIsReplacedOnce() {
        String two = ",\"overrides\":[{\"name\":\"velocity-pressure\",\"value\":\"1 kPa\",\"reason\":\"r\"},{\"name\":\"velocity-pressure\",\"value\":\"2 kPa\",\"reason\":\"r\"}]";
        assertThat(read(sign(BOARD, two)).problems()).extracting(Problem::path).containsExactly("overrides[1].name");
    }

    @Test
    void aForceMayBeReplacedToo() {
        ItemResult item = assess(sign(BOARD, ",\"overrides\":[{\"name\":\"force/centred\",\"value\":\"12 kN\",\"reason\":\"tunnel test\"}]"));
        assertThat(item.loads().orElseThrow().governs("base-moment").force()).isEqualTo(12000);
    }

    @Test
    void anOverrideThatNamesNoStepIsRefusedAlsoBesideAnItemThatIsNotCovered() {
        String open = "{\"width\":\"4 m\",\"height\":\"2 m\",\"clearance\":\"250 m\"}";
        String job = sign(BOARD, ",\"overrides\":[{\"name\":\"orografy\",\"value\":1.1,\"reason\":\"r\"}]").replace("}],\"overrides\"",
            "},{\"mark\":\"O\",\"kind\":\"post-sign\",\"boards\":[" + open + "]}],\"overrides\"");
        assertThatThrownBy(() -> assess(job)).isInstanceOf(BadJob.class).hasMessageContaining("orografy");
    }

    @Test
    void boardsOfOneNameKeepTheirOwnPressures() {
        String boards = "{\"mark\":\"A\",\"width\":\"3 m\",\"height\":\"2 m\",\"clearance\":\"12 m\"},{\"mark\":\"A\",\"width\":\"3 m\",\"height\":\"2 m\",\"clearance\":\"2.5 m\"}";
        ItemResult item = assess(sign(boards, ""));
        assertThat(item.item().panels()).extracting(Panel::part).containsExactly("1 A", "2 A");
        assertThat(item.loads().orElseThrow().velocity().height()).isEqualTo(13);
    }

    @Test
    void aGateThatEndsWithTheHoardingLeavesNoSliver() {
        String job = sign(BOARD, "").replaceAll("\"items\":.*", "\"items\":[{\"mark\":\"H\",\"kind\":\"hoarding\",\"length\":\"2.6 m\",\"height\":\"2 m\","
            + "\"gates\":[{\"from\":\"1.4 m\",\"width\":\"1.2 m\"}]}]}");
        assertThat(read(job).orThrow().items().get(0).panels()).hasSize(1);
    }

    @Test
    void aReadingWithADoubtIsAskedBack() {
        assertThat(read(sign(BOARD.replace("4 m", "4,500 ft"), "")).problems()).extracting(Problem::path).containsExactly("items[0].boards[0].width");
    }

    private static String wall(String more) {
        return sign(BOARD, "").replaceAll("\"items\":.*", "\"items\":[{\"mark\":\"H\",\"kind\":\"hoarding\",\"height\":\"2 m\"," + more + "}]}");
    }

    @Test
    void twoGatesSideBySideAreOneOpening() {
        String one = wall("\"length\":\"20 m\",\"posts\":{\"spacing\":\"2 m\"},\"gates\":[{\"from\":\"6 m\",\"width\":\"6 m\"}]");
        String two = wall("\"length\":\"20 m\",\"posts\":{\"spacing\":\"2 m\"},\"gates\":[{\"from\":\"6 m\",\"width\":\"3 m\"},{\"from\":\"9 m\",\"width\":\"3 m\"}]");
        assertThat(assess(two).loads().orElseThrow().posts()).isEqualTo(assess(one).loads().orElseThrow().posts());
    }

    @Test
    void gatesThatLeaveNoHoardingAreRefused() {
        assertThat(read(wall("\"length\":\"10 m\",\"gates\":[{\"from\":\"3 mm\",\"width\":\"9.994 m\"}]")).problems()).extracting(Problem::path)
            .containsExactly("items[0].gates");
        assertThat(read(wall("\"length\":\"5 mm\"")).problems()).extracting(Problem::path).containsExactly("items[0].length");
    }

    @Test
    void aShortWallWithUnlikeEndsShowsBothEnds() {
        ItemResult item = assess(wall("\"length\":\"0.6 m\",\"returns\":{\"left\":\"0.5 m\"}").replace("\"height\":\"2 m\"", "\"height\":\"4 m\""));
        assertThat(item.loads().orElseThrow().cases()).extracting(c -> c.windward().name()).contains("LEFT", "RIGHT");
    }

    @Test
    void anOverrideForOneBoardStaysWithThatBoard() {
        String boards = BOARD.replace("{", "{\"mark\":\"low\",") + "," + BOARD.replace("{", "{\"mark\":\"other\",");
        ItemResult item = assess(sign(boards, ",\"overrides\":[{\"name\":\"velocity-pressure/low\",\"value\":\"2 kPa\",\"reason\":\"r\"}]"));
        assertThat(item.sheet().find("velocity-pressure/low").orElseThrow().value()).isEqualTo(2000);
        assertThat(item.sheet().find("velocity-pressure/other").orElseThrow().value()).isLessThan(1000);
    }

    @Test
    void theGreatestShearIsThatOfAllPosts() {
        String boards = "{\"width\":\"1 m\",\"height\":\"3 m\",\"clearance\":\"0.8 m\",\"offset\":\"-3 m\"},{\"width\":\"1 m\",\"height\":\"0.4 m\",\"clearance\":\"9 m\",\"offset\":\"3 m\"}";
        ItemResult item = assess(sign(boards, ""));
        double most = item.loads().orElseThrow().posts().stream().mapToDouble(p -> p.shear()).max().orElseThrow();
        assertThat(item.sheet().find("post-shear").orElseThrow().value()).isEqualTo(most);
    }

    @Test
    void anAuthorityLevelWithoutAPressureIsRefused() {
        String job = sign(BOARD, "").replace("\"terrain\"", "\"authority-minimum-level\":\"service\",\"terrain\"");
        assertThat(read(job).problems()).extracting(Problem::path).containsExactly("site.authority-minimum-level");
    }

    @Test
    void aLongListIsRefusedWithOneLine() {
        String many = String.join(",", java.util.Collections.nCopies(5000, "{}"));
        assertThat(read(sign(many, "")).problems()).hasSize(1);
    }

    @Test
    void aPostThatIsPushedBackwardsCountsByItsMagnitude() {
        ItemResult item = assess(sign("{\"width\":\"16 m\",\"height\":\"4 m\",\"clearance\":\"8.5 m\",\"offset\":\"6.23 m\"}", ""));
        assertThat(item.loads().orElseThrow().posts()).allSatisfy(p -> assertThat(p.moment()).isPositive());
        double first = item.loads().orElseThrow().posts().get(0).moment();
        double force = item.loads().orElseThrow().governs("base-moment").force();
        // F/n - F (x_b + b/4) x / S with x = 1 m, S = 2 m2, taken 10.5 m above the ground.
        assertThat(first).isCloseTo(Math.abs(force / 2 - force * (6.23 + 4) / 2) * 10.5, org.assertj.core.api.Assertions.within(1e-6 * first));
    }
}
