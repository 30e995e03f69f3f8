package broadside.web;

import broadside.codes.CodeLibrary;
import broadside.codes.WindCode;
import broadside.job.Field;
import broadside.job.Shape;
import broadside.job.Shapes;
import broadside.web.FormView.Bit;
import broadside.web.FormView.Button;
import broadside.web.FormView.Choice;
import broadside.web.FormView.Part;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The order of the questions: five parts, the most asked first, the rarely needed folded under a plain sentence. */
final class FormLayout {

    private static final Map<String, String> SENTENCES = Map.of(
        "footing", "It stands in the ground like this",
        "replaces", "It takes the place of an older board on the same post",
        "ballast", "It is held by braces with ballast");

    private final Answers answers;
    private final CodeLibrary codes;
    private final FormReader reader;
    private final FormProblems problems;
    private final Questions ask;
    private final String item;
    private final Map<String, String> anchors = new LinkedHashMap<>();

    FormLayout(Answers answers, CodeLibrary codes, FormProblems problems, int item) {
        this.answers = answers;
        this.codes = codes;
        this.reader = new FormReader(codes);
        this.problems = problems;
        this.ask = new Questions(answers, code(), problems);
        this.item = "items[" + item + "]";
    }

    List<Part> parts() {
        boolean hoarding = answers.get(item + ".kind").equals("hoarding");
        Shape shape = hoarding ? Shapes.KINDS.get("hoarding") : Shapes.KINDS.get("post-sign");
        List<Part> parts = new ArrayList<>();
        parts.add(part("code", "By which code", "The next questions use the words of the code chosen here.", byCode(), "basis"));
        parts.add(part("place", "Where it stands", "", place(), "site"));
        List<Bit> what = hoarding ? hoarding(shape) : sign(shape);
        List<Bit> carries = carries(shape);
        parts.add(part("item", "What it is", "", what, item));
        parts.add(part("support", "What carries it", "", carries, item + ".posts"));
        parts.add(part("paper", "For the paper", "", paper(shape), ""));
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
        Shape shape = shape(Shapes.JOB, "basis");
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
            own.add(Bit.entry("Own factor " + (i + 1), path, rows(ask.ask(shape(Shapes.JOB, "overrides"), path, "name", "value", "reason")),
                List.of(new Button("drop-factor:" + i, "Take own factor " + (i + 1) + " away", "code"))));
        }
        own.add(Bit.buttons(List.of(new Button("add-factor", "Add a factor of my own", "overrides[" + answers.size("overrides") + "]"))));
        bits.add(Bit.fold("My own factors", "own-factors", answers.size("overrides") > 0 || problems.any("overrides"), own));
        others(bits, ask.rest(shape, "basis", Set.of("code", "edition", "overlay")), "basis");
        return bits;
    }

    private Choice choice(String key) {
        return new Choice("basis.code-" + key, key, codes.code(key).orElseThrow().edition().property("title"), "", answers.get("basis.code").equals(key));
    }

    private List<Bit> place() {
        Shape site = shape(Shapes.JOB, "site");
        Shape slope = shape(site, "topography");
        Set<String> foreign = reader.foreign(code());
        List<Bit> bits = new ArrayList<>(ask.ask(site, "site", "name"));
        bits.add(Bit.row(ask.ask(site, "site", "basic-speed", "averaging")));
        if (!foreign.contains("risk-category")) {
            bits.addAll(ask.ask(site, "site", "risk-category"));
        }
        bits.addAll(ask.ask(site, "site", "terrain", "terrain-reason", "altitude"));
        bits.add(Bit.fold("The ground is not flat", "site.topography", ask.open("site.topography"), rows(ask.rest(slope, "site.topography", Set.of()))));
        bits.add(fold("The wind is asked for with another return period", site, "site", "return-period"));
        bits.add(fold("The authority asks for a least pressure", site, "site", "authority-minimum-pressure", "authority-minimum-level"));
        List<Bit> more = rows(ask.rest(site, "site", foreign));
        if (!more.isEmpty()) {
            bits.add(Bit.fold("Factors that this code lets you set", "site.factors", more.stream().anyMatch(this::holds), more));
        }
        return bits;
    }

    private List<Bit> sign(Shape shape) {
        Shape board = shape(shape, "boards");
        String list = item + ".boards";
        int size = Math.max(1, answers.size(list));
        List<Bit> bits = new ArrayList<>(ask.ask(shape, item, "mark"));
        for (int i = 0; i < size; i++) {
            String path = list + "[" + i + "]";
            List<Bit> inside = new ArrayList<>(ask.ask(board, path, size > 1 ? new String[] {"mark"} : new String[0]));
            inside.addAll(rows(ask.ask(board, path, "width", "height", "clearance", "shape", "depth", "mass")));
            inside.add(fold("It hangs to one side of the posts", board, path, "offset"));
            inside.add(fold("Part of it is open", board, path, "solidity"));
            others(inside, ask.rest(board, path, size > 1 ? Set.of() : Set.of("mark")), path);
            bits.add(Bit.entry(size > 1 ? "Board " + (i + 1) : "The board", path, inside, size == 1 ? List.of()
                : List.of(new Button("drop-board:" + i, "Take board " + (i + 1) + " away", "item"))));
            anchors.put(path, path);
        }
        bits.add(Bit.buttons(List.of(new Button("add-board", "Add a board on the same posts", list + "[" + size + "]"))));
        anchors.put(list, list + "[0]");
        bits.add(fold("It is read from both sides, or part of it is open", shape, item, "faces", "solidity-by"));
        return bits;
    }

    private List<Bit> hoarding(Shape shape) {
        Shape gate = shape(shape, "gates");
        String list = item + ".gates";
        List<Bit> bits = new ArrayList<>(ask.ask(shape, item, "mark"));
        bits.addAll(rows(ask.ask(shape, item, "length", "height", "clearance")));
        bits.add(Bit.fold("It turns a corner at an end", item + ".returns", ask.open(item + ".returns"),
            rows(ask.rest(shape(shape, "returns"), item + ".returns", Set.of()))));
        List<Bit> gates = new ArrayList<>();
        for (int i = 0; i < answers.size(list); i++) {
            gates.add(Bit.entry("Gate " + (i + 1), list + "[" + i + "]", rows(ask.ask(gate, list + "[" + i + "]", "from", "width")),
                List.of(new Button("drop-gate:" + i, "Take gate " + (i + 1) + " away", "item"))));
        }
        gates.add(Bit.buttons(List.of(new Button("add-gate", "Add a gate", list + "[" + answers.size(list) + "]"))));
        bits.add(Bit.fold("It has a gate", list, answers.size(list) > 0 || problems.any(list), gates));
        anchors.put(list, list);
        bits.add(fold("Part of it is open", shape, item, "solidity", "solidity-by"));
        return bits;
    }

    /** Posts first, then every other part that the item can have, each folded under its sentence. */
    private List<Bit> carries(Shape shape) {
        List<Bit> bits = new ArrayList<>(rows(ask.rest(shape(shape, "posts"), item + ".posts", Set.of())));
        for (Field field : shape.fields()) {
            if (field.holds() == Field.Holds.OBJECT && !Set.of("posts", "returns").contains(field.name())) {
                bits.add(below(SENTENCES.getOrDefault(field.name(), capital(field.meaning())), shape, field.name()));
            }
        }
        return bits;
    }

    private static String capital(String text) {
        return text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }

    private List<Bit> paper(Shape shape) {
        List<Bit> inside = new ArrayList<>(rows(ask.rest(Shapes.JOB, "", Set.of("broadside", "units"))));
        inside.addAll(rows(ask.rest(shape, item, Set.of("kind"))));
        return List.of(Bit.fold("Names, numbers and dates that stand on the paper", "paper-fields", inside.stream().anyMatch(this::holds), inside));
    }

    private Bit below(String sentence, Shape shape, String name) {
        String path = item + "." + name;
        anchors.put(path, path);
        return Bit.fold(sentence, path, ask.open(path), rows(ask.rest(shape(shape, name), path, Set.of())));
    }

    private Bit fold(String sentence, Shape shape, String path, String... names) {
        return Bit.fold(sentence, path + "." + names[0] + "-fold", ask.open(path, names), ask.ask(shape, path, names));
    }

    private void others(List<Bit> bits, List<Bit> rest, String path) {
        if (!rest.isEmpty()) {
            bits.add(Bit.fold("Further answers", path + "-further", rest.stream().anyMatch(this::holds), rest));
        }
    }

    private boolean holds(Bit bit) {
        boolean own = bit.input() != null && (!bit.input().typed().isBlank() || bit.input().wrong());
        return own || bit.bits().stream().anyMatch(this::holds);
    }

    /** Short questions stand side by side where there is room. */
    private static List<Bit> rows(List<Bit> bits) {
        List<Bit> rows = new ArrayList<>();
        List<Bit> row = new ArrayList<>();
        for (Bit bit : bits) {
            if (bit.kind().equals("radio")) {
                flush(rows, row);
                rows.add(bit);
            } else {
                row.add(bit);
            }
        }
        flush(rows, row);
        return rows;
    }

    private static void flush(List<Bit> rows, List<Bit> row) {
        if (!row.isEmpty()) {
            rows.add(Bit.row(List.copyOf(row)));
            row.clear();
        }
    }

    private static Shape shape(Shape shape, String field) {
        return shape.field(field).flatMap(f -> f.shape()).orElseThrow();
    }
}
