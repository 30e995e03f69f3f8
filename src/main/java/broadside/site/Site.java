package broadside.site;

import broadside.quantity.Length;
import broadside.quantity.Period;
import broadside.quantity.Pressure;
import broadside.quantity.Speed;
import java.util.Optional;
import java.util.Set;

/**
 * Where the item stands and the wind it must stand.
 *
 * @param name              name of the place
 * @param basicSpeed        basic wind speed as the chosen code defines it
 * @param averaging         averaging time of that speed
 * @param returnPeriod      return period asked for, where it was given
 * @param ground            terrain, altitude and the shape of the ground
 * @param authorityMinimum  least pressure that the local authority asks for
 * @param options           further values that single codes ask for
 */
public record Site(String name, Speed basicSpeed, Averaging averaging, Optional<Period> returnPeriod, Ground ground,
                   Optional<AuthorityMinimum> authorityMinimum, SiteOptions options) {

    /**
     * Terrain class in the words of the code, altitude above the sea, and the hill near by.
     *
     * @param unknown  what the user answered with "I don't know"
     */
    public record Ground(String terrain, Optional<Length> altitude, Optional<Topography> topography, Set<Unknown> unknown) {

        public Ground {
            unknown = Set.copyOf(unknown);
        }

        /** Whether the ground near by is not known, so that the worst value of the code counts. */
        public boolean shapeUnknown() {
            return unknown.contains(Unknown.SHAPE);
        }
    }

    /** What a user need not know: the terrain class, and whether the ground near by is higher or lower. */
    public enum Unknown { TERRAIN, SHAPE }

    /** A least pressure; {@code service} when the authority means it at allowable stress. */
    public record AuthorityMinimum(Pressure pressure, boolean service) { }

    /** The same place in another wind. */
    public Site withSpeed(Speed speed) {
        return new Site(name, speed, averaging, returnPeriod, ground, authorityMinimum, options);
    }
}
