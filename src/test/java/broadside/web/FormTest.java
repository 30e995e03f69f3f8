package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.job.JobText;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ObjectNode;

class FormTest {

    private static Map<String, String> blank(String kind, String units) {
        return new LinkedHashMap<>(Pool.fields(Pool.get("/fill?kind=" + kind + "&units=" + units + "&code=en-1991-1-4/2005").body()));
    }

    private static Map<String, String> sign() {
        Map<String, String> form = blank("post-sign", "metric");
        form.putAll(Map.of("site.basic-speed", "26", "site.averaging", "10 min mean", "site.terrain", "II", "items[0].boards[0].width", "3",
            "items[0].boards[0].height", "2,0", "items[0].boards[0].clearance", "2500 mm", "items[0].posts.count", "2", "items[0].posts.spacing", "2"));
        form.put("items[0].held-by", "own posts");
        return form;
    }

    private static HttpResponse<String> send(Map<String, String> form, String todo) {
        Map<String, String> all = new LinkedHashMap<>(form);
        all.put("do", todo);
        return Pool.post("/fill", all);
    }

    private static JsonNode job(HttpResponse<String> answer) {
        assertThat(answer.statusCode()).as(answer.body()).isEqualTo(303);
        String place = answer.headers().firstValue("Location").orElseThrow();
        assertThat(place).contains("/answer?j=");
        return Token.read(place.substring(place.indexOf("j=") + 2));
    }

    @Test
    void a_bare_number_gets_the_unit_beside_its_box_and_a_typed_unit_counts() {
        JsonNode job = job(send(sign(), "assess"));
        JsonNode board = job.path("items").path(0).path("boards").path(0);
        assertThat(job.path("site").path("basic-speed").stringValue()).isEqualTo("26 m/s");
        assertThat(board.path("width").stringValue()).isEqualTo("3 m");
        assertThat(board.path("height").stringValue()).isEqualTo("2,0 m");
        assertThat(board.path("clearance").stringValue()).isEqualTo("2500 mm");
        assertThat(job.path("items").path(0).path("posts").path("count").intValue()).isEqualTo(2);
        assertThat(job.path("units").stringValue()).isEqualTo("metric");
    }

    @Test
    void a_blank_form_lists_every_missing_answer_beside_its_question_and_on_top() {
        HttpResponse<String> answer = send(blank("post-sign", "metric"), "assess");
        String page = Pool.plain(answer.body());
        assertThat(answer.statusCode()).isEqualTo(422);
        assertThat(page).contains("<title>Error: A sign on posts, S1 - Broadside</title>").contains("role=\"alert\"");
        for (String path : List.of("site.basic-speed", "site.averaging", "site.terrain", "items[0].boards[0].width", "items[0].boards[0].height",
            "items[0].boards[0].clearance", "items[0].posts.count", "items[0].held-by")) {
            assertThat(page).contains("href=\"#" + path + "\"").contains("id=\"" + path + "\"").contains("id=\"" + path + "-problem\"");
        }
        assertThat(page).contains("Width is missing: type it like 2.4 m");
        assertThat(Pool.get("/fill?kind=post-sign").body()).doesNotContain("aria-invalid");
    }

    @Test
    void what_was_typed_stands_there_again_also_inside_folds() {
        Map<String, String> form = sign();
        form.putAll(Map.of("site.basic-speed", "fast", "site.ground-nearby", "hill", "site.topography.height", "about 30", "site.direction-factor", "one", "items[0].footing.ground",
            " stiff clay ", "title", "Ferry & \"Street\" <sign>", "items[0].boards[0].solidity", "0,8", "items[0].posts.section", "CHS 114.3x5"));
        HttpResponse<String> answer = send(form, "assess");
        assertThat(answer.statusCode()).isEqualTo(422);
        Map<String, String> again = Pool.fields(answer.body());
        form.forEach((name, text) -> assertThat(again.getOrDefault(name, "")).as(name).isEqualTo(text));
        assertThat(answer.body()).containsPattern("id=\"site.topography\" open");
        assertThat(Pool.plain(answer.body())).contains("Direction factor: \"one\" is not a plain number");
    }

