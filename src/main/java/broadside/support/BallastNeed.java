package broadside.support;

/**
 * Ballast with which every check of one panel or post holds, kg, in place of the ballast that was typed.
 *
 * @param named  the wind that asks for it
 * @param line   on the line of the fence, or on the foot below the face of a hoarding
 * @param brace  on the foot of the brace; 0 without one
 */
public record BallastNeed(String named, double line, double brace) {

    /** Both together, kg. */
    public double total() {
        return line + brace;
    }

    /** The more of each place. */
    BallastNeed and(BallastNeed other) {
        return new BallastNeed(other.total() > total() ? other.named : named, Math.max(line, other.line), Math.max(brace, other.brace));
    }
}
