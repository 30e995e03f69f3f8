package broadside.codes;

import broadside.quantity.Length;
import broadside.site.Topography;
import broadside.site.Topography.Feature;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;

/**
 * Orography factor of EN 1991-1-4 annex A.3: hills, ridges, cliffs and escarpments. Logarithms are to base 10.
 * The factor is used wherever the formulas give one, also outside the distances of A.3(4) within which it must be.
 */
final class En1991Orography {

    private final Constants constants;
    private final Rows upwind;
    private final Rows cliff;
    private final Rows hill;
    private final Source place;

    En1991Orography(Edition edition) {
        this.constants = new Constants(edition);
        this.upwind = edition.rows("orography-upwind");
        this.cliff = edition.rows("orography-cliff");
        this.hill = edition.rows("orography-hill");
        this.place = upwind.number("A", "p0").source();
    }

    /** Orography factor c_o at a height above the ground of the site, in metres; at least 1. */
    double factor(Topography ground, double height, Trace trace) {
        double h = trace.given("H", "height of the crest above the foot", ground.height().metres(), "m", ground.height().typed());
        double lu = trace.given("L_u", "length of the upwind slope", ground.upwindLength().metres(), "m", ground.upwindLength().typed());
        double slope = trace.line("slope", "Φ", "upwind slope").in("H", h, "m").in("L_u", lu, "m")
            .from(place.citation(), place.status()).gives("H / L_u", h / lu, "1");
        if (slope < constants.number("orography-flat")) {
            return trace.line("topography-factor", "c_o", "orography factor").in("Φ", slope)
                .from(place.citation(), place.status())
                .reads("1, as Φ is below " + constants.text("orography-flat"), 1, "1");
        }
        boolean steep = slope > constants.number("orography-steep");
        double le = effectiveLength(h, lu, steep, trace);
        double s = Math.max(0, location(ground, height, lu, le, trace));
        s = trace.line("orography-location-factor", "s", "orographic location factor").in("z_e", height, "m").in("L_e", le, "m")
            .from(place.citation(), place.status()).reads(where(ground), s, "1");
        double coefficient = constants.number(steep ? "orography-steep-factor" : "orography-shallow-factor");
        Trace.Line line = trace.line("topography-factor", "c_o", "orography factor").in("s", s).from(place.citation(), place.status());
        return steep ? line.gives("1 + " + Numbers.plain(coefficient) + " s", 1 + coefficient * s, "1")
            : line.in("Φ", slope).gives("1 + " + Numbers.plain(coefficient) + " s Φ", 1 + coefficient * s * slope, "1");
    }

    private double effectiveLength(double h, double lu, boolean steep, Trace trace) {
        Trace.Line line = trace.line("effective-length", "L_e", "effective length of the upwind slope").from(place.citation(), place.status());
        double limit = constants.number("orography-steep");
        return steep ? line.in("H", h, "m").gives("H / " + Numbers.plain(limit), h / limit, "m") : line.in("L_u", lu, "m").gives("L_u", lu, "m");
    }

    private double location(Topography ground, double z, double lu, double le, Trace trace) {
        double x = trace.given("x", "distance from the crest to the site, positive downwind", ground.distanceFromCrest().metres(), "m",
            ground.distanceFromCrest().typed());
        double up = z / le;
        if (up > constants.number("orography-height-reach")) {
            return 0;
        }
        if (x <= 0) {
            return x / lu < -constants.number("orography-upwind-reach") ? 0
                : polynomial(upwind, "A", up) * Math.exp(polynomial(upwind, "B", up) * x / lu);
        }
        if (ground.feature() == Feature.ESCARPMENT) {
            return cliff(x / le, up);
        }
        double ld = downwindLength(ground, trace);
        return x / ld > constants.number("hill-reach") ? 0 : polynomial(hill, "A", up) * Math.exp(polynomial(hill, "B", up) * x / ld);
    }

    /** Where the downwind slope is not given it is taken as long as the upwind one; the assessment says so. */
    private double downwindLength(Topography ground, Trace trace) {
        Length ld = ground.downwindLength().orElse(ground.upwindLength());
        return trace.given("L_d", "length of the downwind slope", ld.metres(), "m", ld.typed());
    }

    private double cliff(double along, double up) {
        if (along > constants.number("cliff-reach")) {
            return 0;
        }
        double least = constants.number("cliff-least");
        double atLeast = cliffFormula(Math.max(along, least), Math.max(up, constants.number("cliff-least-height")));
        if (along >= least) {
            return atLeast;
        }
        double crest = polynomial(upwind, "A", up);
        return crest + along / least * (atLeast - crest);
    }

    private double cliffFormula(double along, double up) {
        double x = Math.log10(along);
        double z = Math.log10(up);
        return polynomial(cliff, "A", z) * x * x + polynomial(cliff, "B", z) * x + polynomial(cliff, "C", z);
    }

    private static double polynomial(Rows rows, String name, double x) {
        double sum = 0;
        for (int power = 4; power >= 0; power--) {
            sum = sum * x + rows.number(name, "p" + power).value();
        }
        return sum;
    }

    private static String where(Topography ground) {
        if (ground.distanceFromCrest().metres() <= 0) {
            return "upwind of the crest: A exp(B x/L_u) with the polynomials A, B of z/L_e";
        }
        return ground.feature() == Feature.ESCARPMENT
            ? "downwind of an escarpment: A X² + B X + C with X = log10(x/L_e) and the polynomials A, B, C of log10(z/L_e);"
                + " a straight line from the crest to x/L_e = 0.1"
            : "downwind of a hill or ridge: A exp(B x/L_d) with the polynomials A, B of z/L_e";
    }
}
