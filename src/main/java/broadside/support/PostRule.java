package broadside.support;

import broadside.trace.Trace;
import java.util.List;

/** How a code checks the cross-section of a post at its foot. The post as a column is not checked: signs weigh little. */
public interface PostRule {

    /** What no rule for steel posts here covers. */
    String STEEL_NOTE = "The cross-section at the foot is checked. Buckling of the post as a column, welds, holes and the base are not.";

    /** The rule as it is printed on the sheet. */
    String title();

    /** Whether it asks for loads at the level of strength; otherwise at that of allowable stress. */
    boolean strength();

    /** Factor on weights that act against the post, with its place. */
    Figure weights();

    default double weightFactor() {
        return weights().value();
    }

    /** How the loads are written. */
    LoadSymbols symbols();

    /** What the rule leaves out, for the notes of the sheet. */
    List<String> notes();

    /**
     * Checks one section under one case and records the steps. The loads must stand on the sheet under {@link #symbols}.
     * Never a result above that of a load that is larger in every part.
     *
     * @throws UnfitAnswer  where the rule does not know the grade
     */
    List<Check> check(Section section, Grade grade, DesignLoad load, Trace trace);
}
