package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.EdgeOn;
import broadside.assess.Carried.Part;
import broadside.assess.Carried.Result;
import broadside.codes.LoadCase;
import broadside.codes.NotCovered;
import broadside.codes.ZonePressure;
import broadside.panel.FacadePanel;
import broadside.panel.Fixings;
import broadside.panel.ProjectingSign;
import broadside.quantity.Length;
import broadside.support.BracketFixings;
import broadside.support.Check;
import broadside.support.FixingGroup;
import broadside.support.FixingPulls;
import broadside.support.WindLevels;
import broadside.table.OutsideTable;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Fixings of a panel on a wall and of the brackets of a blade sign: pull and shear of the hardest. */
final class FixingCarrier {

    /** Name of the area of one fixing in steps. */
    private static final String ONE = "one-fixing";

    static Carried facade(FacadePanel facade, Fixings fixings, List<CaseAction> cases, ItemLoads loads, Carriers by) {
        Trace sheet = loads.sheet();
        WindLevels levels = by.levels(sheet);
        double pressure = suction(facade, fixings, cases, loads);
        double service = sheet.line("fixing-suction", "p_1", "suction on the area of one fixing, at allowable stress").in("k_s", levels.service()).in("p_0", pressure, "Pa")
            .from(levels.place(), levels.status()).gives("k_s p_0", levels.service() * pressure, "Pa");
        double depth = sheet.given("d_1", "thickness of the panel" + (facade.depth().metres() == 0 ? ", not given" : ""), facade.depth().metres(), "m", facade.depth().typed());
        double h = sheet.given("h_1", "height of the panel on the fixings", facade.height().metres(), "m", "");
        double side = sheet.line("side-wind", "F_x", "wind on the edge of the panel, along the wall, at the same pressure").in("p_1", service, "Pa").in("h_1", h, "m").in("d_1", depth, "m")
            .from("as in published sign calculations: wall pressure on the edge", Status.READ).gives("p_1 h_1 d_1", service * h * depth, "N");
        double off = facade.gap().map(Length::metres).orElse(0.0) + facade.depth().metres() / 2;
        FixingPulls pulls = by.rules().fixings().assess(fixings, new FixingGroup.PanelLoad(new Check.In("p_1", service), facade.width().metres(), facade.height().metres(), off, 0,
            facade.mass(), new Check.In("F_x", side)), FixingGroup.Sharing.BY_AREA, sheet);
        List<String> assumed = new ArrayList<>(pulls.assumptions());
        if (facade.depth().metres() == 0) {
            assumed.add("The thickness of the panel was not given: no wind on its edge is counted.");
        }
        return new Carried(List.of(part(pulls, fixings, assumed, "")));
    }

    /** The greatest suction on the area of one fixing, from the edge nearest to the corner: small areas get more by most codes. Pa, recorded as p_0. */
    private static double suction(FacadePanel facade, Fixings fixings, List<CaseAction> cases, ItemLoads loads) {
        double width = share(facade.width().metres(), fixings.columns(), fixings.horizontal());
        double height = share(facade.height().metres(), fixings.rows(), fixings.vertical());
        double bottom = facade.bottom().metres() + facade.height().metres() - height;
        FacadePanel one = new FacadePanel(facade.mark(), facade.backing(), Length.metres(width), Length.metres(height), Length.metres(bottom), facade.fromCorner(), facade.building(),
            facade.gap(), facade.depth(), facade.mass(), Optional.empty(), List.of());
        Trace part = loads.sheet().part(ONE);
        double whole = cases.stream().flatMap(c -> c.zones().stream()).flatMap(z -> z.zones().stream()).mapToDouble(ZonePressure::pressure).min().orElse(0);
        String how = "the greatest suction of its zones";
        double most = Math.max(0, -whole);
        try {
            loads.giveDimensions("the area of one fixing", "", one.panels().get(0), part);
            List<LoadCase> found = loads.code().wallPressures(one, loads.job().site(), part);
            most = Math.max(most, -found.stream().flatMap(c -> c.zones().stream()).mapToDouble(ZonePressure::pressure).min().orElse(0));
        } catch (NotCovered | OutsideTable e) {
            how = "that of the whole panel, as the code gives none for so small an area";
        }
        return part.line("fixing-pressure", "p_0", "suction on the area of one fixing, or on the whole panel where that is more").from("as above", Status.DERIVED).reads(how, most, "Pa");
    }

