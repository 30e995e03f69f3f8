package broadside.panel;

import broadside.quantity.Angle;
import broadside.quantity.Length;
import java.util.Optional;

/**
 * The building that a panel is fixed to, as a block.
 *
 * @param width      of the face that carries the panel
 * @param depth      at right angles to that face
 * @param height     from the ground to the top of the wall
 * @param roofSlope  where it was given
 * @param enclosure  how open its walls are
 */
public record Building(Length width, Length depth, Length height, Optional<Angle> roofSlope, Enclosure enclosure) {

    /** How open the walls are, with the word used in a job file. */
    public enum Enclosure {
        ENCLOSED("enclosed"), PARTIALLY_ENCLOSED("partially enclosed"), OPEN("open");

        private final String word;

        Enclosure(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }
}
