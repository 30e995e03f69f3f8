package broadside.site;

import broadside.quantity.Length;
import java.util.Optional;

/**
 * A hill, ridge or escarpment near the site.
 *
 * @param feature            shape of the ground
 * @param height             height of the crest above the foot
 * @param upwindLength       length of the upwind slope in plan, from the foot to the crest
 * @param downwindLength     length of the downwind slope in plan, where there is one
 * @param halfLength         distance in plan upwind from the crest to half the height, where it was measured
 * @param distanceFromCrest  from the crest to the site, positive downwind
 */
public record Topography(Feature feature, Length height, Length upwindLength, Optional<Length> downwindLength,
                         Optional<Length> halfLength, Length distanceFromCrest) {

    /** Shape of the ground, with the word used in a job file and in the tables. */
    public enum Feature {
        HILL("hill"), RIDGE("ridge"), ESCARPMENT("escarpment");

        private final String word;

        Feature(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }
}
