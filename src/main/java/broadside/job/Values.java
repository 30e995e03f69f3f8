package broadside.job;

import broadside.quantity.Quantity;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The values that were read for one object of a job, with the path at which it stands. What did not fit is absent. */
final class Values {

    private final String path;
    private final Map<String, Object> values = new LinkedHashMap<>();

    Values(String path) {
        this.path = path;
    }

    String path() {
        return path;
    }

    /** Path of a field of this object. */
    String at(String name) {
        return path.isEmpty() ? name : path + "." + name;
    }

    void put(String name, Object value) {
        values.put(name, value);
    }

    Optional<String> text(String name) {
        return get(name, String.class);
    }

    Optional<Double> number(String name) {
        return get(name, Double.class);
    }

    Optional<Integer> whole(String name) {
        return get(name, Integer.class);
    }

    <Q extends Quantity> Optional<Q> quantity(String name, Class<Q> kind) {
        return get(name, kind);
    }

    Optional<Values> object(String name) {
        return get(name, Values.class);
    }

    @SuppressWarnings("unchecked")
    List<Values> list(String name) {
        return get(name, List.class).map(l -> (List<Values>) l).orElse(List.of());
    }

    private <T> Optional<T> get(String name, Class<T> kind) {
        Object value = values.get(name);
        return kind.isInstance(value) ? Optional.of(kind.cast(value)) : Optional.empty();
    }
}
