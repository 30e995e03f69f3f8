package broadside.action;

import broadside.aero.LineLoad;
import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.codes.ZonePressure;
import broadside.panel.Hoarding;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Moments of a hoarding's posts: each carries the boards half-way to its neighbours, in the zones that lie there; a post
 * beside a gate also carries half of the shut leaf, at the pressure of the zone beside it.
 */
public final class HoardingPosts {

    private static final String STATICS = "statics: each post carries half of the bays beside it";

    /** One post of a stretch: its place and the boards that it carries, in metres from the left end of the stretch. */
    private record Bay(int panel, double at, double from, double to, double gate) { }

    /** Works out every post in every combination, keeps the worst of each, and records the worst of each zone. */
    public static List<PostAction> of(Hoarding hoarding, double spacing, List<FootActions.Combined> combinations, Trace trace) {
        List<Combination> all = combinations.stream().map(FootActions.Combined::combination).toList();
        List<PostAction> posts = new ArrayList<>();
        List<Worst> worst = new ArrayList<>();
        for (Bay bay : bays(hoarding, all.get(0), spacing)) {
            Worst found = all.stream().map(c -> share(c, bay)).max(Comparator.comparingDouble(Worst::moment)).orElseThrow();
            worst.add(found);
            PanelForce panel = found.panel();
            double left = panel.panel().middle() - panel.panel().width() / 2 + hoarding.length().metres() / 2;
            posts.add(new PostAction(posts.size() + 1, left + bay.at(), found.zone(), bay.gate(), Optional.of(bay.to() - bay.from()),
                found.combination().name(), found.force(), found.moment()));
        }
        record(posts, worst, trace);
        return posts;
    }

    private static List<Bay> bays(Hoarding hoarding, Combination any, double spacing) {
        List<Bay> bays = new ArrayList<>();
        double half = hoarding.length().metres() / 2;
        for (int i = 0; i < any.panels().size(); i++) {
            double width = any.panels().get(i).panel().width();
            double left = any.panels().get(i).panel().middle() - width / 2 + half;
            List<Double> at = positions(width, spacing);
            for (int k = 0; k < at.size(); k++) {
                double from = k == 0 ? 0 : (at.get(k - 1) + at.get(k)) / 2;
                double to = k == at.size() - 1 ? width : (at.get(k) + at.get(k + 1)) / 2;
                double gate = (k == 0 ? leaf(hoarding, left) : 0) + (k == at.size() - 1 ? leaf(hoarding, left + width) : 0);
                bays.add(new Bay(i, at.get(k), from, to, gate));
            }
        }
        return bays;
    }

    /** Posts from the left end at the spacing, and one at the right end. */
    static List<Double> positions(double width, double spacing) {
        List<Double> at = new ArrayList<>();
        int whole = (int) Math.floor(width / spacing + 1e-9);
        for (int i = 0; i <= whole; i++) {
            at.add(Math.min(i * spacing, width));
        }
        if (width - at.get(at.size() - 1) > 1e-6) {
            at.add(width);
        }
        return at;
    }

    private static double leaf(Hoarding hoarding, double edge) {
        for (Hoarding.Gate gate : hoarding.gates()) {
            if (Math.abs(gate.from().metres() - edge) < 1e-9 || Math.abs(gate.end() - edge) < 1e-9) {
                return gate.width().metres() / 2;
            }
        }
        return 0;
    }

    /** A post in one combination. */
    private record Worst(Combination combination, PanelForce panel, Bay bay, String zone, double boards, double leaf) {
        double force() {
            return boards + leaf;
        }

        double moment() {
            return force() * panel.height();
        }
    }

    private static Worst share(Combination combination, Bay bay) {
        PanelForce panel = combination.panels().get(bay.panel());
        LineLoad line = panel.line();
        double width = panel.panel().width();
        double edge = Math.min(0.01, width / 100);
        double beside = bay.at() < width / 2 ? line.force(0, edge) / edge : line.force(width - edge, width) / edge;
        return new Worst(combination, panel, bay, zone(panel, bay.at()), line.force(bay.from(), bay.to()), bay.gate() * beside);
    }

    private static String zone(PanelForce panel, double at) {
        List<ZonePressure> zones = panel.load().zones();
        boolean right = panel.load().windward() == Windward.RIGHT;
        for (int i = 0; i < zones.size(); i++) {
            ZonePressure zone = zones.get(right ? zones.size() - 1 - i : i);
            if (at >= zone.from() - 1e-9 && at <= zone.to() + 1e-9) {
                return zone.zone();
            }
        }
        return zones.get(0).zone();
    }

    private static void record(List<PostAction> posts, List<Worst> worst, Trace trace) {
        Map<String, Integer> byZone = new LinkedHashMap<>();
        int most = 0;
        for (int i = 0; i < worst.size(); i++) {
            byZone.merge(worst.get(i).zone(), i, (a, b) -> worst.get(b).moment() > worst.get(a).moment() ? b : a);
            most = worst.get(i).moment() > worst.get(most).moment() ? i : most;
        }
        byZone.values().forEach(i -> recordOne(posts.get(i), worst.get(i), "/" + worst.get(i).zone(), trace));
        recordOne(posts.get(most), worst.get(most), "", trace);
    }

    private static void recordOne(PostAction post, Worst worst, String zone, Trace trace) {
        Trace.Line line = trace.line("post-shear" + zone, "V_p", "shear at the foot of post " + post.post() + ", case " + worst.combination().name())
            .from(STATICS, Status.DERIVED);
        StringBuilder formula = new StringBuilder();
        double h = worst.panel().panel().height();
        boolean plain = worst.panel().load().shift() == 0 && worst.panel().load().least() == 0;
        if (plain) {
            for (ZonePressure z : worst.panel().load().zones()) {
                double t = Strip.overlap(worst.bay().from(), worst.bay().to(), z.from(), z.to());
                if (t > 0) {
                    String width = "t_{" + z.zone() + "}";
                    line.in(z.symbol(), z.pressure(), "Pa").in(width, t, "m");
                    formula.append(formula.isEmpty() ? "" : " + ").append(z.symbol()).append(' ').append(width);
                }
            }
            line.in("h", h, "m");
            if (worst.leaf() > 0) {
                line.in("F_g", worst.leaf(), "N");
            }
        }
        String text = "(" + formula + ") h" + (worst.leaf() > 0 ? " + F_g" : "");
        double shear = plain ? line.gives(text, worst.force(), "N")
            : line.reads("line load of the case over the boards that the post carries" + (worst.leaf() > 0 ? " and half of the gate" : ""),
                worst.force(), "N");
        double z = worst.panel().height();
        trace.line("post-moment" + zone, "M_p", "moment at the foot of post " + post.post() + ", case " + worst.combination().name())
            .in("V_p", shear, "N").in("z_F", z, "m").from(STATICS, Status.DERIVED).gives("V_p z_F", shear * z, "N m");
    }

    /** Sums of the posts' shears, N, and moments, N m, in one combination, boards only. */
    public static double[] sums(FootActions.Combined combined, Hoarding hoarding, double spacing) {
        double shear = 0;
        double moment = 0;
        for (Bay bay : bays(hoarding, combined.combination(), spacing)) {
            Worst one = share(combined.combination(), bay);
            shear += one.boards();
            moment += one.boards() * one.panel().height();
        }
        return new double[] {shear, moment};
    }

    private HoardingPosts() { }
}
