package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Parts that carry an item as published checks without a job. */
class BallastPartsTest {

    private static PublishedCheck.Line run(String given, String step, String value, String within) {
        String text = ("{ 'title': 'Part', 'source': { 'publication': 'P', 'edition': 'E', 'place': 'p. 1', 'status': 'read' }, 'given': { " + given
            + " }, 'expected': [{ 'step': '" + step + "', 'value': " + value + ", 'within': " + within + ", 'why': 'w' }] }").replace('\'', '"');
        return Jobs.CHECKS.run(Map.of("a.json", text.getBytes(StandardCharsets.UTF_8))).get(0).lines().get(0);
    }

    /** By area two by two at 1 kPa on 2.4 by 1.2 m: 720 N; 40 kg at 0.1 m off the wall: 392.3 x 0.1/1.6 = 24.5 N more. */
    @Test
    void aFacadePanelByArea() {
        String panel = "'part': 'facade-fixings', 'sharing': 'by area', 'suction': '1 kN/m2', 'width': '2.4 m', 'height': '1.2 m', 'mass': '40 kg', 'stand-off': '0.1 m', "
            + "'columns': 2, 'rows': 2, 'horizontal-pitch': '1.8 m', 'vertical-pitch': '0.8 m'";
        assertThat(run(panel, "fixing-tension", "'744.52 N'", "'0.01 N'").passed()).isTrue();
        assertThat(run(panel, "fixing-shear", "'98.07 N'", "'0.01 N'").passed()).isTrue();
        assertThat(run(panel, "fixing-utilisation", "0.5", "0.1").computed()).isEqualTo("the calculation has no step of this name");
    }

    /** 400 Pa x 1.3 on 3 by 2 m: 3120 N at 2 m above the base of 1 m, block 1 x 2 x 1 m of 2400 kg/m3: 23536/6240. */
    @Test
    void aBlockInTheGround() {
        String block = "'part': 'block-footing', 'pressure': '400 Pa', 'coefficient': 1.3, 'panel-width': '3 m', 'panel-height': '2 m', 'width': '1 m', 'length': '2 m', "
            + "'depth': '1 m', 'density': '2400 kg/m3', 'rule': 'factor-1.5'";
        assertThat(run(block, "overturning-ratio", "3.7718", "0.0001").passed()).isTrue();
        assertThat(run(block, "utilisation/overturning", "0.39769", "0.00001").passed()).isTrue();
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', quoteCharacter = '~', value = {
        "'part': 'bolt-group', 'vertical': '1 kN';bolts: a list of places",
        "'part': 'bolt-group', 'bolts': [{ 'x': '7', 'y': '1 m' }];x: a length is typed with its unit",
        "'part': 'bolt-group', 'bolts': [{ 'x': '1 m', 'y': '1 m' }], 'vertical': '1 kN', 'vertical-arm': '1 m';fixings in one place take no moment",
        "'part': 'stay', 'force': '1000 lbf', 'angle': '90 deg';stay.angle: the angle of a stay",
        "'part': 'stay', 'force': '1000 kg', 'angle': '45 deg';force: a force is typed with its unit",
        "'part': 'frame-ballast', 'friction': '0.4';friction: a plain number",
        "'part': 'facade-fixings';sharing is ~equal~",
        "'part': 'facade-fixings', 'sharing': 'equal', 'columns': 1.5;columns: a whole number",
        "'part': 'block-footing', 'pressure': '400 Pa', 'coefficient': 1.3, 'panel-width': '3 m', 'panel-height': '2 m', 'width': '1 m', 'length': '2 m', 'depth': '1 m', "
            + "'density': '2400 kg/m3', 'rule': 'safe';basis.stability: ~safe~ is not a rule of stability",
        "'part': 'edge-pull', 'pressure': '400 Pa', 'width': '3 m', 'height': '2 m', 'sag': '0 m';sag: a banner that does not sag"})
    void aPartThatDoesNotFitFailsWithTheReason(String given, String reason) {
        PublishedCheck.Line line = run(given, "fixing-shear", "'1 N'", "'1 N'");
        assertThat(line.passed()).isFalse();
        assertThat(line.computed()).contains(reason.replace('~', '"'));
    }
}
