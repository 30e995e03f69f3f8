package broadside.job;

import java.util.List;

/** The answers to "what is it fixed to?"; those that are outside the scope stand in the table of the tool's own rules. */
final class HeldBy {

    /** In the order in which they are offered. */
    static final List<String> WORDS = List.of("own posts", "its own feet", "building wall", "own supports", "existing post", "existing wall", "existing fence",
        "parapet", "roof", "lamp column", "scaffold", "tree", "stage or screen");

    private HeldBy() { }
}
