package broadside.aero;

/**
 * Force per metre along a panel: steps from zone to zone, and a tilt that moves the resultant off the middle.
 * Positions in metres from the left edge of the panel.
 */
public final class LineLoad {

    private final double[] from;
    private final double[] to;
    private final double[] force;
    private final double middle;
    private final double tilt;

    /**
     * Makes a line load.
     *
     * @param from   where each zone begins
     * @param to     where each zone ends
     * @param force  force per metre in each zone, N/m
     * @param width  width of the panel
     * @param shift  how far the resultant is moved off that of the zones, spread in a straight line over the width:
     *               the load is multiplied by 1 + 12 shift (x - width/2) / width^2
     */
    public LineLoad(double[] from, double[] to, double[] force, double width, double shift) {
        this.from = from.clone();
        this.to = to.clone();
        this.force = force.clone();
        this.middle = width / 2;
        this.tilt = 12 * shift / (width * width);
    }

    /** Force on the stretch between two positions, N. */
    public double force(double start, double end) {
        double sum = 0;
        for (int i = 0; i < force.length; i++) {
            double a = Math.max(start, from[i]);
            double b = Math.min(end, to[i]);
            if (b > a) {
                sum += force[i] * (b - a) * (1 + tilt * ((a + b) / 2 - middle));
            }
        }
        return sum;
    }
}
