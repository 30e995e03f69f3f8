package broadside.codes;

import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Grid;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Solid free-standing signs and walls of ASCE 7, figure 29.3-1: cases A, B and C. */
final class Asce7Signs {

    private final Constants constants;
    private final Grid squareOn;
    private final Curve regions;
    private final Curve longRegions;
    private final Curve returnCorners;
    private final Status equations;

    Asce7Signs(Edition edition) {
        this.constants = new Constants(edition);
        this.squareOn = edition.grid("solid-signs");
        this.regions = edition.curve("solid-signs-case-c");
        this.longRegions = edition.curve("solid-signs-case-c-long");
        this.returnCorners = edition.curve("return-corners");
        this.equations = Asce7.equations(edition);
    }

    /** What the cases of one panel are worked out from. */
    record Sheet(Panel panel, Site site, WindCode code, Asce7Pressure q, double gust, double clearness, double aspect, double porosity,
                 Trace trace) { }

    List<LoadCase> cases(Panel panel, Site site, WindCode code, Asce7Pressure q, double gust, Trace trace) {
        Source place = constants.source("case-b-offset");
        double clearness = line(trace, place, "height-ratio", "s/h", "height of the panel over the height of its top")
            .in("s", panel.height(), "m").in("h", panel.top(), "m").gives("s / h", panel.height() / panel.top(), "1");
        double aspect = line(trace, place, "aspect", "B/s", "width over height of the panel")
            .in("B", panel.width(), "m").in("s", panel.height(), "m").gives("B / s", panel.width() / panel.height(), "1");
        Sheet sheet = new Sheet(panel, site, code, q, gust, clearness, aspect, porosity(panel, trace), trace);
        List<LoadCase> cases = new ArrayList<>(squareAndOffset(sheet));
        if (Numbers.atLeast(aspect, constants.number("case-c-least-aspect"))) {
            LoadCase left = byRegions(sheet, panel.returnLeft(), "");
            LoadCase right = panel.endsAlike() ? left : byRegions(sheet, panel.returnRight(), "/right-end");
            cases.add(left);
            cases.add(right.mirrored(panel.width()));
        }
        return cases;
    }

    private double porosity(Panel panel, Trace trace) {
        double solidity = trace.given("ε", "solidity", panel.solidity(), "1", "");
        Source place = constants.source("openness-limit");
        if (solidity == 1) {
            return 1;
        }
        double power = constants.number("porosity-exponent");
        return line(trace, place, "porosity-factor", "k_ε", "reduction for openings").in("ε", solidity)
            .gives("1 - (1 - ε)^" + Numbers.plain(power), 1 - Math.pow(1 - solidity, power), "1");
    }

    private List<LoadCase> squareAndOffset(Sheet sheet) {
        Panel panel = sheet.panel();
        Coefficient printed = squareOn.at(sheet.clearness(), sheet.aspect());
        double c = reduced(sheet, "case-a", "C_f", "force coefficient of cases A and B", printed);
        double least = leastPressure(sheet.trace());
        double p = pressure(sheet, "case-a", "p_{case-a}", c, "C_f", least);
        sheet.trace().line("coefficient/case-b", "C_f", "force coefficient of case B: as in case A").in("C_f", c)
            .from(constants.source("case-b-offset").citation(), constants.source("case-b-offset").status()).gives("C_f", c, "1");
        sheet.trace().line("pressure/case-b", "p_{case-b}", "net pressure of case B: as in case A").in("p_{case-a}", p, "Pa")
            .from(constants.source("case-b-offset").citation(), constants.source("case-b-offset").status()).gives("p_{case-a}", p, "Pa");
        double rise = rise(sheet);
        double b = panel.width();
        ShiftRule rule = new ShiftRule(constants.number("case-b-offset"), constants.source("case-b-offset"));
        LoadCase a = new LoadCase("case-a", "case A, wind square on", Windward.NONE,
            List.of(new ZonePressure("case-a", "p_{case-a}", 0, b, b, c, p)), 0, Optional.empty(), rise, 0);
        LoadCase right = new LoadCase("case-b", "case B, force a fifth of the width towards the windward edge", Windward.RIGHT,
            List.of(new ZonePressure("case-b", "p_{case-b}", 0, b, b, c, p)), rule.factor() * b, Optional.of(rule), rise, 0);
        return List.of(a, right, right.mirrored(b));
    }

