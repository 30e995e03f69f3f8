package broadside.codes;

import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/** Design wind pressure of IS 875 (Part 3), 7.2: the factors for direction, area and combination, and the least pressure. */
final class Is875Pressure {

    private final Constants constants;
    private final Rows directionality;
    private final Curve area;
    private final Source place;

    Is875Pressure(Edition edition) {
        this.constants = new Constants(edition);
        this.directionality = edition.rows("directionality");
        this.area = edition.curve("area-averaging");
        this.place = constants.source("least-design-pressure");
    }

    /** Design wind pressure p_d on a free-standing panel, Pa. */
    double ofSign(Panel panel, double pz, Site site, Trace trace) {
        double kd = directionality("solid signs", site, trace);
        double ka = panel.kind() == Panel.Kind.BOARD ? ofBoard(panel, trace)
            : shared("1: the posts share the wall, and the area that one of them carries is not known here; safe", trace);
        return design(new Named("design-pressure", "p_d", "design wind pressure", "K_d"), kd, ka, pz, trace);
    }

    /** Design wind pressures on a panel on a building, Pa: for the wall, and for the strip with the local coefficient. */
    record OnWall(double general, double local) { }

    OnWall onWall(double pz, Site site, Trace trace) {
        double kd = directionality("buildings", site, trace);
        Coefficient printed = directionality.number("local pressure coefficients", "value");
        double local = printed.into(trace.line("directionality-factor/local", "K_{d,l}", "directionality factor together with a local pressure coefficient"));
        double ka = shared("1: fixings share the panel, and the area that one of them carries is not known here; safe", trace);
        return new OnWall(design(new Named("design-pressure", "p_d", "design wind pressure on the wall", "K_d"), kd, ka, pz, trace),
            design(new Named("design-pressure/local", "p_{d,l}", "design wind pressure for the local coefficient", "K_{d,l}"), local, ka, pz, trace));
    }

    /** Pressure on which the force coefficient of a slender member is put, Pa: without the area factor, and with K_d of circular forms, which is safe for others. */
    double ofMember(double pz, Site site, Trace trace) {
        double kd = directionality("circular forms", site, trace);
        double least = constants.number("least-design-pressure");
        return trace.line("member-pressure", "q_m", "pressure for members and edges: the design wind pressure without the area factor").in("K_d", kd)
            .in("p_z", pz, "Pa").from(place.citation(), place.status())
            .gives("max(K_d p_z; " + Numbers.plain(least) + " p_z)", Math.max(kd * pz, least * pz), "Pa");
    }

    /** 1.0 where the site has a cyclone factor, also one of 1.00, which only a cyclone-affected region has. */
    private double directionality(String structure, Site site, Trace trace) {
        return trace.once("directionality factor, " + structure, () -> {
            Trace.Line line = trace.line("directionality-factor", "K_d", "directionality factor");
            if (site.options().number("directionality").isPresent()) {
                return line.from("given", Status.GIVEN).reads("as given", site.options().number("directionality").get(), "1");
            }
            boolean cyclone = site.options().number("k4").isPresent() || trace.overridesUsed().stream().anyMatch(o -> o.name().startsWith("cyclone-factor"));
            return directionality.number(cyclone ? "cyclone-affected regions" : structure, "value").into(line);
        }, known -> known);
    }

    private double ofBoard(Panel panel, Trace trace) {
        double a = trace.line("tributary-area", "A", "tributary area: the board, or what one of its posts carries of it").in("b", panel.width(), "m")
            .in("h", panel.height(), "m").in("n", trace.given("n", "number of supports that share the board", panel.sharers(), "1", "")).from(place.publicationAndEdition() + ", 7.2.2.1", Status.DERIVED).gives("b h / n", panel.area() / panel.sharers(), "m²");
        return area.at("K_a", a).into(trace.line("area-factor", "K_a", "area averaging factor").in("A", a, "m²"));
    }

    private double shared(String why, Trace trace) {
        Coefficient small = area.at("K_a", area.first());
        return trace.line("area-factor", "K_a", "area averaging factor").from(small.source().citation(), small.source().status()).reads(why, small.value(), "1");
    }

    /** How a design pressure is recorded, and the symbol of the directionality factor in it. */
    private record Named(String step, String symbol, String meaning, String directionality) { }

    private double design(Named named, double kd, double ka, double pz, Trace trace) {
        Source combination = constants.source("combination-factor");
        double kc = trace.once("combination factor", () -> trace.line("combination-factor", "K_c", "combination factor")
            .from(combination.citation(), combination.status())
            .reads("1, as the reduction is for frames of clad buildings only", constants.number("combination-factor"), "1"), known -> known);
        double least = constants.number("least-design-pressure");
        return trace.line(named.step(), named.symbol(), named.meaning() + ", not below " + Numbers.plain(least) + " p_z").in(named.directionality(), kd).in("K_a", ka)
            .in("K_c", kc).in("p_z", pz, "Pa").from(place.citation(), place.status())
            .gives("max(" + named.directionality() + " K_a K_c p_z; " + Numbers.plain(least) + " p_z)", Math.max(kd * ka * kc * pz, least * pz), "Pa");
    }
}
