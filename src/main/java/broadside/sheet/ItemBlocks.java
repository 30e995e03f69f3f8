package broadside.sheet;

import broadside.action.Foot;
import broadside.action.PostAction;
import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.assess.Note;
import broadside.panel.PostSign;
import broadside.quantity.Dimension;
import broadside.quantity.Period;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.sheet.Block.Answer;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.Notes;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Picture;
import broadside.sheet.Block.Tone;
import broadside.site.Site;
import broadside.trace.Status;
import broadside.trace.Step;
import java.util.ArrayList;
import java.util.List;

/** The blocks of one item: answer, drawing, cases, posts, what was assumed, what was not checked. */
final class ItemBlocks {

    /** Lines of the answer. */
    private static final int MOST_LINES = 6;

    static List<Block> of(Assessment assessment, ItemResult item, Format format, String anchor, int level) {
        List<Block> blocks = new ArrayList<>();
        if (item.loads().isEmpty()) {
            blocks.addAll(refusal(item, anchor, level));
        } else {
            Loads loads = item.loads().get();
            if (item.refusal().isPresent()) {
                blocks.addAll(refusal(item, anchor + "scope-", level));
            }
            blocks.add(new Heading(level, "The answer", anchor + "answer"));
            blocks.add(new Paragraph(wind(assessment, item, loads, format), Tone.PLAIN));
            blocks.add(answer(assessment, item, loads, format));
            overrides(item).forEach(blocks::add);
        }
        blocks.add(new Heading(level, "Drawing", anchor + "drawing"));
        blocks.add(new Picture(ItemDrawing.of(item.item(), item.loads(), format.units()), caption(item),
            ItemDrawing.words(item.item(), item.loads(), format.units())));
        item.loads().ifPresent(loads -> {
            blocks.add(new Heading(level, "Loads by case", anchor + "cases"));
            blocks.addAll(CaseTables.of(item.item(), loads, format));
            loads.carried().ifPresent(c -> blocks.addAll(CarriedBlocks.of(c, format, anchor, level)));
            item.limits().ifPresent(l -> blocks.addAll(LimitBlocks.of(l, format, anchor, level)));
        });
        blocks.add(new Heading(level, "What was assumed", anchor + "assumed"));
        blocks.add(notes(item, Note.Kind.ASSUMPTION, Note.Kind.CAUTION));
        blocks.add(new Heading(level, "What was not checked", anchor + "not-checked"));
        blocks.add(notes(item, Note.Kind.NOT_CHECKED));
        return blocks;
    }

    private static Answer answer(Assessment assessment, ItemResult item, Loads loads, Format format) {
        List<Fact> lines = new ArrayList<>();
        String companion = loads.level().shown();
        Loads other = loads.companion();
        lines.add(Fact.of("Governing case", CaseTables.name(loads.governs("base-moment")), loads.governs("base-moment").label() + others(item, loads) + raised(item)));
        lines.add(Fact.of("Wind force", format.both(loads.governs("base-shear").force(), Dimension.FORCE) + ", " + loads.level().name(),
            format.force(other.governs("base-shear").force()) + " " + companion));
        lines.add(moment(item, loads, other, format));
        double torsion = Math.abs(loads.governs("torsion").torsion());
        List<Fact> more = new ArrayList<>();
        if (item.item() instanceof PostSign && torsion > 0) {
            more.add(Fact.of("Torsion about the middle of the posts", format.both(torsion, Dimension.MOMENT) + ", " + loads.level().name(),
                format.moment(Math.abs(other.governs("torsion").torsion())) + " " + companion + ", case " + CaseTables.name(loads.governs("torsion"))));
        }
        more.addAll(reactions(loads, format));
        List<Fact> last = new ArrayList<>(loads.carried().map(c -> CarriedBlocks.answer(c, format)).stream().toList());
        LimitBlocks.answer(item, format).ifPresent(last::add);
        last.add(sure(item, loads));
        lines.addAll(more.stream().limit(Math.max(0, MOST_LINES - last.size() - lines.size())).toList());
        lines.addAll(last);
        return new Answer(lines);
    }

