package broadside.table;

import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;

/** A file in code-tables is not as it must be. Names the file and the line, because a person has to mend it. */
public final class TableFormat extends RuntimeException {

    public TableFormat(String file, int line, String problem) {
        super(file + ":" + line + ": " + problem);
    }

    /** What was read on the side; a broken table is told as it is. */
    public static <T> T joined(CompletableFuture<T> read) {
        try {
            return read.join();
        } catch (CompletionException e) {
            throw e.getCause() instanceof TableFormat broken ? broken : e;
        }
    }
}
