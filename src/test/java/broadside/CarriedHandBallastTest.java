package broadside;

import static broadside.CarriedJobs.EN;
import static broadside.CarriedJobs.carried;
import static broadside.CarriedJobs.check;
import static broadside.CarriedJobs.enSite;
import static broadside.CarriedJobs.job;
import static broadside.CarriedJobs.part;
import static broadside.CarriedJobs.result;
import static broadside.CarriedJobs.step;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.support.Check;
import org.junit.jupiter.api.Test;

/** Ballast, feet, braces and fixings of whole jobs worked out by hand; only the wind comes from the result. */
class CarriedHandBallastTest {

    private static final double G = 9.80665;

    /** What acts, times the ratio that has to be reached, against what resists. */
    private static void ratio(Carried carried, String name, String named, double required, double resists, double acts) {
        Check check = check(carried, name, named);
        assertThat(check.demand()).as("asked of " + name).isCloseTo(required * acts, within(1e-9 * required * acts));
        assertThat(check.capacity()).as(name + ", " + named).isCloseTo(resists, within(1e-9 * resists));
        assertThat(check.utilisation()).as(name).isCloseTo(required * acts / resists, within(1e-9 * required * acts / resists));
        assertThat(check.passes()).isEqualTo(required * acts <= resists * (1 + 1e-9));
    }

    private static void near(double actual, double expected) {
        assertThat(actual).isCloseTo(expected, within(1e-9 * Math.max(1, Math.abs(expected))));
    }

    /** 2.4 m high, frames 2.4 m apart, braces 1.6 m deep: 120 kg of face and 600 kg below it, 900 kg on the brace, friction 0.4, factor 1.5. */
    @Test
    void hoardingOnKentledgeBothWays() {
        String job = job(EN + ", 'stability': 'factor-1.5'", enSite(26), "hoarding", "'length': '24 m', 'height': '2.4 m', 'clearance': '0 m', 'posts': {'spacing': '2.4 m'}, "
            + "'ballast': {'mass': '900 kg', 'lever': '1.6 m', 'face-mass': '120 kg', 'front-mass': '600 kg', 'friction': 0.4}");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        // The second frame carries 2.4 m of zone B, c = 2.1; the force stands 1.2 m above the ground.
        double f = step(item, "velocity-pressure") * 2.1 * 2.4 * 2.4;
        // Towards the brace it tips about the foot of the brace: face and front ballast, 1.6 m away, hold it; the brace's own stands on the edge.
        ratio(carried, "overturning towards the brace", "zone B", 1.5, G * (120 + 600) * 1.6, f * 1.2);
        // Away from it it tips about the foot of the face: only the 900 kg, 1.6 m away, hold it.
        ratio(carried, "overturning away from the brace", "zone B", 1.5, G * 900 * 1.6, f * 1.2);
        ratio(carried, "sliding", "zone B", 1.5, 0.4 * G * (120 + 600 + 900), f);
        // In place of the ballast typed: 1.5 M/(g 1.6) on either foot, and 1.5 F/(0.4 g) in all.
        double foot = 1.5 * f * 1.2 / (G * 1.6);
        double all = 1.5 * f / (0.4 * G);
        near(part(carried, "ballast", "ballast-line").value(), foot - 120);
        near(part(carried, "ballast", "ballast-brace").value(), Math.max(foot, all - foot));
        near(part(carried, "ballast", "ballast-per-metre").value(), (foot - 120 + Math.max(foot, all - foot)) / 2.4);
    }

