package broadside.web;

import broadside.assess.Assessor;
import broadside.assess.BadJob;
import broadside.assess.Problem;
import broadside.job.JobReader;
import broadside.job.Shapes;
import broadside.quantity.Units;
import broadside.web.FormView.Button;
import broadside.web.FormView.Hidden;
import broadside.web.FormView.ItemLink;
import broadside.web.FormView.Page;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** The sheet to fill in: shows it, changes it, and hands a job that fits on to its answer. */
final class FormDesk {

    private static final String TOO_LONG = "This job is too long to travel in a link. Nothing is lost: all answers are still on this page. "
        + "Take items out here, or assess the job file with the command line: check JOB, or summary JOB -o OUT.pdf";

    private final Pages pages;
    private final Assessor assessor;
    private final JobReader reader;
    private final FormReader forms;
    private final Sketch sketch;
    private final FormTables tables;

    FormDesk(Pages pages, Assessor assessor, JobReader reader, Documents documents, FormTables tables) {
        this.tables = tables;
        this.pages = pages;
        this.assessor = assessor;
        this.reader = reader;
        this.forms = new FormReader(assessor.codes());
        this.sketch = new Sketch(assessor, reader, documents);
    }

    /** A blank sheet, or the sheet of the job in a link. */
    void open(Context ctx) {
        if (ctx.queryParam("j") != null) {
            String item = ctx.queryParamMap().containsKey("item") ? ctx.queryParam("item") : "0";
            if (!item.matches("\\d{1,3}")) {
                throw Refused.badLink("It names no item.");
            }
            show(ctx, 200, Draft.of(Token.read(ctx.queryParam("j")), Integer.parseInt(item)), List.of(), "");
            return;
        }
        if (ctx.queryParam("d") != null) {
            showDraft(ctx, Draft.of(Token.read(ctx.queryParam("d"))), ctx.queryParam("check") != null);
            return;
        }
        String code = ctx.queryParam("code") == null ? "" : ctx.queryParam("code");
        String known = assessor.codes().code(code).isPresent() ? code : "";
        show(ctx, 200, Draft.blank(String.valueOf(ctx.queryParam("kind")), String.valueOf(ctx.queryParam("units")), known), List.of(), "");
    }

    private void showDraft(Context ctx, Draft draft, boolean check) {
        List<Problem> problems = check ? problems(draft) : List.of();
        show(ctx, problems.isEmpty() ? 200 : 422, draft, problems, check && problems.isEmpty() ? "All answers can be read now." : "");
    }

    /** Sends the browser on to an address that holds the answers as typed, so that its back button and a reload lose nothing. */
    private void goTo(Context ctx, Draft draft, boolean check) {
        JsonNode answers = draft.json();
        if (Token.fits(answers)) {
            ctx.redirect("/fill?d=" + Token.of(answers) + (check ? "&check=1" : ""), HttpStatus.SEE_OTHER);
        } else {
            showDraft(ctx, draft, check);
        }
    }

    /** The sheet of a job that does not fit, with what does not fit. */
    void mend(Context ctx, JsonNode job, List<Problem> problems) {
        for (JsonNode item : job.path("items")) {
            if (!Draft.known(item)) {
                throw new BadJob(problems);
            }
        }
        show(ctx, 422, Draft.of(job, item(problems, job)), problems, "");
    }

    /** The item that the first problem is about. */
    private static int item(List<Problem> problems, JsonNode job) {
        for (Problem problem : problems) {
            java.util.regex.Matcher found = java.util.regex.Pattern.compile("^items\\[(\\d{1,3})\\].*").matcher(problem.path());
            if (found.matches() && Integer.parseInt(found.group(1)) < job.path("items").size()) {
                return Integer.parseInt(found.group(1));
            }
        }
        return 0;
    }

    void send(Context ctx) {
        Map<String, String> form = Sent.form(ctx);
        String todo = form.getOrDefault("do", "assess");
        form.remove("do");
        Draft draft = Draft.sent(form);
        draft.followCode();
        String[] words = todo.split(":", 2);
        String with = words.length > 1 ? words[1] : "";
        switch (words[0]) {
            case "assess" -> assess(ctx, draft);
            case "item", "add-item", "drop-item" -> showOther(ctx, draft, words[0], with);
            case "set" -> {
                int equals = with.indexOf('=');
                draft.take(with.substring(0, Math.max(0, equals)), with.substring(equals + 1));
                goTo(ctx, draft, true);
            }
            default -> {
                change(draft, words[0], with);
                goTo(ctx, draft, false);
            }
        }
    }

    private static void change(Draft draft, String todo, String with) {
        Answers answers = draft.answers();
        int index = with.matches("\\d{1,3}") ? Integer.parseInt(with) : 999;
        String boards = draft.path() + ".boards";
        String gates = draft.path() + ".gates";
        String blocks = draft.path() + ".blocks";
        switch (todo) {
            case "units" -> draft.changeUnits(with);
            case "add-board" -> answers.set(boards + "[" + Math.max(1, answers.size(boards)) + "].width", "");
            case "drop-board" -> answers.drop(boards, index);
            case "add-gate" -> answers.set(gates + "[" + answers.size(gates) + "].from", "");
            case "drop-gate" -> answers.drop(gates, index);
            case "add-block" -> answers.set(blocks + "[" + answers.size(blocks) + "].mass", "");
            case "drop-block" -> answers.drop(blocks, index);
            case "add-factor" -> answers.set("overrides[" + answers.size("overrides") + "].name", "");
            case "drop-factor" -> answers.drop("overrides", index);
            default -> { }
        }
    }

