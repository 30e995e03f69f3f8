package broadside.codes;

import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.panel.Building.Enclosure;
import broadside.panel.FacadePanel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Panels flat on the vertical walls of buildings of rectangular plan, EN 1991-1-4, 7.2.2: pushed by the wind on their
 * face (zone D), pulled by the wind along it from either corner (zones A, B, C) or from behind (zone E).
 * The relief of 7.2.10, more than one skin, is not used.
 */
final class En1991Facade {

    private final Constants constants;
    private final Curve table;
    private final En1991FacadeZones zones;
    private final En1991FacadeWind wind;
    private final Source place;

    En1991Facade(Edition edition) {
        this.constants = new Constants(edition);
        this.table = edition.curve("building-walls");
        this.zones = new En1991FacadeZones(edition);
        this.place = table.at("D-10", table.first()).source();
        this.wind = new En1991FacadeWind(place);
    }

    /** The building, m: width of the face with the panel, depth at right angles to it, height. */
    record Sizes(double width, double depth, double height) { }

    /** What the cases of one panel are worked out from; area in m2, peak pressures in Pa at the building's height and on the windward face. */
    private record Sheet(FacadePanel facade, Site site, Level level, Sizes building, double area, En1991FacadeWind.Pressures wind, Trace trace) {

        boolean skin() {
            return facade.backing() == FacadePanel.Backing.SKIN;
        }

        double panelWidth() {
            return facade.width().metres();
        }
    }

    List<LoadCase> cases(FacadePanel facade, Site site, WindCode code, Trace trace) {
        if (facade.building().enclosure() == Enclosure.OPEN) {
            throw new NotCovered(place.publicationAndEdition(), "7.2.9", "the building is open: its walls do not carry the pressures of a closed building.",
                "Take the panel as a free-standing wall, or ask an engineer.");
        }
        Sizes building = new Sizes(trace.given("B_w", "width of the wall that carries the panel", facade.building().width().metres(), "m", facade.building().width().typed()),
            trace.given("D_w", "depth of the building at right angles to it", facade.building().depth().metres(), "m", facade.building().depth().typed()),
            trace.given("H_w", "height of the building", facade.building().height().metres(), "m", facade.building().height().typed()));
        trace.given("x_c", "distance of the panel from the corner", facade.fromCorner().metres(), "m", facade.fromCorner().typed());
        En1991FacadeWind.Pressures pressures = wind.pressures(facade, building, site, code, trace);
        double b = facade.width().metres();
        double h = facade.height().metres();
        double area = trace.line("panel-area", "A_p", "loaded area: that of the panel").in("b", b, "m").in("h", h, "m").from(place.publicationAndEdition() + ", 7.2.1(1)", place.status())
            .gives("b h", b * h, "m²");
        Sheet sheet = new Sheet(facade, site, code.level(site), building, area, pressures, trace);
        return List.of(pushed(sheet), pulled(sheet));
    }

    private LoadCase pushed(Sheet sheet) {
        double cpe = coefficient("D", acrossRatio(sheet), sheet);
        String symbol = sheet.wind().faceSymbol();
        double face = sheet.wind().onFace();
        double q = sheet.wind().atTop();
        double internal = sheet.skin() ? internal(sheet, "pushed", "c_{pi,min}", "cpi-under", "A-1") : 0;
        double value = sheet.skin() ? face * cpe - q * internal : face * cpe;
        double w = NetPressure.record(sheet.site(), sheet.level(), sheet.trace(), "D", "w_D", (name, of) -> {
            Trace.Line line = sheet.trace().line(name, of, "pressure on the panel, wind on its face" + (sheet.skin() ? ": outside less inside"
                : "; 7.2.10, more than one skin, is not used")).in(symbol, face, "Pa").in("c_D", cpe).from(place.publicationAndEdition() + ", 5.2, 7.2.2", place.status());
            return sheet.skin() ? line.in("q_p", q, "Pa").in("c_{pi,min}", internal) : line;
        }, symbol + " c_D" + (sheet.skin() ? " - q_p c_{pi,min}" : ""), value);
        double c = face == q ? cpe - internal : value / q;
        ZonePressure zone = new ZonePressure("D", "w_D", 0, sheet.panelWidth(), sheet.panelWidth(), c, w);
        return new LoadCase("pushed", "pushed towards the wall, wind on this face", Windward.NONE, List.of(zone), 0, Optional.empty(), 0, 0);
    }

