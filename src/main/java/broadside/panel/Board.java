package broadside.panel;

import broadside.quantity.Length;
import broadside.quantity.Mass;
import java.util.Optional;

/**
 * One board of a sign.
 *
 * @param mark       its mark, empty when it has none
 * @param shape      outline; a disc or triangle is assessed by the rectangle around it
 * @param offset     of its middle from the middle of the posts, positive to the right seen from the front
 * @param depth      thickness of the board or box
 * @param solidity   solid area over gross area
 */
public record Board(String mark, Shape shape, Length width, Length height, Length clearance, Length offset, Length depth,
                    double solidity, Optional<Mass> mass) {

    /** Outline of a board, with the word used in a job file. */
    public enum Shape {
        RECTANGLE("rectangle"), DISC("disc"), TRIANGLE("triangle");

        private final String word;

        Shape(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    /** Area of the board over that of the rectangle around it. */
    public double areaShare() {
        return switch (shape) {
            case RECTANGLE -> 1;
            case DISC -> Math.PI / 4;
            case TRIANGLE -> 0.5;
        };
    }

    Panel panel(String part, int posts) {
        return new Panel(part, Panel.Kind.BOARD, width.metres(), height.metres(), clearance.metres(), offset.metres(), solidity, 0, 0, 1, posts,
            new Panel.AsTyped(width.typed(), height.typed(), clearance.typed(), offset.typed()));
    }
}
