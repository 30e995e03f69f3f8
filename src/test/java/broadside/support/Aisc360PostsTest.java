package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.support.Section.Form;
import broadside.support.Section.Material;
import broadside.support.Section.Properties;
import broadside.trace.Trace;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Steel posts by AISC 360, against the clauses worked out by hand in inches and ksi. */
class Aisc360PostsTest {

    private static final PostRule ASD = new PostRules(Tubes.RULES).of("us-asd", Material.STEEL);
    private static final PostRule LRFD = new PostRules(Tubes.RULES).of("us-strength", Material.STEEL);
    private static final double KIP_IN = 4448.2216152605 * 0.0254;
    private static final double KIP = 4448.2216152605;
    private static final double IN = 25.4;

    /** Pipe 6STD as listed: OD 6.625, design wall 0.261, S 7.99, Z 10.6, I 26.5, A 5.20 (inches). */
    private static final Section PIPE = pipe(6.625, 0.261, 7.99, 10.6, 26.5, 5.20);

    private static Section pipe(double od, double t, double s, double z, double i, double a) {
        double in3 = Math.pow(0.0254, 3);
        return new Section("PIPE", "test", Form.ROUND_TUBE, Material.STEEL, od * 0.0254, od * 0.0254, t * 0.0254, t * 0.0254, new Properties(a * 0.0254 * 0.0254, i * in3 * 0.0254,
            i * in3 * 0.0254, s * in3, s * in3, z * in3, z * in3, 2 * i * in3 * 0.0254, 2 * s * in3, 28.3));
    }

    private static DesignLoad load(double kips, double kipInches, double torsion) {
        return new DesignLoad("case-a", kips * KIP, kipInches * KIP_IN, torsion * KIP_IN, 0, 0, 0.3 * KIP, 120 * 0.0254);
    }

    private static List<Check> run(PostRule rule, Section section, Grade grade, DesignLoad load, Trace trace) {
        List<Check> checks = rule.check(section, grade, load, trace);
        SheetCheck.holds(trace);
        return checks;
    }

    private static Trace sheet(DesignLoad load) {
        return Sheets.with(LoadSymbols.US, load);
    }

    /** 6STD of 35 ksi: D/t 25.38, compact to 58.0; F_y Z/1.67 = 18.513 kip-ft; 0.9 F_y Z = 27.825 kip-ft. */
    @Test
    void compactPipe() {
        DesignLoad load = load(1, 150, 0);
        Trace trace = sheet(load);
        List<Check> checks = run(ASD, PIPE, Tubes.A53, load, trace);
        assertThat(Sheets.value(trace, "post-slenderness")).isCloseTo(25.383, within(0.001));
        assertThat(Sheets.value(trace, "post-resistance/bending")).isCloseTo(18.513 * 12 * KIP_IN, within(0.001 * 12 * KIP_IN));
        assertThat(Sheets.check(checks, "post bending").utilisation()).isCloseTo(150 / (18.513 * 12), within(1e-4));
        Trace other = sheet(load);
        run(LRFD, PIPE, Tubes.A53, load, other);
        assertThat(Sheets.value(other, "post-resistance/bending")).isCloseTo(27.825 * 12 * KIP_IN, within(0.001 * 12 * KIP_IN));
    }

    /** Shear: F_cr = 0.6 x 35 = 21 ksi, V_n = 21 x 5.20/2 = 54.6 kip, /1.67 = 32.69. Torsion: C = pi 6.364^2 x 0.261/2 = 16.604, 21 x 16.604/1.67 = 208.8 kip-in. */
    @Test
    void shearAndTorsion() {
        DesignLoad load = load(2, 100, 60);
        Trace trace = sheet(load);
        List<Check> checks = run(ASD, PIPE, Tubes.A53, load, trace);
        assertThat(Sheets.value(trace, "post-resistance/shear") / KIP).isCloseTo(32.695, within(0.001));
        assertThat(Sheets.value(trace, "post-torsion-constant") / Math.pow(0.0254, 3)).isCloseTo(16.604, within(0.002));
        assertThat(Sheets.value(trace, "post-resistance/torsion") / KIP_IN).isCloseTo(208.79, within(0.05));
        double pc = 35 * 5.20 / 1.67;
        double expected = 0.3 / pc + 100 / (35 * 10.6 / 1.67) + Math.pow(2 / 32.695 + 60 / 208.79, 2);
        assertThat(Sheets.check(checks, "post combined").utilisation()).isCloseTo(expected, within(1e-4));
    }

