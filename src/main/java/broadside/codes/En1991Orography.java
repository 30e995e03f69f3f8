package broadside.codes;

import broadside.quantity.Length;
import broadside.site.Topography.Feature;
import broadside.site.Topography;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.Locale;

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
        if (!Numbers.atLeast(slope, constants.number("orography-flat"))) {
            return trace.line("topography-factor", "c_o", "orography factor").in("Φ", slope)
                .from(place.citation(), place.status())
                .reads("1, as Φ is below " + constants.text("orography-flat"), 1, "1");
        }
        boolean steep = Numbers.above(slope, constants.number("orography-steep"));
        double le = effectiveLength(h, lu, steep, trace);
        double s = location(ground, height, lu, le, trace);
        double coefficient = constants.number(steep ? "orography-steep-factor" : "orography-shallow-factor");
        Trace.Line line = trace.line("topography-factor", "c_o", "orography factor").in("s", s).from(place.citation(), place.status());
        return steep ? line.gives("1 + " + Numbers.plain(coefficient) + " s", 1 + coefficient * s, "1")
            : line.in("Φ", slope).gives("1 + " + Numbers.plain(coefficient) + " s Φ", 1 + coefficient * s * slope, "1");
    }

    /** The largest factor that the formulas give: a steep slope, at its crest, at the ground. For ground that is not known. */
    double worst(Trace trace) {
        double factor = constants.number("orography-steep-factor");
        double crest = upwind.number("A", "p0").value();
        return trace.line("topography-factor", "c_o", "orography factor").from(place.citation(), place.status())
            .reads("worst value of annex A.3, 1 + " + Numbers.plain(factor) + " s with s = " + Numbers.plain(crest)
                + " at the crest of a steep slope, as the ground near by is not known", 1 + factor * crest, "1");
    }

    private double effectiveLength(double h, double lu, boolean steep, Trace trace) {
        Trace.Line line = trace.line("effective-length", "L_e", "effective length of the upwind slope").from(place.citation(), place.status());
        double limit = constants.number("orography-steep");
        return steep ? line.in("H", h, "m").gives("H / " + Numbers.plain(limit), h / limit, "m") : line.in("L_u", lu, "m").gives("L_u", lu, "m");
    }

    private double location(Topography ground, double height, double lu, double le, Trace trace) {
        double x = trace.given("x", "distance from the crest to the site, positive downwind", ground.distanceFromCrest().metres(), "m",
            ground.distanceFromCrest().typed());
        double up = line(trace, "orography-height", "ζ", "height over effective length").in("z_e", height, "m").in("L_e", le, "m")
            .gives("z_e / L_e", height / le, "1");
        boolean cliff = ground.feature() == Feature.ESCARPMENT;
        double reach = constants.number("orography-height-reach");
        if (Numbers.above(up, reach)) {
            return location(trace).reads("0, as z/L_e is above " + Numbers.plain(reach), 0, "1");
        }
        if (x <= 0) {
            return upwindOrHill(upwind, x, "L_u", lu, constants.number("orography-upwind-reach"), up, trace);
        }
        return cliff ? cliff(x, le, up, trace)
            : upwindOrHill(hill, x, "L_d", downwindLength(ground, trace), constants.number("hill-reach"), up, trace);
    }

    private Trace.Line location(Trace trace) {
        return line(trace, "orography-location-factor", "s", "orographic location factor");
    }

    private double upwindOrHill(Rows rows, double x, String symbol, double length, double reach, double up, Trace trace) {
        if (Numbers.above(Math.abs(x) / length, reach)) {
            return location(trace).in("x", x, "m").in(symbol, length, "m")
                .reads("0, as the site lies farther than " + Numbers.plain(reach) + " times " + symbol + " from the crest", 0, "1");
        }
        double a = polynomial(rows, "A", "ζ", up, trace);
        double b = polynomial(rows, "B", "ζ", up, trace);
        return location(trace).in("A", a).in("B", b).in("x", x, "m").in(symbol, length, "m")
            .gives("max(0; A exp(B x / " + symbol + "))", Math.max(0, a * Math.exp(b * x / length)), "1");
    }

    /** Where the downwind slope is not given it is taken as long as the upwind one; the assessment says so. */
    private double downwindLength(Topography ground, Trace trace) {
        Length ld = ground.downwindLength().orElse(ground.upwindLength());
        return trace.given("L_d", "length of the downwind slope", ld.metres(), "m", ld.typed());
    }

    /** From the crest to a tenth of the effective length a straight line joins the two formulas. */
    private double cliff(double x, double le, double up, Trace trace) {
        double along = line(trace, "orography-distance", "ξ", "distance over effective length").in("x", x, "m").in("L_e", le, "m")
            .gives("x / L_e", x / le, "1");
        if (Numbers.above(along, constants.number("cliff-reach"))) {
            return location(trace).in("ξ", along).reads("0, as x/L_e is above " + constants.text("cliff-reach"), 0, "1");
        }
        double least = constants.number("cliff-least");
        double lowest = constants.number("cliff-least-height");
        double logX = line(trace, "orography-log-distance", "X", "base 10 logarithm of the distance over the effective length, at least " + Numbers.plain(least)).in("ξ", along)
            .gives("ln(max(ξ; " + Numbers.plain(least) + ")) / ln(10)", Math.log(Math.max(along, least)) / Math.log(10), "1");
        double logZ = line(trace, "orography-log-height", "Z", "base 10 logarithm of the height over the effective length, at least " + Numbers.plain(lowest)).in("ζ", up)
            .gives("ln(max(ζ; " + Numbers.plain(lowest) + ")) / ln(10)", Math.log(Math.max(up, lowest)) / Math.log(10), "1");
        double a = polynomial(cliff, "A", "Z", logZ, trace);
        double b = polynomial(cliff, "B", "Z", logZ, trace);
        double c = polynomial(cliff, "C", "Z", logZ, trace);
        double formula = a * logX * logX + b * logX + c;
        if (Numbers.atLeast(along, least)) {
            return location(trace).in("A", a).in("X", logX).in("B", b).in("C", c).gives("max(0; A X² + B X + C)", Math.max(0, formula), "1");
        }
        double there = line(trace, "orography-location-factor-at-0.1", "s_{0.1}", "location factor at a distance over effective length of " + Numbers.plain(least)).in("A", a)
            .in("X", logX).in("B", b).in("C", c).gives("A X² + B X + C", formula, "1");
        double crest = polynomial(upwind, "A", "ζ", up, trace);
        return location(trace).in("A", crest).in("s_{0.1}", there).in("ξ", along)
            .gives("max(0; A + (s_{0.1} - A) ξ / " + Numbers.plain(least) + ")", Math.max(0, crest + along / least * (there - crest)), "1");
    }

    private double polynomial(Rows rows, String name, String variable, double x, Trace trace) {
        double sum = 0;
        StringBuilder text = new StringBuilder();
        for (int power = 4; power >= 0; power--) {
            double p = rows.number(name, "p" + power).value();
            sum = sum * x + p;
            if (p != 0) {
                text.append(text.isEmpty() ? (p < 0 ? "-" : "") : p < 0 ? " - " : " + ").append(Numbers.plain(Math.abs(p)))
                    .append(power == 0 ? "" : power == 1 ? " " + variable : " " + variable + "^" + power);
            }
        }
        return line(trace, "orography-polynomial-" + name.toLowerCase(Locale.ROOT), name, "polynomial " + name + " of this side of the crest")
            .in(variable, x).gives(text.toString(), sum, "1");
    }

    private Trace.Line line(Trace trace, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
