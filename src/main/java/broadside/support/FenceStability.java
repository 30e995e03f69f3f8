package broadside.support;

import broadside.panel.FenceFeet;
import broadside.support.StabilityResult.Stand;
import broadside.support.StabilityResult.Turn;
import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/**
 * A temporary fence on feet, blocks and braces against overturning and sliding: each panel by itself, wind from both sides.
 * Statics: an unbraced panel tips about the leeward end of its foot; a braced one about the foot of the brace when the wind
 * blows towards it, and about its own foot when the wind blows away.
 */
public final class FenceStability {

    private static final String STATICS = "statics";

    private final StabilityRules rules;
    private final Friction friction;
    private final StabilityNumbers assumed;

    /** A way of tipping and what resists it, R_d in N m. */
    private record Way(String name, double resists) {
        String step(String quantity) {
            return name.isEmpty() ? quantity : quantity + "/" + name.replace(' ', '-');
        }
    }

    /** Reads the tables of stability. */
    public FenceStability(Edition stability) {
        this.rules = new StabilityRules(stability);
        this.friction = new Friction(stability);
        this.assumed = new StabilityNumbers(stability);
    }

    /**
     * Checks every wind and finds the ballast that each needs.
     *
     * @param panelLength  m
     * @param winds        on one panel, recorded before
     * @throws UnfitAnswer  for feet that cannot be
     */
    public StabilityResult assess(FenceFeet feet, double panelLength, List<PanelWind> winds, StabilityRule rule, WindLevels levels, Trace trace) {
        if (winds.isEmpty() || !(panelLength > 0)) {
            throw new IllegalArgumentException("a fence needs a wind and a length of its panels");
        }
        List<String> assumptions = new ArrayList<>();
        List<String> remarks = new ArrayList<>();
        RuleFactors by = RuleFactors.of(rule, rules, levels, assumed, trace);
        Friction.Grip grip = friction.of(feet.surface(), trace);
        Fence fence = Fence.of(feet, assumed, assumptions, remarks, trace);
        assumptions.addAll(grip.assumptions());
        remarks.addAll(grip.remarks());
        List<Way> ways = ways(fence, by, trace);
        double slides = slidingResistance(fence, grip.value(), by, trace);
        List<Stand> stands = new ArrayList<>();
        for (PanelWind wind : winds) {
            stands.add(stand(wind, ways, slides, fence, grip, by, trace.part(wind.part())));
        }
        BallastNeed need = stands.stream().map(Stand::need).reduce(BallastNeed::and).orElseThrow();
        double perMetre = perMetre(need, panelLength, trace);
        new FenceWords(assumed).tell(fence, stands, f -> braced(f, winds, grip.value(), by, trace.quiet()), remarks);
        return new StabilityResult(stands, need, perMetre, assumptions, remarks);
    }

    private static BallastNeed braced(Fence fence, List<PanelWind> winds, double mu, RuleFactors by, Trace quiet) {
        return winds.stream().filter(PanelWind::covered).map(w -> need(w, fence, by.action(w, quiet), mu, by, quiet)).reduce(BallastNeed::and)
            .orElse(new BallastNeed("", 0, 0));
    }

    private static List<Way> ways(Fence fence, RuleFactors by, Trace trace) {
        if (fence.alike()) {
            return List.of(new Way("", onFoot(fence, by, "", "-", trace)));
        }
        if (fence.brace().isEmpty()) {
            return List.of(new Way("to the back", onFoot(fence, by, "to the back", "-", trace)),
                new Way("to the front", onFoot(fence, by, "to the front", "+", trace)));
        }
        return List.of(new Way("towards the brace", onBrace(fence, by, trace)), new Way("away from the brace", onFoot(fence, by, "away from the brace", "+",
            trace)));
    }

    /** About the leeward end of the foot; {@code sign} minus for wind from the front, when what stands behind the line is near that end. */
    private static double onFoot(Fence fence, RuleFactors by, String name, String sign, Trace trace) {
        Trace.Line line = trace.line(new Way(name, 0).step("resisting-moment"), "R_d", "moment that resists tipping " + (name.isEmpty() ? "either way" : name)
            + ", about the leeward end of the foot");
        line.in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²").in("m_p", fence.panel(), "kg").in("m_f", fence.foot(), "kg").in("a_f", fence.half(), "m");
        StringBuilder formula = new StringBuilder("γ_G g_n ((m_p + m_f) a_f");
        double sum = (fence.panel() + fence.foot()) * fence.half();
        for (int i = 0; i < fence.blocks().size(); i++) {
            Fence.Block block = fence.blocks().get(i);
            block(line, i, block);
            formula.append(" + m_{b").append(i + 1).append("} max(0; a_f ").append(sign).append(" x_{b").append(i + 1).append("})");
            sum += block.mass() * Math.max(0, sign.equals("-") ? fence.half() - block.lever() : fence.half() + block.lever());
        }
        if (fence.brace().isPresent()) {
            Fence.Brace brace = fence.brace().get();
            line.in("m_B", brace.mass(), "kg").in("L_B", brace.lever(), "m");
            formula.append(" + m_B L_B");
            sum += brace.mass() * brace.lever();
        }
        return ended(line, formula.append(")"), by.weight() * by.gravity() * sum, fence, by);
    }

