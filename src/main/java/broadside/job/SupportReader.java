package broadside.job;

import broadside.assess.Problem;
import broadside.panel.FenceFeet;
import broadside.panel.Fixings;
import broadside.panel.Footing;
import broadside.panel.Kentledge;
import broadside.panel.PostType;
import broadside.quantity.Angle;
import broadside.quantity.Density;
import broadside.quantity.Force;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import broadside.quantity.Measure;
import broadside.quantity.Pressure;
import broadside.quantity.Quantity;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Reads what carries an item and checks what a person may have typed wrongly. */
final class SupportReader {

    private static final double MOST_SAFETY = 10;

    private final ItemReader sizes;
    private final List<Problem> problems;

    SupportReader(ItemReader sizes, List<Problem> problems) {
        this.sizes = sizes;
        this.problems = problems;
    }

    /** What the posts are made of. */
    static PostType posts(Values values) {
        return new PostType(values.text("section"), values.text("series"), values.text("grade"), values.text("deflection-limit"), values.text("load-duration"));
    }

    /** The footing of an item, where something was typed. */
    Optional<Footing> footing(Values item) {
        return item.object("footing").map(values -> {
            Footing.Kind kind = Footing.Kind.valueOf(values.text("kind").orElse("planted").toUpperCase(Locale.ROOT));
            Footing.Soil soil = new Footing.Soil(values.text("ground"), values.text("rule"), above(values, "lateral-bearing", Measure.class), above(values, "cohesion", Pressure.class),
                above(values, "friction-angle", Angle.class), above(values, "soil-density", Density.class), above(values, "bearing", Pressure.class), friction(values),
                safety(values));
            Footing.Ground ground = new Footing.Ground(yes(values, "paved"), yes(values, "half-inch-motion"), yes(values, "third-increase"), values.text("slope"),
                values.text("water"), sizes.notBelow(values, "frost-depth", "frost goes down from the ground"), values.text("services"));
            boolean round = values.text("shape").map("round"::equals).orElse(kind != Footing.Kind.PAD);
            return new Footing(kind, round, sizes.size(values, "width"), sizes.size(values, "length"), sizes.size(values, "depth"), soil, ground);
        });
    }

    private Optional<Double> safety(Values values) {
        Optional<Double> factor = values.number("safety-factor");
        factor.filter(f -> !(f >= 1 && f <= MOST_SAFETY)).ifPresent(f -> problem(values, "safety-factor", "must lie between 1 and 10"));
        return factor;
    }

    /** A friction coefficient; above 1 only with a reason. */
    private Optional<Double> friction(Values values) {
        Optional<Double> mu = values.number("friction");
        mu.filter(m -> !(m > 0)).ifPresent(m -> problem(values, "friction", "must be above 0, like 0.3"));
        mu.filter(m -> m > 1 && values.text("friction-reason").isEmpty()).ifPresent(m -> problem(values, "friction", "is above 1, which is rare: "
            + (values.path().endsWith("footing") ? "at most 1 fits here" : "say beside it why it may be above 1 (friction-reason), or give a value up to 1")));
        return mu;
    }

    private FenceFeet.Surface surface(Values values) {
        return new FenceFeet.Surface(values.text("ground"), friction(values), values.text("friction-reason"));
    }

    /** Ballast of a hoarding. */
    Optional<Kentledge> kentledge(Values item) {
        return item.object("ballast").map(values -> new Kentledge(above(values, "mass", Mass.class), near(values, "lever", 20), mass(values, "front-mass"),
            mass(values, "face-mass"), surface(values)));
    }

    /** What holds each panel of a fence. */
    FenceFeet feet(Values item) {
        List<FenceFeet.Block> blocks = item.list("blocks").stream().flatMap(b -> mass(b, "mass").flatMap(m -> lever(b).map(l -> new FenceFeet.Block(m, l))).stream()).toList();
        Optional<FenceFeet.Brace> brace = item.object("brace").flatMap(b -> mass(b, "mass").flatMap(m -> near(b, "lever", 20).map(l -> new FenceFeet.Brace(l, m))));
        Optional<Integer> stakes = item.whole("stakes-per-panel");
        stakes.filter(n -> n < 1 || n > 20).ifPresent(n -> problem(item, "stakes-per-panel", "must lie between 1 and 20"));
        return new FenceFeet(mass(item, "panel-mass"), mass(item, "foot-mass"), near(item, "foot-length", 5), blocks, brace, surface(item),
            new FenceFeet.Stakes(item.text("stakes"), above(item, "stake-proof-load", Force.class), stakes));
    }

    /** A length of a few metres at most: more is a slip of a unit. */
    private Optional<Length> near(Values values, String name, int most) {
        Optional<Length> found = sizes.size(values, name);
        found.filter(l -> l.metres() > most).ifPresent(l -> problem(values, name, "must not be above " + most + " m; \"" + l.typed() + "\" is. Millimetres are typed like \"650 mm\""));
        return found;
    }

    /** A block may lie on either side of the fence. */
    private Optional<Length> lever(Values block) {
        Optional<Length> found = block.quantity("lever", Length.class);
        found.filter(l -> Math.abs(l.metres()) > 20).ifPresent(l -> problem(block, "lever", "must lie within 20 m of the fence"));
        return found;
    }

    /** A grid of fixings. */
    Optional<Fixings> fixings(Values item) {
        return item.object("fixings").flatMap(values -> {
            int columns = count(values, "columns");
            int rows = count(values, "rows");
            Optional<Length> across = pitch(values, "horizontal-pitch", columns, "columns");
            Optional<Length> up = pitch(values, "vertical-pitch", rows, "rows");
            Optional<Force> tension = above(values, "allowable-tension", Force.class);
            Optional<Force> shear = above(values, "allowable-shear", Force.class);
            return columns < 1 || rows < 1 ? Optional.empty() : Optional.of(new Fixings(columns, rows, across, up, tension, shear));
        });
    }

    private int count(Values values, String name) {
        Optional<Integer> found = values.whole(name);
        if (found.isEmpty() && absent(values, name)) {
            problem(values, name, "is missing: a grid of fixings has columns and rows, like 2 and 3");
        }
        found.filter(n -> n < 1 || n > 100).ifPresent(n -> problem(values, name, "must lie between 1 and 100"));
        return found.filter(n -> n <= 100).orElse(0);
    }

    private Optional<Length> pitch(Values values, String name, int count, String of) {
        Optional<Length> found = sizes.size(values, name);
        if (count > 1 && found.isEmpty() && absent(values, name)) {
            problem(values, name, "is missing: two or more " + of + " of fixings need the distance between them, like \"600 mm\"");
        }
        return found;
    }

    private Optional<Mass> mass(Values values, String name) {
        Optional<Mass> mass = values.quantity(name, Mass.class);
        mass.filter(m -> m.kilograms() < 0).ifPresent(m -> problem(values, name, "must not be below zero"));
        return mass;
    }

    private <Q extends Quantity> Optional<Q> above(Values values, String name, Class<Q> kind) {
        Optional<Q> found = values.quantity(name, kind);
        found.filter(q -> !(q.si() > 0)).ifPresent(q -> problem(values, name, "must be above zero; \"" + q.typed() + "\" is not"));
        return found;
    }

    /** Whether nothing was typed, rather than something that was refused. */
    private boolean absent(Values values, String name) {
        return problems.stream().noneMatch(p -> p.path().equals(values.at(name)));
    }

    private static boolean yes(Values values, String name) {
        return values.text(name).filter("yes"::equals).isPresent();
    }

    private void problem(Values values, String name, String text) {
        problems.add(new Problem(values.at(name), text));
    }
}
