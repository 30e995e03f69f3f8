package broadside.sheet;

import broadside.assess.ItemResult;
import broadside.assess.Limits;
import broadside.assess.Limits.Limit;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.Table;
import broadside.sheet.Block.Tone;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The question turned round: at which gust the checks are used up. Speeds are rounded down. */
final class LimitBlocks {

    private static final String SHORT = "A gust is the peak of about 1 to 3 seconds; a forecast or a reading that is a mean is lower by about a third.";

    /** The line of the answer: the first check to fail. */
    static Optional<Fact> answer(ItemResult item, Format format) {
        return item.limits().flatMap(limits -> limits.first().map(first -> Fact.of("Gust that uses up the first check", format.slow(first.inTheOpen()) + ", 3 s gust at 10 m in the open",
            first.check() + " first; at the item, " + format.length(limits.height()) + " up, " + format.slow(first.atItem()) + "; 10 min mean in the open " + format.slow(first.mean())
                + (first.bySquare() ? "; by the square of the speed, as a least value of the code holds below" : ""))));
    }

    static List<Block> of(Limits limits, Format format, String anchor, int level) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Heading(level, "At which wind the checks are used up", anchor + "limits"));
        if (limits.list().isEmpty()) {
            blocks.add(new Paragraph("No wind was found that uses a check up: see the checks above.", Tone.PLAIN));
            return blocks;
        }
        List<Row> rows = new ArrayList<>();
        Optional<Limit> first = limits.first();
        for (Limit limit : limits.list()) {
            boolean governs = first.filter(limit::equals).isPresent();
            rows.add(new Row(List.of(limit.check(), limit.state().isEmpty() ? "as it is" : limit.state(), format.slow(limit.atItem()), format.slow(limit.inTheOpen()), format.slow(limit.mean()),
                (governs ? "first" : "-") + (limit.bySquare() ? ", by the square" : "")), governs));
        }
        blocks.add(new Table("The wind that blows, not the wind of a year; the factors of each rule are inside", List.of(new Column("Check", false, 6), new Column("Holds for", false, 4),
            new Column("3 s gust at the item, " + format.length(limits.height()), true, 4), new Column("3 s gust at 10 m in the open", true, 4), new Column("10 min mean there", true, 3),
            new Column("Governs", false, 4)), rows));
        if (!limits.changes().isEmpty()) {
            blocks.add(new Table("What would change it, one thing at a time", List.of(new Column("With", false, 9), new Column("3 s gust at 10 m in the open", true, 4), new Column("First check", false, 5)),
                limits.changes().stream().map(c -> new Row(List.of(c.what(), c.first().map(l -> format.slow(l.inTheOpen())).orElse("not found"), c.first().map(Limit::check).orElse("-")), false)).toList()));
        }
        blocks.add(new Paragraph("Found on the same calculation with other winds, for what carries it as named above, wind from the worst side; gusts and means at 10 m by the ratios of Durst for open "
            + "ground, which other publications put up to a sixth apart. " + SHORT + (limits.level().isEmpty() ? "" : " Here: " + limits.level() + ".")
            + " This is no permission to stay: act earlier, and let the engineer set the levels.", Tone.SMALL));
        return blocks;
    }

    /** For those who build and watch. */
    static String comesDown(ItemResult item, Format format) {
        return item.limits().flatMap(limits -> limits.first().map(first -> "well before a 3 s gust of " + format.slow(first.inTheOpen()) + " at 10 m in the open (" + format.slow(first.atItem())
            + " at the item), when " + first.check() + " is used up; the engineer sets the level")).orElse("no gust is worked out here: ask the engineer before anyone relies on one");
    }

    private LimitBlocks() { }
}
