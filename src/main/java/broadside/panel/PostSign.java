package broadside.panel;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * One or more boards on one or more posts.
 *
 * @param faces     parallel faces of one box are one board with depth
 * @param footing   of each post, where something was typed
 * @param replaces  the old board on the same posts, where there was one
 */
public record PostSign(String mark, List<Board> boards, Faces faces, Posts posts, Optional<Footing> footing, Optional<Board> replaces, List<Carrying> carrying)
    implements Item {

    /** Name of the old board in steps and tables. */
    public static final String REPLACED = "replaced-board";

    /** Name of the stack of boards as one board in steps and tables. */
    public static final String ENVELOPE = "envelope";

    /** How many faces are read, and the angle between two that open in a V, rad; zero for parallel faces. */
    public record Faces(int count, double opening) { }

    public PostSign {
        boards = List.copyOf(boards);
        carrying = List.copyOf(carrying);
        if (boards.isEmpty()) {
            throw new IllegalArgumentException("a sign needs a board");
        }
    }

    /** The same sign on posts with the outline of a section that was found or chosen. */
    public PostSign with(PostSection outline) {
        return new PostSign(mark, boards, faces, posts.with(outline), footing, replaces, carrying);
    }

    @Override
    public <R> R choose(Kinds<R> kinds) {
        return kinds.postSign(this);
    }

    @Override
    public String kind() {
        return "post-sign";
    }

    /** One panel for each board. With several boards each is named by its mark, or by its number from the first. */
    @Override
    public List<Panel> panels() {
        List<Panel> panels = new ArrayList<>();
        for (int i = 0; i < boards.size(); i++) {
            panels.add(boards.get(i).panel(part(i), posts.count()));
        }
        return panels;
    }

    /** The old board on the same posts. */
    public Optional<Panel> replacedPanel() {
        return replaces.map(b -> b.panel("", posts.count()));
    }

    /** Name of a board in steps and tables: its mark where no other board has it, else its number; empty when it is the only one. */
    public String part(int index) {
        String own = boards.get(index).mark();
        boolean alone = boards.stream().filter(b -> b.mark().equals(own)).count() == 1;
        return boards.size() == 1 ? "" : own.isEmpty() ? Integer.toString(index + 1)
            : alone && !own.chars().allMatch(Character::isDigit) ? own : (index + 1) + " " + own;
    }
}
