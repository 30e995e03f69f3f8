package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.Footing;
import broadside.panel.Footing.Kind;
import broadside.support.FootLoad;
import broadside.support.Footings.Request;
import broadside.support.GroundCases;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The sheet of a footing: every formula gives its value, and nothing goes in that no line above gives. */
class FootingSheetTest {

    private static final List<Map<String, String>> SOILS = List.of(Map.of("ground", "gravel"), Map.of("ground", "clay", "doubled", ""),
        Map.of("ground", "sand", "paved", "", "increased", ""), Map.of("ground", "average"), Map.of(), Map.of("cohesion", "35 kPa"),
        Map.of("friction-angle", "28 deg", "water", "high"), Map.of("lateral", "150 psf/ft", "doubled", "", "increased", ""));

    static Stream<Trace> sheets() {
        List<List<FootLoad>> loads = List.of(List.of(new FootLoad("a", 3000, 7500)), List.of(new FootLoad("a", 6000, 3000), new FootLoad("b", 900, 9000)),
            List.of(new FootLoad("a", 0, 0)), List.of(new FootLoad("a", 0, 5000)), List.of(new FootLoad("a", 40000, 400)));
        return SOILS.stream().flatMap(soil -> Stream.of(Kind.values()).flatMap(kind -> Stream.of(Map.<String, String>of(), Map.of("depth", "0.9 m"),
            Map.of("width", "0.7 m"), Map.of("width", "1.7 m", "depth", "0.5 m", "length", "2.4 m")).flatMap(size -> loads.stream().map(load -> {
                Map<String, String> answers = new HashMap<>(soil);
                answers.putAll(size);
                Footing footing = GroundCases.footing(kind, false, answers);
                Trace trace = new Trace();
                GroundCases.FOOTINGS.hold(new Request(Optional.of(footing), load, 1500, 200, GroundCases.LEVELS, GroundCases.EQU, "en", 0.1143, false), trace);
                return trace;
            }))));
    }

    @ParameterizedTest
    @MethodSource("sheets")
    void whatIsPrintedIsWhatWasCalculated(Trace sheet) {
        Map<String, Set<Double>> known = new HashMap<>();
        sheet.givens().forEach(g -> known.computeIfAbsent(bare(g.symbol()), k -> new HashSet<>()).add(g.value()));
        for (Step step : sheet.steps()) {
            Map<String, Double> inputs = new HashMap<>();
            step.inputs().forEach(i -> {
                inputs.put(i.symbol(), i.value());
                assertThat(known.getOrDefault(bare(i.symbol()), Set.of())).as(step.name() + " uses " + i.symbol()).contains(i.value());
            });
            if (step.way() == Step.Way.RELATION) {
                assertThat(Formula.value(step.formula(), inputs)).as(step.name() + " = " + step.formula())
                    .isCloseTo(step.value(), within(1e-12 * Math.max(1e-3, Math.abs(step.value()))));
            }
            assertThat(step.place()).as(step.name()).isNotBlank();
            known.computeIfAbsent(bare(step.symbol()), k -> new HashSet<>()).add(step.value());
        }
        assertThat(sheet.find("embedment-depth").isPresent() || sheet.find("overturning-ratio").isPresent()).isTrue();
    }

    private static String bare(String symbol) {
        return symbol.replace("{", "").replace("}", "");
    }
}
