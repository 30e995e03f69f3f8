package broadside.cli;

import static broadside.cli.CommandLineRun.job;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.job.JobText;
import broadside.table.TableFiles;
import broadside.table.TableLibrary;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.api.parallel.Isolated;
import tools.jackson.databind.JsonNode;

/** A folder of a firm's own values, and the list of tables. */
@Isolated("standard output is exchanged")
class CodeTablesTest {

    private static final String HEADING = """
        # title: Gust factor of the office
        # source: ASCE7 | ASCE/SEI 7-16 | office sheet
        # form: rows
        # axis: key, name of the number, -
        # value: value the number; unit; place
        # between: steps
        # beyond: refused
        # status: by row
        # entered: 2026-12-01
        # note: an example of an own value
        key, value, unit, place, status
        """;
    private static final String JOB = "bakery-sign-feet.json";

    @TempDir
    private Path folder;

    /** A folder of tables with one overlay of one row, which stands in line 12 of its file. */
    private Path tables(String row) throws IOException {
        Path own = Files.createDirectories(folder.resolve("tables/asce-7/16-own"));
        Files.writeString(own.resolve("edition.properties"), "title=Office values on ASCE/SEI 7-16\nbasis=asce-7/16\nstatus=own\n");
        Files.writeString(own.resolve("constants.csv"), HEADING + row + "\n");
        return folder.resolve("tables");
    }

    private Path overlaid() {
        return job(folder, JOB, "\"edition\": \"16\"", "\"edition\": \"16\", \"overlay\": \"own\"");
    }

    private static JsonNode item(CommandLineRun run) {
        assertThat(run.errors()).isEmpty();
        assertThat(run.status()).isZero();
        return JobText.read(run.bytes()).get("items").get(0);
    }

    private static double step(JsonNode item, String name) {
        return item.get("steps").valueStream().filter(s -> s.get("name").stringValue().equals(name)).findFirst().orElseThrow().get("value").doubleValue();
    }

    @Test
    void anOverlayIsUsedWhenTheJobSaysSo() throws IOException {
        Path tables = tables("gust-factor, 0.95, -, office sheet 4, read");
        Path job = overlaid();
        JsonNode own = item(CommandLineRun.of("check", job, "--json", "--code-tables", tables));
        JsonNode plain = item(CommandLineRun.of("check", job(folder, JOB), "--json", "--code-tables", tables));
        assertThat(step(plain, "gust-factor")).isEqualTo(0.85);
        assertThat(step(own, "gust-factor")).isEqualTo(0.95);
        assertThat(own.get("steps").toString()).contains("office sheet 4");
        assertThat(step(own, "velocity-pressure")).as("all else is that of the edition").isEqualTo(step(plain, "velocity-pressure"));
        double force = plain.get("cases").get(0).get("force_N").doubleValue();
        assertThat(own.get("cases").get(0).get("force_N").doubleValue()).isCloseTo(force * 0.95 / 0.85, within(1e-6 * force));
    }

    @Test
    void theOptionMayStandBeforeTheCommand() throws IOException {
        Path tables = tables("gust-factor, 0.95, -, office sheet 4, read");
        assertThat(step(item(CommandLineRun.of("--code-tables", tables, "check", overlaid(), "--json")), "gust-factor")).isEqualTo(0.95);
    }

