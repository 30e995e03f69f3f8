package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tools.jackson.databind.JsonNode;

/** The schema knows the same keys and kinds of value as the reader. */
class SchemaTest {

    private static final SchemaRegistry REGISTRY = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
    private static final Schema SCHEMA = REGISTRY.getSchema(new String(JobText.write(SchemaText.of()), StandardCharsets.UTF_8), InputFormat.JSON);

    private static List<String> errors(String text) {
        return SCHEMA.validate(text, InputFormat.JSON).stream().map(Object::toString).toList();
    }

    @Test
    void itIsASchemaOfItsDraft() {
        Schema meta = REGISTRY.getSchema(com.networknt.schema.SchemaLocation.of("https://json-schema.org/draft/2020-12/schema"));
        assertThat(meta.validate(new String(JobText.write(SchemaText.of()), StandardCharsets.UTF_8), InputFormat.JSON)).isEmpty();
        assertThat(SchemaText.of().get("$schema").stringValue()).isEqualTo("https://json-schema.org/draft/2020-12/schema");
    }

    static Stream<String> examples() {
        return Jobs.all().keySet().stream();
    }

    @ParameterizedTest
    @MethodSource("examples")
    void everyExampleFits(String name) {
        assertThat(errors(Jobs.text(name))).isEmpty();
    }

    static Stream<Arguments> broken() {
        String width = "\"width\": \"3 m\"";
        return Stream.of(
            Arguments.of(width, "\"width\": \"3 m\", \"widht\": \"3 m\""), Arguments.of(width + ",", ""), Arguments.of(width, "\"width\": 3"),
            Arguments.of(width, "\"width\": null"), Arguments.of(width, "\"width\": [\"3 m\"]"),
            Arguments.of("\"solidity\": 1.0", "\"solidity\": \"1\""), Arguments.of("\"shape\": \"rectangle\"", "\"shape\": \"oval\""),
            Arguments.of("\"count\": 2", "\"count\": 2.5"), Arguments.of("\"count\": 2", "\"count\": \"2\""), Arguments.of("\"count\": 2,", ""),
            Arguments.of("\"mark\": \"S1\",", ""), Arguments.of("\"kind\": \"post-sign\"", "\"kind\": \"tower\""),
            Arguments.of("\"kind\": \"post-sign\",", ""), Arguments.of("\"broadside\": 1", "\"broadside\": 2"),
            Arguments.of("\"broadside\": 1,", ""), Arguments.of("\"broadside\": 1", "\"broadside\": \"1\""),
            Arguments.of("\"title\":", "\"units\": \"imperial\", \"title\":"), Arguments.of("\"title\": \"Larkmoor Retail Park, entrance sign\"", "\"title\": 5"),
            Arguments.of("\"averaging\": \"10 min mean\"", "\"averaging\": \"10 min\""), Arguments.of("\"feature\": \"escarpment\"", "\"feature\": \"cliff\""),
            Arguments.of("\"terrain\": \"II\",", ""), Arguments.of("\"terrain\": \"II\"", "\"terrain\": 2"),
            Arguments.of("\"posts\": {", "\"posts\": [], \"replaces\": {"), Arguments.of("\"footing\": {", "\"footing\": { \"colour\": \"red\", "),
            Arguments.of("\"broadside\": 1,", "\"broadside\": 1, \"overrides\": [{ \"name\": \"a\", \"value\": 1 }],"),
            Arguments.of("\"broadside\": 1,", "\"broadside\": 1, \"overrides\": [{ \"name\": \"a\", \"value\": true, \"reason\": \"r\" }],"),
            Arguments.of("\"terrain\": \"II\"", "\"terrain\": \"II\", \"gust-factor\": \"auto\""),
            Arguments.of("\"items\": [", "\"items\": [5,"), Arguments.of("\"items\": [", "\"items\": [], \"things\": ["));
    }

    @ParameterizedTest
    @MethodSource("broken")
    void aBrokenJobIsRefusedBySchemaAndReaderAlike(String old, String other) {
        String text = Jobs.changed(Jobs.SIGN, old, other);
        assertThat(errors(text)).as("schema").isNotEmpty();
        assertThat(Jobs.READER.read(Jobs.json(text)).problems()).as("reader").isNotEmpty();
    }

    static Stream<Arguments> loose() {
        return Stream.of(Arguments.of("\"overlay\": null,", ""), Arguments.of("\"shape\": \"rectangle\"", "\"shape\": null"),
            Arguments.of("\"solidity\": 1.0", "\"solidity\": null"), Arguments.of("\"topography\": {", "\"topography\": null, \"unused\": {"),
            Arguments.of("\"count\": 2,", "\"count\": 2.0,"), Arguments.of("\"broadside\": 1,", "\"broadside\": 1.0,"),
            Arguments.of("\"broadside\": 1,", "\"broadside\": 1, \"overrides\": null, \"units\": null, \"applicant\": null,"),
            Arguments.of("\"broadside\": 1,", "\"broadside\": 1, \"overrides\": [],"),
            Arguments.of("\"kind\": \"post-sign\",", "\"kind\": \"post-sign\", \"faces\": null, \"replaces\": null,"));
    }

    @ParameterizedTest
    @MethodSource("loose")
    void whatTheReaderLetsPassTheSchemaLetsPass(String old, String other) {
        String text = Jobs.changed(Jobs.SIGN, old, other).replaceFirst(", \"unused\": \\{[^}]*}", "");
        assertThat(Jobs.READER.read(Jobs.json(text)).problems()).as("reader").isEmpty();
        assertThat(errors(text)).as("schema").isEmpty();
    }

    @Test
    void everyKeyOfTheReaderIsInTheSchemaWithItsMeaning() {
        JsonNode schema = SchemaText.of();
        same(Shapes.JOB, schema);
        JsonNode kinds = schema.get("properties").get("items").get("items").get("oneOf");
        assertThat(kinds.size()).isEqualTo(Shapes.KINDS.size());
        for (JsonNode kind : kinds) {
            same(Shapes.KINDS.get(kind.get("properties").get("kind").get("enum").get(0).stringValue()), kind);
        }
    }

    private static void same(Shape shape, JsonNode node) {
        assertThat(node.get("additionalProperties").booleanValue()).isFalse();
        assertThat(node.get("properties").propertyNames()).containsExactlyElementsOf(shape.fields().stream().map(Field::name).toList());
        for (Field field : shape.fields()) {
            JsonNode property = node.get("properties").get(field.name());
            assertThat(property.get("description").stringValue()).startsWith(field.meaning());
            boolean required = node.has("required") && node.get("required").valueStream().anyMatch(r -> r.stringValue().equals(field.name()));
            assertThat(required).as(field.name()).isEqualTo(field.required());
        }
    }
}
