package broadside.codes;

import broadside.quantity.Period;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;

/**
 * From the wind of a site to that of another return period: by the speeds of its region, or of the region and the return
 * period that are assumed where they are not known. Loads go with the square of the speed.
 */
final class AsNzsLevels {

    private final AsNzsRegions regions;
    private final Rows periods;
    private final String assumedRegion;
    private final String assumedUse;
    private final Source speeds;

    AsNzsLevels(Edition edition, AsNzsRegions regions) {
        this.regions = regions;
        this.periods = edition.rows("return-periods");
        this.assumedRegion = edition.property("assumed-region");
        this.assumedUse = edition.property("assumed-use");
        this.speeds = edition.rows("regional-speeds").number(assumedRegion, "a").source();
    }

    /** The wind of a site: region and return period, typed or assumed. */
    private record Wind(String region, double years, String assumed) { }

    private Wind wind(Optional<String> region, Optional<Period> period) {
        String assumed = region.isEmpty() ? period.isEmpty() ? "; region and return period are assumed" : "; the region is assumed"
            : period.isEmpty() ? "; the return period is assumed" : "";
        return new Wind(region.orElse(assumedRegion), period.map(Period::years).orElse(periods.number(assumedUse, "years").value()), assumed);
    }

    private Wind wind(Site site) {
        return wind(site.options().word("region").filter(regions::has), site.returnPeriod());
    }

    /** The level at a site of which neither is known. */
    Level usual() {
        return of(wind(Optional.empty(), Optional.empty()));
    }

    /** Strength loads with their companion, the loads in the wind of the serviceability limit state. */
    Level of(Site site) {
        return of(wind(site));
    }

    private Level of(Wind wind) {
        Coefficient service = periods.number("serviceability", "years");
        double r = service.value();
        Status status = service.source().status().weaker(speeds.status());
        String place = service.source().citation() + "; " + speeds.citation();
        if (!Numbers.above(wind.years(), r)) {
            return new Level("strength", "service", "serviceability", 1, "the same wind, as its return period of " + Numbers.plain(wind.years())
                + " years is not above " + Numbers.plain(r), place, status);
        }
        double then = regions.speed(wind.region(), r);
        double now = regions.speed(wind.region(), wind.years());
        return new Level("strength", "service", "serviceability", Math.pow(then / now, 2), "wind of " + Numbers.plain(r) + " years over that of "
            + Numbers.plain(wind.years()) + " years in region " + wind.region() + ", (" + AsNzsRegions.text(then) + " / " + AsNzsRegions.text(now) + ")²" + wind.assumed(), place, status);
    }

    /** The speed passed once in 50 years over that of the site; recorded as "fifty-year-ratio". */
    double fiftyYearRatio(Site site, Trace trace) {
        Wind wind = wind(site);
        Trace.Line line = trace.line("fifty-year-ratio", "k_{50}", "the wind passed once in 50 years over the basic speed").from(speeds.citation(), speeds.status());
        if (!regions.covers(wind.region(), wind.years())) {
            return line.reads("1: the formula of the region does not reach a return period of " + Numbers.plain(wind.years()) + " years", 1, "1");
        }
        return line.reads("wind of 50 years over that of " + Numbers.plain(wind.years()) + " years in region " + wind.region() + ", by its formula, not rounded" + wind.assumed(),
            regions.ratio(wind.region(), 50, wind.years()), "1");
    }
}
