package broadside.crew;

import broadside.quantity.Speed;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/**
 * Published classes of structures that are cleared before a limiting wind, or never, with the wind for which they are
 * designed. The limit and the design pressure are one pair: those of two rules are never mixed.
 */
public final class EvacuationClasses {

    private static final String STATICS = "definition of dynamic pressure";

    private final Rows rows;
    private final Figures figures;

    /**
     * One class.
     *
     * @param limit      wind before which it is cleared; absent where it never is
     * @param often      how often that happens
     * @param remark     what must be known with the limit; empty for nothing
     * @param byFifty    whether its pressure is that of the 50-year wind
     * @param share      of that pressure
     * @param factor     on the wind
     */
    public record EvacuationClass(String key, String title, Optional<Speed> limit, String often, String remark, boolean byFifty, double share, double factor,
                                  String place, Status status) { }

    /**
     * What a class asks for.
     *
     * @param peak    pressure before the factor, Pa
     * @param design  pressure with the factor, Pa
     * @param gust    gust whose pressure is the design pressure, m/s
     */
    public record Design(EvacuationClass of, double peak, double design, double gust) { }

    EvacuationClasses(Edition crew) {
        this.rows = crew.rows("evacuation-classes");
        this.figures = new Figures(rows);
        all();
    }

    public List<EvacuationClass> all() {
        return rows.keys().stream().map(this::read).toList();
    }

    private EvacuationClass read(String key) {
        Optional<Speed> limit = figures.speed(key, "limit");
        return new EvacuationClass(key, rows.text(key, "title"), limit, rows.text(key, "often"),
            rows.isPrinted(key, "remark") ? rows.text(key, "remark") : "", limit.isEmpty() && !rows.isPrinted(key, "pressure"),
            figures.value(key, "share"), figures.value(key, "factor"), figures.place(key), figures.source(key).status());
    }

    /**
     * Pressure for which a structure of a class is designed, recorded as "design-pressure"; before the factor as "peak-pressure".
     *
     * @param fifty    peak pressure of the 50-year wind, Pa: needed by classes that are never cleared, refused by the others
     * @param density  of the air, kg/m3
     * @throws UnfitFigure  for an unknown class, a pressure that is missing or out of place, a density that is none
     */
    public Design design(String key, Optional<Double> fifty, double density, Trace trace) {
        if (!rows.has(key)) {
            throw new UnfitFigure("class", "this class is not known; known are " + String.join(", ", rows.keys()));
        }
        EvacuationClass of = read(key);
        if (of.byFifty() != fifty.isPresent()) {
            throw new UnfitFigure("pressure", of.byFifty() ? "this class is never cleared: it is designed for the pressure of the 50-year wind, which is needed"
                : "this class has its own limiting wind: limit and pressure are one pair, and no other pressure goes with it");
        }
        double rho = trace.given("ρ", "air density", UnfitFigure.positive("air-density", density, "1.25 kg/m3"), "kg/m³", "");
        double before = pressure(of, fifty, rho, trace);
        double share = figures.record(key, "share", "pressure-share", "k_q", "share of the pressure, already squared where it is the season", "1", trace);
        double peak = figures.line(key, "peak-pressure", "q_p", "peak pressure of the class", trace).in("q_{p0}", before, "Pa").in("k_q", share)
            .gives("q_{p0} k_q", before * share, "Pa");
        double factor = figures.record(key, "factor", "wind-factor", "γ_w", "factor on the wind", "1", trace);
        double design = figures.line(key, "design-pressure", "q_d", "pressure with the factor", trace).in("q_p", peak, "Pa").in("γ_w", factor)
            .gives("q_p γ_w", peak * factor, "Pa");
        double gust = trace.line("design-gust", "v_d", "gust with that pressure").in("q_d", design, "Pa").in("ρ", rho, "kg/m³").from(STATICS, Status.DERIVED)
            .gives("(2 q_d / ρ)^0.5", Math.sqrt(2 * design / rho), "m/s");
        return new Design(of, peak, design, gust);
    }

    private double pressure(EvacuationClass of, Optional<Double> fifty, double rho, Trace trace) {
        if (fifty.isPresent()) {
            return trace.given("q_{p0}", "peak pressure of the 50-year wind", UnfitFigure.positive("pressure", fifty.get(), "800 Pa"), "Pa", "");
        }
        double v = figures.line(of.key(), "evacuation-speed", "v_e", "wind before which it is cleared (" + of.often() + ")", trace)
            .reads("printed as " + of.limit().orElseThrow().typed(), of.limit().get().metresPerSecond(), "m/s");
        double own = trace.line("evacuation-pressure", "q_e", "pressure of that wind").in("ρ", rho, "kg/m³").in("v_e", v, "m/s").from(STATICS, Status.DERIVED)
            .gives("½ ρ v_e²", 0.5 * rho * v * v, "Pa");
        if (rows.isPrinted(of.key(), "pressure")) {
            return figures.line(of.key(), "base-pressure", "q_{p0}", "printed pressure that goes with that wind", trace)
                .reads("read at " + of.key(), 1000 * figures.value(of.key(), "pressure"), "Pa");
        }
        return figures.line(of.key(), "base-pressure", "q_{p0}", "pressure of the class", trace).in("q_e", own, "Pa").gives("q_e", own, "Pa");
    }
}
