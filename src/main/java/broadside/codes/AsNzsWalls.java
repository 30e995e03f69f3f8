package broadside.codes;

import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.panel.Building.Enclosure;
import broadside.panel.FacadePanel.Backing;
import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.stream.Stream;

/**
 * Panels flat on the walls of a building, AS/NZS 1170.2 section 5. The wind comes on the face, from behind it, and along
 * it from either corner; at each place of the panel the worst of the three suctions counts. All pressures stand on the
 * speed at the top of the building, which is safe for windward walls higher than 25 m. The local factor goes by the area
 * of the whole panel.
 */
final class AsNzsWalls {

    /** Places that are nearer to each other differ by binary rounding only, m. */
    private static final double ROUNDING = 1e-9;

    private static final String PUSHED = "pushed";
    private static final String PULLED = "pulled";
    private static final String LEEWARD = "leeward";

    private final Constants constants;
    private final Curve leeward;
    private final Rows sides;
    private final Rows local;
    private final Curve areaFactors;
    private final Rows internal;
    private final String shape;

    AsNzsWalls(Edition edition) {
        this.constants = new Constants(edition);
        this.leeward = edition.curve("leeward-walls");
        this.sides = edition.rows("side-walls");
        this.local = edition.rows("local-factors");
        this.areaFactors = edition.curve("area-factors");
        this.internal = edition.rows("internal-pressures");
        this.shape = edition.property("shape-factor");
    }

    /** The panel on its building: height h, pressure at it, length a of the local zones, what is recorded already. */
    private record Sheet(FacadePanel facade, Site site, WindCode code, double h, double q, double dynamic, double combination, double a, double area, Trace trace) {

        double face() {
            return facade.building().width().metres();
        }

        double depth() {
            return facade.building().depth().metres();
        }
    }

    /** A stretch of the face between two distances from the nearer corner, with its coefficients; the local zone is empty where there is none. */
    private record Zone(String name, double from, double to, Coefficient external, String localZone, double areaFactor, double localFactor) {

        double suction() {
            return external.value() * areaFactor * localFactor;
        }

        Zone between(double start, double end) {
            return new Zone(name, start, end, external, localZone, areaFactor, localFactor);
        }

        Zone fromFarCorner(double face) {
            return between(face - to, face - from);
        }
    }

    List<LoadCase> cases(FacadePanel facade, Site site, WindCode code, Trace trace) {
        refuse(facade);
        Sheet sheet = sheet(facade, site, code, trace);
        return List.of(loadCase(sheet, PUSHED, "pushed towards the wall, wind on the face", List.of(windward(sheet))),
            loadCase(sheet, PULLED, "pulled off the wall, wind along the face or from behind", suctions(sheet)));
    }

    private Sheet sheet(FacadePanel facade, Site site, WindCode code, Trace trace) {
        Source walls = constants.source("windward-low");
        Source place = constants.source("local-length");
        double height = trace.given("h_b", "height of the building", facade.building().height().metres(), "m", facade.building().height().typed());
        double face = trace.given("b_f", "width of the face that carries the panel", facade.building().width().metres(), "m", facade.building().width().typed());
        double depth = trace.given("d_f", "depth of the building behind that face", facade.building().depth().metres(), "m", facade.building().depth().typed());
        double h = line(trace, walls, "reference-height", "h", "height at which the speed is taken: the top of the building").in("h_b", height, "m").gives("h_b", height, "m");
        double q = code.velocityPressure(site, h, trace);
        double dynamic = AsNzsHoardings.dynamic(constants, trace);
        double share = constants.number("local-length");
        double a = line(trace, place, "local-length", "a", "length of the local zones").in("b_f", face, "m").in("d_f", depth, "m").in("h", h, "m")
            .gives("min(" + Numbers.plain(share) + " b_f; " + Numbers.plain(share) + " d_f; h)", Math.min(Math.min(share * face, share * depth), h), "m");
        Panel panel = facade.panels().get(0);
        double area = line(trace, place, "panel-area", "A", "area of the panel, by which area and local factors go").in("b", panel.width(), "m").in("c", panel.height(), "m")
            .gives("b c", panel.area(), "m²");
        double kc = trace.line("combination-factor", "K_c", "combination factor").from(place.publicationAndEdition() + ", section 5", place.status())
            .reads("1: nothing is taken off for surfaces that act together, which is safe", 1, "1");
        return new Sheet(facade, site, code, h, q, dynamic, kc, a, area, trace);
    }

    private void refuse(FacadePanel facade) {
        if (facade.backing() == Backing.SKIN && facade.building().enclosure() == Enclosure.OPEN) {
            Source inside = constants.source("dominant-opening");
            throw new NotCovered(inside.publicationAndEdition(), inside.place(), "no internal pressure of an open building is known here.",
                "Ask an engineer for it, or choose a code that covers it.");
        }
    }

