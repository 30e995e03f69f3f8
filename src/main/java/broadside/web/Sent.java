package broadside.web;

import io.javalin.http.Context;
import io.javalin.http.UploadedFile;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URLDecoder;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;

/** Reads what was sent with a request, within limits of size and number. */
final class Sent {

    /** Largest body, in bytes. */
    static final int LARGEST = 1 << 20;

    private static final int MOST_KEYS = 4000;
    private static final int LONGEST_KEY = 200;
    /** A refused body is read and thrown away up to this size, so that the sender sees why. */
    private static final int MOST_DRAINED = 32 << 20;

    /** The fields of a sent form in their order. A field that stands twice is refused. */
    static Map<String, String> form(Context ctx) {
        String type = ctx.contentType() == null ? "" : ctx.contentType().toLowerCase(Locale.ROOT);
        if (!type.startsWith("application/x-www-form-urlencoded")) {
            throw new Refused(415, "This is not a form", "This address takes a form as a browser sends it.");
        }
        Map<String, String> fields = new LinkedHashMap<>();
        for (String pair : new String(body(ctx), StandardCharsets.UTF_8).split("&")) {
            if (!pair.isEmpty()) {
                add(fields, pair);
            }
        }
        return fields;
    }

    private static void add(Map<String, String> fields, String pair) {
        int equals = pair.indexOf('=');
        String key = decoded(equals < 0 ? pair : pair.substring(0, equals));
        String value = equals < 0 ? "" : decoded(pair.substring(equals + 1));
        if (key.length() > LONGEST_KEY || fields.size() >= MOST_KEYS) {
            throw new Refused(400, "The form is too long", "The form has more fields, or longer names of fields, than any form of this tool.");
        }
        if (fields.putIfAbsent(key, value) != null) {
            throw new Refused(400, "The form cannot be read", "A field of the form was sent twice.");
        }
    }

    private static String decoded(String text) {
        try {
            return URLDecoder.decode(text, StandardCharsets.UTF_8);
        } catch (IllegalArgumentException e) {
            throw new Refused(400, "The form cannot be read", "A field of the form is not encoded as browsers do.");
        }
    }

    private static byte[] body(Context ctx) {
        try {
            byte[] body = ctx.req().getInputStream().readNBytes(LARGEST + 1);
            if (body.length > LARGEST) {
                drain(ctx);
                throw Refused.tooLarge();
            }
            return body;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The one file of an upload. */
    static byte[] file(Context ctx, String name) {
        UploadedFile file = ctx.uploadedFile(name);
        if (file == null || file.size() == 0) {
            throw new Refused(400, "No file was sent", "Choose a job file or a PDF of this tool, then press the button beside it.");
        }
        try (InputStream in = file.content()) {
            byte[] bytes = in.readNBytes(LARGEST + 1);
            if (bytes.length > LARGEST) {
                throw Refused.tooLarge();
            }
            return bytes;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Reads the rest of a refused body and throws it away, as browsers show no answer while they are still sending. */
    static void drain(Context ctx) {
        try {
            InputStream in = ctx.req().getInputStream();
            byte[] buffer = new byte[16_384];
            long left = MOST_DRAINED;
            int read;
            while (left > 0 && (read = in.read(buffer)) >= 0) {
                left -= read;
            }
        } catch (IOException e) {
            ctx.res().setHeader("Connection", "close");
        }
    }

    private Sent() { }
}
