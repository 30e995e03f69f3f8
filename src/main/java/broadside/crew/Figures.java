package broadside.crew;

import broadside.quantity.Speed;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.math.BigDecimal;
import java.util.Optional;

/** Numbers of a table of rows that has a column "place" and a unit beside each number. */
final class Figures {

    private final Rows rows;

    Figures(Rows rows) {
        this.rows = rows;
    }

    double value(String key, String column) {
        return rows.number(key, column).value();
    }

    /** A speed in the unit of its row, absent where none is printed. */
    Optional<Speed> speed(String key, String column) {
        return rows.isPrinted(key, column) ? Optional.of(Speed.of(rows.text(key, column) + " " + rows.text(key, "unit"))) : Optional.empty();
    }

    /** Publication and place of a row. */
    String place(String key) {
        return source(key).citation() + ": " + rows.text(key, "place");
    }

    Source source(String key) {
        return rows.source(key);
    }

    /** A line that cites a row. */
    Trace.Line line(String key, String step, String symbol, String meaning, Trace trace) {
        return trace.line(step, symbol, meaning).from(place(key), source(key).status());
    }

    /** Records a number of a row as it is printed. */
    double record(String key, String column, String step, String symbol, String meaning, String unit, Trace trace) {
        return line(key, step, symbol, meaning, trace).reads("read at " + key, value(key, column), unit);
    }

    /** A number as it stands in a formula. */
    static String plain(double value) {
        return BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    }
}
