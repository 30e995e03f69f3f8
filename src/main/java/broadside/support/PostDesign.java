package broadside.support;

import broadside.table.Edition;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;

/** Checks a post, or takes the lightest section that passes every check. Both run the same rules; only the case that governs is recorded. */
public final class PostDesign {

    private static final int LIGHTER = 3;
    private static final int HEAVIER = 4;
    private static final int LOOK_BACK = 12;

    private final PostRules rules;
    private final PostDeflection deflection;
    private final PostFrequency frequency;
    private final Figure gravity;

    /** Reads the tables of posts. */
    public PostDesign(Edition edition) {
        this.rules = new PostRules(edition);
        this.deflection = new PostDeflection(edition);
        this.frequency = new PostFrequency(edition);
        this.gravity = Figure.of(edition.rows("post-constants"), "gravity");
    }

    /**
     * A post with its checks.
     *
     * @param title        the rule
     * @param notes        what the rule leaves out
     * @param checks       strength in the governing case, deflection in its governing case, natural frequency
     * @param named        the case that governs the strength
     * @param limit        name of the deflection limit that was used
     * @param frequency    lowest natural frequency, Hz
     * @param dynamic      swings so slowly that no rule here covers it
     */
    public record Result(Section section, String title, List<String> notes, List<Check> checks, String named, String limit, double frequency, boolean dynamic) {

        public boolean passes() {
            return checks.stream().allMatch(Check::passes);
        }

        /** The check that uses most of what it has. */
        public Check worst() {
            return PostDesign.worst(checks);
        }
    }

    /**
     * One section that was tried.
     *
     * @param mass         kg/m
     * @param utilisation  of its worst check
     * @param governing    name of that check
     * @param named        the case that gives it; empty for all
     */
    public record Candidate(String designation, double mass, double utilisation, String governing, String named, boolean passes) { }

    /**
     * The lightest section that passes.
     *
     * @param chosen      as {@link #check} gives it; empty where none passes
     * @param candidates  three lighter ones that fail by least, the chosen one and the next heavier ones that pass, in order of mass
     */
    public record Sized(Optional<Result> chosen, List<Candidate> candidates) { }

    /** The limits of deflection and the standard of each route. */
    public PostDeflection deflection() {
        return deflection;
    }

    public PostRules rules() {
        return rules;
    }

    /**
     * Checks one section and records the cases that govern.
     *
     * @throws UnfitAnswer  where route, duration, limit or grade do not fit
     */
    public Result check(Section section, Grade grade, PostTask task, Trace trace) {
        return new Work(grade, task).result(section, trace);
    }

    /**
     * Takes the first section that passes and records it as {@link #check} does.
     *
     * @param sections  in order of mass
     */
    public Sized size(List<Section> sections, Grade grade, PostTask task, Trace trace) {
        Work work = new Work(grade, task);
        Trace quiet = trace.quiet();
        int found = 0;
        while (found < sections.size() && !work.passes(sections.get(found), quiet)) {
            found++;
        }
        List<Candidate> candidates = new ArrayList<>(lighter(sections, found, work, quiet));
        int kept = candidates.size();
        for (int i = found; i < sections.size() && candidates.size() < kept + 1 + HEAVIER; i++) {
            if (i == found || work.passes(sections.get(i), quiet)) {
                candidates.add(candidate(work.result(sections.get(i), quiet)));
            }
        }
        return new Sized(found < sections.size() ? Optional.of(work.result(sections.get(found), trace)) : Optional.empty(), candidates);
    }

    /** Of the last lighter sections those that failed by least, in order of mass. */
    private static List<Candidate> lighter(List<Section> sections, int found, Work work, Trace quiet) {
        List<Candidate> last = new ArrayList<>();
        for (int i = Math.max(0, found - LOOK_BACK); i < found; i++) {
            last.add(candidate(work.result(sections.get(i), quiet)));
        }
        List<Candidate> near = last.stream().sorted(Comparator.comparingDouble(Candidate::utilisation)).limit(LIGHTER).toList();
        return last.stream().filter(near::contains).toList();
    }

    private static Candidate candidate(Result result) {
        Check worst = result.worst();
        return new Candidate(result.section().designation(), result.section().mass(), worst.utilisation(), worst.name(), worst.named(), result.passes());
    }

    private static Check worst(List<Check> checks) {
        Check worst = checks.get(0);
        for (Check check : checks) {
            worst = check.utilisation() > worst.utilisation() ? check : worst;
        }
        return worst;
    }

    /** One task with what does not depend on the section. */
    private final class Work {

