package broadside;

import static broadside.CarriedJobs.ASCE;
import static broadside.CarriedJobs.EN;
import static broadside.CarriedJobs.US_SITE;
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

/**
 * Posts and footings of whole jobs worked out by hand. Only the wind on the boards and on the bare post comes from the result;
 * sizes, masses, section properties, strengths and the ground are worked out here from the rules and from what is typed.
 */
class CarriedHandTest {

    private static final double G = 9.80665;

    /** CHS 139.7x5, S235: mm. A = pi/4 (139.7^2 - 129.7^2) = 2115.9; I = pi/64 (139.7^4 - 129.7^4) = 480.54e4. */
    private static final double AREA = Math.PI / 4 * (139.7 * 139.7 - 129.7 * 129.7);
    private static final double INERTIA = Math.PI / 64 * (Math.pow(139.7, 4) - Math.pow(129.7, 4));
    /** W_el = I/69.85 = 68.80e3; W_pl = (139.7^3 - 129.7^3)/6 = 90.76e3; W_t = 2 W_el; A_v = 2 A/pi = 1347; 7850 kg/m3: 16.61 kg/m. */
    private static final double ELASTIC = INERTIA / 69.85;
    private static final double PLASTIC = (Math.pow(139.7, 3) - Math.pow(129.7, 3)) / 6;
    private static final double TORSION = 2 * ELASTIC;
    private static final double SHEAR_AREA = 2 * AREA / Math.PI;
    private static final double MASS = 7850e-6 * AREA;

    private static final String TUBE = "'section': 'CHS 139.7x5', 'grade': 'S235'";
    private static final String SIGN = "'boards': [{'width': '2 m', 'height': '1.2 m', 'clearance': '2.2 m', 'depth': '0.05 m', 'mass': '30 kg'}], 'posts': {'count': 1, " + TUBE + "}";

    private static void of(Carried carried, String name, double demand, double capacity) {
        Check check = check(carried, name);
        assertThat(check.demand()).as("demand of " + name).isCloseTo(demand, within(1e-6 * Math.abs(demand) + 1e-9));
        assertThat(check.capacity()).as("capacity of " + name).isCloseTo(capacity, within(1e-6 * Math.abs(capacity) + 1e-9));
        assertThat(check.utilisation()).as(name).isCloseTo(demand / capacity, within(1e-6 * demand / capacity + 1e-12));
    }

    @Test
    void sectionPropertiesOfTheHandCalculation() {
        assertThat(AREA).isCloseTo(2116, within(1.0));
        assertThat(PLASTIC * 235e-6).as("plastic moment, kN m").isCloseTo(21.33, within(0.02));
        assertThat(SHEAR_AREA * 235 / Math.sqrt(3) / 1000).as("plastic shear, kN").isCloseTo(182.8, within(0.1));
        assertThat(TORSION * 235 / Math.sqrt(3) / 1e6).as("torsion, kN m").isCloseTo(18.67, within(0.01));
    }

