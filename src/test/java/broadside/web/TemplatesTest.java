package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.job.JobText;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class TemplatesTest {

    /** Ways by which text could reach a page unescaped, or be worked out as an expression. */
    private static final List<Pattern> FORBIDDEN = List.of(Pattern.compile("th:utext"), Pattern.compile("__\\$\\{"), Pattern.compile("th:on[a-z]"),
        Pattern.compile("\\[\\("), Pattern.compile("th:inline"), Pattern.compile("\\bon[a-z]+="), Pattern.compile("style="), Pattern.compile("th:field"),
        Pattern.compile("#fields"), Pattern.compile("javascript:"), Pattern.compile("https?://"));

    private static List<Path> templates() throws IOException {
        try (Stream<Path> files = Files.walk(Path.of("templates"))) {
            return files.filter(Files::isRegularFile).sorted().toList();
        }
    }

    @Test
    void templates_hold_nothing_that_is_forbidden() throws IOException {
        List<String> found = new ArrayList<>();
        for (Path template : templates()) {
            String text = Files.readString(template);
            FORBIDDEN.stream().filter(p -> p.matcher(text).find()).forEach(p -> found.add(template + " holds " + p));
        }
        assertThat(found).isEmpty();
        assertThat("<p th:utext=\"${x}\">").matches(".*" + FORBIDDEN.get(0) + ".*");
    }

    /** Names of templates and fragments are written out, never made from a value. */
    @Test
    void fragments_are_named_in_the_template_itself() throws IOException {
        Pattern use = Pattern.compile("th:(?:replace|insert)=\"([^\"]*)\"");
        for (Path template : templates()) {
            var uses = use.matcher(Files.readString(template));
            while (uses.find()) {
                assertThat(uses.group(1)).as(template.toString()).matches("~\\{[a-z]+ :: [a-z]+\\(.*\\)\\}|\\$\\{main\\}");
            }
        }
    }

    @Test
    void every_page_is_rendered_full_and_with_problems() throws IOException {
        Map<String, String> pages = pages();
        TreeSet<String> shown = new TreeSet<>(List.of("frame.html", "bits.html", "blocks.html"));
        pages.forEach((name, html) -> {
            shown.add(name.replaceAll(" .*", "") + ".html");
            assertThat(html).as(name).startsWith("<!DOCTYPE html>").endsWith("</html>\n").contains("<main id=\"main\"").contains("<h1")
                .contains("Broadside 0").doesNotContainPattern("\\bth:").doesNotContain("${").doesNotContain("Exception").doesNotContain("null");
            assertThat(Pattern.compile("<h1").matcher(html).results().count()).as("one main heading: " + name).isEqualTo(1);
            List<String> ids = Pattern.compile("\\sid=\"([^\"]*)\"").matcher(html).results().map(r -> r.group(1)).toList();
            assertThat(ids).as("ids of " + name).doesNotHaveDuplicates().doesNotContain("");
            Pattern.compile("href=\"#([^\"]+)\"").matcher(html).results().map(r -> r.group(1)).forEach(target -> assertThat(ids).as(name).contains(target));
            Pattern.compile("(?:for|aria-describedby|aria-labelledby)=\"([^\"]+)\"").matcher(html).results()
                .flatMap(r -> Stream.of(r.group(1).split(" "))).forEach(target -> assertThat(ids).as(name).contains(target));
        });
        assertThat(templates().stream().map(p -> p.getFileName().toString())).containsExactlyInAnyOrderElementsOf(shown);
    }

    private static Map<String, String> pages() {
        Map<String, String> pages = new LinkedHashMap<>();
        String token = Token.of(JobText.read(Pool.SIGN.getBytes(StandardCharsets.UTF_8)));
        String uncovered = Token.of(JobText.read(Pool.SIGN.replace("2.5 m", "400 m").getBytes(StandardCharsets.UTF_8)));
        pages.put("start", Pool.get("/").body());
        pages.put("form blank", Pool.get("/fill?kind=post-sign").body());
        pages.put("form full", Pool.get("/fill?j=" + token).body());
        for (Kind of : Kind.values()) {
            String kind = of.key();
            Map<String, String> form = Pool.fields(Pool.get("/fill?units=us&kind=" + kind + "&code=asce-7/16").body());
            for (String todo : List.of("add-board", "add-gate", "add-block", "add-factor")) {
                form.put("do", todo);
                form = Pool.fields(Pool.post("/fill", form).body());
            }
            form.replaceAll((name, text) -> List.of("kept", "item", "items[0].kind", "basis.code", "units").contains(name) ? text : "wrong");
            pages.put("form wrong " + kind, Pool.post("/fill", form).body());
        }
        pages.put("answer full", Pool.get("/answer?j=" + token).body());
        pages.put("answer uncovered", Pool.get("/answer?j=" + uncovered).body());
        pages.put("answer example", Pool.get("/answer?j=" + example()).body());
        pages.put("compare full", Pool.get("/side-by-side?j=" + token).body());
        pages.put("card", Pool.get("/card?j=" + token).body());
        pages.put("tables", Pool.get("/tables").body());
        pages.put("edition", Pool.get("/tables/asce-7/16").body());
        pages.put("checks", Pool.get("/checks").body());
        pages.put("publication", Pool.get("/checks/BNBC20").body());
        pages.put("publication mistakes", Pool.get("/checks/mistakes-in-print").body());
        pages.put("about", Pool.get("/about").body());
        pages.put("message plain", Pool.get("/nowhere").body());
        return pages;
    }

    private static String example() {
        var found = Pattern.compile("/answer\\?j=([^\"]+)\">Merrovale").matcher(Pool.get("/").body());
        assertThat(found.find()).isTrue();
        return found.group(1);
    }

    @Test
    void messages_are_rendered_with_lists_and_references() {
        Pages pages = new Pages(Pool.ASSESSOR.about());
        String html = pages.text("message", pages.frame("Broken"), new Failures.Message("Broken", "A <b>sentence</b>", List.of("one", "${7*7}"), "0a1b2c3d"));
        assertThat(html).contains("A &lt;b&gt;sentence&lt;/b&gt;").contains("<li>${7*7}</li>").contains("0a1b2c3d").doesNotContain("49");
    }
}
