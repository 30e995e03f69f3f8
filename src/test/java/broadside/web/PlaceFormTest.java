package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.Problem;
import broadside.codes.CodeFacts;
import broadside.codes.LoadCase;
import broadside.codes.SiteTerms;
import broadside.codes.WindCode;
import broadside.job.JobText;
import broadside.job.Shapes;
import broadside.panel.Panel;
import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.site.Averaging;
import broadside.site.Site;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import broadside.web.FormView.Bit;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;

/** The questions about the place: the ground near by, what is not known, and what only some codes take. */
class PlaceFormTest {

    private static Map<String, String> sign() {
        Map<String, String> form = new LinkedHashMap<>(Pool.fields(Pool.get("/fill?kind=post-sign&units=metric&code=en-1991-1-4/2005").body()));
        form.putAll(Map.of("site.basic-speed", "26", "site.averaging", "10 min mean", "site.terrain", "II", "items[0].boards[0].width", "3",
            "items[0].boards[0].height", "2", "items[0].boards[0].clearance", "2.5", "items[0].posts.count", "1", "items[0].held-by", "own posts"));
        return form;
    }

    private static HttpResponse<String> send(Map<String, String> form, String todo) {
        Map<String, String> all = new LinkedHashMap<>(form);
        all.put("do", todo);
        return Pool.post("/fill", all);
    }

    private static JsonNode job(Map<String, String> form) {
        HttpResponse<String> sent = send(form, "assess");
        assertThat(sent.statusCode()).isEqualTo(303);
        String place = sent.headers().firstValue("Location").orElseThrow();
        return Token.read(place.substring(place.indexOf("j=") + 2));
    }

    private static Map<String, String> opened(String draft) {
        return Pool.fields(Pool.get("/fill?d=" + Token.of(JobText.read(draft.getBytes(StandardCharsets.UTF_8)))).body());
    }

    @Test
    void links_from_before_the_question_about_the_ground_still_open() {
        String head = "{\"units\":\"metric\",\"basis.code\":\"en-1991-1-4/2005\",\"items[0].kind\":\"post-sign\",\"item\":\"0\",\"kept\":\"\"";
        assertThat(opened(head + ",\"site.topography.feature\":\"flat\"}")).containsEntry("site.ground-nearby", "flat").doesNotContainKey("site.topography.feature");
        assertThat(opened(head + ",\"site.topography.feature\":\"ridge\",\"site.topography.height\":\"30\"}")).containsEntry("site.ground-nearby", "hill")
            .containsEntry("site.topography.feature", "ridge").containsEntry("site.topography.height", "30");
        assertThat(opened(head + "}")).doesNotContainKey("site.ground-nearby");
        JsonNode hill = JobText.read(Pool.SIGN.replace("\"terrain\":\"II\"", "\"terrain\":\"II\",\"topography\":{\"feature\":\"hill\",\"height\":\"30 m\",\"upwind-length\":\"90 m\","
            + "\"distance-from-crest\":\"0 m\"}").getBytes(StandardCharsets.UTF_8));
        assertThat(Pool.fields(Pool.get("/fill?j=" + Token.of(hill)).body())).containsEntry("site.ground-nearby", "hill").containsEntry("site.topography.height", "30");
    }

    @Test
    void a_hill_asks_for_its_sizes_unless_a_factor_stands_for_them() {
        Map<String, String> form = sign();
        form.put("site.ground-nearby", "hill");
        String page = send(form, "assess").body();
        for (String name : List.of("feature", "height", "upwind-length", "distance-from-crest")) {
            assertThat(page).contains("href=\"#site.topography." + name + "\"");
        }
        form.putAll(Map.of("site.topography.feature", "escarpment", "site.topography.height", "30", "site.topography.upwind-length", "90",
            "site.topography.distance-from-crest", "15"));
        assertThat(job(form).path("site").path("topography").path("height").stringValue()).isEqualTo("30 m");
        Map<String, String> factor = sign();
        factor.putAll(Map.of("basis.code", "asce-7/16", "site.averaging", "3 s gust", "site.terrain@asce-7/16", "C", "site.ground-nearby", "hill",
            "site.topographic-factor", "1.2"));
        JsonNode site = job(factor).path("site");
        assertThat(site.has("topography")).isFalse();
        assertThat(site.path("ground-nearby").stringValue()).isEqualTo("hill");
    }

