package broadside.weather;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import broadside.weather.GustFactors.Ground;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GustFactorsTest {

    private static final WeatherTables TABLES = new WeatherTables(TableLibrary.shipped());
    private static final GustFactors GUSTS = new GustFactors(TABLES);

    /** Worked out apart from this program, over the hourly mean; intensity of turbulence 0.20. */
    @ParameterizedTest
    @CsvSource({
        "1, 1.568, 1.550, 1.544, 1.726, 1.688", "2, 1.542, 1.522, 1.525, 1.690, 1.630", "3, 1.522, 1.501, 1.509, 1.662, 1.596",
        "5, 1.490, 1.469, 1.483, 1.619, 1.553", "10, 1.434, 1.414, 1.433, 1.547, 1.494", "20, 1.367, 1.349, 1.368, 1.460, 1.436",
        "30, 1.323, 1.308, 1.324, 1.406, 1.402", "60, 1.248, 1.237, 1.244, 1.311, 1.344", "120, 1.177, 1.170, 1.169, 1.223, 1.286",
        "300, 1.102, 1.097, 1.091, 1.128, 1.209", "600, 1.061, 1.055, 1.050, 1.075, 1.151", "3600, 1.004, 0.994, 1.000, 0.999, 1.000"})
    void curves_over_the_hour(double t, double asce, double krayer, double cem, double hurricane, double cook) {
        double[] printed = {asce, krayer, cem, hurricane, cook};
        String[] keys = {"durst-asce", "durst-krayer", "cem", "krayer-hurricane", "cook"};
        for (int i = 0; i < keys.length; i++) {
            Trace trace = new Trace();
            assertThat(GUSTS.ratio(keys[i], t, 3600, 0.2, trace).value()).as(keys[i]).isCloseTo(printed[i], within(0.0005 + 1e-9));
            SheetCheck.holds(trace);
        }
    }

    @Test
    void wieringa_relates_to_ten_minutes_and_ends_at_two() {
        assertThat(GUSTS.ratio("wieringa", 3, 600, 0.2, new Trace()).value()).isCloseTo(1.602, within(0.0005));
        assertThat(GUSTS.covers("wieringa", 3, 3600)).isFalse();
        assertThat(GUSTS.covers("wieringa", 121, 600)).isFalse();
        assertThatThrownBy(() -> GUSTS.ratio("wieringa", 3, 3600, 0.2, new Trace())).isInstanceOf(UnfitWeather.class);
    }

    /** 1.509/1.050 = 1.437; 1.5334 - 0.15 log10 7200 = 0.9548, so 3 s over two hours is 1.581. */
    @Test
    void coastal_manual_within_ten_minutes_and_over_two_hours() {
        assertThat(GUSTS.ratio("cem", 3, 600, 0.2, new Trace()).value()).isCloseTo(1.437, within(0.0006));
        Trace trace = new Trace();
        assertThat(GUSTS.ratio("cem", 3, 7200, 0.2, trace).value()).isCloseTo(1.581, within(0.0006));
        SheetCheck.holds(trace);
        assertThat(GUSTS.covers("cem", 3, 36001)).isFalse();
        assertThat(GUSTS.covers("durst-asce", 3, 7200)).isFalse();
    }

    @Test
    void band_names_the_relations_that_lie_furthest_apart() {
        Trace trace = new Trace();
        GustFactors.Band band = GUSTS.band(3, 600, 0.2, Ground.LAND, trace);
        assertThat(band.all()).extracting(r -> r.relation().key())
            .containsExactly("durst-asce", "durst-krayer", "cem", "krayer-hurricane", "cook", "wieringa", "wmo-off-land", "wmo-in-land");
        assertThat(band.least().relation().key()).isEqualTo("cook");
        assertThat(band.least().value()).isCloseTo(1.596 / 1.151, within(0.001));
        assertThat(band.greatest().relation().key()).isEqualTo("wmo-in-land");
        assertThat(band.greatest().value()).isEqualTo(1.66);
        assertThat(trace.find("gust-ratio/wieringa")).isPresent();
        assertThat(trace.find("gust-ratio-least").orElseThrow().formula()).isEqualTo("by Cook");
        SheetCheck.holds(trace);
    }

    @Test
    void table_is_not_read_between_its_times() {
        assertThat(GUSTS.ratio("wmo-at-sea", 60, 600, 0.2, new Trace()).value()).isEqualTo(1.05);
        assertThat(GUSTS.covers("wmo-at-sea", 10, 600)).isFalse();
        assertThat(GUSTS.ratios(10, 600, 0.2, Ground.SEA, new Trace())).hasSize(6);
    }

    @Test
    void refuses_what_has_no_meaning() {
        assertThatThrownBy(() -> GUSTS.band(600, 3, 0.2, Ground.LAND, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> GUSTS.band(3, 600, Double.NaN, Ground.LAND, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> GUSTS.band(0.2, 600, 0.2, Ground.LAND, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> GUSTS.ratio("unknown", 3, 600, 0.2, new Trace())).isInstanceOf(UnfitWeather.class).hasMessageContaining("durst-asce");
    }

    /** Stull prints the drag of the ground beside each class: (0.4/ln(10/z0))^2. */
    @Test
    void roughness_classes_agree_with_their_printed_drag() {
        double[] drag = {0.0014, 0.0028, 0.0047, 0.0075, 0.012, 0.018, 0.030, 0.062};
        assertThat(TABLES.groundClasses()).hasSize(8);
        for (int i = 0; i < drag.length; i++) {
            double ratio = 0.4 / Math.log(10 / TABLES.groundClasses().get(i).roughness());
            assertThat(ratio * ratio).isCloseTo(drag[i], within(drag[i] * 0.03));
        }
    }
}
