package broadside.action;

import broadside.action.CaseAction.PanelZones;
import broadside.codes.LoadCase.Windward;
import broadside.codes.LoadCase;
import broadside.codes.PanelSymbols;
import broadside.codes.ShiftRule;
import broadside.codes.ZonePressure;
import broadside.panel.Panel;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/** From zone pressures to the force on the item and to shear, moment and torsion at its foot: statics, the same for every code. */
public final class FootActions {

    private static final String STATICS = "statics";

    /** The actions of every case, front and back, and the combinations that posts are worked out from. */
    public record Result(List<CaseAction> cases, List<Combined> combinations) {

        /** Together with those of another arrangement of the item. */
        public Result with(Result other) {
            List<CaseAction> allCases = new ArrayList<>(cases);
            allCases.addAll(other.cases);
            List<Combined> all = new ArrayList<>(combinations);
            all.addAll(other.combinations);
            return new Result(allCases, all);
        }
    }

    /**
     * How the item stands.
     *
     * @param state  name of the arrangement, empty for the item as it is
     * @param foot   where its loads end
     * @param posts  wind on the posts themselves; empty where it is not known
     */
    public record Standing(String state, Foot foot, List<PostDrag> posts) {

        double shear() {
            return posts.stream().mapToDouble(PostDrag::force).sum();
        }

        double moment() {
            return posts.stream().mapToDouble(PostDrag::moment).sum();
        }
    }

    /** A combination in the hands of other packages, with the force and moment that were recorded for it. */
    public static final class Combined {

        private final Combination combination;
        private final double force;
        private final double moment;
        private final String state;

        Combined(Combination combination, CaseAction recorded) {
            this.combination = combination;
            this.force = recorded.force();
            this.moment = recorded.force() * recorded.height();
            this.state = recorded.state();
        }

        Combination combination() {
            return combination;
        }

        public String name() {
            return combination.name();
        }

        /** Arrangement of the item, empty for the item as it stands. */
        public String state() {
            return state;
        }

        /** Force on all panels, N. */
        public double force() {
            return force;
        }

        /** Moment of the panels at the ground line, N m. */
        public double moment() {
            return moment;
        }
    }

    /**
     * Works out and records each case. Of two ends the worse one comes first. The other end comes too where
     * pressures are measured from the windward end, since they then lie elsewhere; where it only mirrors the first it is not worked out again.
     */
    public static Result of(List<PanelCases> panels, PanelSymbols symbols, Standing standing, Trace trace) {
        List<Combination> all = Combination.all(panels);
        List<CaseAction> cases = new ArrayList<>();
        List<Combined> combinations = new ArrayList<>();
        for (String name : all.stream().map(Combination::name).distinct().toList()) {
            List<Combination> ends = all.stream().filter(c -> c.name().equals(name)).toList();
            Combination worst = ends.stream().reduce(Combination::worse).orElseThrow();
            CaseAction front = record(worst, "", symbols, standing, trace);
            add(cases, front);
            for (Combination end : ends) {
                boolean unlike = end != worst && end.measuredFromTheEnd();
                CaseAction action = !unlike ? front : end.mirrors(worst) ? front.fromOtherEnd(zones(end))
                    : record(end, end.windward() == Windward.LEFT ? "from-left" : "from-right", symbols, standing, trace);
                if (unlike) {
                    add(cases, action);
                }
                combinations.add(new Combined(end, action));
            }
        }
        return new Result(cases, combinations);
    }

    private static void add(List<CaseAction> cases, CaseAction front) {
        cases.add(front);
        cases.add(front.fromBehind());
    }

    private static CaseAction record(Combination combination, String end, PanelSymbols symbols, Standing standing, Trace whole) {
        Trace trace = whole.part(end);
        String name = combination.name();
        boolean one = combination.panels().size() == 1;
        List<double[]> found = new ArrayList<>();
        for (PanelForce panel : combination.panels()) {
            Names names = new Names(name, symbols, one ? 0 : found.size() + 1, standing);
            found.add(panel(panel, names, trace.part(panel.panel().part())));
        }
        double force = one ? found.get(0)[0] : total("force/" + name, "F", "wind force on all panels, case " + LoadCase.shortName(name), found, 0, trace);
        double shear = withPosts(trace.line("base-shear/" + name, "F_b", "shear at the foot, case " + LoadCase.shortName(name)), "F", force,
            "F_{post}", standing.shear(), "N");
        double moment = one ? found.get(0)[1] : totalMoment(name, found, standing, trace);
        double torsion = one ? found.get(0)[2] : total("torsion/" + name, "M_T", "torsion about the middle, case " + LoadCase.shortName(name), found, 2, trace);
        if (!one) {
            trace.line("lever-arm/" + name, "z", "height of the resultant, case " + LoadCase.shortName(name)).in("M", combination.moment(), "N m").in("F", force, "N")
                .from(STATICS, Status.DERIVED).reads("moment of all panels over their force", combination.moment() / force, "m");
        }
        return new CaseAction(standing.state(), name, combination.label(), "front", combination.windward(), zones(combination), force,
            combination.moment() / force, combination.torsion() / force, shear, moment, torsion);
    }

