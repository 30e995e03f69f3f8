package broadside.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Random;
import java.util.zip.DeflaterOutputStream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.encryption.AccessPermission;
import org.apache.pdfbox.pdmodel.encryption.StandardProtectionPolicy;
import org.apache.pdfbox.pdfwriter.compress.CompressParameters;
import org.junit.jupiter.api.Test;

class PdfReaderTest {

    private static byte[] pdf() throws IOException {
        return PdfWriterTest.pdf(Samples.sheet(), Paper.A4);
    }

    @Test
    void returnsTheJobThatWasWritten() throws IOException {
        assertThat(PdfReader.job(pdf())).hasValueSatisfying(job -> assertThat(job).isEqualTo(Samples.job().bytes()));
    }

    @Test
    void returnsALargeJob() throws IOException {
        byte[] large = new byte[Attachment.MOST_BYTES];
        new Random(3).nextBytes(large);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        new PdfWriter().write(Samples.sheet(), Paper.A4, new Attachment("job.json", "", large), out);
        assertThat(PdfReader.job(out.toByteArray())).hasValueSatisfying(job -> assertThat(job).isEqualTo(large));
    }

    @Test
    void returnsTheJobAfterOtherSoftwareHasSavedTheFile() throws IOException {
        for (CompressParameters packing : new CompressParameters[] {CompressParameters.DEFAULT_COMPRESSION,
            CompressParameters.NO_COMPRESSION}) {
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            try (PDDocument document = Loader.loadPDF(pdf())) {
                document.addPage(new PDPage());
                document.save(out, packing);
            }
            assertThat(PdfReader.job(out.toByteArray())).hasValueSatisfying(job ->
                assertThat(job).isEqualTo(Samples.job().bytes()));
        }
    }

    @Test
    void returnsTheJobAfterAChangeWasAddedAtTheEnd() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (PDDocument document = Loader.loadPDF(pdf())) {
            document.getDocumentInformation().setAuthor("A. Reader");
            document.getDocumentInformation().getCOSObject().setNeedToBeUpdated(true);
            document.saveIncremental(out);
        }
        assertThat(out.size()).isGreaterThan(pdf().length);
        assertThat(PdfReader.job(out.toByteArray())).isPresent();
    }

    @Test
    void aPdfWithoutAJobGivesNothing() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (PDDocument document = new PDDocument()) {
            document.addPage(new PDPage());
            document.save(out);
        }
        assertThat(PdfReader.job(out.toByteArray())).isEmpty();
    }

    @Test
    void whatIsNoPdfIsRefused() {
        refused(new byte[0], "this is not a PDF file: it does not begin with %PDF");
        refused("{\"name\": \"a job\"}".getBytes(StandardCharsets.UTF_8),
            "this is not a PDF file: it does not begin with %PDF");
    }

    @Test
    void aCutFileIsRefused() throws IOException {
        byte[] pdf = pdf();
        refused(Arrays.copyOf(pdf, pdf.length / 2), "the PDF is damaged: its end is missing");
    }

    @Test
    void aDamagedJobIsRefused() throws IOException {
        byte[] pdf = pdf();
        int dictionary = new String(pdf, StandardCharsets.ISO_8859_1).indexOf("/Type /EmbeddedFile\n");
        assertThat(dictionary).isPositive();
        int data = new String(pdf, StandardCharsets.ISO_8859_1).indexOf("stream", dictionary);
        for (int i = data + 12; i < data + 40; i++) {
            pdf[i] ^= 0x55;
        }
        refused(pdf, "the PDF is damaged: the job file in it cannot be unpacked");
    }

    @Test
    void aLockedPdfIsRefused() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (PDDocument document = Loader.loadPDF(pdf())) {
            document.protect(new StandardProtectionPolicy("owner", "user", new AccessPermission()));
            document.save(out);
        }
        refused(out.toByteArray(), "the PDF is locked; save it without a password and try again");
    }

    @Test
    void tooLargeAFileIsRefused() {
        refused(new byte[PdfReader.MOST_BYTES + 1], "the PDF has 20 MB; at most 20 MB are read");
    }

    @Test
    void aJobThatUnpacksToTooMuchIsRefused() throws IOException {
        ByteArrayOutputStream packed = new ByteArrayOutputStream();
        try (DeflaterOutputStream deflater = new DeflaterOutputStream(packed)) {
            byte[] zeros = new byte[1_000_000];
            for (int i = 0; i < 500; i++) {
                deflater.write(zeros);
            }
        }
        refused(around("/Filter /FlateDecode", packed.toByteArray()),
            "the job file in the PDF has more than 2000000 bytes, which is more than a job can have");
    }

    @Test
    void aJobThatIsNotPackedIsReadByItsLength() throws IOException {
        byte[] job = Samples.job().bytes();
        assertThat(PdfReader.job(around("/Length " + job.length, job))).hasValueSatisfying(read ->
            assertThat(read).isEqualTo(job));
        refused(around("/Length 99999", job), "the PDF is damaged: the job file in it is cut off");
        refused(around("/Length 7 0 R", job), "the PDF is damaged: the job file in it is cut off");
        refused(around("/Filter /LZWDecode", job), "the job file in the PDF is packed in a way that is not read here");
        refused(around("/Filter [/FlateDecode /FlateDecode]", job),
            "the job file in the PDF is packed in a way that is not read here");
    }

    @Test
    void aJobThatDoesNotAgreeWithItsSumIsRefused() throws IOException {
        byte[] job = Samples.job().bytes();
        String sum = Envelope.sum(job);
        String entries = "/Length " + job.length + " /Params <</Size " + job.length + " /CheckSum <%s>>>";
        assertThat(PdfReader.job(around(entries.formatted(sum), job))).isPresent();
        job[9] = 'X';
        refused(around(entries.formatted(sum), job), "the PDF is damaged: the job file in it has changed");
        refused(around("/Length 5 /Params <</Size 6>>", job), "the PDF is damaged: the job file in it has changed");
    }

    private static byte[] around(String entry, byte[] data) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        out.write(("%PDF-1.7\n1 0 obj\n<</Type /EmbeddedFile /Subtype /application#2Fjson " + entry + ">>\nstream\n")
            .getBytes(StandardCharsets.ISO_8859_1));
        out.write(data);
        out.write("\nendstream\nendobj\nstartxref\n0\n%%EOF".getBytes(StandardCharsets.ISO_8859_1));
        return out.toByteArray();
    }

    @Test
    void damageAnywhereGivesAJobNothingOrAPlainMessage() throws IOException {
        byte[] pdf = pdf();
        Random random = new Random(11);
        for (int i = 0; i < 500; i++) {
            byte[] damaged = pdf.clone();
            for (int k = 0; k < 60; k++) {
                damaged[random.nextInt(damaged.length)] = (byte) random.nextInt();
            }
            try {
                PdfReader.job(damaged).ifPresent(job -> assertThat(job).isEqualTo(Samples.job().bytes()));
            } catch (ReportException e) {
                assertThat(e.getMessage()).isNotBlank().doesNotContain("\n");
            }
        }
    }

    private static void refused(byte[] pdf, String message) {
        assertThatThrownBy(() -> PdfReader.job(pdf)).isInstanceOf(ReportException.class).hasMessage(message);
    }
}
