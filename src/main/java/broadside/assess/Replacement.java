package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.Foot;
import broadside.action.FootActions.Standing;
import broadside.action.FootActions;
import broadside.action.PanelCases;
import broadside.action.Reaction;
import broadside.codes.WindCode;
import broadside.panel.Board;
import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;

/** A new sign on an old post: how much more the post must take than before. A ratio, never a check of the post. */
final class Replacement {

    static List<Reaction> of(PostSign sign, Job job, WindCode code, Map<String, CaseAction> governing, Trace sheet) {
        if (sign.replaces().isEmpty()) {
            return List.of();
        }
        Trace part = sheet.part(PostSign.REPLACED);
        Panel old = sign.replacedPanel().orElseThrow();
        part.given(code.symbols().width(), "width of the old board", old.width(), "m", old.typed().width());
        part.given(code.symbols().height(), "height of the old board", old.height(), "m", old.typed().height());
        part.given(code.symbols().gap(), "gap below the old board", old.clearance(), "m", old.typed().clearance());
        part.given("x_b", "middle of the old board from the middle of the posts, to the right", old.middle(), "m", old.typed().middle());
        List<CaseAction> cases = FootActions.of(List.of(new PanelCases(old, code.netPressures(old, job.site(), part))), code.symbols(),
            new Standing(PostSign.REPLACED, Foot.GROUND, List.of()), part).cases();
        Map<String, CaseAction> governed = ItemLoads.governing(cases);
        double newArea = sheet.given("A_{new}", "area of the new boards", sign.panels().stream().mapToDouble(Panel::area).sum(), "m²", "");
        Board board = sign.replaces().orElseThrow();
        double share = board.areaShare();
        double oldArea = sheet.given("A_{old}", "area of the old board, which was a " + board.shape().word(), share * old.area(), "m²", "");
        double area = line(sheet, "area", "r_A", "area of the new boards over that of the old one").in("A_{new}", newArea, "m²").in("A_{old}", oldArea, "m²")
            .gives("A_{new} / A_{old}", newArea / oldArea, "1");
        CaseAction now = governing.get("base-moment");
        CaseAction then = governed.get("base-moment");
        double after = line(sheet, "new", "M_{new}", "governing moment at the ground by the wind on the new boards, without the posts").in("F", now.force(), "N")
            .reads("force times height of the governing case", now.force() * now.height(), "N m");
        double shape = line(sheet, "shape", "k_A", "share of the rectangle around it that the old board filled").reads(board.shape().word(), share, "1");
        double before = line(sheet, "old", "M_{old}", "governing moment at the ground by the wind on the old board").in("k_A", shape).in("M", then.baseMoment(), "N m")
            .gives("k_A M", shape * then.baseMoment(), "N m");
        double ratio = line(sheet, "moment", "r_M", "moment at the ground with the new boards over that with the old one").in("M_{new}", after, "N m")
            .in("M_{old}", before, "N m").gives("M_{new} / M_{old}", after / before, "1");
        return List.of(new Reaction("replacement-ratio/area", "Area of the new sign over that of the old one", area, "1", ""),
            new Reaction("replacement-ratio/moment", "Moment at the ground, new sign over old one", ratio, "1", governing.get("base-moment").name()));
    }

    private static Trace.Line line(Trace sheet, String what, String symbol, String meaning) {
        return sheet.line("replacement-ratio/" + what, symbol, meaning).from("statics", Status.DERIVED);
    }

    private Replacement() { }
}
