package broadside.sheet;

import broadside.action.CaseAction;
import broadside.assess.Loads;
import broadside.codes.LoadCase.Windward;
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

    /** The case whose zones are drawn: the one that governs the moment, or the first with zones where that one has none; met from the left end where both ends are alike. */
    static CaseAction shown(Loads loads) {
        CaseAction governing = loads.governs("base-moment");
        return fromLeft(loads, zoned(governing) ? governing
            : loads.cases().stream().filter(c -> c.direction().equals("front") && zoned(c)).findFirst().orElse(governing));
    }

    /** The same case met from the left end, where that end does no less; posts and panels are counted from the left too. */
    static CaseAction fromLeft(Loads loads, CaseAction action) {
        return loads.cases().stream().filter(c -> c.direction().equals(action.direction()) && c.windward() == Windward.LEFT && alike(c, action)
            && equal(c.force(), action.force()) && equal(c.baseMoment(), action.baseMoment()) && equal(Math.abs(c.torsion()), Math.abs(action.torsion())))
            .findFirst().orElse(action);
    }

    /** "case B" where the force of the side view is not that of the case whose zones are drawn, else empty. */
    static String otherCase(Loads loads) {
        CaseAction governing = loads.governs("base-moment");
        return alike(governing, shown(loads)) ? "" : Format.caseWords(governing.name());
    }

    /** Title of the elevation; it names the case of the zones where the force beside it is of another. */
    static String elevation(Optional<Loads> loads) {
        return loads.filter(l -> !otherCase(l).isEmpty()).map(l -> "elevation, zones of " + Format.caseWords(shown(l).name())).orElse("elevation, seen from the front");
    }

    private static boolean alike(CaseAction one, CaseAction other) {
        return one.name().equals(other.name()) && one.state().equals(other.state());
    }

    private static boolean equal(double one, double other) {
        return Math.abs(one - other) <= 1e-9 * Math.max(Math.abs(one), Math.abs(other));
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
