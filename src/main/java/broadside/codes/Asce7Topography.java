package broadside.codes;

import broadside.quantity.Length;
import broadside.site.Topography;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Comparator;
import java.util.Locale;

/**
 * Topographic factor K_zt of ASCE 7, 26.8. The conditions that excuse a site because of other ground around it are
 * not asked for: they are taken as not excusing it, which is safe.
 */
final class Asce7Topography {

    private final Constants constants;
    private final Rows shapes;

    Asce7Topography(Edition edition) {
        this.constants = new Constants(edition);
        this.shapes = edition.rows("topography");
    }

    /** A height above the ground of the site, m, and its symbol. */
    record Height(String symbol, double metres) { }

    /** K_zt at a height. */
    double factor(Topography ground, String exposure, Height z, Trace trace) {
        double h = trace.given("H", "height of the crest above the foot", ground.height().metres(), "m", ground.height().typed());
        double half = halfLength(ground, trace);
        Source place = shapes.number(ground.feature().word(), "gamma").source();
        double slope = trace.line("slope", "H/L_h", "height over half-length").in("H", h, "m").in("L_h", half, "m")
            .from(place.citation(), place.status()).gives("H / L_h", h / half, "1");
        boolean rough = exposure.equals("B");
        double leastHeight = constants.metres(rough ? "topography-least-height-b" : "topography-least-height-cd");
        Source conditions = constants.source("topography-least-slope");
        boolean low = !Numbers.atLeast(h, leastHeight);
        if (low || !Numbers.atLeast(slope, constants.number("topography-least-slope"))) {
            return trace.line("topography-factor", "K_{zt}", "topographic factor").in("H", h, "m").in("H/L_h", slope)
                .from(conditions.citation(), conditions.status())
                .reads(low ? "1, as H is below the least height for this exposure"
                    : "1, as H/L_h is below " + constants.text("topography-least-slope"), 1, "1");
        }
        return multipliers(new Hill(ground, exposure, z, h, half, slope, place), trace);
    }

    private double halfLength(Topography ground, Trace trace) {
        if (ground.halfLength().isPresent()) {
            Length given = ground.halfLength().get();
            return trace.given("L_h", "distance upwind from the crest to half its height", given.metres(), "m", given.typed());
        }
        double whole = trace.given("L_u", "length of the upwind slope, foot to crest", ground.upwindLength().metres(), "m",
            ground.upwindLength().typed());
        return trace.line("half-length", "L_h", "distance upwind from the crest to half its height, for an even slope")
            .in("L_u", whole, "m").from("geometry of an even slope", Status.DERIVED).gives("L_u / 2", whole / 2, "m");
    }

    /**
     * K_zt where the ground near by is not known: the largest that the table can give in this exposure, at the crest of
     * the steepest slope that counts and at the ground.
     */
    double worst(String exposure, Trace trace) {
        String column = column(exposure);
        Coefficient steepest = shapes.keys().stream().map(shape -> shapes.number(shape, column)).max(Comparator.comparingDouble(Coefficient::value)).orElseThrow();
        double k1 = steepest.value() * constants.number("topography-steep");
        Source form = constants.source("topography-exponent");
        return trace.line("topography-factor", "K_{zt}", "topographic factor").from(form.citation(), form.status().weaker(steepest.source().status()))
            .reads("worst value of figure 26.8-1 in exposure " + exposure + ": at the crest and the ground, K_1 = " + Numbers.plain(steepest.value()) + " times "
                + constants.text("topography-steep") + ", as the ground near by is not known", Math.pow(1 + k1, constants.number("topography-exponent")), "1");
    }

    private static String column(String exposure) {
        return "k1-" + exposure.toLowerCase(Locale.ROOT);
    }

    private record Hill(Topography ground, String exposure, Height z, double h, double half, double slope, Source place) { }

    private double multipliers(Hill hill, Trace trace) {
        String shape = hill.ground().feature().word();
        double steepest = constants.number("topography-steep");
        boolean steep = Numbers.above(hill.slope(), steepest);
        double perSlope = shapes.number(shape, column(hill.exposure())).value();
        double k1 = line(hill.place(), trace, "topography-k1", "K_1", "shape of the ground and its greatest speed-up").in("H/L_h", hill.slope())
            .reads(Numbers.plain(perSlope) + " times H/L_h" + (steep ? ", with H/L_h held at " + Numbers.plain(steepest) : ""),
                perSlope * Math.min(hill.slope(), steepest), "1");
        double length = steep
            ? line(hill.place(), trace, "topography-length", "L", "length for K_2 and K_3 of a steep slope").in("H", hill.h(), "m")
                .gives(constants.text("topography-steep-length") + " H", constants.number("topography-steep-length") * hill.h(), "m")
            : line(hill.place(), trace, "topography-length", "L", "length for K_2 and K_3").in("L_h", hill.half(), "m").gives("L_h", hill.half(), "m");
        double typed = hill.ground().distanceFromCrest().metres();
        double x = trace.given("x", "distance from the crest to the site, positive downwind", typed, "m",
            hill.ground().distanceFromCrest().typed());
        double mu = shapes.number(shape, x > 0 ? "mu-downwind" : "mu-upwind")
            .into(trace.line("topography-mu", "μ", "horizontal attenuation, site " + (x > 0 ? "downwind" : "upwind") + " of the crest"));
        Source form = constants.source("topography-exponent");
        double k2 = line(form, trace, "topography-k2", "K_2", "fall with the distance from the crest").in("x", x, "m").in("μ", mu)
            .in("L", length, "m").gives("max(0; 1 - abs(x) / (μ L))", Math.max(0, 1 - Math.abs(x) / (mu * length)), "1");
        double gamma = shapes.number(shape, "gamma").into(trace.line("topography-gamma", "γ", "height attenuation"));
        String z = hill.z().symbol();
        double k3 = line(form, trace, "topography-k3", "K_3", "fall with the height above the ground").in("γ", gamma)
            .in(z, hill.z().metres(), "m").in("L", length, "m").gives("exp(-γ " + z + " / L)", Math.exp(-gamma * hill.z().metres() / length), "1");
        return line(form, trace, "topography-factor", "K_{zt}", "topographic factor").in("K_1", k1).in("K_2", k2).in("K_3", k3)
            .gives("(1 + K_1 K_2 K_3)^" + constants.text("topography-exponent"), Math.pow(1 + k1 * k2 * k3, constants.number("topography-exponent")), "1");
    }

    private static Trace.Line line(Source place, Trace trace, String name, String symbol, String meaning) {
        return trace.line(name, symbol, meaning).from(place.citation(), place.status());
    }
}
