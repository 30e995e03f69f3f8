package broadside.table;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A printed table of named rows, such as terrain categories or constants of a code. */
public final class Rows {

    private final TableFile file;
    private final List<String> headings;
    private final Map<String, Row> rows;
    private final Optional<Rows> basis;

    /** One row: its cells as printed and where they were printed. */
    record Row(List<String> cells, Source source, int line) { }

    Rows(TableFile file, List<String> headings, Map<String, Row> rows, Optional<Rows> basis) {
        this.file = file;
        this.headings = List.copyOf(headings);
        this.rows = rows;
        this.basis = basis;
    }

    /** The same table, with rows that it lacks taken from the table it stands on. */
    Rows over(Rows other) {
        return new Rows(file, headings, rows, Optional.of(other));
    }

    /** Keys in the order of print, those of this table first. */
    public List<String> keys() {
        return java.util.stream.Stream.concat(rows.keySet().stream(),
            basis.stream().flatMap(b -> b.keys().stream())).distinct().toList();
    }

    public boolean has(String key) {
        return rows.containsKey(key) || basis.map(b -> b.has(key)).orElse(false);
    }

    /** A number of a row; the unit is "1", the caller knows the unit of the column. */
    public Coefficient number(String key, String column) {
        Row row = row(key);
        if (row == null) {
            return basis.orElseThrow().number(key, column);
        }
        String cell = cell(row, column);
        if (cell.equals("-")) {
            throw new OutsideTable(row.source(), "prints no " + column + " for " + key);
        }
        if (!TableFile.isNumber(cell)) {
            throw new TableFormat(file.name(), row.line(), "\"" + cell + "\" is not a number as printed");
        }
        return new Coefficient(Double.parseDouble(cell), "1", row.source(), "read at " + key);
    }

    /** The text of a cell. */
    public String text(String key, String column) {
        Row row = row(key);
        return row == null ? basis.orElseThrow().text(key, column) : cell(row, column);
    }

    /** Where a row was printed, with its status. */
    public Source source(String key) {
        Row row = row(key);
        return row == null ? basis.orElseThrow().source(key) : row.source();
    }

    public boolean isPrinted(String key, String column) {
        return !text(key, column).equals("-");
    }

    private Row row(String key) {
        Row row = rows.get(key);
        if (row == null && basis.isEmpty()) {
            throw new IllegalArgumentException(file.name() + " has no row " + key);
        }
        return row;
    }

    private String cell(Row row, String column) {
        int index = headings.indexOf(column);
        if (index < 0) {
            throw new IllegalArgumentException(file.name() + " has no column " + column);
        }
        return row.cells().get(index);
    }
}
