package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.codes.WindCode;
import broadside.job.JobText;
import broadside.job.Shapes;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tools.jackson.databind.JsonNode;

/** The form of each kind of item: every answer survives, what it is fixed to is asked for, and nothing is asked that the code does not take. */
class KindFormTest {

    private static final String EN = "en-1991-1-4/2005";

    /** Every answer of each kind, as typed, without the head of its path. */
    private static final Map<Kind, Map<String, String>> ANSWERS = Map.of(
        Kind.POST_SIGN, Map.ofEntries(Map.entry("boards[0].width", "3"), Map.entry("boards[0].height", "2"), Map.entry("boards[0].clearance", "2,5"),
            Map.entry("boards[0].depth", "50"), Map.entry("posts.count", "2"), Map.entry("posts.spacing", "2"), Map.entry("posts.shape", "round"),
            Map.entry("posts.width", "114"), Map.entry("posts.grade", "S275"), Map.entry("posts.series", "chs-hot"), Map.entry("posts.deflection-limit", "tdb4"),
            Map.entry("footing.kind", "pad"), Map.entry("footing.shape", "square"), Map.entry("footing.width", "1.2"), Map.entry("footing.length", "1,5"),
            Map.entry("footing.depth", "0.9"), Map.entry("footing.bearing", "150"), Map.entry("footing.friction", "0.4"), Map.entry("footing.slope", "flat"),
            Map.entry("footing.water", "deep"), Map.entry("footing.services", "located"), Map.entry("footing.frost-depth", "0.6"), Map.entry("replaces.width", "2"), Map.entry("replaces.height", "1"), Map.entry("replaces.clearance", "2.5"),
            Map.entry("replaces.depth", "30"), Map.entry("faces", "2"), Map.entry("held-by", "existing post"), Map.entry("fixed-to", "steel, 1998")),
        Kind.HOARDING, Map.ofEntries(Map.entry("length", "24"), Map.entry("height", "2.4"), Map.entry("posts.spacing", "2.4"), Map.entry("gates[0].from", "4"),
            Map.entry("gates[0].width", "5"), Map.entry("returns.left", "2.4"), Map.entry("solidity", "0.9"), Map.entry("solidity-by", "the maker"),
            Map.entry("held-by", "its own feet"), Map.entry("ballast.mass", "400"), Map.entry("ballast.lever", "1.5"), Map.entry("ballast.front-mass", "200"),
            Map.entry("ballast.face-mass", "90"), Map.entry("ballast.ground", "concrete")),
        Kind.BANNER_FENCE, Map.ofEntries(Map.entry("panel-length", "3,45"), Map.entry("panel-height", "2"), Map.entry("panels", "40"), Map.entry("cover-solidity", "0.9"),
            Map.entry("fence-solidity", "0.25"), Map.entry("panel-mass", "18"), Map.entry("foot-mass", "25"), Map.entry("foot-length", "700 mm"),
            Map.entry("blocks[0].mass", "25"), Map.entry("blocks[0].lever", "0.6"), Map.entry("blocks[1].mass", "35"), Map.entry("blocks[1].lever", "0.9"),
            Map.entry("brace.lever", "1.2"), Map.entry("brace.mass", "80"), Map.entry("ground", "wet grass"), Map.entry("stakes", "proved on site"),
            Map.entry("stake-proof-load", "2"), Map.entry("stakes-per-panel", "2"), Map.entry("friction", "1.1"), Map.entry("friction-reason", "rubber mats, tested"),
            Map.entry("held-by", "its own feet"), Map.entry("solidity-by", "the mill")),
        Kind.FACADE_PANEL, Map.ofEntries(Map.entry("backing", "skin"), Map.entry("width", "4"), Map.entry("height", "2"), Map.entry("bottom", "4"),
            Map.entry("distance-from-corner", "1.5"), Map.entry("building.width", "20"), Map.entry("building.depth", "12"), Map.entry("building.height", "8"),
            Map.entry("building.roof-slope", "7"), Map.entry("building.enclosure", "partially enclosed"), Map.entry("gap", "40"), Map.entry("depth", "30"),
            Map.entry("mass", "65"), Map.entry("fixings.columns", "4"), Map.entry("fixings.rows", "3"), Map.entry("fixings.horizontal-pitch", "1200"),
            Map.entry("fixings.vertical-pitch", "900"), Map.entry("fixings.allowable-tension", "1.2"), Map.entry("fixings.allowable-shear", "800 N"),
            Map.entry("held-by", "building wall")),
        Kind.PROJECTING_SIGN, Map.ofEntries(Map.entry("projection", "0.9"), Map.entry("height", "2.4"), Map.entry("bottom", "3"), Map.entry("gap", "100"),
            Map.entry("depth", "150"), Map.entry("mass", "40"), Map.entry("brackets.count", "2"), Map.entry("brackets.spacing", "1.8"), Map.entry("fixings.columns", "2"),
            Map.entry("fixings.rows", "2"), Map.entry("fixings.horizontal-pitch", "100"), Map.entry("fixings.vertical-pitch", "150"),
            Map.entry("held-by", "building wall")),
        Kind.SPANNED_BANNER, Map.of("width", "10", "height", "1.2", "bottom", "5.5", "sag", "0.5", "solidity", "0.9", "solidity-by", "the printer", "mass-per-area", "450",
            "held-by", "own supports"));

