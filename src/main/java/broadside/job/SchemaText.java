package broadside.job;

import java.util.List;
import java.util.TreeMap;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** JSON Schema (draft 2020-12) of the job file, made from the same declarations that the reader uses. */
public final class SchemaText {

    public static JsonNode of() {
        ObjectNode root = JobText.object();
        root.put("$schema", "https://json-schema.org/draft/2020-12/schema");
        root.put("$id", "urn:broadside:job:1");
        root.put("title", "Broadside job file, version 1");
        object(root, Shapes.JOB);
        ((ObjectNode) root.get("properties").get("broadside")).put("const", 1);
        ObjectNode items = (ObjectNode) root.get("properties").get("items").get("items");
        items.removeAll();
        ArrayNode kinds = items.putArray("oneOf");
        new TreeMap<>(Shapes.KINDS).forEach((kind, shape) -> object(kinds.addObject(), shape));
        return root;
    }

    private static void object(ObjectNode node, Shape shape) {
        node.put("type", "object");
        node.put("additionalProperties", false);
        ObjectNode properties = node.putObject("properties");
        for (Field field : shape.fields()) {
            property(properties.putObject(field.name()), field);
        }
        List<String> needed = shape.fields().stream().filter(Field::required).map(Field::name).toList();
        if (!needed.isEmpty()) {
            ArrayNode required = node.putArray("required");
            needed.forEach(required::add);
        }
    }

    private static void property(ObjectNode node, Field field) {
        node.put("description", field.meaning());
        switch (field.holds()) {
            case TEXT -> type(node, field, "string");
            case QUANTITY -> {
                type(node, field, "string");
                node.put("description", field.meaning() + "; text with its unit, a " + field.dimension().orElseThrow().word());
                node.putArray("examples").add(field.dimension().orElseThrow().example(broadside.quantity.Units.METRIC))
                    .add(field.dimension().orElseThrow().example(broadside.quantity.Units.US));
            }
            case NUMBER -> type(node, field, "number");
            case WHOLE -> type(node, field, "integer");
            case CHOICE -> words(node, field);
            case NUMBER_OR_CHOICE -> {
                ArrayNode any = node.putArray("anyOf");
                any.addObject().put("type", "number");
                words(any.addObject(), field);
                any.addObject().put("type", "null");
            }
            case NUMBER_OR_QUANTITY -> node.putArray("type").add("number").add("string");
            case OBJECT -> {
                if (field.required()) {
                    object(node, field.shape().orElseThrow());
                } else {
                    ArrayNode any = node.putArray("anyOf");
                    object(any.addObject(), field.shape().orElseThrow());
                    any.addObject().put("type", "null");
                }
            }
            case LIST -> {
                type(node, field, "array");
                object(node.putObject("items"), field.shape().orElseThrow());
                if (field.required()) {
                    node.put("minItems", 1);
                }
            }
        }
    }

    /** A field that need not be there may also hold null. */
    private static void type(ObjectNode node, Field field, String type) {
        if (field.required()) {
            node.put("type", type);
        } else {
            node.putArray("type").add(type).add("null");
        }
    }

    private static void words(ObjectNode node, Field field) {
        ArrayNode words = node.putArray("enum");
        field.choices().forEach(words::add);
        if (!field.required()) {
            words.addNull();
        }
    }


    private SchemaText() { }
}
