package broadside.codes;

import broadside.codes.LoadCase.Windward;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/**
 * Open signs and lattice frameworks of ASCE 7, 29.4: force on the solid area, given as a net pressure on the gross area.
 * The members are taken as flat-sided, since round ones take less.
 */
final class Asce7OpenSigns {

    private final Constants constants;
    private final Rows classes;
    private final Status equations;

    Asce7OpenSigns(Edition edition) {
        this.constants = new Constants(edition);
        this.classes = edition.rows("open-signs");
        this.equations = Asce7.equations(edition);
    }

    /** Whether a panel is so open that it is no solid sign any more. */
    boolean covers(Panel panel) {
        return !Numbers.above(panel.solidity(), constants.number("openness-limit"));
    }

    /** The one case that the clause has; the solid area is taken as spread evenly. */
    List<LoadCase> cases(Panel panel, Site site, WindCode code, Asce7Pressure q, double gust, Trace trace) {
        double solidity = trace.given("ε", "solidity", panel.solidity(), "1", "");
        double c = coefficient(solidity).into(trace.line("coefficient/case-a", "C_f",
            "force coefficient on the solid area, flat-sided members; round members would take less").in("ε", solidity));
        Source minimum = constants.source("minimum-pressure");
        double least = trace.line("minimum-pressure", "p_{16}", "least pressure on the solid area").from(minimum.citation(), minimum.status())
            .reads(constants.text("minimum-pressure") + " psf", constants.pascals("minimum-pressure"), "Pa");
        String clause = minimum.publicationAndEdition() + ", 29.4, (29.4-1)";
        double solid = q.into(trace.line("solid-area-pressure/case-a", "p_s", "pressure on the solid area, not below 16 psf")).in("G", gust).in("C_f", c)
            .in("p_{16}", least, "Pa").from(clause + " and 29.7", equations.weaker(minimum.status()))
            .gives("max(" + q.text() + " G C_f; p_{16})", Math.max(q.value() * gust * c, least), "Pa");
        double p = NetPressure.record(site, code.level(site), trace, "case-a", "p_{case-a}", (name, symbol) ->
            trace.line(name, symbol, "net pressure on the gross area, which gives the force on the solid area").in("p_s", solid, "Pa").in("ε", solidity)
                .from(clause, equations), "p_s ε", solid * solidity);
        double b = panel.width();
        return List.of(new LoadCase("case-a", "open sign, wind square on", Windward.NONE,
            List.of(new ZonePressure("case-a", "p_{case-a}", 0, b, b, c, p)), 0, Optional.empty(), 0, 0));
    }

    /** The value of the last class that begins at this solidity or below it. */
    private Coefficient coefficient(double solidity) {
        String found = classes.keys().get(0);
        for (String each : classes.keys()) {
            if (Numbers.atLeast(solidity, classes.number(each, "from").value())) {
                found = each;
            }
        }
        Coefficient flat = classes.number(found, "flat");
        return new Coefficient(flat.value(), "1", flat.source(), "read in the class of solidity " + found.replace("below-", "below "));
    }
}
