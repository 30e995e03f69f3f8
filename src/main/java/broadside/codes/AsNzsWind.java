package broadside.codes;

import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;

/**
 * Site and design wind speed of AS/NZS 1170.2, sections 2 to 4, and the pressure 0.5 rho V_des^2. One direction
 * multiplier stands for all directions, so the largest site speed within 45 degrees is that of the site.
 */
final class AsNzsWind {

    private final Constants constants;
    private final Rows categories;
    private final Curve heights;
    private final Optional<Rows> climate;
    private final Optional<Coefficient> shieldedUpTo;
    private final AsNzsRegions regions;
    private final AsNzsTopography topography;
    private final Source place;

    AsNzsWind(Edition edition, AsNzsRegions regions) {
        this.constants = new Constants(edition);
        this.categories = edition.rows("terrain-categories");
        this.heights = edition.curve("terrain-height");
        this.climate = edition.hasProperty("climate-multipliers") ? Optional.of(edition.rows("climate-multipliers")) : Optional.empty();
        this.shieldedUpTo = edition.rows("constants").has("shielding-height") ? Optional.of(constants.entry("shielding-height")) : Optional.empty();
        this.regions = regions;
        this.topography = new AsNzsTopography(edition);
        this.place = constants.source("least-design-speed");
    }

    /** The pressure of the design wind speed at a height above the ground, Pa. */
    double pressure(Site site, double height, Trace trace) {
        double vr = regionalSpeed(site, trace);
        Optional<Double> mc = climate.map(rows -> climateMultiplier(site, rows, trace));
        double md = multiplier(site, "direction-multiplier", "M_d", "wind direction multiplier", trace);
        double z = line(trace, "wind-height", "z", "height above the ground at which the speed is taken").reads("height of the case", height, "m");
        double mz = heightMultiplier(site.ground().terrain(), z, trace);
        refuseShielding(site, z);
        double ms = multiplier(site, "shielding-multiplier", "M_s", "shielding multiplier", trace);
        double mt = topography.factor(site, z, trace);
        Trace.Line sum = line(trace, "site-speed", "V_{sit}", "site wind speed").in("V_R", vr, "m/s");
        mc.ifPresent(m -> sum.in("M_c", m));
        double vsit = sum.in("M_d", md).in("M_{z,cat}", mz).in("M_s", ms).in("M_t", mt)
            .gives("V_R " + (mc.isPresent() ? "M_c " : "") + "M_d (M_{z,cat} M_s M_t)", vr * mc.orElse(1.0) * md * (mz * ms * mt), "m/s");
        double least = constants.number("least-design-speed");
        double vdes = line(trace, "design-speed", "V_{des}", "design wind speed, not below " + Numbers.plain(least) + " m/s for strength").in("V_{sit}", vsit, "m/s")
            .gives("max(V_{sit}; " + Numbers.plain(least) + ")", Math.max(vsit, least), "m/s");
        double rho = line(trace, "air-density", "ρ", "air density").reads("as printed", constants.number("air-density"), "kg/m³");
        return line(trace, "velocity-pressure", "q", "pressure of the design wind speed").in("ρ", rho, "kg/m³").in("V_{des}", vdes, "m/s")
            .gives("½ ρ V_{des}²", 0.5 * rho * vdes * vdes, "Pa");
    }

    /** The speed of the site with the way it came about; a speed that was put in the place of the region's own is taken as given. */
    private double regionalSpeed(Site site, Trace trace) {
        double v = site.basicSpeed().metresPerSecond();
        Optional<String> region = site.options().word("region").filter(regions::has);
        boolean typed = site.options().quantities().containsKey("regional-speed");
        if (!typed && region.isPresent() && site.returnPeriod().isPresent() && regions.covers(region.get(), site.returnPeriod().get().years())
            && regions.speed(region.get(), site.returnPeriod().get().years()) == v) {
            return regions.record(region.get(), site.returnPeriod().get(), trace);
        }
        trace.given("V_R", "regional gust speed", v, "m/s", site.basicSpeed().typed());
        return trace.line("regional-speed", "V_R", "regional gust speed").from("given", Status.GIVEN).reads("as given", v, "m/s");
    }

    private static double climateMultiplier(Site site, Rows rows, Trace trace) {
        Trace.Line line = trace.line("climate-multiplier", "M_c", "climate change multiplier");
        Optional<Double> typed = site.options().number("climate-multiplier");
        if (typed.isPresent()) {
            return line.from("given", Status.GIVEN).reads("as given", typed.get(), "1");
        }
        Optional<String> region = site.options().word("region").filter(rows::has);
        Coefficient found = rows.number(region.orElse("generally"), "value");
        return line.from(found.source().citation(), found.source().status()).reads(region.map(r -> "read at region " + r).orElse(
            "the general value, as no region is given; more in regions " + String.join(", ", rows.keys().stream()
                .filter(r -> rows.number(r, "value").value() > found.value()).toList())), found.value(), "1");
    }

    private double multiplier(Site site, String key, String symbol, String meaning, Trace trace) {
        Trace.Line line = trace.line(key, symbol, meaning);
        return site.options().number(key).map(typed -> line.from("given", Status.GIVEN).reads("as given", typed, "1"))
            .orElseGet(() -> line.from(place.publicationAndEdition(), place.status()).reads("1: none given, which is safe", 1, "1"));
    }

    private void refuseShielding(Site site, double z) {
        boolean counted = site.options().number("shielding-multiplier").filter(m -> m < 1).isPresent();
        shieldedUpTo.filter(limit -> counted && Numbers.above(z, limit.value())).ifPresent(limit -> {
            throw new NotCovered(limit.source().publicationAndEdition(), limit.source().place(), "shielding counts for structures up to " + Numbers.plain(limit.value())
                + " m only.", "Leave the shielding-multiplier out: nothing is taken off, which is safe.");
        });
    }

    private double heightMultiplier(String category, double z, Trace trace) {
        String meaning = "terrain-height multiplier in category " + category;
        String column = categories.text(category, "column");
        if (!categories.isPrinted(category, "mean-with")) {
            return heights.at(column, z).into(trace.line("terrain-height-multiplier", "M_{z,cat}", meaning).in("z", z, "m"));
        }
        String other = categories.text(category, "mean-with");
        double first = heights.at(column, z).into(trace.line("terrain-height-multiplier/category-" + column, "M_{" + column + "}",
            "terrain-height multiplier in category " + column).in("z", z, "m"));
        double second = heights.at(other, z).into(trace.line("terrain-height-multiplier/category-" + other, "M_{" + other + "}",
            "terrain-height multiplier in category " + other).in("z", z, "m"));
        return line(trace, "terrain-height-multiplier", "M_{z,cat}", meaning + ", the mean of those of " + column + " and " + other)
            .in("M_{" + column + "}", first).in("M_{" + other + "}", second).gives("(M_{" + column + "} + M_{" + other + "}) / 2", (first + second) / 2, "1");
    }

    private Trace.Line line(Trace trace, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
