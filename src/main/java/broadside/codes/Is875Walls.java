package broadside.codes;

import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.panel.Building;
import broadside.panel.FacadePanel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Panels flat on the walls of rectangular clad buildings by table 5 of IS 875 (Part 3). The wind may come from any of the
 * four sides: pushed by the windward coefficient, pulled by the worse of side and leeward, and by the local coefficient on
 * the strip beside a corner.
 */
final class Is875Walls {

    private final Constants constants;
    private final Rows rows;
    private final Rows internal;
    private final Is875Pressure pressure;

    Is875Walls(Edition edition, Is875Pressure pressure) {
        this.constants = new Constants(edition);
        this.rows = edition.rows("building-walls");
        this.internal = edition.rows("internal-pressure");
        this.pressure = pressure;
    }

    /** Which walls of the table the panel's wall can be: A and B are the long walls; all four walls of a square building are alike. */
    private enum Face {
        LONG("long", List.of("0-a"), List.of("0-b", "90-ab")),
        SHORT("short", List.of("90-c"), List.of("90-d", "0-cd")),
        SQUARE("square building's", List.of("0-a"), List.of("0-b", "0-cd"));

        private final String word;
        private final List<String> windward;
        private final List<String> others;

        Face(String word, List<String> windward, List<String> others) {
            this.word = word;
            this.windward = windward;
            this.others = others;
        }
    }

    /** The wall in the terms of the table, with the rows that hold for it. */
    private record Wall(Face face, List<String> keys, double strip) { }

    /** What the zones are worked out from; C_pi without its sign, zero where only the outside counts. */
    private record Sheet(Site site, Level level, Is875Pressure.OnWall pressures, double internal, Trace trace) { }

    List<LoadCase> cases(FacadePanel facade, Site site, WindCode code, Trace trace) {
        Wall wall = wall(facade.building(), trace);
        double height = facade.building().height().metres();
        Source place = constants.source("edge-strip");
        double z = trace.line("reference-height", "z", "height for the wind: the top of the building, as no other height is stated, which is safe")
            .in("h_b", height, "m").from(place.citation(), Status.DERIVED).gives("h_b", height, "m");
        double pz = code.velocityPressure(site, z, trace);
        Sheet sheet = new Sheet(site, code.level(site), pressure.onWall(pz, site, trace), internalPressure(facade, trace), trace);
        double push = worst(wall, wall.face().windward, Comparator.naturalOrder(), trace.line("coefficient/pushed/general", "C_{push}",
            "external coefficient, wind on this wall"));
        double pull = worst(wall, wall.face().others, Comparator.reverseOrder(), trace.line("coefficient/pulled/general", "C_{pull}",
            "external coefficient, the worse of wind on the other walls"));
        ZonePressure pushed = zone(sheet, "general", "pushed/general", "push", push);
        ZonePressure pulled = zone(sheet, "general", "pulled/general", "pull", pull);
        List<Strip> strips = strips(facade, wall.strip());
        Optional<ZonePressure> local = strips.stream().anyMatch(s -> s.name().equals("local")) ? Optional.of(local(sheet, wall)) : Optional.empty();
        double width = facade.width().metres();
        List<ZonePressure> zones = strips.stream().map(s -> placed(s.name().equals("local") ? local.orElseThrow() : pulled, s.from(), s.to())).toList();
        return List.of(new LoadCase("pushed", "pushed towards the wall", Windward.NONE, List.of(placed(pushed, 0, width)), 0, Optional.empty(), 0, 0),
            new LoadCase("pulled", "pulled away from the wall", Windward.NONE, zones, 0, Optional.empty(), 0, 0));
    }

    private Wall wall(Building building, Trace trace) {
        double face = trace.given("w_f", "width of the wall that carries the panel", building.width().metres(), "m", building.width().typed());
        double depth = trace.given("d_f", "depth of the building behind it", building.depth().metres(), "m", building.depth().typed());
        double height = trace.given("h_b", "height of the building", building.height().metres(), "m", building.height().typed());
        Source place = constants.source("edge-strip");
        double w = line(trace, "plan-width", "w", "smaller side of the building in plan").in("w_f", face, "m").in("d_f", depth, "m")
            .gives("min(w_f; d_f)", Math.min(face, depth), "m");
        double l = line(trace, "plan-length", "l", "larger side of the building in plan").in("w_f", face, "m").in("d_f", depth, "m")
            .gives("max(w_f; d_f)", Math.max(face, depth), "m");
        double tall = line(trace, "height-to-width", "h/w", "height over smaller side").in("h_b", height, "m").in("w", w, "m").gives("h_b / w", height / w, "1");
        double along = line(trace, "length-to-width", "l/w", "larger side over smaller side").in("l", l, "m").in("w", w, "m").gives("l / w", l / w, "1");
        double strip = line(trace, "zone-width/local", "s_l", "width of the strip beside a corner").in("w", w, "m")
            .gives(constants.text("edge-strip") + " w", constants.number("edge-strip") * w, "m");
        boolean square = !Numbers.above(along, 1);
        List<String> keys = rows.keys().stream().filter(k -> Range.of(rows.text(k, "h/w")).holds(tall)).filter(k -> {
            Range range = Range.of(rows.text(k, "l/w"));
            return square ? range.from() == 1 : range.holds(along);
        }).toList();
        if (keys.isEmpty()) {
            throw new NotCovered(place.publicationAndEdition(), place.place(), "the table has no row for a building with h/w = " + round(tall) + " and l/w = "
                + round(along) + ".", "Ask an engineer for the wind on such a building.");
        }
        return new Wall(square ? Face.SQUARE : face > depth ? Face.LONG : Face.SHORT, keys, strip);
    }

