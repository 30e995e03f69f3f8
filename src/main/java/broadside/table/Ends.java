package broadside.table;

import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** What holds beyond the printed ends of each axis: refused, unless the table itself prints its last value as going on. */
record Ends(Map<String, String> lastValueBelow, Map<String, String> lastValueAbove) {

    /** Reads the heading line, such as "B/s above: last value (printed as >= 45)". */
    static Ends of(String text, String file, int line) {
        Map<String, String> below = new HashMap<>();
        Map<String, String> above = new HashMap<>();
        for (String entry : text.split(";")) {
            String part = entry.strip();
            if (part.equals("refused")) {
                continue;
            }
            int colon = part.indexOf(':');
            String end = colon < 0 ? "" : part.substring(0, colon).strip();
            String rule = colon < 0 ? "" : part.substring(colon + 1).strip();
            if (!rule.startsWith("last value (") || !rule.endsWith(")")) {
                throw new TableFormat(file, line, "beyond: expected \"refused\" or \"AXIS below: last value (reason)\", found \""
                    + part + "\"");
            }
            String reason = rule.substring("last value (".length(), rule.length() - 1);
            if (end.endsWith(" below")) {
                below.put(end.substring(0, end.length() - " below".length()), reason);
            } else if (end.endsWith(" above")) {
                above.put(end.substring(0, end.length() - " above".length()), reason);
            } else {
                throw new TableFormat(file, line, "beyond: \"" + end + "\" must end in below or above");
            }
        }
        return new Ends(Map.copyOf(below), Map.copyOf(above));
    }

    /** The axes for which an end is open. */
    Set<String> axes() {
        Set<String> axes = new TreeSet<>(lastValueBelow.keySet());
        axes.addAll(lastValueAbove.keySet());
        return axes;
    }

    /** The rule in words. */
    String words() {
        java.util.List<String> held = new java.util.ArrayList<>();
        new java.util.TreeMap<>(lastValueBelow).forEach((axis, reason) -> held.add(axis + " below: the last value holds (" + reason + ")"));
        new java.util.TreeMap<>(lastValueAbove).forEach((axis, reason) -> held.add(axis + " above: the last value holds (" + reason + ")"));
        return held.isEmpty() ? "refused" : String.join("; ", held) + "; elsewhere refused";
    }

    /** Moves a value beyond an open end back to that end; refuses it at a closed end. NaN is refused. */
    double held(String axis, double x, double first, double last, Source source) {
        if (x >= first && x <= last) {
            return x;
        }
        if (x < first && lastValueBelow.containsKey(axis)) {
            return first;
        }
        if (x > last && lastValueAbove.containsKey(axis)) {
            return last;
        }
        throw OutsideTable.range(source, axis, x, first, last);
    }

    /** How a held value is explained; empty when nothing was held. */
    String explained(String axis, double asked, double held) {
        if (asked == held) {
            return "";
        }
        String reason = asked < held ? lastValueBelow.get(axis) : lastValueAbove.get(axis);
        return " for " + axis + " = " + OutsideTable.number(asked) + " (" + reason + ")";
    }
}
