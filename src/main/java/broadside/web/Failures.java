package broadside.web;

import broadside.assess.BadJob;
import broadside.assess.Problem;
import io.javalin.config.JavalinConfig;
import io.javalin.http.Context;
import io.javalin.http.HttpResponseException;
import java.util.HexFormat;
import java.util.List;
import java.util.concurrent.ThreadLocalRandom;
import java.util.concurrent.TimeoutException;
import org.eclipse.jetty.http.HttpException;
import org.eclipse.jetty.io.EofException;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Turns whatever goes wrong into a plain page. Inner detail goes to the log under a reference number, never to the visitor. */
final class Failures {

    private static final Logger LOG = LoggerFactory.getLogger(Failures.class);

    private final Pages pages;

    Failures(Pages pages) {
        this.pages = pages;
    }

    /** A page with a title, sentences and a list. */
    public record Message(String title, String text, List<String> lines, String reference) { }

    void add(JavalinConfig cfg) {
        cfg.routes.exception(Refused.class, (e, ctx) -> show(ctx, e.status(), new Message(e.title(), e.getMessage(), List.of(), "")));
        cfg.routes.exception(BadJob.class, (e, ctx) -> badJob(ctx, e.problems()));
        cfg.routes.exception(HttpResponseException.class, this::known);
        cfg.routes.exception(Exception.class, (e, ctx) -> unknown(ctx, e));
        cfg.router.javaLangErrorHandler((response, error) -> {
            LOG.error("An error of the machine", error);
            response.setStatus(500);
        });
    }

    void badJob(Context ctx, List<Problem> problems) {
        show(ctx, 400, new Message("This is not a job that can be assessed", "What does not fit is listed here; nothing was kept or changed.",
            problems.stream().limit(50).map(Problem::line).toList(), ""));
    }

    private void known(HttpResponseException e, Context ctx) {
        Refused plain = switch (e.getStatus()) {
            case 404 -> Refused.notFound();
            case 405 -> new Refused(405, "This is not done here", "This address is asked for in another way; begin at the start page.");
            case 413 -> Refused.tooLarge();
            default -> new Refused(e.getStatus(), "That did not work", "The request does not fit this address.");
        };
        show(ctx, plain.status(), new Message(plain.title(), plain.getMessage(), List.of(), ""));
    }

    private void unknown(Context ctx, Exception e) {
        if (tooLargeUpload(e)) {
            // What is left of the body is not read, so the connection cannot serve another request.
            ctx.header("Connection", "close");
            Refused plain = Refused.tooLarge();
            show(ctx, plain.status(), new Message(plain.title(), plain.getMessage(), List.of(), ""));
            return;
        }
        if (cause(e, EofException.class) || cause(e, TimeoutException.class) || cause(e, HttpException.class)) {
            LOG.debug("A sender broke off or was too slow");
            ctx.header("Connection", "close");
            show(ctx, 408, new Message("The form did not arrive", "The sending broke off or was too slow. Send it again.", List.of(), ""));
            return;
        }
        byte[] number = new byte[4];
        ThreadLocalRandom.current().nextBytes(number);
        String reference = HexFormat.of().formatHex(number);
        LOG.error("{} {} failed, reference {}", ctx.req().getMethod(), ctx.path().replaceAll("[^\\x20-\\x7e]", "?"), reference, e);
        show(ctx, 500, new Message("Something went wrong here", "The fault is on this side, and no result is shown. The log of this tool "
            + "holds the details under the reference below.", List.of(), reference));
    }

    private static boolean cause(Throwable e, Class<?> kind) {
        for (Throwable each = e; each != null; each = each.getCause()) {
            if (kind.isInstance(each)) {
                return true;
            }
        }
        return false;
    }

    private static boolean tooLargeUpload(Throwable e) {
        for (Throwable each = e; each != null; each = each.getCause()) {
            String text = String.valueOf(each.getMessage());
            if (text.contains("max file size") || text.contains("max length exceeded") || text.contains("Multipart Mime part")
                || text.contains("exceeds max")) {
                return true;
            }
        }
        return false;
    }

    private void show(Context ctx, int status, Message message) {
        ctx.header("Cache-Control", "no-store");
        pages.show(ctx, status, "message", message.title(), message);
    }
}
