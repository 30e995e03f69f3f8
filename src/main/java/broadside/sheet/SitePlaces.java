package broadside.sheet;

import broadside.panel.BannerFence;
import broadside.panel.Board;
import broadside.panel.FacadePanel;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import broadside.sheet.Block.Fact;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** Positions for the site sheet: what is set out from where. */
final class SitePlaces implements Item.Kinds<List<Fact>> {

    /** More than these are left to the drawing. */
    private static final int MOST_BOARDS = 5;

    private final Format format;

    SitePlaces(Format format) {
        this.format = format;
    }

    @Override
    public List<Fact> postSign(PostSign sign) {
        List<Fact> facts = new ArrayList<>();
        List<String> boards = new ArrayList<>();
        for (int i = 0; i < Math.min(MOST_BOARDS, sign.boards().size()); i++) {
            Board b = sign.boards().get(i);
            boards.add((sign.boards().size() == 1 ? "" : sign.part(i) + " ") + b.width().typed() + " by " + b.height().typed() + ", lower edge " + b.clearance().typed()
                + " above the ground" + (b.offset().metres() == 0 ? "" : ", middle " + b.offset().typed() + " from the middle of the posts"));
        }
        if (sign.boards().size() > MOST_BOARDS) {
            boards.add((sign.boards().size() - MOST_BOARDS) + " more as on the drawing");
        }
        facts.add(Fact.of(sign.boards().size() == 1 ? "Board" : "Boards", String.join("; ", boards)));
        facts.add(Fact.of("Posts", sign.posts().count() == 1 ? "one" : sign.posts().count() + ", from the middle: "
            + sign.posts().positions().stream().map(x -> (x < 0 ? "-" : "") + format.length(Math.abs(x))).collect(Collectors.joining(", "))));
        return facts;
    }

    @Override
    public List<Fact> hoarding(Hoarding hoarding) {
        return List.of(Fact.of("Hoarding", hoarding.length().typed() + " long, " + hoarding.height().typed() + " high"),
            Fact.of("Posts", hoarding.spacing().map(s -> "at " + s.typed() + " from the left end, one at each end and beside each gate").orElse("spacing not given")),
            Fact.of("Gates", hoarding.gates().isEmpty() ? "none" : String.join("; ", hoarding.gates().stream().map(g -> g.width().typed() + " wide from " + g.from().typed()).toList())));
    }

    @Override
    public List<Fact> bannerFence(BannerFence fence) {
        return List.of(Fact.of("Panels", fence.count() + " of " + fence.panelLength().typed() + " by " + fence.panelHeight().typed()));
    }

    @Override
    public List<Fact> facadePanel(FacadePanel facade) {
        return List.of(Fact.of("Panel", facade.width().typed() + " by " + facade.height().typed() + ", lower edge " + facade.bottom().typed() + " above the ground, "
            + facade.fromCorner().typed() + " from the corner"));
    }

    @Override
    public List<Fact> projectingSign(ProjectingSign sign) {
        return List.of(Fact.of("Sign", sign.projection().typed() + " by " + sign.height().typed() + ", lower edge " + sign.bottom().typed() + " above the ground"),
            Fact.of("Brackets", sign.brackets().count() + sign.brackets().spacing().map(s -> ", " + s.typed() + " apart").orElse("")));
    }

    @Override
    public List<Fact> spannedBanner(SpannedBanner banner) {
        return List.of(Fact.of("Banner", banner.width().typed() + " by " + banner.height().typed() + ", lower edge " + banner.bottom().typed() + " above the ground, sag "
            + banner.sag().typed()));
    }
}
