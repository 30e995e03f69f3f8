package broadside.job;

import broadside.assess.BadJob;
import broadside.assess.Problem;
import java.nio.charset.StandardCharsets;
import java.util.List;
import tools.jackson.core.JacksonException;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.StreamReadFeature;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.databind.DeserializationFeature;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;

/** JSON text in and out: one strict mapper for job files, results and published checks. */
public final class JobText {

    /** Largest job file, in bytes. */
    public static final int LARGEST = 1 << 20;

    private static final JsonMapper MAPPER = JsonMapper.builder(JsonFactory.builder()
            .streamReadConstraints(StreamReadConstraints.builder().maxNestingDepth(30).maxNumberLength(60).maxNameLength(200)
                .maxStringLength(20_000).build())
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION).build())
        .enable(SerializationFeature.INDENT_OUTPUT)
        .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
        .build();

    /**
     * Reads JSON text.
     *
     * @throws BadJob with the line and column where the text stops being JSON
     */
    public static JsonNode read(byte[] bytes) {
        if (bytes.length > LARGEST) {
            throw new BadJob(List.of(new Problem("", "the file has " + bytes.length + " bytes; a job file has at most " + LARGEST)));
        }
        try {
            JsonNode node = MAPPER.readTree(bytes);
            if (node == null || node.isMissingNode()) {
                throw new BadJob(List.of(new Problem("", "the file is empty; a job file is JSON that begins with {")));
            }
            return node;
        } catch (JacksonException e) {
            String where = e.getLocation() == null || e.getLocation().getLineNr() < 1 ? ""
                : "line " + e.getLocation().getLineNr() + ", column " + e.getLocation().getColumnNr() + ": ";
            throw new BadJob(List.of(new Problem("", where + plain(e.getOriginalMessage()))));
        }
    }

    /** JSON text, indented, UTF-8, with a line end at its end. */
    public static byte[] write(JsonNode node) {
        return (MAPPER.writeValueAsString(node) + "\n").getBytes(StandardCharsets.UTF_8);
    }

    static JsonMapper mapper() {
        return MAPPER;
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
        String cut = first.replaceAll("\\s*[(\\[].*$", "").replaceAll(": (expected|was expecting|maybe).*$", "");
        return "this is not JSON" + (cut.isBlank() ? "" : ": " + StructureReader.clean(cut));
    }

    private JobText() { }
}
