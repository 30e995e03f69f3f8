package broadside.job;

import broadside.assess.Problem;
import broadside.codes.WindCode;
import broadside.panel.Board;
import broadside.panel.Footing;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSection;
import broadside.panel.PostSign;
import broadside.panel.PostType;
import broadside.panel.Posts;
import broadside.quantity.Angle;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import broadside.quantity.Quantity;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Reads one item and checks what a person may have typed wrongly: sizes, ends, gates. */
final class ItemReader {

    /** A size that was not typed. */
    private static final Length ZERO = new Length(0, "");
    private static final double LONGEST = 2000;
    private static final String SHELTER = "shelter-factor";
    private static final double LEAST_SHELTER = 0.3;

    private final List<Problem> problems;
    private final Optional<WindCode> code;
    private final SupportReader supports;

    /** Reads items that are to be worked out by a code, where the code is known. */
    ItemReader(List<Problem> problems, Optional<WindCode> code) {
        this.problems = problems;
        this.code = code;
        this.supports = new SupportReader(this, problems);
    }

    /** The item, or nothing when something needed is missing; what does not fit is noted. */
    Optional<Item> read(Values values) {
        KindReader others = new KindReader(this, supports, problems);
        return values.text("kind").flatMap(kind -> switch (kind) {
            case "hoarding" -> hoarding(values);
            case "banner-fence" -> others.bannerFence(values);
            case "facade-panel" -> others.facadePanel(values);
            case "projecting-sign" -> others.projectingSign(values);
            case "spanned-banner" -> others.spannedBanner(values);
            default -> sign(values);
        });
    }

    private Optional<Item> sign(Values values) {
        List<Board> boards = values.list("boards").stream().flatMap(b -> board(b).stream()).toList();
        Optional<Board> replaces = values.object("replaces").flatMap(this::board);
        double opening = values.quantity("opening-angle", Angle.class).map(Angle::radians).orElse(0.0);
        if (opening < 0 || opening > Math.PI) {
            problem(values, "opening-angle", "must lie between 0 and 180 degrees");
        }
        int faces = values.whole("faces").orElse(1);
        if (faces != 1 && faces != 2) {
            problem(values, "faces", "must be 1 or 2");
        }
        if (values.list("boards").size() > 20) {
            problem(values, "boards", "has " + values.list("boards").size() + " entries; a sign has at most 20 boards");
        }
        Optional<Posts> posts = values.object("posts").map(this::posts).orElse(Optional.of(new Posts(1, Optional.empty(), Optional.empty())));
        Optional<Footing> footing = supports.footing(values);
        if (boards.isEmpty() || boards.size() != values.list("boards").size() || posts.isEmpty() || values.text("mark").isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new PostSign(values.text("mark").get(), boards, new PostSign.Faces(faces, opening), posts.get(), footing, replaces,
            carrying(values)));
    }

    private Optional<Board> board(Values values) {
        Optional<Length> width = size(values, "width");
        Optional<Length> height = size(values, "height");
        Optional<Length> clearance = notBelow(values, "clearance", "the lower edge would lie below the ground");
        Optional<Length> depth = notBelow(values, "depth", "a thickness is not below zero");
        Optional<Length> offset = values.quantity("offset", Length.class);
        offset.filter(o -> Math.abs(o.metres()) > 50).ifPresent(o -> problem(values, "offset", "must lie within 50 m of the posts"));
        Optional<Mass> mass = values.quantity("mass", Mass.class);
        mass.filter(m -> m.kilograms() < 0).ifPresent(m -> problem(values, "mass", "must not be below zero"));
        double solidity = solidity(values);
        if (width.isEmpty() || height.isEmpty() || clearance.isEmpty()) {
            return Optional.empty();
        }
        Board.Shape shape = Board.Shape.valueOf(values.text("shape").orElse("rectangle").toUpperCase(Locale.ROOT));
        if (shape == Board.Shape.DISC && Math.abs(width.get().metres() - height.get().metres()) > 1e-6) {
            problem(values, "height", "must be " + width.get().typed() + " like the width, as the board is a disc");
        }
        return Optional.of(new Board(values.text("mark").orElse(""), shape, width.get(), height.get(), clearance.get(), offset.orElse(ZERO),
            depth.orElse(ZERO), solidity, mass));
    }

