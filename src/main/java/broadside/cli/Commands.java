package broadside.cli;

import broadside.table.TableFormat;
import broadside.table.TableLibrary;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.function.Supplier;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine;

/** The commands of the tool. Errors go to standard error, one line each; no stack trace. */
@Command(name = "broadside", mixinStandardHelpOptions = true, versionProvider = VersionText.class,
    description = "What the wind does to a flat thing that faces it: preliminary load summaries.")
public final class Commands implements Runnable {

    @Option(names = "--code-tables", scope = CommandLine.ScopeType.INHERIT, paramLabel = "DIR",
        description = "a folder with more editions and overlays, such as a firm's own values")
    private Path ownTables;

    private static final Map<String, Supplier<Object>> COMMANDS = new LinkedHashMap<>();

    static {
        COMMANDS.put("serve", ServeCommand::new);
        COMMANDS.put("check", CheckCommand::new);
        COMMANDS.put("summary", SummaryCommand::new);
        COMMANDS.put("verify", VerifyCommand::new);
        COMMANDS.put("tables", TablesCommand::new);
    }

    /** Most lines of problems that are printed. */
    private static final int MOST_LINES = 50;

    private final CompletableFuture<TableLibrary> shipped;

    private Commands(CompletableFuture<TableLibrary> shipped) {
        this.shipped = shipped;
    }

    /** Runs a command line; returns the exit status. */
    public static int run(String... args) {
        return run(new PrintWriter(System.err, true), args);
    }

    static int run(PrintWriter errors, String... args) {
        CommandLine line = new CommandLine(new Commands(Tool.begin()));
        // Each command costs time to describe, so only the one named is; without a name, all are, for the help.
        List<String> named = COMMANDS.keySet().stream().filter(List.of(args)::contains).toList();
        COMMANDS.forEach((name, command) -> {
            if (named.isEmpty() || named.contains(name)) {
                line.addSubcommand(name, command.get());
            }
        });
        line.setErr(errors);
        line.setParameterExceptionHandler((e, given) -> {
            errors.println(Terminal.plain(e.getMessage().lines().findFirst().orElse("this command line does not fit"))
                + (e instanceof CommandLine.UnmatchedArgumentException ? "; the commands are serve, check, summary, verify and tables" : ""));
            return 2;
        });
        line.setExecutionExceptionHandler((e, command, parsed) -> failed(e, errors));
        return line.execute(args);
    }

    private static int failed(Exception e, PrintWriter errors) {
        if (e instanceof Refused refused) {
            refused.lines().stream().limit(MOST_LINES).forEach(line -> errors.println(Terminal.plain(line)));
            if (refused.lines().size() > MOST_LINES) {
                errors.println("and " + (refused.lines().size() - MOST_LINES) + " more");
            }
        } else if (e instanceof TableFormat) {
            errors.println(Terminal.plain(e.getMessage()));
        } else {
            errors.println("the tool failed: " + e.getClass().getSimpleName() + (e.getMessage() == null ? "" : ", " + e.getMessage().lines().findFirst().orElse("")));
        }
        return 2;
    }

    Tool tool() {
        return Tool.of(Optional.ofNullable(ownTables), shipped);
    }

    /** Without a command the tool serves. */
    @Override
    public void run() {
        ServeCommand.serve(tool(), ServeCommand.HOST, ServeCommand.PORT);
    }
}
