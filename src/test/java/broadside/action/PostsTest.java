package broadside.action;

import static broadside.action.Cases.board;
import static broadside.action.Cases.even;
import static broadside.action.Cases.hoarding;
import static broadside.action.Cases.open;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.codes.LoadCase;
import broadside.panel.Hoarding;
import broadside.panel.Panel;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What reaches the foot of each post, of a sign and of a hoarding. */
class PostsTest {

    private static final List<Double> TWO = List.of(-1.0, 1.0);
    private static final Panel BOARD = board("", 3, 2, 2.5, 0);

    private static List<FootActions.Combined> combinations(LoadCase... cases) {
        return FootActions.of(List.of(new PanelCases(BOARD, List.of(cases))), Cases.SYMBOLS, Cases.ALONE, new Trace()).combinations();
    }

    private static List<PostAction> posts(Hoarding hoarding, double spacing) {
        Optional<PanelCases> shut = hoarding.gates().isEmpty() ? Optional.empty()
            : Optional.of(new PanelCases(hoarding.shut(), Cases.wall(hoarding.shut())));
        return HoardingPosts.of(hoarding, spacing, open(hoarding), shut, Cases.SYMBOLS, new Trace());
    }

    @Test
    void twoPostsShareACentredForce() {
        List<PostAction> posts = SignPosts.of(TWO, combinations(even("centred", BOARD, 1000, 0)), List.of(), new Trace());
        assertThat(posts).extracting(PostAction::position).containsExactly(-1.0, 1.0);
        assertThat(posts).allSatisfy(p -> assertThat(p.shear()).isCloseTo(3000, within(1e-9)));
        assertThat(posts).allSatisfy(p -> assertThat(p.moment()).isCloseTo(10500, within(1e-9)));
    }

    @Test
    void anEccentricForceLoadsThePostBesideIt() {
        LoadCase right = even("eccentric", BOARD, 1000, 0.75);
        List<PostAction> posts = SignPosts.of(TWO, combinations(even("centred", BOARD, 1000, 0), right, right.mirrored(3)), List.of(), new Trace());
        assertThat(posts).allSatisfy(p -> assertThat(p.named()).isEqualTo("eccentric"));
        assertThat(posts).allSatisfy(p -> assertThat(p.shear()).as("F/2 + F e / 2 m").isCloseTo(3000 + 6000 * 0.75 / 2, within(1e-9)));
        assertThat(posts).allSatisfy(p -> assertThat(p.moment()).isCloseTo(3.5 * 5250, within(1e-9)));
    }

    @Test
    void onePostTakesAll() {
        LoadCase right = even("eccentric", BOARD, 1000, 0.75);
        Trace trace = new Trace();
        List<PostAction> posts = SignPosts.of(List.of(0.0), combinations(even("centred", BOARD, 1000, 0), right), List.of(), trace);
        assertThat(posts).hasSize(1);
        assertThat(posts.get(0).shear()).isCloseTo(6000, within(1e-9));
        assertThat(posts.get(0).moment()).isCloseTo(21000, within(1e-9));
        assertThat(trace.find("post-moment").orElseThrow().value()).isCloseTo(21000, within(1e-9));
    }

    @Test
    void thePostsOfASignAnswerWhatActs() {
        Random random = new Random(11);
        for (int i = 0; i < 200; i++) {
            int count = 1 + random.nextInt(5);
            double step = 0.5 + random.nextDouble();
            List<Double> at = java.util.stream.IntStream.range(0, count).mapToObj(k -> (k - (count - 1) / 2.0) * step).toList();
            FootActions.Combined combined = combinations(even("eccentric", BOARD, 200 + 2000 * random.nextDouble(), random.nextDouble() - 0.5)).get(0);
            double[] sums = SignPosts.sums(combined, at);
            assertThat(sums[0]).isCloseTo(combined.force(), within(1e-9 * combined.force()));
            assertThat(sums[1]).isCloseTo(combined.moment(), within(1e-9 * combined.moment()));
        }
    }

