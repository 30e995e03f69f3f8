package broadside.web;

import broadside.site.Averaging;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;

/** How single answers are offered, where the word of the job file is not plain enough. */
record ChoiceWords(String words, String small) {

    /** One line for each answer: field, word of the job file, words on the page, and a second line in small letters. */
    private static final String LINES = """
        held-by|own posts|Posts of its own, set in the ground or on pads|
        held-by|its own feet|Its own feet or blocks on the ground|
        held-by|building wall|The wall of a building, below its top|
        held-by|own supports|Two supports made for it|
        held-by|existing post|A post that was there before|
        held-by|existing wall|A free-standing wall that was there before|
        held-by|existing fence|A fence that was there before|
        held-by|parapet|A parapet|
        held-by|roof|A roof|
        held-by|lamp column|A lamp column|
        held-by|scaffold|A scaffold|
        held-by|tree|A tree|
        held-by|stage or screen|A stage, a screen or another structure of an event|
        ground-nearby|flat|No, it is flat|
        ground-nearby|hill|Yes, it is higher or lower|Its sizes are asked below
        ground-nearby|unknown|I don't know|The worst value of the code is taken, and the sheet says so
        feature|hill|A single hill|hill
        feature|ridge|A long hill that falls on both sides|ridge
        feature|escarpment|A slope up to high ground that stays high|escarpment
        terrain|unknown|I don't know|The smoothest ground of the code is taken, which gives the largest load
        backing|wall|A solid wall|Only the pressure outside acts on the panel
        backing|skin|Nothing: it is the skin of the building|The pressure inside the building acts on it too
        duration-rule|none|No: the full load counts|
        duration-rule|code|Yes: the code's own rule for a short stay counts|
        authority-minimum-level|code|At the level of the code's own loads|
        authority-minimum-level|service|At service level (allowable stress)|
        kind|planted|Planted: the post stands in the ground|
        kind|pier|Pier: a shaft of concrete|
        kind|pad|Pad: a block that holds by its weight|
        rule|ground-factor|Ground factor|
        rule|ibc|IBC, lateral bearing|
        rule|broms-clay|Broms, clay|
        rule|broms-sand|Broms, sand|
        design|en|Eurocodes|
        design|us-asd|United States, allowable stress|
        design|us-strength|United States, load and resistance factors|
        slope|unknown|I don't know|
        water|unknown|I don't know|
        water|deep|Deep below the footing|
        enclosure|enclosed|No: doors and windows are shut in a storm|enclosed
        enclosure|partially enclosed|Yes, mostly on one side|partially enclosed
        enclosure|open|Yes, on all sides|open
        """;

    private static final Map<String, ChoiceWords> KNOWN = known();

    static ChoiceWords of(String field, String value) {
        ChoiceWords known = KNOWN.get(field + "|" + value);
        boolean asItIs = Averaging.of(value).isPresent() || value.length() <= 3;
        return known != null ? known : new ChoiceWords(asItIs ? value : value.substring(0, 1).toUpperCase(Locale.ROOT) + value.substring(1), "");
    }

    private static Map<String, ChoiceWords> known() {
        Map<String, ChoiceWords> known = new HashMap<>();
        LINES.lines().forEach(line -> {
            String[] cells = line.split("\\|", -1);
            known.put(cells[0] + "|" + cells[1], new ChoiceWords(cells[2], cells[3]));
        });
        return Map.copyOf(known);
    }
}
