package broadside.web;

import broadside.table.Edition;
import broadside.table.Rows;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Answers that stand in the tables of a code and not in the declarations of the job file: regions, wind zones, seasons. */
final class TableChoices {

    private static final String REGIONS = "regional-speeds";
    private static final String ZONES = "wind-zones";
    private static final String SIMPLIFIED = "simplified-pressure";
    private static final String SEASONS = "season";

    /** The answers to a question with their words on the page, in the order of print; none where the tables have no list for it. */
    static Map<String, String> of(Edition edition, String field) {
        Map<String, String> answers = new LinkedHashMap<>();
        switch (field) {
            case "region" -> keys(edition, REGIONS).forEach(key -> answers.put(key, key));
            case "season" -> keys(edition, SEASONS).forEach(key -> answers.put(key, key.substring(0, 1).toUpperCase(Locale.ROOT) + key.substring(1)));
            case "wind-zone" -> {
                keys(edition, ZONES).forEach(key -> answers.put(key, "Zone " + key + ": " + edition.rows(ZONES).text(key, "speed") + " m/s"));
                if (simplified(edition)) {
                    Rows rows = edition.rows(SIMPLIFIED);
                    rows.keys().forEach(key -> answers.put(rows.text(key, "site"), "Zone " + rows.text(key, "site") + ": simplified pressure up to "
                        + rows.text(key, "height") + " m"));
                }
            }
            default -> { }
        }
        return answers;
    }

    /** Whether some wind zones come with a pressure that holds the terrain already. */
    static boolean simplified(Edition edition) {
        return edition.has(ZONES) && edition.has(SIMPLIFIED);
    }

    private static List<String> keys(Edition edition, String table) {
        return edition.has(table) ? edition.rows(table).keys() : List.of();
    }

    private TableChoices() { }
}
