package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.FencePanels;
import broadside.action.Foot;
import broadside.action.FootActions.Standing;
import broadside.action.FootActions;
import broadside.action.PanelCases;
import broadside.action.Reaction;
import broadside.codes.NotCovered;
import broadside.panel.BannerFence;
import broadside.table.OutsideTable;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Loads on a line of temporary fence panels, with the cover and once the cover is down. */
final class FenceLoads {

    static Loads of(BannerFence fence, ItemLoads by) {
        List<PanelCases> covered = by.panels(fence.mark(), "line", fence.panels(), by.sheet());
        List<CaseAction> cases = new ArrayList<>(FootActions.of(covered, by.symbols(), new Standing("", Foot.GROUND, List.of()), by.sheet()).cases());
        List<Reaction> reactions = new ArrayList<>(FencePanels.of(covered.get(0), fence.panelLength().metres(), fence.count(), "with its cover", by.sheet()));
        var governing = ItemLoads.governing(cases);
        Trace part = by.sheet().part(BannerFence.BARE);
        bare(fence, by, part).ifPresent(line -> {
            cases.addAll(FootActions.of(List.of(line), by.symbols(), new Standing(BannerFence.BARE, Foot.GROUND, List.of()), part).cases());
            reactions.addAll(FencePanels.of(line, fence.panelLength().metres(), fence.count(), "without its cover", part));
        });
        Optional<Carried> carried = by.carriers().map(c -> FenceCarrier.fence(fence, governing.get("base-shear"), c, by.sheet()));
        return new Loads(by.velocity(fence.panels()), cases, governing, Loads.Supports.of(reactions, carried), Optional.of(by.edgeOn(fence.panels(), i -> 0)),
            by.code().level(by.job().site()), 0, Foot.GROUND);
    }

    /** The bare line; a code that has no rule for so open a fence leaves it out, and the notes say so. */
    private static Optional<PanelCases> bare(BannerFence fence, ItemLoads by, Trace part) {
        try {
            return Optional.of(by.panels(fence.mark(), "line", List.of(fence.bare()), part).get(0));
        } catch (NotCovered | OutsideTable e) {
            return Optional.empty();
        }
    }

    private FenceLoads() { }
}
