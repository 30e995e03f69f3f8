package broadside.assess;

import broadside.assess.Carried.Part;
import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Footing;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.panel.PostType;
import broadside.panel.Posts;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import broadside.quantity.Length;
import java.util.Optional;

/** An item with what was found for it as if it had been typed: other winds are then checked against the same posts and footings. */
record Frozen(Carried carried) implements Item.Kinds<Item> {

    @Override
    public Item postSign(PostSign sign) {
        Posts posts = new Posts(sign.posts().count(), sign.posts().spacing(), sign.posts().section(), type(sign.posts().type()));
        return new PostSign(sign.mark(), sign.boards(), sign.faces(), posts, footing(sign.footing()), Optional.empty(), sign.carrying());
    }

    @Override
    public Item hoarding(Hoarding h) {
        Hoarding.Held held = h.held().kentledge().isPresent() ? h.held() : new Hoarding.Held(type(h.held().posts()), footing(h.held().footing()), Optional.empty());
        return new Hoarding(h.mark(), h.length(), h.height(), h.clearance(), h.solidity(), h.returnLeft(), h.returnRight(), h.shelter(), h.gates(), h.spacing(), held, h.carrying());
    }

    @Override
    public Item bannerFence(BannerFence fence) {
        return fence;
    }

    @Override
    public Item facadePanel(FacadePanel facade) {
        return facade;
    }

    @Override
    public Item projectingSign(ProjectingSign sign) {
        return sign;
    }

    @Override
    public Item spannedBanner(SpannedBanner banner) {
        return banner;
    }

    /** The section and grade of the answer. */
    private PostType type(PostType typed) {
        Optional<String> found = carried.part("posts").flatMap(p -> text(p, "section"));
        return found.map(text -> text.split(", ")).map(words -> new PostType(Optional.of(words[0]), Optional.empty(), Optional.of(words[1]), typed.deflection(), typed.duration()))
            .orElse(typed);
    }

    private Optional<Footing> footing(Optional<Footing> typed) {
        Optional<Part> part = carried.part("footing").filter(p -> p.refused().isEmpty());
        if (part.isEmpty()) {
            return typed;
        }
        Footing of = typed.orElseGet(() -> new Footing(Footing.Kind.PLANTED, true, Optional.empty(), Optional.empty(), Optional.empty(), Footing.Soil.UNKNOWN,
            Footing.Ground.UNKNOWN));
        return Optional.of(new Footing(of.kind(), of.round(), size(part.get(), "width"), of.kind() == Footing.Kind.PAD ? size(part.get(), "length") : of.length(),
            size(part.get(), "depth"), of.soil(), of.ground()));
    }

    private static Optional<Length> size(Part part, String key) {
        return part.results().stream().filter(r -> r.key().equals(key)).findFirst().map(r -> Length.metres(r.value()));
    }

    private static Optional<String> text(Part part, String key) {
        return part.results().stream().filter(r -> r.key().equals(key)).findFirst().map(Carried.Result::text);
    }
}
