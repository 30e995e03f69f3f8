package broadside.assess;

import java.util.List;
import java.util.Optional;

/**
 * The winds at which the checks of an item are just met, the first to govern first.
 *
 * @param height  at which the gust at the item holds, m above the ground
 * @param level   how the wind of the code was brought to the wind that blows; empty where it is that wind
 */
public record Limits(List<Limit> list, double height, String level, List<Change> changes) {

    public Limits {
        list = List.copyOf(list);
        changes = List.copyOf(changes);
    }

    /**
     * The limit of one check.
     *
     * @param check     its name
     * @param state     what it holds for, such as "cover taken off"; empty for the item as it is
     * @param atItem    3 s gust at the item, m/s
     * @param inTheOpen 3 s gust at 10 m above open ground, m/s
     * @param mean      10 minute mean there, m/s
     * @param multiple  of the basic speed of the job
     * @param bySquare  found by the square of the speed, because a least value of the code holds below
     */
    public record Limit(String check, String state, double atItem, double inTheOpen, double mean, double multiple, boolean bySquare) { }

    /** One thing changed, in words, and the first limit then; empty where none was found. */
    public record Change(String what, Optional<Limit> first) { }

    /** The first to govern with the item as it is. */
    public Optional<Limit> first() {
        return list.stream().filter(l -> l.state().isEmpty()).findFirst();
    }
}
