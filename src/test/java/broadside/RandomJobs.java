package broadside;

import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.job.JobText;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;

/** Random valid jobs from a seed, as the text of a job file, with every size in metres. */
final class RandomJobs {

    record Board(double width, double height, double clearance, double offset, double depth, double solidity) { }

    record Wall(double length, double height, double clearance, double solidity, double left, double right, double spacing) { }

    private final Random random;

    RandomJobs(long seed) {
        this.random = new Random(seed);
    }

    double between(double least, double most) {
        return Math.round((least + random.nextDouble() * (most - least)) * 1000) / 1000.0;
    }

    int upTo(int most) {
        return random.nextInt(most + 1);
    }

    boolean chance() {
        return random.nextBoolean();
    }

    Board board(boolean en) {
        return new Board(between(0.3, 12), between(0.3, 4), chance() ? 0 : between(0, 6), between(-2, 2), between(0, 0.4),
            chance() ? 1 : between(en ? 0.8 : 0.701, 1));
    }

    Wall wall(boolean en) {
        double height = between(1, 4);
        double length = between(1.5, 80);
        return new Wall(length, height, chance() ? 0 : between(0, 0.2), chance() ? 1 : between(en ? 0.8 : 0.701, 1),
            chance() ? 0 : between(0, Math.min(length, 2 * height)), chance() ? 0 : between(0, Math.min(length, 2 * height)), between(1, 3.5));
    }

    String terrain(boolean en) {
        return en ? List.of("0", "I", "II", "III", "IV").get(upTo(4)) : List.of("B", "C", "D").get(upTo(2));
    }

    static String sign(List<Board> boards, int posts, double spacing) {
        List<String> texts = new ArrayList<>();
        for (Board b : boards) {
            texts.add(String.format(Locale.ROOT, "{\"width\":\"%s m\",\"height\":\"%s m\",\"clearance\":\"%s m\",\"offset\":\"%s m\",\"depth\":\"%s m\","
                + "\"solidity\":%s}", b.width(), b.height(), b.clearance(), b.offset(), b.depth(), b.solidity()));
        }
        return "{\"mark\":\"X\",\"kind\":\"post-sign\",\"boards\":[" + String.join(",", texts) + "],\"posts\":{\"count\":" + posts
            + (posts > 1 ? ",\"spacing\":\"" + spacing + " m\"" : "") + "}}";
    }

    static String hoarding(Wall w) {
        return String.format(Locale.ROOT, "{\"mark\":\"X\",\"kind\":\"hoarding\",\"length\":\"%s m\",\"height\":\"%s m\",\"clearance\":\"%s m\",\"solidity\":%s,"
            + "\"returns\":{\"left\":\"%s m\",\"right\":\"%s m\"},\"posts\":{\"spacing\":\"%s m\"}}", w.length(), w.height(), w.clearance(), w.solidity(),
            w.left(), w.right(), w.spacing());
    }

    static String job(boolean en, double speed, String terrain, String more, String item) {
        return "{\"broadside\":1,\"basis\":{\"code\":\"" + (en ? "en-1991-1-4\",\"edition\":\"2005" : "asce-7\",\"edition\":\"16") + "\"},\"site\":{\"basic-speed\":\""
            + speed + " m/s\",\"averaging\":\"" + (en ? "10 min mean" : "3 s gust") + "\",\"terrain\":\"" + terrain + "\"" + more + "},\"items\":[" + item + "]}";
    }

    static ItemResult result(String job) {
        Assessment assessment = AllJobs.assess(AllJobs.TOOL.reader().read(JobText.read(job.getBytes(StandardCharsets.UTF_8))).orThrow());
        return assessment.items().get(0);
    }

    /** Without what carries it, which is sized in the units of the job. */
    static ItemResult loadsOnly(String job) {
        return AllJobs.TOOL.assessor().loadsOnly(AllJobs.TOOL.reader().read(JobText.read(job.getBytes(StandardCharsets.UTF_8))).orThrow()).items().get(0);
    }

    static Loads loads(String job) {
        return result(job).loads().orElseThrow(() -> new AssertionError("not covered: " + job));
    }
}
