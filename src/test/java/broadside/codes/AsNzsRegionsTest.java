package broadside.codes;

import static broadside.codes.AsNzsJobs.GUST_45;
import static broadside.codes.AsNzsJobs.board;
import static broadside.codes.AsNzsJobs.job;
import static broadside.codes.AsNzsJobs.problems;
import static broadside.codes.AsNzsJobs.region;
import static broadside.codes.AsNzsJobs.result;
import static broadside.codes.AsNzsJobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.site.Averaging;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.trace.Trace;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Regional gust speeds of AS/NZS 1170.2 by region and return period, and what is refused. */
class AsNzsRegionsTest {

    private static final String TERRAIN = ",\"terrain\":\"2\"";
    private static final String BOARD = board(2, 1, 2, "");

    /** The formulas worked out to one decimal, region by region. */
    @ParameterizedTest
    @CsvSource({"A, 5, 32.1", "A, 10, 34.4", "A, 25, 37.3", "A, 50, 39.3", "A, 100, 41.1", "A, 200, 42.9", "A, 250, 43.4", "A, 500, 45.0", "A, 1000, 46.5", "A, 2000, 47.8",
        "B, 5, 27.7", "B, 10, 32.9", "B, 25, 39.3", "B, 50, 43.8", "B, 100, 48.0", "B, 200, 51.8", "B, 250, 53.0", "B, 500, 56.6", "B, 1000, 59.9", "B, 2000, 63.0",
        "C, 25, 46.6", "C, 50, 51.7", "C, 100, 56.4", "C, 200, 60.8", "C, 500, 66.1", "C, 1000, 69.9", "C, 2000, 73.4",
        "D, 25, 53.1", "D, 50, 60.0", "D, 100, 66.4", "D, 200, 72.4", "D, 500, 79.7", "D, 1000, 84.8", "D, 2000, 89.6",
        "W, 25, 43.4", "W, 50, 45.3", "W, 100, 47.1", "W, 500, 51.1", "W, 1000, 52.7", "W, 2000, 54.3"})
    void the_formula_of_each_region(String region, int years, double expected) {
        assertThat(value("2011", region(region, years + " years") + TERRAIN, BOARD, "regional-speed-by-formula")).isCloseTo(expected, within(0.0501));
        if (!region.equals("W")) {
            assertThat(value("2021", region(region, years + " years") + TERRAIN, BOARD, "regional-speed-by-formula")).isCloseTo(expected, within(0.0501));
        }
    }

    /** 104 - 70 x 200^-0.045 = 104 - 70 x 0.787853 = 48.85. */
    @Test
    void the_formula_of_region_w_at_200_years() {
        assertThat(value("2011", region("W", "200 years") + TERRAIN, BOARD, "regional-speed-by-formula")).isCloseTo(48.85, within(0.005));
    }

    /** Region D, 500 years: 79.7 is rounded to 80, and the edition of 2011 multiplies that by 1.10; so region C: 66 x 1.05 = 69.3. */
    @Test
    void the_speed_is_rounded_before_it_is_multiplied() {
        assertThat(value("2011", region("D", "500 years") + TERRAIN, BOARD, "regional-speed")).isCloseTo(88, within(1e-9));
        assertThat(value("2011", region("C", "500 years") + TERRAIN, BOARD, "regional-speed")).isCloseTo(69.3, within(1e-9));
        assertThat(value("2021", region("D", "500 years") + TERRAIN, BOARD, "regional-speed")).isEqualTo(80);
        assertThat(result(job("2011", region("D", "500 years") + TERRAIN, BOARD)).sheet().find("velocity-pressure")).isPresent();
    }

    /** Below 50 years there is no factor in regions C and D. */
    @Test
    void the_factor_begins_at_50_years() {
        assertThat(value("2011", region("D", "49 years") + TERRAIN, BOARD, "regional-speed")).isEqualTo(60);
        assertThat(value("2011", region("D", "50 years") + TERRAIN, BOARD, "regional-speed")).isCloseTo(66, within(1e-9));
    }

