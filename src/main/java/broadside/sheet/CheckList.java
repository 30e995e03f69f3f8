package broadside.sheet;

import broadside.assess.Assessment;
import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.assess.Job;
import broadside.assess.Note;
import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Item;
import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Facts;
import broadside.sheet.Block.Heading;
import broadside.site.Site;
import broadside.trace.Step;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The twelve groups of fields that a load summary is checked by. A field without a value says "not given". */
final class CheckList {

    static final String NOT_GIVEN = "not given";
    private static final String NOT_HERE = "not worked out in this version";

    private final Assessment assessment;
    private final Job job;
    private final Format format;
    private final List<Fact> facts = new ArrayList<>();
    private final List<Block> blocks = new ArrayList<>();

    private CheckList(Assessment assessment, Format format) {
        this.assessment = assessment;
        this.job = assessment.job();
        this.format = format;
    }

    static List<Block> of(Assessment assessment, Format format, String date) {
        CheckList list = new CheckList(assessment, format);
        list.blocks.add(new Heading(2, "Check list of the load summary", "check-list"));
        list.identity(date);
        list.status();
        assessment.items().forEach(item -> list.sign(item.item(), assessment.items().size() > 1));
        list.site(job(assessment).site());
        assessment.items().forEach(list::coefficients);
        list.results();
        list.foundation();
        list.limits();
        list.assumptions();
        list.exclusions();
        list.handCheck();
        list.maintenance();
        return list.blocks;
    }

    private static Job job(Assessment assessment) {
        return assessment.job();
    }

    private void group(String caption) {
        blocks.add(new Facts(caption, facts));
        facts.clear();
    }

    private void fact(String label, String value) {
        facts.add(Fact.of(label, value.isBlank() ? NOT_GIVEN : value));
    }

    private void head(String label, String name) {
        fact(label, job.head(name).orElse(""));
    }

    private void identity(String date) {
        head("Project", "title");
        head("Reference", "reference");
        fact("Site", join(job.site().name(), job.head("address").orElse("")));
        head("Coordinates", "coordinates");
        head("Client", "client");
        head("Applicant", "applicant");
        head("Drawing number", "drawing-number");
        head("Revision", "revision");
        fact("Date", date);
        head("Prepared by", "prepared-by");
        head("Checked by", "checked-by");
        head("Remarks", "remarks");
        fact("Engineer, licence, seal", job.head("engineer").orElse(NOT_GIVEN + " (space for the seal is left to the engineer)"));
        fact("Tool and version", "Broadside " + assessment.about().version());
        fact("Tables", assessment.about().tables());
        group("1 Identity");
    }

    private void status() {
        fact("Status", SheetMaker.PRELIMINARY);
        fact("Scope", "wind loads on flat panels and what they come to at their supports, by the code named here");
        fact("Not checked", "see \"What was not checked\" and group 10");
        group("2 Status");
    }

    private void sign(Item item, boolean many) {
        fact("Type", item.kind());
        facts.addAll(ItemFacts.of(item, format));
        fact("Solidity, and who says so", solidity(item));
        fact("Lighting and openings", job.remark(item.mark(), "lighting").orElse(""));
        fact("Fixed to", job.remark(item.mark(), "fixed-to").orElse(""));
        for (Item.Carrying carrying : item.carrying()) {
            fact("As typed: " + carrying.name(), carrying.typed());
        }
        group("3 Sign" + (many ? " " + item.mark() : ""));
    }

    private String solidity(Item item) {
        double least = item.panels().stream().mapToDouble(p -> p.solidity()).min().orElse(1);
        return format.plain(least) + (least < 1 ? ", by " + job.remark(item.mark(), "solidity-by").orElse("an unnamed source") : ", closed");
    }

