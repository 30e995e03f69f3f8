package broadside.codes;

import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Free-standing walls, hoardings and signs of AS/NZS 1170.2 (appendix D in 2011, B in 2021): wind square on, at 45 degrees
 * and along the panel. In wind at 45 degrees a panel of up to five times its height moves its resultant, a longer one has zones.
 */
final class AsNzsHoardings {

    private static final String NORMAL = "normal";
    private static final String OBLIQUE = "oblique";
    private static final String ALONG = "along";

    private final Constants constants;
    private final Rows oblique;
    private final Rows along;
    private final String shape;

    AsNzsHoardings(Edition edition) {
        this.constants = new Constants(edition);
        this.oblique = edition.rows("hoarding-oblique");
        this.along = edition.rows("hoarding-along");
        this.shape = edition.property("shape-factor");
    }

    /** What the cases of one panel are worked out from; the factors by symbol are recorded before. */
    private record Sheet(Panel panel, Site site, WindCode code, double q, double dynamic, double area, double local, double porosity, Trace trace) {

        double aspect() {
            return panel.width() / panel.height();
        }

        double ratio() {
            return panel.height() / panel.top();
        }
    }

    List<LoadCase> cases(Panel panel, Site site, WindCode code, Trace trace) {
        Source place = constants.source("normal-constant");
        double h = line(trace, place, "reference-height", "h", "height of the top").in("g", panel.clearance(), "m").in("c", panel.height(), "m")
            .gives("g + c", panel.top(), "m");
        double aspect = line(trace, place, "aspect", "b/c", "width over height of the panel").in("b", panel.width(), "m").in("c", panel.height(), "m")
            .gives("b / c", panel.width() / panel.height(), "1");
        line(trace, place, "height-ratio", "c/h", "height of the panel over the height of its top").in("c", panel.height(), "m").in("h", h, "m")
            .gives("c / h", panel.height() / h, "1");
        refuseNarrow(aspect);
        double q = code.velocityPressure(site, h, trace);
        double dynamic = dynamic(constants, trace);
        double ka = constants.entry("hoarding-area-factor").into(trace.line("area-factor", "K_a", "area reduction factor of hoardings and walls"));
        double kl = constants.entry("hoarding-local-factor").into(trace.line("local-factor", "K_l", "local pressure factor of hoardings and walls"));
        Sheet sheet = new Sheet(panel, site, code, q, dynamic, ka, kl, porosity(panel, trace), trace);
        List<LoadCase> cases = new ArrayList<>();
        LoadCase square = squareOn(sheet);
        cases.add(square);
        cases.addAll(Numbers.above(aspect, constants.number("hoarding-long")) ? obliqueZones(sheet) : obliqueShift(sheet, square.zones().get(0)));
        cases.addAll(alongPanel(sheet));
        return cases;
    }

    private void refuseNarrow(double aspect) {
        double least = constants.number("hoarding-least-aspect");
        Source place = constants.source("hoarding-least-aspect");
        if (!Numbers.atLeast(aspect, least)) {
            throw new NotCovered(place.publicationAndEdition(), place.place(), "the panel is narrower than " + Numbers.plain(least)
                + " times its height; there is no rule for wind at an angle on it.", "Make the panel wider or lower, or choose a code that covers it.");
        }
    }

    /** The response of a stiff structure; recorded as "dynamic-response-factor". */
    static double dynamic(Constants constants, Trace trace) {
        Source place = constants.source("dynamic-response-factor");
        return line(trace, place, "dynamic-response-factor", "C_{dyn}", "dynamic response factor").reads("as the first natural frequency is taken to lie above "
            + constants.text("rigid-least-frequency") + " Hz", constants.number("dynamic-response-factor"), "1");
    }

    private double porosity(Panel panel, Trace trace) {
        double solidity = trace.given("δ", "solidity", panel.solidity(), "1", "");
        double power = constants.number("porosity-exponent");
        return line(trace, constants.source("porosity-exponent"), "porosity-factor", "K_p", "reduction for openings").in("δ", solidity)
            .gives("1 - (1 - δ)^" + Numbers.plain(power), 1 - Math.pow(1 - solidity, power), "1");
    }

