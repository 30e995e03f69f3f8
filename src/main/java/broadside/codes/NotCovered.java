package broadside.codes;

/** The code has no rule for this case. Not an error: it says which code and clause, why, and what can be done. */
public final class NotCovered extends RuntimeException {

    private final String code;
    private final String clause;
    private final String reason;
    private final String instead;

    public NotCovered(String code, String clause, String reason, String instead) {
        super(code + ", " + clause + ": " + reason + " " + instead);
        this.code = code;
        this.clause = clause;
        this.reason = reason;
        this.instead = instead;
    }

    public String code() {
        return code;
    }

    public String clause() {
        return clause;
    }

    public String reason() {
        return reason;
    }

    public String instead() {
        return instead;
    }
}
