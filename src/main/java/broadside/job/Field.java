package broadside.job;

import broadside.quantity.Dimension;
import java.util.List;
import java.util.Optional;

/**
 * One field of the job file: its name, what it holds, and what it means. The reader, the schema and the form are made
 * from these declarations, so they cannot differ.
 *
 * @param dimension  of a quantity
 * @param choices    words that fit, for a choice
 * @param shape      of an object, or of each entry of a list
 */
public record Field(String name, Holds holds, boolean required, String meaning, Optional<Dimension> dimension, List<String> choices,
                    Optional<Shape> shape) {

    /** What a field holds. */
    public enum Holds {
        TEXT, NUMBER, WHOLE, QUANTITY, CHOICE, OBJECT, LIST,
        /** A plain number, or one of the words of the choices. */
        NUMBER_OR_CHOICE,
        /** A plain number, or a quantity of any dimension. */
        NUMBER_OR_QUANTITY
    }

    public Field {
        choices = List.copyOf(choices);
    }

    static Field text(String name, String meaning) {
        return new Field(name, Holds.TEXT, false, meaning, Optional.empty(), List.of(), Optional.empty());
    }

    static Field number(String name, String meaning) {
        return new Field(name, Holds.NUMBER, false, meaning, Optional.empty(), List.of(), Optional.empty());
    }

    static Field whole(String name, String meaning) {
        return new Field(name, Holds.WHOLE, false, meaning, Optional.empty(), List.of(), Optional.empty());
    }

    static Field quantity(String name, Dimension dimension, String meaning) {
        return new Field(name, Holds.QUANTITY, false, meaning, Optional.of(dimension), List.of(), Optional.empty());
    }

    static Field choice(String name, String meaning, List<String> choices) {
        return new Field(name, Holds.CHOICE, false, meaning, Optional.empty(), choices, Optional.empty());
    }

    static Field numberOrChoice(String name, String meaning, List<String> choices) {
        return new Field(name, Holds.NUMBER_OR_CHOICE, false, meaning, Optional.empty(), choices, Optional.empty());
    }

    static Field object(String name, Shape shape, String meaning) {
        return new Field(name, Holds.OBJECT, false, meaning, Optional.empty(), List.of(), Optional.of(shape));
    }

    static Field list(String name, Shape shape, String meaning) {
        return new Field(name, Holds.LIST, false, meaning, Optional.empty(), List.of(), Optional.of(shape));
    }

    static Field numberOrQuantity(String name, String meaning) {
        return new Field(name, Holds.NUMBER_OR_QUANTITY, false, meaning, Optional.empty(), List.of(), Optional.empty());
    }

    Field needed() {
        return new Field(name, holds, true, meaning, dimension, choices, shape);
    }
}
