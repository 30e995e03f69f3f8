package broadside.job;

import broadside.panel.Fixings;
import broadside.quantity.Dimension;
import broadside.quantity.Force;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import broadside.quantity.Reading;
import broadside.quantity.Typed;
import broadside.support.BlockFooting;
import broadside.support.Check;
import broadside.support.EccentricGroup;
import broadside.support.EdgePull;
import broadside.support.FixingGroup;
import broadside.support.FrameBallast;
import broadside.support.StabilityRules;
import broadside.support.Stay;
import broadside.support.UnfitAnswer;
import broadside.table.Edition;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tools.jackson.databind.JsonNode;

/** Published checks of parts that carry an item: fixings, stays, ballast of a frame, pull of an edge, a block in the ground. */
final class BallastParts {

    private final Edition stability;

    BallastParts(Edition stability) {
        this.stability = stability;
    }

    Trace run(String part, JsonNode given) {
        Trace trace = new Trace();
        try {
            switch (part) {
                case "bolt-group" -> boltGroup(given, trace);
                case "facade-fixings" -> facadeFixings(given, trace);
                case "stay" -> Stay.of(stability, force(given, "force", "H_1", "force along the ground", trace), si(given, "angle", Dimension.ANGLE,
                    "45 deg"),
                    Optional.empty(), trace);
                case "frame-ballast" -> frameBallast(given, trace);
                case "edge-pull" -> edgePull(given, trace);
                default -> blockFooting(given, trace);
            }
        } catch (UnfitAnswer e) {
            throw PublishedChecks.bad(e.field() + ": " + e.getMessage());
        }
        return trace;
    }

    private void boltGroup(JsonNode given, Trace trace) {
        List<EccentricGroup.At> bolts = new ArrayList<>();
        for (JsonNode bolt : given.path("bolts")) {
            bolts.add(new EccentricGroup.At(si(bolt, "x", Dimension.LENGTH, "70 mm"), si(bolt, "y", Dimension.LENGTH, "150 mm")));
        }
        if (bolts.isEmpty()) {
            throw PublishedChecks.bad("bolts: a list of places like { \"x\": \"70 mm\", \"y\": \"150 mm\" }");
        }
        Check.In right = given.has("horizontal") ? force(given, "horizontal", "P_x", "load to the right", trace) : nothing("P_x", trace);
        Check.In up = given.has("vertical") ? force(given, "vertical", "P_y", "load upward", trace) : nothing("P_y", trace);
        double ex = trace.given("e_x", "of the upward load, to the right of the centroid", optional(given, "vertical-arm"), "m", "");
        double ey = trace.given("e_y", "of the load to the right, above the centroid", optional(given, "horizontal-arm"), "m", "");
        double moment = trace.line("group-moment", "M_1", "moment about the centroid").in("P_y", up.value(), "N").in("e_x", ex, "m")
            .in("P_x", right.value(), "N")
            .in("e_y", ey, "m").from("statics", Status.DERIVED).gives("P_y e_x - P_x e_y", up.value() * ex - right.value() * ey, "N m");
        EccentricGroup.of(bolts, new EccentricGroup.Load(right, up, new Check.In("M_1", moment)), trace);
    }

    private void facadeFixings(JsonNode given, Trace trace) {
        String sharing = PublishedChecks.text(given, "sharing");
        if (!List.of("equal", "by area").contains(sharing)) {
            throw PublishedChecks.bad("sharing is \"equal\" or \"by area\"");
        }
        Fixings fixings = new Fixings(count(given, "columns"), count(given, "rows"), length(given, "horizontal-pitch"), length(given, "vertical-pitch"),
            allowable(given, "allowable-tension"), allowable(given, "allowable-shear"));
        double suction = trace.given("p_1", "suction", si(given, "suction", Dimension.PRESSURE, "2 kN/m2"), "Pa", PublishedChecks.text(given, "suction"));
        Check.In side = given.has("side-wind") ? force(given, "side-wind", "S_1", "wind on the edge", trace) : nothing("S_1", trace);
        Optional<Mass> mass = given.has("mass") ? Optional.of(Mass.kilograms(si(given, "mass", Dimension.MASS, "80 kg"))) : Optional.empty();
        new FixingGroup(stability).assess(fixings, new FixingGroup.PanelLoad(new Check.In("p_1", suction), si(given, "width", Dimension.LENGTH, "2 m"),
            si(given, "height", Dimension.LENGTH, "2 m"), optional(given, "stand-off"), optional(given, "aside"), mass, side),
            sharing.equals("equal") ? FixingGroup.Sharing.EQUAL : FixingGroup.Sharing.BY_AREA, trace);
    }

