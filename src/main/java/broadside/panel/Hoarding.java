package broadside.panel;

import broadside.quantity.Length;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * A long wall of boards on posts, with or without return corners and gates.
 *
 * @param clearance   gap below the boards
 * @param solidity    solid area over gross area
 * @param returnLeft  length of the return at the left end, zero for a free end
 * @param shelter     factor on the wind by a wall or fence in front that stays there, 1 for none
 * @param gates       openings; an open gate makes two new free ends
 * @param spacing     distance of the posts, where it is known
 * @param held        what carries it
 */
public record Hoarding(String mark, Length length, Length height, Length clearance, double solidity, Length returnLeft,
                       Length returnRight, double shelter, List<Gate> gates, Optional<Length> spacing, Held held, List<Carrying> carrying) implements Item {

    /** A stretch narrower than this comes from binary rounding or is no hoarding, m. */
    private static final double NARROWEST = 0.005;

    /** What carries it: posts with a footing each, or raking braces with ballast. */
    public record Held(PostType posts, Optional<Footing> footing, Optional<Kentledge> kentledge) {

        public static final Held NONE = new Held(PostType.NONE, Optional.empty(), Optional.empty());
    }

    /** An opening; {@code from} is measured from the left end. */
    public record Gate(Length from, Length width) {
        public double end() {
            return from.metres() + width.metres();
        }
    }

    public Hoarding {
        gates = gates.stream().sorted(Comparator.comparing(Gate::from)).toList();
        carrying = List.copyOf(carrying);
    }

    @Override
    public <R> R choose(Kinds<R> kinds) {
        return kinds.hoarding(this);
    }

    @Override
    public String kind() {
        return "hoarding";
    }

    /** An opening between two stretches or at an end, m from the left end; gates side by side are one opening. */
    public record Opening(double from, double to) { }

    /** The openings, from the left. What is left of hoarding beside a gate and is too narrow to stand belongs to the opening. */
    public List<Opening> openings() {
        List<Opening> openings = new ArrayList<>();
        for (Gate gate : gates) {
            double from = gate.from().metres() < NARROWEST ? 0 : gate.from().metres();
            double to = gate.end() > length.metres() - NARROWEST ? length.metres() : gate.end();
            int last = openings.size() - 1;
            if (last >= 0 && from - openings.get(last).to() < NARROWEST) {
                openings.set(last, new Opening(openings.get(last).from(), to));
            } else {
                openings.add(new Opening(from, to));
            }
        }
        return openings;
    }

    /** The stretches between the ends and the gates, from the left. A gate at an end leaves no stretch there. */
    @Override
    public List<Panel> panels() {
        List<double[]> stretches = new ArrayList<>();
        double start = 0;
        for (Opening opening : openings()) {
            if (opening.from() > 0) {
                stretches.add(new double[] {start, opening.from()});
            }
            start = opening.to();
        }
        if (start < length.metres() - NARROWEST) {
            stretches.add(new double[] {start, length.metres()});
        }
        List<Panel> panels = new ArrayList<>();
        for (int i = 0; i < stretches.size(); i++) {
            panels.add(panel(stretches.size() == 1 ? "" : "stretch-" + (i + 1), stretches.get(i)[0], stretches.get(i)[1]));
        }
        return panels;
    }

    /** The whole wall while its gates are shut. */
    public Panel shut() {
        return panel("gates-shut", 0, length.metres());
    }

    private Panel panel(String part, double from, double to) {
        double left = from == 0 ? returnLeft.metres() : 0;
        double right = Math.abs(to - length.metres()) < NARROWEST ? returnRight.metres() : 0;
        return new Panel(part, Panel.Kind.WALL, to - from, height.metres(), clearance.metres(),
            (from + to) / 2 - length.metres() / 2, solidity, left, right, shelter, 1,
            new Panel.AsTyped(from == 0 && to == length.metres() ? length.typed() : "", height.typed(), clearance.typed(), ""));
    }
}
