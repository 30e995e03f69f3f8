package broadside.panel;

import broadside.quantity.Length;
import broadside.quantity.Mass;
import java.util.List;
import java.util.Optional;

/**
 * A blade sign on brackets, square to the wall.
 *
 * @param projection  of the board itself, from its inner to its outer edge
 * @param bottom      height of the lower edge above the ground
 * @param gap         between the wall and the inner edge
 * @param depth       thickness, zero where it is not known
 * @param brackets    that carry it, one above the other
 * @param fixings     of each bracket, where they were typed
 */
public record ProjectingSign(String mark, Length projection, Length height, Length bottom, Length gap, Length depth, Optional<Mass> mass,
                             Brackets brackets, Optional<Fixings> fixings, List<Carrying> carrying) implements Item {

    /** Brackets one above the other; one bracket needs no spacing. */
    public record Brackets(int count, Optional<Length> spacing) {

        /** From the lowest to the highest, m. */
        public double spread() {
            return (count - 1) * spacing.map(Length::metres).orElse(0.0);
        }
    }

    public ProjectingSign {
        carrying = List.copyOf(carrying);
    }

    @Override
    public <R> R choose(Kinds<R> kinds) {
        return kinds.projectingSign(this);
    }

    @Override
    public String kind() {
        return "projecting-sign";
    }

    /** The board; its middle is measured from the wall. */
    @Override
    public List<Panel> panels() {
        return List.of(new Panel("", Panel.Kind.BOARD, projection.metres(), height.metres(), bottom.metres(),
            gap.metres() + projection.metres() / 2, 1, 0, 0, new Panel.AsTyped(projection.typed(), height.typed(), bottom.typed(), "")));
    }
}
