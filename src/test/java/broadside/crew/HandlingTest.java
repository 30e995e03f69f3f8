package broadside.crew;

import static broadside.crew.Crews.CREW;
import static broadside.crew.Crews.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** A sheet of 2.44 by 1.22 m in the wind, the people who hold it, and what a crane may lift. */
class HandlingTest {

    private static final Handling.Sheet SHEET = new Handling.Sheet(2.44, 1.22);

    private static double force(double degrees, double speed) {
        Trace trace = new Trace();
        double force = CREW.handling().force(SHEET, Math.toRadians(degrees), speed, trace);
        SheetCheck.holds(trace);
        return force;
    }

    /** 0.6 x 1.15 x 2.9768 v². */
    @ParameterizedTest
    @CsvSource({"3, 18", "5, 51", "7, 101", "8, 131", "10, 205", "12, 296", "15, 462", "20, 822"})
    void faceOn(double speed, double newtons) {
        assertThat(force(90, speed)).isCloseTo(newtons, within(0.6));
        assertThat(force(60, speed)).isEqualTo(force(90, speed));
    }

    /** At 10 m/s q A is 178.608 N. 30 degrees: 1/(0.222 + 0.283/0.5) = 1.26904; 45 degrees: 1.607, held at 1.6; edge on and nearly so: 2 x 0.04. */
    @ParameterizedTest
    @CsvSource({"0, 14.289", "0.5, 14.289", "15, 135.78", "30, 226.66", "45, 285.77", "59.9, 285.77", "60, 205.40"})
    void slantingAndEdgeOn(double degrees, double newtons) {
        assertThat(force(degrees, 10)).isCloseTo(newtons, within(0.01));
    }

    /** (100/(0.69 x 2.9768))^0.5 = 6.977 for one person, twice that for four; (100/(0.96 x 2.9768))^0.5 = 5.915; 200 N: 9.868. */
    @Test
    void whatPeopleHold() {
        Trace trace = new Trace();
        List<Handling.Held> held = CREW.handling().held(SHEET, trace);
        assertThat(held).extracting(Handling.Held::people).containsExactly(1, 2, 4);
        assertThat(held.get(0).faceOn()).isCloseTo(6.977, within(0.001));
        assertThat(held.get(1).faceOn()).isCloseTo(9.868, within(0.001));
        assertThat(held.get(2).faceOn()).isCloseTo(13.955, within(0.001));
        assertThat(held.get(0).anyAngle()).isCloseTo(5.915, within(0.001));
        assertThat(held.get(0).atStart()).isCloseTo(9.868, within(0.001));
        assertThat(value(trace, "handling-speed/4")).isEqualTo(held.get(2).faceOn());
        assertThat(trace.find("handling-speed-start/1").orElseThrow().status()).isEqualTo(Status.RECALLED);
        assertThat(trace.find("handling-speed/1").orElseThrow().status()).isEqualTo(Status.DERIVED);
        SheetCheck.holds(trace);
        assertThat(force(90, held.get(0).faceOn())).isCloseTo(100, within(1e-6));
        assertThat(force(45, held.get(0).anyAngle())).isCloseTo(100, within(1e-6));
    }

    @Test
    void whatIsNoSheetOrAngleIsRefused() {
        assertThatThrownBy(() -> new Handling.Sheet(0, 1)).isInstanceOf(UnfitFigure.class);
        assertThatThrownBy(() -> new Handling.Sheet(1, Double.NaN)).isInstanceOf(UnfitFigure.class);
        assertThatThrownBy(() -> CREW.handling().held(SHEET, List.of(0), new Trace())).isInstanceOf(UnfitFigure.class);
        for (double degrees : new double[] {-1, 91, Double.NaN}) {
            assertThatThrownBy(() -> force(degrees, 10)).isInstanceOf(UnfitFigure.class).extracting("field").isEqualTo("angle");
        }
        assertThatThrownBy(() -> force(90, 0)).isInstanceOf(UnfitFigure.class).extracting("field").isEqualTo("speed");
    }

    /** 0.6 x 0.84 v² on a person; (2 x 0.4 x 50 x 9.80665/(1.2 x 0.84))^0.5 = 19.73 m/s. */
    @Test
    void aPersonInTheWind() {
        Trace trace = new Trace();
        assertThat(CREW.person().force(15, trace)).isCloseTo(113, within(0.5));
        assertThat(CREW.person().force(25, new Trace())).isCloseTo(315, within(0.5));
        assertThat(CREW.person().slidingSpeed(50, trace)).isCloseTo(19.73, within(0.005));
        assertThat(CREW.person().comfort(4.9, new Trace())).isEmpty();
        assertThat(CREW.person().comfort(5, new Trace())).get().extracting(PersonInWind.Comfort::key).isEqualTo("onset");
        assertThat(CREW.person().comfort(19.9, new Trace())).get().extracting(PersonInWind.Comfort::key).isEqualTo("unpleasant");
        assertThat(CREW.person().comfort(25, trace)).get().extracting(PersonInWind.Comfort::effect).isEqualTo("dangerous");
        SheetCheck.holds(trace);
    }

    /** 50 kg, 3 m2, 1.2: (1.2 x 0.05/3.6)^0.5 = 0.129, so 9 m/s of the chart become 1.16. */
    @Test
    void aSheetIsNoStandardLoad() {
        CraneWind.Load sheet = new CraneWind.Load(50, 3, 1.2);
        Trace trace = new Trace();
        CraneWind.Lift lift = CREW.crane().lift(sheet, 9, trace);
        assertThat(value(trace, "factor")).isCloseTo(0.129, within(0.0005));
        assertThat(lift.speed()).isCloseTo(1.162, within(0.0005));
        assertThat(lift.standard()).isFalse();
        SheetCheck.holds(trace);
        assertThatThrownBy(() -> CREW.crane().standard(sheet, 9, new Trace())).isInstanceOf(UnfitFigure.class)
            .hasMessageContaining("1.2 x 3 m2 on 50 kg").hasMessageContaining("1.2 m2 on a tonne");
    }

    /** 3 t with 3.6 m2 of wind area is just what a chart presumes. */
    @Test
    void theChartIsNeverRaised() {
        CraneWind.Lift lift = CREW.crane().standard(new CraneWind.Load(3000, 3, 1.2), 9, new Trace());
        assertThat(lift).isEqualTo(new CraneWind.Lift(9, true));
        assertThat(CREW.crane().lift(new CraneWind.Load(85000, 50, 1.2), 9, new Trace()).speed()).isEqualTo(9);
    }

    @ParameterizedTest
    @ValueSource(strings = {"sphere", "presumed", ""})
    void aShapeWithoutACoefficientIsRefused(String shape) {
        assertThat(CREW.crane().drag("unknown")).isEqualTo(2.4);
        assertThatThrownBy(() -> CREW.crane().drag(shape)).isInstanceOf(UnfitFigure.class).hasMessageContaining("cylinder");
    }
}
