package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.support.Section.Material;
import broadside.trace.Trace;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Timber and aluminium posts, against the rules worked out by hand. */
class ElasticPostsTest {

    private static final PostRules RULES = new PostRules(Tubes.RULES);

    private static List<Check> run(PostRule rule, Section section, Grade grade, DesignLoad load, Trace trace) {
        List<Check> checks = rule.check(section, grade, load, trace);
        SheetCheck.holds(trace);
        return checks;
    }

    private static DesignLoad load(double torsion, double weak) {
        return new DesignLoad("normal", 2000, 3000, torsion, 0, weak, 500, 3);
    }

    /** C24, 150 x 100: f_m,d = 0.7 x 24/1.3 = 12.923; W 375 cm3: 4.846 kNm; f_v,d 2.1538, A_v 0.67 x 150/1.5 cm2 = 67 cm2: 14.431 kN. */
    @Test
    void eurocodeTimber() {
        PostRule rule = RULES.of("en", Material.TIMBER);
        DesignLoad load = load(0, 400);
        Trace trace = Sheets.with(LoadSymbols.EN, load);
        List<Check> checks = run(rule, Tubes.timber(150, 100), Tubes.C24, load, trace);
        assertThat(Sheets.value(trace, "post-resistance/bending")).isCloseTo(4846.15, within(0.01));
        assertThat(Sheets.value(trace, "post-resistance/shear")).isCloseTo(14_430.8, within(0.1));
        double stress = 500 / 0.015 + 3000 / 375e-6 + 400 / 250e-6;
        assertThat(Sheets.value(trace, "post-stress")).isCloseTo(stress, within(1.0));
        assertThat(Sheets.check(checks, "post combined").utilisation()).isCloseTo(stress / (0.7 * 24e6 / 1.3), within(1e-9));
        PostRule instantaneous = RULES.of("en", Material.TIMBER, "instantaneous");
        assertThat(Sheets.check(instantaneous.check(Tubes.timber(150, 100), Tubes.C24, load, new Trace()), "post bending").capacity()).isCloseTo(4846.15 * 9 / 7, within(0.1));
        assertThat(instantaneous.title()).contains("instantaneous");
    }

    /** k_shape = 1 + 0.15 x 1.5 = 1.225; of a plank, 2. Torsion and shear are added. */
    @Test
    void timberInTorsion() {
        PostRule rule = RULES.of("en", Material.TIMBER);
        DesignLoad load = load(200, 0);
        Trace trace = Sheets.with(LoadSymbols.EN, load);
        Section post = Tubes.timber(150, 100);
        List<Check> checks = run(rule, post, Tubes.C24, load, trace);
        double fv = 0.7 * 4e6 / 1.3;
        double torsion = 200 / (post.properties().torsionModulus() * 1.225 * fv);
        assertThat(Sheets.check(checks, "post torsion").utilisation()).isCloseTo(torsion, within(1e-9));
        assertThat(Sheets.check(checks, "post shear and torsion").utilisation()).isCloseTo(torsion + 2000 / 14_430.77, within(1e-6));
        Trace plank = Sheets.with(LoadSymbols.EN, load);
        run(rule, Tubes.timber(300, 40), Tubes.C24, load, plank);
        assertThat(Sheets.value(plank, "post-shape")).isEqualTo(2);
        Trace turned = Sheets.with(LoadSymbols.EN, load);
        run(rule, Tubes.timber(100, 150), Tubes.C24, load, turned);
        assertThat(Sheets.value(turned, "post-shape")).isEqualTo(1.225);
    }

    @Test
    void gluedTimberHasItsOwnFactor() {
        PostRule rule = RULES.of("en", Material.TIMBER);
        List<Check> checks = rule.check(Tubes.timber(150, 100), Tubes.timber("GL24h", 24e6, 2.7e6, 11.6e9), load(0, 0), new Trace());
        assertThat(Sheets.check(checks, "post bending").capacity()).isCloseTo(0.7 * 24e6 / 1.25 * 375e-6, within(0.01));
    }

