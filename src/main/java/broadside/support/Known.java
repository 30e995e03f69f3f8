package broadside.support;

import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.table.Coefficient;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.math.BigDecimal;
import java.util.stream.Stream;

/**
 * A figure in SI with how it was found and where it stands.
 *
 * @param how   such as "150 psf/ft, read at 4" or "as typed: 100 psf/ft"
 * @param text  the number as it stands in a formula text
 */
public record Known(double value, String unit, String how, String place, Status status, String text) {

    public Known(double value, String unit, String how, String place, Status status) {
        this(value, unit, how, place, status, BigDecimal.valueOf(value).stripTrailingZeros().toPlainString());
    }

    /** A number of a table with columns "value" and "unit". */
    static Known of(Rows rows, String key) {
        Known found = of(rows, key, "value", rows.text(key, "unit"));
        String unit = rows.text(key, "unit").equals("-") ? "" : " " + rows.text(key, "unit");
        return new Known(found.value(), found.unit(), "as printed: " + rows.text(key, "value") + unit, found.place(), found.status());
    }

    /** A number of a column printed in {@code printed} units; "-" for a plain number. */
    static Known of(Rows rows, String key, String column, String printed) {
        Coefficient found = rows.number(key, column);
        String place = found.source().citation();
        if (printed.equals("-") || printed.equals("m/s2")) {
            return new Known(found.value(), printed.equals("-") ? "1" : "m/s²", found.how(), place, found.source().status());
        }
        Unit unit = Stream.of(Dimension.LENGTH, Dimension.PRESSURE, Dimension.PRESSURE_PER_DEPTH, Dimension.DENSITY, Dimension.ANGLE)
            .flatMap(d -> Unit.of(d, printed).stream()).findFirst().orElseThrow(() -> new IllegalArgumentException(key + ": " + printed + " is no unit"));
        return new Known(exact(found.value(), unit), trace(unit.dimension()), rows.text(key, column) + " " + printed + ", " + found.how(), place,
            found.source().status());
    }

    /** A value that the user gave, in SI. */
    public static Known typed(double value, String unit, String text) {
        return new Known(value, unit, "as typed: " + text, "given", Status.GIVEN);
    }

    /** 12 ft is 3.6576 m and not the next number beside it. */
    private static double exact(double value, Unit unit) {
        return BigDecimal.valueOf(value).multiply(BigDecimal.valueOf(unit.toSi())).doubleValue();
    }

    private static String trace(Dimension dimension) {
        return switch (dimension) {
            case DENSITY -> "kg/m³";
            default -> dimension.siUnit();
        };
    }

    /** Records the figure as the value of this step and hands it back. */
    public double into(Trace.Line line) {
        return line.from(place, status).reads(how, value, unit);
    }
}
