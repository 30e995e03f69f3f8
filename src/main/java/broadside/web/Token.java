package broadside.web;

import broadside.assess.BadJob;
import broadside.job.JobText;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.zip.DataFormatException;
import java.util.zip.Deflater;
import java.util.zip.Inflater;
import tools.jackson.databind.JsonNode;

/** A job inside a link: its JSON, deflated, in the letters that an address may hold. The server keeps no jobs. */
final class Token {

    /** Longest token that fits into a link with everything around it, in characters. */
    static final int LONGEST = 40_000;

    /** Longest single text that is read back from a token. */
    private static final int LONGEST_TEXT = 20_000;

    /** Largest JSON inside a token, in bytes. */
    static final int LARGEST = 256 << 10;

    static String of(JsonNode job) {
        return of(job.toString().getBytes(StandardCharsets.UTF_8));
    }

    private static String of(byte[] json) {
        Deflater deflater = new Deflater(Deflater.BEST_COMPRESSION, true);
        try {
            deflater.setInput(json);
            deflater.finish();
            ByteArrayOutputStream out = new ByteArrayOutputStream(1024);
            byte[] buffer = new byte[4096];
            while (!deflater.finished()) {
                out.write(buffer, 0, deflater.deflate(buffer));
            }
            return Base64.getUrlEncoder().withoutPadding().encodeToString(out.toByteArray());
        } finally {
            deflater.end();
        }
    }

    /** Whether a job is short enough to travel in a link. */
    static boolean fits(JsonNode job) {
        byte[] json = job.toString().getBytes(StandardCharsets.UTF_8);
        return json.length <= LARGEST && job.properties().stream().allMatch(e -> !e.getValue().isString() || e.getValue().stringValue().length() <= LONGEST_TEXT)
            && of(json).length() <= LONGEST;
    }

    /** The job in a token; anything else is refused with a plain page. */
    static JsonNode read(String token) {
        if (token == null || token.isEmpty()) {
            throw Refused.badLink("The part of the link that holds the job is missing.");
        }
        try {
            return JobText.read(inflate(Base64.getUrlDecoder().decode(token)));
        } catch (IllegalArgumentException | DataFormatException | BadJob e) {
            throw Refused.badLink("The part of the link that holds the job is damaged or cut off.");
        }
    }

    private static byte[] inflate(byte[] packed) throws DataFormatException {
        Inflater inflater = new Inflater(true);
        try {
            inflater.setInput(packed);
            ByteArrayOutputStream out = new ByteArrayOutputStream(4096);
            byte[] buffer = new byte[4096];
            while (!inflater.finished()) {
                int read = inflater.inflate(buffer);
                if (read == 0 && (inflater.needsInput() || inflater.needsDictionary())) {
                    throw new DataFormatException("cut off");
                }
                if (out.size() + read > LARGEST) {
                    throw new DataFormatException("too large");
                }
                out.write(buffer, 0, read);
            }
            return out.toByteArray();
        } finally {
            inflater.end();
        }
    }

    private Token() { }
}
