package broadside.trace;

import java.util.List;
import java.util.Optional;

/**
 * One line of the calculation sheet. Page and PDF print steps and compute nothing.
 *
 * @param name      fixed name of the quantity, with its zone or case behind a slash
 * @param symbol    what is found, as the publication writes it
 * @param meaning   the same in plain words
 * @param way       whether {@code formula} is a relation that can be worked out or tells how a table was read
 * @param formula   the relation in symbols, or how the table was read
 * @param inputs    the values that went in
 * @param value     the result in SI
 * @param unit      SI unit; "1" for a plain number
 * @param place     publication and clause, equation or table
 * @param status    how well that place is known
 * @param replaced  what was calculated before the user's own value took its place, with the reason
 */
public record Step(String name, String symbol, String meaning, Way way, String formula, List<Input> inputs,
                   double value, String unit, String place, Status status, Optional<Replaced> replaced) {

    /** A value that went into a step. */
    public record Input(String symbol, double value, String unit) { }

    /** A calculated value that the user replaced. */
    public record Replaced(double calculated, String reason) { }

    /** Kind of the text in {@code formula}. */
    public enum Way {
        /** A relation that gives the value when the inputs are put in. */
        RELATION,
        /** How a table or rule was read, in words. */
        READING
    }

    public Step {
        finite(name, value);
        inputs = List.copyOf(inputs);
    }

    static double finite(String name, double value) {
        if (!Double.isFinite(value)) {
            throw new ArithmeticException("the step " + name + " gave " + value + ", which is no result");
        }
        return value;
    }
}
