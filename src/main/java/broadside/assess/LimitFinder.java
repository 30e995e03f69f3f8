package broadside.assess;

import broadside.codes.WindCode;
import broadside.limit.LimitSearch;
import broadside.panel.Item;
import broadside.quantity.Speed;
import broadside.site.Averaging;
import broadside.site.Site;
import broadside.site.SpeedConversion;
import broadside.support.Check;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiFunction;
import java.util.stream.Collectors;

/**
 * Turns the question round: at which gust is each check of an item just met? The item keeps what carries it; the wind is the
 * basic speed of the code without return period, season, direction or an authority's least pressure, since it is the wind
 * that blows and not the wind of a year.
 */
final class LimitFinder {

    /** Checks that the wind does not bring to failure, or whose failure is no danger. */
    private static final Set<String> LEFT_OUT = Set.of("post deflection", "natural frequency", "wall slenderness");
    private static final String[] OF_YEARS = {"duration-rule", "season", "season-factor", "structure-class", "direction-factor", "direction-multiplier", "region", "regional-speed",
        "climate-multiplier", "wind-zone", "k4", "directionality"};
    private static final String OPEN = "open fields";
    private static final String BARE = "cover taken off";
    private static final double TEN = 10;

    private final SpeedConversion conversion;
    private final Rows terrains;
    private final Rows own;

    LimitFinder(SpeedConversion conversion, Rows terrains, Rows own) {
        this.conversion = conversion;
        this.terrains = terrains;
        this.own = own;
    }

    /**
     * Finds the limits and records them.
     *
     * @param loads  the loads of an item at a site
     * @return empty where nothing was checked
     */
    Optional<Limits> of(Job job, ItemResult result, WindCode code, BiFunction<Item, Site, Loads> loads) {
        Optional<Carried> carried = result.loads().flatMap(Loads::carried).filter(c -> c.checks().stream().anyMatch(k -> !LEFT_OUT.contains(k.name())));
        if (carried.isEmpty()) {
            return Optional.empty();
        }
        Item frozen = result.item().choose(new Frozen(carried.get()));
        Site site = windy(job.site());
        double height = result.loads().get().velocity().height();
        double level = code.level(site).name().equals("strength") ? Math.sqrt(code.level(site).factor()) : 1;
        Wind wind = new Wind(site, level, height, code, loads);
        List<Limits.Limit> found = limits(frozen, keys(carried.get()), wind);
        found.forEach(l -> record(l, result.sheet()));
        List<Limits.Change> changes = new ArrayList<>();
        frozen.choose(new Changes(carried.get(), own)).forEach((what, item) -> changes.add(new Limits.Change(what, changed(item, wind))));
        return Optional.of(new Limits(found, height, level == 1 ? "" : "the wind at the level of strength times the square root of " + code.level(site).rule(), changes));
    }

    /** The site in other winds, and the loads of an item there. */
    private record Wind(Site site, double level, double height, WindCode code, BiFunction<Item, Site, Loads> loads) {

        Loads at(Item item, double multiple) {
            return loads.apply(item, site.withSpeed(new Speed(multiple * site.basicSpeed().metresPerSecond(), "")));
        }
    }

    /** The limits of an item, the first to govern first. */
    private List<Limits.Limit> limits(Item item, Set<String> keys, Wind wind) {
        LimitSearch search = new LimitSearch(multiple -> shares(wind.at(item, multiple)));
        List<Limits.Limit> found = new ArrayList<>();
        for (String key : keys) {
            search.find(key).ifPresent(f -> found.add(limit(key, f, wind)));
        }
        found.sort(Comparator.comparingDouble(Limits.Limit::inTheOpen));
        return found;
    }

