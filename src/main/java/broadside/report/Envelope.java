package broadside.report;

import java.io.IOException;
import java.io.OutputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import java.util.zip.Deflater;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSStream;
import org.apache.pdfbox.cos.COSString;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.destination.PDPageXYZDestination;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDDocumentOutline;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineItem;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineNode;

/** What a PDF holds around its pages: the tree of tags, bookmarks, the colour profile and the job file. */
final class Envelope {

    static final int LEVEL = 2;

    private final PDDocument document;
    private final COSDictionary catalog;

    Envelope(PDDocument document) {
        this.document = document;
        catalog = document.getDocumentCatalog().getCOSObject();
    }

    /** Language, title bar and the statement that the document is tagged. */
    void describe() {
        catalog.setItem(COSName.LANG, new COSString("en-GB"));
        COSDictionary marked = direct();
        marked.setBoolean(COSName.getPDFName("Marked"), true);
        catalog.setItem(COSName.getPDFName("MarkInfo"), marked);
        COSDictionary viewer = direct();
        viewer.setBoolean(COSName.getPDFName("DisplayDocTitle"), true);
        catalog.setItem(COSName.VIEWER_PREFERENCES, viewer);
    }

    private static COSDictionary direct() {
        COSDictionary dictionary = new COSDictionary();
        dictionary.setDirect(true);
        return dictionary;
    }

    /** The way from each marked stretch of a page back to its element. */
    void parents(COSDictionary root, List<Flow.Leaf> leaves) {
        COSArray numbers = new COSArray();
        for (int i = 0; i < leaves.size(); i++) {
            numbers.add(COSInteger.get(i));
            numbers.add(leaves.get(i).owners());
        }
        COSDictionary tree = new COSDictionary();
        tree.setItem(COSName.NUMS, numbers);
        root.setItem(COSName.PARENT_TREE, tree);
        root.setItem(COSName.PARENT_TREE_NEXT_KEY, COSInteger.get(leaves.size()));
        root.setItem(COSName.TYPE, COSName.STRUCT_TREE_ROOT);
        catalog.setItem(COSName.STRUCT_TREE_ROOT, root);
    }

    void bookmarks(List<HeadingPart> headings, Flow flow) {
        if (headings.isEmpty()) {
            return;
        }
        PDDocumentOutline outline = new PDDocumentOutline();
        PDOutlineNode[] nodes = {outline, outline, outline, outline};
        for (HeadingPart heading : headings) {
            PDPageXYZDestination place = new PDPageXYZDestination();
            place.setPage(flow.leaves().get(heading.page()).page());
            place.setTop((int) flow.y(heading.top()));
            PDOutlineItem item = new PDOutlineItem();
            item.getCOSObject().setItem(COSName.TITLE, Texts.pdf(heading.text(), 250));
            item.setDestination(place);
            nodes[heading.level() - 1].addLast(item);
            nodes[heading.level()] = item;
        }
        outline.openNode();
        document.getDocumentCatalog().setDocumentOutline(outline);
    }

    /** The colours are meant for this profile, sRGB. */
    void colours(byte[] packedProfile) throws IOException {
        COSStream stream = stream(document, packedProfile);
        stream.setInt(COSName.N, 3);
        COSDictionary intent = new COSDictionary();
        intent.setItem(COSName.TYPE, COSName.getPDFName("OutputIntent"));
        intent.setItem(COSName.S, COSName.getPDFName("GTS_PDFA1"));
        intent.setString(COSName.getPDFName("OutputConditionIdentifier"), "sRGB IEC61966-2.1");
        intent.setString(COSName.getPDFName("Info"), "sRGB IEC61966-2.1");
        intent.setItem(COSName.getPDFName("DestOutputProfile"), stream);
        COSArray intents = new COSArray();
        intents.add(intent);
        catalog.setItem(COSName.getPDFName("OutputIntents"), intents);
    }

    /** Embeds the job file as the source of the document. */
    void attach(Attachment job, COSString date) throws IOException {
        byte[] bytes = job.bytes();
        COSStream stream = stream(document, pack(bytes));
        stream.setItem(COSName.TYPE, COSName.EMBEDDED_FILE);
        stream.setItem(COSName.SUBTYPE, COSName.getPDFName("application/json"));
        COSDictionary properties = direct();
        properties.setInt(COSName.SIZE, bytes.length);
        properties.setItem(COSName.getPDFName("ModDate"), date);
        properties.setItem(COSName.getPDFName("CheckSum"), new COSString(HexFormat.of().parseHex(sum(bytes)), true));
        stream.setItem(COSName.getPDFName("Params"), properties);
        COSDictionary file = file(job, stream);
        COSArray names = new COSArray();
        names.add(Texts.pdf(job.fileName(), 200));
        names.add(file);
        COSDictionary tree = direct();
        tree.setItem(COSName.NAMES, names);
        COSDictionary all = direct();
        all.setItem(COSName.EMBEDDED_FILES, tree);
        catalog.setItem(COSName.NAMES, all);
        COSArray associated = new COSArray();
        associated.add(file);
        catalog.setItem(COSName.AF, associated);
    }

    /** Returns the MD5 sum in hexadecimal digits, as PDF asks for embedded files; it finds damage, no forgery. */
    static String sum(byte[] bytes) {
        try {
            return HexFormat.of().withUpperCase().formatHex(MessageDigest.getInstance("MD5").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new ReportException("this Java has no MD5, which every Java must have", e);
        }
    }

    private static COSDictionary file(Attachment job, COSStream stream) {
        COSDictionary versions = direct();
        versions.setItem(COSName.F, stream);
        versions.setItem(COSName.UF, stream);
        COSDictionary file = new COSDictionary();
        file.setItem(COSName.TYPE, COSName.FILESPEC);
        file.setItem(COSName.F, Texts.pdf(job.fileName(), 200));
        file.setItem(COSName.UF, Texts.pdf(job.fileName(), 200));
        file.setItem(COSName.DESC, Texts.pdf(job.description(), 500));
        file.setItem(COSName.EF, versions);
        file.setItem(COSName.getPDFName("AFRelationship"), COSName.getPDFName("Source"));
        return file;
    }

    /** Returns a stream of the document with packed content. */
    static COSStream stream(PDDocument document, byte[] packed) throws IOException {
        COSStream stream = document.getDocument().createCOSStream();
        stream.setItem(COSName.FILTER, COSName.FLATE_DECODE);
        try (OutputStream out = stream.createRawOutputStream()) {
            out.write(packed);
        }
        return stream;
    }

    /** Packs the content of a stream; the fast levels cost a third of the time and a few hundredths of the size. */
    static byte[] pack(byte[] content) {
        Deflater deflater = new Deflater(LEVEL);
        try {
            deflater.setInput(content);
            deflater.finish();
            byte[] packed = new byte[content.length / 2 + 64];
            int length = 0;
            while (!deflater.finished()) {
                if (length == packed.length) {
                    packed = Arrays.copyOf(packed, length * 2);
                }
                length += deflater.deflate(packed, length, packed.length - length);
            }
            return Arrays.copyOf(packed, length);
        } finally {
            deflater.end();
        }
    }
}
