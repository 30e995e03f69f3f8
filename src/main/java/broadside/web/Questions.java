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
import broadside.site.Averaging;
import broadside.web.FormView.Bit;
import broadside.web.FormView.Button;
import broadside.web.FormView.Choice;
import broadside.web.FormView.Input;
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

    private final Answers answers;
    private final Optional<WindCode> code;
    private final FormProblems problems;
    private final Units units;
    private final Set<String> asked = new TreeSet<>();
    private final Map<String, String> labels = new LinkedHashMap<>();

    Questions(Answers answers, Optional<WindCode> code, FormProblems problems) {
        this.answers = answers;
        this.code = code;
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
        Wording words = Wording.of(shape.name(), field);
        boolean terrain = shape.name().equals("site") && field.name().equals("terrain");
        if (terrain && code.filter(c -> c.terms().byRoughness()).isPresent()) {
            return made("text", path, words.label(), "", "Here it is " + code.orElseThrow().terms().terrainNames() + ". If you are not sure, take the smaller one", null,
                List.of(), null, "short");
        }
        if (terrain) {
            return made("radio", path, words.label(), "", code.isPresent() ? words.hint()
                : "Each code has its own classes: choose the code above, then show its questions", null, terrains(path), "", "");
        }
        if (shape.name().equals("topography") && field.name().equals("feature")) {
            return made("radio", path, words.label(), "", words.hint(), null, features(path), "", "");
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

    private Input quantity(Field field, Wording words, String path) {
        Dimension dimension = field.dimension().orElseThrow();
        Unit unit = words.unit(dimension, units);
        boolean letters = units == Units.US && dimension == Dimension.LENGTH || SIGNED.contains(field.name());
        return made("text", path, words.label() + ", in " + unit.symbol(), unit.symbol(), words.hint(),
            reading(answers.get(path), dimension, unit), List.of(), letters ? null : "decimal", "short");
    }

    /** The value read, in both systems; empty when there is none yet. */
    static String reading(String typed, Dimension dimension, Unit unit) {
        if (typed.isBlank() || !(Typed.read(typed, dimension, unit) instanceof Reading.Value value)) {
            return "";
        }
        String both = dimension == Dimension.PERIOD ? "" : "= " + Show.both(Typed.quantity(dimension, value.si(), typed));
        return value.warnings().isEmpty() ? both : both + ". " + String.join(". ", value.warnings());
    }

    private Input made(String kind, String path, String label, String unit, String hint, String reading, List<Choice> choices, String keypad,
                       String width) {
        asked.add(path);
        labels.put(path, label.replaceAll(", in [^,]*$", ""));
        List<Button> readings = problems.options(path).stream().map(o -> new Button("set:" + path + "=" + o, o, path)).toList();
        return new Input(kind, path, label, unit, hint, answers.get(path), reading, problems.sentence(path, labels.get(path)), readings, choices,
            keypad, width);
    }

    private String hint(Field field, Wording words) {
        return field.name().equals("averaging") ? code.map(c -> c.edition().property("title") + " defines it as a " + c.terms().averaging().words()).orElse(words.hint()) : words.hint();
    }

    private List<Choice> terrains(String path) {
        return code.stream().flatMap(c -> c.terms().terrains().stream()).map(t -> new Choice(path + "-" + t.name(), t.name(),
            t.meaning().isEmpty() ? t.name() : capital(t.meaning()), "class " + t.name(), answers.get(path).equals(t.name()))).toList();
    }

    private List<Choice> features(String path) {
        String now = answers.get(path);
        return List.of(
            new Choice(path + "-flat", FormReader.FLAT, "Flat, or I don't know", "taken as flat, and the sheet says so", now.equals(FormReader.FLAT)),
            new Choice(path + "-hill", "hill", "A single hill", "hill", now.equals("hill")),
            new Choice(path + "-ridge", "ridge", "A long hill that falls on both sides", "ridge", now.equals("ridge")),
            new Choice(path + "-escarpment", "escarpment", "A slope up to high ground that stays high", "escarpment", now.equals("escarpment")));
    }

    private List<Choice> choices(Field field, String path) {
        List<Choice> choices = new ArrayList<>();
        choices.add(new Choice("", "", field.required() ? "Choose" : field.name().equals("shape") ? "Not said: a rectangle" : "Not said", "", answers.blank(path)));
        for (String value : field.choices()) {
            choices.add(new Choice("", value, words(value), "", answers.get(path).equals(value)));
        }
        boolean known = answers.blank(path) || field.choices().contains(answers.get(path));
        if (!known) {
            choices.add(new Choice("", answers.get(path), answers.get(path), "", true));
        }
        return choices;
    }

    private static String words(String value) {
        return switch (value) {
            case "code" -> "at the level of the code's own loads";
            case "service" -> "at service level (allowable stress)";
            default -> Averaging.of(value).isPresent() || value.length() <= 3 ? value : capital(value);
        };
    }

    private static String capital(String text) {
        return text.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + text.substring(1);
    }

    static String at(String path, String name) {
        return path.isEmpty() ? name : path + "." + name;
    }
}
