package broadside.codes;

import broadside.site.Averaging;
import java.util.List;
import java.util.Set;

/**
 * What a code wants to know of the site, and by which words.
 *
 * @param averaging   the averaging time by which its basic speed is defined
 * @param terrains    its terrain classes, with what each means in plain words
 * @param options     names of the further site values that it takes
 */
public record SiteTerms(Averaging averaging, List<Terrain> terrains, Set<String> options) {

    /** A terrain class and its meaning. */
    public record Terrain(String name, String meaning) { }

    public boolean hasTerrain(String name) {
        return terrains.stream().anyMatch(t -> t.name().equals(name));
    }

    public String terrainNames() {
        return String.join(", ", terrains.stream().map(Terrain::name).toList());
    }
}
