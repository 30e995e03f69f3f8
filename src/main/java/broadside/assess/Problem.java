package broadside.assess;

import java.util.List;

/**
 * An answer that does not fit. It is gathered, never thrown one by one, so that all can be shown at once.
 *
 * @param path     where it stands in the job, such as items[0].boards[0].width
 * @param text     what is wrong and what fits, without the path
 * @param options  answers that would fit, where the typed text has more than one reading; mostly empty
 */
public record Problem(String path, String text, List<String> options) {

    public Problem {
        options = List.copyOf(options);
    }

    public Problem(String path, String text) {
        this(path, text, List.of());
    }

    /** Place and text in one line. */
    public String line() {
        return path.isEmpty() ? text : path + ": " + text;
    }
}
