package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a crew is told, as published checks without a job. */
class CrewPartsTest {

    private static PublishedCheck.Line run(String given, String step, String value, String within) {
        String text = ("{ 'title': 'Part', 'source': { 'publication': 'P', 'edition': 'E', 'place': 'p. 1', 'status': 'read' }, 'given': { " + given
            + " }, 'expected': [{ 'step': '" + step + "', 'value': " + value + ", 'within': " + within + ", 'why': 'w' }] }").replace('\'', '"');
        return Jobs.CHECKS.run(Map.of("a.json", text.getBytes(StandardCharsets.UTF_8))).get(0).lines().get(0);
    }

    /**
     * Limit 20 m/s, 30 min, 10 m/s in an hour, sheets held to 10 m/s: 10 - 5; edge on 0.5 x 1.2 x 100 x 0.08 x 2 = 9.6 N;
     * four people on 2 m2: 2 x (100/1.38)^0.5.
     */
    @ParameterizedTest
    @CsvSource(delimiter = ';', quoteCharacter = '~', value = {
        "'part': 'action-levels', 'limit': '20 m/s', 'act-minutes': 30, 'work-limit': '10 m/s';start/act;'5 m/s';'0.001 m/s'",
        "'part': 'action-levels', 'limit': '20 m/s', 'act-minutes': 30, 'rise-in-an-hour': '36 km/h';start/act;'13 m/s';'0.001 m/s'",
        "'part': 'action-levels', 'limit': '20 m/s', 'act-minutes': 5, 'weather': 'thunderstorm';start/clear;'5 m/s';'0.001 m/s'",
        "'part': 'action-levels', 'limit': '20 m/s', 'share-of': 'load';level/prepare;'15.4919 m/s';'0.0001 m/s'",
        "'part': 'action-levels', 'limit': '20 m/s', 'share-of': 'speed';level/prepare;'12 m/s';'0.0001 m/s'",
        "'part': 'handling', 'width': '2 m', 'height': '1 m', 'speed': '10 m/s', 'angle': '0 deg';sheet-force;'9.6 N';'0.0001 N'",
        "'part': 'handling', 'width': '2 m', 'height': '1 m', 'speed': '10 m/s', 'angle': '90 deg';sheet-force;'138 N';'0.0001 N'",
        "'part': 'handling', 'width': '2 m', 'height': '1 m';handling-speed/4;'17.0251 m/s';'0.0001 m/s'",
        "'part': 'handling', 'width': '2 m', 'height': '1 m', 'people': 4;handling-speed/4;'17.0251 m/s';'0.0001 m/s'",
        "'part': 'person-in-wind', 'speed': '15 m/s';person-force;'113.4 N';'0.001 N'",
        "'part': 'crane-wind', 'mass': '3 t', 'area': '3 m2', 'drag-coefficient': 1.2, 'chart-speed': '9 m/s', 'standard': true;speed;'9 m/s';'0 m/s'"})
    void aPart(String given, String step, String value, String within) {
        PublishedCheck.Line line = run(given, step, value, within);
        assertThat(line.passed()).as(line.toString()).isTrue();
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', quoteCharacter = '~', value = {
        "'part': 'action-levels', 'limit': '20';limit: a speed",
        "'part': 'action-levels', 'limit': '20 m/s', 'share-of': 'wind';share-of is",
        "'part': 'action-levels', 'limit': '20 m/s', 'clear-minutes': 5;times.act: how long it takes",
        "'part': 'action-levels', 'limit': '20 m/s', 'act-minutes': '5';act-minutes: a plain number",
        "'part': 'evacuation-class', 'class': 'denmark-2', 'air-density': '1.25 kg/m3';pressure: this class is never cleared",
        "'part': 'handling', 'width': '2 m', 'height': '1 m', 'people': 0;people: at least one",
        "'part': 'handling', 'width': '2 m', 'height': '1 m', 'people': 1.5;people: a whole number",
        "'part': 'published-limit', 'limit': 'alerts';limit: this source prints no number",
        "'part': 'crane-wind', 'mass': '50 kg', 'area': '3 m2', 'drag-coefficient': 1.2, 'chart-speed': '9 m/s', 'standard': true;"
            + "standard: this is no standard load",
        "'part': 'crane-wind', 'mass': '50 kg', 'area': '3 m2', 'chart-speed': '9 m/s';drag-coefficient: a plain number",
        "'part': 'crane-wind', 'mass': '50 kg', 'area': '3 m2', 'shape': 'sheet', 'chart-speed': '9 m/s';shape: this shape has no"})
    void aPartThatCannotBeWorkedOut(String given, String problem) {
        assertThat(run(given, "speed", "1", "1").computed()).startsWith(problem);
    }
}
