package broadside.support;

import static broadside.support.Stands.RULES;
import static broadside.support.Stands.STABILITY;
import static broadside.support.Stands.in;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.quantity.Force;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Stays, edges of banners, ballast of frames and blocks in the ground, worked out by hand. */
class StayTest {

    private static Stay stay(double degrees, Optional<Force> strength) {
        Trace trace = new Trace();
        return Stay.of(STABILITY, in("H_1", 1000, "N", trace), Math.toRadians(degrees), strength, trace);
    }

    /** 3-4-5: cos 0.6, tan 4/3. */
    @Test
    void aStayPullsMoreTheSteeperItIs() {
        Stay stay = stay(Math.toDegrees(Math.atan2(4, 3)), Optional.of(Force.newtons(10000)));
        assertThat(stay.tension()).isCloseTo(1000 / 0.6, within(1e-9));
        assertThat(stay.uplift()).isCloseTo(4000.0 / 3, within(1e-9));
        assertThat(stay.strength()).isCloseTo(5000 / 0.6, within(1e-9));
        assertThat(stay.checks()).extracting(Check::utilisation).containsExactly(stay.strength() / 10000);
        assertThat(stay(45, Optional.of(Force.newtons(7000))).checks()).noneMatch(Check::passes);
        assertThat(stay(45, Optional.empty()).checks()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1, 90, 91, 135, 400, Double.NaN})
    void anAngleThatIsNoneIsRefused(double degrees) {
        assertThatThrownBy(() -> stay(degrees, Optional.empty())).isInstanceOf(UnfitAnswer.class);
    }

    /** 1000 Pa over 3 m with a sag of 0.3 m: 3750 N/m, 7500 N on 2 m; half of 6000 N square to it. */
    @Test
    void theSagGivesThePull() {
        Trace trace = new Trace();
        EdgePull pull = EdgePull.of(in("w_1", 1000, "Pa", trace), 3, 2, 0.3, trace);
        assertThat(pull.pull()).isCloseTo(3750, within(1e-9));
        assertThat(pull.total()).isCloseTo(7500, within(1e-9));
        assertThat(pull.resultant()).isCloseTo(Math.hypot(7500, 3000), within(1e-9));
        assertThatThrownBy(() -> EdgePull.of(in("w_1", 1000, "Pa", trace), 3, 2, 0, trace)).isInstanceOf(UnfitAnswer.class);
    }

    /** Printed: 25 kNm over 2.5 m less 4.5 kN, over 0.9, is 6.11 kN; 0.4 x 11.61/1.5 is 3.10 kN against 2.5 kN. GB 05/2023. */
    @Test
    void aFrameIsHeldDown() {
        FrameBallast frame = new FrameBallast(STABILITY);
        assertThat(frame.ballast(25000, 2.5, 4500, new Trace())).isCloseTo(5500 / 0.9 / 9.80665, within(1e-9));
        assertThat(frame.ballast(25000, 2.5, 11000, new Trace())).isZero();
        Check check = frame.sliding(0.4, 11610, 2500, new Trace());
        assertThat(check.capacity()).isCloseTo(3096, within(1e-9));
        assertThat(check.passes()).isTrue();
        assertThat(frame.sliding(0.4, 11610, 3097, new Trace()).passes()).isFalse();
        assertThatThrownBy(() -> frame.ballast(25000, 0, 4500, new Trace())).isInstanceOf(UnfitAnswer.class);
        assertThatThrownBy(() -> frame.sliding(0, 11610, 2500, new Trace())).isInstanceOf(UnfitAnswer.class);
    }

    /** A sheet finds 317.84 over 312.66 N m at the ground and writes "OK SOF 1.0": at the base it is 317.7 over 625.3, and no rule is met. */
    @Test
    void aHoardingSheetThatSaysOkIsRejectedByEveryRule() {
        for (String key : List.of("en-1990-equ", "asd-0.6", "factor-1.5", "en-13782", "evacuation-1.2", "br18-1.5", "bs-5975-1.2", "twf-1.5",
            "frame-ballast-0.9")) {
            Trace trace = new Trace();
            Check check = new BlockFooting(STABILITY).overturning(new BlockFooting.Block(0.3, 0.3, 1.0, 2400), in("F_1", 312.66, "N", trace), in("z_1", 1.0,
                "m", trace),
                RULES.of(key), trace);
            assertThat(check.passes()).as(key).isFalse();
        }
        Trace trace = new Trace();
        Check check = new BlockFooting(STABILITY).overturning(new BlockFooting.Block(0.3, 0.3, 1.0, 2400), in("F_1", 312.66, "N", trace), in("z_1", 1.0, "m",
            trace),
            RULES.of("factor-1.5"), trace);
        assertThat(check.capacity() / check.demand()).isCloseTo(2400 * 0.09 * 9.80665 * 0.15 / (1.5 * 312.66 * 2), within(1e-9));
    }

    /** Four bolts at 40 and 30 mm, 10 kN at 100 mm: 2.5 direct and 5.0 from the moment, 7.16 kN. The forces give the load back. */
    @Test
    void anEccentricGroup() {
        List<EccentricGroup.At> bolts = List.of(new EccentricGroup.At(0.04, 0.03), new EccentricGroup.At(-0.04, 0.03), new EccentricGroup.At(0.04, -0.03),
            new EccentricGroup.At(-0.04, -0.03));
        Trace trace = new Trace();
        EccentricGroup.Result result = EccentricGroup.of(bolts, new EccentricGroup.Load(in("P_x", 0, "N", trace), in("P_y", 10000, "N", trace), in("M_1",
            1000, "N m", trace)), trace);
        assertThat(result.most()).isCloseTo(Math.hypot(6500, 3000), within(1e-6));
        assertThat(result.forces().get(1).y()).isCloseTo(-1500, within(1e-6));
    }
}
