package broadside.weather;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.quantity.Speed;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import broadside.weather.ForecastWind.Forecast;
import broadside.weather.ForecastWind.Kind;
import broadside.weather.ForecastWind.Place;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ForecastWindTest {

    private static final ForecastWind WIND = new ForecastWind(new WeatherTables(TableLibrary.shipped()));
    private static final Speed TEN = Speed.metresPerSecond(10);

    /** (ln(z/z0) + 3)/ln(10/z0), worked out apart from this program. */
    @ParameterizedTest
    @CsvSource({
        "0.005, 1.183, 1.236, 1.274, 1.303, 1.327, 1.365, 1.395", "0.03, 1.239, 1.309, 1.359, 1.397, 1.428, 1.478, 1.516",
        "0.1, 1.302, 1.390, 1.452, 1.501, 1.541, 1.603, 1.651", "0.25, 1.377, 1.487, 1.565, 1.625, 1.675, 1.753, 1.813",
        "0.5, 1.464, 1.600, 1.696, 1.770, 1.831, 1.927, 2.001"})
    void closed_form_over_the_ground_of_the_forecast(double z0, double z2, double z3, double z4, double z5, double z6, double z8, double z10) {
        double[] heights = {2, 3, 4, 5, 6, 8, 10};
        double[] printed = {z2, z3, z4, z5, z6, z8, z10};
        for (int i = 0; i < heights.length; i++) {
            Trace trace = new Trace();
            assertThat(mean(new Place(z0, z0, heights[i]), trace).gust() / 10).isCloseTo(printed[i], within(0.0006));
            SheetCheck.holds(trace);
        }
    }

    /** Net gust at 3 m over the forecast mean in the open: 1.43, 1.31, 1.20, 1.10, 1.01. */
    @ParameterizedTest
    @CsvSource({"0.005, 1.153, 1.43", "0.03, 1.000, 1.31", "0.1, 0.863, 1.20", "0.25, 0.738, 1.10", "0.5, 0.629, 1.01"})
    void rougher_ground_slows_the_mean(double z0, double ratio, double net) {
        Trace trace = new Trace();
        assertThat(mean(new Place(0.03, z0, 3), trace).gust() / 10).isCloseTo(net, within(0.006));
        assertThat(trace.find("ground-ratio").orElseThrow().value()).isCloseTo(ratio, within(0.0006));
        assertThat(trace.find("gust-open-ground").orElseThrow().value() / 10).isCloseTo(1.309, within(0.0006));
        SheetCheck.holds(trace);
    }

    /** Over open ground the gust at 3 m is 0.86 of that at 10 m. */
    @Test
    void forecast_gust_falls_less_than_the_mean() {
        Trace trace = new Trace();
        ForecastWind.AtItem item = WIND.atItem(new Forecast(Kind.GUST, TEN, 600), new Place(0.03, 0.03, 3), trace);
        assertThat(item.gust() / 10).isCloseTo(0.86, within(0.005));
        assertThat(item.greatest().value() - item.least().value()).isLessThan(1);
        SheetCheck.holds(trace);
    }

    /** By hand at 10 m, z0 0.03: greatest 1 + 0.546 of Krayer and Marshall over the hour mean of ten minutes, 1.662/1.075. */
    @Test
    void band_holds_the_closed_form_and_names_its_relations() {
        ForecastWind.AtItem item = mean(new Place(0.03, 0.03, 10), new Trace());
        assertThat(item.greatest().value() / 10).isCloseTo(1.662 / 1.075, within(0.002));
        assertThat(item.greatest().relation()).isEqualTo("Krayer and Marshall, hurricanes");
        assertThat(item.least().relation()).isEqualTo("Cook");
        assertThat(item.gust()).isBetween(item.least().value(), item.greatest().value());
    }

    @ParameterizedTest
    @CsvSource({"0.03, 3", "0.5, 2.5", "0.005, 8", "1.0, 20"})
    void the_way_back_gives_the_forecast_again(double z0, double height) {
        Place place = new Place(0.03, z0, height);
        Trace trace = new Trace();
        ForecastWind.AtItem there = mean(place, new Trace());
        ForecastWind.InTheOpen back = WIND.inTheOpen(Speed.metresPerSecond(there.gust()), 600, place, trace);
        assertThat(back.mean()).isCloseTo(10, within(1e-9));
        assertThat(back.gust() / back.mean()).isCloseTo(1.516, within(0.0006));
        assertThat(back.mean()).isBetween(back.leastMean().value(), back.greatestMean().value());
        assertThat(back.gust()).isBetween(back.leastGust().value(), back.greatestGust().value());
        SheetCheck.holds(trace);
    }

    @Test
    void sensor_at_ten_metres_over_open_ground_reads_the_forecast() {
        Trace trace = new Trace();
        Place place = new Place(0.03, 0.03, 3);
        ForecastWind.AtSensor reads = WIND.atSensor(Speed.metresPerSecond(13.09), 600, place, 10, trace);
        assertThat(reads.mean()).isCloseTo(10, within(0.01));
        assertThat(reads.gust()).isCloseTo(15.16, within(0.01));
        assertThat(reads.gust()).isBetween(reads.leastGust().value(), reads.greatestGust().value());
        SheetCheck.holds(trace);
    }

    @Test
    void below_two_metres_the_wind_at_two_metres_counts() {
        assertThat(mean(new Place(0.03, 0.03, 0.5), new Trace()).gust()).isEqualTo(mean(new Place(0.03, 0.03, 2), new Trace()).gust());
        assertThat(mean(new Place(0.03, 1, 2), new Trace()).gust()).isEqualTo(mean(new Place(0.03, 1, 4), new Trace()).gust());
    }

    @Test
    void refuses_what_the_profile_does_not_cover() {
        refused(new Place(0.03, 0.03, 31), "height");
        refused(new Place(0.03, 0.03, Double.NaN), "height");
        refused(new Place(0.03, 2, 10), "roughness");
        refused(new Place(0, 0.03, 10), "forecast-roughness");
        assertThatThrownBy(() -> WIND.atSensor(TEN, 600, new Place(0.03, 1, 5), 3, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> WIND.atItem(new Forecast(Kind.MEAN, TEN, 60), new Place(0.03, 0.03, 3), new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> WIND.atItem(new Forecast(Kind.MEAN, Speed.metresPerSecond(1e308), 600), new Place(0.03, 0.03, 3), new Trace()))
            .isInstanceOf(UnfitWeather.class);
    }

    private static void refused(Place place, String field) {
        assertThatThrownBy(() -> mean(place, new Trace())).isInstanceOfSatisfying(UnfitWeather.class, e -> assertThat(e.field()).isEqualTo(field));
    }

    private static ForecastWind.AtItem mean(Place place, Trace trace) {
        return WIND.atItem(new Forecast(Kind.MEAN, TEN, 600), place, trace);
    }
}
