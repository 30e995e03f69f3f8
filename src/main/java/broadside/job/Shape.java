package broadside.job;

import java.util.List;
import java.util.Optional;

/** An object of the job file: its name and its fields. */
public record Shape(String name, List<Field> fields) {

    public Shape {
        fields = List.copyOf(fields);
    }

    public Optional<Field> field(String wanted) {
        return fields.stream().filter(f -> f.name().equals(wanted)).findFirst();
    }

    String names() {
        return String.join(", ", fields.stream().map(Field::name).toList());
    }
}
