package broadside.action;

import java.util.Optional;

/**
 * What reaches the foot of one post, the worst of all cases, ends and directions.
 *
 * @param post      its number from the left, from 1
 * @param position  of the post, m: from the middle of the posts of a sign, from the left end of a hoarding
 * @param zone      zone in which it stands in the governing case; empty for a sign
 * @param gate      width of gate leaf that hangs on it, m, zero for none
 * @param share     width of panel that it carries, m; empty for a sign, whose posts share by statics
 * @param state     arrangement of the item in that case, empty for the item as it stands
 * @param named     the case that gives the greatest moment
 * @param shear     the greatest shear, N
 * @param shearCase the case that gives it
 * @param moment    at the ground line, N m
 */
public record PostAction(int post, double position, String zone, double gate, Optional<Double> share, String state, String named, double shear,
                         String shearCase, double moment) {

    /** The same post at the level that a factor leads to. */
    public PostAction atLevel(double factor) {
        return new PostAction(post, position, zone, gate, share, state, named, factor * shear, shearCase, factor * moment);
    }
}
