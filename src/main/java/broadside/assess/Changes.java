package broadside.assess;

import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.FenceFeet;
import broadside.panel.Footing;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.Kentledge;
import broadside.panel.PostSign;
import broadside.panel.PostType;
import broadside.panel.Posts;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import broadside.quantity.Show;
import broadside.table.Rows;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What would change the limit of an item that is as it was found: the item with one thing changed, by what was changed.
 *
 * @param carried  what was found
 * @param own      what this tool takes for each change
 */
record Changes(Carried carried, Rows own) implements Item.Kinds<Map<String, Item>> {

    private double value(String key) {
        return own.number(key, "value").value();
    }

    @Override
    public Map<String, Item> postSign(PostSign sign) {
        Map<String, Item> changed = new LinkedHashMap<>();
        heavier(sign.posts().type()).ifPresent(t -> changed.put("posts of " + t.section().orElseThrow(), new PostSign(sign.mark(), sign.boards(), sign.faces(),
            new Posts(sign.posts().count(), sign.posts().spacing(), sign.posts().section(), t), sign.footing(), Optional.empty(), sign.carrying())));
        sign.footing().ifPresent(f -> changed.put(words(f), new PostSign(sign.mark(), sign.boards(), sign.faces(), sign.posts(), Optional.of(more(f)), Optional.empty(), sign.carrying())));
        return changed;
    }

    @Override
    public Map<String, Item> hoarding(Hoarding h) {
        Map<String, Item> changed = new LinkedHashMap<>();
        if (h.held().kentledge().isPresent()) {
            changed.put("half as much ballast again", held(h, new Hoarding.Held(h.held().posts(), Optional.empty(), Optional.of(half(h.held().kentledge().get())))));
            return changed;
        }
        heavier(h.held().posts()).ifPresent(t -> changed.put("posts of " + t.section().orElseThrow(), held(h, new Hoarding.Held(t, h.held().footing(), Optional.empty()))));
        h.held().footing().ifPresent(f -> changed.put(words(f), held(h, new Hoarding.Held(h.held().posts(), Optional.of(more(f)), Optional.empty()))));
        return changed;
    }

    private static Hoarding held(Hoarding h, Hoarding.Held held) {
        return new Hoarding(h.mark(), h.length(), h.height(), h.clearance(), h.solidity(), h.returnLeft(), h.returnRight(), h.shelter(), h.gates(), h.spacing(), held, h.carrying());
    }

    private Kentledge half(Kentledge k) {
        return new Kentledge(again(k.mass()), k.lever(), again(k.frontMass()), k.faceMass(), k.surface());
    }

    private Optional<Mass> again(Optional<Mass> mass) {
        return mass.map(m -> Mass.kilograms(value("more-ballast") * m.kilograms()));
    }

    @Override
    public Map<String, Item> bannerFence(BannerFence fence) {
        Map<String, Item> changed = new LinkedHashMap<>();
        double mesh = value("mesh-solidity");
        if (fence.coverSolidity() > mesh) {
            changed.put("a mesh that is " + Math.round(100 * mesh) + " % closed in place of the cover", new BannerFence(fence.mark(), fence.panelLength(), fence.panelHeight(), fence.count(),
                mesh, fence.fenceSolidity(), fence.fenceKnown(), fence.shelter(), fence.feet(), fence.carrying()));
        }
        FenceFeet feet = fence.feet();
        double block = value("block-mass");
        List<FenceFeet.Block> blocks = new ArrayList<>(feet.blocks());
        for (int i = 0; i < value("more-blocks"); i++) {
            blocks.add(new FenceFeet.Block(Mass.kilograms(block), Length.metres(0)));
        }
        changed.put(Math.round(value("more-blocks")) + " more blocks of " + Show.both(Mass.kilograms(block)) + " on each panel", on(fence, new FenceFeet(feet.panelMass(), feet.footMass(), feet.footLength(),
            blocks, feet.brace(), feet.surface(), feet.stakes())));
        double mass = value("brace-mass");
        FenceFeet.Brace brace = feet.brace().map(b -> new FenceFeet.Brace(b.lever(), Mass.kilograms(2 * b.mass().kilograms())))
            .orElseGet(() -> new FenceFeet.Brace(Length.metres(value("brace-reach")), Mass.kilograms(mass)));
        changed.put(feet.brace().isPresent() ? "twice the mass on each brace" : "a brace that reaches " + Show.both(Length.metres(value("brace-reach"))) + " behind each panel, with " + Show.both(Mass.kilograms(mass)) + " on its foot",
            on(fence, new FenceFeet(feet.panelMass(), feet.footMass(), feet.footLength(), feet.blocks(), Optional.of(brace), feet.surface(), feet.stakes())));
        return changed;
    }

    private static BannerFence on(BannerFence fence, FenceFeet feet) {
        return new BannerFence(fence.mark(), fence.panelLength(), fence.panelHeight(), fence.count(), fence.coverSolidity(), fence.fenceSolidity(), fence.fenceKnown(), fence.shelter(), feet,
            fence.carrying());
    }

    @Override
    public Map<String, Item> facadePanel(FacadePanel facade) {
        return Map.of();
    }

    @Override
    public Map<String, Item> projectingSign(ProjectingSign sign) {
        return Map.of();
    }

    @Override
    public Map<String, Item> spannedBanner(SpannedBanner banner) {
        return Map.of();
    }

    /** The next heavier section that was tried and is used less than the one that was chosen. */
    private Optional<PostType> heavier(PostType type) {
        List<Carried.Choice> tried = carried.part("posts").map(Carried.Part::choices).orElse(List.of());
        Optional<Carried.Choice> chosen = tried.stream().filter(Carried.Choice::chosen).findFirst();
        return chosen.flatMap(now -> tried.stream().filter(c -> c.mass() > now.mass() && c.utilisation() < now.utilisation()).findFirst())
            .map(c -> new PostType(Optional.of(c.designation()), Optional.empty(), type.grade(), type.deflection(), type.duration()));
    }

    private String words(Footing footing) {
        return "footings " + Show.both(Length.metres(value("more-depth"))) + " " + (footing.kind() == Footing.Kind.PAD ? "wider and longer" : "deeper");
    }

    private Footing more(Footing f) {
        boolean pad = f.kind() == Footing.Kind.PAD;
        return new Footing(f.kind(), f.round(), pad ? f.width().map(this::longer) : f.width(), pad ? f.length().map(this::longer) : f.length(), pad ? f.depth() : f.depth().map(this::longer),
            f.soil(), f.ground());
    }

    private Length longer(Length length) {
        return Length.metres(length.metres() + value("more-depth"));
    }
}
