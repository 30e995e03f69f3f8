package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Nominal strengths of round and rectangular steel tubes by AISC 360, chapters F, G and H. SI units. */
final class AiscNominal {

    static final String CODE = "AISC 360-16, ";
    private static final double ROUNDING = 1e-9;

    private final Map<String, Figure> figures = new HashMap<>();

    AiscNominal(Edition edition) {
        Rows rows = edition.rows("aisc-360");
        rows.keys().forEach(key -> figures.put(key, Figure.of(rows, key)));
    }

    Figure figure(String key) {
        return figures.get(key);
    }

    private double f(String key) {
        return figures.get(key).value();
    }

    /** A number of the code under its symbol, for the formula that comes next. */
    private double put(String key, String symbol, Trace trace) {
        return figures.get(key).into(trace.line("post-number", symbol, "number of the rule"));
    }

    /**
     * A section in the terms of the code; yield and modulus in Pa.
     *
     * @param walls  slenderness of the wall of a round tube, D/t; of the flats of a rectangular one, which each axis has for itself
     */
    record Steel(PostValues post, DesignLoad load, double wall, double yield, double modulus, double walls, double stretch) {

        boolean round() {
            return post.round();
        }

        Trace.Line of(Trace.Line line) {
            return line.in("E", modulus, "Pa").in("F_y", yield, "Pa");
        }
    }

    /** Slenderness of the flats about one axis. */
    record Flats(double flange, double web) { }

    /** A wall that no rule here covers: its slenderness, recorded as λ, and the limit, recorded as λ_lim. */
    record TooThin(double slenderness, double limit) { }

    Steel steel(PostValues post, DesignLoad load, double yield, double modulus, Trace trace) {
        double t = post.wall(trace);
        double stretch = trace.line("post-stiffness-ratio", "s", "modulus over yield strength").in("E", modulus, "Pa").in("F_y", yield, "Pa")
            .from(CODE + "table B4.1b", Status.RECALLED).gives("E / F_y", modulus / yield, "1");
        double walls = 0;
        if (post.round()) {
            double d = post.diameter(trace);
            walls = trace.line("post-slenderness", "λ", "diameter over wall").in("D", d, "m").in("t", t, "m").from(CODE + "table B4.1b", Status.RECALLED)
                .gives("D / t", d / t, "1");
        }
        return new Steel(post, load, t, yield, modulus, walls, stretch);
    }

    /** Records the slenderness of the flats about one axis, as λ_f and λ_w. */
    Flats flats(Steel steel, Axis axis, Trace trace) {
        double n = put("flat-deduction", "n_t", trace);
        double b = steel.post.across(axis, trace);
        double h = steel.post.depth(axis, trace);
        double flange = trace.line("post-slenderness/flange", "λ_f", "flat width over wall of the flange").in("b_s", b, "m").in("n_t", n).in("t", steel.wall, "m")
            .from(CODE + "B4.1b(d)", Status.RECALLED).gives("(b_s - n_t t) / t", (b - n * steel.wall) / steel.wall, "1");
        double web = trace.line("post-slenderness/web", "λ_w", "flat height over wall of the webs").in("h_s", h, "m").in("n_t", n).in("t", steel.wall, "m")
            .from(CODE + "B4.1b(d)", Status.RECALLED).gives("(h_s - n_t t) / t", (h - n * steel.wall) / steel.wall, "1");
        return new Flats(flange, web);
    }

    /** The wall that lies beyond the rules, if one does; null otherwise. */
    TooThin tooThin(Steel steel, List<Axis> axes, Flats[] flats, Trace trace) {
        if (steel.round()) {
            return beyond("f8-valid", steel.walls, "k s", steel.stretch, steel.stretch, trace);
        }
        for (int i = 0; i < flats.length; i++) {
            Trace sheet = axes.get(i).sheet(trace);
            TooThin flange = beyond("f7-flange-noncompact", flats[i].flange, "k s^0.5", Math.sqrt(steel.stretch), steel.stretch, sheet);
            TooThin web = beyond("f7-web-noncompact", flats[i].web, "k s^0.5", Math.sqrt(steel.stretch), steel.stretch, sheet);
            if (flange != null || web != null) {
                return flange != null ? flange : web;
            }
        }
        return null;
    }

