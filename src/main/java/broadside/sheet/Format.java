package broadside.sheet;

import broadside.action.CaseAction;
import broadside.codes.LoadCase.Windward;
import broadside.codes.LoadCase;
import broadside.quantity.Dimension;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Shown;
import broadside.quantity.Speed;
import broadside.quantity.Unit;
import broadside.quantity.Units;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Numbers as they are shown: three figures in answers, four in the calculation; loads are rounded up, and only here. */
final class Format {

    /** Lengths below this are shown in millimetres or inches, m: deflections. */
    private static final double SMALL = 0.3;
    /** Pressures from here on are stresses of a material, Pa. */
    private static final double STRESS = 2e6;

    /** Winds above it are of no interest, m/s. */
    private static final double STRONGEST = 100;

    private final Units units;

    Format(Units units) {
        this.units = units;
    }

    /** A case in words: "case A" for case-a, "case centred" for centred. */
    static String caseWords(String name) {
        return "case " + caseName(name);
    }

    /** A case in a column headed so: "A" for case-a. */
    static String caseName(String name) {
        return LoadCase.shortName(name);
    }

    /** The side of a case, as it follows its name: the end from which zones run, or the side to which an even force moves. */
    static String end(CaseAction action) {
        String side = action.windward() == Windward.LEFT ? "left" : "right";
        if (action.windward() == Windward.NONE) {
            return "";
        }
        return action.zones().stream().anyMatch(p -> p.zones().size() > 1) ? ", from the " + side : ", force to the " + side;
    }

    Units units() {
        return units;
    }

    String force(double newtons) {
        return load(newtons, Dimension.FORCE);
    }

    String moment(double newtonMetres) {
        return load(newtonMetres, Dimension.MOMENT);
    }

    /** A moment for each metre, or for each foot where feet lead. */
    String momentPerLength(double newtonMetresPerMetre) {
        return moment(units == Units.US ? newtonMetresPerMetre * 0.3048 : newtonMetresPerMetre);
    }

    String pressure(double pascals) {
        return load(pascals, Dimension.PRESSURE);
    }

    /** A speed as typed, with the other system in brackets. */
    static String speed(Speed speed) {
        String typed = speed.typed().toLowerCase(Locale.ROOT);
        Units other = typed.contains("mph") || typed.contains("ft/s") ? Units.METRIC : Units.US;
        return speed.typed() + " (" + Show.of(speed.metresPerSecond(), Dimension.SPEED, other, 3, Rounding.NEAREST).text() + ")";
    }

    /** A speed that must not be passed: rounded down, in both systems. */
    String slow(double metresPerSecond) {
        if (metresPerSecond > STRONGEST) {
            return "above " + slow(STRONGEST);
        }
        String lead = Show.of(metresPerSecond, Dimension.SPEED, units, 3, Rounding.DOWN).text();
        return lead + " (" + Show.of(metresPerSecond, Dimension.SPEED, units == Units.US ? Units.METRIC : Units.US, 3, Rounding.DOWN).text() + ")";
    }

    String length(double metres) {
        return units == Units.US ? Show.feetInches(metres) : trimmed(metres) + " m";
    }

    String mass(double kilograms) {
        return load(kilograms, Dimension.MASS);
    }

    /** A mass for each metre, or for each foot where feet lead. */
    String massPerLength(double kilogramsPerMetre) {
        return load(kilogramsPerMetre, Dimension.MASS_PER_LENGTH);
    }

    /** A value by its SI unit, rounded up as a load is; sizes as they are. */
    String amount(double si, String unit) {
        return shown(si, unit, Rounding.UP);
    }

    /** A demand, rounded up, and a capacity, rounded down, in one unit: that of the larger. */
    List<String> pair(double demand, double capacity, String unit) {
        if (unit.equals("m") && Math.max(demand, capacity) >= SMALL) {
            return List.of(length(demand), length(capacity));
        }
        Optional<Dimension> dimension = unit.equals("m") || unit.equals("Pa") && Math.max(demand, capacity) >= STRESS ? Optional.empty() : dimension(unit);
        return dimension.map(d -> Show.of(Math.max(demand, capacity), d, units, 3, Rounding.UP).unit()).filter(u -> !u.isEmpty()).map(u -> List.of(
            demand == 0 ? "0" : in(demand, dimension.get(), u, Rounding.UP), capacity == 0 ? "0" : in(capacity, dimension.get(), u, Rounding.DOWN)))
            .orElseGet(() -> List.of(amount(demand, unit), capacity(capacity, unit)));
    }

