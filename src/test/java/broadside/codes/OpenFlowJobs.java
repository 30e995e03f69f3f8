package broadside.codes;

import broadside.assess.ItemResult;
import broadside.cli.Tool;
import broadside.job.JobText;
import broadside.trace.Step;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Jobs by plain fluid mechanics, as text. */
final class OpenFlowJobs {

    static final Tool TOOL = Tool.of(Optional.empty());

    /** A job with one item in a gust; {@code more} are further fields of the site. */
    static ItemResult result(String speed, String terrain, String more, String item) {
        return assess("{\"broadside\":1,\"basis\":{\"code\":\"open-flow\",\"edition\":\"1\"},\"site\":{\"basic-speed\":\"" + speed
            + "\",\"averaging\":\"3 s gust\",\"terrain\":\"" + terrain + "\"" + more + "},\"items\":[" + item + "]}");
    }

    static ItemResult assess(String job) {
        return TOOL.assessor().assess(TOOL.reader().read(JobText.read(job.getBytes(StandardCharsets.UTF_8))).orThrow()).items().get(0);
    }

    static String sign(String width, String height, String clearance, double solidity) {
        return "{\"mark\":\"S\",\"kind\":\"post-sign\",\"boards\":[{\"width\":\"" + width + "\",\"height\":\"" + height + "\",\"clearance\":\"" + clearance
            + "\",\"solidity\":" + solidity + "}],\"posts\":{\"count\":1}}";
    }

    static String posted(String section) {
        return "{\"mark\":\"S\",\"kind\":\"post-sign\",\"boards\":[{\"width\":\"2 m\",\"height\":\"1 m\",\"clearance\":\"3 m\"}],\"posts\":{\"count\":1,\"section\":\""
            + section + "\"}}";
    }

    static String hoarding(String length, String height, String clearance) {
        return "{\"mark\":\"H\",\"kind\":\"hoarding\",\"length\":\"" + length + "\",\"height\":\"" + height + "\",\"clearance\":\"" + clearance
            + "\",\"posts\":{\"spacing\":\"2 m\"}}";
    }

    static double value(ItemResult item, String step) {
        return item.sheet().find(step).map(Step::value).orElseThrow(() -> new AssertionError("no step " + step + "; " + item.refusal()));
    }

    private OpenFlowJobs() { }
}
