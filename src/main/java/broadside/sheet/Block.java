package broadside.sheet;

import java.util.List;

/** One block of a sheet. Each kind has one writer for the page and one for the PDF. */
public sealed interface Block {

    /** A heading; {@code level} 1 is the title of the document, {@code anchor} is unique in the sheet. */
    record Heading(int level, String text, String anchor) implements Block { }

    /** Running text. */
    record Paragraph(String text, Tone tone) implements Block { }

    /** The first thing to read: at most five lines in large type. */
    record Answer(List<Fact> lines) implements Block {
        public Answer {
            lines = List.copyOf(lines);
        }
    }

    /** Labels with their values, such as the fields of the check list. */
    record Facts(String caption, List<Fact> facts) implements Block {
        public Facts {
            facts = List.copyOf(facts);
        }
    }

    /** One label with its value; {@code remark} may be empty; {@code strong} marks what someone must confirm. */
    record Fact(String label, String value, String remark, boolean strong) {
        public static Fact of(String label, String value) {
            return new Fact(label, value, "", false);
        }

        public static Fact of(String label, String value, String remark) {
            return new Fact(label, value, remark, false);
        }
    }

    /** A table. The first cell of each row is the row's heading. */
    record Table(String caption, List<Column> columns, List<Row> rows) implements Block {
        public Table {
            columns = List.copyOf(columns);
            rows = List.copyOf(rows);
        }
    }

    /** A column; numbers stand to the right in tabular figures; {@code weight} is its share of the width. */
    record Column(String heading, boolean number, int weight) { }

    /** A row; {@code marked} rows govern and are set strong, and say so in words in one of their cells. */
    record Row(List<String> cells, boolean marked) {
        public Row {
            cells = List.copyOf(cells);
        }
    }

    /** A drawing to scale with its caption and the same content in words. */
    record Picture(Drawing drawing, String caption, String alternative) implements Block { }

    /** The calculation sheet: one entry for each recorded step, in the order of calculation. */
    record Steps(List<StepLine> lines) implements Block {
        public Steps {
            lines = List.copyOf(lines);
        }
    }

    /**
     * One line of the calculation. {@code symbol}, {@code formula} and {@code numbers} may hold subscripts,
     * written {@code q_p} or {@code c_{p,net}}; see {@link Runs}.
     *
     * @param formula  a relation, which then begins with an equals sign, or how a table was read
     * @param numbers  the formula's inputs with the numbers put in, such as "I_v = 0.161, v_m = 34.8 m/s"
     * @param other    the value in the other system of units; may be empty
     * @param status   how well the source is known: read, second-hand, recalled, derived
     */
    record StepLine(int number, String name, String symbol, String meaning, String formula, String numbers,
                    String value, String unit, String other, String place, String status) {

        /** Whether the formula can be put between the symbol and the value. */
        public boolean relation() {
            return formula.startsWith("=");
        }

        /** How it was found, for a line below the value: the reading and the numbers, or the numbers alone. */
        public String found() {
            return relation() || formula.isBlank() ? numbers : numbers.isBlank() ? formula : formula + "; " + numbers;
        }
    }

    /** A list of sentences. */
    record Notes(List<String> items) implements Block {
        public Notes {
            items = List.copyOf(items);
        }
    }

    /** What follows begins on a new page of the PDF; the page on screen shows a rule. */
    record NewPage() implements Block { }

    /** How a paragraph is set. */
    enum Tone { PLAIN, CAUTION, SMALL }
}
