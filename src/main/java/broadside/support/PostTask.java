package broadside.support;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * What a post is to be checked or sized for.
 *
 * @param route             "en", "us-asd" or "us-strength"
 * @param duration          duration class of the wind for timber by EN 1995-1-1, such as "short"
 * @param loads             all cases of all posts, at the level of the code; weights without the post itself
 * @param levels            from the code's level to those of service and of strength
 * @param drag              wind on the bare post itself, at the level of the code
 * @param height            of the post above the ground, m
 * @param deflectionHeight  top of the highest board, m above the ground; not below any of the forces
 * @param tipMass           mass that one post carries, kg
 * @param tipHeight         height of its middle, m
 * @param limit             name of the deflection limit; empty for that of the route
 */
public record PostTask(String route, String duration, List<PostLoad> loads, WindLevels levels, Function<Section, OwnDrag> drag, double height, double deflectionHeight,
                       double tipMass, double tipHeight, Optional<String> limit) {

    public PostTask {
        loads = List.copyOf(loads);
        if (loads.isEmpty() || !(height > 0) || !(deflectionHeight > 0) || !(tipHeight > 0)) {
            throw new IllegalArgumentException("a post has a height, a mass above the ground and at least one case");
        }
    }
}
