package broadside.codes;

import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/** IS 875 (Part 3): hoardings and free-standing walls (7.4.2.3) and walls of clad buildings (table 5) on the design wind pressure of 7.2. */
final class Is875 implements WindCode {

    private static final Set<String> OPTIONS = Set.of("structure-class", "duration-rule", "k4", "directionality");

    /** Plain words for the terrain categories of table 2. */
    private static final Map<String, String> MEANINGS = Map.of(
        "1", "open sea, a coast that lies open to it, flat plains without trees",
        "2", "open fields with scattered trees, hedges and low houses",
        "3", "suburbs, small towns, woodland, industrial areas",
        "4", "a city centre with many tall buildings close to each other");

    private final Constants constants;
    private final Is875Wind wind;
    private final Is875Pressure pressure;
    private final Is875Hoardings hoardings;
    private final Is875Walls walls;
    private final CodeFacts facts;

    Is875(Edition edition) {
        this.constants = new Constants(edition);
        this.wind = new Is875Wind(edition);
        this.pressure = new Is875Pressure(edition);
        this.hoardings = new Is875Hoardings(edition);
        this.walls = new Is875Walls(edition, pressure);
        Coefficient factor = edition.rows("load-factors").number("dead-and-wind", "wind");
        Level level = new Level("characteristic", "factored", "factored", factor.value(), "partial factor " + Numbers.plain(factor.value()) + " on wind",
            factor.source().citation(), factor.source().status());
        SiteTerms terms = new SiteTerms(SiteTerms.averagings(edition),
            Stream.of("1", "2", "3", "4").map(k -> new SiteTerms.Terrain(k, MEANINGS.get(k))).toList(), edition.property("smoothest-terrain"), OPTIONS);
        this.facts = new CodeFacts(edition, terms, level, new PanelSymbols("b", "h", "h'"), "p_z");
    }

    @Override
    public CodeFacts facts() {
        return facts;
    }

    @Override
    public double workOutVelocityPressure(Site site, double height, Trace trace) {
        return wind.pressure(site, height, trace);
    }

    @Override
    public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
        Source place = constants.source("hoarding-height-limit");
        double z = trace.line("reference-height", "z", "height for the wind: the top of the panel, as no other height is stated, which is safe")
            .in("h'", panel.clearance(), "m").in("h", panel.height(), "m").from(place.citation(), Status.DERIVED).gives("h' + h", panel.top(), "m");
        if (Numbers.atLeast(z, constants.metres("hoarding-height-limit"))) {
            throw new NotCovered(place.publicationAndEdition(), place.place(), "the table is for walls and hoardings lower than "
                + constants.text("hoarding-height-limit") + " m; the top of this one lies at " + Numbers.plain((double) Math.round(z * 1000) / 1000) + " m.",
                "Ask an engineer for a taller one.");
        }
        double pz = velocityPressure(site, z, trace);
        double pd = pressure.ofSign(panel, pz, site, trace);
        return hoardings.cases(panel, site, level(site), pd, trace);
    }

    @Override
    public List<LoadCase> wallPressures(FacadePanel facade, Site site, Trace trace) {
        return walls.cases(facade, site, this, trace);
    }

    @Override
    public double memberPressure(Site site, double height, Trace trace) {
        return pressure.ofMember(velocityPressure(site, height, trace), site, trace);
    }
}
