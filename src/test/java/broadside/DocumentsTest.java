package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.cli.Commands;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** What README.md and DEVELOPERS.md show is what the tool does. */
class DocumentsTest {

    @Test
    void the_first_result_of_the_readme_is_printed_by_its_command() throws IOException {
        String readme = Files.readString(Path.of("README.md"));
        Matcher block = Pattern.compile("```\\n\\$ java -jar target/broadside\\.jar ([^\\n]+)\\n(.*?)```", Pattern.DOTALL).matcher(readme);
        assertThat(block.find()).isTrue();
        String printed = run(block.group(1).split(" "));
        assertThat(block.group(2).lines().toList()).isNotEmpty().allSatisfy(line -> assertThat(printed).contains(line));
    }

    @Test
    void the_commands_of_the_readme_are_there() throws IOException {
        String help = run("--help");
        for (String command : List.of("serve", "check", "summary", "verify", "tables", "--code-tables")) {
            assertThat(Files.readString(Path.of("README.md"))).contains(command);
            assertThat(help).contains(command);
        }
    }

    @Test
    void the_places_that_the_documents_name_are_there() throws IOException {
        for (String file : List.of("README.md", "DEVELOPERS.md")) {
            Matcher name = Pattern.compile("`((?:code-tables|templates|examples|src)/[\\w./-]*)`").matcher(Files.readString(Path.of(file)));
            while (name.find()) {
                assertThat(Path.of(name.group(1))).as(file).exists();
            }
        }
        for (String type : List.of("FormDesk", "JobReader", "Assessor", "FootActions", "SheetMaker", "PdfWriter", "SheetView", "UnitTable", "Wording")) {
            try (var files = Files.walk(Path.of("src/main/java"))) {
                assertThat(files.anyMatch(f -> f.getFileName().toString().equals(type + ".java"))).as(type).isTrue();
            }
        }
    }

    private static String run(String... command) {
        PrintStream before = System.out;
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        System.setOut(new PrintStream(out, true, StandardCharsets.UTF_8));
        try {
            Commands.run(command);
        } finally {
            System.setOut(before);
        }
        return out.toString(StandardCharsets.UTF_8);
    }
}
