package broadside.table;

import broadside.table.TableLibrary.Publication;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Reads publications.csv: one row for each publication that a table or a check cites. */
final class Bibliography {

    static Map<String, Publication> read(String name, byte[] bytes) {
        if (bytes == null) {
            throw new TableFormat(name, 1, "this file is missing");
        }
        CSVFormat format = CSVFormat.DEFAULT.builder().setCommentMarker('#').setIgnoreSurroundingSpaces(true).get();
        Map<String, Publication> publications = new LinkedHashMap<>();
        String text = new String(bytes, StandardCharsets.UTF_8);
        try (CSVParser parser = CSVParser.parse(text, format)) {
            List<CSVRecord> records = parser.getRecords();
            if (records.isEmpty() || !List.of(records.get(0).values()).equals(List.of("key", "title", "publisher", "year"))) {
                throw new TableFormat(name, 1, "the columns must be key, title, publisher, year");
            }
            for (CSVRecord record : records.subList(1, records.size())) {
                if (record.size() != 4 || record.stream().anyMatch(String::isBlank)) {
                    throw new TableFormat(name, line(text, record), "expected 4 filled cells, found " + record.size());
                }
                Publication row = new Publication(record.get(0), record.get(1), record.get(2), record.get(3));
                if (publications.put(row.key(), row) != null) {
                    throw new TableFormat(name, line(text, record), "the key " + row.key() + " stands twice");
                }
            }
        } catch (IOException | UncheckedIOException e) {
            throw new TableFormat(name, 1, "this file cannot be read: " + e.getMessage());
        }
        return publications;
    }

    /** The line on which a record begins. */
    private static int line(String text, CSVRecord record) {
        return (int) text.substring(0, (int) record.getCharacterPosition()).chars().filter(c -> c == '\n').count() + 1;
    }

    private Bibliography() { }
}
