package broadside.assess;

import broadside.action.CaseAction;
import broadside.action.EdgeOn;
import broadside.action.FootActions;
import broadside.action.HoardingPosts;
import broadside.action.PanelCases;
import broadside.action.PostAction;
import broadside.action.SignPosts;
import broadside.assess.ItemResult.Outcome;
import broadside.assess.ItemResult.Refusal;
import broadside.codes.CodeLibrary;
import broadside.codes.NotCovered;
import broadside.codes.PanelSymbols;
import broadside.codes.WindCode;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.table.OutsideTable;
import broadside.table.Rows;
import broadside.table.TableLibrary;
import broadside.trace.OwnValue;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.ToDoubleFunction;

/** Job in, assessment out: the one door that the page, the commands and the document use. */
public final class Assessor {

    /** Standard acceleration of free fall, m/s2. */
    private static final double G = 9.80665;

    private final CodeLibrary codes;
    private final Rows edgeOnRule;
    private final About about;

    public Assessor(TableLibrary tables) {
        this.codes = new CodeLibrary(tables);
        this.edgeOnRule = tables.edition("own-rules/1").orElseThrow().rows("edge-on");
        this.about = About.of(tables.digest());
    }

    public CodeLibrary codes() {
        return codes;
    }

    public About about() {
        return about;
    }

    /**
     * Assesses every item of a job.
     *
     * @throws BadJob when the code is not there, or an override names no step of the calculation
     */
    public Assessment assess(Job job) {
        WindCode code = codes.code(job.basis().key()).orElseThrow(() -> new BadJob(List.of(new Problem("basis.code",
            "\"" + job.basis().key() + "\" is not among the codes: " + String.join(", ", codes.editions())))));
        List<ItemResult> results = new ArrayList<>();
        for (int i = 0; i < job.items().size(); i++) {
            try {
                results.add(assess(job, job.items().get(i), code));
            } catch (ArithmeticException e) {
                throw new BadJob(List.of(new Problem("items[" + i + "]", "the values given lead to no result: " + e.getMessage())));
            }
        }
        checkOverrides(job, results);
        return new Assessment(job, code, results, about);
    }

    private static void checkOverrides(Job job, List<ItemResult> results) {
        Set<OwnValue> used = new HashSet<>();
        results.forEach(r -> used.addAll(r.sheet().overridesUsed()));
        boolean any = results.stream().anyMatch(r -> r.outcome() == Outcome.ASSESSED);
        List<Problem> problems = new ArrayList<>();
        for (int i = 0; i < job.overrides().size(); i++) {
            OwnValue own = job.overrides().get(i);
            if (any && !used.contains(own)) {
                Set<String> names = new java.util.TreeSet<>();
                results.forEach(r -> r.sheet().steps().stream().filter(s -> s.unit().equals(own.unit())).forEach(s -> names.add(s.name())));
                problems.add(new Problem("overrides[" + i + "].name", "\"" + own.name() + "\" is not a step of this calculation "
                    + (own.unit().equals("1") ? "without a unit" : "with the unit " + own.unit()) + "; there are " + String.join(", ", names.stream().limit(40).toList())));
            }
        }
        if (!problems.isEmpty()) {
            throw new BadJob(problems);
        }
    }

    private ItemResult assess(Job job, Item item, WindCode code) {
        Trace sheet = new Trace(job.overrides());
        try {
            Loads loads = loads(job, item, code, sheet);
            return new ItemResult(item, Outcome.ASSESSED, Optional.empty(), Optional.of(loads), Notes.of(job, item, code, sheet), sheet);
        } catch (NotCovered e) {
            return refused(job, item, code, sheet, new Refusal(e.code(), e.clause(), e.reason(), e.instead()));
        } catch (OutsideTable e) {
            return refused(job, item, code, sheet, new Refusal(e.source().publicationAndEdition(), e.source().place(),
                "The printed table does not cover this case: " + e.getMessage() + ".",
                "Change the panel so that it falls inside, or choose a code that covers it."));
        }
    }

    private static ItemResult refused(Job job, Item item, WindCode code, Trace sheet, Refusal refusal) {
        return new ItemResult(item, Outcome.NOT_COVERED, Optional.of(refusal), Optional.empty(), Notes.of(job, item, code, sheet), sheet);
    }

    private Loads loads(Job job, Item item, WindCode code, Trace sheet) {
        List<PanelCases> panels = new ArrayList<>();
        for (Panel panel : item.panels()) {
            giveDimensions(item, panel, code.symbols(), sheet);
            panels.add(new PanelCases(panel, code.netPressures(panel, job.site(), sheet.part(panel.part()))));
        }
        FootActions.Result actions = FootActions.of(panels, code.symbols(), sheet);
        List<PostAction> posts = posts(job, item, code, panels, actions, sheet);
        Map<String, CaseAction> governing = governing(actions.cases());
        EdgeOn edgeOn = edgeOn(item, code, sheet);
        double weight = selfWeight(item, sheet);
        Loads loads = new Loads(velocity(item, sheet), actions.cases(), governing, posts, edgeOn, code.level(), weight,
            Balances.of(item, panels, actions, posts));
        Companions.record(loads, sheet);
        return loads;
    }

