package broadside;

import broadside.cli.Commands;

/** The tool: commands, or the web tool when none is given. */
public final class Main {

    public static void main(String[] args) {
        System.exit(Commands.run(args));
    }

    private Main() { }
}
