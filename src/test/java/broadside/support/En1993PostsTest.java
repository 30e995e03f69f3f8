package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.support.Section.Material;
import broadside.trace.Trace;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Steel posts by EN 1993-1-1, against the clauses worked out by hand. */
class En1993PostsTest {

    private static final PostRule RULE = new PostRules(Tubes.RULES).of("en", Material.STEEL);
    private static final Section CHS = Tubes.chs(139.7, 5);

    private static DesignLoad load(double shear, double moment, double torsion) {
        return new DesignLoad("centred", shear, moment, torsion, 0, 0, 1000, 4);
    }

    private static List<Check> run(Section section, Grade grade, DesignLoad load, Trace trace) {
        List<Check> checks = RULE.check(section, grade, load, trace);
        SheetCheck.holds(trace);
        return checks;
    }

    private static Trace sheet(DesignLoad load) {
        return Sheets.with(LoadSymbols.EN, load);
    }

    /** 139.7 x 5 of S235: d/t 27.94, class 1; W_pl 90.80 cm3 (90.76 unrounded), A 21.16 cm2, W_t 137.6 cm3. */
    @Test
    void plasticResistances() {
        DesignLoad load = load(3000, 10_000, 500);
        Trace trace = sheet(load);
        run(CHS, Tubes.S235, load, trace);
        assertThat(Sheets.value(trace, "post-slenderness/tube")).isCloseTo(27.94, within(1e-9));
        assertThat(Sheets.value(trace, "post-class/tube")).isEqualTo(1);
        assertThat(Sheets.value(trace, "post-resistance/bending")).isCloseTo(21_338, within(0.0005 * 21_338));
        assertThat(Sheets.value(trace, "post-resistance/shear")).isCloseTo(182_770, within(20.0));
        assertThat(Sheets.value(trace, "post-resistance/torsion")).isCloseTo(18_669, within(5.0));
    }

    /** Without torsion: 10/21.329 + 1000/(2116 x 235) = 0.46884 + 0.00201. */
    @Test
    void sumOfShares() {
        DesignLoad load = load(3000, 10_000, 0);
        Trace trace = sheet(load);
        List<Check> checks = run(CHS, Tubes.S235, load, trace);
        assertThat(checks).extracting(Check::name).containsExactly("post shear", "post bending", "post combined");
        assertThat(Sheets.check(checks, "post bending").utilisation()).isCloseTo(0.46884, within(5e-5));
        assertThat(Sheets.check(checks, "post combined").utilisation()).isCloseTo(0.47085, within(5e-5));
        assertThat(Sheets.check(checks, "post shear").utilisation()).isCloseTo(3 / 182.77, within(1e-5));
    }

    /** With torsion: sigma = 1000/2116 + 10e6/68800 = 145.8, tau = 2e6/137600 + 3000/1347 = 16.76: 148.7 of 235. */
    @Test
    void elasticStressWithTorsion() {
        DesignLoad load = load(3000, 10_000, 2000);
        Trace trace = sheet(load);
        List<Check> checks = run(CHS, Tubes.S235, load, trace);
        double sigma = 1000 / 21.159e-4 + 10_000 / 68.803e-6;
        double tau = 2000 / 137.606e-6 + 3000 / 13.470e-4;
        assertThat(Sheets.value(trace, "post-stress")).isCloseTo(Math.sqrt(sigma * sigma + 3 * tau * tau), within(2e4));
        assertThat(Sheets.check(checks, "post combined").capacity()).isEqualTo(235e6);
        assertThat(Sheets.check(checks, "post torsion").utilisation()).isCloseTo(2 / 18.669, within(1e-4));
        assertThat(Sheets.value(trace, "post-resistance/shear-with-torsion")).isCloseTo(182_770 * (1 - 2 / 18.669), within(30.0));
    }

    /** V = 0.75 V_pl: rho = 0.25, three quarters of the moment are left; at half nothing is taken off. */
    @Test
    void highShearLowersBending() {
        DesignLoad load = load(0.75 * 182_775.8, 10_000, 0);
        Trace trace = sheet(load);
        List<Check> checks = run(CHS, Tubes.S235, load, trace);
        assertThat(Sheets.value(trace, "post-resistance/bending-with-shear")).isCloseTo(0.75 * 21_338, within(10.0));
        assertThat(Sheets.check(checks, "post bending").capacity()).isEqualTo(Sheets.value(trace, "post-resistance/bending-with-shear"));
        DesignLoad half = load(0.4999 * 182_775.8, 10_000, 0);
        Trace other = sheet(half);
        run(CHS, Tubes.S235, half, other);
        assertThat(Sheets.has(other, "post-resistance/bending-with-shear")).isFalse();
    }

    @Test
    void nothingLeftGivesNoInfinity() {
        for (double torsion : new double[] {0, 20_000, 1e9}) {
            DesignLoad load = load(400_000, 10_000, torsion);
            List<Check> checks = run(CHS, Tubes.S235, load, sheet(load));
            assertThat(checks).allMatch(c -> Double.isFinite(c.utilisation()) && c.utilisation() <= Check.MOST);
            assertThat(Sheets.check(checks, "post bending").utilisation()).isEqualTo(Check.MOST);
        }
    }

