package broadside.cli;

import broadside.assess.Assessment;
import broadside.assess.BadJob;
import broadside.job.JobText;
import broadside.job.ResultText;
import broadside.sheet.ComparisonBlocks;
import broadside.sheet.SheetMaker;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.CompletableFuture;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;
import tools.jackson.databind.JsonNode;

/** Assesses a job file: a table, or the result as JSON. */
@Command(name = "check", mixinStandardHelpOptions = true, description = "Assesses a job file or a Broadside PDF and prints the loads.")
final class CheckCommand implements Callable<Integer> {

    @ParentCommand
    private Commands parent;

    @Parameters(paramLabel = "JOB", description = "job file or Broadside PDF")
    private Path job;

    @Option(names = "--json", description = "print the result as JSON")
    private boolean json;

    @Option(names = "--side-by-side", description = "print what every code says, side by side")
    private boolean sideBySide;

    @Override
    public Integer call() {
        CompletableFuture<JsonNode> begun = JobFiles.begin(job);
        Tool tool = parent.tool();
        Assessment assessment = assess(tool, JobFiles.open(job, begun, tool.reader()), job);
        PrintStream out = Terminal.out();
        if (sideBySide) {
            assessment.job().items().forEach(item -> TextTable.print(ComparisonBlocks.sheet(tool.assessor(), assessment, item, ""), out));
        } else if (json) {
            out.writeBytes(JobText.write(ResultText.of(assessment)));
        } else {
            TextTable.print(SheetMaker.answer(assessment), out);
        }
        Terminal.finish(out);
        return assessment.allAssessed() ? 0 : 1;
    }

    static Assessment assess(Tool tool, JobFiles.Opened opened, Path file) {
        try {
            return tool.assessor().withLimits(tool.assessor().assess(opened.job()));
        } catch (BadJob e) {
            throw new Refused(e.problems().stream().map(p -> file + ": " + p.line()).toList());
        }
    }
}
