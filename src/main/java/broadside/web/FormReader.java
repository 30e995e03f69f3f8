package broadside.web;

import broadside.assess.Problem;
import broadside.codes.CodeLibrary;
import broadside.codes.WindCode;
import broadside.job.Field;
import broadside.job.Shape;
import broadside.job.Shapes;
import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.quantity.Unit;
import broadside.quantity.Units;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/**
 * Makes a job from the answers of a form, by the declared shapes. A bare number gets the unit shown beside its box; what
 * cannot be read goes into the job as it was typed, so that nothing is lost, and is listed.
 */
final class FormReader {

    /** The answer "I don't know". */
    static final String UNKNOWN = "unknown";

    /** Unit of a roughness length that is typed as a bare number, in both systems. */
    static final Unit ROUGHNESS = Unit.of(Dimension.LENGTH, "m").orElseThrow();

    private static final String PLAIN = "[+-]?\\d{1,12}([.,]\\d{1,12})?";
    private static final String TWO_READINGS = "[+-]?[1-9]\\d{0,2},\\d{3}";

    private final CodeLibrary codes;

    FormReader(CodeLibrary codes) {
        this.codes = codes;
    }

    /** A job as JSON, and what of the form could not be read. */
    record Made(ObjectNode job, List<Problem> problems) { }

    /** The system of units of a form. */
    static Units units(Answers answers) {
        return answers.get("units").equals("us") ? Units.US : Units.METRIC;
    }

    /**
     * The job of a form.
     *
     * @param items  all items of the job; the one at {@code index} is replaced by the answers
     */
    Made read(Answers answers, ArrayNode items, int index) {
        return new Pass(answers).job(items, index);
    }

    /** One reading of one form. */
    private final class Pass {

        private final Answers answers;
        private final Units units;
        private final Optional<WindCode> code;
        private final Set<String> foreign;
        private final List<Problem> problems = new ArrayList<>();

        Pass(Answers answers) {
            this.answers = answers;
            this.units = units(answers);
            this.code = codes.code(answers.get("basis.code"));
            this.foreign = SiteFields.foreign(code);
        }

        Made job(ArrayNode items, int index) {
            ObjectNode job = JsonNodeFactory.instance.objectNode();
            job.put("broadside", 1);
            for (Field field : Shapes.JOB.fields()) {
                switch (field.name()) {
                    case "broadside" -> { }
                    case "basis" -> job.set("basis", basis(field.shape().orElseThrow()));
                    case "items" -> job.set("items", items(items, index));
                    default -> value(job, Shapes.JOB, field, field.name());
                }
            }
            return new Made(job, List.copyOf(problems));
        }

        private ArrayNode items(ArrayNode items, int index) {
            ArrayNode all = JsonNodeFactory.instance.arrayNode();
            all.addAll(items);
            String path = "items[" + index + "]";
            ObjectNode own = JsonNodeFactory.instance.objectNode();
            Optional.ofNullable(Shapes.KINDS.get(answers.get(path + ".kind"))).ifPresent(shape -> {
                fill(own, shape, path);
                heldBy(own, path + ".held-by");
            });
            if (index < all.size()) {
                all.set(index, own);
            } else {
                all.add(own);
            }
            return all;
        }

        /** A job file may leave it out; a form may not. The empty word keeps the question open while another item is filled in. */
        private void heldBy(ObjectNode own, String path) {
            if (answers.blank(path)) {
                own.put("held-by", "");
                missing(path, FormProblems.HELD_BY);
            }
        }

        /** Code, edition and overlay are one answer on the form: the key of the tables. */
        private ObjectNode basis(Shape shape) {
            ObjectNode basis = JsonNodeFactory.instance.objectNode();
            String key = answers.get("basis.code").strip();
            String plain = codes.code(key).flatMap(c -> c.edition().basis()).map(b -> b.key()).orElse(key);
            int slash = plain.indexOf('/');
            if (key.isEmpty()) {
                missing("basis.code", "is missing: choose one of those below");
            } else {
                basis.put("code", slash < 0 ? plain : plain.substring(0, slash));
                basis.put("edition", slash < 0 ? "" : plain.substring(slash + 1));
            }
            if (key.length() > plain.length() + 1) {
                basis.put("overlay", key.substring(plain.length() + 1));
            }
            for (Field field : shape.fields()) {
                if (!Set.of("code", "edition", "overlay").contains(field.name())) {
                    value(basis, shape, field, "basis." + field.name());
                }
            }
            return basis;
        }

        private void fill(ObjectNode to, Shape shape, String path) {
            for (Field field : shape.fields()) {
                if (!(shape.name().equals("site") && foreign.contains(field.name()))) {
                    value(to, shape, field, path + "." + field.name());
                }
            }
            if (shape.name().equals("site")) {
                speed();
            }
        }

        /** The speed and its kind are asked for, unless the code takes something else in their place and that was given. */
        private void speed() {
            boolean other = SiteFields.IN_PLACE_OF_SPEED.stream().anyMatch(name -> !foreign.contains(name) && !answers.blank("site." + name));
            boolean blank = answers.blank("site.basic-speed");
            if (blank && !other) {
                missing("site.basic-speed", "is missing: type it like " + Dimension.SPEED.example(units));
            }
            if (answers.blank("site.averaging") && !(blank && other)) {
                missing("site.averaging", "is missing: choose one of those below");
            }
        }

