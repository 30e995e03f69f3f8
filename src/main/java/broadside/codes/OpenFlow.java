package broadside.codes;

import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Plain fluid mechanics: the mean force of a gust on a flat plate. No code; it stands beside the codes as a check from outside. */
final class OpenFlow implements WindCode {

    private static final Set<String> OPTIONS = Set.of("air-density");

    private final OpenFlowWind wind;
    private final OpenFlowPlates plates;
    private final OpenFlowAside aside;
    private final MemberRule members;
    private final CodeFacts facts;

    OpenFlow(Edition edition) {
        this.wind = new OpenFlowWind(edition);
        this.plates = new OpenFlowPlates(edition);
        this.aside = new OpenFlowAside(edition);
        this.members = new OpenFlowMembers(edition);
        String name = edition.property("edition");
        Level level = new Level("characteristic", "characteristic", "unfactored", 1, "no code and no partial factor", name, Status.DERIVED);
        SiteTerms terms = new SiteTerms(SiteTerms.averagings(edition), List.of(), edition.property("smoothest-terrain"), OPTIONS);
        this.facts = new CodeFacts(edition, terms, level, new PanelSymbols("b", "h", "z_g"), "q");
    }

    @Override
    public CodeFacts facts() {
        return facts;
    }

    @Override
    public Optional<MemberRule> memberRule() {
        return Optional.of(members);
    }

    @Override
    public double workOutVelocityPressure(Site site, double height, Trace trace) {
        return wind.flow(site, height, trace).pressure();
    }

    /** Air, gust and pressure are each taken over where they come again. */
    @Override
    public double velocityPressure(Site site, double height, Trace trace) {
        return wind.flow(site, height, trace).pressure();
    }

    @Override
    public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
        double z = referenceHeight(panel, trace);
        OpenFlowWind.Flow flow = wind.flow(site, z, trace);
        double q = flow.pressure();
        OpenFlowPlates.Plate plate = new OpenFlowPlates.Plate(panel.width(), panel.height(), onGround(panel), panel.solidity());
        double reynolds = plates.reynolds(plate, flow.speed(), flow.density(), trace);
        double c = plates.coefficient(plate, "coefficient/all", trace);
        double p = NetPressure.record(site, level(site), trace, "all", "p", (name, symbol) ->
            trace.line(name, symbol, "net pressure on the panel, both faces together").in("q", q, "Pa").in("C_D", c)
                .from("definition of the drag coefficient", Status.DERIVED), "q C_D", q * c);
        aside.record(panel, q, reynolds, trace);
        double b = panel.width();
        return List.of(new LoadCase("normal", "wind square on", LoadCase.Windward.NONE,
            List.of(new ZonePressure("all", "p", 0, b, b, c, p)), 0, Optional.empty(), 0, 0));
    }

    private static boolean onGround(Panel panel) {
        return panel.clearance() == 0;
    }

    /** A board in the air is met at its middle; a wall, and whatever stands on the ground, counts with the wind at its top. */
    private double referenceHeight(Panel panel, Trace trace) {
        boolean top = panel.kind() == Panel.Kind.WALL || onGround(panel);
        Trace.Line line = trace.line("reference-height", "z_r", top ? "height of the wind: the top of the wall" : "height of the wind: the middle of the board")
            .in("z_g", panel.clearance(), "m").in("h", panel.height(), "m").from(edition().property("edition") + ", own rule", Status.DERIVED);
        return top ? line.gives("z_g + h", panel.top(), "m") : line.gives("z_g + h / 2", panel.clearance() + panel.height() / 2, "m");
    }
}
