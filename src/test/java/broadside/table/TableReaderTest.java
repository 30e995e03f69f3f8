package broadside.table;

import static broadside.table.TableText.CURVE;
import static broadside.table.TableText.GRID;
import static broadside.table.TableText.ROWS;
import static broadside.table.TableText.before;
import static broadside.table.TableText.bytes;
import static broadside.table.TableText.file;
import static broadside.table.TableText.with;
import static broadside.table.TableText.without;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import broadside.trace.Status;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every line of a table file is accounted for, and what does not fit is named with its file and line. */
class TableReaderTest {

    private static void refused(List<String> lines, String message) {
        assertThatThrownBy(() -> file(lines)).isInstanceOf(TableFormat.class).hasMessage(message);
    }

    @Test
    void readsEveryPartOfTheHeading() {
        TableFile file = file(CURVE);
        assertThat(file.name()).isEqualTo("t.csv");
        assertThat(file.title()).isEqualTo("A printed curve");
        assertThat(file.source()).isEqualTo(new Source("PUB", "2020", "table 1", Status.READ));
        assertThat(file.source().citation()).isEqualTo("PUB:2020, table 1");
        assertThat(file.form()).isEqualTo("curve");
        assertThat(file.axes()).containsExactly("x, a ratio, -");
        assertThat(file.value()).isEqualTo("a, b plain numbers");
        assertThat(file.betweenWord()).isEqualTo("straight line");
        assertThat(file.statusText()).isEqualTo("read");
        assertThat(file.entered()).isEqualTo("2026-12-01");
        assertThat(file.note()).isEqualTo("none");
        assertThat(file.headings()).containsExactly("x", "a", "b");
        assertThat(file.body()).containsExactly(List.of("1", "2.5", "-"), List.of("2", "4.5", "1"), List.of("4", "3.5", "2"));
        assertThat(file.rowStatus()).containsExactly(Status.READ, Status.READ, Status.READ);
    }

    @Test
    void anEditionThatBeginsWithALetterNamesItself() {
        assertThat(file(with(CURVE, 2, "# source: PUB | Guide 2020 | table 1")).source().citation()).isEqualTo("Guide 2020, table 1");
    }

    @Test
    void rowsMayEachHaveTheirStatus() {
        TableFile file = file(ROWS);
        assertThat(file.rowStatus()).containsExactly(Status.READ, Status.RECALLED, Status.DERIVED);
        assertThat(file.source().status()).as("the weakest of the rows").isEqualTo(Status.RECALLED);
        assertThat(file.headings()).containsExactly("key", "value", "unit", "place");
        assertThat(file.body().get(0)).containsExactly("alpha", "1.5", "m", "3.1, (2)");
    }

    @Test
    void lineEndsOfEitherKindAreTheSame() {
        TableFile unix = file(CURVE);
        TableFile dos = TableReader.read("t.csv", bytes(String.join("\r\n", CURVE) + "\r\n"));
        assertThat(dos.body()).isEqualTo(unix.body());
        assertThat(dos.title()).isEqualTo(unix.title());
        assertThat(dos.digest()).as("digest of the bytes").isNotEqualTo(unix.digest());
    }

    @ParameterizedTest
    @CsvSource({"1,title", "2,source", "3,form", "4,axis", "5,value", "6,between", "7,beyond", "8,status", "9,entered", "10,note"})
    void everyHeadingLineIsNeeded(int line, String key) {
        refused(without(CURVE, line), "t.csv:10: the heading line \"# " + key + ":\" is missing");
    }

    @ParameterizedTest
    @CsvSource({"1,title", "2,source", "3,form", "5,value", "6,between", "7,beyond", "8,status", "9,entered", "10,note"})
    void noHeadingLineStandsTwice(int line, String key) {
        refused(before(CURVE, line + 1, CURVE.get(line - 1)), "t.csv:" + (line + 1) + ": the heading line \"# " + key + ":\" stands twice");
    }

