package broadside.cli;

import broadside.assess.Assessment;
import broadside.job.JobText;
import broadside.report.Attachment;
import broadside.report.Paper;
import broadside.report.PdfWriter;
import broadside.sheet.ComparisonBlocks;
import broadside.sheet.Sheet;
import broadside.sheet.SheetMaker;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.concurrent.Callable;
import java.util.concurrent.CompletableFuture;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;
import tools.jackson.databind.JsonNode;

/** Writes the PDF load summary of a job. */
@Command(name = "summary", mixinStandardHelpOptions = true, description = "Writes the PDF load summary of a job file or a Broadside PDF.")
final class SummaryCommand implements Callable<Integer> {

    @ParentCommand
    private Commands parent;

    @Parameters(paramLabel = "JOB", description = "job file or Broadside PDF")
    private Path job;

    @Option(names = {"-o", "--output"}, required = true, paramLabel = "OUT.pdf", description = "the PDF to write")
    private Path output;

    @Option(names = "--paper", paramLabel = "a4|letter", description = "size of the paper; a4 unless told otherwise", defaultValue = "a4")
    private String paper;

    @Option(names = "--date", paramLabel = "YYYY-MM-DD", description = "date of the document; the job's own date comes first, else today")
    private String date;

    @Option(names = "--side-by-side", description = "add a page that holds each item against every code")
    private boolean sideBySide;

    @Override
    public Integer call() {
        if (Files.isDirectory(output) || output.toAbsolutePath().getParent() != null && !Files.isWritable(output.toAbsolutePath().getParent())) {
            throw new Refused(output + ": the file cannot be written");
        }
        CompletableFuture<JsonNode> begun = JobFiles.begin(job);
        Tool tool = parent.tool();
        JobFiles.Opened opened = JobFiles.open(job, begun, tool.reader());
        if (same(job, output)) {
            throw new Refused(output + ": is the job itself; give the PDF another name");
        }
        Assessment assessment = CheckCommand.assess(tool, opened, job);
        Sheet own = SheetMaker.of(assessment, date());
        Sheet sheet = sideBySide ? ComparisonBlocks.behind(own, tool.assessor(), assessment) : own;
        ByteArrayOutputStream pdf = new ByteArrayOutputStream();
        try {
            new PdfWriter().write(sheet, paper(), new Attachment("job.json", "the job that this document was made from", JobText.write(opened.json())), pdf);
            Files.write(output, pdf.toByteArray());
        } catch (IOException e) {
            throw new Refused(output + ": the file cannot be written");
        }
        return assessment.allAssessed() ? 0 : 1;
    }

    private static boolean same(Path one, Path other) {
        try {
            return Files.exists(other) && Files.isSameFile(one, other);
        } catch (IOException e) {
            return false;
        }
    }

    private Paper paper() {
        return switch (paper.toLowerCase(java.util.Locale.ROOT)) {
            case "a4" -> Paper.A4;
            case "letter" -> Paper.LETTER;
            default -> throw new Refused("--paper " + paper + ": must be a4 or letter");
        };
    }

    private String date() {
        try {
            return (date == null ? LocalDate.now() : LocalDate.parse(date)).toString();
        } catch (DateTimeParseException e) {
            throw new Refused("--date " + date + ": must be a date like 2026-12-01");
        }
    }
}
