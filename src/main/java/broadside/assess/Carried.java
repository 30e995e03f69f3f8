package broadside.assess;

import broadside.support.Check;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * What carries an item: chosen or checked, always as pre-sizing.
 *
 * @param parts  posts, footing, ballast, fixings, in the order in which the force goes down
 */
public record Carried(List<Part> parts) {

    public Carried {
        parts = List.copyOf(parts);
    }

    /**
     * One part of it.
     *
     * @param key      "posts", "footing", "ballast", "fixings" or "lines"
     * @param title    in words
     * @param results  what it is or has to be
     * @param checks   demand against capacity
     * @param choices  sections that were tried, the chosen one among them
     * @param assumed  values that someone must confirm
     * @param warnings what an engineer must settle before anything is built, whatever the shares say
     * @param remarks  what was found or left out, in words
     * @param refused  why no check is given at all; empty for none
     */
    public record Part(String key, String title, List<Result> results, List<Check> checks, List<Choice> choices, List<String> assumed, List<String> warnings, List<String> remarks,
                       Optional<String> refused) {
        public Part {
            results = List.copyOf(results);
            checks = List.copyOf(checks);
            choices = List.copyOf(choices);
            assumed = List.copyOf(assumed);
            warnings = List.copyOf(warnings);
            remarks = List.copyOf(remarks);
        }

        /** A part of which nothing could be found. */
        static Part refused(String key, String title, String why) {
            return new Part(key, title, List.of(), List.of(), List.of(), List.of(), List.of(), List.of(), Optional.of(why));
        }

        /** The check with the greatest share. */
        public Optional<Check> worst() {
            return checks.stream().max(Comparator.comparingDouble(Check::utilisation));
        }

        public boolean passes() {
            return refused.isEmpty() && checks.stream().allMatch(Check::passes);
        }
    }

    /**
     * One line of what a part is.
     *
     * @param key    short name, such as "section" or "depth"
     * @param text   in words; empty where {@code value} says it
     * @param value  in {@code unit}
     * @param unit   SI unit; empty for words
     */
    public record Result(String key, String label, String text, double value, String unit) {

        static Result words(String key, String label, String text) {
            return new Result(key, label, text, 0, "");
        }

        static Result of(String key, String label, double value, String unit) {
            return new Result(key, label, "", value, unit);
        }
    }

    /**
     * A section that was tried.
     *
     * @param mass         kg/m
     * @param utilisation  greatest share of its checks
     * @param by           the check that has it
     * @param named        the case that gives it; empty for all
     */
    public record Choice(String designation, double mass, double utilisation, String by, String named, boolean passes, boolean chosen) { }

    public List<Check> checks() {
        return parts.stream().flatMap(p -> p.checks().stream()).toList();
    }

    public Optional<Part> part(String key) {
        return parts.stream().filter(p -> p.key().equals(key)).findFirst();
    }

    /** Whether every part passes; never when one was refused. */
    public boolean passes() {
        return parts.stream().allMatch(Part::passes);
    }
}