    /** The leeward wall by the depth of the building; for a roof whose coefficients are not known the largest suction of any wall. */
    private Coefficient behind(Sheet sheet) {
        double degrees = sheet.facade().building().roofSlope().map(s -> Math.toDegrees(s.radians())).orElse(0.0);
        if (!Numbers.atLeast(degrees, constants.number("leeward-roof-slope"))) {
            return leeward.at("value", sheet.depth() / sheet.face());
        }
        Coefficient worst = sides.number(sides.keys().get(0), "value");
        return new Coefficient(worst.value(), "1", worst.source(), "the coefficient below a roof of " + constants.text("leeward-roof-slope")
            + " degrees or more is not known here: the largest suction of a side wall is taken in its place");
    }

    private boolean isLow(Sheet sheet) {
        return !Numbers.above(sheet.h(), constants.number("low-building"));
    }

    private Zone windward(Sheet sheet) {
        Coefficient external = external(sheet);
        Optional<String> zone = local.keys().stream().filter(k -> local.text(k, "wall").equals("windward") && small(sheet, k)).findFirst();
        return new Zone(zone.orElse("windward"), 0, sheet.face(), external, zone.orElse(""), 1, zone.map(z -> local.number(z, "value").value()).orElse(1.0));
    }

    private Coefficient external(Sheet sheet) {
        Coefficient found = constants.entry(isLow(sheet) ? "windward-low" : "windward-high");
        String limit = constants.text("low-building") + " m";
        return new Coefficient(found.value(), "1", found.source(), isLow(sheet) ? "windward wall with the speed at h, as h is not above " + limit
            : "windward wall, as h is above " + limit + "; the speed is taken at h, which is safe");
    }

    /** Whether the panel is small enough for a local factor. */
    private boolean small(Sheet sheet, String zone) {
        return !Numbers.above(sheet.area() / (sheet.a() * sheet.a()), local.number(zone, "area").value());
    }

    /** The worst suction at each place of the panel: wind along the face from either corner, or from behind. */
    private List<Zone> suctions(Sheet sheet) {
        List<Zone> all = new ArrayList<>(List.of(new Zone(LEEWARD, 0, sheet.face(), behind(sheet), "", 1, 1)));
        List<Zone> near = sideZones(sheet);
        all.addAll(near);
        near.forEach(z -> all.add(z.fromFarCorner(sheet.face())));
        double start = sheet.facade().fromCorner().metres();
        double end = start + sheet.facade().width().metres();
        TreeSet<Double> cuts = new TreeSet<>(List.of(end));
        all.stream().flatMap(z -> Stream.of(z.from(), z.to())).filter(x -> x > start + ROUNDING && x < end - ROUNDING).forEach(cuts::add);
        List<Zone> found = new ArrayList<>();
        double from = start;
        for (double to : cuts) {
            if (to - from < ROUNDING) {
                continue;
            }
            double middle = (from + to) / 2;
            Zone worst = all.stream().filter(z -> z.from() <= middle && z.to() >= middle).reduce((x, y) -> y.suction() < x.suction() ? y : x).orElseThrow();
            int last = found.size() - 1;
            if (last >= 0 && found.get(last).name().equals(worst.name())) {
                found.set(last, worst.between(found.get(last).from(), to));
            } else {
                found.add(worst.between(from, to));
            }
            from = to;
        }
        return found;
    }

    /** The zones of a side wall from the windward corner over the whole face: distances by the height, and local zones by a. */
    private List<Zone> sideZones(Sheet sheet) {
        List<String> names = sides.keys();
        List<Double> limits = names.stream().map(z -> sides.isPrinted(z, "to") ? sides.number(z, "to").value() * sheet.h() : Double.POSITIVE_INFINITY).toList();
        double ka = areaFactors.at("value", sheet.area()).value();
        List<Zone> found = new ArrayList<>();
        for (Strip strip : Strip.cut(sheet.face(), names, limits)) {
            Coefficient external = sides.number(strip.name(), "value");
            double from = strip.from();
            for (String zone : localOfSides(sheet)) {
                double end = local.isPrinted(zone, "within") ? Math.min(strip.to(), local.number(zone, "within").value() * sheet.a()) : strip.to();
                if (end > from + ROUNDING) {
                    String name = zone + strip.name().substring(names.get(0).length());
                    found.add(new Zone(name, from, end, external, zone, ka, local.number(zone, "value").value()));
                    from = end;
                }
            }
            if (strip.to() > from + ROUNDING) {
                found.add(new Zone(strip.name(), from, strip.to(), external, "", ka, 1));
            }
        }
        return found;
    }

    /** The local zones of side walls that count for a panel of this size on a building of this height, from the corner. */
    private List<String> localOfSides(Sheet sheet) {
        return local.keys().stream().filter(k -> local.text(k, "wall").equals("side") && local.text(k, "building").equals(isLow(sheet) ? "low" : "high") && small(sheet, k)).toList();
    }

