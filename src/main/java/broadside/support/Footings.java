package broadside.support;

import broadside.panel.Footing;
import broadside.quantity.Show;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The footing of the worst post of an item: sized where its depth or the width of its pad is not typed, checked otherwise. */
public final class Footings {

    private static final String EN = "en";
    private static final Footing USUAL = new Footing(Footing.Kind.PLANTED, true, Optional.empty(), Optional.empty(), Optional.empty(), Footing.Soil.UNKNOWN,
        Footing.Ground.UNKNOWN);

    private final GroundTables tables;

    /**
     * What has to be held.
     *
     * @param footing    as typed; empty for the usual one, sized
     * @param loads      of the worst post, one or more
     * @param weight     permanent, at the foot, N
     * @param torsion    greatest at the foot, at the level of the code, N m
     * @param rule       of stability, for a pad
     * @param route      "en", "us-asd" or "us-strength": the rule for ground that is not known
     * @param postWidth  of the post, m
     * @param feet       whether sizes that are chosen are in feet and inches
     */
    public record Request(Optional<Footing> footing, List<FootLoad> loads, double weight, double torsion, WindLevels levels, StabilityRule rule, String route,
                          double postWidth, boolean feet) {

        public Request {
            loads = List.copyOf(loads);
            if (loads.isEmpty()) {
                throw new IllegalArgumentException("a footing needs a load");
            }
        }

        /** A size of the tables that is chosen in the units of the job. */
        Known size(GroundTables tables, String key) {
            return tables.size(feet ? key + "-us" : key);
        }

        /** A size in words. */
        String words(double metres) {
            return feet ? Show.feetInches(metres) : Math.round(metres * 1000) + " mm";
        }

        /** The loads that no other exceeds in both shear and moment: more of either never helps a footing. */
        List<FootLoad> worst() {
            List<FootLoad> worst = new ArrayList<>(loads.size());
            for (FootLoad load : loads) {
                if (worst.stream().noneMatch(w -> covers(w, load))) {
                    worst.removeIf(w -> covers(load, w));
                    worst.add(load);
                }
            }
            return worst;
        }

        private static boolean covers(FootLoad more, FootLoad less) {
            return more.shear() >= less.shear() && more.moment() >= less.moment();
        }
    }

    public Footings(TableLibrary tables) {
        this.tables = new GroundTables(tables);
    }

    /**
     * Sizes or checks the footing and records what was chosen.
     *
     * @throws UnfitAnswer for an answer that fits no rule
     * @throws NoAnswer    when no size holds the loads, or nothing is known of the ground
     */
    public FootingResult hold(Request request, Trace trace) {
        List<Assumed> assumed = new ArrayList<>();
        List<String> remarks = new ArrayList<>();
        Footing footing = request.footing().orElse(USUAL);
        FootingRules rules = new FootingRules(tables, footing.soil(), footing.ground(), request.route().equals(EN), assumed);
        if (request.footing().isEmpty()) {
            assumed.add(new Assumed("No footing was given: the post is assumed to be planted in concrete."));
        }
        if (rules.isBadGround()) {
            assumed.add(new Assumed("This ground has no presumptive values: the typed values must come from tests, and what lies below must be looked at.", true));
        }
        FootingResult result = footing.kind() == Footing.Kind.PAD ? new PadFooting(tables, rules, footing, request, assumed, remarks).hold(trace)
            : new ShaftFooting(tables, rules, footing, request, assumed, remarks).hold(trace);
        if (request.torsion() > 0) {
            trace.line("footing-torsion", "T_f", "torsion at the foot, at the level of the code")
                .from("taken over from the loads of the post", Status.DERIVED).reads("greatest of all cases", request.torsion(), "N m");
            remarks.add("Torsion of the footing is shown and not checked.");
        }
        return new FootingResult(result.kind(), result.rule(), result.sized(), result.round(), result.depth(), result.width(), result.length(),
            result.concrete(),
            result.checks(), assumed, remarks);
    }

    /** Records the loads of one case at the ground, at the level of the code, under "V_f" and "M_f". */
    static FootLoad recorded(FootLoad load, Trace trace) {
        String from = "taken over from the loads of the post";
        double shear = trace.line("footing-shear", "V_f", "shear at the ground, at the level of the code").from(from, Status.DERIVED)
            .reads("case " + load.named(), load.shear(), "N");
        double moment = trace.line("footing-moment", "M_f", "moment at the ground, at the level of the code").from(from, Status.DERIVED)
            .reads("case " + load.named(), load.moment(), "N m");
        return new FootLoad(load.named(), shear, moment);
    }

    /** A typed length above zero. */
    static double above(String field, double least, double value, String what) {
        if (!(value > 0) || value < least) {
            throw new UnfitAnswer("footing." + field, what);
        }
        return value;
    }
}
