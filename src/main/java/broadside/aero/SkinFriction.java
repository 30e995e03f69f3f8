package broadside.aero;

/** Mean friction on one side of a smooth plate along the stream; the Reynolds number is that of its length. */
public final class SkinFriction {

    /** c / Re^n: one half for a laminar layer, one fifth for a turbulent one. */
    public static double power(double reynolds, double c, double n) {
        return c / Math.pow(reynolds, n);
    }

    /** c / (log10 Re)^n. */
    public static double logarithmic(double reynolds, double c, double n) {
        return c / Math.pow(Math.log(reynolds) / Math.log(10), n);
    }

    private SkinFriction() { }
}
