package broadside.codes;

import static broadside.codes.AsNzsJobs.GUST_45;
import static broadside.codes.AsNzsJobs.board;
import static broadside.codes.AsNzsJobs.job;
import static broadside.codes.AsNzsJobs.region;
import static broadside.codes.AsNzsJobs.result;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.site.Averaging;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** From strength loads to serviceability, and from any return period to 50 years. */
class AsNzsLevelsTest {

    private static Level level(String edition, String site) {
        return result(job(edition, site + ",\"terrain\":\"2\"", board(2, 1, 2, ""))).loads().orElseThrow().level();
    }

    /** (V_25 / V_R)^2 of the rounded speeds, with the factor of the region where the edition has one: region D, 53 and 80 x 1.1. */
    @ParameterizedTest
    @CsvSource({"2011, A, 500, 37, 45", "2021, A, 1000, 37, 46", "2011, D, 500, 53, 88", "2021, D, 500, 53, 80", "2011, C, 500, 47, 69.3", "2011, W, 500, 43, 51", "2021, B2, 100, 39, 48"})
    void serviceability_by_region(String edition, String region, int years, double service, double strength) {
        Level level = level(edition, region(region, years + " years"));
        assertThat(level.factor()).isCloseTo(service * service / strength / strength, within(1e-12));
        assertThat(level.rule()).contains("region " + region, years + " years").doesNotContain("assumed");
        assertThat(level.name()).isEqualTo("strength");
        assertThat(level.companion()).isEqualTo("service");
        assertThat(level.status()).isEqualTo(Status.RECALLED);
    }

    @Test
    void what_is_assumed_is_said() {
        Level typed = level("2011", GUST_45);
        assertThat(typed.factor()).isCloseTo(37.0 * 37 / 45 / 45, within(1e-12));
        assertThat(typed.rule()).contains("region A", "500 years", "region and return period are assumed");
        assertThat(level("2011", GUST_45 + ",\"return-period\":\"1000 years\"").rule()).contains("1000 years", "the region is assumed");
        assertThat(level("2021", "\"regional-speed\":\"66 m/s\",\"region\":\"C\"").rule()).contains("region C", "the return period is assumed");
    }

    /** A wind that comes more often than once in 25 years is not raised. */
    @Test
    void a_frequent_wind_is_its_own_serviceability_wind() {
        assertThat(level("2011", region("A", "25 years")).factor()).isEqualTo(1);
        assertThat(level("2011", region("A", "1 year")).factor()).isEqualTo(1);
        assertThat(level("2011", GUST_45 + ",\"return-period\":\"2 years\"").factor()).isEqualTo(1);
    }

    @Test
    void the_companion_loads_follow_and_the_step_names_the_rule() {
        var item = result(job("2011", region("A", "500 years") + ",\"terrain\":\"2\"", board(2, 1, 2, "")));
        assertThat(item.sheet().find("companion-factor").orElseThrow().formula()).contains("(37 / 45)²");
    }

    /**
     * V_50 / V_R, not rounded: region A 39.27 / 44.98; for one year 39.27 / 30; below 5 years the formula does not reach; region D 59.97 / 79.72.
     */
    @ParameterizedTest
    @CsvSource({"A, 500, 0.87321", "A, 1, 1.30913", "A, 3, 1", "D, 500, 0.75227", "'', 500, 0.87321", "'', 0, 0.87321"})
    void fifty_year_ratio(String region, double years, double expected) {
        WindCode code = AsNzsJobs.ASSESSOR.codes().code("as-nzs-1170-2/2021").orElseThrow();
        SiteOptions options = region.isEmpty() ? SiteOptions.NONE : new SiteOptions(Map.of(), Map.of(), Map.of("region", region));
        Site site = new Site("", Speed.metresPerSecond(45), Averaging.GUST_0_2_S, years == 0 ? Optional.empty() : Optional.of(Period.years(years)),
            new Site.Ground("2", Optional.empty(), Optional.empty(), Set.of()), Optional.empty(), options);
        Trace trace = new Trace();
        assertThat(code.fiftyYearRatio(site, trace)).isCloseTo(expected, within(1e-5));
        assertThat(trace.find("fifty-year-ratio")).isPresent();
    }

    /** The comparison side by side keeps the climate multiplier of the region: region C of 2021, V_50 / V_500 = 51.67 / 66.14 of 66 m/s, times 1.05, in category 2 below 5 m. */
    @Test
    void the_comparison_keeps_the_climate_multiplier_of_the_region() {
        var job = AsNzsJobs.read(job("2021", region("C", "500 years") + ",\"terrain\":\"2\"", board(2, 1, 2, "")));
        var line = AsNzsJobs.ASSESSOR.sideBySide(job, job.items().get(0)).lines().get(0);
        double v50 = 66 * (122 - 104 * Math.pow(50, -0.1)) / (122 - 104 * Math.pow(500, -0.1));
        assertThat(line.speed()).isEqualTo(66);
        assertThat(line.found().orElseThrow().velocity()).isCloseTo(0.6 * Math.pow(v50 * 1.05 * 0.91, 2), within(1e-6));
    }
}
