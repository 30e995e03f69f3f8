package broadside.assess;

import broadside.action.CaseAction;
import broadside.assess.Carried.Part;
import broadside.assess.Carried.Result;
import broadside.panel.BannerFence;
import broadside.panel.Hoarding;
import broadside.panel.Kentledge;
import broadside.support.BallastNeed;
import broadside.support.Check;
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
        StabilityResult standing = by.rules().fences().assess(fence.feet(), fence.panelLength().metres(), winds, by.stability(), by.levels(sheet), sheet);
        return new Carried(List.of(ballast(standing, "panel", fence.feet().brace().isPresent(), by)));
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
        StabilityResult standing = by.rules().kentledge().assess(kentledge, hoarding.spacing().orElseThrow().metres(), winds, by.stability(), by.levels(sheet), sheet);
        Part part = ballast(standing, "post", true, by);
        List<String> remarks = new ArrayList<>(part.remarks());
        remarks.add("Posts, braces and their joints are not checked: only whether the frames tip, slide or lift.");
        return new Carried(List.of(new Part(part.key(), part.title(), part.results(), part.checks(), List.of(), part.assumed(), remarks, Optional.empty())));
    }

    private static Part ballast(StabilityResult standing, String each, boolean braced, Carriers by) {
        BallastNeed need = standing.need();
        List<Result> results = new ArrayList<>();
        boolean enough = standing.checks().stream().allMatch(Check::passes);
        results.add(Result.words("standing", "As typed", enough ? "it stands by the rule named" : "it does NOT stand by the rule named; see what is needed"));
        results.add(Result.of("ballast-line", braced && each.equals("post") ? "Needed on the foot below the face, each post" : "Needed on the line, each " + each, need.line(), "kg"));
        if (braced) {
            results.add(Result.of("ballast-brace", "Needed on the foot of each brace", need.brace(), "kg"));
        }
        results.add(Result.of("ballast-per-metre", "Needed in all along the line", standing.perMetre(), "kg/m"));
        results.add(Result.words("asked-by", "Asked for by", need.named()));
        results.add(Result.words("rule", "Rule of stability", by.stability().title()));
        return new Part("ballast", "Ballast and braces", results, standing.checks(), List.of(), standing.assumptions(), standing.remarks(), Optional.empty());
    }

    private FenceCarrier() { }
}
