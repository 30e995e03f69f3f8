package broadside.job;

import static broadside.quantity.Dimension.ANGLE;
import static broadside.quantity.Dimension.DENSITY;
import static broadside.quantity.Dimension.FORCE;
import static broadside.quantity.Dimension.LENGTH;
import static broadside.quantity.Dimension.MASS;
import static broadside.quantity.Dimension.MASS_PER_AREA;
import static broadside.quantity.Dimension.PRESSURE;
import static broadside.quantity.Dimension.PRESSURE_PER_DEPTH;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The fields of each kind of item. */
final class KindShapes {

    private static final List<String> YES_NO = List.of("yes", "no");
    private static final List<String> DURATIONS = List.of("short", "instantaneous");

    private static final Shape FOOTING = new Shape("footing", List.of(
        Field.choice("kind", "planted: the post stands in the ground; pier: a shaft of concrete; pad: a block that holds by its weight", List.of("planted", "pier", "pad")),
        Field.choice("shape", "outline in plan", List.of("round", "square", "rectangular")),
        Field.quantity("width", LENGTH, "diameter or width of the post, the concrete or the shaft; of a pad along the wind"),
        Field.quantity("length", LENGTH, "of a pad across the wind"),
        Field.quantity("depth", LENGTH, "depth below the ground; empty to have it sized"),
        Field.text("ground", "ground in words: good, average, poor, or rock, soft rock, gravel, sand, clay"),
        Field.choice("rule", "rule for the depth; empty for the one that fits what is known", List.of("ground-factor", "ibc", "broms-clay", "broms-sand")),
        Field.quantity("lateral-bearing", PRESSURE_PER_DEPTH, "allowable lateral bearing of the soil for each metre of depth"),
        Field.quantity("cohesion", PRESSURE, "undrained shear strength of clay"),
        Field.quantity("friction-angle", ANGLE, "angle of friction of sand"),
        Field.quantity("soil-density", DENSITY, "density of the soil"),
        Field.quantity("bearing", PRESSURE, "allowable pressure on the soil under a pad"),
        Field.number("friction", "friction coefficient under a pad"),
        Field.number("safety-factor", "factor on the loads of an ultimate method"),
        Field.choice("paved", "whether a rigid floor or pavement holds the post at the ground", YES_NO),
        Field.choice("half-inch-motion", "whether 12.7 mm of motion at the ground does no harm, so that lateral bearing counts twice (IBC)", YES_NO),
        Field.choice("third-increase", "whether the increase of a third for wind is counted (IBC, alternate combinations)", YES_NO),
        Field.choice("slope", "whether the ground near the footing slopes", List.of("flat", "sloping", "unknown")),
        Field.choice("water", "ground water: deep below the footing, or high", List.of("deep", "high", "unknown")),
        Field.quantity("frost-depth", LENGTH, "depth to which the ground freezes"),
        Field.choice("services", "whether buried services were located", List.of("located", "not located"))));

    private static final Shape FIXINGS = new Shape("fixings", List.of(
        Field.whole("columns", "columns of fixings"),
        Field.whole("rows", "rows of fixings"),
        Field.quantity("horizontal-pitch", LENGTH, "between columns"),
        Field.quantity("vertical-pitch", LENGTH, "between rows"),
        Field.quantity("allowable-tension", FORCE, "allowable pull on one fixing"),
        Field.quantity("allowable-shear", FORCE, "allowable shear of one fixing")));

    private static final Shape BUILDING = new Shape("building", List.of(
        Field.quantity("width", LENGTH, "of the face that carries the panel").needed(),
        Field.quantity("depth", LENGTH, "at right angles to that face").needed(),
        Field.quantity("height", LENGTH, "from the ground to the top of the wall").needed(),
        Field.quantity("roof-slope", ANGLE, "slope of the roof"),
        Field.choice("enclosure", "how open the walls are", List.of("enclosed", "partially enclosed", "open"))));

    static Map<String, Shape> all() {
        Map<String, Shape> kinds = new LinkedHashMap<>();
        for (Shape shape : List.of(postSign(), hoarding(), bannerFence(), facadePanel(), projectingSign(), spannedBanner())) {
            kinds.put(shape.name(), shape);
        }
        return kinds;
    }

