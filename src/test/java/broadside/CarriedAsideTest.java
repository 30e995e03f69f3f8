package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.support.Check;
import org.junit.jupiter.api.Test;

/** A heavy board that hangs to one side: its weight turns the footing also in calm air. */
class CarriedAsideTest {

    private static final String BOARD = "'mark': 'X', 'kind': 'post-sign', 'boards': [{'width': '2 m', 'height': '1.2 m', 'clearance': '2.2 m', 'offset': '1.9 m', 'depth': '0.4 m', "
        + "'mass': '600 kg'}], 'posts': {'count': 1, 'section': 'CHS 219.1x10', 'grade': 'S355'}, 'footing': ";
    private static final String CALM = "'basic-speed': '20 m/s', 'averaging': '10 min mean', 'terrain': 'II'";
    /** 600 kg x 9.80665 x 1.9 m. */
    private static final double DEAD = 11_179.581;

    private static ItemResult held(String code, String site, String footing) {
        return JobTexts.result(code, site, "{" + BOARD + "{" + footing + "}}");
    }

    private static Check check(ItemResult item, String name) {
        Carried carried = item.loads().orElseThrow().carried().orElseThrow();
        return carried.checks().stream().filter(c -> c.name().equals(name)).findFirst().orElseThrow();
    }

    /**
     * 0.8 m across the wind, 0.6 m deep: N = 600 kg of board, the post and 1.6 x 0.8 x 0.6 m of concrete, about 25.7 kN; it resists N 0.8 / 2 = 10.3 kN m to
     * the side, less than the 11.2 kN m of the board. It falls in calm air.
     */
    @Test
    void aNarrowPadTurnsOverInCalmAir() {
        ItemResult item = held("en-1991-1-4/2005", CALM, "'kind': 'pad', 'width': '1.6 m', 'length': '0.8 m', 'depth': '0.6 m', 'bearing': '100 kPa', 'friction': 0.4");
        double n = JobTexts.step(item, "vertical-load");
        assertThat(n * 0.8 / 2).isLessThan(DEAD);
        assertThat(JobTexts.step(item, "footing-weight-moment")).isCloseTo(2 * DEAD, within(0.1));
        assertThat(check(item, "overturning").utilisation()).isGreaterThan(1);
    }

    /** The demand of the rule holds the wind with its factor 1.5 and no less than 1.35 of the permanent moment. */
    @Test
    void aPlantedPostTakesItIntoItsDepth() {
        String planted = "'kind': 'planted', 'width': '0.6 m', 'ground': 'average', 'depth': '1.5 m'";
        ItemResult with = held("en-1991-1-4/2005", CALM, planted);
        ItemResult without = JobTexts.result("en-1991-1-4/2005", CALM, ("{" + BOARD + "{" + planted + "}}").replace(", 'mass': '600 kg'", ", 'mass': '0.001 kg'"));
        double more = check(with, "ground resistance").demand() - check(without, "ground resistance").demand();
        assertThat(more).isGreaterThanOrEqualTo(1.35 * DEAD * 0.999);
    }

    /** By allowable stress the wind counts with 0.6, and the weight still with 1. */
    @Test
    void noFactorOnWindLessensTheWeight() {
        ItemResult item = held("asce-7/16", "'basic-speed': '45 m/s', 'averaging': '3 s gust', 'terrain': 'C'", "'kind': 'planted', 'width': '0.6 m', 'ground': 'clay'");
        assertThat(JobTexts.step(item, "footing-weight-moment") * JobTexts.step(item, "footing-wind-level")).isCloseTo(DEAD, within(0.1));
    }

    /** Two posts 1 m apart, a board of 600 kg 1.9 m beside their middle: the far post is lifted by 600 g (1.9 / 1 - 1 / 2), more than its post weighs. */
    @Test
    void theFarPostIsLifted() {
        ItemResult item = JobTexts.result("en-1991-1-4/2005", CALM, "{" + BOARD.replace("'count': 1", "'count': 2, 'spacing': '1 m'")
            + "{'kind': 'pad', 'width': '1 m', 'depth': '0.6 m', 'ground': 'sand'}}");
        double post = JobTexts.step(item, "section-mass") * 3.4 * 9.80665;
        assertThat(JobTexts.step(item, "footing-weight")).isCloseTo(post - 600 * 9.80665 * 1.4, within(1.0));
    }
}
