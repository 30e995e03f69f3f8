package broadside.support;

/** An answer about what carries an item that fits none of the tables, or no use of them. */
public final class UnfitAnswer extends RuntimeException {

    private final String field;

    /**
     * Makes the answer known.
     *
     * @param field  path of the answer inside its item, such as "posts.section"
     * @param text   what is wrong and what fits
     */
    public UnfitAnswer(String field, String text) {
        super(text);
        this.field = field;
    }

    public String field() {
        return field;
    }
}