    /** Of the winds along the wall from either corner and from behind, the one with the largest suction counts for the whole panel. */
    private LoadCase pulled(Sheet sheet) {
        List<Strip> wall = zones.ofWall(sheet.building(), sheet.trace());
        double width = sheet.panelWidth();
        List<Strip> near = En1991FacadeZones.ofPanel(wall, sheet.facade().fromCorner().metres(), width);
        List<Strip> far = En1991FacadeZones.turned(En1991FacadeZones.ofPanel(wall, sheet.facade().fromFarCorner(), width), width);
        double internal = sheet.skin() ? internal(sheet, "pulled", "c_{pi,max}", "cpi-over", "D-1") : 0;
        Map<String, ZonePressure> found = new LinkedHashMap<>();
        double along = sheet.trace().line("height-to-depth/along", "h/d", "height of the building over its depth along the wind, wind along the wall")
            .in("H_w", sheet.building().height(), "m").in("B_w", sheet.building().width(), "m").from(place.citation(), place.status())
            .gives("H_w / B_w", sheet.building().height() / sheet.building().width(), "1");
        for (Strip strip : wall) {
            String zone = strip.name();
            if (near.stream().anyMatch(s -> s.name().equals(zone)) || far.stream().anyMatch(s -> s.name().equals(zone))) {
                found.put(zone, suction(zone, along, internal, sheet));
            }
        }
        double behind = sheet.trace().line("height-to-depth/behind", "h/d", "height of the building over its depth along the wind, wind from behind")
            .in("H_w", sheet.building().height(), "m").in("D_w", sheet.building().depth(), "m").from(place.citation(), place.status())
            .gives("H_w / D_w", sheet.building().height() / sheet.building().depth(), "1");
        found.put("E", suction("E", behind, internal, sheet));
        List<Strip> chosen = worst(found, near, far, sheet);
        return new LoadCase("pulled", "pulled off the wall, the worst of the winds along it and from behind", Windward.NONE,
            chosen.stream().map(s -> placed(found.get(s.name()), s)).toList(), 0, Optional.empty(), 0, 0);
    }

    private static ZonePressure placed(ZonePressure zone, Strip part) {
        return new ZonePressure(zone.zone(), zone.symbol(), part.from(), part.to(), part.width(), zone.coefficient(), zone.pressure());
    }

    private List<Strip> worst(Map<String, ZonePressure> found, List<Strip> near, List<Strip> far, Sheet sheet) {
        List<Strip> behind = List.of(new Strip("E", 0, sheet.panelWidth()));
        double fromNear = most(near, found);
        double fromFar = most(far, found);
        double all = Math.min(Math.min(fromNear, fromFar), found.get("E").pressure());
        String which = all == fromNear ? "the wind along the wall from the nearer corner" : all == fromFar ? "the wind along the wall from the farther corner" : "the wind from behind";
        Trace.Line line = sheet.trace().line("governing-suction", "w_s", "largest suction of the winds along the wall from either corner and from behind; " + which
            + " gives it and counts for the whole panel");
        List<String> symbols = new ArrayList<>();
        found.values().forEach(z -> {
            line.in(z.symbol(), z.pressure(), "Pa");
            symbols.add(z.symbol());
        });
        line.from(place.publicationAndEdition() + ", 7.2.2", place.status()).gives("min(" + String.join("; ", symbols) + ")", all, "Pa");
        return all == fromNear ? near : all == fromFar ? far : behind;
    }

    private static double most(List<Strip> parts, Map<String, ZonePressure> found) {
        return parts.stream().mapToDouble(p -> found.get(p.name()).pressure()).min().orElseThrow();
    }