    private double leastPressure(Trace trace) {
        Source place = constants.source("minimum-pressure");
        return line(trace, place, "minimum-pressure", "p_{16}", "least pressure on the whole panel")
            .reads(constants.text("minimum-pressure") + " psf", constants.pascals("minimum-pressure"), "Pa");
    }

    /** A panel that touches the ground has its resultant a little above the middle. */
    private double rise(Sheet sheet) {
        if (sheet.panel().clearance() > 0) {
            return 0;
        }
        Source place = constants.source("ground-rise");
        return line(sheet.trace(), place, "ground-rise", "Δ", "resultant above mid-height, as the panel touches the ground")
            .in("s", sheet.panel().height(), "m")
            .gives(constants.text("ground-rise") + " s", constants.number("ground-rise") * sheet.panel().height(), "m");
    }

    private LoadCase byRegions(Sheet sheet, double returnLength, String end) {
        double s = sheet.panel().height();
        boolean isLong = Numbers.above(sheet.aspect(), regions.last());
        List<String> names = isLong ? List.of("0-s", "s-2s", "2s-3s", "3s-4s", "4s-5s", "5s-10s", "over-10s")
            : List.of("0-s", "s-2s", "2s-3s", "3s-10s");
        List<Double> limits = isLong ? List.of(s, 2 * s, 3 * s, 4 * s, 5 * s, 10 * s, Double.POSITIVE_INFINITY)
            : List.of(s, 2 * s, 3 * s, Double.POSITIVE_INFINITY);
        List<ZonePressure> pressures = new ArrayList<>();
        double corner = returnFactor(sheet, returnLength, end);
        double ground = groundFactor(sheet, end);
        for (Strip strip : Strip.cut(sheet.panel().width(), names, limits)) {
            String zone = "case-c/" + strip.name();
            Source place = constants.source("case-c-least-aspect");
            sheet.trace().line("zone-width/" + zone + end, "l_{" + strip.name() + "}", "width of region " + strip.name())
                .in("s", s, "m").in("B", sheet.panel().width(), "m").from(place.citation(), place.status())
                .reads("measured from the windward edge", strip.width(), "m");
            double c = regionCoefficient(sheet, strip.name(), strip.name().equals("0-s") ? corner : 1, ground, end);
            double p = pressure(sheet, zone + end, "p_{" + strip.name() + "}", c, "C_{" + strip.name() + "}", 0);
            pressures.add(new ZonePressure(zone, "p_{" + strip.name() + "}", strip.from(), strip.to(), strip.width(), c, p));
        }
        double p16 = constants.pascals("minimum-pressure");
        double least = line(sheet.trace(), constants.source("minimum-pressure"), "minimum-force/case-c" + end, "F_{min}", "least force of case C")
            .in("p_{16}", p16, "Pa").in("B", sheet.panel().width(), "m").in("s", s, "m")
            .gives("p_{16} B s", p16 * sheet.panel().width() * s, "N");
        double rise = sheet.panel().clearance() > 0 ? 0 : constants.number("ground-rise") * s;
        return new LoadCase("case-c", "case C, wind from one side, by regions from the windward edge", Windward.LEFT, pressures, 0, Optional.empty(), rise, least);
    }

    private double returnFactor(Sheet sheet, double length, String end) {
        double s = sheet.panel().height();
        boolean starred = Numbers.atLeast(sheet.aspect(), constants.number("case-c-return-from"));
        if (!starred || !Numbers.atLeast(length / s, returnCorners.first())) {
            return 1;
        }
        sheet.trace().given("L_r", "length of the return corner at the windward end", length, "m", "");
        return returnCorners.at("factor", Math.max(length / s, returnCorners.first())).into(sheet.trace().line("return-corner-factor" + end, "k_r",
            "reduction of the first region by the return corner").in("L_r", length, "m").in("s", s, "m"));
    }

    private double groundFactor(Sheet sheet, String end) {
        if (!Numbers.above(sheet.clearness(), constants.number("ground-factor-from"))) {
            return 1;
        }
        if (!end.isEmpty()) {
            return constants.number("ground-factor-constant") - sheet.clearness();
        }
        Source place = constants.source("ground-factor-constant");
        return line(sheet.trace(), place, "case-c-ground-factor", "k_g", "reduction of case C near the ground").in("s/h", sheet.clearness())
            .reads(constants.text("ground-factor-constant") + " - s/h, as s/h is above " + constants.text("ground-factor-from"),
                constants.number("ground-factor-constant") - sheet.clearness(), "1");
    }

