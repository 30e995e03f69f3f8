package broadside.action;

import broadside.aero.LineLoad;
import broadside.aero.Strip;
import broadside.codes.LoadCase.Windward;
import broadside.codes.LoadCase;
import broadside.codes.PanelSymbols;
import broadside.codes.ZonePressure;
import broadside.panel.Hoarding;
import broadside.panel.Panel;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Moments of a hoarding's posts: each carries the boards half-way to its neighbours, in the zones that lie there. With
 * gates both states count: open, where each gate makes two free ends, and shut, where the leaf hangs on the posts beside it.
 */
public final class HoardingPosts {

    private static final String STATICS = "statics: each post carries half of the bays beside it";

    /** One post and the boards that it carries, m from the left end of the hoarding; {@code leaf} is its half of a gate. */
    private record Bay(int stretch, double at, double from, double to, double leafLeft, double leafRight) {
        double leaf() {
            return leafLeft + leafRight;
        }
    }

    /** A panel in one case, its load along it, and the place of its left edge, m from the left end of the hoarding. */
    private record Placed(PanelForce panel, LineLoad line, double left, boolean shut) { }

    /** A post in one case. */
    private record Share(Placed placed, Bay bay, String zone, double from, double to, double force) {
        double moment() {
            return force * placed.panel().height();
        }

        String named() {
            return placed.panel().load().name();
        }
    }

    /**
     * Works out every post in every case, keeps the worst of each, and records the worst of each zone.
     *
     * @param shut  the cases of the whole wall while its gates are shut; empty without gates
     */
    public static List<PostAction> of(Hoarding hoarding, double spacing, List<PanelCases> open, Optional<PanelCases> shut, PanelSymbols symbols,
                                       Trace trace) {
        List<PostAction> posts = new ArrayList<>();
        List<Share> worst = new ArrayList<>();
        List<List<Placed>> stretches = open.stream().map(stretch -> placed(hoarding, stretch, false)).toList();
        List<Placed> whole = shut.map(s -> placed(hoarding, s, true)).orElse(List.of());
        for (Bay bay : bays(hoarding, spacing)) {
            Share most = shares(bay, stretches.get(bay.stretch()), whole).stream().max(Comparator.comparingDouble(Share::moment)).orElseThrow();
            worst.add(most);
            posts.add(new PostAction(posts.size() + 1, bay.at(), most.zone(), most.placed().shut() ? bay.leaf() : 0,
                Optional.of(bay.to() - bay.from()), "", most.named(), most.force(), most.named(), most.moment()));
        }
        record(posts, worst, symbols, trace);
        return posts;
    }

    private static List<Share> shares(Bay bay, List<Placed> stretch, List<Placed> whole) {
        List<Share> shares = new ArrayList<>();
        stretch.forEach(placed -> shares.add(share(placed, bay, bay.from(), bay.to())));
        whole.forEach(placed -> shares.add(share(placed, bay, bay.from() - bay.leafLeft(), bay.to() + bay.leafRight())));
        return shares;
    }

    /** The cases of a stretch that tell how pressure is spread along it, each in its place. */
    private static List<Placed> placed(Hoarding hoarding, PanelCases stretch, boolean shut) {
        return spread(stretch).stream().map(load -> placed(hoarding, stretch.panel(), load, shut)).toList();
    }

    /**
     * The cases that tell how pressure is spread along the wall. A case that only moves the resultant of an even pressure
     * is spread in a straight line, unless the code also gives zones of which one is loaded harder, which then tell.
     */
    private static List<LoadCase> spread(PanelCases panel) {
        double zoned = panel.cases().stream().filter(c -> c.zones().size() > 1).mapToDouble(HoardingPosts::hardest).max().orElse(0);
        return panel.cases().stream().filter(c -> c.shift() == 0 || zoned <= hardest(c)).toList();
    }

    private static double hardest(LoadCase load) {
        return load.zones().stream().mapToDouble(ZonePressure::coefficient).max().orElseThrow();
    }

    private static Placed placed(Hoarding hoarding, Panel panel, LoadCase load, boolean shut) {
        PanelForce force = PanelForce.of(panel, load);
        return new Placed(force, force.line(), panel.middle() - panel.width() / 2 + hoarding.length().metres() / 2, shut);
    }

    private static Share share(Placed placed, Bay bay, double from, double to) {
        double force = placed.line().force(from - placed.left(), to - placed.left());
        return new Share(placed, bay, zone(placed.panel(), bay.at() - placed.left()), from, to, force);
    }

