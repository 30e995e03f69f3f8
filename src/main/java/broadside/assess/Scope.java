package broadside.assess;

import broadside.assess.ItemResult.Refusal;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.table.Rows;
import java.util.List;
import java.util.Optional;

/** What lies outside the scope of this tool: what an item is fixed to, faces that open in a V, sizes beyond small works. */
public final class Scope {

    private final Rows rows;
    private final Rows sizes;

    /** An item outside the scope; loads may still be shown, never a check of what holds it. */
    record Outside(Refusal refusal, boolean showsLoads) { }

    Scope(Rows rows, Rows sizes) {
        this.rows = rows;
        this.sizes = sizes;
    }

    /** The answers to "what is it fixed to?" that are outside the scope. */
    public static List<String> words(Rows rows) {
        return rows.keys();
    }

    Optional<Outside> of(Job job, Item item) {
        if (item instanceof PostSign sign && sign.faces().opening() > 0) {
            return Optional.of(row("v-shaped faces"));
        }
        Optional<String> heldBy = job.remark(item.mark(), "held-by").filter(rows::has);
        if (heldBy.filter("existing post"::equals).isPresent() && item instanceof PostSign sign && sign.posts().section().isPresent()) {
            return Optional.empty();
        }
        return heldBy.map(this::row);
    }

    private Outside row(String key) {
        return new Outside(new Refusal("", key, rows.text(key, "reason"), rows.text(key, "send")), !rows.text(key, "shown").equals("nothing"));
    }
}
