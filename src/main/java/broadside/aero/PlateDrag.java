package broadside.aero;

/** A sharp-edged flat plate square to an even stream. Lengths in metres. */
public final class PlateDrag {

    /**
     * Larger side over smaller side. A plate that stands on the ground is the upper half of one twice as high, as the
     * ground acts as a mirror.
     */
    public static double aspect(double width, double height, boolean onGround) {
        double whole = onGround ? 2 * height : height;
        return Math.max(width, whole) / Math.min(width, whole);
    }

    /** Fit base + slope (AR + 1/AR), not above the coefficient of an endless plate. */
    public static double fit(double aspect, double base, double slope, double endless) {
        return Math.min(base + slope * (aspect + 1 / aspect), endless);
    }

    private PlateDrag() { }
}
