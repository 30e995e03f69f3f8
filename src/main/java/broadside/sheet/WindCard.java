package broadside.sheet;

import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.Limits;
import broadside.assess.Limits.Limit;
import broadside.crew.ActionLevels;
import broadside.quantity.Dimension;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Units;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * What a crew reads at arm's length: the limiting gust of each structure and the levels below it. The structure that must
 * come down first stands first.
 *
 * @param place  where it stands
 * @param made   name and version of the tool and the digest of its tables
 */
public record WindCard(String title, String place, String date, List<Structure> structures, String made) {

    /** What a drawing shows begins with the views of it. */
    private static final String OF = " of ";

    /**
     * One structure.
     *
     * @param limit   figure and unit of the limiting gust in large type; empty where there is none, and {@code words} says why
     * @param words   in which other units, where and by what
     * @param unsafe  does not even stand in the wind that it was assessed for
     */
    public record Structure(String mark, String what, String limit, String unit, String words, boolean unsafe, List<Rung> rungs) { }

    /** One level: its action, the gust at which it begins and the mean that goes with it; a share is one of the speed, which is the safer reading. */
    public record Rung(String name, String action, String gust, String mean, String share) { }

    public static WindCard of(Assessment assessment, ActionLevels levels, String date) {
        Units units = assessment.job().units();
        Format format = new Format(units);
        List<ItemResult> items = new ArrayList<>(assessment.items());
        items.sort(Comparator.comparingDouble(i -> i.limits().flatMap(Limits::first).map(Limit::inTheOpen).orElse(Double.MAX_VALUE)));
        return new WindCard(assessment.job().head("title").orElse("Wind card"), assessment.job().site().name().isBlank() ? assessment.job().head("address").orElse("")
            : assessment.job().site().name(), assessment.job().head("date").orElse(date), items.stream().map(i -> structure(i, levels, units, format)).toList(), assessment.about().line());
    }

    private static Structure structure(ItemResult item, ActionLevels levels, Units units, Format format) {
        String drawn = ItemDrawing.words(item.item(), Optional.empty(), units);
        String what = drawn.substring(drawn.indexOf(OF) + OF.length());
        Optional<Limit> first = item.limits().flatMap(Limits::first);
        if (first.isEmpty()) {
            return new Structure(item.item().mark(), what, "", "", "No limiting wind was found for it: nothing that carries it was checked. Ask the engineer.", true, List.of());
        }
        Limit limit = first.get();
        var shown = Show.of(limit.inTheOpen(), Dimension.SPEED, units, 3, Rounding.DOWN);
        String other = Show.of(limit.inTheOpen(), Dimension.SPEED, units == Units.US ? Units.METRIC : Units.US, 3, Rounding.DOWN).text();
        String words = other + ", " + kilometres(limit.inTheOpen()) + ". 3 s gust at 10 m above open ground; at the structure, " + format.length(item.limits().orElseThrow().height()) + " up, "
            + format.slow(limit.atItem()) + ". Then " + limit.check() + " is used up.";
        List<Rung> rungs = levels.of(limit.inTheOpen(), Optional.empty(), new Trace()).stream().map(l -> rung(l, limit, units)).toList();
        return new Structure(item.item().mark(), what, shown.number(), shown.unit(), words, limit.multiple() < 1, rungs);
    }

    private static Rung rung(ActionLevels.Level level, Limit limit, Units units) {
        int colon = level.action().indexOf(':');
        String mean = speed(level.share() * limit.mean(), units);
        return new Rung(level.action().substring(0, Math.max(0, colon)), level.action().substring(colon + 1).strip(), speed(level.bySpeed(), units), mean,
            Math.round(100 * level.share()) + " % of the limiting gust, " + Math.round(100 * level.loadBySpeed()) + " % of the load; as a share of the load it "
                + "would be " + speed(level.byLoad(), units));
    }

    private static String speed(double metresPerSecond, Units units) {
        return Show.of(metresPerSecond, Dimension.SPEED, units, 3, Rounding.DOWN).text();
    }

    private static String kilometres(double metresPerSecond) {
        return String.format(Locale.ROOT, "%d km/h", (long) Math.floor(metresPerSecond * 3600 / 1000));
    }
}