    private Optional<Posts> posts(Values values) {
        int count = values.whole("count").orElse(0);
        Optional<Length> spacing = size(values, "spacing");
        if (values.whole("count").isPresent() && (count < 1 || count > 20)) {
            problem(values, "count", "must lie between 1 and 20");
        }
        if (count > 1 && spacing.isEmpty()) {
            problem(values, "spacing", "is missing: two or more posts need the distance between them, like \"2 m\" or \"6 ft\"");
        }
        return count < 1 ? Optional.empty() : Optional.of(new Posts(count, spacing, section(values), SupportReader.posts(values)));
    }

    /** Outer sizes of a post: from its designation, or as typed. */
    private Optional<PostSection> section(Values values) {
        Optional<PostSection> named = values.text("section").flatMap(PostSection::of);
        Optional<Length> width = size(values, "width");
        Optional<Length> depth = size(values, "depth");
        if (values.text("shape").isPresent() && width.isEmpty()) {
            problem(values, "width", "is missing: the outline of a post needs its width, like \"114 mm\" or \"4 in\"");
        }
        if (named.isPresent() && width.isPresent()) {
            problem(values, "width", "stands beside a section that tells it; give one of the two");
        }
        boolean round = values.text("shape").filter("round"::equals).isPresent();
        return named.or(() -> width.map(w -> new PostSection(round ? PostSection.Shape.ROUND : PostSection.Shape.RECTANGULAR, w.metres(),
            round ? w.metres() : depth.orElse(w).metres())));
    }

    private Optional<Item> hoarding(Values values) {
        Optional<Length> length = size(values, "length");
        Optional<Length> height = size(values, "height");
        Length clearance = notBelow(values, "clearance", "the lower edge would lie below the ground").orElse(ZERO);
        double solidity = solidity(values);
        Optional<Values> returns = values.object("returns");
        Length left = returns.flatMap(r -> returnLength(r, "left", length)).orElse(ZERO);
        Length right = returns.flatMap(r -> returnLength(r, "right", length)).orElse(ZERO);
        List<Hoarding.Gate> gates = gates(values, length);
        Optional<Length> spacing = values.object("posts").flatMap(p -> size(p, "spacing"));
        if (length.isPresent() && spacing.filter(s -> s.metres() >= 0.005).isPresent() && length.get().metres() / spacing.get().metres() > 1000) {
            problem(values.object("posts").orElseThrow(), "spacing", "gives more than 1000 posts; check its unit");
        }
        if (length.isEmpty() || height.isEmpty() || values.text("mark").isEmpty()) {
            return Optional.empty();
        }
        Hoarding hoarding = new Hoarding(values.text("mark").get(), length.get(), height.get(), clearance, solidity, left, right, shelter(values), gates,
            spacing, new Hoarding.Held(values.object("posts").map(SupportReader::posts).orElse(PostType.NONE), supports.footing(values), supports.kentledge(values)),
            carrying(values));
        if (hoarding.panels().isEmpty()) {
            problem(values, gates.isEmpty() ? "length" : "gates", "leaves no hoarding to assess");
            return Optional.empty();
        }
        return Optional.of(hoarding);
    }

    private Optional<Length> returnLength(Values values, String end, Optional<Length> length) {
        Optional<Length> found = notBelow(values, end, "a return is not shorter than nothing");
        found.filter(r -> length.isPresent() && r.metres() > length.get().metres()).ifPresent(r ->
            problem(values, end, "a return of " + r.typed() + " is longer than the hoarding of " + length.orElseThrow().typed()));
        return found;
    }

