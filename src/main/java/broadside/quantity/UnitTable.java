package broadside.quantity;

import static broadside.quantity.Dimension.ANGLE;
import static broadside.quantity.Dimension.AREA;
import static broadside.quantity.Dimension.DENSITY;
import static broadside.quantity.Dimension.FORCE;
import static broadside.quantity.Dimension.FORCE_PER_LENGTH;
import static broadside.quantity.Dimension.FREQUENCY;
import static broadside.quantity.Dimension.INERTIA;
import static broadside.quantity.Dimension.LENGTH;
import static broadside.quantity.Dimension.MASS;
import static broadside.quantity.Dimension.MASS_PER_AREA;
import static broadside.quantity.Dimension.MASS_PER_LENGTH;
import static broadside.quantity.Dimension.MOMENT;
import static broadside.quantity.Dimension.PERIOD;
import static broadside.quantity.Dimension.PRESSURE;
import static broadside.quantity.Dimension.PRESSURE_PER_DEPTH;
import static broadside.quantity.Dimension.SPEED;
import static broadside.quantity.Dimension.VOLUME;
import static broadside.quantity.Units.METRIC;
import static broadside.quantity.Units.US;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;

/**
 * The accepted units with their exact factors and usual spellings.
 *
 * <p>Factors from NIST SP 811 (recalled): 1 ft = 0.3048 m, 1 lb = 0.45359237 kg, g0 = 9.80665 m/s2,
 * 1 lbf = 4.4482216152605 N, 1 mph = 0.44704 m/s, 1 kn = 1852/3600 m/s. Each factor is kept as numerator
 * over denominator, so that a conversion rounds once, at its end.
 */
final class UnitTable {
    private static final String LBF = "4.4482216152605";
    private static final String PI = "3.14159265358979323846264338327950288";