    /** Whether a least pressure, and not the wind, gives the loads. */
    private static String raised(ItemResult item) {
        return item.notes().stream().map(Note::text).filter(t -> t.contains("least pressure governs")).findFirst().map(t -> ". " + t).orElse("");
    }

    /** The wind on one line: speed with its averaging time, terrain, and what it comes to. */
    private static String wind(Assessment assessment, ItemResult item, Loads loads, Format format) {
        Site site = assessment.job().site();
        String unknown = (site.ground().unknown().contains(Site.Unknown.TERRAIN) ? "; the terrain was not known, the smoothest is taken" : "")
            + (site.ground().shapeUnknown() ? "; hills were not known, the worst value of the code is taken" : "");
        return "Wind: " + Format.speed(site.basicSpeed()) + ", " + site.averaging().words() + returns(site, item)
            + "; terrain " + site.ground().terrain() + "; velocity pressure " + format.nearest(loads.velocity().pressure(), Dimension.PRESSURE) + " at "
            + format.length(loads.velocity().height()) + ", " + loads.level().name() + unknown + ".";
    }

    /** The return period where it counts: as typed, or as the code's rule for a short stay gives it. */
    private static String returns(Site site, ItemResult item) {
        if (item.sheet().find("probability-factor").isEmpty()) {
            return "";
        }
        return ", " + site.returnPeriod().map(Period::typed).or(() -> item.sheet().find("return-period").map(t -> Show.number(t.value(), 3, Rounding.NEAREST) + " years"))
            .orElse("other return period");
    }

    /** Which cases govern posts and torsion, where they are others than the one that governs the moment. */
    private static String others(ItemResult item, Loads loads) {
        String base = CaseTables.name(loads.governs("base-moment"));
        String post = loads.worstPost().map(p -> Format.caseName(p.named()) + CaseTables.arrangement(p.state())).orElse(base);
        String torsion = item.item() instanceof PostSign && loads.governs("torsion").torsion() != 0 ? CaseTables.name(loads.governs("torsion")) : base;
        if (post.equals(torsion)) {
            return post.equals(base) ? "" : "; posts and torsion: " + post;
        }
        return (post.equals(base) ? "" : "; posts: " + post) + (torsion.equals(base) ? "" : "; torsion: " + torsion);
    }

    /** What the wind on a post that was found, and is not in the loads, brings the moment to. */
    private static String proposed(ItemResult item, Loads loads, Format format) {
        boolean more = item.item() instanceof PostSign && loads.supports().drag().isEmpty() && loads.carried().isPresent();
        return more ? item.sheet().find("footing-moment").map(m -> "; with the wind on the post that is proposed " + format.moment(m.value()) + ", " + loads.level().name()).orElse("") : "";
    }

    private static Fact moment(ItemResult item, Loads loads, Loads other, Format format) {
        String companion = loads.level().shown();
        return loads.worstPost()
            .map(p -> Fact.of("Moment at the foot of the worst post", format.both(p.moment(), Dimension.MOMENT) + ", " + loads.level().name(),
                format.moment(other.worstPost().orElseThrow().moment()) + " " + companion + ", " + worstPosts(loads, p) + ", case " + Format.caseName(p.named())
                    + CaseTables.arrangement(p.state()) + proposed(item, loads, format)))
            .orElseGet(() -> loads.foot() == Foot.NONE ? height(loads, format) : Fact.of(loads.foot() == Foot.WALL ? "Moment at the wall" : "Moment at the ground, whole length", format.both(loads.governs("base-moment").baseMoment(), Dimension.MOMENT) + ", "
                + loads.level().name(), format.moment(other.governs("base-moment").baseMoment()) + " " + companion));
    }

    private static Fact height(Loads loads, Format format) {
        return Fact.of("Height of the force", format.length(loads.governs("base-shear").height()) + " above the ground");
    }