    @Test
    void a_number_with_two_readings_comes_back_with_both_to_choose() {
        Map<String, String> form = sign();
        form.put("items[0].boards[0].width", "1,500");
        String page = Pool.plain(send(form, "assess").body());
        assertThat(page).contains("value=\"set:items[0].boards[0].width=1500 m\"").contains("value=\"set:items[0].boards[0].width=1.5 m\"");
        HttpResponse<String> chosen = send(Pool.fields(send(form, "assess").body()), "set:items[0].boards[0].width=1.5 m");
        assertThat(chosen.statusCode()).isEqualTo(200);
        assertThat(chosen.body()).contains("All answers can be read now.");
        assertThat(job(send(Pool.fields(chosen.body()), "assess")).path("items").path(0).path("boards").path(0).path("width").stringValue()).isEqualTo("1.5 m");
        form.put("items[0].boards[0].width", "3");
        form.put("items[0].boards[0].solidity", "1,000");
        assertThat(Pool.plain(send(form, "assess").body())).contains("set:items[0].boards[0].solidity=1000").contains("set:items[0].boards[0].solidity=1.000");
    }

    @Test
    void changing_units_changes_no_size() {
        Map<String, String> form = sign();
        form.put("items[0].boards[0].depth", "50");
        Map<String, String> us = Pool.fields(send(form, "units:us").body());
        assertThat(us).containsEntry("items[0].boards[0].width", "3 m").containsEntry("items[0].boards[0].depth", "50 mm")
            .containsEntry("site.basic-speed", "26 m/s").containsEntry("units", "us");
        us.put("items[0].boards[0].height", "6' 6\"");
        us.put("items[0].posts.spacing", "8-6");
        JsonNode job = job(send(us, "assess"));
        assertThat(job.path("items").path(0).path("boards").path(0).path("width").stringValue()).isEqualTo("3 m");
        assertThat(job.path("items").path(0).path("boards").path(0).path("height").stringValue()).isEqualTo("6' 6\"");
        assertThat(Pool.fields(send(us, "units:metric").body())).containsEntry("items[0].posts.spacing", "8-6").containsEntry("items[0].boards[0].width", "3 m");
    }

    @Test
    void boards_gates_and_own_factors_come_and_go_with_their_answers() {
        Map<String, String> two = Pool.fields(send(sign(), "add-board").body());
        assertThat(two).containsKey("items[0].boards[1].width").containsEntry("items[0].boards[0].width", "3");
        two.putAll(Map.of("items[0].boards[1].width", "1", "items[0].boards[1].height", "0.5", "items[0].boards[1].clearance", "1.5"));
        assertThat(job(send(two, "assess")).path("items").path(0).path("boards").size()).isEqualTo(2);
        Map<String, String> one = Pool.fields(send(two, "drop-board:0").body());
        assertThat(one).containsEntry("items[0].boards[0].width", "1").doesNotContainKey("items[0].boards[1].width");
        Map<String, String> own = Pool.fields(send(sign(), "add-factor").body());
        assertThat(job(send(own, "assess")).has("overrides")).isFalse();
        own.putAll(Map.of("overrides[0].name", "exposure-factor", "overrides[0].value", "2,5"));
        assertThat(Pool.plain(send(own, "assess").body())).contains("Own factor 1: Why is missing");
        own.put("overrides[0].reason", "site survey");
        assertThat(job(send(own, "assess")).path("overrides").path(0).path("value").doubleValue()).isEqualTo(2.5);
        own.put("overrides[0].name", "no-such-step");
        assertThat(send(own, "assess").statusCode()).isEqualTo(422);
        Map<String, String> gate = Pool.fields(send(blank("hoarding", "metric"), "add-gate").body());
        assertThat(gate).containsKey("items[0].gates[0].from");
        assertThat(Pool.fields(send(gate, "drop-gate:0").body())).doesNotContainKey("items[0].gates[0].from");
    }

    @Test
    void another_code_asks_its_own_questions_and_forgets_nothing() {
        Map<String, String> form = sign();
        form.put("site.direction-factor", "0.9");
        form.put("basis.code", "asce-7/16");
        HttpResponse<String> page = send(form, "code");
        Map<String, String> other = Pool.fields(page.body());
        assertThat(page.body()).contains("site.terrain-C").doesNotContain("site.terrain-III");
        assertThat(other).doesNotContainKey("site.terrain").containsEntry("site.direction-factor", "0.9").containsEntry("items[0].boards[0].width", "3");
        other.putAll(Map.of("site.terrain", "C", "site.averaging", "3 s gust"));
        JsonNode job = job(send(other, "assess"));
        assertThat(job.path("site").has("direction-factor")).isFalse();
        assertThat(job.path("basis").path("code").stringValue()).isEqualTo("asce-7");
        other.put("basis.code", "en-1991-1-4/2005");
        Map<String, String> back = Pool.fields(send(other, "code").body());
        assertThat(back).containsEntry("site.terrain", "II").containsEntry("site.direction-factor", "0.9");
        back.put("basis.code", "asce-7/16");
        assertThat(Pool.fields(send(back, "code").body())).containsEntry("site.terrain", "C");
    }

