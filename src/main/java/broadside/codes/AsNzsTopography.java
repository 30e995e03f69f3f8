package broadside.codes;

import broadside.quantity.Length;
import broadside.site.Site;
import broadside.site.Topography;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Topographic multiplier M_t of AS/NZS 1170.2, for low ground, where it is the hill shape multiplier M_h.
 * A steep slope has its own formula in the zone about its peak; elsewhere on it the formula of lower slopes counts.
 */
final class AsNzsTopography {

    private final Constants constants;
    private final Source place;
    private final Source lowGround;

    AsNzsTopography(Edition edition) {
        this.constants = new Constants(edition);
        this.place = constants.source("topography-factor");
        this.lowGround = constants.source("topography-altitude");
    }

    /** M_t at a height z above the ground of the site, m; at least 1. */
    double factor(Site site, double z, Trace trace) {
        refuseHighGround(site);
        if (site.ground().shapeUnknown()) {
            return result(trace).reads("worst value of " + place.place() + ", as the ground near by is not known", constants.number("topography-largest"), "1");
        }
        return site.ground().topography().map(ground -> ofHill(ground, z, trace))
            .orElseGet(() -> result(trace).reads("1: no hill, ridge or escarpment given", 1, "1"));
    }

    private void refuseHighGround(Site site) {
        double limit = constants.metres("topography-altitude");
        site.ground().altitude().filter(a -> Numbers.atLeast(a.metres(), limit)).ifPresent(a -> {
            throw new NotCovered(lowGround.publicationAndEdition(), lowGround.place(), "the ground lies at " + a.typed() + "; the topographic multiplier is known here below "
                + constants.text("topography-altitude") + " m only.", "Leave the altitude out and set topography-factor to the multiplier that an engineer gives for this place.");
        });
    }

    private double ofHill(Topography ground, double z, Trace trace) {
        double h = trace.given("H", "height of the crest above the foot", ground.height().metres(), "m", ground.height().typed());
        double lu = halfLength(ground, trace);
        double slope = line(trace, "slope", "H/2L_u", "height over twice the half-height length").in("H", h, "m").in("L_u", lu, "m").gives("H / (2 L_u)", h / (2 * lu), "1");
        if (!Numbers.atLeast(slope, constants.number("topography-flat"))) {
            return result(trace).in("H/2L_u", slope).reads("1, as H/2L_u is below " + constants.text("topography-flat"), 1, "1");
        }
        double x = trace.given("x", "distance from the crest to the site, positive downwind", ground.distanceFromCrest().metres(), "m", ground.distanceFromCrest().typed());
        double l1 = line(trace, "topography-length", "L_1", "length for the fall with the height").in("L_u", lu, "m").in("H", h, "m")
            .gives("max(" + constants.text("topography-length") + " L_u; " + constants.text("topography-length-steep") + " H)",
                Math.max(constants.number("topography-length") * lu, constants.number("topography-length-steep") * h), "m");
        double l2 = reach(ground, x, l1, trace);
        boolean peak = Numbers.atLeast(slope, constants.number("topography-steep")) && x > -h / constants.number("topography-peak-zone");
        double fall = Math.max(0, 1 - Math.abs(x) / l2);
        double most = constants.number("topography-largest");
        String cap = "min(" + constants.text("topography-largest") + "; ";
        if (peak) {
            double k = constants.number("topography-peak-factor");
            return result(trace).in("x", x, "m").in("L_2", l2, "m").gives(cap + "1 + " + Numbers.plain(k) + " max(0; 1 - abs(x) / L_2))", Math.min(most, 1 + k * fall), "1");
        }
        double k = constants.number("topography-factor");
        return result(trace).in("H", h, "m").in("z", z, "m").in("L_1", l1, "m").in("x", x, "m").in("L_2", l2, "m")
            .gives(cap + "1 + H / (" + Numbers.plain(k) + " (z + L_1)) max(0; 1 - abs(x) / L_2))", Math.min(most, 1 + h / (k * (z + l1)) * fall), "1");
    }

    private double halfLength(Topography ground, Trace trace) {
        if (ground.halfLength().isPresent()) {
            Length given = ground.halfLength().get();
            return trace.given("L_u", "distance upwind from the crest to half its height", given.metres(), "m", given.typed());
        }
        double whole = trace.given("L", "length of the upwind slope, foot to crest", ground.upwindLength().metres(), "m", ground.upwindLength().typed());
        return trace.line("half-length", "L_u", "distance upwind from the crest to half its height, for an even slope").in("L", whole, "m")
            .from("geometry of an even slope", Status.DERIVED).gives("L / 2", whole / 2, "m");
    }

    private double reach(Topography ground, double x, double l1, Trace trace) {
        String key = x > 0 && ground.feature() == Topography.Feature.ESCARPMENT ? "topography-reach-escarpment" : "topography-reach";
        Source from = constants.source(key);
        return trace.line("topography-reach", "L_2", "length for the fall with the distance from the crest").in("L_1", l1, "m").from(from.citation(), from.status())
            .gives(constants.text(key) + " L_1", constants.number(key) * l1, "m");
    }

    private Trace.Line result(Trace trace) {
        return trace.line("topography-factor", "M_t", "topographic multiplier, which is the hill shape multiplier M_h below " + constants.text("topography-altitude") + " m")
            .from(lowGround.citation(), lowGround.status().weaker(place.status()));
    }

    private Trace.Line line(Trace trace, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