        private final Grade grade;
        private final PostTask task;
        private final PostRule rule;
        private final PostLoads factored;
        private final String limit;
        private final List<PostLoad> strong;
        private final List<PostLoad> bent;
        private int first; // the case that failed last is tried first

        Work(Grade grade, PostTask task) {
            this.grade = grade;
            this.task = task;
            this.rule = rules.of(task.route(), grade.material(), task.duration());
            this.factored = new PostLoads(task, rule, gravity);
            this.limit = task.limit().orElse(deflection.standard(task.route()));
            deflection.known(limit);
            this.strong = PostCases.forStrength(task.loads());
            this.bent = PostCases.forDeflection(task.loads(), task.deflectionHeight(), deflection.ofWind(limit));
        }

        boolean passes(Section section, Trace quiet) {
            // What fails without the wind on the post itself fails with it, and that wind takes the longest to find.
            if (!strength(strong.get(first), section, OwnDrag.NONE, quiet).stream().allMatch(Check::passes)) {
                return false;
            }
            OwnDrag drag = drag(section);
            for (int i = 0; i < strong.size(); i++) {
                int at = (first + i) % strong.size();
                if (!strength(strong.get(at), section, drag, quiet).stream().allMatch(Check::passes)) {
                    first = at;
                    return false;
                }
            }
            return bent.stream().allMatch(b -> deflected(b, section, drag, quiet).passes()) && frequency.check(swing(section, quiet), quiet).passes();
        }

        Result result(Section section, Trace trace) {
            OwnDrag drag = drag(section);
            Trace quiet = trace.quiet();
            PostLoad load = strong.get(most(strong.stream().mapToDouble(l -> worst(strength(l, section, drag, quiet)).utilisation())));
            PostLoad swayed = bent.get(most(bent.stream().mapToDouble(l -> deflected(l, section, drag, quiet).utilisation())));
            List<Check> checks = new ArrayList<>(strength(load, section, drag, trace));
            checks.add(deflected(swayed, section, drag, trace));
            double swing = swing(section, trace);
            checks.add(frequency.check(swing, trace));
            return new Result(section, rule.title(), rule.notes(), List.copyOf(checks), load.named(), limit, swing, frequency.dynamic(swing));
        }

        private OwnDrag drag(Section section) {
            return task.drag().apply(section);
        }

        private List<Check> strength(PostLoad load, Section section, OwnDrag drag, Trace trace) {
            if (section.material() != grade.material()) {
                throw new UnfitAnswer("posts.grade", grade.name() + " is no material of " + section.designation());
            }
            return rule.check(section, grade, factored.design(load, section, drag, trace), trace);
        }

        private Check deflected(PostLoad load, Section section, OwnDrag drag, Trace trace) {
            boolean along = PostCases.along(load);
            PostDeflection.Bent sums = factored.service(load, drag, trace);
            double modulus = grade.modulus().into(trace.line("post-modulus", "E", "modulus of elasticity"));
            double inertia = inertia(section, along ? section.properties().weakInertia() : section.properties().inertia(), trace);
            double height = trace.line("post-deflection-height", "h_t", "height of the deflection").from("statics", Status.DERIVED)
                .reads("top of the highest board", task.deflectionHeight(), "m");
            return deflection.check(sums, height, modulus, inertia, limit, trace);
        }

        private static double inertia(Section section, double value, Trace trace) {
            return trace.line("post-section/inertia", "I", "second moment of area").from("properties of the section", Status.DERIVED).reads(section.designation(), value, "m⁴");
        }

        /** The softer axis; what of the post stands above the middle of the boards counts with them. */
        private double swing(Section section, Trace trace) {
            double modulus = grade.modulus().into(trace.line("post-modulus", "E", "modulus of elasticity"));
            double inertia = inertia(section, Math.min(section.properties().inertia(), section.properties().weakInertia()), trace);
            double length = trace.line("post-tip-height", "L_t", "height of the middle of the boards").from("statics", Status.DERIVED)
                .reads("length of the post that swings", task.tipHeight(), "m");
            double mass = section.mass();
            double above = mass * Math.max(0, task.height() - length);
            double tip = trace.line("post-tip-mass", "m_t", "mass at that height").from("statics", Status.DERIVED).reads("boards, and the post above them", task.tipMass() + above, "kg");
            double own = trace.line("post-swinging-mass", "m_p", "mass of the post up to there").from("statics", Status.DERIVED).reads("mass per metre times its length", mass * length,
                "kg");
            return frequency.of("post-frequency", modulus, inertia, length, tip, own, trace);
        }
    }

    private static int most(DoubleStream values) {
        double[] all = values.toArray();
        int most = 0;
        for (int i = 1; i < all.length; i++) {
            most = all[i] > all[most] ? i : most;
        }
        return most;
    }
}
