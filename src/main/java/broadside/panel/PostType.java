package broadside.panel;

import java.util.Optional;

/**
 * What the posts are made of, as typed.
 *
 * @param section     designation such as "CHS 114.3x5", or empty or "auto" to have one chosen
 * @param series      series that a section is chosen from, such as "chs-hot"; empty for those of the rules in use
 * @param grade       material grade
 * @param deflection  name of the limit on the deflection
 * @param duration    class of load duration of timber, "short" or "instantaneous"
 */
public record PostType(Optional<String> section, Optional<String> series, Optional<String> grade, Optional<String> deflection, Optional<String> duration) {

    /** The word for a section that is to be chosen. */
    public static final String AUTO = "auto";

    /** Nothing typed. */
    public static final PostType NONE = new PostType(Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());

    /** Whether a section was typed that has to be checked. */
    public boolean typed() {
        return section.filter(s -> !s.equalsIgnoreCase(AUTO)).isPresent();
    }

    /** Whether it was asked to choose a section, so that it counts in the loads too. */
    public boolean auto() {
        return section.filter(s -> s.equalsIgnoreCase(AUTO)).isPresent();
    }
}
