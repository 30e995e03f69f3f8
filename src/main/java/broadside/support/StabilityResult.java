package broadside.support;

import java.util.List;

/**
 * Whether a fence or a hoarding on braces stands, and what it would need.
 *
 * @param panels       one for each wind
 * @param need         of the hardest of them
 * @param perMetre     that need along the line, kg/m
 * @param assumptions  what was taken without having been typed
 * @param remarks      what the reader should know
 */
public record StabilityResult(List<Stand> panels, BallastNeed need, double perMetre, List<String> assumptions, List<String> remarks) {

    /**
     * One panel or post under one wind.
     *
     * @param turns   one for each way in which it can tip
     * @param sliding ratio of friction to force
     */
    public record Stand(PanelWind wind, List<Turn> turns, double sliding, List<Check> checks, BallastNeed need) {

        public Stand {
            turns = List.copyOf(turns);
            checks = List.copyOf(checks);
        }
    }

    /**
     * One way of tipping.
     *
     * @param name    such as "towards the brace"; empty where both ways are alike
     * @param ratio   resisting to overturning moment
     * @param uplift  of the windward foot, N; 0 where it stays down or where there is no brace
     */
    public record Turn(String name, double ratio, double uplift) { }

    public StabilityResult {
        panels = List.copyOf(panels);
        assumptions = List.copyOf(assumptions);
        remarks = List.copyOf(remarks);
    }

    /** The checks of all panels. */
    public List<Check> checks() {
        return panels.stream().flatMap(p -> p.checks().stream()).toList();
    }
}
