package broadside.support;

import broadside.quantity.Unit;
import broadside.support.Section.Form;
import broadside.support.Section.Material;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.TableFormat;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * A series of sections as its folder of tables gives it.
 *
 * @param key      name of the folder below "posts", or the whole key of a folder elsewhere
 * @param edition  the folder
 * @param us       whether it belongs to the practice of the United States
 * @param corners  family of corners of a rectangular tube
 * @param density  what its mass follows from, kg/m3
 * @param factor   design wall over the wall as sold, where no design wall is listed
 */
record Series(String key, Edition edition, String prefix, Form form, Material material, boolean us, String corners, Coefficient density,
              Optional<Coefficient> factor, Rows rows, Materials materials) {

    /** By mass, and by designation where that is the same. */
    static final Comparator<Section> LIGHTEST = Series::compare;

    private static final String HOME = "posts/";

    private static int compare(Section a, Section b) {
        int byMass = Double.compare(a.mass(), b.mass());
        return byMass != 0 ? byMass : a.designation().compareTo(b.designation());
    }

    static Series of(Edition edition, Materials materials) {
        String key = edition.key().startsWith(HOME) ? edition.key().substring(HOME.length()) : edition.key();
        return new Series(key, edition, edition.property("prefix").toUpperCase(Locale.ROOT), word(edition, "form", Form.values()),
            word(edition, "material", Material.values()), edition.property("region").equals("us"), edition.property("corners"),
            materials.density(edition.property("density")),
            edition.hasProperty("walls") ? Optional.of(materials.wallFactor(edition.property("walls"))) : Optional.empty(), edition.rows("sections"),
            materials);
    }

    private static <E extends Enum<E>> E word(Edition edition, String property, E[] values) {
        String word = edition.property(property);
        List<String> words = new ArrayList<>();
        for (E value : values) {
            words.add(value.name().toLowerCase(Locale.ROOT).replace('_', ' '));
            if (words.get(words.size() - 1).equals(word)) {
                return value;
            }
        }
        throw new TableFormat(edition.key() + "/edition.properties", 1, property + " must be " + String.join(" or ", words) + ", found \"" + word + "\"");
    }

    String grade() {
        return edition.property("grade");
    }

    /** The sections of the table, lightest first. */
    List<Section> sections(SectionShape shape) {
        List<Section> sections = new ArrayList<>();
        for (String designation : rows.keys()) {
            sections.add(listed(designation, shape));
        }
        sections.sort(LIGHTEST);
        return List.copyOf(sections);
    }

    /** The section of one row. */
    Section listed(String designation, SectionShape shape) {
        Sizes sizes = sizes(designation, materials.length(rows.text(designation, "unit")));
        Optional<String> problem = sizes.problem();
        if (problem.isPresent()) {
            throw broken(designation + ": " + problem.get());
        }
        return section(designation, key, sizes, shape);
    }

    /** Whether a designation stands here with the same sizes as in another series. */
    boolean agrees(Series other, String designation) {
        boolean same = form == other.form && material == other.material;
        for (String column : List.of("depth", "width", "wall", "design-wall", "unit")) {
            same = same && rows.text(designation, column).equals(other.rows.text(designation, column));
        }
        return same;
    }

    /** A section of this series or like it, with its properties. */
    Section section(String designation, String series, Sizes sizes, SectionShape shape) {
        return new Section(designation, series, form, material, sizes.depth(), sizes.width(), sizes.wall(), sizes.nominal(), shape.quietly(sizes, density));
    }

    private Sizes sizes(String designation, Unit unit) {
        double depth = cell(designation, "depth", unit);
        double width = form == Form.ROUND_TUBE ? depth : cell(designation, "width", unit);
        double nominal = cell(designation, "wall", unit);
        double listed = cell(designation, "design-wall", unit);
        double wall = listed > 0 ? listed : factor.isPresent() ? nominal * factor.get().value() : nominal;
        return new Sizes(form, depth, width, wall, nominal, corner(corners, nominal));
    }

    /** The corners that a wall has in a family; none of a round tube or a solid section. */
    Optional<Materials.Corner> corner(String family, double nominal) {
        return form == Form.RECTANGULAR_TUBE && nominal > 0 ? Optional.of(materials.corner(family, nominal)) : Optional.empty();
    }

    /** A size, m; 0 where none is printed. */
    private double cell(String designation, String column, Unit unit) {
        String cell = rows.text(designation, column);
        if (cell.equals("-")) {
            return 0;
        }
        try {
            return Materials.metres(Double.parseDouble(cell), unit);
        } catch (NumberFormatException e) {
            throw broken(designation + ": \"" + cell + "\" is not a number as printed");
        }
    }

    private TableFormat broken(String text) {
        return new TableFormat(edition.key() + "/sections.csv", 1, text);
    }
}
