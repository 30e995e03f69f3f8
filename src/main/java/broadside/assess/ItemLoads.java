package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.EdgeOn;
import broadside.action.Foot;
import broadside.action.FootActions.Standing;
import broadside.action.FootActions;
import broadside.action.HoardingPosts;
import broadside.action.PanelCases;
import broadside.action.PostAction;
import broadside.action.PostDrag;
import broadside.action.Reaction;
import broadside.action.SignPosts;
import broadside.codes.MemberRule;
import broadside.codes.PanelSymbols;
import broadside.codes.WindCode;
import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import broadside.support.WindLevels;
import broadside.table.Rows;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;
import java.util.function.ToDoubleFunction;

/** From an item to its loads by one code: one method for each kind. */
final class ItemLoads implements Item.Kinds<Loads> {

    private final Job job;
    private final WindCode code;
    private final Rules rules;
    private final Optional<Carriers> carriers;
    private final Trace sheet;

    /** Rules of this tool and the rule for posts, beside the code. */
    record Rules(Rows edgeOn, Rows stacks, Optional<MemberRule> posts) { }

    /** Loads of an item; {@code carriers} is empty where they are loads only. */
    ItemLoads(Job job, WindCode code, Rules rules, Optional<Carriers> carriers, Trace sheet) {
        this.carriers = carriers;
        this.job = job;
        this.code = code;
        this.rules = rules;
        this.sheet = sheet;
    }

    @Override
    public Loads postSign(PostSign typed) {
        List<PanelCases> panels = panels(typed.mark(), "posts", typed.panels(), sheet);
        Optional<List<PanelCases>> one = Stack.of(typed, rules.stacks(), sheet).map(e -> panels(typed.mark(), "posts", e, sheet.part(PostSign.ENVELOPE)));
        EdgeOn edgeOn = edgeOn(typed.panels(), i -> typed.boards().get(i).depth().metres());
        Optional<SignCarrier> carrier = carriers.map(c -> new SignCarrier(c, typed, standing(panels, one, List.of(), sheet.quiet()).combinations(), edgeOn, this));
        PostSign sign = carrier.map(SignCarrier::sign).orElse(typed);
        List<PostDrag> drag = rules.posts().map(rule -> PostDrag.of(sign, code, rule, job.site(), sheet)).orElse(List.of());
        FootActions.Result actions = standing(panels, one, drag, sheet);
        List<PostAction> posts = SignPosts.of(sign.posts().positions(), actions.combinations(), drag, sheet);
        Map<String, CaseAction> governing = governing(actions.cases());
        double weight = Weights.boards(sign, sheet);
        List<Reaction> reactions = new ArrayList<>(Replacement.of(sign, job, code, governing, sheet));
        reactions.addAll(VShape.of(sign, governing, sheet));
        Optional<PostDrag> all = drag.stream().reduce(PostDrag::plus);
        Optional<Carried> carried = carrier.map(SignCarrier::carried);
        return new Loads(velocity(sign.panels()), actions.cases(), governing, new Loads.Supports(posts, all, reactions, Balances.sign(sign, actions.combinations(), posts),
            carried), Optional.of(edgeOn), code.level(job.site()), weight, Foot.GROUND);
    }

    /** Boards apart, and as one where they hang close to each other. */
    private FootActions.Result standing(List<PanelCases> panels, Optional<List<PanelCases>> one, List<PostDrag> drag, Trace trace) {
        FootActions.Result apart = FootActions.of(panels, code.symbols(), new Standing("", Foot.GROUND, drag), trace);
        return one.map(envelope -> apart.with(FootActions.of(envelope, code.symbols(), new Standing(PostSign.ENVELOPE, Foot.GROUND, drag), trace.part(PostSign.ENVELOPE))))
            .orElse(apart);
    }

    Optional<MemberRule> memberRule() {
        return rules.posts();
    }

    @Override
    public Loads hoarding(Hoarding hoarding) {
        List<PanelCases> panels = panels(hoarding.mark(), "hoarding", hoarding.panels(), sheet);
        FootActions.Result actions = FootActions.of(panels, code.symbols(), new Standing("", Foot.GROUND, List.of()), sheet);
        List<PostAction> posts = hoarding.spacing().map(spacing -> HoardingPosts.of(hoarding, spacing.metres(), panels, shut(hoarding),
            code.symbols(), sheet)).orElse(List.of());
        EdgeOn edgeOn = edgeOn(hoarding.panels(), i -> 0);
        Optional<Carried> carried = carriers.flatMap(c -> hoarding(hoarding, posts, edgeOn, c));
        return new Loads(velocity(hoarding.panels()), actions.cases(), governing(actions.cases()),
            new Loads.Supports(posts, Optional.empty(), List.of(), posts.isEmpty() ? List.of() : Balances.hoarding(hoarding, panels), carried),
            Optional.of(edgeOn), code.level(job.site()), 0, Foot.GROUND);
    }