    @Test
    void a_speed_of_another_averaging_time_gets_the_conversion_offered() {
        Map<String, String> form = sign();
        form.put("site.averaging", "3 s gust");
        assertThat(Pool.plain(send(form, "assess").body())).contains("is about").contains("as a 10 min mean");
    }

    @Test
    void flat_ground_leaves_the_sizes_of_the_slope_out_of_the_job() {
        Map<String, String> form = sign();
        form.putAll(Map.of("site.ground-nearby", "flat", "site.topography.height", "30 m"));
        JsonNode flat = job(send(form, "assess"));
        assertThat(flat.path("site").has("topography")).isFalse();
        assertThat(flat.path("site").path("ground-nearby").stringValue()).isEqualTo("flat");
        form.put("site.ground-nearby", "hill");
        assertThat(Pool.plain(send(form, "assess").body())).contains("href=\"#site.topography.feature\"").containsPattern("id=\"site.topography\" open");
        form.put("site.ground-nearby", "unknown");
        JsonNode unknown = job(send(form, "assess"));
        assertThat(unknown.path("site").has("topography")).isFalse();
        assertThat(unknown.path("site").path("ground-nearby").stringValue()).isEqualTo("unknown");
    }

    @Test
    void other_items_stay_as_they_are() {
        JsonNode two = JobText.read(Pool.SIGN.replace("\"items\":[", "\"items\":[{\"mark\":\"H9\",\"kind\":\"hoarding\",\"length\":\"40 m\",\"height\":\"2.4 m\","
            + "\"returns\":{\"left\":\"2.4 m\"},\"lighting\":\"none\"},").getBytes(StandardCharsets.UTF_8));
        Map<String, String> form = new LinkedHashMap<>(Pool.fields(Pool.get("/fill?item=1&j=" + Token.of(two)).body()));
        form.put("items[1].boards[0].width", "3.5");
        form.put("items[1].held-by", "own posts");
        JsonNode job = job(send(form, "assess"));
        assertThat(job.path("items").path(0)).isEqualTo(two.path("items").path(0));
        assertThat(job.path("items").path(1).path("boards").path(0).path("width").stringValue()).isEqualTo("3.5 m");
        form.put("items[1].boards[0].height", "tall");
        Map<String, String> first = Pool.fields(send(form, "item:0").body());
        assertThat(first).containsEntry("items[0].length", "40").containsEntry("items[0].lighting", "none");
        assertThat(Pool.fields(send(first, "item:1").body())).containsEntry("items[1].boards[0].height", "tall").containsEntry("items[1].boards[0].width", "3.5");
    }

    @Test
    void items_are_added_and_taken_out() {
        Map<String, String> added = Pool.fields(send(sign(), "add-item:hoarding").body());
        assertThat(added).containsEntry("items[1].kind", "hoarding").containsEntry("item", "1");
        added.putAll(Map.of("items[1].length", "20", "items[1].height", "2.4", "items[1].held-by", "its own feet"));
        assertThat(job(send(added, "assess")).path("items").size()).isEqualTo(2);
        assertThat(job(send(Pool.fields(send(added, "drop-item").body()), "assess")).path("items").size()).isEqualTo(1);
    }

    @Test
    void a_job_goes_through_the_form_without_a_change() {
        Matcher links = Pattern.compile("href=\"/answer\\?j=([^\"]+)\"").matcher(Pool.get("/").body());
        int seen = 0;
        while (links.find()) {
            JsonNode before = Token.read(links.group(1));
            Map<String, String> form = Pool.fields(Pool.get("/fill?j=" + links.group(1)).body());
            ObjectNode expected = ((ObjectNode) before).deepCopy();
            if (!form.containsKey("items[0].held-by")) {
                form.put("items[0].held-by", "own posts");
                ((ObjectNode) expected.get("items").get(0)).put("held-by", "own posts");
            }
            if (before.path("site").has("topography")) {
                ((ObjectNode) expected.get("site")).put("ground-nearby", "hill");
            }
            JsonNode after = job(send(form, "assess"));
            if (expected.path("basis").path("overlay").isNull()) {
                ((ObjectNode) expected.get("basis")).remove("overlay");
            }
            ObjectNode made = ((ObjectNode) after).deepCopy();
            made.remove("units");
            expected.remove("units");
            assertThat(json(made)).as(before.path("title").toString()).isEqualTo(json(expected));
            seen++;
        }
        assertThat(seen).isGreaterThanOrEqualTo(14);
    }

