package broadside.assess;

import java.io.IOException;
import java.io.InputStream;
import java.util.Properties;

/**
 * The tool and its tables.
 *
 * @param version  version of the tool
 * @param tables   digest of all table files
 */
public record About(String version, String tables) {

    public static About of(String tables) {
        try (InputStream in = About.class.getResourceAsStream("/version.properties")) {
            Properties properties = new Properties();
            properties.load(in);
            return new About(properties.getProperty("version"), tables);
        } catch (IOException e) {
            throw new IllegalStateException("version.properties cannot be read", e);
        }
    }

    /** Name, version and the first digits of the digest, as they stand at the foot of every page. */
    public String line() {
        return "Broadside " + version + ", tables " + tables.substring("sha256:".length(), "sha256:".length() + 12);
    }
}
