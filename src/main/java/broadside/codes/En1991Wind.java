package broadside.codes;

import broadside.quantity.Period;
import broadside.quantity.Speed;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;

/** Mean wind, turbulence and peak velocity pressure of EN 1991-1-4, chapter 4. */
final class En1991Wind {

    private final Constants constants;
    private final Rows terrain;
    private final En1991Orography orography;
    private final En1991WindZones zones;
    private final En1991Speed speed;
    private final String name;

    En1991Wind(Edition edition) {
        this.constants = new Constants(edition);
        this.terrain = edition.rows("terrain");
        this.orography = new En1991Orography(edition);
        this.zones = new En1991WindZones(edition);
        this.speed = new En1991Speed(edition, zones);
        this.name = constants.source("peak-constant").publicationAndEdition();
    }

    /** The basic speed of a wind zone; values of the site that do not fit the tables are refused. */
    Optional<Speed> basicSpeed(SiteOptions options, Optional<Period> returnPeriod) {
        speed.check(options);
        return zones.speed(options, returnPeriod);
    }

    /** Peak velocity pressure q_p at a height above the ground, Pa. */
    double peakPressure(Site site, double height, Trace trace) {
        if (height > constants.metres("height-limit")) {
            throw new NotCovered(name, constants.source("height-limit").place(), "the mean wind profile ends at "
                + constants.text("height-limit") + " m.", "Ask an engineer for the wind at that height.");
        }
        if (zones.isSimplified(site)) {
            return zones.pressure(site, height, trace);
        }
        double vb = speed.basic(site, height, trace);
        double rho = density(site, trace);
        Profile profile = profile(site, height, vb, trace);
        double vm = profile.meanSpeed();
        double iv = profile.turbulence();
        double qb = line(trace, "basic-velocity-pressure", "q_b", "basic velocity pressure", "peak-constant", "4.5(1), (4.10)")
            .in("ρ", rho, "kg/m³").in("v_b", vb, "m/s").gives("½ ρ v_b²", 0.5 * rho * vb * vb, "Pa");
        double peak = constants.number("peak-constant");
        double qp = line(trace, "velocity-pressure", "q_p", "peak velocity pressure at the reference height", "peak-constant", null)
            .in("I_v", iv).in("ρ", rho, "kg/m³").in("v_m", vm, "m/s")
            .gives("(1 + " + constants.text("peak-constant") + " I_v) ½ ρ v_m²", (1 + peak * iv) * 0.5 * rho * vm * vm, "Pa");
        line(trace, "exposure-factor", "c_e", "exposure factor", "peak-constant", "4.5(1), (4.9)")
            .in("q_p", qp, "Pa").in("q_b", qb, "Pa").gives("q_p / q_b", qp / qb, "1");
        return qp;
    }

    private double density(Site site, Trace trace) {
        Trace.Line line = trace.line("air-density", "ρ", "air density");
        return site.options().si("air-density")
            .map(typed -> line.from("given", Status.GIVEN).reads("as given", typed, "kg/m³"))
            .orElseGet(() -> line.from(constants.source("air-density").citation(), constants.source("air-density").status())
                .reads(constants.source("air-density").citation().startsWith(name) ? "recommended value" : "national value", constants.number("air-density"), "kg/m³"));
    }

    /** Mean speed, m/s, and turbulence intensity at a height. */
    private record Profile(double meanSpeed, double turbulence) { }

    private Profile profile(Site site, double height, double vb, Trace trace) {
        String category = site.ground().terrain();
        Source printed = terrain.number(category, "z0").source();
        double z0 = trace.line("roughness-length", "z_0", "roughness length of terrain category " + category)
            .from(printed.citation(), printed.status()).reads("read at category " + category, terrain.number(category, "z0").value(), "m");
        double least = trace.line("least-height", "z_{min}", "least height of the profile in category " + category)
            .from(printed.citation(), printed.status()).reads("read at category " + category, terrain.number(category, "zmin").value(), "m");
        double z = trace.line("profile-height", "z", "height in the profile: at least the least height of the category")
            .in("z_e", height, "m").in("z_{min}", least, "m").from(printed.citation(), printed.status())
            .gives("max(z_e; z_{min})", Math.max(height, least), "m");
        double c = constants.number("terrain-factor-constant");
        double power = constants.number("terrain-factor-exponent");
        double z02 = constants.number("roughness-of-category-ii");
        double kr = line(trace, "terrain-factor", "k_r", "terrain factor", "terrain-factor-constant", null).in("z_0", z0, "m")
            .gives(Numbers.plain(c) + " (z_0 / " + Numbers.plain(z02) + ")^" + Numbers.plain(power), c * Math.pow(z0 / z02, power), "1");
        double cr = line(trace, "roughness-factor", "c_r", "roughness factor", "terrain-factor-constant", "4.3.2(1), (4.4)")
            .in("k_r", kr).in("z", z, "m").in("z_0", z0, "m").gives("k_r ln(z / z_0)", kr * Math.log(z / z0), "1");
        double co = orographyFactor(site, height, trace);
        double vm = line(trace, "mean-speed", "v_m", "mean wind velocity", "terrain-factor-constant", "4.3.1(1), (4.3)")
            .in("c_r", cr).in("c_o", co).in("v_b", vb, "m/s").gives("c_r c_o v_b", cr * co * vb, "m/s");
        double ki = constants.entry("turbulence-factor").into(trace.line("turbulence-factor", "k_I", "turbulence factor"));
        double iv = line(trace, "turbulence-intensity", "I_v", "turbulence intensity", "turbulence-factor", null)
            .in("k_I", ki).in("c_o", co).in("z", z, "m").in("z_0", z0, "m")
            .gives("k_I / (c_o ln(z / z_0))", ki / (co * Math.log(z / z0)), "1");
        return new Profile(vm, iv);
    }

    private double orographyFactor(Site site, double height, Trace trace) {
        if (site.ground().shapeUnknown()) {
            return orography.worst(trace);
        }
        return site.ground().topography().map(ground -> orography.factor(ground, height, trace))
            .orElseGet(() -> trace.line("topography-factor", "c_o", "orography factor").from(name + ", 4.3.3", Status.RECALLED)
                .reads("1: no hill, ridge or escarpment given", 1, "1"));
    }

    /** A step from the place of a constant, or from another clause that is known as well as that constant is. */
    private Trace.Line line(Trace trace, String step, String symbol, String meaning, String constant, String otherPlace) {
        Source source = constants.source(constant);
        String place = otherPlace == null ? source.place() : otherPlace;
        return trace.line(step, symbol, meaning).from(name + ", " + place, source.status());
    }
}
