package broadside.assess;

import broadside.action.Foot;
import broadside.codes.Level;
import broadside.trace.Trace;

/** The governing loads at the other level: factored beside characteristic, service beside strength. */
final class Companions {

    static void record(Loads loads, Trace sheet) {
        Level level = loads.level();
        double f = sheet.line("companion-factor", "f", "from " + level.name() + " to " + level.shown() + " loads")
            .from(level.place(), level.status()).reads(level.rule(), level.factor(), "1");
        one("companion-base-shear", "F_b", loads.governs("base-shear").baseShear(), "N", f, level, sheet);
        if (loads.foot() != Foot.NONE) {
            one("companion-base-moment", loads.foot() == Foot.WALL ? "M_w" : "M", loads.governs("base-moment").baseMoment(), "N m", f, level, sheet);
        }
        if (loads.foot() == Foot.GROUND) {
            one("companion-torsion", "M_T", loads.governs("torsion").torsion(), "N m", f, level, sheet);
        }
        loads.worstPost().ifPresent(post ->
            one("companion-post-moment", "M_p", post.moment(), "N m", f, level, sheet));
    }

    private static void one(String step, String symbol, double value, String unit, double f, Level level, Trace sheet) {
        sheet.line(step, symbol + "*", "governing " + step.substring("companion-".length()).replace('-', ' ') + ", " + level.shown())
            .in("f", f).in(symbol, value, unit).from(level.place(), level.status()).gives("f " + symbol, f * value, unit);
    }

    private Companions() { }
}
