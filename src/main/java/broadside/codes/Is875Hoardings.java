package broadside.codes;

import broadside.codes.LoadCase.Windward;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/**
 * Free-standing walls and hoardings of IS 875 (Part 3), 7.4.2.3: wind square on by table 26, and oblique wind, whose
 * pressure falls in a straight line from the windward to the leeward edge. Openings bring no reduction.
 */
final class Is875Hoardings {

    private final Constants constants;
    private final Curve above;
    private final Curve onGround;

    Is875Hoardings(Edition edition) {
        this.constants = new Constants(edition);
        this.above = edition.curve("hoardings-above-ground");
        this.onGround = edition.curve("hoardings-on-ground");
    }

    /** What the net pressures of one panel are worked out from: the design wind pressure p_d, Pa, and the force coefficient. */
    private record Sheet(Site site, Level level, double pd, double cf, Trace trace) { }

    /** The cases "normal" and "oblique", the second from either end. */
    List<LoadCase> cases(Panel panel, Site site, Level level, double pd, Trace trace) {
        Sheet sheet = new Sheet(site, level, pd, coefficient(panel, trace), trace);
        double p = pressure(sheet, "normal", "p_{normal}", "wind square on", "C_f", sheet.cf());
        double b = panel.width();
        LoadCase normal = new LoadCase("normal", "wind square on", Windward.NONE, List.of(new ZonePressure("normal", "p_{normal}", 0, b, b, sheet.cf(), p)), 0,
            Optional.empty(), 0, 0);
        LoadCase right = oblique(b, sheet);
        return List.of(normal, right, right.mirrored(b));
    }

    private double coefficient(Panel panel, Trace trace) {
        Source place = constants.source("hoarding-clearance");
        double aspect = trace.line("aspect", "b/h", "width over height of the panel").in("b", panel.width(), "m").in("h", panel.height(), "m")
            .from(place.citation(), place.status()).gives("b / h", panel.width() / panel.height(), "1");
        double gap = trace.line("clearance-ratio", "h'/h", "gap below the panel over its height").in("h'", panel.clearance(), "m").in("h", panel.height(), "m")
            .from(place.citation(), place.status()).gives("h' / h", panel.clearance() / panel.height(), "1");
        boolean clear = Numbers.atLeast(gap, constants.number("hoarding-clearance"));
        // A board with a small gap that is too narrow for the column on the ground may still be read as above ground.
        boolean ground = !clear && (gap == 0 || Numbers.atLeast(aspect, onGround.first()));
        Curve column = ground ? onGround : above;
        boolean turned = !Numbers.atLeast(aspect, column.first());
        Coefficient found = turned ? above.at("C_f", (ground ? onGround.first() / above.first() : 1) / aspect) : column.at("C_f", Math.max(aspect, column.first()));
        boolean ownLine = !turned && found.how().startsWith("between") && Numbers.above(aspect, constants.number(ground ? "on-ground-line-to" : "above-ground-line-to"));
        String how = found.how() + (clear ? ", above ground" : ground ? ", on the ground, as h' is less than " + constants.text("hoarding-clearance") + " h"
            : ", above ground, as the clause allows for a small gap") + (ownLine ? "; the straight line between these rows is a reading of this tool" : "")
            + (turned ? "; the table begins at b/h " + Numbers.plain(column.first()) + ": the same plate turned on its side" + (ground ? ", its image in the ground with it," : "")
                + " is a reading of this tool" : "") + (panel.solidity() < 1 ? "; openings bring no reduction" : "");
        return trace.line("coefficient/normal", "C_f", "force coefficient of a wall or hoarding").in("b/h", aspect).in("h'/h", gap)
            .from(found.source().citation(), ownLine || turned ? Status.DERIVED : found.source().status()).reads(how, found.value(), "1");
    }

    /** One even zone of the mean pressure, its resultant where the straight line puts it; shares of posts follow the line itself. */
    private LoadCase oblique(double b, Sheet sheet) {
        Trace trace = sheet.trace();
        Edge windward = edge("windward", sheet);
        Edge leeward = edge("leeward", sheet);
        double c = trace.line("coefficient/oblique", "C_{oblique}", "mean net coefficient, oblique wind").in("C_{windward}", windward.coefficient())
            .in("C_{leeward}", leeward.coefficient()).from("mean of a straight line", Status.DERIVED)
            .gives("(C_{windward} + C_{leeward}) / 2", (windward.coefficient() + leeward.coefficient()) / 2, "1");
        double p = trace.line("pressure/oblique", "p_{oblique}", "mean net pressure, oblique wind").in("p_{windward}", windward.pressure(), "Pa")
            .in("p_{leeward}", leeward.pressure(), "Pa").from("mean of a straight line", Status.DERIVED)
            .gives("(p_{windward} + p_{leeward}) / 2", (windward.pressure() + leeward.pressure()) / 2, "Pa");
        double share = trace.line("eccentricity-ratio/oblique", "e/b", "distance of the resultant from the middle, towards the windward edge, over the width")
            .in("p_{windward}", windward.pressure(), "Pa").in("p_{leeward}", leeward.pressure(), "Pa").from("centroid of a straight line", Status.DERIVED)
            .gives("(p_{windward} - p_{leeward}) / (6 (p_{windward} + p_{leeward}))",
                (windward.pressure() - leeward.pressure()) / (6 * (windward.pressure() + leeward.pressure())), "1");
        return new LoadCase("oblique", "oblique wind, the pressure falls in a straight line from the windward to the leeward edge", Windward.RIGHT,
            List.of(new ZonePressure("oblique", "p_{oblique}", 0, b, b, c, p)), share * b, Optional.empty(), 0, 0);
    }

    /** Net coefficient, and net pressure in Pa, at one edge. */
    private record Edge(double coefficient, double pressure) { }

    private Edge edge(String side, Sheet sheet) {
        String key = "oblique-" + side + "-edge";
        String zone = "oblique/" + side + "-edge";
        String symbol = "C_{" + side + "}";
        Source place = constants.source(key);
        double c = sheet.trace().line("coefficient/" + zone, symbol, "net coefficient at the " + side + " edge, oblique wind").in("C_f", sheet.cf())
            .from(place.citation(), place.status()).gives(constants.text(key) + " C_f", constants.number(key) * sheet.cf(), "1");
        return new Edge(c, pressure(sheet, zone, "p_{" + side + "}", "at the " + side + " edge, oblique wind", symbol, c));
    }

    private double pressure(Sheet sheet, String zone, String symbol, String where, String coefficient, double c) {
        Source place = constants.source("oblique-windward-edge");
        return NetPressure.record(sheet.site(), sheet.level(), sheet.trace(), zone, symbol, (name, own) -> sheet.trace()
            .line(name, own, "net pressure, " + where).in(coefficient, c).in("p_d", sheet.pd(), "Pa").from(place.citation(), place.status()),
            coefficient + " p_d", c * sheet.pd());
    }
}
