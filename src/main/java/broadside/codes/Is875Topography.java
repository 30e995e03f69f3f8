package broadside.codes;

import broadside.site.Site;
import broadside.site.Topography;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Topography factor k_3 of IS 875 (Part 3), annex C. The charts of s_0 (figures 14 and 15) are not held here: inside the
 * zone of influence s_0 counts as 1, its largest value, which is safe.
 */
final class Is875Topography {

    private final Constants constants;
    private final Source place;

    Is875Topography(Edition edition) {
        this.constants = new Constants(edition);
        this.place = constants.source("topography-most");
    }

    /** k_3, the same at every height. */
    double factor(Site.Ground ground, Trace trace) {
        if (ground.shapeUnknown()) {
            return result(trace).reads("worst value of annex C, as the ground near by is not known", constants.number("topography-most"), "1");
        }
        return ground.topography().map(hill -> factor(hill, trace))
            .orElseGet(() -> result(trace).reads("1: no hill, ridge or escarpment given", constants.number("topography-least"), "1"));
    }

    private double factor(Topography hill, Trace trace) {
        double height = trace.given("Z", "height of the crest above the foot", hill.height().metres(), "m", hill.height().typed());
        double length = trace.given("L", "length of the upwind slope", hill.upwindLength().metres(), "m", hill.upwindLength().typed());
        double tangent = line(trace, "slope", "Z/L", "upwind slope").in("Z", height, "m").in("L", length, "m").gives("Z / L", height / length, "1");
        double angle = line(trace, "slope-angle", "θ", "angle of the upwind slope").in("Z/L", tangent)
            .reads("the angle whose tangent is Z/L", Math.toDegrees(Math.atan(tangent)), "deg");
        if (!Numbers.above(angle, constants.number("topography-flat"))) {
            return result(trace).in("θ", angle, "deg").reads("1, as θ is not above " + constants.text("topography-flat") + " degrees",
                constants.number("topography-least"), "1");
        }
        boolean steep = Numbers.above(angle, constants.number("topography-steep"));
        double c = steepness(tangent, steep, trace);
        double reach = effectiveLength(height, length, steep, trace);
        double x = trace.given("x", "distance from the crest to the site, positive downwind", hill.distanceFromCrest().metres(), "m",
            hill.distanceFromCrest().typed());
        String share = x < 0 ? "topography-reach-upwind" : "topography-reach-downwind";
        if (Numbers.above(Math.abs(x) / reach, constants.number(share))) {
            return result(trace).in("x", x, "m").in("L_e", reach, "m").reads("1, as the site lies farther than " + constants.text(share) + " L_e "
                + (x < 0 ? "upwind" : "downwind") + " of the crest", constants.number("topography-least"), "1");
        }
        double s0 = trace.line("topography-location-factor", "s_0", "factor for the place on the slope and the height above it").in("x", x, "m")
            .in("L_e", reach, "m").from(place.citation() + ", figures 14 and 15", Status.DERIVED)
            .reads("1, the largest there is, as the charts are not held here: safe", 1, "1");
        double most = constants.number("topography-most");
        return result(trace).in("C", c).in("s_0", s0).gives("min(1 + C s_0; " + Numbers.plain(most) + ")", Math.min(1 + c * s0, most), "1");
    }

    private double steepness(double tangent, boolean steep, Trace trace) {
        double factor = constants.number("topography-slope-factor");
        Trace.Line line = line(trace, "topography-constant", "C", "constant of the slope");
        return steep ? line.reads("the slope is steeper than " + constants.text("topography-steep") + " degrees", constants.number("topography-steep-factor"), "1")
            : line.in("Z/L", tangent).reads(Numbers.plain(factor) + " times Z/L, as the slope is not steeper than " + constants.text("topography-steep")
                + " degrees", factor * tangent, "1");
    }

    private double effectiveLength(double height, double length, boolean steep, Trace trace) {
        double share = constants.number("topography-steep-length");
        Trace.Line line = line(trace, "effective-length", "L_e", "effective length of the upwind slope");
        return steep ? line.in("Z", height, "m").gives("Z / " + Numbers.plain(share), height / share, "m") : line.in("L", length, "m").gives("L", length, "m");
    }

    private Trace.Line result(Trace trace) {
        return line(trace, "topography-factor", "k_3", "topography factor");
    }

    private Trace.Line line(Trace trace, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
