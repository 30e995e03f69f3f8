package broadside.web;

import broadside.codes.WindCode;
import broadside.job.Field;
import broadside.job.Shape;
import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Show;
import broadside.quantity.Typed;
import broadside.quantity.Unit;
import broadside.quantity.Units;
import broadside.web.FormView.Bit;
import broadside.web.FormView.Button;
import broadside.web.FormView.Choice;
import broadside.web.FormView.Input;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** Makes single questions from the declared fields, with what was typed, how it was read and what is wrong with it. */
final class Questions {

    /** Lengths that may be below zero: no keypad without a minus. */
    private static final Set<String> SIGNED = Set.of("offset", "distance-from-crest", "altitude", "ground-elevation");

    /** Answers that a job file may leave out, and the form only where something else stands for them. */
    private static final Set<String> NEEDED = Set.of("held-by", "basic-speed", "averaging");

    /** Units of the boxes for thicknesses and gaps. */
    private static final Set<String> SMALL_UNITS = Set.of("mm", "in");

    /** Questions whose few answers are written out one below the other. */
    private static final Set<String> RADIOS = Set.of("held-by", "ground-nearby", "feature", "backing", "duration-rule");

    private static final String ROUGHNESS_LABEL = "Roughness length of the ground on the windward side";
    private static final String ROUGHNESS_HINT = "Sea 0.0002, smooth 0.005, open 0.03, roughly open 0.1, rough 0.25, very rough 0.5 (classes of Davenport and Wieringa). "
        + "A smoother ground gives a larger load. Type unknown if you don't know: the smoothest counts";

    private static final String ZONE_HINT = ". A zone alone counts with the profile of the terrain; a zone named with its site counts with a simplified pressure, in which "
        + "the terrain plays no part";
    private static final String TERRAIN_HINT = ". Where a zone with a simplified pressure was chosen it is not used, but the job file asks for it";

    private final Answers answers;
    private final Optional<WindCode> code;
    private final HeldByChoices heldBy;
    private final FormTables tables;
    private final FormProblems problems;
    private final Units units;
    private final Set<String> asked = new TreeSet<>();
    private final Map<String, String> labels = new LinkedHashMap<>();

    Questions(Answers answers, Optional<WindCode> code, HeldByChoices heldBy, FormTables tables, FormProblems problems) {
        this.answers = answers;
        this.code = code;
        this.heldBy = heldBy;
        this.tables = tables;
        this.problems = problems;
        this.units = FormReader.units(answers);
    }

    /** The questions for some fields of one shape, in the order given. */
    List<Bit> ask(Shape shape, String path, String... names) {
        List<Bit> bits = new ArrayList<>();
        for (String name : names) {
            shape.field(name).ifPresent(field -> bits.add(Bit.ask(input(shape, field, at(path, name)))));
        }
        return bits;
    }

    /** The questions for the fields of a shape that were not asked yet; fields of objects and lists are left out. */
    List<Bit> rest(Shape shape, String path, Set<String> without) {
        List<Bit> bits = new ArrayList<>();
        for (Field field : shape.fields()) {
            boolean leaf = field.shape().isEmpty();
            if (leaf && !asked.contains(at(path, field.name())) && !without.contains(field.name())) {
                bits.add(Bit.ask(input(shape, field, at(path, field.name()))));
            }
        }
        return bits;
    }

    /** Some questions folded under a plain sentence. */
    Bit fold(String sentence, Shape shape, String path, String... names) {
        return Bit.fold(sentence, path + "." + names[0] + "-fold", open(path, names), ask(shape, path, names));
    }

    /** Whether the code takes a value that only some codes take. */
    boolean takes(String option) {
        return code.filter(c -> c.terms().options().contains(option)).isPresent();
    }

    /** The shape of an object or of the entries of a list. */
    Shape shape(Shape shape, String field) {
        return shape.field(field).flatMap(Field::shape).orElseThrow();
    }

    /** A question whose answers are written out one below the other. */
    Bit choose(String path, String label, String hint, List<Choice> choices) {
        return Bit.ask(made("radio", path, label, "", hint, null, choices, "", ""));
    }

