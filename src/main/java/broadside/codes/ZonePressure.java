package broadside.codes;

/**
 * Net pressure on one zone of a panel, both faces together.
 *
 * @param zone         name of the zone in its code
 * @param symbol       symbol of the pressure in the calculation
 * @param from         where it begins, m from the left edge of the panel seen from the front
 * @param to           where it ends
 * @param width        its width as it was recorded, m
 * @param coefficient  net coefficient, all reductions in
 * @param pressure     net pressure, Pa
 */
public record ZonePressure(String zone, String symbol, double from, double to, double width, double coefficient, double pressure) {

    /** The same zone at the level that a factor leads to. */
    public ZonePressure atLevel(double factor) {
        return new ZonePressure(zone, symbol, from, to, width, coefficient, factor * pressure);
    }
}
