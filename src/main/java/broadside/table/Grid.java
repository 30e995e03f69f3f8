package broadside.table;

/** A printed table against two axes, read by straight lines in both. */
public final class Grid {

    private final TableFile file;
    private final String downAxis;
    private final String acrossAxis;
    private final double[] down;
    private final double[] across;
    private final double[][] value;

    Grid(TableFile file, String downAxis, String acrossAxis, double[] down, double[] across, double[][] value) {
        this.file = file;
        this.downAxis = downAxis;
        this.acrossAxis = acrossAxis;
        this.down = down.clone();
        this.across = across.clone();
        this.value = value.clone();
    }

    /** Reads the table at a place of each axis. */
    public Coefficient at(double y, double x) {
        double heldY = file.ends().held(downAxis, y, down[0], down[down.length - 1], file.source());
        double heldX = file.ends().held(acrossAxis, x, across[0], across[across.length - 1], file.source());
        int row = Between.lower(down, heldY);
        int column = Between.lower(across, heldX);
        double found = alongRow(row, column, heldX);
        if (down[row] != heldY) {
            double share = file.between().share(down[row], down[row + 1], heldY);
            found += share * (alongRow(row + 1, column, heldX) - found);
        }
        return new Coefficient(found, "1", file.source(), how(row, column, heldY, heldX)
            + file.ends().explained(downAxis, y, heldY) + file.ends().explained(acrossAxis, x, heldX));
    }

    private double alongRow(int row, int column, double x) {
        double left = cell(row, column);
        if (across[column] == x) {
            return left;
        }
        return left + file.between().share(across[column], across[column + 1], x) * (cell(row, column + 1) - left);
    }

    private double cell(int row, int column) {
        double found = value[row][column];
        if (Double.isNaN(found)) {
            throw new OutsideTable(file.source(), "prints no value at " + downAxis + " = " + OutsideTable.number(down[row])
                + ", " + acrossAxis + " = " + OutsideTable.number(across[column]));
        }
        return found;
    }

    private String how(int row, int column, double y, double x) {
        boolean onRow = down[row] == y;
        boolean onColumn = across[column] == x;
        StringBuilder text = new StringBuilder(onRow && onColumn ? "read at " : "between ");
        text.append(downAxis).append(" = ").append(OutsideTable.number(down[row]));
        if (!onRow) {
            text.append(" and ").append(OutsideTable.number(down[row + 1]));
        }
        text.append(", ").append(acrossAxis).append(" = ").append(OutsideTable.number(across[column]));
        if (!onColumn) {
            text.append(" and ").append(OutsideTable.number(across[column + 1]));
        }
        text.append(" (").append(value[row][column]);
        if (!onColumn) {
            text.append(", ").append(value[row][column + 1]);
        }
        if (!onRow) {
            text.append("; ").append(value[row + 1][column]);
            if (!onColumn) {
                text.append(", ").append(value[row + 1][column + 1]);
            }
        }
        return text.append(')').toString();
    }
}
