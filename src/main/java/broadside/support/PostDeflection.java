package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Deflection of a post under the service wind: a cantilever fixed at the ground, each force at its own height. Beam theory. */
public final class PostDeflection {

    private static final String BEAM = "beam theory: cantilever fixed at the ground";

    /** A limit as a share of a height. */
    private record Limit(Figure share, boolean ofWind) { }

    private final Map<String, Limit> limits = new HashMap<>();
    private final Map<String, String> defaults = new HashMap<>();
    private final List<String> names;

    public PostDeflection(Edition edition) {
        Rows rows = edition.rows("deflection-limits");
        names = List.copyOf(rows.keys());
        names.forEach(key -> limits.put(key, new Limit(Figure.of(rows, key, "share").at(rows.text(key, "place")), rows.text(key, "of").equals("wind"))));
        Rows routes = edition.rows("deflection-defaults");
        routes.keys().forEach(key -> defaults.put(key, routes.text(key, "limit")));
    }

    /** The names of the limits. */
    public List<String> names() {
        return names;
    }

    /** The limit taken on a route where none is chosen. */
    public String standard(String route) {
        return defaults.get(route);
    }

    /** Refuses a name that is no limit. */
    public void known(String name) {
        if (!limits.containsKey(name)) {
            throw new UnfitAnswer("posts.deflection-limit", "\"" + name + "\" is no limit of the deflection; there are " + String.join(", ", names));
        }
    }

    /** Whether a limit is a share of the height of the wind force. */
    boolean ofWind(String name) {
        return limits.get(name).ofWind;
    }

    /** Where a limit stands. */
    public String place(String name) {
        return limits.get(name).share.place();
    }

    /**
     * Wind of one case on one post at the level of service.
     *
     * @param named    the case
     * @param squares  sum of force times the square of its height, N m2, recorded as S_2
     * @param cubes    sum of force times the cube of its height, N m3, recorded as S_3
     * @param lever    height of the wind force, m; used by limits that are a share of it
     */
    public record Bent(String named, double squares, double cubes, double lever) { }

    /**
     * Checks the deflection at a height.
     *
     * @param height   m above the ground, recorded as h_t; not below any of the forces
     * @param modulus  of elasticity, Pa, recorded as E
     * @param inertia  m4, recorded as I
     */
    public Check check(Bent bent, double height, double modulus, double inertia, String limitName, Trace trace) {
        double delta = trace.line("post-deflection", "δ", "deflection at the top of the highest board").in("h_t", height, "m").in("S_2", bent.squares, "N m²")
            .in("S_3", bent.cubes, "N m³").in("E", modulus, "Pa").in("I", inertia, "m⁴").from(BEAM, Status.DERIVED)
            .gives("(3 h_t S_2 - S_3) / (6 E I)", (3 * height * bent.squares - bent.cubes) / (6 * modulus * inertia), "m");
        trace.line("post-rotation", "θ", "rotation there").in("S_2", bent.squares, "N m²").in("E", modulus, "Pa").in("I", inertia, "m⁴").from(BEAM, Status.DERIVED)
            .gives("S_2 / (2 E I)", bent.squares / (2 * modulus * inertia), "rad");
        Limit limit = limits.get(limitName);
        double share = limit.share.into(trace.line("post-deflection-share", "k_δ", "share of the height that is allowed"));
        Trace.Line line = trace.line("post-deflection-limit", "δ_lim", "deflection that is allowed").in("k_δ", share).from(limit.share.place(), limit.share.status());
        double allowed;
        if (limit.ofWind) {
            double lever = trace.line("post-wind-height", "z_F", "height of the wind force").from("statics", Status.DERIVED).reads("moment over shear", bent.lever, "m");
            allowed = line.in("z_F", lever, "m").gives("k_δ z_F", share * lever, "m");
        } else {
            allowed = line.in("h_t", height, "m").gives("k_δ h_t", share * height, "m");
        }
        return Check.of("post deflection", limit.share.place(), new Check.In("δ", delta), new Check.In("δ_lim", allowed), "m", bent.named, limit.share.status(), trace);
    }
}
