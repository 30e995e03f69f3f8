package broadside.codes;

import broadside.action.CaseAction;
import broadside.assess.ItemResult;
import broadside.cli.Tool;
import broadside.job.JobText;
import broadside.trace.Step;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Jobs by IS 875 (Part 3) as text, with single quotation marks, and what comes out of them. */
final class Is875Jobs {

    private static final Tool TOOL = Tool.of(Optional.empty());

    /** 47 m/s, terrain 2: p_z = 0.6 x 47² = 1325.4 Pa up to 10 m, and p_d = 0.9 p_z = 1192.86 Pa. */
    static final String DELHI = site("47 m/s", "2", "");

    static String site(String speed, String terrain, String more) {
        return "'basic-speed': '" + speed + "', 'averaging': '3 s gust', 'terrain': '" + terrain + "'" + (more.isEmpty() ? "" : ", " + more);
    }

    static String sign(String width, String height, String clearance) {
        return sign(width, height, clearance, "0 m", 1);
    }

    static String sign(String width, String height, String clearance, String offset, double solidity) {
        return "{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'width': '" + width + "', 'height': '" + height + "', 'clearance': '" + clearance + "', 'offset': '"
            + offset + "', 'solidity': " + solidity + "}], 'posts': {'count': 2, 'spacing': '2 m'}}";
    }

    static String hoarding(String length, String height, String clearance, String more) {
        return "{'mark': 'H1', 'kind': 'hoarding', 'length': '" + length + "', 'height': '" + height + "', 'clearance': '" + clearance + "'" + more + "}";
    }

    static String facade(String backing, String size, String corner, String building) {
        return "{'mark': 'F1', 'kind': 'facade-panel', 'backing': '" + backing + "', " + size + ", 'bottom': '1 m', 'distance-from-corner': '" + corner
            + "', 'building': {" + building + "}}";
    }

    /** Width of the face, depth and height of a building. */
    static String building(String width, String depth, String height) {
        return "'width': '" + width + "', 'depth': '" + depth + "', 'height': '" + height + "'";
    }

    static ItemResult result(String site, String item) {
        String text = ("{'broadside': 1, 'basis': {'code': 'is-875-3', 'edition': '2015'}, 'site': {" + site + "}, 'items': [" + item + "]}").replace('\'', '"');
        return TOOL.assessor().assess(TOOL.reader().read(JobText.read(text.getBytes(StandardCharsets.UTF_8))).orThrow()).items().get(0);
    }

    static Step step(ItemResult item, String name) {
        return item.sheet().find(name).orElseThrow(() -> new AssertionError("no step " + name + "; " + item.refusal()));
    }

    static double value(ItemResult item, String name) {
        return step(item, name).value();
    }

    /** The value of a step of a sign 2 m by 1 m, 2 m clear, at this site. */
    static double ofSign(String site, String step) {
        return value(result(site, sign("2 m", "1 m", "2 m")), step);
    }

    /** A case, wind on the front, met from that end. */
    static CaseAction find(ItemResult item, String name, LoadCase.Windward windward) {
        return item.loads().orElseThrow().cases().stream().filter(c -> c.name().equals(name) && !c.direction().equals("back") && c.windward() == windward)
            .findFirst().orElseThrow();
    }

    private Is875Jobs() { }
}
