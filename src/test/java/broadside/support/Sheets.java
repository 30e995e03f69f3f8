package broadside.support;

import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.List;

/** What the tests of posts read from a sheet. */
final class Sheets {

    /** A sheet on which the loads of a rule stand, as the choice of a section records them. */
    static Trace with(LoadSymbols s, DesignLoad load) {
        Trace trace = new Trace();
        trace.given(s.moment(), "moment", load.moment(), "N m", "");
        trace.given(s.shear(), "shear", load.shear(), "N", "");
        trace.given(s.torsion(), "torsion", load.torsion(), "N m", "");
        trace.given(s.weakMoment(), "moment along", load.weakMoment(), "N m", "");
        trace.given(s.weakShear(), "shear along", load.weakShear(), "N", "");
        trace.given(s.axial(), "compression", load.axial(), "N", "");
        return trace;
    }

    static double value(Trace trace, String step) {
        return trace.find(step).map(Step::value).orElseThrow(() -> new AssertionError(step + " is not among " + trace.steps().stream().map(Step::name).toList()));
    }

    static boolean has(Trace trace, String step) {
        return trace.find(step).isPresent();
    }

    static Check check(List<Check> checks, String name) {
        return checks.stream().filter(c -> c.name().equals(name)).findFirst().orElseThrow(() -> new AssertionError(name + " is not among " + checks));
    }

    private Sheets() { }
}
