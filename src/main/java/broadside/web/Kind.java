package broadside.web;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * A kind of item in the words of the pages, in the order in which kinds are offered.
 *
 * @see broadside.job.Shapes#KINDS
 */
public enum Kind {

    POST_SIGN("post-sign", "A sign on posts", "One or more boards on one or more posts", "S", List.of("own posts")),
    HOARDING("hoarding", "A site hoarding", "A long wall of boards that stands on the ground", "H", List.of("own posts", "its own feet")),
    BANNER_FENCE("banner-fence", "A banner fence", "A line of temporary fence panels that carries fabric or mesh", "F", List.of("its own feet")),
    FACADE_PANEL("facade-panel", "A panel on a wall", "A board or panel flat on the wall of a building", "P", List.of("building wall")),
    PROJECTING_SIGN("projecting-sign", "A blade sign", "A board that stands out from a wall on brackets", "B", List.of("building wall")),
    SPANNED_BANNER("spanned-banner", "A banner between supports", "A length of fabric held at both ends, with sag", "N", List.of("own supports", "building wall"));

    private final String key;
    private final String words;
    private final String line;
    private final String letter;
    private final List<String> heldBy;

    Kind(String key, String words, String line, String letter, List<String> heldBy) {
        this.key = key;
        this.words = words;
        this.line = line;
        this.letter = letter;
        this.heldBy = heldBy;
    }

    static Optional<Kind> of(String key) {
        return Arrays.stream(values()).filter(k -> k.key.equals(key)).findFirst();
    }

    /** As written in a job file. */
    public String key() {
        return key;
    }

    /** Its name with its article: "A sign on posts". */
    public String words() {
        return words;
    }

    /** What it is, in one line. */
    public String line() {
        return line;
    }

    /** "sign on posts". */
    String plain() {
        return words.substring(2);
    }

    /** "Add a sign on posts". */
    String add() {
        return "Add " + words.substring(0, 1).toLowerCase(Locale.ROOT) + words.substring(1);
    }

    /** A mark for the item with a number in its job. */
    String mark(int number) {
        return letter + number;
    }

    /** What it can be fixed to inside the scope of this tool, in the words of a job file. */
    List<String> heldBy() {
        return heldBy;
    }
}
