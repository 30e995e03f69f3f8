package broadside.assess;

import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.table.Coefficient;
import broadside.table.Rows;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Boards one above the other that stand so close that the wind may see them as one: a rule of this tool. Boards whose
 * gap is not larger than a share of the smaller height of the two, and that overlap across, become the closed rectangle around them.
 */
final class Stack {

    /** The panels of the item with close boards joined; nothing when no two boards stand close. */
    static Optional<List<Panel>> of(PostSign sign, Rows rule, Trace sheet) {
        if (sign.boards().size() < 2) {
            return Optional.empty();
        }
        Coefficient share = rule.number("stack-gap", "value");
        double most = share.value();
        List<List<Panel>> groups = new ArrayList<>();
        for (Panel panel : sign.panels().stream().sorted(Comparator.comparingDouble(Panel::clearance)).toList()) {
            List<List<Panel>> joined = groups.stream().filter(g -> g.stream().anyMatch(p -> close(p, panel, most))).toList();
            List<Panel> group = new ArrayList<>(List.of(panel));
            joined.forEach(group::addAll);
            groups.removeAll(joined);
            groups.add(group);
        }
        if (groups.stream().allMatch(g -> g.size() == 1)) {
            return Optional.empty();
        }
        share.into(sheet.line("stack-gap", "k_s", "boards count as one when the gap between them is at most this share of the smaller height"));
        List<Panel> panels = new ArrayList<>();
        int number = 0;
        for (List<Panel> group : groups) {
            number++;
            panels.add(around(group, groups.size() == 1 ? "" : group.size() == 1 ? group.get(0).part() : "group-" + number));
        }
        return Optional.of(panels);
    }

    private static boolean close(Panel a, Panel b, double share) {
        boolean across = Math.abs(a.middle() - b.middle()) < (a.width() + b.width()) / 2;
        double gap = Math.max(a.clearance(), b.clearance()) - Math.min(a.top(), b.top());
        return across && gap <= share * Math.min(a.height(), b.height()) + 1e-9;
    }

    private static Panel around(List<Panel> group, String part) {
        if (group.size() == 1) {
            Panel p = group.get(0);
            return new Panel(part, p.kind(), p.width(), p.height(), p.clearance(), p.middle(), p.solidity(), 0, 0, 1, p.sharers(), p.typed());
        }
        double left = group.stream().mapToDouble(p -> p.middle() - p.width() / 2).min().orElseThrow();
        double right = group.stream().mapToDouble(p -> p.middle() + p.width() / 2).max().orElseThrow();
        double bottom = group.stream().mapToDouble(Panel::clearance).min().orElseThrow();
        double top = group.stream().mapToDouble(Panel::top).max().orElseThrow();
        return new Panel(part, Panel.Kind.BOARD, right - left, top - bottom, bottom, (left + right) / 2, 1, 0, 0, 1,
            group.get(0).sharers(), new Panel.AsTyped("", "", "", ""));
    }

    private Stack() { }
}
