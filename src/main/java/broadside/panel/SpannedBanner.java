package broadside.panel;

import broadside.quantity.Length;
import java.util.List;

/**
 * A banner between two supports, with sag.
 *
 * @param width   between its ends
 * @param bottom  height of the lower edge above the ground
 * @param sag     how far its middle bows out in the wind
 */
public record SpannedBanner(String mark, Length width, Length height, Length bottom, Length sag, double solidity, List<Carrying> carrying)
    implements Item {

    public SpannedBanner {
        carrying = List.copyOf(carrying);
    }

    @Override
    public <R> R choose(Kinds<R> kinds) {
        return kinds.spannedBanner(this);
    }

    @Override
    public String kind() {
        return "spanned-banner";
    }

    @Override
    public List<Panel> panels() {
        return List.of(new Panel("", Panel.Kind.BOARD, width.metres(), height.metres(), bottom.metres(), 0, solidity, 0, 0,
            new Panel.AsTyped(width.typed(), height.typed(), bottom.typed(), "")));
    }
}
