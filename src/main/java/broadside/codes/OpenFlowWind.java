package broadside.codes;

import broadside.aero.GustProfile;
import broadside.aero.StandardAtmosphere;
import broadside.quantity.Dimension;
import broadside.quantity.Typed;
import broadside.site.Site;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/** Air and wind at the height of the item: a measured gust at 10 m brought there over the ground of the site. */
final class OpenFlowWind {

    private final Constants constants;
    private final StandardAtmosphere atmosphere;
    private final GustProfile profile;

    OpenFlowWind(Edition edition) {
        this.constants = new Constants(edition);
        this.atmosphere = new StandardAtmosphere(constants.number("sea-level-temperature"), constants.number("lapse-rate"),
            constants.number("sea-level-pressure"), constants.number("pressure-exponent"), constants.number("gas-constant"));
        this.profile = new GustProfile(constants.number("peak-factor"), constants.metres("reference-height"));
    }

    /** Air density, kg/m3, gust, m/s, and its dynamic pressure, Pa. */
    record Flow(double density, double speed, double pressure) { }

    /** The wind at a height; what was recorded before on the sheet is taken over. */
    Flow flow(Site site, double height, Trace trace) {
        double density = trace.once("air density", () -> density(site, trace), known -> known);
        double speed = trace.once("gust at " + height + " m", () -> speed(site, height, trace), known -> known);
        double pressure = trace.once("velocity pressure at " + height + " m", () -> trace.line("velocity-pressure", "q", "dynamic pressure of the gust")
            .in("ρ", density, "kg/m³").in("v", speed, "m/s").from("definition of dynamic pressure", Status.DERIVED)
            .gives("½ ρ v²", 0.5 * density * speed * speed, "Pa"), known ->
            trace.line("velocity-pressure", "q", "dynamic pressure at the same height as above").in("q", known, "Pa").from("as above", Status.DERIVED)
                .gives("q", known, "Pa"));
        return new Flow(density, speed, pressure);
    }

    private double density(Site site, Trace trace) {
        if (site.options().si("air-density").isPresent()) {
            return trace.line("air-density", "ρ", "air density").from("given", Status.GIVEN)
                .reads("as given", site.options().si("air-density").get(), "kg/m³");
        }
        if (site.ground().altitude().isEmpty()) {
            return line(trace, "sea-level-density", "air-density", "ρ", "air density; colder air is denser")
                .reads("at sea level and 15 °C, as no altitude is given", constants.number("sea-level-density"), "kg/m³");
        }
        double h = trace.given("h_s", "altitude above the sea", site.ground().altitude().get().metres(), "m", site.ground().altitude().get().typed());
        String t0 = constants.text("sea-level-temperature");
        String lapse = constants.text("lapse-rate");
        double t = line(trace, "lapse-rate", "air-temperature", "T_h", "temperature of the standard atmosphere").in("h_s", h, "m")
            .gives(t0 + " - " + lapse + " h_s", atmosphere.temperatureAt(h), "K");
        double p = line(trace, "pressure-exponent", "air-pressure", "p_h", "pressure of the standard atmosphere").in("T_h", t, "K")
            .gives(constants.text("sea-level-pressure") + " (T_h / " + t0 + ")^" + constants.text("pressure-exponent"),
                atmosphere.pressure() * Math.pow(t / atmosphere.temperature(), atmosphere.exponent()), "Pa");
        return line(trace, "gas-constant", "air-density", "ρ", "air density of the standard atmosphere; colder air is denser").in("p_h", p, "Pa")
            .in("T_h", t, "K").gives("p_h / (" + constants.text("gas-constant") + " T_h)", p / (atmosphere.gas() * t), "kg/m³");
    }

