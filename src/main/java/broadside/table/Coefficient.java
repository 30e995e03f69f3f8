package broadside.table;

import broadside.trace.Trace;

/**
 * A number from a table, with the place it came from and how it was found.
 *
 * @param value   the number, in the unit of the table
 * @param unit    SI unit when the table's unit is known to the reader, "1" for a plain number
 * @param source  where it was printed
 * @param how     such as "read at l/h = 5" or "between l/h = 5 (2.9) and 10 (3.4)"
 */
public record Coefficient(double value, String unit, Source source, String how) {

    /** Records the number as the value of this step and hands it back. */
    public double into(Trace.Line line) {
        return line.from(source.citation(), source.status()).reads(how, value, unit);
    }
}
