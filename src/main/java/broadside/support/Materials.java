package broadside.support;

import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.TableFormat;
import broadside.trace.Status;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/** What the properties of sections need besides their sizes: corners, densities, design walls, torsion of a rectangle. */
final class Materials {

    private static final double ROUNDING = 1e-9;

    private final String name;
    private final List<Corner> corners = new ArrayList<>();
    private final Map<String, Coefficient> densities = new HashMap<>();
    private final Map<String, Unit> lengths = new ConcurrentHashMap<>();
    private final Rows walls;
    private final Curve rectangle;

    /**
     * Corners of a product, as multiples of the wall.
     *
     * @param above         the rule holds for walls above this, m
     * @param to            and up to this
     * @param outerFormula  outer radius as a formula of the wall t_s
     * @param nominalArea   area of the section with the wall as sold, t_n, as a formula
     */
    record Corner(String family, double above, double to, double outer, double inner, String outerFormula, String innerFormula, String nominalArea,
                  String place, Status status) {

        /** Whether the roundings of a wall leave no straight part of a side, or less than none. */
        boolean fills(double wall, double side) {
            return 2 * outer * wall > side * (1 + ROUNDING) || 2 * inner * wall > (side - 2 * wall) * (1 + ROUNDING);
        }
    }

    Materials(Edition edition) {
        this.name = edition.key();
        this.walls = edition.rows("design-walls");
        Rows radii = edition.rows("corner-radii");
        for (String row : radii.keys()) {
            corners.add(corner(radii, row));
        }
        Rows density = edition.rows("densities");
        for (String material : density.keys()) {
            densities.put(material, si(density, material, "density", Dimension.DENSITY, "kg/m³"));
        }
        this.rectangle = edition.curve("rectangle-torsion");
    }

    private static Corner corner(Rows rows, String row) {
        Coefficient outer = rows.number(row, "outer");
        String o = rows.text(row, "outer");
        String i = rows.text(row, "inner");
        return new Corner(rows.text(row, "family"), limit(rows, row, "above", 0), limit(rows, row, "to", Double.MAX_VALUE), outer.value(),
            rows.number(row, "inner").value(), o + " t_s", i + " t_s",
            "H_s B_s - (H_s - 2 t_n) (B_s - 2 t_n) - (4 - π) ((" + o + " t_n)² - (" + i + " t_n)²)", outer.source().citation(), outer.source().status());
    }

    private static double limit(Rows rows, String row, String column, double none) {
        return rows.isPrinted(row, column) ? metres(rows.number(row, column).value(), unit(rows.text(row, "unit"))) : none;
    }

    /** The corners of a family, such as "hot", for a wall as sold, m. */
    Corner corner(String family, double wall) {
        for (Corner corner : corners) {
            if (corner.family().equals(family) && wall > corner.above() && wall <= corner.to()) {
                return corner;
            }
        }
        throw new TableFormat(name + "/corner-radii.csv", 1, "has no row of the family \"" + family + "\" for a wall of " + wall + " m");
    }

    /** Density by its name, kg/m3. */
    Coefficient density(String material) {
        Coefficient density = densities.get(material);
        if (density == null) {
            throw new TableFormat(name + "/densities.csv", 1, "has no row \"" + material + "\"");
        }
        return density;
    }

    /** Design wall as a share of the wall as sold, for tubes to a standard. */
    Coefficient wallFactor(String standard) {
        if (!walls.has(standard)) {
            throw new TableFormat(name + "/design-walls.csv", 1, "has no row \"" + standard + "\"");
        }
        return walls.number(standard, "factor");
    }

    /** Torsion of a solid rectangle: modulus and inertia against h/b. */
    Curve rectangle() {
        return rectangle;
    }

    /** A number of a row in the unit that its row names, in SI. */
    static Coefficient si(Rows rows, String key, String column, Dimension dimension, String siUnit) {
        Coefficient printed = rows.number(key, column);
        String unit = rows.text(key, "unit");
        Optional<Unit> known = Unit.of(dimension, unit);
        if (known.isEmpty()) {
            throw new TableFormat("posts/materials", 1, "the unit \"" + unit + "\" of " + key + " is not known");
        }
        return new Coefficient(printed.value() * known.get().toSi(), siUnit, printed.source(), printed.how());
    }

    /** A unit of length by its symbol. */
    Unit length(String symbol) {
        Unit known = lengths.get(symbol);
        if (known == null) {
            known = unit(symbol);
            lengths.put(symbol, known);
        }
        return known;
    }

    static Unit unit(String symbol) {
        return Unit.of(Dimension.LENGTH, symbol).orElseThrow(() -> new TableFormat("posts", 1, "\"" + symbol + "\" is no unit of length"));
    }

    /** Divided where the metre holds a whole number of the unit, so that 114.3 mm is 0.1143 m and not its neighbour. */
    static double metres(double value, Unit unit) {
        double parts = 1 / unit.toSi();
        return parts == Math.rint(parts) ? value / parts : value * unit.toSi();
    }
}
