package broadside.assess;

import broadside.panel.Item;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/**
 * What came out for one item.
 *
 * @param refusal  why there are no loads, or why they are loads only
 * @param loads    the loads, when the code covers the item; outside the scope they are loads only
 * @param sheet    the calculation sheet, as far as it went
 * @param limits   the winds at which its checks are just met, where they were asked for and something was checked
 */
public record ItemResult(Item item, Outcome outcome, Optional<Refusal> refusal, Optional<Loads> loads, List<Note> notes, Trace sheet,
                         Optional<Limits> limits) {

    /** How it ended, with the word of the result file. */
    public enum Outcome {
        ASSESSED("assessed"), NOT_COVERED("not-covered"), OUTSIDE_SCOPE("outside-scope");

        private final String word;

        Outcome(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    /** The sentence that stands wherever an item is outside the scope. */
    public static final String OUTSIDE = "Outside the scope of this tool: an engineer is needed";

    /**
     * Why the code gives no loads: which code and clause, the reason, and what can be done. Outside the scope of the tool
     * {@code code} is empty, {@code clause} names the case, and {@code instead} says what to send to the engineer.
     */
    public record Refusal(String code, String clause, String reason, String instead) {

        public boolean ofScope() {
            return code.isEmpty();
        }
    }

    public ItemResult {
        notes = List.copyOf(notes);
    }

    ItemResult with(Optional<Limits> found) {
        return new ItemResult(item, outcome, refusal, loads, notes, sheet, found);
    }
}
