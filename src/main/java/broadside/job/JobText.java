package broadside.job;

import broadside.assess.BadJob;
import broadside.assess.Problem;
import java.io.ByteArrayOutputStream;
import java.util.List;
import java.util.Map;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.PrettyPrinter;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.StreamReadFeature;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.util.DefaultPrettyPrinter;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/**
 * JSON text in and out, strict, for job files, results and published checks. The streams of the library are used without
 * its object mapper, whose start takes longer than the assessment of a job.
 */
public final class JobText {

    /** Largest job file, in bytes. */
    public static final int LARGEST = 1 << 20;

    private static final JsonFactory FACTORY = JsonFactory.builder()
        .streamReadConstraints(StreamReadConstraints.builder().maxNestingDepth(30).maxNumberLength(60).maxNameLength(200)
            .maxStringLength(20_000).build())
        .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION).build();

    private static final ObjectWriteContext INDENTED = new ObjectWriteContext.Base() {
        @Override
        public PrettyPrinter getPrettyPrinter() {
            return new DefaultPrettyPrinter();
        }

        @Override
        public boolean hasPrettyPrinter() {
            return true;
        }
    };

    /**
     * Reads JSON text.
     *
     * @throws BadJob with the line and column where the text stops being JSON
     */
    public static JsonNode read(byte[] bytes) {
        if (bytes.length > LARGEST) {
            throw bad("the file has " + bytes.length + " bytes; a job file has at most " + LARGEST);
        }
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), bytes)) {
            JsonToken first = parser.nextToken();
            if (first == null) {
                throw bad("the file is empty; a job file is JSON that begins with {");
            }
            JsonNode node = value(parser, first);
            if (parser.nextToken() != null) {
                throw bad("line " + parser.currentTokenLocation().getLineNr() + ", column " + parser.currentTokenLocation().getColumnNr()
                    + ": this is not JSON: something stands after its end");
            }
            return node;
        } catch (JacksonException e) {
            String where = e.getLocation() == null || e.getLocation().getLineNr() < 1 ? ""
                : "line " + e.getLocation().getLineNr() + ", column " + e.getLocation().getColumnNr() + ": ";
            throw bad(where + plain(e.getOriginalMessage()));
        }
    }

    private static JsonNode value(JsonParser parser, JsonToken token) {
        JsonNodeFactory make = JsonNodeFactory.instance;
        return switch (token) {
            case START_OBJECT -> {
                ObjectNode object = make.objectNode();
                for (String name = parser.nextName(); name != null; name = parser.nextName()) {
                    object.set(name, value(parser, parser.nextToken()));
                }
                yield object;
            }
            case START_ARRAY -> {
                ArrayNode array = make.arrayNode();
                for (JsonToken next = parser.nextToken(); next != JsonToken.END_ARRAY; next = parser.nextToken()) {
                    array.add(value(parser, next));
                }
                yield array;
            }
            case VALUE_STRING -> make.stringNode(parser.getString());
            case VALUE_NUMBER_INT -> parser.getString().length() < 10 ? make.numberNode(parser.getIntValue()) : make.numberNode(parser.getDoubleValue());
            case VALUE_NUMBER_FLOAT -> make.numberNode(parser.getDoubleValue());
            case VALUE_TRUE -> make.booleanNode(true);
            case VALUE_FALSE -> make.booleanNode(false);
            default -> make.nullNode();
        };
    }

    /** JSON text, indented, UTF-8, with a line end at its end. */
    public static byte[] write(JsonNode node) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (JsonGenerator generator = FACTORY.createGenerator(INDENTED, out)) {
            write(node, generator);
        }
        out.write('\n');
        return out.toByteArray();
    }

    private static void write(JsonNode node, JsonGenerator generator) {
        if (node.isObject()) {
            generator.writeStartObject();
            for (Map.Entry<String, JsonNode> entry : node.properties()) {
                generator.writeName(entry.getKey());
                write(entry.getValue(), generator);
            }
            generator.writeEndObject();
        } else if (node.isArray()) {
            generator.writeStartArray();
            node.forEach(each -> write(each, generator));
            generator.writeEndArray();
        } else if (node.isString()) {
            generator.writeString(node.stringValue());
        } else if (node.isInt()) {
            generator.writeNumber(node.intValue());
        } else if (node.isNumber()) {
            generator.writeNumber(node.doubleValue());
        } else if (node.isBoolean()) {
            generator.writeBoolean(node.booleanValue());
        } else {
            generator.writeNull();
        }
    }

    /** An empty object. */
    static ObjectNode object() {
        return JsonNodeFactory.instance.objectNode();
    }

    private static BadJob bad(String problem) {
        return new BadJob(List.of(new Problem("", problem)));
    }

    /** The parser's message without the names of its own parts. */
    private static String plain(String message) {
        String first = message.lines().findFirst().orElse("").strip();
        if (first.startsWith("Duplicate")) {
            return first.replace("Duplicate Object property", "the key") + " stands twice";
        }
        if (first.contains("nesting depth")) {
            return "objects are nested too deep for a job file";
        }
        if (first.contains("exceeds the maximum")) {
            return "a text or number is too long for a job file";
        }
        String cut = first.replaceAll("\\s*[(\\[].*$", "").replaceAll(": (expected|was expecting|maybe|enable).*$", "");
        return "this is not JSON" + (cut.isBlank() ? "" : ": " + StructureReader.clean(cut));
    }

    private JobText() { }
}