    private static final List<Row> ROWS = List.of(
            row(LENGTH, METRIC, "m", "1", "1", "metre,metres,meter,meters"),
            row(LENGTH, METRIC, "cm", "0.01", "1", "centimetre,centimetres,centimeter,centimeters"),
            row(LENGTH, METRIC, "mm", "0.001", "1", "millimetre,millimetres,millimeter,millimeters"),
            row(LENGTH, METRIC, "km", "1000", "1", "kilometre,kilometres,kilometer,kilometers"),
            row(LENGTH, US, "ft", "0.3048", "1", "',foot,feet"),
            row(LENGTH, US, "in", "0.0254", "1", "\",inch,inches,ins"),
            row(LENGTH, US, "yd", "0.9144", "1", "yds,yard,yards"),
            row(SPEED, METRIC, "m/s", "1", "1", "m/sec,mps,metres per second,meters per second"),
            row(SPEED, METRIC, "km/h", "1", "3.6",
                    "kph,kmh,kmph,km/hr,kilometres per hour,kilometers per hour"),
            row(SPEED, METRIC, "kn", "1852", "3600", "kt,kts,knot,knots"),
            row(SPEED, US, "mph", "0.44704", "1", "mi/h,miles per hour,mile per hour"),
            row(SPEED, US, "ft/s", "0.3048", "1", "fps,ft/sec,feet per second"),
            row(PRESSURE, METRIC, "Pa", "1", "1", "pascal,pascals"),
            row(PRESSURE, METRIC, "kPa", "1000", "1", "kilopascal,kilopascals"),
            row(PRESSURE, METRIC, "MPa", "1000000", "1", "megapascal,megapascals,n/mm2,n/sq mm"),
            row(PRESSURE, METRIC, "N/m2", "1", "1", "n/sq m"),
            row(PRESSURE, METRIC, "kN/m2", "1000", "1", "kn/sq m"),
            row(PRESSURE, METRIC, "kgf/m2", "9.80665", "1", "kgf/sq m"),
            row(PRESSURE, US, "psf", LBF, "0.09290304",
                    "lb/ft2,lbf/ft2,lbs/ft2,lb/sq ft,lbf/sq ft,pounds per square foot"),
            row(PRESSURE, US, "psi", LBF, "0.00064516",
                    "lb/in2,lbf/in2,lbs/in2,lb/sq in,lbf/sq in,pounds per square inch"),
            row(PRESSURE, US, "ksi", "4448.2216152605", "0.00064516", "kip/in2,kip/sq in"),
            row(FORCE, METRIC, "N", "1", "1", "newton,newtons"),
            row(FORCE, METRIC, "kN", "1000", "1", "kilonewton,kilonewtons"),
            row(FORCE, METRIC, "kgf", "9.80665", "1", "kp,kilogram force,kilograms force"),
            row(FORCE, US, "lbf", LBF, "1", "lbsf,pound force,pounds force"),
            row(FORCE, US, "kip", "4448.2216152605", "1", "kips"),
            row(MOMENT, METRIC, "N m", "1", "1", "newton metre,newton metres,newton meter,newton meters"),
            row(MOMENT, METRIC, "kN m", "1000", "1", "kilonewton metre,kilonewton metres"),
            row(MOMENT, US, "lbf ft", "1.3558179483314004", "1",
                    "ft lbf,lb ft,ft lb,lbs ft,ft lbs,foot pound,foot pounds,pound foot,pound feet"),
            row(MOMENT, US, "kip ft", "1355.8179483314004", "1", "ft kip,kips ft,ft kips,k ft,ft k"),
            row(MASS, METRIC, "kg", "1", "1", "kgs,kilogram,kilograms,kilo,kilos"),
            row(MASS, METRIC, "t", "1000", "1", "tonne,tonnes"),
            row(MASS, METRIC, "g", "0.001", "1", "gram,grams"),
            row(MASS, US, "lb", "0.45359237", "1", "lbs,lbm,pound,pounds"),
            row(ANGLE, METRIC, "deg", PI, "180", "°,degs,degree,degrees"),
            row(ANGLE, METRIC, "rad", "1", "1", "rads,radian,radians"),
            row(AREA, METRIC, "m2", "1", "1", "sq m,m sq,square metre,square metres,square meter,square meters"),
            row(AREA, METRIC, "cm2", "0.0001", "1", "sq cm"),
            row(AREA, METRIC, "mm2", "0.000001", "1", "sq mm"),
            row(AREA, US, "ft2", "0.09290304", "1", "sq ft,ft sq,square foot,square feet"),
            row(AREA, US, "in2", "0.00064516", "1", "sq in,square inch,square inches"),
            row(DENSITY, METRIC, "kg/m3", "1", "1", "kg/cu m"),
            row(DENSITY, US, "lb/ft3", "0.45359237", "0.028316846592", "pcf,lbs/ft3,lb/cu ft,pounds per cubic foot"),
            row(PERIOD, METRIC, "years", "1", "1", "year,yr,yrs,y"),
            row(MASS_PER_AREA, METRIC, "kg/m2", "1", "1", "kg/sq m"),
            row(MASS_PER_AREA, METRIC, "g/m2", "0.001", "1", "g/sq m,gsm"),
            row(MASS_PER_AREA, US, "lb/ft2", "0.45359237", "0.09290304", "lbs/ft2,lb/sq ft"),
            row(PRESSURE_PER_DEPTH, METRIC, "Pa/m", "1", "1", "N/m3"),
            row(PRESSURE_PER_DEPTH, METRIC, "kPa/m", "1000", "1", "kN/m3,kN/m2/m"),
            row(PRESSURE_PER_DEPTH, US, "psf/ft", LBF, "0.028316846592", "lb/ft2/ft,lb/ft3,pcf"),
            row(FORCE_PER_LENGTH, METRIC, "N/m", "1", "1", ""),
            row(FORCE_PER_LENGTH, METRIC, "kN/m", "1000", "1", ""),
            row(FORCE_PER_LENGTH, US, "lbf/ft", LBF, "0.3048", "plf,lb/ft"),
            row(MASS_PER_LENGTH, METRIC, "kg/m", "1", "1", ""),
            row(MASS_PER_LENGTH, US, "lb/ft", "0.45359237", "0.3048", "plf"),
            row(VOLUME, METRIC, "m3", "1", "1", "cu m"),
            row(VOLUME, METRIC, "cm3", "0.000001", "1", "cu cm"),
            row(VOLUME, METRIC, "mm3", "0.000000001", "1", "cu mm"),
            row(VOLUME, US, "ft3", "0.028316846592", "1", "cu ft"),
            row(VOLUME, US, "in3", "0.000016387064", "1", "cu in"),
            row(INERTIA, METRIC, "m4", "1", "1", ""),
            row(INERTIA, METRIC, "cm4", "0.00000001", "1", ""),
            row(INERTIA, METRIC, "mm4", "0.000000000001", "1", ""),
            row(INERTIA, US, "in4", "0.0000004162314256", "1", ""),
            row(FREQUENCY, METRIC, "Hz", "1", "1", "hertz,1/s"),
            row(PERIOD, METRIC, "months", "1", "12", "month,mo"),
            row(PERIOD, METRIC, "weeks", "7", "365.2425", "week,wk"),
            row(PERIOD, METRIC, "days", "1", "365.2425", "day"));

