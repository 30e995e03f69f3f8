package broadside.table;

import static broadside.table.TableText.ROWS;
import static broadside.table.TableText.rows;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import broadside.trace.Status;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class RowsTest {

    private static Rows overlay() {
        List<String> own = new ArrayList<>(ROWS.subList(0, 11));
        own.set(1, "# source: OWN | 2026 | office rules");
        own.add("alpha, 1.9, m, sheet 4, common practice");
        own.add("delta, 7, -, sheet 5, derived");
        return rows(own).over(rows(ROWS));
    }

    @Test
    void aNumberComesWithThePlaceAndStatusOfItsRow() {
        assertThat(rows(ROWS).number("alpha", "value"))
            .isEqualTo(new Coefficient(1.5, "1", new Source("PUB", "2020", "3.1, (2)", Status.READ), "read at alpha"));
        assertThat(rows(ROWS).number("gamma", "value").value()).isEqualTo(-2);
        assertThat(rows(ROWS).text("alpha", "unit")).isEqualTo("m");
        assertThat(rows(ROWS).keys()).containsExactly("alpha", "beta", "gamma");
    }

    @Test
    void aCellThatIsNotPrintedIsRefused() {
        assertThat(rows(ROWS).isPrinted("beta", "value")).isFalse();
        assertThat(rows(ROWS).isPrinted("alpha", "value")).isTrue();
        assertThatThrownBy(() -> rows(ROWS).number("beta", "value")).isInstanceOf(OutsideTable.class)
            .hasMessage("PUB:2020, 3.2 prints no value for beta");
        assertThatThrownBy(() -> rows(ROWS).number("alpha", "unit")).isInstanceOf(TableFormat.class);
    }

    @Test
    void aRowOrColumnThatIsNotThereIsAnErrorOfTheProgram() {
        assertThat(rows(ROWS).has("delta")).isFalse();
        assertThatThrownBy(() -> rows(ROWS).number("delta", "value")).isInstanceOf(IllegalArgumentException.class).hasMessage("t.csv has no row delta");
        assertThatThrownBy(() -> rows(ROWS).number("alpha", "weight")).isInstanceOf(IllegalArgumentException.class)
            .hasMessage("t.csv has no column weight");
    }

    @Test
    void anOverlayHoldsOnlyWhatDiffers() {
        assertThat(overlay().keys()).containsExactly("alpha", "delta", "beta", "gamma");
        assertThat(overlay().number("alpha", "value"))
            .isEqualTo(new Coefficient(1.9, "1", new Source("OWN", "2026", "sheet 4", Status.COMMON_PRACTICE), "read at alpha"));
        assertThat(overlay().number("gamma", "value").source()).isEqualTo(new Source("PUB", "2020", "3.3", Status.DERIVED));
        assertThat(overlay().number("delta", "value").value()).isEqualTo(7);
        assertThat(overlay().has("delta")).isTrue();
        assertThat(overlay().has("beta")).isTrue();
        assertThat(overlay().has("zeta")).isFalse();
        assertThat(overlay().isPrinted("beta", "value")).isFalse();
        assertThatThrownBy(() -> overlay().number("beta", "value")).isInstanceOf(OutsideTable.class);
        assertThatThrownBy(() -> overlay().text("zeta", "value")).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void theBasisIsLeftAsItWas() {
        Rows basis = rows(ROWS);
        Rows own = overlay();
        assertThat(own.number("alpha", "value").value()).isEqualTo(1.9);
        assertThat(basis.number("alpha", "value").value()).isEqualTo(1.5);
        assertThat(basis.has("delta")).isFalse();
    }
}
