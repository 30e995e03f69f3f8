package broadside.table;

import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Properties;
import java.util.TreeMap;
import java.util.concurrent.CompletableFuture;

/** All editions of all codes, read and checked at the start. A broken table stops the start. */
public final class TableLibrary {

    private static final String PROPERTIES = "edition.properties";
    private static final String CONSTANTS = "constants";
    private static final String BIBLIOGRAPHY = "publications.csv";
    private static final String OWN_BIBLIOGRAPHY = "own " + BIBLIOGRAPHY;

    private final Map<String, Edition> editions;
    private final Map<String, Publication> publications;
    private final CompletableFuture<String> digest;

    /** A row of the bibliography. */
    public record Publication(String key, String title, String publisher, String year) { }

    private TableLibrary(Map<String, Edition> editions, Map<String, Publication> publications, CompletableFuture<String> digest) {
        this.editions = editions;
        this.publications = publications;
        this.digest = digest;
    }

    /** Reads the tables that ship with the tool. */
    public static TableLibrary shipped() {
        return of(TableFiles.shipped("code-tables"), Map.of());
    }

    /**
     * Reads tables from files by their path below the folder of tables.
     *
     * @param own  more editions and overlays, such as a firm's own values; they may not replace a shipped file
     */
    public static TableLibrary of(Map<String, byte[]> shipped, Map<String, byte[]> own) {
        Map<String, byte[]> files = new TreeMap<>(shipped);
        own.forEach((name, bytes) -> {
            if (!name.equals(BIBLIOGRAPHY) && files.putIfAbsent(name, bytes) != null) {
                throw new TableFormat(name, 1, "a table of this name ships with the tool; use a folder of your own");
            }
        });
        if (own.containsKey(BIBLIOGRAPHY)) {
            files.put(OWN_BIBLIOGRAPHY, own.get(BIBLIOGRAPHY));
        }
        CompletableFuture<String> digest = CompletableFuture.supplyAsync(() -> digest(files));
        Map<String, Publication> publications = Bibliography.read(BIBLIOGRAPHY, shipped.get(BIBLIOGRAPHY));
        if (own.containsKey(BIBLIOGRAPHY)) {
            Bibliography.read(BIBLIOGRAPHY, own.get(BIBLIOGRAPHY)).forEach((key, row) -> {
                if (publications.putIfAbsent(key, row) != null) {
                    throw new TableFormat(BIBLIOGRAPHY, 1, "the key " + key + " ships with the tool; use a key of your own");
                }
            });
        }
        Map<String, Map<String, byte[]>> folders = folders(files);
        Map<String, Edition> editions = new LinkedHashMap<>();
        for (String key : folders.keySet()) {
            read(key, folders, editions, publications, new ArrayList<>());
        }
        return new TableLibrary(editions, publications, digest);
    }

    private static Map<String, Map<String, byte[]>> folders(Map<String, byte[]> files) {
        Map<String, Map<String, byte[]>> folders = new TreeMap<>();
        files.forEach((name, bytes) -> {
            int slash = name.lastIndexOf('/');
            if (slash >= 0) {
                folders.computeIfAbsent(name.substring(0, slash), k -> new TreeMap<>()).put(name.substring(slash + 1), bytes);
            } else if (!name.equals(BIBLIOGRAPHY) && !name.equals(OWN_BIBLIOGRAPHY)) {
                throw new TableFormat(name, 1, "a file outside a folder of an edition");
            }
        });
        return folders;
    }

