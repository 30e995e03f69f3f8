package broadside.support;

import broadside.panel.Footing;
import broadside.quantity.Length;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** A planted post or a pier: held by the ground at its sides. */
final class ShaftFooting {

    private static final double ALIKE = 1e-9;

    private final GroundTables tables;
    private final FootingRules rules;
    private final Footing footing;
    private final Footings.Request request;
    private final List<FootLoad> loads;
    private final List<Assumed> assumed;
    private final List<String> remarks;

    ShaftFooting(GroundTables tables, FootingRules rules, Footing footing, Footings.Request request, List<Assumed> assumed, List<String> remarks) {
        this.tables = tables;
        this.rules = rules;
        this.footing = footing;
        this.request = request;
        this.loads = request.worst();
        this.assumed = assumed;
        this.remarks = remarks;
    }

    /** What is the same for every load. */
    private record Setting(DepthRule rule, double width, double level) { }

    FootingResult hold(Trace trace) {
        footing.depth().ifPresent(d -> Footings.above("depth", 0, d.metres(), "a depth above zero is needed, such as \"1.2 m\""));
        double width = width(trace);
        DepthRule rule = rules.rule(trace);
        WindLevels levels = request.levels();
        double level = trace.line("footing-wind-level", "k_f", "to the level of the rule for the footing").from(levels.place(), levels.status())
            .reads(rule.strength() ? "level of strength" : "level of service", rule.strength() ? levels.strength() : levels.service(), "1");
        Setting setting = new Setting(rule, width, level);
        Trace quiet = trace.quiet();
        Optional<Length> typed = footing.depth();
        FootLoad first = worst(l -> rule.needed(column(setting, l, quiet), quiet));
        double depth = typed.isPresent() ? trace.given("d_f", "depth of the footing", typed.get().metres(), "m", typed.get().typed())
            : sized(setting, rule.needed(column(setting, first, trace), trace), trace);
        ToDoubleFunction<FootLoad> use = l -> rule.check(column(setting, l, quiet), depth, false, l.named(), quiet).utilisation();
        FootLoad governing = worst(use);
        if (governing != first && use.applyAsDouble(governing) <= use.applyAsDouble(first) + ALIKE) {
            governing = first;
        }
        boolean same = typed.isEmpty() && governing == first;
        Check check = rule.check(column(setting, governing, same ? quiet : trace), depth, same, governing.named(), trace);
        notes(setting, depth);
        double other = footing.round() ? width : footing.length().map(Length::metres).orElse(width);
        return new FootingResult(footing.kind(), rule.title(), typed.isEmpty(), footing.round(), depth, width, other, volume(width, other, depth, trace),
            List.of(check), assumed, remarks);
    }

    /** The load with the greatest value; the first of equals. */
    private FootLoad worst(ToDoubleFunction<FootLoad> value) {
        FootLoad worst = loads.get(0);
        if (loads.size() == 1) {
            return worst;
        }
        double most = value.applyAsDouble(worst);
        for (FootLoad load : loads) {
            double found = value.applyAsDouble(load);
            if (found > most) {
                most = found;
                worst = load;
            }
        }
        return worst;
    }

    private double width(Trace trace) {
        double post = request.postWidth();
        footing.length().ifPresent(l -> Footings.above("length", 0, l.metres(), "a length above zero is needed"));
        if (footing.width().isPresent()) {
            Length typed = footing.width().get();
            Footings.above("width", post, typed.metres(), "the footing must be wider than zero and not narrower than its post (" + request.words(post) + ")");
            return trace.given("b", "width of the footing across the wind", typed.metres(), "m", typed.typed());
        }
        Known usual = request.size(tables, "surround");
        double width = Math.max(usual.value(), GroundTables.roundedUp(post, request.size(tables, "depth-step").value()));
        assumed.add(new Assumed("The concrete around the post is assumed to be " + request.words(width) + " wide"
            + (footing.round() ? ", round." : ", square.")));
        return trace.line("footing-width", "b", "width of the footing across the wind").from(usual.place(), usual.status())
            .reads(width > usual.value() ? "as wide as the post, rounded up" : "assumed: " + usual.how(), width, "m");
    }

    private DepthRule.Column column(Setting setting, FootLoad load, Trace trace) {
        FootLoad foot = Footings.recorded(load, trace);
        String place = "level of the rule for the footing";
        double shear = trace.line("ground-shear", setting.rule().shearSymbol(), "shear at the ground, at the level of the rule").in("k_f", setting.level())
            .in("V_f", foot.shear(), "N").from(place, Status.DERIVED).gives("k_f V_f", setting.level() * foot.shear(), "N");
        double moment = trace.line("ground-moment", setting.rule().momentSymbol(), "moment at the ground, at the level of the rule")
            .in("k_f", setting.level())
            .in("M_f", foot.moment(), "N m").from(place, Status.DERIVED).gives("k_f M_f", setting.level() * foot.moment(), "N m");
        return new DepthRule.Column(shear, moment, setting.width());
    }

    private double sized(Setting setting, double needed, Trace trace) {
        Known least = tables.size("least-depth");
        Known step = request.size(tables, "depth-step");
        double ratio = setting.rule().least(setting.width());
        double depth = GroundTables.roundedUp(Math.max(needed, Math.max(least.value(), ratio)), step.value());
        Known deepest = tables.size("deepest");
        if (depth > deepest.value()) {
            throw new NoAnswer("a footing " + deepest.text() + " m deep does not hold these loads, and deeper ones are piles: a wider footing, a pad or more posts may do, or ask an engineer");
        }
        String how = ratio > needed && ratio > least.value() ? "the least multiple of the width, rounded up"
            : least.value() > needed ? "the least embedment" : "rounded up";
        return trace.line("footing-depth", "d_f", "depth of the footing").from(step.place(), step.status()).reads(how, depth, "m");
    }

    private void notes(Setting setting, double depth) {
        double least = setting.rule().least(setting.width());
        if (depth < least - ALIKE) {
            remarks.add("The depth is less than " + tables.factorRule("least-ratio").text()
                + " times the width of the footing, which guidance gives as the least.");
        }
        boolean ibc = rules.chosen().equals(FootingRules.IBC);
        if (!footing.round() && ibc) {
            remarks.add("The rule allows the diagonal of a square footing as its width; its face counts here, which is safer.");
        }
        if (ibc && depth > tables.ibc("depth-limit").value()) {
            assumed.add(new Assumed("The depth goes beyond what counts for the lateral pressure; an engineer must look at a footing this deep.", true));
        }
        GroundRemarks.add(footing.ground(), Optional.of(rules.chosen()), depth, assumed, remarks);
    }

    private double volume(double width, double other, double depth, Trace trace) {
        Trace.Line line = trace.line("concrete-volume", "V_c", "volume of the hole").in("b", width, "m").in("d_f", depth, "m")
            .from("geometry", Status.DERIVED);
        return footing.round() ? line.reads("π b² d_f / 4, round", Math.PI * width * width * depth / 4, "m³")
            : line.reads("width by length by depth", width * other * depth, "m³");
    }
}