    /** The labels of all questions asked, by their paths. */
    Map<String, String> labels() {
        return labels;
    }

    boolean open(String path) {
        return answers.any(path) || problems.any(path);
    }

    /** Whether a fold over some fields has to stand open: something was typed there, or something is wrong. */
    boolean open(String path, String... names) {
        for (String name : names) {
            if (open(at(path, name))) {
                return true;
            }
        }
        return false;
    }

    private Input input(Shape shape, Field field, String path) {
        Input input = made(shape, field, path);
        return field.required() || NEEDED.contains(field.name()) || neededBeside(shape.name() + "." + field.name()) ? input : input.asOptional();
    }

    /** Whether an answer is needed with some other answers, so that it is not said to be optional. */
    private boolean neededBeside(String name) {
        return switch (name) {
            case "posts.spacing", "brackets.spacing" -> true;
            case "site.altitude" -> code.filter(c -> c.edition().has("altitude-factor")).isPresent();
            case "site.return-period" -> takes("region");
            default -> false;
        };
    }

    private Input made(Shape shape, Field field, String path) {
        Wording words = Wording.of(shape.name(), field);
        Map<String, String> listed = shape.name().equals("site") ? code.map(c -> TableChoices.of(c.edition(), field.name())).orElse(Map.of())
            : tables.of(shape.name(), field.name());
        if (path.equals("site.terrain")) {
            return terrain(path, words);
        }
        if (!listed.isEmpty()) {
            return made("select", path, words.label(), "", field.name().equals("wind-zone") && simplified() ? words.hint() + ZONE_HINT : words.hint(), null,
                choices(path, shape.name().equals("site") || field.name().equals("ground") ? "Not said" : "The usual one", listed), "", "wide");
        }
        if (RADIOS.contains(field.name())) {
            return made("radio", path, words.label(), "", words.hint(), null, written(field, path), "", field.name().equals("held-by") ? "many" : "");
        }
        return switch (field.holds()) {
            case QUANTITY -> quantity(field, words, path);
            case CHOICE -> made("select", path, words.label(), "", hint(field, words), null, choices(field, path), "", "");
            case NUMBER, WHOLE -> made("text", path, words.label(), "", words.hint(), null, List.of(),
                field.holds() == Field.Holds.WHOLE ? "numeric" : "decimal", "short");
            case NUMBER_OR_CHOICE, NUMBER_OR_QUANTITY -> made("text", path, words.label(), "", words.hint(), null, List.of(), null, "short");
            default -> made("text", path, words.label(), "", words.hint(), null, List.of(), null, "wide");
        };
    }

    /** Classes of the code to choose from, or a box for a roughness length where the code has no classes. */
    private Input terrain(String path, Wording words) {
        if (code.filter(c -> c.terms().byRoughness()).isPresent()) {
            Unit unit = FormReader.ROUGHNESS;
            return made("text", path, ROUGHNESS_LABEL + ", in " + unit.symbol(), unit.symbol(),
                "Here it is " + code.orElseThrow().terms().terrainNames() + ". " + ROUGHNESS_HINT, reading(answers.get(path), Dimension.LENGTH, unit),
                List.of(), null, "short");
        }
        return made("radio", path, words.label(), "", code.isPresent() ? words.hint() + (simplified() ? TERRAIN_HINT : "")
            : "Each code has its own classes: choose the code above, then show its questions", null, terrains(path), "", "");
    }

    private Input quantity(Field field, Wording words, String path) {
        Dimension dimension = field.dimension().orElseThrow();
        Unit unit = words.unit(dimension, units);
        boolean letters = units == Units.US && dimension == Dimension.LENGTH || SIGNED.contains(field.name());
        boolean another = path.equals("site.basic-speed") && SiteFields.IN_PLACE_OF_SPEED.stream().anyMatch(this::takes);
        String hint = another ? words.hint() + "; leave it empty where the zone or region below is given" : words.hint();
        return made("text", path, words.label() + ", in " + unit.symbol(), unit.symbol(), hint,
            reading(answers.get(path), dimension, unit), List.of(), letters ? null : "decimal", "short");
    }

