package broadside.support;

/**
 * Something that was assumed and must be confirmed on site.
 *
 * @param warns  an engineer must settle it before anything is built, whatever the checks say
 */
public record Assumed(String text, boolean warns) {

    public Assumed(String text) {
        this(text, false);
    }
}
