package broadside.web;

import broadside.job.Field;
import broadside.job.Shape;
import broadside.job.Shapes;
import broadside.web.FormView.Bit;
import broadside.web.FormView.Button;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/** What is asked about one item: what it is and what carries it, in the order of each kind. */
final class KindQuestions {

    /** Parts of what carries an item, each folded under its sentence. */
    private static final Map<String, String> SENTENCES = Map.of(
        "footing", "It stands in the ground like this",
        "replaces", "It takes the place of an older board on the same post",
        "ballast", "It is held by braces with ballast",
        "brace", "Each panel has a brace behind it",
        "fixings", "It is fixed in a grid like this");

    /** Objects that are asked elsewhere or never folded. */
    private static final Set<String> PLAIN = Set.of("posts", "returns", "brackets", "building");

    private final Answers answers;
    private final Questions ask;
    private final Map<String, String> anchors;
    private final String item;
    private final Kind kind;
    private final Shape shape;

    KindQuestions(Answers answers, Questions ask, Map<String, String> anchors, String item) {
        this.answers = answers;
        this.ask = ask;
        this.anchors = anchors;
        this.item = item;
        this.kind = Kind.of(answers.get(item + ".kind")).orElse(Kind.POST_SIGN);
        this.shape = Shapes.KINDS.get(kind.key());
    }

    Shape shape() {
        return shape;
    }

    List<Bit> what() {
        List<Bit> bits = new ArrayList<>(ask.ask(shape, item, "mark"));
        switch (kind) {
            case POST_SIGN -> boards(bits);
            case HOARDING -> hoarding(bits);
            case BANNER_FENCE -> fence(bits);
            case FACADE_PANEL -> facade(bits);
            case PROJECTING_SIGN -> bits.addAll(Bit.rows(ask.ask(shape, item, "projection", "height", "bottom", "gap", "depth", "mass")));
            case SPANNED_BANNER -> {
                bits.addAll(Bit.rows(ask.ask(shape, item, "width", "height", "bottom", "sag")));
                bits.add(ask.fold("Part of it is open", shape, item, "solidity", "solidity-by"));
            }
        }
        return bits;
    }

    private void boards(List<Bit> bits) {
        Shape board = ask.shape(shape, "boards");
        String list = item + ".boards";
        int size = Math.max(1, answers.size(list));
        for (int i = 0; i < size; i++) {
            String path = list + "[" + i + "]";
            List<Bit> inside = new ArrayList<>(ask.ask(board, path, size > 1 ? new String[] {"mark"} : new String[0]));
            inside.addAll(Bit.rows(ask.ask(board, path, "width", "height", "clearance", "shape", "depth", "mass")));
            inside.add(ask.fold("It hangs to one side of the posts", board, path, "offset"));
            inside.add(ask.fold("Part of it is open", board, path, "solidity"));
            others(inside, ask.rest(board, path, size > 1 ? Set.of() : Set.of("mark")), path);
            bits.add(Bit.entry(size > 1 ? "Board " + (i + 1) : "The board", path, inside, size == 1 ? List.of()
                : List.of(new Button("drop-board:" + i, "Take board " + (i + 1) + " away", "item"))));
            anchors.put(path, path);
        }
        bits.add(Bit.buttons(List.of(new Button("add-board", "Add a board on the same posts", list + "[" + size + "]"))));
        anchors.put(list, list + "[0]");
        bits.add(ask.fold("It is read from both sides, or part of it is open", shape, item, "faces", "opening-angle", "solidity-by"));
    }

    private void hoarding(List<Bit> bits) {
        bits.addAll(Bit.rows(ask.ask(shape, item, "length", "height", "clearance")));
        bits.add(Bit.fold("It turns a corner at an end", item + ".returns", ask.open(item + ".returns"),
            Bit.rows(ask.rest(ask.shape(shape, "returns"), item + ".returns", Set.of()))));
        bits.add(entries("It has a gate", "gate", "Gate ", "Add a gate", "item"));
        bits.add(ask.fold("Part of it is open", shape, item, "solidity", "solidity-by"));
        shelter(bits);
    }

    private void fence(List<Bit> bits) {
        bits.addAll(Bit.rows(ask.ask(shape, item, "panel-length", "panel-height", "panels", "cover-solidity")));
        bits.add(ask.fold("What is left once the cover is down, and who gave these figures", shape, item, "fence-solidity", "solidity-by"));
        shelter(bits);
    }

    /** Only some codes have a rule for a wall or fence in front. */
    private void shelter(List<Bit> bits) {
        if (ask.takes("shelter-factor") || ask.open(item + ".shelter-factor")) {
            bits.add(ask.fold("A wall or fence that will stay stands in front of it", shape, item, "shelter-factor"));
        }
    }

    private void facade(List<Bit> bits) {
        bits.addAll(ask.ask(shape, item, "backing"));
        bits.addAll(Bit.rows(ask.ask(shape, item, "width", "height", "bottom", "distance-from-corner")));
        Shape building = ask.shape(shape, "building");
        String path = item + ".building";
        List<Bit> inside = new ArrayList<>(Bit.rows(ask.ask(building, path, "width", "depth", "height")));
        inside.add(ask.fold("Its roof slopes", building, path, "roof-slope"));
        inside.add(ask.fold("Its walls have large openings", building, path, "enclosure"));
        bits.add(Bit.entry("The building", path, inside, List.of()));
        anchors.put(path, path);
        bits.add(ask.fold("It stands off the wall, or it is thick", shape, item, "gap", "depth"));
    }

