package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StripTest {

    private static final List<String> NAMES = List.of("A", "B", "C", "D");

    private static List<Strip> cut(double width) {
        return Strip.cut(width, NAMES, List.of(0.6, 4.0, 8.0, Double.POSITIVE_INFINITY));
    }

    @Test
    void aLongWallHasAllStrips() {
        assertThat(cut(20)).containsExactly(new Strip("A", 0, 0.6), new Strip("B", 0.6, 4), new Strip("C", 4, 8), new Strip("D", 8, 20));
        assertThat(cut(20).get(3).width()).isEqualTo(12);
    }

    @Test
    void aStripBeyondTheWidthIsLeftOutAndTheLastEndsWithIt() {
        assertThat(cut(5)).containsExactly(new Strip("A", 0, 0.6), new Strip("B", 0.6, 4), new Strip("C", 4, 5));
        assertThat(cut(4)).containsExactly(new Strip("A", 0, 0.6), new Strip("B", 0.6, 4));
        assertThat(cut(0.3)).containsExactly(new Strip("A", 0, 0.3));
        assertThat(cut(0)).isEmpty();
    }

    @Test
    void aStripWithoutWidthIsLeftOut() {
        assertThat(Strip.cut(5, List.of("A", "B", "C"), List.of(2.0, 2.0, 9.0))).containsExactly(new Strip("A", 0, 2), new Strip("C", 2, 5));
        assertThat(Strip.cut(5, List.of("A", "B"), List.of(0.0, 9.0))).containsExactly(new Strip("B", 0, 5));
    }

    @Test
    void stripsThatEndBeforeTheWidthLeaveARest() {
        assertThat(Strip.cut(5, List.of("A"), List.of(2.0))).containsExactly(new Strip("A", 0, 2));
    }

    @Test
    void stripsOfAnyWidthJoinWithoutGapAndFillIt() {
        Random random = new Random(7);
        for (int i = 0; i < 500; i++) {
            double width = random.nextDouble() * 30 + 1e-3;
            List<Strip> strips = cut(width);
            double at = 0;
            for (Strip strip : strips) {
                assertThat(strip.from()).isEqualTo(at);
                assertThat(strip.width()).isPositive();
                at = strip.to();
            }
            assertThat(at).isEqualTo(width);
        }
    }

    @ParameterizedTest
    @CsvSource({"0,4,2,6,2", "2,6,0,4,2", "0,4,4,6,0", "0,1,5,6,0", "0,10,3,4,1", "3,4,0,10,1", "-2,2,-1,1,2", "1,1,0,2,0"})
    void overlapIsWhatTwoStretchesHaveInCommon(double fromA, double toA, double fromB, double toB, double common) {
        assertThat(Strip.overlap(fromA, toA, fromB, toB)).isCloseTo(common, within(1e-15));
    }
}
