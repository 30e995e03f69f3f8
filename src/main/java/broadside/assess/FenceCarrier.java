package broadside.assess;

import broadside.action.CaseAction;
import broadside.assess.Carried.Part;
import broadside.assess.Carried.Result;
import broadside.panel.BannerFence;
import broadside.panel.FenceFeet;
import broadside.panel.Hoarding;
import broadside.panel.Kentledge;
import broadside.quantity.Mass;
import broadside.support.BallastNeed;
import broadside.support.Check;
import broadside.support.NoAnswer;
import broadside.support.PanelWind;
import broadside.support.StabilityResult;
import broadside.trace.Status;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Ballast, blocks and braces of fences and of hoardings. */
final class FenceCarrier {

    /** Rules that hold only below a limiting wind have keys that begin so. */
    private static final String EVACUATED = "evacuation";
    private static final double ROUNDING = 1e-9;

    /** A line of fence panels: hardest and easiest panel and the mean of the line, with the cover and without. */
    static Carried fence(BannerFence fence, CaseAction governing, Carriers by, Trace sheet) {
        List<PanelWind> winds = new ArrayList<>();
        for (String state : List.of("", BannerFence.BARE)) {
            for (String which : List.of("hardest", "easiest")) {
                found(sheet, "fence-panel-shear/" + which, state).ifPresent(force -> winds.add(new PanelWind(which + " panel, " + words(state), which + part(state),
                    new Check.In("F_f", force.value()), new Check.In("z_f", found(sheet, "fence-panel-arm/" + which, state).orElseThrow().value()), state.isEmpty())));
            }
        }
        winds.add(mean(fence, governing, sheet));
        StabilityResult standing;
        try {
            standing = by.rules().fences().assess(fence.feet(), fence.panelLength().metres(), winds, by.stability(), by.levels(sheet), sheet);
        } catch (NoAnswer e) {
            return refused(e.getMessage());
        }
        FenceFeet feet = fence.feet();
        List<Result> typed = new ArrayList<>();
        feet.footLength().ifPresent(l -> typed.add(Result.of("foot", "Foot, across the line", l.metres(), "m")));
        feet.brace().ifPresent(b -> typed.add(Result.of("lever", "From the line to the foot of each brace", b.lever().metres(), "m")));
        feet.blocks().forEach(b -> typed.add(Result.words("block", "Block of each panel, as typed", b.mass().typed() + " at " + b.lever().typed() + " from the line")));
        if (feet.stakes().proofLoad().isPresent()) {
            typed.add(Result.words("stakes", "Stakes, against tipping only", feet.stakes().count().orElse(1) + " on each side of a panel, proved to " + feet.stakes().proofLoad().get().typed()));
        }
        return carried(standing, "panel", feet.brace().isPresent(), typed, List.of(), by);
    }

    /** The whole line, shared by all its panels: what a line that is coupled must hold at least. */
    private static PanelWind mean(BannerFence fence, CaseAction governing, Trace sheet) {
        double n = sheet.given("n", "panels in the line", fence.count(), "1", "");
        double force = sheet.line("fence-panel-mean", "F_f", "force on the whole line shared by its panels, case " + governing.name()).in("F", governing.force(), "N").in("n", n)
            .from("statics", Status.DERIVED).gives("F / n", governing.force() / n, "N");
        double height = sheet.line("fence-panel-arm/mean", "z_f", "height of that force").from("statics", Status.DERIVED)
            .reads("height of the resultant of the case", governing.height(), "m");
        return new PanelWind("whole line, shared by its panels", "mean", new Check.In("F_f", force), new Check.In("z_f", height), true);
    }

    private static Optional<Step> found(Trace sheet, String step, String state) {
        return sheet.find(state.isEmpty() ? step : step + "/" + state);
    }

    private static String words(String state) {
        return state.isEmpty() ? "with its cover" : "cover taken off";
    }

    private static String part(String state) {
        return state.isEmpty() ? "" : "-bare";
    }