    /** One post, board 2 x 1.2 m from 2.2 m to 3.4 m, force F at 2.8 m, pushed 2/4 = 0.5 m aside in the eccentric case. */
    @Test
    void signOnOnePostByEurocode() {
        String job = job(EN, enSite(26), "post-sign", SIGN + ", 'footing': {'kind': 'planted', 'width': '0.5 m', 'ground': 'average'}");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        double f = step(item, "force/eccentric");
        double drag = step(item, "post-own/force/1");
        assertThat(f).as("q_p 1.8 b h").isCloseTo(step(item, "velocity-pressure") * 1.8 * 2 * 1.2, within(1e-6));
        // The wind on the bare post acts at 1.1 m, half of the 2.2 m below the board.
        double shear = 1.5 * (f + drag);
        double moment = 1.5 * (f * 2.8 + drag * 1.1);
        double torsion = 1.5 * f * 0.5;
        // Class 1: 139.7/5 = 27.94, not above 50. EN 1993-1-1 6.2.7: T_Rd = W_t f_y/3^0.5.
        of(carried, "post torsion", torsion, TORSION * 235 / Math.sqrt(3) / 1000);
        // (6.28): V_pl,T = (1 - tau_t/(f_y/3^0.5)) V_pl, V_pl = A_v f_y/3^0.5; the shear is far below half of it.
        double twist = torsion * 1000 / TORSION;
        of(carried, "post shear", shear, (1 - twist / (235 / Math.sqrt(3))) * SHEAR_AREA * 235 / Math.sqrt(3));
        of(carried, "post bending", moment, PLASTIC * 235 / 1000);
        // 6.2.1(5), (6.1): (sigma/f)^2 + 3 (tau/f)^2 = 1, so sigma_v = (sigma^2 + 3 tau^2)^0.5 against 235; sigma = N/A + M/W_el, N = 1.35 (board + 3.4 m of post).
        double axial = 1.35 * G * (30 + MASS * 3.4);
        double sigma = axial / AREA + moment * 1000 / ELASTIC;
        double tau = twist + shear / SHEAR_AREA;
        of(carried, "post combined", Math.sqrt(sigma * sigma + 3 * tau * tau) * 1e6, 235e6);
        // Safe for every point of the section: the outer fibre has no shear of V, and the neutral axis the peak 2 V/A of a thin tube but no bending.
        double stress = check(carried, "post combined").demand() / 1e6;
        assertThat(stress).isGreaterThan(Math.sqrt(sigma * sigma + 3 * twist * twist));
        assertThat(stress).isGreaterThan(Math.sqrt(3) * (twist + 2 * shear / AREA));
        // Service: 1.0. P at a of a cantilever moves its top H = 3.4 m by P a^2 (3 H - a)/(6 E I): summed over the board, 2.2 m to 3.4 m; an even load w over
        // the first c = 2.2 m moves it by w c^4/(8 E I) + w c^3/(6 E I) (H - c). Limit 25 mm/m x 3.4 m.
        double ei = 210e9 * INERTIA * 1e-12;
        double w = drag / 2.2;
        double bent = summed(f, 2.2, 3.4, 3.4) / (6 * ei) + w * Math.pow(2.2, 4) / (8 * ei) + w * Math.pow(2.2, 3) / (6 * ei) * 1.2;
        of(carried, "post deflection", bent, 0.025 * 3.4);
        // PD 6547: M + V P/2^0.5 not above G b P^3/10/1.25, G = 390 kN/m3, b = 0.5 m. At 1.00 m: 16.0 against 15.6 kN m; at 1.05 m: 16.2 against 18.06.
        assertThat(moment + shear * 1.00 / Math.sqrt(2)).isGreaterThan(390e3 * 0.5 / 12.5);
        assertThat(part(carried, "footing", "depth").value()).isCloseTo(1.05, within(1e-12));
        of(carried, "ground resistance", moment + shear * 1.05 / Math.sqrt(2), 390e3 * 0.5 * Math.pow(1.05, 3) / 12.5);
    }

    /** The same sign on a pad 1.5 x 1.6 x 0.6 m: the resultant leaves the middle third. */
    @Test
    void signOnAPad() {
        String job = job(EN + ", 'stability': 'en-1990-equ'", enSite(26), "post-sign", SIGN
            + ", 'footing': {'kind': 'pad', 'width': '1.5 m', 'length': '1.6 m', 'depth': '0.6 m', 'bearing': '100 kPa', 'friction': 0.4}");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        double f = step(item, "force/centred");
        double drag = step(item, "post-own/force/1");
        // N = 2400 x 1.5 x 1.6 x 0.6 kg of concrete, 30 kg of board, 3.4 m of post; M at the base of the pad, 0.6 m below the ground.
        double n = G * (2400 * 1.5 * 1.6 * 0.6 + 30 + MASS * 3.4);
        double base = f * (2.8 + 0.6) + drag * (1.1 + 0.6);
        // EQU: 1.5 of the wind against 0.9 of the weight about the edge, 0.75 m from the middle; sliding 0.4 x 0.9 N.
        of(carried, "overturning", 1.5 * base, 0.9 * n * 0.75);
        of(carried, "sliding", 1.5 * (f + drag), 0.4 * 0.9 * n);
        // Service: e = M/N = 0.30 m, above 1.5/6; contact 3 (0.75 - e); q = 2 N/(3 L (B/2 - e)).
        double e = base / n;
        assertThat(e).isBetween(1.5 / 6, 0.75);
        of(carried, "bearing", 2 * n / (3 * 1.6 * (0.75 - e)), 100e3);
    }

