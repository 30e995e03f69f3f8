package broadside.report;

import broadside.sheet.Drawing;
import java.util.Locale;

/** The few colours of the document. Nothing depends on them: every meaning also stands in words or in line weight. */
enum Colour {
    INK(0x14181c),
    ACCENT(0x0b5563),
    AMBER(0x9a5b00),
    GREY(0x4d5660),
    HAIR(0xb9c0c6),
    PAPER(0xffffff);

    private final String hex;
    private final String components;

    Colour(int rgb) {
        hex = String.format(Locale.ROOT, "#%06x", rgb);
        components = String.format(Locale.ROOT, "%.3f %.3f %.3f", (rgb >> 16 & 255) / 255.0, (rgb >> 8 & 255) / 255.0,
            (rgb & 255) / 255.0);
    }

    static Colour of(Drawing.Ink ink) {
        return switch (ink) {
            case BLACK -> INK;
            case ACCENT -> ACCENT;
            case AMBER -> AMBER;
            case GREY -> GREY;
        };
    }

    /** Returns the colour for SVG, such as {@code #14181c}. */
    String hex() {
        return hex;
    }

    /** Returns red, green and blue from 0 to 1 for PDF. */
    String components() {
        return components;
    }
}
