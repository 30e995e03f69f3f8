package broadside.assess;

import broadside.assess.ItemResult.Outcome;
import broadside.assess.ItemResult.Refusal;
import broadside.codes.CodeLibrary;
import broadside.codes.NotCovered;
import broadside.codes.WindCode;
import broadside.panel.Item;
import broadside.site.SpeedConversion;
import broadside.support.Catalogue;
import broadside.support.UnfitAnswer;
import broadside.table.Edition;
import broadside.table.OutsideTable;
import broadside.table.Rows;
import broadside.table.TableFormat;
import broadside.table.TableLibrary;
import broadside.trace.OwnValue;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.CompletableFuture;

/** Job in, assessment out: the one door that the page, the commands and the document use. */
public final class Assessor {

    private final TableLibrary tables;
    private final CodeLibrary codes;
    private final Rows edgeOnRule;
    private final Rows stackRule;
    private final Scope scope;
    private final About about;
    private final SideBySide sideBySide;
    private final LimitFinder limitFinder;
    private final SupportRules supportRules;

    public Assessor(TableLibrary tables) {
        this.tables = tables;
        CompletableFuture<SupportRules> supports = CompletableFuture.supplyAsync(() -> SupportRules.of(tables, new Catalogue(tables)));
        this.codes = new CodeLibrary(tables);
        Edition own = tables.edition("own-rules/1").orElseThrow();
        this.edgeOnRule = own.rows("edge-on");
        this.stackRule = own.rows("stacks");
        this.scope = new Scope(own.rows("scope"), own.rows("size-limits"));
        this.supportRules = TableFormat.joined(supports);
        this.about = About.of(tables.digest());
        Edition gusts = tables.edition("gust-factors/1").orElseThrow();
        SpeedConversion conversion = new SpeedConversion(gusts.curve("durst"));
        this.limitFinder = new LimitFinder(conversion, own.rows("terrain-match"), own.rows("supports"));
        this.sideBySide = new SideBySide(this, conversion, own.rows("terrain-match"), gusts.rows("gust-over-ten-minutes"));
    }

    public CodeLibrary codes() {
        return codes;
    }

    /** The tables that it works from. */
    public TableLibrary tables() {
        return tables;
    }

    public About about() {
        return about;
    }

    /** Sections and grades of posts. */
    public Catalogue catalogue() {
        return supportRules.catalogue();
    }

    /**
     * Assesses every item of a job.
     *
     * @throws BadJob when the code is not there, or an override names no step of the calculation
     */
    public Assessment assess(Job job) {
        return assess(job, true);
    }

    /** The same without what carries the items. */
    public Assessment loadsOnly(Job job) {
        return assess(job, false);
    }

    private Assessment assess(Job job, boolean supports) {
        WindCode code = codes.code(job.basis().key()).orElseThrow(() -> new BadJob(List.of(new Problem("basis.code",
            "\"" + job.basis().key() + "\" is not among the codes: " + String.join(", ", codes.editions())))));
        try {
            job.basis().stability().ifPresent(supportRules.stability()::of);
        } catch (UnfitAnswer e) {
            throw new BadJob(List.of(new Problem(e.field(), e.getMessage())));
        }
        List<ItemResult> results = new ArrayList<>();
        for (int i = 0; i < job.items().size(); i++) {
            try {
                results.add(assess(job, job.items().get(i), code, supports));
            } catch (UnfitAnswer e) {
                String path = e.field().startsWith("basis.") ? e.field() : "items[" + i + "]." + e.field();
                throw new BadJob(List.of(new Problem(path, e.getMessage())));
            } catch (ArithmeticException e) {
                throw new BadJob(List.of(new Problem("items[" + i + "]", "the values given lead to no result: " + e.getMessage())));
            }
        }
        checkOverrides(job, results);
        return new Assessment(job, code, results, about);
    }

    /** The same assessment with the winds at which the checks of each item are just met. */
    public Assessment withLimits(Assessment of) {
        List<ItemResult> items = new ArrayList<>();
        for (ItemResult result : of.items()) {
            items.add(result.with(limits(of, result)));
        }
        return new Assessment(of.job(), of.code(), items, of.about());
    }

    private Optional<Limits> limits(Assessment of, ItemResult result) {
        try {
            return limitFinder.of(of.job(), result, of.code(), (item, site) -> {
                Job windy = of.job().withSite(site);
                return item.choose(new ItemLoads(windy, of.code(), rules(of.code()), Optional.of(new Carriers(windy, of.code(), supportRules)), new Trace(windy.overrides())));
            });
        } catch (NotCovered | OutsideTable | UnfitAnswer e) {
            return Optional.empty();
        }
    }

    private ItemLoads.Rules rules(WindCode code) {
        return new ItemLoads.Rules(edgeOnRule, stackRule, codes.memberRule(code));
    }

    /** One item of a job by every code. */
    public Comparison sideBySide(Job job, Item item) {
        return sideBySide.of(job, item);
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

    private ItemResult assess(Job job, Item item, WindCode code, boolean supports) {
        Trace sheet = new Trace(job.overrides());
        Optional<Scope.Outside> outside = scope.of(job, item);
        if (outside.isPresent() && !outside.get().showsLoads()) {
            return result(job, item, code, sheet, Outcome.OUTSIDE_SCOPE, outside.map(Scope.Outside::refusal), Optional.empty());
        }
        try {
            Loads loads = item.choose(new ItemLoads(job, code, rules(code), carriers(supports, job, item, code, outside), sheet));
            Companions.record(loads, sheet);
            return result(job, item, code, sheet, outside.isPresent() ? Outcome.OUTSIDE_SCOPE : Outcome.ASSESSED, outside.map(Scope.Outside::refusal),
                Optional.of(loads));
        } catch (NotCovered e) {
            return result(job, item, code, sheet, Outcome.NOT_COVERED, outside.map(Scope.Outside::refusal)
                .or(() -> Optional.of(new Refusal(e.code(), e.clause(), e.reason(), e.instead()))), Optional.empty());
        } catch (OutsideTable e) {
            return result(job, item, code, sheet, Outcome.NOT_COVERED, outside.map(Scope.Outside::refusal)
                .or(() -> Optional.of(new Refusal(e.source().publicationAndEdition(), e.source().place(),
                    "The printed table does not cover this case: " + e.getMessage() + ".",
                    "Change the panel so that it falls inside, or choose a code that covers it."))), Optional.empty());
        }
    }

    /** What carries an item is checked where it was made for it and is no larger than this tool is meant for. */
    private Optional<Carriers> carriers(boolean supports, Job job, Item item, WindCode code, Optional<Scope.Outside> outside) {
        boolean own = job.remark(item.mark(), "held-by").filter(h -> h.startsWith("existing")).isEmpty();
        return supports && outside.isEmpty() && own && scope.size(item).isEmpty() ? Optional.of(new Carriers(job, code, supportRules)) : Optional.empty();
    }

    private ItemResult result(Job job, Item item, WindCode code, Trace sheet, Outcome outcome, Optional<Refusal> refusal, Optional<Loads> loads) {
        Outcome told = refusal.filter(Refusal::ofScope).isPresent() ? Outcome.OUTSIDE_SCOPE : outcome;
        List<Note> notes = new ArrayList<>(scope.size(item).stream().toList());
        notes.addAll(Notes.of(job, item, code, sheet, loads));
        return new ItemResult(item, told, refusal, loads, notes, sheet, Optional.empty());
    }
}
