package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

/**
 * What the calculation sheet prints is what was calculated: every printed formula, worked out from its printed inputs,
 * gives the printed value, and no number goes into a step that no line above gives.
 */
class CalculationSheetTest {

    @Test
    void every_formula_gives_its_value_from_its_inputs() {
        int relations = 0;
        for (ItemResult item : AllJobs.results()) {
            for (Step step : item.sheet().steps()) {
                if (step.way() != Step.Way.RELATION) {
                    continue;
                }
                Map<String, Double> inputs = new HashMap<>();
                step.inputs().forEach(i -> inputs.put(i.symbol(), i.value()));
                double value = Formula.value(step.formula(), inputs);
                assertThat(value).as("%s: %s = %s", step.name(), step.symbol(), step.formula())
                    .isCloseTo(step.value(), within(1e-12 * Math.max(1e-3, Math.abs(step.value()))));
                relations++;
            }
        }
        assertThat(relations).isGreaterThan(10_000);
    }

    @Test
    void nothing_goes_in_that_was_neither_given_nor_found() {
        Set<String> wrong = new HashSet<>();
        for (ItemResult item : AllJobs.results()) {
            wrong.addAll(strangers(item.sheet()));
        }
        assertThat(wrong).isEmpty();
    }

    private static List<String> strangers(Trace sheet) {
        Map<String, Set<Double>> known = new HashMap<>();
        sheet.givens().forEach(g -> known.computeIfAbsent(bare(g.symbol()), k -> new HashSet<>()).add(g.value()));
        List<String> wrong = new ArrayList<>();
        for (Step step : sheet.steps()) {
            for (Step.Input input : step.inputs()) {
                if (!known.getOrDefault(bare(input.symbol()), Set.of()).contains(input.value())) {
                    wrong.add(step.name().replaceAll("/.*", "") + " uses " + input.symbol() + ", which no line above gives");
                }
            }
            known.computeIfAbsent(bare(step.symbol()), k -> new HashSet<>()).add(step.value());
        }
        return wrong;
    }

    /** c_{A} and c_A are the same symbol. */
    private static String bare(String symbol) {
        return symbol.replace("{", "").replace("}", "");
    }

    @Test
    void every_step_says_where_its_rule_stands() {
        for (ItemResult item : AllJobs.results()) {
            for (Step step : item.sheet().steps()) {
                assertThat(step.place()).as(step.name()).isNotBlank();
                assertThat(step.meaning()).as(step.name()).isNotBlank();
            }
        }
    }
}