    /** The first limit of a changed item. */
    private Optional<Limits.Limit> changed(Item item, Wind wind) {
        Optional<Carried> carried = wind.at(item, 1).carried().filter(c -> c.parts().stream().allMatch(p -> p.refused().isEmpty()));
        Set<String> asItIs = carried.map(LimitFinder::keys).orElse(Set.of()).stream().filter(k -> !k.contains("|")).collect(Collectors.toSet());
        return asItIs.isEmpty() ? Optional.empty() : new LimitSearch(multiple -> shares(wind.at(item, multiple))).first(asItIs).map(f -> limit(f.getKey(), f.getValue(), wind));
    }

    /** The site in the wind that blows. */
    private static Site windy(Site site) {
        return new Site(site.name(), site.basicSpeed(), site.averaging(), Optional.empty(), site.ground(), Optional.empty(), site.options().without(OF_YEARS));
    }

    private static Set<String> keys(Carried carried) {
        Set<String> keys = new LinkedHashSet<>();
        carried.checks().stream().filter(k -> !LEFT_OUT.contains(k.name())).forEach(k -> keys.add(key(k)));
        return keys;
    }

    /** A check by its name, apart with the cover taken off. */
    private static String key(Check check) {
        return check.name() + (check.named().contains(BARE) ? "|" + BARE : "");
    }

    private static Map<String, Double> shares(Loads loads) {
        Map<String, Double> shares = new HashMap<>();
        loads.carried().ifPresent(c -> c.checks().forEach(k -> shares.merge(key(k), k.utilisation(), Math::max)));
        return shares;
    }

    private Limits.Limit limit(String key, LimitSearch.Found found, Wind wind) {
        Site site = wind.site();
        WindCode code = wind.code();
        int bar = key.indexOf('|');
        Speed basic = new Speed(found.multiple() * site.basicSpeed().metresPerSecond() * wind.level(), "");
        double gust = averaged(basic, site.averaging(), Averaging.GUST_3_S);
        Trace nowhere = new Trace().quiet();
        String open = terrains.text(OPEN, code.edition().key().substring(0, code.edition().key().indexOf('/')));
        Site flat = new Site("", site.basicSpeed(), site.averaging(), Optional.empty(), new Site.Ground(open, Optional.empty(), Optional.empty(), Set.of()), Optional.empty(),
            site.options().without("topographic-factor"));
        double there = Math.sqrt(code.velocityPressure(site, wind.height(), nowhere) / code.velocityPressure(flat, TEN, nowhere));
        return new Limits.Limit(bar < 0 ? key : key.substring(0, bar), bar < 0 ? "" : key.substring(bar + 1), gust * there, gust,
            averaged(basic, site.averaging(), Averaging.MEAN_10_MIN), found.multiple(), found.bySquare());
    }

    /** The number that one code calls a 0.2 s gust was called a 3 s gust before: it is not converted. */
    private double averaged(Speed speed, Averaging from, Averaging to) {
        Averaging as = from == Averaging.GUST_0_2_S ? Averaging.GUST_3_S : from;
        return as == to ? speed.metresPerSecond() : conversion.convert(speed, as, to, new Trace().quiet());
    }

    private static void record(Limits.Limit limit, Trace sheet) {
        String slug = (limit.check() + (limit.state().isEmpty() ? "" : " " + limit.state())).replace(' ', '-');
        if (sheet.find("limiting-gust/" + slug).isPresent()) {
            return;
        }
        String how = limit.bySquare() ? "a least value of the code holds below: by the square of the speed" : "found by trial on the whole calculation: the share is 1 there";
        sheet.line("limiting-gust/" + slug, "V_{lim}", "3 s gust at 10 m in the open at which " + limit.check() + " is just met"
            + (limit.state().isEmpty() ? "" : ", " + limit.state())).from("root of the whole calculation", Status.DERIVED).reads(how, limit.inTheOpen(), "m/s");
        sheet.line("limiting-mean/" + slug, "V_{lim,m}", "10 minute mean there").from("ratios of Durst", Status.DERIVED).reads("from that gust", limit.mean(), "m/s");
    }
}