    private void showOther(Context ctx, Draft draft, String todo, String with) {
        ObjectNode job = forms.read(draft.answers(), draft.items(), draft.index()).job();
        if (Token.fits(job)) {
            goTo(ctx, otherItem(job, draft, todo, with), false);
        } else {
            show(ctx, 422, draft, List.of(new Problem("", TOO_LONG)), "");
        }
    }

    private static Draft otherItem(ObjectNode job, Draft draft, String todo, String with) {
        ArrayNode items = (ArrayNode) job.get("items");
        int next = with.matches("\\d{1,3}") ? Math.min(Integer.parseInt(with), items.size() - 1) : 0;
        if (todo.equals("drop-item") && items.size() > 1) {
            items.remove(draft.index());
            next = Math.max(0, draft.index() - 1);
        } else if (todo.equals("add-item") && Shapes.KINDS.containsKey(with)) {
            next = items.size();
            items.addObject().put("kind", with).put("mark", Kind.of(with).orElseThrow().mark(next + 1));
        }
        return Draft.of(job, next);
    }

    private void assess(Context ctx, Draft draft) {
        draft.answers().dropBlank(draft.path() + ".gates");
        draft.answers().dropBlank(draft.path() + ".blocks");
        draft.answers().dropBlank("overrides");
        List<Problem> problems = problems(draft);
        if (!problems.isEmpty()) {
            goTo(ctx, draft, true);
            return;
        }
        ObjectNode job = forms.read(draft.answers(), draft.items(), draft.index()).job();
        if (!Token.fits(job)) {
            show(ctx, 422, draft, List.of(new Problem("", TOO_LONG)), "");
            return;
        }
        ctx.redirect("/answer?j=" + Token.of(job), HttpStatus.SEE_OTHER);
    }

    /** All that does not fit: on the form, in the job, and in the values that the user set. */
    private List<Problem> problems(Draft draft) {
        FormReader.Made made = forms.read(draft.answers(), draft.items(), draft.index());
        JobReader.Result result = reader.read(made.job());
        List<Problem> problems = new ArrayList<>(made.problems());
        problems.addAll(result.problems());
        if (problems.isEmpty()) {
            try {
                assessor.assess(result.orThrow());
            } catch (BadJob e) {
                problems.addAll(e.problems());
            }
        }
        return problems;
    }

    /** The drawing and the readings for a form that is being typed. */
    void redraw(Context ctx) {
        Draft draft = Draft.sent(Sent.form(ctx));
        draft.followCode();
        ctx.contentType("application/json; charset=utf-8").result(sketch.json(draft, forms.read(draft.answers(), draft.items(), draft.index()).job()));
    }

    private void show(Context ctx, int status, Draft draft, List<Problem> problems, String note) {
        FormProblems listed = new FormProblems(problems.stream().map(p -> CodeName.told(p, assessor.codes().code(draft.answers().get("basis.code")))).toList());
        FormLayout layout = new FormLayout(draft.answers(), assessor.codes(), tables, listed, draft.index());
        List<FormView.Part> parts = layout.parts();
        JsonNode job = forms.read(draft.answers(), draft.items(), draft.index()).job();
        String mark = draft.answers().get(draft.path() + ".mark");
        String heading = Kind.of(draft.answers().get(draft.path() + ".kind")).orElse(Kind.POST_SIGN).words() + (mark.isBlank() ? "" : ", " + mark);
        Page page = new Page(heading, listed.lines(layout.labels(), layout.anchors(), draft.path()), parts, sketch.picture(draft, job), units(draft),
            items(job, draft.index()), Arrays.stream(Kind.values()).map(k -> new Button("add-item:" + k.key(), k.add(), "")).toList(),
            hidden(draft, layout.asked()), note);
        pages.show(ctx, status, "form", (listed.isEmpty() ? "" : "Error: ") + heading, page);
    }

    private static FormView.Units units(Draft draft) {
        boolean us = FormReader.units(draft.answers()) == Units.US;
        return new FormView.Units(us ? "feet and inches, mph and lb, and inches for a thickness or the gap to a wall" : "metres, m/s and kg, and mm for a thickness or the gap to a wall",
            us ? new Button("units:metric", "Change to metres", "") : new Button("units:us", "Change to feet and inches", ""));
    }

    private static List<ItemLink> items(JsonNode job, int index) {
        List<ItemLink> links = new ArrayList<>();
        for (int i = 0; i < job.path("items").size(); i++) {
            String mark = job.path("items").path(i).path("mark").isString() ? job.path("items").path(i).path("mark").stringValue() : "item " + (i + 1);
            links.add(new ItemLink(mark, i == index, new Button("item:" + i, "Change " + mark, "item")));
        }
        return links;
    }

    /** Everything that is known of the job and not asked on this page travels along unseen. */
    private static List<Hidden> hidden(Draft draft, Set<String> asked) {
        List<Hidden> hidden = new ArrayList<>();
        draft.answers().all().forEach((path, text) -> {
            if (!asked.contains(path) && !text.isEmpty()) {
                hidden.add(new Hidden(path, text));
            }
        });
        hidden.add(new Hidden("drawn-for", draft.answers().get("basis.code")));
        hidden.add(new Hidden("item", Integer.toString(draft.index())));
        hidden.add(new Hidden("kept", Token.of(draft.items())));
        return hidden;
    }
}
