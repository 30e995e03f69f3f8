package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.support.Section.Material;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Grades by the names that people type, in Pa. 1 ksi = 6.894757 MPa. */
class GradesTest {

    private static final Catalogue CATALOGUE = new Catalogue(TableLibrary.shipped());

    @ParameterizedTest
    @CsvSource({"S235, STEEL, S235, 235, 210000", "s355 j2h, STEEL, S355, 355, 210000", "S275J0, STEEL, S275, 275, 210000", "ASTM A53 Gr. B, STEEL, A53 B, 241.316, 199948",
        "A500 Grade C round, STEEL, A500 C round, 317.159, 199948", "c24, TIMBER, C24, 24, 11000", "GL 24h, TIMBER, GL24h, 24, 11600", "D40, TIMBER, D40, 40, 13000",
        "southern pine #2, TIMBER, Southern Pine No.2, 5.86054, 8273.7", "6082 T6, ALUMINIUM, 6082-T6, 250, 70000", "EN AW-6060 T66, ALUMINIUM, 6060-T66, 150, 70000",
        "6063-T6, ALUMINIUM, 6063-T6, 160, 70000"})
    void aGradeByItsName(String typed, Material material, String name, double strength, double modulus) {
        Grade grade = CATALOGUE.grade(typed, material);
        assertThat(grade.name()).isEqualTo(name);
        assertThat(grade.strength().value() / 1e6).isCloseTo(strength, within(strength * 1e-5));
        assertThat(grade.modulus().value() / 1e6).isCloseTo(modulus, within(modulus * 1e-5));
        assertThat(grade.strength().unit()).isEqualTo("Pa");
        assertThat(grade.shear().isPresent()).isEqualTo(material == Material.TIMBER);
    }

    @Test
    void shearOfTimber() {
        assertThat(CATALOGUE.grade("C18", Material.TIMBER).shear().orElseThrow().value()).isCloseTo(3.4e6, within(1.0));
        assertThat(CATALOGUE.grade("GL24h", Material.TIMBER).shear().orElseThrow().value()).as("the lower of two editions").isCloseTo(2.7e6, within(1.0));
        Grade pine = CATALOGUE.grade("Southern Pine No.2", Material.TIMBER);
        assertThat(pine.shear().orElseThrow().value()).as("165 psi").isCloseTo(1.13763e6, within(10.0));
        assertThat(pine.strength().source().status()).isEqualTo(Status.SECOND_HAND);
        assertThat(pine.shear().orElseThrow().source().status()).isEqualTo(Status.RECALLED);
    }

    @Test
    void whereTheFormDecides() {
        Section square = CATALOGUE.find("HSS 4x4x1/4").orElseThrow();
        Section pipe = CATALOGUE.find("PIPE 4 STD").orElseThrow();
        assertThat(CATALOGUE.grade("A500 B", square).name()).isEqualTo("A500 B rectangular");
        assertThat(CATALOGUE.grade("A500 Gr B", pipe).name()).isEqualTo("A500 B round");
        assertThat(CATALOGUE.defaultGrade(square).name()).isEqualTo("A500 B rectangular");
        assertThatThrownBy(() -> CATALOGUE.grade("A500 C rectangular", pipe)).isInstanceOf(UnfitAnswer.class).hasMessageContaining("is not for PIPE 4 STD");
        assertThatThrownBy(() -> CATALOGUE.grade("A500 B", Material.STEEL)).isInstanceOf(UnfitAnswer.class);
    }

    @Test
    void aGradeOfAnotherMaterialOrWallIsRefused() {
        assertThatThrownBy(() -> CATALOGUE.grade("C24", Material.STEEL)).isInstanceOfSatisfying(UnfitAnswer.class, e -> assertThat(e.field()).isEqualTo("posts.grade"))
            .hasMessageContaining("\"C24\" is not known for steel; there are S235, S275, S355, A500 B round");
        assertThatThrownBy(() -> CATALOGUE.grade("", Material.TIMBER)).isInstanceOf(UnfitAnswer.class).hasMessageContaining("C14, C16");
        assertThatThrownBy(() -> CATALOGUE.grade("S355\u0007" + "x".repeat(100), Material.ALUMINIUM)).isInstanceOf(UnfitAnswer.class).hasMessageContaining("S355?xxx")
            .hasMessageContaining("6082-T6");
        Section thick = CATALOGUE.find("CHS 508x20").orElseThrow();
        assertThat(CATALOGUE.beyond(CATALOGUE.grade("S355", thick), thick)).hasValueSatisfying(why -> assertThat(why).contains("walls up to 16 mm"));
        Section sixteen = CATALOGUE.find("SHS 200x16").orElseThrow();
        assertThat(CATALOGUE.beyond(CATALOGUE.grade("S355", sixteen), sixteen)).isEmpty();
    }

    @Test
    void namesByPractice() {
        assertThat(CATALOGUE.gradeNames(false, Material.STEEL)).containsExactly("S235", "S275", "S355");
        assertThat(CATALOGUE.gradeNames(true, Material.TIMBER)).containsExactly("Southern Pine No.2", "Douglas Fir-Larch No.2");
        assertThat(CATALOGUE.gradeNames(true, Material.ALUMINIUM)).isEmpty();
    }
}
