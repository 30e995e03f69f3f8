package broadside.panel;

/**
 * One flat, upright rectangle as a code sees it: a board of a sign, or a stretch of hoarding between free ends.
 * Lengths in metres.
 *
 * @param part        its name inside the item; empty when the item has one panel only
 * @param kind        board held clear of the ground, wall that stands as a fence, or panel flat on a building
 * @param width       across the wind
 * @param height      of the panel itself
 * @param clearance   gap between the ground and its lower edge
 * @param middle      distance of its middle from the middle of the item, positive to the right seen from the front
 * @param solidity    solid area over gross area, 1 for a closed panel
 * @param returnLeft  length of the return corner at the left end, 0 for a free end
 * @param returnRight length of the return corner at the right end
 * @param shelter     factor on the wind by a wall or fence in front that stays there, 1 for none
 * @param sharers     posts that share its load
 * @param typed       the sizes as typed
 */
public record Panel(String part, Kind kind, double width, double height, double clearance, double middle, double solidity,
                    double returnLeft, double returnRight, double shelter, int sharers, AsTyped typed) {

    /** A panel without shelter on one support. */
    public Panel(String part, Kind kind, double width, double height, double clearance, double middle, double solidity, double returnLeft, double returnRight,
                 AsTyped typed) {
        this(part, kind, width, height, clearance, middle, solidity, returnLeft, returnRight, 1, 1, typed);
    }

    /** The sizes as they were typed; a size that follows from others is empty. */
    public record AsTyped(String width, String height, String clearance, String middle) { }

    /** What the panel is in the words of the codes. */
    public enum Kind { BOARD, WALL, FACADE }

    /** Height of the upper edge above the ground, m. */
    public double top() {
        return clearance + height;
    }

    /** Gross area, m2. */
    public double area() {
        return width * height;
    }

    public boolean endsAlike() {
        return returnLeft == returnRight;
    }
}
