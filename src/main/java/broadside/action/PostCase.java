package broadside.action;

/**
 * What the wind on the boards does to the foot of one post in one case, at the level of the code, as magnitudes. With
 * several posts torsion goes into them as a couple; one post takes it itself. The force of a board lies evenly over its height.
 *
 * @param post     its number from the left, from 1
 * @param shear    N
 * @param moment   N m
 * @param torsion  N m
 * @param squares  sum of force times the square of its height, N m2
 * @param cubes    sum of force times the cube of its height, N m3
 */
public record PostCase(int post, String named, String state, double shear, double moment, double torsion, double squares, double cubes) {

    static PostCase of(int post, double x, int count, double spread, FootActions.Combined combined) {
        double[] sums = new double[4];
        for (PanelForce panel : combined.combination().panels()) {
            double share = panel.force() * (1.0 / count + (spread == 0 ? 0 : panel.side() * x / spread));
            double z = panel.height();
            double high = panel.panel().height() * panel.panel().height();
            sums[0] += share;
            sums[1] += share * z;
            sums[2] += share * (z * z + high / 12);
            sums[3] += share * z * (z * z + high / 4);
        }
        // A value of the user's own may stand in place of the force or of the moment.
        double forces = combined.force() / combined.combination().force();
        double moments = combined.moment() / combined.combination().moment();
        double torsion = count == 1 ? combined.combination().torsion() : 0;
        return new PostCase(post, combined.name(), combined.state(), Math.abs(sums[0] * forces), Math.abs(sums[1] * moments), Math.abs(torsion * forces),
            Math.abs(sums[2] * moments), Math.abs(sums[3] * moments));
    }
}
