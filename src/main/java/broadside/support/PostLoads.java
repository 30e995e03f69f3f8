package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/** Brings the loads of a case, with the wind and the weight of the post itself, to the level of a rule and records them. */
final class PostLoads {

    private static final String STATICS = "statics";
    private static final String SUMMED = "loads at the foot of the post, above";

    private final PostTask task;
    private final PostRule rule;
    private final Figure gravity;

    PostLoads(PostTask task, PostRule rule, Figure gravity) {
        this.task = task;
        this.rule = rule;
        this.gravity = gravity;
    }

    /** Loads at the level of the rule. */
    DesignLoad design(PostLoad load, Section section, OwnDrag drag, Trace trace) {
        LoadSymbols s = rule.symbols();
        boolean along = PostCases.along(load);
        double k = trace.line("post-wind-factor", "k_w", rule.strength() ? "factor on the wind, to the level of strength" : "factor on the wind, to the level of allowable stress")
            .from(task.levels().place(), task.levels().status()).reads("level of the rule", rule.strength() ? task.levels().strength() : task.levels().service(), "1");
        double force = found("post-load/drag", "F_d", "wind on the post itself", drag.force(), "N", load, trace);
        double turning = found("post-load/drag-moment", "M_d", "its moment at the ground", drag.moment(), "N m", load, trace);
        double g = rule.weights().into(trace.line("post-weight-factor", "k_G", "factor on weights"));
        double v = wind("post-design-shear", s.shear(), "shear of the post", "V_p", load.shear(), "F_d", along ? 0 : force, "N", k, load, trace);
        double m = wind("post-design-moment", s.moment(), "moment of the post at the ground", "M_p", load.moment(), "M_d", along ? 0 : turning, "N m", k, load, trace);
        double t = load.torsion() > 0 ? wind("post-design-torsion", s.torsion(), "torsion of the post", "T_p", load.torsion(), "", 0, "N m", k, load, trace) : 0;
        double weakV = 0;
        double weakM = 0;
        if (load.weakShear() > 0 || load.weakMoment() > 0 || load.weightMoment() > 0 || along) {
            weakV = wind("post-design-shear/along", s.weakShear(), "shear along the face", "V_{pz}", load.weakShear(), "F_d", along ? force : 0, "N", k, load, trace);
            weakM = weak(load, s, along ? turning : 0, k, g, trace);
        }
        return new DesignLoad(load.named(), v, m, t, weakV, weakM, axial(load, section, g, trace), task.height());
    }

    private double weak(PostLoad load, LoadSymbols s, double turning, double k, double g, Trace trace) {
        double wind = found("post-load/moment-along", "M_{pz}", "moment of wind along the face", load.weakMoment(), "N m", load, trace);
        double dead = found("post-load/moment-weight", "M_G", "moment of boards that hang to one side", load.weightMoment(), "N m", load, trace);
        Trace.Line line = trace.line("post-design-moment/along", s.weakMoment(), "moment about the weak axis").in("k_w", k).in("M_{pz}", wind, "N m").in("k_G", g)
            .in("M_G", dead, "N m").from(STATICS, Status.DERIVED);
        return turning > 0 ? line.in("M_d", turning, "N m").gives("k_w (M_{pz} + M_d) + k_G M_G", k * (wind + turning) + g * dead, "N m")
            : line.gives("k_w M_{pz} + k_G M_G", k * wind + g * dead, "N m");
    }

    private double wind(String step, String symbol, String meaning, String from, double value, String own, double ownValue, String unit, double k, PostLoad load, Trace trace) {
        double wind = found(name(from), from, meaning, value, unit, load, trace);
        Trace.Line line = trace.line(step, symbol, meaning).in("k_w", k).in(from, wind, unit).from(STATICS, Status.DERIVED);
        return ownValue > 0 ? line.in(own, ownValue, unit).gives(both(from), k * (wind + ownValue), unit) : line.gives(alone(from), k * wind, unit);
    }