    private void site(Site site) {
        fact("Code and edition", assessment.code().edition().property("title"));
        fact("Overlay", job.basis().overlay().orElse("none"));
        fact("Basic wind speed", Format.speed(site.basicSpeed()) + ", " + site.averaging().words()
            + ", for loads at " + assessment.code().level(site).name() + " level");
        fact("Return period", site.returnPeriod().map(p -> p.typed()).orElse("as the code's basic speed"));
        fact("Risk category", site.options().word("risk-category").orElse(""));
        fact("Terrain or exposure", (site.ground().unknown().contains(Site.Unknown.TERRAIN) ? "not known, so the smoothest was taken: " : "") + site.ground().terrain() + " in every direction" + assessment.code().terms().terrains().stream()
            .filter(t -> t.name().equals(site.ground().terrain()) && !t.meaning().isEmpty()).map(t -> ": " + t.meaning()).findFirst().orElse(""));
        fact("Reason for it", job.head("terrain-reason").orElse(""));
        fact("Topography", site.ground().shapeUnknown() ? "not known: the worst value of the code was taken" : site.ground().topography().map(g -> g.feature().word() + ", height " + g.height().typed() + ", upwind slope "
            + g.upwindLength().typed() + " long, site " + g.distanceFromCrest().typed() + " from the crest").orElse("none given, taken as flat"));
        fact("Altitude", site.ground().altitude().map(a -> a.typed()).orElse(""));
        fact("Air density", site.options().quantities().containsKey("air-density") ? site.options().quantities().get("air-density").typed() : "by the code");
        fact("Directionality", "by the code; see the calculation");
        fact("Shelter", site.options().number("shielding-multiplier").filter(m -> m < 1).isPresent() ? "by the shielding multiplier given" : assessment.items().stream().flatMap(i -> i.sheet().steps().stream()).anyMatch(s -> s.name().startsWith("shelter-factor"))
            ? "by the factor given for a wall or fence in front" : "none counted");
        fact("Season or duration", site.options().number("season-factor").map(f -> "season factor " + format.plain(f)).orElse(site.options().word("season").orElse("none: the whole year")));
        fact("How long it stands", Optional.ofNullable(site.options().quantities().get("stands-for")).map(q -> q.typed()).orElse("")
            + (site.options().word("duration-rule").isPresent() ? ", by the code's rule for a short stay" : ""));
        fact("Authority's least pressure", site.authorityMinimum().map(m -> m.pressure().typed()).orElse(""));
        group("4 Site and code");
    }

    private void coefficients(ItemResult item) {
        for (Step step : item.sheet().steps()) {
            if (step.name().startsWith("coefficient/") || step.name().equals("gust-factor") || step.name().startsWith("topography-factor")) {
                facts.add(Fact.of(step.meaning() + part(item.item(), step), format.plain(step.value()), step.place() + "; " + CalculationBlocks.plainSymbol(step.formula())));
            }
        }
        fact("Internal pressure", item.item() instanceof FacadePanel facade && facade.backing() == FacadePanel.Backing.SKIN ? "counted; see the calculation" : "none");
        fact("Load cases", item.loads().map(l -> String.join(", ", l.cases().stream().map(c -> Format.caseName(c.name())).distinct().toList())).orElse("none"));
        fact("Wind directions", "front and back, and from both ends");
        group("5 Coefficients, " + item.item().mark());
    }

    private void results() {
        for (ItemResult item : assessment.items()) {
            String mark = item.item().mark();
            item.loads().ifPresent(l -> fact("Governing case, " + mark, String.join(", ", l.governingNames().entrySet().stream()
                .map(e -> e.getKey().replace('-', ' ') + ": " + Format.caseName(e.getValue())).toList())));
            item.loads().ifPresent(l -> fact("Weight of the boards, " + mark, l.selfWeight() > 0 ? format.force(l.selfWeight()) : ""));
            item.loads().flatMap(l -> l.edgeOn()).ifPresent(e -> fact("Wind along the face, " + mark, format.force(e.force()) + ", own rule"));
            item.refusal().ifPresent(r -> fact("Outcome, " + mark, r.ofScope() ? ItemResult.OUTSIDE + ": " + r.clause() : "not covered: " + r.code() + ", " + r.clause()));
        }
        fact("Pressures, forces, moments", assessment.items().stream().anyMatch(i -> i.loads().isPresent())
            ? "at both levels, each labelled, under \"Loads by case\"" : "none: not covered");
        group("6 Results");
    }