    private static Map<String, String> blank(Kind kind, String code) {
        return new LinkedHashMap<>(Pool.fields(Pool.get("/fill?kind=" + kind.key() + "&units=metric&code=" + code).body()));
    }

    private static Map<String, String> full(Kind kind, String code) {
        Map<String, String> form = blank(kind, code);
        WindCode of = Pool.ASSESSOR.codes().code(code).orElseThrow();
        form.putAll(Map.of("site.basic-speed", "30", "site.averaging", of.terms().averaging().words(), "site.terrain", "unknown"));
        ANSWERS.get(kind).forEach((path, text) -> form.put("items[0]." + path, text));
        return form;
    }

    private static HttpResponse<String> send(Map<String, String> form, String todo) {
        Map<String, String> all = new LinkedHashMap<>(form);
        all.put("do", todo);
        return Pool.post("/fill", all);
    }

    private static String place(Map<String, String> form) {
        HttpResponse<String> sent = send(form, "assess");
        assertThat(sent.statusCode()).as(sent.statusCode() == 303 ? "" : problems(sent.body())).isEqualTo(303);
        return sent.headers().firstValue("Location").orElseThrow();
    }

    private static String problems(String page) {
        return page.contains("class=\"problems\"") ? page.substring(page.indexOf("class=\"problems\""), page.indexOf("<h1")) : page;
    }

    private static JsonNode job(String place) {
        return Token.read(place.substring(place.indexOf("j=") + 2));
    }

    @Test
    void every_kind_of_the_job_file_has_its_form() {
        assertThat(Arrays.stream(Kind.values()).map(Kind::key)).containsExactlyElementsOf(Shapes.KINDS.keySet());
        String start = Pool.get("/").body();
        for (Kind kind : Kind.values()) {
            assertThat(start).contains("value=\"" + kind.key() + "\"").contains(kind.words()).contains(kind.line());
            assertThat(Pool.get("/fill?kind=" + kind.key()).body()).contains("<h1>" + kind.words() + ", " + kind.mark(1) + "</h1>")
                .contains("value=\"add-item:" + kind.key() + "\"").contains(kind.add());
        }
        assertThat(start).doesNotContain("not yet in this version");
    }

    @ParameterizedTest
    @EnumSource(Kind.class)
    void each_kind_is_filled_in_and_answered(Kind kind) {
        for (String code : Pool.ASSESSOR.codes().editions()) {
            String place = place(full(kind, code));
            HttpResponse<String> answer = Pool.get(place);
            assertThat(answer.statusCode()).isEqualTo(200);
            String token = place.substring(place.indexOf("j=") + 2);
            assertThat(answer.body()).contains("/drawing.svg?j=" + token);
            assertThat(Pool.get("/drawing.svg?picture=0&j=" + token).body()).startsWith("<svg").endsWith("</svg>");
            assertThat(new String(Pool.bytes("/summary.pdf?j=" + token).body(), 0, 5, StandardCharsets.US_ASCII)).isEqualTo("%PDF-");
        }
    }

    @ParameterizedTest
    @EnumSource(Kind.class)
    void every_answer_survives_the_way_from_form_to_job_to_form(Kind kind) {
        Map<String, String> form = full(kind, EN);
        form.putAll(Map.of("site.ground-nearby", "unknown", "site.stands-for", "3", "site.terrain", "unknown"));
        String place = place(form);
        Map<String, String> again = Pool.fields(Pool.get(place.replace("/answer?", "/fill?")).body());
        ANSWERS.get(kind).forEach((path, text) -> assertThat(again.get("items[0]." + path)).as(path).isEqualTo(text));
        assertThat(again).containsEntry("site.ground-nearby", "unknown").containsEntry("site.stands-for", "3").containsEntry("site.terrain", "unknown");
        assertThat(job(place(again))).isEqualTo(job(place));
    }

    @ParameterizedTest
    @EnumSource(Kind.class)
    void a_form_must_say_what_it_is_fixed_to(Kind kind) {
        Map<String, String> form = full(kind, EN);
        form.remove("items[0].held-by");
        HttpResponse<String> sent = send(form, "assess");
        assertThat(sent.statusCode()).isEqualTo(422);
        assertThat(Pool.plain(problems(sent.body()))).contains("<a href=\"#items[0].held-by\">Choose what it is fixed to</a>").doesNotContain("does not fit");
        String blank = Pool.get("/fill?kind=" + kind.key() + "&code=" + EN).body();
        assertThat(blank).contains("What is it fixed to?").doesNotContainPattern("name=\"items\\[0\\].held-by\"[^>]*checked");
        assertThat(blank).contains("id=\"items[0].held-by-tree\"").contains("outside the scope of this tool: no loads are given");
        for (String own : kind.heldBy()) {
            assertThat(blank).contains("id=\"items[0].held-by-" + own.replace(' ', '-') + "\"");
        }
        assertThat(blank.contains("id=\"items[0].held-by-its-own-feet\"")).isEqualTo(kind.heldBy().contains("its own feet"));
    }