    private static double share(double size, int lines, double pitch) {
        return lines == 1 ? size : lines == 2 ? size / 2 : Math.max(pitch, size / 2 - (lines - 2) * pitch / 2);
    }

    static Carried blade(ProjectingSign sign, Fixings fixings, Map<String, CaseAction> governing, EdgeOn edgeOn, ItemLoads loads, Carriers by) {
        Trace sheet = loads.sheet();
        WindLevels levels = by.levels(sheet);
        CaseAction turning = governing.get("base-moment");
        double normal = sheet.line("blade-wind/square-on", "W_n", "wind square on the blade, at allowable stress, case " + turning.name()).in("k_s", levels.service())
            .in("F", turning.force(), "N").from(levels.place(), levels.status()).gives("k_s F", levels.service() * turning.force(), "N");
        double moment = sheet.line("blade-moment", "M_n", "its moment about the wall, at allowable stress").in("k_s", levels.service()).in("M_w", turning.baseMoment(), "N m")
            .from(levels.place(), levels.status()).gives("k_s M_w", levels.service() * turning.baseMoment(), "N m");
        double along = sheet.line("blade-wind/along", "W_e", "wind along the blade, at allowable stress").in("k_s", levels.service()).in("F_e", edgeOn.force(), "N")
            .from(levels.place(), levels.status()).gives("k_s F_e", levels.service() * edgeOn.force(), "N");
        BracketFixings.BladeLoad load = new BracketFixings.BladeLoad(new Check.In("W_n", normal), new Check.In("W_e", along),
            Optional.of(new Check.In("M_n", moment)), sign.panels().get(0).middle(), sign.mass());
        FixingPulls pulls = by.rules().brackets().assess(fixings, sign.brackets(), load, sheet);
        List<String> assumed = new ArrayList<>(pulls.assumptions());
        if (sign.gap().metres() == 0) {
            assumed.add("No gap between wall and blade was given: none is counted, and a gap pulls harder.");
        }
        return new Carried(List.of(part(pulls, fixings, assumed, " of each bracket")));
    }

    private static Part part(FixingPulls pulls, Fixings fixings, List<String> assumed, String each) {
        List<Result> results = new ArrayList<>();
        List<String> warnings = new ArrayList<>();
        pulls.tension().ifPresentOrElse(t -> results.add(Result.of("pull", "Each fixing must hold a pull, without factors, of", t, "N")),
            () -> warnings.add("The fixings give no couple for the moment that turns them: their pull is not found, and they are NOT enough by themselves."));
        results.add(Result.of("shear", "Each fixing must hold a shear, without factors, of", pulls.shear(), "N"));
        results.add(Result.words("fixings", "Fixings" + each, fixings.columns() + (fixings.columns() == 1 ? " column by " : " columns by ") + fixings.rows() + (fixings.rows() == 1 ? " row" : " rows")
            + fixings.horizontalPitch().map(p -> ", columns " + p.typed() + " apart").orElse("") + fixings.verticalPitch().map(p -> ", rows " + p.typed() + " apart").orElse("")));
        results.add(Result.words("allowable", "Allowable loads of one fixing, as typed", fixings.tension().map(t -> t.typed() + " pull").orElse("pull not given") + ", "
            + fixings.shear().map(v -> v.typed() + " shear").orElse("shear not given")));
        if (fixings.tension().isEmpty() || fixings.shear().isEmpty()) {
            warnings.add("The allowable " + (fixings.tension().isPresent() ? "shear" : fixings.shear().isPresent() ? "pull" : "pull and shear")
                + " of a fixing in this wall was not given: that part is not checked.");
        }
        List<String> remarks = new ArrayList<>(pulls.remarks());
        remarks.add("The wall and the anchors in it are not checked, nor the bending of fixings over a gap: a competent person tests them by pulling.");
        return new Part("fixings", "Fixings", results, pulls.checks(), List.of(), assumed, warnings, remarks, Optional.empty());
    }

    private FixingCarrier() { }
}
