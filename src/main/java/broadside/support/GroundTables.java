package broadside.support;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.TableLibrary;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** The figures of posts in the ground, from the tables of "ground/1". A missing table stops the start. */
public final class GroundTables {

    private static final double ROUNDING = 1e-9;

    private final Rows soils;
    private final Rows ibc;
    private final Rows factors;
    private final Rows factorRule;
    private final Rows broms;
    private final Rows loadFactors;
    private final Rows sizes;
    private final Rows words;
    private final Map<String, Known> read = new ConcurrentHashMap<>();

    public GroundTables(TableLibrary tables) {
        Edition ground = tables.edition("ground/1").orElseThrow();
        this.soils = ground.rows("ibc-soils");
        this.ibc = ground.rows("ibc-rule");
        this.factors = ground.rows("ground-factors");
        this.factorRule = ground.rows("ground-factor-rule");
        this.broms = ground.rows("broms");
        this.loadFactors = ground.rows("load-factors");
        this.sizes = ground.rows("footing-sizes");
        this.words = ground.rows("ground-words");
    }

    Known ibc(String key) {
        return read.computeIfAbsent("ibc " + key, k -> Known.of(ibc, key));
    }

    Known factorRule(String key) {
        return read.computeIfAbsent("factor " + key, k -> Known.of(factorRule, key));
    }

    Known broms(String key) {
        return read.computeIfAbsent("broms " + key, k -> Known.of(broms, key));
    }

    /** Factor on the loads of an ultimate method where none was typed. */
    public Known loadFactor() {
        Known overload = Known.of(loadFactors, "overload");
        Known under = Known.of(loadFactors, "undercapacity");
        return new Known(overload.value() / under.value(), "1", "overload factor " + overload.text() + " over undercapacity factor " + under.text(),
            overload.place(), overload.status().weaker(under.status()));
    }

    /** A size, density or limit of "footing-sizes". */
    public Known size(String key) {
        return read.computeIfAbsent("size " + key, k -> Known.of(sizes, key));
    }

    /** Ground factor G of good, average or poor ground, Pa/m. */
    Known factor(String ground) {
        return Known.of(factors, ground, "factor", "kN/m3");
    }

    /** Allowable pressure under a footing, Pa. */
    Known vertical(String soil) {
        return Known.of(soils, soil, "vertical", "psf");
    }

    /** Lateral bearing, Pa/m. */
    Known lateral(String soil) {
        return Known.of(soils, soil, "lateral", "psf/ft");
    }

    boolean hasFriction(String soil) {
        return soils.isPrinted(soil, "friction");
    }

    Known friction(String soil) {
        return Known.of(soils, soil, "friction", "-");
    }

    /** Cohesion under a footing, Pa. */
    Known cohesion(String soil) {
        return Known.of(soils, soil, "cohesion", "psf");
    }

    String soil(String soil) {
        return soils.text(soil, "soil");
    }

    /** The class with the smallest presumptive values: the last of the table. */
    String lowestSoil() {
        return soils.keys().get(soils.keys().size() - 1);
    }

    String lowestGround() {
        return factors.keys().get(factors.keys().size() - 1);
    }

    Rows words() {
        return words;
    }

    /** The next whole number of steps that is not less. */
    static double roundedUp(double value, double step) {
        return BigDecimal.valueOf(value / step - ROUNDING).setScale(0, RoundingMode.CEILING).multiply(BigDecimal.valueOf(step)).doubleValue();
    }
}
