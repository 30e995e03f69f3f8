package broadside.panel;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/**
 * One or more boards on one or more posts.
 *
 * @param faces  1, or 2 for a sign that is read from both sides; parallel faces of one box are one board with depth
 */
public record PostSign(String mark, List<Board> boards, int faces, Posts posts, List<Carrying> carrying) implements Item {

    public PostSign {
        boards = List.copyOf(boards);
        carrying = List.copyOf(carrying);
        if (boards.isEmpty()) {
            throw new IllegalArgumentException("a sign needs a board");
        }
    }

    @Override
    public <R> R choose(Function<PostSign, R> postSign, Function<Hoarding, R> hoarding) {
        return postSign.apply(this);
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
            panels.add(boards.get(i).panel(part(i)));
        }
        return panels;
    }

    /** Name of a board in steps and tables: its mark where no other board has it, else its number; empty when it is the only one. */
    public String part(int index) {
        String own = boards.get(index).mark();
        boolean alone = boards.stream().filter(b -> b.mark().equals(own)).count() == 1;
        return boards.size() == 1 ? "" : own.isEmpty() ? Integer.toString(index + 1)
            : alone && !own.chars().allMatch(Character::isDigit) ? own : (index + 1) + " " + own;
    }
}