    private LoadCase loadCase(Sheet sheet, String name, String label, List<Zone> zones) {
        double inside = sheet.facade().backing() == Backing.SKIN ? internal(sheet, name) : 0;
        double start = sheet.facade().fromCorner().metres();
        double width = sheet.facade().width().metres();
        List<ZonePressure> found = new ArrayList<>();
        for (Zone zone : zones) {
            double from = Math.max(0, zone.from() - start);
            double to = Math.min(width, zone.to() - start);
            Optional<ZonePressure> before = found.stream().filter(z -> z.zone().equals(zone.name())).findFirst();
            found.add(before.map(z -> new ZonePressure(z.zone(), z.symbol(), from, to, to - from, z.coefficient(), z.pressure()))
                .orElseGet(() -> pressure(sheet, zone, name, inside, from, to)));
        }
        return new LoadCase(name, label, Windward.NONE, found, 0, Optional.empty(), 0, 0);
    }

    /** The pressure inside that makes the case worse: suction for a panel that is pushed, overpressure for one that is pulled. */
    private double internal(Sheet sheet, String name) {
        boolean pushed = name.equals(PUSHED);
        Trace.Line line = sheet.trace().line("internal-coefficient/" + name, symbol(name), "internal pressure coefficient for a panel that is " + name);
        if (sheet.facade().building().enclosure() == Enclosure.ENCLOSED) {
            return internal.number("enclosed", pushed ? "least" : "largest").into(line);
        }
        Coefficient opening = constants.entry("dominant-opening");
        Coefficient outside = pushed ? sides.number(sides.keys().get(0), "value") : external(sheet);
        return line.from(opening.source().citation(), opening.source().status()).reads(opening.value() + " times the coefficient of the wall in which a dominant opening is worst, "
            + outside.value(), opening.value() * outside.value(), "1");
    }

    private static String symbol(String name) {
        return "C_{pi," + name + "}";
    }

    private ZonePressure pressure(Sheet sheet, Zone zone, String name, double inside, double from, double to) {
        Trace trace = sheet.trace();
        boolean skin = sheet.facade().backing() == Backing.SKIN;
        String z = zone.name();
        Source place = zone.external().source();
        double cpe = zone.external().into(trace.line("external-coefficient/" + z, "C_{pe," + z + "}", "external pressure coefficient of zone " + z));
        boolean side = name.equals(PULLED) && !z.equals(LEEWARD);
        double ka = side ? areaFactors.at("value", sheet.area()).into(trace.line("area-factor/" + z, "K_{a," + z + "}", "area reduction factor of zone " + z).in("A", sheet.area(), "m²"))
            : line(trace, place, "area-factor/" + z, "K_{a," + z + "}", "area reduction factor of zone " + z).reads("1: it is for side walls only", 1, "1");
        double kl = localFactor(sheet, zone);
        String symbol = "C_{" + shape + "," + z + "}";
        Trace.Line line = line(trace, place, "coefficient/" + z, symbol, "aerodynamic shape factor of zone " + z + (skin ? ", external less internal" : ", external")).in("C_{pe," + z + "}", cpe)
            .in("K_{a," + z + "}", ka).in("K_c", sheet.combination()).in("K_{l," + z + "}", kl);
        String formula = "C_{pe," + z + "} K_{a," + z + "} K_c K_{l," + z + "}";
        double outer = cpe * ka * sheet.combination() * kl;
        double c = skin ? line.in(symbol(name), inside).gives(formula + " - " + symbol(name) + " K_c", outer - inside * sheet.combination(), "1")
            : line.gives(formula, outer, "1");
        double p = NetPressure.record(sheet.site(), sheet.code().level(sheet.site()), trace, z, "p_{" + z + "}", (step, own) ->
            line(trace, place, step, own, "net pressure of zone " + z).in("q", sheet.q(), "Pa").in(symbol, c).in("C_{dyn}", sheet.dynamic()),
            "q " + symbol + " C_{dyn}", sheet.q() * c * sheet.dynamic());
        return new ZonePressure(z, "p_{" + z + "}", from, to, to - from, c, p);
    }

    private double localFactor(Sheet sheet, Zone zone) {
        String meaning = "local pressure factor of zone " + zone.name() + ", for cladding and its fixings";
        Trace.Line line = sheet.trace().line("local-factor/" + zone.name(), "K_{l," + zone.name() + "}", meaning);
        if (zone.localZone().isEmpty()) {
            Source place = local.number(local.keys().get(0), "value").source();
            return line.from(place.citation(), place.status()).reads("1: no local zone for a panel of this size here; a fixing that carries a smaller area may have one", 1, "1");
        }
        Coefficient found = local.number(zone.localZone(), "value");
        return line.in("A", sheet.area(), "m²").in("a", sheet.a(), "m").from(found.source().citation(), found.source().status())
            .reads("read at " + zone.localZone() + ", as A is not above " + local.text(zone.localZone(), "area") + " a²", found.value(), "1");
    }

    private static Trace.Line line(Trace trace, Source place, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
