package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Basic pressure of 24 m/s at 1.25 kg/m3 is 360 Pa: what passes, what fails, and what is no check. */
class PublishedChecksTest {

    private static final String SPEED = """
        { "title": "Speed", "source": { "publication": "P", "edition": "E", "place": "p. 1", "status": "read" },
          "given": { "part": "convert-speed", "speed": "80 mph", "from": "fastest mile", "to": "3 s gust", "terrain": "open" },
          "expected": [{ "step": "speed", "value": "95.6 mph", "within": "0.05 mph", "why": "rounded" }] }
        """;

    private static String job(String expected, String more) {
        return "{ \"title\": \"Check\", \"source\": { \"publication\": \"P\", \"edition\": \"E\", \"place\": \"p. 1\", \"status\": \"read\" }, " + more
            + "\"given\": " + Jobs.text(Jobs.HOARDING) + ", \"expected\": [" + expected + "] }";
    }

    private static String expected(String item, String step, String value, String within) {
        return "{ \"item\": \"" + item + "\", \"step\": \"" + step + "\", \"value\": " + value + ", \"within\": " + within + ", \"why\": \"w\" }";
    }

    private static PublishedCheck run(String text) {
        List<PublishedCheck> checks = Jobs.CHECKS.run(Map.of("a.json", text.getBytes(StandardCharsets.UTF_8)));
        assertThat(checks).hasSize(1);
        return checks.get(0);
    }

    private static PublishedCheck.Line line(String value, String within, String more) {
        return run(job(expected("H1", "basic-velocity-pressure/stretch-1", value, within), more)).lines().get(0);
    }

    @ParameterizedTest
    @CsvSource({
        "360 Pa, 0.001 Pa, true", "0.36 kN/m2, 0.0001 kN/m2, true", "0.36 kN/m2, 0.1 Pa, true", "361 Pa, 1 Pa, true", "361 Pa, 0.99 Pa, false",
        "359 Pa, 1 Pa, true", "359 Pa, 0.99 Pa, false", "363.6 Pa, 1 %, true", "363.7 Pa, 1 %, false", "356.5 Pa, 1 %, true", "356.3 Pa, 1 %, false",
        "400 Pa, 10 %, true", "400 Pa, 9.99 %, false", "7.52 psf, 0.01 psf, true", "7.6 psf, 0.01 psf, false"})
    void aValueWithinItsTolerancePassesAndATrapFails(String value, String within, boolean near) {
        assertThat(line("\"" + value + "\"", "\"" + within + "\"", "").passed()).isEqualTo(near);
        assertThat(line("\"" + value + "\"", "\"" + within + "\"", "\"trap\": true, ").passed()).isEqualTo(!near);
        assertThat(line("\"" + value + "\"", "\"" + within + "\"", "\"trap\": false, ").passed()).isEqualTo(near);
    }

    @Test
    void aLineTellsPrintedComputedAndDifferenceInThePrintedUnit() {
        PublishedCheck.Line line = line("\"0.40 kN/m2\"", "\"5 %\"", "");
        assertThat(line.item()).isEqualTo("H1");
        assertThat(line.step()).isEqualTo("basic-velocity-pressure/stretch-1");
        assertThat(line.printed()).isEqualTo("0.40 kN/m2");
        assertThat(line.computed()).startsWith("0.36").endsWith(" kN/m2");
        assertThat(line.difference()).startsWith("-0.04").endsWith(" kN/m2");
        assertThat(line.within()).isEqualTo("5 %");
        assertThat(line.why()).isEqualTo("w");
        assertThat(line.passed()).isFalse();
    }

    @Test
    void aPlainNumberHasAPlainTolerance() {
        assertThat(run(job(expected("H1", "coefficient/A/stretch-1", "2.1", "0.001"), "")).passed()).isTrue();
        assertThat(run(job(expected("H1", "coefficient/A/stretch-1", "2.2", "0.09"), "")).passed()).isFalse();
        assertThat(run(job(expected("H1", "coefficient/A/stretch-1", "2.15", "\"3 %\""), "")).passed()).isTrue();
        assertThat(run(job(expected("H1", "coefficient/A/stretch-1", "2.2", "\"0.2 m\""), "")).passed()).isFalse();
    }

    @Test
    void oneWrongLineFailsTheCheck() {
        String right = expected("H1", "basic-velocity-pressure/stretch-1", "\"360 Pa\"", "\"1 Pa\"");
        String wrong = expected("H1", "basic-velocity-pressure/stretch-1", "\"370 Pa\"", "\"1 Pa\"");
        assertThat(run(job(right, "")).passed()).isTrue();
        assertThat(run(job(right + ", " + wrong, "")).passed()).isFalse();
        assertThat(run(job(right + ", " + wrong, "\"trap\": true, ")).passed()).as("every line of a trap must differ").isFalse();
    }

    static Stream<Arguments> mismatches() {
        return Stream.of(
            Arguments.of("360", "1", "the printed value is a plain number, but the step is in Pa"),
            Arguments.of("\"360 kg\"", "1", "\"360 kg\" is a mass; a pressure is typed like"),
            Arguments.of("\"360\"", "1", "\"360\" has no unit"),
            Arguments.of("true", "1", "the printed value must be a number or text with its unit"),
            Arguments.of("null", "1", "the printed value must be a number or text with its unit"),
            Arguments.of("\"360 Pa\"", "\"1 kg\"", "within \"1 kg\" must be an amount not below zero in the form of the value, or a percentage"),
            Arguments.of("\"360 Pa\"", "\"\"", "within \"\" must be an amount not below zero in the form of the value, or a percentage"),
            Arguments.of("\"360 Pa\"", "\"much\"", "within \"much\" must be an amount"),
            Arguments.of("\"360 Pa\"", "-1", "must be an amount not below zero"),
            Arguments.of("\"360 Pa\"", "\"x %\"", "within \"x %\" is not a percentage like \"0.5 %\""),
            Arguments.of("\"360 Pa\"", "\"-1 %\"", "within \"-1 %\" is not a percentage like \"0.5 %\""));
    }

