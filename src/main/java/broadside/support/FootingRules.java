package broadside.support;

import broadside.panel.Footing;
import broadside.quantity.Quantity;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/** Which rule a footing holds by, and the values of its soil: typed, or presumed and said so. */
final class FootingRules {

    static final String IBC = "ibc";
    static final String GROUND_FACTOR = "ground-factor";
    static final String CLAY = "broms-clay";
    static final String SAND = "broms-sand";

    private final GroundTables tables;
    private final Footing.Soil soil;
    private final Footing.Ground ground;
    private final GroundWords words;
    private final List<Assumed> assumed;
    private final boolean en;

    FootingRules(GroundTables tables, Footing.Soil soil, Footing.Ground ground, boolean en, List<Assumed> assumed) {
        this.tables = tables;
        this.soil = soil;
        this.ground = ground;
        this.en = en;
        this.assumed = assumed;
        this.words = new GroundWords(tables, soil, assumed);
    }

    /** Name of the rule that is typed or that fits what is known. */
    String chosen() {
        if (soil.rule().isPresent()) {
            String typed = soil.rule().get().strip();
            if (!List.of(IBC, GROUND_FACTOR, CLAY, SAND).contains(typed)) {
                throw new UnfitAnswer("footing.rule", "the rules for the depth are " + String.join(", ", List.of(IBC, GROUND_FACTOR, CLAY, SAND)));
            }
            return typed;
        }
        if (soil.cohesion().isPresent()) {
            return CLAY;
        }
        if (soil.friction().isPresent()) {
            return SAND;
        }
        if (soil.lateral().isPresent() || words.soilClass().isPresent()) {
            return IBC;
        }
        return words.ground().isPresent() || en ? GROUND_FACTOR : IBC;
    }

    boolean isBadGround() {
        return words.isBad();
    }

    /** The rule with its soil recorded. */
    DepthRule rule(Trace trace) {
        return switch (chosen()) {
            case IBC -> new IbcEmbedment(tables, new IbcEmbedment.Soil(lateral(), ground.doubled(), ground.increased()), ground.paved(), trace);
            case CLAY -> new BromsClay(tables, typed("cohesion", "Pa", soil.cohesion(),
                "the undrained shear strength of the clay, such as \"40 kPa\""), factor(), trace);
            case SAND -> new BromsSand(tables, typed("friction-angle", "rad", soil.friction(),
                "the angle of friction of the sand, such as \"30 deg\""), density(), factor(),
                trace);
            default -> new GroundFactor(tables, tables.factor(words.presumedGround()), trace);
        };
    }

    private static Known typed(String field, String unit, Optional<? extends Quantity> value, String what) {
        Quantity given = value.orElseThrow(() -> new UnfitAnswer("footing." + field, "this rule needs " + what));
        return Known.typed(given.si(), unit, given.typed());
    }

    private Known lateral() {
        if (soil.lateral().isPresent()) {
            return positive("lateral-bearing", Known.typed(soil.lateral().get().si(), "Pa/m", soil.lateral().get().typed()));
        }
        return tables.lateral(words.presumedClass());
    }

    private Known factor() {
        return soil.safety().map(s -> Known.typed(s, "1", Double.toString(s))).orElseGet(tables::loadFactor);
    }

    /** Density of the soil that counts, kg/m3: less that of water where the water stands high. */
    private Known density() {
        Known dry = soil.density().map(d -> Known.typed(d.si(), "kg/m³", d.typed())).orElseGet(() -> {
            assumed.add(new Assumed("The density of the sand is assumed to be that of loose sand. Confirm it."));
            return tables.size("sand-density");
        });
        return lessWater(dry);
    }

    /** Density that counts, kg/m3. */
    Known lessWater(Known dry) {
        if (!highWater()) {
            return dry;
        }
        Known water = tables.size("water-density");
        return new Known(dry.value() - water.value(), dry.unit(), dry.how() + ", less " + water.text() + " kg/m3 of water: the water stands high",
            dry.place(),
            dry.status().weaker(water.status()));
    }

    boolean highWater() {
        return ground.water().filter("high"::equals).isPresent();
    }

    /** What the ground under a pad can take. */
    Pad.Soil pad() {
        Known bearing = soil.bearing().map(b -> positive("bearing", Known.typed(b.si(), "Pa",
            b.typed()))).orElseGet(() -> tables.vertical(words.presumedClass()));
        if (soil.sliding().isPresent()) {
            return new Pad.Soil(bearing, positive("friction", Known.typed(soil.sliding().get(), "1", Double.toString(soil.sliding().get()))), false);
        }
        String presumed = words.presumedClass();
        boolean friction = tables.hasFriction(presumed);
        return new Pad.Soil(bearing, friction ? tables.friction(presumed) : tables.cohesion(presumed), !friction);
    }

    private static Known positive(String field, Known value) {
        if (!(value.value() > 0)) {
            throw new UnfitAnswer("footing." + field, "must be above zero");
        }
        return value;
    }
}
