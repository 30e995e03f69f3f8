package broadside.report;

import broadside.sheet.Runs;
import java.text.Normalizer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Text made ready for the page: every character is one that both fonts have, and carries a mark for bold and lowered.
 * Breaks into lines between words, or inside a word that is wider than the line.
 */
final class Words {

    static final byte PLAIN = 0;
    static final byte BOLD = 1;
    static final byte LOWERED = 2;

    /** A part of the text that stands on one line; {@code width} is in points. */
    record Line(Words words, int from, int to, double width) { }

    private final Lettering lettering;
    private char[] characters = new char[32];
    private byte[] marks = new byte[32];
    private int length;
    private boolean rightToLeft;

    Words(Lettering lettering) {
        this.lettering = lettering;
    }

    char character(int i) {
        return characters[i];
    }

    byte mark(int i) {
        return marks[i];
    }

    boolean isEmpty() {
        return length == 0;
    }

    /** Adds text as it stands, but for the characters that cannot be set. */
    Words add(String text, boolean bold) {
        addMarked(text, bold ? BOLD : PLAIN);
        return this;
    }

    /** Adds a symbol or formula whose subscripts are marked by underscores. */
    Words addFormula(String text, boolean bold) {
        for (Runs.Run run : Runs.of(text)) {
            addMarked(run.text(), (byte) ((bold ? BOLD : PLAIN) | (run.lowered() ? LOWERED : PLAIN)));
        }
        return this;
    }

    private void addMarked(String text, byte mark) {
        String composed = Normalizer.isNormalized(text, Normalizer.Form.NFC) ? text
            : Normalizer.normalize(text, Normalizer.Form.NFC);
        int i = 0;
        while (i < composed.length()) {
            int c = composed.codePointAt(i);
            i += Character.charCount(c);
            addOne(c, mark);
        }
    }

    private void addOne(int c, byte mark) {
        if (c > 0x20 && c < 0x7F) {
            append((char) c, mark);
        } else if (c >= 0x2080 && c <= 0x2089) {
            append((char) ('0' + c - 0x2080), (byte) (mark | LOWERED));
        } else if (isSpace(c)) {
            if (length > 0 && characters[length - 1] != ' ') {
                append(' ', mark);
            }
        } else if (c == 0x2011 || c == 0x2010) {
            append('-', mark);
        } else if (!isSilent(c)) {
            append(lettering.has(c) ? (char) c : Lettering.MISSING, mark);
        }
    }

    /** All white space but the spaces that hold two words together; these stay. */
    private static boolean isSpace(int c) {
        return c != 0xA0 && c != 0x202F && (Character.isWhitespace(c) || Character.isSpaceChar(c) || c == 0x85);
    }

    /** Marks that steer other software and print nothing: joiners, direction marks, variants, soft hyphens. */
    private static boolean isSilent(int c) {
        return Character.getType(c) == Character.FORMAT || c >= 0xFE00 && c <= 0xFE0F || c >= 0xE0100 && c <= 0xE01EF;
    }

    private void append(char c, byte mark) {
        if (length == characters.length) {
            characters = Arrays.copyOf(characters, length * 2);
            marks = Arrays.copyOf(marks, length * 2);
        }
        rightToLeft = rightToLeft || c >= 0x590 && RightToLeft.isIn(c);
        characters[length] = c;
        marks[length++] = mark;
    }

    /** Returns the width of the widest word in points, for columns that should not break words. */
    double widestWord(double size) {
        double widest = 0;
        double word = 0;
        for (int i = 0; i < length; i++) {
            word = characters[i] == ' ' ? 0 : word + width(i, size);
            widest = Math.max(widest, word);
        }
        return widest;
    }

    /** Returns the width of the text on one line, in points. */
    double wholeWidth(double size) {
        double sum = 0;
        for (int i = 0; i < length; i++) {
            sum += width(i, size);
        }
        return sum;
    }

    private double width(int i, double size) {
        return lettering.width(characters[i], marks[i], size);
    }

    /** Breaks the text into lines no wider than {@code width} points; no text gives no lines. */
    List<Line> lines(double size, double width) {
        List<Line> lines = new ArrayList<>();
        int start = 0;
        while (start < length) {
            Line line = next(start, size, width);
            lines.add(ordered(line));
            start = line.to();
            while (start < length && characters[start] == ' ') {
                start++;
            }
        }
        return lines;
    }

    /** Returns the line with its characters in the order of the paper. */
    private Line ordered(Line line) {
        if (!rightToLeft || line.to() == line.from()) {
            return line;
        }
        Words turned = new Words(lettering);
        turned.characters = Arrays.copyOfRange(characters, line.from(), line.to());
        turned.marks = Arrays.copyOfRange(marks, line.from(), line.to());
        turned.length = line.to() - line.from();
        RightToLeft.reorder(turned.characters, turned.marks);
        return new Line(turned, 0, turned.length, line.width());
    }

    private Line next(int start, double size, double width) {
        double sum = 0;
        int space = -1;
        double untilSpace = 0;
        for (int i = start; i < length; i++) {
            double here = width(i, size);
            if (characters[i] == ' ') {
                space = i;
                untilSpace = sum;
            } else if (sum + here > width && i > start) {
                boolean between = space > start && !(untilSpace < width * 0.75 && isWider(space + 1, size, width));
                return between ? new Line(this, start, space, untilSpace) : split(start, i, size);
            }
            sum += here;
        }
        boolean trailing = characters[length - 1] == ' ';
        return new Line(this, start, trailing ? length - 1 : length, trailing ? untilSpace : sum);
    }

    /** A word that has to be broken anyway begins on the line that is not full yet. */
    private boolean isWider(int from, double size, double width) {
        double sum = 0;
        for (int i = from; i < length && characters[i] != ' ' && sum <= width; i++) {
            sum += width(i, size);
        }
        return sum > width;
    }

    /** Splits a long word, after a sign in its second half if there is one. */
    private Line split(int start, int end, double size) {
        int at = end;
        while (at > (start + end) / 2 && "/-_.,;:&?=+".indexOf(characters[at - 1]) < 0) {
            at--;
        }
        int to = at > start && at > (start + end) / 2 ? at : end;
        double sum = 0;
        for (int i = start; i < to; i++) {
            sum += width(i, size);
        }
        return new Line(this, start, to, sum);
    }

    /** Returns the text on one line, cut with three dots where it is wider than {@code width} points. */
    Line fitted(double size, double width) {
        double whole = wholeWidth(size);
        if (whole <= width) {
            return ordered(new Line(this, 0, length, whole));
        }
        double sum = 3 * lettering.width('.', marks[0], size);
        int end = 0;
        while (end < length && sum + width(end, size) <= width) {
            sum += width(end++, size);
        }
        Words cut = new Words(lettering);
        for (int i = 0; i < end; i++) {
            cut.append(characters[i], marks[i]);
        }
        cut.add("...", (marks[0] & BOLD) != 0);
        return cut.ordered(new Line(cut, 0, cut.length, cut.wholeWidth(size)));
    }
}
