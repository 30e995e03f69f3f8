package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.Foot;
import broadside.action.FootActions.Standing;
import broadside.action.FootActions;
import broadside.action.PanelCases;
import broadside.action.Reaction;
import broadside.aero.Cable;
import broadside.panel.SpannedBanner;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Loads on a banner between two supports: force, line pull by the parabola and by the catenary, and what each end must take. */
final class BannerLoads {

    private static final String STATICS = "statics of a cable";

    static Loads of(SpannedBanner banner, ItemLoads by) {
        Trace sheet = by.sheet();
        List<PanelCases> panels = by.panels(banner.mark(), "", banner.panels(), sheet);
        List<CaseAction> cases = FootActions.of(panels, by.symbols(), new Standing("", Foot.NONE, List.of()), sheet).cases();
        CaseAction worst = ItemLoads.most(cases, CaseAction::baseShear);
        CaseAction uneven = ItemLoads.most(cases, c -> c.force() * (0.5 + Math.abs(c.side()) / banner.width().metres()));
        return new Loads(by.velocity(banner.panels()), cases, Map.of("base-shear", worst), Loads.Supports.of(ends(banner, worst, uneven, by), Optional.empty()),
            Optional.empty(), by.code().level(by.job().site()), 0, Foot.NONE);
    }

    private static List<Reaction> ends(SpannedBanner banner, CaseAction worst, CaseAction uneven, ItemLoads by) {
        Trace sheet = by.sheet();
        String span = by.symbols().width();
        double length = banner.width().metres();
        double sag = sheet.given("s", "sag: how far the middle bows out", banner.sag().metres(), "m", banner.sag().typed());
        double w = line(sheet, "line-load", "w", "wind force for each metre of span, case " + worst.name()).in("F", worst.force(), "N").in(span, length, "m")
            .gives("F / " + span, worst.force() / length, "N/m");
        double pull = line(sheet, "line-pull", "H", "pull along the span, all lines together, by the parabola").in("w", w, "N/m").in(span, length, "m").in("s", sag, "m")
            .gives("w " + span + "² / (8 s)", Cable.parabola(w, length, sag), "N");
        double a = line(sheet, "catenary-parameter", "a", "parameter of the catenary of the same sag: a (cosh(" + span + " / 2a) - 1) = s").in(span, length, "m").in("s", sag, "m")
            .reads("found by iteration", Cable.catenary(length, sag), "m");
        double catenary = line(sheet, "line-pull/catenary", "H_c", "the same by the catenary").in("w", w, "N/m").in("a", a, "m").gives("w a", w * a, "N");
        double larger = line(sheet, "line-pull/larger", "H_m", "the larger of the two").in("H", pull, "N").in("H_c", catenary, "N").gives("max(H; H_c)", Math.max(pull, catenary), "N");
        double share = 0.5 + Math.abs(uneven.side()) / length;
        double across = line(sheet, "end-reaction", "R", "what one end takes along the wind, case " + uneven.name()).in("F", uneven.force(), "N")
            .reads("force times its distance from the other end, over the span", uneven.force() * share, "N");
        double end = line(sheet, "end-pull", "T", "resultant at one end").in("H_m", larger, "N").in("R", across, "N").gives("(H_m² + R²)^0.5",
            Math.hypot(larger, across), "N");
        return List.of(new Reaction("end-pull", "Resultant at one end", end, "N", uneven.name()),
            new Reaction("line-pull/larger", "Pull along the span, the larger of both curves", larger, "N", worst.name()),
            new Reaction("line-pull", "Pull along the span, by the parabola", pull, "N", worst.name()),
            new Reaction("line-pull/catenary", "Pull along the span, by the catenary", catenary, "N", worst.name()),
            new Reaction("end-reaction", "What one end takes along the wind", across, "N", uneven.name()));
    }

    private static Trace.Line line(Trace sheet, String step, String symbol, String meaning) {
        return sheet.line(step, symbol, meaning).from(STATICS, Status.DERIVED);
    }

    private BannerLoads() { }
}
