package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/** Class of a cross-section by EN 1993-1-1, table 5.2. */
final class En1993Classes {

    private static final String PLACE = "EN 1993-1-1:2005, table 5.2";
    private static final int CLASSES = 3;
    private static final double ROUNDING = 1e-9;

    private final Figure referenceYield;
    private final Figure[][] limits = new Figure[Plate.values().length][CLASSES];

    En1993Classes(Edition edition) {
        this.referenceYield = Figure.of(edition.rows("steel-en"), "reference-yield");
        Rows rows = edition.rows("section-classes");
        for (Plate plate : Plate.values()) {
            for (int i = 0; i < CLASSES; i++) {
                limits[plate.ordinal()][i] = Figure.of(rows, plate.row, "class-" + (i + 1));
            }
        }
    }

    /** A part of a cross-section that may buckle. */
    private enum Plate {

        TUBE("tube", "D / t", "k ε²", "diameter over wall"),
        FLANGE("flange", "(b_s - 3 t) / t", "k ε", "flat width over wall of the part in compression"),
        WEB("web", "(h_s - 3 t) / t", "k ε", "flat height over wall of the parts in bending");

        private final String row;
        private final String slenderness;
        private final String limit;
        private final String meaning;

        Plate(String row, String slenderness, String limit, String meaning) {
            this.row = row;
            this.slenderness = slenderness;
            this.limit = limit;
            this.meaning = meaning;
        }
    }

    /**
     * The worst part of a section.
     *
     * @param number       1 to 4
     * @param slenderness  recorded as λ
     * @param limit        limit of the class, of class 3 where none is kept; recorded as λ_lim
     */
    record Found(int number, double slenderness, double limit) {

        Found worse(Found other) {
            return number > other.number || number == other.number && slenderness / limit >= other.slenderness / other.limit ? this : other;
        }
    }

    Status status() {
        return limits[0][0].status();
    }

    Found of(PostValues post, List<Axis> axes, double wall, double yield, Trace trace) {
        double reference = referenceYield.into(trace.line("post-reference-yield", "f_235", "yield strength, Pa, at which ε is 1"));
        double ratio = trace.line("post-epsilon", "ε", "factor for the yield strength").in("f_235", reference).in("f_y", yield, "Pa")
            .from(PLACE, referenceYield.status()).gives("(f_235 / f_y)^0.5", Math.sqrt(reference / yield), "1");
        if (post.round()) {
            double d = post.diameter(trace);
            return found(Plate.TUBE, trace.part(Plate.TUBE.row), "D", d, wall, d / wall, ratio);
        }
        Found worst = new Found(0, 0, 1);
        for (Axis axis : axes) {
            Trace sheet = axis.sheet(trace);
            double across = post.across(axis, sheet);
            worst = found(Plate.FLANGE, sheet.part(Plate.FLANGE.row), "b_s", across, wall, (across - 3 * wall) / wall, ratio).worse(worst);
            double depth = post.depth(axis, sheet);
            worst = found(Plate.WEB, sheet.part(Plate.WEB.row), "h_s", depth, wall, (depth - 3 * wall) / wall, ratio).worse(worst);
        }
        return worst;
    }

    private Found found(Plate plate, Trace trace, String symbol, double size, double wall, double ratioOfSizes, double epsilon) {
        double slenderness = trace.line("post-slenderness", "λ", plate.meaning).in(symbol, size, "m").in("t", wall, "m").from(PLACE, status())
            .gives(plate.slenderness, ratioOfSizes, "1");
        double power = plate == Plate.TUBE ? epsilon * epsilon : epsilon;
        int found = 1;
        while (found <= CLASSES && slenderness > limits[plate.ordinal()][found - 1].value() * power * (1 + ROUNDING)) {
            found++;
        }
        double k = limits[plate.ordinal()][Math.min(found, CLASSES) - 1].into(trace.line("post-class-factor", "k", "limit where ε is 1"));
        double limit = trace.line("post-class-limit", "λ_lim", "limit of the slenderness").in("k", k).in("ε", epsilon).from(PLACE, status()).gives(plate.limit, k * power, "1");
        trace.line("post-class", "class", "class of this part").in("λ", slenderness).in("λ_lim", limit).from(PLACE, status())
            .reads(found > CLASSES ? "above the limit of class 3" : "not above this limit, and above that of the class before", found, "1");
        return new Found(found, slenderness, limit);
    }
}
