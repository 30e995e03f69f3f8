package broadside.action;

import broadside.codes.MemberRule;
import broadside.codes.WindCode;
import broadside.panel.Panel;
import broadside.panel.PostSection;
import broadside.panel.PostSign;
import broadside.site.Site;
import broadside.trace.Status;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Wind on one post of a sign: on what stands free of the boards, from the ground to the top of the highest board.
 *
 * @param force   N
 * @param moment  at the ground line, N m
 * @param squares sum of force times the square of its height, N m2
 * @param cubes   sum of force times the cube of its height, N m3
 */
public record PostDrag(double force, double moment, double squares, double cubes) {

    /** No wind on the post. */
    public static final PostDrag NONE = new PostDrag(0, 0, 0, 0);

    private static final String STATICS = "statics";

    /** A stretch of a post that the wind meets, m above the ground. */
    public record Stretch(double from, double to) { }

    /** The stretches of a post at a distance from the middle of the posts that no board covers over the post's whole width. */
    public static List<Stretch> bare(PostSign sign, double at, double halfWidth) {
        List<Panel> before = sign.panels().stream().filter(p -> Math.abs(p.middle() - at) + halfWidth <= p.width() / 2 + 1e-9)
            .sorted(Comparator.comparingDouble(Panel::clearance)).toList();
        double top = sign.panels().stream().mapToDouble(Panel::top).max().orElseThrow();
        List<Stretch> bare = new ArrayList<>();
        double from = 0;
        for (Panel board : before) {
            if (board.clearance() > from + 1e-9) {
                bare.add(new Stretch(from, board.clearance()));
            }
            from = Math.max(from, board.top());
        }
        if (from < top - 1e-9) {
            bare.add(new Stretch(from, top));
        }
        return bare;
    }

    /** Works out every post, in order from the left; empty when the posts' sizes are not known. */
    public static List<PostDrag> of(PostSign sign, WindCode code, MemberRule rule, Site site, Trace trace) {
        if (sign.posts().section().isEmpty()) {
            return List.of();
        }
        PostSection section = sign.posts().section().get();
        trace.given("b_p", "width of a post across the wind", section.width(), "m", "");
        List<PostDrag> posts = new ArrayList<>();
        List<Double> positions = sign.posts().positions();
        Map<List<Stretch>, PostDrag> known = new HashMap<>();
        for (int i = 0; i < positions.size(); i++) {
            List<Stretch> bare = bare(sign, positions.get(i), section.width() / 2);
            boolean again = known.containsKey(bare);
            String post = "post-" + (i + 1);
            PostDrag drag = again ? known.get(bare) : worked(bare, post, section, code, rule, site, trace);
            known.put(bare, drag);
            posts.add(drag);
            String which = Integer.toString(i + 1);
            trace.line("post-own/force/" + which, "F_{d" + which + "}", "wind on post " + which + " itself").from(STATICS, Status.DERIVED)
                .reads(again ? "as on a post before, which stands as free" : "sum over the lengths that stand free", drag.force(), "N");
            trace.line("post-own/moment/" + which, "M_{d" + which + "}", "its moment at the foot of post " + which).from(STATICS, Status.DERIVED)
                .reads(again ? "as on a post before, which stands as free" : "sum over the lengths that stand free", drag.moment(), "N m");
        }
        double force = posts.stream().mapToDouble(PostDrag::force).sum();
        double moment = posts.stream().mapToDouble(PostDrag::moment).sum();
        trace.line("posts-drag", "F_{post}", "wind on all posts").from(STATICS, Status.DERIVED).reads("sum over the posts", force, "N");
        trace.line("posts-drag-moment", "M_{post}", "its moment at the ground line").from(STATICS, Status.DERIVED).reads("sum over the posts", moment, "N m");
        return posts;
    }

    private static PostDrag worked(List<Stretch> bare, String post, PostSection section, WindCode code, MemberRule rule, Site site, Trace trace) {
        PostDrag drag = NONE;
        for (int k = 0; k < bare.size(); k++) {
            drag = drag.plus(stretch(bare.get(k), section, code, rule, site, trace.part(post + (bare.size() == 1 ? "" : "-" + (k + 1)))));
        }
        return drag;
    }

    private static PostDrag stretch(Stretch bare, PostSection section, WindCode code, MemberRule rule, Site site, Trace trace) {
        double top = trace.line("post-height", heightSymbol(trace), "height of the wind on the post").from(STATICS, Status.DERIVED)
            .reads("top of the length that stands free", bare.to(), "m");
        double q = code.memberPressure(site, top, trace);
        double length = trace.line("post-length", "l_p", "length of the post that stands free, from " + metres(bare.from()) + " to " + metres(bare.to()))
            .from(STATICS, Status.DERIVED).reads("between the ground and the boards", bare.to() - bare.from(), "m");
        double c = rule.coefficient(section, length, q, trace);
        double force = trace.line("post-drag", "F_d", "wind on the post itself: " + rule.words()).in("q_m", q, "Pa").in("c_p", c).in("b_p", section.width(), "m")
            .in("l_p", length, "m").from(STATICS, Status.DERIVED).gives("q_m c_p b_p l_p", q * c * section.width() * length, "N");
        double arm = trace.line("post-drag-arm", "z_d", "height of that force").from(STATICS, Status.DERIVED)
            .reads("middle of the length that stands free", (bare.from() + bare.to()) / 2, "m");
        double moment = trace.line("post-drag-moment", "M_d", "its moment at the ground line").in("F_d", force, "N").in("z_d", arm, "m")
            .from(STATICS, Status.DERIVED).gives("F_d z_d", force * arm, "N m");
        double perMetre = force / length;
        return new PostDrag(force, moment, perMetre * (Math.pow(bare.to(), 3) - Math.pow(bare.from(), 3)) / 3,
            perMetre * (Math.pow(bare.to(), 4) - Math.pow(bare.from(), 4)) / 4);
    }

    /** The symbol by which the code writes the height of the wind: that of the boards. */
    private static String heightSymbol(Trace trace) {
        return trace.steps().stream().filter(s -> s.name().startsWith("reference-height")).findFirst().map(Step::symbol).orElse("z");
    }

    private static String metres(double value) {
        return Math.round(value * 1000) / 1000.0 + " m";
    }

    public PostDrag plus(PostDrag other) {
        return new PostDrag(force + other.force, moment + other.moment, squares + other.squares, cubes + other.cubes);
    }
}
