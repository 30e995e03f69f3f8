package broadside.codes;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * One load case of a code on one panel.
 *
 * @param name      name of the case in its code
 * @param label     the same in words
 * @param windward  the end of the panel from which zones or the eccentricity are measured
 * @param zones     net pressures, from the left edge to the right
 * @param shift     distance that the code moves the resultant off that of the zones, m, positive to the right
 * @param rule      the rule that moves it, where one does
 * @param rise      distance that the code moves the resultant above mid-height, m
 * @param least     least resultant force that the code asks for in this case, N
 */
public record LoadCase(String name, String label, Windward windward, List<ZonePressure> zones, double shift,
                       Optional<ShiftRule> rule, double rise, double least) {

    /** End that the wind meets first; NONE where the case is the same from either side. */
    public enum Windward {
        NONE, LEFT, RIGHT;

        public Windward mirrored() {
            return this == LEFT ? RIGHT : this == RIGHT ? LEFT : NONE;
        }
    }

    /** A case as it is named in running text after the word case: A for case-a, centred for centred. */
    public static String shortName(String name) {
        return name.length() == 6 && name.startsWith("case-") ? name.substring(5).toUpperCase(Locale.ROOT) : name;
    }

    public LoadCase {
        zones = List.copyOf(zones);
    }

    /** The same case met from the other end of a panel whose ends are alike. */
    public LoadCase mirrored(double width) {
        List<ZonePressure> other = new ArrayList<>();
        for (int i = zones.size() - 1; i >= 0; i--) {
            ZonePressure z = zones.get(i);
            other.add(new ZonePressure(z.zone(), z.symbol(), width - z.to(), width - z.from(), z.width(), z.coefficient(), z.pressure()));
        }
        return new LoadCase(name, label, windward.mirrored(), other, -shift, rule, rise, least);
    }
}
