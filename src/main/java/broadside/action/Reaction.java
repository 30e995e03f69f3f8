package broadside.action;

/**
 * What a support of the item must take, beside posts: a bracket, the end of a banner, one panel of a fence.
 *
 * @param step    name of the step that gave it
 * @param label   in words
 * @param value   N or N m
 * @param unit    "N", "N m" or "1" for a ratio
 * @param named   the case that gives it; empty where the wind has no part in it
 */
public record Reaction(String step, String label, double value, String unit, String named) {

    /** The same at the level that a factor leads to; weight and ratios stay. */
    public Reaction atLevel(double factor) {
        return named.isEmpty() || unit.equals("1") ? this : new Reaction(step, label, factor * value, unit, named);
    }
}