    /** The same job whether a plain number is written 1 or 1.0. */
    private static JsonNode json(JsonNode job) {
        return JobText.read(job.toString().replaceAll(":(\\d+)\\.0([,}])", ":$1$2").getBytes(StandardCharsets.UTF_8));
    }

    @ParameterizedTest
    @ValueSource(strings = {"<script>alert(1)</script>", "${7*7}", "__${7*7}__::.x", "[[${7*7}]]", "\"><img src=x onerror=alert(1)>", "'; drop", "*{7*7}",
        "#{x}", "~{frame :: page}", "\u202eabc\u0000def", "\ud83d\ude00"})
    void hostile_texts_are_shown_as_text_through_every_field(String text) {
        for (Kind of : Kind.values()) {
            String kind = of.key();
            String add = kind.equals("hoarding") ? "add-gate" : kind.equals("banner-fence") ? "add-block" : "add-board";
            Map<String, String> form = Pool.fields(send(Pool.fields(send(blank(kind, "metric"), add).body()), "add-factor").body());
            Map<String, String> hostile = new LinkedHashMap<>();
            form.forEach((name, value) -> hostile.put(name, List.of("kept", "item", "items[0].kind").contains(name) ? value : "q" + text + "p"));
            HttpResponse<String> answer = send(hostile, "assess");
            assertThat(answer.statusCode()).isEqualTo(422);
            assertThat(answer.body()).doesNotContain("<script>alert").doesNotContain("<img src=x").doesNotContain("q49p").doesNotContain("q[49]p");
            assertThat(Pool.fields(answer.body())).containsEntry("title", "q" + text + "p");
            Map<String, String> drawing = new LinkedHashMap<>(hostile);
            assertThat(Pool.post("/drawing", drawing).statusCode()).isEqualTo(200);
        }
    }

    @Test
    void a_job_too_long_for_a_link_keeps_its_answers_and_says_what_to_do() {
        Map<String, String> form = sign();
        java.util.Random random = new java.util.Random(7);
        for (String field : List.of("items[0].fixed-to", "items[0].lighting", "site.name", "title", "client", "address", "applicant", "engineer", "reference",
            "prepared-by", "checked-by", "coordinates", "drawing-number", "site.terrain-reason", "items[0].solidity-by", "items[0].design-life",
            "items[0].inspection-interval", "items[0].posts.grade", "items[0].posts.section", "revision", "items[0].footing.ground")) {
            StringBuilder long_ = new StringBuilder();
            random.ints(1900, 0x4e00, 0x9fa5).forEach(c -> long_.append((char) c));
            form.put(field, long_.toString());
        }
        HttpResponse<String> answer = send(form, "assess");
        assertThat(answer.statusCode()).isEqualTo(422);
        assertThat(answer.body()).contains("too long to travel in a link");
        assertThat(Pool.fields(answer.body())).containsEntry("site.name", form.get("site.name"));
    }

    @Test
    void the_script_gets_drawing_readings_and_status() {
        HttpResponse<String> answer = Pool.post("/drawing", sign());
        JsonNode json = JobText.read(answer.body().getBytes(StandardCharsets.UTF_8));
        assertThat(json.path("readings").path("items[0].boards[0].clearance").stringValue()).isEqualTo("= 2.5 m (8 ft 2 3/8 in)");
        assertThat(json.path("status").stringValue()).startsWith("Preliminary: characteristic wind force");
        HttpResponse<String> svg = Pool.get(json.path("source").stringValue());
        assertThat(svg.statusCode()).isEqualTo(200);
        assertThat(svg.body()).startsWith("<svg").contains("kN");
        Map<String, String> part = sign();
        part.remove("site.terrain");
        JsonNode sizes = JobText.read(Pool.post("/drawing", part).body().getBytes(StandardCharsets.UTF_8));
        assertThat(Pool.get(sizes.path("source").stringValue()).body()).startsWith("<svg").doesNotContain("kN");
    }
}
