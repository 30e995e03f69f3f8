package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.job.JobText;
import broadside.report.PdfReader;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;

/** The page "side by side", its picture, its PDF, and speeds typed for single codes. */
class CompareTest {

    private static final String TOKEN = Token.of(JobText.read(Pool.SIGN.getBytes(StandardCharsets.UTF_8)));

    @Test
    void the_answer_leads_to_it_and_every_code_is_on_it() {
        assertThat(Pool.get("/answer?j=" + TOKEN).body()).contains("/side-by-side?j=" + TOKEN);
        String page = Pool.get("/side-by-side?j=" + TOKEN).body();
        assertThat(page).contains("PRELIMINARY", "How far apart", "Why they differ", "/side-by-side.svg?item=0&amp;j=" + TOKEN);
        Pool.ASSESSOR.codes().editions().forEach(key -> assertThat(page).contains(Pool.ASSESSOR.codes().code(key).orElseThrow().edition().property("title").split(",")[0]));
    }

    @Test
    void the_picture_has_a_number_for_each_code() {
        HttpResponse<String> svg = Pool.get("/side-by-side.svg?item=0&j=" + TOKEN + "&picture=0");
        assertThat(svg.statusCode()).isEqualTo(200);
        assertThat(svg.body()).contains("<title", "kPa", "IS 875", "AS/NZS 1170.2");
        assertThat(svg.body().split("<circle").length - 1).isEqualTo(Pool.ASSESSOR.codes().editions().size());
    }

    @Test
    void its_pdf_holds_the_job() throws Exception {
        HttpResponse<byte[]> pdf = Pool.bytes("/side-by-side.pdf?paper=letter&item=0&j=" + TOKEN);
        assertThat(pdf.statusCode()).isEqualTo(200);
        assertThat(pdf.headers().firstValue("content-disposition")).hasValueSatisfying(v -> assertThat(v).contains("side-by-side.pdf"));
        assertThat(JobText.read(PdfReader.job(pdf.body()).orElseThrow()).path("title").asString("")).isEqualTo("Test sign");
        assertThat(Pool.get("/side-by-side.pdf?paper=a3&j=" + TOKEN).statusCode()).isEqualTo(400);
    }

    @Test
    void a_typed_speed_is_kept_in_the_link_and_can_be_taken_back() {
        HttpResponse<String> sent = Pool.post("/side-by-side", Map.of("j", TOKEN, "item", "0", "speed:is-875-3/2015", "44 m/s", "terrain:is-875-3/2015", "1"));
        assertThat(sent.statusCode()).isEqualTo(303);
        String link = sent.headers().firstValue("location").orElseThrow();
        JsonNode job = Token.read(link.substring(link.indexOf("j=") + 2));
        assertThat(job.path("comparison").path(0).path("basic-speed").asString("")).isEqualTo("44 m/s");
        String page = Pool.get(link).body();
        assertThat(page).contains("value=\"44 m/s\"", "a speed typed for this code");
        HttpResponse<String> back = Pool.post("/side-by-side", Map.of("j", link.substring(link.indexOf("j=") + 2), "item", "0", "speed:is-875-3/2015", ""));
        assertThat(Token.read(back.headers().firstValue("location").orElseThrow().replaceAll(".*j=", "")).has("comparison")).isFalse();
    }

    @Test
    void a_speed_that_does_not_fit_is_told_with_its_code() {
        HttpResponse<String> sent = Pool.post("/side-by-side", Map.of("j", TOKEN, "item", "0", "speed:is-875-3/2015", "44", "terrain:asce-7/22", "II"));
        assertThat(sent.statusCode()).isEqualTo(422);
        assertThat(sent.body()).contains("<title>Error: ", "IS 875 (Part 3):2015: ", "is not a terrain class of ASCE/SEI 7-22; it has B, C, D", "role=\"alert\"", "value=\"44\"", "value=\"II\"");
    }

    @Test
    void each_wrong_box_says_so_itself_and_all_that_was_typed_stays() {
        Map<String, String> typed = new java.util.LinkedHashMap<>(Map.of("j", TOKEN, "item", "0", "speed:is-875-3/2015", "44", "terrain:is-875-3/2015", "9",
            "speed:asce-7/22", "115 mph", "terrain:asce-7/22", "II", "speed:as-nzs-1170-2/2011", "900 m/s", "terrain:open-flow/1", "0.05 m"));
        String page = Pool.post("/side-by-side", typed).body();
        for (String id : java.util.List.of("basic-speed-is-875-3-2015", "terrain-is-875-3-2015", "terrain-asce-7-22", "basic-speed-as-nzs-1170-2-2011")) {
            assertThat(page).contains("href=\"#" + id + "\"", "id=\"" + id + "-problem\"").containsPattern("id=\"" + id + "\"[^>]*aria-describedby=\"" + id + "-hint " + id
                + "-problem\"[^>]*aria-invalid=\"true\"");
        }
        assertThat(page.split("aria-invalid").length - 1).isEqualTo(4);
        assertThat(page).contains("value=\"44\"", "value=\"9\"", "value=\"115 mph\"", "value=\"II\"", "value=\"900 m/s\"", "value=\"0.05 m\"");
        typed.putAll(Map.of("speed:is-875-3/2015", "44 m/s", "terrain:is-875-3/2015", "2"));
        String again = Pool.post("/side-by-side", typed).body();
        assertThat(again.split("aria-invalid").length - 1).isEqualTo(2);
        assertThat(again).contains("value=\"44 m/s\"", "value=\"115 mph\"", "value=\"II\"", "value=\"900 m/s\"", "value=\"0.05 m\"");
        typed.putAll(Map.of("terrain:asce-7/22", "C", "speed:as-nzs-1170-2/2011", "45 m/s"));
        HttpResponse<String> right = Pool.post("/side-by-side", typed);
        assertThat(right.statusCode()).isEqualTo(303);
        assertThat(Token.read(right.headers().firstValue("location").orElseThrow().replaceAll(".*j=", "")).path("comparison").size()).isEqualTo(4);
    }

    @Test
    void an_item_that_is_not_there_is_not_found() {
        assertThat(Pool.get("/side-by-side?item=7&j=" + TOKEN).statusCode()).isEqualTo(404);
        assertThat(Pool.get("/side-by-side?item=x&j=" + TOKEN).statusCode()).isEqualTo(404);
    }
}
