package broadside.table;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;

/** Finds the files that ship with the tool, in the jar or in the folder of compiled classes. */
public final class TableFiles {

    /** All files below a folder of the class path, by their path below it, in the order of their names. */
    public static Map<String, byte[]> shipped(String folder) {
        try {
            URI home = TableFiles.class.getProtectionDomain().getCodeSource().getLocation().toURI();
            Path place = Path.of(home);
            return Files.isDirectory(place) ? below(place.resolve(folder)) : inJar(place, folder + "/");
        } catch (IOException e) {
            throw new UncheckedIOException("cannot read the files of " + folder, e);
        } catch (URISyntaxException e) {
            throw new IllegalStateException("cannot find the files of " + folder, e);
        }
    }

    /** All files below a folder of the machine, by their path below it; hidden files are left out. */
    public static Map<String, byte[]> below(Path folder) throws IOException {
        Map<String, byte[]> files = new TreeMap<>();
        try (Stream<Path> found = Files.walk(folder)) {
            for (Path file : (Iterable<Path>) found.filter(Files::isRegularFile)::iterator) {
                String name = folder.relativize(file).toString().replace('\\', '/');
                if (!name.startsWith(".") && !name.contains("/.")) {
                    files.put(name, Files.readAllBytes(file));
                }
            }
        }
        return files;
    }

    private static Map<String, byte[]> inJar(Path jar, String prefix) throws IOException {
        Map<String, byte[]> files = new TreeMap<>();
        try (ZipFile open = new ZipFile(jar.toFile())) {
            for (ZipEntry entry : Collections.list(open.entries())) {
                if (entry.isDirectory() || !entry.getName().startsWith(prefix)) {
                    continue;
                }
                try (InputStream in = open.getInputStream(entry)) {
                    files.put(entry.getName().substring(prefix.length()), in.readAllBytes());
                }
            }
        }
        return files;
    }

    private TableFiles() { }
}
