package broadside.codes;

import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.panel.FacadePanel.Backing;
import broadside.panel.FacadePanel;
import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Components and cladding on the walls of buildings, ASCE 7 chapter 30: zone 5 along both vertical edges, zone 4 between
 * them. A sign on a solid wall takes them without internal pressure (29.3.2). The values for low buildings that are
 * allowed up to 90 ft for some shapes are not used.
 */
final class Asce7Cladding {

    private final Constants constants;
    private final Rows external;
    private final Rows internal;
    private final Asce7Velocity velocity;
    private final Asce7Attached attached;
    private final Asce7WallZones zones;
    private final Status equations;
    private final String chapter;

    Asce7Cladding(Edition edition, Asce7Velocity velocity, Asce7Attached attached) {
        this.constants = new Constants(edition);
        this.external = edition.rows("wall-cladding");
        this.internal = edition.rows("internal-pressure");
        this.velocity = velocity;
        this.attached = attached;
        this.zones = new Asce7WallZones(edition);
        this.equations = Asce7.equations(edition);
        this.chapter = constants.source("cladding-low-height").citation();
    }

    /** Effective wind area with the two areas between which GC_p changes, m2. */
    private record Area(double effective, double small, double large) { }

    /** Velocity pressures on the windward face of the wall and on the others. */
    private record Faces(Asce7Pressure windward, Asce7Pressure other) { }

    /** What the zones of one panel are worked out from; the least pressures come from chapter 30 and from the panel as a free-standing sign. */
    private record Sheet(Site site, WindCode code, boolean low, Faces faces, double flatRoof, double internal, double least, OptionalDouble free,
                         List<Strip> strips, Trace trace) { }

    List<LoadCase> cases(FacadePanel facade, Site site, WindCode code, Trace trace) {
        double h = height(facade, trace);
        boolean low = !Numbers.above(h, constants.metres("cladding-low-height"));
        Asce7Pressure top = velocity.inLoads(new Asce7Velocity.Point(site, h, Asce7Use.CLADDING_TOP), trace);
        Asce7Pressure windward = low ? top : atPanel(facade, site, trace);
        double a = zones.edge(facade, h, low, trace);
        List<Strip> strips = zones.strips(facade, a, trace);
        OptionalDouble free = attached.freeStanding(facade, site, code, trace);
        Sheet sheet = new Sheet(site, code, low, new Faces(windward, top), flatRoof(facade, low, trace), internal(facade, trace), least(trace), free, strips, trace);
        Area area = area(facade, low, trace);
        return List.of(one(sheet, area, "pushed", "pushed towards the wall"), one(sheet, area, "pulled", "pulled off the wall"));
    }

    private double height(FacadePanel facade, Trace trace) {
        double given = trace.given("h_b", "height of the building", facade.building().height().metres(), "m", facade.building().height().typed());
        return line(trace, chapter, equations, "reference-height", "h", "mean height of the roof, taken as the height of the building").in("h_b", given, "m")
            .gives("h_b", given, "m");
    }

    /** High building: the windward face has the velocity pressure at its own height; that of the top of the panel is the largest on it. */
    private Asce7Pressure atPanel(FacadePanel facade, Site site, Trace trace) {
        Trace part = trace.part("pushed");
        double z = line(part, chapter, equations, "reference-height", "z", "height of the top of the panel").in("g", facade.bottom().metres(), "m")
            .in("s", facade.height().metres(), "m").gives("g + s", facade.bottom().metres() + facade.height().metres(), "m");
        return velocity.inLoads(new Asce7Velocity.Point(site, z, Asce7Use.CLADDING), part);
    }

