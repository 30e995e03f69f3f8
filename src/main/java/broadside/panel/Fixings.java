package broadside.panel;

import broadside.quantity.Force;
import broadside.quantity.Length;
import java.util.Optional;

/**
 * A grid of fixings, as typed: of a panel on a wall, or of one bracket of a blade sign.
 *
 * @param tension  allowable pull on one fixing
 * @param shear    allowable shear of one fixing
 */
public record Fixings(int columns, int rows, Optional<Length> horizontalPitch, Optional<Length> verticalPitch, Optional<Force> tension, Optional<Force> shear) {

    public int count() {
        return columns * rows;
    }

    public double horizontal() {
        return horizontalPitch.map(Length::metres).orElse(0.0);
    }

    public double vertical() {
        return verticalPitch.map(Length::metres).orElse(0.0);
    }
}
