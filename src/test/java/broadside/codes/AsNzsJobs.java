package broadside.codes;

import broadside.assess.Assessor;
import broadside.assess.BadJob;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.assess.Problem;
import broadside.job.JobReader;
import broadside.job.JobText;
import broadside.site.SpeedConversion;
import broadside.table.TableLibrary;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;

/** Jobs to AS/NZS 1170.2 as text, and what comes out of them. */
final class AsNzsJobs {

    private static final TableLibrary TABLES = TableLibrary.shipped();
    static final Assessor ASSESSOR = new Assessor(TABLES);
    private static final JobReader READER = new JobReader(ASSESSOR.codes(), new SpeedConversion(TABLES.edition("gust-factors/1").orElseThrow().curve("durst")));

    /** The site of a typed speed; a place for more fields behind it. */
    static final String GUST_45 = "\"basic-speed\":\"45 m/s\",\"averaging\":\"0.2 s gust\"";

    static String job(String edition, String site, String item) {
        return "{\"broadside\":1,\"basis\":{\"code\":\"as-nzs-1170-2\",\"edition\":\"" + edition + "\"},\"site\":{" + site + "},\"items\":[" + item + "]}";
    }

    static String region(String region, String period) {
        return "\"region\":\"" + region + "\",\"return-period\":\"" + period + "\"";
    }

    static String board(double width, double height, double clearance, String more) {
        return String.format(Locale.ROOT, "{\"mark\":\"X\",\"kind\":\"post-sign\",\"boards\":[{\"width\":\"%s m\",\"height\":\"%s m\",\"clearance\":\"%s m\"%s}],\"posts\":{\"count\":1}}",
            width, height, clearance, more);
    }

    static String hoarding(double length, double height, double clearance, String more) {
        return String.format(Locale.ROOT, "{\"mark\":\"X\",\"kind\":\"hoarding\",\"length\":\"%s m\",\"height\":\"%s m\",\"clearance\":\"%s m\",\"posts\":{\"spacing\":\"2 m\"}%s}",
            length, height, clearance, more);
    }

    static Job read(String job) {
        return READER.read(JobText.read(job.getBytes(StandardCharsets.UTF_8))).orThrow();
    }

    static ItemResult result(String job) {
        return ASSESSOR.assess(read(job)).items().get(0);
    }

    /** What is wrong with a job, one line for each problem; empty when nothing is. */
    static List<String> problems(String job) {
        try {
            result(job);
            return List.of();
        } catch (BadJob e) {
            return e.problems().stream().map(Problem::line).toList();
        }
    }

    static double value(ItemResult item, String step) {
        return item.sheet().find(step).orElseThrow(() -> new AssertionError("no step " + step + ": " + item.refusal())).value();
    }

    static double value(String edition, String site, String item, String step) {
        return value(result(job(edition, site, item)), step);
    }

    private AsNzsJobs() { }
}
