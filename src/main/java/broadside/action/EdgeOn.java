package broadside.action;

import broadside.codes.PanelSymbols;
import broadside.panel.Panel;
import broadside.table.Coefficient;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;

/**
 * Wind along the face: pressure on the edge of the panel and friction on both faces. A rule of this tool and of no
 * code; it gives the weak-axis case of a post.
 *
 * @param force   N
 * @param moment  at the ground line, N m
 */
public record EdgeOn(double force, double moment) {

    /**
     * The wind along the face in the terms of a code.
     *
     * @param pressure  recorded before as q_m, Pa
     * @param friction  friction coefficient of the code, where it prints one
     */
    public record Wind(double pressure, PanelSymbols symbols, Optional<Coefficient> friction) { }

    /** Works out one panel; depth in metres, zero where it is not known. */
    public static EdgeOn of(Rows rule, Panel panel, double depth, Wind wind, Trace trace) {
        Coefficient edge = rule.number("edge-coefficient", "value");
        Coefficient friction = wind.friction().orElse(rule.number("friction-coefficient", "value"));
        double q = wind.pressure();
        PanelSymbols symbols = wind.symbols();
        double ce = edge.into(trace.line("edge-coefficient", "c_d", "drag coefficient of the edge"));
        double cf = friction.into(trace.line("friction-coefficient", "c_{fr}", "friction coefficient of a face, the roughest printed"));
        Status status = edge.source().status().weaker(friction.source().status());
        double pressure = trace.line("pressure/edge-on", "q_e", "pressure of the wind along the face").from("own rule: edge-on case", status)
            .in("q_m", q, "Pa").gives("q_m", q, "Pa");
        double d = trace.given("d", "thickness of the panel, zero where it is not given", depth, "m", "");
        String b = symbols.width();
        String h = symbols.height();
        double force = trace.line("force/edge-on", "F_e", "force of wind along the face: own rule, of no code").in("q_e", pressure, "Pa").in("c_d", ce)
            .in("d", d, "m").in(h, panel.height(), "m").in("c_{fr}", cf).in(b, panel.width(), "m").from("own rule: edge-on case", status)
            .gives("q_e (c_d d " + h + " + 2 c_{fr} " + b + " " + h + ")", pressure * (ce * d * panel.height() + 2 * cf * panel.width() * panel.height()), "N");
        double middle = trace.line("lever-arm/edge-on", "z_m", "height of the middle of the panel").in(symbols.gap(), panel.clearance(), "m")
            .in(h, panel.height(), "m").from("statics", Status.DERIVED).gives(symbols.gap() + " + " + h + " / 2", panel.clearance() + panel.height() / 2, "m");
        double moment = trace.line("base-moment/edge-on", "M_e", "moment at the ground line, wind along the face").in("F_e", force, "N")
            .in("z_m", middle, "m").from("own rule: edge-on case", status).gives("F_e z_m", force * middle, "N m");
        return new EdgeOn(force, moment);
    }

    public EdgeOn plus(EdgeOn other) {
        return new EdgeOn(force + other.force, moment + other.moment);
    }
}
