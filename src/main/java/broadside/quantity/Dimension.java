package broadside.quantity;

import java.util.List;

/** The kinds of quantity that are typed and shown, each with its unit inside the program. */
public enum Dimension {
    LENGTH("length", "m", "2.4 m", "8 ft 6 in", 0.001, 1000),
    SPEED("speed", "m/s", "25 m/s", "56 mph", 0.5, 150),
    PRESSURE("pressure", "Pa", "0.8 kPa", "17 psf", 10, 1e9),
    FORCE("force", "N", "1.2 kN", "300 lbf", 10, 1e8),
    MOMENT("moment", "N m", "3.5 kN m", "2600 lbf ft", 10, 1e9),
    MASS("mass", "kg", "120 kg", "260 lb", 0.01, 1e6),
    ANGLE("angle", "rad", "15 deg", "15 deg", 0.0001, 2 * Math.PI),
    AREA("area", "m2", "2.9 m2", "31 ft2", 1e-6, 1e6),
    DENSITY("density", "kg/m3", "1.25 kg/m3", "0.078 lb/ft3", 0.5, 25000),
    MASS_PER_AREA("mass per area", "kg/m2", "0.25 kg/m2", "0.05 lb/ft2", 0.01, 1000),
    PERIOD("period", "years", "50 years", "50 years", 1.0 / 366, 1e5),
    PRESSURE_PER_DEPTH("pressure per depth", "Pa/m", "23.6 kPa/m", "150 psf/ft", 100, 1e7),
    FORCE_PER_LENGTH("force per length", "N/m", "4.4 kN/m", "300 lbf/ft", 1, 1e7),
    MASS_PER_LENGTH("mass per length", "kg/m", "13.5 kg/m", "9.1 lb/ft", 0.01, 1e5),
    VOLUME("volume", "m3", "0.5 m3", "18 ft3", 1e-7, 1e5),
    INERTIA("second moment of area", "m4", "192 cm4", "7.2 in4", 1e-10, 10),
    FREQUENCY("frequency", "Hz", "2.5 Hz", "2.5 Hz", 0.01, 1000);

    private final String word;
    private final String siUnit;
    private final String metricExample;
    private final String usExample;
    private final double least;
    private final double most;

    Dimension(String word, String siUnit, String metricExample, String usExample, double least, double most) {
        this.word = word;
        this.siUnit = siUnit;
        this.metricExample = metricExample;
        this.usExample = usExample;
        this.least = least;
        this.most = most;
    }

    /** The plain word, such as {@code length}. */
    public String word() {
        return word;
    }

    /** The unit in which the program calculates; radians for angles, years for periods. */
    public String siUnit() {
        return siUnit;
    }

    /** The units in which this quantity may be typed, metric first. */
    public List<Unit> units() {
        return UnitTable.units(this);
    }

    /** A text that reads as this quantity, in units of the given system. */
    public String example(Units system) {
        return system == Units.METRIC ? metricExample : usExample;
    }

    /** The word with its article. */
    String phrase() {
        return (word.startsWith("a") ? "an " : "a ") + word;
    }

    /** Both examples, or one where the systems share their units. */
    String examples() {
        return metricExample.equals(usExample) ? metricExample : metricExample + " or " + usExample;
    }

    /**
     * Whether a size is ordinary for the things this program looks at. The range decides only between two
     * readings of one text such as {@code 1,500 m/s}; it refuses nothing. Widths set here by judgement.
     */
    boolean plausible(double si) {
        return Math.abs(si) >= least && Math.abs(si) <= most;
    }
}