    private Optional<Carried> hoarding(Hoarding hoarding, List<PostAction> posts, EdgeOn edgeOn, Carriers by) {
        boolean feet = job.remark(hoarding.mark(), "held-by").filter("its own feet"::equals).isPresent();
        if (hoarding.held().kentledge().isPresent() || feet && hoarding.held().footing().isEmpty()) {
            return Optional.of(hoarding.held().kentledge().isEmpty() || posts.isEmpty() ? FenceCarrier.refused("it stands on its own feet: the distance between its posts and the distance from "
                + "the face to the ballast are needed. Loads only.") : FenceCarrier.hoarding(hoarding, hoarding.held().kentledge().get(), by, sheet));
        }
        if (posts.isEmpty()) {
            return Optional.empty();
        }
        PostAction worst = posts.stream().max(Comparator.comparingDouble(PostAction::moment)).orElseThrow();
        PostDemands demands = PostDemands.of(hoarding, worst, edgeOn, posts.size(), by.rules().own().number("board-mass", "value"), sheet);
        PostCarrier carrier = new PostCarrier(by, hoarding.held().posts(), hoarding.held().footing(), demands, outline -> PostDrag.NONE);
        WindLevels levels = by.levels(sheet);
        return Optional.of(carrier.carry(carrier.choose(levels, sheet.quiet()), levels, sheet));
    }

    /** The whole wall while its gates are shut. */
    private Optional<PanelCases> shut(Hoarding hoarding) {
        return hoarding.gates().isEmpty() ? Optional.empty() : Optional.of(panels(hoarding.mark(), "hoarding", List.of(hoarding.shut()), sheet).get(0));
    }

    @Override
    public Loads bannerFence(BannerFence fence) {
        return FenceLoads.of(fence, this);
    }

    @Override
    public Loads facadePanel(FacadePanel facade) {
        return FacadeLoads.of(facade, this);
    }

    @Override
    public Loads projectingSign(ProjectingSign sign) {
        return BladeLoads.of(sign, this);
    }

    @Override
    public Loads spannedBanner(SpannedBanner banner) {
        return BannerLoads.of(banner, this);
    }

    /** What carries the item is checked by these; empty where it is loads only. */
    Optional<Carriers> carriers() {
        return carriers;
    }

    Job job() {
        return job;
    }

    WindCode code() {
        return code;
    }

    Trace sheet() {
        return sheet;
    }

    PanelSymbols symbols() {
        return code.symbols();
    }

    /** The panels with the load cases of the code; their sizes are noted as given. */
    List<PanelCases> panels(String mark, String middle, List<Panel> panels, Trace trace) {
        List<PanelCases> found = new ArrayList<>();
        for (Panel panel : panels) {
            giveDimensions(mark, middle, panel, trace);
            found.add(new PanelCases(panel, code.netPressures(panel, job.site(), trace.part(panel.part()))));
        }
        return found;
    }

    void giveDimensions(String mark, String middle, Panel panel, Trace trace) {
        String of = panel.part().isEmpty() ? mark : panel.part();
        PanelSymbols symbols = code.symbols();
        trace.given(symbols.width(), "width of " + of, panel.width(), "m", panel.typed().width());
        trace.given(symbols.height(), "height of " + of, panel.height(), "m", panel.typed().height());
        trace.given(symbols.gap(), "gap below " + of, panel.clearance(), "m", panel.typed().clearance());
        if (!middle.isEmpty()) {
            trace.given("x_b", "middle of " + of + " from the middle of the " + middle + ", to the right", panel.middle(), "m", panel.typed().middle());
        }
    }

    static Map<String, CaseAction> governing(List<CaseAction> cases) {
        return Map.of("base-shear", most(cases, CaseAction::baseShear), "base-moment", most(cases, CaseAction::baseMoment),
            "torsion", most(cases, c -> Math.abs(c.torsion())));
    }

    /** The first of the cases, wind on the front, that is not less than any other, within rounding. */
    static CaseAction most(List<CaseAction> cases, ToDoubleFunction<CaseAction> by) {
        CaseAction best = cases.get(0);
        for (CaseAction each : cases) {
            if (!each.direction().equals("back") && by.applyAsDouble(each) > by.applyAsDouble(best) * (1 + 1e-9)) {
                best = each;
            }
        }
        return best;
    }

    /** Wind along the face of every panel; the thickness by the index of the panel, m. */
    EdgeOn edgeOn(List<Panel> panels, IntToDoubleFunction depth) {
        EdgeOn sum = new EdgeOn(0, 0);
        for (int i = 0; i < panels.size(); i++) {
            Panel panel = panels.get(i);
            Trace part = sheet.part(panel.part());
            double height = sheet.find("reference-height" + suffix(panel)).orElseThrow().value();
            EdgeOn.Wind wind = new EdgeOn.Wind(code.memberPressure(job.site(), height, part.part("edge-on")), code.symbols(), code.friction("very rough"));
            sum = sum.plus(EdgeOn.of(rules.edgeOn(), panel, depth.applyAsDouble(i), wind, part));
        }
        return sum;
    }

    private static String suffix(Panel panel) {
        return panel.part().isEmpty() ? "" : "/" + panel.part();
    }

    Loads.Velocity velocity(List<Panel> panels) {
        Loads.Velocity most = new Loads.Velocity(0, -1);
        for (Panel panel : panels) {
            double q = sheet.find("velocity-pressure" + suffix(panel)).orElseThrow().value();
            if (q > most.pressure()) {
                most = new Loads.Velocity(sheet.find("reference-height" + suffix(panel)).orElseThrow().value(), q);
            }
        }
        return most;
    }
}
