package broadside.web;

import broadside.codes.CodeLibrary;
import broadside.codes.WindCode;
import broadside.job.Shape;
import broadside.job.Shapes;
import broadside.web.FormView.Bit;
import broadside.web.FormView.Button;
import broadside.web.FormView.Choice;
import broadside.web.FormView.Part;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The order of the questions: five parts, the most asked first, the rarely needed folded under a plain sentence. */
final class FormLayout {

    private static final String SHORT_STAY = "A short stay does not lower the safety that people near it need. The full load counts unless you ask for less here, and whether "
        + "less is allowed is for the authority to say.";

    private final Answers answers;
    private final CodeLibrary codes;
    private final FormProblems problems;
    private final Questions ask;
    private final String item;
    private final Map<String, String> anchors = new LinkedHashMap<>();

    FormLayout(Answers answers, CodeLibrary codes, FormTables tables, FormProblems problems, int item) {
        this.answers = answers;
        this.codes = codes;
        this.problems = problems;
        this.item = "items[" + item + "]";
        this.ask = new Questions(answers, code(), new HeldByChoices(tables.scope(), answers, this.item), tables, problems);
    }

    List<Part> parts() {
        KindQuestions kind = new KindQuestions(answers, ask, anchors, item);
        List<Part> parts = new ArrayList<>();
        parts.add(part("code", "By which code", "The next questions use the words of the code chosen here.", byCode(), "basis"));
        parts.add(part("place", "Where it stands", "", place(), "site"));
        parts.add(part("item", "What it is", "", kind.what(), item));
        parts.add(part("support", "What carries it", "", kind.carries(), item + ".posts"));
        parts.add(part("paper", "For the paper", "", paper(kind.shape()), ""));
        anchors.put("overrides", "code");
        return parts;
    }

    Map<String, String> labels() {
        return ask.labels();
    }

    /** The paths of all questions on the page. */
    Set<String> asked() {
        return ask.labels().keySet();
    }

    /** Where the questions below a path stand on the page. */
    Map<String, String> anchors() {
        return anchors;
    }

    private Optional<WindCode> code() {
        return codes.code(answers.get("basis.code"));
    }

    private Part part(String anchor, String title, String lead, List<Bit> bits, String path) {
        anchors.put(path, anchor);
        return new Part(anchor, title, lead, bits);
    }

    private List<Bit> byCode() {
        Shape shape = ask.shape(Shapes.JOB, "basis");
        List<Choice> choices = new ArrayList<>();
        for (String key : codes.editions()) {
            choices.add(choice(key));
            codes.overlays(key).forEach(overlay -> choices.add(choice(overlay)));
        }
        List<Bit> bits = new ArrayList<>();
        bits.add(ask.choose("basis.code", "The wind code that counts at this place", "The local building authority says which one it is", choices));
        bits.add(Bit.buttons(List.of(new Button("code", "Show the questions of this code", "place"))));
        List<Bit> own = new ArrayList<>();
        for (int i = 0; i < answers.size("overrides"); i++) {
            String path = "overrides[" + i + "]";
            own.add(Bit.entry("Own factor " + (i + 1), path, Bit.rows(ask.ask(ask.shape(Shapes.JOB, "overrides"), path, "name", "value", "reason")),
                List.of(new Button("drop-factor:" + i, "Take own factor " + (i + 1) + " away", "code"))));
        }
        own.add(Bit.buttons(List.of(new Button("add-factor", "Add a factor of my own", "overrides[" + answers.size("overrides") + "]"))));
        bits.add(Bit.fold("My own factors", "own-factors", answers.size("overrides") > 0 || problems.any("overrides"), own));
        List<Bit> rest = ask.rest(shape, "basis", Set.of("code", "edition", "overlay"));
        if (!rest.isEmpty()) {
            bits.add(Bit.fold("Further answers", "basis-further", rest.stream().anyMatch(Bit::typed), rest));
        }
        return bits;
    }

    private Choice choice(String key) {
        return new Choice("basis.code-" + key, key, codes.code(key).orElseThrow().edition().property("title"), "", answers.get("basis.code").equals(key));
    }

    private List<Bit> place() {
        Shape site = ask.shape(Shapes.JOB, "site");
        Shape slope = ask.shape(site, "topography");
        List<Bit> bits = new ArrayList<>(ask.ask(site, "site", "name"));
        bits.add(Bit.row(ask.ask(site, "site", "basic-speed", "averaging")));
        String[] inPlace = SiteFields.IN_PLACE_OF_SPEED.stream().filter(ask::takes).toArray(String[]::new);
        bits.addAll(Bit.rows(ask.ask(site, "site", inPlace)));
        if (ask.takes("risk-category")) {
            bits.addAll(ask.ask(site, "site", "risk-category"));
        }
        bits.addAll(ask.ask(site, "site", "terrain", "terrain-reason", "altitude", "ground-nearby"));
        bits.add(Bit.fold("Sizes of the hill or slope", "site.topography", answers.get("site.ground-nearby").equals("hill") || problems.any("site.topography"),
            Bit.rows(ask.rest(slope, "site.topography", Set.of()))));
        anchors.put("site.topography", "site.topography");
        bits.add(ask.fold("The wind is asked for with another return period", site, "site", "return-period"));
        bits.add(ask.fold("The authority asks for a least pressure", site, "site", "authority-minimum-pressure", "authority-minimum-level"));
        bits.add(shortStay(site));
        List<Bit> more = Bit.rows(ask.rest(site, "site", SiteFields.foreign(code())));
        if (!more.isEmpty()) {
            bits.add(Bit.fold("Factors that this code lets you set", "site.factors", more.stream().anyMatch(Bit::typed), more));
        }
        return bits;
    }

    private Bit shortStay(Shape site) {
        List<Bit> inside = new ArrayList<>(List.of(Bit.words(SHORT_STAY)));
        inside.addAll(ask.ask(site, "site", "stands-for"));
        for (String name : List.of("duration-rule", "season")) {
            if (ask.takes(name)) {
                inside.addAll(ask.ask(site, "site", name));
            }
        }
        return Bit.fold("It stands for less than a year", "site.stands-for-fold", ask.open("site", "stands-for", "duration-rule", "season"), inside);
    }

    private List<Bit> paper(Shape shape) {
        List<Bit> inside = new ArrayList<>(Bit.rows(ask.rest(Shapes.JOB, "", Set.of("broadside", "units"))));
        inside.addAll(Bit.rows(ask.rest(shape, item, Set.of("kind", "shelter-factor"))));
        return List.of(Bit.fold("Names, numbers and dates that stand on the paper", "paper-fields", inside.stream().anyMatch(Bit::typed), inside));
    }
}
