package broadside.web;

import broadside.assess.BadJob;
import broadside.codes.CodeLibrary;
import broadside.job.JobReader;
import broadside.job.JobText;
import broadside.table.Edition;
import broadside.table.TableFiles;
import broadside.web.FormView.Choice;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.ArrayList;
import java.util.List;
import tools.jackson.databind.JsonNode;

/** The start page: what stands in the wind, files opened again, examples. */
final class StartDesk {

    private static final byte[] PDF = {'%', 'P', 'D', 'F', '-'};

    private final Pages pages;
    private final JobReader reader;
    private final Documents documents;
    private final FormDesk forms;
    private final Start start;

    /** What the start page shows; each code stands before its national values. */
    public record Start(List<List<Choice>> codes, List<Kind> kinds, List<Example> examples) { }

    /** A demo job that ships with the tool. */
    public record Example(String href, String title, String what) { }

    StartDesk(Pages pages, CodeLibrary codes, JobReader reader, Documents documents, FormDesk forms) {
        this.pages = pages;
        this.reader = reader;
        this.documents = documents;
        this.forms = forms;
        this.start = new Start(codes(codes), List.of(Kind.values()), examples(codes));
    }

    void show(Context ctx) {
        pages.show(ctx, 200, "start", "What stands in the wind?", start);
    }

    /** Opens a job file or a PDF of this tool. What does not fit is shown on the form, where it can be mended. */
    void open(Context ctx) {
        byte[] bytes = Sent.file(ctx, "file");
        JsonNode job = JobText.read(isPdf(bytes) ? inside(bytes) : bytes);
        JobReader.Result result = reader.read(job);
        if (!Token.fits(job)) {
            throw new Refused(413, "This job is too long for a page", "It is too long to travel in a link. Your file is untouched: assess it with the "
                + "command line, check JOB, or write its PDF with summary JOB -o OUT.pdf.");
        }
        if (result.job().isPresent()) {
            ctx.redirect("/answer?j=" + Token.of(job), HttpStatus.SEE_OTHER);
        } else if (job.path("items").path(0).isObject()) {
            forms.mend(ctx, job, result.problems());
        } else {
            throw new BadJob(result.problems());
        }
    }

    private byte[] inside(byte[] pdf) {
        return documents.jobInPdf(pdf).orElseThrow(() -> new Refused(400, "This PDF holds no job",
            "A PDF that this tool wrote holds its job file, and this one does not. Open the job file itself, or begin a new sheet."));
    }

    private static boolean isPdf(byte[] bytes) {
        return bytes.length > PDF.length && java.util.Arrays.equals(bytes, 0, PDF.length, PDF, 0, PDF.length);
    }

    private static List<List<Choice>> codes(CodeLibrary codes) {
        List<List<Choice>> groups = new ArrayList<>();
        for (String key : codes.editions()) {
            List<Choice> group = new ArrayList<>(List.of(choice(codes, key, "title")));
            codes.overlays(key).forEach(overlay -> group.add(choice(codes, overlay, "short")));
            groups.add(group);
        }
        return groups;
    }

    private static Choice choice(CodeLibrary codes, String key, String name) {
        Edition edition = codes.code(key).orElseThrow().edition();
        return new Choice("code-" + key.replace('/', '-'), key, edition.property(edition.hasProperty(name) ? name : "title"), "", false);
    }

    private static List<Example> examples(CodeLibrary codes) {
        List<Example> examples = new ArrayList<>();
        TableFiles.shipped("examples").forEach((name, bytes) -> {
            if (name.endsWith(".json") && !name.contains("/")) {
                JsonNode job = JobText.read(bytes);
                String key = job.path("basis").path("code").asString("") + "/" + job.path("basis").path("edition").asString("");
                String what = Kind.of(job.path("items").path(0).path("kind").asString("")).map(Kind::plain).orElse("");
                examples.add(new Example("/answer?j=" + Token.of(job), job.path("title").asString(name),
                    what + ", " + codes.code(key).map(c -> c.edition().property("title")).orElse(key)));
            }
        });
        return examples;
    }
}
