package broadside.support;

import broadside.quantity.Unit;
import broadside.support.Section.Form;
import broadside.support.Section.Material;
import broadside.support.Section.Properties;
import broadside.table.Edition;
import broadside.table.TableFormat;
import broadside.table.TableLibrary;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Sections of posts and the grades they are made of, from the folders of tables whose procedure is post-sections. A folder
 * that stands on another (basis) takes its place: its rows count where a designation is looked up or a series is not named.
 */
public final class Catalogue {

    /** Series of a section that was worked out from the sizes in its designation. */
    public static final String NOT_LISTED = "not in the catalogue";

    private static final String SECTIONS = "post-sections";
    private static final String MATERIALS = "post-materials";

    /** The series whose form, density and grade a section of the same letters has when it is not listed. */
    private static final Map<String, String> FORMS = Map.of("CHS", "chs-hot", "SHS", "shs-hot", "RHS", "rhs-cold");

    private final Map<String, Series> series = new TreeMap<>();
    private final Map<String, List<Section>> bySeries = new ConcurrentHashMap<>();
    private final Map<String, Series> listed = new HashMap<>();
    private final Set<String> replaced = new HashSet<>();
    private final SectionShape shape;
    private final Grades grades;
    private Map<String, String> byKey; // these two are made when first asked for
    private List<Section> all;

    /**
     * Opens the catalogue. Properties are worked out series by series, when a series is first asked for.
     *
     * @throws TableFormat where a table is broken, or two series list different sections under one designation
     */
    public Catalogue(TableLibrary tables) {
        Edition home = materials(tables);
        Materials materials = new Materials(home);
        this.shape = new SectionShape(materials);
        this.grades = new Grades(home);
        List<Edition> editions = of(SECTIONS, tables);
        for (Edition edition : editions) {
            Series each = Series.of(edition, materials);
            series.put(each.key(), each);
        }
        for (Series each : series.values()) {
            if (replaced(each.edition(), editions)) {
                replaced.add(each.key());
            } else {
                list(each);
            }
        }
    }

    /** The tables of materials: those that ship, or the one folder that stands on them. */
    private static Edition materials(TableLibrary tables) {
        List<Edition> found = of(MATERIALS, tables);
        List<Edition> own = new ArrayList<>();
        for (Edition edition : found) {
            if (!replaced(edition, found)) {
                own.add(edition);
            }
        }
        if (own.size() != 1) {
            throw own.isEmpty() ? new TableFormat("posts/materials", 1, "the tables of materials are missing")
                : new TableFormat(own.get(1).key() + "/edition.properties", 1, "only one folder may hold or change the materials of posts; " + own.get(0).key()
                    + " does too");
        }
        return own.get(0);
    }

    private static List<Edition> of(String procedure, TableLibrary tables) {
        List<Edition> found = new ArrayList<>();
        for (Edition edition : tables.editions()) {
            if (edition.property("procedure").equals(procedure)) {
                found.add(edition);
            }
        }
        return found;
    }

    /** Whether another edition stands on this one. */
    private static boolean replaced(Edition edition, List<Edition> editions) {
        for (Edition other : editions) {
            if (other.basis().isPresent() && other.basis().get() == edition) {
                return true;
            }
        }
        return false;
    }

    private void list(Series each) {
        for (String designation : each.rows().keys()) {
            Series other = listed.putIfAbsent(designation, each);
            if (other != null && !other.agrees(each, designation)) {
                throw new TableFormat(each.edition().key() + "/sections.csv", 1, designation + " stands with other sizes in the series " + other.key());
            }
        }
    }

    /** All sections, lightest first. */
    public synchronized List<Section> sections() {
        if (all == null) {
            List<Section> sections = new ArrayList<>();
            listed.forEach((designation, home) -> sections.add(home.listed(designation, shape)));
            sections.sort(Series.LIGHTEST);
            all = List.copyOf(sections);
        }
        return all;
    }

    /** The sections of a series, lightest first. */
    public List<Section> series(String key) {
        Series found = series.get(key);
        if (found == null) {
            throw new UnfitAnswer("posts.series", "the series \"" + UnfitText.clean(key) + "\" is not among the tables; there are "
                + String.join(", ", seriesKeys()));
        }
        return bySeries.computeIfAbsent(key, k -> found.sections(shape));
    }

    public List<String> seriesKeys() {
        return List.copyOf(series.keySet());
    }

    /** The series of a material in the practice of the United States or of other countries; of any practice where it has none of its own. */
    public List<String> defaults(boolean us, Material material) {
        List<Series> fitting = series.values().stream().filter(s -> s.material() == material && !replaced.contains(s.key())).toList();
        List<String> own = fitting.stream().filter(s -> s.us() == us).map(Series::key).toList();
        return own.isEmpty() ? fitting.stream().map(Series::key).toList() : own;
    }

