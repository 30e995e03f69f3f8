package broadside.job;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.SheetCheck;
import broadside.assess.BadJob;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import java.nio.charset.StandardCharsets;
import org.assertj.core.api.Assertions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;

class WeatherPartsTest {

    private static final WeatherParts PARTS = new WeatherParts(TableLibrary.shipped());

    @ParameterizedTest
    @ValueSource(strings = {
        "{'part':'gust-factor','gust-seconds':3,'mean-seconds':600}",
        "{'part':'gust-factor','gust-seconds':3,'mean-seconds':3600,'ground':'sea','turbulence':0.1}",
        "{'part':'beaufort','speed':'16 kn'}", "{'part':'beaufort','force':0,'unit':'kn'}", "{'part':'beaufort','force':4}",
        "{'part':'forecast-gust','mean':'12 m/s','height':'3 m','roughness':'0.25 m'}",
        "{'part':'forecast-gust','gust':'50 mph','height':'1 m','mean-seconds':3600}",
        "{'part':'open-wind','gust':'20 m/s','height':'4 m'}", "{'part':'open-wind','gust':'20 m/s','height':'4 m','sensor-height':'8 m'}",
        "{'part':'extremes','series':[100,110,125,90],'unit':'km/h','method':'moments'}",
        "{'part':'return-level','series':[100,110,125,90],'unit':'km/h','method':'maximum likelihood','return-periods':[10]}",
        "{'part':'lifetime-risk','return-period':50,'years':5}", "{'part':'lifetime-risk','risk':0.1,'years':50}"})
    void every_sheet_can_be_worked_out_again(String given) {
        Trace sheet = run(given);
        assertThat(sheet.steps()).isNotEmpty();
        SheetCheck.holds(sheet);
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "{'part':'gust-factor','gust-seconds':3}", "{'part':'gust-factor','gust-seconds':'3','mean-seconds':600}",
        "{'part':'gust-factor','gust-seconds':3,'mean-seconds':600,'ground':'moon'}",
        "{'part':'gust-factor','gust-seconds':3,'mean-seconds':600,'relation':'best'}", "{'part':'gust-factor','gust-seconds':1e-300,'mean-seconds':1e300}",
        "{'part':'beaufort'}", "{'part':'beaufort','speed':'20 ft/s'}", "{'part':'beaufort','force':4.5,'unit':'kn'}",
        "{'part':'beaufort','force':1e300,'unit':'kn'}",
        "{'part':'beaufort','force':13,'unit':'kn'}", "{'part':'beaufort','force':-1}", "{'part':'forecast-gust','mean':'12','height':'3 m'}",
        "{'part':'forecast-gust','mean':'12 m/s','height':'300 m'}", "{'part':'open-wind','gust':'20 m/s','height':'4 m','roughness':'5 m'}",
        "{'part':'gumbel-fit','series':[],'unit':'km/h','method':'moments'}", "{'part':'gumbel-fit','series':[1,'2',3],'unit':'km/h','method':'moments'}",
        "{'part':'gumbel-fit','series':[1,2,3],'unit':'kg','method':'moments'}", "{'part':'gumbel-fit','series':[1,2,3],'unit':'km/h','method':'guess'}",
        "{'part':'return-level','series':[1,2,3],'unit':'km/h','method':'moments'}",
        "{'part':'return-level','series':[1,2,3],'unit':'km/h','method':'moments','return-periods':[1]}",
        "{'part':'lifetime-risk','years':5}", "{'part':'lifetime-risk','risk':1,'years':5}"})
    void what_does_not_fit_is_said_in_words(String given) {
        Assertions.assertThatThrownBy(() -> run(given)).isInstanceOf(BadJob.class);
    }

    @Test
    void one_relation_or_all() {
        assertThat(run("{'part':'gust-factor','gust-seconds':3,'mean-seconds':3600,'relation':'cem'}").find("gust-ratio")).isPresent();
        assertThat(run("{'part':'gust-factor','gust-seconds':3,'mean-seconds':3600}").find("gust-ratio-greatest").orElseThrow().value()).isEqualTo(1.75);
    }

    private static Trace run(String given) {
        JsonNode node = JobText.read(given.replace('\'', '"').getBytes(StandardCharsets.UTF_8));
        return PARTS.run(PublishedChecks.text(node, "part"), node);
    }
}
