package broadside.weather;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import broadside.weather.Beaufort.Scale;
import org.junit.jupiter.api.Test;

class BeaufortTest {

    private static final Beaufort SCALE = new Beaufort(new WeatherTables(TableLibrary.shipped()));

    @Test
    void classes_in_metres_a_second_are_half_open() {
        double[] from = {0.3, 1.6, 3.4, 5.5, 8.0, 10.8, 13.9, 17.2, 20.8, 24.5, 28.5, 32.7};
        for (int i = 0; i < from.length; i++) {
            assertThat(force(from[i], Scale.METRES_PER_SECOND)).isEqualTo(i + 1);
            assertThat(force(from[i] - 0.001, Scale.METRES_PER_SECOND)).isEqualTo(i);
        }
        assertThat(force(0, Scale.KNOTS)).isZero();
        assertThat(force(150, Scale.KNOTS)).isEqualTo(12);
    }

    /** The classes join up: each begins one unit of print after the last speed of the one before. */
    @Test
    void printed_classes_join_up() {
        for (Scale scale : Scale.values()) {
            double unit = scale == Scale.METRES_PER_SECOND ? 0.1 : 1;
            for (int b = 1; b < 12; b++) {
                assertThat(SCALE.force(b + 1, scale).from()).isCloseTo(SCALE.force(b, scale).to().orElseThrow() + unit, within(1e-9));
            }
        }
    }

    /** 16 kn is 8.23 m/s: force 4 in knots, 5 in metres a second. */
    @Test
    void units_that_disagree_are_told() {
        Trace trace = new Trace();
        Beaufort.Reading reading = SCALE.read(16, Scale.KNOTS, trace);
        assertThat(reading.force().number()).isEqualTo(4);
        assertThat(reading.force().name()).isEqualTo("Moderate breeze");
        assertThat(reading.byUnit().get(Scale.METRES_PER_SECOND)).isEqualTo(5);
        assertThat(reading.told()).anyMatch(t -> t.contains("m/s make this speed force 5"));
        assertThat(trace.find("beaufort-force/m-s").orElseThrow().value()).isEqualTo(5);
        SheetCheck.holds(trace);
    }

    @Test
    void other_printed_edges_are_told() {
        assertThat(SCALE.read(62, Scale.KILOMETRES_PER_HOUR, new Trace()).told()).anyMatch(t -> t.contains("63-75"));
        assertThat(SCALE.read(118, Scale.KILOMETRES_PER_HOUR, new Trace()).told()).anyMatch(t -> t.contains("103-118"));
        assertThat(SCALE.read(110, Scale.KILOMETRES_PER_HOUR, new Trace()).told()).isEmpty();
    }

    /** The formula with B - 0.5 gives the printed lower edge within 0.1 m/s. */
    @Test
    void formula_gives_the_middle_of_a_class() {
        Trace trace = new Trace();
        assertThat(SCALE.speedByFormula(4, trace)).isCloseTo(6.688, within(0.0005));
        SheetCheck.holds(trace);
        for (int b = 1; b <= 12; b++) {
            assertThat(SCALE.speedByFormula(b - 0.5, new Trace())).isCloseTo(SCALE.force(b, Scale.METRES_PER_SECOND).from(), within(0.105));
        }
    }

    @Test
    void refuses_what_is_not_on_the_scale() {
        assertThatThrownBy(() -> SCALE.read(-1, Scale.KNOTS, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> SCALE.read(Double.NaN, Scale.KNOTS, new Trace())).isInstanceOf(UnfitWeather.class);
        assertThatThrownBy(() -> SCALE.force(13, Scale.KNOTS)).isInstanceOf(UnfitWeather.class);
    }

    private static int force(double speed, Scale scale) {
        return SCALE.read(speed, scale, new Trace()).force().number();
    }
}
