package broadside.table;

import static broadside.table.TableText.CURVE;
import static broadside.table.TableText.EDITION;
import static broadside.table.TableText.ROWS;
import static broadside.table.TableText.bytes;
import static broadside.table.TableText.with;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TableLibraryTest {

    private static TableLibrary of(Map<String, byte[]> own) {
        return TableLibrary.of(TableText.library(), own);
    }

    private static void refused(Map<String, byte[]> own, String message) {
        assertThatThrownBy(() -> of(own)).isInstanceOf(TableFormat.class).hasMessage(message);
    }

    /** The library with one file put in place of another, or added. */
    private static Map<String, byte[]> changed(String name, byte[] content) {
        Map<String, byte[]> files = TableText.library();
        files.put(name, content);
        return files;
    }

    private static List<String> ownRows() {
        List<String> own = new ArrayList<>(ROWS.subList(0, 11));
        own.add("alpha, 9, m, sheet 4, read");
        return own;
    }

    private static Map<String, byte[]> overlay() {
        return Map.of("code/1-own/edition.properties", bytes("title=Own values\nbasis= code/1 \n"), "code/1-own/rows.csv", bytes(ownRows()));
    }

    @Test
    void anEditionGivesItsTablesByTheirForm() {
        Edition edition = of(Map.of()).edition("code/1").orElseThrow();
        assertThat(edition.curve("curve").at("a", 2).value()).isEqualTo(4.5);
        assertThat(edition.grid("grid").at(1, 5).value()).isEqualTo(9);
        assertThat(edition.rows("rows").number("alpha", "value").value()).isEqualTo(1.5);
        assertThat(edition.property("averaging")).isEqualTo("3 s gust");
        assertThat(edition.isOverlay()).isFalse();
        assertThat(edition.ownFiles()).extracting(TableFile::name).containsExactly("code/1/curve.csv", "code/1/grid.csv", "code/1/rows.csv");
        assertThatThrownBy(() -> edition.curve("rows")).isInstanceOf(TableFormat.class)
            .hasMessage("code/1/rows.csv:3: is read as curve, but its form is another");
        assertThatThrownBy(() -> edition.curve("nothing")).isInstanceOf(TableFormat.class).hasMessage("code/1/nothing.csv:1: this table is missing");
        assertThat(of(Map.of()).edition("code/2")).isEmpty();
    }

    @Test
    void publicationsAreListed() {
        TableLibrary library = of(Map.of());
        assertThat(library.publications()).containsExactly(new TableLibrary.Publication("PUB", "A publication, in print", "A publisher", "2020"));
        assertThat(library.publication("PUB")).isPresent();
        assertThat(library.publication("pub")).isEmpty();
    }

    @Test
    void anOverlayReadsThroughToItsBasis() {
        Edition own = of(overlay()).edition("code/1-own").orElseThrow();
        assertThat(own.isOverlay()).isTrue();
        assertThat(own.basis().orElseThrow().key()).isEqualTo("code/1");
        assertThat(own.property("title")).isEqualTo("Own values");
        assertThat(own.property("procedure")).isEqualTo("none");
        assertThat(own.rows("rows").number("alpha", "value").value()).isEqualTo(9);
        assertThat(own.rows("rows").number("gamma", "value").value()).isEqualTo(-2);
        assertThat(own.curve("curve").at("a", 2).value()).isEqualTo(4.5);
        assertThat(own.ownFiles()).extracting(TableFile::name).containsExactly("code/1-own/rows.csv");
        assertThat(of(overlay()).edition("code/1").orElseThrow().rows("rows").number("alpha", "value").value()).isEqualTo(1.5);
    }

    @Test
    void anOverlayMayStandOnAnOverlayReadBeforeOrAfterIt() {
        for (String second : List.of("code/1-aaa", "code/1-zzz")) {
            Map<String, byte[]> own = new java.util.HashMap<>(overlay());
            own.put(second + "/edition.properties", bytes("basis=code/1-own\n"));
            TableLibrary library = of(own);
            assertThat(library.edition(second).orElseThrow().rows("rows").number("alpha", "value").value()).isEqualTo(9);
            assertThat(library.edition(second).orElseThrow().rows("rows").number("gamma", "value").value()).isEqualTo(-2);
            assertThat(library.editions()).hasSize(3);
        }
    }

    @Test
    void anUnknownPublicationIsNamed() {
        refused(Map.of("own/1/edition.properties", bytes(EDITION), "own/1/curve.csv", bytes(with(CURVE, 2, "# source: BOOK | 2020 | table 1"))),
            "own/1/curve.csv:2: the publication BOOK is not in publications.csv");
        Map<String, byte[]> known = Map.of("own/1/edition.properties", bytes(EDITION), "own/1/curve.csv",
            bytes(with(CURVE, 2, "# source: BOOK | 2020 | table 1")), "publications.csv", bytes("# More.\nkey,title,publisher,year\nBOOK,A book,P,2021\n"));
        assertThat(of(known).publication("BOOK")).isPresent();
        assertThat(of(known).publication("PUB")).isPresent();
    }

    @Test
    void anUnknownBasisIsNamed() {
        refused(Map.of("own/1/edition.properties", bytes(EDITION + "basis=code/9\n")), "own/1/edition.properties:1: basis = code/9 names no edition");
    }

    @Test
    void aBasisThatLeadsBackIsNamed() {
        refused(Map.of("own/1/edition.properties", bytes("basis=own/1\n")), "own/1/edition.properties:1: basis = own/1 leads back to itself");
        refused(Map.of("own/1/edition.properties", bytes("basis=own/2\n"), "own/2/edition.properties", bytes("basis=own/1\n")),
            "own/2/edition.properties:1: basis = own/1 leads back to itself");
    }

    @Test
    void aFileOutsideAnEditionIsNamed() {
        refused(Map.of("stray.csv", bytes(CURVE)), "stray.csv:1: a file outside a folder of an edition");
        refused(Map.of("own/1/edition.properties", bytes(EDITION), "own/1/readme.txt", bytes("x")),
            "own/1/readme.txt:1: a folder of an edition holds edition.properties and .csv files only");
        refused(Map.of("own/1/curve.csv", bytes(CURVE)), "own/1/edition.properties:1: this file is missing");
    }

    @Test
    void anOwnFileDoesNotReplaceAShippedOne() {
        refused(Map.of("code/1/rows.csv", bytes(ownRows())), "code/1/rows.csv:1: a table of this name ships with the tool; use a folder of your own");
        refused(Map.of("code/1/edition.properties", bytes(EDITION)),
            "code/1/edition.properties:1: a table of this name ships with the tool; use a folder of your own");
    }

    @ParameterizedTest
    @ValueSource(strings = {"title", "publication", "edition", "procedure", "averaging", "level", "status"})
    void everyPropertyIsNeeded(String name) {
        String less = EDITION.replaceAll("(?m)^" + name + "=.*\n", "");
        assertThatThrownBy(() -> TableLibrary.of(changed("code/1/edition.properties", bytes(less)), Map.of())).isInstanceOf(TableFormat.class)
            .hasMessage("code/1/edition.properties:1: the line \"" + name + " = ...\" is missing");
    }

    @Test
    void aBrokenTableStopsTheStart() {
        assertThatThrownBy(() -> TableLibrary.of(changed("code/1/curve.csv", bytes(with(CURVE, 13, "2, x, 1"))), Map.of()))
            .isInstanceOf(TableFormat.class).hasMessage("code/1/curve.csv:13: \"x\" is not a number as printed");
        assertThatThrownBy(() -> TableLibrary.of(changed("code/1/edition.properties", bytes("title=\\u12\n")), Map.of()))
            .isInstanceOf(TableFormat.class).hasMessageStartingWith("code/1/edition.properties:1: ");
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {
        "'# One.\nkey,title,year\n'; publications.csv:1: the columns must be key, title, publisher, year",
        "''; publications.csv:1: the columns must be key, title, publisher, year",
        "'# One.\nkey,title,publisher,year\nPUB,A,B\n'; publications.csv:3: expected 4 filled cells, found 3",
        "'# One.\nkey,title,publisher,year\nPUB,A,B,2020\nTWO,A,,2020\n'; publications.csv:4: expected 4 filled cells, found 4",
        "'# One.\nkey,title,publisher,year\nPUB,A,B,2020\nPUB,A,C,2021\n'; publications.csv:4: the key PUB stands twice"})
    void aBrokenListOfPublicationsIsNamed(String text, String message) {
        assertThatThrownBy(() -> TableLibrary.of(changed("publications.csv", bytes(text)), Map.of())).isInstanceOf(TableFormat.class).hasMessage(message);
    }

    @Test
    void aListOfPublicationsIsNeeded() {
        Map<String, byte[]> files = TableText.library();
        files.remove("publications.csv");
        assertThatThrownBy(() -> TableLibrary.of(files, Map.of())).isInstanceOf(TableFormat.class).hasMessage("publications.csv:1: this file is missing");
    }

    @Test
    void theDigestChangesWithAnyByteAndAnyName() {
        String plain = of(Map.of()).digest();
        assertThat(plain).matches("sha256:[0-9a-f]{64}").isEqualTo(of(Map.of()).digest());
        Set<String> digests = new HashSet<>(Set.of(plain));
        TableText.library().forEach((name, content) -> {
            String text = new String(content, java.nio.charset.StandardCharsets.UTF_8);
            String changed = name.endsWith("properties") ? text.replace("A code", "A kode") : text.replace("printed", "Printed").replace("in print", "in Print")
                .replace("note: none", "note: nonE");
            assertThat(changed).as(name).isNotEqualTo(text);
            digests.add(TableLibrary.of(changed(name, bytes(changed)), Map.of()).digest());
        });
        digests.add(of(overlay()).digest());
        Map<String, byte[]> renamed = TableText.library();
        renamed.put("code/1/other.csv", renamed.remove("code/1/curve.csv"));
        digests.add(TableLibrary.of(renamed, Map.of()).digest());
        assertThat(digests).hasSize(1 + 5 + 2);
    }
}
