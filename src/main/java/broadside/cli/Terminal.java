package broadside.cli;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/** What goes to the terminal: foreign text without its control characters, and output that is known to have arrived. */
final class Terminal {

    /** Standard output, UTF-8. */
    static PrintStream out() {
        return new PrintStream(System.out, false, StandardCharsets.UTF_8);
    }

    /** Ends the output; what did not arrive is an error. */
    static void finish(PrintStream out) {
        if (out.checkError()) {
            throw new Refused("standard output cannot be written");
        }
    }

    /** A text on one line without control characters and without marks that change the direction of writing. */
    static String plain(String text) {
        return text.replaceAll("[\\p{Cc}\\p{Cf}\\u2028\\u2029]", " ");
    }

    private Terminal() { }
}
