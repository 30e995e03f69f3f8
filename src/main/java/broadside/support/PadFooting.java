package broadside.support;

import broadside.panel.Footing;
import broadside.quantity.Length;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A pad: held by its weight against overturning, sliding and too much pressure. */
final class PadFooting {

    private final GroundTables tables;
    private final FootingRules rules;
    private final Footing footing;
    private final Footings.Request request;
    private final List<Assumed> assumed;
    private final List<String> remarks;
    private final List<FootLoad> loads;
    private final Pad pad;

    PadFooting(GroundTables tables, FootingRules rules, Footing footing, Footings.Request request, List<Assumed> assumed, List<String> remarks) {
        this.tables = tables;
        this.rules = rules;
        this.footing = footing;
        this.request = request;
        this.loads = request.worst();
        this.assumed = assumed;
        this.remarks = remarks;
        this.pad = new Pad(tables, rules.lessWater(tables.size("concrete-density")));
    }

    /** What is the same for every size and load. */
    private record Setting(Stability stability, Pad.Soil soil, double friction, double bearing, double service) { }

    /** One of the three checks. */
    private interface Row {
        Check of(FootLoad load, double vertical, Trace trace);
    }

    FootingResult hold(Trace trace) {
        if (footing.round()) {
            throw new UnfitAnswer("footing.shape", "a pad is square or rectangular in plan; give the square inside a round one");
        }
        Pad.Soil soil = rules.pad();
        Trace quiet = trace.quiet();
        Setting trial = setting(soil, quiet);
        double depth = depth(trace);
        boolean sized = footing.width().isEmpty();
        double along = sized ? sized(trial, depth, quiet, trace) : typed("width", "B", "size of the pad along the wind", footing.width().get(), trace);
        double across = footing.length().isPresent() ? typed("length", "L", "size of the pad across the wind", footing.length().get(), trace)
            : trace.line("pad-length", "L", "size of the pad across the wind").in("B", along, "m").from("square pad", Status.DERIVED).gives("B", along, "m");
        double weight = trace.line("footing-weight", "G_f", "permanent weight at the foot").from("taken over from the loads of the post", Status.DERIVED)
            .reads("weight of boards and post where it is known", request.weight(), "N");
        Pad.Block block = new Pad.Block(along, across, depth, weight);
        List<Check> checks = checks(setting(soil, trace), block, trace);
        assumed.add(new Assumed("The pad is plain concrete over its whole depth, cast against firm ground."));
        remarks.add("The soil at the sides of the pad is not counted; overturning is checked along the wind on the face.");
        GroundRemarks.add(footing.ground(), Optional.empty(), depth, assumed, remarks);
        double volume = trace.line("concrete-volume", "V_c", "volume of the hole").in("B", along, "m").in("L", across, "m").in("d_f", depth, "m")
            .from("geometry", Status.DERIVED).gives("B L d_f", along * across * depth, "m³");
        return new FootingResult(footing.kind(), "pad by its weight, " + request.rule().title(), sized, false, depth, along, across, volume, checks,
            assumed, remarks);
    }

    private Setting setting(Pad.Soil soil, Trace trace) {
        WindLevels levels = request.levels();
        Stability stability = Stability.of(request.rule(), levels, trace);
        double friction = soil.cohesive() ? soil.friction().into(trace.line("base-cohesion", "c_a", "cohesion under the pad"))
            : soil.friction().into(trace.line("base-friction", "μ", "friction under the pad"));
        double bearing = soil.bearing().into(trace.line("bearing-allowed", "q_a", "pressure that the ground is allowed to take"));
        double service = trace.line("bearing-wind-level", "k_s", "to the level of service").from(levels.place(), levels.status())
            .reads("level of service", levels.service(), "1");
        return new Setting(stability, soil, friction, bearing, service);
    }

