package broadside.web;

import broadside.assess.Assessment;
import broadside.assess.Assessor;
import broadside.assess.BadJob;
import broadside.assess.Job;
import broadside.assess.Loads;
import broadside.job.JobReader;
import broadside.job.JobText;
import broadside.panel.Item;
import broadside.quantity.Units;
import broadside.sheet.Block;
import broadside.sheet.Sheet;
import broadside.web.SheetView.Change;
import broadside.web.SheetView.Download;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Semaphore;
import java.util.concurrent.TimeUnit;
import tools.jackson.databind.JsonNode;

/** Shows the answer to the job in a link, and hands out its PDF, its job file and its drawings. */
final class AnswerDesk {

    private static final int PDFS_AT_ONCE = 4;

    private final Pages pages;
    private final Assessor assessor;
    private final JobReader reader;
    private final Documents documents;
    private final FormDesk forms;
    private final CompareDesk compare;
    private final Sketch sketch;
    private final Semaphore writers = new Semaphore(PDFS_AT_ONCE);

    AnswerDesk(Pages pages, Assessor assessor, JobReader reader, Documents documents, FormDesk forms, CompareDesk compare) {
        this.compare = compare;
        this.pages = pages;
        this.assessor = assessor;
        this.reader = reader;
        this.documents = documents;
        this.forms = forms;
        this.sketch = new Sketch(assessor, reader, documents);
    }

    /** The answer page; a job with something that does not fit gets its form. */
    void show(Context ctx) {
        JsonNode job = Token.read(ctx.queryParam("j"));
        try {
            Assessment assessment = assessor.withLimits(assessor.assess(reader.read(job).orThrow()));
            String token = Token.of(job);
            Sheet sheet = documents.sheet(assessment);
            List<Change> changes = changes(assessment.job(), token);
            String title = sheet.title().isBlank() ? "Wind loads" : sheet.title();
            Pages.Frame frame = pages.frame(title);
            pages.show(ctx, 200, "answer", SheetView.cautioned(sheet) ? new Pages.Frame(title, "", frame.made()) : frame,
                SheetView.of(sheet, "/drawing.svg?j=" + token, changes, downloads(token)));
        } catch (BadJob e) {
            forms.mend(ctx, job, e.problems());
        }
    }

    private static List<Change> changes(Job job, String token) {
        List<Change> changes = new ArrayList<>();
        String fill = "/fill?j=" + token;
        changes.add(new Change(fill + "&item=0#place", "where it stands"));
        boolean many = job.items().size() > 1;
        for (int i = 0; i < job.items().size(); i++) {
            String mark = many ? ", " + job.items().get(i).mark() : "";
            changes.add(new Change(fill + "&item=" + i + "#item", "what it is" + mark));
            changes.add(new Change(fill + "&item=" + i + "#support", "what carries it" + mark));
        }
        changes.add(new Change(fill + "&item=0#code", "by which code"));
        changes.add(new Change(fill + "&item=0#paper", "what stands on the paper"));
        return changes;
    }

    private static List<Download> downloads(String token) {
        return List.of(new Download("/summary.pdf?paper=a4&j=" + token, "PDF on A4 paper"),
            new Download("/summary.pdf?paper=letter&j=" + token, "PDF on Letter paper"),
            new Download("/card?j=" + token, "Wind card for the crew"),
            new Download("/job.json?j=" + token, "Job file, to open again"),
            new Download("/side-by-side?j=" + token, "Every code side by side"));
    }

    void pdf(Context ctx) throws InterruptedException {
        JsonNode node = Token.read(ctx.queryParam("j"));
        pdf(ctx, node, documents.sheet(assessor.withLimits(assessor.assess(reader.read(node).orThrow()))), "");
    }

    /** The page "side by side" as a PDF. */
    void comparison(Context ctx) throws InterruptedException {
        JsonNode node = Token.read(ctx.queryParam("j"));
        pdf(ctx, node, compare.sheet(ctx, node), "-side-by-side");
    }

    private void pdf(Context ctx, JsonNode node, Sheet sheet, String suffix) throws InterruptedException {
        String paper = ctx.queryParam("paper") == null ? "a4" : ctx.queryParam("paper");
        if (!paper.equals("a4") && !paper.equals("letter")) {
            throw new Refused(400, "This paper is not known", "The PDF comes on a4 or letter paper.");
        }
        if (!writers.tryAcquire(20, TimeUnit.SECONDS)) {
            throw new Refused(503, "Too many PDFs at once", "Several PDFs are being written. Wait a moment and open the link again.");
        }
        try {
            download(ctx, "application/pdf", name(reader.read(node).orThrow()) + suffix + ".pdf", documents.pdf(sheet, paper, JobText.write(node)));
        } finally {
            writers.release();
        }
    }

    void job(Context ctx) {
        JsonNode node = Token.read(ctx.queryParam("j"));
        download(ctx, "application/json; charset=utf-8", name(reader.read(node).orThrow()) + ".json", JobText.write(node));
    }

    /** One drawing: of a picture of the document, or of an item with or without its forces. */
    void drawing(Context ctx) {
        Job job = reader.read(Token.read(ctx.queryParam("j"))).orThrow();
        String svg = ctx.queryParam("picture") != null ? picture(job, number(ctx.queryParam("picture"))) : item(job, number(ctx.queryParam("item")),
            !"no".equals(ctx.queryParam("loads")));
        ctx.contentType("image/svg+xml; charset=utf-8").result(svg.getBytes(StandardCharsets.UTF_8));
    }

    private String picture(Job job, int wanted) {
        List<Block.Picture> pictures = documents.sheet(assessor.assess(job)).blocks().stream()
            .filter(Block.Picture.class::isInstance).map(Block.Picture.class::cast).toList();
        if (wanted >= pictures.size()) {
            throw Refused.notFound();
        }
        Block.Picture picture = pictures.get(wanted);
        return documents.svg(picture.drawing(), picture.caption(), picture.alternative());
    }

    private String item(Job job, int wanted, boolean withLoads) {
        if (wanted >= job.items().size()) {
            throw Refused.notFound();
        }
        Item item = job.items().get(wanted);
        Optional<Loads> loads = withLoads ? sketch.loads(job, wanted) : Optional.empty();
        Units units = "us".equals(job.head("units").orElse("")) ? Units.US : Units.METRIC;
        return documents.svg(documents.drawing(item, loads, units), "Drawing of " + item.mark(), documents.words(item, loads, units));
    }

    private static int number(String text) {
        if (text == null || !text.matches("\\d{1,3}")) {
            throw Refused.notFound();
        }
        return Integer.parseInt(text);
    }

    private static void download(Context ctx, String type, String name, byte[] bytes) {
        ctx.contentType(type).header("Content-Disposition", "attachment; filename=\"" + name + "\"").result(bytes);
    }

    /** A file name of plain letters from the reference and revision of a job, or from its title. */
    static String name(Job job) {
        String text = job.head("reference").map(r -> r + job.head("revision").map(v -> "-" + v).orElse("")).or(() -> job.head("title")).orElse("");
        String plain = java.text.Normalizer.normalize(text, java.text.Normalizer.Form.NFD).replaceAll("[^A-Za-z0-9_-]+", "-")
            .replaceAll("^-+|-+$", "").toLowerCase(Locale.ROOT);
        String kept = plain.length() > 60 ? plain.substring(0, 60) : plain;
        return kept.isEmpty() ? "wind-loads" : kept;
    }
}
