package broadside.codes;

import broadside.table.Source;

/**
 * The rule by which a case moves its resultant off the middle of the panel.
 *
 * @param factor  of the panel's width
 * @param source  where it stands
 */
public record ShiftRule(double factor, Source source) { }
