package broadside.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.api.parallel.Isolated;

@Isolated("standard output is exchanged")
class VerifyCommandTest {

    private static final String CHECK = """
        { "title": "Fastest mile", "source": { "publication": "CAN98", "edition": "1998", "place": "example", "status": "read" },
          "given": { "part": "convert-speed", "speed": "80 mph", "from": "fastest mile", "to": "3 s gust", "terrain": "open" },
          "expected": [{ "step": "speed", "value": "95.6 mph", "within": "0.05 mph", "why": "rounded" }] }
        """;

    @TempDir
    private Path folder;

    @Test
    void thoseThatShipPass() {
        CommandLineRun run = CommandLineRun.of("verify");
        assertThat(run.errors()).isEmpty();
        assertThat(run.out().lines().reduce((a, b) -> b).orElseThrow()).matches("\\d{3} passed, 0 failed");
        assertThat(run.out()).doesNotContain("FAIL").contains("(a mistake in print: must differ)");
        assertThat(run.status()).isZero();
    }

    @Test
    void thoseOfAFolderAreRunAndCounted() throws IOException {
        Files.writeString(folder.resolve("a.json"), CHECK);
        CommandLineRun good = CommandLineRun.of("verify", folder);
        assertThat(good.status()).isZero();
        assertThat(good.out()).startsWith("pass  a.json: Fastest mile").contains("printed 95.6 mph, computed 95.6").endsWith("1 passed, 0 failed" + System.lineSeparator());
        Files.writeString(folder.resolve("b.json"), CHECK.replace("95.6 mph", "96.6 mph"));
        Files.writeString(folder.resolve("c.json"), "{");
        CommandLineRun bad = CommandLineRun.of("verify", folder);
        assertThat(bad.status()).isEqualTo(1);
        assertThat(bad.errors()).isEmpty();
        assertThat(bad.out()).contains("FAIL  b.json: Fastest mile", "FAIL  c.json: ", "1 passed, 2 failed");
    }

    @Test
    void aFolderWithoutChecksOrThatIsNotThereIsOneLine() throws IOException {
        CommandLineRun empty = CommandLineRun.of("verify", folder);
        assertThat(empty.status()).isEqualTo(2);
        assertThat(empty.errors()).containsExactly(folder + ": there is no published check (.json) in this folder");
        Path missing = folder.resolve("nothing");
        CommandLineRun none = CommandLineRun.of("verify", missing);
        assertThat(none.status()).isEqualTo(2);
        assertThat(none.errors()).containsExactly(missing + ": there is no such folder");
        assertThat(none.out() + empty.out()).isEmpty();
    }
}
