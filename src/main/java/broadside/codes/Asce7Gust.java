package broadside.codes;

import broadside.site.Site;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.OptionalDouble;

/** Gust-effect factor G of a rigid structure, ASCE 7, 26.11: 0.85, a value given, or the formula. */
final class Asce7Gust {

    private final Constants constants;
    private final Rows exposures;

    Asce7Gust(Edition edition) {
        this.constants = new Constants(edition);
        this.exposures = edition.rows("exposure");
    }

    /** G of a panel, m, whose top was recorded as h. */
    double ofPanel(Site site, double width, double height, Trace trace) {
        return factor(site, OptionalDouble.of(width), height, trace);
    }

    /** G of a slender member whose top was recorded as h; by the formula its width counts as nothing, which gives the largest G. */
    double ofMember(Site site, double height, Trace trace) {
        return trace.once("G of a member at " + height + " m", () -> factor(site, OptionalDouble.empty(), height, trace), known -> known);
    }

    private double factor(Site site, OptionalDouble width, double height, Trace trace) {
        if (site.options().word("gust-factor").isPresent()) {
            return computed(site.ground().terrain(), width, height, trace);
        }
        if (site.options().number("gust-factor").isPresent()) {
            return trace.line("gust-factor", "G", "gust-effect factor").from("given", Status.GIVEN)
                .reads("as given", site.options().number("gust-factor").get(), "1");
        }
        return constants.entry("gust-factor").into(trace.line("gust-factor", "G", "gust-effect factor of a rigid structure"));
    }

    /** Turbulence at the equivalent height; lengths in metres. */
    private record Turbulence(double height, double reference, double intensity) { }

    private double computed(String exposure, OptionalDouble width, double height, Trace trace) {
        Turbulence turbulence = turbulence(exposure, height, trace);
        double iz = turbulence.intensity();
        double q = background(exposure, width, height, turbulence, trace);
        Source place = constants.source("gust-constant");
        double a = constants.number("gust-constant");
        double slope = constants.number("gust-slope");
        double g = line(trace, constants.source("gust-peak"), "gust-peak", "g", "peak factor of background response and of wind, both alike")
            .reads("as printed", constants.number("gust-peak"), "1");
        return line(trace, place, "gust-factor", "G", "gust-effect factor of a rigid structure").in("g", g).in("I_z", iz).in("Q", q)
            .gives(Numbers.plain(a) + " (1 + " + Numbers.plain(slope) + " g I_z Q) / (1 + " + Numbers.plain(slope) + " g I_z)",
                a * (1 + slope * g * iz * q) / (1 + slope * g * iz), "1");
    }

    private Turbulence turbulence(String exposure, double height, Trace trace) {
        Source place = constants.source("gust-constant");
        double least = line(trace, table(exposure), "gust-least-height", "z_{min}", "least equivalent height").reads("read at " + exposure,
            exposures.number(exposure, "zmin").value() * Asce7Velocity.foot(), "m");
        double share = constants.number("gust-height-share");
        double z = line(trace, place, "gust-height", "z̄", "equivalent height").in("h", height, "m").in("z_{min}", least, "m")
            .gives("max(" + Numbers.plain(share) + " h; z_{min})", Math.max(share * height, least), "m");
        double reference = line(trace, place, "gust-reference-height", "z_r", "reference height").reads(constants.text("reference-height") + " ft",
            constants.metres("reference-height"), "m");
        double c = exposures.number(exposure, "c").into(trace.line("turbulence-constant", "c", "turbulence at the reference height"));
        double n = constants.number("turbulence-exponent-denominator");
        double iz = line(trace, place, "turbulence-intensity", "I_z", "turbulence intensity at the equivalent height").in("c", c)
            .in("z_r", reference, "m").in("z̄", z, "m")
            .gives("c (z_r / z̄)^(1 / " + Numbers.plain(n) + ")", c * Math.pow(reference / z, 1 / n), "1");
        return new Turbulence(z, reference, iz);
    }

    private double background(String exposure, OptionalDouble width, double height, Turbulence at, Trace trace) {
        Source place = constants.source("gust-constant");
        double l = line(trace, table(exposure), "length-constant", "l", "length scale at the reference height").reads("read at " + exposure,
            exposures.number(exposure, "l").value() * Asce7Velocity.foot(), "m");
        double e = exposures.number(exposure, "epsilon-denominator").value();
        double lz = line(trace, place, "length-scale", "L_z", "length scale of turbulence").in("l", l, "m").in("z̄", at.height(), "m")
            .in("z_r", at.reference(), "m").gives("l (z̄ / z_r)^(1 / " + Numbers.plain(e) + ")", l * Math.pow(at.height() / at.reference(), 1 / e), "m");
        double k = constants.number("gust-background");
        double p = constants.number("gust-exponent");
        Trace.Line line = line(trace, place, "background-response", "Q", "background response").in("h", height, "m").in("L_z", lz, "m");
        width.ifPresent(b -> line.in("B", b, "m"));
        return line.gives("(1 / (1 + " + Numbers.plain(k) + " (" + (width.isPresent() ? "(B + h)" : "h") + " / L_z)^" + Numbers.plain(p) + "))^0.5",
            Math.sqrt(1 / (1 + k * Math.pow((width.orElse(0) + height) / lz, p))), "1");
    }

    private Source table(String exposure) {
        return exposures.number(exposure, "zmin").source();
    }

    private static Trace.Line line(Trace trace, Source place, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
