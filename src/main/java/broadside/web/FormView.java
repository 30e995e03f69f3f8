package broadside.web;

import java.util.ArrayList;
import java.util.List;

/** What the template of the form shows. Every text is finished; the template decides nothing. */
public final class FormView {

    /** The whole form. */
    public record Page(String heading, List<Line> problems, List<Part> parts, Picture picture, Units units, List<ItemLink> items,
                       List<Button> moreItems, List<Hidden> hidden, String status) { }

    /** A line of the list of problems; {@code target} is the id it leads to, empty when there is none. */
    public record Line(String target, String text) { }

    /** A group of questions. */
    public record Part(String anchor, String title, String lead, List<Bit> bits) { }

    /** A piece of a part: a question, a row of questions, a fold, an entry of a list, or buttons. {@code kind} names the fragment. */
    public record Bit(String kind, Input input, String title, String anchor, boolean open, List<Bit> bits, List<Button> buttons) {

        static Bit ask(Input input) {
            return new Bit(input.kind(), input, "", "", false, List.of(), List.of());
        }

        static Bit row(List<Bit> bits) {
            return new Bit("row", null, "", "", false, bits, List.of());
        }

        static Bit fold(String title, String anchor, boolean open, List<Bit> bits) {
            return new Bit("fold", null, title, anchor, open, bits, List.of());
        }

        static Bit entry(String title, String anchor, List<Bit> bits, List<Button> buttons) {
            return new Bit("entry", null, title, anchor, false, bits, buttons);
        }

        static Bit buttons(List<Button> buttons) {
            return new Bit("buttons", null, "", "", false, List.of(), buttons);
        }

        /** A sentence between questions. */
        static Bit words(String sentence) {
            return new Bit("words", null, sentence, "", false, List.of(), List.of());
        }

        /** Short questions stand side by side where there is room. */
        static List<Bit> rows(List<Bit> bits) {
            List<Bit> rows = new ArrayList<>();
            List<Bit> row = new ArrayList<>();
            for (Bit bit : bits) {
                if (bit.kind().equals("radio")) {
                    flush(rows, row);
                    rows.add(bit);
                } else {
                    row.add(bit);
                }
            }
            flush(rows, row);
            return rows;
        }

        private static void flush(List<Bit> rows, List<Bit> row) {
            if (!row.isEmpty()) {
                rows.add(row(List.copyOf(row)));
                row.clear();
            }
        }

        /** Whether something was typed in it, or something in it is wrong. */
        boolean typed() {
            return input != null && (!input.typed().isBlank() || input.wrong()) || bits.stream().anyMatch(Bit::typed);
        }
    }

    /** One question; one that is not {@code optional} has to be answered. {@code label} holds the unit in words; null stands for an attribute that is left out. */
    public record Input(String kind, String id, String label, String unit, String hint, String typed, String reading, String problem,
                        List<Button> readings, List<Choice> choices, String keypad, String width, boolean optional) {

        /** The same question, said to be one that may stay empty. */
        Input asOptional() {
            return new Input(kind, id, label, unit, hint, typed, reading, problem, readings, choices, keypad, width, true);
        }

        public boolean wrong() {
            return !problem.isEmpty();
        }

        /** The ids that describe the box; null when there are none. */
        public String describedBy() {
            String ids = (hint.isEmpty() ? "" : id + "-hint ") + (reading == null ? "" : id + "-reading ") + (wrong() ? id + "-problem" : "");
            return ids.isBlank() ? null : ids.strip();
        }
    }

    /**
     * One answer to choose. {@code words} are the user's, {@code code} are those of the code.
     *
     * @param unfolds  id of the fold that opens when it is chosen and shuts when another is; empty for most
     */
    public record Choice(String id, String value, String words, String code, boolean chosen, String unfolds) {

        Choice(String id, String value, String words, String code, boolean chosen) {
            this(id, value, words, code, chosen, "");
        }
    }

    /** A button that sends the form; {@code target} is where the page opens again. */
    public record Button(String value, String text, String target) { }

    /** A field that is carried along unseen. */
    public record Hidden(String name, String value) { }

    /** The drawing beside the form; {@code source} is empty when the sizes cannot be read yet. */
    public record Picture(String source, String words) { }

    /** The system of units in use and the button to the other. */
    public record Units(String now, Button other) { }

    /** One item of the job. */
    public record ItemLink(String mark, boolean here, Button button) { }

    private FormView() { }
}
