package broadside.table;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Turns the checked cells of a file into a curve, a grid or named rows. */
final class Shapes {

    static Curve curve(TableFile file) {
        require(file, "curve");
        List<String> headings = file.headings();
        int size = file.body().size();
        double[] at = new double[size];
        Map<String, double[]> columns = new HashMap<>();
        for (int column = 0; column < headings.size(); column++) {
            double[] values = new double[size];
            for (int row = 0; row < size; row++) {
                values[row] = number(file, row, column);
            }
            if (column == 0) {
                at = values;
            } else {
                columns.put(headings.get(column), values);
            }
        }
        requireRising(file, at, headings.get(0));
        if (file.between() == Between.LOGARITHMIC && at[0] <= 0) {
            throw new TableFormat(file.name(), line(file, 0), "a logarithmic axis begins above zero");
        }
        requireEnds(file, List.of(headings.get(0)));
        return new Curve(file, headings.get(0), at, columns);
    }

    static Grid grid(TableFile file) {
        require(file, "grid");
        if (file.axes().size() != 2) {
            throw new TableFormat(file.name(), 1, "a grid needs two axis lines");
        }
        int columns = file.headings().size() - 1;
        double[] across = new double[columns];
        for (int i = 0; i < columns; i++) {
            String heading = file.headings().get(i + 1);
            across[i] = TableFile.cellNumber(heading).filter(Double::isFinite).orElseThrow(() ->
                new TableFormat(file.name(), line(file, -1), "the column heading \"" + heading + "\" is not a number"));
        }
        double[] down = new double[file.body().size()];
        double[][] value = new double[down.length][columns];
        for (int row = 0; row < down.length; row++) {
            down[row] = number(file, row, 0);
            for (int column = 0; column < columns; column++) {
                value[row][column] = number(file, row, column + 1);
            }
        }
        requireRising(file, down, "the rows");
        requireRising(file, across, "the columns");
        requireEnds(file, List.of(axisName(file, 0), axisName(file, 1)));
        return new Grid(file, axisName(file, 0), axisName(file, 1), down, across, value);
    }

    static Rows rows(TableFile file) {
        require(file, "rows");
        Map<String, Rows.Row> rows = new LinkedHashMap<>();
        int place = file.headings().indexOf("place");
        for (int i = 0; i < file.body().size(); i++) {
            List<String> cells = file.body().get(i);
            Source source = place < 0 ? file.rowSource(i) : file.source().with(cells.get(place), file.rowStatus().get(i));
            if (rows.put(cells.get(0), new Rows.Row(cells, source, line(file, i))) != null) {
                throw new TableFormat(file.name(), line(file, i), "the row \"" + cells.get(0) + "\" stands twice");
            }
        }
        return new Rows(file, file.headings(), rows, Optional.empty());
    }

    /** Heading lines, then the line of column headings, then the rows. */
    private static int line(TableFile file, int row) {
        return 9 + file.axes().size() + 2 + row;
    }

    private static String axisName(TableFile file, int index) {
        return file.axes().get(index).split(",")[0].strip();
    }

    /** The axes for which the heading says what holds beyond their ends must be there. */
    private static void requireEnds(TableFile file, List<String> axes) {
        file.ends().axes().stream().filter(a -> !axes.contains(a)).findFirst().ifPresent(a -> {
            throw new TableFormat(file.name(), 1, "beyond: \"" + a + "\" is not an axis of this table; it has " + String.join(", ", axes));
        });
    }

    private static void require(TableFile file, String form) {
        if (!file.form().equals(form)) {
            throw new TableFormat(file.name(), 3, "is read as a " + form + " but its form is " + file.form());
        }
    }

    private static double number(TableFile file, int row, int column) {
        String cell = file.body().get(row).get(column);
        Optional<Double> found = TableFile.cellNumber(cell);
        if (found.isEmpty() || column == 0 && found.get().isNaN()) {
            throw new TableFormat(file.name(), line(file, row), "\"" + cell + "\" is not a number as printed");
        }
        return found.get();
    }

    private static void requireRising(TableFile file, double[] at, String axis) {
        if (at.length < 2) {
            throw new TableFormat(file.name(), line(file, 0), axis + " needs two or more printed points");
        }
        for (int i = 1; i < at.length; i++) {
            if (!(at[i] > at[i - 1])) {
                throw new TableFormat(file.name(), line(file, i), axis + " must rise from point to point");
            }
        }
    }

    private Shapes() { }
}
