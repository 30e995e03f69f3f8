package broadside.support;

import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import java.util.List;

/** The named rules of stability, from rules.csv; the user picks one. */
public final class StabilityRules {

    private final Rows rows;

    /** Reads the rules of the tables of stability. */
    public StabilityRules(Edition stability) {
        this.rows = stability.rows("rules");
    }

    public List<String> keys() {
        return rows.keys();
    }

    /** The rule of a key; another key is refused with those that there are. */
    public StabilityRule of(String key) {
        if (!rows.has(key)) {
            throw new UnfitAnswer("basis.stability", "\"" + key + "\" is not a rule of stability; known are " + String.join(", ", keys()));
        }
        return read(key, "required");
    }

    /** The same rule with the ratio that it asks for against sliding. */
    public StabilityRule sliding(StabilityRule rule) {
        return rows.has(rule.key()) ? read(rule.key(), "sliding") : rule;
    }

    private StabilityRule read(String key, String required) {
        Coefficient weight = rows.number(key, "weight");
        String level = rows.text(key, "level");
        if (!List.of("service", "strength").contains(level)) {
            throw new IllegalArgumentException("rules.csv " + key + ": the level is service or strength, found " + level);
        }
        return new StabilityRule(key, rows.text(key, "title"), weight.value(), rows.number(key, "wind").value(), level.equals("strength"),
            rows.number(key, required).value(), rows.text(key, "place"), weight.source().status());
    }
}