    private static Edition read(String key, Map<String, Map<String, byte[]>> folders, Map<String, Edition> editions,
                                Map<String, Publication> publications, List<String> open) {
        if (editions.containsKey(key)) {
            return editions.get(key);
        }
        Map<String, byte[]> folder = folders.get(key);
        if (folder == null || open.contains(key)) {
            throw new TableFormat(open.get(open.size() - 1) + "/" + PROPERTIES, 1, "basis = " + key
                + (folder == null ? " names no edition" : " leads back to itself"));
        }
        Properties properties = properties(key, folder.get(PROPERTIES));
        open.add(key);
        Optional<Edition> basis = Optional.ofNullable(properties.getProperty("basis"))
            .map(b -> read(b.strip(), folders, editions, publications, open));
        Map<String, TableFile> tables = new LinkedHashMap<>();
        folder.forEach((name, bytes) -> {
            if (name.endsWith(".csv")) {
                TableFile table = TableReader.read(key + "/" + name, bytes);
                if (!publications.containsKey(table.source().publication())) {
                    throw new TableFormat(table.name(), 2, "the publication " + table.source().publication()
                        + " is not in publications.csv");
                }
                tables.put(name.substring(0, name.length() - ".csv".length()), table);
            } else if (!name.equals(PROPERTIES)) {
                throw new TableFormat(key + "/" + name, 1, "a folder of an edition holds edition.properties and .csv files only");
            }
        });
        basis.ifPresent(b -> tables.forEach((name, table) -> fits(key, name, table, b)));
        Edition edition = new Edition(key, properties, tables, basis);
        for (String needed : List.of("title", "publication", "edition", "procedure", "averaging", "level", "status")) {
            edition.property(needed);
        }
        editions.put(key, edition);
        return edition;
    }

    /** An overlay changes tables of its edition, or adds one that the edition allows; a slip in a name must not go unseen. */
    private static void fits(String key, String name, TableFile table, Edition basis) {
        List<String> more = basis.hasProperty("overlay-tables") ? List.of(basis.property("overlay-tables").split("\\s*,\\s*")) : List.of();
        if (!basis.has(name) && !more.contains(name)) {
            throw new TableFormat(table.name(), 1, "is no table of " + basis.key() + ": an overlay changes " + String.join(", ", basis.tables())
                + (more.isEmpty() ? "" : ", or adds " + String.join(", ", more)));
        }
        if (name.equals(CONSTANTS) && basis.has(name)) {
            table.body().stream().map(row -> row.get(0)).filter(number -> !basis.rows(name).has(number)).findFirst().ifPresent(number -> {
                throw new TableFormat(table.name(), 1, "\"" + number + "\" is no number of " + basis.key() + "; it has " + String.join(", ", basis.rows(name).keys()));
            });
        }
    }

    private static Properties properties(String key, byte[] bytes) {
        if (bytes == null) {
            throw new TableFormat(key + "/" + PROPERTIES, 1, "this file is missing");
        }
        Properties properties = new Properties();
        try {
            properties.load(new StringReader(new String(bytes, StandardCharsets.UTF_8)));
        } catch (IOException | IllegalArgumentException e) {
            throw new TableFormat(key + "/" + PROPERTIES, 1, e.getMessage());
        }
        return properties;
    }

    private static String digest(Map<String, byte[]> files) {
        try {
            MessageDigest sum = MessageDigest.getInstance("SHA-256");
            files.forEach((name, bytes) -> {
                sum.update(name.getBytes(StandardCharsets.UTF_8));
                sum.update((byte) 0);
                sum.update(Integer.toString(bytes.length).getBytes(StandardCharsets.UTF_8));
                sum.update((byte) 0);
                sum.update(bytes);
            });
            return "sha256:" + HexFormat.of().formatHex(sum.digest());
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }

    public Optional<Edition> edition(String key) {
        return Optional.ofNullable(editions.get(key));
    }

    public List<Edition> editions() {
        return List.copyOf(editions.values());
    }

    public List<Publication> publications() {
        return List.copyOf(publications.values());
    }

    public Optional<Publication> publication(String key) {
        return Optional.ofNullable(publications.get(key));
    }

    /** Digest of all table files, so that an old document can be explained years later. */
    public String digest() {
        return digest.join();
    }
}
