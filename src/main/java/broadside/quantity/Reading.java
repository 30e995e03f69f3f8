package broadside.quantity;

import java.util.List;
import java.util.Objects;

/** What came of reading a typed text. */
public sealed interface Reading {

    /**
     * The text was read.
     *
     * @param si       the value in the unit of calculation, finite
     * @param unit     the unit it was typed in; the foot for feet and inches
     * @param typed    the text exactly as typed
     * @param warnings sentences that say how an unusual text was read; mostly empty
     */
    record Value(double si, Unit unit, String typed, List<String> warnings) implements Reading {
        public Value {
            Objects.requireNonNull(unit, "unit");
            Finite.check(si, typed, unit.dimension());
            warnings = List.copyOf(warnings);
        }
    }

    /**
     * The text has more than one sensible reading.
     *
     * @param problem one line that names the readings
     * @param options the readings as texts, each of which reads without doubt
     */
    record Ambiguous(String problem, List<String> options) implements Reading {
        public Ambiguous {
            Objects.requireNonNull(problem, "problem");
            options = List.copyOf(options);
        }
    }

    /**
     * The text is not such a quantity.
     *
     * @param problem one line that says why, and what fits
     */
    record Refused(String problem) implements Reading {
        public Refused {
            Objects.requireNonNull(problem, "problem");
        }
    }
}
