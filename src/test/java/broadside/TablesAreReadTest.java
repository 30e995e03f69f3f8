package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.Assessor;
import broadside.job.JobReader;
import broadside.job.JobText;
import broadside.job.PublishedChecks;
import broadside.site.SpeedConversion;
import broadside.table.TableFiles;
import broadside.table.TableFormat;
import broadside.table.TableLibrary;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every table is needed by something, and every figure of a code stands in a table. */
class TablesAreReadTest {

    private static final Map<String, byte[]> FILES = TableFiles.shipped("code-tables");

    /** A literal with a part behind the point; whole numbers are counts, powers and indices. */
    private static final Pattern FIGURE = Pattern.compile("(?<![\\w.\"])(\\d+\\.\\d+(?:[eE]-?\\d+)?|\\d+[eE]-?\\d+)");

    /** Figures that belong to the calculation itself and to no publication. */
    private static final Map<String, Set<String>> OWN = Map.ofEntries(
        Map.entry("", Set.of("0.5", "1.0", "0.0", "2.0", "1e-9", "1e-6", "1e-12")),
        Map.entry("Weights.java", Set.of("9.80665")),
        Map.entry("Hoarding.java", Set.of("0.005")),
        Map.entry("Cable.java", Set.of("1e-14")),
        Map.entry("En1991Walls.java", Set.of("1e4")),
        Map.entry("En1991FacadeZones.java", Set.of("1e4")),
        Map.entry("InclinedPlate.java", Set.of("0.75")),
        Map.entry("Numbers.java", Set.of("1e9")),
        Map.entry("ItemNotes.java", Set.of("0.1", "0.001")),
        Map.entry("Averaging.java", Set.of("0.2")),
        Map.entry("SpeedConversion.java", Set.of("1609.344")),
        Map.entry("PostDrag.java", Set.of("1000.0")));

    /** Without any one of its tables an edition cannot be used: the start stops, or a job that needs it does. */
    @Test
    void no_table_can_be_taken_away() {
        List<String> unused = new ArrayList<>();
        for (String name : FILES.keySet()) {
            boolean overlay = name.contains("/") && TableLibrary.shipped().editions().stream().filter(e -> name.startsWith(e.key() + "/")).anyMatch(e -> e.isOverlay());
            if (name.endsWith(".csv") && name.contains("/") && !overlay && !isMissed(name)) {
                unused.add(name);
            }
        }
        assertThat(unused).as("tables that nothing reads").isEmpty();
    }

    private static boolean isMissed(String name) {
        Map<String, byte[]> fewer = new TreeMap<>(FILES);
        fewer.remove(name);
        try {
            TableLibrary tables = TableLibrary.of(fewer, Map.of());
            Assessor assessor = new Assessor(tables);
            assessor.catalogue();
            SpeedConversion conversion = new SpeedConversion(tables.edition("gust-factors/1").orElseThrow().curve("durst"));
            JobReader reader = new JobReader(assessor.codes(), conversion);
            new PublishedChecks(assessor, reader, conversion).run(Map.of());
            for (Map.Entry<String, byte[]> file : AllJobs.files().entrySet()) {
                if (file.getKey().endsWith(".json") && !file.getKey().contains("/")) {
                    reader.read(JobText.read(file.getValue())).job().ifPresent(assessor::assess);
                }
            }
            return false;
        } catch (TableFormat e) {
            return true;
        }
    }

    /** What an overlay holds must be a table that some code asks for by that name. */
    @Test
    void every_table_is_asked_for_by_name() throws IOException {
        String java = sources("codes", "assess", "site", "cli", "action", "support", "crew", "weather");
        Set<String> unknown = new TreeSet<>();
        FILES.keySet().stream().filter(n -> n.endsWith(".csv") && n.contains("/")).forEach(n -> {
            String table = n.substring(n.lastIndexOf('/') + 1, n.length() - ".csv".length());
            if (!java.contains("\"" + table + "\"")) {
                unknown.add(n);
            }
        });
        assertThat(unknown).isEmpty();
    }

    @Test
    void no_figure_of_a_code_stands_in_java() throws IOException {
        List<String> figures = new ArrayList<>();
        for (Path file : files("codes", "aero", "crew", "weather", "action", "assess", "panel", "site", "support")) {
            String name = file.getFileName().toString();
            int line = 0;
            for (String text : Files.readAllLines(file)) {
                line++;
                Matcher found = FIGURE.matcher(text.replaceAll("\"(?:[^\"\\\\]|\\\\.)*\"", "\"\"").replaceAll("//.*|^\\s*/?\\*.*", "").replaceAll("/\\*.*?\\*/", ""));
                while (found.find()) {
                    if (!OWN.get("").contains(found.group(1)) && !OWN.getOrDefault(name, Set.of()).contains(found.group(1))) {
                        figures.add(name + ":" + line + ": " + found.group(1));
                    }
                }
            }
        }
        assertThat(figures).as("figures that belong in a table, or in the list of this test with a reason").isEmpty();
    }

    private static String sources(String... packages) throws IOException {
        StringBuilder all = new StringBuilder();
        for (Path file : files(packages)) {
            all.append(Files.readString(file));
        }
        return all.toString();
    }

    private static List<Path> files(String... packages) throws IOException {
        List<Path> files = new ArrayList<>();
        for (String each : packages) {
            try (Stream<Path> found = Files.list(Path.of("src/main/java/broadside", each))) {
                found.filter(f -> f.toString().endsWith(".java")).sorted().forEach(files::add);
            }
        }
        return files;
    }
}