    @ParameterizedTest
    @CsvSource({"10,2.5,5", "10,3,5", "10,10,2", "10,12,2", "2.4,2.4,2", "0.3,0.1,4", "48,2.4,21"})
    void postsStandAtTheSpacingAndAtBothEnds(double width, double spacing, int count) {
        List<Double> at = HoardingPosts.positions(width, spacing);
        assertThat(at).hasSize(count).isSorted();
        assertThat(at.get(0)).isEqualTo(0);
        assertThat(at.get(count - 1)).isCloseTo(width, within(1e-12));
        for (int i = 1; i < count; i++) {
            assertThat(at.get(i) - at.get(i - 1)).isLessThanOrEqualTo(spacing + 1e-9).isPositive();
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.1, 2, 2.4, 3.3, 7})
    void thePostsOfAHoardingAnswerWhatActs(double spacing) {
        for (Hoarding hoarding : List.of(hoarding(20), hoarding(20, 8, 3), hoarding(20, 0, 4), hoarding(20, 4, 2, 12, 5), hoarding(20, 15, 5))) {
            double[] sums = HoardingPosts.balance(hoarding, spacing, open(hoarding));
            assertThat(sums[1]).isCloseTo(sums[0], within(1e-9 * sums[0]));
            double area = hoarding.panels().stream().mapToDouble(Panel::area).sum();
            assertThat(sums[0]).as("3 kPa on a fifth, 1 kPa on the rest").isCloseTo(1400 * area, within(1e-6));
        }
    }

    @Test
    void aWallWhoseEndsAreAlikeHasPostsAlike() {
        List<PostAction> posts = posts(hoarding(20), 2);
        assertThat(posts).hasSize(11);
        for (int i = 0; i < posts.size(); i++) {
            PostAction mirror = posts.get(posts.size() - 1 - i);
            assertThat(posts.get(i).post()).isEqualTo(i + 1);
            assertThat(posts.get(i).moment()).isCloseTo(mirror.moment(), within(1e-9 * mirror.moment()));
            assertThat(posts.get(i).zone()).isEqualTo(mirror.zone());
            assertThat(posts.get(i).moment()).as("boards 2 m high on the ground").isCloseTo(posts.get(i).shear(), within(1e-9));
        }
        assertThat(posts.get(0).shear()).as("1 m of zone A").isCloseTo(3000 * 2, within(1e-9));
        assertThat(posts.get(1).shear()).as("2 m of zone A").isCloseTo(3000 * 2 * 2, within(1e-9));
        assertThat(posts.get(5).shear()).as("2 m of zone B").isCloseTo(1000 * 2 * 2, within(1e-9));
    }

    @Test
    void aShutGateHangsOnThePostsBesideIt() {
        Hoarding hoarding = hoarding(40, 18, 4);
        List<PostAction> posts = posts(hoarding, 2);
        PostAction beside = posts.stream().filter(p -> p.position() == 18).findFirst().orElseThrow();
        assertThat(beside.share().orElseThrow()).isCloseTo(1, within(1e-12));
        assertThat(beside.gate()).as("open: 1 m of zone A, 6 kN; shut: 1 m of boards and 2 m of leaf in zone B, 6 kN").isIn(0.0, 2.0);
        assertThat(beside.shear()).isCloseTo(6000, within(1e-9));
        Hoarding wide = hoarding(60, 26, 8);
        PostAction wider = posts(wide, 2).stream().filter(p -> p.position() == 26).findFirst().orElseThrow();
        assertThat(wider.gate()).isCloseTo(4, within(1e-12));
        assertThat(wider.shear()).as("1 m of boards and 4 m of leaf in zone B").isCloseTo(10_000, within(1e-9));
    }

    @Test
    void aGateAtTheEndHangsOnOnePost() {
        PostAction beside = posts(hoarding(40, 0, 4), 2).get(0);
        assertThat(beside.position()).isEqualTo(4);
        assertThat(beside.gate()).isCloseTo(4, within(1e-12));
        assertThat(beside.shear()).as("4 m of leaf and 1 m of boards in zone A, gates shut").isCloseTo(5 * 3000 * 2, within(1e-9));
    }

    @Test
    void theWorstPostOfEachZoneIsOnTheSheet() {
        Trace trace = new Trace();
        Hoarding hoarding = hoarding(20);
        List<PostAction> posts = HoardingPosts.of(hoarding, 2, open(hoarding), Optional.empty(), Cases.SYMBOLS, trace);
        double most = posts.stream().mapToDouble(PostAction::moment).max().orElseThrow();
        assertThat(trace.find("post-moment").orElseThrow().value()).isCloseTo(most, within(1e-9));
        assertThat(trace.find("post-moment/A").orElseThrow().value()).isCloseTo(most, within(1e-9));
        assertThat(trace.find("post-moment/B").orElseThrow().value()).isLessThan(most);
    }
}
