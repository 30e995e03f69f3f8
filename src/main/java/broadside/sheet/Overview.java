package broadside.sheet;

import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Row;
import java.util.ArrayList;
import java.util.List;

/** One row for each item of a job with several. */
final class Overview {

    static List<Block> of(Assessment assessment, Format format) {
        List<Row> rows = new ArrayList<>();
        for (ItemResult item : assessment.items()) {
            String mark = item.item().mark();
            rows.add(item.loads().map(l -> row(mark, item, l, format)).orElseGet(() ->
                new Row(List.of(mark, item.item().kind(), item.outcome().word(), "-", "-", "-"), false)));
        }
        return List.of(new Block.Heading(2, "All items", "all-items"), new Block.Table("Items of this job; loads at the code's own level",
            List.of(new Column("Mark", false, 2), new Column("Kind", false, 3), new Column("Outcome", false, 3), new Column("Wind force", true, 3),
                new Column("Moment at the foot", true, 4), new Column("Worst post", true, 4)), rows));
    }

    private static Row row(String mark, ItemResult item, Loads loads, Format format) {
        double post = loads.posts().stream().mapToDouble(p -> p.moment()).max().orElse(0);
        return new Row(List.of(mark, item.item().kind(), item.outcome().word(), format.force(loads.governs("base-shear").force()),
            moment(loads, format), post > 0 ? format.moment(post) : "-"), false);
    }

    /** At the ground, or at the wall for what stands on brackets; nothing for what has no foot. */
    private static String moment(Loads loads, Format format) {
        return switch (loads.foot()) {
            case NONE -> "-";
            case WALL -> format.moment(loads.governs("base-moment").baseMoment()) + " at the wall";
            case GROUND -> format.moment(loads.governs("base-moment").baseMoment());
        };
    }

    private Overview() { }
}
