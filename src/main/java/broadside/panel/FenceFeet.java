package broadside.panel;

import broadside.quantity.Force;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import java.util.List;
import java.util.Optional;

/**
 * What holds each panel of a temporary fence, as typed.
 *
 * @param panelMass   of one panel with its cover
 * @param footMass    of the feet of one panel together
 * @param footLength  of a foot across the line, half of it on each side
 * @param blocks      that weigh the panel down; the lever is measured from the line, positive behind the fence
 * @param brace       behind the fence
 * @param surface     what it stands on and how well that grips
 * @param stakes      as typed, with a proof load where one was measured
 */
public record FenceFeet(Optional<Mass> panelMass, Optional<Mass> footMass, Optional<Length> footLength, List<Block> blocks, Optional<Brace> brace, Surface surface,
                        Stakes stakes) {

    /** A block and the distance of its middle from the line of the fence. */
    public record Block(Mass mass, Length lever) { }

    /** A brace: from the line of the fence to its foot, and the mass on that foot. */
    public record Brace(Length lever, Mass mass) { }

    /**
     * The surface.
     *
     * @param ground    name of the surface, such as "grass" or "concrete"
     * @param friction  friction coefficient
     * @param reason    why it may be above 1
     */
    public record Surface(Optional<String> ground, Optional<Double> friction, Optional<String> reason) { }

    /**
     * Stakes of one panel.
     *
     * @param words      as typed
     * @param proofLoad  pull that each was proved to hold, along the pull
     * @param count      stakes that hold one panel against each direction
     */
    public record Stakes(Optional<String> words, Optional<Force> proofLoad, Optional<Integer> count) { }

    public FenceFeet {
        blocks = List.copyOf(blocks);
    }
}
