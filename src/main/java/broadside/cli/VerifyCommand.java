package broadside.cli;

import broadside.job.PublishedCheck;
import broadside.table.TableFiles;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;

/** Runs published checks and prints printed, computed and difference. */
@Command(name = "verify", mixinStandardHelpOptions = true, description = "Runs the published checks that ship, or those of a folder.")
final class VerifyCommand implements Callable<Integer> {

    @ParentCommand
    private Commands parent;

    @Parameters(paramLabel = "DIR", arity = "0..1", description = "a folder of published checks; those that ship unless given")
    private Path folder;

    @Override
    public Integer call() {
        List<PublishedCheck> checks = folder == null ? parent.tool().checks().shipped() : parent.tool().checks().run(files());
        PrintStream out = Terminal.out();
        int failed = 0;
        for (PublishedCheck check : checks) {
            failed += check.passed() ? 0 : 1;
            print(check, out);
        }
        out.println((checks.size() - failed) + " passed, " + failed + " failed");
        Terminal.finish(out);
        return failed == 0 && !checks.isEmpty() ? 0 : 1;
    }

    private Map<String, byte[]> files() {
        if (!Files.isDirectory(folder)) {
            throw new Refused(folder + ": " + (Files.exists(folder) ? "is not a folder" : "there is no such folder"));
        }
        try {
            Map<String, byte[]> files = TableFiles.below(folder);
            if (files.keySet().stream().noneMatch(n -> n.endsWith(".json"))) {
                throw new Refused(folder + ": there is no published check (.json) in this folder");
            }
            return files;
        } catch (IOException e) {
            throw new Refused(folder + ": the folder cannot be read");
        }
    }

    private static void print(PublishedCheck check, PrintStream out) {
        PublishedCheck.Source source = check.source();
        out.println((check.passed() ? "pass  " : "FAIL  ") + check.file() + ": " + check.title() + (check.trap() ? " (a mistake in print: must differ)" : ""));
        out.println("      " + source.publication() + ", " + source.edition() + ", " + source.place() + "; " + source.status().word());
        for (PublishedCheck.Line line : check.lines()) {
            out.println("      " + (line.passed() ? "pass" : "FAIL") + "  " + (line.item().isEmpty() ? "" : line.item() + " ") + line.step() + ": printed "
                + line.printed() + ", computed " + line.computed() + ", difference " + line.difference() + ", within " + line.within());
        }
    }
}
