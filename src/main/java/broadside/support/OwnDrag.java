package broadside.support;

/**
 * Wind on the bare post itself, at the level of the code.
 *
 * @param force    N
 * @param moment   at the ground, N m
 * @param bending  sum of force times the square of its height, N m2
 * @param cubes    sum of force times the cube of its height, N m3
 */
public record OwnDrag(double force, double moment, double bending, double cubes) {

    public static final OwnDrag NONE = new OwnDrag(0, 0, 0, 0);

    /**
     * An even wind on a length of the post.
     *
     * @param perMetre  N/m
     * @param from      its lower end above the ground, m
     * @param to        its upper end, m
     */
    public static OwnDrag even(double perMetre, double from, double to) {
        double force = perMetre * (to - from);
        return new OwnDrag(force, force * (from + to) / 2, perMetre * (to * to * to - from * from * from) / 3,
            perMetre * (to * to * to * to - from * from * from * from) / 4);
    }

    public OwnDrag plus(OwnDrag other) {
        return new OwnDrag(force + other.force, moment + other.moment, bending + other.bending, cubes + other.cubes);
    }
}
