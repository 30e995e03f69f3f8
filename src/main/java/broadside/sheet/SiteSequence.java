package broadside.sheet;

import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Footing;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The order of work for the site sheet: common practice, in the words of those who build. */
final class SiteSequence implements Item.Kinds<List<String>> {

    private static final String SERVICES = "Locate buried services before anything is dug or driven.";
    private static final String CALM = "Work in calm weather, and stop when a sheet is hard to hold.";
    private static final String AFTER = "Inspect after every storm, and at the interval that the engineer sets.";

    @Override
    public List<String> postSign(PostSign sign) {
        List<String> order = new ArrayList<>(ground(sign.footing()));
        order.add("Hang the boards once the engineer says that the footing carries. " + CALM);
        order.add(AFTER);
        return order;
    }

    @Override
    public List<String> hoarding(Hoarding hoarding) {
        List<String> order = new ArrayList<>();
        if (hoarding.held().kentledge().isPresent()) {
            order.add("Set frames and braces out, and put the ballast on before the first board goes up.");
        } else {
            order.addAll(ground(hoarding.held().footing()));
        }
        order.add("Board from a braced bay outward; never leave a line of posts boarded that is not held. " + CALM);
        order.add("Gates shut, and their leaves held, in any wind.");
        order.add(AFTER);
        return order;
    }

    @Override
    public List<String> bannerFence(BannerFence fence) {
        return List.of("Set up and couple the whole line, with feet, braces and ballast in place.", "No cover goes on before the ballast and the braces named here stand.",
            "Covers come off first: agree beforehand who takes them down and how long that takes.", "Look at ballast, braces and ties each day and after every gust that moves anything.");
    }

    @Override
    public List<String> facadePanel(FacadePanel facade) {
        return List.of("Have the anchors for this wall chosen and pull-tested by a competent person.", "Set all fixings named here; one left out loads its neighbours.", CALM, AFTER);
    }

    @Override
    public List<String> projectingSign(ProjectingSign sign) {
        return List.of("Have the wall looked at and the anchors pull-tested by a competent person.", "Fix the highest bracket first, and hang the sign with lifting gear.", CALM, AFTER);
    }

    @Override
    public List<String> spannedBanner(SpannedBanner banner) {
        return List.of("Have both supports confirmed for the pull named in the summary by the engineer.", "Keep the sag: a tighter banner pulls harder.", CALM,
            "Take it down before strong wind.");
    }

    private static List<String> ground(Optional<Footing> footing) {
        boolean pad = footing.filter(f -> f.kind() == Footing.Kind.PAD).isPresent();
        return List.of(SERVICES, "Compare the ground in the hole with the class named here; stop if it is softer, wet, filled or sloping.",
            pad ? "Cast or set the pad on firm, level ground at the depth named, posts plumb; no load before it is hard."
                : "Dig to the depth named with undisturbed sides, compact the concrete in layers, posts plumb; no load before it is hard.");
    }
}
