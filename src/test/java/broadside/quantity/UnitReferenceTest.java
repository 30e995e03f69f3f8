package broadside.quantity;

import static javax.measure.MetricPrefix.CENTI;
import static javax.measure.MetricPrefix.KILO;
import static javax.measure.MetricPrefix.MEGA;
import static javax.measure.MetricPrefix.MILLI;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tech.units.indriya.unit.Units.GRAM;
import static tech.units.indriya.unit.Units.HERTZ;
import static tech.units.indriya.unit.Units.KILOGRAM;
import static tech.units.indriya.unit.Units.KILOMETRE_PER_HOUR;
import static tech.units.indriya.unit.Units.METRE;
import static tech.units.indriya.unit.Units.METRE_PER_SECOND;
import static tech.units.indriya.unit.Units.METRE_PER_SQUARE_SECOND;
import static tech.units.indriya.unit.Units.DAY;
import static tech.units.indriya.unit.Units.MONTH;
import static tech.units.indriya.unit.Units.WEEK;
import static tech.units.indriya.unit.Units.NEWTON;
import static tech.units.indriya.unit.Units.PASCAL;
import static tech.units.indriya.unit.Units.RADIAN;
import static tech.units.indriya.unit.Units.SQUARE_METRE;
import static tech.units.indriya.unit.Units.YEAR;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import systems.uom.common.USCustomary;

/** Every factor against the units library; units it lacks are built from its own. */
class UnitReferenceTest {
    private static final javax.measure.Unit<?> GRAVITY = METRE_PER_SQUARE_SECOND.multiply(9.80665);
    private static final javax.measure.Unit<?> LBF = USCustomary.POUND.multiply(GRAVITY);
    private static final javax.measure.Unit<?> KGF = KILOGRAM.multiply(GRAVITY);
    private static final javax.measure.Unit<?> SQUARE_INCH = USCustomary.INCH.pow(2);
    private static final Map<Dimension, javax.measure.Unit<?>> SI = si();

    static Stream<Unit> units() {
        return Stream.of(Dimension.values()).flatMap(d -> d.units().stream());
    }

    @ParameterizedTest
    @MethodSource("units")
    void factorAgreesWithTheLibrary(Unit unit) throws Exception {
        javax.measure.Unit<?> reference = references(unit.dimension()).get(unit.symbol());
        assertThat(reference).as("reference for %s", unit.symbol()).isNotNull();
        double factor = reference.getConverterToAny(SI.get(unit.dimension())).convert(1.0);
        assertThat(unit.toSi()).isCloseTo(factor, within(4 * Math.ulp(factor)));
    }

    @ParameterizedTest
    @MethodSource("units")
    void symbolReadsAsItsUnit(Unit unit) {
        assertThat(Unit.of(unit.dimension(), unit.symbol())).contains(unit);
        Reading reading = Typed.read("3 " + unit.symbol(), unit.dimension());
        assertThat(reading).isInstanceOf(Reading.Value.class);
        Reading.Value value = (Reading.Value) reading;
        assertThat(value.unit()).isEqualTo(unit);
        assertThat(value.si()).isCloseTo(3 * unit.toSi(), within(2 * Math.ulp(value.si())));
        assertThat(value.warnings()).isEmpty();
    }

    @Test
    void exactFactors() {
        assertThat(factor(Dimension.LENGTH, "ft")).isEqualTo(0.3048);
        assertThat(factor(Dimension.FORCE, "lbf")).isEqualTo(4.4482216152605);
        assertThat(factor(Dimension.MASS, "lb")).isEqualTo(0.45359237);
        assertThat(factor(Dimension.SPEED, "mph")).isEqualTo(0.44704);
        assertThat(factor(Dimension.SPEED, "kn")).isEqualTo(1852.0 / 3600.0);
        assertThat(factor(Dimension.FORCE, "kgf")).isEqualTo(9.80665);
    }

    @Test
    void unknownSymbolsAndOtherKindsGiveNoUnit() {
        assertThat(Unit.of(Dimension.FORCE, "lb")).isEmpty();
        assertThat(Unit.of(Dimension.FORCE, "kg")).isEmpty();
        assertThat(Unit.of(Dimension.MASS, "lbf")).isEmpty();
        assertThat(Unit.of(Dimension.LENGTH, "")).isEmpty();
        assertThat(Unit.of(Dimension.LENGTH, "M")).isEmpty();
    }

    private static double factor(Dimension dimension, String symbol) {
        return Unit.of(dimension, symbol).orElseThrow().toSi();
    }

