package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.FenceFeet;
import broadside.panel.Fixings;
import broadside.panel.Kentledge;
import broadside.panel.ProjectingSign.Brackets;
import broadside.quantity.Force;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import broadside.support.BracketFixings;
import broadside.support.Check;
import broadside.support.EdgePull;
import broadside.support.FenceStability;
import broadside.support.FixingGroup;
import broadside.support.FrameBallast;
import broadside.support.KentledgeStability;
import broadside.support.PanelWind;
import broadside.support.StabilityRules;
import broadside.support.Stay;
import broadside.support.WindLevels;
import broadside.table.Edition;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** The sheets of ballast and fixings print what was calculated: formulas give their values, and nothing goes in that no line above gives. */
class BallastSheetTest {

    private static final Edition STABILITY = TableLibrary.shipped().edition("stability/1").orElseThrow();
    private static final StabilityRules RULES = new StabilityRules(STABILITY);
    private static final WindLevels LEVELS = new WindLevels(0.6, 1.0, "levels of a code", Status.READ);

    private final Random random = new Random(7);

    private double upTo(double most) {
        return most * random.nextDouble();
    }

    private Check.In in(String symbol, double value, String unit, Trace trace) {
        return new Check.In(symbol, trace.given(symbol, "given", value, unit, ""));
    }

    private PanelWind wind(String part, Trace trace) {
        return new PanelWind(part, part, in("F_f", upTo(3000), "N", trace), in("z_f", upTo(2), "m", trace), true);
    }

    private Trace fence() {
        Trace trace = new Trace();
        List<FenceFeet.Block> blocks = new ArrayList<>();
        for (int i = 0; i < random.nextInt(4); i++) {
            blocks.add(new FenceFeet.Block(Mass.kilograms(upTo(100)), Length.metres(upTo(2) - 1)));
        }
        Optional<FenceFeet.Brace> brace = random.nextBoolean() ? Optional.of(new FenceFeet.Brace(Length.metres(0.6 + upTo(2)), Mass.kilograms(upTo(100))))
            : Optional.empty();
        Optional<Force> proof = random.nextBoolean() ? Optional.of(Force.newtons(1 + upTo(2000))) : Optional.empty();
        FenceFeet feet = new FenceFeet(Optional.of(Mass.kilograms(upTo(30))), Optional.of(Mass.kilograms(upTo(30))), random.nextBoolean()
            ? Optional.of(Length.metres(0.3 + upTo(0.7)))
            : Optional.empty(), blocks, brace, new FenceFeet.Surface(Optional.of("grass"), Optional.empty(), Optional.empty()),
            new FenceFeet.Stakes(Optional.empty(), proof, Optional.empty()));
        new FenceStability(STABILITY).assess(feet, 3.5, List.of(wind("hardest", trace), wind("easiest", trace)), RULES.of(any()), LEVELS, trace);
        return trace;
    }

    private String any() {
        return RULES.keys().get(random.nextInt(RULES.keys().size()));
    }

    private Trace hoarding() {
        Trace trace = new Trace();
        Kentledge kentledge = new Kentledge(Optional.of(Mass.kilograms(upTo(900))), Optional.of(Length.metres(0.5 + upTo(2))),
            Optional.of(Mass.kilograms(upTo(500))),
            Optional.of(Mass.kilograms(upTo(200))), new FenceFeet.Surface(Optional.empty(), Optional.of(0.1 + upTo(0.8)), Optional.empty()));
        new KentledgeStability(STABILITY).assess(kentledge, 2.4, List.of(wind("worst", trace), wind("ordinary", trace)), RULES.of(any()), LEVELS, trace);
        return trace;
    }

    private Trace panel(int columns, int rows) {
        Trace trace = new Trace();
        Fixings fixings = fixings(columns, rows);
        new FixingGroup(STABILITY).assess(fixings, new FixingGroup.PanelLoad(in("p_s", upTo(2000), "Pa", trace), columns + upTo(1), rows + upTo(1), upTo(0.3),
            columns * rows > 1 && random.nextBoolean() ? upTo(1) : 0, Optional.of(Mass.kilograms(upTo(100))), in("S", upTo(100), "N", trace)),
            random.nextInt(4) == 0 ? FixingGroup.Sharing.EQUAL : FixingGroup.Sharing.BY_AREA, trace);
        return trace;
    }

    private Fixings fixings(int columns, int rows) {
        return new Fixings(columns, rows, Optional.of(Length.metres(0.1 + upTo(0.9))), Optional.of(Length.metres(0.1 + upTo(0.9))),
            random.nextBoolean() ? Optional.of(Force.newtons(1 + upTo(3000))) : Optional.empty(), random.nextBoolean() ? Optional.of(Force.newtons(1
            + upTo(3000))) : Optional.empty());
    }

    private Trace blade(int columns, int rows) {
        Trace trace = new Trace();
        new BracketFixings(STABILITY).assess(fixings(columns, rows), new Brackets(1 + random.nextInt(3), Optional.of(Length.metres(0.1 + upTo(2)))),
            new BracketFixings.BladeLoad(in("F_w", upTo(2000), "N", trace), in("F_e", upTo(90), "N", trace), upTo(1),
            Optional.of(Mass.kilograms(upTo(100)))), trace);
        return trace;
    }

    private Trace others() {
        Trace trace = new Trace();
        Stay.of(STABILITY, in("H_1", upTo(1000), "N", trace), upTo(1.5), Optional.of(Force.newtons(1 + upTo(9000))), trace);
        EdgePull.of(in("w_1", upTo(1000), "Pa", trace), 1 + upTo(9), 1 + upTo(3), 0.1 + upTo(1), trace);
        new FrameBallast(STABILITY).ballast(upTo(25000), 1 + upTo(2), upTo(9000), trace);
        new FrameBallast(STABILITY).sliding(0.1 + upTo(0.8), upTo(20000), upTo(5000), trace);
        return trace;
    }

    @Test
    void everySheetCanBeWorkedOutAgain() {
        int relations = 0;
        for (int i = 0; i < 500; i++) {
            for (Trace trace : List.of(fence(), hoarding(), panel(1 + random.nextInt(4), 1 + random.nextInt(4)), blade(1 + random.nextInt(3), 1
                + random.nextInt(3)), others())) {
                relations += worked(trace);
            }
        }
        assertThat(relations).isGreaterThan(20_000);
    }

    private static int worked(Trace trace) {
        Map<String, Set<Double>> known = new HashMap<>();
        trace.givens().forEach(g -> known.computeIfAbsent(bare(g.symbol()), k -> new HashSet<>()).add(g.value()));
        int relations = 0;
        for (Step step : trace.steps()) {
            Map<String, Double> inputs = new HashMap<>();
            for (Step.Input input : step.inputs()) {
                assertThat(known.getOrDefault(bare(input.symbol()), Set.of())).as("%s uses %s", step.name(), input.symbol()).contains(input.value());
                inputs.put(input.symbol(), input.value());
            }
            if (step.way() == Step.Way.RELATION) {
                relations++;
                assertThat(Formula.value(step.formula(), inputs)).as("%s: %s", step.name(), step.formula())
                    .isCloseTo(step.value(), within(1e-12 * Math.max(1e-3, Math.abs(step.value()))));
            }
            assertThat(step.place()).as(step.name()).isNotBlank();
            assertThat(step.meaning()).as(step.name()).isNotBlank();
            known.computeIfAbsent(bare(step.symbol()), k -> new HashSet<>()).add(step.value());
        }
        return relations;
    }

    private static String bare(String symbol) {
        return symbol.replace("{", "").replace("}", "");
    }
}
