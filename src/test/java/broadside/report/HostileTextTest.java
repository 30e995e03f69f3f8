package broadside.report;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.sheet.Block;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Picture;
import broadside.sheet.Block.Tone;
import broadside.sheet.Sheet;
import java.io.IOException;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.verapdf.pdfa.flavours.PDFAFlavour;

/** Whatever a user types, the PDF is written, opens again and keeps its margins. */
class HostileTextTest {

    static Stream<Long> seeds() {
        return IntStream.range(0, 30).mapToObj(i -> (long) i);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void neverThrowsAndOpensAgain(long seed) throws IOException {
        OddSheets sheets = new OddSheets(seed);
        for (int i = 0; i < 10; i++) {
            byte[] pdf = PdfWriterTest.pdf(sheets.next(), i % 2 == 0 ? Paper.A4 : Paper.LETTER);
            try (PDDocument document = Loader.loadPDF(pdf)) {
                assertThat(document.getNumberOfPages()).isPositive();
            }
            assertThat(PdfReader.job(pdf)).isPresent();
        }
    }

    @ParameterizedTest
    @MethodSource("fewSeeds")
    void keepsTheStandards(long seed) throws Exception {
        byte[] pdf = PdfWriterTest.pdf(new OddSheets(seed).next(), Paper.A4);
        assertThat(Conformance.failures(pdf, PDFAFlavour.PDFA_3_A)).isEmpty();
        assertThat(Conformance.failures(pdf, PDFAFlavour.PDFUA_1)).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("fewSeeds")
    void staysInsideTheMargins(long seed) throws IOException {
        Sheet whole = new OddSheets(seed).next();
        List<Block> texts = whole.blocks().stream().filter(block -> !(block instanceof Picture)).toList();
        Sheet sheet = new Sheet(whole.title(), whole.reference(), whole.revision(), whole.date(), whole.caution(),
            whole.made(), texts);
        assertThat(Places.of(PdfWriterTest.pdf(sheet, Paper.A4), "")).isNotEmpty().allSatisfy(place -> {
            assertThat(place[0]).isGreaterThan(50.5);
            assertThat(place[1]).isLessThan(595.28 - 50.5);
            assertThat(place[2]).isBetween(30.0, 841.89 - 20);
        });
    }

    static Stream<Long> fewSeeds() {
        return IntStream.range(100, 112).mapToObj(i -> (long) i);
    }

    @Test
    void thingsTheFontLacksAreShownAsBoxes() throws IOException {
        String text = PdfWriterTest.text(PdfWriterTest.pdf(Samples.sheet(List.of(
            new Paragraph("wind \ud83c\udf2c and \u98a8 and \u0007 and tab\there", Tone.PLAIN))), Paper.A4));
        assertThat(text).contains("wind \u25a1 and \u25a1 and \u25a1 and tab here");
    }

    @Test
    void hebrewStandsFromRightToLeft() throws IOException {
        String text = PdfWriterTest.text(PdfWriterTest.pdf(Samples.sheet(List.of(
            new Paragraph("sign of \u05e9\u05dc\u05d5\u05dd 12 m", Tone.PLAIN))), Paper.A4));
        assertThat(text).contains("sign of", "\u05e9\u05dc\u05d5\u05dd");
    }
}
