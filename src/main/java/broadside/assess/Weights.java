package broadside.assess;

import broadside.panel.PostSign;
import broadside.quantity.Mass;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;

/** Weights from masses. */
final class Weights {

    /** Standard acceleration of free fall, m/s2. */
    private static final double G = 9.80665;

    /** Weight of the boards, N, and its moment in their plane; zero where no mass was given. */
    static double boards(PostSign sign, Trace sheet) {
        if (sign.boards().stream().allMatch(b -> b.mass().isEmpty())) {
            return 0;
        }
        double mass = sign.boards().stream().mapToDouble(b -> b.mass().map(Mass::kilograms).orElse(0.0)).sum();
        double aside = sign.boards().stream().mapToDouble(b -> b.mass().map(Mass::kilograms).orElse(0.0) * b.offset().metres()).sum();
        double weight = weight(mass, "mass of the boards", sheet);
        double arm = sheet.line("self-weight-arm", "x_W", "centre of mass from the middle of the posts, to the right").from("statics", Status.DERIVED)
            .reads("from the masses and offsets of the boards", mass == 0 ? 0 : aside / mass, "m");
        sheet.line("self-weight-moment", "M_W", "moment of the weight in the plane of the boards, about the middle of the posts")
            .in("W", weight, "N").in("x_W", arm, "m").from("statics", Status.DERIVED).gives("W x_W", weight * arm, "N m");
        return weight;
    }

    /** Weight of one mass, N; zero where it was not given. */
    static double of(Optional<Mass> mass, String what, Trace sheet) {
        return mass.map(m -> weight(m.kilograms(), what, sheet)).orElse(0.0);
    }

    /** Weight of a mass in kg, N. */
    static double newtons(double mass) {
        return mass * G;
    }

    private static double weight(double mass, String what, Trace sheet) {
        sheet.given("m", what, mass, "kg", "");
        sheet.given("g_n", "standard acceleration of free fall", G, "m/s²", "");
        return sheet.line("self-weight", "W", "weight, from the " + what).in("m", mass, "kg").in("g_n", G, "m/s²")
            .from("standard acceleration of free fall", Status.RECALLED).gives("m g_n", mass * G, "N");
    }

    private Weights() { }
}
