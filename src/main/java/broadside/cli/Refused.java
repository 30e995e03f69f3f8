package broadside.cli;

import java.util.List;

/** Input that the commands refuse: one line for each problem, exit status 2. */
final class Refused extends RuntimeException {

    private final List<String> lines;

    Refused(List<String> lines) {
        super(lines.isEmpty() ? "" : lines.get(0));
        this.lines = List.copyOf(lines);
    }

    Refused(String line) {
        this(List.of(line));
    }

    List<String> lines() {
        return lines;
    }
}