    @Test
    void withoutTheFolderTheOverlayIsNotThere() {
        CommandLineRun run = CommandLineRun.of("check", overlaid());
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).containsExactly(folder.resolve(JOB) + ": basis.overlay: \"own\" is not an overlay of asce-7/16; it has none");
    }

    @Test
    void theResultNamesTheTablesItWasMadeFrom() throws IOException {
        Path job = job(folder, JOB);
        JsonNode own = JobText.read(CommandLineRun.of("check", job, "--json", "--code-tables", tables("gust-factor, 0.95, -, sheet 4, read")).bytes());
        JsonNode shipped = JobText.read(CommandLineRun.of("check", job, "--json").bytes());
        assertThat(shipped.get("tables").stringValue()).isEqualTo(TableLibrary.shipped().digest());
        assertThat(own.get("tables").stringValue()).isNotEqualTo(shipped.get("tables").stringValue());
    }

    @Test
    void aSummaryIsMadeByTheOverlayToo() throws IOException {
        Path tables = tables("gust-factor, 0.95, -, office sheet 4, read");
        Path out = folder.resolve("out.pdf");
        assertThat(CommandLineRun.of("summary", overlaid(), "-o", out, "--code-tables", tables).status()).isZero();
        assertThat(step(item(CommandLineRun.of("check", out, "--json", "--code-tables", tables)), "gust-factor")).isEqualTo(0.95);
        assertThat(CommandLineRun.of("check", out).status()).as("the overlay is not there").isEqualTo(2);
    }

    @Test
    void aBrokenOwnTableIsNamedWithItsLine() throws IOException {
        Path tables = tables("gust-factor, 0.95, -, read");
        for (Object[] words : new Object[][] {{"check", job(folder, JOB)}, {"tables"}, {"verify"}, {"summary", job(folder, JOB), "-o", folder.resolve("o.pdf")}}) {
            Object[] all = java.util.Arrays.copyOf(words, words.length + 2);
            all[words.length] = "--code-tables";
            all[words.length + 1] = tables;
            CommandLineRun run = CommandLineRun.of(all);
            assertThat(run.status()).isEqualTo(2);
            assertThat(run.errors()).containsExactly("asce-7/16-own/constants.csv:12: expected 5 cells, found 4");
            assertThat(run.out()).isEmpty();
        }
    }

    @Test
    void anOverlayOfATableOrNumberThatIsNotThereIsOneLine() throws IOException {
        CommandLineRun number = CommandLineRun.of("tables", "--code-tables", tables("gust-facter, 0.95, -, office sheet 4, read"));
        assertThat(number.status()).isEqualTo(2);
        assertThat(number.errors()).hasSize(1).first().asString().startsWith("asce-7/16-own/constants.csv:1: \"gust-facter\" is no number of asce-7/16; it has ");
        Files.move(folder.resolve("tables/asce-7/16-own/constants.csv"), folder.resolve("tables/asce-7/16-own/constant.csv"));
        CommandLineRun table = CommandLineRun.of("check", job(folder, JOB), "--code-tables", folder.resolve("tables"));
        assertThat(table.status()).isEqualTo(2);
        assertThat(table.errors()).hasSize(1).first().asString().startsWith("asce-7/16-own/constant.csv:1: is no table of asce-7/16: an overlay changes ").contains("solid-signs");
    }

    /** A new edition with a procedure that is there is a folder of tables and no Java: here the one of 2005 under another year, with one number changed. */
    @Test
    void aNewEditionNeedsNoJava() throws IOException {
        Path own = Files.createDirectories(folder.resolve("tables/en-1991-1-4/2031"));
        for (java.util.Map.Entry<String, byte[]> file : TableFiles.shipped("code-tables").entrySet()) {
            if (file.getKey().startsWith("en-1991-1-4/2005/")) {
                String text = new String(file.getValue(), java.nio.charset.StandardCharsets.UTF_8).replace("title=EN 1991-1-4:2005 + A1:2010, recommended values",
                    "title=Demonstration of an edition of 2031").replace("short=EN 1991-1-4:2005", "short=Demonstration of 2031").replaceAll("signboard-cf( *), 1.80", "signboard-cf$1, 1.95");
                Files.writeString(own.resolve(file.getKey().substring("en-1991-1-4/2005/".length())), text);
            }
        }
        Path job = job(folder, "bakery-sign.json", "\"edition\": \"2005\"", "\"edition\": \"2031\"");
        JsonNode item = item(CommandLineRun.of("check", job, "--json", "--code-tables", folder.resolve("tables")));
        assertThat(step(item, "coefficient/all")).isEqualTo(1.95);
        assertThat(CommandLineRun.of("check", job, "--side-by-side", "--code-tables", folder.resolve("tables")).out()).contains("Demonstration of 2031 (this job)");
    }

    @Test
    void aFolderThatIsNotThereIsOneLine() {
        CommandLineRun run = CommandLineRun.of("tables", "--code-tables", folder.resolve("nothing"));
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).containsExactly(folder.resolve("nothing") + ": there is no such folder");
    }

    @Test
    void everyTableIsListedWithSourceStatusAndDigest() {
        CommandLineRun run = CommandLineRun.of("tables");
        assertThat(run.status()).isZero();
        assertThat(run.errors()).isEmpty();
        TableLibrary.shipped().editions().forEach(edition -> {
            assertThat(run.out()).contains(edition.key() + ": " + edition.property("title"));
            edition.ownFiles().forEach(f -> assertThat(run.out()).contains("  " + f.name() + ": " + f.title() + "; " + f.source().citation() + "; ",
                "sha256:" + f.digest().substring(0, 12)));
        });
        assertThat(run.out().lines().reduce((a, b) -> b)).contains(TableLibrary.shipped().digest());
    }

    @Test
    void anOverlayIsListedWithItsBasis() throws IOException {
        assertThat(CommandLineRun.of("tables", "--code-tables", tables("gust-factor, 0.95, -, sheet 4, second-hand")).out())
            .contains("asce-7/16-own: Office values on ASCE/SEI 7-16 (overlay of asce-7/16); own", "asce-7/16-own/constants.csv: Gust factor of the office",
                "by row, weakest second-hand");
    }
}