    private Trace.Line line(Trace trace, String step, String symbol, String meaning) {
        Source place = constants.source("edge-strip");
        return trace.line(step, symbol, meaning).from(place.citation(), place.status());
    }

    private static double round(double ratio) {
        return (double) Math.round(ratio * 1000) / 1000;
    }

    /** The worst value of some columns in the rows that hold; two rows hold where both print l/w = 3/2. */
    private double worst(Wall wall, List<String> columns, Comparator<Double> order, Trace.Line line) {
        Coefficient worst = null;
        String where = "";
        for (String key : wall.keys()) {
            for (String column : columns) {
                Coefficient here = held(key, column);
                if (worst == null || order.compare(here.value(), worst.value()) > 0) {
                    worst = here;
                    where = key;
                }
            }
        }
        return new Coefficient(worst.value(), "1", worst.source(), "read in the row " + where + ", " + wall.face().word + " wall").into(line);
    }

    private Coefficient held(String key, String column) {
        if (!rows.isPrinted(key, column)) {
            Source place = rows.number(key, "local").source();
            throw new NotCovered(place.publicationAndEdition(), place.place(), "the values of the row " + key
                + " for wind on the short wall are not held here, and this wall needs them.", "Ask an engineer for the wind on such a tower.");
        }
        return rows.number(key, column);
    }

    private double internalPressure(FacadePanel facade, Trace trace) {
        if (facade.backing() == FacadePanel.Backing.WALL) {
            return 0;
        }
        String key = facade.building().enclosure().word();
        Coefficient found = internal.number(key, "value");
        return trace.line("internal-coefficient", "C_{pi}", "internal pressure coefficient, either sign").from(found.source().citation(), found.source().status())
            .reads(key + ": " + internal.text(key, "openings"), found.value(), "1");
    }

    private ZonePressure local(Sheet sheet, Wall wall) {
        double c = worst(wall, List.of("local"), Comparator.reverseOrder(), sheet.trace().line("coefficient/local", "C_{loc}",
            "local external coefficient, on the strip beside a corner"));
        return zone(sheet, "local", "local", "loc", c);
    }

    /** Net pressure of a zone; the internal pressure counts with the sign that makes it larger. */
    private ZonePressure zone(Sheet sheet, String name, String step, String index, double c) {
        boolean isLocal = name.equals("local");
        double pd = isLocal ? sheet.pressures().local() : sheet.pressures().general();
        String design = isLocal ? "p_{d,l}" : "p_d";
        String symbol = "p_{" + index + "}";
        boolean inside = sheet.internal() > 0;
        String net = inside ? "(C_{" + index + "} " + (c < 0 ? "-" : "+") + " C_{pi})" : "C_{" + index + "}";
        double coefficient = c + Math.signum(c) * sheet.internal();
        Source place = constants.source("edge-strip");
        double p = NetPressure.record(sheet.site(), sheet.level(), sheet.trace(), step, symbol, (record, own) -> {
            Trace.Line line = sheet.trace().line(record, own, "net pressure on the panel, " + step.replace('/', ' ')).in("C_{" + index + "}", c)
                .in(design, pd, "Pa").from(place.citation(), place.status());
            return inside ? line.in("C_{pi}", sheet.internal()) : line;
        }, net + " " + design, coefficient * pd);
        return new ZonePressure(name, symbol, 0, 0, 0, coefficient, p);
    }

    private static ZonePressure placed(ZonePressure zone, double from, double to) {
        return new ZonePressure(zone.zone(), zone.symbol(), from, to, to - from, zone.coefficient(), zone.pressure());
    }

    /** The panel cut at the edges of the strips beside both corners, from its edge nearer to the corner it is measured from. */
    private static List<Strip> strips(FacadePanel facade, double strip) {
        double width = facade.width().metres();
        double near = reach(strip, facade.fromCorner().metres());
        double far = Math.max(0, width - reach(strip, facade.fromFarCorner()));
        return Strip.cut(width, List.of("local", "general", "local"), List.of(near, far, Double.POSITIVE_INFINITY));
    }

    /** How far a strip reaches into the panel, m. */
    private static double reach(double strip, double fromCorner) {
        return Numbers.above(strip, Math.max(0, fromCorner)) ? strip - fromCorner : 0;
    }

    /** A printed range; "(0; 0.5]" means above 0 and not above 0.5, a dash means without end. */
    private record Range(double from, boolean takesFrom, double to, boolean takesTo) {

        static Range of(String text) {
            String[] ends = text.substring(1, text.length() - 1).split(";");
            double to = ends[1].strip().equals("-") ? Double.POSITIVE_INFINITY : Double.parseDouble(ends[1].strip());
            return new Range(Double.parseDouble(ends[0].strip()), text.startsWith("["), to, text.endsWith("]"));
        }

        boolean holds(double ratio) {
            boolean beyondFrom = takesFrom ? Numbers.atLeast(ratio, from) : Numbers.above(ratio, from);
            return beyondFrom && (takesTo ? !Numbers.above(ratio, to) : !Numbers.atLeast(ratio, to));
        }
    }
}
