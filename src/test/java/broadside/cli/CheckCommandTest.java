package broadside.cli;

import static broadside.cli.CommandLineRun.job;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.api.parallel.Isolated;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Assessing job files from the command line: exit status, output, and errors of one line each. */
@Isolated("standard output is exchanged")
class CheckCommandTest {

    private static final String SIGN = "entrance-sign.json";

    @TempDir
    private Path folder;

    private static void refused(CommandLineRun run, String... lines) {
        assertThat(run.errors()).containsExactly(lines);
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"entrance-sign.json", "granary-hoarding.json", "bakery-sign-feet.json", "stacked-signs.json", "yard-fence-feet.json"})
    void aGoodJobIsShownAsATable(String example) {
        CommandLineRun run = CommandLineRun.of("check", job(folder, example));
        assertThat(run.status()).isZero();
        assertThat(run.errors()).isEmpty();
        assertThat(run.out()).startsWith("PRELIMINARY - not for construction - for review by a licensed engineer").contains("Broadside 0.", ", tables ")
            .doesNotContain("NaN", "Infinity", "Optional[", "null");
    }

    @Test
    void asJsonItIsTheResultAndNothingElse() {
        CommandLineRun run = CommandLineRun.of("check", job(folder, SIGN), "--json");
        assertThat(run.status()).isZero();
        assertThat(run.errors()).isEmpty();
        assertThat(run.out()).startsWith("{").endsWith("}\n").contains("\"status\" : \"preliminary\"");
        assertThat(broadside.job.JobText.read(run.bytes()).get("items").get(0).get("outcome").stringValue()).isEqualTo("assessed");
        assertThat(CommandLineRun.of("check", "--json", folder.resolve(SIGN)).bytes()).as("the same again").isEqualTo(run.bytes());
    }

    @Test
    void anItemThatIsNotCoveredGivesOne() {
        Path job = job(folder, SIGN, "\"clearance\": \"2.5 m\"", "\"clearance\": \"250 m\"");
        CommandLineRun text = CommandLineRun.of("check", job);
        assertThat(text.status()).isEqualTo(1);
        assertThat(text.errors()).isEmpty();
        assertThat(text.out()).containsIgnoringCase("not covered").contains("the mean wind profile ends at 200 m");
        CommandLineRun json = CommandLineRun.of("check", job, "--json");
        assertThat(json.status()).isEqualTo(1);
        assertThat(json.out()).contains("\"outcome\" : \"not-covered\"");
    }

    @Test
    void whatDoesNotFitIsOneLineEachWithFileAndPath() {
        Path job = job(folder, SIGN, "\"width\": \"3 m\"", "\"width\": \"3\"");
        refused(CommandLineRun.of("check", job),
            job + ": items[0].boards[0].width: \"3\" has no unit: a length is typed with its unit, like 2.4 m or 8 ft 6 in");
        Path two = job(folder, SIGN, "\"count\": 2,", "");
        CommandLineRun run = CommandLineRun.of("check", job(folder, SIGN, "\"terrain\": \"II\"", "\"terrain\": \"C\", \"risk-category\": \"I\""), "--json");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).hasSize(2).allSatisfy(line -> assertThat(line).startsWith(two + ": site."));
        assertThat(run.out()).isEmpty();
    }

    @Test
    void anUnknownOverrideIsOneLineWithFileAndPath() {
        CommandLineRun run = CommandLineRun.of("check", job(folder, SIGN, "\"broadside\": 1,",
            "\"broadside\": 1, \"overrides\": [{ \"name\": \"x\", \"value\": 1, \"reason\": \"r\" }],"));
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).hasSize(1);
        assertThat(run.errors().get(0)).startsWith(folder.resolve(SIGN) + ": overrides[0].name: \"x\" is not a step");
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {"'';the file is empty; a job file is JSON that begins with {", "'hello';this is not JSON",
        "'{\"a\": 1, \"a\": 2}';the key \"a\" stands twice", "'[]';must be an object with the keys broadside", "'%PDF-1.7 nothing';the PDF is damaged"})
    void aFileThatIsNoJobIsOneLine(String text, String reason) throws IOException {
        Path file = Files.writeString(folder.resolve("job.json"), text);
        CommandLineRun run = CommandLineRun.of("check", file);
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).hasSize(1);
        assertThat(run.errors().get(0)).startsWith(file + ": ").contains(reason.split(";")[0]).doesNotContain("Exception", "\tat ");
    }

    @Test
    void aMissingFileAFolderAndAHugeFileAreOneLine() throws IOException {
        Path missing = folder.resolve("nothing.json");
        refused(CommandLineRun.of("check", missing), missing + ": there is no such file");
        refused(CommandLineRun.of("check", folder), folder + ": the file cannot be read, it is a folder");
        Path huge = Files.write(folder.resolve("huge.json"), new byte[2_000_000]);
        refused(CommandLineRun.of("check", huge), huge + ": the file has 2000000 bytes; a job file has at most 1048576");
        Path larger = Files.write(folder.resolve("larger.pdf"), new byte[20_000_001]);
        refused(CommandLineRun.of("check", larger), larger + ": the file has more than 20000000 bytes");
    }

    @ParameterizedTest
    @ValueSource(strings = {"check", "summary job.json", "check a b", "check a --jason", "assess a", "verify a b", "tables x", "--code-tables", "summary"})
    void aCommandLineThatDoesNotFitIsOneLine(String words) {
        CommandLineRun run = CommandLineRun.of((Object[]) words.split(" "));
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).hasSize(1);
        assertThat(run.errors().get(0)).isNotBlank();
        assertThat(run.out()).isEmpty();
    }

    @Test
    void helpAndVersionAreGiven() {
        assertThat(CommandLineRun.of("--version").out()).matches("Broadside \\d+\\.\\d+.*\\R");
        CommandLineRun help = CommandLineRun.of("--help");
        assertThat(help.status()).isZero();
        assertThat(help.out()).contains("check", "summary", "verify", "tables", "--code-tables");
    }

    @Test
    void theDefaultLocaleChangesNothing() {
        Path job = job(folder, "bakery-sign-feet.json");
        java.util.Locale before = java.util.Locale.getDefault();
        byte[] table = CommandLineRun.of("check", job).bytes();
        byte[] json = CommandLineRun.of("check", job, "--json").bytes();
        try {
            for (String tag : new String[] {"de-DE", "tr-TR", "ar-EG-u-nu-arab"}) {
                java.util.Locale.setDefault(java.util.Locale.forLanguageTag(tag));
                assertThat(new String(CommandLineRun.of("check", job).bytes(), StandardCharsets.UTF_8)).isEqualTo(new String(table, StandardCharsets.UTF_8));
                assertThat(CommandLineRun.of("check", job, "--json").bytes()).isEqualTo(json);
            }
        } finally {
            java.util.Locale.setDefault(before);
        }
    }
}
