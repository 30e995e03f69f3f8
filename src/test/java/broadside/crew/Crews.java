package broadside.crew;

import broadside.table.TableFiles;
import broadside.table.TableLibrary;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.UnaryOperator;

/** The tables of crews for tests, as they ship and with one of them changed. */
final class Crews {

    static final Crew CREW = new Crew(TableLibrary.shipped());

    static Crew with(String table, UnaryOperator<String> change) {
        Map<String, byte[]> files = new TreeMap<>(TableFiles.shipped("code-tables"));
        files.computeIfPresent("crew/1/" + table + ".csv", (name, bytes) ->
            change.apply(new String(bytes, StandardCharsets.UTF_8)).getBytes(StandardCharsets.UTF_8));
        return new Crew(TableLibrary.of(files, Map.of()));
    }

    static Crew without(String table) {
        Map<String, byte[]> files = new TreeMap<>(TableFiles.shipped("code-tables"));
        files.remove(table);
        return new Crew(TableLibrary.of(files, Map.of()));
    }

    static double value(Trace trace, String step) {
        return trace.find(step).map(Step::value).orElseThrow(() ->
            new AssertionError(step + " is not among " + trace.steps().stream().map(Step::name).toList()));
    }

    private Crews() { }
}