    /**
     * A section by its designation: a listed one, or one of a known form (CHS, SHS, RHS with sizes in mm) that is worked out
     * from its sizes. Nothing for any other text.
     *
     * @throws UnfitAnswer where the sizes can be no section
     */
    public Optional<Section> find(String designation) {
        Series home = listed.get(designation);
        if (home != null) {
            return Optional.of(home.listed(designation, shape));
        }
        String key = Designation.key(designation);
        Optional<Section> found = byKey(key);
        return found.isPresent() ? found : Designation.of(key).filter(d -> FORMS.containsKey(d.prefix())).flatMap(this::sized);
    }

    private synchronized Optional<Section> byKey(String key) {
        if (byKey == null) {
            byKey = new HashMap<>();
            listed.keySet().forEach(designation -> byKey.put(Designation.key(designation), designation));
        }
        return Optional.ofNullable(byKey.get(key)).map(designation -> listed.get(designation).listed(designation, shape));
    }

    private Optional<Section> sized(Designation typed) {
        Series like = like(typed.prefix());
        boolean round = like.form() == Form.ROUND_TUBE;
        boolean square = typed.prefix().equals("SHS");
        double[] sizes = typed.sizes();
        if (round ? sizes.length != 2 : !square && sizes.length != 3) {
            return Optional.empty();
        }
        if (square && sizes.length == 3 && sizes[0] != sizes[1]) {
            throw new UnfitAnswer("posts.section", "a square section (SHS) has equal sides; RHS is the rectangular one");
        }
        String finish = typed.finish().isEmpty() ? like.corners() : typed.finish();
        String name = typed.prefix() + " " + Designation.plain(sizes[0]) + "x" + (round || square ? "" : Designation.plain(sizes[1]) + "x")
            + Designation.plain(sizes[sizes.length - 1]) + (round ? "" : " " + finish);
        Optional<Section> found = byKey(Designation.key(name));
        if (found.isPresent()) {
            return found;
        }
        Unit unit = Materials.unit("mm");
        double depth = Materials.metres(sizes[0], unit);
        double width = round || square ? depth : Materials.metres(sizes[1], unit);
        double wall = Materials.metres(sizes[sizes.length - 1], unit);
        Sizes made = new Sizes(like.form(), depth, width, wall, wall, like.corner(finish, wall));
        made.problem().ifPresent(p -> {
            throw new UnfitAnswer("posts.section", name + " can be no section: " + p);
        });
        return Optional.of(like.section(name, NOT_LISTED, made, shape));
    }

    private Series like(String prefix) {
        String key = FORMS.get(prefix);
        return Optional.ofNullable(series.get(key)).orElseThrow(() -> new TableFormat("posts/" + key + "/edition.properties", 1, "this file is missing"));
    }

    private Series origin(Section section) {
        return section.series().equals(NOT_LISTED) ? like(section.designation().substring(0, section.designation().indexOf(' ')))
            : series.get(section.series());
    }

    /**
     * Records the sizes and properties of a section: section-area, section-inertia, section-modulus-elastic,
     * section-modulus-plastic, section-torsion-inertia, section-torsion-modulus, section-mass and what leads to them; those of
     * the weak axis with "/weak" behind, where the sides differ.
     *
     * @return the recorded properties
     */
    public Properties record(Section section, Trace trace) {
        return SectionSheet.record(section, origin(section), shape, trace);
    }

    /**
     * A grade by its name, whatever its letter case, spaces and marks.
     *
     * @throws UnfitAnswer where no grade of the material has that name
     */
    public Grade grade(String name, Material material) {
        return grades.find(name, material);
    }

    /**
     * A grade by its name for a section: "A500 B" is that of its form.
     *
     * @throws UnfitAnswer where no grade of its material and form has that name, or that grade is of another form
     */
    public Grade grade(String name, Section section) {
        return grades.find(name, section);
    }

    /** Why the strength of a grade does not hold for a section; empty where it holds. */
    public Optional<String> beyond(Grade grade, Section section) {
        return grades.beyond(grade, section);
    }

    /** The weakest grade in common use for a section, for a job that names none. */
    public Grade defaultGrade(Section section) {
        return grades.find(origin(section).grade(), section);
    }

    /** Names of the grades of a material in the practice of the United States (allowable stresses for timber), or of other countries. */
    public List<String> gradeNames(boolean us, Material material) {
        return grades.names(us, material);
    }
}