    private static List<Bay> bays(Hoarding hoarding, double spacing) {
        List<Bay> bays = new ArrayList<>();
        List<Panel> stretches = hoarding.panels();
        double half = hoarding.length().metres() / 2;
        for (int i = 0; i < stretches.size(); i++) {
            double width = stretches.get(i).width();
            double left = stretches.get(i).middle() - width / 2 + half;
            List<Double> at = positions(width, spacing);
            for (int k = 0; k < at.size(); k++) {
                boolean first = k == 0;
                boolean last = k == at.size() - 1;
                double from = first ? 0 : (at.get(k - 1) + at.get(k)) / 2;
                double to = last ? width : (at.get(k) + at.get(k + 1)) / 2;
                bays.add(new Bay(i, left + at.get(k), left + from, left + to, first ? leaf(hoarding, left) : 0,
                    last ? leaf(hoarding, left + width) : 0));
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

    /** Half of the leaves in an opening that begins or ends at an edge; in an opening at an end all of them hang on one post. */
    private static double leaf(Hoarding hoarding, double edge) {
        for (Hoarding.Opening opening : hoarding.openings()) {
            double width = opening.to() - opening.from();
            if (Math.abs(opening.from() - edge) < 1e-9 || Math.abs(opening.to() - edge) < 1e-9) {
                return opening.from() == 0 || opening.to() == hoarding.length().metres() ? width : width / 2;
            }
        }
        return 0;
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

    private static void record(List<PostAction> posts, List<Share> worst, PanelSymbols symbols, Trace trace) {
        Map<String, Integer> byZone = new LinkedHashMap<>();
        int most = 0;
        for (int i = 0; i < worst.size(); i++) {
            byZone.merge(worst.get(i).zone(), i, (a, b) -> worst.get(b).moment() > worst.get(a).moment() ? b : a);
            most = worst.get(i).moment() > worst.get(most).moment() ? i : most;
        }
        byZone.forEach((zone, i) -> recordOne(posts.get(i), worst.get(i), "/" + zone, symbols, trace));
        recordOne(posts.get(most), worst.get(most), "", symbols, trace);
    }

    /** Symbol of the width of a zone that a post carries: t_A beside w_A, t_{B,s} beside w_{B,s}. */
    private static String widthSymbol(ZonePressure zone) {
        int low = zone.symbol().indexOf('_');
        String below = low < 0 ? zone.zone() : zone.symbol().substring(low + 1);
        return "t_" + (below.startsWith("{") ? below : "{" + below + "}");
    }

    private static void recordOne(PostAction post, Share share, String zone, PanelSymbols symbols, Trace trace) {
        PanelForce panel = share.placed().panel();
        String which = post.post() + ", case " + LoadCase.shortName(share.named()) + (share.placed().shut() ? ", gates shut" : "");
        Trace.Line line = trace.line("post-shear" + zone, "F_p", "shear at the foot of post " + which).from(STATICS, Status.DERIVED);
        StringBuilder formula = new StringBuilder();
        for (ZonePressure z : panel.load().zones()) {
            double t = Strip.overlap(share.from() - share.placed().left(), share.to() - share.placed().left(), z.from(), z.to());
            if (t > 1e-9) {
                String width = widthSymbol(z);
                trace.line("post-width" + zone + "/" + z.zone(), width, "boards of zone " + z.zone() + " that post " + post.post() + " carries")
                    .from(STATICS, Status.DERIVED).reads("half-way to the neighbouring posts", t, "m");
                line.in(z.symbol(), z.pressure(), "Pa").in(width, t, "m");
                formula.append(formula.isEmpty() ? "" : " + ").append(z.symbol()).append(' ').append(width);
            }
        }
        String h = symbols.height();
        line.in(h, panel.panel().height(), "m");
        String sum = "(" + formula + ") " + h;
        double shear = panel.load().shift() != 0
            ? line.reads("the pressures over the boards that the post carries, spread in a straight line to the resultant of the case", share.force(), "N")
            : panel.raised() ? line.in("k_F", panel.raise()).gives("k_F " + sum, share.force(), "N") : line.gives(sum, share.force(), "N");
        double z = trace.line("post-lever-arm" + zone, "z_p", "height of the force on the post").from(STATICS, Status.DERIVED)
            .reads("height of the resultant of the case", panel.height(), "m");
        trace.line("post-moment" + zone, "M_p", "moment at the foot of post " + which).in("F_p", shear, "N").in("z_p", z, "m")
            .from(STATICS, Status.DERIVED).gives("F_p z_p", shear * z, "N m");
    }

    /** Which case the balance is drawn up for. */
    public static String balanceCase(List<PanelCases> open) {
        return LoadCase.shortName(spread(open.get(0)).get(0).name()) + (spread(open.get(0)).get(0).windward() == Windward.NONE ? "" : ", wind from the left");
    }

    /** Force on the boards in the first zoned or square case, gates open, N, and the sum of what its posts carry. */
    public static double[] balance(Hoarding hoarding, double spacing, List<PanelCases> open) {
        List<Placed> first = open.stream().map(stretch -> placed(hoarding, stretch.panel(), spread(stretch).get(0), false)).toList();
        double loads = first.stream().mapToDouble(placed -> placed.panel().force()).sum();
        double reactions = bays(hoarding, spacing).stream().mapToDouble(bay -> share(first.get(bay.stretch()), bay, bay.from(), bay.to()).force()).sum();
        return new double[] {loads, reactions};
    }

    private HoardingPosts() { }
}
