package broadside.aero;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;

class LineLoadTest {

    /** Zones side by side over a width, with random limits and forces per metre. */
    private record Zones(double[] from, double[] to, double[] force, double width) {

        static Zones random(Random random) {
            int count = 1 + random.nextInt(5);
            double width = 0.5 + 30 * random.nextDouble();
            double[] cuts = random.doubles(count - 1, 0, width).sorted().toArray();
            double[] from = new double[count];
            double[] to = new double[count];
            for (int i = 0; i < count; i++) {
                from[i] = i == 0 ? 0 : cuts[i - 1];
                to[i] = i == count - 1 ? width : cuts[i];
            }
            return new Zones(from, to, random.doubles(count, 100, 5000).toArray(), width);
        }

        LineLoad load(double shift) {
            return new LineLoad(from, to, force, width, shift);
        }

        double sum() {
            double sum = 0;
            for (int i = 0; i < force.length; i++) {
                sum += force[i] * (to[i] - from[i]);
            }
            return sum;
        }

        double centroid() {
            double first = 0;
            for (int i = 0; i < force.length; i++) {
                first += force[i] * (to[i] - from[i]) * (from[i] + to[i]) / 2;
            }
            return first / sum();
        }

        Zones even() {
            double[] same = new double[force.length];
            Arrays.fill(same, force[0]);
            return new Zones(from, to, same, width);
        }
    }

    /** Centroid by the forces on many short stretches; each acts in its middle but for a share of the second order. */
    private static double centroid(LineLoad load, double width) {
        int parts = 2000;
        double sum = 0;
        double first = 0;
        for (int i = 0; i < parts; i++) {
            double a = width * i / parts;
            double b = width * (i + 1) / parts;
            double force = load.force(a, b);
            sum += force;
            first += force * (a + b) / 2;
        }
        return first / sum;
    }

    @Test
    void theWholeWidthCarriesTheSumOfTheZones() {
        Random random = new Random(1);
        for (int i = 0; i < 200; i++) {
            Zones zones = Zones.random(random);
            assertThat(zones.load(0).force(0, zones.width())).isCloseTo(zones.sum(), within(1e-9 * zones.sum()));
            assertThat(zones.load(0).force(-5, zones.width() + 5)).as("nothing acts beside the panel").isCloseTo(zones.sum(), within(1e-9 * zones.sum()));
        }
    }

    @Test
    void theResultantStandsInTheCentroidOfTheZones() {
        Random random = new Random(2);
        for (int i = 0; i < 50; i++) {
            Zones zones = Zones.random(random);
            assertThat(centroid(zones.load(0), zones.width())).isCloseTo(zones.centroid(), within(1e-3 * zones.width()));
        }
    }

    @Test
    void aTiltMovesTheResultantOfAnEvenLoadByTheShiftAndKeepsItsSum() {
        Random random = new Random(3);
        for (int i = 0; i < 50; i++) {
            Zones zones = Zones.random(random).even();
            double shift = (random.nextDouble() - 0.5) * 0.5 * zones.width();
            LineLoad load = zones.load(shift);
            assertThat(load.force(0, zones.width())).isCloseTo(zones.sum(), within(1e-9 * zones.sum()));
            assertThat(centroid(load, zones.width()) - zones.width() / 2).isCloseTo(shift, within(1e-5 * zones.width()));
        }
    }

    @Test
    void aStretchCutAnywhereKeepsTheSum() {
        Random random = new Random(4);
        for (int i = 0; i < 200; i++) {
            Zones zones = Zones.random(random);
            LineLoad load = zones.load((random.nextDouble() - 0.5) * 0.3 * zones.width());
            double a = random.nextDouble() * zones.width();
            double b = a + random.nextDouble() * (zones.width() - a);
            double whole = load.force(0, zones.width());
            assertThat(load.force(0, a) + load.force(a, b) + load.force(b, zones.width())).isCloseTo(whole, within(1e-9 * zones.sum()));
        }
    }

    @Test
    void aTiltedLoadIsThatOfItsFormula() {
        LineLoad load = new LineLoad(new double[] {0}, new double[] {4}, new double[] {100}, 4, 0.5);
        assertThat(load.force(0, 4)).isCloseTo(400, within(1e-9));
        assertThat(load.force(2, 4)).as("100 x 2 x (1 + 12 x 0.5 x 1 / 16)").isCloseTo(275, within(1e-9));
        assertThat(load.force(0, 2)).isCloseTo(125, within(1e-9));
    }

    @Test
    void nothingActsOnAStretchWithoutLengthOrBesideThePanel() {
        LineLoad load = new LineLoad(new double[] {0, 2}, new double[] {2, 4}, new double[] {100, 50}, 4, 0);
        assertThat(load.force(1, 1)).isZero();
        assertThat(load.force(3, 1)).isZero();
        assertThat(load.force(5, 9)).isZero();
        assertThat(load.force(1, 3)).isCloseTo(150, within(1e-12));
    }
}
