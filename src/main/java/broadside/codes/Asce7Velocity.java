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
import java.util.OptionalDouble;

/** Velocity pressure of ASCE 7, chapter 26. */
final class Asce7Velocity {

    /** Where the directionality factor K_d stands. */
    enum Directionality { IN_VELOCITY_PRESSURE, IN_LOAD_EQUATIONS }

    private final Directionality placed;
    private final Constants constants;
    private final Rows numbers;
    private final Rows exposures;
    private final Rows directionality;
    private final Asce7Topography topography;
    private final Asce7Stay stay;
    private final String name;

    Asce7Velocity(Edition edition, Directionality placed) {
        this.placed = placed;
        this.constants = new Constants(edition);
        this.numbers = edition.rows("constants");
        this.exposures = edition.rows("exposure");
        this.directionality = edition.rows("directionality");
        this.topography = new Asce7Topography(edition);
        this.stay = new Asce7Stay(edition);
        this.name = constants.source("kz-factor").publicationAndEdition();
    }

    /** A height above the ground, m, and what is worked out there. */
    record Point(Site site, double height, Asce7Use use) { }

    /** The velocity pressure at a point as it stands in the load equations. */
    Asce7Pressure inLoads(Point point, Trace trace) {
        return inLoads(point.use(), velocity(point, trace), trace);
    }

    /** A velocity pressure that was worked out before, as it stands in the load equations. */
    Asce7Pressure inLoads(Asce7Use use, double q, Trace trace) {
        if (placed == Directionality.IN_VELOCITY_PRESSURE) {
            return new Asce7Pressure(use.pressure(), q, OptionalDouble.empty());
        }
        return new Asce7Pressure(use.pressure(), q, OptionalDouble.of(trace.once("K_d of " + use.structure(), () -> directionality(use, trace), known -> known)));
    }

    private double directionality(Asce7Use use, Trace trace) {
        return directionality.number(use.structure(), "value").into(trace.line("directionality-factor", "K_d", "directionality factor, " + use.words()));
    }

    /** Velocity pressure at a point, Pa, K_d in it where the edition puts it there. */
    double velocity(Point point, Trace trace) {
        if (point.height() > constants.metres("z-limit")) {
            throw new NotCovered(name, constants.source("z-limit").place(), "K_z ends at " + constants.text("z-limit") + " ft.",
                "Ask an engineer for the wind at that height.");
        }
        Site site = point.site();
        Asce7Use use = point.use();
        Asce7Stay.Speed v = stay.speed(site, trace);
        double k = exposureFactor(point, trace);
        double kzt = topographyFactor(point, trace);
        boolean inside = placed == Directionality.IN_VELOCITY_PRESSURE;
        double kd = inside ? directionality(use, trace) : 1;
        double ke = elevationFactor(site, trace);
        Source place = constants.source("velocity-constant");
        double constant = constants.number("velocity-constant") * Unit.of(Dimension.PRESSURE, "psf").orElseThrow().toSi()
            / Math.pow(Unit.of(Dimension.SPEED, "mph").orElseThrow().toSi(), 2);
        double c = trace.line("velocity-constant", "c_q", "constant of the velocity pressure").from(place.citation(), place.status())
            .reads(constants.text("velocity-constant") + " psf/mph² in SI; the SI form prints " + constants.text("velocity-constant-si")
                + ", which is 0.06 % less", constant, "kg/m³");
        Trace.Line line = trace.line("velocity-pressure", use.pressure(), "velocity pressure " + use.where()).in("c_q", c, "kg/m³").in(use.exposure(), k)
            .in("K_{zt}", kzt).in("K_e", ke).in(v.symbol(), v.value(), "m/s").from(place.citation(), place.status());
        if (inside) {
            line.in("K_d", kd);
        }
        return line.gives("c_q " + use.exposure() + " K_{zt} " + (inside ? "K_d " : "") + "K_e " + v.symbol() + "²", c * k * kzt * kd * ke * v.value() * v.value(), "Pa");
    }

