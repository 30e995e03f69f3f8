package broadside.trace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class TraceTest {

    private static final OwnValue PRESSURE = new OwnValue("velocity-pressure", 650, "Pa", "survey");

    private static double pressure(Trace trace, double value, String unit) {
        return trace.line("velocity-pressure", "q_p", "peak pressure").in("v", 30, "m/s").in("f", 2).from("a rule", Status.READ).gives("f v", value, unit);
    }

    @Test
    void recordingAStepHandsItsValueBack() {
        Trace trace = new Trace();
        assertThat(pressure(trace, 812.5, "Pa")).isEqualTo(812.5);
        Step step = trace.steps().get(0);
        assertThat(step.name()).isEqualTo("velocity-pressure");
        assertThat(step.symbol()).isEqualTo("q_p");
        assertThat(step.meaning()).isEqualTo("peak pressure");
        assertThat(step.way()).isEqualTo(Step.Way.RELATION);
        assertThat(step.formula()).isEqualTo("f v");
        assertThat(step.inputs()).containsExactly(new Step.Input("v", 30, "m/s"), new Step.Input("f", 2, "1"));
        assertThat(step.value()).isEqualTo(812.5);
        assertThat(step.unit()).isEqualTo("Pa");
        assertThat(step.place()).isEqualTo("a rule");
        assertThat(step.status()).isEqualTo(Status.READ);
        assertThat(step.replaced()).isEmpty();
        assertThat(trace.overridesUsed()).isEmpty();
    }

    @Test
    void aReadingIsMarkedAsSuch() {
        Trace trace = new Trace();
        assertThat(trace.line("c", "c", "c").reads("read at x = 1", 2.1, "1")).isEqualTo(2.1);
        assertThat(trace.steps().get(0).way()).isEqualTo(Step.Way.READING);
        assertThat(trace.steps().get(0).formula()).isEqualTo("read at x = 1");
    }

    @Test
    void anOverrideReplacesTheValueAndIsMarked() {
        Trace trace = new Trace(List.of(PRESSURE));
        assertThat(pressure(trace, 812.5, "Pa")).isEqualTo(650);
        Step step = trace.steps().get(0);
        assertThat(step.value()).isEqualTo(650);
        assertThat(step.way()).isEqualTo(Step.Way.READING);
        assertThat(step.formula()).isEqualTo("set by the user: survey");
        assertThat(step.inputs()).isEmpty();
        assertThat(step.status()).isEqualTo(Status.GIVEN);
        assertThat(step.replaced()).contains(new Step.Replaced(812.5, "survey"));
        assertThat(trace.overridesUsed()).containsExactly(PRESSURE);
    }

    @Test
    void anOverrideHoldsForTheSameUnitOnly() {
        Trace trace = new Trace(List.of(new OwnValue("velocity-pressure", 650, "1", "survey")));
        assertThat(pressure(trace, 812.5, "Pa")).isEqualTo(812.5);
        assertThat(trace.overridesUsed()).isEmpty();
        assertThat(trace.steps().get(0).replaced()).isEmpty();
    }

    @Test
    void anOverrideHoldsForItsOwnNameOnly() {
        Trace trace = new Trace(List.of(PRESSURE, new OwnValue("velocity", 3, "Pa", "x"), new OwnValue("velocity-pressure/A", 3, "Pa", "x")));
        assertThat(trace.line("velocity-pressure/B", "q", "q").gives("q", 5, "Pa")).isEqualTo(5);
        assertThat(trace.line("velocity-pressures", "q", "q").gives("q", 6, "Pa")).isEqualTo(6);
    }

    @Test
    void partsGetSuffixesOnOneSheet() {
        Trace trace = new Trace();
        pressure(trace.part("stretch-1"), 1, "Pa");
        pressure(trace.part("stretch-1").part("left"), 2, "Pa");
        pressure(trace.part(""), 3, "Pa");
        assertThat(trace.steps()).extracting(Step::name)
            .containsExactly("velocity-pressure/stretch-1", "velocity-pressure/stretch-1/left", "velocity-pressure");
        assertThat(trace.part("x").steps()).isEqualTo(trace.steps());
    }

    @Test
    void anOverrideHoldsForEveryPartUnlessItNamesOne() {
        OwnValue one = new OwnValue("pressure/A/left", 7, "Pa", "r");
        Trace named = new Trace(List.of(one));
        assertThat(named.part("left").line("pressure/A", "w", "w").gives("w", 1, "Pa")).isEqualTo(7);
        assertThat(named.part("right").line("pressure/A", "w", "w").gives("w", 1, "Pa")).isEqualTo(1);
        Trace all = new Trace(List.of(PRESSURE));
        assertThat(pressure(all.part("left"), 1, "Pa")).isEqualTo(650);
        assertThat(pressure(all.part("right"), 2, "Pa")).isEqualTo(650);
        assertThat(all.overridesUsed()).as("used in parts, seen on the sheet").containsExactly(PRESSURE);
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void whatIsNoResultIsRefused(double value) {
        Trace trace = new Trace();
        assertThatThrownBy(() -> pressure(trace, value, "Pa")).isInstanceOf(ArithmeticException.class).hasMessageContaining("velocity-pressure");
        assertThatThrownBy(() -> trace.line("c", "c", "c").reads("x", value, "1")).isInstanceOf(ArithmeticException.class);
        assertThat(trace.steps()).isEmpty();
    }

    @Test
    void findReturnsTheLast() {
        Trace trace = new Trace();
        pressure(trace, 1, "Pa");
        pressure(trace, 2, "Pa");
        pressure(trace.part("a"), 3, "Pa");
        assertThat(trace.find("velocity-pressure").orElseThrow().value()).isEqualTo(2);
        assertThat(trace.find("velocity-pressure/a").orElseThrow().value()).isEqualTo(3);
        assertThat(trace.find("pressure")).isEmpty();
    }

    @Test
    void aGivenValueIsNotedOnceAndHandedBack() {
        Trace trace = new Trace();
        assertThat(trace.given("b", "width", 2.5, "m", "2.5 m")).isEqualTo(2.5);
        trace.part("x").given("b", "width", 2.5, "m", "2.5 m");
        trace.given("b", "width", 2.6, "m", "2.6 m");
        assertThat(trace.givens()).extracting(Trace.Given::value).containsExactly(2.5, 2.6);
    }

    @Test
    void whatIsHandedOutCannotBeChanged() {
        Trace trace = new Trace();
        pressure(trace, 1, "Pa");
        assertThatThrownBy(() -> trace.steps().clear()).isInstanceOf(UnsupportedOperationException.class);
        assertThatThrownBy(() -> trace.steps().get(0).inputs().clear()).isInstanceOf(UnsupportedOperationException.class);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "\t\n"})
    void anOverrideNeedsAReason(String reason) {
        assertThatThrownBy(() -> new OwnValue("a", 1, "1", reason)).isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @EnumSource(Status.class)
    void aStatusIsReadBackFromItsWordAndNeverRaised(Status status) {
        assertThat(Status.of(status.word())).contains(status);
        for (Status other : Status.values()) {
            assertThat(status.weaker(status.weaker(other))).isEqualTo(status.weaker(other));
        }
        assertThat(status.weaker(Status.RECALLED)).isEqualTo(Status.RECALLED);
        assertThat(Status.READ.weaker(status)).isIn(status, Status.READ);
    }

    @Test
    void theOrderOfStatusesIsFixed() {
        assertThat(Status.READ.weaker(Status.DERIVED)).isEqualTo(Status.READ);
        assertThat(Status.GIVEN.weaker(Status.READ)).isEqualTo(Status.READ);
        assertThat(Status.READ.weaker(Status.COMMON_PRACTICE)).isEqualTo(Status.COMMON_PRACTICE);
        assertThat(Status.SECOND_HAND.weaker(Status.COMMON_PRACTICE)).isEqualTo(Status.SECOND_HAND);
        assertThat(Status.RECALLED.weaker(Status.SECOND_HAND)).isEqualTo(Status.RECALLED);
        assertThat(Status.of("printed")).isEmpty();
        assertThat(Status.RECALLED.shown()).contains("not yet checked against print");
    }
}
