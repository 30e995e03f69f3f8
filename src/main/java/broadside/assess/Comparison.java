package broadside.assess;

import broadside.panel.Item;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/**
 * One item by every code, all in the wind that is passed once in 50 years, at characteristic level.
 *
 * @param lines  one for each edition, the chosen one first
 * @param gust   how the sources differ over the ratio of a gust to a mean
 */
public record Comparison(Item item, List<Line> lines, Gust gust) {

    /** Ratio of the 3 s gust to the 10 minute mean: the one used, and the smallest and the largest of other sources. */
    public record Gust(double used, double smallest, double largest) { }

    /**
     * The item by one code.
     *
     * @param key       edition
     * @param title     its title
     * @param name      the same in short
     * @param chosen    whether this is the code of the job
     * @param plain     whether it is plain fluid mechanics and no code
     * @param speed     basic speed that was used, m/s
     * @param terrain   terrain class that was used
     * @param how       in one sentence how speed and terrain came about
     * @param found     what it gives; empty when the code does not cover the item
     * @param refusal   why it gives nothing
     * @param why       what is particular to the code, in words
     * @param steps     conversion of the speed
     */
    public record Line(String key, String title, String name, boolean chosen, boolean plain, double speed, String terrain, String how, Optional<Found> found,
                       Optional<ItemResult.Refusal> refusal, String why, Trace steps) { }

    /**
     * What one code gives.
     *
     * @param velocity   velocity pressure, Pa
     * @param pressure   force over gross area in the governing case, Pa
     * @param greatest   greatest pressure of any zone, Pa, without sign
     * @param force      N
     * @param moment     at the foot, N m; 0 where the item has none
     * @param recalled   share of the steps that rest on figures not yet checked against print
     */
    public record Found(double velocity, double pressure, double greatest, double force, double moment, double recalled) {

        /** Everything between the velocity pressure and the load: coefficient, gust and direction factors. */
        public double coefficient() {
            return pressure / velocity;
        }
    }

    public Comparison {
        lines = List.copyOf(lines);
    }

    /** The lines of codes that cover the item, plain fluid mechanics left out. */
    public List<Line> codes() {
        return lines.stream().filter(l -> !l.plain() && l.found().isPresent()).toList();
    }

    /** What plain fluid mechanics says, where it covers the item. */
    public Optional<Line> plain() {
        return lines.stream().filter(l -> l.plain() && l.found().isPresent()).findFirst();
    }

    /** The largest mean pressure of a code over the smallest; empty when fewer than two codes cover the item. */
    public Optional<Double> spread() {
        double most = codes().stream().mapToDouble(l -> l.found().orElseThrow().pressure()).max().orElse(0);
        double least = codes().stream().mapToDouble(l -> l.found().orElseThrow().pressure()).min().orElse(0);
        return codes().size() < 2 ? Optional.empty() : Optional.of(most / least);
    }
}
