package broadside.report;

import broadside.sheet.Sheet;
import java.awt.color.ColorSpace;
import java.awt.color.ICC_Profile;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.List;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.filter.Filter;
import org.apache.pdfbox.pdmodel.PDDocument;

/**
 * Writes a sheet as a tagged PDF that keeps PDF/A-3A and PDF/UA-1, with the job file inside. The same sheet gives the
 * same bytes. One writer serves all threads; making it reads the fonts.
 */
public final class PdfWriter {

    static {
        // The library packs fonts and objects itself, at the level that this names.
        if (System.getProperty(Filter.SYSPROP_DEFLATELEVEL) == null) {
            System.setProperty(Filter.SYSPROP_DEFLATELEVEL, Integer.toString(Envelope.LEVEL));
        }
    }

    private final Lettering lettering = new Lettering();
    private final byte[] profile = Envelope.pack(ICC_Profile.getInstance(ColorSpace.CS_sRGB).getData());
    private final String description = Metadata.template();

    /** Writes the document and leaves {@code out} open. Nothing is written before the document is complete. */
    public void write(Sheet sheet, Paper paper, Attachment job, OutputStream out) throws IOException {
        Typeset typeset = new Typeset(lettering);
        Flow flow = new Flow(paper, typeset);
        COSDictionary root = new COSDictionary();
        List<HeadingPart> headings = new Composer(sheet, flow, Tag.top(root)).compose();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream(65_536);
        try (PDDocument document = new PDDocument()) {
            document.setVersion(1.7f);
            MessageDigest digest = digest();
            for (Flow.Leaf leaf : flow.leaves()) {
                byte[] packed = Envelope.pack(leaf.content().bytes());
                digest.update(packed);
                leaf.page().getCOSObject().setItem(COSName.CONTENTS, Envelope.stream(document, packed));
                document.addPage(leaf.page());
            }
            document.setDocumentId(ByteBuffer.wrap(digest.digest(job.bytes())).getLong());
            typeset.embed(document, flow.resources());
            surround(document, sheet, job, new Metadata(sheet), root, headings, flow);
            document.save(bytes);
        }
        bytes.writeTo(out);
    }

    private void surround(PDDocument document, Sheet sheet, Attachment job, Metadata metadata, COSDictionary root,
                          List<HeadingPart> headings, Flow flow) throws IOException {
        Envelope envelope = new Envelope(document);
        envelope.describe();
        envelope.parents(root, flow.leaves());
        envelope.bookmarks(headings, flow);
        envelope.colours(profile);
        envelope.attach(job, metadata.pdfDate());
        metadata.write(document, description);
    }

    /** What identifies the document is made from its pages and its job, so that the same ones give the same bytes. */
    private static MessageDigest digest() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new ReportException("this Java has no SHA-256, which every Java must have", e);
        }
    }
}
