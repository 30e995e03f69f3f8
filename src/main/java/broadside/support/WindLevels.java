package broadside.support;

import broadside.trace.Status;

/**
 * What a wind load of the code is multiplied by to reach the level that a rule asks for.
 *
 * @param service   to the level of allowable stress and of deflections (the characteristic wind, 0.6 W)
 * @param strength  to the level of design resistances (1.5 times the characteristic wind, 1.0 W)
 * @param place     where the factor between the two stands
 */
public record WindLevels(double service, double strength, String place, Status status) { }
