package broadside.panel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.quantity.Length;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;

class HoardingTest {

    private static Hoarding.Gate gate(double from, double width) {
        return new Hoarding.Gate(Length.metres(from), Length.metres(width));
    }

    private static Hoarding hoarding(double length, Hoarding.Gate... gates) {
        return new Hoarding("H1", Length.metres(length), Length.metres(2.4), Length.metres(0.1), 0.9, Length.metres(1.5), Length.metres(2), 1, List.of(gates),
            Optional.empty(), Hoarding.Held.NONE, List.of());
    }

    private static Panel panel(String part, double width, double middle, double left, double right) {
        return new Panel(part, Panel.Kind.WALL, width, 2.4, 0.1, middle, 0.9, left, right,
            new Panel.AsTyped(part.isEmpty() ? Length.metres(width).typed() : "", "2.4 m", "0.1 m", ""));
    }

    @Test
    void withoutGatesItIsOnePanelWithoutAName() {
        assertThat(hoarding(20).panels()).usingRecursiveFieldByFieldElementComparatorIgnoringFields("typed").containsExactly(panel("", 20, 0, 1.5, 2));
        assertThat(hoarding(20).panels().get(0).top()).isEqualTo(2.5);
        assertThat(hoarding(20).panels().get(0).area()).isEqualTo(48);
        assertThat(hoarding(20).panels().get(0).endsAlike()).isFalse();
    }

    @Test
    void aGateInTheMiddleMakesTwoFreeEnds() {
        assertThat(hoarding(20, gate(8, 2)).panels()).usingRecursiveFieldByFieldElementComparatorIgnoringFields("typed").containsExactly(panel("stretch-1", 8, -6, 1.5, 0), panel("stretch-2", 10, 5, 0, 2));
    }

    @Test
    void aGateAtAnEndLeavesNoStretchThereAndNoReturn() {
        assertThat(hoarding(20, gate(0, 4)).panels()).usingRecursiveFieldByFieldElementComparatorIgnoringFields("typed").containsExactly(panel("", 16, 2, 0, 2));
        assertThat(hoarding(20, gate(16, 4)).panels()).usingRecursiveFieldByFieldElementComparatorIgnoringFields("typed").containsExactly(panel("", 16, -2, 1.5, 0));
        assertThat(hoarding(20, gate(0, 4), gate(16, 4)).panels()).usingRecursiveFieldByFieldElementComparatorIgnoringFields("typed").containsExactly(panel("", 12, 0, 0, 0));
    }

    @Test
    void gatesMayBeGivenInAnyOrder() {
        assertThat(hoarding(20, gate(14, 2), gate(5, 1)).panels())
            .containsExactly(panel("stretch-1", 5, -7.5, 1.5, 0), panel("stretch-2", 8, 0, 0, 0), panel("stretch-3", 4, 8, 0, 2));
        assertThat(hoarding(20, gate(14, 2), gate(5, 1)).gates()).containsExactly(gate(5, 1), gate(14, 2));
    }

    @Test
    void gatesSideBySideLeaveNothingBetweenThem() {
        assertThat(hoarding(20, gate(8, 2), gate(10, 2)).panels()).usingRecursiveFieldByFieldElementComparatorIgnoringFields("typed").containsExactly(panel("stretch-1", 8, -6, 1.5, 0), panel("stretch-2", 8, 6, 0, 2));
    }

    @Test
    void shutItIsTheWholeWall() {
        assertThat(hoarding(20, gate(8, 2)).shut()).usingRecursiveComparison().ignoringFields("typed").isEqualTo(panel("gates-shut", 20, 0, 1.5, 2));
    }

    @Test
    void stretchesAndGatesFillTheLength() {
        Random random = new Random(5);
        for (int i = 0; i < 300; i++) {
            double length = 10 + random.nextInt(60);
            double[] at = random.ints(4, 1, (int) length * 10).distinct().sorted().mapToDouble(k -> k / 10.0).toArray();
            List<Hoarding.Gate> gates = new ArrayList<>();
            for (int k = 0; k + 1 < at.length; k += 2) {
                gates.add(gate(at[k], at[k + 1] - at[k]));
            }
            Hoarding hoarding = hoarding(length, gates.toArray(Hoarding.Gate[]::new));
            double filled = hoarding.panels().stream().mapToDouble(Panel::width).sum() + gates.stream().mapToDouble(g -> g.width().metres()).sum();
            assertThat(filled).isCloseTo(length, within(1e-9));
            assertThat(hoarding.panels()).extracting(Panel::middle).isSorted();
            assertThat(hoarding.panels().stream().mapToDouble(Panel::returnLeft).sum()).isIn(0.0, 1.5);
            assertThat(hoarding.panels().stream().skip(1).mapToDouble(Panel::returnLeft).sum()).as("only at the outer end").isZero();
        }
    }
}
