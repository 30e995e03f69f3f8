package broadside.codes;

import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

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

    /**
     * Net pressures on a panel flat on the wall of a building: the cases "pushed", towards the wall, and "pulled", away
     * from it, with negative pressures. A panel that lies in two zones has both, from its edge nearer to the corner.
     *
     * @throws NotCovered where the code has no rule
     */
    default List<LoadCase> wallPressures(FacadePanel facade, Site site, Trace trace) {
        throw new NotCovered(edition().property("title"), "walls of buildings", "there is no rule for panels flat on the wall of a building here.",
            "Choose a code that covers them.");
    }

    /**
     * The pressure on which the force coefficient of a slender member or of the edge of a panel is put, Pa: the velocity
     * pressure at the height, with the factors that this code gives to every force. Recorded as "member-pressure", symbol q_m.
     */
    default double memberPressure(Site site, double height, Trace trace) {
        double q = velocityPressure(site, height, trace);
        return trace.line("member-pressure", "q_m", "pressure on a slender member: the velocity pressure").in(facts().pressure(), q, "Pa")
            .from("as above", Status.DERIVED).gives(facts().pressure(), q, "Pa");
    }

    /** The rule of this code for the wind on posts, where it has one. */
    default Optional<MemberRule> memberRule() {
        return Optional.empty();
    }

    /** Friction coefficient of a face along the wind by this code, where it prints one; the surface is smooth, rough or very rough. */
    default Optional<Coefficient> friction(String surface) {
        return Optional.empty();
    }

    /** The basic speed that other values of the site stand for, such as a region with a return period; mostly none. */
    default Optional<Speed> basicSpeed(SiteOptions options, Optional<Period> returnPeriod) {
        return Optional.empty();
    }

    /**
     * The speed of the wind that is passed once in 50 years over the basic speed of this site, by the code's own law of
     * return periods; 1 where the basic speed is that wind already. Recorded as "fifty-year-ratio".
     */
    default double fiftyYearRatio(Site site, Trace trace) {
        return trace.line("fifty-year-ratio", "k_{50}", "the wind passed once in 50 years over the basic speed").from(edition().property("title"), Status.DERIVED)
            .reads("1: the basic speed is that wind", 1, "1");
    }

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

    /** The level of the loads at this site; only some codes let it depend on the site. */
    default Level level(Site site) {
        return facts().level();
    }

    default PanelSymbols symbols() {
        return facts().symbols();
    }
}
