package broadside.crew;

import broadside.aero.InclinedPlate;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;

/** Force of the wind on a sheet that people carry, and the wind in which they can hold it. */
public final class Handling {

    private static final List<Integer> CREWS = List.of(1, 2, 4);
    private static final String AIR = "air-density";
    private static final String FACE_ON = "face-on";
    private static final String PEAK = "slanting-peak";

    /** Angles nearer than this are the same, rad. */
    private static final double NARROW = 1e-9;

    private final Figures own;
    private final Figures flow;

    /** A flat sheet, sides in metres. */
    public record Sheet(double width, double height) {

        public Sheet {
            UnfitFigure.positive("width", width, "2.44 m");
            UnfitFigure.positive("height", height, "1.22 m");
        }
    }

    /**
     * Gusts in which a number of people hold a sheet, m/s.
     *
     * @param faceOn    by the rule: 100 N a person, the sheet face on
     * @param anyAngle  the same when the sheet may stand at any angle to the wind
     * @param atStart   face on, with the push that lasts for a moment only: not for planning
     */
    public record Held(int people, double faceOn, double anyAngle, double atStart) { }

    /** Reads the numbers for handling, and the relation for slanting plates from those of open flow. */
    Handling(Edition crew, Edition openFlow) {
        Rows rows = crew.rows("handling");
        this.own = new Figures(rows);
        this.flow = new Figures(openFlow.rows("constants"));
        rows.keys().forEach(k -> own.value(k, "value"));
    }

    /**
     * Force on a sheet, N, recorded as "sheet-force"; its coefficient as "sheet-coefficient". Face on from an angle of the
     * table on; slanting by the relation for plates from whose edges the flow parts, at most the peak of compact plates;
     * edge on by friction on both faces.
     *
     * @param angle  between the wind and the plane of the sheet, rad, 0 edge on to π/2 face on
     * @param speed  gust, m/s
     * @throws UnfitFigure  for an angle outside that range or a speed that is none
     */
    public double force(Sheet sheet, double angle, double speed, Trace trace) {
        double area = area(sheet, trace);
        double v = trace.given("v", "gust", UnfitFigure.positive("speed", speed, "8 m/s"), "m/s", "");
        double rho = air(trace);
        double c = coefficient(angle, trace);
        double q = trace.line("sheet-pressure", "q", "dynamic pressure").in("ρ", rho, "kg/m³").in("v", v, "m/s")
            .from("definition of dynamic pressure", Status.DERIVED).gives("½ ρ v²", 0.5 * rho * v * v, "Pa");
        return trace.line("sheet-force", "F_s", "force on the sheet").in("q", q, "Pa").in("C_s", c).in("A_s", area, "m²")
            .from("definition of the coefficient", Status.DERIVED).gives("q C_s A_s", q * c * area, "N");
    }

    private double coefficient(double angle, Trace trace) {
        if (!(angle >= 0 && angle <= Math.PI / 2 + NARROW)) {
            throw new UnfitFigure("angle", "the angle between the wind and the sheet goes from 0 (edge on) to 90 degrees (face on)");
        }
        double alpha = trace.given("α", "angle between the wind and the sheet", angle, "rad", "");
        double from = own.line("face-on-from", "face-on-from", "α_1", "angle from which it counts as face on", trace)
            .reads("read at face-on-from, in degrees", Math.toRadians(own.value("face-on-from", "value")), "rad");
        if (alpha >= from - NARROW) {
            return own.line(FACE_ON, "sheet-coefficient", "C_s", "coefficient of the sheet, face on", trace).in("α", alpha, "rad").in("α_1", from, "rad")
                .reads("read at face-on", own.value(FACE_ON, "value"), "1");
        }
        double friction = own.record("edge-friction", "value", "edge-friction", "c_f", "friction on one face", "1", trace);
        if (alpha <= NARROW) {
            return own.line("edge-friction", "sheet-coefficient", "C_s", "coefficient of the sheet, edge on, both faces", trace).in("c_f", friction)
                .gives("2 c_f", 2 * friction, "1");
        }
        double peak = peak(trace);
        double a = flow.value("inclined-constant", "value");
        double b = flow.value("inclined-slope", "value");
        double slanting = flow.line("inclined-slope", "slanting-coefficient", "C_N", "force square to an endless plate", trace).in("α", alpha, "rad")
            .gives("1 / (" + Figures.plain(a) + " + " + Figures.plain(b) + " / sin(α))", InclinedPlate.normalForce(alpha, a, b), "1");
        return trace.line("sheet-coefficient", "C_s", "coefficient of the sheet, slanting").in("C_N", slanting).in("C_p", peak).in("c_f", friction)
            .from("own rule: at most the peak of compact plates, at least friction", Status.RECALLED)
            .gives("max(min(C_N; C_p); 2 c_f)", Math.max(Math.min(slanting, peak), 2 * friction), "1");
    }

