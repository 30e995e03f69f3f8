package broadside.action;

import broadside.codes.LoadCase;
import broadside.codes.LoadCase.Windward;
import broadside.codes.PanelSymbols;
import broadside.codes.ZonePressure;
import broadside.panel.Hoarding;
import broadside.panel.Panel;
import broadside.quantity.Length;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Panels, hoardings and load cases made by hand. */
final class Cases {

    static final PanelSymbols SYMBOLS = new PanelSymbols("b", "h", "z_g");

    /** On the ground, the wind on posts not known. */
    static final FootActions.Standing ALONE = new FootActions.Standing("", Foot.GROUND, List.of());

    static Panel board(String part, double width, double height, double clearance, double middle) {
        return new Panel(part, Panel.Kind.BOARD, width, height, clearance, middle, 1, 0, 0, new Panel.AsTyped("", "", "", ""));
    }

    /** One even pressure over the panel, its resultant moved to the right by a shift. */
    static LoadCase even(String name, Panel panel, double pressure, double shift) {
        Windward windward = shift == 0 ? Windward.NONE : shift > 0 ? Windward.RIGHT : Windward.LEFT;
        return new LoadCase(name, name, windward, List.of(new ZonePressure("all", "w", 0, panel.width(), panel.width(), 1, pressure)), shift,
            Optional.empty(), 0, 0);
    }

    /** Zones from the left end: 3 kPa on the first fifth, 1 kPa on the rest. */
    static LoadCase zonedFromLeft(Panel panel) {
        double limit = panel.width() / 5;
        return new LoadCase("wall", "wall", Windward.LEFT, List.of(new ZonePressure("A", "w_A", 0, limit, limit, 3, 3000),
            new ZonePressure("B", "w_B", limit, panel.width(), panel.width() - limit, 1, 1000)), 0, Optional.empty(), 0, 0);
    }

    static List<LoadCase> wall(Panel panel) {
        LoadCase left = zonedFromLeft(panel);
        return List.of(left.mirrored(panel.width()), left);
    }

    static Hoarding hoarding(double length, double... gates) {
        List<Hoarding.Gate> list = new ArrayList<>();
        for (int i = 0; i < gates.length; i += 2) {
            list.add(new Hoarding.Gate(Length.metres(gates[i]), Length.metres(gates[i + 1])));
        }
        return new Hoarding("H1", Length.metres(length), Length.metres(2), Length.metres(0), 1, Length.metres(0), Length.metres(0), 1, list, Optional.empty(),
            Hoarding.Held.NONE, List.of());
    }

    static List<PanelCases> open(Hoarding hoarding) {
        return hoarding.panels().stream().map(p -> new PanelCases(p, wall(p))).toList();
    }

    private Cases() { }
}
