package broadside.codes;

import broadside.trace.Trace;
import java.util.OptionalDouble;

/**
 * Velocity pressure as it stands in the load equations of ASCE 7: q alone where K_d is inside it, else q times K_d.
 *
 * @param symbol  q_h at the top, q_z at another height
 * @param q       velocity pressure, Pa
 * @param kd      directionality factor, where the edition keeps it out of q
 */
record Asce7Pressure(String symbol, double q, OptionalDouble kd) {

    /** What a coefficient is put on, Pa. */
    double value() {
        return q * kd.orElse(1);
    }

    /** The same in symbols. */
    String text() {
        return kd.isPresent() ? symbol + " K_d" : symbol;
    }

    /** Puts the symbols of {@link #text()} into a step. */
    Trace.Line into(Trace.Line line) {
        line.in(symbol, q, "Pa");
        return kd.isPresent() ? line.in("K_d", kd.getAsDouble()) : line;
    }
}
