package broadside.quantity;

import static broadside.quantity.Rounding.DOWN;
import static broadside.quantity.Rounding.NEAREST;
import static broadside.quantity.Rounding.UP;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ShowTest {

    @ParameterizedTest
    @CsvSource({
        "0, 3, NEAREST, 0", "-0.0, 3, UP, 0", "1.2, 3, UP, 1.20", "1.2, 3, DOWN, 1.20", "1.2, 3, NEAREST, 1.20",
        "1.201, 3, UP, 1.21", "1.201, 3, NEAREST, 1.20", "1.209, 3, DOWN, 1.20", "-1.201, 3, UP, -1.21",
        "-1.209, 3, DOWN, -1.20", "1.205, 3, NEAREST, 1.21", "9.996, 3, NEAREST, 10.0", "9.991, 3, UP, 10.0",
        "9.999, 3, DOWN, 9.99", "12345, 3, NEAREST, 12300", "12345, 3, UP, 12400", "12345, 5, UP, 12345",
        "0.30000000000000004, 3, UP, 0.300", "0.29999999999999998, 3, DOWN, 0.300",
        "1.2000000000001, 3, UP, 1.20", "1.1999999999999, 3, DOWN, 1.20", "1.20000001, 3, UP, 1.21",
        "1.19999998, 3, DOWN, 1.19", "0.000123456, 3, NEAREST, 0.000123", "0.0005, 3, NEAREST, 0.000500",
        "100, 3, NEAREST, 100", "100, 1, NEAREST, 100", "1000000, 2, NEAREST, 1000000", "999.6, 3, UP, 1000",
        "1.5e20, 3, NEAREST, 1.50e20", "1.5e-12, 2, UP, 1.5e-12", "0.1, 1, UP, 0.1", "7, 1, DOWN, 7"
    })
    void number(double value, int figures, Rounding rounding, String expected) {
        assertThat(Show.number(value, figures, rounding)).isEqualTo(expected);
    }

    @ParameterizedTest
    @CsvSource({
        "LENGTH, METRIC, 2.5908, NEAREST, 2.59 m", "LENGTH, US, 2.5908, NEAREST, 8 ft 6 in",
        "LENGTH, US, 2.5909, UP, 8 ft 6 1/8 in", "LENGTH, US, 2.5907, DOWN, 8 ft 5 7/8 in",
        "SPEED, METRIC, 25, DOWN, 25.0 m/s", "SPEED, US, 25, DOWN, 55.9 mph",
        "PRESSURE, METRIC, 99, UP, 99.0 Pa", "PRESSURE, METRIC, 99.96, UP, 0.100 kPa",
        "PRESSURE, METRIC, 613, UP, 0.613 kPa", "PRESSURE, US, 813.961693, NEAREST, 17.0 psf",
        "FORCE, METRIC, 999, UP, 999 N", "FORCE, METRIC, 999.2, UP, 1.00 kN", "FORCE, METRIC, 999.2, DOWN, 999 N",
        "FORCE, METRIC, 1234, UP, 1.24 kN", "FORCE, METRIC, -1234, UP, -1.24 kN",
        "FORCE, US, 1334.46648457815, UP, 300 lbf", "FORCE, US, 44482.2, UP, 10.0 kip",
        "FORCE, US, 44000, DOWN, 9890 lbf", "MOMENT, METRIC, 900, UP, 900 N m", "MOMENT, METRIC, 3500, UP, 3.50 kN m",
        "MOMENT, US, 3525.1266656616, NEAREST, 2600 lbf ft", "MOMENT, US, 135581.79483314, NEAREST, 100 kip ft",
        "MASS, METRIC, 120, UP, 120 kg", "MASS, US, 117.9340162, UP, 260 lb",
        "ANGLE, METRIC, 0.2617993877991494, NEAREST, 15.0 deg", "ANGLE, US, 0.2617993877991494, UP, 15.0 deg",
        "AREA, METRIC, 2.9, UP, 2.90 m2", "AREA, US, 2.87999424, UP, 31.0 ft2",
        "DENSITY, METRIC, 2400, NEAREST, 2400 kg/m3", "DENSITY, US, 2402.769506, NEAREST, 150 lb/ft3",
        "PERIOD, METRIC, 50, NEAREST, 50.0 years", "FORCE, METRIC, 0, UP, 0 N", "FORCE, METRIC, 1e300, UP, 1.00e297 kN"
    })
    void valueWithItsUnit(Dimension dimension, Units system, double si, Rounding rounding, String expected) {
        assertThat(Show.of(si, dimension, system, 3, rounding).text()).isEqualTo(expected);
    }

    @ParameterizedTest
    @CsvSource({
        "2.5908, 8 ft 6 in", "2.4384, 8 ft", "0.1524, 6 in", "0.1651, 6 1/2 in", "2.4257, 7 ft 11 1/2 in",
        "0, 0 in", "0.0001, 0 in", "0.003175, 1/8 in", "0.00635, 1/4 in", "0.022225, 7/8 in", "0.3047, 1 ft",
        "-2.5908, -8 ft 6 in", "30.48, 100 ft", "2.4003, 7 ft 10 1/2 in"
    })
    void feetAndInches(double metres, String expected) {
        assertThat(Show.feetInches(metres)).isEqualTo(expected);
    }

    @Test
    void echoesBothSystems() {
        assertThat(Show.both(Length.of("8 ft 6 in"))).isEqualTo("2.591 m (8 ft 6 in)");
        assertThat(Show.both(Length.of("2.4 m"))).isEqualTo("2.4 m (7 ft 10 1/2 in)");
        assertThat(Show.both(Speed.of("25 m/s"))).isEqualTo("25 m/s (55.92 mph)");
        assertThat(Show.both(Force.of("1.2 kN"))).isEqualTo("1.2 kN (269.8 lbf)");
        assertThat(Show.both(Force.of("999.97 N"))).isEqualTo("1 kN (224.8 lbf)");
        assertThat(Show.both(Mass.of("12345 kg"))).isEqualTo("12345 kg (27216 lb)");
        assertThat(Show.both(Angle.of("15°"))).isEqualTo("15 deg");
        assertThat(Show.both(Period.of("50 years"))).isEqualTo("50 years");
        assertThat(Show.both(Mass.of("0 kg"))).isEqualTo("0 kg (0 lb)");
    }

    @Test
    void stepKeepsItsUnit() {
        assertThat(Show.step(613.0, "N/m2", 4)).isEqualTo(new Shown("613.0", "N/m2"));
        assertThat(Show.step(1.15, "", 3).text()).isEqualTo("1.15");
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void valuesThatAreNotFiniteAreNeverShown(double value) {
        assertThatThrownBy(() -> Show.number(value, 3, UP)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Show.feetInches(value)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Show.of(value, Dimension.FORCE, Units.US, 3, DOWN))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Show.number(1, 0, NEAREST)).isInstanceOf(IllegalArgumentException.class);
    }
}