    /** Clay: 6.2 kPa (130 psf) on the length in contact by the factored loads, and not above half of the weight with its factor. */
    @Test
    void signOnAPadOnClay() {
        String job = job(EN + ", 'stability': 'en-1990-equ'", enSite(26), "post-sign", SIGN
            + ", 'footing': {'kind': 'pad', 'width': '2.2 m', 'length': '1.6 m', 'depth': '0.6 m', 'ground': 'clay'}");
        ItemResult item = result(job);
        double f = step(item, "force/centred");
        double drag = step(item, "post-own/force/1");
        double n = G * (2400 * 2.2 * 1.6 * 0.6 + 30 + MASS * 3.4);
        double base = f * (2.8 + 0.6) + drag * (1.1 + 0.6);
        double psf = 4.4482216152605 / (0.3048 * 0.3048);
        double contact = Math.min(2.2, 3 * (1.1 - 1.5 * base / (0.9 * n)));
        Carried carried = carried(item, job);
        of(carried, "sliding", 1.5 * (f + drag), Math.min(130 * psf * contact * 1.6, 0.9 * n / 2));
        of(carried, "bearing", n / (2.2 * 1.6) * (1 + 6 * base / n / 2.2), 1500 * psf);
    }

    /** Two posts 5 ft apart of NPS 4 STD pipe, A53 B; board 8.5 x 4 ft from 3 ft to 7 ft. Allowable stress design in lb, in, ksi. */
    @Test
    void signOnTwoPostsByTheAmericanRules() {
        String job = job(ASCE, US_SITE, "post-sign", "'boards': [{'width': '8 ft 6 in', 'height': '4 ft', 'clearance': '3 ft', 'depth': '3 in', 'mass': '150 lb'}], "
            + "'posts': {'count': 2, 'spacing': '5 ft', 'section': 'PIPE 4 STD', 'grade': 'A53 B'}, 'footing': {'kind': 'planted', 'width': '1 ft 6 in', 'ground': 'clay'}");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        double lbf = 4.4482216152605;
        double inch = 0.0254;
        double f = step(item, "force/case-b") / lbf;
        double drag = step(item, "post-own/force/1") / lbf;
        // Case B: 0.2 x 8.5 = 1.7 ft aside; posts at 2.5 ft, so T x/S = F 1.7 x 2.5/(2 x 2.5^2) = 0.34 F more on one. 0.6 W; F at 5 ft, the bare 3 ft of post at 1.5 ft.
        double panel = f * (0.5 + 0.34);
        double shear = 0.6 * (panel + drag);
        double moment = 0.6 * (panel * 60 + drag * 18);
        // D = 4.5 in, t = 0.93 x 0.237 = 0.2204 in, d = 4.059 in: Z = (4.5^3 - d^3)/6, I = pi/64 (4.5^4 - d^4). D/t = 20.4, below 0.07 x 29000/35 = 58: compact.
        double d = 4.5 - 2 * 0.93 * 0.237;
        double z = (Math.pow(4.5, 3) - Math.pow(d, 3)) / 6;
        double area = Math.PI / 4 * (4.5 * 4.5 - d * d);
        double inertia = Math.PI / 64 * (Math.pow(4.5, 4) - Math.pow(d, 4));
        assertThat(4.5 / (0.93 * 0.237)).isLessThan(0.07 * 29000 / 35);
        // AISC 360 F8: F_y Z/1.67. G5: F_cr is F_y 0.6 = 21 ksi, as 0.78 E/(D/t)^1.5 = 245 ksi; V_n = F_cr A/2.
        of(carried, "post bending", moment * lbf * inch, 35000 * z / 1.67 * lbf * inch);
        of(carried, "post shear", shear * lbf, 21000 * area / 2 / 1.67 * lbf);
        // Half of the board and 7 ft of pipe, weighed by its nominal wall: pi (4.5 - 0.237) 0.237 in2 at 490 pcf.
        double pipe = Math.PI * (4.5 - 0.237) * 0.237 / 144 * 490;
        assertThat(pipe).as("lb/ft").isCloseTo(10.8, within(0.02));
        double pressed = 75 + 7 * pipe;
        of(carried, "post combined", pressed / (35000 * area / 1.67) + moment / (35000 * z / 1.67), 1);
        // P a^2 (3 H - a)/(6 E I), H = 84 in, summed over the board, 36 in to 84 in; even load on the first 36 in. Limit: a height of the wind force, M/V, over 80.
        double ei = 29e6 * inertia;
        double w = 0.6 * drag / 36;
        double bent = summed(0.6 * panel, 36, 84, 84) / (6 * ei) + w * Math.pow(36, 4) / (8 * ei) + w * Math.pow(36, 3) / (6 * ei) * 48;
        of(carried, "post deflection", bent * inch, moment / shear / 80 * inch);
        // IBC 18-1, clay 100 psf/ft, b = 1.5 ft: d = 0.5 A (1 + (1 + 4.36 h/A)^0.5), A = 2.34 P/(100 d/3 x 1.5), found by going round.
        double h = moment / shear / 12;
        double deep = 7;
        for (int i = 0; i < 200; i++) {
            double a = 2.34 * shear / (100 * deep / 3 * 1.5);
            deep = (deep + 0.5 * a * (1 + Math.sqrt(1 + 4.36 * h / a))) / 2;
        }
        assertThat(step(item, "embedment-depth")).isCloseTo(deep * 0.3048, within(1e-6));
        assertThat(part(carried, "footing", "depth").value()).as("rounded up to 3 in").isCloseTo(Math.ceil(deep * 4) / 4 * 0.3048, within(1e-9));
        double chosen = part(carried, "footing", "depth").value() / 0.3048;
        double a = 2.34 * shear / (100 * chosen / 3 * 1.5);
        of(carried, "embedment", 0.5 * a * (1 + Math.sqrt(1 + 4.36 * h / a)) * 0.3048, chosen * 0.3048);
    }

