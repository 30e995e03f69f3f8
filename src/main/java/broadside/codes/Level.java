package broadside.codes;

import broadside.trace.Status;

/**
 * The level of the loads that a code gives, and the companion at the other level.
 *
 * @param name       "characteristic" or "strength"
 * @param companion  name of the companion level in results: "factored" or "service"
 * @param shown      the companion in words for a reader
 * @param factor     what a load is multiplied by to reach the companion level
 * @param rule       the factor in words
 * @param place      where it stands
 */
public record Level(String name, String companion, String shown, double factor, String rule, String place, Status status) { }
