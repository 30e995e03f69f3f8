package broadside.codes;

import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.cli.Tool;
import broadside.job.JobText;
import broadside.trace.Step;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Jobs by ASCE 7 as texts, with single quotation marks for double ones. */
final class AsceJobs {

    static final Tool TOOL = Tool.of(Optional.empty());

    static Job job(String edition, String site, String item) {
        String text = "{'broadside':1,'basis':{'code':'asce-7','edition':'" + edition + "'},'site':{'averaging':'3 s gust'," + site + "},'items':[{'mark':'X'," + item + "}]}";
        return TOOL.reader().read(JobText.read(text.replace('\'', '"').getBytes(StandardCharsets.UTF_8))).orThrow();
    }

    static ItemResult result(String edition, String site, String item) {
        return TOOL.assessor().assess(job(edition, site, item)).items().get(0);
    }

    static String wind(String speed, String exposure) {
        return "'basic-speed':'" + speed + "','terrain':'" + exposure + "'";
    }

    static String sign(String width, String height, String clearance, String solidity) {
        return "'kind':'post-sign','boards':[{'width':'" + width + "','height':'" + height + "','clearance':'" + clearance + "','solidity':" + solidity + "}],'posts':{'count':1}";
    }

    static WindCode code(String edition) {
        return TOOL.assessor().codes().code("asce-7/" + edition).orElseThrow();
    }

    static double value(ItemResult item, String step) {
        return step(item, step).value();
    }

    static Step step(ItemResult item, String name) {
        return item.sheet().find(name).orElseThrow(() -> new AssertionError("no step " + name + " in " + item.sheet().steps().stream().map(Step::name).toList() + item.refusal()));
    }

    private AsceJobs() { }
}
