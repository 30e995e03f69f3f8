package broadside.table;

import static broadside.table.TableText.CURVE;
import static broadside.table.TableText.curve;
import static broadside.table.TableText.with;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CurveTest {

    private static final List<String> LOGARITHMIC = with(CURVE, 6, "# between: logarithmic");
    private static final List<String> STEPS = with(CURVE, 6, "# between: steps");
    private static final List<String> OPEN = with(CURVE, 7,
        "# beyond: x below: last value (row printed as at most 1); x above: last value (row printed as at least 4)");

    @Test
    void aPrintedPointIsReadAsPrinted() {
        assertThat(curve(CURVE).at("a", 1)).isEqualTo(new Coefficient(2.5, "1", new Source("PUB", "2020", "table 1", Status.READ), "read at x = 1"));
        assertThat(curve(CURVE).at("a", 4).value()).isEqualTo(3.5);
        assertThat(curve(CURVE).at("b", 4).value()).isEqualTo(2);
    }

    @Test
    void betweenPointsTheLineIsStraight() {
        Coefficient found = curve(CURVE).at("a", 1.25);
        assertThat(found.value()).isCloseTo(3.0, within(1e-12));
        assertThat(found.how()).isEqualTo("between x = 1 (2.5) and 2 (4.5)");
        assertThat(curve(CURVE).at("a", 3.5).value()).isCloseTo(3.75, within(1e-12));
    }

    @Test
    void logarithmicIsStraightInTheLogarithmOfTheAxis() {
        assertThat(curve(LOGARITHMIC).at("a", Math.sqrt(2)).value()).isCloseTo(3.5, within(1e-12));
        assertThat(curve(LOGARITHMIC).at("a", 2 * Math.pow(2, 0.25)).value()).isCloseTo(4.25, within(1e-12));
        assertThat(curve(LOGARITHMIC).at("a", 2).value()).isEqualTo(4.5);
    }

    @Test
    void stepsHoldTheLastPrintedPoint() {
        assertThat(curve(STEPS).at("a", 1.999).value()).isEqualTo(2.5);
        assertThat(curve(STEPS).at("a", 2).value()).isEqualTo(4.5);
        assertThat(curve(STEPS).at("a", 3.999).value()).isEqualTo(4.5);
        assertThat(curve(STEPS).at("a", 3.999).how()).isEqualTo("read at x = 2");
        assertThat(curve(STEPS).at("a", 4).value()).isEqualTo(3.5);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.999999, 4.000001, 0, -1, -5, 1e12, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void beyondTheEndsItIsRefused(double x) {
        for (List<String> lines : List.of(CURVE, LOGARITHMIC, STEPS)) {
            assertThatThrownBy(() -> curve(lines).at("a", x)).isInstanceOf(OutsideTable.class)
                .hasMessageStartingWith("PUB:2020, table 1 covers x from 1 to 4; this case has ");
        }
    }

    @Test
    void theLastValueGoesOnWhereTheTableSaysSo() {
        assertThat(curve(OPEN).at("a", 0.25).value()).isEqualTo(2.5);
        assertThat(curve(OPEN).at("a", 0.25).how()).isEqualTo("read at x = 1 for x = 0.25 (row printed as at most 1)");
        assertThat(curve(OPEN).at("a", 90).value()).isEqualTo(3.5);
        assertThat(curve(OPEN).at("a", 90).how()).isEqualTo("read at x = 4 for x = 90 (row printed as at least 4)");
        assertThatThrownBy(() -> curve(OPEN).at("a", Double.NaN)).isInstanceOf(OutsideTable.class);
    }

    @Test
    void oneOpenEndLeavesTheOtherShut() {
        List<String> below = with(CURVE, 7, "# beyond: x below: last value (as printed)");
        List<String> above = with(CURVE, 7, "# beyond: x above: last value (as printed)");
        assertThat(curve(below).at("a", 0).value()).isEqualTo(2.5);
        assertThatThrownBy(() -> curve(below).at("a", 5)).isInstanceOf(OutsideTable.class);
        assertThat(curve(above).at("a", 5).value()).isEqualTo(3.5);
        assertThatThrownBy(() -> curve(above).at("a", 0)).isInstanceOf(OutsideTable.class);
    }

    @Test
    void aCellThatIsNotPrintedIsRefusedAlsoAsOneEndOfALine() {
        String message = "PUB:2020, table 1 prints no value of b at x = 1";
        assertThatThrownBy(() -> curve(CURVE).at("b", 1)).isInstanceOf(OutsideTable.class).hasMessage(message);
        assertThatThrownBy(() -> curve(CURVE).at("b", 1.5)).isInstanceOf(OutsideTable.class).hasMessage(message);
        List<String> end = with(CURVE, 14, "4, -, 2");
        assertThatThrownBy(() -> curve(end).at("a", 3)).isInstanceOf(OutsideTable.class).hasMessage("PUB:2020, table 1 prints no value of a at x = 4");
        assertThat(curve(CURVE).at("b", 2).value()).isEqualTo(1);
    }

    @Test
    void itKnowsItsEnds() {
        assertThat(curve(CURVE).first()).isEqualTo(1);
        assertThat(curve(CURVE).last()).isEqualTo(4);
        assertThat(curve(CURVE).firstPrinted("a")).isEqualTo(1);
        assertThat(curve(CURVE).firstPrinted("b")).isEqualTo(2);
    }

    @Test
    void aColumnThatIsNotThereIsAnErrorOfTheProgram() {
        assertThatThrownBy(() -> curve(CURVE).at("c", 2)).isInstanceOf(IllegalArgumentException.class).hasMessage("t.csv has no column c");
        assertThatThrownBy(() -> curve(CURVE).firstPrinted("c")).isInstanceOf(RuntimeException.class);
    }

    @Test
    void aPrintedPointHasTheStatusOfItsRowAndALineTheWeakestOfAll() {
        List<String> mixed = new java.util.ArrayList<>(with(CURVE, 8, "# status: by row"));
        mixed.set(10, "x, a, b, status");
        mixed.set(11, "1, 2.5, -, read");
        mixed.set(12, "2, 4.5, 1, recalled");
        mixed.set(13, "4, 3.5, 2, read");
        assertThat(curve(mixed).at("a", 1).source().status()).isEqualTo(Status.READ);
        assertThat(curve(mixed).at("a", 2).source().status()).isEqualTo(Status.RECALLED);
        assertThat(curve(mixed).at("a", 1.5).source().status()).isEqualTo(Status.RECALLED);
    }

    @Test
    void aCoefficientGoesIntoAStepWithItsPlace() {
        Trace trace = new Trace();
        double value = curve(CURVE).at("a", 1.5).into(trace.line("coefficient/A", "c", "coefficient"));
        assertThat(value).isEqualTo(3.5);
        assertThat(trace.steps().get(0).place()).isEqualTo("PUB:2020, table 1");
        assertThat(trace.steps().get(0).status()).isEqualTo(Status.READ);
        assertThat(trace.steps().get(0).formula()).isEqualTo("between x = 1 (2.5) and 2 (4.5)");
    }
}
