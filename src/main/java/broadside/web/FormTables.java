package broadside.web;

import broadside.assess.Assessor;
import broadside.support.Section.Material;
import broadside.table.Rows;
import broadside.table.TableLibrary;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;

/**
 * Answers that stand in tables beside the codes, with their words on the page in the order of the tables.
 *
 * @param scope    answers to "what is it fixed to?" that are outside the scope
 * @param answers  for a question such as "posts.series" each answer with its words
 */
record FormTables(Rows scope, Map<String, Map<String, String>> answers) {

    static FormTables of(TableLibrary tables, Assessor assessor) {
        Map<String, Map<String, String>> answers = new LinkedHashMap<>();
        answers.put("basis.stability", column(rows(tables, "stability/1", "rules"), "title"));
        Map<String, String> limits = column(rows(tables, "post-rules/1", "deflection-limits"), "place");
        Map<String, String> series = new LinkedHashMap<>();
        tables.editions().stream().filter(e -> e.key().startsWith("posts/") && e.has("sections")).forEach(e -> series.put(e.key().substring("posts/".length()), e.property("title")));
        Map<String, String> grades = new LinkedHashMap<>();
        for (boolean us : new boolean[] {false, true}) {
            for (Material material : Material.values()) {
                assessor.catalogue().gradeNames(us, material).forEach(name -> grades.put(name, name + ", " + material.name().toLowerCase(Locale.ROOT)));
            }
        }
        for (String posts : new String[] {"posts", "hoarding-posts"}) {
            answers.put(posts + ".deflection-limit", limits);
            answers.put(posts + ".series", series);
            answers.put(posts + ".grade", grades);
        }
        answers.put("footing.ground", grounds(tables));
        Map<String, String> surfaces = surfaces(rows(tables, "stability/1", "friction"));
        answers.put("banner-fence.ground", surfaces);
        answers.put("ballast.ground", surfaces);
        return new FormTables(rows(tables, "own-rules/1", "scope"), answers);
    }

    /** Surfaces by the name that comes first in the table, then those for feet of bare steel. */
    private static Map<String, String> surfaces(Rows friction) {
        Map<String, String> surfaces = new LinkedHashMap<>();
        Map<String, String> steel = new LinkedHashMap<>();
        for (String key : friction.keys()) {
            boolean bare = friction.text(key, "feet").equals("steel");
            for (String ground : friction.text(key, "ground").split("\\s*;\\s*")) {
                String word = bare ? "steel on " + ground : ground;
                (bare ? steel : surfaces).put(word, word.substring(0, 1).toUpperCase(Locale.ROOT) + word.substring(1) + (friction.isPrinted(key, "mu") ? "" : ": nothing holds there"));
            }
        }
        surfaces.putAll(steel);
        return surfaces;
    }

    /** Words for the ground, each with what the tables say it is. */
    private static Map<String, String> grounds(TableLibrary tables) {
        Rows words = rows(tables, "ground/1", "ground-words");
        Rows soils = rows(tables, "ground/1", "ibc-soils");
        Rows factors = rows(tables, "ground/1", "ground-factors");
        Map<String, String> grounds = new LinkedHashMap<>();
        for (String word : words.keys()) {
            String soil = words.text(word, "class");
            String ground = words.text(word, "ground");
            String says = !soil.equals("-") ? "class " + soil + ", " + soils.text(soil, "soil") : !ground.equals("-") ? "by the ground factor, " + factors.text(ground, "soil")
                : "no value is known for it";
            if (!word.startsWith("class ")) {
                grounds.put(word, word + ": " + says);
            }
        }
        return grounds;
    }

    private static Rows rows(TableLibrary tables, String edition, String table) {
        return tables.edition(edition).map(e -> e.rows(table)).orElseThrow();
    }

    private static Map<String, String> column(Rows rows, String column) {
        Map<String, String> words = new LinkedHashMap<>();
        rows.keys().forEach(key -> words.put(key, rows.text(key, column)));
        return words;
    }

    /** The answers to a question of a shape; none where no table lists them. */
    Map<String, String> of(String shape, String field) {
        return answers.getOrDefault(shape + "." + field, Map.of());
    }
}
