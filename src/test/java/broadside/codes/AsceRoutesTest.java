package broadside.codes;

import static broadside.codes.AsceJobs.result;
import static broadside.codes.AsceJobs.sign;
import static broadside.codes.AsceJobs.value;
import static broadside.codes.AsceJobs.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.ItemResult;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Random open signs and wall panels, worked out a second time from the clauses with the constants typed here. */
class AsceRoutesTest {

    private static final double FT = 0.3048;
    private static final double FLOOR = 16 * 47.88025898;

    private final Random random = new Random(30);

    private double between(double least, double most) {
        return Math.round((least + random.nextDouble() * (most - least)) * 100) / 100.0;
    }

    /** q with K_d in both editions, so that it is the pressure on which coefficients stand. */
    private static double q(boolean newer, char exposure, double z, double v, boolean cladding) {
        int i = "BCD".indexOf(exposure);
        double alpha = newer ? new double[] {7.5, 9.8, 11.5}[i] : new double[] {7.0, 9.5, 11.5}[i];
        double zg = FT * (newer ? new double[] {3280, 2460, 1935}[i] : new double[] {1200, 900, 700}[i]);
        double k = (newer ? 2.41 : 2.01) * Math.pow(Math.max(z, 15 * FT) / zg, 2 / alpha);
        return 0.00256 * 47.88025898 / (0.44704 * 0.44704) * (cladding && i == 0 ? Math.max(k, 0.70) : k) * 0.85 * v * v;
    }

    /** F = q_z K_d G C_f A_f with the solid area itself, and not below 16 psf on it. */
    @Test
    void open_signs_by_their_solid_area() {
        for (int i = 0; i < 150; i++) {
            boolean newer = random.nextBoolean();
            char exposure = "BCD".charAt(random.nextInt(3));
            double v = between(20, 80);
            double b = between(0.5, 12);
            double s = between(0.5, 5);
            double g = between(0, 12);
            double solidity = between(0.02, 0.7);
            double solid = b * s * solidity;
            double cf = solidity < 0.1 ? 2.0 : solidity < 0.3 ? 1.8 : 1.6;
            double force = Math.max(q(newer, exposure, g + s / 2, v, false) * 0.85 * cf, FLOOR) * solid;
            ItemResult item = result(newer ? "22" : "16", wind(v + " m/s", String.valueOf(exposure)), sign(b + " m", s + " m", g + " m", String.valueOf(solidity)));
            assertThat(value(item, "force/case-a")).isCloseTo(force, within(1e-6 * force));
            assertThat(value(item, "base-moment/case-a")).isCloseTo(force * (g + s / 2), within(1e-6 * force * (g + s)));
        }
    }

    /** The log-linear forms with A in square feet, which are rounded to four decimals. */
    private static double gcp(boolean low, boolean pushed, boolean edge, double area) {
        double a = Math.log10(Math.min(Math.max(area / (FT * FT), low ? 10 : 20), 500));
        if (low) {
            return pushed ? 1.1766 - 0.1766 * a : edge ? -(1.7532 - 0.3532 * a) : -(1.2766 - 0.1766 * a);
        }
        return pushed ? 1.1792 - 0.2146 * a : edge ? -(2.5445 - 0.5723 * a) : -(1.0861 - 0.1431 * a);
    }

    @Test
    void wall_panels_by_the_forms_in_square_feet() {
        for (int i = 0; i < 200; i++) {
            boolean newer = random.nextBoolean();
            char exposure = "BCD".charAt(random.nextInt(3));
            double v = between(25, 80);
            double h = between(3, 60);
            double width = between(8, 60);
            double depth = between(5, 60);
            double b = between(0.5, 4);
            double s = between(0.5, 2.9);
            double bottom = between(0, h - s - 0.02);
            double corner = Math.max(0, between(0, (width - b) / 2 - 0.02));
            boolean skin = random.nextBoolean();
            boolean flat = random.nextBoolean();
            ItemResult item = result(newer ? "22" : "16", wind(v + " m/s", String.valueOf(exposure)), String.format(Locale.ROOT, "'kind':'facade-panel','backing':'%s',"
                + "'width':'%s m','height':'%s m','bottom':'%s m','distance-from-corner':'%s m','building':{'width':'%s m','depth':'%s m','height':'%s m','roof-slope':'%s deg'}",
                skin ? "skin" : "wall", b, s, bottom, corner, width, depth, h, flat ? 5 : 25));
            boolean low = h <= 60 * FT;
            double w = Math.min(width, depth);
            double a = low ? Math.max(Math.min(0.1 * w, 0.4 * h), Math.max(0.04 * w, 3 * FT)) : Math.max(0.1 * w, 3 * FT);
            double area = Math.max(b, s) * Math.max(Math.min(b, s), Math.max(b, s) / 3);
            double inside = skin ? 0.18 : 0;
            double reduced = low && flat ? 0.9 : 1;
            double qh = q(newer, exposure, h, v, true);
            double qw = low ? qh : q(newer, exposure, bottom + s, v, true);
            String zone = corner < a || width - corner - b < a ? "5" : "4";
            double pushed = Math.max(qw * reduced * gcp(low, true, false, area) + qh * inside, FLOOR);
            double pulled = Math.max(qh * (inside - reduced * gcp(low, false, zone.equals("5"), area)), FLOOR);
            assertThat(value(item, "force/pushed")).as("%s %s", h, area).isCloseTo(pushed * b * s, within(2e-4 * qh * b * s));
            assertThat(value(item, "force/pulled")).as("%s %s", h, area).isCloseTo(pulled * b * s, within(2e-4 * qh * b * s));
            assertThat(value(item, "pressure/pulled/" + zone)).isCloseTo(-pulled, within(2e-4 * qh));
        }
    }
}
