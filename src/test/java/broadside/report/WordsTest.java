package broadside.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class WordsTest {

    private static final Lettering LETTERING = new Lettering();

    private static Words words(String text) {
        return new Words(LETTERING).add(text, false);
    }

    private static String text(Words.Line line) {
        StringBuilder out = new StringBuilder();
        for (int i = line.from(); i < line.to(); i++) {
            out.append(line.words().character(i));
        }
        return out.toString();
    }

    private static List<String> lines(String text, double width) {
        return words(text).lines(10, width).stream().map(WordsTest::text).toList();
    }

    @Test
    void breaksBetweenWords() {
        assertThat(lines("the wind on a board", 55)).containsExactly("the wind on", "a board");
        assertThat(lines("", 55)).isEmpty();
        assertThat(lines("  \t\n ", 55)).isEmpty();
        assertThat(lines(" one \n\t two ", 55)).containsExactly("one two");
    }

    @Test
    void keepsAValueWithItsUnit() {
        assertThat(lines("force of 11.4\u00a0kN", 60)).containsExactly("force of", "11.4\u00a0kN");
    }

    @Test
    void breaksALongWordAfterASign() {
        assertThat(lines("https://example.org/abcdefgh", 120)).containsExactly("https://example.org/", "abcdefgh");
        assertThat(lines("iiiiiiiiii", 11)).containsExactly("iiii", "iiii", "ii");
    }

    @Test
    void noLineIsWiderThanItsWidth() {
        Random random = new Random(1);
        for (int i = 0; i < 500; i++) {
            StringBuilder text = new StringBuilder();
            for (int k = random.nextInt(200); k > 0; k--) {
                text.append(random.nextInt(6) == 0 ? ' ' : (char) (33 + random.nextInt(600)));
            }
            double width = 20 + random.nextInt(200);
            Words words = words(text.toString());
            StringBuilder joined = new StringBuilder();
            for (Words.Line line : words.lines(10, width)) {
                assertThat(line.width()).isLessThanOrEqualTo(width);
                assertThat(words(text(line)).wholeWidth(10)).isCloseTo(line.width(), Offset.offset(1e-6));
                joined.append(text(line));
            }
            StringBuilder whole = new StringBuilder();
            words.lines(10, 1e9).forEach(line -> whole.append(text(line)));
            assertThat(joined.toString().replace(" ", "")).isEqualTo(whole.toString().replace(" ", ""));
        }
    }

    @Test
    void subscriptsAreSmaller() {
        double plain = words("qp").wholeWidth(10);
        assertThat(new Words(LETTERING).addFormula("q_p", false).wholeWidth(10)).isLessThan(plain);
        assertThat(words("x\u2082").mark(1)).isEqualTo(Words.LOWERED);
    }

    @Test
    void cutsWithThreeDots() {
        assertThat(text(words("a title that is too long for its place").fitted(9, 80))).endsWith("...")
            .startsWith("a title");
        assertThat(words("a title that is too long for its place").fitted(9, 80).width()).isLessThanOrEqualTo(80);
    }

    @Test
    void replacesWhatTheFontsLack() {
        assertThat(lines("a\ud83d\ude00b\u0001c\ud800d\ue000e\u200bf\u2011g", 500))
            .containsExactly("a\u25a1b\u25a1c\u25a1d\u25a1ef-g");
        assertThat(lines("e\u0301", 500)).containsExactly("\u00e9");
    }

    @Test
    void hebrewIsReordered() {
        assertThat(lines("a \u05d0\u05d1\u05d2 (\u05d3) b", 500)).containsExactly("a (\u05d3) \u05d2\u05d1\u05d0 b");
    }
}
