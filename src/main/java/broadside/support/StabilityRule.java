package broadside.support;

import broadside.trace.Status;

/** A named rule of stability: factors on favourable weight and on wind, the level of the wind, and the ratio that must be reached. */
public record StabilityRule(String key, String title, double onWeight, double onWind, boolean strength, double required, String place, Status status) { }
