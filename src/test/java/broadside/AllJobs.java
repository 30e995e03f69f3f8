package broadside;

import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.cli.Tool;
import broadside.job.JobText;
import broadside.table.TableFiles;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tools.jackson.databind.JsonNode;

/** Every job that ships with the tool, demo jobs and published checks alike, assessed once. */
final class AllJobs {

    static final Tool TOOL = Tool.of(Optional.empty());

    private static final List<ItemResult> RESULTS = assessAll();

    static List<ItemResult> results() {
        return RESULTS;
    }

    static Map<String, byte[]> files() {
        return TableFiles.shipped("examples");
    }

    /** A demo job by its file name. */
    static Job demo(String name) {
        return TOOL.reader().read(files().get(name));
    }

    static Assessment assess(Job job) {
        return TOOL.assessor().assess(job);
    }

    private static List<ItemResult> assessAll() {
        List<ItemResult> results = new ArrayList<>();
        files().forEach((name, bytes) -> {
            if (!name.endsWith(".json")) {
                return;
            }
            JsonNode node = JobText.read(bytes);
            JsonNode job = node.has("given") ? node.get("given") : node;
            if (!job.has("part")) {
                results.addAll(assess(TOOL.reader().read(job).orThrow()).items());
            }
        });
        return List.copyOf(results);
    }

    private AllJobs() { }
}