    private static Shape board(String name) {
        return new Shape(name, List.of(
            Field.text("mark", "mark of the board"),
            Field.quantity("width", LENGTH, "across the wind").needed(),
            Field.quantity("height", LENGTH, "of the board itself").needed(),
            Field.quantity("clearance", LENGTH, "gap between the ground and the lower edge").needed(),
            Field.choice("shape", "outline", List.of("rectangle", "disc", "triangle")),
            Field.quantity("offset", LENGTH, "of the board's middle from the middle of the posts, positive to the right"),
            Field.quantity("depth", LENGTH, "thickness of the board or box"),
            Field.number("solidity", "solid area over gross area, 1 for a closed board"),
            Field.quantity("mass", MASS, "mass of the board")));
    }

    private static Shape postSign() {
        return Shapes.item("post-sign", List.of(
            Field.list("boards", board("board"), "boards from the top").needed(),
            Field.whole("faces", "faces that are read: 1 or 2"),
            Field.quantity("opening-angle", ANGLE, "angle between two faces that open in a V; none for parallel faces"),
            Field.object("posts", new Shape("posts", List.of(
                Field.whole("count", "number of posts").needed(),
                Field.quantity("spacing", LENGTH, "distance between posts"),
                Field.text("section", "section of a post, such as CHS 114.3x5; auto to have one chosen and counted in the loads"),
                Field.text("grade", "material grade"),
                Field.text("series", "series that a section is chosen from, such as chs-hot"),
                Field.text("deflection-limit", "limit on the deflection by its name, such as tdb4 or l-80"),
                Field.choice("load-duration", "class of load duration of timber", DURATIONS),
                Field.choice("shape", "outline of a post, where no section is given", List.of("round", "square", "rectangular")),
                Field.quantity("width", LENGTH, "width of a post across the wind, where no section is given"),
                Field.quantity("depth", LENGTH, "depth of a post along the wind"))), "posts"),
            Field.object("footing", FOOTING, "footing"),
            Field.object("replaces", board("replaces"), "the old board on the same post")));
    }

    private static Shape hoarding() {
        return Shapes.item("hoarding", List.of(
            Field.quantity("length", LENGTH, "over all, from end to end").needed(),
            Field.quantity("height", LENGTH, "of the boards themselves").needed(),
            Field.quantity("clearance", LENGTH, "gap below the boards"),
            Field.number("solidity", "solid area over gross area, 1 for closed boards"),
            Field.number("shelter-factor", "shelter by a wall or fence in front that will stay, psi_s (EN)"),
            Field.object("returns", new Shape("returns", List.of(
                Field.quantity("left", LENGTH, "length of the return corner at the left end"),
                Field.quantity("right", LENGTH, "length of the return corner at the right end"))), "return corners at the ends"),
            Field.list("gates", new Shape("gate", List.of(
                Field.quantity("from", LENGTH, "from the left end to the gate").needed(),
                Field.quantity("width", LENGTH, "width of the gate").needed())), "gates"),
            Field.object("posts", new Shape("hoarding-posts", List.of(
                Field.quantity("spacing", LENGTH, "distance between posts").needed(),
                Field.text("section", "section of a post, such as CHS 114.3x5; empty to have one chosen"),
                Field.text("grade", "material grade"),
                Field.text("series", "series that a section is chosen from, such as chs-hot"),
                Field.text("deflection-limit", "limit on the deflection by its name, such as tdb4 or l-80"),
                Field.choice("load-duration", "class of load duration of timber", DURATIONS))), "posts"),
            Field.object("footing", FOOTING, "footing"),
            Field.object("ballast", new Shape("ballast", List.of(
                Field.quantity("mass", MASS, "mass at each brace"),
                Field.quantity("lever", LENGTH, "from the face to the middle of the ballast"),
                Field.quantity("front-mass", MASS, "mass on the foot below the face, at each brace"),
                Field.quantity("face-mass", MASS, "mass of boards, post and brace that go with one brace"),
                Field.text("ground", "surface that it stands on"),
                Field.number("friction", "friction coefficient on that surface"),
                Field.text("friction-reason", "why the friction coefficient may be above 1"))), "ballast on raking braces")));
    }

