package broadside.job;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.action.Foot;
import broadside.action.PostAction;
import broadside.assess.Assessment;
import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.assess.Limits;
import broadside.assess.Loads;
import broadside.codes.Level;
import broadside.codes.ZonePressure;
import broadside.trace.OwnValue;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** The result of a job as JSON. Page, document and commands show this and nothing else. */
public final class ResultText {

    public static JsonNode of(Assessment assessment) {
        ObjectNode root = JobText.object();
        root.put("broadside", 1);
        root.put("status", "preliminary");
        root.put("version", assessment.about().version());
        root.put("tables", assessment.about().tables());
        root.put("code", assessment.job().basis().key());
        assessment.job().head("title").ifPresent(t -> root.put("title", t));
        ArrayNode items = root.putArray("items");
        assessment.items().forEach(item -> item(items.addObject(), item));
        return root;
    }

    private static void item(ObjectNode node, ItemResult result) {
        node.put("mark", result.item().mark());
        node.put("kind", result.item().kind());
        node.put("outcome", result.outcome().word());
        result.refusal().filter(ItemResult.Refusal::ofScope).ifPresent(r -> node.putObject("scope").put("sentence", ItemResult.OUTSIDE).put("case", r.clause())
            .put("reason", r.reason()).put("send", r.instead()).put("shown", result.loads().isPresent() ? "loads only" : "nothing"));
        result.refusal().filter(r -> !r.ofScope()).ifPresent(r -> node.putObject("reason").put("code", r.code()).put("clause", r.clause()).put("reason", r.reason())
            .put("instead", r.instead()));
        result.loads().ifPresent(l -> loads(node, l));
        supports(node, result.loads().flatMap(Loads::carried));
        limits(node, result.limits());
        node.putArray("limits");
        ArrayNode notes = node.putArray("notes");
        result.notes().forEach(n -> notes.addObject().put("kind", n.kind().word()).put("text", n.text()));
        overrides(node, result.sheet());
        givens(node.putArray("given"), result.sheet());
        ArrayNode steps = node.putArray("steps");
        result.sheet().steps().forEach(s -> step(steps.addObject(), s));
    }

    /** The winds at which checks are just met, the first to govern first. */
    private static void limits(ObjectNode node, Optional<Limits> limits) {
        ArrayNode list = node.putArray("limits");
        limits.ifPresent(l -> l.list().forEach(each -> {
            list.addObject().put("check", each.check()).put("state", each.state()).put("gust_m_s", each.inTheOpen()).put("at_height_m", 10.0).put("mean_m_s", each.mean())
                .put("gust_at_item_m_s", each.atItem()).put("item_height_m", l.height()).put("by-square", each.bySquare());
        }));
        ArrayNode changes = node.putArray("limit-changes");
        limits.ifPresent(l -> l.changes().forEach(c -> changes.addObject().put("with", c.what()).put("gust_m_s", c.first().map(Limits.Limit::inTheOpen).orElse(0.0))));
    }

    /** Every check in one list, and each part with what it is, what was tried and what must be confirmed. */
    private static void supports(ObjectNode node, Optional<Carried> carried) {
        ArrayNode checks = node.putArray("supports");
        carried.ifPresent(c -> {
            c.checks().forEach(k -> checks.addObject().put("check", k.name()).put("rule", k.rule()).put("demand", k.demand()).put("capacity", k.capacity())
                .put("unit", k.unit()).put("utilisation", k.utilisation()).put("passes", k.passes()).put("case", k.named()).put("status", k.status().word()));
            ArrayNode parts = node.putArray("carried-by");
            c.parts().forEach(p -> part(parts.addObject(), p));
        });
    }

    private static void part(ObjectNode node, Carried.Part part) {
        node.put("part", part.key()).put("title", part.title());
        part.refused().ifPresent(why -> node.put("refused", why));
        ArrayNode results = node.putArray("results");
        for (Carried.Result r : part.results()) {
            ObjectNode each = results.addObject().put("name", r.key()).put("label", r.label());
            if (r.unit().isEmpty()) {
                each.put("text", r.text());
            } else {
                each.put("value", r.value()).put("unit", r.unit());
            }
        }
        ArrayNode tried = node.putArray("tried");
        part.choices().forEach(t -> tried.addObject().put("section", t.designation()).put("mass_kg_per_m", t.mass()).put("utilisation", t.utilisation())
            .put("check", t.by()).put("case", t.named()).put("passes", t.passes()).put("chosen", t.chosen()));
        ArrayNode assumed = node.putArray("to-confirm");
        part.assumed().forEach(assumed::add);
        ArrayNode remarks = node.putArray("remarks");
        part.remarks().forEach(remarks::add);
    }

