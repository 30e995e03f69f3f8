package broadside.web;

import broadside.assess.Problem;
import broadside.web.FormView.Line;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The problems of a form, by the question they belong to. */
final class FormProblems {

    private static final String VERBS = "(is|are|must|has|have|stands|of|gives|leave|leaves|names) .*";

    /** A question that cannot be the subject of a sentence. */
    private static final String CLAUSE = "(From|How|More|Once|What|Who|Why) .*";

    /** What is said where "What is it fixed to?" was not answered. */
    static final String HELD_BY = "choose what it is fixed to";

    private final List<Problem> all;

    FormProblems(List<Problem> problems) {
        List<Problem> own = new ArrayList<>();
        for (Problem each : problems) {
            Problem moved = told(each);
            if (own.stream().noneMatch(p -> p.path().equals(moved.path()))) {
                own.add(moved);
            }
        }
        this.all = List.copyOf(own);
    }

    /** A problem in the words of the form. */
    private static Problem told(Problem problem) {
        if (problem.path().matches("basis\\.(edition|overlay)")) {
            return new Problem("basis.code", problem.text(), problem.options());
        }
        boolean open = problem.path().endsWith(".held-by") && problem.text().startsWith("\"\" does not fit");
        return open ? new Problem(problem.path(), HELD_BY) : problem;
    }

    boolean isEmpty() {
        return all.isEmpty();
    }

    /** Whether there is a problem at a path or below it. */
    boolean any(String path) {
        return all.stream().anyMatch(p -> p.path().equals(path) || p.path().startsWith(path + ".") || p.path().startsWith(path + "["));
    }

    List<String> options(String path) {
        return all.stream().filter(p -> p.path().equals(path)).findFirst().map(Problem::options).orElse(List.of());
    }

    /** The sentence beside a question, empty when it is in order. */
    String sentence(String path, String label) {
        return all.stream().filter(p -> p.path().equals(path)).findFirst().map(p -> joined(label, p.text())).orElse("");
    }

    /** The list on top of the page, each line with the question that it leads to. */
    List<Line> lines(Map<String, String> labels, Map<String, String> anchors, String item) {
        List<Line> lines = new ArrayList<>();
        for (Problem problem : all) {
            String path = problem.path();
            if (path.startsWith("items[") && !path.startsWith(item)) {
                lines.add(new Line("items", "Item " + (Integer.parseInt(path.substring(6, path.indexOf(']'))) + 1) + ": "
                    + new Problem(path.substring(path.indexOf(']') + 1).replaceFirst("^\\.", ""), problem.text()).line()));
                continue;
            }
            String label = labels.get(path);
            String place = label == null ? place(path, anchors) : "";
            String target = label != null ? path : path.isEmpty() ? "" : anchors.getOrDefault(root(path, anchors), "");
            String entry = path.contains(".boards[0]") && labels.keySet().stream().noneMatch(l -> l.contains(".boards[1]")) ? "" : entry(path);
            String text = label != null ? joined(label, problem.text()) : place.isEmpty() ? problem.line() : joined(place, problem.text());
            lines.add(new Line(target, entry.isEmpty() ? text : entry + ": " + text));
        }
        return lines;
    }

    private static String joined(String label, String text) {
        boolean verb = text.matches("(?s)" + VERBS);
        if (label.endsWith("?") || verb && label.matches(CLAUSE)) {
            return verb ? "The answer to \"" + label + "\" " + text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
        }
        return verb ? label + " " + text : label + ": " + text;
    }

    /** The longest known place that a path lies in. */
    private static String root(String path, Map<String, String> anchors) {
        return anchors.keySet().stream().filter(path::startsWith).max(java.util.Comparator.comparingInt(String::length)).orElse("");
    }

    private static String place(String path, Map<String, String> anchors) {
        return anchors.containsKey(path) && !path.isEmpty() ? path.replaceAll(".*\\.", "") : "";
    }

    /** "Board 2" for a path inside the second of several boards. */
    private static String entry(String path) {
        java.util.regex.Matcher found = java.util.regex.Pattern.compile("\\.(board|gate|block)s\\[(\\d{1,3})\\]").matcher(path);
        java.util.regex.Matcher own = java.util.regex.Pattern.compile("^overrides\\[(\\d{1,3})\\]").matcher(path);
        if (found.find()) {
            return found.group(1).substring(0, 1).toUpperCase(Locale.ROOT) + found.group(1).substring(1) + " " + (Integer.parseInt(found.group(2)) + 1);
        }
        return own.find() ? "Own factor " + (Integer.parseInt(own.group(1)) + 1) : "";
    }
}