    /** Hoarding 24 x 2.4 m, posts 2.4 m apart: the worst carries 2.4 m of zone B, 1.2 m above the ground. */
    @Test
    void hoardingPost() {
        String job = job(EN, enSite(26), "hoarding", "'length': '24 m', 'height': '2.4 m', 'clearance': '0 m', 'posts': {'spacing': '2.4 m', " + TUBE
            + "}, 'footing': {'kind': 'planted', 'width': '0.45 m', 'ground': 'good'}");
        ItemResult item = result(job);
        Carried carried = carried(item, job);
        // l/h = 10: zone B, c = 2.1, from 0.3 h = 0.72 m to 2 h = 4.8 m; the second post stands at 2.4 m and carries 1.2 m to 3.6 m.
        double f = step(item, "velocity-pressure") * 2.1 * 2.4 * 2.4;
        assertThat(f / step(item, "post-shear")).isCloseTo(1, within(1e-9));
        double shear = 1.5 * f;
        double moment = 1.5 * f * 1.2;
        of(carried, "post shear", shear, SHEAR_AREA * 235 / Math.sqrt(3));
        of(carried, "post bending", moment, PLASTIC * 235 / 1000);
        // 6.2.1(7): N/N_pl + M/M_c; boards of 20 kg/m2 and 2.4 m of post, times 1.35.
        double axial = 1.35 * G * (20 * 2.4 * 2.4 + MASS * 2.4);
        of(carried, "post combined", axial / (AREA * 235) + moment * 1000 / (PLASTIC * 235), 1);
        // An even load w from the ground to the top moves it by w h^4/(8 E I).
        of(carried, "post deflection", f / 2.4 * Math.pow(2.4, 4) / (8 * 210e9 * INERTIA * 1e-12), 0.025 * 2.4);
        // At 0.95 m: 21.8 against 19.4 kN m; at 1.00 m: 22.2 against 630 x 0.45/12.5 = 22.68.
        assertThat(moment + shear * 0.95 / Math.sqrt(2)).isGreaterThan(630e3 * 0.45 * Math.pow(0.95, 3) / 12.5);
        assertThat(part(carried, "footing", "depth").value()).isCloseTo(1.0, within(1e-12));
        of(carried, "ground resistance", moment + shear / Math.sqrt(2), 630e3 * 0.45 / 12.5);
    }

    /** Sum of P a^2 (3 H - a) for a force spread evenly from one height to another, by the midpoints of 100 000 strips. */
    private static double summed(double force, double from, double to, double top) {
        int strips = 100_000;
        double sum = 0;
        for (int i = 0; i < strips; i++) {
            double a = from + (i + 0.5) * (to - from) / strips;
            sum += force / strips * a * a * (3 * top - a);
        }
        return sum;
    }
}
