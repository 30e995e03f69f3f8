package broadside.report;

import java.io.IOException;
import java.util.BitSet;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.font.PDType0Font;

/** The two fonts in one document: notes which characters occur, and embeds these alone. */
final class Typeset {

    private final Lettering lettering;
    private final BitSet regular = new BitSet();
    private final BitSet bold = new BitSet();

    Typeset(Lettering lettering) {
        this.lettering = lettering;
    }

    Lettering lettering() {
        return lettering;
    }

    Words words() {
        return new Words(lettering);
    }

    /** Returns the glyph for a character that is about to be set. */
    int glyph(char c, boolean isBold) {
        (isBold ? bold : regular).set(c);
        return lettering.face(isBold).glyph(c);
    }

    /** Embeds the fonts with the characters that were set, under the names that {@link Content} uses. */
    void embed(PDDocument document, PDResources resources) throws IOException {
        embed(document, resources, "F1", lettering.face(false), regular);
        embed(document, resources, "F2", lettering.face(true), bold);
    }

    private static void embed(PDDocument document, PDResources resources, String name, Face face, BitSet used)
        throws IOException {
        if (used.isEmpty()) {
            return;
        }
        TrueTypeFont file = face.borrow();
        try {
            PDType0Font font = PDType0Font.load(document, file, true);
            used.stream().forEach(font::addToSubset);
            font.subset();
            resources.put(COSName.getPDFName(name), font);
        } finally {
            face.giveBack(file);
        }
    }
}
