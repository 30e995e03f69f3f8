package broadside.codes;

import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/** Velocity pressure of ASCE 7-16, chapter 26, and the gust-effect factor of a rigid structure. */
final class Asce7Velocity {

    private final Constants constants;
    private final Rows exposures;
    private final Rows directionality;
    private final Asce7Topography topography;
    private final String name;

    Asce7Velocity(Edition edition) {
        this.constants = new Constants(edition);
        this.exposures = edition.rows("exposure");
        this.directionality = edition.rows("directionality");
        this.topography = new Asce7Topography(edition);
        this.name = constants.source("kz-factor").publicationAndEdition();
    }

    /** Velocity pressure q_h at the height h of the top, Pa. */
    double pressure(Site site, double height, Trace trace) {
        if (height > constants.metres("z-limit")) {
            throw new NotCovered(name, constants.source("z-limit").place(), "the table of K_z ends at "
                + constants.text("z-limit") + " ft.", "Ask an engineer for the wind at that height.");
        }
        double v = trace.given("V", "basic wind speed, 3 s gust", site.basicSpeed().metresPerSecond(), "m/s", site.basicSpeed().typed());
        double kh = exposureFactor(site.ground().terrain(), height, trace);
        double kzt = topographyFactor(site, height, trace);
        Coefficient solid = directionality.number("solid signs", "value");
        double kd = solid.into(trace.line("directionality-factor", "K_d", "directionality factor, solid signs and walls"));
        double ke = elevationFactor(site, trace);
        Source place = constants.source("velocity-constant");
        double constant = constants.number("velocity-constant") * Unit.of(Dimension.PRESSURE, "psf").orElseThrow().toSi()
            / Math.pow(Unit.of(Dimension.SPEED, "mph").orElseThrow().toSi(), 2);
        double c = trace.line("velocity-constant", "c_q", "constant of the velocity pressure").from(place.citation(), place.status())
            .reads(constants.text("velocity-constant") + " psf/mph² in SI; the SI form prints " + constants.text("velocity-constant-si")
                + ", which is 0.06 % less", constant, "kg/m³");
        return trace.line("velocity-pressure", "q_h", "velocity pressure at the top").in("c_q", c, "kg/m³").in("K_h", kh)
            .in("K_{zt}", kzt).in("K_d", kd).in("K_e", ke).in("V", v, "m/s").from(place.citation(), place.status())
            .gives("c_q K_h K_{zt} K_d K_e V²", c * kh * kzt * kd * ke * v * v, "Pa");
    }

    private double exposureFactor(String exposure, double height, Trace trace) {
        Source place = constants.source("kz-factor");
        Coefficient alpha = exposures.number(exposure, "alpha");
        double a = alpha.into(trace.line("profile-exponent", "α", "exponent of the profile in exposure " + exposure));
        double zg = trace.line("gradient-height", "z_g", "height of the profile in exposure " + exposure)
            .from(alpha.source().citation(), alpha.source().status())
            .reads("read at " + exposure, exposures.number(exposure, "zg").value() * foot(), "m");
        double least = trace.line("least-height", "z_{min}", "least height of the profile").from(place.citation(), place.status())
            .reads(constants.text("kz-least-height") + " ft", constants.metres("kz-least-height"), "m");
        double z = trace.line("profile-height", "z", "height in the profile: at least 15 ft").in("h", height, "m").in("z_{min}", least, "m")
            .from(place.citation(), place.status()).gives("max(h; z_{min})", Math.max(height, least), "m");
        double factor = constants.number("kz-factor");
        return trace.line("exposure-factor", "K_h", "velocity pressure exposure coefficient at the top").in("z", z, "m").in("z_g", zg, "m")
            .in("α", a).from(place.citation(), place.status())
            .gives(Numbers.plain(factor) + " (z / z_g)^(2 / α)", factor * Math.pow(z / zg, 2 / a), "1");
    }

    private double topographyFactor(Site site, double height, Trace trace) {
        if (site.options().number("topographic-factor").isPresent()) {
            return trace.line("topography-factor", "K_{zt}", "topographic factor").from("given", Status.GIVEN)
                .reads("as given", site.options().number("topographic-factor").get(), "1");
        }
        return site.ground().topography().map(ground -> topography.factor(ground, site.ground().terrain(), height, trace))
            .orElseGet(() -> trace.line("topography-factor", "K_{zt}", "topographic factor").from(name + ", 26.8.2", Status.RECALLED)
                .reads("1: no hill, ridge or escarpment given", 1, "1"));
    }