    private static void giveDimensions(Item item, Panel panel, PanelSymbols symbols, Trace sheet) {
        String of = panel.part().isEmpty() ? item.mark() : panel.part();
        sheet.given(symbols.width(), "width of " + of, panel.width(), "m", panel.typed().width());
        sheet.given(symbols.height(), "height of " + of, panel.height(), "m", panel.typed().height());
        sheet.given(symbols.gap(), "gap below " + of, panel.clearance(), "m", panel.typed().clearance());
        sheet.given("x_b", "middle of " + of + " from the middle of the " + item.choose(sign -> "posts", hoarding -> "hoarding") + ", to the right",
            panel.middle(), "m", panel.typed().middle());
    }

    private static List<PostAction> posts(Job job, Item item, WindCode code, List<PanelCases> panels, FootActions.Result actions, Trace sheet) {
        return item.choose(
            sign -> SignPosts.of(sign.posts().positions(), actions.combinations(), sheet),
            hoarding -> hoarding.spacing().map(spacing -> HoardingPosts.of(hoarding, spacing.metres(), panels,
                shut(job, hoarding, code, sheet), code.symbols(), sheet)).orElse(List.of()));
    }

    /** The whole wall while its gates are shut. */
    private static Optional<PanelCases> shut(Job job, Hoarding hoarding, WindCode code, Trace sheet) {
        if (hoarding.gates().isEmpty()) {
            return Optional.empty();
        }
        Panel whole = hoarding.shut();
        giveDimensions(hoarding, whole, code.symbols(), sheet);
        return Optional.of(new PanelCases(whole, code.netPressures(whole, job.site(), sheet.part(whole.part()))));
    }

    private static Map<String, CaseAction> governing(List<CaseAction> cases) {
        return Map.of("base-shear", most(cases, CaseAction::baseShear), "base-moment", most(cases, CaseAction::baseMoment),
            "torsion", most(cases, c -> Math.abs(c.torsion())));
    }

    /** The first of the cases, wind on the front, that is not less than any other, within rounding. */
    private static CaseAction most(List<CaseAction> cases, ToDoubleFunction<CaseAction> by) {
        CaseAction best = cases.get(0);
        for (CaseAction each : cases) {
            if (each.direction().equals("front") && by.applyAsDouble(each) > by.applyAsDouble(best) * (1 + 1e-9)) {
                best = each;
            }
        }
        return best;
    }

    private EdgeOn edgeOn(Item item, WindCode code, Trace sheet) {
        EdgeOn sum = new EdgeOn(0, 0);
        List<Panel> panels = item.panels();
        for (int i = 0; i < panels.size(); i++) {
            Panel panel = panels.get(i);
            double depth = item instanceof PostSign sign ? sign.boards().get(i).depth().metres() : 0;
            String suffix = panel.part().isEmpty() ? "" : "/" + panel.part();
            double q = sheet.find("velocity-pressure" + suffix).orElseThrow().value();
            sum = sum.plus(EdgeOn.of(edgeOnRule, panel, depth, q, code.symbols(), sheet.part(panel.part())));
        }
        return sum;
    }

    private static double selfWeight(Item item, Trace sheet) {
        if (!(item instanceof PostSign sign) || sign.boards().stream().allMatch(b -> b.mass().isEmpty())) {
            return 0;
        }
        double mass = sign.boards().stream().mapToDouble(b -> b.mass().map(m -> m.kilograms()).orElse(0.0)).sum();
        double aside = sign.boards().stream().mapToDouble(b -> b.mass().map(m -> m.kilograms()).orElse(0.0) * b.offset().metres()).sum();
        sheet.given("m", "mass of the boards", mass, "kg", "");
        sheet.given("g_n", "standard acceleration of free fall", G, "m/s²", "");
        double weight = sheet.line("self-weight", "W", "weight of the boards").in("m", mass, "kg").in("g_n", G, "m/s²")
            .from("standard acceleration of free fall", Status.RECALLED).gives("m g_n", mass * G, "N");
        double arm = sheet.line("self-weight-arm", "x_W", "centre of mass from the middle of the posts, to the right").from("statics", Status.DERIVED)
            .reads("from the masses and offsets of the boards", mass == 0 ? 0 : aside / mass, "m");
        sheet.line("self-weight-moment", "M_W", "moment of the weight in the plane of the boards, about the middle of the posts")
            .in("W", weight, "N").in("x_W", arm, "m").from("statics", Status.DERIVED).gives("W x_W", weight * arm, "N m");
        return weight;
    }

    private static Loads.Velocity velocity(Item item, Trace sheet) {
        Loads.Velocity most = new Loads.Velocity(0, -1);
        for (Panel panel : item.panels()) {
            String suffix = panel.part().isEmpty() ? "" : "/" + panel.part();
            double q = sheet.find("velocity-pressure" + suffix).orElseThrow().value();
            if (q > most.pressure()) {
                most = new Loads.Velocity(sheet.find("reference-height" + suffix).orElseThrow().value(), q);
            }
        }
        return most;
    }
}
