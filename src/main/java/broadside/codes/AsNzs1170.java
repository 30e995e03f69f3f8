package broadside.codes;

import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.trace.Trace;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** AS/NZS 1170.2: hoardings and walls of the appendix and walls of buildings of section 5, on the design wind speed of sections 2 to 4. */
final class AsNzs1170 implements WindCode {

    private static final String CLIMATE = "climate-multiplier";

    private static final Set<String> OPTIONS = Set.of("region", "regional-speed", "direction-multiplier", "shielding-multiplier");

    /** Plain words for the terrain categories. */
    private static final Map<String, String> MEANINGS = Map.of(
        "1", "open water, or flat bare ground without obstacles",
        "1.5", "between 1 and 2: water or bare ground with a few obstacles",
        "2", "open fields with grass and a few scattered trees or houses",
        "2.5", "between 2 and 3: fields with many trees, the edge of a town",
        "3", "suburbs, light industry, woods: many obstacles as high as a house",
        "4", "a city centre: large, high buildings close together");

    private final AsNzsRegions regions;
    private final AsNzsLevels levels;
    private final AsNzsWind wind;
    private final AsNzsHoardings hoardings;
    private final AsNzsWalls walls;
    private final Constants constants;
    private final CodeFacts facts;

    AsNzs1170(Edition edition) {
        this.regions = new AsNzsRegions(edition);
        this.levels = new AsNzsLevels(edition, regions);
        this.wind = new AsNzsWind(edition, regions);
        this.hoardings = new AsNzsHoardings(edition);
        this.walls = new AsNzsWalls(edition);
        this.constants = new Constants(edition);
        Set<String> options = new HashSet<>(OPTIONS);
        if (edition.hasProperty("climate-multipliers")) {
            options.add(CLIMATE);
        }
        SiteTerms terms = new SiteTerms(SiteTerms.averagings(edition), edition.rows("terrain-categories").keys().stream()
            .map(k -> new SiteTerms.Terrain(k, MEANINGS.getOrDefault(k, ""))).toList(), edition.property("smoothest-terrain"), Set.copyOf(options));
        this.facts = new CodeFacts(edition, terms, levels.usual(), new PanelSymbols("b", "c", "g"), "q");
    }

    @Override
    public CodeFacts facts() {
        return facts;
    }

    @Override
    public Level level(Site site) {
        return levels.of(site);
    }

    @Override
    public double fiftyYearRatio(Site site, Trace trace) {
        return levels.fiftyYearRatio(site, trace);
    }

    /** The regional speed that is typed, or that of a region and a return period. */
    @Override
    public Optional<Speed> basicSpeed(SiteOptions options, Optional<Period> returnPeriod) {
        Optional<String> region = options.word("region");
        region.ifPresent(regions::checkName);
        if (options.quantities().get("regional-speed") instanceof Speed typed) {
            return Optional.of(typed);
        }
        return region.map(r -> {
            double v = regions.speed(r, returnPeriod.orElseThrow(() -> new IllegalArgumentException("region " + r
                + " gives a speed with a return-period only, such as \"500 years\"; or type regional-speed in its place")).years());
            return new Speed(v, AsNzsRegions.text(v) + " m/s");
        });
    }

    @Override
    public double workOutVelocityPressure(Site site, double height, Trace trace) {
        return wind.pressure(site, height, trace);
    }

    @Override
    public List<LoadCase> netPressures(Panel panel, Site site, Trace trace) {
        return hoardings.cases(panel, site, this, trace);
    }

    @Override
    public List<LoadCase> wallPressures(FacadePanel facade, Site site, Trace trace) {
        return walls.cases(facade, site, this, trace);
    }

    /** A range is known and not the surfaces it belongs to: its largest value counts for all. */
    @Override
    public Optional<Coefficient> friction(String surface) {
        return Optional.of(constants.entry("friction-largest"));
    }
}
