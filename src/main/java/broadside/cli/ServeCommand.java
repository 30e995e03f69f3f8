package broadside.cli;

import broadside.web.ShippedDocuments;
import broadside.web.WebServer;
import java.time.Clock;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParentCommand;

/** Starts the web tool, prints its address and stays until it is stopped. */
@Command(name = "serve", mixinStandardHelpOptions = true, description = "Starts the web tool and prints its address; also done without a command.")
final class ServeCommand implements Callable<Integer> {

    static final String HOST = "127.0.0.1";
    static final int PORT = 7070;

    @ParentCommand
    private Commands parent;

    @Option(names = "--host", paramLabel = "ADDRESS", description = "address to listen on; 127.0.0.1 unless told otherwise", defaultValue = HOST)
    private String host;

    @Option(names = "--port", paramLabel = "PORT", description = "port to listen on; 7070 unless told otherwise, 0 for any free one", defaultValue = "" + PORT)
    private int port;

    @Override
    public Integer call() {
        serve(parent.tool(), host, port);
        return 0;
    }

    /** Serves until the process is told to stop. */
    static void serve(Tool tool, String host, int port) {
        if (port < 0 || port > 65_535) {
            throw new Refused("--port " + port + ": a port lies between 0 and 65535");
        }
        WebServer server = new WebServer(tool.assessor(), tool.reader(), tool.checks(), tool.tables(), new ShippedDocuments(Clock.systemDefaultZone()));
        try {
            server.start(host, port);
        } catch (RuntimeException e) {
            throw new Refused("http://" + host + ":" + port + " cannot be listened on: another program may use it; choose one with --port");
        }
        System.out.println("Broadside listens at http://" + host + ":" + server.port() + "/ (stop it with Ctrl+C)");
        CountDownLatch stopped = new CountDownLatch(1);
        Runtime.getRuntime().addShutdownHook(new Thread(() -> {
            server.stop();
            stopped.countDown();
        }));
        try {
            stopped.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            server.stop();
        }
    }
}
