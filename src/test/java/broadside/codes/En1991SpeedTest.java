package broadside.codes;

import static broadside.codes.En1991Inputs.at;
import static broadside.codes.En1991Inputs.code;
import static broadside.codes.En1991Inputs.site;
import static broadside.codes.En1991Inputs.value;
import static broadside.codes.En1991Inputs.with;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.quantity.Length;
import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.site.Topography;
import broadside.table.OutsideTable;
import broadside.trace.Trace;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Basic wind velocity of EN 1991-1-4: short stays by EN 1991-1-6, national values, and ground that is not known. */
class En1991SpeedTest {

    private static Trace pressure(String overlay, Site site, double height) {
        Trace trace = new Trace();
        trace.line("reference-height", "z_e", "height").from("here", broadside.trace.Status.GIVEN).reads("given", height, "m");
        code(overlay).velocityPressure(site, height, trace);
        return trace;
    }

    private static Site stay(double speed, String stay) {
        return with(with(site(speed, "II"), "duration-rule", "code"), "stands-for", Period.of(stay));
    }

    /** c_prob 0.7764, 0.8545, 0.9025, 1 for 2, 5, 10 and 50 years; K 0.2, n 0.5. */
    @ParameterizedTest
    @CsvSource({"1 day, 2, 0.7764", "3 days, 2, 0.7764", "4 days, 5, 0.8545", "3 months, 5, 0.8545", "4 months, 10, 0.9025", "1 year, 10, 0.9025", "13 months, 50, 1", "5 years, 50, 1"})
    void how_long_it_stands_gives_the_return_period(String stay, double years, double factor) {
        Trace trace = pressure("", stay(30, stay), 4);
        assertThat(value(trace, "return-period")).isEqualTo(years);
        assertThat(value(trace, "probability-factor")).isCloseTo(factor, within(5e-5));
        assertThat(value(trace, "basic-speed")).isCloseTo(30 * factor, within(0.0015));
    }

    /** 22 m/s x 0.8545 is 18.8 m/s: a stay up to three months takes at least 20 m/s, a longer one does not. */
    @Test
    void a_short_stay_takes_at_least_20_metres_per_second() {
        assertThat(value(pressure("", stay(22, "2 months"), 4), "basic-speed")).isEqualTo(20);
        assertThat(value(pressure("", stay(22, "2 days"), 4), "basic-speed")).isEqualTo(20);
        assertThat(value(pressure("", stay(21, "6 months"), 4), "basic-speed")).isCloseTo(21 * 0.9025, within(0.0015));
    }

    @Test
    void a_typed_return_period_comes_before_the_rule() {
        Trace trace = pressure("", with(stay(22, "2 days"), Period.of("25 years")), 4);
        assertThat(value(trace, "probability-factor")).isCloseTo(0.9597, within(5e-5));
        assertThat(trace.find("return-period")).isEmpty();
        assertThat(trace.givens()).anySatisfy(g -> assertThat(g.meaning()).contains("it was typed, so it counts and not the rule"));
        assertThat(value(trace, "basic-speed")).isCloseTo(22 * 0.9597, within(0.0015));
    }

    @Test
    void the_rule_without_the_stay_is_not_covered_and_the_stay_alone_changes_nothing() {
        assertThatThrownBy(() -> pressure("", with(site(22, "II"), "duration-rule", "code"), 4)).isInstanceOf(NotCovered.class)
            .hasMessageContaining("how long it stands is not given");
        assertThat(value(pressure("", with(site(22, "II"), "stands-for", Period.of("2 days")), 4), "basic-speed")).isEqualTo(22);
    }

    /** 1 + 0.001 x 66 x (10/18)^0.2 = 1.05868; up to 10 m 1.066. */
    @ParameterizedTest
    @CsvSource({"18, 1.05868", "10, 1.066", "2, 1.066"})
    void altitude_in_the_united_kingdom(double height, double factor) {
        Trace trace = pressure("-uk", at(site(22, "III"), Length.of("66 m")), height);
        assertThat(value(trace, "altitude-factor")).isCloseTo(factor, within(5e-6));
        assertThat(value(trace, "basic-speed")).isCloseTo(22 * factor, within(0.0002));
        assertThat(value(trace, "air-density")).isEqualTo(1.226);
    }

    @Test
    void the_united_kingdom_asks_for_the_altitude_and_keeps_its_air_density() {
        assertThatThrownBy(() -> pressure("-uk", site(22, "III"), 4)).isInstanceOf(NotCovered.class).hasMessageContaining("the altitude of the site is needed");
        assertThat(value(pressure("-uk", at(site(22, "III"), Length.of("-4 m")), 4), "altitude-factor")).isEqualTo(1);
        assertThat(code("-uk").terms().options()).contains("season").doesNotContain("air-density", "wind-zone");
        assertThat(code("").terms().options()).contains("air-density").doesNotContain("season", "wind-zone");
        assertThat(code("-de").terms().options()).contains("wind-zone");
    }

    @ParameterizedTest
    @CsvSource({"two months from May to August, 0.71", "April to September, 0.84", "February and March, 0.86", "October to March, 1.00"})
    void seasons_of_the_united_kingdom(String season, double factor) {
        Site site = at(with(site(22, "III"), "season", season), Length.of("0 m"));
        assertThat(value(pressure("-uk", site, 4), "season-factor")).isEqualTo(factor);
    }