    @ParameterizedTest
    @ValueSource(strings = {"# titel: x", "# Title: x", "#", "# ", "# title", "# title:", "# title:   ", "# a remark", "#note x"})
    void anUnknownOrEmptyHeadingLineIsNamed(String text) {
        refused(with(CURVE, 5, text), "t.csv:5: expected a heading line such as \"# title: ...\", found \"" + text + "\"");
    }

    @Test
    void theNumberOfCellsIsThatOfTheHeadings() {
        refused(with(CURVE, 13, "2, 4.5"), "t.csv:13: expected 3 cells, found 2");
        refused(with(CURVE, 14, "4, 3.5, 2, 1"), "t.csv:14: expected 3 cells, found 4");
        refused(with(ROWS, 13, "beta, -, -, 3.2, extra, read"), "t.csv:13: expected 5 cells, found 6");
    }

    @Test
    void noCellIsEmpty() {
        String message = ": an empty cell; a value that is not printed is written as -";
        refused(with(CURVE, 12, "1, , -"), "t.csv:12" + message);
        refused(with(CURVE, 14, "4, 3.5,"), "t.csv:14" + message);
        refused(with(CURVE, 13, "2, \"\", 1"), "t.csv:13" + message);
        refused(with(ROWS, 14, "gamma, -2, -, 3.3, "), "t.csv:14" + message);
    }

    @Test
    void noBlankOrCommentLineStandsInTheBody() {
        String message = ": a blank or comment line inside the body";
        refused(before(CURVE, 13, ""), "t.csv:13" + message);
        refused(before(CURVE, 11, "  "), "t.csv:11" + message);
        refused(before(CURVE, 14, "# title: again"), "t.csv:14" + message);
        refused(before(CURVE, 15, ""), "t.csv:15" + message);
    }

    @Test
    void aRowIsOneLine() {
        assertThatThrownBy(() -> file(with(CURVE, 13, "2, \"4.5, 1"))).isInstanceOf(TableFormat.class).hasMessageStartingWith("t.csv:13: ");
        assertThatThrownBy(() -> file(with(CURVE, 13, "2, \"4.5\"7, 1"))).isInstanceOf(TableFormat.class).hasMessageStartingWith("t.csv:13: ");
    }

    @Test
    void theBodyHasHeadingsAndARow() {
        String message = ": the body needs a line of column headings and at least one row";
        refused(CURVE.subList(0, 10), "t.csv:11" + message);
        refused(CURVE.subList(0, 11), "t.csv:11" + message);
        List<String> narrow = new ArrayList<>(CURVE.subList(0, 10));
        narrow.addAll(List.of("x", "1", "2"));
        refused(narrow, "t.csv:11: the body needs at least two columns");
    }

    @Test
    void anEmptyFileLacksItsHeading() {
        refused(List.of(), "t.csv:1: the heading line \"# title:\" is missing");
    }

    @ParameterizedTest
    @ValueSource(strings = {"seen", "given", "by rows", "read once", "-"})
    void aStatusIsOneOfFiveWords(String word) {
        String message = ": status must be read, second-hand, recalled, derived or common practice, found \"" + word + "\"";
        refused(with(CURVE, 8, "# status: " + word), "t.csv:11" + message);
        refused(with(ROWS, 13, "beta, -, -, 3.2, " + word), "t.csv:13" + message);
    }

    @Test
    void statusByRowNeedsAColumnOfStatus() {
        refused(with(CURVE, 8, "# status: by row"), "t.csv:11: \"status: by row\" needs a last column named status");
        refused(with(ROWS, 11, "key, status, value, unit, place"), "t.csv:11: \"status: by row\" needs a last column named status");
    }

    @ParameterizedTest
    @ValueSource(strings = {"PUB | 2020", "PUB", "PUB | 2020 | table 1 | p. 3", "| 2020 | table 1", "PUB | | table 1", "PUB | 2020 | "})
    void aSourceHasThreeParts(String text) {
        refused(with(CURVE, 2, "# source: " + text), "t.csv:2: source must be \"publication | edition | place\", found \"" + text.strip() + "\"");
    }

    @Test
    void theFormIsOneOfThree() {
        assertThatThrownBy(() -> file(with(CURVE, 3, "# form: table"))).isInstanceOf(TableFormat.class)
            .hasMessageMatching("t\\.csv:\\d+: form must be curve, grid or rows, found \"table\"");
    }