    @ParameterizedTest
    @MethodSource("mismatches")
    void whatCannotBeComparedFailsWithTheReasonAlsoAsATrap(String value, String within, String reason) {
        for (String more : List.of("", "\"trap\": true, ")) {
            PublishedCheck.Line line = line(value, within, more);
            assertThat(line.passed()).isFalse();
            assertThat(line.computed()).contains(reason);
            assertThat(line.difference()).isEqualTo("-");
        }
    }

    @Test
    void anItemOrStepThatIsNotThereFailsAlsoAsATrap() {
        for (String more : List.of("", "\"trap\": true, ")) {
            PublishedCheck mark = run(job(expected("H2", "velocity-pressure", "\"360 Pa\"", "\"1 Pa\""), more));
            assertThat(mark.lines().get(0).computed()).isEqualTo("no item has the mark \"H2\"");
            PublishedCheck step = run(job(expected("H1", "velocity-presure", "\"360 Pa\"", "\"1 Pa\""), more));
            assertThat(step.lines().get(0).computed()).isEqualTo("the calculation has no step of this name");
            assertThat(mark.passed() || step.passed()).isFalse();
        }
    }

    @Test
    void aJobThatDoesNotFitFailsWithItsProblem() {
        String text = job(expected("H1", "velocity-pressure", "\"360 Pa\"", "\"1 Pa\""), "").replace("\"terrain\": \"II\"", "\"terrain\": \"C\"");
        assertThat(run(text).passed()).isFalse();
        assertThat(run(text).lines().get(0).computed()).startsWith("site.terrain: \"C\" is not a terrain class");
    }

    @Test
    void anItemThatIsNotCoveredFailsWithTheReason() {
        String text = job(expected("H1", "base-moment/wall", "\"360 kN m\"", "\"1 kN m\""), "").replace("\"height\": \"2.4 m\"", "\"height\": \"250 m\"");
        assertThat(run(text).lines().get(0).computed()).startsWith("the mean wind profile ends at 200 m");
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {"'';the file is empty", "'{';this is not JSON", "'[]';a published check has title", "'{}';a published check has title",
        "'5';a published check has title", "'{\"title\": \"a\", \"title\": \"b\"}';the key \"title\" stands twice"})
    void aBrokenFileFails(String text, String reason) {
        PublishedCheck check = run(text);
        assertThat(check.passed()).isFalse();
        assertThat(check.file()).isEqualTo("a.json");
        assertThat(check.lines().get(0).computed()).contains(reason);
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {"\"title\": \"Speed\", ;''", "\"status\": \"read\";\"status\": \"seen\"", "\"status\": \"read\";\"status\": \"given\"", ", \"status\": \"read\";''", "\"given\";\"gegeben\"",
        "\"expected\": [{;\"expected\": [], \"more\": [{"})
    void aCheckHasAllItsParts(String old, String other) {
        assertThat(SPEED).contains(old);
        PublishedCheck check = run(SPEED.replace(old, other));
        assertThat(check.passed()).isFalse();
        assertThat(check.lines().get(0).computed()).isEqualTo("a published check has title, source with a status, given and a list of expected values");
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {"\"80 mph\";\"80 kg\";a speed above zero is typed with its unit", "\"80 mph\";\"0 mph\";a speed above zero", "\"80 mph\";80;a speed above zero is typed with its unit",
        "\"open\";\"suburban\";the conversion holds for \"open\" only", "\"3 s gust\";\"3 sec\";is none of fastest mile, 0.2 s gust",
        "\"fastest mile\";\"gust\";from \"gust\" is none of", "\"3 s gust\";\"0.2 s gust\";covers t from 1 to 3600; this case has 0.2",
        "convert-speed;convert;it knows convert-speed"})
    void aPartThatDoesNotFitFailsWithTheReason(String old, String other, String reason) {
        assertThat(run(SPEED).passed()).isTrue();
        assertThat(SPEED).contains(old);
        assertThat(run(SPEED.replace(old, other)).passed()).isFalse();
        assertThat(run(SPEED.replace(old, other)).lines().get(0).computed()).contains(reason);
    }

    @Test
    void otherFilesAreLeftOutAndTheOrderIsThatOfTheNames() {
        byte[] speed = SPEED.getBytes(StandardCharsets.UTF_8);
        assertThat(Jobs.CHECKS.run(new TreeMap<>(Map.of("b.json", speed, "a.json", speed, "readme.txt", speed))))
            .extracting(PublishedCheck::file).containsExactly("a.json", "b.json");
        assertThat(Jobs.CHECKS.run(Map.of())).isEmpty();
    }

    @Test
    void allThatShipPassAndEachTrapIsMarked() {
        List<PublishedCheck> shipped = Jobs.CHECKS.shipped();
        assertThat(shipped).hasSizeGreaterThan(100).allSatisfy(c -> assertThat(c.passed()).as(c.file()).isTrue());
        assertThat(shipped).filteredOn(PublishedCheck::trap).isNotEmpty().allSatisfy(c -> assertThat(c.title()).isNotBlank());
        assertThat(shipped).allSatisfy(c -> assertThat(c.lines()).isNotEmpty().allSatisfy(l -> assertThat(l.why()).isNotBlank()));
        assertThat(shipped).allSatisfy(c -> assertThat(Jobs.TABLES.publication(c.source().publication())).as(c.file()).isPresent());
    }
}
