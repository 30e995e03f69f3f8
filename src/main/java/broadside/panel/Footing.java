package broadside.panel;

import broadside.quantity.Angle;
import broadside.quantity.Density;
import broadside.quantity.Length;
import broadside.quantity.Measure;
import broadside.quantity.Pressure;
import java.util.Optional;

/**
 * The footing of each post, as typed. What is empty is sized or assumed.
 *
 * @param kind    how it holds
 * @param round   whether it is round in plan
 * @param width   along the wind on the face for a pad; diameter or face width across the wind for a post or pier
 * @param length  of a pad, across the wind
 * @param depth   below the ground
 */
public record Footing(Kind kind, boolean round, Optional<Length> width, Optional<Length> length, Optional<Length> depth, Soil soil, Ground ground) {

    /** How a footing holds, with the word of the job file. */
    public enum Kind {
        /** The post itself stands in the ground, with or without concrete around it. */
        PLANTED("planted"),
        /** A shaft of concrete in the ground that carries the post. */
        PIER("pier"),
        /** A block or slab that holds by its weight. */
        PAD("pad");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    /**
     * What is known of the soil.
     *
     * @param ground       class of the ground; empty when it is not known
     * @param rule         rule for the depth; empty for the one that fits what is known
     * @param lateral      allowable lateral bearing for each metre of depth
     * @param cohesion     undrained shear strength of clay
     * @param friction     angle of friction of sand
     * @param density      of the soil
     * @param bearing      allowable pressure under a pad
     * @param sliding      friction coefficient under a pad
     * @param safety       factor on the loads of an ultimate method
     */
    public record Soil(Optional<String> ground, Optional<String> rule, Optional<Measure> lateral, Optional<Pressure> cohesion, Optional<Angle> friction,
                       Optional<Density> density, Optional<Pressure> bearing, Optional<Double> sliding, Optional<Double> safety) {

        public static final Soil UNKNOWN = new Soil(Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty(),
            Optional.empty(), Optional.empty(), Optional.empty());
    }

    /**
     * What stands around the footing.
     *
     * @param paved      a rigid floor or pavement at ground level holds the post
     * @param doubled    whether the post may move half an inch at the ground, so that lateral bearing counts twice
     * @param increased  whether the increase of a third for wind counts
     * @param slope      "flat", "sloping" or "unknown"; empty when it was not asked
     * @param water      "deep", "high" or "unknown"
     * @param frost      depth of frost
     * @param services   "located", "not located"
     */
    public record Ground(boolean paved, boolean doubled, boolean increased, Optional<String> slope, Optional<String> water, Optional<Length> frost,
                         Optional<String> services) {

        public static final Ground UNKNOWN = new Ground(false, false, false, Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
    }
}
