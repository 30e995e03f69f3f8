package broadside.support;

import java.util.ArrayList;
import java.util.List;

/** The cases that can govern: those that no other case matches or passes in every part. Rules never fall when a load grows. */
final class PostCases {

    /** Whether the wind runs along the face, so that the drag of the post itself bends it the other way. */
    static boolean along(PostLoad load) {
        return load.moment() == 0 && load.shear() == 0 && (load.weakMoment() > 0 || load.weakShear() > 0);
    }

    /** For the checks of strength, in their order. */
    static List<PostLoad> forStrength(List<PostLoad> all) {
        return kept(all, PostCases::coversStrength);
    }

    /**
     * For the deflection, in their order.
     *
     * @param ofWind  the limit is a share of the height of the wind force, so only cases alike in all are left out
     */
    static List<PostLoad> forDeflection(List<PostLoad> all, double height, boolean ofWind) {
        return kept(all, (a, b) -> along(a) == along(b) && (ofWind ? a.bending() == b.bending() && a.cubes() == b.cubes() && a.shear() == b.shear()
            && a.moment() == b.moment() && a.weakShear() == b.weakShear() && a.weakMoment() == b.weakMoment()
            : 3 * height * a.bending() - a.cubes() >= 3 * height * b.bending() - b.cubes()));
    }

    private interface Covers {
        boolean test(PostLoad a, PostLoad b);
    }

    private static boolean coversStrength(PostLoad a, PostLoad b) {
        return along(a) == along(b) && a.shear() >= b.shear() && a.moment() >= b.moment() && a.torsion() >= b.torsion() && a.weakShear() >= b.weakShear()
            && a.weakMoment() >= b.weakMoment() && a.weight() >= b.weight() && a.weightMoment() >= b.weightMoment();
    }

    private static List<PostLoad> kept(List<PostLoad> all, Covers covers) {
        List<PostLoad> kept = new ArrayList<>();
        for (PostLoad each : all) {
            if (kept.stream().noneMatch(k -> covers.test(k, each))) {
                kept.removeIf(k -> covers.test(each, k));
                kept.add(each);
            }
        }
        return kept;
    }

    private PostCases() { }
}