    private TooThin beyond(String key, double slenderness, String formula, double by, double stretch, Trace trace) {
        if (slenderness <= f(key) * by * (1 + ROUNDING)) {
            return null;
        }
        double k = put(key, "k", trace);
        trace.line("post-slenderness", "λ", "slenderness of the thinnest wall").from(CODE + "table B4.1b", Status.RECALLED).reads("as above", slenderness, "1");
        double limit = trace.line("post-slenderness-limit", "λ_lim", "slenderness up to which the rules hold").in("k", k).in("s", stretch)
            .from(CODE + "table B4.1b", Status.RECALLED).gives(formula, k * by, "1");
        return new TooThin(slenderness, limit);
    }

    /** Nominal bending strength, N m, recorded as M_n. */
    double bending(Steel steel, Axis axis, Flats flats, Trace trace) {
        double z = steel.post.plastic(axis, "Z", trace);
        double mp = trace.line("post-plastic-moment", "M_{pl}", "plastic moment").in("F_y", steel.yield, "Pa").in("Z", z, "m³").from(CODE + (steel.round() ? "F8-1" : "F7-1"),
            Status.RECALLED).gives("F_y Z", steel.yield * z, "N m");
        double s = steel.post.elastic(axis, "S", trace);
        return steel.round() ? roundBending(steel, mp, s, trace) : flatBending(steel, flats, mp, s, trace);
    }

    private double roundBending(Steel steel, double mp, double s, Trace trace) {
        Trace.Line line;
        if (steel.walls <= f("f8-compact") * steel.stretch * (1 + ROUNDING)) {
            return trace.line("post-nominal/bending", "M_n", "nominal bending strength, compact").in("M_{pl}", mp, "N m").from(CODE + "F8.1", Status.RECALLED)
                .gives("M_{pl}", mp, "N m");
        }
        boolean noncompact = steel.walls <= f("f8-noncompact") * steel.stretch * (1 + ROUNDING);
        double k = put(noncompact ? "f8-noncompact-factor" : "f8-slender-factor", "k", trace);
        line = steel.of(trace.line("post-nominal/bending", "M_n", noncompact ? "nominal bending strength, noncompact" : "nominal bending strength, slender"))
            .in("M_{pl}", mp, "N m").in("k", k).in("λ", steel.walls).in("S", s, "m³").from(CODE + (noncompact ? "F8-2" : "F8-3, F8-4"), Status.RECALLED);
        return noncompact ? line.gives("min(M_{pl}; (k E / λ + F_y) S)", Math.min(mp, (k * steel.modulus / steel.walls + steel.yield) * s), "N m")
            : line.gives("min(M_{pl}; k E / λ S)", Math.min(mp, k * steel.modulus / steel.walls * s), "N m");
    }

    private double flatBending(Steel steel, Flats flats, double mp, double s, Trace trace) {
        double flange = flat(steel, "f7-flange", flats.flange, "λ_f", mp, s, "post-nominal/flange", "M_{n,f}", trace);
        double web = flat(steel, "f7-web", flats.web, "λ_w", mp, s, "post-nominal/web", "M_{n,w}", trace);
        return trace.line("post-nominal/bending", "M_n", "nominal bending strength").in("M_{n,f}", flange, "N m").in("M_{n,w}", web, "N m")
            .from(CODE + "F7", Status.RECALLED).gives("min(M_{n,f}; M_{n,w})", Math.min(flange, web), "N m");
    }

