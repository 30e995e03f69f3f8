package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Mean wind and gust near the ground. */
class GustProfileTest {

    private static final GustProfile PROFILE = new GustProfile(3.0, 10);

    /** 10 m drag coefficient (0.4 / ln(10/z0))² of the Davenport classes, as Stull prints it: with Iu = 1 / ln(10/z0) it is (0.4 Iu)². */
    @ParameterizedTest
    @CsvSource({"0.0002, 0.0014, 0.00005", "0.005, 0.0028, 0.00005", "0.03, 0.0047, 0.00005", "0.1, 0.0075, 0.00005", "0.25, 0.012, 0.0005", "0.5, 0.018, 0.0005",
        "1.0, 0.030, 0.0005", "2, 0.062, 0.0005"})
    void turbulenceBelongsToTheDragOfTheGround(double roughness, double printed, double half) {
        double turbulence = PROFILE.turbulence(10, roughness);
        assertThat(Math.pow(0.4 * turbulence, 2)).isCloseTo(printed, within(half));
    }

    /** Gust over the mean at 10 m is 1.23 at sea to 1.66 over land in WMO/TD-No. 1555; the classes give 1.28 to 1.65. */
    @Test
    void gustFactorsLieAmongMeasuredOnes() {
        assertThat(PROFILE.gustFactor(10, 0.0002)).isBetween(1.23, 1.38);
        assertThat(PROFILE.gustFactor(10, 0.004)).isCloseTo(1.38, within(0.01));
        assertThat(PROFILE.gustFactor(10, 0.03)).isCloseTo(1.52, within(0.01));
        assertThat(PROFILE.gustFactor(10, 0.1)).isCloseTo(1.66, within(0.01));
    }

    /** Exponent of a power law through two heights: 1 / ln((z1 z2)^0.5 / z0) after Wieringa, printed for 3 m to 10 m and 10 m to 30 m. */
    @ParameterizedTest
    @CsvSource({"0.005, 0.143, 0.123", "0.03, 0.192, 0.157", "0.1, 0.250, 0.194", "0.25, 0.324, 0.236", "0.5, 0.418, 0.282"})
    void aPowerLawThroughTwoHeightsHasThePrintedExponent(double roughness, double below, double above) {
        assertThat(exponent(3, 10, roughness)).isCloseTo(below, within(0.015 * below + 0.005));
        assertThat(exponent(10, 30, roughness)).isCloseTo(above, within(0.015 * above + 0.005));
    }

    private static double exponent(double z1, double z2, double roughness) {
        return Math.log(PROFILE.meanRatio(z2, roughness) / PROFILE.meanRatio(z1, roughness)) / Math.log(z2 / z1);
    }

    /** Two routes to the gust: the closed form, and the mean times its gust factor. */
    @ParameterizedTest
    @CsvSource({"2, 0.005", "3.5, 0.05", "7, 0.3", "10, 1", "25, 0.03"})
    void theGustIsTheMeanTimesItsFactor(double height, double roughness) {
        assertThat(PROFILE.meanRatio(height, roughness) * PROFILE.gustFactor(height, roughness)).isCloseTo(PROFILE.gustRatio(height, roughness), within(1e-12));
    }

    /** Two routes to the force on a board: the gust at its middle, and strips of its height each in their own gust. */
    @ParameterizedTest
    @CsvSource({"2.5, 4.5, 0.05", "2, 6, 0.3", "2, 10, 0.03", "5, 8, 0.5"})
    void theMiddleOfABoardStandsForItsStrips(double bottom, double top, double roughness) {
        double strips = strips(bottom, top, roughness);
        double middle = Math.pow(PROFILE.gustRatio((bottom + top) / 2, roughness), 2);
        assertThat(middle).isGreaterThanOrEqualTo(strips).isLessThan(1.03 * strips);
        assertThat(Math.pow(PROFILE.gustRatio(top, roughness), 2)).isGreaterThan(strips);
    }

    private static double strips(double bottom, double top, double roughness) {
        int count = 2000;
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum += Math.pow(PROFILE.gustRatio(bottom + (i + 0.5) * (top - bottom) / count, roughness), 2);
        }
        return sum / count;
    }
}
