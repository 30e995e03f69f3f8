package broadside.crew;

import broadside.table.Edition;
import broadside.table.Rows;
import broadside.trace.Trace;
import java.util.Optional;

/** The Beaufort scale: force and effects of a mean wind. */
public final class WindScale {

    private final Rows rows;
    private final Figures figures;

    /**
     * One force; speeds in m/s.
     *
     * @param to      absent for the last
     * @param effect  empty where none is at hand
     */
    public record Force(int number, String name, double from, Optional<Double> to, String effect) { }

    WindScale(Edition crew) {
        this.rows = crew.rows("wind-scale");
        this.figures = new Figures(rows);
        rows.keys().forEach(this::read);
    }

    private Force read(String key) {
        return new Force(Integer.parseInt(key), rows.text(key, "name"), figures.value(key, "from"),
            rows.isPrinted(key, "to") ? Optional.of(figures.value(key, "to")) : Optional.empty(),
            rows.isPrinted(key, "effect") ? rows.text(key, "effect") : "");
    }

    /** Force of a mean wind over 10 minutes at 10 m (m/s), recorded as "beaufort", with its printed bounds as "beaufort-from" and "beaufort-to". */
    public Force of(double mean, Trace trace) {
        if (!(mean >= 0) || Double.isInfinite(mean)) {
            throw new UnfitFigure("mean", "a wind speed of 0 or more is needed");
        }
        double v = trace.given("v_m", "mean wind at 10 m", mean, "m/s", "");
        String key = rows.keys().stream().filter(k -> figures.value(k, "from") <= v).reduce((a, b) -> b).orElseThrow();
        Force force = read(key);
        figures.line(key, "beaufort", "B", "force of the Beaufort scale, " + force.name(), trace).in("v_m", v, "m/s")
            .reads("the last force whose printed start the mean wind reaches", force.number(), "1");
        figures.record(key, "from", "beaufort-from", "v_1", "printed start of that force", "m/s", trace);
        if (force.to().isPresent()) {
            figures.record(key, "to", "beaufort-to", "v_2", "printed end of that force", "m/s", trace);
        }
        return force;
    }
}
