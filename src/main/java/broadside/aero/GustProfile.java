package broadside.aero;

/**
 * Mean wind and gust near the ground: the mean follows the logarithm of height, the gust stands a fixed number of
 * standard deviations above it, and the standard deviation does not change with height.
 *
 * @param peak       gust less mean, in standard deviations
 * @param reference  height at which the wind is measured, m
 */
public record GustProfile(double peak, double reference) {

    /** Turbulence intensity 1 / ln(z/z0); the roughness length z0 in metres. */
    public double turbulence(double height, double roughness) {
        return 1 / Math.log(height / roughness);
    }

    /** Gust over the mean at the same height. */
    public double gustFactor(double height, double roughness) {
        return 1 + peak * turbulence(height, roughness);
    }

    /** Mean at a height over the gust at the reference height. */
    public double meanRatio(double height, double roughness) {
        return Math.log(height / roughness) / (Math.log(reference / roughness) + peak);
    }

    /** Gust at a height over the gust at the reference height. */
    public double gustRatio(double height, double roughness) {
        return (Math.log(height / roughness) + peak) / (Math.log(reference / roughness) + peak);
    }
}
