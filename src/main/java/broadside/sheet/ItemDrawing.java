package broadside.sheet;

import broadside.action.CaseAction;
import broadside.assess.Loads;
import broadside.panel.Item;
import broadside.quantity.Units;
import java.util.Optional;

/** The drawing of an item: elevation and side view to scale, with zones and forces once the loads are known. */
public final class ItemDrawing {

    /** Width of a drawing on paper, points. */
    static final double WIDTH = 480;

    /** Draws an item; zones and force are those of the case that governs the moment at the ground. */
    public static Drawing of(Item item, Optional<Loads> loads, Units units) {
        Format format = new Format(units);
        return item.choose(new KindDrawing(loads, format));
    }

    /** The content of the drawing in words, for those who cannot see it. */
    public static String words(Item item, Optional<Loads> loads, Units units) {
        Format format = new Format(units);
        String what = item.choose(new KindWords());
        return what + loads.map(l -> ". The force of the governing case, " + format.force(l.governs("base-moment").force()) + ", acts "
            + format.length(l.governs("base-moment").height()) + " above the ground.").orElse(".");
    }

    /** The case whose zones are drawn: the one that governs the moment, or the first with zones where that one has none. */
    static CaseAction shown(Loads loads) {
        CaseAction governing = loads.governs("base-moment");
        return zoned(governing) ? governing
            : loads.cases().stream().filter(c -> c.direction().equals("front") && zoned(c)).findFirst().orElse(governing);
    }

    private static boolean zoned(CaseAction action) {
        return action.zones().stream().anyMatch(p -> p.zones().size() > 1);
    }

    /** A round length for the scale bar, at most about a quarter of the width drawn. */
    static double barLength(double widthMetres, Units units) {
        double unit = units == Units.US ? 0.3048 : 1;
        double[] round = {0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500};
        double best = round[0];
        for (double each : round) {
            if (each * unit <= widthMetres / 4) {
                best = each;
            }
        }
        return best * unit;
    }

    /** Its text. */
    static String barText(double metres, Format format) {
        double feet = Math.round(metres / 0.3048 * 10) / 10.0;
        return "scale, " + (format.units() == Units.US ? (feet == Math.rint(feet) ? Long.toString((long) feet) : Double.toString(feet)) + " ft"
            : format.length(metres));
    }

    private ItemDrawing() { }
}
