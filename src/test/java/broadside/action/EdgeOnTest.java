package broadside.action;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.Panel;
import broadside.table.Rows;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class EdgeOnTest {

    private static final Rows RULE = TableLibrary.shipped().edition("own-rules/1").orElseThrow().rows("edge-on");
    private static final Panel PANEL = Cases.board("", 3, 2, 2.5, 0);

    private static final EdgeOn.Wind WIND = new EdgeOn.Wind(1000, Cases.SYMBOLS, Optional.empty());

    @Test
    void theEdgeAndBothFacesCount() {
        Trace trace = new Trace();
        EdgeOn found = EdgeOn.of(RULE, PANEL, 0.1, WIND, trace);
        assertThat(found.force()).as("1000 (2.0 x 0.1 x 2 + 2 x 0.04 x 3 x 2)").isCloseTo(880, within(1e-9));
        assertThat(found.moment()).isCloseTo(880 * 3.5, within(1e-9));
        assertThat(trace.find("force/edge-on").orElseThrow().status()).isEqualTo(Status.RECALLED);
        assertThat(trace.find("force/edge-on").orElseThrow().place()).startsWith("own rule");
    }

    @Test
    void withoutAThicknessOnlyFrictionCounts() {
        assertThat(EdgeOn.of(RULE, PANEL, 0, WIND, new Trace()).force()).isCloseTo(480, within(1e-9));
    }

    @Test
    void panelsAreAdded() {
        assertThat(new EdgeOn(1, 2).plus(new EdgeOn(10, 20))).isEqualTo(new EdgeOn(11, 22));
    }
}
