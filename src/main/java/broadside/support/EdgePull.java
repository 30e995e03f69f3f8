package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Pull along the edges of a banner that sags between two of them: a parabola, T = w L²/(8 s).
 *
 * @param pull       along one edge, N/m
 * @param total      on one whole edge, N
 * @param resultant  of that pull and half the wind force, N
 */
public record EdgePull(double pull, double total, double resultant) {

    private static final String PARABOLA = "statics: cable of small sag, a parabola";

    /**
     * Works out one banner.
     *
     * @param wind  net pressure, recorded before, Pa
     * @param span  between the edges that hold it, m
     * @param edge  length of such an edge, m
     * @param sag   in the middle, m
     * @throws UnfitAnswer  for a sag that is none
     */
    public static EdgePull of(Check.In wind, double span, double edge, double sag, Trace trace) {
        if (!(sag > 0)) {
            throw new UnfitAnswer("sag", "a banner that does not sag would pull without end: type the sag in its middle");
        }
        String w = wind.symbol();
        double l = trace.given("L_1", "span of the banner", span, "m", "");
        double b = trace.given("b_e", "length of an edge that holds it", edge, "m", "");
        double s = trace.given("s_1", "sag in the middle", sag, "m", "");
        double force = trace.line("edge-force", "F_1", "wind force on the banner").in(w, wind.value(), "Pa").in("L_1", l, "m").in("b_e", b, "m")
            .from("statics", Status.DERIVED).gives(w + " L_1 b_e", wind.value() * l * b, "N");
        double pull = trace.line("edge-pull", "T_e", "pull along the edge").in(w, wind.value(), "Pa").in("L_1", l, "m").in("s_1", s, "m")
            .from(PARABOLA, Status.DERIVED).gives(w + " L_1² / (8 s_1)", wind.value() * (l * l) / (8 * s), "N/m");
        double total = trace.line("edge-pull-total", "T_t", "the same on one whole edge").in("T_e", pull, "N/m").in("b_e", b, "m")
            .from("statics", Status.DERIVED).gives("T_e b_e", pull * b, "N");
        double half = trace.line("edge-share", "F_2", "wind force on one edge, square to the banner").in("F_1", force, "N").from("statics", Status.DERIVED)
            .gives("F_1 / 2", force / 2, "N");
        double resultant = trace.line("edge-resultant", "R_e", "pull and wind together, on one edge").in("T_t", total, "N").in("F_2", half, "N")
            .from("statics", Status.DERIVED).gives("(T_t² + F_2²)^0.5", Math.pow(total * total + half * half, 0.5), "N");
        return new EdgePull(pull, total, resultant);
    }
}