    @Test
    void a_season_that_is_not_there_or_stands_beside_its_factor_is_refused() {
        SiteOptions wrong = new SiteOptions(Map.of(), Map.of(), Map.of("season", "summer"));
        assertThatThrownBy(() -> code("-uk").basicSpeed(wrong, Optional.empty())).isInstanceOf(IllegalArgumentException.class).hasMessageContaining("it has two months from May to August, April");
        SiteOptions twice = new SiteOptions(Map.of("season-factor", 0.9), Map.of(), Map.of("season", "April to September"));
        assertThatThrownBy(() -> code("-uk").basicSpeed(twice, Optional.empty())).isInstanceOf(IllegalArgumentException.class).hasMessageContaining("give one of the two");
    }

    private static Optional<Speed> zone(String word, Optional<Period> period) {
        return code("-de").basicSpeed(new SiteOptions(Map.of(), Map.of(), Map.of("wind-zone", word)), period);
    }

    @Test
    void wind_zones_of_germany_give_the_speed() {
        assertThat(zone("3", Optional.empty()).orElseThrow().metresPerSecond()).isEqualTo(27.5);
        assertThat(zone("2 coast", Optional.of(Period.of("50 years"))).orElseThrow().metresPerSecond()).isEqualTo(25);
        assertThat(code("-de").basicSpeed(SiteOptions.NONE, Optional.empty())).isEmpty();
        assertThatThrownBy(() -> zone("3 inland", Optional.empty())).isInstanceOf(IllegalArgumentException.class).hasMessageContaining("it has 1, 2, 3, 4, 1 inland, 2 inland, 2 coast");
        assertThatThrownBy(() -> zone("2 inland", Optional.of(Period.of("10 years")))).isInstanceOf(IllegalArgumentException.class).hasMessageContaining("give the zone alone, \"2\"");
        assertThat(zone("2", Optional.of(Period.of("10 years")))).isPresent();
    }

    private static Site inland(double speed) {
        return with(site(speed, "IV"), "wind-zone", "2 inland");
    }

    @ParameterizedTest
    @CsvSource({"0.5, 650", "10, 650", "10.01, 800", "18, 800", "25, 900"})
    void the_simplified_pressure_goes_by_height_only(double height, double pascals) {
        assertThat(value(pressure("-de", inland(25), height), "velocity-pressure")).isEqualTo(pascals);
    }

    @Test
    void the_simplified_pressure_ends_at_25_metres_and_at_hills() {
        assertThatThrownBy(() -> pressure("-de", inland(25), 25.1)).isInstanceOf(OutsideTable.class).hasMessageContaining("no pressure above 25 m");
        Topography hill = new Topography(Topography.Feature.HILL, Length.of("30 m"), Length.of("90 m"), Optional.empty(), Optional.empty(), Length.of("0 m"));
        assertThatThrownBy(() -> pressure("-de", En1991Inputs.near(inland(25), hill), 4)).isInstanceOf(NotCovered.class).hasMessageContaining("flat ground only");
        assertThatThrownBy(() -> pressure("-de", En1991Inputs.unknownGround(inland(25)), 4)).isInstanceOf(NotCovered.class);
    }

    /** Half the speed is a quarter of the pressure, so that a limit turned round by the speed meets itself. */
    @Test
    void the_simplified_pressure_follows_another_wind() {
        Site half = inland(25).withSpeed(Speed.of("12.5 m/s"));
        assertThat(value(pressure("-de", half, 4), "velocity-pressure")).isCloseTo(162.5, within(1e-9));
    }

    /** ((1 - 0.11 ln(-ln 0.9))/(1 - 0.11 ln(-ln 0.98)))^1 = 0.8729. */
    @Test
    void probability_in_portugal() {
        Trace trace = pressure("-pt", with(site(27, "II"), Period.of("10 years")), 4);
        assertThat(value(trace, "probability-factor")).isCloseTo(0.8729, within(5e-5));
        assertThat(trace.find("probability-factor").orElseThrow().status().word()).isEqualTo("second-hand");
        assertThat(trace.find("probability-factor").orElseThrow().place()).contains("CACHIM");
    }

    /** 1 + 0.6 x 1.0124 = 1.60744; no hill of any size or place gives more. */
    @Test
    void ground_that_is_not_known_takes_the_largest_orography_factor() {
        Trace trace = pressure("", En1991Inputs.unknownGround(site(26, "II")), 4);
        assertThat(value(trace, "topography-factor")).isCloseTo(1.60744, within(1e-12));
        double worst = value(trace, "velocity-pressure");
        for (Topography.Feature feature : Topography.Feature.values()) {
            for (double x = -150; x <= 150; x += 7.5) {
                for (double slope : new double[] {20, 60, 100, 300, 1000}) {
                    Topography hill = new Topography(feature, Length.of("50 m"), Length.metres(slope), Optional.empty(), Optional.empty(), Length.metres(x));
                    assertThat(value(pressure("", En1991Inputs.near(site(26, "II"), hill), 0.5), "topography-factor")).isLessThanOrEqualTo(1.60744);
                    assertThat(value(pressure("", En1991Inputs.near(site(26, "II"), hill), 4), "velocity-pressure")).isLessThanOrEqualTo(worst);
                }
            }
        }
    }
}