    private double exposureFactor(Point point, Trace trace) {
        Asce7Use use = point.use();
        boolean floor = use.cladding() && point.site().ground().terrain().equals("B");
        if (!floor) {
            return byProfile(point, "exposure-factor", use.exposure(), trace);
        }
        double k = byProfile(point, "profile-exposure-factor", use.exposure() + "'", trace);
        double least = constants.entry("cladding-least-kz").into(trace.line("least-exposure-factor", "K_{min}", "least coefficient for components and cladding in exposure B"));
        Source place = constants.source("cladding-least-kz");
        return trace.line("exposure-factor", use.exposure(), "velocity pressure exposure coefficient " + use.where()).in(use.exposure() + "'", k).in("K_{min}", least)
            .from(place.citation(), place.status()).gives("max(" + use.exposure() + "'; K_{min})", Math.max(k, least), "1");
    }

    private double byProfile(Point point, String step, String symbol, Trace trace) {
        String exposure = point.site().ground().terrain();
        Asce7Use use = point.use();
        Source place = constants.source("kz-factor");
        Coefficient alpha = exposures.number(exposure, "alpha");
        double a = alpha.into(trace.line("profile-exponent", "α", "exponent of the profile in exposure " + exposure));
        double zg = trace.line("gradient-height", "z_g", "height of the profile in exposure " + exposure)
            .from(alpha.source().citation(), alpha.source().status())
            .reads("read at " + exposure, exposures.number(exposure, "zg").value() * foot(), "m");
        double least = trace.line("least-height", "z_{min}", "least height of the profile").from(place.citation(), place.status())
            .reads(constants.text("kz-least-height") + " ft", constants.metres("kz-least-height"), "m");
        double z = trace.line("profile-height", "z_p", "height in the profile: at least 15 ft").in(use.height(), point.height(), "m").in("z_{min}", least, "m")
            .from(place.citation(), place.status()).gives("max(" + use.height() + "; z_{min})", Math.max(point.height(), least), "m");
        double factor = constants.number("kz-factor");
        Trace.Line line = trace.line(step, symbol, "velocity pressure exposure coefficient " + use.where() + againstTable()).in("z_p", z, "m").in("z_g", zg, "m").in("α", a)
            .from(place.citation(), place.status());
        return z > zg ? line.reads(constants.text("kz-factor") + ", the same from z_g upward", factor, "1")
            : line.gives(constants.text("kz-factor") + " (z_p / z_g)^(2 / α)", factor * Math.pow(z / zg, 2 / a), "1");
    }

    /** Where the cells of the printed table are not what the printed formula gives, by how much. */
    private String againstTable() {
        return numbers.has("kz-table-difference") ? ", by the formula; the printed table lies within " + constants.text("kz-table-difference") + " % of it" : "";
    }

    private double topographyFactor(Point point, Trace trace) {
        Site site = point.site();
        String exposure = site.ground().terrain();
        if (site.options().number("topographic-factor").isPresent()) {
            return trace.line("topography-factor", "K_{zt}", "topographic factor").from("given", Status.GIVEN)
                .reads("as given", site.options().number("topographic-factor").get(), "1");
        }
        if (site.ground().topography().isPresent()) {
            return topography.factor(site.ground().topography().get(), exposure, new Asce7Topography.Height(point.use().height(), point.height()), trace);
        }
        return site.ground().shapeUnknown() ? topography.worst(exposure, trace) : trace.line("topography-factor", "K_{zt}", "topographic factor")
            .from(name + ", 26.8.2", constants.source("topography-least-slope").status()).reads("1: no hill, ridge or escarpment given", 1, "1");
    }

    private double elevationFactor(Site site, Trace trace) {
        Source place = constants.source("elevation-exponent");
        if (site.options().si("ground-elevation").isEmpty()) {
            Source free = constants.source("elevation-default");
            return trace.line("elevation-factor", "K_e", "ground elevation factor").from(free.citation(), free.status())
                .reads("1, which is permitted at any elevation", constants.number("elevation-default"), "1");
        }
        double z = site.options().si("ground-elevation").get();
        trace.given("z_e", "elevation of the ground above the sea", z, "m", site.options().quantities().get("ground-elevation").typed());
        double exponent = constants.number("elevation-exponent") / foot();
        double perMetre = trace.line("elevation-exponent", "k_e", "exponent of the ground elevation factor").from(place.citation(), place.status())
            .reads("0.0000362 for each foot", exponent, "1/m");
        return trace.line("elevation-factor", "K_e", "ground elevation factor").in("k_e", perMetre, "1/m").in("z_e", z, "m")
            .from(place.citation(), place.status()).gives("exp(-k_e z_e)", Math.exp(-perMetre * z), "1");
    }

    static double foot() {
        return Unit.of(Dimension.LENGTH, "ft").orElseThrow().toSi();
    }
}