    private static String both(String symbol) {
        return switch (symbol) {
            case "V_p" -> "k_w (V_p + F_d)";
            case "M_p" -> "k_w (M_p + M_d)";
            default -> "k_w (V_{pz} + F_d)";
        };
    }

    private static String alone(String symbol) {
        return switch (symbol) {
            case "V_p" -> "k_w V_p";
            case "M_p" -> "k_w M_p";
            case "T_p" -> "k_w T_p";
            default -> "k_w V_{pz}";
        };
    }

    private static String name(String symbol) {
        return switch (symbol) {
            case "V_p" -> "post-load/shear";
            case "M_p" -> "post-load/moment";
            case "T_p" -> "post-load/torsion";
            default -> "post-load/shear-along";
        };
    }

    private double axial(PostLoad load, Section section, double g, Trace trace) {
        double boards = found("post-load/weight", "G", "weight on the post", load.weight(), "N", load, trace);
        double mass = trace.line("post-mass-per-metre", "m_s", "mass of the post per metre").from("properties of the section", Status.DERIVED)
            .reads(section.designation(), section.mass(), "kg/m");
        double height = height(trace);
        double fall = gravity.into(trace.line("post-gravity", "g", "acceleration of free fall, m/s²"));
        double own = trace.line("post-own-weight", "G_p", "weight of the post itself").in("m_s", mass, "kg/m").in("h_p", height, "m").in("g", fall).from(STATICS, Status.DERIVED)
            .gives("m_s h_p g", mass * height * fall, "N");
        return trace.line("post-design-compression", rule.symbols().axial(), "compression of the post").in("k_G", g).in("G", boards, "N").in("G_p", own, "N")
            .from(STATICS, Status.DERIVED).gives("k_G (G + G_p)", g * (boards + own), "N");
    }

    double height(Trace trace) {
        return trace.line("post-height-above-ground", "h_p", "height of the post above the ground").from(STATICS, Status.DERIVED).reads("as given", task.height(), "m");
    }

    /** Sums of the wind of one case at the level of service. */
    PostDeflection.Bent service(PostLoad load, OwnDrag drag, Trace trace) {
        double k = trace.line("post-service-factor", "k_s", "factor on the wind, to the level of service").from(task.levels().place(), task.levels().status())
            .reads("level of deflections", task.levels().service(), "1");
        double squares = sum("2", load.bending(), drag.bending(), "N m²", k, load, trace);
        double cubes = sum("3", load.cubes(), drag.cubes(), "N m³", k, load, trace);
        boolean along = PostCases.along(load);
        double shear = (along ? load.weakShear() : load.shear()) + drag.force();
        double moment = (along ? load.weakMoment() : load.moment()) + drag.moment();
        return new PostDeflection.Bent(load.named(), squares, cubes, shear > 0 ? moment / shear : task.deflectionHeight());
    }

    private static double sum(String power, double wind, double own, String unit, double k, PostLoad load, Trace trace) {
        boolean two = power.equals("2");
        String from = two ? "S_{2p}" : "S_{3p}";
        String post = two ? "S_{2d}" : "S_{3d}";
        double boards = found(two ? "post-load/squares" : "post-load/cubes", from, two ? "sum of wind force times height squared" : "sum of wind force times height cubed", wind, unit,
            load, trace);
        double drag = found(two ? "post-load/drag-squares" : "post-load/drag-cubes", post, "the same of the wind on the post itself", own, unit, load, trace);
        return trace.line(two ? "post-service/squares" : "post-service/cubes", two ? "S_2" : "S_3", two ? "sum of service force times height squared"
            : "sum of service force times height cubed").in("k_s", k).in(from, boards, unit).in(post, drag, unit).from(STATICS, Status.DERIVED)
            .gives(two ? "k_s (S_{2p} + S_{2d})" : "k_s (S_{3p} + S_{3d})", k * (boards + drag), unit);
    }

    private static double found(String step, String symbol, String meaning, double value, String unit, PostLoad load, Trace trace) {
        return trace.line(step, symbol, meaning).from(SUMMED, Status.DERIVED).reads(load.named(), value, unit);
    }
}