    private double elevationFactor(Site site, Trace trace) {
        Source place = constants.source("elevation-exponent");
        if (site.options().si("ground-elevation").isEmpty()) {
            return trace.line("elevation-factor", "K_e", "ground elevation factor").from(name + ", 26.9", Status.SECOND_HAND)
                .reads("1, which is permitted at any elevation", 1, "1");
        }
        double z = site.options().si("ground-elevation").get();
        trace.given("z_e", "elevation of the ground above the sea", z, "m", site.options().quantities().get("ground-elevation").typed());
        double exponent = constants.number("elevation-exponent") / foot();
        double perMetre = trace.line("elevation-exponent", "k_e", "exponent of the ground elevation factor").from(place.citation(), place.status())
            .reads("0.0000362 for each foot", exponent, "1/m");
        return trace.line("elevation-factor", "K_e", "ground elevation factor").in("k_e", perMetre, "1/m").in("z_e", z, "m")
            .from(place.citation(), place.status()).gives("exp(-k_e z_e)", Math.exp(-perMetre * z), "1");
    }

    /** Gust-effect factor G of a rigid structure: 0.85, a value given, or the formula. */
    double gustFactor(Site site, double width, double height, Trace trace) {
        if (site.options().word("gust-factor").isPresent()) {
            return computedGustFactor(site.ground().terrain(), width, height, trace);
        }
        if (site.options().number("gust-factor").isPresent()) {
            return trace.line("gust-factor", "G", "gust-effect factor").from("given", Status.GIVEN)
                .reads("as given", site.options().number("gust-factor").get(), "1");
        }
        return constants.entry("gust-factor").into(trace.line("gust-factor", "G", "gust-effect factor of a rigid structure"));
    }

    private double computedGustFactor(String exposure, double width, double height, Trace trace) {
        Source place = constants.source("gust-constant");
        double foot = foot();
        Source table = exposures.number(exposure, "zmin").source();
        double least = line(trace, table, "gust-least-height", "z_{min}", "least equivalent height").reads("read at " + exposure,
            exposures.number(exposure, "zmin").value() * foot, "m");
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
        double l = line(trace, table, "length-constant", "l", "length scale at the reference height").reads("read at " + exposure,
            exposures.number(exposure, "l").value() * foot, "m");
        double e = exposures.number(exposure, "epsilon-denominator").value();
        double lz = line(trace, place, "length-scale", "L_z", "length scale of turbulence").in("l", l, "m").in("z̄", z, "m")
            .in("z_r", reference, "m").gives("l (z̄ / z_r)^(1 / " + Numbers.plain(e) + ")", l * Math.pow(z / reference, 1 / e), "m");
        double k = constants.number("gust-background");
        double p = constants.number("gust-exponent");
        double q = line(trace, place, "background-response", "Q", "background response").in("B", width, "m").in("h", height, "m")
            .in("L_z", lz, "m").gives("(1 / (1 + " + Numbers.plain(k) + " ((B + h) / L_z)^" + Numbers.plain(p) + "))^0.5",
                Math.sqrt(1 / (1 + k * Math.pow((width + height) / lz, p))), "1");
        double a = constants.number("gust-constant");
        double slope = constants.number("gust-slope");
        double g = line(trace, constants.source("gust-peak"), "gust-peak", "g", "peak factor of background response and of wind, both alike")
            .reads("as printed", constants.number("gust-peak"), "1");
        return line(trace, place, "gust-factor", "G", "gust-effect factor of a rigid structure").in("g", g).in("I_z", iz).in("Q", q)
            .gives(Numbers.plain(a) + " (1 + " + Numbers.plain(slope) + " g I_z Q) / (1 + " + Numbers.plain(slope) + " g I_z)",
                a * (1 + slope * g * iz * q) / (1 + slope * g * iz), "1");
    }

    private static Trace.Line line(Trace trace, Source place, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }

    private static double foot() {
        return Unit.of(Dimension.LENGTH, "ft").orElseThrow().toSi();
    }
}
