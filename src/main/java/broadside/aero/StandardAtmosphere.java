package broadside.aero;

/**
 * The standard atmosphere below 11 km. SI units, altitude in metres above the sea.
 *
 * @param temperature  at sea level, K
 * @param lapse        fall of the temperature with height, K/m
 * @param pressure     at sea level, Pa
 * @param exponent     of the temperature ratio in the pressure ratio
 * @param gas          gas constant of air, J/(kg K)
 */
public record StandardAtmosphere(double temperature, double lapse, double pressure, double exponent, double gas) {

    /** Temperature, K. */
    public double temperatureAt(double altitude) {
        return temperature - lapse * altitude;
    }

    /** Pressure, Pa. */
    public double pressureAt(double altitude) {
        return pressure * Math.pow(temperatureAt(altitude) / temperature, exponent);
    }

    /** Density, kg/m3: p / (R T). */
    public double densityAt(double altitude) {
        return pressureAt(altitude) / (gas * temperatureAt(altitude));
    }
}
