package broadside.assess;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.action.Foot;
import broadside.action.Reaction;
import broadside.codes.LoadCase;
import broadside.codes.ZonePressure;
import broadside.panel.FacadePanel;
import broadside.panel.Panel;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Loads on a panel flat on a wall: pushed towards it and pulled off it. Where the panel lies in two zones the worse counts for all of it. */
final class FacadeLoads {

    static Loads of(FacadePanel facade, ItemLoads by) {
        Panel panel = facade.panels().get(0);
        Trace sheet = by.sheet();
        by.giveDimensions(facade.mark(), "", panel, sheet);
        List<CaseAction> cases = new ArrayList<>();
        for (LoadCase load : by.code().wallPressures(facade, by.job().site(), sheet)) {
            cases.add(action(load, panel, by));
        }
        double weight = Weights.of(facade.mass(), "mass of the panel", sheet);
        List<Reaction> reactions = weight == 0 ? List.of() : List.of(new Reaction("self-weight", "Weight along the wall", weight, "N", ""));
        Map<String, CaseAction> governing = Map.of("base-shear", ItemLoads.most(cases, CaseAction::force));
        Optional<Carried> carried = by.carriers().flatMap(c -> facade.fixings().map(f -> FixingCarrier.facade(facade, f, cases, by, c)));
        return new Loads(by.velocity(facade.panels()), cases, governing, Loads.Supports.of(reactions, carried), Optional.empty(), by.code().level(by.job().site()),
            weight, Foot.NONE);
    }

    private static CaseAction action(LoadCase load, Panel panel, ItemLoads by) {
        ZonePressure worst = load.zones().stream().reduce((a, b) -> Math.abs(b.pressure()) > Math.abs(a.pressure()) ? b : a).orElseThrow();
        String name = load.name();
        String b = by.symbols().width();
        String h = by.symbols().height();
        Trace sheet = by.sheet();
        double force = sheet.line("force/" + name, "F", "wind force on the panel, " + load.label() + (load.zones().size() > 1
            ? ", the worse of its zones over the whole panel" : "")).in(worst.symbol(), worst.pressure(), "Pa").in(b, panel.width(), "m").in(h, panel.height(), "m")
            .from("statics", Status.DERIVED).gives("abs(" + worst.symbol() + ") " + b + " " + h, Math.abs(worst.pressure()) * panel.area(), "N");
        double z = sheet.line("lever-arm/" + name, "z", "height of the force above the ground").in(by.symbols().gap(), panel.clearance(), "m")
            .in(h, panel.height(), "m").from("statics", Status.DERIVED).gives(by.symbols().gap() + " + " + h + " / 2", panel.clearance() + panel.height() / 2, "m");
        double shear = sheet.line("base-shear/" + name, "F_b", "what the wall must take").in("F", force, "N").from("statics", Status.DERIVED).gives("F", force, "N");
        return new CaseAction("", name, load.label(), worst.pressure() < 0 ? "outward" : "inward", load.windward(),
            List.of(new PanelZones("", panel.middle() - panel.width() / 2, load.zones(), List.of())), force, z, panel.middle(), shear, 0, 0);
    }

    private FacadeLoads() { }
}