    private static Shape bannerFence() {
        return Shapes.item("banner-fence", List.of(
            Field.quantity("panel-length", LENGTH, "length of one panel").needed(),
            Field.quantity("panel-height", LENGTH, "height of one panel").needed(),
            Field.whole("panels", "number of panels in the line").needed(),
            Field.number("cover-solidity", "solid area over gross area of the cover, 1 for a closed cover"),
            Field.number("fence-solidity", "the same of the bare fence"),
            Field.number("shelter-factor", "shelter by a wall or fence in front that will stay, psi_s (EN)"),
            Field.quantity("panel-mass", MASS, "mass of one panel with its cover"),
            Field.quantity("foot-mass", MASS, "mass of one foot"),
            Field.quantity("foot-length", LENGTH, "length of a foot across the line"),
            Field.list("blocks", new Shape("block", List.of(
                Field.quantity("mass", MASS, "mass of the block").needed(),
                Field.quantity("lever", LENGTH, "from the line of the fence to the middle of the block").needed())), "blocks for each panel"),
            Field.object("brace", new Shape("brace", List.of(
                Field.quantity("lever", LENGTH, "from the line of the fence to the foot of the brace").needed(),
                Field.quantity("mass", MASS, "mass on the foot of the brace").needed())), "brace of each panel"),
            Field.text("ground", "surface that it stands on"),
            Field.number("friction", "friction coefficient on that surface"),
            Field.text("friction-reason", "why the friction coefficient may be above 1"),
            Field.text("stakes", "stakes, where the ground takes them"),
            Field.quantity("stake-proof-load", FORCE, "pull that each stake was proved to hold on site"),
            Field.whole("stakes-per-panel", "stakes that hold one panel against each direction")));
    }

    private static Shape facadePanel() {
        return Shapes.item("facade-panel", List.of(
            Field.choice("backing", "what is behind it: wall, a solid wall; skin, the panel is the building's skin", List.of("wall", "skin")).needed(),
            Field.quantity("width", LENGTH, "of the panel").needed(),
            Field.quantity("height", LENGTH, "of the panel").needed(),
            Field.quantity("bottom", LENGTH, "of the lower edge above the ground").needed(),
            Field.quantity("distance-from-corner", LENGTH, "from the nearer corner of the building to the panel").needed(),
            Field.object("building", BUILDING, "the building that carries it").needed(),
            Field.quantity("gap", LENGTH, "between the wall and the panel"),
            Field.quantity("mass", MASS, "mass of the panel"),
            Field.quantity("depth", LENGTH, "thickness of the panel"),
            Field.object("fixings", FIXINGS, "fixings in a grid")));
    }

    private static Shape projectingSign() {
        return Shapes.item("projecting-sign", List.of(
            Field.quantity("projection", LENGTH, "from the inner to the outer edge of the board").needed(),
            Field.quantity("height", LENGTH, "of the board").needed(),
            Field.quantity("bottom", LENGTH, "of the lower edge above the ground").needed(),
            Field.quantity("gap", LENGTH, "between the wall and the inner edge"),
            Field.quantity("mass", MASS, "mass of the sign with its brackets"),
            Field.quantity("depth", LENGTH, "thickness of the board"),
            Field.object("brackets", new Shape("brackets", List.of(
                Field.whole("count", "number of brackets, one above the other").needed(),
                Field.quantity("spacing", LENGTH, "distance between brackets"))), "brackets"),
            Field.object("fixings", FIXINGS, "fixings of the brackets")));
    }

    private static Shape spannedBanner() {
        return Shapes.item("spanned-banner", List.of(
            Field.quantity("width", LENGTH, "between its ends").needed(),
            Field.quantity("height", LENGTH, "of the banner").needed(),
            Field.quantity("bottom", LENGTH, "of the lower edge above the ground").needed(),
            Field.quantity("sag", LENGTH, "how far its middle bows out").needed(),
            Field.number("solidity", "solid area over gross area, 1 for a closed banner"),
            Field.quantity("mass-per-area", MASS_PER_AREA, "mass of the fabric for each square metre")));
    }

    private KindShapes() { }
}
