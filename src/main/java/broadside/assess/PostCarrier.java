package broadside.assess;

import broadside.action.PostDrag;
import broadside.assess.Carried.Choice;
import broadside.assess.Carried.Part;
import broadside.assess.Carried.Result;
import broadside.panel.Footing;
import broadside.panel.PostSection;
import broadside.panel.PostType;
import broadside.quantity.Show;
import broadside.quantity.Units;
import broadside.support.Assumed;
import broadside.support.Catalogue;
import broadside.support.Check;
import broadside.support.FootLoad;
import broadside.support.FootingResult;
import broadside.support.Footings;
import broadside.support.Grade;
import broadside.support.NoAnswer;
import broadside.support.OwnDrag;
import broadside.support.PostDesign;
import broadside.support.PostLoad;
import broadside.support.PostTask;
import broadside.support.Section;
import broadside.support.Section.Material;
import broadside.support.WindLevels;
import broadside.trace.Status;
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

    /** The section, or why there is none. */
    record Decision(Optional<Chosen> chosen, String why) {
        static Decision none(String why) {
            return new Decision(Optional.empty(), why);
        }
    }

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

    /** The section typed, or the lightest that passes. */
    Decision choose(WindLevels levels, Trace quiet) {
        Catalogue catalogue = by.rules().catalogue();
        if (type.typed()) {
            return catalogue.find(type.section().get()).map(this::typed).orElseGet(() -> Decision.none("\"" + type.section().get() + "\" names no section that is known here; known "
                + "are designations such as CHS 114.3x5, SHS 100x5 hot, RHS 120x80x5 cold, PIPE 4 STD, HSS 4x4x1/4, TIMBER 100x100, TUBE 89x3. Loads only."));
        }
        List<Section> sections = sections(catalogue);
        Grade grade = grade(sections.get(0));
        sections.removeIf(s -> catalogue.beyond(grade, s).isPresent());
        try {
            PostDesign.Sized sized = by.rules().posts().size(sections, grade, task(levels), quiet);
            return sized.chosen().map(r -> new Decision(Optional.of(new Chosen(r.section(), grade, false, sized.candidates())), "")).orElseGet(() -> Decision.none("no section of the series "
                + type.series().orElse("in use") + " passes every check: other posts, more posts or a smaller board are needed. An engineer is needed."));
        } catch (NoAnswer e) {
            return Decision.none(e.getMessage() + ". Loads only.");
        }
    }

    private Decision typed(Section section) {
        Grade grade = grade(section);
        return by.rules().catalogue().beyond(grade, section).map(why -> Decision.none(why + ". Loads only."))
            .orElseGet(() -> new Decision(Optional.of(new Chosen(section, grade, true, List.of())), ""));
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
    Carried carry(Decision decided, WindLevels levels, Trace sheet) {
        if (decided.chosen().isEmpty()) {
            return new Carried(List.of(Part.refused("posts", "Posts", decided.why())));
        }
        Chosen chosen = decided.chosen().get();
        List<Part> parts = new ArrayList<>();
        try {
            by.rules().catalogue().record(chosen.section(), sheet);
            PostDesign.Result result = by.rules().posts().check(chosen.section(), chosen.grade(), task(levels), sheet);
            parts.add(posts(chosen, result));
            if (!result.dynamic()) {
                parts.add(footing(chosen.section(), levels, sheet));
            }
        } catch (NoAnswer e) {
            parts.add(parts.isEmpty() ? Part.refused("posts", "Posts", e.getMessage() + ". Loads only.") : Part.refused("footing", "Footing of each post", e.getMessage() + "."));
        }
        return new Carried(parts);
    }

    private Part posts(Chosen chosen, PostDesign.Result result) {
        Section section = chosen.section();
        List<Result> results = new ArrayList<>(List.of(
            Result.words("section", "Post", section.designation() + ", " + chosen.grade().name() + (chosen.typed() ? "" : ", chosen") + along(section)),
            Result.of("mass", "Mass of a post along its length", section.mass(), "kg/m"), Result.words("rule", "Rule for the post", result.title()),
            Result.words("limit", "Limit on the deflection", by.rules().posts().deflection().place(result.limit()))));
        List<String> assumed = new ArrayList<>(demands.assumed());
        if (type.grade().isEmpty()) {
            assumed.add("The grade was not given: " + chosen.grade().name() + " is taken.");
        }
        List<String> remarks = new ArrayList<>(result.notes());
        remarks.add("The post is taken as held fast at the ground; what the footing turns is not in the deflection. Joints, welds, base plates and the fixing of the boards are not checked.");
        Optional<String> refused = result.dynamic() ? Optional.of("the natural frequency is below 1 Hz: it swings in gusts, which no rule here covers. " + ItemResult.OUTSIDE + ".") : Optional.empty();
        return new Part("posts", "Posts", results, result.dynamic() ? List.of() : result.checks(), chosen.candidates().stream().map(c -> choice(c, section)).toList(), assumed, List.of(), remarks,
            refused);
    }

    /** Which side of a section whose sides differ lies along the wind. */
    private String along(Section section) {
        return section.depth() == section.width() ? "" : ", " + (by.job().units() == Units.US ? Show.feetInches(section.depth()) : Math.round(section.depth() * 1000) + " mm")
            + " along the wind";
    }

    private static Choice choice(PostDesign.Candidate candidate, Section chosen) {
        return new Choice(candidate.designation(), candidate.mass(), candidate.utilisation(), candidate.governing(), candidate.named(),
            candidate.passes(), candidate.designation().equals(chosen.designation()));
    }

    private Part footing(Section section, WindLevels levels, Trace sheet) {
        OwnDrag on = own(section.outline());
        double aside = aside(levels, sheet);
        List<FootLoad> loads = new ArrayList<>();
        double narrow = narrow();
        for (PostLoad load : demands.loads()) {
            // Rules for pads look along the wind on the face; a pad that is narrower across gets more of the wind along the face instead.
            boolean along = load.named().equals(PostDemands.ALONG);
            double r = along ? narrow : 1;
            String named = r > 1 ? load.named() + ", times the width of the pad over its length" : load.named();
            loads.add(new FootLoad(named, r * ((along ? load.weakShear() : load.shear()) + on.force()), r * ((along ? load.weakMoment() : load.moment()) + on.moment()) + aside));
        }
        double weight = demands.given() + Weights.newtons(section.mass() * demands.top());
        FootingResult found = by.rules().footings().hold(new Footings.Request(footing, loads, weight, demands.torsion(), levels, by.stability(), by.route(),
            Math.max(section.width(), section.depth()), by.job().units() == Units.US), sheet);
        List<String> remarks = new ArrayList<>(found.remarks());
        if (aside > 0) {
            remarks.add("The permanent moment of boards that hang to one side counts as if it acted with the wind, on the safe side.");
        }
        return new Part("footing", "Footing of each post", results(found), found.checks(), List.of(), found.assumed().stream().filter(a -> !a.warns()).map(Assumed::text).toList(),
            found.assumed().stream().filter(Assumed::warns).map(Assumed::text).toList(), remarks,
            Optional.empty());
    }

    /** Width of a typed pad over its length, at least 1. */
    private double narrow() {
        return footing.flatMap(f -> f.width().flatMap(w -> f.length().map(l -> Math.max(1, w.metres() / l.metres())))).orElse(1.0);
    }

    /**
     * The permanent moment of boards that hang to one side, N m at the level of the wind: it counts in the direction of the wind, over the least factor of the
     * levels, so that none lessens it, and more on a pad that is narrower across.
     */
    private double aside(WindLevels levels, Trace sheet) {
        double moment = demands.loads().stream().mapToDouble(PostLoad::weightMoment).max().orElse(0);
        if (moment == 0) {
            return 0;
        }
        double m = sheet.line("footing-weight-moment/boards", "M_{G1}", "moment of boards that hang to one side").from("weight of the boards", Status.DERIVED)
            .reads("sum of weight and distance from the post", moment, "N m");
        double k = sheet.line("footing-weight-level", "k_G", "the least of 1 and the factors of the levels").from(levels.place(), levels.status())
            .reads("so that no factor on wind lessens a weight", Math.min(1, Math.min(levels.service(), levels.strength())), "1");
        double r = sheet.line("footing-weight-ratio", "r_G", "width of the pad over its length, at least 1").from("geometry", Status.DERIVED)
            .reads("as typed; 1 for a square or a shaft", narrow(), "1");
        return sheet.line("footing-weight-moment", "M_{G2}", "the same, as it counts with the wind").in("r_G", r).in("M_{G1}", m, "N m").in("k_G", k)
            .from("added to the moment of the wind: on the safe side of both directions together", Status.DERIVED).gives("r_G M_{G1} / k_G", r * m / k, "N m");
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
        footing.flatMap(f -> f.soil().ground()).ifPresent(g -> results.add(Result.words("ground", "Ground, as typed", g)));
        results.add(Result.of("concrete", "Concrete, the whole of the hole", found.concrete(), "m³"));
        results.add(Result.words("rule", "Rule for the ground", found.rule()));
        if (pad) {
            results.add(Result.words("stability", "Rule of stability", by.stability().title()));
        }
        return results;
    }
}
