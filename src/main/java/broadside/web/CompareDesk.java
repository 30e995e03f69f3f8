package broadside.web;

import broadside.assess.Assessment;
import broadside.assess.Assessor;
import broadside.assess.Job;
import broadside.assess.Problem;
import broadside.codes.WindCode;
import broadside.job.JobReader;
import broadside.sheet.Block;
import broadside.sheet.Sheet;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** The page "side by side": one item of a job by every code, with a box for the speed of the place as each code defines it. */
final class CompareDesk {

    private final Pages pages;
    private final Assessor assessor;
    private final JobReader reader;
    private final Documents documents;

    /** The page; {@code speeds} has one line for each code, {@code others} the other items of the job. */
    public record Page(SheetView.Page sheet, String token, int item, List<Speed> speeds, List<SheetView.Change> others, List<String> problems) { }

    /** What was typed for one code. */
    public record Speed(String key, String title, String kind, String speed, String terrain, String classes) { }

    CompareDesk(Pages pages, Assessor assessor, JobReader reader, Documents documents) {
        this.pages = pages;
        this.assessor = assessor;
        this.reader = reader;
        this.documents = documents;
    }

    void show(Context ctx) {
        JsonNode job = Token.read(ctx.queryParam("j"));
        show(ctx, job, job, item(ctx.queryParam("item")), List.of());
    }

    /** The page of a job; what was typed for other codes may not fit and is shown as it is, with what is wrong. */
    private void show(Context ctx, JsonNode node, JsonNode typed, int item, List<String> problems) {
        Job job = reader.read(node).orThrow();
        Sheet sheet = sheet(job, item);
        String token = Token.of(node);
        String here = "item=" + item + "&j=" + token;
        List<SheetView.Download> downloads = List.of(new SheetView.Download("/side-by-side.pdf?paper=a4&" + here, "This page as a PDF on A4 paper"),
            new SheetView.Download("/side-by-side.pdf?paper=letter&" + here, "This page as a PDF on Letter paper"),
            new SheetView.Download("/answer?j=" + token, "Back to the loads by the code of this job"));
        List<SheetView.Change> others = new ArrayList<>();
        for (int i = 0; i < job.items().size(); i++) {
            if (i != item) {
                others.add(new SheetView.Change("/side-by-side?item=" + i + "&j=" + token, job.items().get(i).mark()));
            }
        }
        Page page = new Page(SheetView.of(sheet, "/side-by-side.svg?" + here, List.of(), downloads), token, item, speeds(job, typed), others, problems);
        pages.show(ctx, problems.isEmpty() ? 200 : 422, "compare", new Pages.Frame((problems.isEmpty() ? "" : "Error: ") + sheet.title(), "", pages.frame("").made()), page);
    }

    private Sheet sheet(Job job, int item) {
        if (item >= job.items().size()) {
            throw Refused.notFound();
        }
        Assessment assessment = assessor.assess(job);
        return documents.sideBySide(assessor, assessment, job.items().get(item));
    }

    private List<Speed> speeds(Job job, JsonNode node) {
        List<Speed> speeds = new ArrayList<>();
        for (String key : assessor.codes().editions()) {
            WindCode code = assessor.codes().code(key).orElseThrow();
            if (!key.equals(job.basis().key())) {
                Optional<JsonNode> typed = typed(node, key);
                speeds.add(new Speed(key, code.edition().property("title"), code.terms().averaging().words(), typed.map(t -> t.path("basic-speed").asString("")).orElse(""),
                    typed.map(t -> t.path("terrain").asString("")).orElse(""), code.terms().terrainNames()));
            }
        }
        return speeds;
    }

    private static Optional<JsonNode> typed(JsonNode node, String key) {
        for (JsonNode each : node.path("comparison")) {
            if (key.equals(each.path("code").asString("") + "/" + each.path("edition").asString(""))) {
                return Optional.of(each);
            }
        }
        return Optional.empty();
    }

    /** Takes the speeds that were typed into the job and shows the page again. */
    void type(Context ctx) {
        Map<String, String> form = Sent.form(ctx);
        ObjectNode job = (ObjectNode) Token.read(form.get("j"));
        ArrayNode comparison = job.arrayNode();
        for (String key : assessor.codes().editions()) {
            String speed = form.getOrDefault("speed:" + key, "").strip();
            String terrain = form.getOrDefault("terrain:" + key, "").strip();
            if (!speed.isEmpty() || !terrain.isEmpty()) {
                int slash = key.indexOf('/');
                ObjectNode each = comparison.addObject().put("code", key.substring(0, slash)).put("edition", key.substring(slash + 1));
                put(each, "basic-speed", speed);
                put(each, "terrain", terrain);
            }
        }
        int item = item(form.get("item"));
        JsonNode before = job.deepCopy();
        job.remove("comparison");
        if (!comparison.isEmpty()) {
            job.set("comparison", comparison);
        }
        List<Problem> problems = reader.read(job).problems();
        if (problems.isEmpty()) {
            ctx.redirect("/side-by-side?item=" + item + "&j=" + Token.of(job), HttpStatus.SEE_OTHER);
        } else {
            show(ctx, before, job, item, problems.stream().map(p -> told(p, comparison)).toList());
        }
    }

    /** A problem with the name of its code in place of its path. */
    private String told(Problem problem, ArrayNode comparison) {
        int index = problem.path().startsWith("comparison[") ? Integer.parseInt(problem.path().replaceAll("\\D", "")) : -1;
        String code = index < 0 ? "" : comparison.get(index).path("code").asString("") + "/" + comparison.get(index).path("edition").asString("");
        return assessor.codes().code(code).map(c -> c.edition().property("title") + ": ").orElse("") + problem.text();
    }

    private static void put(ObjectNode node, String name, String text) {
        if (!text.isEmpty()) {
            node.put(name, text);
        }
    }

    void picture(Context ctx) {
        Job job = reader.read(Token.read(ctx.queryParam("j"))).orThrow();
        Block.Picture picture = sheet(job, item(ctx.queryParam("item"))).blocks().stream().filter(Block.Picture.class::isInstance).map(Block.Picture.class::cast)
            .findFirst().orElseThrow(Refused::notFound);
        ctx.contentType("image/svg+xml; charset=utf-8").result(documents.svg(picture.drawing(), picture.caption(), picture.alternative()));
    }

    /** The sheet of the page, for its PDF. */
    Sheet sheet(Context ctx, JsonNode node) {
        return sheet(reader.read(node).orThrow(), item(ctx.queryParam("item")));
    }

    private static int item(String text) {
        if (text == null || text.isEmpty()) {
            return 0;
        }
        if (!text.matches("\\d{1,3}")) {
            throw Refused.notFound();
        }
        return Integer.parseInt(text);
    }
}
