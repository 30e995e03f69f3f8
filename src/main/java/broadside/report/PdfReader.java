package broadside.report;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.InflaterInputStream;

/**
 * Finds the job file in a PDF that {@link PdfWriter} wrote, also after other software has added notes to it. Looks for
 * the embedded file alone and unpacks nothing else, so a hostile PDF costs no more memory than its own size.
 */
public final class PdfReader {

    /** The largest PDF that is looked into. */
    public static final int MOST_BYTES = 20_000_000;

    private static final int TAIL = 2_048;
    private static final int LONGEST_DICTIONARY = 2_048;
    private static final Pattern FILE = Pattern.compile("/Type\\s*/EmbeddedFile(?![A-Za-z])");
    private static final Pattern PACKED =
        Pattern.compile("/Filter\\s*(/FlateDecode|\\[\\s*/FlateDecode\\s*\\])\\s*(/|>>)");
    private static final Pattern SIZE = Pattern.compile("/Size\\s+(\\d{1,9})\\b");
    private static final Pattern SUM = Pattern.compile("/CheckSum\\s*<([0-9A-Fa-f]{32})>");
    private static final Pattern LOCK = Pattern.compile("/Encrypt\\s");
    private static final Pattern LENGTH = Pattern.compile("/Length\\s+(\\d{1,9})(?!\\s+\\d+\\s+R)\\b");

    private final byte[] pdf;
    private final String text;

    private PdfReader(byte[] pdf) {
        this.pdf = pdf;
        text = new String(pdf, StandardCharsets.ISO_8859_1);
    }

    /**
     * Returns the job file of a PDF, or nothing when the PDF holds none. Of several the first one counts.
     *
     * @throws ReportException when the file is no PDF, is damaged, locked or too large; the message is one plain line
     */
    public static Optional<byte[]> job(byte[] pdf) {
        if (pdf.length > MOST_BYTES) {
            throw new ReportException("the PDF has " + pdf.length / 1_000_000 + " MB; at most "
                + MOST_BYTES / 1_000_000 + " MB are read");
        }
        PdfReader reader = new PdfReader(pdf);
        reader.check();
        return reader.find();
    }

    private void check() {
        int head = text.indexOf("%PDF-");
        if (head < 0 || head > 1_024) {
            throw new ReportException("this is not a PDF file: it does not begin with %PDF");
        }
        String tail = text.substring(Math.max(0, text.length() - TAIL));
        if (!tail.contains("startxref") || !tail.contains("%%EOF")) {
            throw new ReportException("the PDF is damaged: its end is missing");
        }
    }

    private Optional<byte[]> find() {
        Matcher matcher = FILE.matcher(text);
        while (matcher.find()) {
            int start = text.lastIndexOf(" obj", matcher.start());
            int data = text.indexOf("stream", matcher.end());
            if (start >= 0 && data >= 0 && data - start <= LONGEST_DICTIONARY) {
                String dictionary = text.substring(start, data);
                if (dictionary.contains("/application#2Fjson") || dictionary.contains("/application#2fjson")) {
                    return Optional.of(unpack(dictionary, data + "stream".length()));
                }
            }
        }
        return Optional.empty();
    }

    private byte[] unpack(String dictionary, int afterKeyword) {
        if (LOCK.matcher(text).find()) {
            throw new ReportException("the PDF is locked; save it without a password and try again");
        }
        int from = afterKeyword;
        if (from < pdf.length && pdf[from] == '\r') {
            from++;
        }
        if (from < pdf.length && pdf[from] == '\n') {
            from++;
        }
        if (!dictionary.contains("/Filter")) {
            return checked(plain(dictionary, from), dictionary);
        }
        if (!PACKED.matcher(dictionary).find() || dictionary.contains("/DecodeParms")) {
            throw new ReportException("the job file in the PDF is packed in a way that is not read here");
        }
        return checked(bounded(new InflaterInputStream(new ByteArrayInputStream(pdf, from, pdf.length - from))),
            dictionary);
    }

    /** Size and check sum are there in a PDF that was written here; other software may leave them out. */
    private static byte[] checked(byte[] job, String dictionary) {
        Matcher size = SIZE.matcher(dictionary);
        Matcher sum = SUM.matcher(dictionary);
        if (size.find() && Integer.parseInt(size.group(1)) != job.length
            || sum.find() && !Envelope.sum(job).equals(sum.group(1).toUpperCase(Locale.ROOT))) {
            throw new ReportException("the PDF is damaged: the job file in it has changed");
        }
        return job;
    }

    private byte[] plain(String dictionary, int from) {
        Matcher length = LENGTH.matcher(dictionary);
        if (!length.find() || Integer.parseInt(length.group(1)) > pdf.length - from) {
            throw new ReportException("the PDF is damaged: the job file in it is cut off");
        }
        return bounded(new ByteArrayInputStream(pdf, from, Integer.parseInt(length.group(1))));
    }

    private static byte[] bounded(InputStream source) {
        try (source) {
            byte[] bytes = source.readNBytes(Attachment.MOST_BYTES + 1);
            if (bytes.length > Attachment.MOST_BYTES) {
                throw new ReportException("the job file in the PDF has more than " + Attachment.MOST_BYTES
                    + " bytes, which is more than a job can have");
            }
            return bytes;
        } catch (IOException e) {
            throw new ReportException("the PDF is damaged: the job file in it cannot be unpacked", e);
        }
    }
}
