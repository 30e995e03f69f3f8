package broadside.support;

import broadside.support.Section.Form;
import broadside.support.Section.Material;
import broadside.support.Section.Properties;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** Sections and grades made by hand for the tests of posts. Lengths in millimetres, strengths in MPa. */
final class Tubes {

    static final Edition RULES = TableLibrary.shipped().edition(PostRules.EDITION).orElseThrow();
    static final Grade S235 = steel("S235", 235e6, 210e9);
    static final Grade S355 = steel("S355", 355e6, 210e9);
    static final Grade A53 = steel("A53 B", 35 * ksi(), 29000 * ksi());
    static final Grade A500 = steel("A500 B", 46 * ksi(), 29000 * ksi());
    static final Grade C24 = timber("C24", 24e6, 4e6, 11e9);
    static final Grade PINE = timber("Southern Pine No.2", 0.850 * ksi(), 0.165 * ksi(), 1200 * ksi());
    static final Grade T6 = new Grade("6082-T6", Material.ALUMINIUM, number(250e6), Optional.empty(), number(70e9));

    static double ksi() {
        return 6894757.293168362;
    }

    static Section chs(double d, double t) {
        return round("CHS " + d + "x" + t, d, t, Material.STEEL, 7850);
    }

    static Section round(String name, double d, double t, Material material, double density) {
        double o = d / 1000;
        double i = o - 2 * t / 1000;
        double a = Math.PI / 4 * (o * o - i * i);
        double inertia = Math.PI / 64 * (Math.pow(o, 4) - Math.pow(i, 4));
        double wel = 2 * inertia / o;
        double wpl = (o * o * o - i * i * i) / 6;
        return new Section(name, "test", Form.ROUND_TUBE, material, o, o, t / 1000, t / 1000, new Properties(a, inertia, inertia, wel, wel, wpl, wpl, 2 * inertia, 2 * wel, a * density));
    }

    /** Sharp corners: the properties of a test, not of a table. */
    static Section rhs(double h, double b, double t) {
        double ho = h / 1000;
        double bo = b / 1000;
        double w = t / 1000;
        double hi = ho - 2 * w;
        double bi = bo - 2 * w;
        double a = ho * bo - hi * bi;
        double strong = (bo * ho * ho * ho - bi * hi * hi * hi) / 12;
        double weak = (ho * bo * bo * bo - hi * bi * bi * bi) / 12;
        double ah = (bo - w) * (ho - w);
        return new Section("RHS " + h + "x" + b + "x" + t, "test", Form.RECTANGULAR_TUBE, Material.STEEL, ho, bo, w, w, new Properties(a, strong, weak, 2 * strong / ho, 2 * weak / bo,
            (bo * ho * ho - bi * hi * hi) / 4, (ho * bo * bo - hi * bi * bi) / 4, 1, 2 * ah * w, a * 7850));
    }

    static Section timber(double h, double b) {
        double ho = h / 1000;
        double bo = b / 1000;
        double a = ho * bo;
        return new Section(h + "x" + b, "test", Form.SOLID_RECTANGLE, Material.TIMBER, ho, bo, 0, 0, new Properties(a, bo * ho * ho * ho / 12, ho * bo * bo * bo / 12,
            bo * ho * ho / 6, ho * bo * bo / 6, bo * ho * ho / 4, ho * bo * bo / 4, 1, 0.208 * ho * bo * Math.min(ho, bo), a * 420));
    }

    /** Many round tubes in order of mass. */
    static List<Section> series() {
        List<Section> all = new ArrayList<>();
        for (double d = 42.4; d < 360; d += 15.5) {
            for (double t : new double[] {2.6, 2.9, 3.2, 3.6, 4, 4.5, 5, 5.6, 6.3, 7.1, 8, 10, 12.5, 14.2}) {
                all.add(chs(d, t));
            }
        }
        all.sort(Comparator.comparingDouble(Section::mass));
        return all;
    }

    static Grade steel(String name, double strength, double modulus) {
        return new Grade(name, Material.STEEL, number(strength), Optional.empty(), number(modulus));
    }

    static Grade timber(String name, double bending, double shear, double modulus) {
        return new Grade(name, Material.TIMBER, number(bending), Optional.of(number(shear)), number(modulus));
    }

    private static Coefficient number(double value) {
        return new Coefficient(value, "Pa", new Source("TEST", "1", "hand", Status.RECALLED), "of the test");
    }

    private Tubes() { }
}
