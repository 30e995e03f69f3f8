package broadside.support;

import broadside.panel.Kentledge;
import broadside.quantity.Mass;
import broadside.support.StabilityResult.Stand;
import broadside.support.StabilityResult.Turn;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A hoarding on raking braces with ballast, one brace at each post: overturning about the foot of the brace when the wind
 * blows towards it and about the foot of the face when it blows from behind, and sliding. Statics; the hoarding itself is
 * not counted on to turn about its own foot.
 */
public final class KentledgeStability {

    private static final String STATICS = "statics";
    private static final String TOWARDS = "towards the brace";
    private static final String AWAY = "away from the brace";

    private final StabilityRules rules;
    private final Friction friction;
    private final StabilityNumbers assumed;

    /** Masses in kg as recorded: face m_p and front ballast m_f below it, brace ballast m_B at the lever L_B, m. */
    private record Post(double face, double front, double brace, double lever) { }

    /** What resists: R_1 towards the brace and R_2 away from it, N m; S_d against sliding, N. */
    private record Resists(double towards, double away, double slides) { }

    /** Reads the tables of stability. */
    public KentledgeStability(Edition stability) {
        this.rules = new StabilityRules(stability);
        this.friction = new Friction(stability);
        this.assumed = new StabilityNumbers(stability);
    }

    /**
     * Checks every wind and finds the ballast that each needs.
     *
     * @param spacing  of the posts, m
     * @param winds    on one post, recorded before: such as that of the worst zone and of an ordinary one
     * @throws UnfitAnswer  for ballast that cannot be
     */
    public StabilityResult assess(Kentledge kentledge, double spacing, List<PanelWind> winds, StabilityRule rule, WindLevels levels, Trace trace) {
        if (winds.isEmpty() || !(spacing > 0)) {
            throw new IllegalArgumentException("a hoarding needs a wind and a spacing of its posts");
        }
        List<String> assumptions = new ArrayList<>();
        RuleFactors by = RuleFactors.of(rule, rules, levels, assumed, trace);
        Friction.Grip grip = friction.of(kentledge.surface(), trace);
        Post post = post(kentledge, assumptions, trace);
        assumptions.addAll(grip.assumptions());
        List<String> remarks = new ArrayList<>(grip.remarks());
        remarks.add("Ballast counts only while it is fixed to the foot of the brace or of the face, and the brace takes push and pull.");
        Resists resists = resists(post, grip.value(), by, trace);
        List<Stand> stands = new ArrayList<>();
        for (PanelWind wind : winds) {
            stands.add(stand(wind, post, resists, grip, by, trace.part(wind.part())));
        }
        BallastNeed need = stands.stream().map(Stand::need).reduce(BallastNeed::and).orElseThrow();
        double total = trace.line("ballast-mass/post", "m_T", "ballast of each post in all, for the hardest wind on one: " + need.named())
            .from(STATICS, Status.DERIVED).reads("the most below the face and the most on the foot of the brace", need.total(), "kg");
        double s = trace.given("l_p", "spacing of the posts", spacing, "m", "");
        double perMetre = trace.line("ballast-mass-per-metre", "m'", "the same along the line").in("m_T", total, "kg").in("l_p", s, "m")
            .from(STATICS, Status.DERIVED).gives("m_T / l_p", total / s, "kg/m");
        return new StabilityResult(stands, need, perMetre, assumptions, remarks);
    }

    private static Post post(Kentledge kentledge, List<String> assumptions, Trace trace) {
        double lever = kentledge.lever().orElseThrow(() -> new UnfitAnswer("ballast.lever",
            "the distance from the face to the middle of the ballast is needed: without it nothing can be said")).metres();
        if (!(lever > 0)) {
            throw new UnfitAnswer("ballast.lever", "the distance from the face to the middle of the ballast is above zero");
        }
        return new Post(mass(kentledge.faceMass(), "ballast.face-mass", "m_p", "mass of boards, post and brace of one post", assumptions, trace),
            mass(kentledge.frontMass(), "ballast.front-mass", "m_f", "ballast on the foot below the face, at one post", assumptions, trace),
            mass(kentledge.mass(), "ballast.mass", "m_B", "ballast on the foot of each brace", assumptions, trace),
            trace.given("L_B", "from the face to the middle of that ballast", lever, "m", kentledge.lever().get().typed()));
    }

    private static double mass(Optional<Mass> typed, String field, String symbol, String meaning, List<String> assumptions, Trace trace) {
        if (typed.isEmpty()) {
            assumptions.add("The " + meaning + " was not given: it counts as nothing.");
        }
        double value = Fence.notNegative(typed.map(Mass::kilograms).orElse(0.0), field);
        return trace.given(symbol, meaning + (typed.isEmpty() ? ", not given" : ""), value, "kg", typed.map(Mass::typed).orElse(""));
    }

