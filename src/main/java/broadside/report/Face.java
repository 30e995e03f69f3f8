package broadside.report;

import java.io.IOException;
import java.io.InputStream;
import java.util.Optional;
import java.util.concurrent.ArrayBlockingQueue;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/**
 * One font file: the widths and glyph numbers of its characters, read once, and a few parsed copies for embedding.
 * A parsed font moves a read mark while it is used, so each document borrows a copy of its own.
 */
final class Face {

    private static final int KEPT = 4;
    private static final int CHARACTERS = 0x10000;

    private final byte[] file;
    private final short[] glyphs = new short[CHARACTERS];
    private final short[] advances = new short[CHARACTERS];
    private final ArrayBlockingQueue<TrueTypeFont> idle = new ArrayBlockingQueue<>(KEPT);

    /** Reads a font from the class path. */
    Face(String resource) {
        try (InputStream in = Face.class.getResourceAsStream(resource)) {
            file = Optional.ofNullable(in)
                .orElseThrow(() -> new ReportException("the font " + resource + " is missing")).readAllBytes();
            TrueTypeFont font = parse();
            measure(font);
            idle.offer(font);
        } catch (IOException e) {
            throw new ReportException("the font " + resource + " cannot be read", e);
        }
    }

    private TrueTypeFont parse() throws IOException {
        TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(file));
        // Substitution costs many times the rest of the document and its ligatures spoil the search for words.
        font.setEnableGsub(false);
        return font;
    }

    private void measure(TrueTypeFont font) throws IOException {
        CmapLookup characters = font.getUnicodeCmapLookup();
        double perThousand = 1000.0 / font.getUnitsPerEm();
        for (int c = ' '; c < CHARACTERS; c++) {
            int glyph = isPrivate(c) ? 0 : characters.getGlyphId(c);
            if (glyph != 0) {
                glyphs[c] = (short) glyph;
                advances[c] = (short) Math.round(font.getAdvanceWidth(glyph) * perThousand);
            }
        }
    }

    /** Private characters and surrogates have no meaning that a reader of the text could recover. */
    private static boolean isPrivate(int c) {
        return c >= 0xD800 && c <= 0xF8FF || c >= 0xFFF0;
    }

    /** Returns the number of the character's glyph in the font file, or 0 when the font lacks it. */
    int glyph(char c) {
        return glyphs[c];
    }

    /** Returns the width of the character in thousandths of the size of the type. */
    int advance(char c) {
        return advances[c];
    }

    /** Returns a parsed copy for one document; hand it back with {@link #giveBack}. */
    TrueTypeFont borrow() throws IOException {
        TrueTypeFont font = idle.poll();
        return font != null ? font : parse();
    }

    void giveBack(TrueTypeFont font) {
        idle.offer(font);
    }
}
