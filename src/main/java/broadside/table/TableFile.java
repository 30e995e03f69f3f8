package broadside.table;

import broadside.trace.Status;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * The heading of one table file and its checked content.
 *
 * @param name       path of the file below code-tables
 * @param title      what the table gives
 * @param source     where it was printed; its status is the weakest of the rows when the rows differ
 * @param form       curve, grid or rows
 * @param between    how it is read between printed points
 * @param ends       what holds beyond them
 * @param statusText the status line as written: a status word or "by row"
 * @param entered    date of entry
 * @param note       what was read where
 * @param headings   headings of the body
 * @param body       cells of the body as printed, row by row, without the status column
 * @param rowStatus  status of each row
 * @param file       the file as it is
 */
public record TableFile(String name, String title, Source source, String form, List<String> axes, String value, Between between,
                        Ends ends, String statusText, String entered, String note, List<String> headings,
                        List<List<String>> body, List<Status> rowStatus, byte[] file) {

    public TableFile {
        axes = List.copyOf(axes);
        headings = List.copyOf(headings);
        body = List.copyOf(body);
        rowStatus = List.copyOf(rowStatus);
    }

    private static final Pattern NUMBER = Pattern.compile("-?\\d+(\\.\\d+)?");

    /** SHA-256 of the file. */
    public String digest() {
        return TableReader.digest(file);
    }

    Source rowSource(int row) {
        return source.with(source.place(), rowStatus.get(row));
    }

    /** The word between the printed points, for the page of tables. */
    public String betweenWord() {
        return between.name().toLowerCase(java.util.Locale.ROOT).replace('_', ' ');
    }

    /** What holds beyond the printed ends, for the page of tables. */
    public String beyondWords() {
        return ends.words();
    }

    static boolean isNumber(String cell) {
        return NUMBER.matcher(cell).matches();
    }

    /** A printed number, NaN for a cell that is not printed; empty when it is neither. */
    static Optional<Double> cellNumber(String cell) {
        if (cell.equals("-")) {
            return Optional.of(Double.NaN);
        }
        return isNumber(cell) ? Optional.of(Double.parseDouble(cell)) : Optional.empty();
    }
}