    /** A hoarding on raking braces: the worst post of each zone. */
    static Carried hoarding(Hoarding hoarding, Kentledge kentledge, Carriers by, Trace sheet) {
        List<PanelWind> winds = new ArrayList<>();
        for (Step step : List.copyOf(sheet.steps())) {
            if (step.name().startsWith("post-shear/")) {
                String zone = step.name().substring("post-shear/".length());
                double arm = sheet.find("post-lever-arm/" + zone).orElseThrow().value();
                winds.add(new PanelWind("post in zone " + zone.substring(zone.lastIndexOf('/') + 1), "zone-" + zone.replace('/', '-'), new Check.In("F_p", step.value()),
                    new Check.In("z_p", arm), true));
            }
        }
        StabilityResult standing;
        try {
            standing = by.rules().kentledge().assess(kentledge, hoarding.spacing().orElseThrow().metres(), winds, by.stability(), by.levels(sheet), sheet);
        } catch (NoAnswer e) {
            return refused(e.getMessage());
        }
        List<Result> typed = new ArrayList<>();
        kentledge.lever().ifPresent(l -> typed.add(Result.of("lever", "From the face to the middle of the ballast on each brace", l.metres(), "m")));
        typed.add(Result.words("typed", "Ballast as typed", kentledge.frontMass().map(Mass::typed).orElse("none") + " below the face and " + kentledge.mass().map(Mass::typed).orElse("none")
            + " on each brace"));
        return carried(standing, "post", true, typed, List.of("Posts, braces and their joints are not checked: only whether the frames tip, slide or lift."), by);
    }

    private static Carried carried(StabilityResult standing, String each, boolean braced, List<Result> typed, List<String> more, Carriers by) {
        BallastNeed need = standing.need();
        boolean enough = standing.checks().stream().allMatch(Check::passes);
        boolean face = each.equals("post");
        List<Result> results = new ArrayList<>();
        results.add(Result.words("standing", "As typed", enough ? "it stands by the rule named" : "it does NOT stand by the rule named; see what is needed"));
        results.add(Result.of("ballast-line", face ? "Needed on the foot below the face, each post" : "Needed on the line, each panel", need.line(), "kg"));
        if (braced) {
            results.add(Result.of("ballast-brace", "Needed on the foot of each brace", need.brace(), "kg"));
        }
        double block = by.rules().own().number("block-mass", "value").value();
        results.add(Result.words("blocks", "That is, in blocks of " + Math.round(block) + " kg", blocks(need.line(), block) + (face ? " at each post" : " on each panel")
            + (braced ? " and " + blocks(need.brace(), block) + " on each brace" : "")));
        results.add(Result.of("ballast-per-metre", "Needed in all along the line, in place of what was typed", standing.perMetre(), "kg/m"));
        results.add(Result.words("asked-by", "Asked for by", need.named()));
        results.addAll(typed);
        results.add(Result.words("rule", "Rule of stability", by.stability().title()));
        List<String> assumed = new ArrayList<>(standing.assumptions());
        if (by.job().basis().stability().isEmpty()) {
            assumed.add("The rule of stability was not chosen: the usual one with this code is taken, " + by.stability().title() + ".");
        }
        List<String> remarks = new ArrayList<>(standing.remarks());
        remarks.addAll(more);
        return new Carried(List.of(new Part("ballast", "Ballast and braces", results, standing.checks(), List.of(), assumed, by.stability().key().startsWith(EVACUATED)
            ? List.of("The rule of stability holds only where it is taken down, or people are kept away, before a limiting wind. That wind is not worked out here.") : List.of(), remarks,
            Optional.empty())));
    }

    static Carried refused(String why) {
        return new Carried(List.of(Part.refused("ballast", "Ballast and braces", why)));
    }

    private static long blocks(double mass, double block) {
        return (long) Math.ceil(mass / block - ROUNDING);
    }

    private FenceCarrier() { }
}
