package broadside.quantity;

import java.math.BigDecimal;

/** The units in which each kind of quantity is shown, and the number from which the larger unit is used. */
final class DisplayUnits {
    private static final BigDecimal NEVER = new BigDecimal("1e400");

    private DisplayUnits() {
    }

    static Unit small(Dimension dimension, Units system) {
        return unit(dimension, system == Units.METRIC ? smallMetric(dimension) : smallUs(dimension));
    }

    static Unit large(Dimension dimension, Units system) {
        boolean metric = system == Units.METRIC;
        return switch (dimension) {
            case PRESSURE -> unit(dimension, metric ? "kPa" : "psf");
            case FORCE -> unit(dimension, metric ? "kN" : "kip");
            case MOMENT -> unit(dimension, metric ? "kN m" : "kip ft");
            case PRESSURE_PER_DEPTH -> unit(dimension, metric ? "kPa/m" : "psf/ft");
            case FORCE_PER_LENGTH -> unit(dimension, metric ? "kN/m" : "lbf/ft");
            default -> small(dimension, system);
        };
    }

    /** The number in the small unit from which the large one is shown. */
    static BigDecimal limit(Dimension dimension, Units system) {
        boolean metric = system == Units.METRIC;
        return switch (dimension) {
            case PRESSURE -> metric ? BigDecimal.valueOf(100) : NEVER;
            case PRESSURE_PER_DEPTH, FORCE_PER_LENGTH -> metric ? BigDecimal.valueOf(1000) : NEVER;
            case FORCE, MOMENT -> BigDecimal.valueOf(metric ? 1000 : 10_000);
            default -> NEVER;
        };
    }

    private static String smallMetric(Dimension dimension) {
        return dimension == Dimension.ANGLE ? "deg" : dimension.siUnit();
    }

    private static String smallUs(Dimension dimension) {
        return switch (dimension) {
            case LENGTH -> "ft";
            case SPEED -> "mph";
            case PRESSURE -> "psf";
            case FORCE -> "lbf";
            case MOMENT -> "lbf ft";
            case MASS -> "lb";
            case AREA -> "ft2";
            case DENSITY -> "lb/ft3";
            case MASS_PER_AREA -> "lb/ft2";
            case PRESSURE_PER_DEPTH -> "psf/ft";
            case FORCE_PER_LENGTH -> "lbf/ft";
            case MASS_PER_LENGTH -> "lb/ft";
            case VOLUME -> "ft3";
            case INERTIA -> "in4";
            case ANGLE, PERIOD, FREQUENCY -> smallMetric(dimension);
        };
    }

    private static Unit unit(Dimension dimension, String symbol) {
        return Unit.of(dimension, symbol).orElseThrow();
    }
}