    /** What it is fixed to comes first, and has to be answered; then its posts, feet or brackets, and every other part folded under its sentence. */
    List<Bit> carries() {
        List<Bit> bits = new ArrayList<>(ask.ask(shape, item, "held-by", "fixed-to"));
        switch (kind) {
            case POST_SIGN -> {
                Shape posts = ask.shape(shape, "posts");
                bits.addAll(Bit.rows(ask.ask(posts, item + ".posts", "count", "spacing", "section", "grade")));
                bits.add(choice(posts));
                bits.add(Bit.fold("The section has no name: its outline and sizes", item + ".posts-outline", ask.open(item + ".posts", "shape", "width", "depth"),
                    Bit.rows(ask.ask(posts, item + ".posts", "shape", "width", "depth"))));
            }
            case HOARDING -> {
                Shape posts = ask.shape(shape, "posts");
                bits.addAll(Bit.rows(ask.ask(posts, item + ".posts", "spacing", "section", "grade")));
                bits.add(choice(posts));
            }
            case BANNER_FENCE -> {
                bits.addAll(Bit.rows(ask.ask(shape, item, "foot-length", "foot-mass", "panel-mass")));
                bits.add(entries("Blocks weigh it down", "block", "Block ", "Add a block", "support"));
                bits.addAll(Bit.rows(ask.ask(shape, item, "ground", "stakes")));
                bits.add(ask.fold("The friction or the hold of stakes was measured", shape, item, "friction", "friction-reason", "stake-proof-load", "stakes-per-panel"));
            }
            case FACADE_PANEL -> bits.addAll(Bit.rows(ask.ask(shape, item, "mass")));
            case PROJECTING_SIGN -> bits.addAll(Bit.rows(ask.rest(ask.shape(shape, "brackets"), item + ".brackets", Set.of())));
            case SPANNED_BANNER -> bits.add(ask.fold("The weight of the fabric is known", shape, item, "mass-per-area"));
        }
        for (Field field : shape.fields()) {
            if (field.name().equals("footing")) {
                bits.add(footing());
            } else if (field.holds() == Field.Holds.OBJECT && !PLAIN.contains(field.name())) {
                bits.add(below(SENTENCES.getOrDefault(field.name(), capital(field.meaning())), field.name()));
            }
        }
        return bits;
    }

    /** How a section is chosen where none is typed. */
    private Bit choice(Shape posts) {
        return ask.fold("A section is chosen where none is typed: from which series, and by which limit", posts, item + ".posts", "series", "deflection-limit",
            "load-duration");
    }

    /** The footing: what is asked first, then what is known of the soil and what stands around it. */
    private Bit footing() {
        Shape footing = ask.shape(shape, "footing");
        String path = item + ".footing";
        anchors.put(path, path);
        List<Bit> inside = new ArrayList<>(Bit.rows(ask.ask(footing, path, "kind", "shape", "width", "length", "depth", "ground")));
        inside.add(rows("More is known of the soil", footing, path, "rule", "lateral-bearing", "cohesion", "friction-angle", "soil-density", "bearing", "friction",
            "safety-factor", "half-inch-motion", "third-increase"));
        inside.add(rows("Pavement, slope, water, frost and buried services", footing, path, "paved", "slope", "water", "frost-depth", "services"));
        return Bit.fold(SENTENCES.get("footing"), path, ask.open(path), inside);
    }

    private Bit rows(String sentence, Shape of, String path, String... names) {
        return Bit.fold(sentence, path + "-" + names[0] + "-fold", ask.open(path, names), Bit.rows(ask.ask(of, path, names)));
    }

    /** The entries of a list of which there may be none, folded. */
    private Bit entries(String sentence, String word, String title, String add, String part) {
        Shape entry = ask.shape(shape, word + "s");
        String list = item + "." + word + "s";
        List<Bit> inside = new ArrayList<>();
        for (int i = 0; i < answers.size(list); i++) {
            inside.add(Bit.entry(title + (i + 1), list + "[" + i + "]", Bit.rows(ask.rest(entry, list + "[" + i + "]", Set.of())),
                List.of(new Button("drop-" + word + ":" + i, "Take " + word + " " + (i + 1) + " away", part))));
        }
        inside.add(Bit.buttons(List.of(new Button("add-" + word, add, list + "[" + answers.size(list) + "]"))));
        anchors.put(list, list);
        return Bit.fold(sentence, list, answers.size(list) > 0 || ask.open(list), inside);
    }

    private Bit below(String sentence, String name) {
        String path = item + "." + name;
        anchors.put(path, path);
        return Bit.fold(sentence, path, ask.open(path), Bit.rows(ask.rest(ask.shape(shape, name), path, Set.of())));
    }

    private static void others(List<Bit> bits, List<Bit> rest, String path) {
        if (!rest.isEmpty()) {
            bits.add(Bit.fold("Further answers", path + "-further", rest.stream().anyMatch(Bit::typed), rest));
        }
    }

    private static String capital(String text) {
        return text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }
}
