package broadside.table;

import java.util.Map;

/**
 * Printed columns against one axis. Between the points it is read as the heading says; beyond the printed ends it
 * refuses, unless the heading says that the last value goes on.
 */
public final class Curve {

    private final TableFile file;
    private final String axis;
    private final double[] at;
    private final Map<String, double[]> columns;

    Curve(TableFile file, String axis, double[] at, Map<String, double[]> columns) {
        this.file = file;
        this.axis = axis;
        this.at = at.clone();
        this.columns = Map.copyOf(columns);
    }

    /** Reads a column at x. NaN in a column means "not printed" and is refused. */
    public Coefficient at(String column, double x) {
        double[] value = columns.get(column);
        if (value == null) {
            throw new IllegalArgumentException(file.name() + " has no column " + column);
        }
        double held = file.ends().held(axis, x, at[0], at[at.length - 1], file.source());
        int i = Between.lower(at, held);
        String beyond = file.ends().explained(axis, x, held);
        if (at[i] == held || file.between() == Between.STEPS) {
            return printed(value[i], "read at " + axis + " = " + OutsideTable.number(at[i]) + beyond, column, i);
        }
        double share = file.between().share(at[i], at[i + 1], held);
        double found = printed(value[i], "", column, i).value()
            + share * (printed(value[i + 1], "", column, i + 1).value() - value[i]);
        return new Coefficient(found, "1", file.source(), "between " + axis + " = " + OutsideTable.number(at[i]) + " ("
            + value[i] + ") and " + OutsideTable.number(at[i + 1]) + " (" + value[i + 1] + ")");
    }

    public double first() {
        return at[0];
    }

    public double last() {
        return at[at.length - 1];
    }

    /** The first printed point of a column; a column may begin later than the axis. */
    public double firstPrinted(String column) {
        double[] value = columns.get(column);
        for (int i = 0; i < at.length; i++) {
            if (!Double.isNaN(value[i])) {
                return at[i];
            }
        }
        throw new IllegalArgumentException(file.name() + " column " + column + " is empty");
    }

    private Coefficient printed(double value, String how, String column, int row) {
        if (Double.isNaN(value)) {
            throw new OutsideTable(file.source(), "prints no value of " + column + " at " + axis + " = "
                + OutsideTable.number(at[row]));
        }
        return new Coefficient(value, "1", file.rowSource(row), how);
    }
}
