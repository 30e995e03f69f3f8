package broadside.panel;

import broadside.quantity.Length;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The posts of a sign, evenly spaced about its middle. One post needs no spacing.
 *
 * @param section  outer sizes of a post, where they are known
 */
public record Posts(int count, Optional<Length> spacing, Optional<PostSection> section) {

    /** Distance of each post from the middle of the posts, m, from the left. */
    public List<Double> positions() {
        double step = spacing.map(Length::metres).orElse(0.0);
        List<Double> at = new ArrayList<>(count);
        for (int i = 0; i < count; i++) {
            at.add((i - (count - 1) / 2.0) * step);
        }
        return at;
    }
}
