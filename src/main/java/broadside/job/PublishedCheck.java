package broadside.job;

import broadside.trace.Status;
import java.util.List;

/**
 * One published case: what was printed, and what comes out here.
 *
 * @param file    name of the file
 * @param trap    a published mistake: its lines pass only when the computed value differs
 * @param lines   one for each printed value
 */
public record PublishedCheck(String file, String title, Source source, boolean trap, List<Line> lines) {

    /** Where the case was printed. */
    public record Source(String publication, String edition, String place, Status status) { }

    /**
     * One printed value.
     *
     * @param printed     as printed
     * @param computed    in the unit of the printed value, or why there is none
     * @param difference  computed less printed, in the same unit
     * @param within      the tolerance as written
     * @param why         why that tolerance
     * @param passed      whether the difference lies within the tolerance, or for a trap outside it
     */
    public record Line(String item, String step, String printed, String computed, String difference, String within, String why,
                       boolean passed) { }

    public PublishedCheck {
        lines = List.copyOf(lines);
    }

    public boolean passed() {
        return !lines.isEmpty() && lines.stream().allMatch(Line::passed);
    }
}
