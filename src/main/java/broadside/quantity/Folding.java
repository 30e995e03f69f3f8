package broadside.quantity;

/** Brings the many characters with one meaning to one plain form before a text is read. */
final class Folding {
    private static final String APOSTROPHES = "'\u2018\u2019\u02BC\u2032\u02B9\u00B4`\uFF07";
    private static final String DOUBLE_MARKS = "\"\u201C\u201D\u201E\u2033\u02BA\uFF02";
    private static final String DASHES = "-\u2212\u2010\u2011\u2012\u2013\uFE63\uFF0D";
    private static final String SLASHES = "/\u2044\u2215\uFF0F";
    private static final String FRACTIONS = "½¼¾⅓⅔⅛⅜⅝⅞⅕⅖⅗⅘⅙⅚";
    private static final String[] FRACTION_TEXTS = {"1/2", "1/4", "3/4", "1/3", "2/3", "1/8", "3/8", "5/8", "7/8",
            "1/5", "2/5", "3/5", "4/5", "1/6", "5/6"};

    private Folding() {
    }

    /** One line with plain spaces, apostrophes, dashes, slashes and fractions; ends stripped. */
    static String line(String text) {
        StringBuilder out = new StringBuilder(text.length() + 8);
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            int fraction = FRACTIONS.indexOf(c);
            if (fraction >= 0) {
                space(out);
                out.append(FRACTION_TEXTS[fraction]);
                space(out);
            } else if (c == '\t' || Character.isSpaceChar(c)) {
                space(out);
            } else if (Character.getType(c) != Character.FORMAT) {
                mark(out, plain(c));
            }
        }
        return out.toString().strip();
    }

    /** A unit symbol in plain letters and digits, letter case kept. */
    static String symbol(String text) {
        StringBuilder out = new StringBuilder(text.length());
        for (char c : line(text).toCharArray()) {
            switch (c) {
                case '²' -> out.append('2');
                case '³' -> out.append('3');
                case 'º', '˚' -> out.append('°');
                case '^' -> { }
                case '·', '⋅', '∙', '•', '*', '.', '-', ' ' -> space(out);
                default -> out.append(c);
            }
        }
        return out.toString().strip().replace(" /", "/").replace("/ ", "/");
    }

    /** The text between quotation marks, short and without characters that do not print. */
    static String quote(String text) {
        String kept = text.length() > 40 ? text.substring(0, 39) + "…" : text;
        StringBuilder out = new StringBuilder(kept.length() + 2).append('"');
        kept.codePoints().forEach(c -> out.appendCodePoint(prints(c) ? c : '\uFFFD'));
        return out.append('"').toString();
    }

    /** Whether a character has a place on a line of text; line ends and direction marks have none. */
    static boolean prints(int c) {
        return switch (Character.getType(c)) {
            case Character.CONTROL, Character.FORMAT, Character.SURROGATE, Character.PRIVATE_USE,
                 Character.UNASSIGNED, Character.LINE_SEPARATOR, Character.PARAGRAPH_SEPARATOR -> false;
            default -> true;
        };
    }

    private static void space(StringBuilder out) {
        if (out.length() > 0 && out.charAt(out.length() - 1) != ' ') {
            out.append(' ');
        }
    }

    private static void mark(StringBuilder out, char c) {
        int last = out.length() - 1;
        if (c == '\'' && last >= 0 && out.charAt(last) == '\'') {
            out.setCharAt(last, '"');
        } else {
            out.append(c);
        }
    }

    private static char plain(char c) {
        if (APOSTROPHES.indexOf(c) >= 0) {
            return '\'';
        }
        if (DOUBLE_MARKS.indexOf(c) >= 0) {
            return '"';
        }
        if (DASHES.indexOf(c) >= 0) {
            return '-';
        }
        return SLASHES.indexOf(c) >= 0 ? '/' : c;
    }
}
