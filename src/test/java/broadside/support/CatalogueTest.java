package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.support.Section.Form;
import broadside.support.Section.Material;
import broadside.table.TableLibrary;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the catalogue lists, and what a typed designation finds. */
class CatalogueTest {

    private static final Catalogue CATALOGUE = new Catalogue(TableLibrary.shipped());

    private static Section found(String designation) {
        return CATALOGUE.find(designation).orElseThrow(() -> new AssertionError(designation + " is not found"));
    }

    @Test
    void everySectionIsFoundByItsDesignation() {
        for (Section section : CATALOGUE.sections()) {
            assertThat(CATALOGUE.find(section.designation())).contains(section);
            String sloppy = "  " + section.designation().toLowerCase(Locale.ROOT).replace("x", " × ") + " ";
            if (!section.designation().endsWith("XS")) {
                assertThat(CATALOGUE.find(sloppy)).as(sloppy).contains(section);
            }
        }
    }

    @Test
    void theSeriesHoldAboutThreeHundredSections() {
        assertThat(CATALOGUE.seriesKeys()).containsExactly("alu-round", "alu-square", "chs-hot", "rhs-cold", "shs-hot", "timber-metric", "timber-us", "us-hss-square",
            "us-pipe");
        assertThat(CATALOGUE.sections()).hasSizeGreaterThan(300);
        assertThat(List.of("chs-hot", "shs-hot", "rhs-cold").stream().mapToInt(k -> CATALOGUE.series(k).size()).sum()).isGreaterThanOrEqualTo(180);
        Set<Section> together = new HashSet<>();
        CATALOGUE.seriesKeys().forEach(k -> together.addAll(CATALOGUE.series(k)));
        assertThat(together).isEqualTo(Set.copyOf(CATALOGUE.sections()));
    }

    @Test
    void theLightestStandsFirst() {
        Comparator<Section> order = Comparator.comparingDouble(Section::mass).thenComparing(Section::designation);
        assertThat(CATALOGUE.sections()).isSortedAccordingTo(order);
        CATALOGUE.seriesKeys().forEach(k -> assertThat(CATALOGUE.series(k)).isSortedAccordingTo(order).allMatch(s -> s.series().equals(k)));
        assertThat(CATALOGUE.series("chs-hot").get(0).designation()).isEqualTo("CHS 33.7x2.6");
    }