    @Test
    void one_year_is_read_in_the_table_and_not_by_the_formula() {
        ItemResult item = result(job("2021", region("A", "1 year") + TERRAIN, BOARD));
        assertThat(value(item, "regional-speed")).isEqualTo(30);
        assertThat(item.sheet().find("regional-speed-by-formula")).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "2011 | A | 3 years | site.region: the formula of region A holds for a return-period of 5 years or more; for 1 year the table has 30 m/s",
        "2011 | C | 1 year | site.region: the formula of region C holds for a return-period of 5 years or more",
        "2011 | Z | 500 years | site.region: must be one of the regions of AS/NZS 1170.2:2011 that are known here: A, W, B, B1, B2, C, D",
        "2021 | W | 500 years | site.region: must be one of the regions of AS/NZS 1170.2:2021 that are known here: A, B, B1, B2, C, D",
        "2021 | A | 0.5 years | site.return-period: must lie between 1 year and 10 000 years"})
    void what_has_no_speed_is_refused(String edition, String region, String period, String problem) {
        assertThat(problems(job(edition, region(region, period) + TERRAIN, BOARD))).contains(problem);
    }

    /** What is wrong with a region is told once, and not again as a missing speed. */
    @Test
    void a_region_without_a_speed_is_one_problem() {
        assertThat(problems(job("2021", region("Z", "500 years") + TERRAIN, BOARD))).hasSize(1);
        assertThat(problems(job("2021", "\"terrain\":\"2\"", BOARD))).hasSize(1).allMatch(p -> p.startsWith("site.basic-speed: is missing"));
    }

    @Test
    void a_region_needs_a_return_period() {
        assertThat(problems(job("2021", "\"region\":\"A\"" + TERRAIN, BOARD))).anyMatch(p -> p.contains("region A gives a speed with a return-period only"));
    }

    @Test
    void two_speeds_are_refused() {
        assertThat(problems(job("2021", GUST_45 + "," + region("A", "500 years") + TERRAIN, BOARD))).anyMatch(p -> p.startsWith("site.basic-speed: stands beside values that give the speed"));
        assertThat(problems(job("2021", GUST_45 + ",\"regional-speed\":\"46 m/s\"" + TERRAIN, BOARD))).anyMatch(p -> p.startsWith("site.basic-speed: stands beside"));
        assertThat(problems(job("2021", "\"regional-speed\":\"460 m/s\"" + TERRAIN, BOARD))).contains("site.regional-speed: must lie between 1 m/s and 150 m/s");
    }

    /** A typed regional speed needs no averaging time, and a region beside it only picks the climate multiplier. */
    @Test
    void a_typed_regional_speed_counts() {
        ItemResult item = result(job("2021", "\"regional-speed\":\"66 m/s\",\"region\":\"C\"" + TERRAIN, BOARD));
        assertThat(value(item, "regional-speed")).isEqualTo(66);
        assertThat(value(item, "climate-multiplier")).isEqualTo(1.05);
        assertThat(item.sheet().find("regional-speed").orElseThrow().place()).isEqualTo("given");
    }

    @ParameterizedTest
    @CsvSource({"A, 1.0", "B1, 1.0", "B2, 1.05", "B, 1.05", "C, 1.05", "D, 1.05"})
    void climate_multiplier_by_region(String region, double expected) {
        assertThat(value("2021", region(region, "500 years") + TERRAIN, BOARD, "climate-multiplier")).isEqualTo(expected);
        assertThat(result(job("2011", region(region, "500 years") + TERRAIN, BOARD)).sheet().find("climate-multiplier")).isEmpty();
    }

    @Test
    void without_a_region_the_general_climate_multiplier_counts_and_the_sheet_says_so() {
        ItemResult item = result(job("2021", GUST_45 + TERRAIN, BOARD));
        assertThat(value(item, "climate-multiplier")).isEqualTo(1);
        assertThat(item.sheet().find("climate-multiplier").orElseThrow().formula()).contains("no region is given", "B2, C, D");
        assertThat(value("2021", GUST_45 + ",\"climate-multiplier\":1.02" + TERRAIN, BOARD, "climate-multiplier")).isEqualTo(1.02);
    }

    /** The same place in another wind: the region's own speed no longer counts. */
    @Test
    void a_speed_put_in_the_place_of_the_regions_own_counts() {
        WindCode code = AsNzsJobs.ASSESSOR.codes().code("as-nzs-1170-2/2011").orElseThrow();
        SiteOptions options = new SiteOptions(Map.of(), Map.of(), Map.of("region", "A"));
        Optional<Period> period = Optional.of(Period.years(500));
        Site site = new Site("", code.basicSpeed(options, period).orElseThrow(), Averaging.GUST_0_2_S, period, new Site.Ground("2", Optional.empty(), Optional.empty(), Set.of()),
            Optional.empty(), options);
        Trace own = new Trace();
        code.velocityPressure(site, 3, own);
        assertThat(own.find("regional-speed").orElseThrow().value()).isEqualTo(45);
        assertThat(own.find("regional-speed-by-formula")).isPresent();
        Trace other = new Trace();
        code.velocityPressure(site.withSpeed(Speed.metresPerSecond(38)), 3, other);
        assertThat(other.find("regional-speed").orElseThrow().value()).isEqualTo(38);
        assertThat(other.find("regional-speed-by-formula")).isEmpty();
    }

    @Test
    void the_note_on_an_unused_return_period_stays_away() {
        assertThat(result(job("2011", region("A", "500 years") + TERRAIN, BOARD)).notes()).noneMatch(n -> n.text().contains("is not used by this code"));
    }
}