    /** The value read, in both systems; empty when there is none yet. In a box for thicknesses and gaps less than 1 mm is asked about. */
    static String reading(String typed, Dimension dimension, Unit unit) {
        if (typed.isBlank() || !(Typed.read(typed, dimension, unit) instanceof Reading.Value value)) {
            return "";
        }
        double size = Math.abs(value.si());
        boolean tiny = SMALL_UNITS.contains(unit.symbol()) && size > 0 && size < 0.001;
        String both = tiny ? "= " + new BigDecimal(value.si() * 1000).round(new MathContext(3)).stripTrailingZeros().toPlainString() + " mm: is that meant?"
            : dimension == Dimension.PERIOD ? "" : "= " + Show.both(Typed.quantity(dimension, value.si(), typed));
        return value.warnings().isEmpty() ? both : both + (tiny ? " " : ". ") + String.join(". ", value.warnings());
    }

    private Input made(String kind, String path, String label, String unit, String hint, String reading, List<Choice> choices, String keypad,
                       String width) {
        asked.add(path);
        labels.put(path, label.replaceAll(", in [^,]*$", ""));
        List<Button> readings = problems.options(path).stream().map(o -> new Button("set:" + path + "=" + o, o, path)).toList();
        return new Input(kind, path, label, unit, hint, answers.get(path), reading, problems.sentence(path, labels.get(path)), readings, choices,
            keypad, width, false);
    }

    private String hint(Field field, Wording words) {
        return field.name().equals("averaging") ? code.map(c -> CodeName.of(c) + " defines it as a " + c.terms().averaging().words()).orElse(words.hint()) : words.hint();
    }

    private List<Choice> terrains(String path) {
        List<Choice> choices = new ArrayList<>();
        code.ifPresent(c -> {
            c.terms().terrains().forEach(t -> choices.add(new Choice(path + "-" + t.name(), t.name(), t.meaning().isEmpty() ? t.name() : capital(t.meaning()),
                "class " + t.name(), answers.get(path).equals(t.name()))));
            choices.add(choice("terrain", path, FormReader.UNKNOWN));
        });
        return choices;
    }

    /** The answers of a question that are written out, in plain words. */
    private List<Choice> written(Field field, String path) {
        return field.name().equals("held-by") ? heldBy.of(field, path) : field.choices().stream().map(value -> choice(field.name(), path, value)).toList();
    }

    private Choice choice(String field, String path, String value) {
        ChoiceWords words = ChoiceWords.of(field, value);
        String unfolds = field.equals("ground-nearby") ? value.equals("hill") ? "site.topography" : "-site.topography" : "";
        return new Choice(path + "-" + value.replace(' ', '-'), value, words.words(), words.small(), answers.get(path).equals(value), unfolds);
    }

    private List<Choice> choices(Field field, String path) {
        Map<String, String> words = new LinkedHashMap<>();
        field.choices().forEach(value -> words.put(value, ChoiceWords.of(field.name(), value).words()));
        return choices(path, field.required() || field.name().equals("averaging") ? "Choose"
            : path.contains(".boards[") || path.contains(".replaces.") ? "Not said: a rectangle" : "Not said", words);
    }

    /** The answers of a select; what was typed elsewhere and is none of them stays as it is. */
    private List<Choice> choices(String path, String blank, Map<String, String> words) {
        List<Choice> choices = new ArrayList<>(List.of(new Choice("", "", blank, "", answers.blank(path))));
        words.forEach((value, text) -> choices.add(new Choice("", value, text, "", answers.get(path).equals(value))));
        if (!answers.blank(path) && !words.containsKey(answers.get(path))) {
            choices.add(new Choice("", answers.get(path), answers.get(path), "", true));
        }
        return choices;
    }

    private boolean simplified() {
        return code.filter(c -> TableChoices.simplified(c.edition())).isPresent();
    }

    private static String capital(String text) {
        return text.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + text.substring(1);
    }

    static String at(String path, String name) {
        return path.isEmpty() ? name : path + "." + name;
    }
}
