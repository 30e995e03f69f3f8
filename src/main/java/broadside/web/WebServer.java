package broadside.web;

import broadside.assess.Assessor;
import broadside.crew.Crew;
import broadside.job.JobReader;
import broadside.job.PublishedChecks;
import broadside.table.TableFiles;
import broadside.table.TableLibrary;
import io.javalin.Javalin;
import io.javalin.config.JavalinConfig;
import io.javalin.config.SizeUnit;
import io.javalin.http.Context;
import java.util.Map;
import org.eclipse.jetty.http.HttpFields;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.server.Connector;
import org.eclipse.jetty.server.HttpConfiguration;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.server.handler.ErrorHandler;
import org.eclipse.jetty.util.Callback;

/**
 * The pages of the tool. Jobs travel in links and forms: the server keeps none, writes no file and asks no other machine.
 */
public final class WebServer {

    /** A job travels in the address, so head lines are longer than usual, in bytes. */
    private static final int HEAD = 64 << 10;
    /** A sender slower than this is cut off, bytes per second. */
    private static final int SLOWEST = 200;
    private static final long IDLE_MS = 20_000;
    private static final Map<String, String> TYPES = Map.of("css", "text/css", "js", "text/javascript", "svg", "image/svg+xml");

    private final Javalin javalin;

    public WebServer(Assessor assessor, JobReader reader, PublishedChecks checks, TableLibrary tables, Documents documents) {
        Pages pages = new Pages(assessor.about());
        FormDesk forms = new FormDesk(pages, assessor, reader, documents, FormTables.of(tables, assessor));
        CompareDesk compare = new CompareDesk(pages, assessor, reader, documents);
        AnswerDesk answers = new AnswerDesk(pages, assessor, reader, documents, forms, compare);
        CardDesk cards = new CardDesk(pages, assessor, reader, documents, new Crew(tables).levels());
        StartDesk start = new StartDesk(pages, assessor.codes(), reader, documents, forms);
        Shelf shelf = new Shelf(pages, tables, checks);
        this.javalin = Javalin.create(cfg -> {
            settings(cfg);
            new Failures(pages).add(cfg);
            cfg.routes.before(Guard::check);
            cfg.routes.get("/", start::show);
            cfg.routes.post("/open", start::open);
            cfg.routes.get("/fill", forms::open);
            cfg.routes.post("/fill", forms::send);
            cfg.routes.post("/drawing", forms::redraw);
            cfg.routes.get("/answer", answers::show);
            cfg.routes.get("/summary.pdf", answers::pdf);
            cfg.routes.get("/job.json", answers::job);
            cfg.routes.get("/card", cards::show);
            cfg.routes.get("/drawing.svg", answers::drawing);
            cfg.routes.get("/side-by-side", compare::show);
            cfg.routes.post("/side-by-side", compare::type);
            cfg.routes.get("/side-by-side.svg", compare::picture);
            cfg.routes.get("/side-by-side.pdf", answers::comparison);
            cfg.routes.get("/tables", shelf::tables);
            cfg.routes.get("/tables/{code}/{edition}", shelf::edition);
            cfg.routes.get("/checks", shelf::checks);
            cfg.routes.get("/checks/{publication}", shelf::publication);
            cfg.routes.get("/about", ctx -> pages.show(ctx, 200, "about", "About this tool", assessor.about()));
            cfg.routes.get("/health", ctx -> ctx.contentType("text/plain; charset=utf-8").result("ok " + assessor.about().version() + "\n"));
            cfg.routes.get("/schema.json", ctx -> ctx.contentType("application/schema+json; charset=utf-8").result(documents.schema()));
            TableFiles.shipped("public").forEach((name, bytes) -> cfg.routes.get("/" + name, ctx -> file(ctx, name, bytes)));
        });
    }

    /** Starts to listen; port 0 takes any free one. The usual host is 127.0.0.1, which other machines cannot reach. */
    public WebServer start(String host, int port) {
        javalin.start(host, port);
        for (Connector connector : javalin.jettyServer().server().getConnectors()) {
            if (connector instanceof org.eclipse.jetty.server.AbstractConnector each) {
                each.setIdleTimeout(IDLE_MS);
            }
        }
        return this;
    }

    public int port() {
        return javalin.port();
    }

    public void stop() {
        javalin.stop();
    }

    private static void file(Context ctx, String name, byte[] bytes) {
        String type = TYPES.getOrDefault(name.substring(name.lastIndexOf('.') + 1), "application/octet-stream");
        ctx.header("Cache-Control", "public, max-age=300").contentType(type + "; charset=utf-8").result(bytes);
    }

    private static void settings(JavalinConfig cfg) {
        cfg.startup.showJavalinBanner = false;
        cfg.startup.showOldJavalinVersionWarning = false;
        cfg.startup.startupWatcherEnabled = false;
        cfg.http.prefer405over404 = true;
        cfg.http.maxRequestSize = Sent.LARGEST;
        cfg.jetty.multipartConfig.maxFileSize(1, SizeUnit.MB);
        cfg.jetty.multipartConfig.maxInMemoryFileSize(2, SizeUnit.MB);
        cfg.jetty.multipartConfig.maxTotalRequestSize(1, SizeUnit.MB);
        cfg.jetty.modifyHttpConfiguration(WebServer::heads);
        cfg.jetty.modifyServer(server -> server.setErrorHandler(new BareErrors()));
    }

    private static void heads(HttpConfiguration http) {
        http.setRequestHeaderSize(HEAD);
        http.setResponseHeaderSize(HEAD);
        http.setSendServerVersion(false);
        http.setSendXPoweredBy(false);
        http.setMinRequestDataRate(SLOWEST);
        http.setIdleTimeout(IDLE_MS);
    }

    /** Answers to requests that never reach a page, such as a broken head line: one plain sentence with the usual headers. */
    private static final class BareErrors extends ErrorHandler {

        @Override
        public boolean handle(Request request, Response response, Callback callback) {
            HttpFields.Mutable headers = response.getHeaders();
            Guard.HEADERS.forEach(headers::put);
            headers.put(HttpHeader.CACHE_CONTROL, "no-store");
            headers.put(HttpHeader.CONTENT_TYPE, "text/plain; charset=utf-8");
            response.write(true, java.nio.ByteBuffer.wrap("The request cannot be read.\n".getBytes(java.nio.charset.StandardCharsets.UTF_8)), callback);
            return true;
        }
    }
}