    /** Local buckling of a flange or a web: straight from M_{pl} at the compact limit to F_y S at the other. */
    private double flat(Steel steel, String keys, double slenderness, String symbol, double mp, double s, String step, String result, Trace trace) {
        if (slenderness <= f(keys + "-compact") * Math.sqrt(steel.stretch) * (1 + ROUNDING)) {
            return trace.line(step, result, "bending strength, this part compact").in("M_{pl}", mp, "N m").from(CODE + "F7.1", Status.RECALLED).gives("M_{pl}", mp, "N m");
        }
        double a = put(keys + "-slope", "a", trace);
        double c = put(keys + "-offset", "c", trace);
        double fall = a * slenderness / Math.sqrt(steel.stretch) - c;
        return trace.line(step, result, "bending strength, this part noncompact").in("M_{pl}", mp, "N m").in("F_y", steel.yield, "Pa").in("S", s, "m³").in("a", a)
            .in(symbol, slenderness).in("s", steel.stretch).in("c", c).from(CODE + "F7", Status.RECALLED)
            .gives("min(M_{pl}; M_{pl} - (M_{pl} - F_y S) (a " + symbol + " / s^0.5 - c))", Math.min(mp, mp - (mp - steel.yield * s) * fall), "N m");
    }

    /** Nominal shear strength, N, recorded as V_n. */
    double shear(Steel steel, Axis axis, Flats flats, Trace trace) {
        double y = put("shear-yield", "k_v", trace);
        if (steel.round()) {
            double stress = roundStress(steel, "shear-long", "shear-short", "L_v", "G5", y, trace);
            double area = steel.post.area(trace);
            return trace.line("post-nominal/shear", "V_n", "nominal shear strength").in("F_cr", stress, "Pa").in("A", area, "m²").from(CODE + "G5-1", Status.RECALLED)
                .gives("F_cr A / 2", stress * area / 2, "N");
        }
        double kv = put("web-kv", "k_w", trace);
        double root = Math.sqrt(kv * steel.stretch);
        double cv;
        if (flats.web <= f("web-cv-first") * root * (1 + ROUNDING)) {
            cv = trace.line("post-web-shear", "C_{v2}", "web shear buckling coefficient").from(CODE + "G2-9", Status.RECALLED).reads("a stocky web", 1, "1");
        } else if (flats.web <= f("web-cv-second") * root * (1 + ROUNDING)) {
            double k = put("web-cv-first", "k", trace);
            cv = trace.line("post-web-shear", "C_{v2}", "web shear buckling coefficient").in("k", k).in("k_w", kv).in("s", steel.stretch).in("λ_w", flats.web)
                .from(CODE + "G2-10", Status.RECALLED).gives("k (k_w s)^0.5 / λ_w", k * root / flats.web, "1");
        } else {
            double k = put("web-cv-last", "k", trace);
            cv = trace.line("post-web-shear", "C_{v2}", "web shear buckling coefficient").in("k", k).in("k_w", kv).in("s", steel.stretch).in("λ_w", flats.web)
                .from(CODE + "G2-11", Status.RECALLED).gives("k k_w s / λ_w²", k * kv * steel.stretch / (flats.web * flats.web), "1");
        }
        double t = steel.wall;
        return trace.line("post-nominal/shear", "V_n", "nominal shear strength of both webs").in("k_v", y).in("F_y", steel.yield, "Pa").in("λ_w", flats.web).in("t", t, "m")
            .in("C_{v2}", cv).from(CODE + "G4-1", Status.RECALLED).gives("k_v F_y 2 λ_w t² C_{v2}", y * steel.yield * 2 * flats.web * t * t * cv, "N");
    }

