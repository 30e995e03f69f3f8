package broadside;

import broadside.assess.Assessment;
import broadside.assess.BadJob;
import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.assess.Problem;
import broadside.job.JobReader;
import broadside.job.JobText;
import broadside.support.Check;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Whole jobs with what carries their item, written as text with single quotes. */
final class CarriedJobs {

    static final String EN = "'code': 'en-1991-1-4', 'edition': '2005'";
    static final String ASCE = "'code': 'asce-7', 'edition': '16'";
    static final String US_SITE = "'basic-speed': '115 mph', 'averaging': '3 s gust', 'risk-category': 'II', 'terrain': 'C'";

    static String enSite(double speed) {
        return "'basic-speed': '" + speed + " m/s', 'averaging': '10 min mean', 'terrain': 'II'";
    }

    /** The text of a job of one item, whose fields follow its mark. */
    static String job(String basis, String site, String kind, String fields) {
        return ("{'broadside': 1, 'basis': {" + basis + "}, 'site': {" + site + "}, 'items': [{'mark': 'X', 'kind': '" + kind + "', " + fields + "}]}").replace('\'', '"');
    }

    private static JobReader.Result read(String job) {
        return AllJobs.TOOL.reader().read(JobText.read(job.getBytes(StandardCharsets.UTF_8)));
    }

    static Assessment assessment(String job) {
        return AllJobs.assess(read(job).orThrow());
    }

    static ItemResult result(String job) {
        return assessment(job).items().get(0);
    }

    static Carried carried(String job) {
        return carried(result(job), job);
    }

    static Carried carried(ItemResult item, String job) {
        return item.loads().flatMap(l -> l.carried()).orElseThrow(() -> new AssertionError("nothing carries it: " + job));
    }

    /** What is wrong with a job, whichever step notices it; empty when nothing is. */
    static List<Problem> problems(String job) {
        try {
            assessment(job);
            return List.of();
        } catch (BadJob e) {
            return e.problems();
        }
    }

    /** The check of a name; of several with that name the one whose case contains a word. */
    static Check check(Carried carried, String name, String named) {
        return carried.checks().stream().filter(c -> c.name().equals(name) && c.named().contains(named)).findFirst()
            .orElseThrow(() -> new AssertionError("no check " + name + " of " + named + " in " + carried.checks()));
    }

    static Check check(Carried carried, String name) {
        return check(carried, name, "");
    }

    static Carried.Result part(Carried carried, String part, String key) {
        return carried.part(part).orElseThrow(() -> new AssertionError("no part " + part)).results().stream().filter(r -> r.key().equals(key)).findFirst()
            .orElseThrow(() -> new AssertionError("no result " + key + " of " + part));
    }

    static double step(ItemResult item, String name) {
        return JobTexts.step(item, name);
    }

    private CarriedJobs() { }
}
