package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.Problem;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Text that is no JSON, or more than JSON, is refused in one line; nothing else is thrown. */
class JobTextTest {

    private static String only(byte[] bytes) {
        List<Problem> problems = Jobs.problems(bytes);
        assertThat(problems).hasSize(1);
        assertThat(problems.get(0).path()).isEmpty();
        assertThat(problems.get(0).line()).doesNotContain("\n").hasSizeLessThan(260);
        return problems.get(0).line();
    }

    private static String only(String text) {
        return only(text.getBytes(StandardCharsets.UTF_8));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "\n\n", "\t"})
    void anEmptyFileIsNamed(String text) {
        assertThat(only(text)).isEqualTo("the file is empty; a job file is JSON that begins with {");
    }

    @Test
    void aKeyThatStandsTwiceIsNamedWithLineAndColumn() {
        String text = "{\n  \"broadside\": 1,\n  \"title\": \"a\",\n  \"title\": \"b\"\n}";
        assertThat(only(text)).matches("line 4, column \\d+: the key \"title\" stands twice");
    }

    @Test
    void aKeyThatStandsTwiceDeepInsideIsNamed() {
        assertThat(only(Jobs.changed(Jobs.SIGN, "\"width\": \"3 m\",", "\"width\": \"3 m\",\n\"width\": \"4 m\",")))
            .matches("line \\d+, column \\d+: the key \"width\" stands twice");
    }

    @ParameterizedTest
    @ValueSource(strings = {"hello", "{", "{\"a\":}", "{\"a\" 1}", "{'a': 1}", "{\"a\": 1,}", "{\"a\": 01}", "{\"a\": .5}", "{\"a\": 0x1}", "{\"a\": +1}",
        "{a: 1}", "// x\n{}", "{\"a\": tru}", "]", "\u0000"})
    void whatIsNotJsonIsNamedWithItsPlace(String text) {
        assertThat(only(text)).matches("line \\d+, column \\d+: this is not JSON: .+");
    }

    @ParameterizedTest
    @ValueSource(strings = {"NaN", "-Infinity", "Infinity", "1e", "1.", "--1"})
    void whatIsNoNumberIsNoJson(String number) {
        assertThat(only(Jobs.changed(Jobs.SIGN, "\"solidity\": 1.0", "\"solidity\": " + number))).matches("line \\d+, column \\d+: this is not JSON: .+");
    }

    @ParameterizedTest
    @ValueSource(strings = {"x", "{}", ",", "}", "1", "\"\""})
    void textBehindTheJsonIsRefused(String more) {
        assertThat(only(Jobs.text(Jobs.SIGN) + more)).matches("line \\d+, column \\d+: this is not JSON: .+");
    }

    @Test
    void lineEndsBehindTheJsonAreNothing() {
        assertThat(Jobs.problems(Jobs.text(Jobs.SIGN) + " \r\n\n\t")).isEmpty();
        assertThat(Jobs.problems("\uFEFF" + Jobs.text(Jobs.SIGN))).as("a byte order mark before it").isEmpty();
        assertThat(Jobs.problems(Jobs.text(Jobs.SIGN).replace("\n", "\r\n"))).isEmpty();
    }

    @Test
    void deepNestingIsRefused() {
        assertThat(only("[".repeat(100_000))).isEqualTo("objects are nested too deep for a job file");
        assertThat(only("{\"a\":".repeat(31) + "1" + "}".repeat(31))).contains("nested too deep");
        assertThat(Jobs.problems("{\"a\":".repeat(30) + "1" + "}".repeat(30))).extracting(Problem::path).contains("a");
    }

    @Test
    void longNumbersAreRefused() {
        assertThat(only("{\"a\": 1" + "0".repeat(60) + "}")).contains("too long for a job file");
    }

    @Test
    void aFileOfTwoMegabytesIsRefused() {
        assertThat(only("{\"title\": \"" + "x".repeat(2_000_000) + "\"}")).isEqualTo("the file has 2000013 bytes; a job file has at most 1048576");
    }

    @Test
    void bytesThatAreNotUtf8AreRefused() {
        assertThat(only(Jobs.text(Jobs.SIGN).replace("Larkmoor", "L\u00e4rkmoor").getBytes(StandardCharsets.ISO_8859_1)))
            .matches("line \\d+, column \\d+: this is not JSON: .+");
    }

    @ParameterizedTest
    @ValueSource(strings = {"[]", "5", "\"x\"", "null", "true"})
    void jsonThatIsNoObjectIsNoJob(String text) {
        assertThat(only(text)).startsWith("must be an object with the keys broadside, title, ");
    }

    @Test
    void anEmptyObjectLacksEveryNeededKey() {
        assertThat(Jobs.problems("{}")).extracting(Problem::path).containsExactlyInAnyOrder("broadside", "basis", "site", "items");
    }

    @Test
    void writtenTextIsReadBackAlike() {
        Jobs.all().forEach((name, bytes) -> {
            byte[] once = JobText.write(JobText.read(bytes));
            assertThat(JobText.read(once)).as(name).isEqualTo(JobText.read(bytes));
            assertThat(JobText.write(JobText.read(once))).isEqualTo(once);
            assertThat(new String(once, StandardCharsets.UTF_8)).endsWith("}\n");
        });
    }
}
