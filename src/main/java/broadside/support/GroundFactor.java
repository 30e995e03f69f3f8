package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * Planted post by the ground factor of PD 6547, at the level of strength: the ground turns G b P³/10 about a fulcrum at
 * P/√2 below its surface.
 *
 * <p>Hand calculation, metric: 3 kN and 7.5 kN m at the ground, b = 0.5 m, P = 1.2 m, G = 390 kN/m3: demand 7.5 + 3 x 1.2/1.41421 = 10.0456 kN m;
 * resistance 390 x 0.5 x 1.728/10 = 33.696, /1.25 = 26.957 kN m. US: the same in pounds and feet: G = 390 kN/m3 = 2482.7 lbf/ft3, b = 1.6404 ft,
 * P = 3.9370 ft: 2482.7 x 1.6404 x 61.024/10 = 24 853 lbf ft = 33.696 kN m.
 */
public final class GroundFactor implements DepthRule {

    private final GroundTables tables;
    private final Known ground;
    private final Known divisor;
    private final Known modelFactor;
    private final double factor;
    private final double model;

    /** Takes the ground factor, Pa/m, and records it. */
    public GroundFactor(GroundTables tables, Known ground, Trace trace) {
        this.tables = tables;
        this.ground = ground;
        this.divisor = tables.factorRule("divisor");
        this.modelFactor = tables.factorRule("model-factor");
        this.factor = ground.into(trace.line("ground-factor", "G", "ground factor"));
        this.model = modelFactor.into(trace.line("ground-model-factor", "γ_m", "model factor on the resistance of the ground"));
    }

    @Override
    public String title() {
        return "PD 6547, planted post by the ground factor";
    }

    @Override
    public Status status() {
        return ground.status().weaker(divisor.status());
    }

    @Override
    public String shearSymbol() {
        return "V_d";
    }

    @Override
    public String momentSymbol() {
        return "M_d";
    }

    @Override
    public boolean strength() {
        return true;
    }

    @Override
    public double least(double width) {
        return tables.factorRule("least-ratio").value() * width;
    }

    @Override
    public double needed(Column column, Trace trace) {
        Trace quiet = trace.quiet();
        double root = Root.depth(p -> demand(column, p, quiet) - design(resistance(column, p, quiet), quiet));
        return trace.line("embedment-depth", "d", "embedment needed").from(divisor.place(), status())
            .reads("found by trial, so that the ground resists what is asked of it", root, "m");
    }

    @Override
    public Check check(Column column, double depth, boolean sized, String named, Trace trace) {
        if (!sized) {
            needed(column, trace);
        }
        double demand = demand(column, depth, trace);
        double capacity = design(resistance(column, depth, trace), trace);
        return Check.of("ground resistance", title(), new Check.In("M_q", demand), new Check.In("M_{gr,d}", capacity), "N m", named, status(), trace);
    }

    /** Moment, N m, that the ground can turn at a depth, m, before any factor. */
    double resistance(Column c, double depth, Trace trace) {
        return trace.line("ground-resistance", "M_gr", "moment that the ground resists").in("G", factor, "Pa/m").in("b", c.width(), "m").in("d_f", depth, "m")
            .from(divisor.place(), status()).gives("G b d_f^3 / " + divisor.text(), factor * c.width() * depth * depth * depth / divisor.value(), "N m");
    }

    /** Moment about the fulcrum, N m. */
    double demand(Column c, double depth, Trace trace) {
        return trace.line("ground-demand", "M_q", "moment about the fulcrum in the ground").in("M_d", c.moment(), "N m").in("V_d", c.shear(), "N")
            .in("d_f", depth, "m").from("fulcrum at the depth over √2: PD 6547, planted posts", divisor.status())
            .gives("M_d + V_d d_f / 2^0.5", c.moment() + c.shear() * depth / Math.sqrt(2), "N m");
    }

    private double design(double resistance, Trace trace) {
        return trace.line("ground-resistance-design", "M_{gr,d}", "the same with the model factor").in("M_gr", resistance, "N m").in("γ_m", model)
            .from(modelFactor.place(), modelFactor.status()).gives("M_gr / γ_m", resistance / model, "N m");
    }
}