    /** A fifth of the torsional strength, 41.76 kip-in, may be left out; a little more may not. */
    @Test
    void smallTorsionIsLeftOut() {
        DesignLoad small = load(2, 100, 41.7);
        DesignLoad large = load(2, 100, 41.8);
        double without = 0.3 / (35 * 5.20 / 1.67) + 100 / (35 * 10.6 / 1.67);
        assertThat(Sheets.check(run(ASD, PIPE, Tubes.A53, small, sheet(small)), "post combined").utilisation()).isCloseTo(without, within(1e-6));
        assertThat(Sheets.check(run(ASD, PIPE, Tubes.A53, large, sheet(large)), "post combined").utilisation()).isCloseTo(without + Math.pow(2 / 32.695 + 0.2002, 2), within(1e-4));
        assertThat(Sheets.check(run(ASD, PIPE, Tubes.A53, small, sheet(small)), "post torsion").utilisation()).isCloseTo(41.7 / 208.79, within(1e-4));
    }

    /** E/F_y = 828.57: compact to 58, noncompact to 256.86, valid to 372.86. */
    @ParameterizedTest
    @CsvSource({"57.9,compact", "58.1,noncompact", "256.8,noncompact", "256.9,slender", "372.8,slender", "372.9,none"})
    void limitsOfRoundTubes(double ratio, String kind) {
        DesignLoad load = load(0.1, 5, 0);
        Section tube = Tubes.chs(2 * ratio, 2);
        Trace trace = sheet(load);
        List<Check> checks = run(ASD, tube, Tubes.A53, load, trace);
        if (kind.equals("none")) {
            assertThat(checks).singleElement().satisfies(c -> {
                assertThat(c.name()).isEqualTo("wall slenderness");
                assertThat(c.passes()).isFalse();
            });
            return;
        }
        double fy = 35 * Tubes.ksi();
        double e = 29000 * Tubes.ksi();
        double mp = fy * tube.properties().plastic();
        double s = tube.properties().elastic();
        double mn = switch (kind) {
            case "compact" -> mp;
            case "noncompact" -> Math.min(mp, (0.021 * e / ratio + fy) * s);
            default -> 0.33 * e / ratio * s;
        };
        assertThat(Sheets.value(trace, "post-nominal/bending")).isCloseTo(mn, within(1e-6 * mn));
        assertThat(trace.find("post-nominal/bending").orElseThrow().meaning()).endsWith(kind);
    }

    /** D/t = 300, D = 600 mm, height 120 in: G5: a thin wall buckles in shear before it yields. */
    @Test
    void thinRoundWallInShear() {
        DesignLoad load = load(1, 50, 30);
        Trace trace = sheet(load);
        run(ASD, Tubes.chs(600, 2), Tubes.A53, load, trace);
        double e = 29000 * Tubes.ksi();
        double shear = Math.min(Math.max(1.60 * e / (Math.sqrt(3.048 / 0.6) * Math.pow(300, 1.25)), 0.78 * e / Math.pow(300, 1.5)), 0.6 * 35 * Tubes.ksi());
        assertThat(shear).isLessThan(0.6 * 35 * Tubes.ksi());
        double area = Tubes.chs(600, 2).properties().area();
        assertThat(Sheets.value(trace, "post-nominal/shear")).isCloseTo(shear * area / 2, within(1.0));
        double torsion = Math.max(1.23 * e / (Math.sqrt(3.048 / 0.6) * Math.pow(300, 1.25)), 0.60 * e / Math.pow(300, 1.5));
        assertThat(Sheets.value(trace, "post-nominal/torsion")).isCloseTo(torsion * Math.PI * 0.598 * 0.598 * 0.002 / 2, within(1.0));
    }

