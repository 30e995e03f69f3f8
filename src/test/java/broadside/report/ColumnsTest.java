package broadside.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.Random;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class ColumnsTest {

    private static final Offset<Double> NEAR = Offset.offset(1e-6);

    @Test
    void sharesWhatIsLeftOverByWeight() {
        assertThat(Columns.fit(new double[] {50, 50}, new double[] {20, 20}, new int[] {1, 3}, 300))
            .containsExactly(new double[] {100, 200}, NEAR);
    }

    @Test
    void keepsWordsWholeWhenItCan() {
        double[] widths = Columns.fit(new double[] {400, 60, 40}, new double[] {50, 60, 40}, new int[] {1, 1, 1}, 300);
        assertThat(widths).containsExactly(new double[] {200, 60, 40}, NEAR);
    }

    @Test
    void alwaysFillsTheWidth() {
        Random random = new Random(7);
        for (int i = 0; i < 2_000; i++) {
            int count = 1 + random.nextInt(10);
            double[] least = random.doubles(count, 0, random.nextInt(10) == 0 ? 9_000 : 100).toArray();
            double[] whole = Arrays.stream(least).map(w -> w + random.nextInt(300)).toArray();
            int[] weights = random.ints(count, -1, 5).toArray();
            double[] widths = Columns.fit(whole, least, weights, 450);
            assertThat(Arrays.stream(widths).sum()).isCloseTo(450, NEAR);
            assertThat(Arrays.stream(widths).min().orElseThrow()).isNotNegative();
            if (Arrays.stream(least).sum() <= 450) {
                for (int k = 0; k < count; k++) {
                    assertThat(widths[k]).isGreaterThanOrEqualTo(least[k] - 1e-9);
                }
            }
        }
    }
}
