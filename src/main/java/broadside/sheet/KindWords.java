package broadside.sheet;

import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;

/** What the drawing of each kind shows, in words. */
final class KindWords implements Item.Kinds<String> {

    @Override
    public String postSign(PostSign sign) {
        return "Elevation and side view of a sign of " + (sign.boards().size() == 1 ? "one board" : sign.boards().size() + " boards") + " on "
            + (sign.posts().count() == 1 ? "one post" : sign.posts().count() + " posts") + ": " + String.join("; ", sign.boards().stream()
            .map(b -> b.width().typed() + " wide, " + b.height().typed() + " high, " + b.clearance().typed() + " above the ground").toList());
    }

    @Override
    public String hoarding(Hoarding hoarding) {
        return "Elevation and side view of a hoarding " + hoarding.length().typed() + " long and " + hoarding.height().typed() + " high"
            + (hoarding.gates().isEmpty() ? "" : " with " + hoarding.gates().size() + (hoarding.gates().size() == 1 ? " gate" : " gates"));
    }

    @Override
    public String bannerFence(BannerFence fence) {
        return "Elevation and side view of a line of " + fence.count() + " fence panels, each " + fence.panelLength().typed() + " long and "
            + fence.panelHeight().typed() + " high";
    }

    @Override
    public String facadePanel(FacadePanel facade) {
        return "Elevation of a building face " + facade.building().width().typed() + " wide and " + facade.building().height().typed() + " high with a panel "
            + facade.width().typed() + " wide and " + facade.height().typed() + " high, " + facade.fromCorner().typed() + " from the corner and "
            + facade.bottom().typed() + " above the ground";
    }

    @Override
    public String projectingSign(ProjectingSign sign) {
        return "Elevation of a sign " + sign.height().typed() + " high that stands out " + sign.projection().typed() + " from a wall, "
            + sign.bottom().typed() + " above the ground, and its plan";
    }

    @Override
    public String spannedBanner(SpannedBanner banner) {
        return "Elevation of a banner " + banner.width().typed() + " wide and " + banner.height().typed() + " high between two supports, "
            + banner.bottom().typed() + " above the ground, and its plan with a sag of " + banner.sag().typed();
    }
}
