package broadside.support;

import broadside.support.Section.Form;
import java.util.Optional;

/**
 * Sizes of a section, m.
 *
 * @param depth    along the wind on the face; the diameter of a round tube
 * @param wall     by which the section is checked; 0 for a solid one
 * @param nominal  wall as sold
 * @param corner   corners of a rectangular tube
 */
record Sizes(Form form, double depth, double width, double wall, double nominal, Optional<Materials.Corner> corner) {

    /** Sides beyond this, m, and walls below the other are slips of typing. */
    private static final double LARGEST = 10;
    private static final double THINNEST = 1.0 / 10_000;

    /** Why there can be no such section, in words. */
    Optional<String> problem() {
        double smaller = Math.min(depth, width);
        if (!(smaller > 0) || !(Math.max(depth, width) <= LARGEST)) {
            return Optional.of("its sizes must be above zero and not above 10 m");
        }
        if (form == Form.SOLID_RECTANGLE) {
            return wall == 0 ? Optional.empty() : Optional.of("a solid section has no wall");
        }
        if (!(wall >= THINNEST && nominal >= THINNEST)) {
            return Optional.of("its wall must be above zero, and not below 0.1 mm");
        }
        if (2 * Math.max(wall, nominal) >= smaller) {
            return Optional.of("its wall is thicker than half the " + (form == Form.ROUND_TUBE ? "diameter" : "smaller side"));
        }
        return corner.isPresent() && corner.get().fills(Math.max(wall, nominal), smaller)
            ? Optional.of("its wall is too thick for the rounded corners of the product") : Optional.empty();
    }
}
