package broadside.panel;

import broadside.quantity.Length;
import java.util.List;

/**
 * A line of temporary fence panels that carry fabric or mesh. The line stands on the ground.
 *
 * @param count           number of panels in the line
 * @param coverSolidity   solid area over gross area of the fabric
 * @param fenceSolidity   the same of the bare fence
 * @param fenceKnown      whether that was given
 * @param shelter         factor on the wind by a wall or fence in front that stays there, 1 for none
 * @param feet            what holds each panel
 */
public record BannerFence(String mark, Length panelLength, Length panelHeight, int count, double coverSolidity, double fenceSolidity, boolean fenceKnown,
                          double shelter, FenceFeet feet, List<Carrying> carrying) implements Item {

    /** Name of the bare line in steps and tables. */
    public static final String BARE = "bare-fence";

    public BannerFence {
        carrying = List.copyOf(carrying);
    }

    @Override
    public <R> R choose(Kinds<R> kinds) {
        return kinds.bannerFence(this);
    }

    @Override
    public String kind() {
        return "banner-fence";
    }

    /** Length of the line, m. */
    public double length() {
        return count * panelLength.metres();
    }

    /** The line with its cover. */
    @Override
    public List<Panel> panels() {
        return List.of(panel(coverSolidity));
    }

    /** The line once the cover is taken down. */
    public Panel bare() {
        return panel(fenceSolidity);
    }

    private Panel panel(double solidity) {
        return new Panel("", Panel.Kind.WALL, length(), panelHeight.metres(), 0, 0, solidity, 0, 0, shelter, 1,
            new Panel.AsTyped("", panelHeight.typed(), "", ""));
    }
}