    private LoadCase squareOn(Sheet sheet) {
        double cpn = netCoefficient(sheet);
        double c = shapeFactor(sheet, NORMAL, "0", cpn, constants.source("normal-constant"));
        double p = pressure(sheet, NORMAL, "0", c, constants.source("normal-constant"));
        double b = sheet.panel().width();
        return new LoadCase(NORMAL, "wind square on", Windward.NONE, List.of(new ZonePressure(NORMAL, "p_{0}", 0, b, b, c, p)), 0, Optional.empty(), 0, 0);
    }

    /** Three formulas: for a panel high above the ground, for a long one and for the others. */
    private double netCoefficient(Sheet sheet) {
        double b = sheet.panel().width();
        double c = sheet.panel().height();
        double h = sheet.panel().top();
        double log = Math.log(b / c) / Math.log(10);
        if (!Numbers.atLeast(sheet.ratio(), constants.number("hoarding-high"))) {
            return cpn(sheet, "normal-high-constant").in("b", b, "m").in("c", c, "m").gives(constants.text("normal-high-constant") + " + "
                + constants.text("normal-high-slope") + " ln(b / c) / ln(10)", constants.number("normal-high-constant") + constants.number("normal-high-slope") * log, "1");
        }
        if (Numbers.above(sheet.aspect(), constants.number("hoarding-long"))) {
            return cpn(sheet, "normal-long-constant").in("c", c, "m").in("h", h, "m").gives(constants.text("normal-long-constant") + " - "
                + constants.text("normal-long-slope") + " c / h", constants.number("normal-long-constant") - constants.number("normal-long-slope") * c / h, "1");
        }
        return cpn(sheet, "normal-constant").in("b", b, "m").in("c", c, "m").in("h", h, "m")
            .gives(constants.text("normal-constant") + " + " + constants.text("normal-slope") + " (" + constants.text("normal-aspect") + " + ln(b / c) / ln(10)) ("
                + constants.text("normal-height") + " - c / h)", constants.number("normal-constant")
                + constants.number("normal-slope") * (constants.number("normal-aspect") + log) * (constants.number("normal-height") - c / h), "1");
    }

    private Trace.Line cpn(Sheet sheet, String constant) {
        return line(sheet.trace(), constants.source(constant), "net-coefficient/" + NORMAL, "C_{pn,0}", "net pressure coefficient, wind square on");
    }

    /** The pressure of wind square on, with its resultant off the middle, towards either end. */
    private List<LoadCase> obliqueShift(Sheet sheet, ZonePressure square) {
        Source place = constants.source("oblique-offset");
        String zone = OBLIQUE + "/1";
        double b = sheet.panel().width();
        double c = line(sheet.trace(), place, "coefficient/" + zone, symbol("45,1"), "aerodynamic shape factor, wind at 45 degrees: as with wind square on")
            .in(symbol("0"), square.coefficient()).gives(symbol("0"), square.coefficient(), "1");
        double p = line(sheet.trace(), place, "pressure/" + zone, "p_{45,1}", "net pressure, wind at 45 degrees: as with wind square on")
            .in("p_{0}", square.pressure(), "Pa").gives("p_{0}", square.pressure(), "Pa");
        ShiftRule rule = new ShiftRule(constants.number("oblique-offset"), place);
        LoadCase right = new LoadCase(OBLIQUE, "wind at 45 degrees, force a fifth of the width towards the windward end", Windward.RIGHT,
            List.of(new ZonePressure(zone, "p_{45,1}", 0, b, b, c, p)), rule.factor() * b, Optional.of(rule), 0, 0);
        return List.of(right, right.mirrored(b));
    }

    private List<LoadCase> obliqueZones(Sheet sheet) {
        String label = "wind at 45 degrees, zones from the windward free end";
        Panel panel = sheet.panel();
        LoadCase left = zoned(sheet, oblique, OBLIQUE, label, "45", panel.returnLeft(), "");
        LoadCase right = panel.endsAlike() ? left : zoned(sheet, oblique, OBLIQUE, label, "45", panel.returnRight(), "/right-end");
        return List.of(left, right.mirrored(panel.width()));
    }