    /** About the foot of the brace, whose own ballast stands on the tipping edge. */
    private static double onBrace(Fence fence, RuleFactors by, Trace trace) {
        double lever = fence.brace().orElseThrow().lever();
        Trace.Line line = trace.line("resisting-moment/towards-the-brace", "R_d",
            "moment that resists tipping about the foot of the brace, whose own ballast does not help");
        line.in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²").in("m_p", fence.panel(), "kg").in("m_f", fence.foot(), "kg").in("L_B", lever, "m");
        StringBuilder formula = new StringBuilder("γ_G g_n ((m_p + m_f) L_B");
        double sum = (fence.panel() + fence.foot()) * lever;
        for (int i = 0; i < fence.blocks().size(); i++) {
            Fence.Block block = fence.blocks().get(i);
            block(line, i, block);
            formula.append(" + m_{b").append(i + 1).append("} max(0; L_B - x_{b").append(i + 1).append("})");
            sum += block.mass() * Math.max(0, lever - block.lever());
        }
        return ended(line, formula.append(")"), by.weight() * by.gravity() * sum, fence, by);
    }

    private static void block(Trace.Line line, int i, Fence.Block block) {
        line.in("m_{b" + (i + 1) + "}", block.mass(), "kg").in("x_{b" + (i + 1) + "}", block.lever(), "m");
    }

    private static double ended(Trace.Line line, StringBuilder formula, double weights, Fence fence, RuleFactors by) {
        line.from(STATICS, by.rule().status());
        if (fence.stakes().isEmpty()) {
            return line.gives(formula.toString(), weights, "N m");
        }
        return line.in("M_s", fence.stakes().get(), "N m").gives(formula.append(" + M_s").toString(), weights + fence.stakes().get(), "N m");
    }

    private static double slidingResistance(Fence fence, double mu, RuleFactors by, Trace trace) {
        Trace.Line line = trace.line("sliding-resistance", "S_d", "friction of all weights; stakes do not count").in("μ", mu).in("γ_G", by.weight())
            .in("g_n", by.gravity(), "m/s²").in("m_p", fence.panel(), "kg").in("m_f", fence.foot(), "kg");
        StringBuilder formula = new StringBuilder("μ γ_G g_n (m_p + m_f");
        double mass = fence.panel() + fence.foot();
        for (int i = 0; i < fence.blocks().size(); i++) {
            line.in("m_{b" + (i + 1) + "}", fence.blocks().get(i).mass(), "kg");
            formula.append(" + m_{b").append(i + 1).append("}");
            mass += fence.blocks().get(i).mass();
        }
        if (fence.brace().isPresent()) {
            line.in("m_B", fence.brace().get().mass(), "kg");
            formula.append(" + m_B");
            mass += fence.brace().get().mass();
        }
        return line.from(STATICS, by.rule().status()).gives(formula.append(")").toString(), mu * by.weight() * by.gravity() * mass, "N");
    }

    private static Stand stand(PanelWind wind, List<Way> ways, double slides, Fence fence, Friction.Grip grip, RuleFactors by, Trace part) {
        RuleFactors.Action acts = by.action(wind, part);
        List<Turn> turns = new ArrayList<>();
        List<Check> checks = new ArrayList<>();
        for (Way way : ways) {
            double ratio = RuleFactors.ratio(part.line(way.step("overturning-ratio"), "r_o", "resisting over overturning moment" + (way.name().isEmpty() ? ""
                : ", " + way.name())),
                new Check.In("R_d", way.resists()), new Check.In("M_d", acts.moment()), "N m", by.status());
            checks.add(by.overturning(("overturning " + way.name()).strip(), new Check.In("R_d", way.resists()), acts, wind, part));
            turns.add(new Turn(way.name(), ratio, fence.brace().isPresent() ? uplift(way, acts, fence.brace().get(), by, part) : 0));
        }
        double ratio = RuleFactors.ratio(part.line("sliding-ratio", "r_s", "friction over the force along the ground"), new Check.In("S_d", slides),
            new Check.In("F_d", acts.force()), "N", by.status().weaker(grip.status()));
        checks.add(by.sliding(new Check.In("S_d", slides), acts, wind, grip.status(), part));
        return new Stand(wind, turns, ratio, checks, need(wind, fence, acts, grip.value(), by, part));
    }