    private double flatRoof(FacadePanel facade, boolean low, Trace trace) {
        double limit = constants.number("flat-roof-slope");
        boolean flat = low && facade.building().roofSlope().filter(slope -> !Numbers.above(Math.toDegrees(slope.radians()), limit)).isPresent();
        if (!flat) {
            return 1;
        }
        Source place = constants.source("flat-roof-factor");
        return line(trace, place.citation(), place.status(), "flat-roof-factor", "k_r", "reduction for a roof that is nearly flat")
            .reads(constants.text("flat-roof-factor") + ", as the slope of the roof, " + facade.building().roofSlope().get().typed() + ", is not above "
                + constants.text("flat-roof-slope") + " degrees", constants.number("flat-roof-factor"), "1");
    }

    private double internal(FacadePanel facade, Trace trace) {
        if (facade.backing() == Backing.WALL) {
            return constants.entry("attached-internal").into(trace.line("internal-coefficient", "C_{pi}", "internal pressure coefficient GC_pi: none for a sign on a solid wall"));
        }
        return internal.number(facade.building().enclosure().word(), "value")
            .into(trace.line("internal-coefficient", "C_{pi}", "internal pressure coefficient GC_pi of either sign, " + facade.building().enclosure().word() + " building"));
    }

    private double least(Trace trace) {
        Source place = constants.source("cladding-minimum-pressure");
        return line(trace, place.citation(), place.status(), "minimum-pressure", "p_{16}", "least pressure on cladding, either way")
            .reads(constants.text("cladding-minimum-pressure") + " psf", constants.pascals("cladding-minimum-pressure"), "Pa");
    }

    private Area area(FacadePanel facade, boolean low, Trace trace) {
        double b = facade.width().metres();
        double s = facade.height().metres();
        double parts = constants.number("effective-width-divisor");
        Source place = constants.source("effective-width-divisor");
        double effective = line(trace, place.citation(), place.status(), "effective-area", "A", "effective wind area: the span, by the width or a third of the span if that is more")
            .in("B", b, "m").in("s", s, "m").gives("max(B; s) max(min(B; s); max(B; s) / " + Numbers.plain(parts) + ")",
                Math.max(b, s) * Math.max(Math.min(b, s), Math.max(b, s) / parts), "m²");
        String row = (low ? "low" : "high") + "/pushed/4";
        return new Area(effective, limit(row, "small", "A_1", trace), limit(row, "large", "A_2", trace));
    }

    private double limit(String row, String end, String symbol, Trace trace) {
        Coefficient printed = external.number(row, end + "-area");
        return line(trace, printed.source().citation(), printed.source().status(), "area-limit/" + end, symbol, "area at which GC_p is printed, the " + end + " one")
            .reads(Numbers.plain(printed.value()) + " ft²", printed.value() * Unit.of(Dimension.AREA, "ft2").orElseThrow().toSi(), "m²");
    }

    private LoadCase one(Sheet sheet, Area area, String load, String label) {
        List<ZonePressure> found = new ArrayList<>();
        for (Strip strip : sheet.strips()) {
            String zone = strip.name();
            Optional<ZonePressure> before = found.stream().filter(z -> z.zone().equals(zone)).findFirst();
            double c = before.isPresent() ? before.get().coefficient() : coefficient(sheet, area, load, zone);
            double p = before.isPresent() ? before.get().pressure() : pressure(sheet, load, zone, c);
            found.add(new ZonePressure(zone, "p_" + lowered(load, zone), strip.from(), strip.to(), strip.width(), c, p));
        }
        return new LoadCase(load, label, Windward.NONE, found, 0, Optional.empty(), 0, 0);
    }

    /** Below the line: 4+ for pressure in zone 4, 4- for suction. */
    private static String lowered(String load, String zone) {
        return "{" + zone + (load.equals("pushed") ? "+" : "-") + "}";
    }

