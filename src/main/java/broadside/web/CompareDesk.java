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
    public record Page(SheetView.Page sheet, String token, int item, List<Speed> speeds, List<SheetView.Change> others, List<FormView.Line> problems) { }

    /** What was typed for one code. */
    public record Speed(String key, String title, Box speed, Box terrain, String kind, String classes) { }

    /** One box; {@code problem} is empty when it is in order. */
    public record Box(String id, String typed, String problem) {

        /** The ids that describe the box. */
        public String describedBy() {
            return id + "-hint" + (problem.isEmpty() ? "" : " " + id + "-problem");
        }
    }

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
    private void show(Context ctx, JsonNode node, JsonNode typed, int item, List<Problem> problems) {
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
        Page page = new Page(SheetView.of(sheet, "/side-by-side.svg?" + here, List.of(), downloads), token, item, speeds(job, typed, problems), others,
            problems.stream().map(p -> line(p, typed)).toList());
        pages.show(ctx, problems.isEmpty() ? 200 : 422, "compare", new Pages.Frame((problems.isEmpty() ? "" : "Error: ") + sheet.title(), "", pages.frame("").made()), page);
    }

    private Sheet sheet(Job job, int item) {
        if (item >= job.items().size()) {
            throw Refused.notFound();
        }
        Assessment assessment = assessor.assess(job);
        return documents.sideBySide(assessor, assessment, job.items().get(item));
    }

    private List<Speed> speeds(Job job, JsonNode node, List<Problem> problems) {
        List<Speed> speeds = new ArrayList<>();
        for (String key : assessor.codes().editions()) {
            WindCode code = assessor.codes().code(key).orElseThrow();
            if (!key.equals(job.basis().key())) {
                speeds.add(new Speed(key, code.edition().property("title"), box("basic-speed", key, node, problems), box("terrain", key, node, problems),
                    code.terms().averaging().words(), code.terms().terrainNames()));
            }
        }
        return speeds;
    }

    private Box box(String name, String key, JsonNode node, List<Problem> problems) {
        JsonNode all = node.path("comparison");
        for (int i = 0; i < all.size(); i++) {
            if (key.equals(key(all.path(i)))) {
                String path = "comparison[" + i + "]." + name;
                String problem = problems.stream().filter(p -> p.path().equals(path)).findFirst().map(Problem::text).orElse("");
                return new Box(id(name, key), all.path(i).path(name).asString(""), problem);
            }
        }
        return new Box(id(name, key), "", "");
    }

    private static String key(JsonNode compared) {
        return compared.path("code").asString("") + "/" + compared.path("edition").asString("");
    }

    private static String id(String name, String key) {
        return name + "-" + key.replace('/', '-');
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
            show(ctx, before, job, item, problems.stream().map(p -> told(p, job)).toList());
        }
    }

    /** A problem in which the code has its short name. */
    private Problem told(Problem problem, JsonNode job) {
        return CodeName.told(problem, compared(problem, job).flatMap(node -> assessor.codes().code(key(node))));
    }

    /** A line of the list on top, with the name of its code, and leading to the box. */
    private FormView.Line line(Problem problem, JsonNode job) {
        Optional<JsonNode> node = compared(problem, job);
        String name = problem.path().substring(problem.path().lastIndexOf('.') + 1);
        String target = node.filter(n -> n.has(name)).map(n -> id(name, key(n))).orElse("");
        return new FormView.Line(target, node.flatMap(n -> assessor.codes().code(key(n))).map(c -> CodeName.of(c) + ": ").orElse("") + problem.text());
    }

    private static Optional<JsonNode> compared(Problem problem, JsonNode job) {
        java.util.regex.Matcher found = java.util.regex.Pattern.compile("^comparison\\[(\\d{1,3})\\].*").matcher(problem.path());
        return found.matches() ? Optional.of(job.path("comparison").path(Integer.parseInt(found.group(1)))) : Optional.empty();
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
