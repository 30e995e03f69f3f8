package broadside.codes;

import broadside.aero.InclinedPlate;
import broadside.aero.SkinFriction;
import broadside.panel.Panel;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/** What plain fluid mechanics says beside the load: the wind at 45 degrees, and friction when it blows along the panel. */
final class OpenFlowAside {

    private static final String NOT_USED = "; for information, not used in the loads";
    private static final double ANGLE = Math.PI / 4;

    private final Constants constants;

    OpenFlowAside(Edition edition) {
        this.constants = new Constants(edition);
    }

    /** Records the lines; velocity pressure in Pa, Reynolds number on the smaller side. */
    void record(Panel panel, double q, double reynolds, Trace trace) {
        inclined(panel, trace);
        friction(panel, q, reynolds, trace);
    }

    private void inclined(Panel panel, Trace trace) {
        double sine = trace.line("inclined/sine", "s_α", "sine of the angle between the wind and the panel" + NOT_USED)
            .from("geometry", Status.DERIVED).reads("at 45 degrees", Math.sin(ANGLE), "1");
        double a = constants.number("inclined-constant");
        double b = constants.number("inclined-slope");
        line(trace, "inclined-constant", "inclined/normal-force-coefficient", "C_N", "force square to an endless panel in wind at 45 degrees" + NOT_USED)
            .in("s_α", sine).gives("1 / (" + Numbers.plain(a) + " + " + Numbers.plain(b) + " / s_α)", InclinedPlate.normalForce(ANGLE, a, b), "1");
        trace.line("inclined/centre-of-pressure", "x_{cp}", "its place from the windward edge, as a part of the width" + NOT_USED)
            .from("Rayleigh and Kirchhoff, flow that parts from the edges", Status.SECOND_HAND)
            .reads("1/2 - (3/4) cos α / (4 + π sin α) at 45 degrees", InclinedPlate.centreOfPressure(ANGLE), "1");
        double e = constants.number("inclined-eccentricity");
        line(trace, "inclined-eccentricity", "inclined/eccentricity", "e_α",
            "how far the force on a compact panel moves to the windward edge in wind at 45 degrees, where it can be as large as head-on" + NOT_USED)
            .in("b", panel.width(), "m").gives(Numbers.plain(e) + " b", e * panel.width(), "m");
    }

    private void friction(Panel panel, double q, double reynolds, Trace trace) {
        double along = trace.line("skin-friction-reynolds-number", "R_L", "Reynolds number along the panel").in("R_e", reynolds).in("b", panel.width(), "m")
            .in("h", panel.height(), "m").from("definition of the Reynolds number", Status.DERIVED)
            .gives("R_e b / min(b; h)", reynolds * panel.width() / Math.min(panel.width(), panel.height()), "1");
        if (along > constants.number("friction-logarithmic-to")) {
            return;
        }
        double cf = coefficient(along, trace);
        trace.line("skin-friction-force", "F_s", "friction on both faces of a smooth panel in wind along it; codes take several times as much" + NOT_USED)
            .in("C_F", cf).in("q", q, "Pa").in("b", panel.width(), "m").in("h", panel.height(), "m").from("definition of the friction coefficient", Status.DERIVED)
            .gives("2 C_F q b h", 2 * cf * q * panel.width() * panel.height(), "N");
    }

    private double coefficient(double along, Trace trace) {
        String name = "skin-friction-coefficient";
        if (along < constants.number("friction-laminar-to")) {
            double c = constants.number("friction-laminar");
            return line(trace, "friction-laminar", name, "C_F", "friction coefficient of one smooth face, laminar layer").in("R_L", along)
                .gives(Numbers.plain(c) + " / R_L^0.5", SkinFriction.power(along, c, 0.5), "1");
        }
        if (along <= constants.number("friction-turbulent-to")) {
            double c = constants.number("friction-turbulent");
            double n = constants.number("friction-exponent");
            return line(trace, "friction-turbulent", name, "C_F", "friction coefficient of one smooth face, turbulent layer").in("R_L", along)
                .gives(Numbers.plain(c) + " / R_L^" + Numbers.plain(n), SkinFriction.power(along, c, n), "1");
        }
        double c = constants.number("friction-logarithmic");
        double n = constants.number("friction-power");
        return line(trace, "friction-logarithmic", name, "C_F", "friction coefficient of one smooth face, turbulent layer").in("R_L", along)
            .gives(Numbers.plain(c) + " / (ln(R_L) / ln(10))^" + Numbers.plain(n), SkinFriction.logarithmic(along, c, n), "1");
    }

    private Trace.Line line(Trace trace, String constant, String step, String symbol, String meaning) {
        Source source = constants.source(constant);
        return trace.line(step, symbol, meaning).from(source.citation(), source.status());
    }
}
