package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.Reaction;
import broadside.panel.PostSign;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;

/** Upper bracket for two faces that open in a V: both loaded as if the other were not there. No code result, and outside the scope. */
final class VShape {

    static List<Reaction> of(PostSign sign, Map<String, CaseAction> governing, Trace sheet) {
        if (sign.faces().opening() == 0) {
            return List.of();
        }
        CaseAction shear = governing.get("base-shear");
        CaseAction moment = governing.get("base-moment");
        double force = sheet.line("upper-bracket/force", "F_V", "upper bracket of the shear at the ground, both faces loaded").in("F_b", shear.baseShear(), "N")
            .from("own rule: upper bracket", Status.DERIVED).gives("2 F_b", 2 * shear.baseShear(), "N");
        double turning = sheet.line("upper-bracket/moment", "M_V", "upper bracket of the moment at the ground, both faces loaded").in("M", moment.baseMoment(), "N m")
            .from("own rule: upper bracket", Status.DERIVED).gives("2 M", 2 * moment.baseMoment(), "N m");
        return List.of(new Reaction("upper-bracket/force", "Upper bracket, shear at the ground, both faces loaded", force, "N", shear.name()),
            new Reaction("upper-bracket/moment", "Upper bracket, moment at the ground, both faces loaded", turning, "N m", moment.name()));
    }

    private VShape() { }
}