    private double regionCoefficient(Sheet sheet, String region, double corner, double ground, String end) {
        Coefficient printed = printed(region, sheet.aspect());
        String zone = "case-c/" + region + end;
        String symbol = "C_{" + region + "}";
        String meaning = "force coefficient of region " + region;
        double reduction = corner * ground * sheet.porosity();
        if (reduction == 1) {
            return printed.into(sheet.trace().line("coefficient/" + zone, symbol, meaning).in("B/s", sheet.aspect()));
        }
        double c = printed.into(sheet.trace().line("table-coefficient/" + zone, symbol + "'", meaning + ", as printed").in("B/s", sheet.aspect()));
        Trace.Line line = line(sheet.trace(), printed.source(), "coefficient/" + zone, symbol, meaning).in(symbol + "'", c);
        StringBuilder formula = new StringBuilder(symbol + "'");
        append(formula, line, "k_r", corner);
        append(formula, line, "k_g", ground);
        append(formula, line, "k_ε", sheet.porosity());
        return line.gives(formula.toString(), c * reduction, "1");
    }

    private static void append(StringBuilder formula, Trace.Line line, String symbol, double factor) {
        if (factor != 1) {
            line.in(symbol, factor);
            formula.append(' ').append(symbol);
        }
    }

    /** Between the two printed lists of regions the larger coefficient counts, as the figure gives no rule. */
    private Coefficient printed(String region, double aspect) {
        if (!Numbers.above(aspect, regions.last())) {
            return regions.at(region, Math.min(Math.max(aspect, regions.firstPrinted(region)), regions.last()));
        }
        if (Numbers.atLeast(aspect, longRegions.first())) {
            return longRegions.at(region, Math.max(aspect, longRegions.first()));
        }
        Coefficient above = longRegions.at(region, longRegions.first());
        if (region.equals("over-10s")) {
            return above;
        }
        Coefficient below = regions.at(regionBelow(region), regions.last());
        Coefficient larger = below.value() > above.value() ? below : above;
        return new Coefficient(larger.value(), "1", larger.source(), "the larger of the printed columns B/s = "
            + Numbers.plain(regions.last()) + " (" + below.value() + ") and " + Numbers.plain(longRegions.first()) + " (" + above.value()
            + "), as the regions change between them");
    }

    private static String regionBelow(String region) {
        return switch (region) {
            case "0-s", "s-2s", "2s-3s" -> region;
            default -> "3s-10s";
        };
    }

    private double reduced(Sheet sheet, String zone, String symbol, String meaning, Coefficient printed) {
        if (sheet.porosity() == 1) {
            return printed.into(sheet.trace().line("coefficient/" + zone, symbol, meaning).in("s/h", sheet.clearness()).in("B/s", sheet.aspect()));
        }
        double c = printed.into(sheet.trace().line("table-coefficient/" + zone, symbol + "'", meaning + ", closed panel")
            .in("s/h", sheet.clearness()).in("B/s", sheet.aspect()));
        return line(sheet.trace(), printed.source(), "coefficient/" + zone, symbol, meaning + ", with openings").in(symbol + "'", c)
            .in("k_ε", sheet.porosity()).gives(symbol + "' k_ε", c * sheet.porosity(), "1");
    }

    private double pressure(Sheet sheet, String zone, String pressureSymbol, double c, String symbol, double least) {
        String q = sheet.q().text() + " G " + symbol;
        double value = sheet.q().value() * sheet.gust() * c;
        String formula = least > 0 ? "max(" + q + "; p_{16})" : q;
        return NetPressure.record(sheet.site(), sheet.code().level(sheet.site()), sheet.trace(), zone, pressureSymbol, (name, own) -> {
            Trace.Line line = sheet.q().into(sheet.trace().line(name, own, least > 0 ? "net pressure, not below 16 psf" : "net pressure"))
                .in("G", sheet.gust()).in(symbol, c)
                .from(constants.source("openness-limit").publicationAndEdition() + ", 29.3, (29.3-1)" + (least > 0 ? " and 29.7" : ""), equations);
            return least > 0 ? line.in("p_{16}", least, "Pa") : line;
        }, formula, Math.max(value, least));
    }

    private static Trace.Line line(Trace trace, Source place, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }
}