    @Test
    void what_is_not_known_is_an_answer() {
        Map<String, String> form = sign();
        form.put("site.terrain", "unknown");
        form.put("site.ground-nearby", "unknown");
        assertThat(job(form).path("site").path("terrain").stringValue()).isEqualTo("unknown");
        HttpResponse<String> answer = Pool.get("/answer?j=" + Token.of(job(form)));
        assertThat(answer.statusCode()).isEqualTo(200);
        form.put("basis.code", "asce-7/16");
        assertThat(Pool.fields(send(form, "code").body())).containsEntry("site.terrain", "unknown");
    }

    @Test
    void values_that_a_code_does_not_take_are_not_asked() {
        for (String code : List.of("en-1991-1-4/2005", "asce-7/16", "")) {
            String page = Pool.get("/fill?kind=hoarding&code=" + code).body();
            Set<String> takes = Pool.ASSESSOR.codes().code(code).map(c -> c.terms().options()).orElse(Set.of());
            for (String option : List.of("direction-factor", "season-factor", "air-density", "risk-category", "topographic-factor", "ground-elevation", "gust-factor", "season",
                "wind-zone", "structure-class", "k4", "directionality", "region", "regional-speed", "direction-multiplier", "shielding-multiplier", "climate-multiplier",
                "duration-rule")) {
                assertThat(page.contains("id=\"site." + option + "\"")).as(option + " in " + code).isEqualTo(takes.contains(option));
            }
            assertThat(page).contains("id=\"site.stands-for\"").contains("does not lower the safety");
        }
    }

    @Test
    void a_value_of_another_code_travels_along_and_is_left_out_of_the_job() {
        Map<String, String> form = sign();
        form.putAll(Map.of("site.region", "A2", "site.k4", "1.1", "site.stands-for", "6"));
        assertThat(Pool.fields(send(form, "redraw").body())).containsEntry("site.region", "A2").containsEntry("site.stands-for", "6");
        JsonNode site = job(form).path("site");
        assertThat(site.has("region")).isFalse();
        assertThat(site.has("k4")).isFalse();
        assertThat(site.path("stands-for").stringValue()).isEqualTo("6 months");
    }

    @Test
    void a_zone_stands_in_place_of_the_speed() {
        Map<String, String> form = sign();
        form.put("basis.code", "en-1991-1-4/2005-de");
        form.put("drawn-for", "en-1991-1-4/2005-de");
        form.put("site.basic-speed", "");
        form.put("site.averaging", "");
        String asked = send(form, "assess").body();
        assertThat(asked).contains("href=\"#site.basic-speed\"").contains("href=\"#site.averaging\"").contains("id=\"site.wind-zone\"")
            .contains("leave it empty where the zone or region below is given");
        form.put("site.wind-zone", "2");
        JsonNode site = job(form).path("site");
        assertThat(site.has("basic-speed")).isFalse();
        assertThat(site.path("wind-zone").stringValue()).isEqualTo("2");
        assertThat(Pool.get("/fill?code=en-1991-1-4/2005").body()).doesNotContain("leave it empty where");
    }

    @Test
    void answers_that_stand_in_the_tables_of_a_code_are_choices() {
        String germany = Pool.plain(Pool.get("/fill?kind=hoarding&code=en-1991-1-4/2005-de").body());
        assertThat(germany).containsPattern("<select id=\"site.wind-zone\"").contains("<option value=\"2\">Zone 2: 25.0 m/s</option>",
            "<option value=\"2 coast\">Zone 2 coast: simplified pressure up to 25 m</option>", "in which the terrain plays no part", "it is not used, but the job file asks for it");
        assertThat(germany.split("value=\"2 inland\"").length).isEqualTo(2);
        assertThat(Pool.plain(Pool.get("/fill?code=en-1991-1-4/2005-uk").body())).contains("<option value=\"April to September\">April to September</option>",
            "<option value=\"two months from May to August\">Two months from May to August</option>").doesNotContain("it is not used, but");
        assertThat(Pool.get("/fill?code=as-nzs-1170-2/2011").body()).containsPattern("<select id=\"site.region\"").contains("<option value=\"W\">W</option>");
        assertThat(Pool.get("/fill?code=as-nzs-1170-2/2021").body()).doesNotContain("<option value=\"W\">");
        Map<String, String> form = sign();
        form.putAll(Map.of("basis.code", "as-nzs-1170-2/2021", "drawn-for", "as-nzs-1170-2/2021", "site.region", "A2"));
        assertThat(Pool.fields(send(form, "code").body())).containsEntry("site.region", "A2");
    }

