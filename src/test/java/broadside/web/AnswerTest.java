package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import broadside.job.JobText;
import java.io.ByteArrayOutputStream;
import java.net.URI;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.List;
import java.util.zip.DeflaterOutputStream;
import java.util.zip.Deflater;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;

class AnswerTest {

    private static JsonNode json(String text) {
        return JobText.read(text.getBytes(StandardCharsets.UTF_8));
    }

    private static HttpResponse<String> upload(byte[] file) {
        ByteArrayOutputStream body = new ByteArrayOutputStream();
        body.writeBytes("--edge\r\nContent-Disposition: form-data; name=\"file\"; filename=\"../../x\"\r\nContent-Type: text/html\r\n\r\n".getBytes(StandardCharsets.US_ASCII));
        body.writeBytes(file);
        body.writeBytes("\r\n--edge--\r\n".getBytes(StandardCharsets.US_ASCII));
        return Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/open")).header("Content-Type", "multipart/form-data; boundary=edge")
            .POST(HttpRequest.BodyPublishers.ofByteArray(body.toByteArray())));
    }

    @Test
    void the_start_page_has_national_values_below_their_code_with_short_words() {
        String page = Pool.plain(Pool.get("/").body());
        Pool.ASSESSOR.codes().editions().forEach(key -> {
            int code = page.indexOf("value=\"" + key + "\"");
            assertThat(code).as(key).isPositive();
            Pool.ASSESSOR.codes().overlays(key).forEach(overlay -> {
                assertThat(page.indexOf("value=\"" + overlay + "\"")).isGreaterThan(code);
                assertThat(page.substring(code)).contains("class=\"choice national\"",
                    ">" + Pool.ASSESSOR.codes().code(overlay).orElseThrow().edition().property("short") + "</label>");
            });
        });
        assertThat(page.split("type=\"radio\" name=\"code\"").length - 1).isEqualTo(Pool.ASSESSOR.codes().editions().stream()
            .mapToInt(key -> 1 + Pool.ASSESSOR.codes().overlays(key).size()).sum());
    }

    @Test
    void captions_wrap_and_a_wide_drawing_can_be_opened_alone() {
        String page = Pool.get("/answer?j=" + Token.of(broadside.job.JobText.read(Pool.SIGN.getBytes(java.nio.charset.StandardCharsets.UTF_8)))).body();
        assertThat(page).contains("<caption><span>", "class=\"sideways\"").containsPattern("<a href=\"/drawing.svg[^\"]*picture=0\">open it alone</a>");
    }

    @Test
    void a_token_gives_the_job_back() throws Exception {
        JsonNode job = json(Pool.SIGN);
        assertThat(Token.read(Token.of(job))).isEqualTo(job);
        assertThatThrownBy(() -> Token.read(packed(" ".repeat(Token.LARGEST + 10)))).isInstanceOf(Refused.class);
        assertThat(Token.read(packed(Pool.SIGN))).isEqualTo(job);
    }

    private static String packed(String text) throws Exception {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (DeflaterOutputStream deflate = new DeflaterOutputStream(out, new Deflater(9, true))) {
            deflate.write(text.getBytes(StandardCharsets.UTF_8));
        }
        return Base64.getUrlEncoder().withoutPadding().encodeToString(out.toByteArray());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "%", "AAAA", "a b", "////", "q1Y", "null", "%00", "bVE9T-QwEP0rIzc0"})
    void damaged_links_get_a_plain_page(String token) {
        for (String page : new String[] {"/answer", "/fill", "/job.json", "/summary.pdf", "/drawing.svg", "/side-by-side", "/side-by-side.svg", "/side-by-side.pdf"}) {
            HttpResponse<String> answer = Pool.get(page + "?item=0&j=" + java.net.URLEncoder.encode(token, StandardCharsets.UTF_8));
            assertThat(answer.statusCode()).isEqualTo(400);
            assertThat(answer.body()).contains("This link does not hold a job").doesNotContain("Exception");
        }
    }

    @Test
    void links_to_json_that_is_no_job_are_no_error_of_the_server() throws Exception {
        for (String text : new String[] {"null", "[]", "3", "\"x\"", "{}", "{\"items\":[]}", "{\"items\":[null]}", "{\"items\":{\"a\":1}}", "{\"items\":[{\"kind\":3}]}",
            "{\"items\":[{\"kind\":\"post-sign\",\"boards\":{\"a\":1},\"posts\":[1]}],\"site\":7,\"basis\":[]}", "{\"basis\":{\"code\":\"a/b\",\"edition\":\"..\"},\"items\":[{}]}"}) {
            for (String page : new String[] {"/answer", "/fill", "/job.json", "/summary.pdf", "/drawing.svg", "/side-by-side", "/side-by-side.svg", "/side-by-side.pdf"}) {
                HttpResponse<String> answer = Pool.get(page + "?item=0&j=" + packed(text));
                assertThat(answer.statusCode()).as(page + " " + text).isBetween(200, 499);
            }
        }
    }

    @Test
    void the_answer_shows_the_blocks_of_the_sheet_with_subscripts_and_links() {
        String token = Token.of(json(Pool.SIGN));
        String page = Pool.get("/answer?j=" + token).body();
        assertThat(page).contains("<h1 id=\"top\">Test sign</h1>").contains("class=\"answer\"").contains("<sub>p</sub>").contains("scope=\"col\"")
            .contains("src=\"/drawing.svg?j=" + token + "&amp;picture=0\"").contains("PRELIMINARY").contains("/fill?j=" + token + "&amp;item=0#place")
            .contains("/summary.pdf?paper=letter&amp;j=" + token).contains("/job.json?j=" + token);
    }

    @Test
    void the_pdf_of_a_link_opens_again_as_the_same_job() {
        JsonNode job = json(Pool.SIGN.replace("\"title\"", "\"reference\":\"B-\u00fc/7\\\"\\r\\nX: y\",\"title\""));
        HttpResponse<byte[]> pdf = Pool.bytes("/summary.pdf?paper=letter&j=" + Token.of(job));
        assertThat(pdf.headers().firstValue("Content-Disposition")).contains("attachment; filename=\"b-u-7-x-y.pdf\"");
        assertThat(new String(pdf.body(), 0, 5, StandardCharsets.US_ASCII)).isEqualTo("%PDF-");
        HttpResponse<String> opened = upload(pdf.body());
        assertThat(opened.statusCode()).isEqualTo(303);
        String place = opened.headers().firstValue("Location").orElseThrow();
        assertThat(Token.read(place.substring(place.indexOf("j=") + 2))).isEqualTo(job);
        assertThat(Pool.get("/summary.pdf?paper=a0&j=" + Token.of(job)).statusCode()).isEqualTo(400);
    }

    @Test
    void files_are_opened_by_what_they_hold_and_mended_on_the_form() {
        assertThat(upload(Pool.SIGN.getBytes(StandardCharsets.UTF_8)).statusCode()).isEqualTo(303);
        HttpResponse<String> wrong = upload(Pool.SIGN.replace("\"3 m\"", "\"3 kg\"").replace("\"terrain\":\"II\"", "\"terrain\":\"X\"").getBytes(StandardCharsets.UTF_8));
        assertThat(wrong.statusCode()).isEqualTo(422);
        assertThat(Pool.fields(wrong.body())).containsEntry("items[0].boards[0].width", "3 kg");
        assertThat(Pool.plain(wrong.body())).contains("href=\"#site.terrain\"").contains("\"X\" is not a terrain class");
        HttpResponse<String> kind = upload(Pool.SIGN.replace("post-sign", "spinning-sign").getBytes(StandardCharsets.UTF_8));
        assertThat(kind.statusCode()).isEqualTo(400);
        assertThat(Pool.plain(kind.body())).contains("items[0].kind: \"spinning-sign\" is not a kind that this version assesses");
        HttpResponse<String> key = upload(Pool.SIGN.replace("\"terrain\"", "\"soil\":\"peat\",\"terrain\"").getBytes(StandardCharsets.UTF_8));
        assertThat(Pool.plain(key.body())).contains("href=\"#place\"").contains("site.soil: is not a key of site");
        assertThat(upload("{\"broadside\":1,".getBytes(StandardCharsets.UTF_8)).body()).contains("line 1, column");
        assertThat(upload("hello".getBytes(StandardCharsets.UTF_8)).statusCode()).isEqualTo(400);
        assertThat(upload(new byte[0]).statusCode()).isEqualTo(400);
        assertThat(upload("%PDF-1.7 nothing".getBytes(StandardCharsets.UTF_8)).statusCode()).isEqualTo(400);
    }

    @Test
    void a_case_that_the_code_does_not_cover_is_no_mistake_of_the_user() {
        String page = Pool.get("/answer?j=" + Token.of(json(Pool.SIGN.replace("\"2.5 m\"", "\"0.2 m\"").replace("\"2 m\",\"clearance\"", "\"9 m\",\"clearance\"")))).body();
        String far = Pool.get("/answer?j=" + Token.of(json(Pool.SIGN.replace("\"2.5 m\"", "\"400 m\"")))).body();
        assertThat(far).contains("Not covered by this code").contains("Clause").contains("What can be done").doesNotContain("class=\"problem");
        assertThat(page).doesNotContain("Error: ");
    }

    @Test
    void a_job_of_a_link_that_does_not_fit_gets_its_form() {
        HttpResponse<String> answer = Pool.get("/answer?j=" + Token.of(json(Pool.SIGN.replace("10 min mean", "3 s gust"))));
        assertThat(answer.statusCode()).isEqualTo(422);
        assertThat(answer.body()).contains("<title>Error: ").contains("is about");
    }

    @Test
    void a_long_job_travels_in_a_link() {
        StringBuilder items = new StringBuilder();
        java.util.Random random = new java.util.Random(3);
        for (int i = 0; i < 150; i++) {
            items.append(i == 0 ? "" : ",").append("{\"mark\":\"S").append(i).append("\",\"kind\":\"post-sign\",\"boards\":[{\"width\":\"").append(1 + random.nextInt(999))
                .append(" cm\",\"height\":\"").append(50 + random.nextInt(300)).append(" cm\",\"clearance\":\"").append(100 + random.nextInt(300))
                .append(" cm\"}],\"posts\":{\"count\":1}}");
        }
        String token = Token.of(json(Pool.SIGN.replaceAll("\"items\":\\[.*\\]\\}$", "\"items\":[" + items + "]}")));
        assertThat(token.length()).isBetween(2000, Token.LONGEST);
        assertThat(Pool.get("/answer?j=" + token).statusCode()).isEqualTo(200);
    }

    @Test
    void tables_and_checks_say_where_figures_come_from() {
        String tables = Pool.get("/tables").body();
        assertThat(tables).contains("EN 1991-1-4:2005+A1:2010, table 4.1").contains("recalled: not yet checked against print").contains("sha256:");
        assertThat(Pool.get("/tables/en-1991-1-4/2005").body()).contains("0.003").contains("straight line").contains("the last value holds");
        String checks = Pool.get("/checks").body();
        assertThat(checks).contains("Mistakes in print that are not repeated here").contains("passed").doesNotContain(">failed<");
        assertThat(Pool.get("/checks/mistakes-in-print").body()).contains("differs from the printed one").contains("Printed").doesNotContain(">failed<");
        assertThat(Pool.get("/checks/SIGN").body()).contains("Printed").contains("Difference");
        assertThat(checks.length()).isLessThan(200 << 10);
        assertThat(Pool.get("/health").body()).startsWith("ok ");
        assertThat(json(Pool.get("/schema.json").body()).path("$schema").stringValue()).contains("json-schema");
    }

    @Test
    void everything_a_page_needs_is_small() {
        int files = Pool.bytes("/sheet.css").body().length + Pool.bytes("/sheet.js").body().length + Pool.bytes("/mark.svg").body().length;
        for (String page : new String[] {"/", "/fill?kind=post-sign&code=en-1991-1-4/2005", "/answer?j=" + Token.of(json(Pool.SIGN)), "/tables", "/checks"}) {
            assertThat(Pool.bytes(page).body().length + files).as(page).isLessThan(200 << 10);
        }
    }

    /** A fence whose blocks do not hold the wind of the code: the card says at which gust it must be gone. */
    @Test
    void the_wind_card_holds_all_it_needs() {
        String job = Pool.SIGN.replaceAll("\"items\":\\[.*\\]\\}$", "\"items\":[{\"mark\":\"F1\",\"kind\":\"banner-fence\",\"panel-length\":\"3.45 m\",\"panel-height\":\"2 m\",\"panels\":40,"
            + "\"panel-mass\":\"18 kg\",\"foot-mass\":\"25 kg\",\"foot-length\":\"0.65 m\",\"ground\":\"asphalt\",\"held-by\":\"its own feet\"}]}");
        var answer = Pool.get("/card?j=" + Token.of(json(job)));
        assertThat(answer.statusCode()).isEqualTo(200);
        String page = answer.body();
        assertThat(page.length()).isLessThan(100 << 10);
        assertThat(page).contains("Gone before a gust of").contains("Prepare").contains("Act").contains("Clear").contains("Who").contains("PRELIMINARY").contains("does not hold the wind")
            .doesNotContain("src=").doesNotContain("<script").doesNotContain("<link").doesNotContain("url(");
        assertThat(answer.headers().firstValue("Content-Security-Policy").orElseThrow()).contains("style-src 'sha256-");
        assertThat(page.indexOf("<style>")).isPositive();
        List<Double> gusts = java.util.regex.Pattern.compile("class=\"figure\">([0-9.]+) m/s<").matcher(page).results().map(m -> Double.valueOf(m.group(1))).toList();
        assertThat(gusts).as("gust and mean of three levels").hasSize(6);
        assertThat(gusts.get(0)).isLessThan(gusts.get(2));
        assertThat(gusts.get(2)).isLessThan(gusts.get(4));
        assertThat(gusts.get(1)).as("a mean is lower than its gust").isLessThan(gusts.get(0));
    }
}
