package broadside.site;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.quantity.Speed;
import broadside.table.OutsideTable;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class SpeedConversionTest {

    private static final double MPH = 0.44704;
    private static final SpeedConversion CONVERSION =
        new SpeedConversion(TableLibrary.shipped().edition("gust-factors/1").orElseThrow().curve("durst"));

    private static double convert(double speed, Averaging from, Averaging to) {
        return CONVERSION.convert(Speed.metresPerSecond(speed), from, to, new Trace());
    }

    static Stream<Arguments> pairs() {
        return Stream.of(Averaging.values()).filter(a -> a.seconds() >= 1)
            .flatMap(a -> Stream.of(Averaging.values()).filter(b -> b.seconds() >= 1).map(b -> Arguments.of(a, b)));
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void thereAndBackIsTheSameSpeed(Averaging from, Averaging to) {
        double there = convert(40, from, to);
        assertThat(convert(there, to, from)).isCloseTo(40, within(1e-9));
        assertThat(Double.compare(there, 40.0)).as("a shorter time has the greater speed").isEqualTo(Double.compare(from.seconds(), to.seconds()));
        assertThat(convert(80, from, to)).isCloseTo(2 * there, within(1e-9));
    }

    /** C. Canitz, correspondence of engineers, 1998: a fastest mile of 80 mph on the curve of Durst. */
    @Test
    void aFastestMileOf80MphIsAGustOf95Point6Mph() {
        Trace trace = new Trace();
        double gust = CONVERSION.convertFastestMile(Speed.of("80 mph"), Averaging.GUST_3_S, trace);
        assertThat(gust / MPH).isCloseTo(95.6, within(0.05));
        assertThat(trace.find("averaging-time").orElseThrow().value()).as("one mile at 80 mph").isCloseTo(45, within(1e-9));
        assertThat(trace.find("ratio-from").orElseThrow().value()).isCloseTo(1.28, within(1e-9));
        assertThat(trace.find("ratio-to").orElseThrow().value()).isEqualTo(1.53);
        assertThat(trace.find("speed").orElseThrow().value()).isEqualTo(gust);
    }

    @Test
    void aMeanOfAnHourIsThePrintedRatioBelowAGust() {
        assertThat(convert(10, Averaging.MEAN_1_H, Averaging.GUST_3_S)).isCloseTo(15.3, within(1e-9));
        assertThat(convert(10, Averaging.MEAN_1_H, Averaging.GUST_1_S)).isCloseTo(15.7, within(1e-9));
        assertThat(convert(10.5, Averaging.MEAN_10_MIN, Averaging.MEAN_1_H)).isCloseTo(10, within(1e-9));
    }

    @Test
    void theSheetTellsTheSpeedsAndHowWellTheRatiosAreKnown() {
        Trace trace = new Trace();
        CONVERSION.convert(Speed.of("26 m/s"), Averaging.MEAN_10_MIN, Averaging.GUST_3_S, trace);
        assertThat(trace.givens()).containsExactly(new Trace.Given("v_1", "wind speed, 10 min mean", 26, "m/s", "26 m/s"));
        assertThat(trace.steps()).extracting(Step::name).containsExactly("ratio-from", "ratio-to", "speed");
        assertThat(trace.find("ratio-from").orElseThrow().status()).isEqualTo(Status.SECOND_HAND);
        assertThat(trace.find("ratio-to").orElseThrow().status()).isEqualTo(Status.READ);
    }

    @Test
    void aTimeOutsideTheCurveIsRefused() {
        assertThatThrownBy(() -> convert(40, Averaging.GUST_0_2_S, Averaging.GUST_3_S)).isInstanceOf(OutsideTable.class)
            .hasMessageContaining("covers t from 1 to 3600; this case has 0.2");
        assertThatThrownBy(() -> convert(40, Averaging.GUST_3_S, Averaging.GUST_0_2_S)).isInstanceOf(OutsideTable.class);
        assertThatThrownBy(() -> CONVERSION.convertFastestMile(Speed.metresPerSecond(0.4), Averaging.GUST_3_S, new Trace()))
            .as("one mile in more than an hour").isInstanceOf(OutsideTable.class);
        assertThatThrownBy(() -> CONVERSION.convertFastestMile(Speed.metresPerSecond(2000), Averaging.GUST_3_S, new Trace()))
            .as("one mile in less than a second").isInstanceOf(OutsideTable.class);
    }

    @ParameterizedTest
    @EnumSource(Averaging.class)
    void everyAveragingIsReadBackFromItsWords(Averaging averaging) {
        assertThat(Averaging.of(averaging.words())).contains(averaging);
        assertThat(Averaging.of(" " + averaging.words() + " ")).contains(averaging);
        assertThat(Averaging.allWords()).contains(averaging.words());
    }

    @ParameterizedTest
    @CsvSource({"3 s gust,3", "10 min mean,600", "1 h mean,3600", "0.2 s gust,0.2", "1 min mean,60"})
    void itsWordsAndSecondsAgree(String words, double seconds) {
        assertThat(Averaging.of(words).orElseThrow().seconds()).isEqualTo(seconds);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "3 s", "gust", "3 S GUST", "10 min", "fastest mile"})
    void otherWordsAreNone(String words) {
        assertThat(Averaging.of(words)).isEmpty();
    }
}
