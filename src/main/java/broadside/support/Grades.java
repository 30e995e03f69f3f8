package broadside.support;

import broadside.quantity.Dimension;
import broadside.support.Section.Form;
import broadside.support.Section.Material;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Grades of steel, timber and aluminium, by name. */
final class Grades {

    private static final String FIELD = "posts.grade";

    private final Rows steel;
    private final Rows classes;
    private final Rows timber;
    private final Rows shear;
    private final Rows alloys;
    private Map<String, Entry> entries; // made when first asked for

    /** A grade, the practice it belongs to, and the largest wall for which it holds, m. */
    private record Entry(Grade grade, boolean us, double thickest) { }

    Grades(Edition edition) {
        this.steel = edition.rows("steel-grades");
        this.classes = edition.rows("timber-classes");
        this.timber = edition.rows("timber-us");
        this.shear = edition.rows("timber-us-shear");
        this.alloys = edition.rows("aluminium-alloys");
    }

    private synchronized Map<String, Entry> byName() {
        if (entries == null) {
            Map<String, Entry> made = new LinkedHashMap<>();
            fill(made);
            entries = made;
        }
        return entries;
    }

    private void fill(Map<String, Entry> made) {
        for (String name : steel.keys()) {
            boolean us = !steel.text(name, "unit").equals("N/mm2");
            double thickest = steel.isPrinted(name, "wall") ? Materials.metres(steel.number(name, "wall").value(), Materials.unit("mm")) : Double.MAX_VALUE;
            add(made, name, Material.STEEL, pressure(steel, name, "strength"), Optional.empty(), pressure(steel, name, "modulus"), us, thickest);
        }
        for (String name : classes.keys()) {
            add(made, name, Material.TIMBER, pressure(classes, name, "bending"), Optional.of(pressure(classes, name, "shear")),
                pressure(classes, name, "modulus"), false, Double.MAX_VALUE);
        }
        for (String name : timber.keys()) {
            add(made, name, Material.TIMBER, pressure(timber, name, "bending"), shear.has(name) ? Optional.of(pressure(shear, name, "shear")) : Optional.empty(),
                pressure(timber, name, "modulus"), true, Double.MAX_VALUE);
        }
        for (String name : alloys.keys()) {
            add(made, name, Material.ALUMINIUM, pressure(alloys, name, "strength"), Optional.empty(), pressure(alloys, name, "modulus"), false, Double.MAX_VALUE);
        }
    }

    private static Coefficient pressure(Rows rows, String name, String column) {
        return Materials.si(rows, name, column, Dimension.PRESSURE, "Pa");
    }

    private static void add(Map<String, Entry> made, String name, Material material, Coefficient strength, Optional<Coefficient> shear, Coefficient modulus,
                            boolean us, double thickest) {
        made.put(key(name), new Entry(new Grade(name, material, strength, shear, modulus), us, thickest));
    }

    /** A grade by its name, whatever its letter case, spaces and marks. */
    Grade find(String name, Material material) {
        return entry(name, "", material).grade();
    }

    /** A grade by its name for a section: of its material, and of its form where the standard tells them apart. */
    Grade find(String name, Section section) {
        Form form = section.form();
        String shaped = form == Form.SOLID_RECTANGLE ? "" : form == Form.ROUND_TUBE ? "ROUND" : "RECTANGULAR";
        Entry entry = entry(name, shaped, section.material());
        String found = key(entry.grade().name());
        if (!shaped.isEmpty() && (found.endsWith("ROUND") || found.endsWith("RECTANGULAR")) && !found.endsWith(shaped)) {
            throw new UnfitAnswer(FIELD, "the grade " + entry.grade().name() + " is not for " + section.designation() + "; " + fitting(section.material()));
        }
        return entry.grade();
    }

    /** Why the strength of a grade does not hold for a section: its wall is thicker than the standard's row; empty where it holds. */
    Optional<String> beyond(Grade grade, Section section) {
        double thickest = byName().get(key(grade.name())).thickest();
        return section.nominalWall() <= thickest ? Optional.empty() : Optional.of("the strength of " + grade.name() + " is known for walls up to "
            + Math.round(thickest * 1000) + " mm only, and " + section.designation() + " is thicker");
    }

    private Entry entry(String name, String form, Material material) {
        String key = key(name);
        Entry entry = byName().getOrDefault(key, byName().get(key + form));
        if (entry == null || entry.grade().material() != material) {
            throw new UnfitAnswer(FIELD, "the grade \"" + UnfitText.clean(name) + "\" is not known for "
                + material.name().toLowerCase(Locale.ROOT) + "; " + fitting(material));
        }
        return entry;
    }

    private String fitting(Material material) {
        List<String> names = new ArrayList<>(names(false, material));
        names.addAll(names(true, material));
        return "there are " + String.join(", ", names);
    }

    /** Names of the grades of a material in one practice, in the order of the tables. */
    List<String> names(boolean us, Material material) {
        return byName().values().stream().filter(e -> e.us() == us && e.grade().material() == material).map(e -> e.grade().name()).toList();
    }

    /** Letters and digits of a name in capitals, without what people write around it; a quality behind an EN steel grade is cut. */
    private static String key(String name) {
        String plain = name.toUpperCase(Locale.ROOT).replace("#", "NO").replace("ASTM", "").replace("GRADE", "").replace("EN AW", "");
        StringBuilder kept = new StringBuilder();
        for (int i = 0; i < plain.length(); i++) {
            if (Character.isLetterOrDigit(plain.charAt(i))) {
                kept.append(plain.charAt(i));
            }
        }
        String key = kept.toString().replace("GR", "");
        boolean steel = key.length() > 4 && key.charAt(0) == 'S' && Character.isLetter(key.charAt(4));
        for (int i = 1; steel && i < 4; i++) {
            steel = key.charAt(i) >= '0' && key.charAt(i) <= '9';
        }
        return steel ? key.substring(0, 4) : key;
    }
}
