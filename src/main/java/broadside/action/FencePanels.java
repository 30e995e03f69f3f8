package broadside.action;

import broadside.aero.LineLoad;
import broadside.codes.LoadCase;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/** What each panel of a line must take by itself: panels of a temporary fence are not counted on to help each other. */
public final class FencePanels {

    private static final String STATICS = "statics: each panel carries the wind on itself";

    /** The worst of all cases on one panel. */
    private record Worst(int panel, PanelForce of, double force) {
        double moment() {
            return force * of.height();
        }
    }

    /**
     * Shear and moment at the foot of the hardest panel of the line and of the easiest one.
     *
     * @param line    the whole line with its cases
     * @param length  of one panel, m
     * @param count   number of panels
     * @param what    the line in words, such as "with its cover"
     */
    public static List<Reaction> of(PanelCases line, double length, int count, String what, Trace trace) {
        List<Worst> worst = new ArrayList<>();
        List<Along> cases = line.cases().stream().map(load -> PanelForce.of(line.panel(), load)).map(of -> new Along(of, of.line())).toList();
        for (int i = 0; i < count; i++) {
            worst.add(worst(cases, i, length));
        }
        Worst most = worst.stream().reduce((a, b) -> b.moment() > a.moment() * (1 + 1e-9) ? b : a).orElseThrow();
        Worst least = worst.stream().reduce((a, b) -> b.moment() < a.moment() * (1 - 1e-9) ? b : a).orElseThrow();
        List<Reaction> reactions = new ArrayList<>(record("hardest", most, what, trace));
        if (least.panel() != most.panel()) {
            reactions.addAll(record("easiest", least, what, trace));
        }
        return reactions;
    }

    /** A case and how it is spread along the line. */
    private record Along(PanelForce of, LineLoad line) { }

    private static Worst worst(List<Along> cases, int index, double length) {
        Worst worst = null;
        for (Along each : cases) {
            double force = each.line().force(index * length, (index + 1) * length);
            if (worst == null || force * each.of().height() > worst.moment() * (1 + 1e-9)) {
                worst = new Worst(index, each.of(), force);
            }
        }
        return worst;
    }

    private static List<Reaction> record(String which, Worst worst, String what, Trace trace) {
        String named = worst.of().load().name();
        String label = which + " panel of the line " + what + ", number " + (worst.panel() + 1) + " from the left, case " + LoadCase.shortName(named);
        double shear = trace.line("fence-panel-shear/" + which, "F_f", "shear at the foot of the " + label).from(STATICS, Status.DERIVED)
            .reads("the pressures over the length of this panel", worst.force(), "N");
        double arm = trace.line("fence-panel-arm/" + which, "z_f", "height of that force").from(STATICS, Status.DERIVED)
            .reads("height of the resultant of the case", worst.of().height(), "m");
        double moment = trace.line("fence-panel-moment/" + which, "M_f", "moment at the ground of the " + label).in("F_f", shear, "N").in("z_f", arm, "m")
            .from(STATICS, Status.DERIVED).gives("F_f z_f", shear * arm, "N m");
        return List.of(new Reaction("fence-panel-shear/" + which, "Shear at the foot, " + label, shear, "N", named),
            new Reaction("fence-panel-moment/" + which, "Moment at the ground, " + label, moment, "N m", named));
    }

    private FencePanels() { }
}
