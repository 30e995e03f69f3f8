package broadside.job;

import broadside.assess.Assessor;
import broadside.assess.BadJob;
import broadside.assess.Problem;
import broadside.site.SpeedConversion;
import broadside.table.TableFiles;
import broadside.table.TableLibrary;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import tools.jackson.databind.JsonNode;

/** The example jobs as text, to be changed, and the parts that read and assess them. */
final class Jobs {

    static final String SIGN = "entrance-sign.json";
    static final String HOARDING = "granary-hoarding.json";
    static final String FEET = "bakery-sign-feet.json";

    static final TableLibrary TABLES = TableLibrary.shipped();
    static final Assessor ASSESSOR = new Assessor(TABLES);
    static final SpeedConversion CONVERSION = new SpeedConversion(TABLES.edition("gust-factors/1").orElseThrow().curve("durst"));
    static final JobReader READER = new JobReader(ASSESSOR.codes(), CONVERSION);
    static final PublishedChecks CHECKS = new PublishedChecks(ASSESSOR, READER, CONVERSION);

    private static final Map<String, byte[]> EXAMPLES = TableFiles.shipped("examples");

    /** The example jobs by their file names, without the published checks. */
    static Map<String, byte[]> all() {
        Map<String, byte[]> jobs = new TreeMap<>(EXAMPLES);
        jobs.keySet().removeIf(name -> name.contains("/") || !name.endsWith(".json"));
        return jobs;
    }

    static String text(String example) {
        return new String(EXAMPLES.get(example), StandardCharsets.UTF_8);
    }

    /** An example with one piece of its text replaced; the piece must be there. */
    static String changed(String example, String old, String other) {
        String text = text(example);
        if (!text.contains(old)) {
            throw new IllegalArgumentException(example + " does not hold " + old);
        }
        return text.replaceFirst(java.util.regex.Pattern.quote(old), java.util.regex.Matcher.quoteReplacement(other));
    }

    static JsonNode json(String text) {
        return JobText.read(text.getBytes(StandardCharsets.UTF_8));
    }

    /** What is wrong with a job text, whichever step notices it; empty when nothing is. */
    static List<Problem> problems(String text) {
        return problems(text.getBytes(StandardCharsets.UTF_8));
    }

    static List<Problem> problems(byte[] bytes) {
        try {
            ASSESSOR.assess(READER.read(bytes));
            return List.of();
        } catch (BadJob e) {
            return e.problems();
        }
    }

    static JsonNode result(String text) {
        return ResultText.of(ASSESSOR.assess(READER.read(text.getBytes(StandardCharsets.UTF_8))));
    }

    private Jobs() { }
}
