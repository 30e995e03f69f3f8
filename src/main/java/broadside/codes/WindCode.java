package broadside.codes;

import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/**
 * One published procedure: from a site and a panel to net pressures. Everything after that is the same for every code.
 * A new edition with the same procedure is a folder of tables; a changed procedure is a sibling class.
 */
public interface WindCode {

    /** What is fixed about it. */
    CodeFacts facts();

    /**
     * Works out the velocity pressure at a height above the ground, Pa; recorded as "velocity-pressure".
     *
     * @throws NotCovered where the code has no rule
     */
    double workOutVelocityPressure(Site site, double height, Trace trace);

    /**
     * The load cases of a panel with their zones, wind from the front. The first case is the one in which the wind
     * stands square on; cases that differ by the end which the wind meets first come once for each end.
     *
     * @throws NotCovered where the code has no rule
     */
    List<LoadCase> netPressures(Panel panel, Site site, Trace trace);

    /** Velocity pressure at a height, Pa: worked out once on a sheet and taken over where the same height comes again. */
    default double velocityPressure(Site site, double height, Trace trace) {
        String symbol = facts().pressure();
        return trace.once("velocity pressure at " + height + " m", () -> workOutVelocityPressure(site, height, trace), known ->
            trace.line("velocity-pressure", symbol, "velocity pressure at the same height as above").in(symbol, known, "Pa")
                .from("as above", Status.DERIVED).gives(symbol, known, "Pa"));
    }

    default Edition edition() {
        return facts().edition();
    }

    default SiteTerms terms() {
        return facts().terms();
    }

    default Level level() {
        return facts().level();
    }

    default PanelSymbols symbols() {
        return facts().symbols();
    }
}
