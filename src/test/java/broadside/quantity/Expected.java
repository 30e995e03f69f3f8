package broadside.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;

/** Compares a reading with one cell of a table: a number, {@code ? readings}, or {@code ! words}. */
final class Expected {
    private Expected() {
    }

    static void check(Reading reading, String expected) {
        String rest = expected.substring(1).strip();
        if (expected.startsWith("?")) {
            assertThat(reading).isInstanceOf(Reading.Ambiguous.class);
            assertThat(((Reading.Ambiguous) reading).options()).isEqualTo(List.of(rest.split("; ")));
        } else if (expected.startsWith("!")) {
            assertThat(reading).isInstanceOf(Reading.Refused.class);
            assertThat(((Reading.Refused) reading).problem()).contains(rest).doesNotContain("\n");
        } else {
            assertThat(reading).isInstanceOf(Reading.Value.class);
            double si = Double.parseDouble(expected);
            assertThat(((Reading.Value) reading).si()).isCloseTo(si, within(Math.ulp(si)));
        }
    }
}
