package broadside.support;

import broadside.panel.Fixings;
import broadside.quantity.Force;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Answers about fixings looked at, and their pull and shear against what was typed as allowable. */
final class FixingChecks {

    private static final String LINEAR = "linear interaction of tension and shear at allowable stress";

    /** Refuses a grid that cannot be. */
    static void sane(Fixings fixings) {
        if (fixings.columns() < 1 || fixings.rows() < 1) {
            throw new UnfitAnswer(fixings.columns() < 1 ? "fixings.columns" : "fixings.rows", "a grid of fixings has at least one column and one row");
        }
        pitch(fixings.columns(), fixings.horizontal(), "fixings.horizontal-pitch", "columns");
        pitch(fixings.rows(), fixings.vertical(), "fixings.vertical-pitch", "rows");
        allowable(fixings.tension(), "fixings.allowable-tension");
        allowable(fixings.shear(), "fixings.allowable-shear");
    }

    private static void pitch(int lines, double pitch, String field, String what) {
        if (lines > 1 && !(pitch > 0)) {
            throw new UnfitAnswer(field, lines + " " + what + " of fixings have a distance above zero between them");
        }
    }

    private static void allowable(Optional<Force> typed, String field) {
        if (typed.isPresent() && !(typed.get().newtons() > 0)) {
            throw new UnfitAnswer(field, "an allowable load is above zero; it is left out where it is not known");
        }
    }

    /**
     * The share of what a fixing can take, recorded as "fixing-utilisation".
     *
     * @param tension  recorded as T_1, N
     * @param shear    recorded as V_1, N
     */
    static List<Check> of(Fixings fixings, double tension, double shear, String named, List<String> remarks, Trace trace) {
        List<Check> checks = new ArrayList<>();
        Optional<Double> most = fixings.tension().map(f -> trace.given("T_a", "allowable tension of one fixing", f.newtons(), "N", f.typed()));
        Optional<Double> slip = fixings.shear().map(f -> trace.given("V_a", "allowable shear of one fixing", f.newtons(), "N", f.typed()));
        if (most.isPresent() && slip.isPresent()) {
            double used = trace.line("fixing-utilisation", "η_f", "tension and shear of the hardest fixing over what is allowed").in("T_1", tension, "N")
                .in("T_a", most.get(), "N")
                .in("V_1", shear, "N").in("V_a", slip.get(), "N").from(LINEAR, Status.READ).gives("T_1 / T_a + V_1 / V_a", tension / most.get()
                + shear / slip.get(), "1");
            double limit = trace.line("fixing-limit", "η_a", "most that the sum may be").from(LINEAR, Status.READ).reads("the whole", 1, "1");
            checks.add(Check.of("fixings", LINEAR, new Check.In("η_f", used), new Check.In("η_a", limit), "1", named, Status.READ, trace));
            return checks;
        }
        most.ifPresent(t -> checks.add(Check.of("fixings in tension", "tension at allowable stress", new Check.In("T_1", tension), new Check.In("T_a", t),
            "N", named,
            Status.DERIVED, trace)));
        slip.ifPresent(v -> checks.add(Check.of("fixings in shear", "shear at allowable stress", new Check.In("V_1", shear), new Check.In("V_a", v), "N", named,
            Status.DERIVED, trace)));
        remark(checks.isEmpty() ? "The fixings are not checked: no allowable loads were given. The pulls are at the level of "
            + "allowable stress, to be held against a pull-out test or the data of the maker."
            : "Tension and shear act together: with one allowable load only, the other and both together are not checked.", remarks);
        return checks;
    }

    static void remark(String text, List<String> remarks) {
        if (!remarks.contains(text)) {
            remarks.add(text);
        }
    }

    private FixingChecks() { }
}