    /** What supports other than posts must take, the greatest first. */
    private static List<Fact> reactions(Loads loads, Format format) {
        return loads.reactions().stream().filter(r -> !r.named().isEmpty() || r.unit().equals("1")).limit(2).map(r -> Fact.of(r.label(), r.unit().equals("1")
            ? CaseTables.ratio(r) : (r.unit().equals("N") ? format.force(r.value()) : format.moment(r.value())) + ", " + loads.level().name())).toList();
    }

    /** The posts that share the greatest moment. */
    private static String worstPosts(Loads loads, PostAction most) {
        List<String> same = loads.posts().stream().filter(p -> p.moment() >= most.moment() * (1 - 1e-9)).map(p -> Integer.toString(p.post())).toList();
        return same.size() == 1 ? "post " + same.get(0) : same.size() > 4 ? same.size() + " posts alike"
            : "posts " + String.join(", ", same.subList(0, same.size() - 1)) + " and " + same.get(same.size() - 1);
    }

    /** How well the sources of the calculation are known. */
    private static Fact sure(ItemResult item, Loads loads) {
        List<Step> steps = item.sheet().steps();
        long recalled = steps.stream().filter(s -> s.status() == Status.RECALLED).count();
        long quoted = steps.stream().filter(s -> s.status() == Status.SECOND_HAND).count();
        String first = recalled == 0 ? "no step rests on memory" : recalled + " of " + steps.size() + " steps rest on figures not yet checked against print";
        return Fact.of("How sure", first, (quoted > 0 ? quoted + " more on figures seen quoted or in another edition; " : "") + scope(loads));
    }

    /** What was checked of what holds it, in one phrase. */
    private static String scope(Loads loads) {
        return loads.carried().isPresent() ? "what carries it is pre-sized only, for an engineer's review"
            : loads.foot() == Foot.GROUND && loads.supports().posts().size() > 0 ? "loads only: no post, footing or ground was checked" : "loads only: what holds it was not checked";
    }

    private static List<Paragraph> overrides(ItemResult item) {
        return item.notes().stream().filter(n -> n.kind() == Note.Kind.OVERRIDE).map(n -> new Paragraph("User's own value: " + n.text(), Tone.CAUTION)).toList();
    }

    private static List<Block> refusal(ItemResult item, String anchor, int level) {
        ItemResult.Refusal refusal = item.refusal().orElseThrow();
        if (refusal.ofScope()) {
            return List.of(new Heading(level, ItemResult.OUTSIDE, anchor + "answer"), new Answer(List.of(Fact.of("Outcome", "outside scope",
                item.loads().isPresent() ? "the loads below are loads only: what holds it is not checked" : "no load is given"),
                Fact.of("Why", refusal.clause() + ": " + refusal.reason()), Fact.of("What to send to the engineer", refusal.instead()))));
        }
        return List.of(new Heading(level, "Not covered by this code", anchor + "answer"),
            new Answer(List.of(Fact.of("Outcome", item.outcome().word().replace('-', ' '), "no load is given"),
                Fact.of("Clause", refusal.code() + ", " + refusal.clause()), Fact.of("Reason", refusal.reason()),
                Fact.of("What can be done", refusal.instead()))));
    }

    private static String caption(ItemResult item) {
        return "Drawn to scale, dimensions as typed." + item.loads().map(l -> " Hatched the denser the higher the pressure, zones as in "
            + Format.caseWords(ItemDrawing.shown(l).name()) + Format.end(ItemDrawing.shown(l))
            + (item.item() instanceof PostSign ? "; the circle marks the force of " + Format.caseWords(l.governs("torsion").name())
                + Format.end(ItemDrawing.fromLeft(l, l.governs("torsion"))).replace(", force to the", ", towards the") : "") + ".").orElse("");
    }

    private static Notes notes(ItemResult item, Note.Kind... kinds) {
        List<Note.Kind> wanted = List.of(kinds);
        return new Notes(item.notes().stream().filter(n -> wanted.contains(n.kind())).map(Note::text).toList());
    }

    private ItemBlocks() { }
}
