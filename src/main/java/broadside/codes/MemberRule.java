package broadside.codes;

import broadside.panel.PostSection;
import broadside.trace.Trace;

/** The wind on a slender upright member, such as a post below a board. */
public interface MemberRule {

    /**
     * Force coefficient on the width across the wind; recorded as "coefficient/post".
     *
     * @param section   outline of the member
     * @param length    length that the wind meets, m
     * @param pressure  pressure on which the coefficient is put, Pa
     */
    double coefficient(PostSection section, double length, double pressure, Trace trace);

    /** The rule in words, and whether it is of the chosen code, for the sheet. */
    String words();
}
