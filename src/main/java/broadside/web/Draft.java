package broadside.web;

import broadside.job.Field;
import broadside.job.Shape;
import broadside.job.Shapes;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.quantity.Unit;
import broadside.quantity.Units;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Consumer;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/**
 * A job while it is filled in: the answers for its head and one item, and the other items as they are.
 *
 * @param items  all items; the one at {@code index} is the one in the answers
 */
record Draft(Answers answers, ArrayNode items, int index) {

    private static final String AS_A = " as a ";

    /** A question of the job file with its path. */
    record Leaf(String path, Shape shape, Field field) {

        Unit unit(Units system) {
            return Wording.of(shape.name(), field).unit(field.dimension().orElseThrow(), system);
        }
    }

    /** An empty sheet for one item of a kind. */
    static Draft blank(String kind, String units, String code) {
        Answers answers = new Answers(Map.of("units", units.equals("us") ? "us" : "metric", "basis.code", code));
        Kind known = Kind.of(kind).orElse(Kind.POST_SIGN);
        answers.set("items[0].kind", known.key());
        answers.set("items[0].mark", known.mark(1));
        return new Draft(answers, JsonNodeFactory.instance.arrayNode(), 0);
    }

    /** The sheet of a job; a number whose unit is the one beside its box stands there without it. */
    static Draft of(JsonNode job, int item) {
        if (!job.isObject() || !job.path("items").isArray() || job.path("items").path(item).isMissingNode()) {
            throw Refused.badLink("It holds no item " + (item + 1) + " of a job.");
        }
        if (!known(job.get("items").get(item))) {
            throw Refused.badLink("Its item " + (item + 1) + " is of a kind that this version does not ask for.");
        }
        Answers answers = Answers.of(job, item);
        if (!answers.blank("basis.edition")) {
            String overlay = answers.blank("basis.overlay") ? "" : "-" + answers.get("basis.overlay").strip();
            answers.set("basis.code", answers.get("basis.code").strip() + "/" + answers.get("basis.edition").strip() + overlay);
            answers.remove("basis.edition");
            answers.remove("basis.overlay");
        }
        older(answers);
        Draft draft = new Draft(answers, (ArrayNode) job.get("items"), item);
        if (answers.blank("units")) {
            answers.set("units", typedInUs(answers) ? "us" : "metric");
        }
        draft.quantities(leaf -> draft.bare(leaf.path(), leaf.unit(FormReader.units(answers))));
        return draft;
    }

    /** Whether an item is of a kind that has a form. */
    static boolean known(JsonNode item) {
        return item.path("kind").isString() && Shapes.KINDS.containsKey(item.path("kind").stringValue());
    }

    /** The answers as they stand, with what travels along unseen; {@link #of(JsonNode)} reads them again. */
    JsonNode json() {
        ObjectNode all = JsonNodeFactory.instance.objectNode();
        answers.all().forEach(all::put);
        all.put("item", Integer.toString(index));
        all.put("kept", Token.of(items));
        return all;
    }

    /** The sheet of answers that {@link #json()} wrote. */
    static Draft of(JsonNode answers) {
        Map<String, String> typed = new LinkedHashMap<>();
        answers.properties().forEach(e -> typed.put(e.getKey(), e.getValue().isString() ? e.getValue().stringValue() : ""));
        return sent(typed);
    }

    /** The sheet that a form sent. */
    static Draft sent(Map<String, String> form) {
        Map<String, String> typed = new LinkedHashMap<>(form);
        String kept = typed.remove("kept");
        String index = typed.getOrDefault("item", "0");
        typed.remove("item");
        JsonNode items = kept == null || kept.isEmpty() ? JsonNodeFactory.instance.arrayNode() : Token.read(kept);
        if (!index.matches("\\d{1,3}") || !items.isArray() || Integer.parseInt(index) > items.size()) {
            throw new Refused(400, "The form cannot be read", "The fields that say which item it is about do not fit. Begin at the start page.");
        }
        Answers answers = new Answers(typed);
        older(answers);
        return new Draft(answers, (ArrayNode) items, Integer.parseInt(index));
    }

    /** Before it was asked whether the ground near by is flat, the shape of the slope held that answer. */
    private static void older(Answers answers) {
        boolean flat = answers.get("site.topography.feature").equals("flat");
        if (flat) {
            answers.remove("site.topography.feature");
        }
        if (answers.blank("site.ground-nearby") && (flat || answers.any("site.topography"))) {
            answers.set("site.ground-nearby", flat ? "flat" : "hill");
        }
    }

    String path() {
        return "items[" + index + "]";
    }

    /** Puts the shown unit behind each bare number, then changes the system: nothing that was typed changes its size. */
    void changeUnits(String units) {
        quantities(leaf -> {
            if (!answers.blank(leaf.path())) {
                answers.set(leaf.path(), FormReader.withUnit(answers.get(leaf.path()), leaf.unit(FormReader.units(answers))));
            }
        });
        answers.set("units", units.equals("us") ? "us" : "metric");
    }

    /** Remembers the terrain class of the code that was asked before, and takes up the one of the code asked now. */
    void followCode() {
        String before = answers.get("drawn-for");
        String now = answers.get("basis.code");
        answers.remove("drawn-for");
        if (!before.isEmpty() && !before.equals(now)) {
            answers.set("site.terrain@" + before, answers.get("site.terrain"));
            boolean unknown = answers.get("site.terrain").equals(FormReader.UNKNOWN) && answers.blank("site.terrain@" + now);
            answers.set("site.terrain", unknown ? FormReader.UNKNOWN : answers.get("site.terrain@" + now));
        }
    }

    /** Takes an answer that was offered. A speed "as a" mean or gust of another kind brings its kind along. */
    void take(String path, String answer) {
        int as = path.equals("site.averaging") ? answer.indexOf(AS_A) : -1;
        if (as > 0) {
            answers.set("site.basic-speed", answer.substring(0, as));
        }
        answers.set(path, as > 0 ? answer.substring(as + AS_A.length()) : answer);
    }

    /** Every quantity among the questions of this sheet. */
    void quantities(Consumer<Leaf> each) {
        walk(Shapes.JOB, "", each);
        Shape own = Shapes.KINDS.get(answers.get(path() + ".kind"));
        if (own != null) {
            walk(own, path(), each);
        }
    }

    private void walk(Shape shape, String path, Consumer<Leaf> each) {
        for (Field field : shape.fields()) {
            String at = Questions.at(path, field.name());
            if (field.dimension().isPresent()) {
                each.accept(new Leaf(at, shape, field));
            } else if (field.holds() == Field.Holds.OBJECT) {
                walk(field.shape().orElseThrow(), at, each);
            } else if (field.holds() == Field.Holds.LIST && !at.equals("items")) {
                for (int i = 0; i < answers.size(at); i++) {
                    walk(field.shape().orElseThrow(), at + "[" + i + "]", each);
                }
            }
        }
    }

    private void bare(String path, Unit unit) {
        String typed = answers.get(path).strip();
        if (typed.endsWith(" " + unit.symbol())) {
            String number = typed.substring(0, typed.length() - unit.symbol().length()).strip();
            boolean same = Typed.read(typed, unit.dimension()) instanceof Reading.Value whole
                && Typed.read(number, unit.dimension(), unit) instanceof Reading.Value alone && whole.si() == alone.si();
            if (same) {
                answers.set(path, number);
            }
        }
    }

    private static boolean typedInUs(Answers answers) {
        return Typed.read(answers.get("site.basic-speed"), broadside.quantity.Dimension.SPEED) instanceof Reading.Value speed
            && speed.unit().system() == Units.US;
    }
}
