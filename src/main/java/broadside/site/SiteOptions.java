package broadside.site;

import broadside.quantity.Quantity;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** Values of the site that only some codes ask for, by their name in the job file. */
public record SiteOptions(Map<String, Double> numbers, Map<String, Quantity> quantities, Map<String, String> words) {

    public static final SiteOptions NONE = new SiteOptions(Map.of(), Map.of(), Map.of());

    public SiteOptions {
        numbers = Map.copyOf(numbers);
        quantities = Map.copyOf(quantities);
        words = Map.copyOf(words);
    }

    public Optional<Double> number(String name) {
        return Optional.ofNullable(numbers.get(name));
    }

    /** A quantity in SI. */
    public Optional<Double> si(String name) {
        return Optional.ofNullable(quantities.get(name)).map(Quantity::si);
    }

    public Optional<String> word(String name) {
        return Optional.ofNullable(words.get(name));
    }

    /** The same values but for some names. */
    public SiteOptions without(String... names) {
        Map<String, Double> n = new HashMap<>(numbers);
        Map<String, Quantity> q = new HashMap<>(quantities);
        Map<String, String> w = new HashMap<>(words);
        for (String name : names) {
            n.remove(name);
            q.remove(name);
            w.remove(name);
        }
        return new SiteOptions(n, q, w);
    }

    /** The names of all values given. */
    public Set<String> names() {
        Set<String> names = new TreeSet<>(numbers.keySet());
        names.addAll(quantities.keySet());
        names.addAll(words.keySet());
        return names;
    }
}
