package broadside.aero;

import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** A cable between two points of equal height under an even load. Lengths in metres, loads in newtons. */
public final class Cable {

    /** Pull along the span when the load is even along the span: w L^2 / (8 s). Statics. */
    public static double parabola(double load, double span, double sag) {
        return load * span * span / (8 * sag);
    }

    /**
     * Parameter a of the catenary y = a cosh(x/a) with the given span and sag: a (cosh(L/2a) - 1) = s; the pull along
     * the span is the load for each metre of cable times a. Statics.
     */
    public static double catenary(double span, double sag) {
        // With u = L/2a the condition is (cosh u - 1)/u = 2 s/L, which grows with u.
        double wanted = 2 * sag / span;
        double u = new BrentSolver(1e-14, 1e-14).solve(1000, x -> 2 * Math.pow(Math.sinh(x / 2), 2) / x - wanted, 1e-9, Math.max(2 * wanted, 20));
        return span / (2 * u);
    }

    private Cable() { }
}
