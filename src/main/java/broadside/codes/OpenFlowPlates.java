package broadside.codes;

import broadside.aero.PlateDrag;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/** Drag coefficient of a flat plate square to the wind by the ratio of its sides, and of a screen of the same outline. */
public final class OpenFlowPlates {

    private final Constants constants;
    private final Curve plates;
    private final OpenFlowScreens screens;

    public OpenFlowPlates(Edition edition) {
        this.constants = new Constants(edition);
        this.plates = edition.curve("plate-drag");
        this.screens = new OpenFlowScreens(edition);
    }

    /** A plate: sides in metres, whether it stands on the ground, and solid over gross area. */
    public record Plate(double width, double height, boolean onGround, double solidity) { }

    /**
     * Reynolds number on the smaller side; speed in m/s, density in kg/m3.
     *
     * @throws NotCovered where the coefficient has not levelled off
     */
    public double reynolds(Plate plate, double speed, double density, Trace trace) {
        Source air = constants.source("kinematic-viscosity");
        double nu = constants.number("kinematic-viscosity");
        double known = constants.number("viscosity-density");
        double viscosity = trace.line("kinematic-viscosity", "ν", "kinematic viscosity of the air").in("ρ", density, "kg/m³").from(air.citation(), air.status())
            .gives(Numbers.plain(nu) + " (" + Numbers.plain(known) + " / ρ) / 100000", nu * (known / density) / 100_000, "m²/s");
        Source place = constants.source("least-reynolds-number");
        double least = constants.number("least-reynolds-number");
        double re = trace.line("reynolds-number", "R_e", "Reynolds number on the smaller side; from " + Numbers.plain(least)
            + " on the coefficient of a sharp-edged plate stays the same").in("v", speed, "m/s").in("b", plate.width(), "m").in("h", plate.height(), "m")
            .in("ν", viscosity, "m²/s").from(place.citation(), place.status())
            .gives("v min(b; h) / ν", speed * Math.min(plate.width(), plate.height()) / viscosity, "1");
        if (!Numbers.atLeast(re, least)) {
            throw new NotCovered(place.publicationAndEdition(), place.place(), "the Reynolds number is below " + Numbers.plain(least)
                + ", where the coefficient still changes with speed and size.", "Nothing so small in so little wind needs a calculation; check the speed and the sizes.");
        }
        return re;
    }

    /** Drag coefficient on the gross area; recorded under the name given. */
    public double coefficient(Plate plate, String step, Trace trace) {
        double aspect = aspect(plate, trace);
        if (plate.solidity() == 1) {
            double c = closed(aspect, step, "C_D", "drag coefficient of the plate", trace);
            fit(aspect, trace);
            return c;
        }
        double closed = closed(aspect, "closed-coefficient", "C_0", "drag coefficient of the closed plate", trace);
        fit(aspect, trace);
        double factor = screens.factor(plate.solidity(), closed, trace);
        return trace.line(step, "C_D", "drag coefficient on the gross area").in("k_s", factor).in("C_0", closed)
            .from(constants.source("open-mesh-from").citation(), constants.source("open-mesh-from").status()).gives("k_s C_0", factor * closed, "1");
    }

    private double aspect(Plate plate, Trace trace) {
        Trace.Line line = trace.line("aspect", "λ", plate.onGround() ? "larger side over smaller side of a plate twice as high, as the ground acts as a mirror"
            : "larger side over smaller side").in("b", plate.width(), "m").in("h", plate.height(), "m").from("geometry", Status.DERIVED);
        double value = PlateDrag.aspect(plate.width(), plate.height(), plate.onGround());
        return plate.onGround() ? line.gives("max(b; 2 h) / min(b; 2 h)", value, "1") : line.gives("max(b; h) / min(b; h)", value, "1");
    }

    /** By the printed values, and beyond the last one by the fit, which meets them there, up to the endless plate. */
    private double closed(double aspect, String step, String symbol, String meaning, Trace trace) {
        if (!Numbers.above(aspect, plates.last())) {
            return plates.at("CD", Math.min(aspect, plates.last())).into(trace.line(step, symbol, meaning).in("λ", aspect));
        }
        Source place = constants.source("fit-base");
        double base = constants.number("fit-base");
        double slope = constants.number("fit-slope");
        double endless = constants.number("two-dimensional-plate");
        return trace.line(step, symbol, meaning + ", by the fit beyond the printed values, at most that of an endless plate").in("λ", aspect)
            .from(place.citation(), place.status())
            .gives("min(" + fitText() + "; " + Numbers.plain(endless) + ")", PlateDrag.fit(aspect, base, slope, endless), "1");
    }

    /** A second route to the same number, inside the range of the fit. */
    private void fit(double aspect, Trace trace) {
        if (Numbers.above(aspect, constants.number("fit-range"))) {
            return;
        }
        Source place = constants.source("fit-base");
        trace.line("fit-coefficient", "C_H", "the closed plate by a fit, for comparison; not used in the loads").in("λ", aspect)
            .from(place.citation(), place.status()).gives(fitText(), PlateDrag.fit(aspect, constants.number("fit-base"), constants.number("fit-slope"),
                Double.POSITIVE_INFINITY), "1");
    }

    private String fitText() {
        return constants.text("fit-base") + " + " + constants.text("fit-slope") + " (λ + 1 / λ)";
    }
}
