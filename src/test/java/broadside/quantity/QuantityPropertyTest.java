package broadside.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import java.util.function.Supplier;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Test;

/** Properties over seeded random values and texts. */
class QuantityPropertyTest {
    private static final List<String> PIECES = List.of("0", "1", "6", "8", "12", "500", ".", ",", "'", "\"", "’", "”",
            " ", "\u202F", "-", "−", "+", "/", "½", "⅛", "ft", "in", "m", "mm", "M", "kN", "KN", "kg", "lb", "lbf",
            "m/s", "²", "^2", "·", "e", "E9", "NaN", "Bft", "\u0663", "\uD83D", "\u202E", "\0", "\n", "\t", "°", "%",
            "<b>", "{", "and ", "sq ", "9999999999", "kip", "deg", "years", "\uFEFF", "İ", "ß");

    @Test
    void shownValuesReadBackWithinHalfAUnitOfTheLastDigit() {
        Random random = new Random(20260801);
        for (int i = 0; i < 20_000; i++) {
            Dimension dimension = Dimension.values()[random.nextInt(Dimension.values().length)];
            double si = Math.exp(random.nextDouble() * 16 - 6) * (random.nextInt(8) == 0 ? -1 : 1);
            int figures = 1 + random.nextInt(6);
            Units system = random.nextBoolean() ? Units.METRIC : Units.US;
            Shown shown = Show.of(si, dimension, system, figures, Rounding.NEAREST);
            double back = Typed.quantity(shown.text(), dimension).si();
            assertThat(Math.abs(back - si)).as("%s as %s", si, shown.text())
                    .isLessThanOrEqualTo(halfStep(shown, dimension, si, figures) * (1 + 1e-9));
        }
    }

    private static double halfStep(Shown shown, Dimension dimension, double si, int figures) {
        if (shown.unit().isEmpty()) {
            return 0.0254 / 16;
        }
        double factor = Unit.of(dimension, shown.unit()).orElseThrow().toSi();
        double exponent = Math.floor(Math.log10(Math.abs(si) / factor) + 1e-12);
        return 0.5 * Math.pow(10, exponent - figures + 1) * factor;
    }

    @Test
    void upNeverShowsLessAndDownNeverMoreBeyondNoise() {
        Random random = new Random(7);
        for (int i = 0; i < 20_000; i++) {
            double value = (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(9));
            int figures = 1 + random.nextInt(5);
            double size = Math.abs(value);
            double up = Math.abs(new BigDecimal(Show.number(value, figures, Rounding.UP)).doubleValue());
            double down = Math.abs(new BigDecimal(Show.number(value, figures, Rounding.DOWN)).doubleValue());
            assertThat(up).isGreaterThanOrEqualTo(size * (1 - 1.1e-9)).isLessThan(size * (1 + 10 * Math.pow(10, -figures)));
            assertThat(down).isLessThanOrEqualTo(size * (1 + 1.1e-9)).isGreaterThan(size * (1 - 10 * Math.pow(10, -figures)));
        }
    }

    @Test
    void printableNumbersKeepTheirDigitsWhenRoundedUpOrDown() {
        for (int thousandths = 1; thousandths < 10_000; thousandths++) {
            double sum = thousandths * 0.001;
            String up = Show.number(sum, 4, Rounding.UP);
            assertThat(up).isEqualTo(Show.number(sum, 4, Rounding.DOWN));
            assertThat(new BigDecimal(up)).isEqualByComparingTo(BigDecimal.valueOf(thousandths, 3));
        }
    }

    @Test
    void quantitiesMadeFromNumbersReadBackExactly() {
        Random random = new Random(99);
        for (int i = 0; i < 20_000; i++) {
            double value = (random.nextDouble() - 0.3) * Math.pow(10, random.nextInt(12) - 4);
            assertThat(Length.of(Length.metres(value).typed()).metres()).isEqualTo(value);
            assertThat(Moment.of(Moment.newtonMetres(value).typed()).newtonMetres()).isEqualTo(value);
            assertThat(Angle.of(Angle.degrees(value).typed()).radians()).isEqualTo(Angle.degrees(value).radians());
        }
    }

    @Test
    void noTextCausesAnException() {
        Random random = new Random(4711);
        Assertions.assertTimeout(Duration.ofSeconds(60), () -> {
            int values = 0;
            for (int i = 0; i < 200_000; i++) {
                String text = random.nextBoolean() ? pieces(random) : characters(random);
                Dimension dimension = Dimension.values()[random.nextInt(Dimension.values().length)];
                List<Unit> units = dimension.units();
                values += sound(() -> Typed.read(text, dimension), text);
                values += sound(() -> Typed.read(text, dimension, units.get(random.nextInt(units.size()))), text);
            }
            assertThat(values).isGreaterThan(1000);
        });
    }

    private static int sound(Supplier<Reading> read, String text) {
        Reading reading = read.get();
        if (reading instanceof Reading.Value value) {
            assertThat(Double.isFinite(value.si())).isTrue();
            assertThat(value.typed()).isEqualTo(text);
            return 1;
        }
        String problem = reading instanceof Reading.Ambiguous open
                ? open.problem() : ((Reading.Refused) reading).problem();
        assertThat(problem).isNotBlank().doesNotContain("\n", "\0", "\u202E");
        assertThat(problem.length()).isLessThan(300);
        return 0;
    }

    private static String pieces(Random random) {
        StringBuilder text = new StringBuilder();
        for (int n = random.nextInt(9); n >= 0; n--) {
            text.append(PIECES.get(random.nextInt(PIECES.size())));
        }
        return text.toString();
    }

    private static String characters(Random random) {
        StringBuilder text = new StringBuilder();
        for (int n = random.nextInt(120); n >= 0; n--) {
            text.append((char) (random.nextInt(4) == 0 ? random.nextInt(0x10000) : random.nextInt(0x80)));
        }
        return text.toString();
    }

    @Test
    void everyOptionOfferedReadsWithoutDoubt() {
        for (String text : List.of("1,500 mm", "-1,500 mm", "8-1/2", "-8-1/2\"", "8ft.6in.", "999,125 mm")) {
            Reading reading = Typed.read(text, Dimension.LENGTH);
            assertThat(reading).as(text).isInstanceOf(Reading.Ambiguous.class);
            List<String> options = ((Reading.Ambiguous) reading).options();
            assertThat(options).hasSize(2).allSatisfy(option ->
                    assertThat(Typed.read(option, Dimension.LENGTH)).isInstanceOf(Reading.Value.class));
            assertThat(options.stream().map(o -> Length.of(o).metres()).distinct()).hasSize(2);
        }
    }
}
