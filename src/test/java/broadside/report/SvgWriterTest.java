package broadside.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import broadside.sheet.Drawing;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Ink;
import broadside.sheet.Drawing.Line;
import broadside.sheet.Drawing.Shape;
import broadside.sheet.Drawing.Text;
import java.io.StringReader;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

class SvgWriterTest {

    private static final Set<String> ELEMENTS = Set.of("svg", "title", "desc", "line", "polygon", "circle", "text");

    private static Element parse(String svg) throws Exception {
        return DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(svg)))
            .getDocumentElement();
    }

    private static String svg(Shape... shapes) {
        return SvgWriter.svg(new Drawing(100, 50, List.of(shapes)), "t", "d");
    }

    private static Text text(String text) {
        return new Text(1, 2, text, 9, Anchor.START, false, 0, Ink.BLACK);
    }

    @Test
    void isAnImageWithANameAndADescription() throws Exception {
        Element svg = parse(SvgWriter.svg(Samples.drawing(), "Front view", "A board on two posts"));
        assertThat(svg.getAttribute("role")).isEqualTo("img");
        assertThat(svg.getAttribute("viewBox")).isEqualTo("0 0 440 270");
        assertThat(svg.getFirstChild().getNodeName()).isEqualTo("title");
        assertThat(svg.getFirstChild().getTextContent()).isEqualTo("Front view");
        assertThat(svg.getChildNodes().item(1).getTextContent()).isEqualTo("A board on two posts");
        assertThat(svg.getChildNodes().getLength()).isEqualTo(2 + Samples.drawing().shapes().size());
        assertThat(svg.getElementsByTagName("polygon").getLength()).isEqualTo(4);
    }

    @Test
    void holdsShapesAndPresentationAttributesOnly() throws Exception {
        String svg = SvgWriter.svg(Samples.drawing(), "<script>alert(1)</script>", "\" onload=\"x\" style='y'");
        Element root = parse(svg);
        NodeList all = root.getElementsByTagName("*");
        for (int i = 0; i < all.getLength(); i++) {
            assertThat(ELEMENTS).contains(all.item(i).getNodeName());
            for (int k = 0; k < all.item(i).getAttributes().getLength(); k++) {
                Node attribute = all.item(i).getAttributes().item(k);
                assertThat(attribute.getNodeName()).doesNotStartWith("on").isNotIn("style", "class", "href", "xlink:href");
            }
        }
        assertThat(root.getFirstChild().getTextContent()).isEqualTo("<script>alert(1)</script>");
    }

    @Test
    void numbersHaveAtMostTwoDecimalsInAnyLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            assertThat(svg(new Line(-0.001, 1234.5, 0.126, -7.005001, 0.7, Ink.AMBER, true)))
                .contains("<line x1=\"0\" y1=\"1234.5\" x2=\"0.13\" y2=\"-7.01\" stroke=\"#9a5b00\" stroke-width=\"0.7\" "
                    + "stroke-dasharray=\"3 2\"/>");
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void turnedTextTurnsAgainstTheClock() {
        assertThat(svg(new Text(10, 20, "h", 9, Anchor.END, true, 90, Ink.ACCENT))).contains("<text x=\"10\" y=\"20\" "
            + "font-size=\"9\" text-anchor=\"end\" font-weight=\"bold\" transform=\"rotate(-90 10 20)\" fill=\"#0b5563\">h");
    }

    @Test
    void anyTextStaysText() throws Exception {
        Random random = new Random(5);
        for (int i = 0; i < 400; i++) {
            StringBuilder hostile = new StringBuilder("<&>\"'\u0000\ud800");
            for (int k = 0; k < 50; k++) {
                hostile.append((char) random.nextInt(0x10000));
            }
            Element root = parse(SvgWriter.svg(new Drawing(9, 9, List.of(text(hostile.toString()))), hostile.toString(),
                hostile.toString()));
            assertThat(root.getLastChild().getTextContent()).startsWith("<&>\"'");
        }
    }

    @Test
    void aCoordinateThatIsNoNumberIsRefused() {
        assertThatIllegalArgumentException().isThrownBy(() -> svg(new Line(Double.NaN, 0, 1, 1, 1, Ink.BLACK, false)))
            .withMessageContaining("not NaN");
        assertThatIllegalArgumentException().isThrownBy(() -> svg(new Line(0, Double.POSITIVE_INFINITY, 1, 1, 1,
            Ink.BLACK, false))).withMessageContaining("Infinity");
    }
}
