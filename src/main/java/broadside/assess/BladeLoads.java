package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.EdgeOn;
import broadside.action.Foot;
import broadside.action.FootActions.Standing;
import broadside.action.FootActions;
import broadside.action.PanelCases;
import broadside.action.Reaction;
import broadside.panel.ProjectingSign;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Loads on a blade sign, by the rule for free-standing panels: indicative, since no code has a rule for it. The wind may
 * come from any direction: across the board it turns the brackets about the vertical, along the board it pulls at them.
 */
final class BladeLoads {

    private static final String STATICS = "statics: brackets share alike, set about the middle of the sign";

    static Loads of(ProjectingSign sign, ItemLoads by) {
        Trace sheet = by.sheet();
        List<PanelCases> panels = by.panels(sign.mark(), "wall", sign.panels(), sheet);
        List<CaseAction> cases = FootActions.of(panels, by.symbols(), new Standing("", Foot.WALL, List.of()), sheet).cases();
        Map<String, CaseAction> governing = Map.of("base-shear", ItemLoads.most(cases, CaseAction::baseShear),
            "base-moment", ItemLoads.most(cases, CaseAction::baseMoment));
        EdgeOn edgeOn = by.edgeOn(sign.panels(), i -> sign.depth().metres());
        double weight = Weights.of(sign.mass(), "mass of the sign", sheet);
        List<Reaction> reactions = brackets(sign, governing, edgeOn, weight, sheet);
        Optional<Carried> carried = by.carriers().flatMap(c -> sign.fixings().map(f -> FixingCarrier.blade(sign, f, governing, edgeOn, by, c)));
        return new Loads(by.velocity(sign.panels()), cases, governing, Loads.Supports.of(reactions, carried), Optional.of(edgeOn),
            by.code().level(by.job().site()), weight, Foot.WALL);
    }

    private static List<Reaction> brackets(ProjectingSign sign, Map<String, CaseAction> governing, EdgeOn edgeOn, double weight, Trace sheet) {
        double n = sheet.given("n", "number of brackets", sign.brackets().count(), "1", "");
        CaseAction across = governing.get("base-shear");
        CaseAction turning = governing.get("base-moment");
        List<Reaction> found = new ArrayList<>();
        double shear = line(sheet, "bracket-shear", "V_k", "shear of one bracket along the wall, case " + across.name()).in("F_b", across.baseShear(), "N").in("n", n)
            .gives("F_b / n", across.baseShear() / n, "N");
        found.add(new Reaction("bracket-shear", "Shear of each bracket, wind across the sign", shear, "N", across.name()));
        double moment = line(sheet, "bracket-moment", "M_k", "moment of one bracket about the vertical, case " + turning.name()).in("M_w", turning.baseMoment(), "N m")
            .in("n", n).gives("M_w / n", turning.baseMoment() / n, "N m");
        found.add(new Reaction("bracket-moment", "Moment of each bracket about the vertical, wind across the sign", moment, "N m", turning.name()));
        double pull = line(sheet, "bracket-pull", "N_k", "pull or push on one bracket, wind at right angles to the wall").in("F_e", edgeOn.force(), "N").in("n", n)
            .gives("F_e / n", edgeOn.force() / n, "N");
        found.add(new Reaction("bracket-pull", "Pull or push on each bracket, wind at right angles to the wall (own rule)", pull, "N", "edge-on"));
        if (weight > 0) {
            found.addAll(ofWeight(sign, weight, n, sheet));
        }
        return found;
    }

    /** The couple of the weight: the top bracket is pulled off the wall, the lowest pressed on it. */
    private static List<Reaction> ofWeight(ProjectingSign sign, double weight, double n, Trace sheet) {
        double arm = sheet.given("x_b", "middle of the sign from the wall", sign.panels().get(0).middle(), "m", "");
        double moment = line(sheet, "weight-moment", "M_W", "moment of the weight at the wall").in("W", weight, "N").in("x_b", arm, "m").gives("W x_b", weight * arm, "N m");
        double each = line(sheet, "bracket-weight", "W_k", "weight on one bracket").in("W", weight, "N").in("n", n).gives("W / n", weight / n, "N");
        List<Reaction> found = new ArrayList<>(List.of(new Reaction("bracket-weight", "Weight on each bracket", each, "N", "")));
        if (sign.brackets().spread() == 0) {
            found.add(new Reaction("weight-moment", "Moment of the weight on the bracket", moment, "N m", ""));
            return found;
        }
        double spread = sheet.given("a", "from the lowest bracket to the highest", sign.brackets().spread(), "m", "");
        double couple = line(sheet, "bracket-couple", "T_k", "pull of the highest bracket and push of the lowest from the weight").in("M_W", moment, "N m").in("a", spread, "m")
            .gives("M_W / a", moment / spread, "N");
        found.add(new Reaction("bracket-couple", "Pull of the highest bracket, push of the lowest, from the weight", couple, "N", ""));
        return found;
    }

    private static Trace.Line line(Trace sheet, String step, String symbol, String meaning) {
        return sheet.line(step, symbol, meaning).from(STATICS, Status.DERIVED);
    }

    private BladeLoads() { }
}
