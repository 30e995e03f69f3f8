package broadside.support;

/**
 * Wind on one footing in one case, at ground level and at the level of the code, unfactored. Magnitudes.
 *
 * @param named   the case
 * @param shear   N
 * @param moment  N m
 */
public record FootLoad(String named, double shear, double moment) { }