    private static final Map<Dimension, Map<String, Row>> BY_SPELLING = bySpelling();

    private UnitTable() {
    }

    private record Row(Unit unit, BigDecimal over, BigDecimal under, List<String> spellings) {
    }

    static List<Unit> units(Dimension dimension) {
        return ROWS.stream().map(Row::unit).filter(u -> u.dimension() == dimension).toList();
    }

    /** The unit a symbol stands for; empty when unknown or when its letter case stands for another unit. */
    static Optional<Unit> find(Dimension dimension, String symbol) {
        return anyCase(dimension, symbol).filter(unit -> !caseDiffers(unit, Folding.symbol(symbol)));
    }

    /** The unit a symbol stands for when capital and small letters count the same. */
    static Optional<Unit> anyCase(Dimension dimension, String symbol) {
        String key = Folding.symbol(symbol).toLowerCase(Locale.ROOT);
        return Optional.ofNullable(BY_SPELLING.get(dimension).get(key)).map(Row::unit);
    }

    /** The kind of quantity a symbol belongs to, the exact symbol before other spellings. */
    static Optional<Dimension> kind(String symbol) {
        String exact = Folding.symbol(symbol);
        Optional<Dimension> same = ROWS.stream().map(Row::unit).filter(u -> u.symbol().equals(exact))
                .map(Unit::dimension).findFirst();
        return same.or(() -> Stream.of(Dimension.values()).filter(d -> find(d, symbol).isPresent()).findFirst());
    }

    /** A value in a unit as a value in the unit of calculation, rounded once. */
    static double toSi(BigDecimal value, Unit unit) {
        Row row = rowOf(unit);
        return value.multiply(row.over()).divide(row.under(), MathContext.DECIMAL128).doubleValue();
    }

    /** A value in the unit of calculation as a value in a unit, to 34 figures. */
    static BigDecimal fromSi(double si, Unit unit) {
        Row row = rowOf(unit);
        return BigDecimal.valueOf(si).multiply(row.under()).divide(row.over(), MathContext.DECIMAL128);
    }

    private static Row rowOf(Unit unit) {
        return ROWS.stream().filter(r -> r.unit().equals(unit)).findFirst()
                .orElseGet(() -> new Row(unit, BigDecimal.valueOf(unit.toSi()), BigDecimal.ONE, List.of()));
    }

    /** Where the prefixes milli and mega, or the metre and the prefix mega, would be confused. */
    private static boolean caseDiffers(Unit unit, String exact) {
        return switch (unit.symbol()) {
            case "m" -> exact.equals("M");
            case "mm" -> exact.equals("Mm") || exact.equals("mM");
            case "MPa" -> exact.startsWith("m") && exact.length() == 3;
            default -> false;
        };
    }

    private static Row row(Dimension d, Units system, String symbol, String over, String under, String spellings) {
        BigDecimal top = new BigDecimal(over);
        BigDecimal bottom = new BigDecimal(under);
        double factor = top.divide(bottom, MathContext.DECIMAL128).doubleValue();
        return new Row(new Unit(symbol, d, factor, system), top, bottom, spellings.isEmpty() ? List.of() : List.of(spellings.split(",")));
    }

    private static Map<Dimension, Map<String, Row>> bySpelling() {
        Map<Dimension, Map<String, Row>> all = new TreeMap<>();
        for (Dimension d : Dimension.values()) {
            Map<String, Row> keys = new TreeMap<>();
            ROWS.stream().filter(r -> r.unit().dimension() == d).forEach(r ->
                    Stream.concat(Stream.of(r.unit().symbol()), r.spellings().stream())
                            .map(s -> s.toLowerCase(Locale.ROOT))
                            .flatMap(s -> Stream.of(s, s.replace(" ", "")))
                            .forEach(s -> keys.put(s, r)));
            all.put(d, Map.copyOf(keys));
        }
        return Map.copyOf(all);
    }
}
