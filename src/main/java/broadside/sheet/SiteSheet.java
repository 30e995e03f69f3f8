package broadside.sheet;

import broadside.assess.Assessment;
import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.assess.Loads;
import broadside.quantity.Dimension;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Facts;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.NewPage;
import broadside.sheet.Block.Notes;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Tone;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/** One page for those who build it: where things stand, what carries them, in which order, and who decides. Without any calculation. */
final class SiteSheet {

    private static final String NOT_SAID = "not said";
    private static final int LONGEST = 120;
    /** Results that need no label. */
    private static final Set<String> PLAIN = Set.of("section", "kind", "standing");
    /** Results that are for those who check, and not for those who build. */
    private static final Set<String> UNTOLD = Set.of("mass", "rule", "limit", "stability");

    static List<Block> of(Assessment assessment, ItemResult item, Format format, String anchor) {
        if (item.loads().isEmpty()) {
            return List.of();
        }
        Loads loads = item.loads().get();
        List<Block> blocks = new ArrayList<>(List.of(new NewPage(), new Heading(2, "Site sheet, " + item.item().mark(), anchor + "site-sheet"),
            new Paragraph("Nothing here is built before a licensed engineer has confirmed it.", Tone.CAUTION)));
        blocks.add(new Facts("Where it stands", place(assessment.job(), item, format)));
        List<Fact> holds = new ArrayList<>();
        loads.carried().ifPresentOrElse(c -> c.parts().forEach(p -> holds.addAll(part(p, format))),
            () -> holds.add(new Fact("Supports", "loads only: what holds it was not checked", "", true)));
        blocks.add(new Facts("What carries it", holds));
        blocks.add(new Facts("Limits", limits(assessment, item, loads, format)));
        blocks.add(new Paragraph("Order of work", Tone.PLAIN));
        blocks.add(new Notes(item.item().choose(new SiteSequence())));
        blocks.add(new Facts("Who decides", decides(assessment.job())));
        return blocks;
    }

    private static List<Fact> place(Job job, ItemResult item, Format format) {
        List<Fact> facts = new ArrayList<>();
        facts.add(Fact.of("Job and place", said(job.head("title")) + job.head("reference").map(r -> ", " + clipped(r)).orElse("")
            + job.head("revision").map(r -> ", revision " + clipped(r)).orElse("") + "; " + (job.site().name().isBlank() ? said(job.head("address")) : clipped(job.site().name()))));
        facts.addAll(item.item().choose(new SitePlaces(format)));
        job.remark(item.item().mark(), "fixed-to").ifPresent(what -> facts.add(Fact.of("Fixed to", clipped(what))));
        return facts;
    }

    /** What to build in one line, without mass and rules, which the summary names; then the hardest check, and what must be confirmed. */
    private static List<Fact> part(Carried.Part part, Format format) {
        List<Fact> facts = new ArrayList<>();
        part.refused().ifPresent(why -> facts.add(new Fact(part.title() + ", not pre-sized", why, "", true)));
        List<String> found = new ArrayList<>();
        part.results().stream().filter(r -> !UNTOLD.contains(r.key())).forEach(r -> found.add(PLAIN.contains(r.key()) ? r.text()
            : r.label().substring(0, 1).toLowerCase(Locale.ROOT) + r.label().substring(1) + " " + CarriedBlocks.value(r, format)));
        String worst = part.worst().map(w -> w.name() + ", share " + CarriedBlocks.share(w.utilisation())).orElse("");
        if (part.passes() && !worst.isEmpty()) {
            found.add("hardest check " + worst);
        }
        if (!found.isEmpty()) {
            facts.add(Fact.of(part.title(), String.join("; ", found)));
        }
        if (!part.passes() && !worst.isEmpty()) {
            facts.add(new Fact("NOT ENOUGH", worst, "", true));
        }
        if (!part.warnings().isEmpty()) {
            facts.add(new Fact(CarriedBlocks.WARNED, String.join(" ", part.warnings()), "", true));
        }
        if (!part.assumed().isEmpty()) {
            facts.add(new Fact("assumed, confirm first", String.join(" ", part.assumed()), "", true));
        }
        return facts;
    }

    private static List<Fact> limits(Assessment assessment, ItemResult item, Loads loads, Format format) {
        List<Fact> facts = new ArrayList<>();
        facts.add(Fact.of("Worked out for", Format.speed(assessment.job().site().basicSpeed()) + ", " + assessment.job().site().averaging().words() + ", terrain "
            + assessment.job().site().ground().terrain() + "; " + assessment.code().edition().property("title") + "; force in all "
            + format.both(loads.governs("base-shear").force(), Dimension.FORCE) + ", " + loads.level().name()));
        facts.add(new Fact("Comes down at", LimitBlocks.comesDown(item, format), "", true));
        facts.add(Fact.of("Never", "larger, higher or more closed than drawn: every figure here changes"));
        return facts;
    }

    private static List<Fact> decides(Job job) {
        return List.of(Fact.of("Before", "the local code, the authority, the engineer of record " + job.head("engineer").map(SiteSheet::clipped).orElse("____________________")),
            Fact.of("On site", "who stops the work, name and telephone: ____________________"));
    }

    private static String said(Optional<String> head) {
        return head.map(SiteSheet::clipped).orElse(NOT_SAID);
    }

    /** One page holds no text of any length; the check list has it whole. */
    private static String clipped(String text) {
        return text.length() <= LONGEST ? text : text.substring(0, text.offsetByCodePoints(0, Math.min(LONGEST, text.codePointCount(0, text.length())))) + "...";
    }

    private SiteSheet() { }
}
