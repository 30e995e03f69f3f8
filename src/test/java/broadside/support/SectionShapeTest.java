package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.support.Section.Form;
import broadside.support.Section.Properties;
import broadside.table.TableLibrary;
import broadside.trace.OwnValue;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

/** Properties of sections against an integration of their outline, the exact torsion of a rectangle, and values by hand. */
class SectionShapeTest {

    private static final Catalogue CATALOGUE = new Catalogue(TableLibrary.shipped());
    private static final int STRIPS = 4000;

    /** Area, second moment and twice the first moment of a half, of an outline less its bore. */
    private record Integral(double area, double inertia, double plastic) {

        Integral less(Integral inner) {
            return new Integral(area - inner.area, inertia - inner.inertia, plastic - inner.plastic);
        }
    }

    /** Sums strips of a rectangle with rounded corners about its middle; a circle is a square with its corners rounded away. */
    private static Integral strips(double depth, double width, double radius) {
        double area = 0;
        double inertia = 0;
        double plastic = 0;
        double thick = depth / STRIPS;
        for (int i = 0; i < STRIPS; i++) {
            double y = Math.abs(-depth / 2 + (i + 0.5) * thick);
            double above = y - (depth / 2 - radius);
            double across = above <= 0 ? width : width - 2 * radius + 2 * Math.sqrt(Math.max(0, radius * radius - above * above));
            area += across * thick;
            inertia += across * thick * y * y;
            plastic += across * thick * y;
        }
        return new Integral(area, inertia, plastic);
    }

    private static Integral integral(Section s, double outer, double inner, boolean weak) {
        double depth = weak ? s.width() : s.depth();
        double width = weak ? s.depth() : s.width();
        Integral whole = strips(depth, width, s.form() == Form.ROUND_TUBE ? depth / 2 : outer * s.wall());
        return s.wall() == 0 ? whole : whole.less(strips(depth - 2 * s.wall(), width - 2 * s.wall(), s.form() == Form.ROUND_TUBE ? depth / 2 - s.wall() : inner * s.wall()));
    }

    private static double outerRadius(Section s) {
        return switch (s.series()) {
            case "shs-hot" -> 1.5;
            case "us-hss-square" -> 2;
            case "rhs-cold", Catalogue.NOT_LISTED -> s.wall() <= 0.006 ? 2 : s.wall() <= 0.010 ? 2.5 : 3;
            default -> 0;
        };
    }

    private static double innerRadius(Section s) {
        return s.form() == Form.SOLID_RECTANGLE || s.series().startsWith("alu") ? 0 : Math.max(1, outerRadius(s) - 1);
    }

    private static Offset<Double> near(double value) {
        return within(0.001 * value);
    }

    @Test
    void everyPropertyAgreesWithAnIntegrationOfTheOutline() {
        List<Section> sections = new ArrayList<>(CATALOGUE.sections());
        for (String unlisted : List.of("RHS 200x120x12 cold", "RHS 250x150x12.5 cold", "RHS 120x80x6.3 cold", "RHS 80x120x5 cold", "CHS 508x12", "CHS 60.3x12")) {
            sections.add(CATALOGUE.find(unlisted).orElseThrow());
        }
        for (Section s : sections) {
            double ro = outerRadius(s);
            double ri = s.series().equals("shs-hot") || s.series().equals("us-hss-square") ? 1 : innerRadius(s);
            Integral strong = integral(s, ro, ri, false);
            Integral weak = integral(s, ro, ri, true);
            Properties p = s.properties();
            assertThat(p.area()).as(s.designation()).isCloseTo(strong.area(), near(strong.area()));
            assertThat(p.inertia()).as(s.designation()).isCloseTo(strong.inertia(), near(strong.inertia()));
            assertThat(p.elastic()).as(s.designation()).isCloseTo(2 * strong.inertia() / s.depth(), near(p.elastic()));
            assertThat(p.plastic()).as(s.designation()).isCloseTo(strong.plastic(), near(strong.plastic()));
            assertThat(p.weakInertia()).as(s.designation()).isCloseTo(weak.inertia(), near(weak.inertia()));
            assertThat(p.weakElastic()).as(s.designation()).isCloseTo(2 * weak.inertia() / s.width(), near(p.weakElastic()));
            assertThat(p.weakPlastic()).as(s.designation()).isCloseTo(weak.plastic(), near(weak.plastic()));
        }
    }

    /** Of a ring the polar moment is the sum of both; a thin closed wall has 4 A^2 t / length and twice A t by Bredt. */
    @Test
    void torsionOfTubes() {
        Section ring = CATALOGUE.find("CHS 139.7x5").orElseThrow();
        assertThat(ring.properties().torsionInertia()).isEqualTo(2 * ring.properties().inertia());
        assertThat(ring.properties().torsionModulus()).as("137.6 cm3").isCloseTo(137.6e-6, within(0.1e-6));
        Section thin = CATALOGUE.find("RHS 200x100x1 cold").orElseThrow();
        assertThat(thin.properties().torsionInertia()).isCloseTo(4 * Math.pow(0.199 * 0.099, 2) * 0.001 / (2 * (0.199 + 0.099)), within(0.01 * thin.properties().torsionInertia()));
        assertThat(thin.properties().torsionModulus()).isCloseTo(2 * 0.199 * 0.099 * 0.001, within(0.02 * thin.properties().torsionModulus()));
    }

