package broadside.panel;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Outer sizes of a post as the wind sees it, in metres.
 *
 * @param width  across the wind that meets the face of the board
 * @param depth  along that wind
 */
public record PostSection(Shape shape, double width, double depth) {

    /** Outline of the section. */
    public enum Shape { ROUND, RECTANGULAR }

    /** CHS 114.3x5, SHS 100x5, RHS 120x80x8: sizes in millimetres; the first size of a rectangular section stands along the wind. */
    private static final Pattern DESIGNATION = Pattern.compile("(CHS|SHS|RHS)\\s*([0-9.]+)\\s*[xX×*]\\s*([0-9.]+)(?:\\s*[xX×*]\\s*([0-9.]+))?.*");

    /** The sizes that a designation tells; nothing when it tells none. */
    public static Optional<PostSection> of(String designation) {
        Matcher found = DESIGNATION.matcher(designation.strip().toUpperCase(Locale.ROOT).replace('X', 'x'));
        if (!found.matches()) {
            return Optional.empty();
        }
        double first = Double.parseDouble(found.group(2)) / 1000;
        return switch (found.group(1)) {
            case "CHS" -> Optional.of(new PostSection(Shape.ROUND, first, first));
            case "SHS" -> Optional.of(new PostSection(Shape.RECTANGULAR, first, first));
            default -> found.group(4) == null ? Optional.empty()
                : Optional.of(new PostSection(Shape.RECTANGULAR, Double.parseDouble(found.group(3)) / 1000, first));
        };
    }
}
