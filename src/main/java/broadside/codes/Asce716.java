package broadside.codes;

import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** ASCE/SEI 7-16: solid free-standing signs and walls of chapter 29, with K_d inside the velocity pressure. */
final class Asce716 implements WindCode {

    private static final Set<String> OPTIONS = Set.of("risk-category", "topographic-factor", "ground-elevation", "gust-factor");

    private static final Map<String, String> MEANINGS = Map.of(
        "B", "towns, suburbs, woods: many obstacles the size of a house or larger",
        "C", "open ground with scattered obstacles below 30 ft",
        "D", "flat ground without obstacles, and water");

    private final Asce7Velocity velocity;
    private final Rows risk;
    private final Asce7Signs signs;
    private final Constants constants;
    private final CodeFacts facts;

    Asce716(Edition edition) {
        this.velocity = new Asce7Velocity(edition);
        this.risk = edition.rows("risk-categories");
        this.signs = new Asce7Signs(edition);
        this.constants = new Constants(edition);
        Coefficient service = edition.rows("load-combinations").number("allowable-full-dead", "w");
        Level level = new Level("strength", "service", "allowable stress (ASD)", service.value(), Numbers.plain(service.value()) + " W",
            service.source().citation(), service.source().status());
        SiteTerms terms = new SiteTerms(SiteTerms.averagings(edition), edition.rows("exposure").keys().stream()
            .map(k -> new SiteTerms.Terrain(k, MEANINGS.getOrDefault(k, ""))).toList(), edition.property("smoothest-terrain"), OPTIONS);
        this.facts = new CodeFacts(edition, terms, level, new PanelSymbols("B", "s", "g"), "q_h");
    }

    @Override
    public CodeFacts facts() {
        return facts;
    }

    @Override
    public double workOutVelocityPressure(Site site, double height, Trace trace) {
        return velocity.pressure(site, height, trace);
    }

    @Override
    public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
        double h = trace.line("reference-height", "h", "height of the top").in("g", panel.clearance(), "m").in("s", panel.height(), "m")
            .from(constants.source("openness-limit").publicationAndEdition() + ", 29.3", constants.source("openness-limit").status())
            .gives("g + s", panel.top(), "m");
        site.options().word("risk-category").ifPresent(category -> risk.number(category, "years")
            .into(trace.line("risk-return-period", "R", "return period in years of the map for risk category " + category)));
        double q = velocityPressure(site, h, trace);
        double gust = velocity.gustFactor(site, panel.width(), h, trace);
        return signs.cases(panel, site, this, q, gust, trace);
    }
}
