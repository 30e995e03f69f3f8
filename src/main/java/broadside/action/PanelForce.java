package broadside.action;

import broadside.aero.LineLoad;
import broadside.codes.LoadCase;
import broadside.codes.ZonePressure;
import broadside.panel.Panel;
import java.util.List;

/**
 * Resultant of one load case on one panel.
 *
 * @param force         N
 * @param height        of the resultant above the ground, m
 * @param eccentricity  of the resultant from the middle of the panel, m, positive to the right
 */
record PanelForce(Panel panel, LoadCase load, double force, double height, double eccentricity) {

    static PanelForce of(Panel panel, LoadCase load) {
        double sum = 0;
        double first = 0;
        for (ZonePressure zone : load.zones()) {
            double f = zone.pressure() * zone.width() * panel.height();
            sum += f;
            first += f * ((zone.from() + zone.to()) / 2 - panel.width() / 2);
        }
        double force = Math.max(sum, load.least());
        double eccentricity = first / sum + load.shift();
        // Even zones leave a remainder of binary rounding, which is no eccentricity.
        boolean rounding = Math.abs(eccentricity) < 1e-9 * panel.width();
        return new PanelForce(panel, load, force, panel.clearance() + panel.height() / 2 + load.rise(), rounding ? 0 : eccentricity);
    }

    /** Distance of the resultant from the middle of the item, m, positive to the right. */
    double side() {
        return panel.middle() + eccentricity;
    }

    /** Whether the least force of the case counts, and not the sum of its zones. */
    boolean raised() {
        return load.least() > 0 && force == load.least();
    }

    /** What all pressures are multiplied by to reach the least force of the case; 1 where the zones count. */
    double raise() {
        return force / load.zones().stream().mapToDouble(z -> z.pressure() * z.width() * panel.height()).sum();
    }

    /**
     * The greatest pressure of the panel over that of its zone. It is 1, except in a case that moves its resultant
     * without a rule of its own for that: there the pressure falls in a straight line, as in {@link LineLoad}.
     */
    double peak() {
        return load.rule().isPresent() ? 1 : 1 + 6 * Math.abs(load.shift()) / panel.width();
    }

    /** Force per metre along the panel; a least force of the code raises all zones alike. */
    LineLoad line() {
        List<ZonePressure> zones = load.zones();
        double raise = raise();
        return new LineLoad(zones.stream().mapToDouble(ZonePressure::from).toArray(), zones.stream().mapToDouble(ZonePressure::to).toArray(),
            zones.stream().mapToDouble(z -> z.pressure() * panel.height() * raise).toArray(), panel.width(), load.shift());
    }
}
