package broadside.action;

import broadside.codes.LoadCase.Windward;
import broadside.codes.LoadCase;
import broadside.panel.Panel;
import java.util.List;

/** A panel with the load cases that its code gives for it. */
public record PanelCases(Panel panel, List<LoadCase> cases) {

    public PanelCases {
        cases = List.copyOf(cases);
    }

    /**
     * The case of this panel that goes with a case of the whole item: its own of that name; else its first case where the
     * wind stands square on, its last where it does not.
     */
    LoadCase matching(String name, boolean square, Windward windward) {
        String own = cases.stream().anyMatch(c -> c.name().equals(name)) ? name
            : square ? cases.get(0).name() : cases.get(cases.size() - 1).name();
        LoadCase fallback = null;
        for (LoadCase each : cases) {
            if (each.name().equals(own)) {
                if (each.windward() == windward || each.windward() == Windward.NONE) {
                    return each;
                }
                fallback = fallback == null || each.windward() == Windward.RIGHT ? each : fallback;
            }
        }
        return fallback;
    }
}
