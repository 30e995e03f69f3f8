package broadside.table;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** A table file that is as it must be, to be changed line by line. */
final class TableText {

    static final List<String> CURVE = List.of(
        "# title: A printed curve",
        "# source: PUB | 2020 | table 1",
        "# form: curve",
        "# axis: x, a ratio, -",
        "# value: a, b plain numbers",
        "# between: straight line",
        "# beyond: refused",
        "# status: read",
        "# entered: 2026-12-01",
        "# note: none",
        "x, a  , b",
        "1, 2.5, -",
        "2, 4.5, 1",
        "4, 3.5, 2");

    static final List<String> GRID = List.of(
        "# title: A printed grid",
        "# source: PUB | 2020 | table 2",
        "# form: grid",
        "# axis: y, down, -",
        "# axis: x, across, -",
        "# value: plain number",
        "# between: straight line",
        "# beyond: refused",
        "# status: read",
        "# entered: 2026-12-01",
        "# note: none",
        "y, 1, 2, 5",
        "1, 1, 3, 9",
        "3, 5, 7, -",
        "4, 6, 8, 4");

    static final List<String> ROWS = List.of(
        "# title: Single numbers",
        "# source: PUB | 2020 | chapter 3",
        "# form: rows",
        "# axis: key, name, -",
        "# value: value; unit; place",
        "# between: steps",
        "# beyond: refused",
        "# status: by row",
        "# entered: 2026-12-01",
        "# note: none",
        "key  , value, unit, place       , status",
        "alpha, 1.5  , m   , \"3.1, (2)\", read",
        "beta , -    , -   , 3.2         , recalled",
        "gamma, -2   , -   , 3.3         , derived");

    static final String EDITION = """
        title=A code
        publication=PUB
        edition=2020
        procedure=none
        averaging=3 s gust
        level=strength
        status=current
        """;

    static final String PUBLICATIONS = """
        # One row for each.
        key,title,publisher,year
        PUB,"A publication, in print",A publisher,2020
        """;

    /** The lines with one replaced. */
    static List<String> with(List<String> lines, int number, String text) {
        List<String> changed = new ArrayList<>(lines);
        changed.set(number - 1, text);
        return changed;
    }

    /** The lines with one taken out. */
    static List<String> without(List<String> lines, int number) {
        List<String> changed = new ArrayList<>(lines);
        changed.remove(number - 1);
        return changed;
    }

    /** The lines with one more in front of a line. */
    static List<String> before(List<String> lines, int number, String text) {
        List<String> changed = new ArrayList<>(lines);
        changed.add(number - 1, text);
        return changed;
    }

    static byte[] bytes(List<String> lines) {
        return bytes(String.join("\n", lines) + "\n");
    }

    static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    static TableFile file(List<String> lines) {
        return TableReader.read("t.csv", bytes(lines));
    }

    static Curve curve(List<String> lines) {
        return Shapes.curve(file(lines));
    }

    static Grid grid(List<String> lines) {
        return Shapes.grid(file(lines));
    }

    static Rows rows(List<String> lines) {
        return Shapes.rows(file(lines));
    }

    /** A library of one edition, "code/1", with the three tables. */
    static Map<String, byte[]> library() {
        Map<String, byte[]> files = new java.util.TreeMap<>();
        files.put("publications.csv", bytes(PUBLICATIONS));
        files.put("code/1/edition.properties", bytes(EDITION));
        files.put("code/1/curve.csv", bytes(CURVE));
        files.put("code/1/grid.csv", bytes(GRID));
        files.put("code/1/rows.csv", bytes(ROWS));
        return files;
    }

    private TableText() { }
}
