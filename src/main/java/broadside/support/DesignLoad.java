package broadside.support;

/**
 * What a post has to take at its foot in one case, factored as its rule asks. Magnitudes, N and N m.
 *
 * @param named       the case
 * @param shear       along the wind on the face
 * @param moment      about the strong axis
 * @param torsion     about the post itself
 * @param weakShear   along the face
 * @param weakMoment  about the weak axis
 * @param axial       compression
 * @param height      of the post above the ground, m
 */
public record DesignLoad(String named, double shear, double moment, double torsion, double weakShear, double weakMoment, double axial, double height) {

    /** A torsion this small beside the moments is the noise of a sum that is zero on paper. */
    private static final double NOISE = 1e-9;

    boolean twisted() {
        return torsion > NOISE * (moment + weakMoment);
    }
}
