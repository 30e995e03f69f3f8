package broadside.table;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Properties;

/**
 * One edition of a code, or one national overlay: a folder of tables with its properties.
 * An overlay holds only what differs; what it lacks is read from the edition that it stands on.
 */
public final class Edition {

    private final String key;
    private final Properties properties;
    private final Map<String, TableFile> files;
    private final Map<String, Object> shapes;
    private final Optional<Edition> basis;

    Edition(String key, Properties properties, Map<String, TableFile> files, Optional<Edition> basis) {
        this.key = key;
        this.properties = properties;
        this.files = new LinkedHashMap<>(files);
        this.basis = basis;
        this.shapes = new LinkedHashMap<>();
        files.forEach((name, file) -> shapes.put(name, switch (file.form()) {
            case "curve" -> Shapes.curve(file);
            case "grid" -> Shapes.grid(file);
            default -> rowsOver(name, Shapes.rows(file), basis);
        }));
    }

    private static Rows rowsOver(String name, Rows own, Optional<Edition> basis) {
        return basis.flatMap(b -> b.find(name, Rows.class)).map(own::over).orElse(own);
    }

    /** Code and edition with a slash between them. */
    public String key() {
        return key;
    }

    /** A line of edition.properties: title, publication, edition, procedure, averaging, level or status. */
    public String property(String name) {
        String own = properties.getProperty(name);
        return own != null ? own.strip() : basis.map(b -> b.property(name)).orElseThrow(() ->
            new TableFormat(key + "/edition.properties", 1, "the line \"" + name + " = ...\" is missing"));
    }

    public boolean hasProperty(String name) {
        return properties.getProperty(name) != null || basis.map(b -> b.hasProperty(name)).orElse(false);
    }

    /** Whether this edition or the one that it stands on has a table of that name. */
    public boolean has(String table) {
        return shapes.containsKey(table) || basis.map(b -> b.has(table)).orElse(false);
    }

    /** The names of the tables of this edition and of the one that it stands on. */
    public List<String> tables() {
        return java.util.stream.Stream.concat(shapes.keySet().stream(), basis.stream().flatMap(b -> b.tables().stream())).distinct().sorted().toList();
    }

    public boolean isOverlay() {
        return basis.isPresent();
    }

    public Optional<Edition> basis() {
        return basis;
    }

    /** The files of this folder alone. */
    public List<TableFile> ownFiles() {
        return List.copyOf(files.values());
    }

    public Curve curve(String name) {
        return get(name, Curve.class);
    }

    public Grid grid(String name) {
        return get(name, Grid.class);
    }

    public Rows rows(String name) {
        return get(name, Rows.class);
    }

    private <T> T get(String name, Class<T> shape) {
        return find(name, shape).orElseThrow(() -> new TableFormat(key + "/" + name + ".csv", 1, "this table is missing"));
    }

    private <T> Optional<T> find(String name, Class<T> shape) {
        Object own = shapes.get(name);
        if (own == null) {
            return basis.flatMap(b -> b.find(name, shape));
        }
        if (!shape.isInstance(own)) {
            throw new TableFormat(key + "/" + name + ".csv", 3, "is read as " + shape.getSimpleName().toLowerCase(java.util.Locale.ROOT)
                + ", but its form is another");
        }
        return Optional.of(shape.cast(own));
    }
}
