package broadside.table;

/** A file in code-tables is not as it must be. Names the file and the line, because a person has to mend it. */
public final class TableFormat extends RuntimeException {

    public TableFormat(String file, int line, String problem) {
        super(file + ":" + line + ": " + problem);
    }
}
