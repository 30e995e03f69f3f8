package broadside.table;

import static broadside.table.TableText.GRID;
import static broadside.table.TableText.grid;
import static broadside.table.TableText.with;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GridTest {

    private static final List<String> OPEN = with(GRID, 8,
        "# beyond: y below: last value (row printed as at most 1); x above: last value (column printed as at least 5)");

    @ParameterizedTest
    @CsvSource({"1,1,1", "1,2,3", "1,5,9", "3,1,5", "3,2,7", "4,1,6", "4,2,8", "4,5,4"})
    void aPrintedCellIsReadAsPrinted(double y, double x, double value) {
        assertThat(grid(GRID).at(y, x).value()).isEqualTo(value);
        assertThat(grid(GRID).at(y, x).how()).startsWith("read at y = ");
    }

    @Test
    void betweenCellsItIsStraightInBothDirections() {
        assertThat(grid(GRID).at(1, 3.5).value()).isCloseTo(6, within(1e-12));
        assertThat(grid(GRID).at(2, 1).value()).isCloseTo(3, within(1e-12));
        assertThat(grid(GRID).at(1.5, 1.25).value()).isCloseTo(2.5, within(1e-12));
        assertThat(grid(GRID).at(1.5, 1.25).how()).isEqualTo("between y = 1 and 3, x = 1 and 2 (1.0, 3.0; 5.0, 7.0)");
        assertThat(grid(GRID).at(3.5, 2).value()).isCloseTo(7.5, within(1e-12));
    }

    @Test
    void bilinearReadingIsThatOfTheFourCorners() {
        double a = 1;
        double b = 3;
        double c = 5;
        double d = 7;
        for (double u = 0; u <= 1; u += 0.125) {
            for (double v = 0; v <= 1; v += 0.125) {
                double expected = (1 - u) * (1 - v) * a + (1 - u) * v * b + u * (1 - v) * c + u * v * d;
                assertThat(grid(GRID).at(1 + 2 * u, 1 + v).value()).isCloseTo(expected, within(1e-12));
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"0.99,1,y", "4.01,1,y", "NaN,1,y", "1,0.99,x", "1,5.01,x", "1,NaN,x", "Infinity,1,y", "1,-Infinity,x"})
    void beyondTheEndsItIsRefused(double y, double x, String axis) {
        assertThatThrownBy(() -> grid(GRID).at(y, x)).isInstanceOf(OutsideTable.class)
            .hasMessageStartingWith("PUB:2020, table 2 covers " + axis + " from 1 to ");
    }

    @Test
    void theLastValueGoesOnWhereTheTableSaysSo() {
        assertThat(grid(OPEN).at(0.2, 1).value()).isEqualTo(1);
        assertThat(grid(OPEN).at(0.2, 1).how()).contains("for y = 0.2 (row printed as at most 1)");
        assertThat(grid(OPEN).at(1, 80).value()).isEqualTo(9);
        assertThat(grid(OPEN).at(1, 80).how()).contains("for x = 80 (column printed as at least 5)");
        assertThat(grid(OPEN).at(0, 80).value()).isEqualTo(9);
        assertThatThrownBy(() -> grid(OPEN).at(5, 1)).isInstanceOf(OutsideTable.class);
        assertThatThrownBy(() -> grid(OPEN).at(1, 0)).isInstanceOf(OutsideTable.class);
    }

    @ParameterizedTest
    @CsvSource({"3,5", "3,4", "2,5", "2,3", "3.5,4", "3.5,5"})
    void aCellThatIsNotPrintedIsRefusedAlsoAsOneCorner(double y, double x) {
        assertThatThrownBy(() -> grid(GRID).at(y, x)).isInstanceOf(OutsideTable.class).hasMessage("PUB:2020, table 2 prints no value at y = 3, x = 5");
    }

    @Test
    void aNeighbourThatIsNotNeededMayBeMissing() {
        assertThat(grid(GRID).at(1, 4).value()).isCloseTo(7, within(1e-12));
        assertThat(grid(GRID).at(3.5, 2).value()).isCloseTo(7.5, within(1e-12));
    }
}
