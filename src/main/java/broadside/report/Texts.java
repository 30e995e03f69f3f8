package broadside.report;

import org.apache.pdfbox.cos.COSString;

/** Numbers and texts in the forms that SVG, XML and PDF ask for. */
final class Texts {

    private static final double LARGEST = 1e7;

    /** Writes a coordinate: at most two decimals, a point as the mark, no sign on zero, in any locale. */
    static void number(StringBuilder out, double value) {
        if (!(Math.abs(value) < LARGEST)) {
            throw new IllegalArgumentException("a coordinate must lie between -10000000 and 10000000, not " + value);
        }
        long hundredths = Math.round(value * 100);
        if (hundredths < 0) {
            out.append('-');
            hundredths = -hundredths;
        }
        out.append(hundredths / 100);
        int rest = (int) (hundredths % 100);
        if (rest != 0) {
            out.append('.').append(rest / 10);
            if (rest % 10 != 0) {
                out.append(rest % 10);
            }
        }
    }

    /** Writes text for XML: marks escaped, characters that XML 1.0 does not allow left out. */
    static void xml(StringBuilder out, String text) {
        int i = 0;
        while (i < text.length()) {
            int c = text.codePointAt(i);
            i += Character.charCount(c);
            switch (c) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> {
                    if (allowed(c)) {
                        out.appendCodePoint(c);
                    }
                }
            }
        }
    }

    /** Returns the text without the characters that XML 1.0 does not allow, unpaired surrogates among them. */
    static String clean(String text) {
        if (text.codePoints().allMatch(Texts::allowed)) {
            return text;
        }
        return text.codePoints().filter(Texts::allowed)
            .collect(StringBuilder::new, StringBuilder::appendCodePoint, StringBuilder::append).toString();
    }

    private static boolean allowed(int c) {
        return c == '\t' || c == '\n' || c == '\r' || c >= 0x20 && c <= 0xD7FF || c >= 0xE000 && c <= 0xFFFD
            || c >= 0x10000;
    }

    /** Returns a text string for PDF, cut to a number of characters: PDF/A limits the length of strings. */
    static COSString pdf(String text, int most) {
        String clean = clean(text);
        boolean cut = clean.length() > most;
        int end = cut && Character.isHighSurrogate(clean.charAt(most - 1)) ? most - 1 : most;
        return new COSString(cut ? clean.substring(0, end) + "..." : clean);
    }

    private Texts() { }
}
