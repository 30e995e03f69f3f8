package broadside.codes;

import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** EN 1991-1-4: signboards (7.4.3) and free-standing walls (7.4.1) on the peak velocity pressure of chapter 4. */
final class En1991 implements WindCode {

    private static final Set<String> OPTIONS = Set.of("direction-factor", "season-factor", "air-density");

    /** Plain words for the categories of table 4.1. */
    private static final Map<String, String> MEANINGS = Map.of(
        "0", "open sea, or a coast that lies open to it",
        "I", "a lake shore, or flat bare ground without obstacles",
        "II", "open fields with low plants and single trees or houses far apart",
        "III", "villages, suburbs, woodland",
        "IV", "a town centre: at least a seventh of the ground built up, houses higher than 15 m on average");

    private final Constants constants;
    private final En1991Wind wind;
    private final En1991Walls walls;
    private final CodeFacts facts;

    En1991(Edition edition) {
        this.constants = new Constants(edition);
        this.wind = new En1991Wind(edition);
        this.walls = new En1991Walls(edition);
        Rows factors = edition.rows("partial-factors");
        Source place = factors.number("en-1990-str-geo-b", "gamma-Q").source();
        double gamma = factors.number("en-1990-str-geo-b", "gamma-Q").value();
        Level level = new Level("characteristic", "factored", "factored", gamma, "partial factor " + Numbers.plain(gamma) + " on wind",
            place.citation(), place.status());
        Rows terrain = edition.rows("terrain");
        SiteTerms terms = new SiteTerms(SiteTerms.averagings(edition),
            terrain.keys().stream().map(k -> new SiteTerms.Terrain(k, MEANINGS.getOrDefault(k, ""))).toList(), edition.property("smoothest-terrain"), OPTIONS);
        this.facts = new CodeFacts(edition, terms, level, new PanelSymbols("b", "h", "z_g"), "q_p");
    }

    @Override
    public CodeFacts facts() {
        return facts;
    }

    @Override
    public double workOutVelocityPressure(Site site, double height, Trace trace) {
        return wind.peakPressure(site, height, trace);
    }

    @Override
    public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
        double limit = constants.number("wall-solidity-limit");
        Source solidity = constants.source("wall-solidity-limit");
        if (panel.solidity() < limit) {
            throw new NotCovered(solidity.publicationAndEdition(), isWall(panel) ? solidity.place() : "7.4.3(1)", "the solidity "
                + Numbers.plain(panel.solidity()) + " is below " + Numbers.plain(limit)
                + "; such a panel counts as a plane lattice (7.11), which is not worked out here.",
                "Take the panel as closed, which is safe, or ask an engineer for the lattice.");
        }
        return isWall(panel) ? walls.cases(panel, site, this, trace) : signboard(panel, site, trace);
    }

    /** 7.4.3: a board near the ground that is wider than it is high is a free-standing wall; so is a hoarding on the ground. */
    private boolean isWall(Panel panel) {
        boolean wide = Numbers.above(panel.width() / panel.height(), constants.number("signboard-aspect"));
        return !clear(panel) && (wide || panel.kind() == Panel.Kind.WALL && panel.clearance() == 0);
    }

    private boolean clear(Panel panel) {
        return Numbers.atLeast(panel.clearance() / panel.height(), constants.number("signboard-clearance"));
    }

    private List<LoadCase> signboard(Panel panel, Site site, Trace trace) {
        Source place = constants.source("signboard-cf");
        double zg = panel.clearance();
        double h = panel.height();
        trace.line("signboard-rule", "b/h", "width over height of the board").in("b", panel.width(), "m").in("h", h, "m")
            .from(place.publicationAndEdition() + ", " + constants.source("signboard-clearance").place(), place.status())
            .gives("b / h", panel.width() / h, "1");
        double ze = trace.line("reference-height", "z_e", "reference height: the middle of the board").in("z_g", zg, "m").in("h", h, "m")
            .from(place.publicationAndEdition() + ", 7.4.3(3)", place.status()).gives("z_g + h / 2", zg + h / 2, "m");
        double qp = velocityPressure(site, ze, trace);
        double cf = trace.line("coefficient/all", "c_f", "force coefficient of a signboard").in("z_g", zg, "m").in("h", h, "m")
            .in("b/h", panel.width() / h).from(place.citation(), place.status())
            .reads(clear(panel) ? "signboard, as z_g is not less than h/4" : "signboard, as z_g is less than h/4 but b/h is not above 1",
                constants.number("signboard-cf"), "1");
        double w = NetPressure.record(site, level(site), trace, "all", "w", (name, symbol) ->
            trace.line(name, symbol, "net pressure on the board").in("q_p", qp, "Pa").in("c_f", cf)
                .from(place.publicationAndEdition() + ", 5.3(2)", place.status()), "q_p c_f", qp * cf);
        double b = panel.width();
        ShiftRule rule = new ShiftRule(constants.number("signboard-eccentricity"), constants.source("signboard-eccentricity"));
        List<ZonePressure> all = List.of(new ZonePressure("all", "w", 0, b, b, cf, w));
        LoadCase centred = new LoadCase("centred", "signboard, wind square on", LoadCase.Windward.NONE, all, 0, Optional.empty(), 0, 0);
        LoadCase right = new LoadCase("eccentric", "signboard, force a quarter of the width off the middle",
            LoadCase.Windward.RIGHT, all, rule.factor() * b, Optional.of(rule), 0, 0);
        return List.of(centred, right, right.mirrored(b));
    }
}