    private List<LoadCase> alongPanel(Sheet sheet) {
        LoadCase left = zoned(sheet, along, ALONG, "wind along the panel, pressure on either face, zones from the windward end", "90", 0, "");
        return left.windward() == Windward.NONE ? List.of(left) : List.of(left, left.mirrored(sheet.panel().width()));
    }

    private LoadCase zoned(Sheet sheet, Rows table, String name, String label, String angle, double returnLength, String end) {
        Panel panel = sheet.panel();
        String row = Numbers.above(sheet.ratio(), constants.number("zone-height-ratio")) ? "large" : "small";
        String measure = table.text(row, "measure");
        double unit = measure.equals("h") ? panel.top() : panel.height();
        List<String> names = List.of("1", "2", "3");
        double first = table.number(row, "to-1").value() * unit;
        double second = table.number(row, "to-2").value() * unit;
        List<ZonePressure> zones = new ArrayList<>();
        for (Strip strip : Strip.cut(panel.width(), names, List.of(first, second, Double.POSITIVE_INFINITY))) {
            String zone = name + "/" + strip.name();
            String index = angle + "," + strip.name();
            Coefficient printed = printed(sheet, table, row, strip.name(), returnLength);
            double width = line(sheet.trace(), printed.source(), "zone-width/" + zone + end, "l_{" + index + "}", "width of zone " + strip.name() + " of case " + name)
                .in(measure, unit, "m").in("b", panel.width(), "m").reads("from the windward end; zones end at " + table.text(row, "to-1") + " " + measure + " and "
                    + table.text(row, "to-2") + " " + measure + ", as c/h is " + table.text(row, "c/h"), strip.width(), "m");
            double cpn = line(sheet.trace(), printed.source(), "net-coefficient/" + zone + end, "C_{pn," + index + "}", "net pressure coefficient of zone "
                + strip.name() + " of case " + name).reads(printed.how(), printed.value(), "1");
            double c = shapeFactor(sheet, zone + end, index, cpn, printed.source());
            double p = pressure(sheet, zone + end, index, c, printed.source());
            zones.add(new ZonePressure(zone, "p_{" + index + "}", strip.from(), strip.to(), width, c, p));
        }
        Windward windward = zones.size() == 1 && returnLength == 0 ? Windward.NONE : Windward.LEFT;
        return new LoadCase(name, label, windward, zones, 0, Optional.empty(), 0, 0);
    }

    /** A return wall that is longer than the panel is high lowers the first zone, where the table has a value for it. */
    private Coefficient printed(Sheet sheet, Rows table, String row, String zone, double returnLength) {
        boolean corner = zone.equals("1") && Numbers.above(returnLength / sheet.panel().height(), constants.number("return-length"));
        if (corner) {
            sheet.trace().given("L_r", "length of the return wall at the windward end", returnLength, "m", "");
        }
        Coefficient found = table.number(row, corner ? zone + "-with-return" : zone);
        return new Coefficient(found.value(), "1", found.source(), "read at c/h " + table.text(row, "c/h") + (corner ? ", beside a return wall longer than "
            + constants.text("return-length") + " c" : ""));
    }

    private String symbol(String index) {
        return "C_{" + shape + "," + index + "}";
    }

    private double shapeFactor(Sheet sheet, String zone, String index, double cpn, Source place) {
        return line(sheet.trace(), place, "coefficient/" + zone, symbol(index), "aerodynamic shape factor").in("C_{pn," + index + "}", cpn).in("K_a", sheet.area())
            .in("K_l", sheet.local()).in("K_p", sheet.porosity()).gives("C_{pn," + index + "} K_a K_l K_p", cpn * sheet.area() * sheet.local() * sheet.porosity(), "1");
    }

    private double pressure(Sheet sheet, String zone, String index, double c, Source place) {
        return NetPressure.record(sheet.site(), sheet.code().level(sheet.site()), sheet.trace(), zone, "p_{" + index + "}", (name, own) ->
            line(sheet.trace(), place, name, own, "net pressure").in("q", sheet.q(), "Pa").in(symbol(index), c).in("C_{dyn}", sheet.dynamic()),
            "q " + symbol(index) + " C_{dyn}", sheet.q() * c * sheet.dynamic());
    }

    private static Trace.Line line(Trace trace, Source place, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
