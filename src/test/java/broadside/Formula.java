package broadside;

import java.util.Map;
import java.util.Set;

/**
 * Works out the formula texts of the calculation sheet, as a reader with a pocket calculator would: symbols side by side
 * are multiplied, ½, π and ² are what they look like, max takes its parts between semicolons.
 */
final class Formula {

    private static final Set<String> FUNCTIONS = Set.of("ln", "exp", "max", "min", "abs", "sin", "cos", "tan");

    private final String text;
    private final Map<String, Double> values;
    private int at;

    private Formula(String text, Map<String, Double> values) {
        this.text = text;
        this.values = values;
    }

    static double value(String text, Map<String, Double> values) {
        Formula formula = new Formula(text, values);
        double value = formula.sum();
        formula.space();
        if (formula.at < text.length()) {
            throw new IllegalArgumentException("stopped at \"" + text.substring(formula.at) + "\" in \"" + text + "\"");
        }
        return value;
    }

    private double sum() {
        space();
        double value = take('-') ? -product() : product();
        while (true) {
            space();
            if (take('+')) {
                value += product();
            } else if (take('-')) {
                value -= product();
            } else {
                return value;
            }
        }
    }

    private double product() {
        double value = power();
        while (true) {
            space();
            if (take('/')) {
                value /= power();
            } else if (at < text.length() && startsFactor(text.charAt(at))) {
                value *= power();
            } else {
                return value;
            }
        }
    }

    private static boolean startsFactor(char c) {
        return Character.isLetterOrDigit(c) || c == '(' || c == '½';
    }

    private double power() {
        double base = factor();
        while (at < text.length()) {
            if (take('²')) {
                base = base * base;
            } else if (take('^')) {
                base = Math.pow(base, factor());
            } else {
                break;
            }
        }
        return base;
    }

    private double factor() {
        space();
        char c = text.charAt(at);
        if (take('½')) {
            return 0.5;
        }
        if (take('(')) {
            double inside = sum();
            close();
            return inside;
        }
        if (take('π')) {
            return Math.PI;
        }
        if (Character.isDigit(c)) {
            int start = at;
            while (at < text.length() && (Character.isDigit(text.charAt(at)) && text.charAt(at) < 128 || text.charAt(at) == '.')) {
                at++;
            }
            return Double.parseDouble(text.substring(start, at));
        }
        for (String function : FUNCTIONS) {
            if (text.startsWith(function + "(", at)) {
                at += function.length() + 1;
                return function(function);
            }
        }
        return symbol();
    }

    private double function(String name) {
        double value = sum();
        if (name.equals("max") || name.equals("min")) {
            space();
            while (take(';')) {
                value = name.equals("max") ? Math.max(value, sum()) : Math.min(value, sum());
                space();
            }
        }
        close();
        return switch (name) {
            case "ln" -> Math.log(value);
            case "exp" -> Math.exp(value);
            case "abs" -> Math.abs(value);
            case "sin" -> Math.sin(value);
            case "cos" -> Math.cos(value);
            case "tan" -> Math.tan(value);
            default -> value;
        };
    }

    /** A letter with its marks, its subscript and its primes. */
    private double symbol() {
        int start = at++;
        while (at < text.length() && Character.getType(text.charAt(at)) == Character.NON_SPACING_MARK) {
            at++;
        }
        if (at < text.length() && text.charAt(at) == '_') {
            at++;
            if (text.charAt(at) == '{') {
                at = text.indexOf('}', at) + 1;
            } else {
                while (at < text.length() && Character.isLetterOrDigit(text.charAt(at)) && text.charAt(at) != '²') {
                    at++;
                }
            }
        }
        while (at < text.length() && text.charAt(at) == '\'') {
            at++;
        }
        String name = text.substring(start, at);
        Double value = values.get(name);
        if (value == null) {
            throw new IllegalArgumentException("\"" + name + "\" in \"" + text + "\" is not among the inputs " + values.keySet());
        }
        return value;
    }

    private void close() {
        space();
        if (!take(')')) {
            throw new IllegalArgumentException("a bracket is not closed in \"" + text + "\" at " + at);
        }
    }

    private void space() {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
    }

    private boolean take(char c) {
        if (at < text.length() && text.charAt(at) == c) {
            at++;
            return true;
        }
        return false;
    }
}
