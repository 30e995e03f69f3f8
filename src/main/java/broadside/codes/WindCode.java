package broadside.codes;

import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Edition;
import broadside.trace.Trace;
import java.util.List;

/**
 * One published procedure: from a site and a panel to net pressures. Everything after that is the same for every code.
 * A new edition with the same procedure is a folder of tables; a changed procedure is a sibling class.
 */
public interface WindCode {

    /** The edition whose tables are read. */
    Edition edition();

    /** What it wants to know of the site. */
    SiteTerms terms();

    /** The level of its loads and the companion. */
    Level level();

    /** How it writes the width and height of a panel. */
    PanelSymbols symbols();

    /**
     * Velocity pressure at a height above the ground, Pa; recorded as "velocity-pressure".
     *
     * @throws NotCovered where the code has no rule
     */
    double velocityPressure(Site site, double height, Trace trace);

    /**
     * The load cases of a panel with their zones, wind from the front. The first case is the one in which the wind
     * stands square on; cases that differ by the end which the wind meets first come once for each end.
     *
     * @throws NotCovered where the code has no rule
     */
    List<LoadCase> netPressures(Panel panel, Site site, Trace trace);
}
