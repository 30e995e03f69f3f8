package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/** Which European timber grade a name tells: C24, D30, GL24h. An American grade has no such name. */
final class TimberFamilies {

    private final Map<String, Figure> factors = new HashMap<>();

    TimberFamilies(Edition edition) {
        Rows rows = edition.rows("timber-families");
        rows.keys().forEach(key -> factors.put(key, Figure.of(rows, key, "gamma-m")));
    }

    /** The partial factor of the family of a grade; nothing when the name tells no European grade. */
    Optional<Figure> factor(Grade grade) {
        String name = grade.name().strip();
        int letters = 0;
        while (letters < name.length() && Character.isLetter(name.charAt(letters))) {
            letters++;
        }
        boolean numbered = letters < name.length() && Character.isDigit(name.charAt(letters));
        return numbered ? Optional.ofNullable(factors.get(name.substring(0, letters))) : Optional.empty();
    }
}