    @Test
    void aSeriesIsChosenByPracticeAndMaterial() {
        assertThat(CATALOGUE.defaults(false, Material.STEEL)).containsExactly("chs-hot", "rhs-cold", "shs-hot");
        assertThat(CATALOGUE.defaults(true, Material.STEEL)).containsExactly("us-hss-square", "us-pipe");
        assertThat(CATALOGUE.defaults(false, Material.TIMBER)).containsExactly("timber-metric");
        assertThat(CATALOGUE.defaults(true, Material.TIMBER)).containsExactly("timber-us");
        assertThat(CATALOGUE.defaults(true, Material.ALUMINIUM)).as("no series of its own").containsExactly("alu-round", "alu-square");
        assertThatThrownBy(() -> CATALOGUE.series("girders")).isInstanceOfSatisfying(UnfitAnswer.class, e -> assertThat(e.field()).isEqualTo("posts.series"))
            .hasMessageContaining("there are alu-round, alu-square");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "chs 114.3 x 3.6|CHS 114.3x3.6", "CHS114,3*3.60|CHS 114.3x3.6", "CHS 273.0×5.0|CHS 273x5", "CHS 114.3x5 hot|CHS 114.3x5",
        "SHS 100x5|SHS 100x5 hot", "SHS 100x100x5|SHS 100x5 hot", "shs 100 × 100 × 5,0 HOT|SHS 100x5 hot", "RHS 120x80x8|RHS 120x80x8 cold",
        "rhs120x80x8cold|RHS 120x80x8 cold", "pipe 4 std|PIPE 4 STD", "Pipe 2 1/2 XS|PIPE 2-1/2 XS", "PIPE 2.5 XS|PIPE 2-1/2 XS", "HSS4X4X.25|HSS 4x4x1/4",
        "HSS 2-1/2 x 2-1/2 x 3/16|HSS 2-1/2x2-1/2x3/16", "HSS 5 1/2x5 1/2x0.1250|HSS 5-1/2x5-1/2x1/8", "timber 6X6|TIMBER 6x6", "tube 50x50x3|TUBE 50x50x3"})
    void whatPeopleTypeIsFound(String typed, String designation) {
        assertThat(found(typed).designation()).isEqualTo(designation);
        assertThat(found(typed).series()).isNotEqualTo(Catalogue.NOT_LISTED);
    }

    /** CHS 168.3 x 6.4: A = pi (168.3 - 6.4) 6.4 = 3255.19 mm2, I = pi/64 (168.3^4 - 155.5^4) = 1068.21e4 mm4. */
    @Test
    void anUnlistedSizeOfAKnownFormIsWorkedOut() {
        Section chs = found("CHS 168.3x6.4");
        assertThat(chs.series()).isEqualTo("not in the catalogue");
        assertThat(chs.designation()).isEqualTo("CHS 168.3x6.4");
        assertThat(chs.properties().area()).isCloseTo(3255.19e-6, within(1e-8));
        assertThat(chs.properties().inertia()).isCloseTo(1068.21e-8, within(1e-10));
        assertThat(chs.mass()).isCloseTo(7850 * 3255.19e-6, within(1e-4));
        assertThat(chs.outline().width()).isEqualTo(0.1683);
        assertThat(CATALOGUE.defaultGrade(chs).name()).isEqualTo("S235");
        assertThat(found("SHS 95x5").designation()).isEqualTo("SHS 95x5 hot");
        assertThat(found("rhs 130x70x4").designation()).isEqualTo("RHS 130x70x4 cold");
        assertThat(found("RHS 130x70x4").properties().area()).as("corners are rounder than those of hot finished sections")
            .isLessThan(found("RHS 130x70x4 hot").properties().area());
        assertThat(found("SHS 100x5 cold").properties().area()).isLessThan(found("SHS 100x5 hot").properties().area());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "x", "IPE 200", "HEA 100", "HSS 4x4x0.3", "PIPE 7 STD", "CHS", "CHS 114.3", "CHS x", "CHS 114.3x", "CHS 1.2.3x4", "CHS 100x50x5", "RHS 100x5",
        "CHS 114.3x5 warm", "TIMBER 101x101", "CHS 1/0x5", "CHS 1e3x5", "\u202eCHS 5", "CHS 1111111111111111111111111111111111111111111x1", "SHS 1x2x3x4", "CHS ٣x٤", "- / - ."})
    void otherTextFindsNothing(String text) {
        assertThat(CATALOGUE.find(text)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CHS 100x50|its wall is thicker than half the diameter", "CHS 100x60|its wall is thicker than half the diameter", "RHS 120x40x20|its wall is thicker than half the smaller side",
        "CHS 100x0|its wall must be above zero", "CHS 0x5|its sizes must be above zero", "CHS -100x5|its sizes must be above zero", "CHS 100x-5|its wall must be above zero",
        "RHS 0x50x4|its sizes must be above zero", "SHS 20x9|its wall is too thick for the rounded corners", "CHS 100x0.01|not below 0.1 mm", "CHS 99999x5|not above 10 m",
        "SHS 100x90x5|a square section (SHS) has equal sides", "CHS 9999999999999999999999999999x1|not above 10 m"})
    void sizesThatMakeNoSectionAreRefused(String typed, String reason) {
        assertThatThrownBy(() -> CATALOGUE.find(typed)).isInstanceOfSatisfying(UnfitAnswer.class, e -> assertThat(e.field()).isEqualTo("posts.section"))
            .hasMessageContaining(reason);
    }

    @Test
    void wallsOfTheUnitedStatesAreDesignWalls() {
        Section listed = found("PIPE 2 STD");
        assertThat(listed.wall()).isCloseTo(0.143 * 0.0254, within(1e-12));
        assertThat(listed.nominalWall()).isCloseTo(0.154 * 0.0254, within(1e-12));
        assertThat(found("PIPE 4 STD").wall()).as("0.93 of 0.237 in").isCloseTo(0.93 * 0.237 * 0.0254, within(1e-12));
        assertThat(found("HSS 4x4x1/4").wall()).isCloseTo(0.2325 * 0.0254, within(1e-12));
        assertThat(found("CHS 60.3x3.2").wall()).isEqualTo(found("CHS 60.3x3.2").nominalWall()).isEqualTo(0.0032);
    }

    @Test
    void everySectionIsWhatItsSeriesSays() {
        for (Section section : CATALOGUE.sections()) {
            assertThat(section.wall() == 0).isEqualTo(section.form() == Form.SOLID_RECTANGLE);
            assertThat(section.wall()).isLessThanOrEqualTo(section.nominalWall());
            assertThat(section.depth()).isGreaterThanOrEqualTo(section.width());
            assertThat(section.properties().inertia()).isGreaterThanOrEqualTo(section.properties().weakInertia()).isPositive();
            assertThat(section.properties().plastic()).isGreaterThan(section.properties().elastic());
            assertThat(CATALOGUE.defaultGrade(section).material()).isEqualTo(section.material());
        }
    }
}
