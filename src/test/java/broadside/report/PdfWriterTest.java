package broadside.report;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.sheet.Sheet;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.verapdf.pdfa.flavours.PDFAFlavour;

class PdfWriterTest {

    private static final PdfWriter WRITER = new PdfWriter();

    static byte[] pdf(Sheet sheet, Paper paper) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        WRITER.write(sheet, paper, Samples.job(), out);
        return out.toByteArray();
    }

    @ParameterizedTest
    @EnumSource(names = {"PDFA_3_A", "PDFUA_1"})
    void keepsTheStandard(PDFAFlavour flavour) throws Exception {
        assertThat(Conformance.failures(pdf(Samples.sheet(), Paper.A4), flavour)).isEmpty();
    }

    @Test
    void dump() throws Exception {
        java.nio.file.Files.write(java.nio.file.Path.of("/tmp/hbx/a4.pdf"), pdf(Samples.sheet(), Paper.A4));
        java.nio.file.Files.write(java.nio.file.Path.of("/tmp/hbx/letter.pdf"), pdf(Samples.sheet(), Paper.LETTER));
    }
}
