package broadside.support;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.trace.OwnValue;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

/** A post is checked and sized by the same rules. */
class PostDesignTest {

    private static final PostDesign DESIGN = new PostDesign(Tubes.RULES);
    private static final WindLevels LEVELS = new WindLevels(1, 1.5, "EN 1990, table A1.2(B)", Status.RECALLED);
    private static final WindLevels AMERICAN = new WindLevels(0.6, 1, "ASCE 7, 2.3 and 2.4", Status.SECOND_HAND);

    private static PostLoad load(String named, double force, double height, double torsion) {
        return new PostLoad(named, force, force * height, torsion, 0, 0, 400, 0, force * height * height, force * Math.pow(height, 3));
    }

    private static final PostLoad ALONG = new PostLoad("edge-on", 0, 0, 0, 150, 450, 400, 0, 150 * 9, 150 * 27);

    static PostTask task(String route, WindLevels levels, List<PostLoad> loads, Function<Section, OwnDrag> drag) {
        return new PostTask(route, "short", loads, levels, drag, 3.75, 4, 40, 3, Optional.empty());
    }

    private static final List<PostLoad> CASES = List.of(load("centred", 2000, 3, 0), load("eccentric", 2000, 3, 900), load("old", 1500, 3, 0), ALONG);

    /** k_w (V + F_d), k_w (M + M_d), T without drag, weights by k_G with the post's own. */
    @Test
    void loadsAreFactoredAndRecorded() {
        Section section = Tubes.chs(139.7, 5);
        Trace trace = new Trace();
        PostDesign.Result result = DESIGN.check(section, Tubes.S355, task("en", LEVELS, CASES, s -> OwnDrag.even(1000 * s.width(), 0, 2)), trace);
        SheetCheck.holds(trace);
        assertThat(result.named()).isEqualTo("eccentric");
        assertThat(Sheets.value(trace, "post-design-shear")).isCloseTo(1.5 * (2000 + 279.4), within(1e-9));
        assertThat(Sheets.value(trace, "post-design-moment")).isCloseTo(1.5 * (6000 + 279.4), within(1e-9));
        assertThat(Sheets.value(trace, "post-design-torsion")).isCloseTo(1350, within(1e-9));
        assertThat(Sheets.value(trace, "post-design-compression")).isCloseTo(1.35 * (400 + section.mass() * 3.75 * 9.80665), within(1e-9));
        double squares = 18_000 + 139.7 * 8 / 3;
        double cubes = 54_000 + 139.7 * 16 / 4;
        assertThat(Sheets.value(trace, "post-deflection")).isCloseTo((12 * squares - cubes) / (6 * 210e9 * section.properties().inertia()), within(1e-12));
        assertThat(result.checks()).extracting(Check::name).containsExactly("post torsion", "post shear", "post bending", "post combined", "post deflection", "natural frequency");
        assertThat(result.limit()).isEqualTo("tdb4");
        assertThat(trace.steps().stream().filter(s -> s.name().equals("post-design-moment"))).hasSize(1);
    }

    /** Wind along the face bends a flat tube about its weak axis, and the drag of the post with it. */
    @Test
    void windAlongTheFace() {
        Section flat = Tubes.rhs(200, 50, 4);
        Trace trace = new Trace();
        PostLoad face = load("centred", 100, 3, 0);
        PostLoad along = new PostLoad("edge-on", 0, 0, 0, 800, 2400, 400, 0, 800 * 9, 800 * 27);
        PostDesign.Result result = DESIGN.check(flat, Tubes.S355, task("en", LEVELS, List.of(face, along), s -> OwnDrag.even(20, 0, 2)), trace);
        SheetCheck.holds(trace);
        assertThat(result.named()).isEqualTo("edge-on");
        assertThat(Sheets.value(trace, "post-design-moment")).isZero();
        assertThat(Sheets.value(trace, "post-design-moment/along")).isCloseTo(1.5 * (2400 + 40), within(1e-9));
        assertThat(Sheets.value(trace, "post-design-shear/along")).isCloseTo(1.5 * 840, within(1e-9));
        assertThat(Sheets.check(result.checks(), "post deflection").named()).isEqualTo("edge-on");
        assertThat(Sheets.value(trace, "post-deflection")).isCloseTo((12 * (7200 + 20 * 8 / 3.0) - 21_600 - 80) / (6 * 210e9 * flat.properties().weakInertia()), within(1e-12));
    }

