package broadside.codes;

import broadside.aero.Strip;
import broadside.codes.En1991Shelter.Part;
import broadside.codes.LoadCase.Windward;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Free-standing walls of EN 1991-1-4, 7.4.1: zones A to D from the windward end, table 7.9, with the shelter of 7.4.2. */
final class En1991Walls {

    private final Constants constants;
    private final Curve free;
    private final Rows withReturns;
    private final Rows open;
    private final Rows zones;
    private final En1991Shelter shelter;

    En1991Walls(Edition edition) {
        this.constants = new Constants(edition);
        this.free = edition.curve("free-standing-walls");
        this.withReturns = edition.rows("free-standing-walls-with-returns");
        this.open = edition.rows("free-standing-walls-open");
        this.zones = edition.rows("wall-zones");
        this.shelter = new En1991Shelter(constants);
    }

    /** The case "wall", once for each end as the windward one. Ends that are alike are worked out once. */
    List<LoadCase> cases(Panel panel, Site site, WindCode code, Trace trace) {
        Source place = constants.source("wall-return-full");
        double ze = trace.line("reference-height", "z_e", "reference height: the top of the wall")
            .in("z_g", panel.clearance(), "m").in("h", panel.height(), "m")
            .from(place.publicationAndEdition() + ", 7.4.1(2)", constants.source("wall-solidity-limit").status())
            .gives("z_g + h", panel.top(), "m");
        double qp = code.velocityPressure(site, ze, trace);
        double length = trace.line("wall-length", "l", "length of the wall between its ends").in("b", panel.width(), "m")
            .from(place.citation(), place.status()).gives("b", panel.width(), "m");
        double slenderness = trace.line("length-to-height", "l/h", "length of the wall over its height")
            .in("l", length, "m").in("h", panel.height(), "m").from(place.citation(), place.status())
            .gives("l / h", length / panel.height(), "1");
        double factor = shelter.factor(panel, trace);
        LoadCase left = fromLeft(new Sheet(panel, site, code, qp, slenderness, factor, panel.returnLeft(), trace, ""));
        LoadCase right = (panel.endsAlike() ? left
            : fromLeft(new Sheet(panel, site, code, qp, slenderness, factor, panel.returnRight(), trace, "/right-end")))
            .mirrored(panel.width());
        return List.of(left, right);
    }

    /** What the zones of one windward end are worked out from. */
    private record Sheet(Panel panel, Site site, WindCode code, double qp, double slenderness, double shelter, double returnLength,
                         Trace trace, String end) { }

    private LoadCase fromLeft(Sheet sheet) {
        List<String> names = zones.keys();
        double h = sheet.panel().height();
        List<Double> limits = names.stream()
            .map(z -> zones.isPrinted(z, "to") ? zones.number(z, "to").value() * h : Double.POSITIVE_INFINITY).toList();
        List<ZonePressure> pressures = new ArrayList<>();
        Map<String, Double> coefficients = new HashMap<>();
        for (Part part : shelter.cut(sheet.panel(), Strip.cut(sheet.panel().width(), names, limits))) {
            pressures.add(pressure(sheet, part, coefficients));
        }
        return new LoadCase("wall", "free-standing wall, zones from the windward end", Windward.LEFT, pressures, 0, Optional.empty(), 0, 0);
    }

    /** Width, coefficient and net pressure of one stretch of a zone; the coefficient of the zone itself is found once. */
    private ZonePressure pressure(Sheet sheet, Part part, Map<String, Double> coefficients) {
        Trace trace = sheet.trace();
        Panel panel = sheet.panel();
        Strip strip = part.strip();
        Source place = zones.number(strip.name(), "from").source();
        double width = trace.line("zone-width/" + part.name() + sheet.end(), part.symbol("l"), "width of zone " + part.words())
            .in("h", panel.height(), "m").in("l", panel.width(), "m").from(place.citation(), place.status())
            .reads("from " + Numbers.plain(round(strip.from())) + " m to " + Numbers.plain(round(strip.to())) + " m from the windward end", strip.width(), "m");
        double ofZone = coefficients.computeIfAbsent(strip.name(), zone -> coefficient(sheet, zone));
        double c = part.sheltered() ? shelter.coefficient(part, ofZone, sheet.shelter(), sheet.end(), trace) : ofZone;
        String symbol = part.sheltered() ? part.symbol("c") : "c_" + strip.name();
        double w = NetPressure.record(sheet.site(), sheet.code().level(sheet.site()), trace, part.name() + sheet.end(), part.symbol("w"),
            (name, of) -> trace.line(name, of, "net pressure in zone " + part.words()).in("q_p", sheet.qp(), "Pa").in(symbol, c)
                .from(place.publicationAndEdition() + ", 5.2, 7.4.1", place.status()), "q_p " + symbol, sheet.qp() * c);
        return new ZonePressure(part.name(), part.symbol("w"), strip.from(), strip.to(), width, c, w);
    }

