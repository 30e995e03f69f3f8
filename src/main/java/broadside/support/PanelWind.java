package broadside.support;

/**
 * Wind on one panel of a fence, or on one post of a hoarding, at the level of the code.
 *
 * @param named    in words, such as "hardest panel, covered"; it names the case in the checks
 * @param part     the same for the names of steps, such as "hardest-covered"
 * @param force    N, under the symbol with which it was recorded
 * @param height   of that force above the ground, m
 * @param covered  whether the panel carries its cover
 */
public record PanelWind(String named, String part, Check.In force, Check.In height, boolean covered) {

    public PanelWind {
        if (!(force.value() >= 0) || !(height.value() >= 0)) {
            throw new IllegalArgumentException("force and height of the wind are magnitudes; " + named + " has " + force.value() + " N at " + height.value()
                + " m");
        }
    }
}
