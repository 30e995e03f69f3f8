package broadside.table;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.trace.Status;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every table that ships: complete headings, a known publication, and every printed point read back as printed. */
class ShippedTablesTest {

    private static final Map<String, byte[]> FILES = TableFiles.shipped("code-tables");
    private static final TableLibrary TABLES = TableLibrary.shipped();
    private static final List<String> HEADING =
        List.of("title", "source", "form", "axis", "value", "between", "beyond", "status", "entered", "note");
    private static final Set<String> STATUSES = Set.of("read", "second-hand", "recalled", "derived", "common practice", "by row");

    static Stream<String> tables() {
        return FILES.keySet().stream().filter(n -> n.endsWith(".csv") && !n.equals("publications.csv"));
    }

    private static TableFile file(String name) {
        return TABLES.editions().stream().flatMap(e -> e.ownFiles().stream()).filter(f -> f.name().equals(name)).findFirst().orElseThrow();
    }

    @Test
    void everyShippedFileIsInTheLibrary() {
        assertThat(tables()).isNotEmpty().allSatisfy(name -> assertThat(file(name).digest()).hasSize(64));
        assertThat(TABLES.editions()).extracting(Edition::key).contains("asce-7/16", "en-1991-1-4/2005", "gust-factors/1", "own-rules/1");
    }

    @ParameterizedTest
    @MethodSource("tables")
    void itsHeadingIsComplete(String name) {
        List<String> lines = new String(FILES.get(name), StandardCharsets.UTF_8).lines().toList();
        for (String key : HEADING) {
            assertThat(lines.stream().filter(l -> l.startsWith("# " + key + ": ") && l.length() > key.length() + 4)).as("%s: # %s", name, key).isNotEmpty();
        }
        TableFile file = file(name);
        assertThat(STATUSES).contains(file.statusText());
        assertThat(file.rowStatus()).hasSameSizeAs(file.body()).doesNotContain(Status.GIVEN);
        assertThat(file.source().status()).isEqualTo(file.rowStatus().stream().reduce(Status::weaker).orElseThrow());
        assertThat(TABLES.publication(file.source().publication())).isPresent();
        assertThat(file.entered()).matches("\\d{4}-\\d{2}-\\d{2}");
        assertThat(new String(FILES.get(name), StandardCharsets.UTF_8)).doesNotContain("\uFFFD");
    }

    @ParameterizedTest
    @MethodSource("tables")
    void everyPrintedPointIsReadAsPrinted(String name) {
        TableFile file = file(name);
        Edition edition = TABLES.edition(name.substring(0, name.lastIndexOf('/'))).orElseThrow();
        String table = name.substring(name.lastIndexOf('/') + 1, name.length() - ".csv".length());
        int points = switch (file.form()) {
            case "curve" -> curve(file, edition.curve(table));
            case "grid" -> grid(file, edition.grid(table));
            default -> rows(file, edition.rows(table));
        };
        assertThat(points).isPositive();
    }

    private static int curve(TableFile file, Curve curve) {
        int points = 0;
        for (int row = 0; row < file.body().size(); row++) {
            List<String> cells = file.body().get(row);
            double x = Double.parseDouble(cells.get(0));
            for (int column = 1; column < cells.size(); column++) {
                if (!cells.get(column).equals("-")) {
                    Coefficient found = curve.at(file.headings().get(column), x);
                    assertThat(found.value()).isEqualTo(Double.parseDouble(cells.get(column)));
                    assertThat(found.source().status()).isEqualTo(file.rowStatus().get(row));
                    points++;
                }
            }
        }
        return points;
    }

    private static int grid(TableFile file, Grid grid) {
        int points = 0;
        for (List<String> cells : file.body()) {
            for (int column = 1; column < cells.size(); column++) {
                double x = Double.parseDouble(file.headings().get(column));
                if (!cells.get(column).equals("-")) {
                    assertThat(grid.at(Double.parseDouble(cells.get(0)), x).value()).isEqualTo(Double.parseDouble(cells.get(column)));
                    points++;
                }
            }
        }
        return points;
    }

    private static int rows(TableFile file, Rows rows) {
        int points = 0;
        for (List<String> cells : file.body()) {
            for (int column = 1; column < cells.size(); column++) {
                String heading = file.headings().get(column);
                assertThat(rows.text(cells.get(0), heading)).isEqualTo(cells.get(column));
                points++;
                if (TableFile.isNumber(cells.get(column))) {
                    assertThat(rows.number(cells.get(0), heading).value()).isEqualTo(Double.parseDouble(cells.get(column)));
                }
            }
        }
        assertThat(rows.keys()).startsWith(file.body().stream().map(cells -> cells.get(0)).toArray(String[]::new));
        return points;
    }

    @Test
    void everyPublicationHasItsFourParts() {
        assertThat(TABLES.publications()).isNotEmpty().allSatisfy(p ->
            assertThat(List.of(p.key(), p.title(), p.publisher(), p.year())).noneMatch(String::isBlank));
    }

    @Test
    void namesOfFilesAreSortedAndRelative() {
        assertThat(List.copyOf(FILES.keySet())).isSorted().noneMatch(n -> n.contains("\\")).noneMatch(n -> n.startsWith("/"));
    }
}
