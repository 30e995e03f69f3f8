package broadside.crew;

/** A figure about a crew, a sheet or a lift for which there is no answer. */
public final class UnfitFigure extends RuntimeException {

    private final String field;

    /**
     * Makes the figure known.
     *
     * @param field  what was given, such as "angle"
     * @param text   what is wrong and what fits
     */
    public UnfitFigure(String field, String text) {
        super(text);
        this.field = field;
    }

    public String field() {
        return field;
    }

    static double positive(String field, double value, String example) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new UnfitFigure(field, "a number above 0 is needed, such as " + example);
        }
        return value;
    }
}
