package broadside.panel;

import broadside.quantity.Length;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The posts of a sign, evenly spaced about its middle. One post needs no spacing.
 *
 * @param section  outer sizes of a post, where they are known
 * @param type     what the posts are made of
 */
public record Posts(int count, Optional<Length> spacing, Optional<PostSection> section, PostType type) {

    /** Posts of which nothing but their outer sizes is known. */
    public Posts(int count, Optional<Length> spacing, Optional<PostSection> section) {
        this(count, spacing, section, PostType.NONE);
    }

    /** The same posts with the outline of a section that was found or chosen. */
    public Posts with(PostSection outline) {
        return new Posts(count, spacing, Optional.of(outline), type);
    }

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