    private ZonePressure suction(String zone, double ratio, double internal, Sheet sheet) {
        double cpe = coefficient(zone, ratio, sheet);
        double q = sheet.wind().atTop();
        String symbol = "w_" + zone;
        double c = cpe - internal;
        double w = NetPressure.record(sheet.site(), sheet.level(), sheet.trace(), zone, symbol, (name, of) -> {
            Trace.Line line = sheet.trace().line(name, of, "pressure on the panel in zone " + zone + (sheet.skin() ? ": outside less inside"
                : "; 7.2.10, more than one skin, is not used")).in("q_p", q, "Pa").in("c_" + zone, cpe).from(place.publicationAndEdition() + ", 5.2, 7.2.2", place.status());
            return sheet.skin() ? line.in("c_{pi,max}", internal) : line;
        }, sheet.skin() ? "q_p (c_" + zone + " - c_{pi,max})" : "q_p c_" + zone, q * c);
        return new ZonePressure(zone, symbol, 0, sheet.panelWidth(), sheet.panelWidth(), c, w);
    }

    private double acrossRatio(Sheet sheet) {
        return sheet.trace().line("height-to-depth", "h/d", "height of the building over its depth along the wind, wind on the face")
            .in("H_w", sheet.building().height(), "m").in("D_w", sheet.building().depth(), "m").from(place.citation(), place.status())
            .gives("H_w / D_w", sheet.building().height() / sheet.building().depth(), "1");
    }

    /** By straight lines in h/d, and between 1 m2 and 10 m2 by the logarithm of the area. */
    private double coefficient(String zone, double ratio, Sheet sheet) {
        double held = Numbers.above(ratio, table.last()) ? ratio : Math.min(ratio, table.last());
        double small = constants.number("cpe-small-area");
        double large = constants.number("cpe-large-area");
        String meaning = "external pressure coefficient of zone " + zone;
        Trace trace = sheet.trace();
        double area = sheet.area();
        boolean least = !Numbers.above(area, small);
        if (least || Numbers.atLeast(area, large)) {
            return table.at(zone + (least ? "-1" : "-10"), held).into(trace.line("coefficient/" + zone, "c_" + zone, meaning + (least
                ? ", area not above " : ", area not below ") + Numbers.plain(least ? small : large) + " m²").in("h/d", ratio).in("A_p", area, "m²"));
        }
        Coefficient one = table.at(zone + "-1", held);
        Coefficient ten = table.at(zone + "-10", held);
        String ofOne = "c_{" + zone + ",1}";
        String ofTen = "c_{" + zone + ",10}";
        double c1 = one.into(trace.line("coefficient-1/" + zone, ofOne, meaning + " for 1 m²").in("h/d", ratio));
        double c10 = ten.into(trace.line("coefficient-10/" + zone, ofTen, meaning + " for 10 m²").in("h/d", ratio));
        Source rule = constants.source("cpe-log-base");
        double base = constants.number("cpe-log-base");
        return trace.line("coefficient/" + zone, "c_" + zone, meaning).in(ofOne, c1).in(ofTen, c10).in("A_p", area, "m²").from(rule.citation(), rule.status())
            .gives(ofOne + " - (" + ofOne + " - " + ofTen + ") ln(A_p) / ln(" + Numbers.plain(base) + ")", c1 - (c1 - c10) * Math.log(area) / Math.log(base), "1");
    }

    /** The internal pressure that adds to a case: of a closed building, or behind a dominant opening in the worst place. */
    private double internal(Sheet sheet, String load, String symbol, String closed, String opening) {
        Trace.Line line = sheet.trace().line("internal-coefficient/" + load, symbol, "internal pressure coefficient that adds most to the case " + load);
        if (sheet.facade().building().enclosure() == Enclosure.ENCLOSED) {
            Coefficient printed = constants.entry(closed);
            return line.from(printed.source().citation(), printed.source().status()).reads("the worse of the two for a closed building", printed.value(), "1");
        }
        Source dominant = constants.source("cpi-dominant");
        double share = constants.entry("cpi-dominant").into(sheet.trace().line("dominant-face-factor", "k_i", "internal over external pressure at a dominant opening"));
        double outside = table.at(opening, table.first()).into(sheet.trace().line("opening-coefficient/" + load, "c_{pe,o}",
            "external pressure coefficient at the opening: the worst of any wall, for 1 m², as the place of the opening is not known"));
        return line.in("k_i", share).in("c_{pe,o}", outside).from(dominant.citation(), dominant.status()).gives("k_i c_{pe,o}", share * outside, "1");
    }
}
