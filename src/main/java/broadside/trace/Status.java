package broadside.trace;

import java.util.Locale;
import java.util.Optional;

/** How well a figure or rule is known. A status is carried along and never raised. */
public enum Status {

    /** Seen in the named publication. */
    READ("read"),
    /** Seen quoted elsewhere. */
    SECOND_HAND("second-hand"),
    /** From memory of the named publication; not yet checked against print. */
    RECALLED("recalled"),
    /** Worked out for this project, from statics or from other figures. */
    DERIVED("derived"),
    /** Usual in the trade, without a publication behind it. */
    COMMON_PRACTICE("common practice"),
    /** Typed by the user. */
    GIVEN("given");

    private final String word;

    Status(String word) {
        this.word = word;
    }

    /** The word used in table files, results and on the page. */
    public String word() {
        return word;
    }

    /** The words shown to a reader who has to judge the figure. */
    public String shown() {
        return this == RECALLED ? "not yet checked against print" : word;
    }

    /** The word, and for a recalled figure what it means. */
    public String told() {
        return this == RECALLED ? word + ": " + shown() : word;
    }

    public static Optional<Status> of(String word) {
        String asked = word.strip().toLowerCase(Locale.ROOT);
        for (Status status : values()) {
            if (status.word.equals(asked)) {
                return Optional.of(status);
            }
        }
        return Optional.empty();
    }

    /** The weaker of two: a result is known no better than what went into it. */
    public Status weaker(Status other) {
        return rank() >= other.rank() ? this : other;
    }

    private int rank() {
        return switch (this) {
            case GIVEN, DERIVED -> 0;
            case READ -> 1;
            case COMMON_PRACTICE -> 2;
            case SECOND_HAND -> 3;
            case RECALLED -> 4;
        };
    }
}
