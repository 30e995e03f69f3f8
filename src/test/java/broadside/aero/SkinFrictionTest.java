package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Friction of a plate along the stream, against printed problems. */
class SkinFrictionTest {

    /** Plate 5 m by 0.5 m in water at 3 m/s, nu 1e-6: Re 1.5e7; printed 63.38 N for both sides. */
    @Test
    void aThinPlateInWater() {
        double c = SkinFriction.logarithmic(3 * 5 / 1e-6, 0.455, 2.58);
        assertThat(c).isCloseTo(0.002817, within(5e-7));
        assertThat(2 * c * 0.5 * 1000 * 9 * 5 * 0.5).isCloseTo(63.38, within(0.02));
    }

    /** Oil over a plate of 5 m at 2 m/s, nu 2.485e-4, 876 kg/m3: Re 40 241, 58.1 N for each metre of width by 1.33. */
    @Test
    void oilOverAPlate() {
        double re = 2 * 5 / 2.485e-4;
        assertThat(re).isCloseTo(40241, within(1.0));
        assertThat(SkinFriction.power(re, 1.33, 0.5) * 0.5 * 876 * 4 * 5).isCloseTo(58.1, within(0.1));
        assertThat(SkinFriction.power(re, 1.328, 0.5) * 0.5 * 876 * 4 * 5).isCloseTo(58.0, within(0.1));
    }

    /** The two turbulent forms meet within 3 % at the Reynolds number where one takes over from the other. */
    @Test
    void turbulentFormsMeet() {
        double power = SkinFriction.power(1e7, 0.074, 0.2);
        assertThat(SkinFriction.logarithmic(1e7, 0.455, 2.58)).isCloseTo(power, within(0.03 * power));
    }
}
