package broadside.cli;

import broadside.table.Edition;
import broadside.table.TableFile;
import java.io.PrintStream;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.ParentCommand;

/** Lists every table with edition, source, status and digest. */
@Command(name = "tables", mixinStandardHelpOptions = true, description = "Lists every table with edition, source, status and digest.")
final class TablesCommand implements Callable<Integer> {

    @ParentCommand
    private Commands parent;

    @Override
    public Integer call() {
        Tool tool = parent.tool();
        PrintStream out = Terminal.out();
        for (Edition edition : tool.tables().editions()) {
            out.println(edition.key() + ": " + edition.property("title") + (edition.isOverlay() ? " (overlay of " + edition.basis().orElseThrow().key() + ")" : "")
                + "; " + edition.property("status"));
            for (TableFile table : edition.ownFiles()) {
                String status = table.statusText().equals("by row") ? "by row, weakest " + table.source().status().word() : table.statusText();
                out.println("  " + table.name() + ": " + table.title() + "; " + table.source().citation() + "; " + status + "; sha256:"
                    + table.digest().substring(0, 12));
            }
        }
        out.println(tool.tables().digest());
        Terminal.finish(out);
        return 0;
    }
}
