package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Air by altitude, against values for geometric altitude, which differ by a few units of the fourth decimal. */
class StandardAtmosphereTest {

    private static final StandardAtmosphere AIR = new StandardAtmosphere(288.15, 0.0065, 101325, 5.2559, 287.05);

    @ParameterizedTest
    @CsvSource({"0, 1.2250", "250, 1.1959", "500, 1.1673", "750, 1.1392", "1000, 1.1117", "1500, 1.0581", "2000, 1.0066", "3000, 0.9093", "5000, 0.7364"})
    void densityFallsAsPrinted(double altitude, double density) {
        assertThat(AIR.densityAt(altitude)).isCloseTo(density, within(0.0005));
    }

    /** 10 000 ft = 3048 m: T = 288.15 - 19.812 = 268.338 K. */
    @Test
    void aWorkedExample() {
        assertThat(AIR.temperatureAt(3048)).isCloseTo(268.34, within(0.005));
        assertThat(AIR.pressureAt(3048)).isCloseTo(69697, within(0.0005 * 69697));
        assertThat(AIR.densityAt(3048)).isCloseTo(0.905, within(0.0005));
    }

    /** The pressure also follows from the weight of the air above: dp = -rho g dh, in steps of 1 m, with g = 9.80665 m/s2. */
    @Test
    void pressureCarriesTheAirAbove() {
        double pressure = AIR.pressureAt(0);
        for (int h = 0; h < 3000; h++) {
            pressure -= AIR.densityAt(h + 0.5) * 9.80665;
        }
        assertThat(pressure).isCloseTo(AIR.pressureAt(3000), within(0.0002 * pressure));
    }
}
