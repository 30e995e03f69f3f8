package broadside.support;

import broadside.panel.FenceFeet;
import broadside.panel.Fixings;
import broadside.panel.Kentledge;
import broadside.quantity.Force;
import broadside.quantity.Length;
import broadside.quantity.Mass;
import broadside.table.Edition;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/** Feet, ballast and fixings for tests, in plain numbers. */
final class Stands {

    static final Edition STABILITY = TableLibrary.shipped().edition("stability/1").orElseThrow();
    static final StabilityRules RULES = new StabilityRules(STABILITY);
    static final WindLevels PLAIN = new WindLevels(1, 1.5, "EN 1990", Status.READ);

    static Optional<Mass> mass(double kilograms) {
        return Optional.of(Mass.kilograms(kilograms));
    }

    static FenceFeet.Surface friction(double mu) {
        return new FenceFeet.Surface(Optional.empty(), Optional.of(mu), Optional.empty());
    }

    static FenceFeet.Surface ground(String words) {
        return new FenceFeet.Surface(Optional.of(words), Optional.empty(), Optional.empty());
    }

    static FenceFeet feet(double panel, double foot, double length, FenceFeet.Surface surface, Optional<FenceFeet.Brace> brace, double... massAndLever) {
        List<FenceFeet.Block> blocks = new java.util.ArrayList<>();
        for (int i = 0; i < massAndLever.length; i += 2) {
            blocks.add(new FenceFeet.Block(Mass.kilograms(massAndLever[i]), Length.metres(massAndLever[i + 1])));
        }
        return new FenceFeet(mass(panel), mass(foot), Optional.of(Length.metres(length)), blocks, brace, surface,
            new FenceFeet.Stakes(Optional.empty(), Optional.empty(), Optional.empty()));
    }

    static FenceFeet staked(FenceFeet feet, double proof, int count) {
        return new FenceFeet(feet.panelMass(), feet.footMass(), feet.footLength(), feet.blocks(), feet.brace(), feet.surface(),
            new FenceFeet.Stakes(Optional.empty(), Optional.of(Force.newtons(proof)), Optional.of(count)));
    }

    static Optional<FenceFeet.Brace> brace(double lever, double mass) {
        return Optional.of(new FenceFeet.Brace(Length.metres(lever), Mass.kilograms(mass)));
    }

    static Kentledge kentledge(double mass, double lever, double front, double face, double mu) {
        return new Kentledge(mass(mass), Optional.of(Length.metres(lever)), mass(front), mass(face), friction(mu));
    }

    static Fixings fixings(int columns, int rows, double across, double along) {
        return new Fixings(columns, rows, Optional.of(Length.metres(across)), Optional.of(Length.metres(along)), Optional.empty(), Optional.empty());
    }

    static Fixings allowed(Fixings of, double tension, double shear) {
        return new Fixings(of.columns(), of.rows(), of.horizontalPitch(), of.verticalPitch(), Optional.of(Force.newtons(tension)),
            Optional.of(Force.newtons(shear)));
    }

    /** A wind recorded on the sheet under F_f and z_f. */
    static PanelWind wind(String part, double force, double height, boolean covered, Trace trace) {
        return new PanelWind(part.replace('-', ' '), part, new Check.In("F_f", trace.given("F_f", "force", force, "N", "")),
            new Check.In("z_f", trace.given("z_f", "height", height, "m", "")), covered);
    }

    static Check.In in(String symbol, double value, String unit, Trace trace) {
        return new Check.In(symbol, trace.given(symbol, "given", value, unit, ""));
    }

    private Stands() { }
}
