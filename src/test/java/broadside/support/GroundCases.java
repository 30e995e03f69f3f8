package broadside.support;

import broadside.panel.Footing;
import broadside.quantity.Angle;
import broadside.quantity.Density;
import broadside.quantity.Dimension;
import broadside.quantity.Length;
import broadside.quantity.Measure;
import broadside.quantity.Pressure;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.support.Footings.Request;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Footings as typed, for tests. */
public final class GroundCases {

    public static final TableLibrary LIBRARY = TableLibrary.shipped();
    static final GroundTables TABLES = new GroundTables(LIBRARY);
    public static final Footings FOOTINGS = new Footings(LIBRARY);

    /** Characteristic loads: service as they are, strength 1.5 times. */
    public static final WindLevels LEVELS = new WindLevels(1, 1.5, "levels of the test", Status.DERIVED);
    public static final StabilityRule GLOBAL = new StabilityRule("global", "resisting over overturning at least 1.5", 1, 1, false, 1.5,
        "rule of the test", Status.READ);
    public static final StabilityRule EQU = new StabilityRule("equ", "EN 1990 EQU", 0.9, 1, true, 1, "rule of the test", Status.SECOND_HAND);

    /** A footing of a kind with answers by name: the names of the job file. */
    public static Footing footing(Footing.Kind kind, boolean round, Map<String, String> a) {
        Footing.Soil soil = new Footing.Soil(text(a, "ground"), text(a, "rule"), text(a, "lateral").map(GroundCases::perDepth), text(a,
            "cohesion").map(Pressure::of),
            text(a, "friction-angle").map(Angle::of), text(a, "density").map(Density::of), text(a, "bearing").map(Pressure::of),
            text(a, "friction").map(Double::valueOf), text(a, "factor").map(Double::valueOf));
        Footing.Ground ground = new Footing.Ground(a.containsKey("paved"), a.containsKey("doubled"), a.containsKey("increased"), text(a, "slope"),
            text(a, "water"),
            text(a, "frost").map(Length::of), text(a, "services"));
        return new Footing(kind, round, text(a, "width").map(Length::of), text(a, "length").map(Length::of), text(a, "depth").map(Length::of), soil, ground);
    }

    private static Optional<String> text(Map<String, String> answers, String name) {
        return Optional.ofNullable(answers.get(name));
    }

    static Measure perDepth(String typed) {
        Reading.Value value = (Reading.Value) Typed.read(typed, Dimension.PRESSURE_PER_DEPTH);
        return new Measure(Dimension.PRESSURE_PER_DEPTH, value.si(), typed);
    }

    public static Request request(Footing footing, FootLoad... loads) {
        return new Request(Optional.of(footing), List.of(loads), 1500, 0, LEVELS, GLOBAL, "en", 0.1143, false);
    }

    static FootLoad load(double shear, double moment) {
        return new FootLoad("wind", shear, moment);
    }

    private GroundCases() { }
}
