package broadside.assess;

import java.util.List;

/** A job that cannot be assessed because answers do not fit. */
public final class BadJob extends RuntimeException {

    private final List<Problem> problems;

    public BadJob(List<Problem> problems) {
        super(problems.isEmpty() ? "" : problems.get(0).line());
        this.problems = List.copyOf(problems);
    }

    public List<Problem> problems() {
        return problems;
    }
}
