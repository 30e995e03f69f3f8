package broadside.sheet;

import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import broadside.quantity.Length;
import broadside.sheet.Block.Fact;
import java.util.ArrayList;
import java.util.List;

/** What an item is, as typed, for the check list: one method for each kind. */
final class ItemFacts implements Item.Kinds<List<Fact>> {

    private final Format format;
    private final List<Fact> facts = new ArrayList<>();

    private ItemFacts(Format format) {
        this.format = format;
    }

    static List<Fact> of(Item item, Format format) {
        return item.choose(new ItemFacts(format));
    }

    @Override
    public List<Fact> postSign(PostSign sign) {
        fact("Faces", Integer.toString(sign.faces().count()));
        for (int i = 0; i < sign.boards().size(); i++) {
            var b = sign.boards().get(i);
            String which = sign.boards().size() == 1 ? "" : " " + sign.part(i);
            fact("Board" + which, b.shape().word() + ", width " + b.width().typed() + ", height " + b.height().typed() + ", depth "
                + (b.depth().metres() > 0 ? b.depth().typed() : CheckList.NOT_GIVEN));
            fact("Clear height below" + which, b.clearance().typed());
            fact("Overall height" + which, format.length(b.clearance().metres() + b.height().metres()));
            fact("Mass" + which, b.mass().map(m -> m.typed()).orElse(""));
            fact("Middle of board from middle of posts" + which, b.offset().metres() == 0 ? "in the middle" : b.offset().typed() + ", positive to the right");
        }
        fact("Posts", sign.posts().count() + sign.posts().spacing().map(s -> " at " + s.typed()).orElse(""));
        sign.replaces().ifPresent(b -> fact("Old board on the same post", b.width().typed() + " by " + b.height().typed() + ", " + b.clearance().typed()
            + " above the ground"));
        return facts;
    }

    @Override
    public List<Fact> hoarding(Hoarding hoarding) {
        fact("Length and height", hoarding.length().typed() + " by " + hoarding.height().typed());
        fact("Gap below", hoarding.clearance().metres() == 0 ? "none" : hoarding.clearance().typed());
        fact("Overall height", format.length(hoarding.clearance().metres() + hoarding.height().metres()));
        fact("Returns", "left " + orNone(hoarding.returnLeft()) + ", right " + orNone(hoarding.returnRight()));
        fact("Gates", hoarding.gates().isEmpty() ? "none" : String.join("; ", hoarding.gates().stream()
            .map(g -> g.width().typed() + " wide from " + g.from().typed()).toList()));
        fact("Posts", hoarding.spacing().map(s -> "at " + s.typed()).orElse(""));
        return facts;
    }

    @Override
    public List<Fact> bannerFence(BannerFence fence) {
        fact("Panels", fence.count() + " of " + fence.panelLength().typed() + " by " + fence.panelHeight().typed());
        fact("Length of the line", format.length(fence.length()));
        fact("Solidity of the bare fence", format.plain(fence.fenceSolidity()));
        return facts;
    }

    @Override
    public List<Fact> facadePanel(FacadePanel facade) {
        fact("Width and height", facade.width().typed() + " by " + facade.height().typed());
        fact("Lower edge above the ground", facade.bottom().typed());
        fact("From the nearer corner of the building", facade.fromCorner().typed());
        fact("Building", facade.building().width().typed() + " wide on this face, " + facade.building().depth().typed() + " deep, "
            + facade.building().height().typed() + " high");
        fact("Roof slope", facade.building().roofSlope().map(a -> a.typed()).orElse(""));
        fact("Behind the panel", facade.backing() == FacadePanel.Backing.WALL ? "a solid wall: external pressure only"
            : "nothing: the panel is the skin of the building, internal pressure acts too");
        fact("Gap to the wall", facade.gap().map(Length::typed).orElse(""));
        fact("Mass", facade.mass().map(m -> m.typed()).orElse(""));
        return facts;
    }

    @Override
    public List<Fact> projectingSign(ProjectingSign sign) {
        fact("Projection and height", sign.projection().typed() + " by " + sign.height().typed());
        fact("Lower edge above the ground", sign.bottom().typed());
        fact("Gap to the wall", sign.gap().metres() == 0 ? "none" : sign.gap().typed());
        fact("Thickness", sign.depth().metres() == 0 ? "" : sign.depth().typed());
        fact("Brackets", sign.brackets().count() + sign.brackets().spacing().map(s -> " at " + s.typed()).orElse(""));
        fact("Mass", sign.mass().map(m -> m.typed()).orElse(""));
        return facts;
    }

    @Override
    public List<Fact> spannedBanner(SpannedBanner banner) {
        fact("Width and height", banner.width().typed() + " by " + banner.height().typed());
        fact("Lower edge above the ground", banner.bottom().typed());
        fact("Sag", banner.sag().typed());
        return facts;
    }

    private void fact(String label, String value) {
        facts.add(Fact.of(label, value.isBlank() ? CheckList.NOT_GIVEN : value));
    }

    private static String orNone(Length length) {
        return length.metres() == 0 ? "none" : length.typed();
    }
}