    private static Resists resists(Post post, double mu, RuleFactors by, Trace trace) {
        double towards = trace.line("resisting-moment/towards-the-brace", "R_1",
            "moment that resists tipping about the foot of the brace, whose own ballast does not help")
            .in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²").in("m_p", post.face(), "kg").in("m_f", post.front(), "kg").in("L_B", post.lever(), "m")
            .from(STATICS, by.rule().status())
            .gives("γ_G g_n (m_p + m_f) L_B", by.weight() * by.gravity() * (post.face() + post.front()) * post.lever(), "N m");
        double away = trace.line("resisting-moment/away-from-the-brace", "R_2", "moment that resists tipping about the foot of the face").in("γ_G", by.weight())
            .in("g_n", by.gravity(), "m/s²").in("m_B", post.brace(), "kg").in("L_B", post.lever(), "m").from(STATICS, by.rule().status())
            .gives("γ_G g_n m_B L_B", by.weight() * by.gravity() * post.brace() * post.lever(), "N m");
        double slides = trace.line("sliding-resistance", "S_d", "friction of all weights").in("μ", mu).in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²")
            .in("m_p", post.face(), "kg").in("m_f", post.front(), "kg").in("m_B", post.brace(), "kg").from(STATICS, by.rule().status())
            .gives("μ γ_G g_n (m_p + m_f + m_B)", mu * by.weight() * by.gravity() * (post.face() + post.front() + post.brace()), "N");
        return new Resists(towards, away, slides);
    }

    private static Stand stand(PanelWind wind, Post post, Resists resists, Friction.Grip grip, RuleFactors by, Trace part) {
        RuleFactors.Action acts = by.action(wind, part);
        List<Check> checks = new ArrayList<>();
        List<Turn> turns = List.of(turn(TOWARDS, new Check.In("R_1", resists.towards()), acts, post, wind, by, checks, part),
            turn(AWAY, new Check.In("R_2", resists.away()), acts, post, wind, by, checks, part));
        double ratio = RuleFactors.ratio(part.line("sliding-ratio", "r_s", "friction over the force along the ground"), new Check.In("S_d", resists.slides()),
            new Check.In("F_d", acts.force()), "N", by.status().weaker(grip.status()));
        checks.add(by.sliding(new Check.In("S_d", resists.slides()), acts, wind, grip.status(), part));
        return new Stand(wind, turns, ratio, checks, need(wind, post, acts, grip.value(), by, part));
    }

    private static Turn turn(String name, Check.In resists, RuleFactors.Action acts, Post post, PanelWind wind, RuleFactors by, List<Check> checks,
        Trace part) {
        String slug = "/" + name.replace(' ', '-');
        double ratio = RuleFactors.ratio(part.line("overturning-ratio" + slug, "r_o", "resisting over overturning moment, " + name), resists,
            new Check.In("M_d", acts.moment()), "N m", by.status());
        checks.add(by.overturning("overturning " + name, resists, acts, wind, part));
        double uplift = part.line("uplift" + slug, "Z", "uplift of the windward foot, tipping " + name).in("M_d", acts.moment(), "N m")
            .in(resists.symbol(), resists.value(), "N m").in("L_B", post.lever(), "m").from(STATICS, by.status())
            .gives("max(0; (M_d - " + resists.symbol() + ") / L_B)", Math.max(0, (acts.moment() - resists.value()) / post.lever()), "N");
        return new Turn(name, ratio, uplift);
    }

    /** Ballast below the face and on the foot of the brace, in place of what was typed. */
    private static BallastNeed need(PanelWind wind, Post post, RuleFactors.Action acts, double mu, RuleFactors by, Trace part) {
        double both = by.required() * acts.moment() / (by.weight() * by.gravity() * post.lever());
        double front = part.line("ballast-mass/front", "m_L", "ballast below the face at each post, for the wind towards the brace").in("η_o", by.required())
            .in("M_d", acts.moment(), "N m").in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²").in("L_B", post.lever(), "m").in("m_p", post.face(), "kg")
            .from(STATICS, by.status()).gives("max(0; η_o M_d / (γ_G g_n L_B) - m_p)", Math.max(0, both - post.face()), "kg");
        double brace = part.line("ballast-mass/brace", "m_N", "ballast on the foot of each brace, for the wind from behind and against sliding")
            .in("η_o", by.required())
            .in("M_d", acts.moment(), "N m").in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²").in("L_B", post.lever(), "m").in("m_p", post.face(), "kg")
            .in("m_L", front, "kg").in("η_s", by.slide()).in("F_d", acts.force(), "N").in("μ", mu).from(STATICS, by.status())
            .gives("max(η_o M_d / (γ_G g_n L_B); η_s F_d / (μ γ_G g_n) - m_p - m_L)",
                Math.max(both, by.slide() * acts.force() / (mu * by.weight() * by.gravity()) - post.face() - front), "kg");
        return new BallastNeed(wind.named(), front, brace);
    }
}
