package broadside.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class QuantityTest {

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void everyDimensionMakesItsQuantity(Dimension dimension) {
        Quantity quantity = Typed.quantity(dimension, 12.5, "as typed");
        assertThat(quantity.si()).isEqualTo(12.5);
        assertThat(quantity.typed()).isEqualTo("as typed");
        assertThat(quantity.dimension()).isEqualTo(dimension);
        assertThat(quantity instanceof Measure || quantity.getClass().getSimpleName().equalsIgnoreCase(dimension.word().replace(" ", ""))).isTrue();
        assertThatThrownBy(() -> Typed.quantity(dimension, Double.NaN, "x")).isInstanceOf(QuantityException.class);
        assertThatThrownBy(() -> Typed.quantity(dimension, Double.NEGATIVE_INFINITY, "x"))
                .isInstanceOf(QuantityException.class).hasMessageContaining("finite number of " + dimension.siUnit());
    }

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void examplesAndTheUnitOfCalculationRead(Dimension dimension) {
        for (Units system : Units.values()) {
            assertThat(Typed.quantity(dimension.example(system), dimension).si()).isPositive();
        }
        assertThat(Unit.of(dimension, dimension.siUnit()).orElseThrow().toSi()).isEqualTo(1.0);
        assertThat(dimension.units()).isNotEmpty().doesNotHaveDuplicates();
    }

    @Test
    void madeFromNumbers() {
        assertThat(Length.metres(2.591)).isEqualTo(new Length(2.591, "2.591 m"));
        assertThat(Speed.metresPerSecond(25)).isEqualTo(new Speed(25, "25 m/s"));
        assertThat(Pressure.pascals(613)).isEqualTo(new Pressure(613, "613 Pa"));
        assertThat(Force.newtons(1200)).isEqualTo(new Force(1200, "1200 N"));
        assertThat(Moment.newtonMetres(0.5)).isEqualTo(new Moment(0.5, "0.5 N m"));
        assertThat(Mass.kilograms(1e7)).isEqualTo(new Mass(1e7, "10000000 kg"));
        assertThat(Angle.radians(0.5)).isEqualTo(new Angle(0.5, "0.5 rad"));
        assertThat(Angle.degrees(15)).isEqualTo(new Angle(0.26179938779914946, "15 deg"));
        assertThat(Area.squareMetres(2.9)).isEqualTo(new Area(2.9, "2.9 m2"));
        assertThat(Density.kilogramsPerCubicMetre(2400)).isEqualTo(new Density(2400, "2400 kg/m3"));
        assertThat(Period.years(50)).isEqualTo(new Period(50, "50 years"));
        assertThatThrownBy(() -> Length.metres(Double.NaN)).isInstanceOf(QuantityException.class);
        assertThat(Angle.degrees(1e-150).radians()).isPositive();
    }

    @Test
    void comparedByValue() {
        assertThat(Length.of("8 ft 6 in")).isGreaterThan(Length.of("2.5 m"));
        assertThat(Mass.of("1 t")).isEqualByComparingTo(Mass.of("1000 kg"));
    }

    @Test
    void keepsTheTextAsTyped() {
        assertThat(Length.of("  8’ 6” ").typed()).isEqualTo("  8’ 6” ");
    }

    @Test
    void refusesInOneClearLine() {
        assertThatThrownBy(() -> Force.of("12 kg")).isInstanceOf(QuantityException.class)
                .hasMessage("\"12 kg\" is a mass; a force is typed like 1.2 kN or 300 lbf");
        assertThatThrownBy(() -> Mass.of("1.2 kN"))
                .hasMessage("\"1.2 kN\" is a force; a mass is typed like 120 kg or 260 lb");
        assertThatThrownBy(() -> Length.of("1,500 mm"))
                .hasMessage("\"1,500 mm\" can be read as 1500 mm or as 1.5 mm: type one of these");
        assertThatThrownBy(() -> Length.of(null)).hasMessageStartingWith("nothing was typed");
        assertThatThrownBy(() -> Length.of("1".repeat(99) + " m")).hasMessageContaining("longer than 100");
        assertThatThrownBy(() -> Length.of("2\n4 m")).hasMessageContaining("does not print");
        assertThatThrownBy(() -> Length.of("2\u202E4 m")).hasMessageContaining("does not print");
        assertThat(Length.of("\uFEFF2.4\u200B m").metres()).isEqualTo(2.4);
    }

    @Test
    void warnsOfUnusualReadings() {
        assertThat(warnings("1.2 KN", Dimension.FORCE)).isEqualTo("[\"KN\" is read as kN, with k for kilo and N for newton]");
        assertThat(warnings("3 KNm", Dimension.MOMENT)).isEqualTo("[\"KNm\" is read as kN m, with k for kilo and N for newton]");
        assertThat(warnings("50 kN", Dimension.SPEED)).isEqualTo("[\"kN\" is read as kn, the knot]");
        assertThat(warnings("1,500 m/s", Dimension.SPEED)).isEqualTo(
                "[\"1,500 m/s\" is read as 1.5 m/s, as 1500 m/s would be an unlikely speed]");
        assertThat(warnings("8ft2", Dimension.LENGTH)).isEqualTo("[\"8ft2\" is read as 8 ft 2 in]");
        assertThat(warnings("1.2 kN", Dimension.FORCE)).isEqualTo("[]");
        assertThat(warnings("1.5 m", Dimension.LENGTH)).isEqualTo("[]");
    }

    private static String warnings(String text, Dimension dimension) {
        return ((Reading.Value) Typed.read(text, dimension)).warnings().toString();
    }

    @Test
    void feetAndInchesCarryTheFoot() {
        Reading.Value value = (Reading.Value) Typed.read("8 ft 6 in", Dimension.LENGTH);
        assertThat(value.unit().symbol()).isEqualTo("ft");
        assertThat(value.si()).isEqualTo(2.5908);
    }

    @Test
    void aFieldUnitOfAnotherKindIsAFaultOfTheProgram() {
        Unit newton = Unit.of(Dimension.FORCE, "N").orElseThrow();
        assertThatThrownBy(() -> Typed.read("2", Dimension.LENGTH, newton)).isInstanceOf(IllegalArgumentException.class);
    }
}
