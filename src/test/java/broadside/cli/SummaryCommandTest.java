package broadside.cli;

import static broadside.cli.CommandLineRun.job;
import static org.assertj.core.api.Assertions.assertThat;

import broadside.job.JobText;
import broadside.report.PdfReader;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.api.parallel.Isolated;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The PDF summary: it holds its job, and the same job and date give the same bytes. */
@Isolated("standard output is exchanged")
class SummaryCommandTest {

    private static final String SIGN = "entrance-sign.json";

    @TempDir
    private Path folder;

    private Path pdf(String name) {
        return folder.resolve(name);
    }

    private byte[] summary(Path job, String name, Object... more) throws IOException {
        Object[] words = new Object[4 + more.length];
        words[0] = "summary";
        words[1] = job;
        words[2] = "-o";
        words[3] = pdf(name);
        System.arraycopy(more, 0, words, 4, more.length);
        CommandLineRun run = CommandLineRun.of(words);
        assertThat(run.errors()).isEmpty();
        assertThat(run.status()).isZero();
        return Files.readAllBytes(pdf(name));
    }

    @ParameterizedTest
    @ValueSource(strings = {"entrance-sign.json", "granary-hoarding.json", "bakery-sign-feet.json"})
    void theJobInsideGivesTheSameResultAgain(String example) throws IOException {
        Path job = job(folder, example);
        byte[] pdf = summary(job, "out.pdf");
        assertThat(new String(pdf, 0, 5, java.nio.charset.StandardCharsets.US_ASCII)).isEqualTo("%PDF-");
        assertThat(JobText.read(PdfReader.job(pdf).orElseThrow())).isEqualTo(JobText.read(Files.readAllBytes(job)));
        CommandLineRun fromPdf = CommandLineRun.of("check", pdf("out.pdf"), "--json");
        assertThat(fromPdf.status()).isZero();
        assertThat(fromPdf.bytes()).isEqualTo(CommandLineRun.of("check", job, "--json").bytes());
    }

    @Test
    void theSameJobAndDateGiveTheSameBytes() throws IOException {
        Path job = job(folder, SIGN, "\"date\": \"2026-11-20\",", "");
        byte[] first = summary(job, "a.pdf", "--date", "2026-12-01");
        assertThat(summary(job, "b.pdf", "--date", "2026-12-01")).isEqualTo(first);
        assertThat(summary(pdf("a.pdf"), "c.pdf", "--date", "2026-12-01")).as("from the job inside").isEqualTo(first);
        assertThat(summary(job, "d.pdf", "--date", "2026-12-02")).isNotEqualTo(first);
        assertThat(summary(job, "e.pdf", "--date", "2026-12-01", "--paper", "letter")).isNotEqualTo(first);
    }

    @Test
    void theDateOfTheJobComesFirst() throws IOException {
        Path job = job(folder, SIGN);
        assertThat(summary(job, "a.pdf", "--date", "2027-01-01")).isEqualTo(summary(job, "b.pdf"));
    }

    @Test
    void anItemThatIsNotCoveredIsStillWrittenAndGivesOne() throws IOException {
        Path job = job(folder, SIGN, "\"clearance\": \"2.5 m\"", "\"clearance\": \"250 m\"");
        CommandLineRun run = CommandLineRun.of("summary", job, "-o", pdf("out.pdf"));
        assertThat(run.status()).isEqualTo(1);
        assertThat(run.errors()).isEmpty();
        assertThat(PdfReader.job(Files.readAllBytes(pdf("out.pdf")))).isPresent();
        assertThat(CommandLineRun.of("check", pdf("out.pdf")).status()).isEqualTo(1);
    }

    @Test
    void aBadJobWritesNothing() {
        Path job = job(folder, SIGN, "\"width\": \"3 m\"", "\"width\": \"3\"");
        CommandLineRun run = CommandLineRun.of("summary", job, "-o", pdf("out.pdf"));
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).hasSize(1);
        assertThat(run.errors().get(0)).startsWith(job + ": items[0].boards[0].width: ");
        assertThat(pdf("out.pdf")).doesNotExist();
    }

    @Test
    void aPdfWithoutAJobIsRefused() throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (PDDocument document = new PDDocument()) {
            document.addPage(new PDPage());
            document.save(bytes);
        }
        Path plain = Files.write(pdf("plain.pdf"), bytes.toByteArray());
        for (CommandLineRun run : new CommandLineRun[] {CommandLineRun.of("check", plain), CommandLineRun.of("summary", plain, "-o", pdf("out.pdf"))}) {
            assertThat(run.status()).isEqualTo(2);
            assertThat(run.errors()).containsExactly(plain + ": this PDF holds no Broadside job; give a job file or a PDF that Broadside wrote");
        }
    }

    @Test
    void aBrokenPdfIsOneLine() throws IOException {
        byte[] whole = summary(job(folder, SIGN), "out.pdf");
        Path half = Files.write(pdf("half.pdf"), java.util.Arrays.copyOf(whole, whole.length / 2));
        CommandLineRun run = CommandLineRun.of("check", half);
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).containsExactly(half + ": the PDF is damaged: its end is missing");
    }

    @Test
    void whereNothingCanBeWrittenIsOneLine() {
        Path job = job(folder, SIGN);
        Path nowhere = folder.resolve("no").resolve("out.pdf");
        CommandLineRun run = CommandLineRun.of("summary", job, "-o", nowhere);
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).containsExactly(nowhere + ": the file cannot be written");
        CommandLineRun onFolder = CommandLineRun.of("summary", job, "-o", folder);
        assertThat(onFolder.status()).isEqualTo(2);
        assertThat(onFolder.errors()).containsExactly(folder + ": the file cannot be written");
    }

    @ParameterizedTest
    @ValueSource(strings = {"--date 1.12.2026", "--date 2026-02-30", "--date today", "--paper a5", "--paper A"})
    void anOptionThatDoesNotFitIsOneLine(String option) {
        String[] words = option.split(" ");
        CommandLineRun run = CommandLineRun.of("summary", job(folder, SIGN), "-o", pdf("out.pdf"), words[0], words[1]);
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errors()).hasSize(1);
        assertThat(run.errors().get(0)).startsWith(option + ": must be ");
        assertThat(pdf("out.pdf")).doesNotExist();
    }
}