    /** A line of six panels 3.5 x 2 m, closed cover; foot 0.7 m, blocks 60 kg 0.2 m behind and 40 kg 0.25 m before the line, brace 1.5 m with 80 kg. */
    @Test
    void fenceOnFeetWithABraceBothWays() {
        String job = job(EN + ", 'stability': 'en-1990-equ'", enSite(22), "banner-fence", "'panel-length': '3.5 m', 'panel-height': '2 m', 'panels': 6, 'cover-solidity': 1.0, "
            + "'fence-solidity': 0.25, 'panel-mass': '24 kg', 'foot-mass': '18 kg', 'foot-length': '0.7 m', 'blocks': [{'mass': '60 kg', 'lever': '0.2 m'}, "
            + "{'mass': '40 kg', 'lever': '-0.25 m'}], 'brace': {'lever': '1.5 m', 'mass': '80 kg'}, 'friction': 0.35");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        // l/h = 10.5, above 10: zone A 3.4 on 0.3 h = 0.6 m and zone B 2.1 on the rest of the end panel; at 1 m above the ground.
        double f = step(item, "velocity-pressure") * 2 * (3.4 * 0.6 + 2.1 * 2.9);
        near(step(item, "fence-panel-shear/hardest") / f, 1);
        // EQU: 1.5 of the wind, 0.9 of the weight. Towards the brace: all but its own mass about its foot, 1.5 m behind the line.
        ratio(carried, "overturning towards the brace", "hardest panel, with its cover", 1, 0.9 * G * (42 * 1.5 + 60 * 1.3 + 40 * 1.75), 1.5 * f * 1.0);
        // Away from it: about the front end of the foot, 0.35 m before the line. The brace counts with 1.5 m, though its foot is 1.85 m from that end: the safe side.
        double away = 0.9 * G * (42 * 0.35 + 60 * 0.55 + 40 * 0.10 + 80 * 1.5);
        ratio(carried, "overturning away from the brace", "hardest panel, with its cover", 1, away, 1.5 * f * 1.0);
        assertThat(away).isLessThan(0.9 * G * (42 * 0.35 + 60 * 0.55 + 40 * 0.10 + 80 * 1.85));
        ratio(carried, "sliding", "hardest panel, with its cover", 1, 0.35 * 0.9 * G * (42 + 60 + 40 + 80), 1.5 * f);
        // Blocks on the line against the wind towards the brace; on the brace the most of tipping away and of sliding.
        double line = 1.5 * f / (0.9 * G * 1.5) - 42;
        double brace = Math.max(1.5 * f / (0.9 * G * 1.5) - (42 + line) * 0.35 / 1.5, 1.5 * f / (0.35 * 0.9 * G) - 42 - line);
        near(part(carried, "ballast", "ballast-line").value(), line);
        near(part(carried, "ballast", "ballast-brace").value(), brace);
        near(part(carried, "ballast", "ballast-per-metre").value(), (line + brace) / 3.5);
    }

    /** What is needed, typed in, stands; one part in a hundred less does not. */
    @Test
    void theBallastNeededStands() {
        for (String[] kind : new String[][] {{"factor-1.5", "0.4"}, {"en-1990-equ", "0.25"}, {"frame-ballast-0.9", "0.6"}}) {
            String head = "'length': '24 m', 'height': '2.4 m', 'clearance': '0 m', 'posts': {'spacing': '2.4 m'}, 'ballast': {'lever': '1.6 m', 'face-mass': '120 kg', 'friction': "
                + kind[1];
            Carried need = carried(job(EN + ", 'stability': '" + kind[0] + "'", enSite(26), "hoarding", head + "}"));
            double front = part(need, "ballast", "ballast-line").value();
            double brace = part(need, "ballast", "ballast-brace").value();
            for (double share : new double[] {1, 0.99}) {
                Carried typed = carried(job(EN + ", 'stability': '" + kind[0] + "'", enSite(26), "hoarding", head + ", 'mass': '" + share * brace + " kg', 'front-mass': '" + share * front
                    + " kg'}"));
                assertThat(typed.passes()).as("%s of what %s needs", share, kind[0]).isEqualTo(share == 1);
            }
        }
    }

