package broadside.support;

import broadside.panel.FenceFeet;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Predicate;

/**
 * Friction of feet and blocks on what they stand on. The lowest published value that fits the words is taken; a bare
 * surface such as "asphalt" is read for feet of concrete, rubber, plastic or wood, and "steel on concrete" names the feet too.
 */
public final class Friction {

    private static final String STEEL = "steel";
    private static final String ANY = "any";
    private static final String ON = " on ";

    private final List<Pair> pairs;
    private final List<String> none; // surfaces on which no friction can be counted

    /** One row of the table. */
    private record Pair(String key, String feet, List<String> grounds, Coefficient coefficient, String place) {
        double mu() {
            return coefficient.value();
        }
    }

    /**
     * What was found.
     *
     * @param value        recorded as μ
     * @param status       how well it is known
     * @param assumptions  what was taken without having been typed
     * @param remarks      what the reader should know
     */
    public record Grip(double value, Status status, List<String> assumptions, List<String> remarks) {

        public Grip {
            assumptions = List.copyOf(assumptions);
            remarks = List.copyOf(remarks);
        }
    }

    /** Reads the table of the tables of stability. */
    public Friction(Edition stability) {
        Rows rows = stability.rows("friction");
        this.none = rows.keys().stream().filter(k -> !rows.isPrinted(k, "mu")).flatMap(k -> grounds(rows.text(k, "ground")).stream()).toList();
        this.pairs = rows.keys().stream().filter(k -> rows.isPrinted(k, "mu")).map(k -> new Pair(k, rows.text(k, "feet"), grounds(rows.text(k, "ground")), rows.number(k, "mu"),
            rows.text(k, "place"))).toList();
    }

    private static List<String> grounds(String text) {
        return List.of(text.split("\\s*;\\s*"));
    }

    /** The words for surfaces that the table knows. */
    public List<String> grounds() {
        return pairs.stream().flatMap(p -> p.grounds().stream()).distinct().toList();
    }

    /**
     * Friction coefficient for a surface as typed, recorded as "friction".
     *
     * @throws NoAnswer     for a surface on which none can be counted
     * @throws UnfitAnswer  for a typed coefficient that is not above zero, or above 1 without a reason
     */
    public Grip of(FenceFeet.Surface surface, Trace trace) {
        return surface.friction().isPresent() ? typed(surface.friction().get(), surface, trace) : fromTable(surface.ground(), trace);
    }

    private Grip typed(double typed, FenceFeet.Surface surface, Trace trace) {
        if (!(typed > 0) || Double.isInfinite(typed)) {
            throw new UnfitAnswer("friction", "a friction coefficient is a number above 0, such as 0.3 for wet asphalt under rubber feet");
        }
        boolean reasoned = surface.reason().filter(r -> !r.isBlank()).isPresent();
        if (typed > 1 && !reasoned) {
            throw new UnfitAnswer("friction", "a friction coefficient above 1 needs a reason: say how it was measured");
        }
        String why = surface.reason().filter(r -> !r.isBlank()).map(r -> ": " + r).orElse("");
        double value = trace.line("friction", "μ", "friction coefficient").from("typed by the user", Status.GIVEN).reads("as typed" + why, typed, "1");
        return new Grip(value, Status.GIVEN, List.of("The friction of " + typed + " is as typed" + (why.isEmpty() ? ", and who measured it was not said." : why + ".")), List.of());
    }

    private Grip fromTable(Optional<String> ground, Trace trace) {
        List<String> assumptions = new ArrayList<>();
        List<String> remarks = new ArrayList<>();
        String words = ground.map(g -> g.strip().toLowerCase(Locale.ROOT).replaceAll("\\s+", " ")).orElse("");
        int on = words.indexOf(ON);
        String feet = on < 0 ? "" : words.substring(0, on).strip();
        String surface = on < 0 ? words : words.substring(on + ON.length()).strip();
        if (none.contains(surface)) {
            throw new NoAnswer("no friction can be counted on " + surface + ": it does not stand there by its weight. An engineer is needed.");
        }
        boolean knownFeet = pairs.stream().anyMatch(p -> p.feet().equals(feet));
        Predicate<Pair> stands = knownFeet ? p -> p.feet().equals(feet) || p.feet().equals(ANY) : p -> !p.feet().equals(STEEL);
        Optional<Pair> pair = lowest(p -> stands.test(p) && p.grounds().contains(surface));
        Pair taken = pair.or(() -> lowest(p -> stands.test(p) || p.grounds().contains(surface))).orElseThrow();
        String first = taken.grounds().get(0);
        double mu = trace.line("friction", "μ", "friction coefficient, " + (taken.feet().equals(ANY) ? "" : taken.feet() + " on ") + first)
            .from(taken.coefficient().source().citation() + ": " + taken.place(), taken.coefficient().source().status())
            .reads("lowest published value that applies: " + taken.key(), taken.mu(), "1");
        if (words.isEmpty()) {
            assumptions.add("Friction " + mu + ": the ground was not given, so the lowest value of all surfaces is taken (" + first + ").");
        } else if (pair.isEmpty()) {
            assumptions.add("Friction " + mu + ": no published value was found for \"" + words + "\", so the lowest that can apply is taken (" + first
                + "). Known surfaces: " + String.join(", ", grounds()) + ".");
        } else {
            caution(surface, knownFeet, mu, assumptions, remarks);
        }
        return new Grip(mu, taken.coefficient().source().status(), assumptions, remarks);
    }

    private void caution(String surface, boolean knownFeet, double mu, List<String> assumptions, List<String> remarks) {
        lowest(p -> p.feet().equals(STEEL) && p.grounds().contains(surface)).filter(p -> !knownFeet && p.mu() < mu).ifPresent(steel ->
            assumptions.add("Friction " + mu + " for feet and blocks of concrete, rubber, plastic or wood. Bare steel grips less (" + steel.mu()
                + "): for such feet the ground is typed as \"steel on " + surface + "\"."));
        lowest(p -> !p.feet().equals(STEEL) && p.grounds().contains("wet " + surface)).filter(p -> p.mu() < mu).ifPresent(wet ->
            remarks.add("On wet " + surface + " the friction is " + wet.mu() + ", not " + mu + "."));
    }

    private Optional<Pair> lowest(Predicate<Pair> fits) {
        return pairs.stream().filter(fits).min(Comparator.comparingDouble(Pair::mu));
    }
}
