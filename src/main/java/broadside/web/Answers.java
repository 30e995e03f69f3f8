package broadside.web;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import tools.jackson.databind.JsonNode;

/** The answers of a form as they were typed, by their path in the job file, such as {@code items[0].boards[1].width}. */
final class Answers {

    private final Map<String, String> typed;

    Answers(Map<String, String> typed) {
        this.typed = new LinkedHashMap<>(typed);
    }

    /** The answers that a job holds for its head and for one of its items. */
    static Answers of(JsonNode job, int item) {
        Answers answers = new Answers(Map.of());
        for (Map.Entry<String, JsonNode> entry : job.properties()) {
            if (!entry.getKey().equals("items")) {
                answers.take(entry.getKey(), entry.getValue());
            }
        }
        answers.take("items[" + item + "]", job.path("items").path(item));
        return answers;
    }

    private void take(String path, JsonNode node) {
        if (node.isObject()) {
            node.properties().forEach(e -> take(path + "." + e.getKey(), e.getValue()));
        } else if (node.isArray()) {
            for (int i = 0; i < node.size(); i++) {
                take(path + "[" + i + "]", node.get(i));
            }
        } else if (!node.isNull() && !node.isMissingNode()) {
            typed.put(path, node.isString() ? node.stringValue() : plain(node));
        }
    }

    private static String plain(JsonNode node) {
        return node.isNumber() && node.doubleValue() == Math.rint(node.doubleValue()) && Math.abs(node.doubleValue()) < 1e9
            ? Long.toString(node.longValue()) : node.toString();
    }

    /** The text at a path, empty when nothing was typed. */
    String get(String path) {
        return typed.getOrDefault(path, "");
    }

    boolean blank(String path) {
        return get(path).isBlank();
    }

    void set(String path, String text) {
        typed.put(path, text);
    }

    void remove(String path) {
        typed.remove(path);
    }

    /** Whether anything was typed at a path or below it. */
    boolean any(String path) {
        return typed.entrySet().stream().anyMatch(e -> below(e.getKey(), path) && !e.getValue().isBlank());
    }

    Map<String, String> all() {
        return Map.copyOf(typed);
    }

    /** Number of entries of a list: one more than the highest index that was sent. */
    int size(String list) {
        int size = 0;
        for (String path : typed.keySet()) {
            if (path.startsWith(list + "[")) {
                int close = path.indexOf(']', list.length());
                String index = close < 0 ? "" : path.substring(list.length() + 1, close);
                if (index.matches("\\d{1,3}")) {
                    size = Math.max(size, Integer.parseInt(index) + 1);
                }
            }
        }
        return size;
    }

    /** Takes one entry out of a list; the entries behind it move up. */
    void drop(String list, int index) {
        Map<String, String> moved = new TreeMap<>();
        for (String path : List.copyOf(typed.keySet())) {
            int close = path.startsWith(list + "[") ? path.indexOf(']', list.length()) : -1;
            if (close > 0 && path.substring(list.length() + 1, close).matches("\\d{1,3}")) {
                int at = Integer.parseInt(path.substring(list.length() + 1, close));
                String text = at >= index ? typed.remove(path) : null;
                if (at > index) {
                    moved.put(list + "[" + (at - 1) + path.substring(close), text);
                }
            }
        }
        typed.putAll(moved);
    }

    /** Takes out the entries of a list in which nothing was typed, and closes the gaps. */
    void dropBlank(String list) {
        for (int i = size(list) - 1; i >= 0; i--) {
            if (!any(list + "[" + i + "]")) {
                drop(list, i);
            }
        }
    }

    private static boolean below(String path, String root) {
        return path.startsWith(root) && (path.length() == root.length() || path.charAt(root.length()) == '.' || path.charAt(root.length()) == '[');
    }
}
