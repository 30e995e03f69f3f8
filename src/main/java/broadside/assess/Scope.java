package broadside.assess;

import broadside.assess.ItemResult.Refusal;
import broadside.panel.Item;
import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.table.Rows;
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

    /** A size beyond those this tool is meant for, in words; the loads are then loads only. */
    Optional<Note> size(Item item) {
        double top = item.panels().stream().mapToDouble(Panel::top).max().orElse(0);
        double area = item.panels().stream().mapToDouble(Panel::area).sum();
        double most = sizes.number(item.kind(), "top").value();
        if (top > most) {
            return Optional.of(beyond("its upper edge lies above " + sizes.text(item.kind(), "top") + " m"));
        }
        boolean tooLarge = sizes.isPrinted(item.kind(), "area") && area > sizes.number(item.kind(), "area").value();
        return tooLarge ? Optional.of(beyond("its area is above " + sizes.text(item.kind(), "area") + " m2")) : Optional.empty();
    }

    private static Note beyond(String what) {
        return new Note(Note.Kind.CAUTION, "Larger than the small works that this tool is meant for: " + what + ". The loads are loads only; an engineer is needed with full drawings.");
    }

    private Outside row(String key) {
        return new Outside(new Refusal("", key, rows.text(key, "reason"), rows.text(key, "send")), !rows.text(key, "shown").equals("nothing"));
    }
}
