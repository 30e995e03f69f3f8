package broadside.job;

import broadside.quantity.Dimension;
import broadside.quantity.Units;
import broadside.support.BromsClay;
import broadside.support.DepthRule;
import broadside.support.GroundTables;
import broadside.support.IbcEmbedment;
import broadside.support.Known;
import broadside.support.Pad;
import broadside.support.UnfitAnswer;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;
import tools.jackson.databind.JsonNode;

/** Published checks of what holds a post in the ground, without a job. */
final class GroundParts {

    private final GroundTables tables;

    GroundParts(TableLibrary tables) {
        this.tables = new GroundTables(tables);
    }

    Trace run(String part, JsonNode given) {
        try {
            return switch (part) {
                case "embedment-ibc" -> embedment(given);
                case "pier-broms-clay" -> pier(given);
                case "broms-clay-capacity" -> capacity(given);
                default -> pad(given);
            };
        } catch (UnfitAnswer e) {
            throw PublishedChecks.bad(e.field() + ": " + e.getMessage());
        }
    }

    /**
     * "force", "height", "width", "lateral-bearing", optional "doubled", "increased", "constrained" (true or false) and "depth": checked at
     * that depth, iterated to its own depth without it.
     */
    private Trace embedment(JsonNode given) {
        Trace trace = new Trace();
        double p = typed(given, "force", Dimension.FORCE, "P", "lateral force", trace);
        double h = typed(given, "height", Dimension.LENGTH, "h", "height of the force above the ground", trace);
        double b = typed(given, "width", Dimension.LENGTH, "b", "width of the footing across the force", trace);
        double lateral = Parts.positive(given, "lateral-bearing", Dimension.PRESSURE_PER_DEPTH, "150 psf/ft");
        double moment = trace.line("ground-moment", "M_g", "moment at the ground").in("P", p, "N").in("h", h, "m").from("statics", Status.DERIVED)
            .gives("P h", p * h, "N m");
        IbcEmbedment.Soil soil = new IbcEmbedment.Soil(Known.typed(lateral, "Pa/m", PublishedChecks.text(given, "lateral-bearing")), flag(given, "doubled"),
            flag(given, "increased"));
        IbcEmbedment rule = new IbcEmbedment(tables, soil, flag(given, "constrained"), trace);
        DepthRule.Column column = new DepthRule.Column(p, moment, b);
        if (given.has("depth")) {
            rule.required(column, typed(given, "depth", Dimension.LENGTH, "d_f", "depth at which it is checked", trace), "d_f", trace);
        } else {
            rule.needed(column, trace);
        }
        return trace;
    }

    /** "force" and "moment" at the ground, "width", "cohesion", optional "load-factor". */
    private Trace pier(JsonNode given) {
        Trace trace = new Trace();
        double v = typed(given, "force", Dimension.FORCE, "V_s", "shear at the ground", trace);
        double m = typed(given, "moment", Dimension.MOMENT, "M_s", "moment at the ground", trace);
        double b = typed(given, "width", Dimension.LENGTH, "b", "width of the pier across the force", trace);
        clay(given, factor(given).orElseGet(tables::loadFactor), trace).needed(new DepthRule.Column(v, m, b), trace);
        return trace;
    }

    /** "height" of the load, "width", "depth" in the ground, "cohesion": ultimate load of a pile, without a factor. */
    private Trace capacity(JsonNode given) {
        Trace trace = new Trace();
        double h = typed(given, "height", Dimension.LENGTH, "h", "height of the load above the ground", trace);
        double b = typed(given, "width", Dimension.LENGTH, "b", "width of the pile across the force", trace);
        double d = typed(given, "depth", Dimension.LENGTH, "d_f", "length in the ground", trace);
        clay(given, Known.typed(1, "1", "none"), trace).capacity(b, d, h, trace);
        return trace;
    }

    private BromsClay clay(JsonNode given, Known factor, Trace trace) {
        double cohesion = Parts.positive(given, "cohesion", Dimension.PRESSURE, "40 kPa");
        return new BromsClay(tables, Known.typed(cohesion, "Pa", PublishedChecks.text(given, "cohesion")), factor, trace);
    }

    /**
     * "vertical", "moment", "length" along the moment, "width" across it ("moment-along": "width" turns that round). With "concrete-density"
     * and "depth" the weight of the pad is added to "vertical"; with "force" and "depth" the moment is that at the ground, and force times depth is
     * added to it.
     */
    private Trace pad(JsonNode given) {
        Trace trace = new Trace();
        String direction = PublishedChecks.text(given, "moment-along");
        if (!direction.isEmpty() && !direction.equals("length") && !direction.equals("width")) {
            throw PublishedChecks.bad("moment-along must be \"length\" or \"width\"");
        }
        boolean turned = direction.equals("width");
        double along = typed(given, turned ? "width" : "length", Dimension.LENGTH, "B", "size of the pad along the moment", trace);
        double across = typed(given, turned ? "length" : "width", Dimension.LENGTH, "L", "size of the pad across the moment", trace);
        double depth = given.has("depth") ? typed(given, "depth", Dimension.LENGTH, "d_f", "depth of the pad", trace) : 0;
        boolean own = given.has("concrete-density");
        boolean atGround = given.has("force");
        if (depth == 0 && (own || atGround)) {
            throw PublishedChecks.bad("concrete-density and force need the depth of the pad");
        }
        Known density = own ? Known.typed(Parts.positive(given, "concrete-density", Dimension.DENSITY, "2400 kg/m3"), "kg/m³",
            PublishedChecks.text(given, "concrete-density"))
            : tables.size("concrete-density");
        Pad pad = new Pad(tables, density);
        double vertical = typed(given, "vertical", Dimension.FORCE, own ? "G_f" : "N", "vertical load", trace);
        Pad.Block block = new Pad.Block(along, across, depth, vertical);
        double n = own ? pad.vertical(block, trace) : vertical;
        double typed = typed(given, "moment", Dimension.MOMENT, atGround ? "M_f" : "M_b", "moment", trace);
        double moment = atGround ? pad.baseMoment(typed(given, "force", Dimension.FORCE, "V_f", "shear at the ground", trace), typed, depth, trace) : typed;
        pad.pressure(n, moment, "M_b", block, trace);
        double resisting = pad.resisting(n, along, trace);
        trace.line("overturning-ratio", "n_o", "resisting moment over the moment at the base, without factors").in("M_R", resisting, "N m")
            .in("M_b", moment, "N m").from("definition", Status.DERIVED).gives("M_R / M_b", resisting / moment, "1");
        return trace;
    }

    private static double typed(JsonNode given, String name, Dimension dimension, String symbol, String meaning, Trace trace) {
        double value = Parts.positive(given, name, dimension, dimension.example(Units.METRIC));
        return trace.given(symbol, meaning, value, dimension.siUnit(), PublishedChecks.text(given, name));
    }

    private static Optional<Known> factor(JsonNode given) {
        JsonNode node = given.path("load-factor");
        if (node.isMissingNode()) {
            return Optional.empty();
        }
        if (!node.isNumber()) {
            throw PublishedChecks.bad("load-factor must be a plain number");
        }
        return Optional.of(Known.typed(node.doubleValue(), "1", node.toString()));
    }

    private static boolean flag(JsonNode given, String name) {
        JsonNode node = given.path(name);
        if (!node.isMissingNode() && !node.isBoolean()) {
            throw PublishedChecks.bad(name + " must be true or false, without quotation marks");
        }
        return node.asBoolean(false);
    }
}