        private void value(ObjectNode to, Shape shape, Field field, String path) {
            switch (field.holds()) {
                case OBJECT -> object(to, field, path);
                case LIST -> list(to, field, path);
                default -> {
                    if (!answers.blank(path)) {
                        leaf(to, shape, field, path, answers.get(path).strip());
                    } else if (field.required()) {
                        missing(path, missing(field));
                    }
                }
            }
        }

        private void object(ObjectNode to, Field field, String path) {
            Shape shape = field.shape().orElseThrow();
            boolean asked = switch (shape.name()) {
                case "posts", "brackets" -> true;
                case "topography" -> slope(path);
                default -> field.required() || answers.any(path);
            };
            if (asked) {
                ObjectNode object = JsonNodeFactory.instance.objectNode();
                fill(object, shape, path);
                to.set(field.name(), object);
            }
        }

        /** The sizes of a slope count when the ground was said to be higher or lower; a factor set by the user stands for them. */
        private boolean slope(String path) {
            boolean factor = !foreign.contains("topographic-factor") && !answers.blank("site.topographic-factor");
            return switch (answers.get("site.ground-nearby")) {
                case "hill" -> answers.any(path) || !factor;
                case "" -> answers.any(path);
                default -> false;
            };
        }

        private void list(ObjectNode to, Field field, String path) {
            ArrayNode list = JsonNodeFactory.instance.arrayNode();
            for (int i = 0; i < answers.size(path); i++) {
                ObjectNode entry = JsonNodeFactory.instance.objectNode();
                fill(entry, field.shape().orElseThrow(), path + "[" + i + "]");
                list.add(entry);
            }
            if (!list.isEmpty() || field.required()) {
                to.set(field.name(), list);
            }
        }

        private void leaf(ObjectNode to, Shape shape, Field field, String path, String text) {
            switch (field.holds()) {
                case QUANTITY -> to.put(field.name(), quantity(shape, field, path, text));
                case NUMBER, WHOLE -> number(to, field, path, text);
                case NUMBER_OR_CHOICE, NUMBER_OR_QUANTITY -> {
                    if (text.matches(PLAIN) || !Character.isLetter(text.charAt(0)) && field.holds() == Field.Holds.NUMBER_OR_CHOICE) {
                        number(to, field, path, text);
                    } else {
                        to.put(field.name(), text);
                    }
                }
                default -> to.put(field.name(), shape.name().equals("site") && field.name().equals("terrain") ? terrain(text) : text);
            }
        }

        /** A class as it is; a roughness length with its unit. */
        private String terrain(String text) {
            boolean roughness = code.filter(c -> c.terms().byRoughness()).isPresent();
            return text.equalsIgnoreCase(UNKNOWN) ? UNKNOWN : roughness ? withUnit(text, ROUGHNESS) : text;
        }

        private String quantity(Shape shape, Field field, String path, String text) {
            Unit unit = Wording.of(shape.name(), field).unit(field.dimension().orElseThrow(), units);
            Reading reading = Typed.read(text, unit.dimension(), unit);
            if (reading instanceof Reading.Ambiguous open) {
                problems.add(new Problem(path, open.problem(), open.options()));
            } else if (reading instanceof Reading.Refused refused) {
                problems.add(new Problem(path, refused.problem()));
            }
            return withUnit(text, unit);
        }

        private void number(ObjectNode to, Field field, String path, String text) {
            if (text.matches(TWO_READINGS)) {
                problems.add(new Problem(path, "\"" + text + "\" can be read in two ways: choose one",
                    List.of(text.replace(",", ""), text.replace(',', '.'))));
                to.put(field.name(), text);
            } else if (text.matches(PLAIN)) {
                BigDecimal value = new BigDecimal(text.replace(',', '.'));
                if (value.stripTrailingZeros().scale() <= 0) {
                    to.put(field.name(), value.longValueExact());
                } else {
                    to.put(field.name(), value);
                }
            } else {
                problems.add(new Problem(path, "\"" + (text.length() > 40 ? text.substring(0, 40) + "..." : text)
                    + "\" is not a plain number: type " + (field.holds() == Field.Holds.WHOLE ? "a whole number like 2" : "digits, like 0.8")));
                to.put(field.name(), text);
            }
        }

        private String missing(Field field) {
            boolean roughness = field.name().equals("terrain") && code.filter(c -> c.terms().byRoughness()).isPresent();
            return "is missing: " + (roughness ? "type a roughness length such as 0.05 m" : example(field));
        }

        private String example(Field field) {
            return field.dimension().map(d -> "type it like " + d.example(units))
                .orElse(field.holds() == Field.Holds.WHOLE ? "type a whole number like 2"
                    : field.choices().isEmpty() && !terrainClass(field) ? "type it here" : "choose one of those below");
        }

        private boolean terrainClass(Field field) {
            return field.name().equals("terrain") && code.filter(c -> c.terms().byRoughness()).isEmpty();
        }

        private void missing(String path, String text) {
            problems.add(new Problem(path, text));
        }
    }

    /** A typed quantity with its unit: a bare number gets the unit shown beside the box, any other text stays as it is. */
    static String withUnit(String text, Unit unit) {
        Reading alone = Typed.read(text, unit.dimension());
        Reading beside = Typed.read(text, unit.dimension(), unit);
        if (alone instanceof Reading.Refused && !(beside instanceof Reading.Refused)) {
            String whole = text.strip() + " " + unit.symbol();
            Reading again = Typed.read(whole, unit.dimension());
            boolean same = !(beside instanceof Reading.Value one) || again instanceof Reading.Value two && two.si() == one.si();
            return same ? whole : text;
        }
        return text;
    }
}
