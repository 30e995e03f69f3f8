package broadside.sheet;

import java.util.ArrayList;
import java.util.List;

/** Splits a symbol or formula such as {@code c_{p,net} = 0.9 c_f} into runs of plain and lowered text. */
public final class Runs {

    /** A piece of text; {@code lowered} pieces are subscripts. */
    public record Run(String text, boolean lowered) { }

    /**
     * Underscore followed by letters and digits, or by text in braces, is a subscript. Everything else stays as it is.
     */
    public static List<Run> of(String text) {
        List<Run> runs = new ArrayList<>();
        StringBuilder plain = new StringBuilder();
        int i = 0;
        while (i < text.length()) {
            int end = text.charAt(i) == '_' ? endOfSubscript(text, i + 1) : i;
            if (end <= i + 1) {
                plain.append(text.charAt(i++));
                continue;
            }
            if (plain.length() > 0) {
                runs.add(new Run(plain.toString(), false));
                plain.setLength(0);
            }
            boolean braces = text.charAt(i + 1) == '{';
            runs.add(new Run(text.substring(braces ? i + 2 : i + 1, braces ? end - 1 : end), true));
            i = end;
        }
        if (plain.length() > 0) {
            runs.add(new Run(plain.toString(), false));
        }
        return List.copyOf(runs);
    }

    /** Returns where the subscript ends, or {@code from} when there is none. */
    private static int endOfSubscript(String text, int from) {
        if (from < text.length() && text.charAt(from) == '{') {
            int close = text.indexOf('}', from);
            return close > from + 1 ? close + 1 : from;
        }
        int i = from;
        while (i < text.length() && Character.isLetterOrDigit(text.charAt(i))) {
            i++;
        }
        return i;
    }

    private Runs() { }
}
