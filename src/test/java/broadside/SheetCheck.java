package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

/** Works the printed formulas of one sheet out again and refuses inputs that no line above gives. */
public final class SheetCheck {

    public static void holds(Trace sheet) {
        Map<String, Set<Double>> known = new HashMap<>();
        sheet.givens().forEach(g -> known.computeIfAbsent(bare(g.symbol()), k -> new HashSet<>()).add(g.value()));
        for (Step step : sheet.steps()) {
            Map<String, Double> inputs = new HashMap<>();
            for (Step.Input input : step.inputs()) {
                assertThat(known.getOrDefault(bare(input.symbol()), Set.of())).as(step.name() + " uses " + input.symbol()).contains(input.value());
                inputs.put(input.symbol(), input.value());
            }
            if (step.way() == Step.Way.RELATION) {
                assertThat(Formula.value(step.formula(), inputs)).as("%s: %s = %s", step.name(), step.symbol(), step.formula())
                    .isCloseTo(step.value(), within(1e-12 * Math.max(1e-3, Math.abs(step.value()))));
            }
            assertThat(step.place()).as(step.name()).isNotBlank();
            known.computeIfAbsent(bare(step.symbol()), k -> new HashSet<>()).add(step.value());
        }
    }

    private static String bare(String symbol) {
        return symbol.replace("{", "").replace("}", "");
    }

    private SheetCheck() { }
}