    private static void loads(ObjectNode node, Loads loads) {
        Level level = loads.level();
        node.putObject("velocity-pressure").put("height_m", loads.velocity().height()).put("value_Pa", loads.velocity().pressure())
            .put("level", level.name());
        ArrayNode cases = node.putArray("cases");
        List<CaseAction> companions = loads.companion().cases();
        for (int i = 0; i < loads.cases().size(); i++) {
            caseOf(cases.addObject(), loads.cases().get(i), companions.get(i), loads);
        }
        ObjectNode governing = node.putObject("governing");
        loads.governingNames().forEach(governing::put);
        loads.governing().forEach((quantity, action) -> {
            if (!action.state().isEmpty()) {
                governing.put(quantity + "-state", action.state());
            }
        });
        node.putObject("companion").put("level", level.companion()).put("factor", level.factor()).put("rule", level.rule());
        ArrayNode posts = node.putArray("posts");
        loads.posts().forEach(p -> post(posts.addObject(), p, level));
        loads.edgeOn().ifPresent(e -> node.putObject("edge-on").put("label", "wind along the face: own rule, of no code").put("force_N", e.force())
            .put("base_moment_Nm", e.moment()));
        loads.supports().drag().ifPresent(d -> node.putObject("posts-drag").put("label", "wind on the posts themselves, inside the base actions")
            .put("force_N", d.force()).put("base_moment_Nm", d.moment()));
        ArrayNode reactions = node.putArray("reactions");
        loads.reactions().forEach(r -> reactions.addObject().put("step", r.step()).put("label", r.label()).put("value", r.value()).put("unit", r.unit())
            .put("case", r.named()).put("companion", r.atLevel(level.factor()).value()));
        if (loads.selfWeight() > 0) {
            node.put("self_weight_N", loads.selfWeight());
        }
        ArrayNode balance = node.putArray("equilibrium");
        loads.balance().forEach(b -> balance.addObject().put("what", b.what()).put("loads", b.loads()).put("reactions", b.reactions())
            .put("unit", b.unit()));
    }

    private static void caseOf(ObjectNode node, CaseAction action, CaseAction companion, Loads loads) {
        Level level = loads.level();
        if (!action.state().isEmpty()) {
            node.put("state", action.state());
        }
        node.put("case", action.name()).put("label", action.label()).put("direction", action.direction())
            .put("windward-end", action.windward().name().toLowerCase(Locale.ROOT)).put("level", level.name());
        ArrayNode zones = node.putArray("zones");
        for (PanelZones panel : action.zones()) {
            for (ZonePressure zone : panel.zones()) {
                ObjectNode each = zones.addObject().put("zone", zone.zone());
                if (!panel.part().isEmpty()) {
                    each.put("panel", panel.part());
                }
                each.put("from_m", zone.from()).put("to_m", zone.to()).put("coefficient", zone.coefficient()).put("pressure_Pa", zone.pressure());
            }
        }
        node.put("force_N", action.force()).put("height_m", action.height()).put("side_m", action.side());
        foot(node, action, loads.foot());
        foot(node.putObject("companion").put("level", level.companion()).put("force_N", companion.force()), companion, loads.foot());
    }

    /** What the foot takes; an item without a foot has no moment, and one on brackets no torsion. */
    private static void foot(ObjectNode node, CaseAction action, Foot foot) {
        node.put("base_shear_N", action.baseShear());
        if (foot != Foot.NONE) {
            node.put("base_moment_Nm", action.baseMoment());
        }
        if (foot == Foot.GROUND) {
            node.put("torsion_Nm", action.torsion());
        }
    }

    private static void post(ObjectNode node, PostAction post, Level level) {
        node.put("post", post.post()).put("position_m", post.position());
        if (!post.zone().isEmpty()) {
            node.put("zone", post.zone());
        }
        post.share().ifPresent(s -> node.put("carries_m", s));
        if (post.gate() > 0) {
            node.put("gate_leaf_m", post.gate());
        }
        if (!post.state().isEmpty()) {
            node.put("state", post.state());
        }
        node.put("case", post.named()).put("shear_N", post.shear()).put("shear_case", post.shearCase()).put("moment_Nm", post.moment())
            .put("companion_moment_Nm", post.atLevel(level.factor()).moment());
    }

    private static void overrides(ObjectNode node, Trace sheet) {
        if (sheet.overridesUsed().isEmpty()) {
            return;
        }
        ArrayNode overrides = node.putArray("overrides");
        for (OwnValue own : sheet.overridesUsed()) {
            overrides.addObject().put("name", own.name()).put("value", own.value()).put("unit", own.unit()).put("reason", own.reason());
        }
    }

    private static void givens(ArrayNode node, Trace sheet) {
        for (Trace.Given given : sheet.givens()) {
            node.addObject().put("symbol", given.symbol()).put("meaning", given.meaning()).put("value", given.value()).put("unit", given.unit())
                .put("typed", given.typed());
        }
    }

    private static void step(ObjectNode node, Step step) {
        node.put("name", step.name()).put("symbol", step.symbol()).put("meaning", step.meaning()).put("formula", step.formula());
        ArrayNode inputs = node.putArray("inputs");
        step.inputs().forEach(i -> inputs.addObject().put("symbol", i.symbol()).put("value", i.value()).put("unit", i.unit()));
        node.put("value", step.value()).put("unit", step.unit()).put("place", step.place()).put("status", step.status().word());
        step.replaced().ifPresent(r -> node.putObject("replaces").put("calculated", r.calculated()).put("reason", r.reason()));
    }

    private ResultText() { }
}
