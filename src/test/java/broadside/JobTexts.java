package broadside;

import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.job.JobText;
import broadside.trace.Step;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Jobs written as text, each code with a site of about the same wind: a gust of 40 m/s or the mean that goes with it. */
final class JobTexts {

    /** Every edition with its site: key, then the fields of the site. */
    static final List<String[]> CODES = List.of(
        new String[] {"en-1991-1-4/2005", "'basic-speed': '27.4 m/s', 'averaging': '10 min mean', 'terrain': 'II'"},
        new String[] {"asce-7/16", "'basic-speed': '40 m/s', 'averaging': '3 s gust', 'terrain': 'C'"},
        new String[] {"asce-7/22", "'basic-speed': '40 m/s', 'averaging': '3 s gust', 'terrain': 'C'"},
        new String[] {"is-875-3/2015", "'basic-speed': '40 m/s', 'averaging': '3 s gust', 'terrain': '2'"},
        new String[] {"as-nzs-1170-2/2011", "'basic-speed': '40 m/s', 'averaging': '0.2 s gust', 'terrain': '2'"},
        new String[] {"as-nzs-1170-2/2021", "'regional-speed': '40 m/s', 'terrain': '2'"},
        new String[] {"open-flow/1", "'basic-speed': '40 m/s', 'averaging': '3 s gust', 'terrain': '0.05 m'"});

    static final String EN = "'basic-speed': '26 m/s', 'averaging': '10 min mean', 'terrain': 'II'";

    static Job job(String key, String site, String items) {
        int slash = key.indexOf('/');
        String text = ("{'broadside': 1, 'basis': {'code': '" + key.substring(0, slash) + "', 'edition': '" + key.substring(slash + 1) + "'}, 'site': {" + site
            + "}, 'items': [" + items + "]}").replace('\'', '"');
        return AllJobs.TOOL.reader().read(JobText.read(text.getBytes(StandardCharsets.UTF_8))).orThrow();
    }

    /** One item by EN 1991-1-4 in a mean wind of 26 m/s over open fields. */
    static ItemResult en(String item) {
        return result("en-1991-1-4/2005", EN, item);
    }

    static ItemResult result(String key, String site, String item) {
        return AllJobs.assess(job(key, site, item)).items().get(0);
    }

    static double step(ItemResult item, String name) {
        return item.sheet().find(name).map(Step::value).orElseThrow(() -> new AssertionError("no step " + name));
    }

    private JobTexts() { }
}