    /** d/t of 50, 70 and 90 epsilon squared, epsilon 1. */
    @ParameterizedTest
    @CsvSource({"50,1", "50.01,2", "70,2", "70.01,3", "90,3"})
    void classLimitsOfTubes(double ratio, int number) {
        DesignLoad load = load(100, 1000, 0);
        Trace trace = sheet(load);
        Section tube = Tubes.chs(4 * ratio, 4);
        run(tube, Tubes.S235, load, trace);
        assertThat(Sheets.value(trace, "post-class/tube")).isEqualTo(number);
        double w = number == 3 ? tube.properties().elastic() : tube.properties().plastic();
        assertThat(Sheets.value(trace, "post-resistance/bending")).isCloseTo(235e6 * w, within(1e-3));
    }

    /** S355: epsilon squared 0.662, so class 3 ends at 59.58. */
    @Test
    void thinWallsAreNotCovered() {
        DesignLoad load = load(100, 1000, 0);
        List<Check> checks = run(Tubes.chs(240, 4), Tubes.S355, load, sheet(load));
        assertThat(checks).hasSize(1);
        assertThat(checks.get(0).name()).isEqualTo("wall slenderness");
        assertThat(checks.get(0).passes()).isFalse();
        assertThat(checks.get(0).utilisation()).isCloseTo(60 / (90 * 235 / 355.0), within(1e-9));
        assertThat(checks.get(0).rule()).contains("EN 1993-1-6");
        assertThat(run(Tubes.chs(238, 4), Tubes.S355, load, sheet(load))).hasSize(3);
    }

    /** c = b - 3t: 33, 38, 42 for the flange; the web of 72 governs a deep thin tube. */
    @ParameterizedTest
    @CsvSource({"144,144,1", "144.1,144.1,2", "164,164,2", "164.1,164.1,3", "180,180,3", "180.1,180.1,4", "300,100,1", "300.1,100,2", "344,100,2", "344.1,100,3", "508,100,3", "508.1,100,4"})
    void classLimitsOfFlats(double h, double b, int number) {
        DesignLoad load = load(100, 1000, 0);
        Trace trace = sheet(load);
        List<Check> checks = run(Tubes.rhs(h, b, 4), Tubes.S235, load, trace);
        assertThat(Math.max(Sheets.value(trace, "post-class/flange"), Sheets.value(trace, "post-class/web"))).isEqualTo(number);
        assertThat(checks.get(0).name().equals("wall slenderness")).isEqualTo(number == 4);
    }

    /** 120 x 80 x 5 S235 with wind on the face and weight to one side: A_v = A h/(b + h); both moments count. */
    @Test
    void bothAxes() {
        DesignLoad load = new DesignLoad("centred", 3000, 6000, 0, 500, 1500, 0, 4);
        Section s = Tubes.rhs(120, 80, 5);
        Trace trace = sheet(load);
        List<Check> checks = run(s, Tubes.S235, load, trace);
        assertThat(Sheets.value(trace, "post-shear-area")).isCloseTo(1900e-6 * 120 / 200, within(1e-12));
        assertThat(Sheets.value(trace, "post-shear-area/along")).isCloseTo(1900e-6 * 80 / 200, within(1e-12));
        double strong = (80 * 120 * 120 - 70 * 110 * 110) / 4e9 * 235e6;
        double weak = (120 * 80 * 80 - 110 * 70 * 70) / 4e9 * 235e6;
        assertThat(Sheets.check(checks, "post combined").utilisation()).isCloseTo(6000 / strong + 1500 / weak, within(1e-9));
        assertThat(Sheets.check(checks, "post bending along the face").utilisation()).isCloseTo(1500 / weak, within(1e-9));
        assertThat(Sheets.check(checks, "post shear along the face").demand()).isEqualTo(500);
    }

    @Test
    void torsionOnBothAxes() {
        DesignLoad load = new DesignLoad("centred", 3000, 6000, 700, 500, 1500, 900, 4);
        List<Check> checks = run(Tubes.rhs(120, 80, 5), Tubes.S235, load, sheet(load));
        double sigma = 900 / 1900e-6 + 6000 / Tubes.rhs(120, 80, 5).properties().elastic() + 1500 / Tubes.rhs(120, 80, 5).properties().weakElastic();
        double tau = 700 / (2 * 0.115 * 0.075 * 0.005) + 3000 / (1900e-6 * 0.6) + 500 / (1900e-6 * 0.4);
        assertThat(Sheets.check(checks, "post combined").demand()).isCloseTo(Math.sqrt(sigma * sigma + 3 * tau * tau), within(1.0));
    }

    @Test
    void heavierWallNeverWorse() {
        for (Grade grade : List.of(Tubes.S235, Tubes.S355)) {
            double last = Double.MAX_VALUE;
            for (double t = 1.2; t < 20; t += 0.1) {
                DesignLoad load = load(2000, 8000, 0);
                List<Check> checks = RULE.check(Tubes.chs(139.7, t), grade, load, new Trace().quiet());
                double used = checks.get(0).name().equals("wall slenderness") ? Double.MAX_VALUE : Sheets.check(checks, "post bending").utilisation();
                assertThat(used).as("wall " + t).isLessThanOrEqualTo(last);
                last = used;
            }
            assertThat(last).isLessThan(0.3);
        }
    }

    @Test
    void titleFactorAndLevel() {
        assertThat(RULE.strength()).isTrue();
        assertThat(RULE.weightFactor()).isEqualTo(1.35);
        assertThat(RULE.title()).contains("EN 1993-1-1");
    }
}