    private double speed(Site site, double height, Trace trace) {
        flatGround(site);
        Source heights = constants.source("greatest-height");
        if (Numbers.above(height, constants.metres("greatest-height"))) {
            throw new NotCovered(heights.publicationAndEdition(), heights.place(), "the profile is worked out up to "
                + constants.text("greatest-height") + " m above the ground.", "Choose a code that covers the height.");
        }
        double gust = trace.given("V", "wind speed, 3 s gust at 10 m over the ground of the site", site.basicSpeed().metresPerSecond(), "m/s",
            site.basicSpeed().typed());
        double z0 = roughness(site, height, trace);
        double z = profileHeight(height, z0, trace);
        String g = constants.text("peak-factor");
        String ten = constants.text("reference-height");
        double turbulence = trace.line("turbulence-intensity", "I_u", "turbulence intensity").in("z", z, "m").in("z_0", z0, "m")
            .from("logarithmic profile of the neutral wind", Status.SECOND_HAND).gives("1 / ln(z / z_0)", profile.turbulence(z, z0), "1");
        line(trace, "peak-factor", "gust-factor", "G", "gust over the mean at the same height").in("I_u", turbulence)
            .gives("1 + " + g + " I_u", 1 + profile.peak() * turbulence, "1");
        line(trace, "peak-factor", "mean-speed", "U", "mean wind in that gust").in("V", gust, "m/s").in("z", z, "m").in("z_0", z0, "m")
            .gives("V ln(z / z_0) / (ln(" + ten + " / z_0) + " + g + ")", gust * profile.meanRatio(z, z0), "m/s");
        double ratio = line(trace, "peak-factor", "height-ratio", "k_z", "gust at the height over the gust at 10 m").in("z", z, "m").in("z_0", z0, "m")
            .gives("(ln(z / z_0) + " + g + ") / (ln(" + ten + " / z_0) + " + g + ")", profile.gustRatio(z, z0), "1");
        return line(trace, "peak-factor", "site-speed", "v", "gust at the height").in("k_z", ratio).in("V", gust, "m/s").gives("k_z V", ratio * gust, "m/s");
    }

    /** Hills speed the wind up, and plain fluid mechanics has no rule for how much. */
    private void flatGround(Site site) {
        if (site.ground().topography().isPresent() || site.ground().shapeUnknown()) {
            throw new NotCovered(constants.source("peak-factor").publicationAndEdition(), "hills", site.ground().shapeUnknown()
                ? "the shape of the ground near by is not known, and there is no rule for hills here." : "there is no rule for hills here.",
                "Choose a code that counts hills, or give the gust measured at the site itself over ground taken as flat.");
        }
    }

    private double roughness(Site site, double height, Trace trace) {
        double typed = Typed.quantity(site.ground().terrain(), Dimension.LENGTH).si();
        double least = constants.metres("least-roughness");
        double greatest = constants.metres("greatest-roughness");
        if (site.ground().unknown().contains(Site.Unknown.TERRAIN) && height > profile.reference()) {
            return line(trace, "greatest-roughness", "roughness-length", "z_0", "roughness length of the ground")
                .reads("not known: above 10 m the roughest ground printed gives the larger gust", greatest, "m");
        }
        if (Numbers.above(least, typed) || Numbers.above(typed, greatest)) {
            Source ends = constants.source(typed < least ? "least-roughness" : "greatest-roughness");
            throw new NotCovered(ends.publicationAndEdition(), ends.place(), "roughness lengths are printed from " + Numbers.plain(least) + " m for the sea to "
                + Numbers.plain(greatest) + " m for suburbs and forest; this one is " + Numbers.plain(typed) + " m.",
                "Give the nearest one of those; up to 10 m above the ground the smaller one gives the larger load.");
        }
        return trace.line("roughness-length", "z_0", "roughness length of the ground").from("given", Status.GIVEN)
            .reads("as given: " + site.ground().terrain(), typed, "m");
    }

    private double profileHeight(double height, double z0, Trace trace) {
        double share = constants.number("least-height-roughness");
        double least = line(trace, "least-height", "least-height", "z_{min}", "lowest height for which the profile is used").in("z_0", z0, "m")
            .gives("max(" + constants.text("least-height") + "; " + Numbers.plain(share) + " z_0)", Math.max(constants.metres("least-height"), share * z0), "m");
        return line(trace, "least-height", "profile-height", "z", "height in the profile").in("z_r", height, "m").in("z_{min}", least, "m")
            .gives("max(z_r; z_{min})", Math.max(height, least), "m");
    }

    private Trace.Line line(Trace trace, String constant, String step, String symbol, String meaning) {
        Source source = constants.source(constant);
        return trace.line(step, symbol, meaning).from(source.citation(), source.status());
    }
}