    private void foundation() {
        for (ItemResult item : assessment.items()) {
            Optional<Carried> carried = item.loads().flatMap(l -> l.carried());
            String which = assessment.items().size() > 1 ? ", " + item.item().mark() : "";
            if (carried.isEmpty()) {
                fact("What carries it" + which, "loads only: not checked");
                continue;
            }
            for (Carried.Part part : carried.get().parts()) {
                fact(part.title() + which, part.refused().orElseGet(() -> String.join("; ", part.results().stream().map(r -> r.label() + " " + CarriedBlocks.value(r, format)).toList())));
                part.worst().ifPresent(c -> fact("its hardest check" + which, c.name() + (c.named().isEmpty() ? "" : ", " + Format.caseName(c.named())) + ", share "
                    + CarriedBlocks.share(c.utilisation()) + "; " + part.checks().size() + " in all under \"What carries it\""));
                part.warnings().forEach(w -> facts.add(new Fact(CarriedBlocks.WARNED + which, w, "", true)));
                part.assumed().forEach(a -> facts.add(new Fact("assumed, to be confirmed" + which, a, "", true)));
            }
        }
        fact("Reinforcement, base plate, anchors", "not worked out: for the engineer");
        if (assessment.items().stream().anyMatch(i -> i.loads().flatMap(Loads::carried).flatMap(c -> c.part("footing")).isPresent())) {
            facts.add(new Fact("Buried services", "located by whoever digs, before anything is dug or driven", "", true));
        }
        group("7 Foundation or ballast");
    }

    private void limits() {
        for (ItemResult item : assessment.items()) {
            fact("Greatest gust and equal mean" + (assessment.items().size() > 1 ? ", " + item.item().mark() : ""), LimitBlocks.answer(item, format).map(f -> f.value() + "; " + f.remark())
                .orElse("not worked out: nothing was checked that the wind uses up"));
        }
        fact("Action levels", NOT_HERE);
        fact("Who measures, and at which height", NOT_GIVEN);
        group("8 Limiting wind");
    }

    private void assumptions() {
        List<String> all = assessment.items().stream().flatMap(i -> i.notes().stream())
            .filter(n -> n.kind() == Note.Kind.ASSUMPTION || n.kind() == Note.Kind.OVERRIDE).map(Note::text).distinct().toList();
        fact("Every default, and each answer that was not known", all.isEmpty() ? "none" : all.size() + ", each listed under \"What was assumed\"");
        group("9 Assumptions and unknowns");
    }

    private void exclusions() {
        fact("Not covered", "ice; snow; earthquake; fatigue and vortex shedding; impact; crowd load; electrical parts; anchors in masonry; existing structure; "
            + "flutter");
        group("10 Exclusions");
    }

    private void handCheck() {
        fact("One line to redo, and the balance of loads and reactions", "under \"To redo by hand\" in the calculation");
        group("11 Hand check");
    }

    private void maintenance() {
        for (ItemResult item : assessment.items()) {
            String mark = item.item().mark();
            fact("Design life, " + mark, job.remark(mark, "design-life").orElse(""));
            fact("Inspection interval, " + mark, job.remark(mark, "inspection-interval").orElse(""));
        }
        fact("Storm action", NOT_GIVEN);
        group("12 Inspection and maintenance");
    }

    /** The panel or arrangement that a step belongs to, behind a comma, where the item has several. */
    static String part(Item item, Step step) {
        String name = step.name();
        for (Panel panel : item.panels()) {
            if (!panel.part().isEmpty() && name.endsWith("/" + panel.part())) {
                return ", " + panel.part();
            }
        }
        return name.endsWith("/gates-shut") ? ", gates shut" : name.contains("/" + PostSign.ENVELOPE) ? ", boards as one" : name.endsWith("/" + BannerFence.BARE) ? ", bare fence"
            : name.endsWith("/" + PostSign.REPLACED) ? ", old board" : "";
    }

    private static String join(String a, String b) {
        return Optional.of(a).filter(s -> !s.isBlank()).map(s -> b.isBlank() ? s : s + "; " + b).orElse(b);
    }
}