    private double depth(Trace trace) {
        if (footing.depth().isPresent()) {
            Length typed = footing.depth().get();
            Footings.above("depth", 0, typed.metres(), "a depth above zero is needed, such as \"0.6 m\"");
            return trace.given("d_f", "depth of the footing", typed.metres(), "m", typed.typed());
        }
        Known usual = request.size(tables, "pad-depth");
        assumed.add(new Assumed("The depth of the pad is assumed to be " + request.words(usual.value()) + "."));
        return usual.into(trace.line("footing-depth", "d_f", "depth of the footing"));
    }

    private double typed(String field, String symbol, String meaning, Length typed, Trace trace) {
        Footings.above(field, request.postWidth(), typed.metres(), "the pad must be larger than zero and not smaller than its post");
        return trace.given(symbol, meaning, typed.metres(), "m", typed.typed());
    }

    /** The least width in steps at which all checks hold; a wider pad is never worse. */
    private double sized(Setting setting, double depth, Trace quiet, Trace trace) {
        double step = request.size(tables, "pad-step").value();
        Known widest = tables.size("widest-pad");
        long low = Math.max(1, Math.round(GroundTables.roundedUp(request.postWidth(), step) / step)) - 1;
        long high = Math.round(widest.value() / step);
        if (!holds(setting, high, step, depth, quiet)) {
            throw new NoAnswer("no pad of this depth up to " + widest.text() + " m wide holds these loads: give another depth or a planted post, or ask an engineer");
        }
        while (high - low > 1) {
            long middle = (low + high) / 2;
            if (holds(setting, middle, step, depth, quiet)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return trace.line("pad-width", "B", "size of the pad along the wind").from(widest.place(), widest.status())
            .reads("the least step at which overturning, sliding and pressure hold", GroundTables.roundedUp(high * step, step), "m");
    }

    private boolean holds(Setting setting, long steps, double step, double depth, Trace quiet) {
        double along = GroundTables.roundedUp(steps * step, step);
        Pad.Block block = new Pad.Block(along, footing.length().map(Length::metres).orElse(along), depth, request.weight());
        double vertical = pad.vertical(block, quiet);
        return rows(setting, block).stream().allMatch(row -> loads.stream().allMatch(l -> row.of(l, vertical, quiet).passes()));
    }

    private List<Row> rows(Setting setting, Pad.Block block) {
        return List.of(
            (load, n, t) -> pad.overturning(setting.stability(), block, n, base(load, block, t), load.named(), t),
            (load, n, t) -> pad.sliding(setting.stability(), setting.soil(), setting.friction(), block, n, load, base(load, block, t.quiet()), t),
            (load, n, t) -> {
                double moment = base(load, block, t.quiet());
                double service = t.line("pad-moment-service", "M_s", "moment at the base at the level of service").in("k_s", setting.service())
                    .in("M_b", moment, "N m").from("level of service", Status.DERIVED).gives("k_s M_b", setting.service() * moment, "N m");
                return pad.bearing(setting.soil(), setting.bearing(), block, n, service, load.named(), t);
            });
    }

    private double base(FootLoad load, Pad.Block block, Trace trace) {
        FootLoad foot = Footings.recorded(load, trace);
        return pad.baseMoment(foot.shear(), foot.moment(), block.depth(), trace);
    }

    /** Each check with the load that governs it; the loads are recorded again where another one governs. */
    private List<Check> checks(Setting setting, Pad.Block block, Trace trace) {
        Trace quiet = trace.quiet();
        double vertical = pad.vertical(block, trace);
        List<Row> rows = rows(setting, block);
        List<Check> checks = new ArrayList<>();
        FootLoad last = null;
        for (int i = 0; i < rows.size(); i++) {
            Row row = rows.get(i);
            FootLoad governing = loads.get(0);
            for (FootLoad load : loads) {
                if (row.of(load, vertical, quiet).utilisation() > row.of(governing, vertical, quiet).utilisation()) {
                    governing = load;
                }
            }
            if (i > 0 && governing != last) {
                base(governing, block, trace);
            }
            checks.add(row.of(governing, vertical, trace));
            last = governing;
        }
        return checks;
    }
}
