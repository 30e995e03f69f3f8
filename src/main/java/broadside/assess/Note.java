package broadside.assess;

/** A sentence that belongs to a result. */
public record Note(Kind kind, String text) {

    /** What the sentence is. */
    public enum Kind {
        /** A value or reading that the tool chose because none was given. */
        ASSUMPTION("assumption"),
        /** Something that the reader must know to use the numbers. */
        CAUTION("caution"),
        /** Something that was not checked. */
        NOT_CHECKED("not-checked"),
        /** A value that the user set in place of a calculated one. */
        OVERRIDE("override");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }
}
