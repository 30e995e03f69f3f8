package broadside.weather;

/** A speed, place or record that these relations do not cover, or that was given wrongly. */
public final class UnfitWeather extends RuntimeException {

    private final String field;

    /**
     * Makes it known.
     *
     * @param field  name of what was given, such as "height"
     * @param text   what is wrong and what fits
     */
    public UnfitWeather(String field, String text) {
        super(text);
        this.field = field;
    }

    public String field() {
        return field;
    }
}