    private static Map<Dimension, javax.measure.Unit<?>> si() {
        Map<Dimension, javax.measure.Unit<?>> map = new LinkedHashMap<>();
        map.put(Dimension.LENGTH, METRE);
        map.put(Dimension.SPEED, METRE_PER_SECOND);
        map.put(Dimension.PRESSURE, PASCAL);
        map.put(Dimension.FORCE, NEWTON);
        map.put(Dimension.MOMENT, NEWTON.multiply(METRE));
        map.put(Dimension.MASS, KILOGRAM);
        map.put(Dimension.ANGLE, RADIAN);
        map.put(Dimension.AREA, SQUARE_METRE);
        map.put(Dimension.DENSITY, KILOGRAM.divide(METRE.pow(3)));
        map.put(Dimension.MASS_PER_AREA, KILOGRAM.divide(SQUARE_METRE));
        map.put(Dimension.PERIOD, YEAR);
        map.put(Dimension.PRESSURE_PER_DEPTH, PASCAL.divide(METRE));
        map.put(Dimension.FORCE_PER_LENGTH, NEWTON.divide(METRE));
        map.put(Dimension.MASS_PER_LENGTH, KILOGRAM.divide(METRE));
        map.put(Dimension.VOLUME, METRE.pow(3));
        map.put(Dimension.INERTIA, METRE.pow(4));
        map.put(Dimension.FREQUENCY, HERTZ);
        return map;
    }

    private static Map<String, javax.measure.Unit<?>> references(Dimension dimension) {
        javax.measure.Unit<?> foot = USCustomary.FOOT;
        return switch (dimension) {
            case LENGTH -> Map.of("m", METRE, "cm", CENTI(METRE), "mm", MILLI(METRE), "km", KILO(METRE),
                    "ft", foot, "in", USCustomary.INCH, "yd", USCustomary.YARD);
            case SPEED -> Map.of("m/s", METRE_PER_SECOND, "km/h", KILOMETRE_PER_HOUR, "mph",
                    USCustomary.MILE_PER_HOUR, "ft/s", USCustomary.FOOT_PER_SECOND, "kn", USCustomary.KNOT);
            case PRESSURE -> Map.of("Pa", PASCAL, "kPa", KILO(PASCAL), "MPa", MEGA(PASCAL),
                    "N/m2", NEWTON.divide(SQUARE_METRE), "kN/m2", KILO(NEWTON).divide(SQUARE_METRE),
                    "kgf/m2", KGF.divide(SQUARE_METRE), "psf", LBF.divide(USCustomary.SQUARE_FOOT),
                    "psi", LBF.divide(SQUARE_INCH), "ksi", LBF.multiply(1000).divide(SQUARE_INCH));
            case FORCE -> Map.of("N", NEWTON, "kN", KILO(NEWTON), "lbf", LBF, "kip", LBF.multiply(1000),
                    "kgf", KGF);
            case MOMENT -> Map.of("N m", NEWTON.multiply(METRE), "kN m", KILO(NEWTON).multiply(METRE),
                    "lbf ft", LBF.multiply(foot), "kip ft", LBF.multiply(1000).multiply(foot));
            case MASS -> Map.of("kg", KILOGRAM, "t", KILOGRAM.multiply(1000), "g", GRAM, "lb", USCustomary.POUND);
            case ANGLE -> Map.of("rad", RADIAN, "deg", USCustomary.DEGREE_ANGLE);
            case AREA -> Map.of("m2", SQUARE_METRE, "cm2", CENTI(METRE).pow(2), "mm2", MILLI(METRE).pow(2),
                    "ft2", USCustomary.SQUARE_FOOT, "in2", SQUARE_INCH);
            case DENSITY -> Map.of("kg/m3", KILOGRAM.divide(METRE.pow(3)),
                    "lb/ft3", USCustomary.POUND.divide(foot.pow(3)));
            case MASS_PER_AREA -> Map.of("kg/m2", KILOGRAM.divide(SQUARE_METRE), "g/m2", GRAM.divide(SQUARE_METRE),
                    "lb/ft2", USCustomary.POUND.divide(USCustomary.SQUARE_FOOT));
            case PRESSURE_PER_DEPTH -> Map.of("Pa/m", PASCAL.divide(METRE), "kPa/m", KILO(PASCAL).divide(METRE),
                    "psf/ft", LBF.divide(USCustomary.SQUARE_FOOT).divide(foot));
            case FORCE_PER_LENGTH -> Map.of("N/m", NEWTON.divide(METRE), "kN/m", KILO(NEWTON).divide(METRE), "lbf/ft", LBF.divide(foot));
            case MASS_PER_LENGTH -> Map.of("kg/m", KILOGRAM.divide(METRE), "lb/ft", USCustomary.POUND.divide(foot));
            case VOLUME -> Map.of("m3", METRE.pow(3), "cm3", CENTI(METRE).pow(3), "mm3", MILLI(METRE).pow(3), "ft3", foot.pow(3),
                    "in3", USCustomary.INCH.pow(3));
            case INERTIA -> Map.of("m4", METRE.pow(4), "cm4", CENTI(METRE).pow(4), "mm4", MILLI(METRE).pow(4), "in4", USCustomary.INCH.pow(4));
            case FREQUENCY -> Map.of("Hz", HERTZ);
            case PERIOD -> Map.of("years", YEAR, "months", MONTH, "weeks", WEEK, "days", DAY);
        };
    }
}
