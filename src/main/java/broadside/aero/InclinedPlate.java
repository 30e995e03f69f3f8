package broadside.aero;

/** A flat plate at an angle to an even stream, in radians between the wind and the plane of the plate. */
public final class InclinedPlate {

    /** Normal force of an endless plate in separated flow, 1 / (a + b / sin(angle)). */
    public static double normalForce(double angle, double a, double b) {
        return 1 / (a + b / Math.sin(angle));
    }

    /** Centre of pressure from the windward edge over the chord, 1/2 - (3/4) cos / (4 + pi sin) (Rayleigh, Kirchhoff). */
    public static double centreOfPressure(double angle) {
        return 0.5 - 0.75 * Math.cos(angle) / (4 + Math.PI * Math.sin(angle));
    }

    private InclinedPlate() { }
}
