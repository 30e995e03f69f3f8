package broadside.crew;

import broadside.quantity.Speed;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.Optional;

/** What the wind does to a person who stands in it, with empty hands. */
public final class PersonInWind {

    private final Rows comfort;
    private final Figures bounds;
    private final Figures own;

    /** Effect of a mean wind from {@code from} on, by a published bound. */
    public record Comfort(String key, String effect, Speed from, String place, Status status) { }

    PersonInWind(Edition crew) {
        this.comfort = crew.rows("comfort");
        this.bounds = new Figures(comfort);
        this.own = new Figures(crew.rows("handling"));
        comfort.keys().forEach(this::read);
    }

    /** The strongest published effect that a mean wind (m/s) reaches, recorded as "comfort-bound"; absent below the first. Gusts lower the bounds. */
    public Optional<Comfort> comfort(double mean, Trace trace) {
        double v = trace.given("v_m", "mean wind", UnfitFigure.positive("mean", mean, "8 m/s"), "m/s", "");
        Optional<Comfort> reached = comfort.keys().stream().map(this::read).filter(c -> c.from().metresPerSecond() <= v).reduce((a, b) -> b);
        reached.ifPresent(c -> bounds.line(c.key(), "comfort-bound", "v_c", c.effect() + ", mean wind from which this holds", trace).in("v_m", v, "m/s")
            .reads("the last bound that the mean wind reaches", c.from().metresPerSecond(), "m/s"));
        return reached;
    }

    private Comfort read(String key) {
        return new Comfort(key, comfort.text(key, "effect"), bounds.speed(key, "speed").orElseThrow(), bounds.place(key), bounds.source(key).status());
    }

    /** Force of the wind on a standing adult, N, recorded as "person-force"; gust in m/s. */
    public double force(double gust, Trace trace) {
        double v = trace.given("v", "gust", UnfitFigure.positive("speed", gust, "15 m/s"), "m/s", "");
        double rho = air(trace);
        double area = area(trace);
        return own.line("drag-area", "person-force", "F_p", "force of the wind on a person", trace).in("ρ", rho, "kg/m³").in("v", v, "m/s")
            .in("A_d", area, "m²").gives("½ ρ v² A_d", 0.5 * rho * v * v * area, "N");
    }

    /** Gust in which a person of a mass (kg) begins to slide, m/s, recorded as "sliding-speed". */
    public double slidingSpeed(double mass, Trace trace) {
        double m = trace.given("m", "mass of the person", UnfitFigure.positive("mass", mass, "70 kg"), "kg", "");
        double rho = air(trace);
        double area = area(trace);
        double mu = own.record("foot-friction", "value", "foot-friction", "μ_p", "friction of the feet", "1", trace);
        double fall = own.record("gravity", "value", "free-fall", "g_n", "acceleration of free fall", "m/s²", trace);
        return own.line("foot-friction", "sliding-speed", "v_s", "gust in which the person begins to slide", trace).in("μ_p", mu)
            .in("m", m, "kg").in("g_n", fall, "m/s²").in("ρ", rho, "kg/m³").in("A_d", area, "m²")
            .gives("(2 μ_p m g_n / (ρ A_d))^0.5", Math.sqrt(2 * mu * m * fall / (rho * area)), "m/s");
    }

    private double air(Trace trace) {
        return own.record("air-density", "value", "air-density", "ρ", "air density", "kg/m³", trace);
    }

    private double area(Trace trace) {
        return own.record("drag-area", "value", "drag-area", "A_d", "drag coefficient times area of a person", "m²", trace);
    }
}