    /** The case, the code's symbols of a panel, and the index that tells one panel's symbols from another's. */
    private record Names(String load, PanelSymbols panel, int index, Standing standing) {
        String of(String symbol) {
            return index == 0 ? symbol : indexed(symbol, index);
        }

        /** What a symbol of a pressure has below the line: A of w_A, 0-s of p_{0-s}. */
        static String bare(String symbol) {
            String below = symbol.substring(Math.min(2, symbol.length()));
            return below.startsWith("{") ? below.substring(1, below.length() - 1) : below;
        }
    }

    /** F becomes F_1, M_T becomes M_{T,1}. */
    private static String indexed(String symbol, int index) {
        int low = symbol.indexOf('_');
        return low < 0 ? symbol + "_" + index : symbol.substring(0, low) + "_{" + symbol.substring(low + 1) + "," + index + "}";
    }

    /** Force, moment and torsion of one panel. */
    private static double[] panel(PanelForce panel, Names names, Trace trace) {
        double force = force(panel, names, trace);
        Panel p = panel.panel();
        double rise = panel.load().rise();
        String h = names.panel().height();
        Trace.Line arm = line(trace, "lever-arm", names, "z", "height of the force above the ground").in(names.panel().gap(), p.clearance(), "m")
            .in(h, p.height(), "m");
        double z = rise == 0 ? arm.gives(names.panel().gap() + " + " + h + " / 2", panel.height(), "m")
            : arm.in("Δ", rise, "m").gives(names.panel().gap() + " + " + h + " / 2 + Δ", panel.height(), "m");
        if (p.kind() == Panel.Kind.WALL) {
            perMetre(panel, names, trace);
        }
        if (names.standing().foot() != Foot.GROUND) {
            return new double[] {force, aboutWall(panel, force, names, trace), 0};
        }
        boolean withPosts = names.index() == 0 && names.standing().moment() != 0;
        double onPanel = line(trace, withPosts ? "panel-moment" : "base-moment", names, withPosts ? "M_{panel}" : "M", "moment at the ground line")
            .in(names.of("F"), force, "N").in(names.of("z"), z, "m").gives(names.of("F") + " " + names.of("z"), force * z, "N m");
        double moment = withPosts ? momentWithPosts(names.load(), onPanel, names.standing(), trace) : onPanel;
        double e = panel.eccentricity();
        double x = p.middle();
        double shift = e == 0 ? 0 : eccentricity(panel, names, trace);
        Trace.Line about = line(trace, "torsion", names, "M_T", "torsion about the middle of the item").in(names.of("F"), force, "N").in("x_b", x, "m");
        double torsion = e == 0 ? about.gives(names.of("F") + " x_b", force * x, "N m")
            : about.in(names.of("e"), shift, "m").gives(names.of("F") + " (x_b " + (e < 0 ? "- " : "+ ") + names.of("e") + ")",
                force * (x + Math.signum(e) * shift), "N m");
        return new double[] {force, moment, torsion};
    }

    /** Moment about the vertical line in the wall that brackets stand on; none where the item has no such line. */
    private static double aboutWall(PanelForce panel, double force, Names names, Trace trace) {
        if (names.standing().foot() == Foot.NONE) {
            return 0;
        }
        double e = panel.eccentricity();
        double shift = e == 0 ? 0 : eccentricity(panel, names, trace);
        Trace.Line line = line(trace, "base-moment", names, "M_w", "moment about the vertical line in the wall").in(names.of("F"), force, "N")
            .in("x_b", panel.panel().middle(), "m");
        return e == 0 ? line.gives(names.of("F") + " x_b", force * panel.panel().middle(), "N m")
            : line.in(names.of("e"), shift, "m").gives(names.of("F") + " (x_b " + (e < 0 ? "- " : "+ ") + names.of("e") + ")",
                force * (panel.panel().middle() + Math.signum(e) * shift), "N m");
    }

    /** Ends a step with the share of the panels alone, or with that of the posts added to it. */
    private static double withPosts(Trace.Line line, String symbol, double value, String postSymbol, double ofPosts, String unit) {
        line.in(symbol, value, unit).from(STATICS, Status.DERIVED);
        return ofPosts == 0 ? line.gives(symbol, value, unit) : line.in(postSymbol, ofPosts, unit).gives(symbol + " + " + postSymbol, value + ofPosts, unit);
    }

    private static double momentWithPosts(String name, double onPanels, Standing standing, Trace trace) {
        return withPosts(trace.line("base-moment/" + name, "M", "moment at the ground line with the wind on the posts, case " + LoadCase.shortName(name)),
            "M_{panel}", onPanels, "M_{post}", standing.moment(), "N m");
    }

