package broadside.crew;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Trace;
import java.util.List;

/**
 * Wind in which a crane may lift a load: that of its load chart times the root of mass over wind area by what the chart
 * presumes, never above the chart (EN 13000). A sheet is never the standard load of a chart.
 */
public final class CraneWind {

    private static final String PRESUMED = "presumed";
    private static final String RATIO = "k_c";

    private final Rows rows;
    private final Figures figures;

    /**
     * A load.
     *
     * @param mass  with hook and slings, kg
     * @param area  greatest area that the wind can meet, m2
     * @param drag  drag coefficient
     */
    public record Load(double mass, double area, double drag) {

        public Load {
            UnfitFigure.positive("mass", mass, "50 kg");
            UnfitFigure.positive("area", area, "3 m2");
            UnfitFigure.positive("drag-coefficient", drag, "1.2");
        }
    }

    /**
     * What was found.
     *
     * @param speed     gust or mean as the chart means it, m/s
     * @param standard  whether the load has no more wind area on its mass than the chart presumes
     */
    public record Lift(double speed, boolean standard) { }

    CraneWind(Edition crew) {
        this.rows = crew.rows("lifting");
        this.figures = new Figures(rows);
        figures.value(PRESUMED, "value");
        shapes().forEach(this::drag);
    }

    /** Shapes of loads that have a drag coefficient. */
    public List<String> shapes() {
        return rows.keys().stream().filter(k -> !k.equals(PRESUMED)).toList();
    }

    /** Drag coefficient of a shape. */
    public double drag(String shape) {
        if (!shapes().contains(shape)) {
            throw new UnfitFigure("shape", "this shape has no drag coefficient; known are " + String.join(", ", shapes()));
        }
        return figures.value(shape, "value");
    }

    /**
     * Allowed wind of a lift, recorded as "speed"; "speed-by-area" is what the area alone would allow.
     *
     * @param chart  allowed wind of the load chart, m/s
     */
    public Lift lift(Load load, double chart, Trace trace) {
        double tab = trace.given("v_t", "allowed wind of the load chart", UnfitFigure.positive("chart-speed", chart, "9 m/s"), "m/s", "");
        double m = trace.given("m_h", "mass of the load", load.mass(), "kg", "");
        double area = windArea(load, trace);
        double presumed = presumed(trace);
        double factor = figures.line(PRESUMED, "factor", "f_v", "share of the allowed wind by area and mass", trace).in(RATIO, presumed, "m²/t")
            .in("m_h", m, "kg").in("A_w", area, "m²").gives("(" + RATIO + " m_h / (1000 A_w))^0.5", Math.sqrt(presumed * m / (1000 * area)), "1");
        figures.line(PRESUMED, "speed-by-area", "v_a", "allowed wind by area and mass, before the chart", trace).in("v_t", tab, "m/s")
            .in("f_v", factor).gives("v_t f_v", tab * factor, "m/s");
        double speed = figures.line(PRESUMED, "speed", "v_max", "allowed wind of the lift, never above the chart", trace).in("v_t", tab, "m/s")
            .in("f_v", factor).gives("v_t min(1; f_v)", tab * Math.min(1, factor), "m/s");
        return new Lift(speed, factor >= 1);
    }

    /**
     * Allowed wind of a lift that is said to be a standard load: that of the chart.
     *
     * @throws UnfitFigure  for a load with more wind area on its mass than the chart presumes
     */
    public Lift standard(Load load, double chart, Trace trace) {
        Lift lift = lift(load, chart, trace);
        if (!lift.standard()) {
            throw new UnfitFigure("standard", "this is no standard load: " + Figures.plain(load.drag()) + " x " + Figures.plain(load.area())
                + " m2 on " + Figures.plain(load.mass()) + " kg is more than the " + Figures.plain(figures.value(PRESUMED, "value"))
                + " m2 on a tonne that a load chart presumes");
        }
        return lift;
    }

    private double windArea(Load load, Trace trace) {
        double a = trace.given("A_p", "area that the wind meets", load.area(), "m²", "");
        double c = trace.given("c_w", "drag coefficient of the load", load.drag(), "1", "");
        return figures.line(PRESUMED, "wind-area", "A_w", "wind area of the load", trace).in("c_w", c).in("A_p", a, "m²").gives("c_w A_p", c * a, "m²");
    }

    private double presumed(Trace trace) {
        return figures.record(PRESUMED, "value", "presumed-area", RATIO, "wind area on a tonne that the chart presumes", "m²/t", trace);
    }
}