    @Test
    void a_question_left_open_on_one_item_is_asked_again_from_the_next() {
        Map<String, String> form = full(Kind.HOARDING, EN);
        form.remove("items[0].held-by");
        Map<String, String> second = Pool.fields(send(form, "add-item:spanned-banner").body());
        assertThat(second).containsEntry("items[1].mark", "N2");
        ANSWERS.get(Kind.SPANNED_BANNER).forEach((path, text) -> second.put("items[1]." + path, text));
        HttpResponse<String> sent = send(second, "assess");
        assertThat(sent.statusCode()).isEqualTo(422);
        assertThat(problems(sent.body())).contains("<a href=\"#items\">Item 1: held-by: choose what it is fixed to</a>");
        Map<String, String> first = Pool.fields(send(second, "item:0").body());
        first.put("items[0].held-by", "own posts");
        assertThat(job(place(first)).path("items").size()).isEqualTo(2);
    }

    @Test
    void a_job_file_may_leave_out_what_it_is_fixed_to_and_its_form_asks() {
        JsonNode job = JobText.read(Pool.SIGN.getBytes(StandardCharsets.UTF_8));
        assertThat(Pool.get("/answer?j=" + Token.of(job)).statusCode()).isEqualTo(200);
        HttpResponse<String> sent = send(Pool.fields(Pool.get("/fill?j=" + Token.of(job)).body()), "assess");
        assertThat(problems(sent.body())).contains("Choose what it is fixed to");
    }

    @Test
    void an_answer_of_another_kind_in_a_job_file_stays() {
        JsonNode job = JobText.read(Pool.SIGN.replace("\"mark\":\"S1\"", "\"mark\":\"S1\",\"held-by\":\"own supports\"").getBytes(StandardCharsets.UTF_8));
        assertThat(Pool.fields(Pool.get("/fill?j=" + Token.of(job)).body())).containsEntry("items[0].held-by", "own supports");
    }

    @Test
    void outside_the_scope_is_answered_as_such_and_said_beside_the_form() {
        Map<String, String> form = full(Kind.SPANNED_BANNER, EN);
        form.put("items[0].held-by", "tree");
        assertThat(Pool.get(place(form)).body()).contains("Outside the scope of this tool: an engineer is needed");
        String status = JobText.read(Pool.post("/drawing", form).body().getBytes(StandardCharsets.UTF_8)).path("status").stringValue();
        assertThat(status).isEqualTo("Outside the scope of this tool: an engineer is needed. No loads are given for it.");
        form.remove("items[0].held-by");
        JsonNode open = JobText.read(Pool.post("/drawing", form).body().getBytes(StandardCharsets.UTF_8));
        assertThat(open.path("status").stringValue()).startsWith("Preliminary: characteristic wind force").doesNotContain("moment");
        assertThat(Pool.get(open.path("source").stringValue()).body()).contains("pull ");
    }

    @Test
    void missing_answers_of_each_kind_stand_beside_their_questions() {
        Map<Kind, List<String>> needed = Map.of(Kind.BANNER_FENCE, List.of("panel-length", "panel-height", "panels"), Kind.FACADE_PANEL,
            List.of("backing", "width", "height", "bottom", "distance-from-corner", "building.width", "building.depth", "building.height"), Kind.PROJECTING_SIGN,
            List.of("projection", "height", "bottom", "brackets.count"), Kind.SPANNED_BANNER, List.of("width", "height", "bottom", "sag"));
        needed.forEach((kind, paths) -> {
            String page = send(blank(kind, EN), "assess").body();
            paths.forEach(path -> assertThat(page).contains("href=\"#items[0]." + path + "\"").contains("id=\"items[0]." + path + "-problem\""));
        });
        Map<String, String> beyond = full(Kind.FACADE_PANEL, EN);
        beyond.put("items[0].distance-from-corner", "18");
        assertThat(Pool.plain(problems(send(beyond, "assess").body()))).contains("From the corner of the building to the panel").contains("ends beyond the wall of 20 m");
    }

    @Test
    void blocks_come_and_go() {
        Map<String, String> one = Pool.fields(send(full(Kind.BANNER_FENCE, EN), "drop-block:0").body());
        assertThat(one).containsEntry("items[0].blocks[0].mass", "35").doesNotContainKey("items[0].blocks[1].mass");
        Map<String, String> more = Pool.fields(send(one, "add-block").body());
        assertThat(more).containsKey("items[0].blocks[1].mass");
        assertThat(job(place(more)).path("items").path(0).path("blocks").size()).isEqualTo(1);
    }
}
