package broadside.web;

import broadside.codes.WindCode;
import broadside.job.Field;
import broadside.job.Shapes;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** Which questions about the place belong to every code, and which to some. */
final class SiteFields {

    /** Values of the place that every code is asked with. All others are asked only where the code takes them. */
    private static final Set<String> COMMON = Set.of("name", "basic-speed", "averaging", "return-period", "terrain", "ground-nearby", "terrain-reason", "altitude",
        "topography", "authority-minimum-pressure", "authority-minimum-level", "stands-for");

    /** Values that some codes take in place of a basic speed. */
    static final List<String> IN_PLACE_OF_SPEED = List.of("region", "regional-speed", "wind-zone");

    /** Names of the values of the place that this code does not take; all of them while no code is chosen. */
    static Set<String> foreign(Optional<WindCode> code) {
        Set<String> names = new TreeSet<>();
        Shapes.JOB.field("site").flatMap(Field::shape).orElseThrow().fields().forEach(f -> names.add(f.name()));
        names.removeAll(COMMON);
        code.ifPresent(c -> names.removeAll(c.terms().options()));
        return names;
    }

    private SiteFields() { }
}
