package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.trace.Step;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Ratios of typed lengths that are a printed limit on paper, but miss it by one bit in binary. */
class LimitsTest {

    private static ItemResult sign(boolean en, String width, String height, String clearance, String more) {
        return RandomJobs.result(RandomJobs.job(en, 50, en ? "II" : "C", more, "{\"mark\":\"X\",\"kind\":\"post-sign\",\"boards\":[{\"width\":\"" + width
            + "\",\"height\":\"" + height + "\",\"clearance\":\"" + clearance + "\"}],\"posts\":{\"count\":1}}"));
    }

    private static double value(ItemResult item, String step) {
        return item.sheet().find(step).map(Step::value).orElseThrow();
    }

    /** 4.6 m over 23 m is 0.2 on paper: the hill counts, ASCE/SEI 7-16, 26.8.1. */
    @Test
    void a_hill_of_one_in_five_counts() {
        ItemResult item = sign(false, "2 m", "1 m", "1 m", ",\"topography\":{\"feature\":\"ridge\",\"height\":\"4.6 m\",\"upwind-length\":\"46 m\","
            + "\"half-length\":\"23 m\",\"distance-from-crest\":\"0 m\"}");
        assertThat(value(item, "topography-factor")).isGreaterThan(1.4);
    }

    /** 3.3 m over 66 m is 0.05 on paper: the slope counts, EN 1991-1-4, A.3(3). */
    @Test
    void a_slope_of_one_in_twenty_counts() {
        ItemResult item = sign(true, "2 m", "1 m", "1 m", ",\"topography\":{\"feature\":\"ridge\",\"height\":\"3.3 m\",\"upwind-length\":\"66 m\","
            + "\"distance-from-crest\":\"0 m\"}");
        assertThat(value(item, "topography-factor")).isGreaterThan(1.05);
    }

    /** Widths and heights whose ratio is a printed B/s of case C: the first region has the printed coefficient and no sliver follows. */
    @ParameterizedTest
    @CsvSource({"9.9 m, 3.3 m, 2.60", "13.2 m, 2.64 m, 3.10", "11.8 m, 1.18 m, 3.75", "38.87 m, 2990 mm, 4.00", "0.6 m, 0.3 m, 2.25"})
    void regions_of_case_c_at_printed_ratios(String width, String height, double printed) {
        ItemResult item = sign(false, width, height, "20 m", "");
        assertThat(value(item, "coefficient/case-c/0-s")).isCloseTo(printed, within(1e-9));
        assertThat(item.loads().orElseThrow().cases()).allSatisfy(c -> c.zones().get(0).zones().forEach(z -> assertThat(z.width()).isGreaterThan(0.01)));
    }

    /** 13.2 m by 2.64 m with returns as long as it is high: B/s is 5 on paper, so the first region is reduced by 0.75. */
    @Test
    void the_return_corner_counts_from_five() {
        ItemResult item = RandomJobs.result(RandomJobs.job(false, 50, "C", "", RandomJobs.hoarding(new RandomJobs.Wall(13.2, 2.64, 0, 1, 2.64, 2.64, 2.64))));
        assertThat(value(item, "return-corner-factor")).isEqualTo(0.75);
    }

    /** A gap of a quarter of the height makes a signboard, EN 1991-1-4, 7.4.3(1). */
    @Test
    void a_gap_of_a_quarter_makes_a_signboard() {
        assertThat(value(sign(true, "6 m", "1.4 m", "0.35 m", ""), "coefficient/all")).isEqualTo(1.8);
        assertThat(value(sign(true, "6 m", "11 ft", "2 ft 9 in", ""), "coefficient/all")).isEqualTo(1.8);
    }
}
