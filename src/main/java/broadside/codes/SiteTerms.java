package broadside.codes;

import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.site.Averaging;
import broadside.table.Edition;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/**
 * What a code wants to know of the site, and by which words.
 *
 * @param averagings  the averaging time by which its basic speed is defined, and after it those that are older words for the same
 * @param terrains    its terrain classes, with what each means in plain words; none where the terrain is a roughness length
 * @param smoothest   the terrain that gives the largest load, taken where the terrain is not known
 * @param options     names of the further site values that it takes
 */
public record SiteTerms(List<Averaging> averagings, List<Terrain> terrains, String smoothest, Set<String> options) {

    /** A terrain class and its meaning. */
    public record Terrain(String name, String meaning) { }

    /** The averaging time of an edition, from its properties; "averaging" and, where there is one, "averaging-also". */
    static List<Averaging> averagings(Edition edition) {
        return Stream.of("averaging", "averaging-also").filter(edition::hasProperty)
            .map(name -> Averaging.of(edition.property(name)).orElseThrow()).toList();
    }

    /** The averaging time by which the basic speed is defined. */
    public Averaging averaging() {
        return averagings.get(0);
    }

    /** Whether the terrain is typed as a roughness length. */
    public boolean byRoughness() {
        return terrains.isEmpty();
    }

    public boolean hasTerrain(String name) {
        return byRoughness() ? Typed.read(name, Dimension.LENGTH) instanceof Reading.Value value
            && value.si() > 0 && value.si() <= 5 : terrains.stream().anyMatch(t -> t.name().equals(name));
    }

    public String terrainNames() {
        return byRoughness() ? "a roughness length up to 5 m, such as 0.05 m for open fields" : String.join(", ", terrains.stream().map(Terrain::name).toList());
    }
}
