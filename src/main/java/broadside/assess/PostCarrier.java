package broadside.assess;

import broadside.action.PostDrag;
import broadside.assess.Carried.Choice;
import broadside.assess.Carried.Part;
import broadside.assess.Carried.Result;
import broadside.panel.Footing;
import broadside.panel.PostSection;
import broadside.panel.PostType;
import broadside.support.Assumed;
import broadside.support.Catalogue;
import broadside.support.Check;
import broadside.support.FootLoad;
import broadside.support.FootingResult;
import broadside.support.Footings;
import broadside.support.Grade;
import broadside.support.OwnDrag;
import broadside.support.PostDesign;
import broadside.support.PostLoad;
import broadside.support.PostTask;
import broadside.support.Section;
import broadside.support.Section.Material;
import broadside.support.WindLevels;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;

/** Posts and their footing: a typed section is checked, an empty one is chosen; the same for the footing. */
final class PostCarrier {

    private final Carriers by;
    private final PostType type;
    private final Optional<Footing> footing;
    private final PostDemands demands;
    private final Function<PostSection, PostDrag> drag;
    private final Map<PostSection, PostDrag> known = new HashMap<>();

    /** What was decided about the section before anything of it was recorded. */
    record Chosen(Section section, Grade grade, boolean typed, List<PostDesign.Candidate> candidates) { }

    /**
     * Makes a carrier.
     *
     * @param drag  wind on the post with the most of it, by its outline
     */
    PostCarrier(Carriers by, PostType type, Optional<Footing> footing, PostDemands demands, Function<PostSection, PostDrag> drag) {
        this.by = by;
        this.type = type;
        this.footing = footing;
        this.demands = demands;
        this.drag = drag;
    }

    /** The section typed, or the lightest that passes; nothing where the text names no section, its strength is not known, or none passes. */
    Optional<Chosen> choose(WindLevels levels, Trace quiet) {
        Catalogue catalogue = by.rules().catalogue();
        if (type.typed()) {
            return catalogue.find(type.section().get()).map(s -> new Chosen(s, grade(s), true, List.of())).filter(c -> catalogue.beyond(c.grade(), c.section()).isEmpty());
        }
        List<Section> sections = sections(catalogue);
        Grade grade = grade(sections.get(0));
        sections.removeIf(s -> catalogue.beyond(grade, s).isPresent());
        PostDesign.Sized sized = by.rules().posts().size(sections, grade, task(levels), quiet);
        return sized.chosen().map(r -> new Chosen(r.section(), grade, false, sized.candidates()));
    }

    /** The sections to choose from: those of the series typed, or the usual ones of the rules in use. */
    private List<Section> sections(Catalogue catalogue) {
        List<String> keys = type.series().map(List::of).orElseGet(() -> catalogue.defaults(by.us(), Material.STEEL));
        Stream<Section> sections = keys.stream().flatMap(k -> catalogue.series(k).stream());
        return new ArrayList<>(keys.size() == 1 ? catalogue.series(keys.get(0)) : sections.sorted(Comparator.comparingDouble(Section::mass).thenComparing(Section::designation)).toList());
    }

    private Grade grade(Section section) {
        Catalogue catalogue = by.rules().catalogue();
        return type.grade().map(g -> catalogue.grade(g, section)).orElseGet(() -> catalogue.defaultGrade(section));
    }

    private PostTask task(WindLevels levels) {
        return new PostTask(by.route(), type.duration().orElse("short"), demands.loads(), levels, s -> own(s.outline()), demands.top(), demands.top(), demands.tipMass(),
            demands.tipHeight(), type.deflection());
    }

    private OwnDrag own(PostSection outline) {
        PostDrag found = known.computeIfAbsent(outline, drag);
        return new OwnDrag(found.force(), found.moment(), found.squares(), found.cubes());
    }

    /** Checks what was chosen, records it, and goes on down into the ground. */
    Carried carry(Optional<Chosen> chosen, WindLevels levels, Trace sheet) {
        List<Part> parts = new ArrayList<>();
        if (chosen.isEmpty()) {
            return new Carried(List.of(none()));
        }
        Section section = chosen.get().section();
        by.rules().catalogue().record(section, sheet);
        PostDesign.Result result = by.rules().posts().check(section, chosen.get().grade(), task(levels), sheet);
        parts.add(posts(chosen.get(), result));
        if (!result.dynamic()) {
            parts.add(footing(section, levels, sheet));
        }
        return new Carried(parts);
    }