    /** 5.5 x 5.5 in, Southern Pine No.2: 850 x 1.6 = 1360 psi on S = 27.73 in3: 37.71 kip-in; a 4x4 is wet lumber: x 0.85 on 7.146 in3. */
    @Test
    void americanTimber() {
        PostRule rule = RULES.of("us-asd", Material.TIMBER);
        DesignLoad load = load(0, 0);
        Trace trace = Sheets.with(LoadSymbols.US, load);
        run(rule, Tubes.timber(139.7, 139.7), Tubes.PINE, load, trace);
        double lbIn = 4.4482216152605 * 0.0254;
        assertThat(Sheets.value(trace, "post-resistance/bending") / lbIn).isCloseTo(1360 * 166.375 / 6, within(0.5));
        assertThat(Sheets.value(trace, "post-resistance/shear") / 4.4482216152605).isCloseTo(165 * 1.6 * 30.25 / 1.5, within(0.1));
        Trace small = Sheets.with(LoadSymbols.US, load);
        run(rule, Tubes.timber(88.9, 88.9), Tubes.PINE, load, small);
        assertThat(Sheets.value(small, "post-resistance/bending") / lbIn).isCloseTo(1360 * 0.85 * 42.875 / 6, within(0.5));
        assertThat(Sheets.value(small, "post-resistance/shear") / 4.4482216152605).isCloseTo(165 * 1.6 * 0.97 * 12.25 / 1.5, within(0.1));
        Trace edge = Sheets.with(LoadSymbols.US, load);
        run(rule, Tubes.timber(114, 114), Tubes.PINE, load, edge);
        assertThat(Sheets.value(edge, "post-wet-factor")).isEqualTo(1);
        DesignLoad twisted = load(100, 0);
        Trace torsion = Sheets.with(LoadSymbols.US, twisted);
        run(rule, Tubes.timber(139.7, 139.7), Tubes.PINE, twisted, torsion);
        assertThat(Sheets.value(torsion, "post-resistance/torsion-stress")).isCloseTo(0.667 * 165 * 1.6 * Tubes.ksi() / 1000, within(1.0));
        assertThat(rule.strength()).isFalse();
        assertThat(RULES.of("us-strength", Material.TIMBER).strength()).isFalse();
    }

    /** 100 x 4, f_o 250: elastic W 27.78 cm3; 250/1.1, 250/1.65, 0.9 x 250. */
    @Test
    void aluminium() {
        Section tube = Tubes.round("ALU 100x4", 100, 4, Material.ALUMINIUM, 2700);
        double w = tube.properties().elastic();
        double a = tube.properties().area();
        DesignLoad load = load(600, 0);
        double sigma = 500 / a + 3000 / w;
        double tau = 600 / (2 * w) + 2000 / (0.6 * a);
        Object[][] ways = {{"en", 250e6 / 1.10, 1 / Math.sqrt(3), LoadSymbols.EN}, {"us-asd", 250e6 / 1.65, 0.6, LoadSymbols.US}, {"us-strength", 250e6 * 0.9, 0.6, LoadSymbols.US}};
        for (Object[] way : ways) {
            PostRule rule = RULES.of((String) way[0], Material.ALUMINIUM);
            Trace trace = Sheets.with((LoadSymbols) way[3], load);
            List<Check> checks = run(rule, tube, Tubes.T6, load, trace);
            double f = (double) way[1];
            double fv = f * (double) way[2];
            assertThat(Sheets.check(checks, "post bending").utilisation()).isCloseTo(3000 / (w * f), within(1e-9));
            assertThat(Sheets.check(checks, "post shear").utilisation()).isCloseTo(2000 / (0.6 * a * fv), within(1e-9));
            assertThat(Sheets.check(checks, "post torsion").utilisation()).isCloseTo(600 / (2 * w * fv), within(1e-9));
            assertThat(Sheets.check(checks, "post combined").utilisation()).isCloseTo(Math.sqrt(sigma * sigma + 3 * tau * tau) / f, within(1e-9));
            assertThat(String.join(" ", rule.notes())).contains("welds").contains("Local buckling");
            assertThat(rule.strength()).isEqualTo(!way[0].equals("us-asd"));
        }
    }

    @Test
    void whatDoesNotFitIsRefused() {
        assertThatThrownBy(() -> RULES.of("en", Material.TIMBER).check(Tubes.timber(100, 100), Tubes.PINE, load(0, 0), new Trace())).isInstanceOf(UnfitAnswer.class)
            .hasMessageContaining("no grade of EN 338");
        assertThatThrownBy(() -> RULES.of("us-asd", Material.TIMBER).check(Tubes.timber(100, 100), Tubes.C24, load(0, 0), new Trace())).isInstanceOf(NoAnswer.class)
            .hasMessageContaining("European grade");
        assertThatThrownBy(() -> RULES.of("en", Material.TIMBER, "weekly")).isInstanceOf(UnfitAnswer.class).hasMessageContaining("short, instantaneous");
        assertThatThrownBy(() -> RULES.of("fr", Material.STEEL)).isInstanceOf(UnfitAnswer.class).hasMessageContaining("us-strength");
    }
}