    private List<Hoarding.Gate> gates(Values values, Optional<Length> length) {
        List<Hoarding.Gate> gates = new ArrayList<>();
        for (Values each : values.list("gates")) {
            Optional<Length> from = notBelow(each, "from", "a gate does not begin before the left end");
            Optional<Length> width = size(each, "width");
            if (from.isPresent() && width.isPresent()) {
                Hoarding.Gate gate = new Hoarding.Gate(from.get(), width.get());
                if (length.isPresent() && gate.end() > length.get().metres() + 1e-9) {
                    problem(each, "from", "the gate from " + from.get().typed() + ", " + width.get().typed() + " wide, ends beyond the hoarding of "
                        + length.get().typed());
                }
                gates.add(gate);
            }
        }
        gates.sort(Comparator.comparing(Hoarding.Gate::from));
        for (int i = 0; i < gates.size(); i++) {
            if (i > 0 && gates.get(i).from().metres() < gates.get(i - 1).end() - 1e-9) {
                problem(values, "gates", "two gates overlap at " + gates.get(i).from().typed());
            }
        }
        return gates;
    }

    Optional<Length> size(Values values, String name) {
        Optional<Length> found = values.quantity(name, Length.class);
        found.filter(l -> !(l.metres() >= 0.005 && l.metres() <= LONGEST)).ifPresent(l ->
            problem(values, name, "must lie between 5 mm and 2000 m; \"" + l.typed() + "\" does not"));
        return found;
    }

    Optional<Length> notBelow(Values values, String name, String why) {
        Optional<Length> found = values.quantity(name, Length.class);
        found.filter(l -> l.metres() < 0).ifPresent(l -> problem(values, name, "\"" + l.typed() + "\" is below zero: " + why));
        found.filter(l -> l.metres() > LONGEST).ifPresent(l -> problem(values, name, "must not be above 2000 m"));
        return found;
    }

    double solidity(Values values) {
        return solidity(values, "solidity");
    }

    double solidity(Values values, String name) {
        double solidity = values.number(name).orElse(1.0);
        if (!(solidity > 0 && solidity <= 1)) {
            problem(values, name, "must be above 0 and not above 1, 1 for a closed panel");
        }
        return solidity;
    }

    /** The factor for a wall or fence in front, 1 where none is typed; only some codes have a rule for it. */
    double shelter(Values values) {
        Optional<Double> typed = values.number(SHELTER);
        typed.filter(s -> !(s >= LEAST_SHELTER && s <= 1)).ifPresent(s -> problem(values, SHELTER, "must lie between " + LEAST_SHELTER + " and 1, 1 for no shelter"));
        code.filter(c -> typed.isPresent() && !c.terms().options().contains(SHELTER)).ifPresent(c ->
            problem(values, SHELTER, "is not a value of " + c.edition().property("title") + ": it has no rule for shelter by a wall in front"));
        return typed.orElse(1.0);
    }

    /** What carries the item, kept as typed. */
    static List<Item.Carrying> carrying(Values values) {
        List<Item.Carrying> found = new ArrayList<>();
        for (String part : List.of("posts", "footing", "ballast", "brace", "fixings")) {
            values.object(part).ifPresent(v -> {
                for (String name : List.of("section", "grade", "kind", "shape", "ground")) {
                    v.text(name).ifPresent(text -> found.add(new Item.Carrying(part + " " + name, text)));
                }
                for (String name : List.of("columns", "rows")) {
                    v.whole(name).ifPresent(n -> found.add(new Item.Carrying(part + " " + name, n.toString())));
                }
                for (String name : List.of("width", "length", "depth", "lever", "mass", "horizontal-pitch", "vertical-pitch", "allowable-tension", "allowable-shear")) {
                    v.quantity(name, Quantity.class).ifPresent(q -> found.add(new Item.Carrying(part + " " + name, q.typed())));
                }
            });
        }
        for (Values block : values.list("blocks")) {
            found.add(new Item.Carrying("block", Stream.of("mass", "lever").flatMap(n -> block.quantity(n, Quantity.class).stream()).map(Quantity::typed)
                .collect(Collectors.joining(" at "))));
        }
        for (String name : List.of("panel-mass", "foot-mass", "foot-length", "mass-per-area")) {
            values.quantity(name, Quantity.class).ifPresent(q -> found.add(new Item.Carrying(name.replace('-', ' '), q.typed())));
        }
        for (String name : List.of("ground", "stakes")) {
            values.text(name).ifPresent(t -> found.add(new Item.Carrying(name, t)));
        }
        return found;
    }

    private void problem(Values values, String name, String text) {
        problems.add(new Problem(values.at(name), text));
    }
}
