package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CableTest {

    /** The catenary that was found has the sag that was asked for. */
    @ParameterizedTest
    @CsvSource({"10, 0.01", "10, 0.5", "10, 2", "10, 10", "0.5, 0.0005", "200, 40"})
    void the_catenary_has_its_sag(double span, double sag) {
        double a = Cable.catenary(span, sag);
        double u = span / (2 * a);
        assertThat(2 * a * Math.pow(Math.sinh(u / 2), 2)).isCloseTo(sag, within(1e-9 * sag));
    }

    /** For a shallow cable both pulls are alike; the catenary is larger by about a sixth of the sag's load. */
    @ParameterizedTest
    @CsvSource({"10, 0.05", "10, 0.2", "30, 0.5"})
    void parabola_and_catenary_meet(double span, double sag) {
        double parabola = Cable.parabola(1, span, sag);
        assertThat(Cable.catenary(span, sag)).isCloseTo(parabola + sag / 6, within(1e-3 * sag));
    }

    /** Fabric Architecture, banner edge pull: 10 ft by 10 ft, 15 psf, C_p 1.45, about 300 lb for each foot of edge at a sag of 0.906 ft. */
    @ParameterizedTest
    @CsvSource({"21.75, 10, 0.906, 300"})
    void pull_of_a_published_banner(double load, double span, double sag, double printed) {
        assertThat(Cable.parabola(load, span, sag)).isCloseTo(printed, within(0.02 * printed));
    }
}
