package broadside.codes;

import static broadside.codes.OpenFlowJobs.hoarding;
import static broadside.codes.OpenFlowJobs.result;
import static broadside.codes.OpenFlowJobs.sign;
import static broadside.codes.OpenFlowJobs.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Air and wind by plain fluid mechanics, and what it does not cover. */
class OpenFlowWindTest {

    private static ItemResult at(String clearance, String terrain, String more) {
        return result("30 m/s", terrain, more, sign("1 m", "1 m", clearance, 1));
    }

    @ParameterizedTest
    @CsvSource({"0.0002 m", "0.05 m", "0.3 m", "1 m"})
    void atTenMetresTheGustIsTheOneGiven(String terrain) {
        assertThat(value(at("9.5 m", terrain, ""), "site-speed")).isEqualTo(30);
    }

    /** Below 2 m, and below four roughness lengths, the profile is not used: 1 m over 0.05 m counts as 2 m, over 1 m as 4 m. */
    @ParameterizedTest
    @CsvSource({"0.5 m, 0.05 m, 2", "0.5 m, 0.5 m, 2", "0.5 m, 1 m, 4", "4.5 m, 1 m, 5"})
    void theProfileHasALowestHeight(String clearance, String terrain, double height) {
        assertThat(value(at(clearance, terrain, ""), "profile-height")).isEqualTo(height);
    }

    @Test
    void theGustFallsLessThanTheMean() {
        ItemResult item = at("2.5 m", "0.03 m", "");
        assertThat(value(item, "height-ratio")).isCloseTo(0.86, within(0.005));
        assertThat(value(item, "mean-speed") * value(item, "gust-factor")).isCloseTo(value(item, "site-speed"), within(1e-9));
    }

    /** 1000 m: T = 281.65 K, p = 101325 (281.65/288.15)^5.2559 = 89 873 Pa, 1.1116 kg/m3. */
    @Test
    void airByAltitude() {
        ItemResult item = at("2 m", "0.05 m", ",\"altitude\":\"1000 m\"");
        assertThat(value(item, "air-temperature")).isCloseTo(281.65, within(1e-9));
        assertThat(value(item, "air-pressure")).isCloseTo(89873, within(3.0));
        assertThat(value(item, "air-density")).isCloseTo(1.1116, within(0.0001));
        assertThat(item.notes()).noneMatch(n -> n.text().contains("does not change these loads"));
        assertThat(value(at("2 m", "0.05 m", ",\"altitude\":\"0 m\""), "air-density")).isCloseTo(1.225, within(0.00005));
        assertThat(value(at("2 m", "0.05 m", ""), "air-density")).isEqualTo(1.225);
        assertThat(value(at("2 m", "0.05 m", ",\"altitude\":\"1000 m\",\"air-density\":\"1.3 kg/m3\""), "air-density")).isEqualTo(1.3);
    }

    /** Ground that is not known: the smoothest below 10 m, and above it the roughest, where the gust grows more with height. */
    @ParameterizedTest
    @ValueSource(strings = {"1 m", "5 m", "9.5 m", "12 m", "24 m"})
    void groundThatIsNotKnownGivesNoLess(String clearance) {
        double unknown = value(at(clearance, "unknown", ""), "velocity-pressure");
        for (String terrain : new String[] {"0.0002 m", "0.005 m", "0.03 m", "0.1 m", "0.3 m", "0.6 m", "1 m"}) {
            assertThat(value(at(clearance, terrain, ""), "velocity-pressure")).isLessThanOrEqualTo(unknown * (1 + 1e-12));
        }
    }

    private static void refused(ItemResult item, String reason) {
        assertThat(item.outcome()).isEqualTo(ItemResult.Outcome.NOT_COVERED);
        assertThat(item.refusal().orElseThrow().reason()).contains(reason);
        assertThat(item.refusal().orElseThrow().instead()).isNotBlank();
    }

    @Test
    void whatIsNotCovered() {
        refused(at("30 m", "0.05 m", ""), "up to 30 m");
        refused(at("2 m", "1.6 m", ""), "roughness lengths are printed");
        refused(at("2 m", "0.00005 m", ""), "roughness lengths are printed");
        refused(at("2 m", "0.05 m", ",\"ground-nearby\":\"unknown\""), "is not known");
        refused(at("2 m", "0.05 m", ",\"topography\":{\"feature\":\"hill\",\"height\":\"30 m\",\"upwind-length\":\"100 m\",\"distance-from-crest\":\"0 m\"}"),
            "no rule for hills");
        refused(result("1 m/s", "0.05 m", "", sign("1 m", "0.1 m", "2 m", 1)), "Reynolds number");
        refused(result("30 m/s", "0.05 m", "", "{\"mark\":\"P\",\"kind\":\"facade-panel\",\"backing\":\"wall\",\"width\":\"3 m\",\"height\":\"1 m\",\"bottom\":\"3 m\","
            + "\"distance-from-corner\":\"2 m\",\"building\":{\"width\":\"20 m\",\"depth\":\"10 m\",\"height\":\"8 m\"}}"), "flat on the wall");
    }

    /** At the ends of what is covered there is a result. */
    @Test
    void theEndsAreCovered() {
        assertThat(at("29.5 m", "0.05 m", "").outcome()).isEqualTo(ItemResult.Outcome.ASSESSED);
        assertThat(at("2 m", "1 m", "").outcome()).isEqualTo(ItemResult.Outcome.ASSESSED);
        assertThat(at("2 m", "0.0001 m", "").outcome()).isEqualTo(ItemResult.Outcome.ASSESSED);
        assertThat(result("30 m/s", "0.05 m", "", hoarding("60 m", "2.4 m", "0 m")).outcome()).isEqualTo(ItemResult.Outcome.ASSESSED);
    }

    /** A value of the user's own counts wherever the wind comes up again, and nothing is recorded twice for one board. */
    @Test
    void ownValuesCount() {
        ItemResult item = OpenFlowJobs.assess("{\"broadside\":1,\"basis\":{\"code\":\"open-flow\",\"edition\":\"1\"},\"overrides\":[{\"name\":\"site-speed\",\"value\":"
            + "\"20 m/s\",\"reason\":\"measured\"},{\"name\":\"coefficient/all\",\"value\":1.5,\"reason\":\"tunnel\"}],\"site\":{\"basic-speed\":\"30 m/s\","
            + "\"averaging\":\"3 s gust\",\"terrain\":\"0.05 m\"},\"items\":[" + sign("3 m", "2 m", "2.5 m", 1) + "]}");
        assertThat(value(item, "velocity-pressure")).isCloseTo(245, within(1e-9));
        assertThat(value(item, "force/normal")).isCloseTo(245 * 1.5 * 6, within(1e-9));
        assertThat(item.sheet().steps().stream().filter(s -> s.name().equals("air-density"))).hasSize(1);
        assertThat(item.sheet().steps().stream().filter(s -> s.name().equals("site-speed"))).hasSize(1);
    }

    /** The least pressure of an authority holds the pressure up. */
    @Test
    void theAuthoritysLeastPressure() {
        ItemResult item = at("2 m", "0.05 m", ",\"authority-minimum-pressure\":\"1.5 kN/m2\"");
        assertThat(value(item, "pressure/all")).isEqualTo(1500);
        assertThat(value(item, "code-pressure/all")).isLessThan(1000);
    }
}
