package broadside.job;

import broadside.assess.Problem;
import broadside.quantity.Dimension;
import broadside.quantity.Quantity;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.quantity.Units;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import tools.jackson.databind.JsonNode;

/** Reads a JSON object by its declared shape. Unknown and missing keys and wrong kinds of value become problems. */
final class StructureReader {

    private static final int LONGEST_LIST = 200;

    private final List<Problem> problems;

    StructureReader(List<Problem> problems) {
        this.problems = problems;
    }

    Values read(JsonNode node, Shape shape, String path) {
        Values values = new Values(path);
        if (!node.isObject()) {
            problem(path, "must be an object with the keys " + shape.names());
            return values;
        }
        for (Map.Entry<String, JsonNode> entry : node.properties()) {
            if (shape.field(entry.getKey()).isEmpty()) {
                problem(values.at(clean(entry.getKey())), "is not a key of " + shape.name() + "; its keys are " + shape.names());
            }
        }
        for (Field field : shape.fields()) {
            JsonNode value = node.get(field.name());
            if (value == null || value.isNull()) {
                if (field.required()) {
                    problem(values.at(field.name()), "is missing: " + field.meaning() + example(field));
                }
            } else {
                value(values, field, value);
            }
        }
        return values;
    }

    private void value(Values values, Field field, JsonNode node) {
        String path = values.at(field.name());
        switch (field.holds()) {
            case TEXT -> text(values, field, node, path);
            case CHOICE -> choice(values, field, node, path);
            case NUMBER, WHOLE -> number(values, field, node, path);
            case QUANTITY -> quantity(values, field, node, path);
            case NUMBER_OR_CHOICE -> {
                if (node.isNumber()) {
                    number(values, field, node, path);
                } else {
                    choice(values, field, node, path);
                }
            }
            case NUMBER_OR_QUANTITY -> either(values, field, node, path);
            case OBJECT -> values.put(field.name(), read(node, field.shape().orElseThrow(), path));
            case LIST -> list(values, field, node, path);
        }
    }

    private void text(Values values, Field field, JsonNode node, String path) {
        if (!node.isString()) {
            problem(path, "must be text: " + field.meaning());
        } else if (node.stringValue().length() > 2000) {
            problem(path, "has " + node.stringValue().length() + " characters; at most 2000 fit");
        } else if (!node.stringValue().isBlank()) {
            values.put(field.name(), node.stringValue().strip());
        } else if (field.required()) {
            problem(path, "is empty: " + field.meaning());
        }
    }

    private void choice(Values values, Field field, JsonNode node, String path) {
        String word = node.isString() ? node.stringValue().strip() : node.toString();
        if (node.isString() && field.choices().contains(word)) {
            values.put(field.name(), word);
        } else {
            problem(path, "\"" + clean(word) + "\" does not fit: " + field.meaning() + ", "
                + (field.holds() == Field.Holds.NUMBER_OR_CHOICE ? "a number or " : "one of ") + String.join(", ", field.choices()));
        }
    }

    private void number(Values values, Field field, JsonNode node, String path) {
        if (!node.isNumber()) {
            problem(path, "must be a plain number without quotation marks: " + field.meaning());
            return;
        }
        double value = node.doubleValue();
        if (!Double.isFinite(value)) {
            problem(path, "is too large to be a number: " + field.meaning());
        } else if (field.holds() != Field.Holds.WHOLE) {
            values.put(field.name(), value);
        } else if (value == Math.rint(value) && Math.abs(value) < 1e6) {
            values.put(field.name(), (int) value);
        } else {
            problem(path, "must be a whole number below 1 000 000: " + field.meaning());
        }
    }

    private void quantity(Values values, Field field, JsonNode node, String path) {
        Dimension dimension = field.dimension().orElseThrow();
        if (!node.isString()) {
            problem(path, "must be text with its unit, like \"" + dimension.example(Units.METRIC) + "\": " + field.meaning());
            return;
        }
        Reading reading = Typed.read(node.stringValue(), dimension);
        if (reading instanceof Reading.Value read) {
            if (read.warnings().isEmpty()) {
                values.put(field.name(), Typed.quantity(dimension, read.si(), read.typed().strip()));
            } else {
                problem(path, read.warnings().get(0) + "; type it so that there is one reading only");
            }
        } else if (reading instanceof Reading.Ambiguous open) {
            problems.add(new Problem(path, open.problem(), open.options()));
        } else {
            problem(path, ((Reading.Refused) reading).problem());
        }
    }

    private void either(Values values, Field field, JsonNode node, String path) {
        if (node.isNumber()) {
            number(values, field, node, path);
            return;
        }
        for (Dimension dimension : List.of(Dimension.PRESSURE, Dimension.FORCE, Dimension.MOMENT, Dimension.SPEED, Dimension.LENGTH, Dimension.DENSITY)) {
            if (node.isString() && Typed.read(node.stringValue(), dimension) instanceof Reading.Value read) {
                Quantity quantity = Typed.quantity(dimension, read.si(), read.typed());
                values.put(field.name(), quantity);
                return;
            }
        }
        problem(path, "must be " + field.meaning() + ", like 1.12 or \"0.65 kN/m2\"");
    }

    private void list(Values values, Field field, JsonNode node, String path) {
        if (!node.isArray()) {
            problem(path, "must be a list in square brackets: " + field.meaning());
            return;
        }
        if (node.size() > LONGEST_LIST) {
            problem(path, "has " + node.size() + " entries; a list has at most " + LONGEST_LIST);
            return;
        }
        List<Values> entries = new ArrayList<>();
        for (int i = 0; i < node.size(); i++) {
            String at = path + "[" + i + "]";
            Shape shape = field.name().equals("items") ? kind(node.get(i), at) : field.shape().orElseThrow();
            if (shape != null) {
                entries.add(read(node.get(i), shape, at));
            }
        }
        if (entries.isEmpty() && field.required() && node.isEmpty()) {
            problem(path, "is empty: " + field.meaning());
        }
        values.put(field.name(), entries);
    }

    /** The shape of an item follows from its kind; null when the kind does not fit and was reported. */
    private Shape kind(JsonNode item, String path) {
        JsonNode kind = item.isObject() ? item.get("kind") : null;
        Shape shape = kind != null && kind.isString() ? Shapes.KINDS.get(kind.stringValue()) : null;
        if (shape == null) {
            String known = String.join(", ", Shapes.KINDS.keySet().stream().sorted().toList());
            problem(path + ".kind", kind == null ? "is missing: one of " + known
                : clean(kind.toString()) + " is not a kind that this version assesses; it knows " + known);
        }
        return shape;
    }

    private static String example(Field field) {
        return field.dimension().map(d -> ", like \"" + d.example(Units.METRIC) + "\"").orElse(
            field.choices().isEmpty() ? "" : ", one of " + String.join(", ", field.choices()));
    }

    private void problem(String path, String text) {
        problems.add(new Problem(path, text));
    }

    /** Foreign text inside a message: on one line, without control characters, not too long. */
    static String clean(String text) {
        String line = text.replaceAll("[\\p{Cc}\\p{Cf}\\u2028\\u2029]", " ");
        return line.length() > 60 ? line.substring(0, 60) + "..." : line;
    }
}