    private static double uplift(Way way, RuleFactors.Action acts, Fence.Brace brace, RuleFactors by, Trace part) {
        return part.line(way.step("uplift"), "Z", "uplift of the windward foot, tipping " + way.name()).in("M_d", acts.moment(), "N m")
            .in("R_d", way.resists(), "N m").in("L_B", brace.lever(), "m").from(STATICS, by.status()).gives("max(0; (M_d - R_d) / L_B)", Math.max(0,
            (acts.moment() - way.resists()) / brace.lever()), "N");
    }

    /** Blocks on the line, and on the foot of the brace where there is one, in place of those typed. */
    private static BallastNeed need(PanelWind wind, Fence fence, RuleFactors.Action acts, double mu, RuleFactors by, Trace part) {
        double unit = by.weight() * by.gravity();
        double held = fence.panel() + fence.foot();
        double moment = by.required() * acts.moment() - fence.stakes().orElse(0.0);
        String asked = fence.stakes().isPresent() ? "(η_o M_d - M_s)" : "η_o M_d";
        double sliding = by.slide() * acts.force() / (mu * by.weight() * by.gravity()) - held;
        if (fence.brace().isEmpty()) {
            double line = needLine("ballast-mass/line", "blocks on the line of each panel, so that it neither tips nor slides", fence, acts, by, part)
                .in("a_f", fence.half(), "m").in("η_s", by.slide()).in("F_d", acts.force(), "N").in("μ", mu)
                .gives("max(0; " + asked + " / (γ_G g_n a_f) - (m_p + m_f); η_s F_d / (μ γ_G g_n) - (m_p + m_f))",
                    Math.max(Math.max(0, moment / (unit * fence.half()) - held), sliding), "kg");
            return new BallastNeed(wind.named(), line, 0);
        }
        double reach = fence.brace().get().lever();
        double line = needLine("ballast-mass/line", "blocks on the line of each panel, for the wind towards the brace", fence, acts, by, part)
            .in("L_B", reach, "m").gives("max(0; " + asked + " / (γ_G g_n L_B) - (m_p + m_f))", Math.max(0, moment / (unit * reach) - held), "kg");
        double brace = needLine("ballast-mass/brace", "on the foot of the brace, with those blocks, for the wind away from it and against sliding", fence,
            acts, by, part)
            .in("L_B", reach, "m").in("a_f", fence.half(), "m").in("m_L", line, "kg").in("η_s", by.slide()).in("F_d", acts.force(), "N").in("μ", mu)
            .gives("max(0; " + asked + " / (γ_G g_n L_B) - (m_p + m_f + m_L) a_f / L_B; η_s F_d / (μ γ_G g_n) - (m_p + m_f) - m_L)",
                Math.max(Math.max(0, moment / (unit * reach) - (held + line) * fence.half() / reach), sliding - line), "kg");
        return new BallastNeed(wind.named(), line, brace);
    }

    private static Trace.Line needLine(String step, String meaning, Fence fence, RuleFactors.Action acts, RuleFactors by, Trace part) {
        Trace.Line line = part.line(step, step.endsWith("line") ? "m_L" : "m_N", meaning).in("η_o", by.required()).in("M_d", acts.moment(), "N m")
            .in("γ_G", by.weight()).in("g_n", by.gravity(), "m/s²").in("m_p", fence.panel(), "kg").in("m_f", fence.foot(), "kg").from(STATICS, by.status());
        return fence.stakes().isPresent() ? line.in("M_s", fence.stakes().get(), "N m") : line;
    }

    private static double perMetre(BallastNeed need, double length, Trace trace) {
        double total = trace.line("ballast-mass/panel", "m_T", "ballast of each panel in all, for the hardest wind on one: " + need.named())
            .from(STATICS, Status.DERIVED).reads("the most on the line and the most on the foot of the brace", need.total(), "kg");
        double b = trace.given("l_p", "length of one panel", length, "m", "");
        return trace.line("ballast-mass-per-metre", "m'", "the same along the line").in("m_T", total, "kg").in("l_p", b, "m").from(STATICS, Status.DERIVED)
            .gives("m_T / l_p", total / b, "kg/m");
    }
}
