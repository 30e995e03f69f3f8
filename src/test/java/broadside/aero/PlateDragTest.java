package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Plates square to the flow and at an angle to it. */
class PlateDragTest {

    @ParameterizedTest
    @CsvSource({"3, 2, false, 1.5", "2, 3, false, 1.5", "2, 2, false, 1", "20, 2, true, 5", "4, 2, true, 1", "2, 2, true, 2", "1, 4, true, 8"})
    void sidesOverEachOther(double width, double height, boolean onGround, double ratio) {
        assertThat(PlateDrag.aspect(width, height, onGround)).isEqualTo(ratio);
    }

    /** Half of a plate of twice the height has half of its force: the same coefficient on its own area. */
    @Test
    void aPlateOnTheGroundIsHalfOfAHigherOne() {
        assertThat(PlateDrag.aspect(7, 3, true)).isEqualTo(PlateDrag.aspect(7, 6, false));
    }

    @ParameterizedTest
    @CsvSource({"1, 1.140", "2, 1.150", "5, 1.204", "10, 1.302", "20, 1.501", "50, 2.0"})
    void theFitUpToTheEndlessPlate(double aspect, double coefficient) {
        assertThat(PlateDrag.fit(aspect, 1.10, 0.02, 2.0)).isCloseTo(coefficient, within(0.0005));
    }

    @ParameterizedTest
    @CsvSource({"15, 0.760", "20, 0.953", "30, 1.269", "40, 1.510", "45, 1.607", "50, 1.691", "60, 1.822", "75, 1.942", "90, 1.980"})
    void normalForceOfAnEndlessPlate(double degrees, double coefficient) {
        assertThat(InclinedPlate.normalForce(Math.toRadians(degrees), 0.222, 0.283)).isCloseTo(coefficient, within(0.0006));
    }

    /** Distance from the middle, given to three decimals. */
    @ParameterizedTest
    @CsvSource({"15, 0.151", "30, 0.117", "45, 0.085", "60, 0.056", "75, 0.028", "90, 0"})
    void itsForceMovesToTheWindwardEdge(double degrees, double eccentricity) {
        assertThat(0.5 - InclinedPlate.centreOfPressure(Math.toRadians(degrees))).isCloseTo(eccentricity, within(0.0006));
    }
}
