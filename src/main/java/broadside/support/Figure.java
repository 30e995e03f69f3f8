package broadside.support;

import broadside.table.Coefficient;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;

/** A number of a rule with the text of its place at hand: rules are tried on hundreds of sections. */
public record Figure(double value, String place, Status status, String how) {

    static Figure of(Rows rows, String key, String column) {
        Coefficient number = rows.number(key, column);
        return new Figure(number.value(), number.source().citation(), number.source().status(), number.how());
    }

    static Figure of(Rows rows, String key) {
        return of(rows, key, "value");
    }

    /** The same with the place as its row names it, where a table gathers from many publications. */
    Figure at(String row) {
        return new Figure(value, row, status, how);
    }

    /** Records the number as the value of this step and hands it back. */
    public double into(Trace.Line line) {
        return line.from(place, status).reads(how, value, "1");
    }
}
