package broadside.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import broadside.sheet.Block;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.NewPage;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Picture;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.Table;
import broadside.sheet.Block.Tone;
import broadside.sheet.Drawing;
import broadside.sheet.Sheet;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import javax.xml.parsers.DocumentBuilderFactory;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.common.filespecification.PDComplexFileSpecification;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineItem;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineNode;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Element;
import org.verapdf.pdfa.flavours.PDFAFlavour;

class PdfWriterTest {

    private static final PdfWriter WRITER = new PdfWriter();

    static byte[] pdf(Sheet sheet, Paper paper) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        WRITER.write(sheet, paper, Samples.job(), out);
        return out.toByteArray();
    }

    private static byte[] pdf(Block... blocks) throws IOException {
        return pdf(Samples.sheet(List.of(blocks)), Paper.A4);
    }

    static String text(byte[] pdf) throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            return new PDFTextStripper().getText(document);
        }
    }

    private static String page(PDDocument document, int number) throws IOException {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setStartPage(number);
        stripper.setEndPage(number);
        return stripper.getText(document);
    }

    private static Block plain(String text) {
        return new Paragraph(text, Tone.PLAIN);
    }

    @ParameterizedTest
    @EnumSource(names = {"PDFA_3_A", "PDFUA_1"})
    void keepsTheStandard(PDFAFlavour flavour) throws Exception {
        assertThat(Conformance.failures(pdf(Samples.sheet(), Paper.A4), flavour)).isEmpty();
        assertThat(Conformance.failures(pdf(Samples.sheet(), Paper.LETTER), flavour)).isEmpty();
    }

    @ParameterizedTest
    @EnumSource(names = {"PDFA_3_A", "PDFUA_1"})
    void keepsTheStandardWithoutAnyBlock(PDFAFlavour flavour) throws Exception {
        Sheet empty = new Sheet("", "", "", "", "", "", List.of());
        assertThat(Conformance.failures(pdf(empty, Paper.A4), flavour)).isEmpty();
    }

    @ParameterizedTest
    @EnumSource(names = {"PDFA_3_A", "PDFUA_1"})
    void theCheckOfTheStandardFindsWhatIsMissing(PDFAFlavour flavour) throws Exception {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (PDDocument document = Loader.loadPDF(pdf(Samples.sheet(), Paper.A4))) {
            document.getDocumentCatalog().getCOSObject().removeItem(COSName.STRUCT_TREE_ROOT);
            document.save(out);
        }
        assertThat(Conformance.failures(out.toByteArray(), flavour)).isNotEmpty();
    }

    @Test
    void textComesOutInTheOrderOfReading() throws IOException {
        assertThat(text(pdf(Samples.sheet(), Paper.A4))).containsSubsequence("What governs", "Wind at an angle, case 2",
            "Force on the board", "11.4 kN (2.56 kip)", "24 m/s (54 mph)", "Caution:", "The drawing", "5.00 m",
            "Front view, to scale", "Basic wind velocity", "to be confirmed", "Load cases with characteristic values",
            "Moment at", "2 Wind at an angle",
            "0.625", "24.7", "governs", "Gust 49", "1.472", "What was assumed",
            "Zo\u00eb \u0141ukasik", "\u221a2", "The calculation", "Iv = kI / (co ln(z / z0)) = 0.2149", "= 0.7055 kPa", "(14.74 psf)",
            "vm = 21.23 m/s", "peak velocity pressure", "EN 1991-1-4, 4.5 (4.8) (read)", "Fw,net = cp,net qp A = 15.87 kN");
    }

    @Test
    void everyPageHasItsMargins() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(Samples.sheet(), Paper.A4))) {
            int pages = document.getNumberOfPages();
            assertThat(pages).isBetween(4, 6);
            for (int i = 1; i <= pages; i++) {
                assertThat(page(document, i)).contains(Samples.CAUTION, "page " + i + " of " + pages,
                    "Sign at the corner of Mill Lane, Harrowby", "Reference HB-0417, revision B, 2026-03-14",
                    "Broadside 0.1.0, tables 3f9a61c2");
            }
        }
    }

    @Test
    void theHeadOfATableStandsOnEachOfItsPages() throws IOException {
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < 120; i++) {
            rows.add(new Row(List.of("row " + i, Integer.toString(i)), false));
        }
        Table table = new Table("Caption", List.of(new Column("First head", false, 1), new Column("Second", true, 1)),
            rows);
        try (PDDocument document = Loader.loadPDF(pdf(table))) {
            assertThat(document.getNumberOfPages()).isGreaterThanOrEqualTo(3);
            for (int i = 1; i <= document.getNumberOfPages(); i++) {
                assertThat(page(document, i)).containsOnlyOnce("First head");
            }
            assertThat(page(document, 2)).doesNotContain("Caption");
        }
    }

    @Test
    void theSameSheetGivesTheSameBytes() throws Exception {
        byte[] once = pdf(Samples.sheet(), Paper.A4);
        assertThat(pdf(Samples.sheet(), Paper.A4)).isEqualTo(once);
        ExecutorService threads = Executors.newFixedThreadPool(6);
        try {
            List<Future<byte[]>> results = threads.invokeAll(Collections.nCopies(24,
                () -> pdf(Samples.sheet(), Paper.A4)));
            for (Future<byte[]> result : results) {
                assertThat(result.get()).isEqualTo(once);
            }
        } finally {
            threads.shutdownNow();
        }
    }

    @Test
    void anotherSheetOrJobHasAnotherIdentity() throws IOException {
        Sheet sheet = Samples.sheet(List.of(plain("one")));
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        WRITER.write(sheet, Paper.A4, new Attachment("job.json", "the job", new byte[] {'{', '}'}), out);
        assertThat(List.of(identity(pdf(sheet, Paper.A4)), identity(pdf(plain("two"))), identity(out.toByteArray())))
            .doesNotHaveDuplicates();
    }

    private static String identity(byte[] pdf) throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            return document.getDocument().getDocumentID().toString();
        }
    }

    @ParameterizedTest
    @EnumSource
    void pagesHaveTheSizeOfThePaper(Paper paper) throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(Samples.sheet(), paper))) {
            for (PDPage page : document.getPages()) {
                assertThat(page.getMediaBox().getWidth()).isEqualTo(paper == Paper.A4 ? 595.28f : 612f);
                assertThat(page.getMediaBox().getHeight()).isEqualTo(paper == Paper.A4 ? 841.89f : 792f);
            }
        }
    }

    @Test
    void theJobIsTheSourceOfTheDocument() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(Samples.sheet(), Paper.A4))) {
            PDComplexFileSpecification file = document.getDocumentCatalog().getNames().getEmbeddedFiles().getNames()
                .get("job.json");
            assertThat(file.getEmbeddedFile().toByteArray()).isEqualTo(Samples.job().bytes());
            assertThat(file.getEmbeddedFile().getSubtype()).isEqualTo("application/json");
            assertThat(file.getFileDescription()).isEqualTo(Samples.job().description());
            assertThat(file.getCOSObject().getNameAsString("AFRelationship")).isEqualTo("Source");
            assertThat(document.getDocumentCatalog().getCOSObject().getCOSArray(COSName.AF).getObject(0))
                .isSameAs(file.getCOSObject());
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"Sign & Co <left>", "@date@ @maker@ @title@", "two\r\n lines", "\u98a8 \ud83d\ude80"})
    void theTitleStandsInBothDescriptions(String title) throws Exception {
        Sheet sheet = new Sheet(title, "", "", "2026-03-14", Samples.CAUTION, "Broadside @title@", List.of());
        String expected = title.replace("\r\n ", " ");
        try (PDDocument document = Loader.loadPDF(pdf(sheet, Paper.A4))) {
            assertThat(document.getDocumentInformation().getTitle()).isEqualTo(expected);
            assertThat(document.getDocumentInformation().getCreationDate().toInstant())
                .isEqualTo("2026-03-14T00:00:00Z");
            Element description = DocumentBuilderFactory.newInstance().newDocumentBuilder()
                .parse(document.getDocumentCatalog().getMetadata().exportXMPMetadata()).getDocumentElement();
            assertThat(description.getElementsByTagName("dc:title").item(0).getTextContent()).isEqualTo(expected);
            assertThat(description.getElementsByTagName("xmp:CreateDate").item(0).getTextContent())
                .isEqualTo("2026-03-14T00:00:00Z");
            assertThat(description.getElementsByTagName("pdf:Producer").item(0).getTextContent())
                .isEqualTo("Broadside @title@");
        }
    }

    @Test
    void headingsAreBookmarks() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(Samples.sheet(), Paper.A4))) {
            List<String> titles = new ArrayList<>();
            collect(document.getDocumentCatalog().getDocumentOutline(), document, titles);
            assertThat(titles).containsExactly("1 Sign at the corner of Mill Lane, Harrowby", "1 The drawing",
                "1 Where it stands", "2 Load cases", "2 Gusts and what to do", "3 What was assumed",
                "3 What was not checked", "4 The calculation");
        }
    }

    private static void collect(PDOutlineNode node, PDDocument document, List<String> into) throws IOException {
        for (PDOutlineItem item : node.children()) {
            PDPage page = item.findDestinationPage(document);
            assertThat(page(document, document.getPages().indexOf(page) + 1)).contains(item.getTitle());
            into.add(document.getPages().indexOf(page) + 1 + " " + item.getTitle());
            collect(item, document, into);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {38, 39, 40, 41, 42, 43, 44, 45, 46, 47, 48, 49, 50})
    void aHeadingStaysWithWhatItHeads(int lines) throws IOException {
        List<Block> blocks = new ArrayList<>();
        for (int i = 0; i < lines; i++) {
            blocks.add(new Block.Facts("", List.of(Block.Fact.of("Filling", "one line"))));
        }
        blocks.add(new Heading(2, "Outer heading", "outer"));
        blocks.add(new Heading(3, "Inner heading", "inner"));
        blocks.add(plain("What is headed"));
        try (PDDocument document = Loader.loadPDF(pdf(Samples.sheet(blocks), Paper.A4))) {
            for (int i = 1; i <= document.getNumberOfPages(); i++) {
                String page = page(document, i);
                assertThat(page.contains("Outer heading")).isEqualTo(page.contains("What is headed"))
                    .isEqualTo(page.contains("Inner heading"));
            }
        }
    }

    @Test
    void aStepIsNotDividedBetweenPages() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(Samples.steps(60)))) {
            assertThat(document.getNumberOfPages()).isGreaterThan(2);
            for (int i = 1; i <= document.getNumberOfPages(); i++) {
                String page = page(document, i);
                assertThat(page.split("\u03c1 = 1.25 kg/m\u00b3", -1)).hasSameSizeAs(page.split("0.7055 kPa \\(", -1));
            }
        }
    }

    @Test
    void aNewPageBeginsOnceAndLeavesNoEmptyPage() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(new NewPage(), plain("one"), new NewPage(), new NewPage(),
            plain("two"), new NewPage()))) {
            assertThat(document.getNumberOfPages()).isEqualTo(2);
            assertThat(page(document, 2)).contains("two").doesNotContain("one");
        }
    }

    @Test
    void aTextTallerThanAPageGoesOnAndLosesNothing() throws IOException {
        String word = "\u0416".repeat(10_000);
        byte[] pdf = pdf(new Table("Long", List.of(new Column("A", false, 1), new Column("B", false, 9)),
            List.of(new Row(List.of(word, "end"), true))), plain("Zz".repeat(5_000)));
        assertThat(text(pdf).chars().filter(c -> c == '\u0416').count()).isEqualTo(10_000);
        assertThat(text(pdf).chars().filter(c -> c == 'Z').count()).isEqualTo(5_000);
    }

    @Test
    void aWideDrawingIsReducedToTheWidthOfTheText() throws IOException {
        Drawing wide = new Drawing(2_000, 100, List.of(new Drawing.Text(1_950, 50, "edge", 20, Drawing.Anchor.START,
            false, 0, Drawing.Ink.BLACK)));
        byte[] pdf = pdf(new Picture(wide, "wide", "a wide drawing"));
        List<double[]> places = Places.of(pdf, "edge");
        assertThat(places).hasSize(1);
        assertThat(places.get(0)[0]).isBetween(51.0, 595.28 - 51);
    }

    @Test
    void tablesAndOutlinesThatDoNotFitTogetherAreRefused() {
        List<Column> columns = List.of(new Column("A", false, 1), new Column("B", false, 1));
        assertThatIllegalArgumentException().isThrownBy(() -> pdf(new Table("Cases", columns,
            List.of(new Row(List.of("only one"), false)))))
            .withMessage("a row has 1 cells and its table 2 columns: Cases");
        Drawing odd = new Drawing(10, 10, List.of(new Drawing.Outline(List.of(1d, 2d, 3d), 1, Drawing.Ink.BLACK,
            Drawing.Fill.NONE)));
        assertThatIllegalArgumentException().isThrownBy(() -> pdf(new Picture(odd, "", "")))
            .withMessageContaining("at least two points");
        Drawing nowhere = new Drawing(10, 10, List.of(
            new Drawing.Line(0, Double.NaN, 1, 1, 1, Drawing.Ink.BLACK, false)));
        assertThatIllegalArgumentException().isThrownBy(() -> pdf(new Picture(nowhere, "", "")))
            .withMessageContaining("NaN");
    }

    @Test
    void anAttachmentIsNamedAndOfBoundedSize() {
        assertThatIllegalArgumentException().isThrownBy(() -> new Attachment(" ", "", new byte[0]))
            .withMessageContaining("needs a name");
        assertThatIllegalArgumentException().isThrownBy(() -> new Attachment("job.json", "", new byte[2_000_001]))
            .withMessageContaining("at most 2000000");
    }
}