    /** A500 B, 46 ksi: root of E/F_y 25.108; flange 1.12 and 1.40: 28.12 and 35.15; web 2.42 and 5.70: 60.76 and 143.1. b = B - 3t. */
    @ParameterizedTest
    @CsvSource({"124.4,124.4", "124.6,124.6", "152.5,152.5", "152.7,152.7", "255,100", "256,100", "584,100", "585,100"})
    void rectangularTubes(double h, double b) {
        DesignLoad load = load(0.5, 20, 0);
        Section tube = Tubes.rhs(h, b, 4);
        Trace trace = sheet(load);
        List<Check> checks = run(ASD, tube, Tubes.A500, load, trace);
        double flange = (b - 12) / 4;
        double web = (h - 12) / 4;
        double root = Math.sqrt(29000 / 46.0);
        if (flange > 1.40 * root || web > 5.70 * root) {
            assertThat(checks.get(0).name()).isEqualTo("wall slenderness");
            assertThat(checks.get(0).passes()).isFalse();
            return;
        }
        double fy = 46 * Tubes.ksi();
        double mp = fy * tube.properties().plastic();
        double fall = mp - fy * tube.properties().elastic();
        double byFlange = flange <= 1.12 * root ? mp : Math.min(mp, mp - fall * (3.57 * flange / root - 4.0));
        double byWeb = web <= 2.42 * root ? mp : Math.min(mp, mp - fall * (0.305 * web / root - 0.738));
        assertThat(Sheets.value(trace, "post-nominal/bending")).isCloseTo(Math.min(byFlange, byWeb), within(1e-6 * mp));
        double shear = Math.sqrt(5) * root;
        double cv = web <= 1.10 * shear ? 1 : web <= 1.37 * shear ? 1.10 * shear / web : 1.51 * shear * shear / (web * web);
        assertThat(Sheets.value(trace, "post-nominal/shear")).isCloseTo(0.6 * fy * 2 * web * 0.004 * 0.004 * cv, within(1.0));
    }

    /** 4 x 4 x 0.233 in: C = 2 x 3.767^2 x 0.233 - 4.5 (4 - pi) 0.233^3 = 6.564 in3; 0.6 x 46 x 6.564 = 181.2 kip-in. */
    @Test
    void torsionOfSquareTube() {
        DesignLoad load = load(0.5, 50, 40);
        Trace trace = sheet(load);
        run(ASD, Tubes.rhs(4 * IN, 4 * IN, 0.233 * IN), Tubes.A500, load, trace);
        assertThat(Sheets.value(trace, "post-nominal/torsion") / KIP_IN).isCloseTo(181.16, within(0.1));
        DesignLoad thin = load(0.1, 5, 3);
        Trace wide = sheet(thin);
        run(ASD, Tubes.rhs(270, 100, 4), Tubes.A500, thin, wide);
        assertThat(Sheets.value(wide, "post-critical-stress")).isCloseTo(0.6 * 46 * Tubes.ksi() * 2.45 * Math.sqrt(29000 / 46.0) / 64.5, within(10.0));
        Trace wider = sheet(thin);
        run(ASD, Tubes.rhs(400, 100, 4), Tubes.A500, thin, wider);
        assertThat(Sheets.value(wider, "post-critical-stress")).isCloseTo(0.458 * Math.PI * Math.PI * 29000 * Tubes.ksi() / (97 * 97), within(10.0));
    }

    @Test
    void bothAxesWithTorsion() {
        DesignLoad load = new DesignLoad("case-b", 9000, 9000, 3000, 800, 1200, 500, 3);
        Section tube = Tubes.rhs(120, 80, 5);
        List<Check> checks = run(LRFD, tube, Tubes.A500, load, sheet(load));
        double fy = 46 * Tubes.ksi() * 0.9;
        double tc = 0.6 * fy * (2 * 0.075 * 0.115 * 0.005 - 4.5 * (4 - Math.PI) * Math.pow(0.005, 3));
        double round = 9000 / (0.6 * fy * 2 * 21 * 25e-6) + 800 / (0.6 * fy * 2 * 13 * 25e-6) + 3000 / tc;
        double sum = 500 / (fy * 1900e-6) + 9000 / (fy * tube.properties().plastic()) + 1200 / (fy * tube.properties().weakPlastic()) + round * round;
        assertThat(3000 / tc).isGreaterThan(0.2);
        assertThat(Sheets.check(checks, "post combined").utilisation()).isCloseTo(sum, within(1e-9));
    }

    @Test
    void heavierWallNeverWorse() {
        for (PostRule rule : List.of(ASD, LRFD)) {
            double last = Double.MAX_VALUE;
            for (double t = 0.5; t < 20; t += 0.05) {
                DesignLoad load = load(0.2, 40, 0);
                List<Check> checks = rule.check(Tubes.chs(168.3, t), Tubes.A53, load, new Trace().quiet());
                double used = checks.get(0).name().equals("wall slenderness") ? Double.MAX_VALUE : Sheets.check(checks, "post bending").utilisation();
                assertThat(used).as("wall " + t).isLessThanOrEqualTo(last);
                last = used;
            }
            assertThat(last).isLessThan(0.2);
        }
    }

    @Test
    void levels() {
        assertThat(ASD.strength()).isFalse();
        assertThat(LRFD.strength()).isTrue();
        assertThat(ASD.weightFactor()).isEqualTo(1.0);
        assertThat(LRFD.weightFactor()).isEqualTo(1.2);
    }
}