    @Test
    void boardsThatHangToOneSide() {
        Trace trace = new Trace();
        PostLoad load = new PostLoad("centred", 2000, 6000, 0, 0, 0, 600, 300, 18_000, 54_000);
        DESIGN.check(Tubes.chs(139.7, 5), Tubes.S355, task("en", LEVELS, List.of(load), s -> OwnDrag.NONE), trace);
        SheetCheck.holds(trace);
        assertThat(Sheets.value(trace, "post-design-moment/along")).isCloseTo(1.35 * 300, within(1e-9));
    }

    @Test
    void levelsOfTheAmericanRoutes() {
        Trace allowable = new Trace();
        DESIGN.check(Tubes.chs(139.7, 5), Tubes.A53, task("us-asd", AMERICAN, CASES, s -> OwnDrag.NONE), allowable);
        SheetCheck.holds(allowable);
        assertThat(Sheets.value(allowable, "post-design-moment")).isCloseTo(3600, within(1e-9));
        Trace strength = new Trace();
        PostDesign.Result result = DESIGN.check(Tubes.chs(139.7, 5), Tubes.A53, task("us-strength", AMERICAN, CASES, s -> OwnDrag.NONE), strength);
        assertThat(Sheets.value(strength, "post-design-moment")).isCloseTo(6000, within(1e-9));
        assertThat(Sheets.value(strength, "post-service/squares")).isCloseTo(0.6 * 18_000, within(1e-9));
        assertThat(Sheets.value(strength, "post-deflection-limit")).isCloseTo(3 / 80.0, within(1e-12));
        assertThat(result.title()).contains("LRFD");
    }

    @Test
    void theLightestThatPasses() {
        List<Section> series = Tubes.series();
        for (String route : List.of("en", "us-asd", "us-strength")) {
            WindLevels levels = route.equals("en") ? LEVELS : AMERICAN;
            PostTask task = task(route, levels, CASES, s -> OwnDrag.even(1200 * s.width(), 0, 2));
            Trace sized = new Trace();
            PostDesign.Sized found = DESIGN.size(series, Tubes.S235, task, sized);
            SheetCheck.holds(sized);
            PostDesign.Result chosen = found.chosen().orElseThrow();
            Trace checked = new Trace();
            assertThat(DESIGN.check(chosen.section(), Tubes.S235, task, checked)).isEqualTo(chosen);
            assertThat(checked.steps()).isEqualTo(sized.steps());
            assertThat(chosen.passes()).isTrue();
            int at = series.indexOf(chosen.section());
            assertThat(at).isBetween(12, series.size() - 10);
            for (int i = 0; i < at; i++) {
                assertThat(DESIGN.check(series.get(i), Tubes.S235, task, new Trace().quiet()).passes()).as(series.get(i).designation()).isFalse();
            }
            assertThat(found.candidates()).hasSize(8);
            assertThat(found.candidates().subList(0, 3)).allMatch(c -> !c.passes() && c.utilisation() > 1 && !c.governing().isEmpty());
            assertThat(found.candidates().get(3).designation()).isEqualTo(chosen.section().designation());
            assertThat(found.candidates().get(3).utilisation()).isEqualTo(chosen.worst().utilisation());
            assertThat(found.candidates()).isSortedAccordingTo((a, b) -> Double.compare(a.mass(), b.mass()));
        }
    }

    /** Leaving out cases that others cover changes nothing: every case alone is within what the check of all says. */
    @Test
    void noCaseIsWorseThanTheOneThatGoverns() {
        Section section = Tubes.rhs(120, 80, 5);
        PostTask all = task("en", LEVELS, CASES, s -> OwnDrag.even(100, 0, 2));
        double worst = DESIGN.check(section, Tubes.S235, all, new Trace()).worst().utilisation();
        List<Double> each = new ArrayList<>();
        for (PostLoad load : CASES) {
            each.add(DESIGN.check(section, Tubes.S235, task("en", LEVELS, List.of(load), all.drag()), new Trace()).worst().utilisation());
        }
        assertThat(each.stream().mapToDouble(Double::doubleValue).max().orElseThrow()).isEqualTo(worst);
        assertThat(PostCases.forStrength(CASES)).extracting(PostLoad::named).containsExactly("eccentric", "edge-on");
        assertThat(PostCases.forDeflection(CASES, 4, false)).extracting(PostLoad::named).containsExactly("centred", "edge-on");
    }