    /** 1.2 x 2.5 m, 60 mm thick, 40 mm off the wall, 38 kg, on two by three fixings 1.15 m apart; building 30 x 20 x 12 m, 0.3 m from the corner. */
    @Test
    void panelOnFixings() {
        String job = job(EN, enSite(26), "facade-panel", "'backing': 'wall', 'width': '1.2 m', 'height': '2.5 m', 'bottom': '6 m', 'distance-from-corner': '0.3 m', "
            + "'building': {'width': '30 m', 'depth': '20 m', 'height': '12 m', 'roof-slope': '2 deg'}, 'gap': '40 mm', 'depth': '60 mm', 'mass': '38 kg', "
            + "'fixings': {'columns': 2, 'rows': 3, 'horizontal-pitch': '1.1 m', 'vertical-pitch': '1.15 m', 'allowable-tension': '3 kN', 'allowable-shear': '1 kN'}");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        // One fixing of the middle row: 0.6 x 1.15 m = 0.69 m2, below 1 m2: zone A, c_pe,1 = -1.4.
        double p = 1.4 * step(item, "velocity-pressure");
        double weight = 38 * G;
        // Rails over three fixings: 1.25; the weight hangs 40 + 30 mm off the wall: rows at 1.15 m above and below the middle, G e z/(2 x 2 z^2).
        double tension = 1.25 * p * 0.6 * 1.15 + weight * 0.07 * 1.15 / (2 * 2 * 1.15 * 1.15);
        // Shear of each: weight and wind on the edge, 2.5 x 0.06 m, at right angles to each other.
        double shear = Math.hypot(p * 2.5 * 0.06, weight) / 6;
        near(part(carried, "fixings", "pull").value(), tension);
        near(part(carried, "fixings", "shear").value(), shear);
        near(check(carried, "fixings").demand(), tension / 3000 + shear / 1000);
        assertThat(check(carried, "fixings").capacity()).isEqualTo(1);
        assertThat(carried.passes()).isTrue();
    }

    /** 0.6 x 2.4 m, 0.1 m off the wall, 34 kg, on two brackets 1.8 m apart with two by two fixings at 100 x 140 mm each. */
    @Test
    void bladeOnBrackets() {
        String job = job(EN, enSite(26), "projecting-sign", "'projection': '0.6 m', 'height': '2.4 m', 'bottom': '3.2 m', 'gap': '0.1 m', 'depth': '0.12 m', 'mass': '34 kg', "
            + "'brackets': {'count': 2, 'spacing': '1.8 m'}, 'fixings': {'columns': 2, 'rows': 2, 'horizontal-pitch': '100 mm', 'vertical-pitch': '140 mm', "
            + "'allowable-tension': '3 kN', 'allowable-shear': '2 kN'}");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        double f = step(item, "force/eccentric");
        double edge = step(item, "force/edge-on");
        double weight = 34 * G;
        // Square on, the force a quarter of the width farther out: 0.1 + 0.3 + 0.15 = 0.55 m; four fixings on each side, 100 mm apart: T = M/(4 x 0.1).
        // The weight at 0.4 m is held by the four fixings of the top bracket, 1.8 m above the lower one.
        double hung = weight * 0.4 / (1.8 * 4);
        double tension = f * 0.55 / (4 * 0.1) + hung;
        double shear = Math.hypot(f, weight) / 8;
        near(check(carried, "fixings", "square on").demand(), tension / 3000 + shear / 2000);
        near(part(carried, "fixings", "pull").value(), tension);
        near(part(carried, "fixings", "shear").value(), shear);
        // At right angles to the wall: the wind pulls all eight alike.
        near(check(carried, "fixings", "along").demand(), (edge / 8 + hung) / 3000 + weight / 8 / 2000);
        assertThat(check(carried, "fixings", "square on").passes()).as("0.937 + 0.129 = 1.066").isFalse();
    }

    /** A fence without a brace, blocks on the line: about the leeward end of the foot, either way. */
    @Test
    void fenceOnBlocks() {
        String job = job(EN + ", 'stability': 'en-13782'", enSite(22), "banner-fence", "'panel-length': '3.5 m', 'panel-height': '2 m', 'panels': 6, 'cover-solidity': 1.0, "
            + "'fence-solidity': 0.25, 'panel-mass': '24 kg', 'foot-mass': '18 kg', 'foot-length': '0.7 m', 'blocks': [{'mass': '60 kg', 'lever': '0 m'}], 'friction': 0.35");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        double f = step(item, "velocity-pressure") * 2 * (3.4 * 0.6 + 2.1 * 2.9);
        // Full weight, 1.2 of the wind.
        ratio(carried, "overturning", "hardest panel, with its cover", 1, G * (42 + 60) * 0.35, 1.2 * f);
        ratio(carried, "sliding", "hardest panel, with its cover", 1, 0.35 * G * (42 + 60), 1.2 * f);
        near(part(carried, "ballast", "ballast-line").value(), Math.max(1.2 * f / (G * 0.35), 1.2 * f / (0.35 * G)) - 42);
    }
}
