package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Parts of a published check that concern the ground: their fields, and what is refused. */
class GroundPartsTest {

    private static PublishedCheck.Line line(String given, String step, String value, String within) {
        String text = "{ \"title\": \"t\", \"source\": { \"publication\": \"P\", \"edition\": \"E\", \"place\": \"p\", \"status\": \"read\" }, \"given\": { " + given
            + " }, \"expected\": [{ \"step\": \"" + step + "\", \"value\": " + value + ", \"within\": " + within + ", \"why\": \"w\" }] }";
        return Jobs.CHECKS.run(Map.of("a.json", text.getBytes(StandardCharsets.UTF_8))).get(0).lines().get(0);
    }

    private static void passes(String given, String step, String value, String within) {
        PublishedCheck.Line line = line(given, step, value, within);
        assertThat(line.passed()).as(line.toString()).isTrue();
    }

    /** 20 kN, 4 kN m, 2 m by 1 m: e 0.2 m. Along 2 m 16 kPa, ratio 5; along 1 m 22.222 kPa, contact 0.9 m, ratio 2.5. */
    @Test
    void thePadKnowsItsDirection() {
        String pad = "\"part\": \"pad\", \"vertical\": \"20 kN\", \"moment\": \"4 kN m\", \"length\": \"2 m\", \"width\": \"1 m\"";
        passes(pad, "bearing-pressure", "\"16 kPa\"", "\"0.001 kPa\"");
        passes(pad, "overturning-ratio", "5", "1e-9");
        String turned = pad + ", \"moment-along\": \"width\"";
        passes(turned, "bearing-pressure", "\"22.222 kPa\"", "\"0.001 kPa\"");
        passes(turned, "contact-length", "\"0.9 m\"", "\"0.001 m\"");
        passes(turned, "overturning-ratio", "2.5", "1e-9");
    }

    /** 5 kN and 15 kN m at the ground, 0.5 m deep: 17.5 kN m at the base; concrete of 2400 kg/m3, 1.6 m square: 30.126 kN. */
    @Test
    void thePadTakesItsOwnWeightAndDepth() {
        String pad = "\"part\": \"pad\", \"vertical\": \"9.874 kN\", \"force\": \"5 kN\", \"moment\": \"15 kN m\", \"length\": \"1.6 m\", \"width\": \"1.6 m\", "
            + "\"depth\": \"0.5 m\", \"concrete-density\": \"2400 kg/m3\"";
        passes(pad, "pad-moment", "\"17.5 kN m\"", "\"0.001 kN m\"");
        passes(pad, "vertical-load", "\"40 kN\"", "\"0.001 kN\"");
        passes(pad, "bearing-pressure", "\"45.977 kPa\"", "\"0.01 kPa\"");
    }

    /** 2 kN, 5 kN m, 0.5 m, 40 kPa, factor 2.5: 1.37999 m and 16.319 kN m. Without a factor 2/0.7 is used, which asks for more. */
    @Test
    void pierInClay() {
        String pier = "\"part\": \"pier-broms-clay\", \"force\": \"2 kN\", \"moment\": \"5 kN m\", \"width\": \"0.5 m\", \"cohesion\": \"40 kPa\"";
        passes(pier + ", \"load-factor\": 2.5", "embedment-depth", "\"1.37999 m\"", "\"0.0001 m\"");
        passes(pier + ", \"load-factor\": 2.5", "pier-moment", "\"16.319 kN m\"", "\"0.001 kN m\"");
        passes(pier, "load-factor", "2.857", "0.001");
    }

    /** Constrained and increased: 31.4 kPa/m x 4/3: d³ = 4.25 x 10.64/(41.8667 x 0.849), d = 1.0835 m. */
    @Test
    void constrainedEmbedment() {
        String post = "\"part\": \"embedment-ibc\", \"force\": \"1.33 kN\", \"height\": \"8 m\", \"width\": \"0.849 m\", \"lateral-bearing\": \"31.4 kPa/m\"";
        passes(post + ", \"constrained\": true", "embedment-depth", "\"1.1926 m\"", "\"0.0001 m\"");
        passes(post + ", \"constrained\": true, \"increased\": true", "embedment-depth", "\"1.0835 m\"", "\"0.0001 m\"");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "\"part\": \"pad\", \"vertical\": \"20 kN\", \"moment\": \"4 kN m\", \"length\": \"2 m\"|width: a length above zero",
        "\"part\": \"pad\", \"vertical\": \"20 kg\", \"moment\": \"4 kN m\", \"length\": \"2 m\", \"width\": \"1 m\"|vertical: a force above zero",
        "\"part\": \"pad\", \"vertical\": \"20 kN\", \"moment\": \"4 kN m\", \"length\": \"2 m\", \"width\": \"1 m\", \"moment-along\": \"depth\"|moment-along must be",
        "\"part\": \"pad\", \"vertical\": \"20 kN\", \"moment\": \"4 kN m\", \"length\": \"2 m\", \"width\": \"1 m\", \"force\": \"1 kN\"|need the depth of the pad",
        "\"part\": \"embedment-ibc\", \"force\": \"1 kN\", \"height\": \"8 m\", \"width\": \"1 m\", \"lateral-bearing\": \"31 kPa\"|lateral-bearing: a pressure per depth",
        "\"part\": \"embedment-ibc\", \"force\": \"1 kN\", \"height\": \"8 m\", \"width\": \"1 m\", \"lateral-bearing\": \"31 kPa/m\", \"doubled\": \"yes\"|doubled must be true or false",
        "\"part\": \"pier-broms-clay\", \"force\": \"1 kN\", \"moment\": \"8 kN m\", \"width\": \"1 m\", \"cohesion\": \"31 kPa\", \"load-factor\": 0.5|at least 1",
        "\"part\": \"pier-broms-clay\", \"force\": \"1 kN\", \"moment\": \"8 kN m\", \"width\": \"1 m\", \"cohesion\": \"31 kPa\", \"load-factor\": \"2\"|plain number",
        "\"part\": \"broms-clay-capacity\", \"height\": \"1 m\", \"width\": \"1 m\", \"depth\": \"1.5 m\", \"cohesion\": \"31 kPa\"|deeper than 1.5 times"})
    void whatIsRefused(String given, String reason) {
        PublishedCheck.Line line = line(given, "embedment-depth", "\"1 m\"", "\"1 m\"");
        assertThat(line.passed()).isFalse();
        assertThat(line.computed()).contains(reason);
    }
}
