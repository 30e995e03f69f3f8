package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.support.Section.Material;
import broadside.table.TableFiles;
import broadside.table.TableFormat;
import broadside.table.TableLibrary;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

/** A firm's own sections: a folder that changes a series, or one of its own. */
class CatalogueOverlayTest {

    private static final Map<String, byte[]> SHIPPED = TableFiles.shipped("code-tables");
    private static final String HEADING = """
        # title: Tubes in our yard
        # source: BROADSIDE | Our yard | stock list
        # form: rows
        # axis: designation, name of the section, -
        # value: sizes
        # between: steps
        # beyond: refused
        # status: by row
        # entered: 2026-12-01
        # note: an example
        designation, depth, width, wall, design-wall, unit, status
        """;
    private static final String OVERLAY = "title=Our tubes\nbasis=posts/chs-hot\nstatus=own\n";
    private static final String OWN = """
        title=Our bamboo
        publication=BROADSIDE
        edition=1
        procedure=post-sections
        averaging=none
        level=none
        status=own
        prefix=BAMBOO
        form=round tube
        material=timber
        region=en
        corners=none
        density=timber
        grade=C16
        """;

    private static Catalogue with(String... namesAndTexts) {
        Map<String, byte[]> own = new TreeMap<>();
        for (int i = 0; i < namesAndTexts.length; i += 2) {
            own.put(namesAndTexts[i], namesAndTexts[i + 1].getBytes(StandardCharsets.UTF_8));
        }
        return new Catalogue(TableLibrary.of(SHIPPED, own));
    }

    private static Catalogue overlaid(String rows) {
        return with("posts/chs-hot-yard/edition.properties", OVERLAY, "posts/chs-hot-yard/sections.csv", HEADING + rows);
    }

    /** CHS 114.3x5 measured with a wall of 4.6 mm: A = pi (114.3 - 4.6) 4.6 = 1585.3 mm2; and a size of our own. */
    @Test
    void rowsAreChangedAndAdded() {
        Catalogue catalogue = overlaid("CHS 114.3x5, 114.3, 114.3, 5, 4.6, mm, read\nCHS 127x5, 127, 127, 5, -, mm, read\n");
        Section changed = catalogue.find("chs 114.3 x 5").orElseThrow();
        assertThat(changed.series()).isEqualTo("chs-hot-yard");
        assertThat(changed.wall()).isEqualTo(0.0046);
        assertThat(changed.properties().area()).isCloseTo(1585.3e-6, within(0.1e-6));
        assertThat(changed.mass()).as("as sold").isCloseTo(7850 * Math.PI * 0.1093 * 0.005, within(1e-6));
        assertThat(catalogue.find("CHS 127x5").orElseThrow().series()).isEqualTo("chs-hot-yard");
        assertThat(catalogue.find("CHS 139.7x5").orElseThrow().series()).as("taken over").isEqualTo("chs-hot-yard");
        int shipped = new Catalogue(TableLibrary.shipped()).series("chs-hot").size();
        assertThat(catalogue.series("chs-hot")).as("what ships stays").hasSize(shipped).noneMatch(s -> s.wall() == 0.0046);
        assertThat(catalogue.series("chs-hot-yard")).hasSize(shipped + 1);
        assertThat(catalogue.defaults(false, Material.STEEL)).containsExactly("chs-hot-yard", "rhs-cold", "shs-hot");
        assertThat(catalogue.sections()).hasSize(new Catalogue(TableLibrary.shipped()).sections().size() + 1).doesNotHaveDuplicates();
        assertThat(catalogue.record(changed, new broadside.trace.Trace())).isEqualTo(changed.properties());
    }

    @Test
    void aSeriesOfOnesOwnNeedsNoJava() {
        Catalogue catalogue = with("posts/bamboo/edition.properties", OWN, "posts/bamboo/sections.csv", HEADING + "BAMBOO 100x10, 100, 100, 10, -, mm, read\n");
        Section section = catalogue.find("bamboo 100 x 10").orElseThrow();
        assertThat(section.mass()).as("420 kg/m3 x pi 90 x 10 mm2").isCloseTo(420 * Math.PI * 0.09 * 0.01, within(1e-9));
        assertThat(catalogue.defaults(false, Material.TIMBER)).containsExactly("bamboo", "timber-metric");
        assertThat(catalogue.defaultGrade(section).name()).isEqualTo("C16");
    }

    @Test
    void gradesOfOnesOwnAreAdded() {
        Catalogue catalogue = with("posts/materials-own/edition.properties", "title=Our steel\nbasis=posts/materials\nstatus=own\n", "posts/materials-own/steel-grades.csv", """
            # title: Our steel
            # source: BROADSIDE | Our yard | mill certificate
            # form: rows
            # axis: grade, name, -
            # value: strength, modulus; wall
            # between: steps
            # beyond: refused
            # status: read
            # entered: 2026-12-01
            # note: an example
            grade, strength, modulus, unit, wall, place
            S420, 420, 210000, N/mm2, 16, mill certificate
            """);
        assertThat(catalogue.grade("s420", Material.STEEL).strength().value()).isEqualTo(420e6);
        assertThat(catalogue.grade("S355", Material.STEEL).strength().value()).isEqualTo(355e6);
    }

    @Test
    void whatIsWrongIsToldWithItsFile() {
        assertThatThrownBy(() -> overlaid("CHS 127x5, 127, 127, 70, -, mm, read\n").sections()).isInstanceOf(TableFormat.class)
            .hasMessageContaining("posts/chs-hot-yard/sections.csv").hasMessageContaining("CHS 127x5: its wall is thicker than half the diameter");
        assertThatThrownBy(() -> overlaid("CHS 127x5, 127, 127, thin, -, mm, read\n").series("chs-hot-yard")).isInstanceOf(TableFormat.class)
            .hasMessageContaining("\"thin\" is not a number");
        assertThatThrownBy(() -> overlaid("CHS 127x5, 127, 127, 5, -, hands, read\n").find("CHS 127x5")).isInstanceOf(TableFormat.class)
            .hasMessageContaining("\"hands\" is no unit of length");
        assertThatThrownBy(() -> with("posts/bamboo/edition.properties", OWN.replace("round tube", "bent"), "posts/bamboo/sections.csv", HEADING + "B, 1, 1, 1, -, mm, read\n"))
            .isInstanceOf(TableFormat.class).hasMessageContaining("form must be round tube or rectangular tube or solid rectangle, found \"bent\"");
        assertThatThrownBy(() -> with("posts/bamboo/edition.properties", OWN.replace("density=timber", "density=cane"), "posts/bamboo/sections.csv",
            HEADING + "B, 1, 1, 1, -, mm, read\n")).isInstanceOf(TableFormat.class).hasMessageContaining("densities.csv").hasMessageContaining("\"cane\"");
        assertThatThrownBy(() -> with("posts/bamboo/edition.properties", OWN, "posts/bamboo/sections.csv", HEADING + "CHS 114.3x5, 114.3, 114.3, 4, -, mm, read\n"))
            .isInstanceOf(TableFormat.class).hasMessageContaining("CHS 114.3x5 stands with other sizes in the series bamboo");
    }
}
