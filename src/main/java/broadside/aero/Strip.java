package broadside.aero;

import java.util.ArrayList;
import java.util.List;

/** A part of a panel along its width, measured from the windward end, in metres. */
public record Strip(String name, double from, double to) {

    public double width() {
        return to - from;
    }

    /** Narrower strips come from binary rounding only, m. */
    private static final double NARROWEST = 1e-9;

    /** Length that two stretches have in common, zero when they do not meet. */
    public static double overlap(double fromA, double toA, double fromB, double toB) {
        return Math.max(0, Math.min(toA, toB) - Math.max(fromA, fromB));
    }

    /**
     * Cuts a width into strips at the given limits, in order from the windward end; a strip that begins beyond the width
     * is left out, the last one ends with it. An infinite limit means "to the end".
     */
    public static List<Strip> cut(double width, List<String> names, List<Double> limits) {
        List<Strip> strips = new ArrayList<>();
        double from = 0;
        for (int i = 0; i < names.size() && from < width - NARROWEST; i++) {
            double to = limits.get(i) > width - NARROWEST ? width : limits.get(i);
            if (to > from) {
                strips.add(new Strip(names.get(i), from, to));
            }
            from = Math.max(from, to);
        }
        return strips;
    }
}
