package broadside.action;

import broadside.codes.LoadCase.Windward;
import broadside.codes.ZonePressure;
import java.util.List;

/**
 * What one load case does to the item and at its foot, wind from the front or from the back.
 *
 * @param state       which arrangement of the item this is, such as "envelope" or "bare-fence"; empty for the item as it stands
 * @param name        name of the case in its code
 * @param direction   "front" or "back": the face that the wind meets
 * @param windward    the end from which zones or eccentricity are measured, the worse one
 * @param zones       pressures on each panel
 * @param force       N
 * @param height      of the resultant above the ground, m
 * @param side        of the resultant from the middle of the item, m, positive to the right seen from the front
 * @param baseShear   N, with the wind on the posts where it is known
 * @param baseMoment  about the ground line or, for brackets, about the wall, N m
 * @param torsion     about the vertical line in the middle of the posts, N m; positive turns the right side backwards
 */
public record CaseAction(String state, String name, String label, String direction, Windward windward, List<PanelZones> zones, double force,
                         double height, double side, double baseShear, double baseMoment, double torsion) {

    /**
     * The zones of one panel; {@code part} is empty when the item has one panel only.
     *
     * @param left      left edge from the middle of the item, m
     * @param perMetre  moment at the ground for each metre of a wall in each zone, N m/m; empty for a board
     */
    public record PanelZones(String part, double left, List<ZonePressure> zones, List<Double> perMetre) {

        PanelZones atLevel(double factor) {
            return new PanelZones(part, left, zones.stream().map(z -> z.atLevel(factor)).toList(), perMetre.stream().map(m -> factor * m).toList());
        }
    }

    /** The same case at the level that a factor leads to. */
    public CaseAction atLevel(double factor) {
        return new CaseAction(state, name, label, direction, windward, zones.stream().map(z -> z.atLevel(factor)).toList(), factor * force, height, side,
            factor * baseShear, factor * baseMoment, factor * torsion);
    }

    /** The same case met from the other end, where that only mirrors it. */
    CaseAction fromOtherEnd(List<PanelZones> otherZones) {
        return new CaseAction(state, name, label, direction, windward.mirrored(), otherZones, force, height, -side, baseShear, baseMoment,
            torsion == 0 ? 0 : -torsion);
    }

    /** The same case with the wind on the back: equal force, torsion the other way. */
    CaseAction fromBehind() {
        return new CaseAction(state, name, label, "back", windward, zones, force, height, side, baseShear, baseMoment, torsion == 0 ? 0 : -torsion);
    }
}