    private static double totalMoment(String name, List<double[]> found, Standing standing, Trace trace) {
        boolean posts = standing.moment() != 0;
        double panels = total((posts ? "panel-moment/" : "base-moment/") + name, posts ? "M_{panel}" : "M", "moment at the ground line, case "
            + LoadCase.shortName(name), found, 1, trace);
        return posts ? momentWithPosts(name, panels, standing, trace) : panels;
    }

    /** Distance of the force from the middle of the panel, m, without sign: by the rule of the case, or the centre of its zones. */
    private static double eccentricity(PanelForce panel, Names names, Trace trace) {
        double width = panel.panel().width();
        Trace.Line line = line(trace, "eccentricity", names, "e", "distance of the force from the middle of the panel, towards the "
            + (panel.eccentricity() < 0 ? "left" : "right")).in(names.panel().width(), width, "m");
        if (panel.load().rule().isEmpty()) {
            return line.reads("centre of the zone pressures", Math.abs(panel.eccentricity()), "m");
        }
        ShiftRule rule = panel.load().rule().get();
        return line.from(rule.source().citation(), rule.source().status()).gives(rule.factor() + " " + names.panel().width(), rule.factor() * width, "m");
    }

    private static Trace.Line line(Trace trace, String step, Names names, String symbol, String meaning) {
        return trace.line(step + "/" + names.load(), names.of(symbol), meaning + ", case " + LoadCase.shortName(names.load())).from(STATICS, Status.DERIVED);
    }

    private static double force(PanelForce panel, Names names, Trace trace) {
        List<ZonePressure> zones = panel.load().zones();
        String h = names.panel().height();
        Trace.Line line = line(trace, "force", names, "F", "wind force on the panel");
        StringBuilder formula = new StringBuilder();
        for (ZonePressure zone : zones) {
            String width = zones.size() == 1 ? names.panel().width() : "l_{" + Names.bare(zone.symbol()) + "}";
            line.in(zone.symbol(), zone.pressure(), "Pa").in(width, zone.width(), "m");
            formula.append(formula.isEmpty() ? "" : " + ").append(zone.symbol()).append(' ').append(width);
        }
        line.in(h, panel.panel().height(), "m");
        String sum = zones.size() == 1 ? formula + " " + h : "(" + formula + ") " + h;
        if (panel.load().least() > 0) {
            double force = line.in("F_{min}", panel.load().least(), "N").gives("max(" + sum + "; F_{min})", panel.force(), "N");
            if (panel.raised()) {
                line(trace, "least-force-factor", names, "k_F", "factor that raises all pressures of the case to its least force")
                    .in(names.of("F"), force, "N").reads("F over the sum of pressure times area", panel.raise(), "1");
            }
            return force;
        }
        return line.gives(sum, panel.force(), "N");
    }

    private static double total(String step, String symbol, String meaning, List<double[]> found, int which, Trace trace) {
        String unit = which == 0 ? "N" : "N m";
        Trace.Line line = trace.line(step, symbol, meaning).from(STATICS, Status.DERIVED);
        StringBuilder formula = new StringBuilder();
        double sum = 0;
        for (int i = 0; i < found.size(); i++) {
            String each = indexed(symbol.equals("M_{panel}") ? "M" : symbol, i + 1);
            line.in(each, found.get(i)[which], unit);
            formula.append(i == 0 ? "" : " + ").append(each);
            sum += found.get(i)[which];
        }
        return line.gives(formula.toString(), sum, unit);
    }

    private static List<PanelZones> zones(Combination combination) {
        return combination.panels().stream().map(p -> new PanelZones(p.panel().part(), p.panel().middle() - p.panel().width() / 2,
            p.load().zones(), p.panel().kind() == Panel.Kind.WALL
                ? p.load().zones().stream().map(z -> p.peak() * z.pressure() * p.panel().height() * p.height()).toList() : List.of())).toList();
    }

    /** Moment at the ground for each metre of a wall, zone by zone. */
    private static void perMetre(PanelForce panel, Names names, Trace trace) {
        String h = names.panel().height();
        for (ZonePressure zone : panel.load().zones()) {
            Trace.Line line = trace.line("moment-per-metre/" + names.load() + "/" + zone.zone(), "m_{" + Names.bare(zone.symbol()) + "}",
                "moment at the ground for each metre of wall" + (panel.peak() == 1 ? "" : ", at the windward edge")).in(zone.symbol(), zone.pressure(), "Pa")
                .in(h, panel.panel().height(), "m").in(names.of("z"), panel.height(), "m").from(STATICS, Status.DERIVED);
            double mean = zone.pressure() * panel.panel().height() * panel.height();
            if (panel.peak() == 1) {
                line.gives(zone.symbol() + " " + h + " " + names.of("z"), mean, "N m/m");
            } else {
                line.reads("the mean, raised to the greatest pressure of the straight line along the wall", panel.peak() * mean, "N m/m");
            }
        }
    }

    private FootActions() { }
}