    @ParameterizedTest
    @ValueSource(strings = {"linear", "straight", "Straight line", "cubic"})
    void betweenIsOneOfThree(String word) {
        assertThatThrownBy(() -> file(with(CURVE, 6, "# between: " + word))).isInstanceOf(TableFormat.class)
            .hasMessageMatching("t\\.csv:\\d+: between must be straight line, logarithmic or steps, found \"" + word + "\"");
    }

    @ParameterizedTest
    @ValueSource(strings = {"last value", "x above: last value", "x above: last value (", "x above: goes on (as printed)", "x above last value (r)", "ignored",
        "refused; x above"})
    void beyondHasItsForm(String text) {
        assertThatThrownBy(() -> file(with(CURVE, 7, "# beyond: " + text))).isInstanceOf(TableFormat.class)
            .hasMessageMatching("t\\.csv:\\d+: beyond: expected \"refused\" or \"AXIS below: last value \\(reason\\)\", found \".*\"");
    }

    @Test
    void beyondNamesAnEnd() {
        assertThatThrownBy(() -> file(with(CURVE, 7, "# beyond: x: last value (as printed)"))).isInstanceOf(TableFormat.class)
            .hasMessageMatching("t\\.csv:\\d+: beyond: \"x\" must end in below or above");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1,5", "1e3", ".5", "5.", "+2", "--", "0x1", "NaN", "Infinity", "1 m", "2*"})
    void aCellOfACurveIsANumberAsPrinted(String cell) {
        assertThatThrownBy(() -> TableText.curve(with(CURVE, 13, "2, \"" + cell + "\", 1"))).isInstanceOf(TableFormat.class)
            .hasMessage("t.csv:13: \"" + cell + "\" is not a number as printed");
        assertThatThrownBy(() -> TableText.grid(with(GRID, 14, "3, 5, \"" + cell + "\", 2"))).isInstanceOf(TableFormat.class)
            .hasMessage("t.csv:14: \"" + cell + "\" is not a number as printed");
    }

    @Test
    void theAxisIsPrintedAndRises() {
        assertThatThrownBy(() -> TableText.curve(with(CURVE, 13, "-, 4.5, 1"))).hasMessage("t.csv:13: \"-\" is not a number as printed");
        assertThatThrownBy(() -> TableText.curve(with(CURVE, 13, "1, 4.5, 1"))).hasMessage("t.csv:13: x must rise from point to point");
        assertThatThrownBy(() -> TableText.curve(with(CURVE, 14, "1.5, 3.5, 2"))).hasMessage("t.csv:14: x must rise from point to point");
        assertThatThrownBy(() -> TableText.curve(CURVE.subList(0, 12))).hasMessage("t.csv:12: x needs two or more printed points");
        assertThatThrownBy(() -> TableText.grid(with(GRID, 15, "2, 6, 8, 4"))).hasMessage("t.csv:15: the rows must rise from point to point");
        assertThatThrownBy(() -> TableText.grid(with(GRID, 12, "y, 1, 5, 2"))).isInstanceOf(TableFormat.class)
            .hasMessageEndingWith(": the columns must rise from point to point");
        assertThatThrownBy(() -> TableText.grid(with(GRID, 12, "y, 1, two, 5"))).hasMessage("t.csv:12: the column heading \"two\" is not a number");
        assertThatThrownBy(() -> TableText.grid(with(GRID, 12, "y, 1, -, 5"))).hasMessage("t.csv:12: the column heading \"-\" is not a number");
    }

    @Test
    void aGridHasTwoAxes() {
        assertThatThrownBy(() -> TableText.grid(without(GRID, 5))).isInstanceOf(TableFormat.class).hasMessage("t.csv:1: a grid needs two axis lines");
    }

    @Test
    void noRowKeyStandsTwice() {
        assertThatThrownBy(() -> TableText.rows(with(ROWS, 14, "alpha, 2, -, 3.3, read"))).isInstanceOf(TableFormat.class)
            .hasMessage("t.csv:14: the row \"alpha\" stands twice");
    }
}
