package broadside.report;

import java.text.Bidi;

/** Puts the characters of a line that holds Hebrew into the order in which they stand on the paper. */
final class RightToLeft {

    private static final String PAIRS = "()[]{}<>\u00ab\u00bb";

    /** Returns whether a character is written from right to left, among those that the fonts have. */
    static boolean isIn(char c) {
        return c >= 0x590 && c <= 0x5FF || c >= 0xFB1D && c <= 0xFB4F;
    }

    /**
     * Reorders a line in place.
     *
     * @param marks the marks of the characters, which move with them
     */
    static void reorder(char[] line, byte[] marks) {
        Bidi bidi = new Bidi(line, 0, null, 0, line.length, Bidi.DIRECTION_LEFT_TO_RIGHT);
        byte[] levels = new byte[line.length];
        Object[] order = new Object[line.length];
        for (int i = 0; i < line.length; i++) {
            levels[i] = (byte) bidi.getLevelAt(i);
            order[i] = i;
        }
        Bidi.reorderVisually(levels, 0, order, 0, line.length);
        char[] characters = line.clone();
        byte[] before = marks.clone();
        for (int i = 0; i < line.length; i++) {
            int from = (Integer) order[i];
            line[i] = bidi.getLevelAt(from) % 2 == 1 ? mirrored(characters[from]) : characters[from];
            marks[i] = before[from];
        }
    }

    private static char mirrored(char c) {
        int at = PAIRS.indexOf(c);
        return at < 0 ? c : PAIRS.charAt(at ^ 1);
    }

    private RightToLeft() { }
}
