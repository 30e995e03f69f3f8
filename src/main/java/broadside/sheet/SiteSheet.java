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

/** One page for those who build it: where things stand, what carries them, in which order, and who decides. Without any calculation. */
final class SiteSheet {

    private static final String NOT_SAID = "not said";

    static List<Block> of(Assessment assessment, ItemResult item, Format format, String anchor) {
        if (item.loads().isEmpty()) {
            return List.of();
        }
        Loads loads = item.loads().get();
        List<Block> blocks = new ArrayList<>(List.of(new NewPage(), new Heading(2, "Site sheet, " + item.item().mark(), anchor + "site-sheet"),
            new Paragraph(SheetMaker.PRELIMINARY + ". To be built only after a licensed engineer has confirmed it.", Tone.CAUTION)));
        blocks.add(new Facts("Where it stands", place(assessment.job(), item, format)));
        loads.carried().ifPresentOrElse(c -> c.parts().forEach(p -> blocks.add(part(p, format))), () -> blocks.add(new Facts("What carries it",
            List.of(new Fact("Supports", "loads only: what holds it was not checked", "", true)))));
        blocks.add(new Facts("Limits", limits(assessment, loads, format)));
        blocks.add(new Paragraph("Order of work", Tone.PLAIN));
        blocks.add(new Notes(item.item().choose(new SiteSequence())));
        blocks.add(new Facts("Who decides", decides(assessment.job())));
        return blocks;
    }

    private static List<Fact> place(Job job, ItemResult item, Format format) {
        List<Fact> facts = new ArrayList<>();
        facts.add(Fact.of("Job", job.head("title").orElse(NOT_SAID) + job.head("reference").map(r -> ", " + r).orElse("") + job.head("revision").map(r -> ", revision " + r).orElse("")));
        facts.add(Fact.of("Place", job.site().name().isBlank() ? job.head("address").orElse(NOT_SAID) : job.site().name()));
        facts.addAll(item.item().choose(new SitePlaces(format)));
        return facts;
    }

    private static Facts part(Carried.Part part, Format format) {
        List<Fact> facts = new ArrayList<>();
        part.refused().ifPresent(why -> facts.add(new Fact("not pre-sized", why, "", true)));
        part.results().forEach(r -> facts.add(Fact.of(r.label(), CarriedBlocks.value(r, format))));
        part.worst().ifPresent(w -> facts.add(new Fact(w.passes() ? "Hardest check" : "NOT ENOUGH", w.name() + ", share " + CarriedBlocks.share(w.utilisation()), "", !w.passes())));
        part.assumed().forEach(a -> facts.add(new Fact("assumed, confirm first", a, "", true)));
        return new Facts(part.title(), facts);
    }

    private static List<Fact> limits(Assessment assessment, Loads loads, Format format) {
        List<Fact> facts = new ArrayList<>();
        facts.add(Fact.of("Wind it was worked out for", Format.speed(assessment.job().site().basicSpeed()) + ", " + assessment.job().site().averaging().words() + ", terrain "
            + assessment.job().site().ground().terrain() + "; " + assessment.code().edition().property("title")));
        facts.add(Fact.of("Wind force in all", format.both(loads.governs("base-shear").force(), Dimension.FORCE) + ", " + loads.level().name()));
        facts.add(new Fact("Gust at which it must come down", "not worked out here: ask the engineer before anyone relies on it", "", true));
        facts.add(Fact.of("Never", "larger, higher or more closed than drawn: a banner, a board or a second face changes every figure here"));
        return facts;
    }

    private static List<Fact> decides(Job job) {
        return List.of(Fact.of("Rules", "the local building code, the authority and the engineer of record"),
            Fact.of("Engineer", job.head("engineer").orElse("name and licence: ____________________")), Fact.of("Prepared by", job.head("prepared-by").orElse(NOT_SAID)),
            Fact.of("On site, stops the work and clears the ground", "name and telephone: ____________________"));
    }

    private SiteSheet() { }
}
