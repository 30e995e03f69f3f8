package broadside.job;

import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Typed;
import broadside.quantity.Unit;
import java.util.Optional;
import tools.jackson.databind.JsonNode;

/**
 * A printed value, in SI and as it was printed.
 *
 * @param unit  the printed unit, absent for a plain number
 */
record Printed(double si, Optional<Unit> unit, String text) {

    /** Reads a number, or text with a unit of the dimension that the step has. */
    static Printed of(JsonNode node, String stepUnit) {
        if (node.isNumber() && Double.isFinite(node.doubleValue())) {
            if (!stepUnit.equals("1")) {
                throw PublishedChecks.bad("the printed value is a plain number, but the step is in " + stepUnit);
            }
            return new Printed(node.doubleValue(), Optional.empty(), node.toString());
        }
        if (!node.isString()) {
            throw PublishedChecks.bad("the printed value must be a number or text with its unit");
        }
        Dimension dimension = dimension(stepUnit).orElseThrow(() ->
            PublishedChecks.bad("the step is in " + stepUnit + ", which has no printed unit here; give a plain number"));
        Reading reading = Typed.read(node.stringValue(), dimension);
        if (reading instanceof Reading.Value value) {
            return new Printed(value.si(), Optional.of(value.unit()), node.stringValue());
        }
        throw PublishedChecks.bad(reading instanceof Reading.Ambiguous open ? open.problem() : ((Reading.Refused) reading).problem());
    }

    /** The tolerance in SI: an amount in the same form, or a percentage of the printed value. */
    double tolerance(JsonNode node) {
        if (node.isNumber() && node.doubleValue() >= 0 && Double.isFinite(node.doubleValue())) {
            return node.doubleValue() * factor();
        }
        String typed = node.isString() ? node.stringValue().strip() : "";
        if (typed.endsWith("%")) {
            String number = typed.substring(0, typed.length() - 1).strip();
            if (!number.matches("\\d{1,6}(\\.\\d{1,9})?")) {
                throw PublishedChecks.bad("within \"" + StructureReader.clean(typed) + "\" is not a percentage like \"0.5 %\"");
            }
            return Math.abs(si) * Double.parseDouble(number) / 100;
        }
        if (unit.isPresent() && Typed.read(typed, unit.get().dimension()) instanceof Reading.Value value && value.si() >= 0) {
            return value.si();
        }
        throw PublishedChecks.bad("within \"" + StructureReader.clean(typed) + "\" must be an amount not below zero in the form of the value, or a percentage");
    }

    /** A value in SI, shown in the printed unit. */
    String inUnit(double value) {
        String number = Show.number(value / factor(), 5, Rounding.NEAREST);
        return unit.map(u -> number + " " + u.symbol()).orElse(number);
    }

    private double factor() {
        return unit.map(Unit::toSi).orElse(1.0);
    }

    /** The dimension of a step by its SI unit. */
    static Optional<Dimension> dimension(String stepUnit) {
        return switch (stepUnit) {
            case "m" -> Optional.of(Dimension.LENGTH);
            case "m/s" -> Optional.of(Dimension.SPEED);
            case "Pa" -> Optional.of(Dimension.PRESSURE);
            case "N" -> Optional.of(Dimension.FORCE);
            case "N m" -> Optional.of(Dimension.MOMENT);
            case "kg" -> Optional.of(Dimension.MASS);
            case "kg/m³" -> Optional.of(Dimension.DENSITY);
            case "m²" -> Optional.of(Dimension.AREA);
            case "years" -> Optional.of(Dimension.PERIOD);
            case "rad" -> Optional.of(Dimension.ANGLE);
            case "Pa/m" -> Optional.of(Dimension.PRESSURE_PER_DEPTH);
            case "N/m" -> Optional.of(Dimension.FORCE_PER_LENGTH);
            case "kg/m" -> Optional.of(Dimension.MASS_PER_LENGTH);
            case "m³" -> Optional.of(Dimension.VOLUME);
            case "m⁴" -> Optional.of(Dimension.INERTIA);
            case "Hz" -> Optional.of(Dimension.FREQUENCY);
            default -> Optional.empty();
        };
    }
}
