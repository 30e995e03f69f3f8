package broadside.assess;

import broadside.codes.Level;
import broadside.support.WindLevels;
import broadside.table.Coefficient;
import broadside.trace.Status;
import broadside.trace.Trace;

/** From the level of the code's loads to the two levels that rules for supports ask for. */
final class SupportLevels {

    /** Records both factors; {@code plain} stands for codes that give no factor of their own. */
    static WindLevels of(Level level, Coefficient plain, Trace sheet) {
        boolean strength = level.name().equals("strength");
        String at = "the loads of the code are at this level";
        double service = strength ? factor(sheet, "service", "k_s", level) : sheet.line("support-factor/service", "k_s", "from the loads of the code to service loads")
            .from("as above", Status.DERIVED).reads(at, 1, "1");
        Trace.Line up = sheet.line("support-factor/strength", "k_u", "from the loads of the code to strength loads");
        double ultimate = strength ? up.from("as above", Status.DERIVED).reads(at, 1, "1")
            : level.factor() > 1 ? up.from(level.place(), level.status()).reads(level.rule(), level.factor(), "1") : plain.into(up);
        boolean own = strength || level.factor() > 1;
        return new WindLevels(service, ultimate, own ? level.place() : plain.source().citation(), own ? level.status() : plain.source().status());
    }

    private static double factor(Trace sheet, String name, String symbol, Level level) {
        return sheet.line("support-factor/" + name, symbol, "from the loads of the code to " + name + " loads").from(level.place(), level.status())
            .reads(level.rule(), level.factor(), "1");
    }

    private SupportLevels() { }
}
