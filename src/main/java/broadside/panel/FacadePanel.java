package broadside.panel;

import broadside.quantity.Length;
import broadside.quantity.Mass;
import java.util.List;
import java.util.Optional;

/**
 * A panel or sign flat on the wall of a building.
 *
 * @param backing         what is behind it
 * @param bottom          height of the lower edge above the ground
 * @param fromCorner      from the nearer vertical corner of the building to the panel
 * @param gap             between the wall and the panel
 * @param depth           thickness, zero where it is not known
 * @param fixings         where they were typed
 */
public record FacadePanel(String mark, Backing backing, Length width, Length height, Length bottom, Length fromCorner, Building building,
                          Optional<Length> gap, Length depth, Optional<Mass> mass, Optional<Fixings> fixings, List<Carrying> carrying) implements Item {

    /** What is behind the panel, with the word used in a job file. */
    public enum Backing {
        /** A solid wall: external pressure only. */
        WALL("wall"),
        /** The panel is the skin of the building: internal pressure acts too. */
        SKIN("skin");

        private final String word;

        Backing(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    public FacadePanel {
        carrying = List.copyOf(carrying);
    }

    @Override
    public <R> R choose(Kinds<R> kinds) {
        return kinds.facadePanel(this);
    }

    @Override
    public String kind() {
        return "facade-panel";
    }

    /** The panel; its middle is measured from the nearer corner of the building. */
    @Override
    public List<Panel> panels() {
        return List.of(new Panel("", Panel.Kind.FACADE, width.metres(), height.metres(), bottom.metres(), fromCorner.metres() + width.metres() / 2, 1,
            0, 0, new Panel.AsTyped(width.typed(), height.typed(), bottom.typed(), "")));
    }

    /** Distance from the farther corner to the panel, m. */
    public double fromFarCorner() {
        return building.width().metres() - fromCorner.metres() - width.metres();
    }
}