    private Part none() {
        Catalogue catalogue = by.rules().catalogue();
        String why = type.section().filter(t -> type.typed()).map(text -> catalogue.find(text).flatMap(s -> catalogue.beyond(grade(s), s)).map(w -> w + ". Loads only.")
            .orElse("\"" + text + "\" names no section that is known here; known are designations such as CHS 114.3x5, SHS 100x5 hot, "
                + "RHS 120x80x5 cold, PIPE 4 STD, HSS 4x4x1/4, TIMBER 100x100, TUBE 89x3. Loads only."))
            .orElse("no section of the series " + type.series().orElse("in use") + " passes every check: other posts, more posts or a smaller board are needed. An engineer is needed.");
        return new Part("posts", "Posts", List.of(), List.of(), List.of(), List.of(), List.of(), Optional.of(why));
    }

    private Part posts(Chosen chosen, PostDesign.Result result) {
        Section section = chosen.section();
        List<Result> results = new ArrayList<>(List.of(
            Result.words("section", "Post", section.designation() + ", " + chosen.grade().name() + (chosen.typed() ? "" : ", chosen")),
            Result.of("mass", "Mass of a post along its length", section.mass(), "kg/m"), Result.words("rule", "Rule for the post", result.title()),
            Result.words("limit", "Limit on the deflection", by.rules().posts().deflection().place(result.limit()))));
        List<String> assumed = new ArrayList<>(demands.assumed());
        if (type.grade().isEmpty()) {
            assumed.add("The grade was not given: " + chosen.grade().name() + " is taken.");
        }
        List<String> remarks = new ArrayList<>(result.notes());
        remarks.add("The post is taken as held fast at the ground; what the footing turns is not in the deflection. Joints, welds, base plates and the fixing of the boards are not checked.");
        Optional<String> refused = result.dynamic() ? Optional.of("the natural frequency is below 1 Hz: it swings in gusts, which no rule here covers. " + ItemResult.OUTSIDE + ".") : Optional.empty();
        return new Part("posts", "Posts", results, result.dynamic() ? List.of() : result.checks(), chosen.candidates().stream().map(c -> choice(c, section)).toList(), assumed, remarks,
            refused);
    }

    private static Choice choice(PostDesign.Candidate candidate, Section chosen) {
        return new Choice(candidate.designation(), candidate.mass(), candidate.utilisation(), candidate.governing(), candidate.named(),
            candidate.passes(), candidate.designation().equals(chosen.designation()));
    }

    private Part footing(Section section, WindLevels levels, Trace sheet) {
        OwnDrag on = own(section.outline());
        List<FootLoad> loads = new ArrayList<>();
        for (PostLoad load : demands.loads()) {
            boolean along = load.named().equals(PostDemands.ALONG);
            loads.add(new FootLoad(load.named(), (along ? load.weakShear() : load.shear()) + on.force(), (along ? load.weakMoment() : load.moment()) + on.moment()));
        }
        double weight = demands.given() + Weights.newtons(section.mass() * demands.top());
        FootingResult found = by.rules().footings().hold(new Footings.Request(footing, loads, weight, demands.torsion(), levels, by.stability(), by.route(),
            section.width()), sheet);
        return new Part("footing", "Footing of each post", results(found), found.checks(), List.of(), found.assumed().stream().map(Assumed::text).toList(), found.remarks(),
            Optional.empty());
    }

    private List<Result> results(FootingResult found) {
        boolean pad = found.kind() == Footing.Kind.PAD;
        List<Result> results = new ArrayList<>();
        results.add(Result.words("kind", "Footing", found.kind().word() + (found.sized() ? ", sized" : ", as typed")));
        results.add(Result.of("depth", "Depth below the ground", found.depth(), "m"));
        results.add(Result.of("width", pad ? "Width along the wind" : found.round() ? "Diameter" : "Width", found.width(), "m"));
        if (pad) {
            results.add(Result.of("length", "Length across the wind", found.length(), "m"));
        }
        results.add(Result.of("concrete", "Concrete, the whole of the hole", found.concrete(), "m³"));
        results.add(Result.words("rule", "Rule for the ground", found.rule()));
        if (pad) {
            results.add(Result.words("stability", "Rule of stability", by.stability().title()));
        }
        return results;
    }
}