    /** Critical stress of a round tube in shear or torsion, Pa, recorded as F_cr; the length is the height of the post. */
    private double roundStress(Steel steel, String longKey, String shortKey, String length, String clause, double shareOfYield, Trace trace) {
        double a = put(longKey, "a", trace);
        double c = put(shortKey, "c", trace);
        double p = put("wall-power-long", "p", trace);
        double r = put("wall-power-short", "r", trace);
        double l = trace.line("post-length", length, "length between the greatest and no load: the height of the post").from("statics", Status.DERIVED)
            .reads("the height of the post above the ground", steel.load.height(), "m");
        double d = steel.post.diameter(trace);
        double buckling = Math.max(a * steel.modulus / (Math.sqrt(l / d) * Math.pow(steel.walls, p)), c * steel.modulus / Math.pow(steel.walls, r));
        return steel.of(trace.line("post-critical-stress", "F_cr", "critical stress")).in("a", a).in("c", c).in("p", p).in("r", r).in(length, l, "m").in("D", d, "m")
            .in("λ", steel.walls).in("k_v", shareOfYield).from(CODE + clause, Status.RECALLED)
            .gives(length.equals("L_v") ? "min(max(a E / ((L_v / D)^0.5 λ^p); c E / λ^r); k_v F_y)" : "min(max(a E / ((L / D)^0.5 λ^p); c E / λ^r); k_v F_y)",
                Math.min(buckling, shareOfYield * steel.yield), "Pa");
    }

    /** Nominal torsional strength, N m, recorded as T_n. */
    double torsion(Steel steel, Axis axis, Flats flats, Trace trace) {
        double y = put("shear-yield", "k_v", trace);
        double stress = steel.round() ? roundStress(steel, "torsion-long", "torsion-short", "L", "H3-2", y, trace) : flatStress(steel, flats, y, trace);
        double c = steel.round() ? roundConstant(steel, trace) : flatConstant(steel, axis, trace);
        return trace.line("post-nominal/torsion", "T_n", "nominal torsional strength").in("F_cr", stress, "Pa").in("C", c, "m³").from(CODE + "H3-1", Status.RECALLED)
            .gives("F_cr C", stress * c, "N m");
    }

    private static double roundConstant(Steel steel, Trace trace) {
        double d = steel.post.diameter(trace);
        double t = steel.wall;
        return trace.line("post-torsion-constant", "C", "torsional shear constant").in("D", d, "m").in("t", t, "m").from(CODE + "H3.1", Status.RECALLED)
            .reads("π (D - t)² t / 2", Math.PI * (d - t) * (d - t) * t / 2, "m³");
    }

    private double flatConstant(Steel steel, Axis axis, Trace trace) {
        double k = f("torsion-corner");
        double b = axis.across() - steel.wall;
        double h = axis.depth() - steel.wall;
        double t = steel.wall;
        return trace.line("post-torsion-constant", "C", "torsional shear constant").from(figures.get("torsion-corner").place(), Status.RECALLED)
            .reads("2 (b_s - t) (h_s - t) t - 4.5 (4 - π) t³", 2 * b * h * t - k * (4 - Math.PI) * t * t * t, "m³");
    }

    private double flatStress(Steel steel, Flats flats, double shareOfYield, Trace trace) {
        double wide = Math.max(flats.flange, flats.web);
        double root = Math.sqrt(steel.stretch);
        double yield = shareOfYield * steel.yield;
        Trace.Line line = trace.line("post-critical-stress", "F_cr", "critical stress of the widest flat").from(CODE + "H3-3 to H3-5", Status.RECALLED);
        if (wide <= f("torsion-flat-first") * root * (1 + ROUNDING)) {
            return line.in("k_v", shareOfYield).in("F_y", steel.yield, "Pa").gives("k_v F_y", yield, "Pa");
        }
        if (wide <= f("torsion-flat-second") * root * (1 + ROUNDING)) {
            return line.reads("0.6 F_y 2.45 (E / F_y)^0.5 over the slenderness", yield * f("torsion-flat-first") * root / wide, "Pa");
        }
        return line.reads("0.458 π² E over the slenderness squared", f("torsion-flat-last") * Math.PI * Math.PI * steel.modulus / (wide * wide), "Pa");
    }
}
