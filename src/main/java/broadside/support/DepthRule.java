package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/** A rule for how deep a post or pier must stand. Its soil is recorded when it is made. */
public interface DepthRule {

    /**
     * What acts on a post in the ground, already recorded under the symbols of the rule and "b".
     *
     * @param shear   at the level of the rule, N
     * @param moment  at ground level, at the level of the rule, N m
     * @param width   diameter or face across the wind, m
     */
    record Column(double shear, double moment, double width) { }

    /** The rule in words, with its publication. */
    String title();

    /** How well the rule and the figures of its soil are known. */
    Status status();

    /** Symbol of the shear at the level of the rule. */
    default String shearSymbol() {
        return "V_s";
    }

    /** Symbol of the moment at the ground at the level of the rule. */
    default String momentSymbol() {
        return "M_s";
    }

    /** Whether it takes loads at the level of strength; otherwise those of service. */
    default boolean strength() {
        return false;
    }

    /** Depth that is needed, m; recorded as "embedment-depth". */
    double needed(Column column, Trace trace);

    /** The least depth whatever the loads, m; 0 for none. */
    default double least(double width) {
        return 0;
    }

    /**
     * Checks a depth that was recorded as "d_f".
     *
     * @param sized  whether {@link #needed} was recorded on this sheet for this column
     */
    Check check(Column column, double depth, boolean sized, String named, Trace trace);
}