    @Test
    void what_may_stay_empty_is_marked() {
        String page = Pool.plain(Pool.get("/fill?kind=post-sign&code=en-1991-1-4/2005-de").body());
        assertThat(page).contains("Answers marked (optional) may stay empty", ">Mark</label>", ">Wind zone (optional)</label>", ">Width, in m</label>", ">Thickness, in mm (optional)</label>",
            ">Height above the sea, in m (optional)</label>", ">Distance between posts, in m</label>", ">Basic wind speed, in m/s</label>");
        assertThat(Pool.get("/fill?code=en-1991-1-4/2005-uk").body()).contains(">Height above the sea, in m</label>");
        assertThat(page).doesNotContain("What is it fixed to? (optional)", "*</label>");
    }

    @Test
    void sentences_hold_the_short_name_of_the_code_and_read_well() {
        assertThat(Pool.plain(Pool.get("/fill?code=en-1991-1-4/2005-de").body())).contains(">EN 1991-1-4:2005 + A1:2010 defines it as a 10 min mean<");
        Map<String, String> form = sign();
        form.putAll(Map.of("site.terrain", "C", "site.ground-nearby", "hill"));
        assertThat(Pool.plain(send(form, "assess").body())).contains("Shape of the ground near by is missing: choose one of those below",
            "The answer to \"From the crest to the item\" is missing: type it like");
        form.put("site.ground-nearby", "flat");
        assertThat(Pool.plain(send(form, "assess").body())).contains("is not a terrain class of EN 1991-1-4:2005 + A1:2010; it has 0, I,");
    }

    @Test
    void less_than_a_millimetre_is_asked_about() {
        assertThat(Questions.reading("0.1", Dimension.LENGTH, Unit.of(Dimension.LENGTH, "mm").orElseThrow())).isEqualTo("= 0.1 mm: is that meant?");
        assertThat(Questions.reading("0.0002 m", Dimension.LENGTH, Unit.of(Dimension.LENGTH, "in").orElseThrow())).isEqualTo("= 0.2 mm: is that meant?");
        assertThat(Questions.reading("0.1", Dimension.LENGTH, Unit.of(Dimension.LENGTH, "in").orElseThrow())).doesNotContain("meant");
        assertThat(Questions.reading("0.0002", Dimension.LENGTH, Unit.of(Dimension.LENGTH, "m").orElseThrow())).doesNotContain("meant");
        assertThat(Questions.reading("0", Dimension.LENGTH, Unit.of(Dimension.LENGTH, "mm").orElseThrow())).doesNotContain("meant");
        Map<String, String> form = sign();
        form.put("items[0].boards[0].depth", "0.1");
        assertThat(Pool.plain(send(form, "code").body())).contains(">= 0.1 mm: is that meant?</p>", "and mm for a thickness or the gap to a wall");
    }

    @Test
    void a_region_with_its_return_period_stands_in_place_of_the_speed() {
        Map<String, String> form = sign();
        form.putAll(Map.of("basis.code", "as-nzs-1170-2/2021", "drawn-for", "as-nzs-1170-2/2021", "site.basic-speed", "", "site.averaging", "", "site.terrain", "unknown",
            "site.region", "A", "site.return-period", "500"));
        JsonNode job = job(form);
        assertThat(job.path("site").has("basic-speed")).isFalse();
        assertThat(Pool.get("/answer?j=" + Token.of(job)).body()).contains("kN");
        form.remove("site.return-period");
        assertThat(send(form, "assess").statusCode()).isEqualTo(422);
    }

