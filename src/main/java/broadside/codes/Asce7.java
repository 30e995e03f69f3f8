package broadside.codes;

import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** What the editions of ASCE 7 have in common: chapter 26, signs of chapter 29, walls of buildings of chapter 30. */
abstract class Asce7 implements WindCode {

    private static final Set<String> OPTIONS = Set.of("risk-category", "topographic-factor", "ground-elevation", "gust-factor", "duration-rule");

    /** Category of the map that the basic speed is taken from where none is given. */
    private static final String USUAL_CATEGORY = "II";

    private static final Map<String, String> MEANINGS = Map.of(
        "B", "towns, suburbs, woods: many obstacles the size of a house or larger",
        "C", "open ground with scattered obstacles below 30 ft",
        "D", "flat ground without obstacles, and water");

    private final Asce7Velocity velocity;
    private final Asce7Gust gust;
    private final Rows risk;
    private final Asce7Signs signs;
    private final Asce7OpenSigns openSigns;
    private final Asce7Cladding cladding;
    private final Constants constants;
    private final CodeFacts facts;
    private final Status equations;

    Asce7(Edition edition, Asce7Velocity.Directionality directionality) {
        this.velocity = new Asce7Velocity(edition, directionality);
        this.gust = new Asce7Gust(edition);
        this.risk = edition.rows("risk-categories");
        this.signs = new Asce7Signs(edition);
        this.openSigns = new Asce7OpenSigns(edition);
        this.cladding = new Asce7Cladding(edition, velocity, new Asce7Attached(edition, velocity, gust, signs));
        this.constants = new Constants(edition);
        this.equations = equations(edition);
        Coefficient service = edition.rows("load-combinations").number("allowable-full-dead", "w");
        Level level = new Level("strength", "service", "allowable stress (ASD)", service.value(), Numbers.plain(service.value()) + " W",
            service.source().citation(), service.source().status());
        SiteTerms terms = new SiteTerms(SiteTerms.averagings(edition), edition.rows("exposure").keys().stream()
            .map(k -> new SiteTerms.Terrain(k, MEANINGS.getOrDefault(k, ""))).toList(), edition.property("smoothest-terrain"), OPTIONS);
        this.facts = new CodeFacts(edition, terms, level, new PanelSymbols("B", "s", "g"), "q_h");
    }

    /** How well the load equations of an edition are known. */
    static Status equations(Edition edition) {
        String word = edition.property("load-equations");
        return Status.of(word).orElseThrow(() -> new IllegalArgumentException(edition.key() + "/edition.properties: load-equations = " + word + " is no status"));
    }

    @Override
    public CodeFacts facts() {
        return facts;
    }

    @Override
    public double workOutVelocityPressure(Site site, double height, Trace trace) {
        return velocity.velocity(new Asce7Velocity.Point(site, height, Asce7Use.SOLID), trace);
    }

    @Override
    public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
        boolean open = openSigns.covers(panel);
        Source place = constants.source("openness-limit");
        double h = trace.line(open ? "top-height" : "reference-height", "h", "height of the top").in("g", panel.clearance(), "m").in("s", panel.height(), "m")
            .from(place.publicationAndEdition() + ", 29.3", place.status()).gives("g + s", panel.top(), "m");
        recordRisk(site, trace);
        if (open) {
            double z = trace.line("reference-height", "z", "height of the middle, where the centroid of the solid area is taken").in("g", panel.clearance(), "m")
                .in("s", panel.height(), "m").from(place.publicationAndEdition() + ", 29.4", place.status()).gives("g + s / 2", panel.clearance() + panel.height() / 2, "m");
            Asce7Pressure q = velocity.inLoads(new Asce7Velocity.Point(site, z, Asce7Use.OPEN), trace);
            return openSigns.cases(panel, site, this, q, gust.ofPanel(site, panel.width(), h, trace), trace);
        }
        Asce7Pressure q = velocity.inLoads(Asce7Use.SOLID, velocityPressure(site, h, trace), trace);
        return signs.cases(panel, site, this, q, gust.ofPanel(site, panel.width(), h, trace), trace);
    }

    @Override
    public List<LoadCase> wallPressures(FacadePanel facade, Site site, Trace trace) {
        recordRisk(site, trace);
        return cladding.cases(facade, site, this, trace);
    }

    private void recordRisk(Site site, Trace trace) {
        site.options().word("risk-category").ifPresent(category -> riskPeriod(category, trace));
    }

    private double riskPeriod(String category, Trace trace) {
        return risk.number(category, "years").into(trace.line("risk-return-period", "R", "return period in years of the map for risk category " + category));
    }

    /** q K_d G, the pressure on which the force coefficient of a member stands in 29.4. */
    @Override
    public double memberPressure(Site site, double height, Trace trace) {
        double h = trace.line("member-height", "h", "height for which the wind on a member is worked out").from("statics", Status.DERIVED)
            .reads("height of the wind on it", height, "m");
        Asce7Pressure q = velocity.inLoads(Asce7Use.SOLID, velocityPressure(site, h, trace), trace);
        double g = gust.ofMember(site, h, trace);
        return q.into(trace.line("member-pressure", "q_m", "velocity pressure with the factors that every force has")).in("G", g)
            .from(constants.source("openness-limit").publicationAndEdition() + ", 29.4, (29.4-1)", equations).gives(q.text() + " G", q.value() * g, "Pa");
    }

    @Override
    public double fiftyYearRatio(Site site, Trace trace) {
        double years = riskPeriod(site.options().word("risk-category").orElse(USUAL_CATEGORY), trace);
        Source law = constants.source("return-period-constant");
        double constant = constants.number("return-period-constant");
        double slope = constants.number("return-period-slope");
        double months = constants.number("return-period-months");
        return trace.line("fifty-year-ratio", "k_{50}", "the wind passed once in 50 years over the basic speed, outside hurricane regions").in("R", years)
            .from(law.citation(), law.status())
            .gives("1 / (" + Numbers.plain(constant) + " + " + Numbers.plain(slope) + " ln(" + Numbers.plain(months) + " R))", 1 / (constant + slope * Math.log(months * years)), "1");
    }
}
