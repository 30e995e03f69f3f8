package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;

/** The lowest natural frequency of an even post with a mass at its tip, fixed at the ground. Within 1.5 percent of the exact root, on the high side. */
public final class PostFrequency {

    private static final String RAYLEIGH = "Rayleigh method with the static shape of a load at the tip";

    private final Figure massShare;
    private final Figure least;

    public PostFrequency(Edition edition) {
        Rows rows = edition.rows("post-constants");
        this.massShare = Figure.of(rows, "mass-share");
        this.least = Figure.of(rows, "least-frequency").at(rows.text("least-frequency", "place"));
    }

    /**
     * Works the frequency out, Hz, recorded as f_1.
     *
     * @param step     name of the step
     * @param modulus  Pa, recorded as E
     * @param inertia  m4, recorded as I
     * @param length   m, recorded as L_t
     * @param tip      mass at the tip, kg, recorded as m_t
     * @param post     mass of the post, kg, recorded as m_p
     */
    public double of(String step, double modulus, double inertia, double length, double tip, double post, Trace trace) {
        double share = massShare.into(trace.line("post-mass-share", "k_m", "share of the mass of the post that moves with its tip"));
        double moving = trace.line("post-moving-mass", "m_1", "mass that moves").in("m_t", tip, "kg").in("k_m", share).in("m_p", post, "kg")
            .from(RAYLEIGH, massShare.status()).gives("m_t + k_m m_p", tip + share * post, "kg");
        return trace.line(step, "f_1", "lowest natural frequency").in("E", modulus, "Pa").in("I", inertia, "m⁴").in("L_t", length, "m").in("m_1", moving, "kg")
            .from(RAYLEIGH, massShare.status()).gives("(3 E I / (L_t^3 m_1))^0.5 / (2 π)",
                Math.sqrt(3 * modulus * inertia / (length * length * length * moving)) / (2 * Math.PI), "Hz");
    }

    /** Checks a frequency that was recorded as f_1. */
    public Check check(double frequency, Trace trace) {
        double limit = least.into(trace.line("post-frequency-limit", "f_lim", "least natural frequency, Hz"));
        return Check.of("natural frequency", least.place(), new Check.In("f_lim", limit), new Check.In("f_1", frequency), "Hz", "", massShare.status(), trace);
    }

    /** Whether a sign of this frequency answers to gusts by swinging, which no rule here covers. */
    public boolean dynamic(double frequency) {
        return frequency < least.value();
    }
}
