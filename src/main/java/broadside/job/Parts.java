package broadside.job;

import broadside.codes.CodeLibrary;
import broadside.codes.NotCovered;
import broadside.codes.OpenFlowPlates;
import broadside.quantity.Dimension;
import broadside.quantity.Reading;
import broadside.quantity.Speed;
import broadside.quantity.Typed;
import broadside.site.Averaging;
import broadside.site.SpeedConversion;
import broadside.support.Catalogue;
import broadside.support.PostRules;
import broadside.table.OutsideTable;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Trace;
import tools.jackson.databind.JsonNode;

/** Published checks of one part of the calculation, without a job: a speed, a plate in the wind, a footing. */
final class Parts {

    private static final String FASTEST_MILE = "fastest mile";
    private static final String OPEN_FLOW = "open-flow/1";

    private static final String NAMES = "convert-speed, plate-drag, section, tip-mass-frequency, post-bending-asd, post-modulus-needed, post-torsion, embedment-ibc, "
        + "pier-broms-clay, broms-clay-capacity, pad, bolt-group, facade-fixings, stay, frame-ballast, edge-pull, block-footing, "
        + "action-levels, evacuation-class, handling, person-in-wind, published-limit, crane-wind, " + WeatherParts.NAMES;

    private final SpeedConversion conversion;
    private final CodeLibrary codes;
    private final Catalogue catalogue;
    private final GroundParts ground;
    private final PostParts posts;
    private final BallastParts ballast;
    private final CrewParts crew;
    private final WeatherParts weather;

    Parts(SpeedConversion conversion, CodeLibrary codes, Catalogue catalogue, TableLibrary tables) {
        this.conversion = conversion;
        this.codes = codes;
        this.catalogue = catalogue;
        this.ground = new GroundParts(tables);
        this.ballast = new BallastParts(tables.edition("stability/1").orElseThrow());
        this.crew = new CrewParts(tables);
        this.weather = new WeatherParts(tables);
        this.posts = new PostParts(tables.edition(PostRules.EDITION).orElseThrow());
    }

    Trace run(JsonNode given) {
        String part = PublishedChecks.text(given, "part");
        return switch (part) {
            case "convert-speed" -> convertSpeed(given);
            case "plate-drag" -> plateDrag(given);
            case "section" -> SectionParts.section(given, catalogue);
            case "tip-mass-frequency", "post-bending-asd", "post-modulus-needed", "post-torsion" -> posts.run(part, given);
            case "embedment-ibc", "pier-broms-clay", "broms-clay-capacity", "pad" -> ground.run(part, given);
            case "bolt-group", "facade-fixings", "stay", "frame-ballast", "edge-pull", "block-footing" -> ballast.run(part, given);
            case "action-levels", "evacuation-class", "handling", "person-in-wind", "published-limit", "crane-wind" -> crew.run(part, given);
            case "gust-factor", "beaufort", "forecast-gust", "open-wind", "gumbel-fit", "extremes", "return-level", "lifetime-risk" -> weather.run(part, given);
            default -> throw PublishedChecks.bad("the part \"" + StructureReader.clean(part) + "\" is not one that this version checks; it knows " + NAMES);
        };
    }

    /** Force on a flat plate in an even wind at the speed given, without any change with height. */
    private Trace plateDrag(JsonNode given) {
        Trace trace = new Trace();
        double b = length(given, "width", "b", trace);
        double h = length(given, "height", "h", trace);
        double v = positive(given, "speed", Dimension.SPEED, "20 m/s");
        double density = positive(given, "air-density", Dimension.DENSITY, "1.225 kg/m3");
        JsonNode ground = given.path("on-ground");
        if (!ground.isMissingNode() && !ground.isBoolean()) {
            throw PublishedChecks.bad("on-ground must be true or false, without quotation marks");
        }
        JsonNode solid = given.path("solidity");
        double solidity = solid.isMissingNode() ? 1 : solid.isNumber() ? solid.doubleValue() : 0;
        if (!(solidity > 0 && solidity <= 1)) {
            throw PublishedChecks.bad("solidity must be a number above 0 and not above 1");
        }
        trace.given("v", "wind speed", v, "m/s", PublishedChecks.text(given, "speed"));
        trace.given("ρ", "air density", density, "kg/m³", PublishedChecks.text(given, "air-density"));
        OpenFlowPlates.Plate plate = new OpenFlowPlates.Plate(b, h, ground.asBoolean(false), solidity);
        OpenFlowPlates plates = codes.code(OPEN_FLOW).map(c -> new OpenFlowPlates(c.edition())).orElseThrow(() ->
            PublishedChecks.bad("the tables of " + OPEN_FLOW + " are not there"));
        try {
            plates.reynolds(plate, v, density, trace);
            double c = plates.coefficient(plate, "coefficient", trace);
            double q = trace.line("velocity-pressure", "q", "dynamic pressure").in("ρ", density, "kg/m³").in("v", v, "m/s")
                .from("definition of dynamic pressure", Status.DERIVED).gives("½ ρ v²", 0.5 * density * v * v, "Pa");
            trace.line("force", "F", "force on the plate").in("q", q, "Pa").in("C_D", c).in("b", b, "m").in("h", h, "m")
                .from("definition of the drag coefficient", Status.DERIVED).gives("q C_D b h", q * c * b * h, "N");
        } catch (NotCovered e) {
            throw PublishedChecks.bad(e.getMessage());
        }
        return trace;
    }

    private static double length(JsonNode given, String name, String symbol, Trace trace) {
        double value = positive(given, name, Dimension.LENGTH, "2 m");
        return trace.given(symbol, name + " of the plate", value, "m", PublishedChecks.text(given, name));
    }

    static double positive(JsonNode given, String name, Dimension dimension, String example) {
        Reading reading = Typed.read(PublishedChecks.text(given, name), dimension);
        if (!(reading instanceof Reading.Value value) || !(value.si() > 0)) {
            throw PublishedChecks.bad(name + ": a " + dimension.word() + " above zero is typed with its unit, like \"" + example + "\"");
        }
        return value.si();
    }

    private Trace convertSpeed(JsonNode given) {
        Reading reading = Typed.read(PublishedChecks.text(given, "speed"), Dimension.SPEED);
        if (!(reading instanceof Reading.Value value) || !(value.si() > 0)) {
            throw PublishedChecks.bad("speed: a speed above zero is typed with its unit, like \"80 mph\"");
        }
        String terrain = PublishedChecks.text(given, "terrain");
        if (!terrain.isEmpty() && !terrain.equals("open")) {
            throw PublishedChecks.bad("terrain \"" + StructureReader.clean(terrain) + "\": the conversion holds for \"open\" only");
        }
        Speed speed = new Speed(value.si(), value.typed());
        String from = PublishedChecks.text(given, "from");
        Averaging to = averaging(given, "to");
        Trace trace = new Trace();
        try {
            if (from.equals(FASTEST_MILE)) {
                conversion.convertFastestMile(speed, to, trace);
            } else {
                conversion.convert(speed, averaging(given, "from"), to, trace);
            }
        } catch (OutsideTable e) {
            throw PublishedChecks.bad(e.getMessage());
        }
        return trace;
    }

    private static Averaging averaging(JsonNode given, String name) {
        String words = PublishedChecks.text(given, name);
        return Averaging.of(words).orElseThrow(() -> PublishedChecks.bad(name + " \"" + StructureReader.clean(words) + "\" is none of "
            + FASTEST_MILE + ", " + String.join(", ", Averaging.allWords())));
    }
}
