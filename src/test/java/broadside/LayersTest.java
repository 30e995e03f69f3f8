package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** A package may use only packages that stand before it in this list. */
class LayersTest {

    private static final List<String> ORDER = List.of("quantity", "trace", "table", "site", "weather", "panel", "aero", "crew", "codes", "action", "support", "limit", "assess", "job",
        "sheet", "report", "web", "cli");

    /** Imports, and whole names in the text. */
    private static final Pattern USE = Pattern.compile("\\bbroadside\\.([a-z]+)\\.[A-Z]");

    @Test
    void packages_look_only_downwards() throws IOException {
        List<String> wrong = new ArrayList<>();
        for (Path file : javaFiles()) {
            String home = file.getParent().getFileName().toString();
            if (home.equals("broadside")) {
                continue;
            }
            assertThat(ORDER).as(file.toString()).contains(home);
            var uses = USE.matcher(Files.readString(file));
            while (uses.find()) {
                if (ORDER.indexOf(uses.group(1)) > ORDER.indexOf(home)) {
                    wrong.add(file.getFileName() + " in " + home + " uses " + uses.group(1));
                }
            }
        }
        assertThat(wrong).isEmpty();
    }

    @Test
    void no_file_is_longer_than_300_lines() throws IOException {
        List<String> wrong = new ArrayList<>();
        for (Path file : javaFiles()) {
            long lines = Files.readAllLines(file).size();
            if (lines > 300) {
                wrong.add(file.getFileName() + " has " + lines + " lines");
            }
        }
        assertThat(wrong).isEmpty();
    }

    @Test
    void a_code_is_named_in_its_own_package_only() throws IOException {
        Pattern name = Pattern.compile("\"(en-1991-1-4|asce-7|is-875-3|as-nzs-1170-2)[\"/]");
        List<String> wrong = new ArrayList<>();
        for (Path file : javaFiles()) {
            if (!file.getParent().endsWith("codes") && name.matcher(Files.readString(file)).find()) {
                wrong.add(file.getFileName().toString());
            }
        }
        assertThat(wrong).isEmpty();
    }

    private static List<Path> javaFiles() throws IOException {
        try (Stream<Path> files = Files.walk(Path.of("src/main/java/broadside"))) {
            return files.filter(f -> f.toString().endsWith(".java")).toList();
        }
    }
}