    private double peak(Trace trace) {
        return own.record(PEAK, "value", "slanting-peak", "C_p", "greatest coefficient of a compact sheet, slanting", "1", trace);
    }

    /** Gusts in which one, two and four people hold a sheet. */
    public List<Held> held(Sheet sheet, Trace trace) {
        return held(sheet, CREWS, trace);
    }

    /**
     * Gusts in which numbers of people hold a sheet, recorded as "handling-speed/N", "handling-speed-any-angle/N" and "handling-speed-start/N".
     *
     * @throws UnfitFigure  for less than one person
     */
    public List<Held> held(Sheet sheet, List<Integer> crews, Trace trace) {
        if (crews.stream().anyMatch(n -> n < 1)) {
            throw new UnfitFigure("people", "at least one person holds it");
        }
        double area = area(sheet, trace);
        double rho = air(trace);
        Figure face = number(FACE_ON, "face-on-coefficient", "C_1", "coefficient of the sheet, face on", "1", trace);
        Figure peak = new Figure("C_p", peak(trace), own.source(PEAK).status());
        Figure push = number("push", "push", "F_1", "what one person holds", "N", trace);
        Figure start = number("push-start", "push-start", "F_0", "what one person pushes for a moment", "N", trace);
        return crews.stream().map(people -> {
            Crowd crowd = new Crowd(people, area, rho, trace);
            return new Held(people, crowd.gust("handling-speed", push, face, "gust in which they hold it face on"),
                crowd.gust("handling-speed-any-angle", push, peak, "gust in which they hold it at any angle"),
                crowd.gust("handling-speed-start", start, face, "gust in which they hold it face on for a moment"));
        }).toList();
    }

    /** A number under its symbol. */
    private record Figure(String symbol, double value, Status status) { }

    private Figure number(String key, String step, String symbol, String meaning, String unit, Trace trace) {
        return new Figure(symbol, own.record(key, "value", step, symbol, meaning, unit, trace), own.source(key).status());
    }

    private record Crowd(int people, double area, double rho, Trace trace) {

        double gust(String step, Figure push, Figure drag, String meaning) {
            String n = "n_{" + people + "}";
            double count = trace.given(n, "people who hold it", people, "1", "");
            return trace.line(step + "/" + people, "v_{h}", meaning).in(n, count).in(push.symbol(), push.value(), "N").in("ρ", rho, "kg/m³")
                .in(drag.symbol(), drag.value()).in("A_s", area, "m²")
                .from("own rule for handling: the push of each person against the force on the sheet", push.status().weaker(drag.status()))
                .gives("(2 " + n + " " + push.symbol() + " / (ρ " + drag.symbol() + " A_s))^0.5",
                    Math.sqrt(2 * count * push.value() / (rho * drag.value() * area)), "m/s");
        }
    }

    private double area(Sheet sheet, Trace trace) {
        double b = trace.given("b", "width of the sheet", sheet.width(), "m", "");
        double h = trace.given("h", "height of the sheet", sheet.height(), "m", "");
        return trace.line("sheet-area", "A_s", "area of the sheet").in("b", b, "m").in("h", h, "m").from("geometry", Status.DERIVED).gives("b h", b * h, "m²");
    }

    private double air(Trace trace) {
        return own.record(AIR, "value", AIR, "ρ", "air density", "kg/m³", trace);
    }
}