    /** A capacity, rounded down. */
    String capacity(double si, String unit) {
        return shown(si, unit, Rounding.DOWN);
    }

    private String shown(double si, String unit, Rounding rounding) {
        return switch (unit) {
            case "1" -> Show.number(si, 3, rounding);
            case "m" -> si >= SMALL ? length(si) : in(si, Dimension.LENGTH, units == Units.US ? "in" : "mm", rounding);
            case "Pa" -> si < STRESS ? Show.of(si, Dimension.PRESSURE, units, 3, rounding).text() : in(si, Dimension.PRESSURE, units == Units.US ? "psi" : "MPa", rounding);
            case "rad" -> Show.of(si, Dimension.ANGLE, units, 3, rounding).text();
            case "m³" -> Show.of(si, Dimension.VOLUME, units, 3, rounding).text();
            case "Hz" -> Show.number(si, 3, rounding) + " Hz";
            default -> dimension(unit).map(d -> Math.abs(si) < 1e-6 ? "0" : Show.of(si, d, units, 3, rounding).text()).orElse(Show.number(si, 3, rounding) + " " + unit);
        };
    }

    private static String in(double si, Dimension dimension, String unit, Rounding rounding) {
        return Show.number(si / Unit.of(dimension, unit).orElseThrow().toSi(), 3, rounding) + " " + unit;
    }

    String plain(double number) {
        return Show.number(number, 4, Rounding.NEAREST);
    }

    /** A plain number that was given: 2, 0.85. */
    static String count(double number) {
        return number == Math.rint(number) ? Long.toString((long) number) : Double.toString(number);
    }

    /** A value that is no load, to the nearest, in both systems. */
    String nearest(double si, Dimension dimension) {
        Units other = units == Units.US ? Units.METRIC : Units.US;
        return Show.of(si, dimension, units, 3, Rounding.NEAREST).text() + " (" + Show.of(si, dimension, other, 3, Rounding.NEAREST).text() + ")";
    }

    /** A load in both systems: the leading one first. */
    String both(double si, Dimension dimension) {
        Units other = units == Units.US ? Units.METRIC : Units.US;
        return load(si, dimension) + " (" + Show.of(si, dimension, other, 3, Rounding.UP).text() + ")";
    }

    private String load(double si, Dimension dimension) {
        return Math.abs(si) < 1e-6 ? "0" : Show.of(si, dimension, units, 3, Rounding.UP).text();
    }

    private static String trimmed(double metres) {
        double rounded = Math.round(metres * 1000) / 1000.0;
        return rounded == Math.rint(rounded) ? Long.toString((long) rounded) : Double.toString(rounded);
    }

    /** A value of the calculation in the other system, when that one leads; empty otherwise. */
    String other(double value, String unit) {
        if (units != Units.US) {
            return "";
        }
        return dimension(unit).map(d -> Show.of(value, d, Units.US, 4, Rounding.NEAREST)).map(Shown::text).orElse("");
    }

    private static Optional<Dimension> dimension(String unit) {
        return switch (unit) {
            case "m" -> Optional.of(Dimension.LENGTH);
            case "m/s" -> Optional.of(Dimension.SPEED);
            case "Pa" -> Optional.of(Dimension.PRESSURE);
            case "N" -> Optional.of(Dimension.FORCE);
            case "N m" -> Optional.of(Dimension.MOMENT);
            case "kg" -> Optional.of(Dimension.MASS);
            case "N/m" -> Optional.of(Dimension.FORCE_PER_LENGTH);
            case "kg/m" -> Optional.of(Dimension.MASS_PER_LENGTH);
            case "Pa/m" -> Optional.of(Dimension.PRESSURE_PER_DEPTH);
            default -> Optional.empty();
        };
    }
}
