package broadside.panel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.quantity.Length;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PostSignTest {

    private static Board board(String mark, double offset) {
        return new Board(mark, Board.Shape.RECTANGLE, Length.metres(3), Length.metres(2), Length.metres(2.5), Length.metres(offset), Length.metres(0.1), 0.9,
            Optional.empty());
    }

    private static PostSign sign(Board... boards) {
        return new PostSign("S1", List.of(boards), new PostSign.Faces(1, 0), new Posts(1, Optional.empty(), Optional.empty()), Optional.empty(), Optional.empty(), List.of());
    }

    @Test
    void oneBoardNeedsNoName() {
        assertThat(sign(board("face", 0.5)).panels()).containsExactly(new Panel("", Panel.Kind.BOARD, 3, 2, 2.5, 0.5, 0.9, 0, 0,
            new Panel.AsTyped("3 m", "2 m", "2.5 m", "0.5 m")));
        assertThat(sign(board("face", 0.5)).part(0)).isEmpty();
        assertThat(sign(board("", 0)).panels().get(0).top()).isEqualTo(4.5);
    }

    @Test
    void severalBoardsAreNamedByTheirMarkOrNumber() {
        PostSign sign = sign(board("top", 0), board("", 0.2), board("arrow", -0.2));
        assertThat(sign.panels()).extracting(Panel::part).containsExactly("top", "2", "arrow");
        assertThat(sign.panels()).extracting(Panel::middle).containsExactly(0.0, 0.2, -0.2);
        assertThat(List.of(sign.part(0), sign.part(1), sign.part(2))).containsExactly("top", "2", "arrow");
    }

    @Test
    void aSignNeedsABoardAndKeepsItsOwnList() {
        assertThatThrownBy(PostSignTest::sign).isInstanceOf(IllegalArgumentException.class);
        List<Board> boards = new ArrayList<>(List.of(board("", 0)));
        PostSign sign = new PostSign("S1", boards, new PostSign.Faces(1, 0), new Posts(1, Optional.empty(), Optional.empty()), Optional.empty(), Optional.empty(), List.of());
        boards.clear();
        assertThat(sign.boards()).hasSize(1);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 7, 20})
    void postsStandEvenlyAboutTheMiddle(int count) {
        List<Double> at = new Posts(count, Optional.of(Length.metres(1.7)), Optional.empty()).positions();
        assertThat(at).hasSize(count);
        for (int i = 0; i < count; i++) {
            assertThat(at.get(i)).isEqualTo(-at.get(count - 1 - i), within(1e-12));
            if (i > 0) {
                assertThat(at.get(i) - at.get(i - 1)).isCloseTo(1.7, within(1e-12));
            }
        }
    }

    @Test
    void onePostNeedsNoSpacing() {
        assertThat(new Posts(1, Optional.empty(), Optional.empty()).positions()).containsExactly(0.0);
        assertThat(new Posts(2, Optional.of(Length.metres(2)), Optional.empty()).positions()).containsExactly(-1.0, 1.0);
    }
}
