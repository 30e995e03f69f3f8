package broadside.report;

import java.nio.charset.StandardCharsets;
import java.util.Optional;

/**
 * The operators of one page, in points with the origin at the lower left corner. Remembers font and colour, so that
 * each is written once.
 */
final class Content {

    /** Characters in one string; PDF/A allows 32767 bytes, and each character takes two. */
    private static final int LONGEST_STRING = 8_000;

    private final StringBuilder out = new StringBuilder(8192);
    private final Typeset typeset;
    private String font = "";
    private Optional<Colour> fill = Optional.empty();
    private Optional<Colour> stroke = Optional.empty();

    Content(Typeset typeset) {
        this.typeset = typeset;
    }

    byte[] bytes() {
        return out.toString().getBytes(StandardCharsets.ISO_8859_1);
    }

    /** Begins a stretch that belongs to the structure element of this kind. */
    void open(String kind, int mark) {
        out.append('/').append(kind).append(" <</MCID ").append(mark).append(">> BDC\n");
    }

    /** Begins a stretch that is no part of the text: a rule, or the header and footer of the page. */
    void openArtifact(String properties) {
        out.append("/Artifact ").append(properties).append(" BDC\n");
    }

    void close() {
        out.append("EMC\n");
    }

    /** Begins a part that draws inside a rectangle only. */
    void openClip(double x, double y, double width, double height) {
        out.append("q ");
        rectangle(x, y, width, height);
        out.append("W n\n");
    }

    void closeClip() {
        out.append("Q\n");
        forget();
    }

    /** Colours and fonts that were set inside a clip are gone after it. */
    private void forget() {
        font = "";
        fill = Optional.empty();
        stroke = Optional.empty();
    }

    void line(Words.Line line, double x, double base, Type type) {
        fill(type.colour());
        out.append("BT ");
        point(x, base);
        out.append("Td ");
        show(line, type.size());
        out.append("ET\n");
    }

    /** Sets a line whose base line is turned by an angle in degrees against the clock around its start. */
    void turned(Words.Line line, double x, double y, double size, double degrees, Colour colour) {
        fill(colour);
        double cos = Math.cos(Math.toRadians(degrees));
        double sin = Math.sin(Math.toRadians(degrees));
        out.append("BT ");
        ratio(cos);
        ratio(sin);
        ratio(-sin);
        ratio(cos);
        point(x, y);
        out.append("Tm ");
        show(line, size);
        out.append("ET\n");
    }

    private void show(Words.Line line, double size) {
        int i = line.from();
        while (i < line.to()) {
            byte mark = line.words().mark(i);
            int end = i;
            while (end < line.to() && line.words().mark(end) == mark) {
                end++;
            }
            run(line.words(), i, end, mark, size);
            i = end;
        }
    }

    private void run(Words words, int from, int to, byte mark, double size) {
        boolean bold = (mark & Words.BOLD) != 0;
        boolean lowered = (mark & Words.LOWERED) != 0;
        font(bold, lowered ? size * Lettering.LOWERED_SIZE : size);
        if (lowered) {
            number(-size * Lettering.LOWERED_BY);
            out.append("Ts ");
        }
        out.append('(');
        for (int i = from; i < to; i++) {
            int glyph = typeset.glyph(words.character(i), bold);
            octet(glyph >> 8);
            octet(glyph & 255);
            if ((i - from + 1) % LONGEST_STRING == 0) {
                out.append(") Tj (");
            }
        }
        out.append(") Tj ");
        if (lowered) {
            out.append("0 Ts ");
        }
    }

    private void octet(int value) {
        switch (value) {
            case '(', ')', '\\' -> out.append('\\').append((char) value);
            case '\r' -> out.append("\\r");
            default -> out.append((char) value);
        }
    }

    private void font(boolean bold, double size) {
        int before = out.length();
        out.append(bold ? "/F2 " : "/F1 ");
        number(size);
        out.append("Tf ");
        String now = out.substring(before);
        if (now.equals(font)) {
            out.setLength(before);
        }
        font = now;
    }

    void rule(double x1, double y1, double x2, double y2, double weight, Colour colour) {
        stroke(colour, weight);
        point(x1, y1);
        out.append("m ");
        point(x2, y2);
        out.append("l S\n");
    }

    void dashed(double x1, double y1, double x2, double y2, double weight, Colour colour) {
        out.append("[3 2] 0 d ");
        rule(x1, y1, x2, y2, weight, colour);
        out.append("[] 0 d ");
    }

    void block(double x, double y, double width, double height, Colour colour) {
        fill(colour);
        rectangle(x, y, width, height);
        out.append("f\n");
    }

    void moveTo(double x, double y) {
        point(x, y);
        out.append("m ");
    }

    void lineTo(double x, double y) {
        point(x, y);
        out.append("l ");
    }

    void curveTo(double x1, double y1, double x2, double y2, double x3, double y3) {
        point(x1, y1);
        point(x2, y2);
        point(x3, y3);
        out.append("c ");
    }

    void stroke(Colour colour, double weight) {
        if (stroke.isEmpty() || stroke.get() != colour) {
            out.append(colour.components()).append(" RG ");
            stroke = Optional.of(colour);
        }
        number(weight);
        out.append("w ");
    }

    void fill(Colour colour) {
        if (fill.isEmpty() || fill.get() != colour) {
            out.append(colour.components()).append(" rg ");
            fill = Optional.of(colour);
        }
    }

    /** Closes the outline that was begun by {@link #moveTo} and fills it, draws it, or both. */
    void paint(boolean filled, boolean drawn) {
        out.append(filled && drawn ? "b\n" : filled ? "h f\n" : drawn ? "s\n" : "n\n");
    }

    private void rectangle(double x, double y, double width, double height) {
        point(x, y);
        point(width, height);
        out.append("re ");
    }

    private void point(double x, double y) {
        number(x);
        number(y);
    }

    private void number(double value) {
        Texts.number(out, value);
        out.append(' ');
    }

    /** Sines need more decimals than places on the paper. */
    private void ratio(double value) {
        long parts = Math.round(value * 100_000);
        out.append(parts < 0 ? "-" : "").append(Math.abs(parts) / 100_000).append('.');
        String rest = Long.toString(100_000 + Math.abs(parts) % 100_000);
        out.append(rest, 1, 6).append(' ');
    }
}
