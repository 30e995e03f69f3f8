package broadside.codes;

import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/**
 * EN 1991-1-4 on the peak velocity pressure of chapter 4: signboards (7.4.3), free-standing walls (7.4.1 and 7.4.2),
 * plane lattices (7.11), walls of buildings (7.2.2), posts (7.6 and 7.9) and friction (7.5).
 */
final class En1991 implements WindCode {

    private static final Set<String> OPTIONS = Set.of("direction-factor", "season-factor", "air-density", "duration-rule", "shelter-factor");

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
    private final En1991Lattice lattice;
    private final En1991Facade facade;
    private final En1991Members members;
    private final Rows friction;
    private final CodeFacts facts;

    En1991(Edition edition) {
        this.constants = new Constants(edition);
        this.wind = new En1991Wind(edition);
        this.walls = new En1991Walls(edition);
        this.lattice = new En1991Lattice(edition);
        this.facade = new En1991Facade(edition);
        this.members = new En1991Members(edition);
        this.friction = edition.rows("friction");
        Rows factors = edition.rows("partial-factors");
        Source place = factors.number("en-1990-str-geo-b", "gamma-Q").source();
        double gamma = factors.number("en-1990-str-geo-b", "gamma-Q").value();
        Level level = new Level("characteristic", "factored", "factored", gamma, "partial factor " + Numbers.plain(gamma) + " on wind",
            place.citation(), place.status());
        Rows terrain = edition.rows("terrain");
        SiteTerms terms = new SiteTerms(SiteTerms.averagings(edition),
            terrain.keys().stream().map(k -> new SiteTerms.Terrain(k, MEANINGS.getOrDefault(k, ""))).toList(), edition.property("smoothest-terrain"),
            options(edition));
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

    /** What the tables of an edition can take: seasons and wind zones where it has them; an overlay may hold a value fixed. */
    private static Set<String> options(Edition edition) {
        Set<String> options = new TreeSet<>(OPTIONS);
        if (edition.has("season")) {
            options.add("season");
        }
        if (edition.has("wind-zones")) {
            options.add("wind-zone");
        }
        if (edition.hasProperty("options-fixed")) {
            options.removeAll(Set.of(edition.property("options-fixed").split(", ")));
        }
        return options;
    }

    @Override
    public Optional<Speed> basicSpeed(SiteOptions options, Optional<Period> returnPeriod) {
        return wind.basicSpeed(options, returnPeriod);
    }

    @Override
    public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
        boolean wall = isWall(panel);
        if (!Numbers.atLeast(panel.solidity(), constants.number("wall-solidity-limit"))) {
            return lattice.cases(panel, wall, site, this, trace);
        }
        return wall ? walls.cases(panel, site, this, trace) : signboard(panel, site, trace);
    }

    @Override
    public List<LoadCase> wallPressures(FacadePanel panel, Site site, Trace trace) {
        return facade.cases(panel, site, this, trace);
    }

    /** The peak velocity pressure, under the symbol by which forces on posts and edges take it. */
    @Override
    public double memberPressure(Site site, double height, Trace trace) {
        Source place = constants.source("peak-constant");
        trace.line("member-height", "z_e", "height at which the pressure is taken").from(place.publicationAndEdition() + ", 5.3(2)", place.status())
            .reads("upper end of the length of a post, or the reference height of the panel", height, "m");
        double qp = velocityPressure(site, height, trace);
        return trace.line("member-pressure", "q_m", "pressure on the member or edge: the peak velocity pressure").in("q_p", qp, "Pa")
            .from(place.publicationAndEdition() + ", 5.3(2)", place.status()).gives("q_p", qp, "Pa");
    }

    @Override
    public Optional<MemberRule> memberRule() {
        return Optional.of(members);
    }

    @Override
    public Optional<Coefficient> friction(String surface) {
        return friction.has(surface) ? Optional.of(friction.number(surface, "value")) : Optional.empty();
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
            .reads((clear(panel) ? "signboard, as z_g is not less than h/4" : "signboard, as z_g is less than h/4 but b/h is not above 1")
                + (panel.shelter() < 1 ? "; shelter is for walls and is not counted" : ""), constants.number("signboard-cf"), "1");
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