    private void frameBallast(JsonNode given, Trace trace) {
        FrameBallast frame = new FrameBallast(stability);
        if (given.has("moment")) {
            frame.ballast(si(given, "moment", Dimension.MOMENT, "25 kN m"), si(given, "leg-spacing", Dimension.LENGTH, "2.5 m"),
                si(given, "permanent", Dimension.FORCE, "4.5 kN"), trace);
        }
        if (given.has("friction")) {
            frame.sliding(number(given, "friction"), si(given, "vertical", Dimension.FORCE, "11.6 kN"), si(given, "horizontal", Dimension.FORCE, "2.5 kN"),
                trace);
        }
    }

    private void edgePull(JsonNode given, Trace trace) {
        double q = trace.given("q_1", "wind pressure", si(given, "pressure", Dimension.PRESSURE, "0.7 kN/m2"), "Pa", PublishedChecks.text(given, "pressure"));
        double c = trace.given("c_1", "coefficient", given.has("coefficient") ? number(given, "coefficient") : 1, "1", "");
        double w = trace.line("pressure", "w_1", "net pressure").in("q_1", q, "Pa").in("c_1", c).from("statics", Status.DERIVED).gives("q_1 c_1", q * c, "Pa");
        EdgePull.of(new Check.In("w_1", w), si(given, "width", Dimension.LENGTH, "3 m"), si(given, "height", Dimension.LENGTH, "3 m"), si(given, "sag",
            Dimension.LENGTH, "0.3 m"), trace);
    }

    private void blockFooting(JsonNode given, Trace trace) {
        double q = trace.given("q_1", "wind pressure", si(given, "pressure", Dimension.PRESSURE, "0.5 kN/m2"), "Pa", PublishedChecks.text(given, "pressure"));
        double c = trace.given("c_1", "coefficient", number(given, "coefficient"), "1", "");
        double b = trace.given("b_1", "width of the panel", si(given, "panel-width", Dimension.LENGTH, "3 m"), "m", "");
        double h = trace.given("h_1", "height of the panel, on the ground", si(given, "panel-height", Dimension.LENGTH, "2 m"), "m", "");
        double f = trace.line("force", "F_1", "force on the panel").in("q_1", q, "Pa").in("c_1", c).in("b_1", b, "m").in("h_1", h, "m")
            .from("statics", Status.DERIVED).gives("q_1 c_1 b_1 h_1", q * c * b * h, "N");
        double z = trace.line("lever-arm", "z_1", "height of the force").in("h_1", h, "m").from("statics", Status.DERIVED).gives("h_1 / 2", h / 2, "m");
        BlockFooting.Block block = new BlockFooting.Block(si(given, "width", Dimension.LENGTH, "0.3 m"), si(given, "length", Dimension.LENGTH, "0.3 m"),
            si(given, "depth", Dimension.LENGTH, "1 m"), si(given, "density", Dimension.DENSITY, "2400 kg/m3"));
        new BlockFooting(stability).overturning(block, new Check.In("F_1", f), new Check.In("z_1", z),
            new StabilityRules(stability).of(PublishedChecks.text(given, "rule")), trace);
    }

    private static Check.In force(JsonNode given, String name, String symbol, String meaning, Trace trace) {
        return new Check.In(symbol, trace.given(symbol, meaning, si(given, name, Dimension.FORCE, "1 kN"), "N", PublishedChecks.text(given, name)));
    }

    private static Check.In nothing(String symbol, Trace trace) {
        return new Check.In(symbol, trace.given(symbol, "none was given", 0, "N", ""));
    }

    private static Optional<Length> length(JsonNode given, String name) {
        return given.has(name) ? Optional.of(Length.metres(si(given, name, Dimension.LENGTH, "0.5 m"))) : Optional.empty();
    }

    private static double optional(JsonNode given, String name) {
        return length(given, name).map(Length::metres).orElse(0.0);
    }

    private static Optional<Force> allowable(JsonNode given, String name) {
        return given.has(name) ? Optional.of(Force.newtons(si(given, name, Dimension.FORCE, "1 kN"))) : Optional.empty();
    }

    private static int count(JsonNode given, String name) {
        JsonNode node = given.path(name);
        if (!node.isInt()) {
            throw PublishedChecks.bad(name + ": a whole number like 2");
        }
        return node.intValue();
    }

    private static double number(JsonNode given, String name) {
        JsonNode node = given.path(name);
        if (!node.isNumber() || !Double.isFinite(node.doubleValue())) {
            throw PublishedChecks.bad(name + ": a plain number");
        }
        return node.doubleValue();
    }

    private static double si(JsonNode given, String name, Dimension dimension, String example) {
        if (Typed.read(PublishedChecks.text(given, name), dimension) instanceof Reading.Value value) {
            return value.si();
        }
        throw PublishedChecks.bad(name + ": a " + dimension.word() + " is typed with its unit, like \"" + example + "\"");
    }
}
