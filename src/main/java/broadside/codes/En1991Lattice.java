package broadside.codes;

import broadside.codes.LoadCase.Windward;
import broadside.panel.Panel;
import broadside.site.Site;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;

/** Panels more open than a wall may be, as plane lattices of flat-sided members: EN 1991-1-4, 7.11. */
final class En1991Lattice {

    private final Constants constants;
    private final Curve lattice;

    En1991Lattice(Edition edition) {
        this.constants = new Constants(edition);
        this.lattice = edition.curve("lattice");
    }

    /** The wind square on, and for a board the force off its middle as on a closed one, which the clause does not ask for; a wall takes the pressure at its top and a board that at its middle. */
    List<LoadCase> cases(Panel panel, boolean wall, Site site, WindCode code, Trace trace) {
        Coefficient printed = lattice.at("c_f0", panel.solidity());
        Source place = printed.source();
        double zg = panel.clearance();
        double h = panel.height();
        Trace.Line height = trace.line("reference-height", "z_e", wall ? "reference height: the top of the wall" : "reference height: the middle of the board")
            .in("z_g", zg, "m").in("h", h, "m").from(place.publicationAndEdition() + ", 7.11", place.status());
        double ze = wall ? height.gives("z_g + h", panel.top(), "m") : height.gives("z_g + h / 2", zg + h / 2, "m");
        double qp = code.velocityPressure(site, ze, trace);
        double phi = trace.given("φ", "solidity", panel.solidity(), "1", "");
        double cf0 = printed.into(trace.line("lattice-coefficient", "c_{f,0}", "force coefficient of a plane lattice, on the projected area of its members").in("φ", phi));
        double end = constants.entry("end-effect-factor").into(trace.line("end-effect-factor", "ψ_λ", "end-effect factor, its safe end"));
        double c = trace.line("coefficient/all", "c_f", "net coefficient on the gross area: the members fill the share φ of it"
                + (panel.shelter() < 1 ? "; no shelter is counted for a lattice" : ""))
            .in("c_{f,0}", cf0).in("ψ_λ", end).in("φ", phi).from(place.citation(), place.status()).gives("c_{f,0} ψ_λ φ", cf0 * end * phi, "1");
        double w = NetPressure.record(site, code.level(site), trace, "all", "w_{all}", (name, symbol) ->
            trace.line(name, symbol, "net pressure on the gross area").in("q_p", qp, "Pa").in("c_f", c)
                .from(place.publicationAndEdition() + ", 5.3(2)", place.status()), "q_p c_f", qp * c);
        double b = panel.width();
        List<ZonePressure> all = List.of(new ZonePressure("all", "w_{all}", 0, b, b, c, w));
        LoadCase square = new LoadCase(wall ? "wall" : "centred", "plane lattice, wind square on", Windward.NONE, all, 0, Optional.empty(), 0, 0);
        if (wall) {
            return List.of(square);
        }
        ShiftRule rule = new ShiftRule(constants.number("signboard-eccentricity"), constants.source("signboard-eccentricity"));
        LoadCase right = new LoadCase("eccentric", "plane lattice, force a quarter of the width off the middle, as for a closed board", Windward.RIGHT, all, rule.factor() * b,
            Optional.of(rule), 0, 0);
        return List.of(square, right, right.mirrored(b));
    }
}
