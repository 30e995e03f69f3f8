package broadside.assess;

import broadside.panel.Item;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/**
 * What came out for one item.
 *
 * @param refusal  why there are no loads, when there are none
 * @param loads    the loads, when the code covers the item
 * @param sheet    the calculation sheet, as far as it went
 */
public record ItemResult(Item item, Outcome outcome, Optional<Refusal> refusal, Optional<Loads> loads, List<Note> notes, Trace sheet) {

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

    /** Why the code gives no loads: which code and clause, the reason, and what can be done. */
    public record Refusal(String code, String clause, String reason, String instead) { }

    public ItemResult {
        notes = List.copyOf(notes);
    }
}
