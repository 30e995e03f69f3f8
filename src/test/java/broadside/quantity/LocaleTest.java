package broadside.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.parallel.Isolated;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The default locale of the machine changes neither what is read nor what is shown. */
@Isolated
class LocaleTest {
    private final Locale before = Locale.getDefault();

    @AfterEach
    void restore() {
        Locale.setDefault(before);
    }

    @ParameterizedTest
    @ValueSource(strings = {"tr-TR", "de-DE", "ar-EG-u-nu-arab", "fa-IR-u-nu-arabext", "hi-IN-u-nu-deva",
        "ja-JP-u-ca-japanese"})
    void readsAndShowsTheSame(String tag) {
        Locale.setDefault(Locale.forLanguageTag(tag));
        assertThat(Length.of("8 FT 6 IN").metres()).isEqualTo(2.5908);
        assertThat(Length.of("102 INCHES").metres()).isEqualTo(2.5908);
        assertThat(Force.of("2 KIPS").newtons()).isEqualTo(8896.443230521);
        assertThat(Moment.of("1 KIP FT").newtonMetres()).isEqualTo(1355.8179483314004);
        assertThat(Speed.of("1 MILES PER HOUR").metresPerSecond()).isEqualTo(0.44704);
        assertThat(Length.of("2,4 m").metres()).isEqualTo(2.4);
        assertThat(Length.metres(2.4).typed()).isEqualTo("2.4 m");
        assertThat(Show.number(1234.5, 6, Rounding.NEAREST)).isEqualTo("1234.50");
        assertThat(Show.number(1.5e20, 3, Rounding.UP)).isEqualTo("1.50e20");
        assertThat(Show.both(Length.of("8 ft 6 in"))).isEqualTo("2.591 m (8 ft 6 in)");
        assertThat(((Reading.Refused) Typed.read("2.4", Dimension.LENGTH)).problem())
                .isEqualTo("\"2.4\" has no unit: a length is typed with its unit, like 2.4 m or 8 ft 6 in");
    }
}