    @Test
    void noneThatPasses() {
        PostDesign.Sized found = DESIGN.size(Tubes.series().subList(0, 20), Tubes.S235, task("en", LEVELS, List.of(load("centred", 20_000, 5, 0)), s -> OwnDrag.NONE), new Trace());
        assertThat(found.chosen()).isEmpty();
        assertThat(found.candidates()).hasSize(3).noneMatch(PostDesign.Candidate::passes);
    }

    @Test
    void slowAndSlenderPostsAreNamed() {
        PostTask task = new PostTask("en", "short", List.of(load("centred", 10, 8, 0)), LEVELS, s -> OwnDrag.NONE, 8, 8, 200, 8, Optional.of("tdb6"));
        PostDesign.Result result = DESIGN.check(Tubes.chs(60.3, 3.2), Tubes.S235, task, new Trace());
        assertThat(result.dynamic()).isTrue();
        assertThat(result.passes()).isFalse();
        assertThat(result.worst().name()).isEqualTo("natural frequency");
        assertThat(DESIGN.check(Tubes.chs(600, 4), Tubes.S235, task, new Trace()).checks().get(0).name()).isEqualTo("wall slenderness");
    }

    @Test
    void frequencyCountsThePostAboveTheBoards() {
        Trace trace = new Trace();
        Section section = Tubes.chs(139.7, 5);
        DESIGN.check(section, Tubes.S235, task("en", LEVELS, CASES, s -> OwnDrag.NONE), trace);
        double moving = 40 + section.mass() * 0.75 + 33.0 / 140 * section.mass() * 3;
        assertThat(Sheets.value(trace, "post-frequency")).isCloseTo(Math.sqrt(3 * 210e9 * section.properties().inertia() / (27 * moving)) / (2 * Math.PI), within(1e-9));
    }

    @Test
    void ownValuesHoldWhileSizing() {
        Trace trace = new Trace(List.of(new OwnValue("post-wind-factor", 3, "1", "by the engineer")));
        PostTask task = task("en", LEVELS, CASES, s -> OwnDrag.NONE);
        PostDesign.Result chosen = DESIGN.size(Tubes.series(), Tubes.S235, task, trace).chosen().orElseThrow();
        PostDesign.Result plain = DESIGN.size(Tubes.series(), Tubes.S235, task, new Trace()).chosen().orElseThrow();
        assertThat(chosen.section().mass()).isGreaterThan(plain.section().mass());
        assertThat(Sheets.value(trace, "post-design-moment")).isCloseTo(18_000, within(1e-9));
    }

    @Test
    void whatDoesNotFitIsRefused() {
        PostTask task = task("en", LEVELS, CASES, s -> OwnDrag.NONE);
        assertThatThrownBy(() -> DESIGN.check(Tubes.timber(100, 100), Tubes.S235, task, new Trace())).isInstanceOf(UnfitAnswer.class).hasMessageContaining("S235");
        PostTask odd = new PostTask("en", "short", CASES, LEVELS, s -> OwnDrag.NONE, 3, 3, 0, 3, Optional.of("l-1"));
        assertThatThrownBy(() -> DESIGN.check(Tubes.chs(100, 5), Tubes.S235, odd, new Trace())).isInstanceOf(UnfitAnswer.class).hasMessageContaining("aashto-15");
        assertThatThrownBy(() -> new PostTask("en", "short", List.of(), LEVELS, s -> OwnDrag.NONE, 3, 3, 0, 3, Optional.empty())).isInstanceOf(IllegalArgumentException.class);
    }

    /** A timber post by both routes, from loads to checks. */
    @Test
    void timber() {
        List<PostLoad> loads = List.of(load("normal", 500, 2, 40));
        for (PostTask task : List.of(task("en", LEVELS, loads, s -> OwnDrag.NONE), task("us-strength", AMERICAN, loads, s -> OwnDrag.NONE))) {
            Trace trace = new Trace();
            PostDesign.Result result = DESIGN.check(Tubes.timber(140, 140), task.route().equals("en") ? Tubes.C24 : Tubes.PINE, task, trace);
            SheetCheck.holds(trace);
            assertThat(Sheets.value(trace, "post-design-moment")).isCloseTo(task.route().equals("en") ? 1500 : 600, within(1e-9));
            assertThat(result.passes()).isTrue();
        }
    }
}
