package broadside.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.ParentCommand;

@Command(name = "serve", mixinStandardHelpOptions = true, description = "Starts the web tool and prints its address.")
final class ServeCommand implements Callable<Integer> {

    @ParentCommand
    private Commands parent;

    @Override
    public Integer call() {
        serve(parent.tool());
        return 0;
    }

    void serve(Tool tool) { }
}