    /** External and internal pressure together, on the velocity pressure of the face. */
    private double coefficient(Sheet sheet, Area area, String load, String zone) {
        String symbol = "C_" + lowered(load, zone);
        boolean pushed = load.equals("pushed");
        String row = (sheet.low() ? "low/" : "high/") + load + "/" + zone;
        Status status = external.number(row, "small").source().status();
        double gcp = external(row, area, sheet.trace().line("external-coefficient/" + load + "/" + zone, symbol + "'", "external pressure coefficient GC_p of zone " + zone));
        boolean unlike = pushed && !sheet.low();
        double ratio = unlike ? sheet.faces().other().q() / sheet.faces().windward().q() : 1;
        Trace.Line line = line(sheet.trace(), chapter, status, "coefficient/" + load + "/" + zone, symbol, "net pressure coefficient of zone " + zone + ", " + load)
            .in(symbol + "'", gcp).in("C_{pi}", sheet.internal());
        if (sheet.flatRoof() != 1) {
            line.in("k_r", sheet.flatRoof());
        }
        if (unlike) {
            line.in("q_h", sheet.faces().other().q(), "Pa").in("q_z", sheet.faces().windward().q(), "Pa");
        }
        return line.gives((sheet.flatRoof() == 1 ? "" : "k_r ") + symbol + "' " + (pushed ? "+" : "-") + " C_{pi}" + (unlike ? " q_h / q_z" : ""),
            gcp * sheet.flatRoof() + (pushed ? 1 : -1) * sheet.internal() * ratio, "1");
    }

    /** GC_p runs straight over the logarithm of the area between the two printed areas and is constant beyond them. */
    private double external(String row, Area area, Trace.Line line) {
        Coefficient small = external.number(row, "small");
        Coefficient large = external.number(row, "large");
        if (!Numbers.above(area.effective(), area.small())) {
            return new Coefficient(small.value(), "1", small.source(), "printed for " + external.text(row, "small-area") + " ft² and less").into(line);
        }
        if (Numbers.atLeast(area.effective(), area.large())) {
            return new Coefficient(large.value(), "1", large.source(), "printed for " + external.text(row, "large-area") + " ft² and more").into(line);
        }
        Status straight = Status.of(external.text(row, "straight")).orElseThrow();
        String first = Numbers.plain(Math.abs(small.value()));
        String formula = first + " + (" + Numbers.plain(Math.abs(large.value())) + " - " + first + ") ln(A / A_1) / ln(A_2 / A_1)";
        double value = small.value() + (large.value() - small.value()) * Math.log(area.effective() / area.small()) / Math.log(area.large() / area.small());
        return line.in("A", area.effective(), "m²").in("A_1", area.small(), "m²").in("A_2", area.large(), "m²")
            .from(small.source().citation(), small.source().status().weaker(straight)).gives(small.value() < 0 ? "-(" + formula + ")" : formula, value, "1");
    }

    private double pressure(Sheet sheet, String load, String zone, double c) {
        boolean pushed = load.equals("pushed");
        String symbol = "C_" + lowered(load, zone);
        Asce7Pressure q = pushed ? sheet.faces().windward() : sheet.faces().other();
        double least = Math.max(sheet.least(), sheet.free().orElse(0));
        double value = pushed ? Math.max(q.value() * c, least) : Math.min(q.value() * c, -least);
        String sign = pushed ? "" : "-";
        String formula = (pushed ? "max(" : "min(") + q.text() + " " + symbol + "; " + sign + "p_{16}" + (sheet.free().isPresent() ? "; " + sign + "p_f)" : ")");
        return NetPressure.record(sheet.site(), sheet.code().level(sheet.site()), sheet.trace(), load + "/" + zone, "p_" + lowered(load, zone), (name, own) -> {
            Trace.Line line = q.into(line(sheet.trace(), chapter, equations, name, own, "net pressure in zone " + zone + ", " + load + ", not below 16 psf either way"))
                .in(symbol, c).in("p_{16}", sheet.least(), "Pa");
            return sheet.free().isPresent() ? line.in("p_f", sheet.free().getAsDouble(), "Pa") : line;
        }, formula, value);
    }

    private static Trace.Line line(Trace trace, String place, Status status, String step, String symbol, String meaning) {
        return trace.line(step, symbol, meaning).from(place, status);
    }
}
