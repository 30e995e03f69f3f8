package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.table.Curve;
import broadside.table.TableLibrary;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Loss through screens and what it leaves of the load. */
class ScreenTest {

    private static final Curve PERFORATED = TableLibrary.shipped().edition("open-flow/1").orElseThrow().curve("perforated-plates");

    @ParameterizedTest
    @CsvSource({"0.2, 12.5, 0.05", "0.3, 5.26, 0.005", "0.4, 2.73, 0.005", "0.5, 1.56, 0.005", "0.6, 0.92, 0.005", "0.7, 0.54, 0.005", "0.8, 0.29, 0.005"})
    void lossOfRoundWire(double open, double loss, double half) {
        assertThat(Screen.wireLoss(open, 0.52)).isCloseTo(loss, within(half));
    }

    /** b = 0.7 at a wire Reynolds number of 100. */
    @Test
    void lossOfThinWire() {
        assertThat(Screen.wireLoss(0.5, 0.7)).isCloseTo(2.10, within(0.005));
    }

    @ParameterizedTest
    @CsvSource({"52, 0.27", "17, 0.62", "7.7, 0.90", "3.8, 1.00", "2.0, 0.89", "1.1, 0.68", "0.53, 0.41", "2.73, 0.96", "1.56, 0.81", "0.92, 0.61"})
    void dragOfAnOpenScreen(double loss, double drag) {
        assertThat(Screen.openDrag(loss)).isCloseTo(drag, within(0.006));
    }

    /** The drag peaks at 1 for a loss of 4 and falls on both sides. */
    @Test
    void dragPeaksAtOne() {
        assertThat(Screen.openDrag(4)).isEqualTo(1);
        assertThat(Screen.openDrag(3.9)).isLessThan(1);
        assertThat(Screen.openDrag(4.1)).isLessThan(1);
    }

    @ParameterizedTest
    @CsvSource({"17, 0.172", "7.7, 0.251", "3.8, 0.347", "2.0, 0.454", "1.1, 0.567"})
    void effectiveOpenings(double loss, double open) {
        assertThat(Screen.effectiveOpenShare(loss, 0.52)).isCloseTo(open, within(0.001));
    }

    /** The wire mesh with the loss of a wire mesh is that mesh. */
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.3, 0.5, 0.77, 0.95})
    void aMeshStandsForItself(double open) {
        assertThat(Screen.effectiveOpenShare(Screen.wireLoss(open, 0.52), 0.52)).isCloseTo(open, within(1e-12));
    }

    /** A second route to the printed losses: the formula of Idelchik for thin perforated plates, within 15 % up to 0.8 open. */
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8})
    void printedLossesAgreeWithAFormula(double open) {
        double formula = Math.pow(0.707 * Math.pow(1 - open, 0.375) + 1 - open, 2) / (open * open);
        assertThat(PERFORATED.at("K", open).value()).isCloseTo(formula, within(0.15 * formula));
    }
}
