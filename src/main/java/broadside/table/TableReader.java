package broadside.table;

import broadside.trace.Status;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Reads a commented CSV table. Every line is accounted for, or the file is refused with file:line. */
public final class TableReader {

    private static final List<String> HEADING =
        List.of("title", "source", "form", "axis", "value", "between", "beyond", "status", "entered", "note");
    private static final Set<String> FORMS = Set.of("curve", "grid", "rows");
    private static final CSVFormat BODY = CSVFormat.DEFAULT.builder()
        .setIgnoreSurroundingSpaces(true).setIgnoreEmptyLines(false).setRecordSeparator('\n').get();

    /** Reads the text of a table file; {@code name} is its path below code-tables. */
    public static TableFile read(String name, byte[] bytes) {
        List<String> lines = new String(bytes, StandardCharsets.UTF_8).lines().toList();
        Map<String, String> heading = new LinkedHashMap<>();
        List<String> axes = new ArrayList<>();
        int bodyStart = heading(name, lines, heading, axes);
        for (String key : HEADING) {
            if (key.equals("axis") ? axes.isEmpty() : !heading.containsKey(key)) {
                throw new TableFormat(name, bodyStart, "the heading line \"# " + key + ":\" is missing");
            }
        }
        List<CSVRecord> records = body(name, lines, bodyStart);
        return assemble(name, heading, axes, records, bodyStart, bytes);
    }

    private static int heading(String name, List<String> lines, Map<String, String> heading, List<String> axes) {
        int i = 0;
        while (i < lines.size() && lines.get(i).startsWith("#")) {
            String line = lines.get(i).substring(1).strip();
            int colon = line.indexOf(':');
            String key = colon < 0 ? line : line.substring(0, colon).strip();
            String text = colon < 0 ? "" : line.substring(colon + 1).strip();
            if (!HEADING.contains(key) || text.isEmpty()) {
                throw new TableFormat(name, i + 1, "expected a heading line such as \"# title: ...\", found \"" + lines.get(i) + "\"");
            }
            if (key.equals("axis")) {
                axes.add(text);
            } else if (heading.put(key, text) != null) {
                throw new TableFormat(name, i + 1, "the heading line \"# " + key + ":\" stands twice");
            }
            i++;
        }
        return i + 1;
    }

    private static List<CSVRecord> body(String name, List<String> lines, int start) {
        List<String> rest = lines.subList(Math.min(start - 1, lines.size()), lines.size());
        for (int i = 0; i < rest.size(); i++) {
            if (rest.get(i).isBlank() || rest.get(i).startsWith("#")) {
                throw new TableFormat(name, start + i, "a blank or comment line inside the body");
            }
        }
        List<CSVRecord> records = new ArrayList<>();
        try (CSVParser parser = CSVParser.parse(String.join("\n", rest), BODY)) {
            Iterator<CSVRecord> found = parser.iterator();
            while (hasNext(found, name, start + records.size())) {
                records.add(found.next());
                if (parser.getCurrentLineNumber() > records.size()) {
                    throw new TableFormat(name, start + records.size() - 1, "a cell runs over the end of the line");
                }
            }
        } catch (IOException e) {
            throw new TableFormat(name, start, "the body cannot be read: " + e.getMessage());
        }
        if (records.size() < 2) {
            throw new TableFormat(name, start, "the body needs a line of column headings and at least one row");
        }
        return records;
    }

    private static boolean hasNext(Iterator<CSVRecord> records, String name, int line) {
        try {
            return records.hasNext();
        } catch (IllegalStateException | UncheckedIOException e) {
            throw new TableFormat(name, line, "this row cannot be read: " + e.getMessage());
        }
    }

    private static TableFile assemble(String name, Map<String, String> heading, List<String> axes, List<CSVRecord> records,
                                      int start, byte[] file) {
        String statusText = heading.get("status");
        boolean byRow = statusText.equals("by row");
        List<String> headings = List.of(records.get(0).values());
        if (Set.copyOf(headings).size() < headings.size()) {
            throw new TableFormat(name, start, "two columns have the same heading");
        }
        int columns = byRow ? headings.size() - 1 : headings.size();
        if (byRow && !headings.get(columns).equals("status")) {
            throw new TableFormat(name, start, "\"status: by row\" needs a last column named status");
        }
        if (columns < 2) {
            throw new TableFormat(name, start, "the body needs at least two columns");
        }
        List<List<String>> body = new ArrayList<>();
        List<Status> statuses = new ArrayList<>();
        Status weakest = byRow ? Status.DERIVED : status(name, start, statusText);
        for (int i = 1; i < records.size(); i++) {
            List<String> cells = List.of(records.get(i).values());
            int line = start + i;
            if (cells.size() != headings.size()) {
                throw new TableFormat(name, line, "expected " + headings.size() + " cells, found " + cells.size());
            }
            if (cells.stream().anyMatch(String::isBlank)) {
                throw new TableFormat(name, line, "an empty cell; a value that is not printed is written as -");
            }
            Status own = byRow ? status(name, line, cells.get(columns)) : weakest;
            weakest = weakest.weaker(own);
            statuses.add(own);
            body.add(cells.subList(0, columns));
        }
        String form = heading.get("form");
        if (!FORMS.contains(form)) {
            throw new TableFormat(name, 1, "form must be curve, grid or rows, found \"" + form + "\"");
        }
        Between between = Between.of(heading.get("between")).orElseThrow(() -> new TableFormat(name, 1,
            "between must be straight line, logarithmic or steps, found \"" + heading.get("between") + "\""));
        return new TableFile(name, heading.get("title"), source(name, heading.get("source"), weakest), form, axes, heading.get("value"),
            between, Ends.of(heading.get("beyond"), name, 1), statusText, heading.get("entered"), heading.get("note"),
            headings.subList(0, columns), body, statuses, file);
    }

    private static Status status(String name, int line, String word) {
        return Status.of(word).filter(s -> s != Status.GIVEN).orElseThrow(() -> new TableFormat(name, line,
            "status must be read, second-hand, recalled, derived or common practice, found \"" + word + "\""));
    }

    private static Source source(String name, String text, Status status) {
        String[] parts = text.split("\\|", -1);
        if (parts.length != 3 || parts[0].isBlank() || parts[1].isBlank() || parts[2].isBlank()) {
            throw new TableFormat(name, 2, "source must be \"publication | edition | place\", found \"" + text + "\"");
        }
        return new Source(parts[0].strip(), parts[1].strip(), parts[2].strip(), status);
    }

    static String digest(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }

    private TableReader() { }
}