    /** Saint-Venant's series for the torsion of a rectangle. */
    @Test
    void torsionOfSolidRectangles() {
        for (Section s : List.of(CATALOGUE.find("TIMBER 100x100").orElseThrow(), CATALOGUE.find("TIMBER 4x6").orElseThrow(), CATALOGUE.find("TIMBER 6x8").orElseThrow())) {
            double h = Math.max(s.depth(), s.width());
            double b = Math.min(s.depth(), s.width());
            double inertia = 0;
            double stress = 0;
            for (int n = 1; n < 60; n += 2) {
                inertia += Math.tanh(n * Math.PI * h / (2 * b)) / Math.pow(n, 5);
                stress += 1 / (n * n * Math.cosh(n * Math.PI * h / (2 * b)));
            }
            double exact = h * b * b * b / 3 * (1 - 192 * b / (Math.pow(Math.PI, 5) * h) * inertia);
            double modulus = exact / (b * (1 - 8 / (Math.PI * Math.PI) * stress));
            assertThat(s.properties().torsionInertia()).as(s.designation()).isCloseTo(exact, within(0.001 * exact)).isLessThan(1.0005 * exact);
            assertThat(s.properties().torsionModulus()).as(s.designation()).isCloseTo(modulus, within(0.001 * modulus)).isLessThan(1.0005 * modulus);
        }
    }

    /** TIMBER 6x8, 7.5 x 5.5 in: A 41.25 in2, I 7.5^3 5.5/12, W 7.5^2 5.5/6, weak 5.5^2 7.5/6, plastic 7.5^2 5.5/4, 35 lb/ft3. */
    @Test
    void aPostByHand() {
        double in = 0.0254;
        Properties p = CATALOGUE.find("TIMBER 6x8").orElseThrow().properties();
        assertThat(p.area()).isCloseTo(41.25 * in * in, within(1e-12));
        assertThat(p.inertia()).isCloseTo(193.359375 * Math.pow(in, 4), within(1e-12));
        assertThat(p.elastic()).isCloseTo(51.5625 * Math.pow(in, 3), within(1e-12));
        assertThat(p.weakElastic()).isCloseTo(37.8125 * Math.pow(in, 3), within(1e-12));
        assertThat(p.plastic()).isCloseTo(77.34375 * Math.pow(in, 3), within(1e-12));
        assertThat(p.mass()).as("35 lb/ft3 are 560.65 kg/m3").isCloseTo(41.25 * in * in * 560.646, within(1e-4));
        assertThat(p.torsionModulus()).as("h/b 1.3636: between 0.2234 at 1.3 and 0.2273 at 1.4, 0.225882 x 7.5 x 5.5^2").isCloseTo(51.2469 * Math.pow(in, 3), within(0.02e-6));
    }

    /** HSS 4x4x1/4 in the tables of the AISC manual (recalled): A 3.37 in2, I 7.80 in4, S 3.90, Z 4.69 in3, J 12.8 in4, 12.21 lb/ft. */
    @Test
    void aSquareTubeOfTheUnitedStates() {
        Properties p = CATALOGUE.find("HSS 4x4x1/4").orElseThrow().properties();
        double inch = 0.0254;
        assertThat(p.area() / Math.pow(inch, 2)).isCloseTo(3.37, within(0.01));
        assertThat(p.inertia() / Math.pow(inch, 4)).isCloseTo(7.80, within(0.02));
        assertThat(p.elastic() / Math.pow(inch, 3)).isCloseTo(3.90, within(0.01));
        assertThat(p.plastic() / Math.pow(inch, 3)).isCloseTo(4.69, within(0.01));
        assertThat(p.torsionInertia() / Math.pow(inch, 4)).isCloseTo(12.8, within(0.05));
        assertThat(p.mass() / 0.45359237 * 0.3048).isCloseTo(12.21, within(0.01));
    }

    @Test
    void whatIsRecordedIsWhatTheCatalogueHolds() {
        for (Section s : CATALOGUE.sections()) {
            assertThat(CATALOGUE.record(s, new Trace())).as(s.designation()).isEqualTo(s.properties());
        }
        Section unlisted = CATALOGUE.find("SHS 95x7 cold").orElseThrow();
        assertThat(CATALOGUE.record(unlisted, new Trace())).isEqualTo(unlisted.properties());
        assertThat(CATALOGUE.record(unlisted, new Trace().quiet())).isEqualTo(unlisted.properties());
    }

    /** A wall that was measured, 3 mm instead of 3.6: A = pi (114.3 - 3) 3 = 1048.98 mm2. */
    @Test
    void aValueOfTheUserGoesOn() {
        Section s = CATALOGUE.find("CHS 114.3x3.6").orElseThrow();
        Properties p = CATALOGUE.record(s, new Trace(List.of(new OwnValue("section-wall", 0.003, "m", "measured"))));
        assertThat(p.area()).isCloseTo(1048.98e-6, within(1e-8));
        org.assertj.core.api.Assertions.assertThatThrownBy(() -> CATALOGUE.record(s, new Trace(List.of(new OwnValue("section-wall", -1, "m", "slip")))))
            .isInstanceOf(UnfitAnswer.class).hasMessageContaining("with the values set by the user");
    }
}