    @Test
    void a_roughness_length_is_typed_with_or_without_its_unit_or_not_known() {
        Map<String, String> form = sign();
        form.putAll(Map.of("basis.code", "open-flow/1", "drawn-for", "open-flow/1", "site.averaging", "3 s gust", "site.terrain", "0.05"));
        assertThat(job(form).path("site").path("terrain").stringValue()).isEqualTo("0.05 m");
        form.put("site.terrain", "2 in");
        assertThat(job(form).path("site").path("terrain").stringValue()).isEqualTo("2 in");
        form.put("site.terrain", "Unknown");
        assertThat(job(form).path("site").path("terrain").stringValue()).isEqualTo("unknown");
        form.put("site.terrain", "");
        assertThat(Pool.plain(send(form, "assess").body())).contains("Roughness length of the ground on the windward side is missing: type a roughness length such as 0.05 m");
        form.put("site.terrain", "rough");
        assertThat(send(form, "assess").statusCode()).isEqualTo(422);
    }

    @Test
    void a_converted_speed_that_is_offered_is_taken_with_its_kind() {
        Map<String, String> form = sign();
        form.putAll(Map.of("site.basic-speed", "38", "site.averaging", "3 s gust"));
        Map<String, String> taken = Pool.fields(send(form, "set:site.averaging=26.6 m/s as a 10 min mean").body());
        assertThat(taken).containsEntry("site.basic-speed", "26.6 m/s").containsEntry("site.averaging", "10 min mean");
        assertThat(job(taken).path("site").path("basic-speed").stringValue()).isEqualTo("26.6 m/s");
        FormProblems offered = new FormProblems(List.of(new Problem("site.averaging", "is a gust", List.of("26.6 m/s as a 10 min mean"))));
        Bit bit = questions(Optional.empty(), new Answers(Map.of()), offered).ask(site(), "site", "averaging").get(0);
        assertThat(bit.input().readings()).extracting(FormView.Button::value).containsExactly("set:site.averaging=26.6 m/s as a 10 min mean");
    }

    private static broadside.job.Shape site() {
        return Shapes.JOB.field("site").orElseThrow().shape().orElseThrow();
    }

    private static Questions questions(Optional<WindCode> code, Answers answers, FormProblems problems) {
        FormTables tables = FormTables.of(TableLibrary.shipped(), Pool.ASSESSOR);
        return new Questions(answers, code, new HeldByChoices(tables.scope(), answers, "items[0]"), tables, problems);
    }

    /** A code whose terrain is a roughness length and whose speed may come from a region. */
    private static WindCode byRoughness() {
        WindCode shipped = Pool.ASSESSOR.codes().code("en-1991-1-4/2005").orElseThrow();
        SiteTerms terms = new SiteTerms(List.of(Averaging.GUST_3_S), List.of(), "0.0002 m", Set.of("region", "duration-rule"));
        return new WindCode() {
            @Override
            public CodeFacts facts() {
                return new CodeFacts(shipped.edition(), terms, shipped.facts().level(), shipped.symbols(), "q");
            }

            @Override
            public double workOutVelocityPressure(Site site, double height, Trace trace) {
                return 0;
            }

            @Override
            public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
                return List.of();
            }
        };
    }

    @Test
    void a_code_without_classes_asks_for_a_roughness_length() {
        Answers answers = new Answers(Map.of("site.terrain", "0.03"));
        Bit box = questions(Optional.of(byRoughness()), answers, new FormProblems(List.of())).ask(site(), "site", "terrain").get(0);
        assertThat(box.input().kind()).isEqualTo("text");
        assertThat(box.input().label()).endsWith(", in m");
        assertThat(box.input().reading()).startsWith("= 0.03 m");
        assertThat(box.input().hint()).contains("open 0.03").contains("unknown");
        assertThat(SiteFields.foreign(Optional.of(byRoughness()))).contains("direction-factor", "regional-speed").doesNotContain("region", "duration-rule");
    }
}
