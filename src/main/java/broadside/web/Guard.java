package broadside.web;

import io.javalin.http.Context;
import java.net.URI;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/** What holds for every request: headers of every answer, allowed methods, no sending from foreign pages, largest body. */
final class Guard {

    /** Headers of every answer, errors and files included. */
    static final Map<String, String> HEADERS = Map.of(
        "Content-Security-Policy", "default-src 'self'; object-src 'none'; base-uri 'none'; frame-ancestors 'none'; form-action 'self'",
        "X-Content-Type-Options", "nosniff",
        "Referrer-Policy", "same-origin",
        "Cross-Origin-Opener-Policy", "same-origin",
        "Cross-Origin-Resource-Policy", "same-origin",
        "Permissions-Policy", "camera=(), geolocation=(), microphone=()");

    private static final Set<String> METHODS = Set.of("GET", "HEAD", "POST");

    static void check(Context ctx) {
        HEADERS.forEach(ctx::header);
        ctx.header("Cache-Control", "no-store");
        String method = ctx.req().getMethod();
        if (!METHODS.contains(method)) {
            ctx.header("Allow", "GET, HEAD, POST");
            throw new Refused(405, "This is not done here", "Pages are asked for with GET and forms are sent with POST.");
        }
        if (method.equals("POST")) {
            checkOrigin(ctx);
        }
        if (ctx.req().getContentLengthLong() > Sent.LARGEST) {
            Sent.drain(ctx);
            throw Refused.tooLarge();
        }
    }

    /** A browser says whether its page came from here; one that says nothing at all is a program and has no one to trick. */
    private static void checkOrigin(Context ctx) {
        String site = ctx.header("Sec-Fetch-Site");
        String origin = ctx.header("Origin");
        boolean own = site != null ? site.equals("same-origin") || site.equals("none") : origin == null || sameHost(origin, ctx.header("Host"));
        if (!own) {
            throw new Refused(403, "Sent from another place", "Forms are taken from the pages of this tool only. Begin at the start page.");
        }
    }

    private static boolean sameHost(String origin, String host) {
        try {
            String authority = URI.create(origin).getAuthority();
            return authority != null && host != null && authority.toLowerCase(Locale.ROOT).equals(host.toLowerCase(Locale.ROOT));
        } catch (IllegalArgumentException e) {
            return false;
        }
    }

    private Guard() { }
}
