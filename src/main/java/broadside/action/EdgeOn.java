package broadside.action;

import broadside.table.Coefficient;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Wind along the face: pressure on the edge of the panel and friction on both faces. A rule of this tool and of no
 * code; it gives the weak-axis case of a post.
 *
 * @param force   N
 * @param moment  at the ground line, N m
 */
public record EdgeOn(double force, double moment) {

    /** Works out one panel; depth in metres, zero where it is not known. */
    public static EdgeOn of(Rows rule, double width, double height, double middle, double depth, double q, Trace trace) {
        Coefficient edge = rule.number("edge-coefficient", "value");
        Coefficient friction = rule.number("friction-coefficient", "value");
        double ce = edge.into(trace.line("edge-coefficient", "c_e", "drag coefficient of the edge"));
        double cf = friction.into(trace.line("friction-coefficient", "c_{fr}", "friction coefficient of a face, the roughest printed"));
        Status status = edge.source().status().weaker(friction.source().status());
        double force = trace.line("force/edge-on", "F_e", "force of wind along the face: own rule, of no code").in("q", q, "Pa").in("c_e", ce)
            .in("d", depth, "m").in("h", height, "m").in("c_{fr}", cf).in("b", width, "m").from("own rule: edge-on case", status)
            .gives("q (c_e d h + 2 c_{fr} b h)", q * (ce * depth * height + 2 * cf * width * height), "N");
        double moment = trace.line("base-moment/edge-on", "M_e", "moment at the ground line, wind along the face").in("F_e", force, "N")
            .in("z", middle, "m").from("own rule: edge-on case", status).gives("F_e z", force * middle, "N m");
        return new EdgeOn(force, moment);
    }

    public EdgeOn plus(EdgeOn other) {
        return new EdgeOn(force + other.force, moment + other.moment);
    }
}
