package broadside.report;

import broadside.sheet.Sheet;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.time.format.DateTimeParseException;
import java.util.Locale;
import java.util.Optional;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSStream;
import org.apache.pdfbox.cos.COSString;
import org.apache.pdfbox.pdmodel.PDDocument;

/** What the PDF says about itself: title, maker, date and the standards it keeps. */
final class Metadata {

    private static final String TEMPLATE = "/report/metadata.xml";
    private static final int LONGEST = 1_000;
    private static final DateTimeFormatter DIGITS = DateTimeFormatter.ofPattern("uuuuMMdd", Locale.ROOT);
    /** A sheet whose date cannot be read is dated here, so that every PDF has a date and none depends on the clock. */
    private static final LocalDate UNDATED = LocalDate.of(2000, 1, 1);

    private final String title;
    private final String maker;
    private final LocalDate date;

    Metadata(Sheet sheet) {
        title = shortened(sheet.title().isBlank() ? "Untitled" : sheet.title());
        maker = shortened(sheet.made().isBlank() ? "Broadside" : sheet.made());
        date = date(sheet.date()).orElse(UNDATED);
    }

    private static String shortened(String text) {
        return Texts.pdf(text.strip().replaceAll("\\s+", " "), LONGEST).getString();
    }

    private static Optional<LocalDate> date(String text) {
        try {
            LocalDate date = LocalDate.parse(text);
            return date.getYear() >= 1900 && date.getYear() <= 9999 ? Optional.of(date) : Optional.empty();
        } catch (DateTimeParseException e) {
            return Optional.empty();
        }
    }

    /** Returns the date of the document at 00:00 UTC in the form of PDF. */
    COSString pdfDate() {
        return new COSString("D:" + DIGITS.format(date) + "000000Z");
    }

    void write(PDDocument document, String template) throws IOException {
        COSDictionary information = document.getDocumentInformation().getCOSObject();
        information.setItem(COSName.TITLE, new COSString(title));
        information.setItem(COSName.PRODUCER, new COSString(maker));
        information.setItem(COSName.CREATION_DATE, pdfDate());
        information.setItem(COSName.MOD_DATE, pdfDate());
        COSStream stream = document.getDocument().createCOSStream();
        stream.setItem(COSName.TYPE, COSName.METADATA);
        stream.setItem(COSName.SUBTYPE, COSName.getPDFName("XML"));
        try (OutputStream out = stream.createOutputStream()) {
            out.write(packet(template).getBytes(StandardCharsets.UTF_8));
        }
        document.getDocumentCatalog().getCOSObject().setItem(COSName.METADATA, stream);
    }

    private String packet(String template) {
        // The date goes in first: a title may hold any text, a place mark too.
        return template.replace("@date@", date + "T00:00:00Z").replace("@maker@", xml(maker).replace("@", "&#64;"))
            .replace("@title@", xml(title));
    }

    private static String xml(String text) {
        StringBuilder out = new StringBuilder();
        Texts.xml(out, text);
        return out.toString();
    }

    /** Returns the description as XML with places for title, maker and date. */
    static String template() {
        try (InputStream in = Metadata.class.getResourceAsStream(TEMPLATE)) {
            return new String(Optional.ofNullable(in).orElseThrow(() -> new ReportException(TEMPLATE + " is missing"))
                .readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new ReportException(TEMPLATE + " cannot be read", e);
        }
    }
}