    /** A limit of a zone as it is told in words: to a tenth of a millimetre. */
    static double round(double metres) {
        return Math.round(metres * 1e4) / 1e4;
    }

    /** Straight lines in l/h, in the length of the return up to h, and in solidity from 1 down to the limit. */
    private double coefficient(Sheet sheet, String zone) {
        Trace trace = sheet.trace();
        String symbol = "c_" + zone;
        String meaning = "net pressure coefficient of zone " + zone;
        boolean corner = sheet.returnLength() > 0;
        trace.given("l_r", "length of the return corner at the windward end", sheet.returnLength(), "m", "");
        trace.given("φ", "solidity", sheet.panel().solidity(), "1", "");
        boolean holes = sheet.panel().solidity() < 1;
        Coefficient printed = free.at(zone, sheet.slenderness());
        if (!corner && !holes) {
            return printed.into(trace.line("coefficient/" + zone + sheet.end(), symbol, meaning).in("l/h", sheet.slenderness()));
        }
        double c = printed.into(trace.line("table-coefficient/" + zone + sheet.end(), symbol + "'", meaning + ", free end, closed")
            .in("l/h", sheet.slenderness()));
        if (corner) {
            c = withReturn(sheet, zone, c, holes ? "table-coefficient/" + zone + sheet.end() + "/return" : "coefficient/" + zone + sheet.end(),
                holes ? symbol + "''" : symbol);
        }
        return holes ? withHoles(sheet, zone, c, corner ? symbol + "''" : symbol + "'", symbol) : c;
    }

    private double withReturn(Sheet sheet, String zone, double freeEnd, String step, String symbol) {
        Coefficient full = withReturns.number("at least h", zone);
        double reach = constants.number("wall-return-full") * sheet.panel().height();
        double share = Math.min(1, sheet.returnLength() / reach);
        Source weaker = share < 1 ? free.at(zone, free.first()).source() : full.source();
        Trace.Line line = sheet.trace().line(step, symbol, "net pressure coefficient of zone " + zone + ", with the return corner")
            .from(weaker.citation(), weaker.status());
        if (share == 1) {
            return line.in("l_r", sheet.returnLength(), "m").in("h", sheet.panel().height(), "m")
                .reads("read in the row with return corners, as the return is not shorter than the height", full.value(), "1");
        }
        String row = "c_{" + zone + ",r}";
        full.into(sheet.trace().line("return-coefficient/" + zone + sheet.end(), row, "coefficient of zone " + zone + " with a return as long as the height"));
        return line.in("c_" + zone + "'", freeEnd).in(row, full.value()).in("l_r", sheet.returnLength(), "m")
            .in("h", sheet.panel().height(), "m")
            .gives("c_" + zone + "' + (" + row + " - c_" + zone + "') l_r / h", freeEnd + (full.value() - freeEnd) * share, "1");
    }

    private double withHoles(Sheet sheet, String zone, double closed, String closedSymbol, String symbol) {
        String key = open.keys().get(0);
        double limit = Double.parseDouble(key);
        Coefficient atLimit = open.number(key, zone);
        double phi = sheet.panel().solidity();
        String row = "c_{" + zone + "," + key + "}";
        atLimit.into(sheet.trace().line("open-coefficient/" + zone + sheet.end(), row, "coefficient of zone " + zone + " at solidity " + key));
        double c = atLimit.value() + (closed - atLimit.value()) * (phi - limit) / (1 - limit);
        return sheet.trace().line("coefficient/" + zone + sheet.end(), symbol, "net pressure coefficient of zone " + zone + ", with openings")
            .in("φ", phi).in(closedSymbol, closed).in(row, atLimit.value()).from(atLimit.source().citation(), atLimit.source().status())
            .gives(row + " + (" + closedSymbol + " - " + row + ") (φ - " + key + ") / (1 - " + key + ")", c, "1");
    }
}
